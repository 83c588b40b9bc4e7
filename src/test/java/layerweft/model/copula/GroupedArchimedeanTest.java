package layerweft.model.copula;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.EnumSource;
import org.junit.jupiter.params.provider.MethodSource;

class GroupedArchimedeanTest {

    /** Perils 0 and 3 on the root, 1 and 2 in a group, 4 and 5 in a group with 6 and 7 inside it. */
    private static GroupedArchimedean threeFloors(ArchimedeanFamily family, boolean survival, double... tau) {
        Group innermost = Group.ofKendallTau(family, tau[2], List.of(6, 7), List.of());
        Group outer = Group.ofKendallTau(family, tau[1], List.of(4, 5), List.of(innermost));
        Group other = Group.ofKendallTau(family, tau[2], List.of(1, 2), List.of());
        return GroupedArchimedean.of(family, survival, Group.ofKendallTau(family, tau[0], List.of(), List.of(other, outer)));
    }

    static Stream<Arguments> strengths() {
        List<Arguments> all = new ArrayList<>();
        for (ArchimedeanFamily family : ArchimedeanFamily.values()) {
            for (double[] tau : new double[][]{{0, 0.3, 0.6}, {0.1, 0.3, 0.5}, {0.5, 0.5, 0.9}, {0.05, 0.9, 0.99}, {0.9, 0.95, 0.99},
                {0.2, 0.999, 0.9999}, {1e-9, 1e-6, 0.9}, {0.001, 0.002, 0.5}}) {
                all.add(Arguments.of(family, false, tau));
            }
            all.add(Arguments.of(family, true, new double[]{0.1, 0.3, 0.5}));
        }
        return all.stream();
    }

    /** 36 cases of 9 points; odds of false alarm with fresh seeds 5e-5. */
    @ParameterizedTest
    @MethodSource("strengths")
    void drawsFollowTheDistributionFunction(ArchimedeanFamily family, boolean survival, double[] tau) {
        GroupedArchimedean copula = threeFloors(family, survival, tau);
        Samples samples = Samples.draw(copula, 8, 20_000, 3);
        double[][] points = {
            {0.5, 1, 1, 0.4, 1, 1, 1, 1}, {0.5, 0.4, 1, 1, 1, 1, 1, 1}, {1, 0.3, 0.5, 1, 1, 1, 1, 1}, {1, 0.3, 1, 1, 1, 0.5, 1, 1},
            {1, 1, 1, 1, 0.1, 1, 0.2, 1}, {1, 1, 1, 1, 1, 1, 0.98, 0.99}, {0.9, 0.9, 0.9, 0.9, 0.9, 0.9, 0.9, 0.9},
            {0.6, 0.9, 0.7, 0.9, 0.8, 0.99, 0.7, 0.95}, {1, 1, 1, 1, 0.9, 0.95, 0.97, 0.9}};
        for (double[] u : points) {
            assertTrue(samples.deviation(copula.cdf(u), u) < 5.2,
                    () -> "C" + Arrays.toString(u) + " = " + copula.cdf(u) + ", seen " + samples.joint(u));
        }
        assertTrue(samples.kolmogorovSmirnov(7) < 2.8);
    }

    @ParameterizedTest
    @EnumSource(ArchimedeanFamily.class)
    void equalStrengthsAreOnePlainCopula(ArchimedeanFamily family) {
        for (boolean survival : new boolean[]{false, true}) {
            double[] u = {0.2, 0.9, 0.7, 0.4, 0.6, 0.95, 0.8, 0.5};
            assertEquals(Archimedean.ofKendallTau(family, survival, 0.4).cdf(u), threeFloors(family, survival, 0.4, 0.4, 0.4).cdf(u), 1e-13);
        }
    }

    @ParameterizedTest
    @EnumSource(ArchimedeanFamily.class)
    void groupsUnderAnIndependentRootAreIndependent(ArchimedeanFamily family) {
        GroupedArchimedean copula = threeFloors(family, false, 0, 0.3, 0.6);
        double product = 0.4 * copula.cdf(1, 0.2, 0.3, 1, 1, 1, 1, 1) * copula.cdf(1, 1, 1, 1, 0.3, 1, 0.5, 0.6);
        assertEquals(product, copula.cdf(0.4, 0.2, 0.3, 1, 0.3, 1, 0.5, 0.6), 1e-14);
    }

    @Test
    void pairsHaveTheStrengthOfTheirInnermostGroup() {
        GroupedArchimedean copula = threeFloors(ArchimedeanFamily.GUMBEL, false, 0.1, 0.3, 0.5);
        assertEquals(0.1, copula.kendallTau(0, 3), 1e-14);
        assertEquals(0.1, copula.kendallTau(1, 7), 1e-14);
        assertEquals(0.5, copula.kendallTau(1, 2), 1e-14);
        assertEquals(0.3, copula.kendallTau(4, 6), 1e-14);
        assertEquals(0.5, copula.kendallTau(7, 6), 1e-14);
        assertEquals(2 - Math.sqrt(2), copula.upperTail(6, 7), 1e-14);
        assertEquals(0, copula.lowerTail(6, 7));
        assertEquals(copula.cdf(1, 1, 1, 1, 0.3, 1, 0.6, 1), copula.pair(4, 6).cdf(0.3, 0.6), 1e-14);
        assertEquals(List.of(0, 3), copula.rootMembers(8));
    }

    @Test
    void survivalFunctionInManyDimensionsIsRefused() {
        GroupedArchimedean copula = threeFloors(ArchimedeanFamily.GUMBEL, true, 0.1, 0.3, 0.5);
        double[] u = new double[21];
        Arrays.fill(u, 0.9);
        assertThrows(UnsupportedOperationException.class, () -> copula.cdf(u));
        Arrays.fill(u, 3, 12, 1);
        assertTrue(copula.cdf(u) > 0.1);
    }
}
