package layerweft.file;

import java.util.List;
import java.util.Map;
import java.util.function.DoubleUnaryOperator;
import layerweft.model.severity.Beta;
import layerweft.model.severity.Burr;
import layerweft.model.severity.DiscreteLosses;
import layerweft.model.severity.Exponential;
import layerweft.model.severity.Gamma;
import layerweft.model.severity.GeneralizedPareto;
import layerweft.model.severity.InverseGaussian;
import layerweft.model.severity.Loglogistic;
import layerweft.model.severity.Lognormal;
import layerweft.model.severity.Mbbefd;
import layerweft.model.severity.Pareto;
import layerweft.model.severity.SeverityModel;
import layerweft.model.severity.Weibull;
import org.apache.commons.math3.analysis.solvers.BrentSolver;

/**
 * A kind of losses seen as a family with one shape and a scale that every loss is proportional to, for finding its member with given figures.
 *
 * @param make of shape and scale
 * @param usual a shape with a heavy tail, where nothing says which
 * @param low the least shape that is tried for a coefficient of variation, which is monotone from there
 * @param high to the largest
 */
record Scaled(Maker make, double usual, double low, double high) {
    private static final double WIDE = 1e12;
    private static final Map<String, Scaled> KINDS = Map.ofEntries(
            Map.entry("lognormal", plain((s, k) -> new Lognormal(Math.log(k), s), 1.8)),
            Map.entry("pareto", plain((s, k) -> new Pareto(k, s), 1.5)),
            Map.entry("generalizedPareto", plain((s, k) -> new GeneralizedPareto(0, k, s), 0.6)),
            Map.entry("gamma", plain(Gamma::new, 0.2)),
            Map.entry("weibull", new Scaled(Weibull::new, 0.4, 0.1, 200)),
            Map.entry("burr", new Scaled((s, k) -> new Burr(2, s, k), 0.8, 1.000001, 500)),
            Map.entry("loglogistic", new Scaled(Loglogistic::new, 1.5, 2.000001, 1000)),
            Map.entry("exponential", plain((s, k) -> new Exponential(k), 1)),
            Map.entry("inverseGaussian", plain((s, k) -> new InverseGaussian(k, k * s), 0.05)),
            Map.entry("beta", plain((s, k) -> new Beta(s, 4 * s, k), 0.3)),
            Map.entry("mbbefd", new Scaled(Mbbefd::ofC, 3, 1e-3, 12)),
            Map.entry("discrete", plain((s, k) -> DiscreteLosses.ofEquallyLikely(List.of(k)), 1)),
            Map.entry("empirical", plain((s, k) -> DiscreteLosses.ofEquallyLikely(List.of(k)), 1)));

    /** A law of shape and scale. */
    @FunctionalInterface
    interface Maker {
        SeverityModel of(double shape, double scale);
    }

    /** A kind whose coefficient of variation is solved for in closed form elsewhere. */
    private static Scaled plain(Maker make, double usual) {
        return new Scaled(make, usual, usual, usual);
    }

    static Scaled of(String kind) {
        return KINDS.get(kind);
    }

    /** Null where no shape has that coefficient of variation. */
    SeverityModel ofMeanAndCv(double mean, double cv) {
        DoubleUnaryOperator miss = shape -> closeness(make.of(shape, 1)) - 1 / (1 + cv);
        double atLow = miss.applyAsDouble(low);
        double atHigh = miss.applyAsDouble(high);
        if (!(atLow * atHigh <= 0)) {
            return null;
        }
        double shape = Math.exp(root(x -> miss.applyAsDouble(Math.exp(x)), Math.log(low), Math.log(high)));
        return make.of(shape, mean / make.of(shape, 1).mean());
    }

    /** 1/(1 + cv), which is finite for any. */
    private static double closeness(SeverityModel model) {
        return 1 / (1 + SeverityMatch.deviation(model) / model.mean());
    }

    SeverityModel ofMean(double mean) {
        return make.of(usual, mean / make.of(usual, 1).mean());
    }

    SeverityModel ofMedian(double median) {
        return make.of(usual, median / make.of(usual, 1).quantile(0.5));
    }

    /** With the mean that the losses have once they are capped. */
    SeverityModel ofCappedMean(double mean, double cap) {
        DoubleUnaryOperator miss = scale -> make.of(usual, Math.exp(scale)).limitedMean(cap) - mean;
        double high = Math.log(cap * WIDE);
        // so many losses at the cap that no scale brings more to it
        return miss.applyAsDouble(high) <= 0 ? ofMedian(cap) : make.of(usual, Math.exp(root(miss, Math.log(mean / WIDE), high)));
    }

    private static double root(DoubleUnaryOperator function, double low, double high) {
        return new BrentSolver(1e-15, 1e-14, 1e-16).solve(1000, function::applyAsDouble, low, high);
    }
}
