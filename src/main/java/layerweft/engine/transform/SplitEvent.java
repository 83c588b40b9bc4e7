package layerweft.engine.transform;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import layerweft.model.copula.Copula;
import layerweft.model.portfolio.EventLoss;
import layerweft.model.portfolio.SubPeril;
import layerweft.model.severity.SeverityModel;
import layerweft.model.treaty.LayerTerms;

/**
 * The occurrence loss of an event whose loss is the sum of covered sub-perils, each of which occurs with its own chance, their sizes
 * joined by a copula. The sum's law lives on lattices only, so that every figure carries a lattice error, of second order.
 */
final class SplitEvent implements EventLaw {
    private static final double JOINT_ERROR = 1e-9;
    private static final int REFERENCE_CELLS = 1024;
    private static final int MOST_CELLS = 1 << 15;
    private final List<SubPeril> parts;
    private final int[] members;
    private final Copula copula;
    private final int dimension;
    private final LayerTerms terms;
    private final double cap;
    private final Map<Double, double[]> sums = new HashMap<>();
    private final double hit;
    private final double full;
    private double chanceError;

    private SplitEvent(EventLoss.Split loss, int[] members, LayerTerms terms, double cap) {
        this.parts = loss.subPerils();
        this.copula = loss.copula();
        this.dimension = parts.size();
        this.members = members;
        this.terms = terms;
        this.cap = cap;
        double start = start();
        this.hit = start > 0 ? extrapolated(start) : positive();
        this.full = extrapolated(terms.hasFranchise() ? Math.max(cap, terms.franchise()) : start + cap);
    }

    /** A single covered sub-peril is an event with one loss that occurs with its chance; more are a sum. */
    static EventLaw of(EventLoss.Split loss, boolean[] covered, LayerTerms terms, double cap) {
        List<Integer> members = new ArrayList<>();
        for (int k = 0; k < covered.length; k++) {
            if (covered[k]) {
                members.add(k);
            }
        }
        if (members.size() == 1) {
            SubPeril only = loss.subPerils().get(members.get(0));
            return new ThinnedEvent(new SingleEvent(only.severity(), terms, cap), only.chance());
        }
        return new SplitEvent(loss, members.stream().mapToInt(Integer::intValue).toArray(), terms, cap);
    }

    private double start() {
        return terms.hasFranchise() ? terms.franchise() : terms.retention();
    }

    /** P(s &gt; 0) where nothing is retained. */
    private double positive() {
        double none = 0;
        for (int subset = 0; subset < 1 << members.length; subset++) {
            double[] u = new double[dimension];
            java.util.Arrays.fill(u, 1);
            boolean certain = true;
            for (int m = 0; m < members.length; m++) {
                if ((subset >> m & 1) == 1) {
                    u[members[m]] = parts.get(members[m]).severity().cdf(0);
                    certain &= u[members[m]] == 1;
                }
            }
            boolean impossible = java.util.Arrays.stream(u).anyMatch(p -> p == 0);
            none += chance(subset) * (impossible ? 0 : certain ? 1 : copula.cdf(u));
        }
        return 1 - none;
    }

    private double chance(int subset) {
        double p = 1;
        for (int m = 0; m < members.length; m++) {
            double own = parts.get(members[m]).chance();
            p *= (subset >> m & 1) == 1 ? own : 1 - own;
        }
        return p;
    }

    /** P(s &gt; amount) from lattices that hold it, extrapolated. */
    private double extrapolated(double amount) {
        int cells = REFERENCE_CELLS;
        double coarse = at(sum(amount / cells, cells + 3), cells);
        double fine = at(sum(amount / (2 * cells), 2 * cells + 3), 2 * cells);
        chanceError = Math.max(chanceError, Math.abs(fine - coarse) / 3 + JOINT_ERROR);
        return Math.max(0, Math.min(1, (4 * fine - coarse) / 3));
    }

