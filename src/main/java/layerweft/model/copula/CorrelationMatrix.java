package layerweft.model.copula;

import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import java.util.OptionalDouble;
import layerweft.model.Check;
import org.apache.commons.math3.linear.Array2DRowRealMatrix;
import org.apache.commons.math3.linear.EigenDecomposition;

/**
 * A full correlation matrix: symmetric, with unit diagonal, positive semi-definite (smallest eigenvalue at least −1e-10); it may be
 * singular.
 *
 * @param rows as many rows as columns
 */
public record CorrelationMatrix(List<List<Double>> rows) implements Correlation {
    private static final double TOLERANCE = 1e-10;

    public CorrelationMatrix {
        rows = rows.stream().map(List::copyOf).toList();
        Check check = new Check();
        int d = rows.size();
        check.that(d >= 1, "correlation", "no rows", "a square matrix");
        for (int i = 0; i < d; i++) {
            List<Double> row = rows.get(i);
            check.that(row.size() == d, "correlation[" + i + "]", row.size() + " numbers", d + " numbers, as many as there are rows");
        }
        if (check.clean()) {
            checkEntries(rows, check);
        }
        if (check.clean()) {
            EigenDecomposition eigen = new EigenDecomposition(new Array2DRowRealMatrix(toArray(rows)));
            double least = Arrays.stream(eigen.getRealEigenvalues()).min().orElse(0);
            check.that(least >= -TOLERANCE, "correlation", String.format(Locale.ROOT, "a matrix with the eigenvalue %.6g", least),
                    "a positive semi-definite matrix (no eigenvalue below 0)");
        }
        check.orThrow();
    }

    public static CorrelationMatrix of(double[][] matrix) {
        return new CorrelationMatrix(Arrays.stream(matrix).map(row -> Arrays.stream(row).boxed().toList()).toList());
    }

    private static void checkEntries(List<List<Double>> rows, Check check) {
        for (int i = 0; i < rows.size(); i++) {
            for (int j = 0; j < rows.size(); j++) {
                double value = rows.get(i).get(j);
                String field = "correlation[" + i + "][" + j + "]";
                if (i == j) {
                    check.that(value == 1, field, value, "1, on the diagonal");
                } else {
                    check.within(field, value, -1, 1);
                    check.that(j > i || !(Math.abs(value - rows.get(j).get(i)) > 1e-12), field, value,
                            "the same as [" + j + "][" + i + "], " + rows.get(j).get(i));
                }
            }
        }
    }

    private static double[][] toArray(List<List<Double>> rows) {
        return rows.stream().map(row -> row.stream().mapToDouble(Double::doubleValue).toArray()).toArray(double[][]::new);
    }

    @Override
    public double rho(int i, int j) {
        return rows.get(Math.max(i, j)).get(Math.min(i, j));
    }

    @Override
    public OptionalDouble common(int dimension) {
        double first = dimension > 1 ? rho(0, 1) : 0;
        for (int i = 0; i < dimension; i++) {
            for (int j = 0; j < i; j++) {
                if (rho(i, j) != first) {
                    return OptionalDouble.empty();
                }
            }
        }
        return OptionalDouble.of(first);
    }

    @Override
    public void requireDimension(int dimension) {
        new Check().that(rows.size() == dimension, "correlation", "a matrix of " + rows.size() + " rows",
                "one of " + dimension + " rows, one for each peril").orThrow();
    }
}
