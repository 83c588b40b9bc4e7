package layerweft.study;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.function.DoubleUnaryOperator;
import layerweft.figures.Figure;
import org.junit.jupiter.api.Test;

class TauScanTest {

    private static TauScan.Roots scan(DoubleUnaryOperator difference, double error) {
        return new TauScan(tau -> new Figure(difference.applyAsDouble(tau), error), 1e-8).on(0, 0.95);
    }

    @Test
    void oneRootIsFoundWithTheErrorOfTheDifference() {
        TauScan.Roots roots = scan(tau -> 2 * (tau - 0.377), 1e-4);
        assertEquals(1, roots.roots().size());
        assertEquals(0.377, roots.roots().get(0).value(), 1e-7);
        assertEquals(5e-5, roots.roots().get(0).error(), 1e-7);
        assertEquals(-1, roots.signBelow());
        assertEquals(-0.754, roots.atLow().value(), 1e-12);
        assertEquals(1.146, roots.atHigh().value(), 1e-12);
    }

    @Test
    void rootsOnGridPointsAndSeveralOfThemAreFound() {
        TauScan.Roots roots = scan(tau -> (tau - 0.2) * (tau - 0.5) * (tau - 0.8), 1e-12);
        assertEquals(3, roots.roots().size());
        assertEquals(0.2, roots.roots().get(0).value(), 1e-6);
        assertEquals(0.5, roots.roots().get(1).value(), 1e-6);
        assertEquals(0.8, roots.roots().get(2).value(), 1e-6);
        assertEquals(-1, roots.signBelow());
    }

    @Test
    void twoRootsWithinOneStepOfTheGridAreFound() {
        TauScan.Roots roots = scan(tau -> (tau - 0.412) * (tau - 0.431), 1e-12);
        assertEquals(2, roots.roots().size());
        assertEquals(0.412, roots.roots().get(0).value(), 1e-6);
        assertEquals(0.431, roots.roots().get(1).value(), 1e-6);
        assertEquals(1, roots.signBelow());
    }

    @Test
    void touchingWithoutCrossingIsNoRoot() {
        TauScan.Roots roots = scan(tau -> (tau - 0.42) * (tau - 0.42) + 1e-6, 1e-9);
        assertTrue(roots.roots().isEmpty());
        assertEquals(1, roots.signBelow());
    }

    @Test
    void differencesWithinTheirErrorHaveNoSign() {
        assertEquals(0, scan(tau -> 1e-5 * (tau - 0.4), 1e-4).signBelow());
        assertTrue(scan(tau -> 1e-5 * (tau - 0.4), 1e-4).roots().isEmpty());
        assertEquals(0, scan(tau -> 0, 0).signBelow());
        assertEquals(1, scan(tau -> tau, 1e-9).signBelow(), "0 at the low end and positive above");
    }

    @Test
    void infiniteCostsAreNotCompared() {
        assertFalse(scan(tau -> tau > 0.5 ? Double.POSITIVE_INFINITY : -1, 0).defined());
        assertFalse(scan(tau -> Double.NaN, 0).defined());
    }
}
