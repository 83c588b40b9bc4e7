package layerweft.model.frequency;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.stream.Stream;
import org.apache.commons.math3.complex.Complex;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;

/** What every law of the count promises, whichever its kind. */
class FrequencyContractTest {

    static Stream<FrequencyModel> models() {
        return Stream.of(new Poisson(1e-12), new Poisson(0.01), new Poisson(1.8), new Poisson(60), new Poisson(12_345.6), new Poisson(1e6),
                new NegativeBinomial(1.8, 1.4), new NegativeBinomial(0.5, 6), new NegativeBinomial(1e-6, 2.5), new NegativeBinomial(30, 2),
                new NegativeBinomial(3, 1.00001), new NegativeBinomial(30, 1 + 0x1p-26), new NegativeBinomial(1000, 50),
                new NegativeBinomial(1e6, 3), new Binomial(1, 0.3), new Binomial(8, 0.2), new Binomial(3, 1), new Binomial(50, 0.9),
                new Binomial(1_000_000_000, 3e-8), new Binomial(1_000_000, 0.999), new EmpiricalCounts(List.of(1.0)),
                new EmpiricalCounts(List.of(0.5, 0.25, 0.15, 0.0, 0.1)), new EmpiricalCounts(List.of(0.0, 0.0, 0.3, 0.7, 0.0)),
                new EmpiricalCounts(List.of(0.1, 0.2, 0.3, 0.1, 0.2, 0.1)));
    }

    /** Relative precision of the probabilities: the exponents of the special functions grow with the mean, and so does their rounding. */
    private static double precision(FrequencyModel model) {
        return 1e-14 * Math.max(10, Math.min(model.mean(), 1e5));
    }

    /** Eleven standard deviations and more either side of the mean; less than 1e-17 of the probability of these models is outside. */
    private static int from(FrequencyModel model) {
        return (int) Math.max(0, model.mean() - 11 * Math.sqrt(model.variance()) - 20);
    }

    private static int to(FrequencyModel model) {
        return model.largest() < Integer.MAX_VALUE && model.largest() < 1000 ? model.largest() : countBeyond(model);
    }

    private static int countBeyond(FrequencyModel model) {
        int n = (int) model.mean() + 20;
        while (model.survival(n) > 1e-17) {
            n += (int) Math.sqrt(model.variance()) + 1;
        }
        return n;
    }

    @ParameterizedTest
    @MethodSource("models")
    void probabilitiesSumToOneAndGiveTheMoments(FrequencyModel model) {
        double sum = 0;
        double first = 0;
        double second = 0;
        for (int n = from(model); n <= to(model); n++) {
            double p = model.probability(n);
            double off = n - model.mean();
            sum += p;
            first += off * p;
            second += off * off * p;
        }
        assertEquals(1, sum, precision(model));
        assertEquals(0, first, precision(model) * model.mean() + 1e-15);
        assertEquals(model.variance(), second, precision(model) * Math.max(1, model.variance()) + 1e-14);
    }

    @ParameterizedTest
    @MethodSource("models")
    void cdfAndSurvivalAreSumsOfProbabilities(FrequencyModel model) {
        int low = from(model);
        int high = to(model);
        double sum = low == 0 ? 0 : model.cdf(low - 1);
        for (int n = low; n <= high; n++) {
            sum += model.probability(n);
            assertEquals(sum, model.cdf(n), precision(model), "P(N <= " + n + ")");
            assertEquals(1, model.cdf(n) + model.survival(n), 1e-13, "cdf + survival at " + n);
        }
    }

    @ParameterizedTest
    @MethodSource("models")
    void nothingIsBelowZeroOrAboveTheLargest(FrequencyModel model) {
        assertEquals(0, model.probability(-1));
        assertEquals(0, model.cdf(-1));
        assertEquals(1, model.survival(-1));
        assertEquals(0, model.probability(Integer.MIN_VALUE));
        assertEquals(1, model.cdf(model.largest()));
        assertEquals(0, model.survival(model.largest()));
        if (model.largest() < Integer.MAX_VALUE) {
            assertEquals(0, model.probability(model.largest() + 1));
            assertEquals(1, model.cdf(model.largest() + 1));
            assertEquals(0, model.survival(model.largest() + 1));
        }
    }

