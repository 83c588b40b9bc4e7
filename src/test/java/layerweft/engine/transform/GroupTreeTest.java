package layerweft.engine.transform;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.SplittableRandom;
import java.util.stream.IntStream;
import java.util.stream.Stream;
import layerweft.model.copula.ArchimedeanFamily;
import layerweft.model.copula.Group;
import layerweft.model.copula.GroupedArchimedean;
import layerweft.model.frequency.NegativeBinomial;
import layerweft.model.frequency.Poisson;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** Counts under grouped copulas as a tree of latent factors, against the copula itself and against nodes by differences. */
class GroupTreeTest {
    private static final int[] ALL = IntStream.range(0, 8).toArray();

    private static CountMargin[] margins(int d) {
        return IntStream.range(0, d).mapToObj(i -> i % 3 == 1 ? new NegativeBinomial(0.3 + 0.3 * i, 1.5) : new Poisson(0.08 + 0.35 * i))
                .map(frequency -> CountMargin.of(frequency, 1e-12)).toArray(CountMargin[]::new);
    }

    /** Perils 0..7: groups within a group, one beside it, one peril alone. */
    private static GroupedArchimedean eight(ArchimedeanFamily family, boolean survival, double outer) {
        Group storm = Group.ofKendallTau(family, 0.5, List.of(0, 1), List.of());
        Group flood = Group.ofKendallTau(family, 0.4, List.of(2, 3), List.of());
        Group weather = Group.ofKendallTau(family, 0.2, List.of(4), List.of(storm, flood));
        Group fire = Group.ofKendallTau(family, 0.15, List.of(6, 7), List.of());
        return GroupedArchimedean.of(family, survival, Group.ofKendallTau(family, outer, List.of(), List.of(weather, fire)));
    }

    static Stream<GroupedArchimedean> copulas() {
        List<GroupedArchimedean> copulas = new ArrayList<>();
        for (ArchimedeanFamily family : ArchimedeanFamily.values()) {
            for (boolean survival : new boolean[] {false, true}) {
                copulas.add(eight(family, survival, 0.05));
            }
        }
        copulas.add(eight(ArchimedeanFamily.GUMBEL, false, 0));
        copulas.add(eight(ArchimedeanFamily.CLAYTON, true, 0.15));
        return copulas.stream();
    }

    /** P(N_i ≤ n_i for all i) of the tree; −1 leaves a peril out. */
    private static double joint(GroupTree tree, int[] n) {
        double[] values = joint(tree.root(), n);
        double sum = 0;
        for (int k = 0; k < values.length; k++) {
            sum += tree.weights()[k] * values[k];
        }
        return sum;
    }

    private static double[] joint(GroupTree.Branch branch, int[] n) {
        double[] values = new double[branch.nodes()];
        for (int k = 0; k < values.length; k++) {
            values[k] = 1;
            for (int i = 0; i < branch.members().length; i++) {
                int at = n[branch.members()[i]];
                values[k] *= at < 0 ? 1 : 1 - branch.survival()[i][k][at];
            }
        }
        for (int g = 0; g < branch.inside().size(); g++) {
            double[] inner = joint(branch.inside().get(g), n);
            for (int k = 0; k < values.length; k++) {
                double sum = 0;
                for (int m = 0; m < inner.length; m++) {
                    sum += branch.transitions().get(g)[k][m] * inner[m];
                }
                values[k] *= sum;
            }
        }
        return values;
    }

    @ParameterizedTest
    @MethodSource("copulas")
    void eightPerilsAgreeWithTheCopula(GroupedArchimedean copula) {
        CountMargin[] margins = margins(8);
        GroupTree tree = GroupTreeNodes.of(copula, ALL, margins, 1e-11);
        SplittableRandom random = new SplittableRandom(11);
        double worst = 0;
        for (int trial = 0; trial < 60; trial++) {
            int[] n = new int[8];
            double[] u = new double[8];
            double part = random.nextDouble();
            for (int i = 0; i < 8; i++) {
                n[i] = random.nextDouble() < 0.3 ? -1 : random.nextInt((int) Math.ceil(1 + part * (margins[i].size() - 1)));
                u[i] = n[i] < 0 ? 1 : margins[i].cdf()[n[i]];
            }
            worst = Math.max(worst, Math.abs(joint(tree, n) - copula.cdf(u)));
        }
        assertTrue(worst < 1e-9, copula.label() + " outer " + copula.root().theta() + ": " + worst + ", stated " + tree.error());
        assertTrue(worst < tree.error() + 1e-12, "stated " + tree.error() + ", found " + worst);
        assertTrue(tree.error() < 1e-7, "stated " + tree.error());
    }

    @Test
    void treeAndDifferencesAgreeWhereBothCanBeUsed() {
        CountMargin[] margins = margins(3);
        double[] losses = {3, 1, 2};
        for (ArchimedeanFamily family : ArchimedeanFamily.values()) {
            Group inner = Group.ofKendallTau(family, 0.5, List.of(0, 2), List.of());
            GroupedArchimedean copula = GroupedArchimedean.of(family, false, Group.ofKendallTau(family, 0.2, List.of(), List.of(inner)));
            LatentNodes nodes = GroupedNodes.of(copula, new int[] {0, 1, 2}, margins, 1e-11);
            GroupTree tree = GroupTreeNodes.of(copula, new int[] {0, 1, 2}, margins, 1e-11);
            for (double w : new double[] {0.01, 0.4, 1}) {
                double[] deficits = {w, 0.3, 1 - w / 2};
                assertEquals(nodes.at(deficits), tree.at(deficits), 2e-8, family + " " + w);
                assertEquals(nodes.at(deficits), tree.hits(new double[] {1, 0.5, 1}, 1e-9).at(deficits), 2e-8, family + " " + w);
            }
            assertEquals(nodes.productMoment(losses), tree.productMoment(losses), 1e-6 * nodes.productMoment(losses), family + " moment");
        }
    }
}
