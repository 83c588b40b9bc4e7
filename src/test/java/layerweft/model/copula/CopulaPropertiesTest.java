package layerweft.model.copula;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;
import java.util.List;
import java.util.SplittableRandom;
import java.util.stream.Stream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;

/** What holds for every copula. */
class CopulaPropertiesTest {

    static Stream<CopulaFamily> families() {
        return Stream.concat(Samples.families(), Stream.of("independence", "comonotonic").map(CopulaFamily::parse));
    }

    static Stream<Copula> pairs() {
        List<String> negative = List.of("clayton", "survival-clayton", "frank", "survival-frank", "gaussian", "student:4");
        return Stream.of(
                families().flatMap(f -> Stream.of(0.0, 0.001, 0.2, 0.7, 0.99).map(f::at)),
                negative.stream().flatMap(f -> Stream.of(-0.01, -0.4, -0.99).map(CopulaFamily.parse(f)::at)),
                Stream.of(new Countermonotonic(), CopulaFamily.parse("clayton").at(-1), CopulaFamily.parse("gaussian").at(-1),
                        CopulaFamily.parse("gaussian").at(1),
                        new MixtureCopula(List.of(0.3, 0.7), List.of(new Countermonotonic(), CopulaFamily.parse("joe").at(0.5))),
                        GroupedArchimedean.of(ArchimedeanFamily.FRANK, true,
                                new Group(2, List.of(), List.of(new Group(4, List.of(0, 1), List.of()))))))
                .flatMap(s -> s);
    }

    @ParameterizedTest
    @MethodSource("pairs")
    void pairsStayWithinTheFrechetBoundsAndFillRectangles(Copula copula) {
        SplittableRandom random = new SplittableRandom(1);
        for (int k = 0; k < 60; k++) {
            double u = edge(random);
            double v = edge(random);
            double c = copula.cdf(u, v);
            assertTrue(c >= Math.max(u + v - 1, 0) - 1e-12 && c <= Math.min(u, v) + 1e-12, () -> "C(" + u + ", " + v + ") = " + c);
            double width = edge(random) * (1 - u);
            double height = edge(random) * (1 - v);
            double mass = copula.cdf(u + width, v + height) - copula.cdf(u + width, v) - copula.cdf(u, v + height) + c;
            assertTrue(mass >= -3e-12, () -> "mass " + mass + " of the rectangle from (" + u + ", " + v + ") by (" + width + ", " + height + ")");
        }
    }

    /** A uniform number, often next to 0 or 1. */
    private static double edge(SplittableRandom random) {
        double u = random.nextDouble();
        return switch (random.nextInt(4)) {
            case 0 -> Math.pow(u, 6);
            case 1 -> 1 - Math.pow(u, 6);
            default -> u;
        };
    }

    @ParameterizedTest
    @MethodSource("pairs")
    void marginsAreUniform(Copula copula) {
        for (double u : new double[]{0, 1e-12, 0.3, 0.999, 1}) {
            assertEquals(u, copula.cdf(u, 1), 1e-13);
            assertEquals(u, copula.cdf(1, u), 1e-13);
            assertEquals(0, copula.cdf(u, 0));
            assertEquals(0, copula.cdf(0, u));
        }
    }

    @ParameterizedTest
    @MethodSource("families")
    void lowerDimensionsAreMarginsOfHigherOnes(CopulaFamily family) {
        Copula copula = family.at(0.4);
        assertEquals(copula.cdf(0.3, 0.6), copula.cdf(0.3, 1, 1, 0.6, 1), 1e-12);
        assertEquals(copula.cdf(0.3, 0.6, 0.8), copula.cdf(1, 0.3, 0.6, 1, 0.8), 1e-11);
        assertEquals(0.7, copula.cdf(1, 1, 0.7, 1), 1e-13);
        assertEquals(copula.cdf(0.3, 0.6), copula.pair(0, 3).cdf(0.3, 0.6), 1e-15);
        assertEquals(1, copula.cdf(1, 1, 1));
    }

    @ParameterizedTest
    @ValueSource(strings = {"gaussian", "clayton", "gumbel", "frank", "joe", "survival-clayton", "survival-gumbel", "survival-joe"})
    void limitsOfTau(String name) {
        CopulaFamily family = CopulaFamily.parse(name);
        for (double[] u : new double[][]{{0.2, 0.7, 0.5}, {0.01, 0.02, 0.03}, {0.99, 0.95, 0.9}}) {
            double product = Arrays.stream(u).reduce(1, (a, b) -> a * b);
            assertEquals(product, family.at(0).cdf(u), 1e-12 * product + 1e-15);
            assertEquals(product, family.at(1e-9).cdf(u), 1e-8);
            double least = Arrays.stream(u).min().orElseThrow();
            double nearlyOne = name.equals("gaussian") ? 1 : 0.99999;
            assertEquals(least, family.at(nearlyOne).cdf(u), 2e-5);
            assertTrue(family.at(0.3).cdf(u) < family.at(0.31).cdf(u), "rising in tau");
        }
    }

    @ParameterizedTest
    @MethodSource("families")
    void survivalVersionTurnsTheCube(CopulaFamily family) {
        if (family.archimedean().isEmpty()) {
            return;
        }
        Archimedean copula = (Archimedean) family.at(0.35);
        Archimedean turned = new Archimedean(copula.family(), copula.theta(), !copula.survival());
        assertEquals(0.2 + 0.3 - 1 + copula.cdf(0.8, 0.7), turned.cdf(0.2, 0.3), 1e-15);
        double pairs = copula.cdf(0.8, 0.7, 1) + copula.cdf(0.8, 1, 0.6) + copula.cdf(1, 0.7, 0.6);
        double three = 1 - 0.8 - 0.7 - 0.6 + pairs - copula.cdf(0.8, 0.7, 0.6);
        assertEquals(three, turned.cdf(0.2, 0.3, 0.4), 1e-15);
        assertEquals(copula.upperTail(0, 1), turned.lowerTail(0, 1));
    }

    @ParameterizedTest
    @ValueSource(strings = {"clayton", "gumbel", "frank", "joe"})
    void strengthAndTauAreInverse(String name) {
        ArchimedeanFamily family = CopulaFamily.parse(name).archimedean().orElseThrow();
        for (double tau : new double[]{0, 1e-10, 1e-5, 0.01, 0.3, 0.5, 0.9, 0.99, 0.9999}) {
            assertEquals(tau, family.tauOf(family.thetaOf(tau)), 1e-13, "tau " + tau);
            if (family.leastTheta(2) < family.independentTheta()) {
                assertEquals(-tau, family.tauOf(family.thetaOf(-tau)), 1e-13, "tau " + -tau);
            }
        }
        assertEquals(family.independentTheta(), family.thetaOf(0));
    }

    @ParameterizedTest
    @MethodSource("families")
    void equalByValue(CopulaFamily family) {
        assertEquals(family.at(0.2), family.at(0.2));
        assertEquals(family.at(0.2).hashCode(), family.at(0.2).hashCode());
        assertEquals(family, CopulaFamily.parse(family.label()));
        assertEquals(family.label(), family.at(0.2).label());
    }
}
