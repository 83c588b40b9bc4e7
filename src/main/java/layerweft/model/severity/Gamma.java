package layerweft.model.severity;

import layerweft.model.Check;
import org.apache.commons.numbers.gamma.RegularizedGamma;
import org.apache.commons.rng.sampling.distribution.AhrensDieterMarsagliaTsangGammaSampler;
import org.apache.commons.statistics.distribution.GammaDistribution;

/**
 * Gamma law with mean shape·scale. Limited moments as in Klugman, Panjer &amp; Willmot, "Loss Models", appendix A.
 *
 * @param shape k, above 0
 * @param scale θ, above 0, in the portfolio's unit
 */
public record Gamma(double shape, double scale) implements SeverityModel {

    public Gamma {
        new Check().positive("shape", shape).positive("scale", scale).orThrow();
    }

    /**
     * @param mean E[X], above 0
     * @param cv coefficient of variation σ(X)/E[X], above 0
     */
    public static Gamma ofMeanAndCv(double mean, double cv) {
        new Check().positive("mean", mean).positive("cv", cv).orThrow();
        return new Gamma(1 / (cv * cv), mean * cv * cv);
    }

    @Override
    public double cdf(double x) {
        return x <= 0 ? 0 : x == Double.POSITIVE_INFINITY ? 1 : RegularizedGamma.P.value(shape, x / scale);
    }

    @Override
    public double survival(double x) {
        return x <= 0 ? 1 : x == Double.POSITIVE_INFINITY ? 0 : RegularizedGamma.Q.value(shape, x / scale);
    }

    @Override
    public double atom(double x) {
        return 0;
    }

    @Override
    public double quantile(double p) {
        return GammaDistribution.of(shape, scale).inverseCumulativeProbability(p);
    }

    @Override
    public double survivalQuantile(double q) {
        return GammaDistribution.of(shape, scale).inverseSurvivalProbability(q);
    }

    @Override
    public double mean() {
        return shape * scale;
    }

    /** kθ·P(k+1, x/θ) + x·P(X &gt; x). */
    @Override
    public double limitedMean(double x) {
        if (x == Double.POSITIVE_INFINITY) {
            return mean();
        }
        return x <= 0 ? 0 : mean() * RegularizedGamma.P.value(shape + 1, x / scale) + x * survival(x);
    }

    @Override
    public double limitedSecondMoment(double x) {
        double second = shape * (shape + 1) * scale * scale;
        if (x == Double.POSITIVE_INFINITY) {
            return second;
        }
        return x <= 0 ? 0 : second * RegularizedGamma.P.value(shape + 2, x / scale) + x * (x * survival(x));
    }

    @Override
    public double layerMean(double from, double to) {
        return from < mean() ? limitedMean(to) - limitedMean(from) : stopLoss(from) - stopLoss(to);
    }

    private double stopLoss(double d) {
        return d == Double.POSITIVE_INFINITY ? 0 : mean() * RegularizedGamma.Q.value(shape + 1, d / scale) - d * survival(d);
    }

    @Override
    public double upperEnd() {
        return Double.POSITIVE_INFINITY;
    }

    @Override
    public SeveritySampler sampler() {
        return stream -> AhrensDieterMarsagliaTsangGammaSampler.of(stream, shape, scale)::sample;
    }
}
