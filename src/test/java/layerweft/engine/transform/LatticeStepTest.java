package layerweft.engine.transform;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;

class LatticeStepTest {

    @Test
    void dividesCommensurableAmounts() {
        double step = LatticeStep.of(30, new double[] {45, 105}, new double[] {5}, 105, 16);
        for (double amount : new double[] {30, 45, 105, 5}) {
            assertTrue(LatticeStep.holds(amount, step), amount + " on " + step);
        }
        assertTrue(30 / step >= 16);
    }

    @Test
    void keepsTheCapOnTheLatticeWhereTheRestHasNoCommonStep() {
        double step = LatticeStep.of(30, new double[] {Math.PI * 10, 30 * Math.E}, new double[0], 30 * Math.E, 16);
        assertTrue(LatticeStep.holds(30, step));
        assertEquals(32, LatticeStep.cells(31.4, 1.0));
        assertEquals(31, LatticeStep.cells(31 + 1e-12, 1.0));
    }

    @Test
    void findsTheCommonStepOfDecimals() {
        assertEquals(0.1, LatticeStep.common(new double[] {0.3, 0.7, 1.2}, 0.01), 1e-15);
        assertTrue(Double.isNaN(LatticeStep.common(new double[] {1, Math.sqrt(2)}, 0.01)));
    }
}
