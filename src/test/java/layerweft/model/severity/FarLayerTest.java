package layerweft.model.severity;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;

/** Layers that a loss reaches once in 10^8 to 10^12: the difference of limited means has no digits left there, the layer's own mean has. */
class FarLayerTest {
    private static final double[] CHANCES = {1e-8, 1e-10, 1e-12};

    static List<SeverityModel> models() {
        return SeverityExamples.all();
    }

    @ParameterizedTest
    @MethodSource("models")
    void aFarLayerKeepsItsRelativePrecision(SeverityModel model) {
        for (double q : CHANCES) {
            double from = model.survivalQuantile(q);
            for (double to : new double[]{from * 1.05, model.survivalQuantile(q / 50), Math.min(from * 3, model.upperEnd())}) {
                if (to > from && model.survival(from) > 0) {
                    double expected = SurvivalQuadrature.integral(model, 1, from, to);
                    assertEquals(expected, model.layerMean(from, to), tolerance(model, from) * expected, "layer " + from + " to " + to);
                }
            }
        }
    }

    @ParameterizedTest
    @MethodSource("models")
    void whatLiesAboveIsALayerAndWhatLiesAboveThat(SeverityModel model) {
        for (double q : CHANCES) {
            double from = model.survivalQuantile(q);
            double to = model.survivalQuantile(q / 50);
            double above = model.layerMean(from, Double.POSITIVE_INFINITY);
            double rest = model.layerMean(to, Double.POSITIVE_INFINITY);
            if (above < Double.POSITIVE_INFINITY) {
                assertEquals(SurvivalQuadrature.integral(model, 1, from, to) + rest, above, tolerance(model, from) * above, "above " + from);
            }
            assertTrue(rest >= 0 && rest <= above, "above " + to + ": " + rest);
        }
    }

    /** 1e-8, and what the amounts near the end of a support are not resolved by doubles. */
    private static double tolerance(SeverityModel model, double from) {
        double end = model.upperEnd();
        return 1e-8 + (end > from && end < Double.POSITIVE_INFINITY ? 10 * Math.ulp(end) / (end - from) : 0);
    }

    /** The mean excess above a far amount is what the tail's kind says, e.g. Embrechts, Klüppelberg &amp; Mikosch (1997), section 3.4. */
    @ParameterizedTest
    @MethodSource("tails")
    void theMeanExcessIsThatOfTheTail(SeverityModel model, double amount, double meanExcess, double relative) {
        double above = model.layerMean(amount, Double.POSITIVE_INFINITY);
        assertEquals(meanExcess, above / model.survival(amount), relative * meanExcess);
    }

    static List<Arguments> tails() {
        return List.of(
                Arguments.of(new Pareto(5, 1.6), 5e8, 5e8 / 0.6, 1e-12),
                Arguments.of(new Pareto(5, 1.001), 5e8, 5e8 / 0.001, 1e-9),
                Arguments.of(new GeneralizedPareto(2, 9, 0.4), 1e6, (9 + 0.4 * (1e6 - 2)) / 0.6, 1e-12),
                Arguments.of(new GeneralizedPareto(2, 9, -0.3), 31.9, (9 - 0.3 * 29.9) / 1.3, 1e-10),
                Arguments.of(new Exponential(11), 300, 11, 1e-12),
                Arguments.of(new Gamma(1, 11), 300, 11, 1e-11),
                Arguments.of(new Weibull(1, 11), 300, 11, 1e-11),
                Arguments.of(new Burr(1.5, 1, 40), 1e9, (1e9 + 40) / 0.5, 1e-12),
                Arguments.of(new Loglogistic(2, 7), 1e6, 1e6, 1e-10),
                Arguments.of(new Beta(1, 3, 100), 99.99, 0.01 / 4, 1e-9),
                Arguments.of(new Beta(1, 1, 10), 10 - 1e-9, 0.5e-9, 1e-6));
    }
}
