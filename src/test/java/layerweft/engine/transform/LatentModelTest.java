package layerweft.engine.transform;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.Stream;
import layerweft.model.copula.Archimedean;
import layerweft.model.copula.ArchimedeanFamily;
import layerweft.model.copula.Comonotonic;
import layerweft.model.copula.Copula;
import layerweft.model.copula.Countermonotonic;
import layerweft.model.copula.CorrelationMatrix;
import layerweft.model.copula.Gaussian;
import layerweft.model.copula.Group;
import layerweft.model.copula.GroupedArchimedean;
import layerweft.model.copula.Independence;
import layerweft.model.copula.MixtureCopula;
import layerweft.model.copula.Student;
import layerweft.model.frequency.NegativeBinomial;
import layerweft.model.frequency.Poisson;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** Every way to the joint law of the counts against another one. */
class LatentModelTest {
    private static final CountMargin[] TWO = margins(0.9, 1.8);
    private static final CountMargin[] THREE = margins(0.9, 0.4, 0.2);

    private static CountMargin[] margins(double... means) {
        CountMargin[] margins = new CountMargin[means.length];
        for (int i = 0; i < means.length; i++) {
            margins[i] = CountMargin.of(i == 1 ? new NegativeBinomial(means[i], 1.4) : new Poisson(means[i]), 1e-10);
        }
        return margins;
    }

    private static int[] first(int d) {
        return java.util.stream.IntStream.range(0, d).toArray();
    }

    /** Largest |P(N ≤ n) by nodes − C(F(n))| over the lattice of counts. */
    private static double worst(LatentNodes nodes, Copula copula, CountMargin[] margins) {
        double worst = 0;
        int[] n = new int[margins.length];
        while (true) {
            double sum = 0;
            double[] u = new double[n.length];
            for (int k = 0; k < nodes.size(); k++) {
                double product = nodes.weights()[k];
                for (int i = 0; i < n.length; i++) {
                    product *= 1 - nodes.survival()[i][k][n[i]];
                }
                sum += product;
            }
            for (int i = 0; i < n.length; i++) {
                u[i] = margins[i].cdf()[n[i]];
            }
            worst = Math.max(worst, Math.abs(sum - copula.cdf(u)));
            int i = 0;
            while (i < n.length && ++n[i] == margins[i].size()) {
                n[i++] = 0;
            }
            if (i == n.length) {
                return worst;
            }
        }
    }

    static Stream<Archimedean> archimedean() {
        List<Archimedean> copulas = new ArrayList<>();
        for (ArchimedeanFamily family : ArchimedeanFamily.values()) {
            for (boolean survival : new boolean[] {false, true}) {
                for (double tau : new double[] {1e-5, 0.01, 0.1, 0.3, 0.5, 0.7, 0.9, 0.99}) {
                    copulas.add(Archimedean.ofKendallTau(family, survival, tau));
                }
            }
        }
        return copulas.stream();
    }

    @ParameterizedTest
    @MethodSource("archimedean")
    void frailtyQuadratureAgreesWithTheCopulaOnThreePerils(Archimedean copula) {
        LatentNodes nodes = LatentModel.of(copula, first(3), THREE, 1e-12);
        double worst = worst(nodes, copula, THREE);
        assertTrue(worst < 1e-9, copula.label() + " tau " + copula.kendallTau(0, 1) + ": " + worst);
        assertTrue(worst <= 3 * nodes.error() + 1e-11, "stated " + nodes.error() + " found " + worst);
    }

    @ParameterizedTest
    @MethodSource("archimedean")
    void differencesOfTheCopulaAgreeWithQuadratureOnTwoPerils(Archimedean copula) {
        LatentNodes differenced = DifferencedNodes.of(copula, TWO);
        assertTrue(worst(differenced, copula, TWO) < 1e-12);
        if (copula.kendallTau(0, 1) > 0.005) {
            LatentNodes quadrature = FrailtyNodes.of(copula.family(), copula.theta(), copula.generator(), copula.survival(), TWO, 1e-12);
            assertTrue(worst(quadrature, copula, TWO) < 1e-9, copula.label() + " " + copula.theta());
        }
    }

