package layerweft.study;

import layerweft.model.copula.Copula;
import layerweft.model.frequency.CountTable;
import layerweft.model.frequency.FrequencyModel;

/**
 * Kendall's τ-b of two annual counts joined by a copula: (P(concordant) − P(discordant)) / √((1 − P(tie in N))·(1 − P(tie in M))) of two independent
 * years (Kendall 1945, "The treatment of ties in ranking problems", Biometrika 33). Whole numbers tie, so it differs from the copula's own τ.
 */
public final class CountConcordance {
    /** Counts are cut where this part of their probability is left. */
    private static final double TAIL = 1e-7;
    /** Values of C that are worth taking. */
    private static final int MOST = 250_000;

    private CountConcordance() {}

    /**
     * @param pair of two variables
     * @return τ-b in [−1, 1]; NaN where a count is always the same, or the counts take too many values
     */
    public static double tauB(Copula pair, FrequencyModel first, FrequencyModel second) {
        CountTable n = CountTable.of(first, TAIL);
        CountTable m = CountTable.of(second, TAIL);
        if ((long) n.size() * m.size() > MOST) {
            return Double.NaN;
        }
        double[][] joint = joint(pair, n, m);
        double ties = 0;
        double otherTies = 0;
        for (int i = 0; i < n.size(); i++) {
            ties += n.probability(i) * n.probability(i);
        }
        for (int j = 0; j < m.size(); j++) {
            otherTies += m.probability(j) * m.probability(j);
        }
        // below[j]: probability of smaller first and smaller second count, less that of smaller first and larger second count
        double difference = 0;
        double[] columns = new double[m.size()];
        for (double[] row : joint) {
            double smaller = 0;
            double larger = 0;
            for (double c : columns) {
                larger += c;
            }
            for (int j = 0; j < row.length; j++) {
                larger -= columns[j];
                difference += row[j] * (smaller - larger);
                smaller += columns[j];
            }
            for (int j = 0; j < row.length; j++) {
                columns[j] += row[j];
            }
        }
        double scale = Math.sqrt((1 - ties) * (1 - otherTies));
        return scale > 0 ? Math.max(-1, Math.min(1, 2 * difference / scale)) : Double.NaN;
    }

    /** P(N = i, M = j) by differences of C; the last row and column hold what is cut off. */
    private static double[][] joint(Copula pair, CountTable n, CountTable m) {
        double[][] joint = new double[n.size()][m.size()];
        double[] before = new double[m.size()];
        for (int i = 0; i < n.size(); i++) {
            double u = i == n.size() - 1 ? 1 : n.cdf(i);
            double left = 0;
            for (int j = 0; j < m.size(); j++) {
                double v = j == m.size() - 1 ? 1 : m.cdf(j);
                double c = u == 1 ? v : v == 1 ? u : pair.cdf(u, v);
                joint[i][j] = Math.max(0, c - before[j] - left);
                left = c - before[j];
                before[j] = c;
            }
        }
        return joint;
    }
}
