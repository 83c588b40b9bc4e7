package layerweft.engine.transform;

import java.util.List;
import layerweft.model.treaty.LayerTerms;
import layerweft.model.treaty.Loading;
import org.apache.commons.statistics.distribution.NormalDistribution;

/**
 * Every figure of a layer's annual loss Y = min(max(A − D, 0), M) from A on one lattice. The figures of several lattices are then
 * extrapolated one by one.
 */
final class LevelFigures {
    private static final NormalDistribution NORMAL = NormalDistribution.of(0, 1);
    private final LatticeSum sum;
    private final LayerTerms terms;
    private final SumFacts facts;
    private final double end;
    private final LatticeSum.Pieces pieces;
    private final double[] continuous;

    /** @param end D + M, or where the lattice ends if there is no M */
    LevelFigures(LatticeSum sum, LayerTerms terms, SumFacts facts, double end) {
        this.sum = sum;
        this.terms = terms;
        this.facts = facts;
        this.end = end;
        this.pieces = sum.pieces(terms.deductible(), end);
        this.continuous = sum.continuous();
    }

    private boolean limited() {
        return terms.annualLimit() < Double.POSITIVE_INFINITY;
    }

    /** E[Y]; without an annual limit from E[A], which is exact. */
    double expectedLoss() {
        return limited() ? pieces.integral() : facts.mean() - sum.limited(terms.deductible());
    }

    double standardDeviation() {
        double mean = expectedLoss();
        double square;
        if (limited()) {
            square = pieces.secondMoment();
        } else if (Double.isInfinite(facts.secondMoment())) {
            return facts.secondMoment();
        } else {
            // E[(A − D)+²] = E[A²] − E[min(A, D)²] − 2D E[(A − D)+]
            double below = terms.deductible() > 0 ? sum.pieces(0, terms.deductible()).secondMoment() : 0;
            square = facts.secondMoment() - below - 2 * terms.deductible() * mean;
        }
        return Math.sqrt(Math.max(0, square - mean * mean));
    }

    double attachment() {
        return terms.deductible() == 0 ? facts.lossChance() : sum.survivalFromAbove(terms.deductible(), continuous);
    }

    double exhaustion() {
        return limited() ? sum.reachesFromBelow(end, continuous) : 0;
    }

    double reinstatementFactor() {
        double factor = 0;
        double line = terms.occurrenceLimit();
        for (int k = 1; k <= terms.reinstatements() && terms.reinstatementRate(k) > 0; k++) {
            double from = Math.min(end, terms.deductible() + (k - 1) * line);
            double to = Math.min(end, terms.deductible() + k * line);
            factor += terms.reinstatementRate(k) * (sum.limited(to) - sum.limited(from)) / line;
        }
        return factor;
    }

    /** ∫ g(S(y)) dy of a distortion principle; NaN for other principles. */
    double distorted(Loading loading) {
        if (!(loading instanceof Loading.ProportionalHazard) && !(loading instanceof Loading.Wang)) {
            return Double.NaN;
        }
        double[] lengths = pieces.lengths();
        double total = 0;
        for (int k = lengths.length - 1; k >= 0; k--) {
            total += distortion(loading, Math.min(1, pieces.average()[k])) * lengths[k];
        }
        return total;
    }

    /**
     * A bound on what a lattice without annual limit leaves out of ∫ g(S(y)) dy, infinite where none is known: all above its end, and where
     * a loss passes the largest one kept. As g is concave it is at most ∫ g(S − S') with S' the law kept, S − S' at most the chance of a
     * passing loss, 0 below it. By Markov's inequality S(y) ≤ K/y² above x, with K = E[A²; A &gt; x]; and g(s) ≤ c·s^(1/p), for the
     * proportional hazard with c = 1, p = ρ, for Wang's transform, a mean of e^(λZ − λ²/2) over the worst part s, by Hölder's inequality
     * with c = e^(λ²/(2(p − 1))) for any p &gt; 1.
     *
     * @param largest loss of one event that is kept
     * @param passed chance of a larger one in the year; NaN where E[A²] is not known
     */
    double distortedBeyond(Loading loading, double largest, double passed) {
        if (limited()) {
            return 0;
        }
        if (Double.isNaN(passed)) {
            return Double.POSITIVE_INFINITY;
        }
        double first = passed > 0 ? Math.min(end, largest) : end;
        double least = Double.POSITIVE_INFINITY;
        for (int part = 0; part <= 16; part++) {
            double x = first + (end - first) * part / 16;
            double below = distortion(loading, Math.min(1, passed)) * (x - first);
            double k = squareAbove(x);
            if (loading instanceof Loading.ProportionalHazard hazard) {
                least = Math.min(least, below + above(x, k, hazard.rho()));
            } else if (loading instanceof Loading.Wang wang) {
                for (double p = 1.05; p < 2; p += 0.05) {
                    least = Math.min(least, below + Math.exp(wang.lambda() * wang.lambda() / (2 * (p - 1))) * above(x, k, p));
                }
            }
        }
        return least;
    }

    /** E[A²; A &gt; x]. */
    private double squareAbove(double x) {
        double within = sum.pieces(0, x).secondMoment();
        return Math.max(0, facts.secondMoment() - within) + x * x * sum.mean()[LatticeStep.cells(x, sum.step()) - 1];
    }

