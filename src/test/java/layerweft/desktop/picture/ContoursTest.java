package layerweft.desktop.picture;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.HashMap;
import java.util.Map;
import org.junit.jupiter.api.Test;

class ContoursTest {
    private static final DensityGrid INDEPENDENT = new DensityGrid((u, v) -> 1);

    private static double score(double node) {
        return DensityGrid.REACH * (2 * DensityGrid.place(node) - 1);
    }

    /** Of two independent normal scores the circle of radius r holds 1 − exp(−r²/2) (Rayleigh). */
    @Test
    void contoursOfIndependenceAreCirclesThatHoldTheirPart() {
        for (double part : new double[] {0.25, 0.5, 0.9}) {
            double radius = Math.sqrt(-2 * Math.log(1 - part));
            Contours.trace(INDEPENDENT, INDEPENDENT.heights(part)[0], (x1, y1, x2, y2) -> assertEquals(radius, Math.hypot(score(x1), score(y1)), 0.04, "at " + part));
        }
    }

    @Test
    void aContourInsideTheSquareIsClosed() {
        Map<String, Integer> ends = new HashMap<>();
        Contours.trace(INDEPENDENT, 0.999 * INDEPENDENT.heights(0.5)[0], (x1, y1, x2, y2) -> {
            ends.merge(String.format("%.9f %.9f", x1, y1), 1, Integer::sum);
            ends.merge(String.format("%.9f %.9f", x2, y2), 1, Integer::sum);
        });
        assertTrue(ends.size() > 40);
        ends.forEach((at, pieces) -> assertEquals(2, pieces, at));
    }

    @Test
    void aHigherPartHasALowerContour() {
        double[] heights = INDEPENDENT.heights(0.1, 0.5, 0.9);
        assertTrue(heights[0] > heights[1] && heights[1] > heights[2]);
    }
}
