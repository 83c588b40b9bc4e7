package layerweft.model.copula;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.function.DoubleBinaryOperator;
import org.apache.commons.statistics.distribution.NormalDistribution;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

class PairDensityTest {
    private static final double STEP = 2e-3;

    static List<Copula> pairs() {
        List<Copula> pairs = new ArrayList<>();
        for (double tau : new double[] {0.05, 0.3, 0.7}) {
            CopulaFamily.withStrength().forEach(family -> pairs.add(family.at(tau)));
        }
        for (CopulaFamily family : CopulaFamily.withStrength()) {
            if (family.tauRange(2).contains(-0.3)) {
                pairs.add(family.at(-0.3));
            }
        }
        pairs.add(new MixtureCopula(List.of(0.4, 0.6), List.of(Gaussian.ofKendallTau(0.5), new Independence())));
        return pairs;
    }

    /** Mass of a small square by C itself, against the density at its middle: equal to the fourth order of the side by Richardson's rule. */
    @ParameterizedTest
    @MethodSource("pairs")
    void isTheMixedDerivativeOfTheDistributionFunction(Copula pair) {
        DoubleBinaryOperator density = PairDensity.of(pair).orElseThrow();
        for (double[] at : new double[][] {{0.3, 0.4}, {0.5, 0.5}, {0.9, 0.8}, {0.62, 0.95}, {0.1, 0.12}}) {
            double mass = (4 * mass(pair, at[0], at[1], STEP) - mass(pair, at[0], at[1], 2 * STEP)) / 3;
            assertEquals(mass, density.applyAsDouble(at[0], at[1]), 2e-4 * Math.max(1, mass), pair.label() + " " + pair.kendallTau(0, 1) + " at " + at[0] + ", " + at[1]);
        }
    }

    private static double mass(Copula pair, double u, double v, double h) {
        return (pair.cdf(u + h, v + h) - pair.cdf(u - h, v + h) - pair.cdf(u + h, v - h) + pair.cdf(u - h, v - h)) / (4 * h * h);
    }

    /** In normal scores over ±6, where all but 1e-8 of the mass lies, by the trapezoidal rule. */
    @ParameterizedTest
    @MethodSource("pairs")
    void hasTheMassOne(Copula pair) {
        DoubleBinaryOperator density = PairDensity.of(pair).orElseThrow();
        NormalDistribution normal = NormalDistribution.of(0, 1);
        double step = 0.05;
        double mass = 0;
        for (double x = -6; x <= 6; x += step) {
            for (double y = -6; y <= 6; y += step) {
                double c = density.applyAsDouble(normal.cumulativeProbability(x), normal.cumulativeProbability(y));
                mass += c * normal.density(x) * normal.density(y) * step * step;
            }
        }
        assertEquals(1, mass, 3e-3, pair.label() + " " + pair.kendallTau(0, 1));
    }

    @ParameterizedTest
    @MethodSource("pairs")
    void staysFiniteInTheCorners(Copula pair) {
        DoubleBinaryOperator density = PairDensity.of(pair).orElseThrow();
        for (double u : new double[] {1e-9, 1e-3, 1 - 1e-3, 1 - 1e-9}) {
            for (double v : new double[] {1e-9, 1e-3, 1 - 1e-3, 1 - 1e-9}) {
                double c = density.applyAsDouble(u, v);
                assertTrue(c >= 0 && c < Double.POSITIVE_INFINITY, pair.label() + " at " + u + ", " + v + ": " + c);
            }
        }
    }

    @Test
    void isFiniteAtStrongDependence() {
        for (CopulaFamily family : CopulaFamily.withStrength()) {
            double c = PairDensity.of(family.at(0.99)).orElseThrow().applyAsDouble(0.999, 0.999);
            assertTrue(c > 1 && c < Double.POSITIVE_INFINITY, family.label() + ": " + c);
        }
    }

    @Test
    void noPairOnALineHasOne() {
        assertTrue(PairDensity.of(new Comonotonic()).isEmpty());
        assertTrue(PairDensity.of(Gaussian.ofKendallTau(1)).isEmpty());
        assertTrue(PairDensity.of(Archimedean.ofTheta(ArchimedeanFamily.CLAYTON, false, -1)).isEmpty());
    }
}
