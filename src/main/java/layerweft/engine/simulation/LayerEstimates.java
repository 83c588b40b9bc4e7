package layerweft.engine.simulation;

import java.util.SortedMap;
import java.util.TreeMap;
import java.util.function.DoubleUnaryOperator;
import layerweft.figures.Engine;
import layerweft.figures.Figure;
import layerweft.figures.LayerStatistics;
import layerweft.figures.PremiumBuildUp;
import layerweft.model.treaty.Buyer;
import layerweft.model.treaty.Layer;
import layerweft.model.treaty.LayerTerms;
import layerweft.model.treaty.Loading;
import layerweft.model.treaty.Pricing;

/**
 * From the sums and the laws of a simulation to a layer's figures with standard errors.
 *
 * <p>Every figure is a smooth functional of the law of A, so its standard error is that of the mean of its influence function
 * (Hampel 1974). Where E[A] is known, the expected loss and the reinstatement factor are corrected by it as control variate:
 * θ − β·(Ā − E[A]), β = Cov(θ's influence, A)/Var(A), and their errors, and that of the premium made of them, are those of the residuals.
 */
final class LayerEstimates {
    private final LayerTerms terms;
    private final Pricing pricing;
    private final Buyer buyer;
    private final OccurrenceMoments known;
    private final LayerSums sums;
    private final AmountLaw sumLaw;
    private final AmountLaw lossLaw;
    private final AmountLaw largestLaw;
    private final boolean timed;

    LayerEstimates(Layer layer, Pricing pricing, Buyer buyer, OccurrenceMoments known, LayerSums sums, AmountLaw sumLaw, AmountLaw largestLaw) {
        this.terms = layer.terms();
        this.pricing = pricing;
        this.buyer = buyer;
        this.known = known;
        this.sums = sums;
        this.sumLaw = sumLaw;
        this.lossLaw = sumLaw.map(terms::annualLoss);
        this.largestLaw = largestLaw;
        this.timed = layer.proRataTime();
    }

    LayerStatistics statistics() {
        double n = sums.years;
        double mean = sums.y / n;
        double variance = Math.max(0, sums.yy / n - mean * mean);
        double sd = Math.sqrt(variance);
        boolean limited = terms.annualLimit() < Double.POSITIVE_INFINITY;
        boolean infiniteMean = !limited && known.mean() == Double.POSITIVE_INFINITY;
        boolean infiniteDeviation = !limited && !known.finiteVariance();

        double meanSlope = controlSlope(sums.ya / n - mean * sums.a / n);
        double factorMean = sums.r / n;
        double factorSlope = controlSlope(sums.ra / n - factorMean * sums.a / n);
        double off = controlled() ? sums.a / n - known.mean() : 0;
        Figure expected = infiniteMean ? Figure.INFINITE
                : new Figure(mean - meanSlope * off, error(residual(variance, meanSlope, sums.ya / n - mean * sums.a / n)) + unseen(meanSlope, 1));
        double factorVariance = Math.max(0, sums.rr / n - factorMean * factorMean);
        Figure factor = new Figure(Math.max(0, factorMean - factorSlope * off),
                error(residual(factorVariance, factorSlope, sums.ra / n - factorMean * sums.a / n)) + unseen(factorSlope, factorPerFullLoss()));
        Figure deviation = infiniteDeviation ? Figure.INFINITE
                : new Figure(sd, sd == 0 ? 0 : error(variance(y -> (y - mean) * (y - mean)) / (4 * variance)));

        SortedMap<Double, Figure> atRisk = quantiles(lossLaw);
        Figure tail = infiniteMean ? Figure.INFINITE : tailMean(buyer.tailLevel());
        PremiumParts premium = premium(expected, deviation, factor, meanSlope, factorSlope);
        return new LayerStatistics(Engine.SIMULATION, expected, null, deviation,
                probability(sums.attached), limited ? probability(sums.exhausted) : Figure.exact(0), events(), factor, premium.net, premium.upfront, atRisk, tail,
                quantiles(largestLaw));
    }

    private boolean controlled() {
        return known.controls();
    }

    /** Standard error of a mean whose summands have this variance. */
    private double error(double variance) {
        return Math.sqrt(Math.max(0, variance) / sums.years);
    }

    private double variance(DoubleUnaryOperator influence) {
        double m = lossLaw.mean(influence);
        return lossLaw.mean(y -> {
            double d = influence.applyAsDouble(y) - m;
            return d * d;
        });
    }

    /** One event that takes the whole line. */
    private double fullLoss() {
        return Math.min(terms.line(), terms.annualLimit());
    }

    private double factorPerFullLoss() {
        return terms.hasPaidReinstatements() ? terms.reinstatementFactor(fullLoss()) / fullLoss() : 0;
    }

    private double varianceOfSum() {
        double m = sums.a / sums.years;
        return sums.aa / sums.years - m * m;
    }

    private double controlSlope(double covariance) {
        return controlled() && varianceOfSum() > 0 ? covariance / varianceOfSum() : 0;
    }

