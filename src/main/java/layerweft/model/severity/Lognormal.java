package layerweft.model.severity;

import java.util.function.DoubleSupplier;
import layerweft.model.Check;
import layerweft.model.random.KeyedStream;
import org.apache.commons.numbers.gamma.Erfcx;
import org.apache.commons.rng.sampling.distribution.ZigguratSampler;
import org.apache.commons.statistics.distribution.NormalDistribution;

/**
 * Lognormal law: ln X is normal with mean μ and standard deviation σ. E[X] = exp(μ + σ²/2). Limited moments as in Klugman, Panjer
 * &amp; Willmot, "Loss Models", appendix A.
 *
 * @param mu μ, of the logarithm of the amount in the portfolio's unit
 * @param sigma σ, above 0
 */
public record Lognormal(double mu, double sigma) implements SeverityModel {
    private static final NormalDistribution NORMAL = NormalDistribution.of(0, 1);
    private static final double ROOT_HALF = Math.sqrt(0.5);

    public Lognormal {
        new Check().finite("mu", mu).positive("sigma", sigma).orThrow();
    }

    /**
     * @param mean E[X], above 0
     * @param cv coefficient of variation σ(X)/E[X], above 0
     */
    public static Lognormal ofMeanAndCv(double mean, double cv) {
        new Check().positive("mean", mean).positive("cv", cv).orThrow();
        double sigma = Math.sqrt(Math.log1p(cv * cv));
        return new Lognormal(Math.log(mean) - sigma * sigma / 2, sigma);
    }

    @Override
    public double cdf(double x) {
        return x <= 0 ? 0 : NORMAL.cumulativeProbability(z(x, 0));
    }

    @Override
    public double survival(double x) {
        return x <= 0 ? 1 : NORMAL.survivalProbability(z(x, 0));
    }

    @Override
    public double atom(double x) {
        return 0;
    }

    @Override
    public double quantile(double p) {
        return Math.exp(mu + sigma * NORMAL.inverseCumulativeProbability(p));
    }

    @Override
    public double survivalQuantile(double q) {
        return Math.exp(mu + sigma * NORMAL.inverseSurvivalProbability(q));
    }

    @Override
    public double mean() {
        return moment(1);
    }

    @Override
    public double limitedMean(double x) {
        return limitedMoment(1, x);
    }

    @Override
    public double limitedSecondMoment(double x) {
        return limitedMoment(2, x);
    }

    @Override
    public double layerMean(double from, double to) {
        // stop losses keep the digits of far layers, but are differences of infinities where the mean is beyond the range of numbers
        if (from <= 0 || z(from, 0) < 0 || z(from, 1) <= 0 && moment(1) == Double.POSITIVE_INFINITY) {
            return limitedMean(to) - limitedMean(from);
        }
        return stopLoss(from) - stopLoss(to);
    }

    @Override
    public double upperEnd() {
        return Double.POSITIVE_INFINITY;
    }

    @Override
    public SeveritySampler sampler() {
        return new Sampler(mu, sigma);
    }

    /** (ln x − μ − shift·σ²)/σ. */
    private double z(double x, double shift) {
        return (Math.log(x) - mu) / sigma - shift * sigma;
    }

    private double moment(int k) {
        return Math.exp(k * mu + k * k * sigma * sigma / 2);
    }

    /** E[min(X, x)^k] = E[X^k; X ≤ x] + x^k·P(X &gt; x), with E[X^k; X ≤ x] = E[X^k]·Φ((ln x − μ − kσ²)/σ). */
    private double limitedMoment(int k, double x) {
        if (x <= 0) {
            return 0;
        }
        if (x == Double.POSITIVE_INFINITY) {
            return moment(k);
        }
        double z = z(x, k);
        double tail = survival(x);
        if (z > 0) {
            // x·(x·P) and not x²·P: the square alone may be beyond the range of numbers
            return moment(k) * NORMAL.cumulativeProbability(z) + (k == 1 ? x * tail : x * (x * tail));
        }
        double scaled = scaledTail(x, -z) + tail;
        return k == 1 ? x * scaled : x * (x * scaled);
    }

    /** E[(X − d)+] = E[X; X &gt; d] − d·P(X &gt; d), for d above the median; keeps its digits however far up, even where E[X] overflows. */
    private double stopLoss(double d) {
        if (d == Double.POSITIVE_INFINITY) {
            return 0;
        }
        double z = z(d, 1);
        return z > 0 ? d * (scaledTail(d, z) - scaledTail(d, z(d, 0))) : moment(1) * NORMAL.survivalProbability(z) - d * survival(d);
    }

    /**
     * e^(−z₀²/2)·erfcx(z/√2)/2 with z₀ = (ln x − μ)/σ and z ≥ 0. Because E[X^k]·φ(z₀ − kσ) = x^k·φ(z₀), this is Φ(−z)·E[X^k]/x^k at
     * z = ±(z₀ − kσ), without the moment, which may be beyond the range of numbers.
     */
    private double scaledTail(double x, double z) {
        double z0 = z(x, 0);
        return 0.5 * Math.exp(-0.5 * z0 * z0) * Erfcx.value(z * ROOT_HALF);
    }

    private record Sampler(double mu, double sigma) implements SeveritySampler {
        @Override
        public DoubleSupplier bind(KeyedStream stream) {
            ZigguratSampler.NormalizedGaussian normal = ZigguratSampler.NormalizedGaussian.of(stream);
            return () -> Math.exp(mu + sigma * normal.sample());
        }

        @Override
        public int fill(KeyedStream stream, long firstSlot, int[] counts, int years, double[] out) {
            int n = StandardVariates.normals(stream, firstSlot, counts, years, out);
            for (int k = 0; k < n; k++) {
                out[k] = Math.exp(mu + sigma * out[k]);
            }
            return n;
        }
    }
}
