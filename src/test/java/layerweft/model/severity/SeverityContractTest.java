package layerweft.model.severity;

import static layerweft.model.severity.SeverityExamples.amounts;
import static layerweft.model.severity.SeverityExamples.atoms;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;
import java.util.List;
import java.util.Set;
import java.util.function.DoubleUnaryOperator;
import java.util.stream.Collectors;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** What every severity promises, whatever its kind. */
class SeverityContractTest {
    private static final double INFINITY = Double.POSITIVE_INFINITY;
    private static final double[] CHANCES = {1e-300, 1e-18, 1e-12, 1e-6, 0.001, 0.05, 0.2, 0.4999, 0.5, 0.6, 0.85, 0.99, 0.999999};

    static List<SeverityModel> models() {
        return SeverityExamples.all();
    }

    @Test
    void theExamplesAreOfEveryKind() {
        assertEquals(Set.of(SeverityModel.class.getPermittedSubclasses()), models().stream().map(Object::getClass).collect(Collectors.toSet()));
    }

    @ParameterizedTest
    @MethodSource("models")
    void probabilitiesAreMonotoneAndAddToOne(SeverityModel model) {
        double cdf = 0;
        double survival = 1;
        for (double x : amounts(model)) {
            assertEquals(1, model.cdf(x) + model.survival(x), 1e-13, "at " + x);
            assertTrue(model.cdf(x) >= cdf * (1 - 1e-12) && model.survival(x) <= survival * (1 + 1e-12), "at " + x);
            cdf = model.cdf(x);
            survival = model.survival(x);
        }
    }

    @ParameterizedTest
    @MethodSource("models")
    void nothingBelowZeroAndAllBelowInfinity(SeverityModel model) {
        assertEquals(0, model.cdf(-1));
        assertEquals(1, model.survival(-1));
        assertEquals(0, model.atom(-1));
        assertEquals(1, model.cdf(INFINITY));
        assertEquals(0, model.survival(INFINITY));
        assertEquals(model.atom(0), model.cdf(0), 1e-15);
        assertEquals(0, model.survival(model.upperEnd()));
        assertEquals(0, model.survival(Double.MAX_VALUE), model.mean() < INFINITY ? 1e-300 : 0.1);
    }

    @ParameterizedTest
    @MethodSource("models")
    void anAtomIsTheStepOfTheDistributionFunction(SeverityModel model) {
        double[] atoms = atoms(model);
        for (double x : atoms) {
            assertEquals(model.atom(x), model.cdf(x) - model.cdf(Math.nextDown(x)), 1e-12, "cdf at " + x);
            assertEquals(model.atom(x), model.survival(Math.nextDown(x)) - model.survival(x), 1e-12, "survival at " + x);
            assertEquals(0, model.atom(Math.nextUp(x)));
        }
        for (double x : amounts(model)) {
            if (Arrays.binarySearch(atoms, x) < 0) {
                assertEquals(0, model.atom(x), "no atom at " + x);
            }
        }
    }

    @ParameterizedTest
    @MethodSource("models")
    void aQuantileIsTheSmallestAmountOfItsProbability(SeverityModel model) {
        for (double p : CHANCES) {
            double x = model.quantile(p);
            assertTrue(model.cdf(wider(x)) >= p * (1 - 1e-9), () -> "quantile of " + p + ": " + x + ", cdf " + model.cdf(wider(x)));
            assertTrue(model.cdf(narrower(x)) <= p * (1 + 1e-9), () -> "quantile of " + p + ": " + x + ", cdf " + model.cdf(narrower(x)));
        }
    }

    @ParameterizedTest
    @MethodSource("models")
    void aSurvivalQuantileIsTheSmallestAmountExceededNoMoreOften(SeverityModel model) {
        for (double q : CHANCES) {
            double x = model.survivalQuantile(q);
            assertTrue(model.survival(wider(x)) <= q * (1 + 1e-9), () -> "exceeded by " + q + ": " + x + ", " + model.survival(wider(x)));
            assertTrue(model.survival(narrower(x)) >= q * (1 - 1e-9), () -> "exceeded by " + q + ": " + x + ", " + model.survival(narrower(x)));
        }
    }

    @ParameterizedTest
    @MethodSource("models")
    void bothQuantilesAreTheSameFunction(SeverityModel model) {
        for (int k = 1; k < 64; k++) {
            double q = k / 64.0 + 1e-4;
            assertEquals(model.quantile(1 - q), model.survivalQuantile(q), 1e-10 * model.quantile(1 - q), "exceeded by " + q);
        }
    }

    @ParameterizedTest
    @MethodSource("models")
    void quantilesEndAtTheSupport(SeverityModel model) {
        assertEquals(model.upperEnd(), model.quantile(1));
        assertEquals(model.upperEnd(), model.survivalQuantile(0));
        assertEquals(model.quantile(0), model.survivalQuantile(1));
        double lower = model.quantile(0);
        assertTrue(lower >= 0 && lower <= model.quantile(1e-300));
        assertEquals(0, model.cdf(narrower(lower)), "nothing below " + lower);
    }

    @ParameterizedTest
    @MethodSource("models")
    void quantilesRefuseWhatIsNoProbability(SeverityModel model) {
        for (double p : new double[]{-1e-9, 1 + 1e-9, Double.NaN, INFINITY, -INFINITY}) {
            assertThrows(IllegalArgumentException.class, () -> model.quantile(p), () -> "quantile of " + p);
            assertThrows(IllegalArgumentException.class, () -> model.survivalQuantile(p), () -> "survival quantile of " + p);
        }
    }

