package layerweft.model.copula;

import static org.junit.jupiter.api.Assertions.assertDoesNotThrow;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.stream.Stream;
import layerweft.model.Finding;
import layerweft.model.InadmissibleException;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.function.Executable;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;

/** Every fault is refused with the field's name and the admissible range. */
class AdmissibleCopulasTest {

    private static Finding only(Executable action) {
        List<Finding> findings = assertThrows(InadmissibleException.class, action).findings();
        assertEquals(1, findings.size(), findings::toString);
        return findings.get(0);
    }

    private static Arguments fault(String field, String admissible, Executable action) {
        return Arguments.of(field, admissible, action);
    }

    static Stream<Arguments> faults() {
        double nan = Double.NaN;
        ArchimedeanFamily gumbel = ArchimedeanFamily.GUMBEL;
        Group pair = new Group(2, List.of(0, 1), List.of());
        return Stream.of(
                fault("kendallTau", "from 0 up to below 1", () -> CopulaFamily.parse("gumbel").at(-0.2)),
                fault("kendallTau", "from 0 up to below 1", () -> CopulaFamily.parse("joe").at(-1e-9)),
                fault("kendallTau", "from 0 up to below 1", () -> CopulaFamily.parse("gumbel").at(1)),
                fault("kendallTau", "from 0 up to below 1", () -> CopulaFamily.parse("survival-gumbel").at(nan)),
                fault("kendallTau", "from -1 up to below 1", () -> CopulaFamily.parse("clayton").at(-1.1)),
                fault("kendallTau", "above -1 up to below 1", () -> CopulaFamily.parse("frank").at(-1)),
                fault("kendallTau", "above -1 up to below 1", () -> CopulaFamily.parse("frank").at(nan)),
                fault("kendallTau", "from -1 to 1", () -> CopulaFamily.parse("gaussian").at(1.01)),
                fault("kendallTau", "from -1 to 1", () -> CopulaFamily.parse("student:4").at(nan)),
                fault("theta", "at least 1", () -> Archimedean.ofTheta(gumbel, false, 0.99)),
                fault("theta", "at least -1", () -> Archimedean.ofTheta(ArchimedeanFamily.CLAYTON, true, -1.01)),
                fault("theta", "a finite number", () -> Archimedean.ofTheta(ArchimedeanFamily.FRANK, false, nan)),
                fault("theta", "a finite number", () -> Archimedean.ofTheta(ArchimedeanFamily.FRANK, false, Double.NEGATIVE_INFINITY)),
                fault("theta", "a finite number", () -> Archimedean.ofTheta(ArchimedeanFamily.JOE, false, Double.POSITIVE_INFINITY)),
                fault("kendallTau", "from 0 up to below 1 for 3 perils", () -> CopulaFamily.parse("clayton").at(-0.2).requireDimension(3)),
                fault("kendallTau", "from 0 up to below 1 for 5 perils", () -> CopulaFamily.parse("frank").at(-0.2).sampler(5)),
                fault("kendallTau", "correlation of at least -0.5", () -> CopulaFamily.parse("gaussian").at(-0.34).requireDimension(3)),
                fault("kendallTau", "correlation of at least -0.25", () -> CopulaFamily.parse("student:3").at(-0.2).requireDimension(5)),
                fault("family", "two perils only", () -> new Countermonotonic().requireDimension(3)),
                fault("family", "two perils only", () -> new Countermonotonic().sampler(1)),
                fault("degreesOfFreedom", "at least 0.1", () -> Student.ofKendallTau(0.1, 0)),
                fault("degreesOfFreedom", "at least 0.1", () -> Student.ofKendallTau(0.1, nan)),
                fault("degreesOfFreedom", "finite", () -> Student.ofKendallTau(0.1, Double.POSITIVE_INFINITY)),
                fault("degreesOfFreedom", "at least 0.1", () -> CopulaFamily.parse("student:-3")),
                fault("correlation", "from -1 to 1", () -> new EqualCorrelation(nan)),
                fault("correlation", "square", () -> Gaussian.ofCorrelation(new double[][]{})),
                fault("correlation[1]", "2 numbers", () -> Gaussian.ofCorrelation(new double[][]{{1, 0.2}, {0.2}})),
                fault("correlation[1][1]", "1", () -> Gaussian.ofCorrelation(new double[][]{{1, 0.2}, {0.2, 0.9}})),
                fault("correlation[1][0]", "0.2", () -> Gaussian.ofCorrelation(new double[][]{{1, 0.2}, {0.3, 1}})),
                fault("correlation[0][0]", "1", () -> Gaussian.ofCorrelation(new double[][]{{nan, 0.2}, {0.2, 1}})),
                fault("correlation", "positive semi-definite",
                        () -> Student.ofCorrelation(new double[][]{{1, 0.9, -0.9}, {0.9, 1, 0.9}, {-0.9, 0.9, 1}}, 4)),
                fault("correlation", "3 rows", () -> Gaussian.ofCorrelation(new double[][]{{1, 0.2}, {0.2, 1}}).requireDimension(3)),
                fault("groups[0]", "at least that around", () -> GroupedArchimedean.of(gumbel, false, new Group(3, List.of(), List.of(pair)))),
                fault("groups[0]", "below 1",
                        () -> GroupedArchimedean.of(gumbel, false, new Group(1.5, List.of(), List.of(new Group(nan, List.of(0), List.of()))))),
                fault("groups[0].groups[0]", "at least that around", () -> GroupedArchimedean.of(gumbel, false,
                        new Group(1.5, List.of(), List.of(new Group(4, List.of(2), List.of(pair)))))),
                fault("groups[1].perils", "one group only", () -> GroupedArchimedean.of(gumbel, false,
                        new Group(1.5, List.of(), List.of(pair, new Group(2, List.of(1, 2), List.of()))))),
                fault("groups[0].perils", "at least one", () -> GroupedArchimedean.of(gumbel, false,
                        new Group(1.5, List.of(), List.of(new Group(2, List.of(), List.of()))))),
                fault("groups[0].perils", "at least 0", () -> GroupedArchimedean.of(gumbel, false,
                        new Group(1.5, List.of(), List.of(new Group(2, List.of(-1), List.of()))))),
                fault("groups", "from 0 to 2", () -> GroupedArchimedean.of(gumbel, false,
                        new Group(1.5, List.of(), List.of(new Group(2, List.of(1, 3), List.of())))).requireDimension(3)),
                fault("kendallTau", "from 0 up to below 1", () -> GroupedArchimedean.of(ArchimedeanFamily.FRANK, false,
                        new Group(-1, List.of(0), List.of()))),
                fault("mixture", "the sum 1", () -> new MixtureCopula(List.of(0.5, 0.4), List.of(new Independence(), new Comonotonic()))),
                fault("mixture", "one weight for each", () -> new MixtureCopula(List.of(1.0), List.of(new Independence(), new Comonotonic()))),
                fault("mixture[1].weight", "above 0", () -> new MixtureCopula(List.of(1.0, nan), List.of(new Independence(), new Comonotonic()))),
                fault("mixture[0].copula.family", "two perils only",
                        () -> new MixtureCopula(List.of(0.5, 0.5), List.of(new Countermonotonic(), new Independence())).requireDimension(3)),
                fault("family", "survival-joe", () -> CopulaFamily.parse("ali-mikhail-haq")),
                fault("family", "student:4", () -> CopulaFamily.parse("student:four")),
                fault("family", "gaussian", () -> CopulaFamily.parse("survival-gaussian")));
    }