    private double residual(double variance, double slope, double covariance) {
        return variance - slope * covariance;
    }

    private Figure probability(long count) {
        double p = (double) count / sums.years;
        return new Figure(p, error(Math.max(p * (1 - p), 1.0 / sums.years)));
    }

    /**
     * What a sample cannot show. Without a control variate: of a layer that no year hit, one full loss in all years is within the error. With
     * one: years beyond the annual limit are rare, and in a sample without any Y and A go together as if there were no limit; one such
     * year, by a further full limit, is within the error.
     *
     * @param slope of the figure on the control variate
     * @param perLoss what the figure gains from a unit of layer loss in one year
     */
    private double unseen(double slope, double perLoss) {
        if (!controlled()) {
            return sums.attached > 0 || perLoss == 0 ? 0 : Math.abs(perLoss) * fullLoss() / sums.years;
        }
        if (slope == 0 || !terms.hasAnnualTerms()) {
            return 0;
        }
        double largest = sumLaw.cells() == 0 ? 0 : sumLaw.point(sumLaw.cells() - 1);
        return Math.abs(slope) * Math.min(terms.occurrenceLimit(), largest) / sums.years;
    }

    private Figure events() {
        if (!Double.isNaN(known.events())) {
            return Figure.exact(known.events());
        }
        double m = sums.hits / sums.years;
        return new Figure(m, error(sums.hitsSquared / sums.years - m * m));
    }

    private SortedMap<Double, Figure> quantiles(AmountLaw law) {
        SortedMap<Double, Figure> quantiles = new TreeMap<>();
        for (double level : buyer.levels()) {
            quantiles.put(level, new Figure(law.quantile(level), law.quantileError(level)));
        }
        return quantiles;
    }

    private Figure tailMean(double level) {
        double q = lossLaw.quantile(level);
        return new Figure(lossLaw.tailMean(level), error(variance(y -> Math.max(y - q, 0))) / (1 - level));
    }

    private record PremiumParts(Figure net, Figure upfront) {}

    private PremiumParts premium(Figure expected, Figure deviation, Figure factor, double meanSlope, double factorSlope) {
        Loading loading = pricing.loading();
        Distortion distortion = Distortion.of(loading);
        double distorted = distortion == null ? Double.NaN : distortion.mean(lossLaw);
        double level = loading instanceof Loading.CostOfCapital c ? c.level() : Double.NaN;
        double tail = Double.isNaN(level) ? Double.NaN : lossLaw.tailMean(level);
        PremiumBuildUp build = PremiumBuildUp.of(pricing, new PremiumBuildUp.Inputs(expected.value(), deviation.value(), tail, distorted,
                factor.value()));
        PremiumBuildUp.Slopes s = build.slopes();
        double[] distortedInfluence = distortion == null ? null : distortion.influence(lossLaw);
        double q = Double.isNaN(level) ? Double.NaN : lossLaw.quantile(level);
        double m = sums.y / sums.years;

        // influence of the net and of the upfront premium on each cell of the law of A
        double[] net = new double[lossLaw.cells()];
        double[] upfront = new double[net.length];
        for (int k = 0; k < net.length; k++) {
            double y = lossLaw.point(k);
            double part = s.byExpectedLoss() * y;
            if (s.byStandardDeviation() != 0 && deviation.value() > 0) {
                part += s.byStandardDeviation() * (y - m) * (y - m) / (2 * deviation.value());
            }
            if (s.byTail() != 0) {
                part += s.byTail() * Math.max(y - q, 0) / (1 - level);
            }
            if (s.byDistorted() != 0) {
                part += s.byDistorted() * distortedInfluence[k];
            }
            net[k] = part * build.divisor();
            upfront[k] = part + (timed ? 0 : s.byReinstatementFactor() * terms.reinstatementFactor(y));
        }
        double control = s.byExpectedLoss() * meanSlope;
        double netError = error(residualVariance(net, control * build.divisor())) + unseen(control * build.divisor(), s.byExpectedLoss() * build.divisor());
        // pro rata as to time the factor is no function of A: its error is added in full, which is never too little
        double upfrontError = timed
                ? error(residualVariance(upfront, control)) + Math.abs(s.byReinstatementFactor()) * factor.error()
                : error(residualVariance(upfront, control + s.byReinstatementFactor() * factorSlope)) + unseen(control, s.byExpectedLoss());
        return new PremiumParts(new Figure(build.net(), netError), new Figure(build.upfront(), upfrontError));
    }

    /** Variance of influence − slope·A over the law of A. */
    private double residualVariance(double[] influence, double slope) {
        double mean = 0;
        double square = 0;
        for (int k = 0; k < influence.length; k++) {
            double v = influence[k] - (slope == 0 ? 0 : slope * sumLaw.point(k));
            double w = sumLaw.weight(k);
            mean += w * v;
            square += w * v * v;
        }
        return Math.max(0, square - mean * mean);
    }
}
