package layerweft.model.severity;

import java.util.function.DoubleSupplier;
import layerweft.model.Check;
import layerweft.model.random.KeyedStream;
import org.apache.commons.rng.sampling.distribution.ZigguratSampler;

/**
 * Generalized Pareto law above a threshold u (Pickands 1975): P(X &gt; x) = (1 + ξ(x − u)/σ)^(−1/ξ), exponential at ξ = 0, with the finite end
 * u − σ/ξ for ξ &lt; 0. With y = ln(1 + ξ(x − u)/σ)/ξ the survival is e^(−y), and every moment an integral of exponentials in y, of the
 * same form for each sign of ξ. The mean is infinite for ξ ≥ 1, the variance for ξ ≥ 1/2.
 *
 * @param threshold u, the smallest loss, at least 0
 * @param scale σ, above 0
 * @param shape ξ, of either sign
 */
public record GeneralizedPareto(double threshold, double scale, double shape) implements SeverityModel {
    /** Nearer to 0 the quotient (g(2ξ) − g(ξ))/ξ in the second moment loses more digits than its derivative form. */
    private static final double NEARLY_EXPONENTIAL = 1e-5;
    /** y below which that quotient, of the order of y² from terms of the order of y, gives way to quadrature. */
    private static final double FEW_DIGITS = 1e-3;

    public GeneralizedPareto {
        new Check().notNegative("threshold", threshold).positive("scale", scale).finite("shape", shape).orThrow();
    }

    @Override
    public double cdf(double x) {
        return x <= threshold ? 0 : -Math.expm1(-exponent(x));
    }

    @Override
    public double survival(double x) {
        return x <= threshold ? 1 : Math.exp(-exponent(x));
    }

    @Override
    public double atom(double x) {
        return 0;
    }

    @Override
    public double quantile(double p) {
        Probability.check(p);
        return at(-Math.log1p(-p));
    }

    @Override
    public double survivalQuantile(double q) {
        Probability.check(q);
        return at(-Math.log(q));
    }

    @Override
    public double mean() {
        return limitedMean(Double.POSITIVE_INFINITY);
    }

    /** u + σ·∫_0^y e^(−(1−ξ)v) dv. */
    @Override
    public double limitedMean(double x) {
        return x <= threshold ? Math.max(x, 0) : threshold + scale * ExponentialIntegral.of(1 - shape, exponent(x));
    }

    /** u² + 2u·σ·∫e^(−(1−ξ)v) dv + 2σ²·∫(e^(ξv) − 1)/ξ·e^(−(1−ξ)v) dv, over v from 0 to y. */
    @Override
    public double limitedSecondMoment(double x) {
        if (x <= threshold) {
            return Math.max(x, 0) * Math.max(x, 0);
        }
        double y = exponent(x);
        if (y < FEW_DIGITS) {
            return threshold * threshold + LogQuadrature.integral(u -> 2 * u * survival(u), threshold, x, 1);
        }
        double first = ExponentialIntegral.of(1 - shape, y);
        double second = Math.abs(shape) < NEARLY_EXPONENTIAL
                ? ExponentialIntegral.first(1 - 1.5 * shape, y)
                : (ExponentialIntegral.of(1 - 2 * shape, y) - first) / shape;
        if (first == Double.POSITIVE_INFINITY) {
            return Double.POSITIVE_INFINITY;
        }
        return threshold * threshold + 2 * threshold * scale * first + 2 * scale * scale * second;
    }

    @Override
    public double layerMean(double from, double to) {
        if (to <= threshold) {
            return to - from;
        }
        double start = Math.max(from, threshold);
        if (start >= upperEnd()) {
            return 0;
        }
        // above any start the law is of the same kind, with this scale
        double scaleThere = scale + shape * (start - threshold);
        double y = excessExponent(Math.min(to, upperEnd()) - start, scaleThere);
        return start - Math.max(from, 0) + survival(start) * scaleThere * ExponentialIntegral.of(1 - shape, y);
    }

    @Override
    public double upperEnd() {
        return shape < 0 ? threshold - scale / shape : Double.POSITIVE_INFINITY;
    }

    @Override
    public SeveritySampler sampler() {
        return new Sampler(threshold, scale, shape);
    }

    /** y of an amount above the threshold, infinite from the end of the support on. */
    private double exponent(double x) {
        return x >= upperEnd() ? Double.POSITIVE_INFINITY : excessExponent(x - threshold, scale);
    }

    private double excessExponent(double excess, double scaleThere) {
        double z = excess / scaleThere;
        return shape == 0 ? z : shape * z <= -1 ? Double.POSITIVE_INFINITY : Math.log1p(shape * z) / shape;
    }

    private double at(double y) {
        if (y == Double.POSITIVE_INFINITY) {
            return upperEnd();
        }
        return threshold + scale * (shape == 0 ? y : Math.expm1(shape * y) / shape);
    }

    private record Sampler(double threshold, double scale, double shape) implements SeveritySampler {
        /** From here on exp(ξy) − 1 has at least 12 digits, and exp is several times faster than expm1. */
        private static final double PLAIN_EXPONENTIAL = 1e-4;

        @Override
        public DoubleSupplier bind(KeyedStream stream) {
            ZigguratSampler.Exponential exponential = ZigguratSampler.Exponential.of(stream);
            return () -> loss(exponential.sample());
        }

        @Override
        public int fill(KeyedStream stream, long firstSlot, int[] counts, int years, double[] out) {
            int n = StandardVariates.exponentials(stream, firstSlot, counts, years, out);
            for (int k = 0; k < n; k++) {
                out[k] = loss(out[k]);
            }
            return n;
        }

        private double loss(double y) {
            if (Math.abs(shape) >= PLAIN_EXPONENTIAL) {
                return threshold + scale / shape * (Math.exp(shape * y) - 1);
            }
            return threshold + scale * (shape == 0 ? y : Math.expm1(shape * y) / shape);
        }
    }
}
