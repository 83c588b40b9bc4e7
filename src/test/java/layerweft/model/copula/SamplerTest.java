package layerweft.model.copula;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.stream.Stream;
import layerweft.model.random.KeyedStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;

/**
 * What the samplers draw against what the distribution functions say. Seeds are fixed; with fresh ones a deviation of 5.2 standard errors has
 * odds of 2e-7 a check, about 1,100 checks give 1 false alarm in 4,000 runs.
 */
class SamplerTest {
    private static final double MOST = 5.2;
    private static final int YEARS = 20_000;

    static Stream<Arguments> strengths() {
        List<Arguments> all = new ArrayList<>();
        for (CopulaFamily family : Samples.families().toList()) {
            for (double tau : new double[]{0, 0.1, 0.5, 0.9, 0.99}) {
                for (int dimension : new int[]{2, 3, 8, 64}) {
                    all.add(Arguments.of(family.label(), tau, dimension));
                }
            }
        }
        for (String family : List.of("clayton", "survival-clayton", "frank", "survival-frank", "gaussian", "student:4", "student:0.5")) {
            for (double tau : new double[]{-0.1, -0.5, -0.9, -0.99}) {
                all.add(Arguments.of(family, tau, 2));
            }
        }
        all.add(Arguments.of("clayton", -1.0, 2));
        all.add(Arguments.of("gaussian", -0.25, 3));
        all.add(Arguments.of("student:4", -0.25, 3));
        for (String family : List.of("independence", "comonotonic")) {
            all.add(Arguments.of(family, 0.0, 2));
            all.add(Arguments.of(family, 0.0, 64));
        }
        all.add(Arguments.of("countermonotonic", 0.0, 2));
        return all.stream();
    }

    @ParameterizedTest
    @MethodSource("strengths")
    void jointProbabilitiesMarginsAndTau(String family, double tau, int dimension) {
        Copula copula = CopulaFamily.parse(family).at(tau);
        long seed = (family + tau + dimension).hashCode();
        Samples samples = Samples.draw(copula, dimension, YEARS, seed);
        for (double[] u : corners(dimension)) {
            assertTrue(samples.deviation(copula.cdf(u), u) < MOST, () -> "seed " + seed + ", C" + Arrays.toString(u) + " = " + copula.cdf(u)
                    + ", seen " + samples.joint(u));
        }
        // odds of false alarm 2exp(-2·2.8²) = 3e-7
        assertTrue(samples.kolmogorovSmirnov(dimension - 1) < 2.8, () -> "seed " + seed);
        int count = 1200;
        double error = Math.sqrt(2 * (1 - Math.pow(copula.kendallTau(0, 1), 2)) / count);
        assertEquals(copula.kendallTau(0, 1), samples.kendallTau(0, dimension - 1, count), MOST * error + 1e-12, () -> "seed " + seed);
    }

    /** Two low, two high, all high (for at most 8 variables: survival functions are sums over subsets), all graded. */
    private static List<double[]> corners(int d) {
        List<double[]> corners = new ArrayList<>();
        corners.add(with(d, 0.05, 0.1));
        corners.add(with(d, 0.4, 0.6));
        corners.add(with(d, 0.99, 0.98));
        corners.add(with(d, 0.02, 0.97));
        double[] graded = new double[d];
        double[] level = new double[d];
        for (int i = 0; i < d; i++) {
            graded[i] = i < 8 ? 0.5 + 0.5 * (i + 0.5) / Math.min(d, 8) : 1;
            level[i] = i < 8 ? Math.pow(0.5, 1.0 / Math.min(d, 8)) : 1;
        }
        corners.add(graded);
        corners.add(level);
        return corners;
    }

    private static double[] with(int d, double first, double last) {
        double[] u = new double[d];
        Arrays.fill(u, 1);
        u[0] = first;
        u[d - 1] = last;
        return u;
    }