    /** Checked over all counts of a short law and over the middle of a long one. */
    @ParameterizedTest
    @MethodSource("models")
    void quantileInvertsTheCdfAtAndAroundItsJumps(FrequencyModel model) {
        int low = Math.max(from(model), (int) model.mean() - 300);
        int high = Math.min(to(model), (int) model.mean() + 300);
        for (int n = low; n <= high; n++) {
            double at = model.cdf(n);
            double before = model.cdf(n - 1);
            if (at > before && at < 1) {
                assertEquals(n, model.quantile(at), "at the jump of " + n);
                assertEquals(n, model.quantile(Math.nextUp(before)), "just above the jump below " + n);
                assertEquals(n, model.quantile((before + at) / 2 > before ? (before + at) / 2 : at), "within the jump of " + n);
            }
        }
    }

    @ParameterizedTest
    @MethodSource("models")
    void quantileIsTheSmallestCountThatReachesP(FrequencyModel model) {
        for (double p : new double[] {1e-300, 1e-100, 1e-15, 1e-6, 0.01, 0.3, 0.5, 0.7, 0.99, 1 - 1e-9, 1 - 0x1p-52, 1 - 0x1p-53}) {
            int n = model.quantile(p);
            assertTrue(model.cdf(n) >= p, () -> "cdf of the quantile of " + p);
            assertTrue(model.cdf(n - 1) < p, () -> "cdf below the quantile of " + p);
        }
    }

    @ParameterizedTest
    @MethodSource("models")
    void quantileAtTheEnds(FrequencyModel model) {
        assertEquals(0, model.quantile(0));
        assertEquals(model.largest(), model.quantile(1));
    }

    @ParameterizedTest
    @ValueSource(doubles = {-0x1p-60, 1 + 0x1p-52, Double.NaN, Double.POSITIVE_INFINITY, Double.NEGATIVE_INFINITY})
    void quantileRefusesWhatIsNoProbability(double p) {
        models().forEach(model -> assertThrows(IllegalArgumentException.class, () -> model.quantile(p), model::toString));
    }

    @ParameterizedTest
    @MethodSource("models")
    void generatingFunctionAtOneAndZero(FrequencyModel model) {
        assertEquals(new Complex(1, 0), roundedToOne(model.generatingFunction(Complex.ONE)));
        Complex atZero = model.generatingFunction(Complex.ZERO);
        assertEquals(model.probability(0), atZero.getReal(), 1e-13 * model.probability(0));
        assertEquals(0, atZero.getImaginary(), 0);
    }

    private static Complex roundedToOne(Complex value) {
        return value.subtract(1).abs() < 4e-16 ? Complex.ONE : value;
    }

    /** On the unit circle G(e^(it)) = E[e^(itN)], whose derivative at t = 0 is i E[N]; the error of the difference is t² E[N³]/6. */
    @ParameterizedTest
    @MethodSource("models")
    void generatingFunctionHasTheMeanAsItsSlope(FrequencyModel model) {
        double t = 1e-5 / (model.mean() + Math.sqrt(model.variance()) + 1) / 10;
        Complex value = model.generatingFunction(new Complex(Math.cos(t), Math.sin(t)));
        assertEquals(model.mean(), value.getImaginary() / t, 1e-9 * model.mean());
    }

    static Stream<FrequencyModel> modelsWithin512Counts() {
        return models().filter(model -> model.survival(511) < 1e-17);
    }

    /** The discrete Fourier transform of the values on the unit circle gives the probabilities back. */
    @ParameterizedTest
    @MethodSource("modelsWithin512Counts")
    void generatingFunctionTransformsToTheProbabilities(FrequencyModel model) {
        int size = 512;
        Complex[] values = new Complex[size];
        for (int k = 0; k < size; k++) {
            double angle = 2 * Math.PI * k / size;
            values[k] = model.generatingFunction(new Complex(Math.cos(angle), Math.sin(angle)));
        }
        for (int n = 0; n < size; n++) {
            double sum = 0;
            for (int k = 0; k < size; k++) {
                double angle = -2 * Math.PI * ((long) k * n % size) / size;
                sum += values[k].getReal() * Math.cos(angle) - values[k].getImaginary() * Math.sin(angle);
            }
            assertEquals(model.probability(n), sum / size, 2e-14, "P(N = " + n + ")");
        }
    }
}