    @ParameterizedTest
    @MethodSource("models")
    void limitedMomentsAreIntegralsOfSurvival(SeverityModel model) {
        double from = 0;
        double first = 0;
        double second = 0;
        for (double x : amounts(model)) {
            first += SurvivalQuadrature.integral(model, 1, from, x);
            second += SurvivalQuadrature.integral(model, 2, from, x);
            from = x;
            assertEquals(first, model.limitedMean(x), 1e-10 * first, "limited mean at " + x);
            assertEquals(second, model.limitedSecondMoment(x), 1e-10 * second, "limited second moment at " + x);
        }
    }

    @ParameterizedTest
    @MethodSource("models")
    void limitedMomentsHaveTheirLimits(SeverityModel model) {
        assertEquals(0, model.limitedMean(0));
        assertEquals(0, model.limitedSecondMoment(0));
        assertEquals(model.mean(), model.limitedMean(INFINITY), tolerance(model.mean(), 1e-13));
        assertTrue(model.mean() > 0);
        double second = model.limitedSecondMoment(INFINITY);
        assertTrue(second >= Math.pow(model.mean(), 2) * (1 - 1e-10), () -> "second moment " + second + ", mean " + model.mean());
        for (double far : new double[]{1e30, 1e100, 1e300, Double.MAX_VALUE}) {
            double beyond = model.survival(far);
            assertLimit(model.mean(), model.limitedMean(far), beyond, far * beyond, "limited mean at " + far);
            assertLimit(model.mean(), model.layerMean(0, far), beyond, far * beyond, "layer up to " + far);
            assertLimit(second, model.limitedSecondMoment(far), beyond, far * (far * beyond), "limited second moment at " + far);
        }
        if (model.upperEnd() < INFINITY) {
            assertEquals(model.mean(), model.limitedMean(model.upperEnd()), 1e-13 * model.mean());
            assertEquals(second, model.limitedSecondMoment(2 * model.upperEnd()), 1e-13 * second);
        }
    }

    @ParameterizedTest
    @MethodSource("models")
    void theLimitedMeanRisesAndIsConcave(SeverityModel model) {
        double top = Math.min(model.upperEnd(), model.survivalQuantile(1e-3));
        double step = top / 200;
        double slope = 1;
        for (int k = 1; k <= 200; k++) {
            double next = (model.limitedMean(k * step) - model.limitedMean((k - 1) * step)) / step;
            assertTrue(next >= -1e-11 && next <= slope + 1e-11, "slope up to " + k * step + ": " + next + " after " + slope);
            slope = next;
        }
    }

    @ParameterizedTest
    @MethodSource("models")
    void aLayerIsADifferenceOfLimitedMeans(SeverityModel model) {
        double[] x = amounts(model);
        for (int k = 0; k < x.length; k++) {
            int from = k;
            for (int to = k; to < x.length; to++) {
                double difference = model.limitedMean(x[to]) - model.limitedMean(x[from]);
                assertEquals(difference, model.layerMean(x[from], x[to]), 1e-11 * model.limitedMean(x[to]), x[from] + " to " + x[to]);
            }
            assertEquals(model.limitedMean(x[from]), model.layerMean(0, x[from]), 1e-11 * model.limitedMean(x[from]), "up to " + x[from]);
            double above = model.layerMean(x[from], INFINITY);
            assertEquals(model.mean() - model.limitedMean(x[from]), above, tolerance(model.mean(), 1e-11), "above " + x[from]);
        }
        assertEquals(model.mean(), model.layerMean(0, INFINITY), tolerance(model.mean(), 1e-13));
        if (model.upperEnd() < INFINITY) {
            assertEquals(0, model.layerMean(model.upperEnd(), INFINITY));
        }
    }

    @ParameterizedTest
    @MethodSource("models")
    void valuesAreNeverNaN(SeverityModel model) {
        List<DoubleUnaryOperator> functions = List.of(model::cdf, model::survival, model::atom, model::limitedMean, model::limitedSecondMoment,
                x -> model.layerMean(x, INFINITY), x -> model.layerMean(x, 2 * x));
        for (double x : new double[]{0, Double.MIN_VALUE, 1e-300, 1e-20, 1, 1e20, 1e160, 1e200, 1e300}) {
            for (int k = 0; k < functions.size(); k++) {
                double value = functions.get(k).applyAsDouble(x);
                assertTrue(value >= 0, "function " + k + " at " + x + ": " + value);
            }
        }
    }

    /** At most the moment, and nearly all of it where hardly a loss is larger and its last piece is negligible. */
    private static void assertLimit(double moment, double limited, double beyond, double last, String what) {
        assertTrue(limited <= moment * (1 + 1e-12), () -> what + ": " + limited + " of " + moment);
        boolean nearlyAll = moment < INFINITY && beyond < 1e-200 && last < 1e-15 * moment;
        assertTrue(!nearlyAll || limited >= moment * (1 - 1e-10), () -> what + ": " + limited + " of " + moment);
    }

    private static double wider(double x) {
        return Math.max(x * (1 + 1e-11), Double.MIN_NORMAL);
    }

    private static double narrower(double x) {
        return x == 0 ? -1 : x == INFINITY ? Double.MAX_VALUE : x * (1 - 1e-11);
    }

    private static double tolerance(double value, double relative) {
        return value == INFINITY ? 0 : relative * value;
    }
}