    /** ∫_x^∞ (K/y²)^(1/p) dy. */
    private static double above(double x, double k, double p) {
        return p >= 2 || Double.isInfinite(k) ? Double.POSITIVE_INFINITY : Math.pow(k, 1 / p) * Math.pow(x, 1 - 2 / p) / (2 / p - 1);
    }

    private static double distortion(Loading loading, double survival) {
        if (survival <= 0 || survival >= 1) {
            return survival;
        }
        return loading instanceof Loading.ProportionalHazard hazard ? Math.pow(survival, 1 / hazard.rho())
                : NORMAL.survivalProbability(NORMAL.inverseSurvivalProbability(survival) - ((Loading.Wang) loading).lambda());
    }

    /** VaR_level(Y) = inf{y : P(Y ≤ y) ≥ level}. */
    double valueAtRisk(double level) {
        double tail = 1 - level;
        // a level written as a decimal should meet a probability that is that decimal
        double slack = 1e-12;
        if (attachment() <= tail + slack) {
            return 0;
        }
        double[] bounds = pieces.bounds();
        int offset = (int) Math.floor(bounds[0] / sum.step() + 1e-7);
        for (int k = 0; k < pieces.average().length; k++) {
            double atomsAbove = pieces.average()[k] - continuous(offset + k);
            double left = node(offset + k, k == 0) + atomsAbove;
            double right = node(offset + k + 1, false) + atomsAbove;
            if (left <= tail + slack) {
                return bounds[k] - bounds[0];
            }
            if (right <= tail) {
                return bounds[k] - bounds[0] + (bounds[k + 1] - bounds[k]) * crossing(left, right, pieces.average()[k], tail);
            }
        }
        return limited() ? terms.annualLimit() : Double.POSITIVE_INFINITY;
    }

    /** P(Y &gt; y) below M: linear between the points of the lattice for the continuous part. */
    double survival(double y) {
        double a = y + pieces.bounds()[0];
        int cell = (int) Math.min(continuous.length - 1, Math.floor(a / sum.step() + 1e-7));
        double s = Math.max(0, a / sum.step() - cell);
        double atomsAbove = sum.mean()[cell] - continuous(cell);
        return y == 0 ? attachment() : Math.min(1, node(cell, false) * (1 - s) + node(cell + 1, false) * s + atomsAbove);
    }

    /** P(Y = y) of an atom, 0 where there is none. */
    double atom(double y) {
        return y == 0 ? 1 - attachment() : y >= terms.annualLimit() ? exhaustion() : sum.atom(terms.deductible() + y);
    }

    private double continuous(int cell) {
        return continuous[Math.max(0, Math.min(cell, continuous.length - 1))];
    }

    /** Continuous part of the survival function at a point of the lattice, from the averages of four cells, kept monotone. */
    private double node(int k, boolean fromAbove) {
        double above = continuous(k);
        if (k == 0 || fromAbove) {
            double value = (11 * above - 7 * continuous(k + 1) + 2 * continuous(k + 2)) / 6;
            return Math.max(above, value);
        }
        double below = continuous(k - 1);
        double value = (7 * (below + above) - continuous(k - 2) - continuous(k + 1)) / 12;
        return Math.min(below, Math.max(above, value));
    }

    /** Where on [0, 1] the parabola with these ends and this average falls to the tail. */
    private static double crossing(double left, double right, double average, double tail) {
        double bulge = 6 * (average - 0.5 * (left + right));
        double limit = Math.abs(left - right);
        bulge = Math.max(-limit, Math.min(limit, bulge));
        double low = 0;
        double high = 1;
        for (int step = 0; step < 50; step++) {
            double x = 0.5 * (low + high);
            double value = left + (right - left) * x + bulge * x * (1 - x);
            if (value > tail) {
                low = x;
            } else {
                high = x;
            }
        }
        return 0.5 * (low + high);
    }

    /** TVaR = VaR + E[(Y − VaR)+]/(1 − level); an error of VaR enters in second order only (Rockafellar &amp; Uryasev 2002). */
    double tailValueAtRisk(double level) {
        double quantile = valueAtRisk(level);
        double mean = expectedLoss();
        if (Double.isInfinite(mean) || Double.isInfinite(quantile)) {
            return Double.POSITIVE_INFINITY;
        }
        double below = sum.limited(terms.deductible() + quantile) - sum.limited(terms.deductible());
        return quantile + Math.max(0, mean - below) / (1 - level);
    }

    /** Figures that are extrapolated from lattice to lattice, in the order in which {@link LayerAnswer} reads them. */
    double[] means(Loading loading, double tailLevel) {
        return new double[] {expectedLoss(), standardDeviation(), reinstatementFactor(), distorted(loading),
            loading instanceof Loading.CostOfCapital capital ? tailValueAtRisk(capital.level()) : Double.NaN, tailValueAtRisk(tailLevel)};
    }

    /** Figures read at a point of the law: attachment, exhaustion, and the values at risk. */
    double[] points(List<Double> levels) {
        double[] row = new double[2 + levels.size()];
        row[0] = attachment();
        row[1] = exhaustion();
        for (int k = 0; k < levels.size(); k++) {
            row[2 + k] = valueAtRisk(levels.get(k));
        }
        return row;
    }
}
