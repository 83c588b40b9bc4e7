package layerweft.engine.transform;

import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import layerweft.model.copula.Archimedean;
import layerweft.model.copula.ArchimedeanFamily;
import layerweft.model.copula.Comonotonic;
import layerweft.model.copula.Copula;
import layerweft.model.copula.Countermonotonic;
import layerweft.model.copula.Gaussian;
import layerweft.model.copula.Independence;
import layerweft.model.copula.MixtureCopula;
import layerweft.model.copula.Student;
import org.junit.jupiter.api.Test;

class ConvexOrderTest {
    private static final int[] PAIR = {0, 1};

    /** P(X = k), k = 0..4, and the same with the masses at 1 and 3 spread to their neighbours. */
    private static final double[] LAW = {0.3, 0.25, 0.1, 0.3, 0.05};

    private static final double[] SPREAD = {0.425, 0, 0.375, 0, 0.2};

    /** E[(X + Y − d)+] of two such variables, from differences of C. */
    private static double stopLoss(Copula copula, double[] law, int d) {
        double sum = 0;
        double[] cdf = new double[6];
        for (int k = 0; k < 5; k++) {
            cdf[k + 1] = Math.min(1, cdf[k] + law[k]);
        }
        for (int i = 0; i < 5; i++) {
            for (int j = 0; j < 5; j++) {
                double p = copula.cdf(cdf[i + 1], cdf[j + 1]) - copula.cdf(cdf[i], cdf[j + 1]) - copula.cdf(cdf[i + 1], cdf[j]) + copula.cdf(cdf[i], cdf[j]);
                sum += p * Math.max(0, i + j - d);
            }
        }
        return sum;
    }

    @Test
    void sumsKeepTheOrderOfTheirPartsUnderTheCopulasNamed() {
        for (double tau : new double[] {0.1, 0.4, 0.8}) {
            for (boolean survival : new boolean[] {false, true}) {
                for (ArchimedeanFamily family : ArchimedeanFamily.values()) {
                    ordered(Archimedean.ofKendallTau(family, survival, tau));
                }
            }
            ordered(Gaussian.ofKendallTau(tau));
        }
        ordered(new Independence());
        ordered(new Comonotonic());
        ordered(new MixtureCopula(List.of(0.3, 0.7), List.of(new Comonotonic(), Gaussian.ofKendallTau(0.2))));
    }

    private static void ordered(Copula copula) {
        assertTrue(ConvexOrder.keptBy(copula, PAIR), copula.label());
        for (int d = 0; d < 8; d++) {
            assertTrue(stopLoss(copula, LAW, d) <= stopLoss(copula, SPREAD, d) + 1e-12, copula + " at " + d);
        }
    }

    @Test
    void othersAreNotTrusted() {
        assertFalse(ConvexOrder.keptBy(new Countermonotonic(), PAIR));
        assertFalse(ConvexOrder.keptBy(Gaussian.ofKendallTau(-0.2), PAIR));
        assertFalse(ConvexOrder.keptBy(Archimedean.ofKendallTau(ArchimedeanFamily.FRANK, false, -0.2), PAIR));
        assertFalse(ConvexOrder.keptBy(Student.ofKendallTau(0.3, 4), PAIR));
        assertFalse(ConvexOrder.keptBy(new MixtureCopula(List.of(0.3, 0.7), List.of(new Independence(), Gaussian.ofKendallTau(-0.2))), PAIR));
        // countermonotonic: a spread part can make the sum less dangerous
        assertTrue(stopLoss(new Countermonotonic(), LAW, 4) > stopLoss(new Countermonotonic(), SPREAD, 4)
                || stopLoss(new Countermonotonic(), LAW, 5) > stopLoss(new Countermonotonic(), SPREAD, 5)
                || stopLoss(new Countermonotonic(), LAW, 3) > stopLoss(new Countermonotonic(), SPREAD, 3));
    }
}
