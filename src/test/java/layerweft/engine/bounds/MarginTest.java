package layerweft.engine.bounds;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.api.Test;

class MarginTest {
    /** P(0) = 0.5, P(10) = 0.3, P(40) = 0.2. */
    private final Margin margin = Margin.of(new double[] {0, 10, 40}, new double[] {0.5, 0.2, 0});

    @Test
    void limitedMeanIsTheAreaUnderTheSurvivalFunction() {
        assertEquals(0.5 * 4, margin.limited(4), 1e-15);
        assertEquals(0.5 * 10 + 0.2 * 15, margin.limited(25), 1e-15);
        assertEquals(0.3 * 10 + 0.2 * 40, margin.mean(), 1e-15);
        assertEquals(margin.mean(), margin.limited(1000));
    }

    @Test
    void lawsThatStartAboveZeroAreLimitedInFullBelow() {
        assertEquals(3, Margin.of(new double[] {5, 6}, new double[] {0.5, 0}).limited(3));
    }

    @Test
    void atomsWithoutProbabilityAndRisingRoundingAreLeftOut() {
        Margin cleaned = Margin.of(new double[] {0, 1, 2, 3}, new double[] {0.4, 0.4, 0.4000000001, 0.3});
        assertEquals(2, cleaned.atoms());
        assertEquals(0.6 * 0 + 0.4 * 3, cleaned.mean(), 1e-15);
    }

    @Test
    void atomsAreFoundFromTheirChanceOfBeingPassed() {
        assertEquals(2, margin.atomFrom(0));
        assertEquals(1, margin.atomFrom(0.2));
        assertEquals(2, margin.atomBelow(0.2));
        assertEquals(0, margin.atomFrom(0.7));
        assertEquals(0, margin.atomBelow(1));
    }

    @Test
    void slicesKeepTheMeanAndFall() {
        assertArrayEquals(new double[] {(0.2 * 40 + 0.05 * 10) / 0.25, 10, 0, 0}, margin.slices(1, 4), 1e-13);
        assertArrayEquals(new double[] {40, (0.05 * 40 + 0.1 * 10) / 0.15}, margin.slices(0.3, 2), 1e-13);
    }

    @Test
    void mirroredLawsHaveTheSameChances() {
        Margin mirrored = margin.mirrored(50);
        assertEquals(50 - margin.mean(), mirrored.mean(), 1e-14);
        assertEquals(0.8, mirrored.above(0), 1e-15);
        assertEquals(10, mirrored.value(0));
        assertEquals(50, mirrored.largest());
    }
}
