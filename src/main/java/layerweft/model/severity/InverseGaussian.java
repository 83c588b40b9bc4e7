package layerweft.model.severity;

import java.util.function.DoubleSupplier;
import layerweft.model.Check;
import layerweft.model.random.KeyedStream;
import org.apache.commons.numbers.gamma.Erfc;
import org.apache.commons.numbers.gamma.Erfcx;
import org.apache.commons.rng.sampling.distribution.ZigguratSampler;

/**
 * Inverse Gaussian law with mean μ and shape λ, variance μ³/λ. With z = √(λ/x)·(x/μ − 1) and w = √(λ/x)·(x/μ + 1),
 * P(X ≤ x) = Φ(z) + e^(2λ/μ)·Φ(−w); the second term equals φ-like e^(−z²/2)·erfcx(w/√2)/2, which neither overflows nor cancels.
 *
 * @param mean μ, above 0
 * @param shape λ, above 0, in the portfolio's unit
 */
public record InverseGaussian(double mean, double shape) implements SeverityModel {
    private static final double ROOT_HALF = Math.sqrt(0.5);
    /** Part of a moment under which its closed form, a difference of terms as large as the moment, gives way to quadrature. */
    private static final double FEW_DIGITS = 1e-3;

    public InverseGaussian {
        new Check().positive("mean", mean).positive("shape", shape).orThrow();
    }

    @Override
    public double cdf(double x) {
        if (x <= 0) {
            return 0;
        }
        return x == Double.POSITIVE_INFINITY ? 1 : 0.5 * Erfc.value(-z(x) * ROOT_HALF) + mirror(x);
    }

    @Override
    public double survival(double x) {
        if (x <= 0) {
            return 1;
        }
        if (x == Double.POSITIVE_INFINITY) {
            return 0;
        }
        double z = z(x);
        return z <= 0 ? 1 - cdf(x) : Math.max(0, 0.5 * Math.exp(-0.5 * z * z) * (Erfcx.value(z * ROOT_HALF) - Erfcx.value(w(x) * ROOT_HALF)));
    }

    @Override
    public double atom(double x) {
        return 0;
    }

    @Override
    public double quantile(double p) {
        Probability.check(p);
        return p == 0 ? 0 : p > 0.5 ? survivalQuantile(1 - p) : Bisection.smallest(0, Double.POSITIVE_INFINITY, x -> cdf(x) >= p);
    }

    @Override
    public double survivalQuantile(double q) {
        Probability.check(q);
        return q == 0 ? Double.POSITIVE_INFINITY : q > 0.5 ? quantile(1 - q) : Bisection.smallest(0, Double.POSITIVE_INFINITY, x -> survival(x) <= q);
    }

    @Override
    public double limitedMean(double x) {
        if (x == Double.POSITIVE_INFINITY) {
            return mean;
        }
        if (x <= 0) {
            return 0;
        }
        double value = firstBelow(x) + x * survival(x);
        return value > FEW_DIGITS * mean ? value : LogQuadrature.integral(this::survival, 0, x, 1);
    }

    /** E[X²; X ≤ x] + x²·P(X &gt; x), the first by parts from the law's differential equation: μ²(F + E[X; X ≤ x]/λ) − 2μ²x²f(x)/λ. */
    @Override
    public double limitedSecondMoment(double x) {
        if (x == Double.POSITIVE_INFINITY) {
            return mean * mean * (1 + mean / shape);
        }
        if (x <= 0) {
            return 0;
        }
        double z = z(x);
        // x²·f(x)
        double atX = x * (Math.sqrt(shape / (2 * Math.PI * x)) * Math.exp(-0.5 * z * z));
        double below = mean * mean * (cdf(x) + firstBelow(x) / shape - 2 * atX / shape);
        double value = below + x * (x * survival(x));
        return value > FEW_DIGITS * mean * mean * Math.max(1, mean / shape) ? value
                : LogQuadrature.integral(u -> 2 * (u * survival(u)), 0, x, 1);
    }

    @Override
    public double layerMean(double from, double to) {
        double start = Math.max(from, 0);
        if (start < mean || to <= start) {
            return limitedMean(to) - limitedMean(start);
        }
        double end = to == Double.POSITIVE_INFINITY ? Math.max(2 * start, survivalQuantile(Double.MIN_NORMAL)) : to;
        return LogQuadrature.integral(this::survival, start, end, Math.min(1, Math.sqrt(mean / shape)));
    }

    @Override
    public double upperEnd() {
        return Double.POSITIVE_INFINITY;
    }

    /** Michael, Schucany &amp; Haas (1976), "Generating random variates using transformations with multiple roots". */
    @Override
    public SeveritySampler sampler() {
        return this::losses;
    }

    private DoubleSupplier losses(KeyedStream stream) {
        ZigguratSampler.NormalizedGaussian normal = ZigguratSampler.NormalizedGaussian.of(stream);
        return () -> {
            double n = normal.sample();
            double y = mean * n * n / shape;
            // the smaller root, written without the difference of near equals
            double x = 2 * mean / (2 + y + Math.sqrt(y * (4 + y)));
            return stream.nextDouble() * (mean + x) <= mean ? x : mean * mean / x;
        };
    }

    private double z(double x) {
        return Math.sqrt(shape / x) * (x / mean - 1);
    }

    private double w(double x) {
        return Math.sqrt(shape / x) * (x / mean + 1);
    }

    /** e^(2λ/μ)·Φ(−w). */
    private double mirror(double x) {
        double z = z(x);
        return 0.5 * Math.exp(-0.5 * z * z) * Erfcx.value(w(x) * ROOT_HALF);
    }

    /** E[X; X ≤ x] = μ·(Φ(z) − e^(2λ/μ)·Φ(−w)). */
    private double firstBelow(double x) {
        return mean * (0.5 * Erfc.value(-z(x) * ROOT_HALF) - mirror(x));
    }
}
