package layerweft.model.copula;

import java.util.OptionalDouble;

/** Correlations ρ of the normal scores of an elliptical copula. */
public sealed interface Correlation permits EqualCorrelation, CorrelationMatrix {

    /** ρ of the pair (i, j); 1 for i = j. */
    double rho(int i, int j);

    /** The one ρ of all pairs of so many variables, where there is one. */
    OptionalDouble common(int dimension);

    /** @throws layerweft.model.InadmissibleException if this is no correlation of so many variables */
    void requireDimension(int dimension);

    /** The matrix, dimension × dimension, a copy. */
    default double[][] matrix(int dimension) {
        double[][] matrix = new double[dimension][dimension];
        for (int i = 0; i < dimension; i++) {
            for (int j = 0; j < dimension; j++) {
                matrix[i][j] = rho(i, j);
            }
        }
        return matrix;
    }
}
