package layerweft.engine.transform;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.stream.IntStream;
import layerweft.model.copula.Archimedean;
import layerweft.model.copula.ArchimedeanFamily;
import layerweft.model.copula.Comonotonic;
import layerweft.model.copula.Copula;
import layerweft.model.copula.Countermonotonic;
import layerweft.model.copula.Independence;
import layerweft.model.copula.Student;
import org.junit.jupiter.api.Test;

class DependentSumTest {
    private static final int N = 24;

    private static CountMargin margin(double[] mass) {
        double[] survival = new double[N];
        double[] cdf = new double[N];
        double above = 1;
        for (int k = 0; k < N; k++) {
            above -= k < mass.length ? mass[k] : 0;
            survival[k] = Math.max(0, above);
            cdf[k] = 1 - survival[k];
        }
        return new CountMargin(cdf, survival);
    }

    /** P(sum &gt; k) from all differences of C. */
    private static double[] differenced(Copula copula, CountMargin a, CountMargin b) {
        double[] survival = new double[N];
        for (int i = 0; i < N; i++) {
            for (int j = 0; j < N; j++) {
                double mass = c(copula, a, b, i, j) - c(copula, a, b, i - 1, j) - c(copula, a, b, i, j - 1) + c(copula, a, b, i - 1, j - 1);
                for (int k = 0; k < Math.min(N, i + j); k++) {
                    survival[k] += mass;
                }
            }
        }
        return survival;
    }

    private static double c(Copula copula, CountMargin a, CountMargin b, int i, int j) {
        return i < 0 || j < 0 ? 0 : copula.cdf(a.cdf()[i], b.cdf()[j]);
    }

    @Test
    void everyRouteAgreesWithDifferencesOfTheCopula() {
        CountMargin a = margin(new double[] {0.3, 0.2, 0.1, 0.1, 0.15, 0.05, 0.06, 0.04});
        CountMargin b = margin(new double[] {0.1, 0.5, 0.1, 0.05, 0.05, 0.2});
        for (Copula copula : new Copula[] {new Independence(), new Comonotonic(), new Countermonotonic(), Student.ofKendallTau(-0.4, 4),
            Archimedean.ofKendallTau(ArchimedeanFamily.JOE, true, 0.6), Archimedean.ofKendallTau(ArchimedeanFamily.FRANK, false, -0.5)}) {
            double[] sum = DependentSum.survival(copula, new int[] {0, 1}, new CountMargin[] {a, b}, 1e-10);
            double[] expected = differenced(copula, a, b);
            IntStream.range(0, 14).forEach(k -> assertEquals(expected[k], sum[k], 2e-8, copula.label() + " " + k));
        }
    }
}
