package layerweft.model.severity;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;
import java.util.List;
import java.util.stream.IntStream;
import java.util.stream.Stream;
import layerweft.model.random.KeyedStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.Timeout;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;

/** Parameters and probabilities at the far ends of what is admissible, where a closed form may overflow, cancel or round. */
@Timeout(60)
class SeverityExtremesTest {
    private static final double INFINITY = Double.POSITIVE_INFINITY;

    static Stream<SeverityModel> extremes() {
        return Stream.of(new Lognormal(0, 40), new Lognormal(600, 20), new Lognormal(-600, 30), new Lognormal(3, 1e-6),
                new Weibull(0.004, 1), new Weibull(0.008, 5), new Weibull(200, 3), new Gamma(1e-4, 7), new Gamma(1e8, 1e-7), new Gamma(1, 1e-200),
                new Burr(0.001, 2, 5), new Burr(0.001, 500, 5), new Burr(300, 0.1, 5), new Burr(2, 300, 5), new Loglogistic(0.01, 3),
                new Pareto(1, 1e-3), new Pareto(1, 1e4), new Pareto(1e-100, 1.5), new GeneralizedPareto(0, 1, 40), new GeneralizedPareto(0, 1, -40),
                new GeneralizedPareto(2, 1, 1e-300), new GeneralizedPareto(2, 1, -1e-300), new GeneralizedPareto(0, 3, 1e-5),
                new InverseGaussian(10, 1e-6), new InverseGaussian(10, 1e9), new InverseGaussian(1e-20, 1e-20), new Exponential(1e-300),
                new Exponential(1e100), new Beta(1e-3, 1e-3, 100), new Beta(1e5, 2, 100), new Beta(2, 1e5, 1e-6),
                new Mbbefd(1e-12, 1e12, 3), new Mbbefd(1e12, 2, 3), new Mbbefd(1 + 1e-15, 5, 3), new Mbbefd(0.5, 1, 3), Mbbefd.ofC(20, 3), Mbbefd.ofC(0, 3),
                new DiscreteLosses(List.of(0.0, 1e300), List.of(1 - 1e-12, 1e-12)));
    }

    @ParameterizedTest
    @MethodSource("extremes")
    void nothingIsNaNOrOutOfRange(SeverityModel model) {
        for (double x : new double[] {0, Double.MIN_VALUE, 1e-300, 1e-30, 1e-3, 1, 3, 7, 100, 1e10, 1e30, 1e150, INFINITY}) {
            assertEquals(1, model.cdf(x) + model.survival(x), 1e-12, "cdf and survival at " + x);
            double first = model.limitedMean(x);
            double second = model.limitedSecondMoment(x);
            double slack = 1 + 1e-9;
            assertTrue(first >= 0 && first <= x * slack, "limited mean " + first + " at " + x);
            assertTrue(second >= 0 && second <= x * x * slack, "second limited moment " + second + " at " + x);
            assertTrue(second * slack >= first * first || second == INFINITY, "variance at " + x);
            double rest = model.layerMean(x == INFINITY ? 1e200 : x, INFINITY);
            assertTrue(rest >= 0, "layer from " + x + ": " + rest);
        }
        assertFalse(Double.isNaN(model.mean()));
        assertEquals(model.upperEnd(), model.quantile(1));
        assertEquals(model.upperEnd(), model.survivalQuantile(0));
        assertEquals(model.quantile(0), model.survivalQuantile(1));
    }

    /** Chances far below the precision of 1 − p find their amount, wherever that is a number. */
    @ParameterizedTest
    @MethodSource("continuous")
    void survivalQuantileInvertsSurvivalFarIntoTheTail(SeverityModel model) {
        for (double q : new double[] {0.999, 0.5, 0.01, 1e-6, 1e-12, 1e-17, 1e-20, 1e-40, 1e-100, 1e-300}) {
            double x = model.survivalQuantile(q);
            assertTrue(x > 0 && x < INFINITY, "a finite amount at " + q);
            double lower = model.survival(x * (1 - 1e-9));
            double upper = model.survival(x * (1 + 1e-9));
            assertTrue(upper <= q && q <= lower, () -> q + " at " + x + ": survival between " + upper + " and " + lower);
        }
    }

    /** Small probabilities, where amounts are tiny. */
    @ParameterizedTest
    @MethodSource("continuous")
    void quantileInvertsCdfNearZero(SeverityModel model) {
        for (double p : new double[] {1e-30, 1e-15, 1e-9, 1e-3, 0.5, 0.9999}) {
            double x = model.quantile(p);
            double low = model.cdf(x * (1 - 1e-9));
            double high = model.cdf(x * (1 + 1e-9));
            assertTrue(low <= p && p <= high, () -> p + " at " + x + ": cdf between " + low + " and " + high);
        }
    }

    static Stream<SeverityModel> continuous() {
        return Stream.of(new Lognormal(1.5, 1.2), new GeneralizedPareto(0, 9, 0.4),
                new GeneralizedPareto(0, 9, 0), new Gamma(0.7, 6), new Gamma(40, 0.5), new Gamma(0.3, 1e-9), new Gamma(2.5, 1e9), new Weibull(0.6, 8),
                new Weibull(2.5, 8), new Burr(1.3, 5, 12), new Burr(0.5, 4, 12), new Loglogistic(2.2, 7), new Exponential(11),
                new InverseGaussian(10, 4), new InverseGaussian(10, 400),
                new Mixture(List.of(0.7, 0.3), List.of(new Gamma(0.7, 6), new Lognormal(1, 1))),
                new Spliced(new Lognormal(0, 1), 2, new Weibull(0.5, 2), 0.3));
    }

