package layerweft.model.copula;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class NearestCorrelationTest {

    /** Higham (2002), section 1 and 3: the tridiagonal matrix of ones, to the four digits printed there. */
    @Test
    void findsThePublishedNearestMatrix() {
        double[][] nearest = NearestCorrelation.of(new double[][] {{1, 1, 0}, {1, 1, 1}, {0, 1, 1}});
        double[][] published = {{1, 0.7607, 0.1573}, {0.7607, 1, 0.7607}, {0.1573, 0.7607, 1}};
        for (int i = 0; i < 3; i++) {
            assertArrayEquals(published[i], nearest[i], 1e-4);
        }
    }

    @Test
    void leavesAMatrixThatExists() {
        double[][] matrix = {{1, 0.5, 0.2}, {0.5, 1, -0.3}, {0.2, -0.3, 1}};
        assertTrue(NearestCorrelation.exists(matrix));
        for (int i = 0; i < 3; i++) {
            assertArrayEquals(matrix[i], NearestCorrelation.of(matrix)[i], 1e-6);
        }
    }

    /** No correlation matrix drawn at random is nearer. */
    @ParameterizedTest
    @ValueSource(longs = {1, 2, 3})
    void isAdmissibleAndNoOtherIsNearer(long seed) {
        Random random = new Random(seed);
        double[][] wished = symmetric(random, 5);
        double[][] nearest = NearestCorrelation.of(wished);
        CorrelationMatrix.of(nearest);
        double distance = distance(wished, nearest);
        for (int k = 0; k < 200; k++) {
            double part = random.nextDouble();
            double[][] other = NearestCorrelation.of(symmetric(random, 5));
            double[][] between = new double[5][5];
            for (int i = 0; i < 5; i++) {
                for (int j = 0; j < 5; j++) {
                    between[i][j] = part * part * part * other[i][j] + (1 - part * part * part) * nearest[i][j];
                }
            }
            assertTrue(distance(wished, between) >= distance - 1e-5, "seed " + seed);
        }
    }

    @Test
    void tellsWhatCannotExist() {
        assertFalse(NearestCorrelation.exists(new double[][] {{1, 0.8, -0.3}, {0.8, 1, 0.7}, {-0.3, 0.7, 1}}));
        assertEquals(1, NearestCorrelation.of(new double[][] {{1}})[0][0]);
    }

    private static double[][] symmetric(Random random, int d) {
        double[][] matrix = new double[d][d];
        for (int i = 0; i < d; i++) {
            matrix[i][i] = 1;
            for (int j = 0; j < i; j++) {
                matrix[i][j] = 2 * random.nextDouble() - 1;
                matrix[j][i] = matrix[i][j];
            }
        }
        return matrix;
    }

    private static double distance(double[][] a, double[][] b) {
        double sum = 0;
        for (int i = 0; i < a.length; i++) {
            for (int j = 0; j < a.length; j++) {
                sum += (a[i][j] - b[i][j]) * (a[i][j] - b[i][j]);
            }
        }
        return Math.sqrt(sum);
    }
}