    @ParameterizedTest(name = "{0}: {1}")
    @MethodSource("faults")
    void refusesWithFieldAndRange(String field, String admissible, Executable action) {
        Finding finding = only(action);
        assertEquals(field, finding.field(), finding::toString);
        assertTrue(finding.admissible().contains(admissible), finding::toString);
    }

    @Test
    void rangesOfTau() {
        assertEquals(new TauRange(-1, false, 1, true), CopulaFamily.parse("clayton").tauRange(2));
        assertEquals(new TauRange(0, false, 1, true), CopulaFamily.parse("clayton").tauRange(3));
        assertEquals(new TauRange(-1, true, 1, true), CopulaFamily.parse("survival-frank").tauRange(2));
        assertEquals(new TauRange(-1, false, 1, false), CopulaFamily.parse("gaussian").tauRange(2));
        assertEquals(-1.0 / 3, CopulaFamily.parse("student:4").tauRange(3).low(), 1e-15);
        for (CopulaFamily family : CopulaFamily.withStrength()) {
            for (int d : new int[]{2, 3, 10}) {
                TauRange range = family.tauRange(d);
                assertDoesNotThrow(() -> family.at(range.lowOpen() ? -0.999 : range.low()).requireDimension(d));
                assertTrue(range.contains(0.99));
                assertFalse(range.contains(Double.NaN));
            }
        }
    }

    @Test
    void singularMatricesAreLegal() {
        Gaussian singular = Gaussian.ofCorrelation(new double[][]{{1, 1, 0.3}, {1, 1, 0.3}, {0.3, 0.3, 1}});
        singular.requireDimension(3);
        Samples samples = Samples.draw(singular, 3, 100, 1);
        for (int y = 0; y < 100; y++) {
            assertEquals(samples.scores()[0][y], samples.scores()[1][y], 1e-12);
        }
        assertEquals(singular.cdf(0.2, 1, 0.6), singular.cdf(0.2, 0.5, 0.6), 1e-12);
        assertEquals(1, singular.upperTail(0, 1));
    }

    @Test
    void matricesAreCopied() {
        double[][] matrix = {{1, 0.5}, {0.5, 1}};
        Gaussian copula = Gaussian.ofCorrelation(matrix);
        matrix[1][0] = 0.9;
        assertEquals(0.5, copula.correlation().rho(0, 1));
        assertEquals(Gaussian.ofCorrelation(new double[][]{{1, 0.5}, {0.5, 1}}), copula);
    }
}