    /** 1 − x/exposedValue falls below the precision of x itself, so fewer chances have an amount of their own. */
    @ParameterizedTest
    @MethodSource("bounded")
    void boundedLawsInvertUpToTheirEnd(SeverityModel model) {
        for (double q : new double[] {0.9, 0.1, 1e-3, 1e-6, 1e-9}) {
            double x = model.survivalQuantile(q);
            double left = model.upperEnd() - x;
            assertTrue(model.survival(x - 1e-6 * left - Math.ulp(x)) >= q && model.survival(x + 1e-6 * left + Math.ulp(x)) <= q, q + " at " + x);
        }
    }

    static Stream<SeverityModel> bounded() {
        return Stream.of(new Beta(0.4, 3.5, 200), new Beta(3, 1.5, 1e-6), new Beta(2, 4, 1e9), new GeneralizedPareto(2, 9, -0.3));
    }

    /** E[min(X, x)] of lognormals whose mean is beyond the range of numbers: σ = 40, where E[X] = e^800. */
    @Test
    void limitedMeanOfALognormalWithoutARepresentableMean() {
        // mpmath, 40 digits: quadrature of the survival function
        Lognormal model = new Lognormal(0, 40);
        assertEquals(INFINITY, model.mean());
        assertEquals(4.8701287079902789, model.limitedMean(10), 1e-10 * 4.87);
        assertEquals(48.20290418579154868, model.limitedSecondMoment(10), 1e-10 * 48.2);
        assertEquals(717669.62000714373, model.layerMean(1e6, 3e6), 1e-10 * 717669);
    }

    /** Of ten equally likely losses, the eighth is the quantile at 0.8, whatever rounding a sum of tenths brings. */
    @ParameterizedTest
    @ValueSource(ints = {3, 7, 10, 49, 100, 1000, 12345})
    void quantileOfEquallyLikelyLossesAtTheirOwnLevels(int n) {
        DiscreteLosses model = DiscreteLosses.ofEquallyLikely(IntStream.rangeClosed(1, n).mapToObj(k -> (double) k).toList());
        for (int k = 1; k <= n; k++) {
            assertEquals(k, model.quantile((double) k / n), "quantile at " + k + "/" + n);
        }
    }

    @Test
    void quantileOfDecimalProbabilities() {
        DiscreteLosses model = new DiscreteLosses(List.of(1.0, 2.0, 3.0, 4.0), List.of(0.7, 0.2, 0.05, 0.05));
        assertEquals(1, model.quantile(0.7));
        assertEquals(2, model.quantile(0.9));
        assertEquals(3, model.quantile(0.95));
        assertEquals(2, model.survivalQuantile(0.1));
        assertEquals(3, model.survivalQuantile(0.05));
        assertEquals(4, model.quantile(1));
    }

    /** Weights that are 1 in sum to rounding are kept digit by digit, so that a saved file reads as it was written. */
    @Test
    void weightsStayAsWritten() {
        List<Double> weights = List.of(0.1, 0.2, 0.7);
        assertEquals(weights, new Mixture(weights, List.of(new Exponential(1), new Exponential(2), new Exponential(3))).weights());
    }

    /** An unlimited layer far up is the sum of a limited one and the rest. */
    @ParameterizedTest
    @MethodSource("continuous")
    void unlimitedLayersAddUpFarIntoTheTail(SeverityModel model) {
        for (double q : new double[] {1e-3, 1e-8, 1e-12}) {
            double from = model.survivalQuantile(q);
            double to = 1.9 * from;
            double sum = model.layerMean(from, to) + model.layerMean(to, INFINITY);
            assertEquals(1, model.layerMean(from, INFINITY) / sum, 1e-9, "layer from " + from);
        }
    }

    /**
     * Sides of a splice that the model's own sampler can draw, and sides so unlikely that the quantile must. The Kolmogorov–Smirnov
     * distance of 20,000 losses exceeds 2.5/√n with a chance below 8e-6; the seed is fixed.
     */
    @ParameterizedTest
    @ValueSource(doubles = {0.05, 0.5, 1, 3, 8})
    void splicedLossesFollowTheirLaw(double threshold) {
        Spliced model = new Spliced(new Lognormal(0, 1), threshold, new Weibull(0.7, 1), 0.3);
        int n = 20_000;
        double[] losses = new double[n];
        assertEquals(n, model.sampler().fill(new KeyedStream(20261201), 0, new int[] {n}, 1, losses));
        Arrays.sort(losses);
        double distance = 0;
        for (int k = 0; k < n; k++) {
            double cdf = model.cdf(losses[k]);
            distance = Math.max(distance, Math.max(cdf - (double) k / n, (k + 1.0) / n - cdf));
        }
        assertTrue(distance < 2.5 / Math.sqrt(n), "distance " + distance);
    }
}
