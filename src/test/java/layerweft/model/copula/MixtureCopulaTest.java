package layerweft.model.copula;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class MixtureCopulaTest {
    private final MixtureCopula inner = new MixtureCopula(List.of(0.5, 0.5),
            List.of(new Comonotonic(), CopulaFamily.parse("student:3").at(0.2)));
    private final MixtureCopula mixture = new MixtureCopula(List.of(0.2, 0.5, 0.3),
            List.of(new Independence(), CopulaFamily.parse("survival-clayton").at(0.5), inner));

    @Test
    void isTheWeightedSum() {
        double[] u = {0.2, 0.5, 0.7};
        double student = CopulaFamily.parse("student:3").at(0.2).cdf(u);
        double clayton = CopulaFamily.parse("survival-clayton").at(0.5).cdf(u);
        assertEquals(0.2 * 0.07 + 0.5 * clayton + 0.15 * 0.2 + 0.15 * student, mixture.cdf(u), 1e-14);
        double studentTail = CopulaFamily.parse("student:3").at(0.2).upperTail(0, 1);
        assertEquals(0.5 * Math.sqrt(0.5) + 0.15 + 0.15 * studentTail, mixture.upperTail(0, 1), 1e-14);
    }

    /** Odds of false alarm with fresh seeds 2e-6. */
    @Test
    void drawsFollowTheDistributionFunction() {
        Samples samples = Samples.draw(mixture, 3, 40_000, 8);
        for (double[] u : new double[][]{{0.2, 0.5, 0.7}, {0.01, 0.02, 1}, {0.99, 0.98, 0.97}, {0.1, 1, 0.9}}) {
            assertTrue(samples.deviation(mixture.cdf(u), u) < 5, () -> "seen " + samples.joint(u) + " for " + mixture.cdf(u));
        }
        assertTrue(samples.kolmogorovSmirnov(0) < 2.8);
        // sd of tau is at most √(2/n)
        assertEquals(mixture.kendallTau(0, 2), samples.kendallTau(0, 2, 2000), 5 * Math.sqrt(2.0 / 2000));
    }

    @Test
    void weightsAreScaledToOne() {
        MixtureCopula scaled = new MixtureCopula(List.of(0.5, 0.5 + 5e-10), List.of(new Independence(), new Comonotonic()));
        assertEquals(1, scaled.weights().stream().mapToDouble(w -> w).sum(), 1e-15);
        assertEquals(1, scaled.cdf(1, 1), 1e-15);
    }

    /** Q(Π, M) = 1/3, Q(Π, W) = −1/3, Q(M, W) = 0 (Nelsen 2006, Theorem 5.1.3 and its corollaries). */
    @Test
    void tauOfTheBoundsAndIndependence() {
        assertEquals(0.25 * 0 + 0.25 * 1 + 0.5 / 3, halfAndHalf(new Independence(), new Comonotonic()), 1e-9);
        assertEquals(0.25 * -1 - 0.5 / 3, halfAndHalf(new Countermonotonic(), new Independence()), 1e-9);
        assertEquals(0, halfAndHalf(new Countermonotonic(), new Comonotonic()), 1e-9);
    }

    private static double halfAndHalf(Copula first, Copula second) {
        return new MixtureCopula(List.of(0.5, 0.5), List.of(first, second)).kendallTau(0, 1);
    }

    @ParameterizedTest
    @CsvSource({"gumbel, 0.3", "clayton, 0.6", "joe, 0.9", "frank, -0.5", "gaussian, 0.5"})
    void concordanceOfNeighboursIsTheirTau(String family, double tau) {
        CopulaFamily parsed = CopulaFamily.parse(family);
        assertEquals(tau, Concordance.of(parsed.at(tau), parsed.at(tau + 1e-9)), 5e-4);
    }
}