    @ParameterizedTest
    @MethodSource("inManyDimensions")
    void allOfSixtyFourTogether(String family, double tau) {
        Copula copula = CopulaFamily.parse(family).at(tau);
        Samples samples = Samples.draw(copula, 64, YEARS, 64);
        double[] u = new double[64];
        for (int i = 0; i < 64; i++) {
            u[i] = 1 - 0.02 * (i + 1) / 64;
        }
        assertTrue(samples.deviation(copula.cdf(u), u) < MOST, () -> "C = " + copula.cdf(u) + ", seen " + samples.joint(u));
    }

    static Stream<Arguments> inManyDimensions() {
        return Stream.of("clayton", "gumbel", "frank", "joe", "gaussian", "student:4")
                .flatMap(f -> Stream.of(0.1, 0.5, 0.99).map(tau -> Arguments.of(f, tau)));
    }

    @ParameterizedTest
    @MethodSource("kinds")
    void yearsDependOnTheirSlotAlone(Copula copula) {
        ScoreSampler sampler = copula.sampler(3);
        double[][] whole = new double[3][50];
        sampler.draw(new KeyedStream(5), 100, 50, whole);
        double[][] part = new double[3][10];
        KeyedStream used = new KeyedStream(5);
        used.nextLong();
        sampler.draw(used, 120, 10, part);
        for (int i = 0; i < 3; i++) {
            assertArrayEquals(Arrays.copyOfRange(whole[i], 20, 30), part[i]);
        }
        assertEquals(3, sampler.dimension());
    }

    static Stream<Copula> kinds() {
        Group nested = new Group(1.2, List.of(2), List.of(new Group(3, List.of(0, 1), List.of())));
        return Stream.of(Stream.of(new Independence(), new Comonotonic(), GroupedArchimedean.of(ArchimedeanFamily.JOE, true, nested),
                        Gaussian.ofCorrelation(new double[][]{{1, 0.3, 0.2}, {0.3, 1, -0.4}, {0.2, -0.4, 1}}),
                        new MixtureCopula(List.of(0.4, 0.6), List.of(new Comonotonic(), Gaussian.ofKendallTau(0.3)))),
                Samples.families().map(f -> f.at(0.4))).flatMap(s -> s);
    }

    @Test
    void familiesShareTheYearsExponentials() {
        // at the limit of tau = 0 every Archimedean family draws what independence draws
        Samples free = Samples.draw(new Independence(), 4, 100, 3);
        for (ArchimedeanFamily family : ArchimedeanFamily.values()) {
            Samples limit = Samples.draw(Archimedean.ofKendallTau(family, false, 0), 4, 100, 3);
            for (int y = 0; y < 100; y++) {
                assertEquals(free.sampler().uniform(2, free.scores()[2][y]), limit.sampler().uniform(2, limit.scores()[2][y]), 1e-13);
            }
        }
    }

    @ParameterizedTest
    @MethodSource("extremes")
    void extremeStrengthsGiveNumbers(Copula copula) {
        int d = copula.kendallTau(0, 1) < 0 ? 2 : 3;
        Samples samples = Samples.draw(copula, d, YEARS, 11);
        for (double[] row : samples.scores()) {
            assertFalse(Arrays.stream(row).anyMatch(s -> !Double.isFinite(s)));
        }
        assertTrue(samples.kolmogorovSmirnov(1) < 2.8);
    }

    static Stream<Copula> extremes() {
        List<Copula> all = new ArrayList<>();
        for (CopulaFamily family : CopulaFamily.withStrength()) {
            for (double tau : new double[]{1e-12, 1e-6, 0.999, 0.9999}) {
                all.add(family.at(tau));
            }
            if (family.tauRange(2).contains(-0.999)) {
                all.add(family.at(-1e-9));
                all.add(family.at(-0.999));
            }
        }
        for (double nu : new double[]{0.1, 1e6, 1e12}) {
            all.add(Student.ofKendallTau(0.5, nu));
        }
        return all.stream();
    }
}