    static Stream<Copula> elliptical() {
        List<Copula> copulas = new ArrayList<>();
        for (double tau : new double[] {-0.9, -0.3, 0.05, 0.3, 0.6, 0.9}) {
            copulas.add(Gaussian.ofKendallTau(tau));
            copulas.add(Student.ofKendallTau(tau, 4));
        }
        copulas.add(Student.ofKendallTau(0, 3));
        copulas.add(Student.ofKendallTau(0.3, 30));
        return copulas.stream();
    }

    @ParameterizedTest
    @MethodSource("elliptical")
    void factorQuadratureAgreesWithTheCopulaOnTwoPerils(Copula copula) {
        LatentNodes nodes = LatentModel.of(copula, first(2), TWO, 1e-12);
        double worst = worst(nodes, copula, TWO);
        assertTrue(worst < 1e-9, copula.label() + " tau " + copula.kendallTau(0, 1) + ": " + worst);
    }

    @Test
    void generalMatrixOfThreePerilsAgreesWithOneFactorWhereThereIsOne() {
        double[] l = {0.8, -0.5, 0.6};
        double[][] rho = {{1, l[0] * l[1], l[0] * l[2]}, {l[0] * l[1], 1, l[1] * l[2]}, {l[0] * l[2], l[1] * l[2], 1}};
        CorrelationMatrix matrix = CorrelationMatrix.of(rho);
        double[] loadings = FactorNodes.loadings(matrix, first(3));
        assertEquals(0.8, Math.abs(loadings[0]), 1e-12);
        for (double nu : new double[] {Double.POSITIVE_INFINITY, 5}) {
            LatentNodes factor = FactorNodes.of(loadings, nu, THREE, 1e-11);
            LatentNodes general = ThreePerilNodes.of(matrix, first(3), nu, THREE, 1e-11);
            for (double w : new double[] {0.1, 0.5, 0.9}) {
                double[] deficits = {w, 0.3, 1 - w / 2};
                assertEquals(JointDeficit.at(factor, deficits), JointDeficit.at(general, deficits), 2e-8);
            }
        }
    }

    @Test
    void groupedCopulaAgreesWithItsDistributionFunction() {
        for (ArchimedeanFamily family : ArchimedeanFamily.values()) {
            for (boolean survival : new boolean[] {false, true}) {
                Group inner = Group.ofKendallTau(family, 0.5, List.of(0, 2), List.of());
                GroupedArchimedean copula = GroupedArchimedean.of(family, survival, Group.ofKendallTau(family, 0.2, List.of(), List.of(inner)));
                double worst = worst(LatentModel.of(copula, first(3), THREE, 1e-12), copula, THREE);
                assertTrue(worst < 1e-9, copula.label() + ": " + worst);
            }
        }
    }

    @Test
    void oneUniformCopulasAndMixturesAgreeWithTheirDistributionFunctions() {
        assertTrue(worst(LatentModel.of(new Comonotonic(), first(3), THREE, 1e-12), new Comonotonic(), THREE) < 1e-14);
        assertTrue(worst(LatentModel.of(new Countermonotonic(), first(2), TWO, 1e-12), new Countermonotonic(), TWO) < 1e-14);
        Copula mixture = new MixtureCopula(List.of(0.3, 0.7), List.of(new Comonotonic(), new Independence()));
        assertTrue(worst(LatentModel.of(mixture, first(3), THREE, 1e-12), mixture, THREE) < 1e-14);
        Copula negative = Archimedean.ofKendallTau(ArchimedeanFamily.CLAYTON, false, -0.4);
        assertTrue(worst(LatentModel.of(negative, first(2), TWO, 1e-12), negative, TWO) < 1e-12);
    }

    @Test
    void mergingStaysWithinItsBound() {
        Archimedean copula = Archimedean.ofKendallTau(ArchimedeanFamily.CLAYTON, false, 0.95);
        LatentNodes nodes = FrailtyNodes.of(copula.family(), copula.theta(), copula.generator(), false, THREE, 1e-12);
        LatentNodes merged = nodes.merged(1e-4);
        double worst = worst(merged, copula, THREE);
        assertTrue(merged.size() < nodes.size() / 3, merged.size() + " of " + nodes.size());
        assertTrue(worst <= merged.error() && worst > 1e-12, worst + " against " + merged.error());
    }
}
