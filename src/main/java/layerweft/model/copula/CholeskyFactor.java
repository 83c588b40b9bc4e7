package layerweft.model.copula;

/** The lower triangular L with LLᵀ = R of a correlation matrix R that may be singular: a pivot lost in rounding counts as 0. */
final class CholeskyFactor {
    private static final double LOST = 1e-12;

    private CholeskyFactor() {
    }

    static double[][] of(double[][] correlation) {
        int d = correlation.length;
        double[][] lower = new double[d][];
        for (int i = 0; i < d; i++) {
            lower[i] = new double[i + 1];
            for (int j = 0; j <= i; j++) {
                double rest = correlation[i][j];
                for (int k = 0; k < j; k++) {
                    rest -= lower[i][k] * lower[j][k];
                }
                if (i == j) {
                    lower[i][i] = rest > LOST ? Math.sqrt(rest) : 0;
                } else {
                    lower[i][j] = lower[j][j] > 0 ? rest / lower[j][j] : 0;
                }
            }
        }
        return lower;
    }
}
