package layerweft.model.severity;

import java.util.function.DoubleSupplier;
import layerweft.model.Check;
import layerweft.model.random.KeyedStream;
import org.apache.commons.rng.sampling.distribution.ZigguratSampler;

/**
 * Pareto law above a threshold: P(X &gt; x) = (threshold/x)^α for x ≥ threshold. The mean is infinite for α ≤ 1, the variance for α ≤ 2.
 *
 * @param threshold smallest loss, above 0
 * @param alpha α, above 0
 */
public record Pareto(double threshold, double alpha) implements SeverityModel {

    public Pareto {
        new Check().positive("threshold", threshold).positive("alpha", alpha).orThrow();
    }

    @Override
    public double cdf(double x) {
        return x <= threshold ? 0 : -Math.expm1(-alpha * Math.log(x / threshold));
    }

    @Override
    public double survival(double x) {
        return x <= threshold ? 1 : Math.pow(threshold / x, alpha);
    }

    @Override
    public double atom(double x) {
        return 0;
    }

    @Override
    public double quantile(double p) {
        Probability.check(p);
        return threshold * Math.exp(-Math.log1p(-p) / alpha);
    }

    @Override
    public double survivalQuantile(double q) {
        Probability.check(q);
        return threshold * Math.pow(q, -1 / alpha);
    }

    @Override
    public double mean() {
        return limitedMean(Double.POSITIVE_INFINITY);
    }

    /** x below the threshold t, t + t·∫_0^{ln x/t} e^(−(α−1)u) du above. */
    @Override
    public double limitedMean(double x) {
        return x <= threshold ? Math.max(x, 0) : threshold * (1 + ExponentialIntegral.of(alpha - 1, Math.log(x / threshold)));
    }

    @Override
    public double limitedSecondMoment(double x) {
        return x <= threshold ? Math.max(x, 0) * Math.max(x, 0)
                : threshold * threshold * (1 + 2 * ExponentialIntegral.of(alpha - 2, Math.log(x / threshold)));
    }

    @Override
    public double layerMean(double from, double to) {
        if (to <= threshold) {
            return to - from;
        }
        double start = Math.max(from, threshold);
        double above = start * survival(start) * ExponentialIntegral.of(alpha - 1, Math.log1p((to - start) / start));
        return start - Math.max(from, 0) + above;
    }

    @Override
    public double upperEnd() {
        return Double.POSITIVE_INFINITY;
    }

    @Override
    public SeveritySampler sampler() {
        return new Sampler(threshold, 1 / alpha);
    }

    private record Sampler(double threshold, double power) implements SeveritySampler {
        @Override
        public DoubleSupplier bind(KeyedStream stream) {
            ZigguratSampler.Exponential exponential = ZigguratSampler.Exponential.of(stream);
            return () -> threshold * Math.exp(power * exponential.sample());
        }

        @Override
        public int fill(KeyedStream stream, long firstSlot, int[] counts, int years, double[] out) {
            int n = StandardVariates.exponentials(stream, firstSlot, counts, years, out);
            for (int k = 0; k < n; k++) {
                out[k] = threshold * Math.exp(power * out[k]);
            }
            return n;
        }
    }
}
