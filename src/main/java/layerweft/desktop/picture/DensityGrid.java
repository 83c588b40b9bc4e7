package layerweft.desktop.picture;

import java.util.Arrays;
import java.util.function.DoubleBinaryOperator;
import org.apache.commons.statistics.distribution.NormalDistribution;

/**
 * The density of a pair copula with normal margins, φ(x)φ(y)c(Φ(x), Φ(y)), over a square of normal scores. Normal margins because the density stays
 * bounded and a tail shows as a point; on the unit square there would only be ink in a corner.
 */
final class DensityGrid {
    static final int SIZE = 90;
    /** Scores from −REACH to REACH. */
    static final double REACH = 3;

    private static final NormalDistribution NORMAL = NormalDistribution.of(0, 1);
    private static final double[] SCORES = new double[SIZE];
    private static final double[] LEVELS = new double[SIZE];
    private static final double[] MARGINS = new double[SIZE];

    static {
        for (int k = 0; k < SIZE; k++) {
            SCORES[k] = -REACH + 2 * REACH * k / (SIZE - 1);
            LEVELS[k] = NORMAL.cumulativeProbability(SCORES[k]);
            MARGINS[k] = NORMAL.density(SCORES[k]);
        }
    }

    private final double[] values = new double[SIZE * SIZE];

    DensityGrid(DoubleBinaryOperator density) {
        for (int j = 0; j < SIZE; j++) {
            for (int i = 0; i < SIZE; i++) {
                values[j * SIZE + i] = MARGINS[i] * MARGINS[j] * density.applyAsDouble(LEVELS[i], LEVELS[j]);
            }
        }
    }

    /** At node i across and j up. */
    double at(int i, int j) {
        return values[j * SIZE + i];
    }

    /** Where the score of a node lies in the square, from 0 to 1. */
    static double place(double node) {
        return node / (SIZE - 1);
    }

    /**
     * The heights whose contours enclose so much of the probability: of all regions that hold as much, the smallest.
     *
     * @param enclosed rising, each in (0, 1)
     * @return falling
     */
    double[] heights(double... enclosed) {
        double[] sorted = values.clone();
        Arrays.sort(sorted);
        double cell = 2 * REACH / (SIZE - 1);
        double[] heights = new double[enclosed.length];
        double mass = 0;
        int next = sorted.length;
        for (int k = 0; k < enclosed.length; k++) {
            while (next > 0 && mass < enclosed[k]) {
                mass += sorted[--next] * cell * cell;
            }
            heights[k] = sorted[Math.max(0, Math.min(next, sorted.length - 1))];
        }
        return heights;
    }
}
