package layerweft.model.copula;

import org.apache.commons.math3.linear.Array2DRowRealMatrix;
import org.apache.commons.math3.linear.EigenDecomposition;
import org.apache.commons.math3.linear.RealMatrix;

/**
 * The correlation matrix nearest to a symmetric one, in the sum of squared differences: alternating projections on the positive semi-definite matrices and
 * on those with unit diagonal, with Dykstra's correction (Higham 2002, "Computing the nearest correlation matrix", IMA Journal of Numerical Analysis 22).
 */
public final class NearestCorrelation {
    private static final int MOST_STEPS = 2000;
    private static final double CLOSE = 1e-9;
    /** Pulled towards independence by so much in the end, so that rounding leaves it admissible. */
    private static final double INWARD = 1e-7;

    private NearestCorrelation() {
    }

    /** Whether a symmetric matrix with unit diagonal is one of correlations: no eigenvalue below 0. */
    public static boolean exists(double[][] matrix) {
        double least = 0;
        for (double eigenvalue : new EigenDecomposition(new Array2DRowRealMatrix(matrix)).getRealEigenvalues()) {
            least = Math.min(least, eigenvalue);
        }
        return least >= -1e-10;
    }

    /** @param matrix symmetric, finite; not changed */
    public static double[][] of(double[][] matrix) {
        int d = matrix.length;
        RealMatrix y = new Array2DRowRealMatrix(matrix);
        RealMatrix correction = new Array2DRowRealMatrix(d, d);
        for (int step = 0; step < MOST_STEPS; step++) {
            RealMatrix r = y.subtract(correction);
            RealMatrix x = positive(r);
            correction = x.subtract(r);
            RealMatrix next = x.copy();
            for (int i = 0; i < d; i++) {
                next.setEntry(i, i, 1);
            }
            double change = next.subtract(y).getFrobeniusNorm();
            y = next;
            if (change < CLOSE && next.subtract(x).getFrobeniusNorm() < CLOSE) {
                break;
            }
        }
        double[][] nearest = new double[d][d];
        for (int i = 0; i < d; i++) {
            for (int j = 0; j < d; j++) {
                double value = (y.getEntry(i, j) + y.getEntry(j, i)) / 2;
                nearest[i][j] = i == j ? 1 : Math.max(-1, Math.min(1, (1 - INWARD) * value));
            }
        }
        return nearest;
    }

    /** The nearest positive semi-definite matrix: eigenvalues below 0 become 0. */
    private static RealMatrix positive(RealMatrix symmetric) {
        RealMatrix even = symmetric.add(symmetric.transpose()).scalarMultiply(0.5);
        EigenDecomposition eigen = new EigenDecomposition(even);
        RealMatrix values = eigen.getD().copy();
        for (int i = 0; i < values.getRowDimension(); i++) {
            values.setEntry(i, i, Math.max(0, values.getEntry(i, i)));
        }
        return eigen.getV().multiply(values).multiply(eigen.getVT());
    }
}
