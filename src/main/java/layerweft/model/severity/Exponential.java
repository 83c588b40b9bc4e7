package layerweft.model.severity;

import java.util.function.DoubleSupplier;
import layerweft.model.Check;
import layerweft.model.random.KeyedStream;
import org.apache.commons.rng.sampling.distribution.ZigguratSampler;

/**
 * Exponential law: P(X &gt; x) = e^(−x/mean).
 *
 * @param mean E[X], above 0
 */
public record Exponential(double mean) implements SeverityModel {

    public Exponential {
        new Check().positive("mean", mean).orThrow();
    }

    @Override
    public double cdf(double x) {
        return x <= 0 ? 0 : -Math.expm1(-x / mean);
    }

    @Override
    public double survival(double x) {
        return x <= 0 ? 1 : Math.exp(-x / mean);
    }

    @Override
    public double atom(double x) {
        return 0;
    }

    @Override
    public double quantile(double p) {
        Probability.check(p);
        return -mean * Math.log1p(-p);
    }

    @Override
    public double survivalQuantile(double q) {
        Probability.check(q);
        return q == 1 ? 0 : -mean * Math.log(q);
    }

    @Override
    public double limitedMean(double x) {
        return mean * ExponentialIntegral.of(1, Math.max(x, 0) / mean);
    }

    @Override
    public double limitedSecondMoment(double x) {
        return 2 * mean * mean * ExponentialIntegral.first(1, Math.max(x, 0) / mean);
    }

    @Override
    public double layerMean(double from, double to) {
        double start = Math.max(from, 0);
        return survival(start) * mean * ExponentialIntegral.of(1, (to - start) / mean);
    }

    @Override
    public double upperEnd() {
        return Double.POSITIVE_INFINITY;
    }

    @Override
    public SeveritySampler sampler() {
        return new Sampler(mean);
    }

    private record Sampler(double mean) implements SeveritySampler {
        @Override
        public DoubleSupplier bind(KeyedStream stream) {
            ZigguratSampler.Exponential exponential = ZigguratSampler.Exponential.of(stream);
            return () -> mean * exponential.sample();
        }

        @Override
        public int fill(KeyedStream stream, long firstSlot, int[] counts, int years, double[] out) {
            int n = StandardVariates.exponentials(stream, firstSlot, counts, years, out);
            for (int k = 0; k < n; k++) {
                out[k] *= mean;
            }
            return n;
        }
    }
}
