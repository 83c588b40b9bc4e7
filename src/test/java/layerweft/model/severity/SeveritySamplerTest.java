package layerweft.model.severity;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;
import java.util.List;
import java.util.function.DoubleSupplier;
import layerweft.model.random.KeyedStream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/**
 * What the samplers draw against what the distribution functions say. Seeds are fixed. With fresh ones each distance has odds of at most 4e-7
 * (2·exp(−2·2.8²)), each mean, 5.2 standard errors away, of 2e-7: about 1 false alarm in 20,000 runs of the whole class.
 */
class SeveritySamplerTest {
    private static final int DRAWS = 20_000;
    private static final double FARTHEST = 2.8;
    private static final double MOST = 5.2;

    static List<SeverityModel> models() {
        return SeverityExamples.all();
    }

    /** The greatest distance of Kolmogorov and Smirnov, at and just below each loss drawn, so that atoms are met as well. */
    @ParameterizedTest
    @MethodSource("models")
    void drawsFollowTheDistributionFunction(SeverityModel model) {
        double[] x = draws(model);
        Arrays.sort(x);
        double distance = 0;
        for (int k = 0; k < DRAWS; k++) {
            if (k == DRAWS - 1 || x[k + 1] > x[k]) {
                distance = Math.max(distance, Math.abs((k + 1.0) / DRAWS - model.cdf(x[k])));
            }
            if (k == 0 || x[k - 1] < x[k]) {
                distance = Math.max(distance, Math.abs((double) k / DRAWS - model.cdf(Math.nextDown(x[k]))));
            }
        }
        double scaled = distance * Math.sqrt(DRAWS);
        assertTrue(scaled < FARTHEST, () -> "seed " + seed(model) + ": distance " + scaled);
        assertTrue(x[0] >= model.quantile(0) && x[DRAWS - 1] <= model.upperEnd() && x[DRAWS - 1] < Double.POSITIVE_INFINITY,
                () -> "from " + x[0] + " to " + x[DRAWS - 1]);
    }

    /** Of the draws limited at their 0.1 % quantile, so that the mean has a normal law even where the variance is infinite. */
    @ParameterizedTest
    @MethodSource("models")
    void drawsHaveTheLimitedMean(SeverityModel model) {
        double limit = model.survivalQuantile(1e-3);
        double mean = Arrays.stream(draws(model)).map(x -> Math.min(x, limit)).average().orElseThrow();
        double variance = model.limitedSecondMoment(limit) - Math.pow(model.limitedMean(limit), 2);
        double error = Math.sqrt(Math.max(0, variance) / DRAWS) + 1e-9 * mean;
        assertTrue(Math.abs(mean - model.limitedMean(limit)) < MOST * error,
                () -> "seed " + seed(model) + ": " + mean + ", expected " + model.limitedMean(limit) + " ± " + error);
    }

    @ParameterizedTest
    @MethodSource("models")
    void aYearsLossesAreTheDrawsOfItsSlot(SeverityModel model) {
        int[] counts = {3, 0, 1, 7, 0, 0, 2, 40};
        double[] out = new double[60];
        Arrays.fill(out, -1);
        SeveritySampler sampler = model.sampler();
        assertEquals(53, sampler.fill(new KeyedStream(seed(model)), 1000, counts, 8, out));
        int k = 0;
        for (int year = 0; year < 8; year++) {
            KeyedStream stream = new KeyedStream(seed(model));
            stream.seek(1000 + year);
            DoubleSupplier bound = sampler.bind(stream);
            KeyedStream other = new KeyedStream(seed(model));
            other.seek(1000 + year);
            for (int j = 0; j < counts[year]; j++, k++) {
                double loss = out[k];
                assertEquals(loss, bound.getAsDouble(), "loss " + j + " of year " + year + ", bound");
                assertEquals(loss, sampler.draw(other), "loss " + j + " of year " + year + ", drawn");
            }
        }
        assertTrue(Arrays.stream(out, k, out.length).allMatch(x -> x == -1), "nothing written after the last year");
    }

    @ParameterizedTest
    @MethodSource("models")
    void aYearDependsNeitherOnTheOthersNorOnTheBlock(SeverityModel model) {
        double[] whole = new double[30];
        double[] alone = new double[30];
        model.sampler().fill(new KeyedStream(seed(model)), 5, new int[]{4, 6, 9}, 3, whole);
        model.sampler().fill(new KeyedStream(seed(model)), 7, new int[]{20}, 1, alone);
        assertArrayEquals(Arrays.copyOfRange(whole, 10, 19), Arrays.copyOf(alone, 9));
    }

    private static long seed(SeverityModel model) {
        return model.toString().hashCode();
    }

    private static double[] draws(SeverityModel model) {
        double[] x = new double[DRAWS];
        int[] counts = new int[DRAWS / 4];
        Arrays.fill(counts, 4);
        model.sampler().fill(new KeyedStream(seed(model)), 0, counts, counts.length, x);
        return x;
    }
}
