package layerweft.study;

import java.util.Arrays;
import layerweft.model.copula.Copula;
import org.apache.commons.statistics.distribution.NormalDistribution;

/**
 * The density of a pair under a copula with normal margins, φ(x)·φ(y)·c(Φ(x), Φ(y)), averaged over the cells of a square grid by second differences of C:
 * bounded, so that a tail shows as a point.
 *
 * @param reach the grid goes from −reach to reach in both directions
 * @param density cell × cell, by x then y
 * @param levels densities inside whose contours lie given parts of the probability, rising
 */
public record CopulaDensity(double reach, double[][] density, double[] levels) {
    /** Parts of the probability outside the contours, from the outermost. */
    private static final double[] OUTSIDE = {0.05, 0.15, 0.3, 0.5, 0.7, 0.88};

    /** @param cells in each direction */
    public static CopulaDensity of(Copula pair, int cells, double reach) {
        double step = 2 * reach / cells;
        double[] u = new double[cells + 1];
        for (int i = 0; i <= cells; i++) {
            u[i] = NormalDistribution.of(0, 1).cumulativeProbability(-reach + i * step);
        }
        double[][] density = new double[cells][cells];
        double[] before = new double[cells + 1];
        for (int i = 0; i <= cells; i++) {
            double[] row = new double[cells + 1];
            for (int j = 0; j <= cells; j++) {
                row[j] = pair.cdf(u[i], u[j]);
            }
            for (int j = 1; i > 0 && j <= cells; j++) {
                density[i - 1][j - 1] = Math.max(0, row[j] - row[j - 1] - before[j] + before[j - 1]) / (step * step);
            }
            before = row;
        }
        return new CopulaDensity(reach, density, levels(density));
    }

    private static double[] levels(double[][] density) {
        double[] sorted = Arrays.stream(density).flatMapToDouble(Arrays::stream).sorted().toArray();
        double all = Arrays.stream(sorted).sum();
        double[] levels = new double[OUTSIDE.length];
        double sum = 0;
        int next = 0;
        for (double d : sorted) {
            sum += d;
            while (next < OUTSIDE.length && sum >= OUTSIDE[next] * all) {
                levels[next++] = d;
            }
        }
        return levels;
    }
}