    /** Survival function at point k from the averages over four cells around it. */
    private static double at(double[] mean, int k) {
        return (7 * (mean[k - 1] + mean[k]) - mean[k - 2] - mean[k + 1]) / 12;
    }

    /** Averages of P(s &gt; y) over cells of s = q Σ X. */
    private double[] sum(double step, int cells) {
        return sums.compute(step, (h, known) -> known != null && known.length >= cells ? known : mixed(m -> averages(severity(m), h, cells), cells));
    }

    private SeverityModel severity(int m) {
        return parts.get(members[m]).severity();
    }

    private double[] averages(SeverityModel severity, double step, int cells) {
        double q = terms.quotaShare();
        double[] mean = new double[cells];
        for (int k = 0; k < cells; k++) {
            double right = severity.survival((k + 1) * step / q);
            double left = severity.survival(k * step / q);
            mean[k] = left <= right ? left : Math.min(left, Math.max(right, severity.layerMean(k * step / q, (k + 1) * step / q) * q / step));
        }
        return mean;
    }

    private interface PartLaw {
        double[] survival(int m);
    }

    /** The sum over all sets of sub-perils that may occur together. */
    private double[] mixed(PartLaw law, int cells) {
        double[][] laws = new double[members.length][];
        for (int m = 0; m < laws.length; m++) {
            laws[m] = law.survival(m);
        }
        double[] sum = new double[cells];
        for (int subset = 1; subset < 1 << members.length; subset++) {
            double chance = chance(subset);
            if (chance == 0) {
                continue;
            }
            int size = Integer.bitCount(subset);
            int[] positions = new int[size];
            CountMargin[] margins = new CountMargin[size];
            for (int m = 0, j = 0; m < members.length; m++) {
                if ((subset >> m & 1) == 1) {
                    positions[j] = members[m];
                    double[] survival = laws[m];
                    margins[j++] = new CountMargin(java.util.Arrays.stream(survival).map(s -> 1 - s).toArray(), survival);
                }
            }
            double[] part = DependentSum.survival(copula, positions, margins, JOINT_ERROR);
            for (int k = 0; k < cells; k++) {
                sum[k] += chance * part[k];
            }
        }
        return sum;
    }

    @Override
    public double cap() {
        return cap;
    }

    @Override
    public double hitChance() {
        return hit;
    }

    @Override
    public double fullChance() {
        return full;
    }

    @Override
    public double chanceError() {
        return chanceError;
    }

    @Override
    public double mean() {
        double limit = terms.occurrenceLimit();
        double step = Math.min(limit, cap) / REFERENCE_CELLS;
        double within = mean(cellSurvival(step, REFERENCE_CELLS), step);
        double finer = mean(cellSurvival(step / 2, 2 * REFERENCE_CELLS), step / 2);
        double capped = (4 * finer - within) / 3;
        if (limit < Double.POSITIVE_INFINITY) {
            return capped;
        }
        double all = 0;
        for (int m : members) {
            all += parts.get(m).chance() * terms.quotaShare() * parts.get(m).severity().mean();
        }
        // what lies below the retention is the only part that needs the joint law
        double start = start();
        return start == 0 ? all : terms.hasFranchise() ? Math.max(capped, all - start) : all - start + integralAbove(start);
    }

    /** ∫_0^start P(s ≤ y) dy, so that E[s] − start + this is E[(s − start)+]. */
    private double integralAbove(double start) {
        double[] mean = sum(start / REFERENCE_CELLS, REFERENCE_CELLS + 3);
        double below = 0;
        for (int k = 0; k < REFERENCE_CELLS; k++) {
            below += (1 - mean[k]) * start / REFERENCE_CELLS;
        }
        return below;
    }

    private static double mean(double[] survival, double step) {
        return java.util.Arrays.stream(survival).sum() * step;
    }

