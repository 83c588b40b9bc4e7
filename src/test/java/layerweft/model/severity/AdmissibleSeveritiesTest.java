package layerweft.model.severity;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.Stream;
import layerweft.model.Finding;
import layerweft.model.InadmissibleException;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.function.Executable;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;

/** No severity exists with a parameter outside its range, and the finding names the field, the value and the range. */
class AdmissibleSeveritiesTest {
    private static final double NAN = Double.NaN;
    private static final double INFINITY = Double.POSITIVE_INFINITY;
    private static final double[] NOT_FINITE = {NAN, INFINITY, -INFINITY};
    private static final double[] NOT_POSITIVE = {0, -0.0, -1, NAN, INFINITY, -INFINITY};
    private static final double[] NEGATIVE = {-1e-300, -1, NAN, INFINITY, -INFINITY};
    private static final SeverityModel LAW = new Exponential(10);

    private interface Kind {
        Object of(double... parameters);
    }

    private record Parameter(String field, double good, double[] bad) {}

    static Stream<Arguments> parameters() {
        List<Arguments> all = new ArrayList<>();
        add(all, p -> new Lognormal(p[0], p[1]), finite("mu"), positive("sigma"));
        add(all, p -> Lognormal.ofMeanAndCv(p[0], p[1]), positive("mean"), positive("cv"));
        add(all, p -> new Pareto(p[0], p[1]), positive("threshold"), positive("alpha"));
        add(all, p -> new GeneralizedPareto(p[0], p[1], p[2]), notNegative("threshold"), positive("scale"), finite("shape"));
        add(all, p -> new Gamma(p[0], p[1]), positive("shape"), positive("scale"));
        add(all, p -> Gamma.ofMeanAndCv(p[0], p[1]), positive("mean"), positive("cv"));
        add(all, p -> new Weibull(p[0], p[1]), positive("shape"), positive("scale"));
        add(all, p -> new Burr(p[0], p[1], p[2]), positive("alpha"), positive("gamma"), positive("theta"));
        add(all, p -> new Loglogistic(p[0], p[1]), positive("shape"), positive("scale"));
        add(all, p -> new Exponential(p[0]), positive("mean"));
        add(all, p -> new InverseGaussian(p[0], p[1]), positive("mean"), positive("shape"));
        add(all, p -> new Beta(p[0], p[1], p[2]), positive("a"), positive("b"), positive("exposedValue"));
        add(all, p -> new Mbbefd(p[0], p[1], p[2]), positive("b"),
                new Parameter("g", 1, new double[]{0.999, 0, -1, NAN, INFINITY, -INFINITY}), positive("exposedValue"));
        add(all, p -> Mbbefd.ofC(p[0], p[1]), notNegative("c"), positive("exposedValue"));
        add(all, p -> new Capped(LAW, p[0]), positive("cap"));
        add(all, p -> new Spliced(LAW, p[0], LAW, p[1]), positive("threshold"),
                new Parameter("tailWeight", 0.5, new double[]{0, 1, -0.1, 1.1, NAN, INFINITY, -INFINITY}));
        return all.stream();
    }

    private static void add(List<Arguments> all, Kind kind, Parameter... parameters) {
        double[] good = Stream.of(parameters).mapToDouble(Parameter::good).toArray();
        assertTrue(kind.of(good).toString().length() > 0);
        for (int k = 0; k < parameters.length; k++) {
            for (double bad : parameters[k].bad()) {
                double[] p = good.clone();
                p[k] = bad;
                Executable making = () -> kind.of(p);
                all.add(Arguments.of(kind.of(good), parameters[k].field(), bad, making));
            }
        }
    }

    private static Parameter positive(String field) {
        return new Parameter(field, 1, NOT_POSITIVE);
    }

    private static Parameter notNegative(String field) {
        return new Parameter(field, 0, NEGATIVE);
    }

    private static Parameter finite(String field) {
        return new Parameter(field, 0, NOT_FINITE);
    }

