package layerweft.desktop.dependence;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import layerweft.file.FileTree;
import layerweft.model.copula.NearestCorrelation;

/**
 * The correlations between perils as a file has them, valid or not, and what can be done to them. On screen a pair has a τ, in the file a ρ = sin(πτ/2).
 *
 * @param correlation as many rows as perils, symmetric
 */
record PairMatrix(double[][] correlation) {
    private static final String COPULA = "dependence.copula";
    private static final String MATRIX = COPULA + ".correlation";
    private static final double DIGITS = 1e6;

    /** Of a normal or t copula with a matrix or with one strength; empty for other copulas and where a number is missing. */
    static Optional<PairMatrix> of(FileTree portfolio) {
        String family = portfolio.text(COPULA + ".family");
        if (!"gaussian".equals(family) && !"student".equals(family)) {
            return Optional.empty();
        }
        int d = portfolio.size("perils");
        double[][] matrix = new double[d][d];
        boolean one = !portfolio.has(MATRIX);
        double common = Math.sin(Math.PI / 2 * portfolio.number(COPULA + ".kendallTau"));
        for (int i = 0; i < d; i++) {
            for (int j = 0; j < d; j++) {
                matrix[i][j] = i == j ? 1 : one ? common : portfolio.number(MATRIX + "[" + Math.min(i, j) + "][" + Math.max(i, j) + "]");
                if (!(Math.abs(matrix[i][j]) <= 1)) {
                    return Optional.empty();
                }
            }
        }
        return Optional.of(new PairMatrix(matrix));
    }

    double tau(int i, int j) {
        return 2 / Math.PI * Math.asin(correlation[i][j]);
    }

    boolean exists() {
        return NearestCorrelation.exists(correlation);
    }

    PairMatrix nearest() {
        return new PairMatrix(NearestCorrelation.of(correlation));
    }

    /** With another τ of one pair. */
    PairMatrix with(int i, int j, double tau) {
        double[][] other = new double[correlation.length][];
        for (int k = 0; k < other.length; k++) {
            other[k] = correlation[k].clone();
        }
        other[i][j] = Math.rint(DIGITS * Math.sin(Math.PI / 2 * tau)) / DIGITS;
        other[j][i] = other[i][j];
        return new PairMatrix(other);
    }

    /** The file with this matrix in the place of whatever strength it had. */
    FileTree in(FileTree portfolio) {
        List<List<Double>> rows = new ArrayList<>();
        for (double[] row : correlation) {
            List<Double> numbers = new ArrayList<>();
            for (double value : row) {
                numbers.add(Math.abs(value) == 1 ? value : Math.rint(1e7 * value) / 1e7);
            }
            rows.add(numbers);
        }
        return portfolio.remove(COPULA + ".kendallTau").set(MATRIX, rows);
    }

    /** Why it cannot exist, by the three perils that fit least together; in general words where three alone could. */
    String why(List<String> perils) {
        double worst = 0;
        String words = "Taken together these pairs contradict each other: no years can do all of them.";
        int d = correlation.length;
        for (int i = 0; i < d; i++) {
            for (int j = i + 1; j < d; j++) {
                for (int k = j + 1; k < d; k++) {
                    double a = correlation[i][j];
                    double b = correlation[i][k];
                    double c = correlation[j][k];
                    double determinant = 1 + 2 * a * b * c - a * a - b * b - c * c;
                    if (determinant < worst) {
                        worst = determinant;
                        words = sentence(pair(perils, i, j, a)) + ", " + pair(perils, j, k, c) + ", but " + pair(perils, i, k, b) + ": no years can do all three.";
                    }
                }
            }
        }
        return words;
    }

    private static String pair(List<String> perils, int i, int j, double rho) {
        return perils.get(i) + (rho >= 0 ? " goes with " : " goes against ") + perils.get(j);
    }

    private static String sentence(String words) {
        return words.substring(0, 1).toUpperCase(Locale.ROOT) + words.substring(1);
    }
}