    /** Up to the cap; what lies beyond a cap that stands for no limit is left out. */
    @Override
    public double secondMoment() {
        for (int m : members) {
            if (Double.isInfinite(terms.occurrenceLimit()) && Double.isInfinite(parts.get(m).severity().limitedSecondMoment(Double.POSITIVE_INFINITY))) {
                return Double.POSITIVE_INFINITY;
            }
        }
        double step = Math.min(terms.occurrenceLimit(), cap) / REFERENCE_CELLS;
        return (4 * square(step / 2, 2 * REFERENCE_CELLS) - square(step, REFERENCE_CELLS)) / 3;
    }

    private double square(double step, int cells) {
        double[] survival = cellSurvival(step, cells);
        double sum = 0;
        for (int k = 0; k < cells; k++) {
            sum += (2 * k + 1) * step * step * survival[k];
        }
        return sum;
    }

    @Override
    public double survival(double x) {
        double y = terms.hasFranchise() ? Math.max(x, terms.franchise()) : x + terms.retention();
        double top = start() + cap;
        double step = top / (2 * REFERENCE_CELLS);
        double[] mean = sum(step, 2 * REFERENCE_CELLS + 3);
        double cell = y / step - 0.5;
        int k = (int) Math.max(0, Math.min(mean.length - 2, Math.floor(cell)));
        double s = Math.min(1, Math.max(0, cell - k));
        return Math.min(hit, mean[k] + (mean[k + 1] - mean[k]) * s);
    }

    @Override
    public double[] cellSurvival(double step, int cells) {
        double start = terms.hasFranchise() ? 0 : terms.retention();
        int shift = (int) Math.floor(start / step + 1e-7);
        double part = Math.max(0, start / step - shift);
        part = part < 1e-7 ? 0 : part;
        double[] sum = sum(step, Math.min(MOST_CELLS, shift + cells + 3));
        double[] mean = new double[cells];
        for (int k = 0; k < cells; k++) {
            mean[k] = (1 - part) * sum[shift + k] + part * sum[shift + k + 1];
            if (terms.hasFranchise()) {
                double below = Math.min(1, Math.max(0, terms.franchise() / step - k));
                mean[k] = below * hit + (1 - below) * mean[k];
            }
            mean[k] = Math.min(hit, mean[k]);
        }
        return mean;
    }

    @Override
    public double[] lowerSurvival(double step, int cells) {
        return roundedSurvival(step, cells)[0];
    }

    @Override
    public double[][] roundedSurvival(double step, int cells) {
        double q = terms.quotaShare();
        double start = start();
        int shift = (int) Math.floor(start / step + 1e-7);
        int reach = shift + cells + 3;
        double[] down = mixed(m -> rounded(severity(m), step / q, reach, 1), reach);
        double[] up = mixed(m -> rounded(severity(m), step / q, reach, 0), reach);
        boolean even = LatticeStep.holds(start, step);
        double[][] out = new double[2][cells];
        for (int k = 0; k < cells; k++) {
            if (terms.hasFranchise()) {
                // o ≥ (k+1)h where s ≥ (k+1)h and s > F; o > kh where s > kh and s > F
                out[0][k] = down[Math.max(k, even ? shift : shift + 1)];
                out[1][k] = up[Math.max(k, shift)];
            } else {
                out[0][k] = down[even ? shift + k : shift + k + 1];
                out[1][k] = up[shift + k];
            }
        }
        return out;
    }

    /** P(X ≥ (k+1)h) with offset 1, P(X &gt; kh) with offset 0. */
    private static double[] rounded(SeverityModel severity, double step, int cells, int offset) {
        double[] survival = new double[cells];
        for (int k = 0; k < cells; k++) {
            double x = (k + offset) * step;
            survival[k] = severity.survival(x * (offset == 1 ? 1 - 1e-13 : 1 + 1e-13));
        }
        return survival;
    }

    @Override
    public double[] atoms(double step, int cells) {
        return null;
    }

    @Override
    public double[] landmarks() {
        return terms.retention() > 0 ? new double[] {terms.retention()} : new double[0];
    }
}
