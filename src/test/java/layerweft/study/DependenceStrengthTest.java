package layerweft.study;

import static org.junit.jupiter.api.Assertions.assertDoesNotThrow;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.util.List;
import java.util.SplittableRandom;
import layerweft.model.copula.Archimedean;
import layerweft.model.copula.ArchimedeanFamily;
import layerweft.model.copula.Comonotonic;
import layerweft.model.copula.Copula;
import layerweft.model.copula.Gaussian;
import layerweft.model.copula.Independence;
import layerweft.model.copula.MixtureCopula;
import layerweft.model.copula.Student;
import layerweft.study.DependenceStrength.Kind;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class DependenceStrengthTest {

    @Test
    void kindsAreToldApart() {
        Copula gumbel = Archimedean.ofKendallTau(ArchimedeanFamily.GUMBEL, false, 0.3);
        assertEquals(Kind.ONE_PERIL, DependenceStrength.of(gumbel, 1).kind());
        assertEquals(Kind.ONE_TAU, DependenceStrength.of(gumbel, 3).kind());
        assertEquals(Kind.INDEPENDENT, DependenceStrength.of(new Independence(), 3).kind());
        assertEquals(Kind.FIXED, DependenceStrength.of(new Comonotonic(), 3).kind());
        assertEquals(Kind.ONE_TAU, DependenceStrength.of(Gaussian.ofCorrelation(new double[][] {{1, 0.4}, {0.4, 1}}), 2).kind());
        assertEquals(Kind.PAIRS, DependenceStrength.of(new MixtureCopula(List.of(0.4, 0.6), List.of(gumbel, new Independence())), 2).kind());
        assertEquals(Kind.FIXED, DependenceStrength.of(new MixtureCopula(List.of(0.4, 0.6), List.of(new Comonotonic(), new Independence())), 2).kind());
    }

    @Test
    void onePerilCannotBeTurned() {
        assertThrows(IllegalStateException.class, () -> DependenceStrength.of(new Independence(), 1).at(0.3));
    }

    /** Any positive semi-definite matrix with a positive mean, turned anywhere within its reach, stays admissible and has the mean asked for. */
    @ParameterizedTest
    @ValueSource(longs = {1, 2, 3, 4, 5, 6, 7, 8, 9, 10})
    void everyTurnOfAMatrixIsAdmissible(long seed) {
        SplittableRandom random = new SplittableRandom(seed);
        int d = 3 + random.nextInt(4);
        double[][] loads = new double[d][2];
        for (double[] load : loads) {
            load[0] = random.nextDouble(0.2, 0.95);
            load[1] = random.nextDouble(-0.3, 0.3);
        }
        double[][] matrix = new double[d][d];
        for (int i = 0; i < d; i++) {
            for (int j = 0; j < d; j++) {
                matrix[i][j] = i == j ? 1 : Math.max(-1, Math.min(1, loads[i][0] * loads[j][0] + loads[i][1] * loads[j][1]));
            }
        }
        DependenceStrength strength = DependenceStrength.of(Student.ofCorrelation(matrix, 4), d);
        assertEquals(Kind.PAIRS, strength.kind(), "seed " + seed);
        for (double part : new double[] {0, 0.1, 0.5, 0.9, 1}) {
            double tau = strength.least() + part * (strength.most() - strength.least());
            Copula turned = strength.at(tau);
            assertDoesNotThrow(() -> turned.requireDimension(d), "seed " + seed);
            assertEquals(tau, DependenceStrength.of(turned, d).tau(), 1e-6, "seed " + seed);
        }
    }
}
