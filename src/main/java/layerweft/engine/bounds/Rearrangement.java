package layerweft.engine.bounds;

import java.util.Arrays;
import layerweft.model.random.KeyedStream;

/**
 * The rearrangement algorithm (Puccetti &amp; Rüschendorf 2012, "Computation of sharp bounds on the distribution of a function of dependent
 * risks", J. Comput. Appl. Math. 236; Embrechts, Puccetti &amp; Rüschendorf 2013, "Model uncertainty and VaR aggregation", J. Banking
 * Finance 37): columns of a matrix, one for each peril, are ordered oppositely to the sum of the others, in turn, until the row sums are
 * as flat as they get. All rows have the same chance.
 *
 * <p>Beyond the published algorithm, a column may be ordered against the sum of the others in its lower and along it in its upper part, or
 * the other way round: where a layer has a deductible and a limit, its loss is convex in small and concave in large sums.
 */
final class Rearrangement {
    private static final double STILL = 1e-7;
    private static final long SEED = 1;
    private final double[][] columns;
    private final int[][] place;
    private final double[] sum;
    private final double[] rest;
    private final int[] order;
    private final int rows;
    private final RankedRows ranked;

    /** @param columns by peril, each falling: [peril][rank]; not negative */
    Rearrangement(double[][] columns) {
        this.columns = columns;
        this.rows = columns[0].length;
        this.place = new int[columns.length][rows];
        this.sum = new double[rows];
        this.rest = new double[rows];
        this.order = new int[rows];
        this.ranked = new RankedRows(rows);
        alongside();
    }

    /** All columns in the same order: comonotone. */
    void alongside() {
        Arrays.fill(sum, 0);
        for (int i = 0; i < columns.length; i++) {
            for (int r = 0; r < rows; r++) {
                place[i][r] = r;
                sum[r] += columns[i][r];
            }
        }
    }

    /** Flattens the sums of rows {@code from} to {@code to} − 1, which hold the same ranks in every column. */
    void flatten(int from, int to, int mostSweeps) {
        double spread = spread(from, to);
        for (int sweep = 0; sweep < mostSweeps && to - from > 1; sweep++) {
            for (int i = 0; i < columns.length; i++) {
                without(i, from, to);
                ranked.falling(rest, from, to, order);
                for (int k = from; k < to; k++) {
                    put(i, order[k], to - 1 - (k - from));
                }
            }
            double now = spread(from, to);
            if (!(now < spread * (1 - STILL))) {
                return;
            }
            spread = now;
        }
    }

    /** Sum of squared row sums: falls as they get flatter, because their total stays. */
    private double spread(int from, int to) {
        double total = 0;
        for (int r = from; r < to; r++) {
            total += sum[r] * sum[r];
        }
        return total;
    }

    /**
     * Orders one column after another partly along and partly against the sum of the others, wherever that improves the mean of the layer's
     * losses, until nothing does.
     *
     * @param sign 1 to raise the mean, −1 to lower it
     */
    void improve(AnnualLayer layer, int sign, int mostSweeps) {
        double best = sign * mean(layer);
        for (int sweep = 0; sweep < mostSweeps; sweep++) {
            double before = best;
            for (int i = 0; i < columns.length; i++) {
                best = improve(i, layer, sign, best);
            }
            if (!(best > before + 1e-9 * Math.abs(before))) {
                return;
            }
        }
    }

    private double improve(int i, AnnualLayer layer, int sign, double best) {
        without(i, 0, rows);
        ranked.falling(rest, 0, rows, order);
        int chosen = -1;
        double top = best;
        for (int k : splits(rows)) {
            double value = 0;
            for (int r = 0; r < rows; r++) {
                value += layer.loss(rest[order[r]] + columns[i][rank(r, k, sign)]);
            }
            value *= (double) sign / rows;
            if (value > top + 1e-12 * Math.abs(top)) {
                top = value;
                chosen = k;
            }
        }
        if (chosen >= 0) {
            for (int r = 0; r < rows; r++) {
                put(i, order[r], rank(r, chosen, sign));
            }
        } else {
            for (int r = 0; r < rows; r++) {
                sum[r] = rest[r] + columns[i][place[i][r]];
            }
        }
        return top;
    }

    /** Rank in the column for the r-th largest sum of the others: the top k turned (to raise the mean) or along (to lower it), the rest not. */
    private int rank(int r, int k, int sign) {
        boolean turned = (r < k) == (sign > 0);
        return !turned ? r : r < k ? k - 1 - r : rows - 1 - (r - k);
    }

    /** Sizes of the upper part that are tried: none, all, and between them by ratios. */
    static int[] splits(int rows) {
        int[] sizes = new int[64];
        int n = 1;
        double at = Math.max(1, rows / 400.0);
        while (at < rows && n < sizes.length - 1) {
            sizes[n++] = (int) at;
            at = Math.max(at + 1, at * 1.25);
        }
        sizes[n++] = rows;
        return Arrays.copyOf(sizes, n);
    }

    /**
     * Exchanges the ranks of one peril between two rows drawn at random, wherever the mean of the layer's losses does not get worse: what the
     * ordering of whole columns cannot reach, above all with few and heavy atoms.
     */
    void exchange(AnnualLayer layer, int sign, int trials) {
        KeyedStream random = new KeyedStream(SEED);
        for (int trial = 0; trial < trials; trial++) {
            int i = random.nextInt(columns.length);
            int a = random.nextInt(rows);
            int b = random.nextInt(rows);
            double shift = columns[i][place[i][b]] - columns[i][place[i][a]];
            double gain = layer.loss(sum[a] + shift) + layer.loss(sum[b] - shift) - layer.loss(sum[a]) - layer.loss(sum[b]);
            if (sign * gain >= 0 && shift != 0) {
                int rank = place[i][a];
                place[i][a] = place[i][b];
                place[i][b] = rank;
                sum[a] += shift;
                sum[b] -= shift;
            }
        }
    }

    private void without(int i, int from, int to) {
        for (int r = from; r < to; r++) {
            double others = 0;
            for (int j = 0; j < columns.length; j++) {
                others += j == i ? 0 : columns[j][place[j][r]];
            }
            rest[r] = others;
        }
    }

    private void put(int i, int row, int rank) {
        place[i][row] = rank;
        sum[row] = rest[row] + columns[i][rank];
    }

    /** Mean of the layer's losses over the rows. */
    double mean(AnnualLayer layer) {
        double total = 0;
        for (double s : sum) {
            total += layer.loss(s);
        }
        return total / rows;
    }

    double[] rowSums() {
        return sum.clone();
    }

    /** The rank that a peril has in a row. */
    int rank(int peril, int row) {
        return place[peril][row];
    }
}
