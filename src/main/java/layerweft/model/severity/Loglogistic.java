package layerweft.model.severity;

import layerweft.model.Check;

/**
 * Loglogistic law: P(X &gt; x) = 1/(1 + (x/scale)^shape), a Burr law with α = 1. The mean is infinite for shape ≤ 1.
 *
 * @param shape γ, above 0
 * @param scale θ, the median, above 0, in the portfolio's unit
 */
public record Loglogistic(double shape, double scale) implements SeverityModel {

    public Loglogistic {
        new Check().positive("shape", shape).positive("scale", scale).orThrow();
    }

    private Burr burr() {
        return new Burr(1, shape, scale);
    }

    @Override
    public double cdf(double x) {
        return burr().cdf(x);
    }

    @Override
    public double survival(double x) {
        return burr().survival(x);
    }

    @Override
    public double atom(double x) {
        return 0;
    }

    @Override
    public double quantile(double p) {
        return burr().quantile(p);
    }

    @Override
    public double survivalQuantile(double q) {
        return burr().survivalQuantile(q);
    }

    @Override
    public double mean() {
        return burr().mean();
    }

    @Override
    public double limitedMean(double x) {
        return burr().limitedMean(x);
    }

    @Override
    public double limitedSecondMoment(double x) {
        return burr().limitedSecondMoment(x);
    }

    @Override
    public double layerMean(double from, double to) {
        return burr().layerMean(from, to);
    }

    @Override
    public double upperEnd() {
        return Double.POSITIVE_INFINITY;
    }

    @Override
    public SeveritySampler sampler() {
        return burr().sampler();
    }
}