    @ParameterizedTest
    @MethodSource("parameters")
    void aBadParameterIsRefusedByItsName(Object valid, String field, double bad, Executable making) {
        List<Finding> findings = assertThrows(InadmissibleException.class, making, () -> valid + " with " + field + " = " + bad).findings();
        assertEquals(List.of(field), findings.stream().map(Finding::field).distinct().toList());
        assertFalse(findings.get(0).found().isBlank());
        assertFalse(findings.get(0).admissible().isBlank());
    }

    @Test
    void allBadParametersAreFoundAtOnce() {
        assertEquals(List.of("alpha", "gamma", "theta"), fields(() -> new Burr(0, NAN, -1)));
        assertEquals(List.of("b", "g", "exposedValue"), fields(() -> new Mbbefd(0, 0.5, INFINITY)));
        assertEquals(List.of("threshold", "scale", "shape"), fields(() -> new GeneralizedPareto(-1, 0, NAN)));
        assertEquals(List.of("losses[0]", "losses[2]"), fields(() -> DiscreteLosses.ofEquallyLikely(List.of(-1.0, 2.0, NAN))));
    }

    @Test
    void discreteLossesNeedAProbabilityEach() {
        assertEquals(List.of("losses"), fields(() -> DiscreteLosses.ofEquallyLikely(List.of())));
        assertEquals(List.of("losses"), fields(() -> new DiscreteLosses(List.of(), List.of())));
        assertEquals(List.of("probabilities"), fields(() -> new DiscreteLosses(List.of(1.0, 2.0), List.of(1.0))));
        assertEquals(List.of("probabilities"), fields(() -> new DiscreteLosses(List.of(1.0, 2.0), List.of(0.5, 0.4))));
        assertEquals(List.of("probabilities"), fields(() -> new DiscreteLosses(List.of(1.0, 2.0), List.of(0.5, 0.5 + 2e-9))));
        assertTrue(fields(() -> new DiscreteLosses(List.of(1.0, 2.0), List.of(1.5, -0.5))).contains("probabilities[1]"));
        assertTrue(fields(() -> new DiscreteLosses(List.of(1.0, 2.0), List.of(1.0, NAN))).contains("probabilities[1]"));
        assertTrue(fields(() -> new DiscreteLosses(List.of(1.0, INFINITY), List.of(0.5, 0.5))).contains("losses[1]"));
        assertEquals(1, new DiscreteLosses(List.of(1.0, 2.0), List.of(0.5, 0.5 + 5e-10)).cdf(2));
    }

    @Test
    void aMixtureNeedsAWeightForEachComponent() {
        assertEquals(List.of("components"), fields(() -> new Mixture(List.of(), List.of())));
        assertEquals(List.of("weights"), fields(() -> new Mixture(List.of(1.0), List.of(LAW, LAW))));
        assertEquals(List.of("weights"), fields(() -> new Mixture(List.of(0.5, 0.6), List.of(LAW, LAW))));
        assertTrue(fields(() -> new Mixture(List.of(1.5, -0.5), List.of(LAW, LAW))).contains("weights[1]"));
        assertTrue(fields(() -> new Mixture(List.of(NAN, 1.0), List.of(LAW, LAW))).contains("weights[0]"));
    }

    @Test
    void aCapLiesAboveTheSmallestLoss() {
        assertEquals(List.of("cap"), fields(() -> new Capped(new Pareto(5, 2), 5)));
        assertEquals(List.of("cap"), fields(() -> new Capped(new Pareto(5, 2), 4)));
        assertEquals(List.of("cap"), fields(() -> new Capped(DiscreteLosses.ofEquallyLikely(List.of(3.0, 9.0)), 3)));
        assertEquals(5.1, new Capped(new Pareto(5, 2), 5.1).upperEnd());
    }

    @Test
    void aSplicedLawHasBodyBelowAndTailAboveItsThreshold() {
        assertEquals(List.of("threshold"), fields(() -> new Spliced(new Pareto(20, 2), 20, new Pareto(20, 1.4), 0.1)));
        assertEquals(List.of("threshold"), fields(() -> new Spliced(LAW, 20, new Beta(2, 2, 20), 0.1)));
    }

    private static List<String> fields(Executable making) {
        return assertThrows(InadmissibleException.class, making).findings().stream().map(Finding::field).toList();
    }
}
