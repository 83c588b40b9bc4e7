package layerweft.engine.bounds;

import java.util.Arrays;

/**
 * A proven upper bound of a layer's expected loss over all joint laws: where functions g_i satisfy Σ g_i(a_i) ≥ f(Σ a_i) everywhere,
 * Σ E[g_i(A_i)] bounds E[f(ΣA_i)] (the dual of the transport problem; for the distribution function of a sum see Embrechts &amp; Puccetti
 * 2006, "Bounds for functions of dependent risks", Finance Stoch. 10). Here f(s) = min((s − D)+, M).
 */
final class UpperDual {
    private static final int WIDTHS = 24;
    private static final int CELLS = 96;
    private final Margin[] margins;
    private final AnnualLayer layer;

    UpperDual(Margin[] margins, AnnualLayer layer) {
        this.margins = margins;
        this.layer = layer;
    }

    /** The smallest bound found. */
    double bound() {
        if (!layer.limited()) {
            // sharp: Dhaene, Denuit, Goovaerts, Kaas & Vyncke 2002, Insurance: Mathematics and Economics 31
            return ParallelRun.comonotone(margins, layer);
        }
        double d = layer.deductible();
        double total = Arrays.stream(margins).mapToDouble(Margin::mean).sum();
        // Jensen, for the concave hull M·min(1, s/(D + M)) of f
        double best = layer.limit() * Math.min(1, total / layer.end());
        for (int k = 0; k <= (d > 0 ? WIDTHS : 0); k++) {
            best = Math.min(best, ramps(d * k / WIDTHS));
        }
        return Math.min(best, mirrored());
    }

    /** M less a lower bound of what the layer lacks of M: a layer of the same kind, on the sum of what each A_i lacks of D + M. */
    private double mirrored() {
        double end = layer.end();
        Margin[] lacking = Arrays.stream(margins).map(m -> m.mirrored(end)).toArray(Margin[]::new);
        return layer.limit() - new LowerDual(lacking, new AnnualLayer((margins.length - 1) * end, layer.limit())).bound();
    }

    /**
     * The smallest bound by ramps g_i(a) = M·min((a − κ_i)+, w)/w with Σκ_i = κ ≤ D and w = D + M − κ: a single a_i beyond its ramp
     * gives M, otherwise Σ g_i ≥ (M/w)(s − κ)+, which is f(s) or more up to s = D + M and M or more beyond.
     */
    private double ramps(double kappa) {
        double w = layer.end() - kappa;
        double[][] cost = new double[margins.length][CELLS + 1];
        for (int i = 0; i < margins.length; i++) {
            for (int k = 0; k <= CELLS; k++) {
                cost[i][k] = ramp(i, kappa * k / CELLS, w);
            }
        }
        double[] at = new double[margins.length];
        int[] split = cheapest(cost);
        for (int i = 0; i < at.length; i++) {
            at[i] = kappa * split[i] / CELLS;
        }
        return layer.limit() / w * refined(at, kappa / CELLS, w);
    }

    private double ramp(int i, double from, double width) {
        return margins[i].limited(from + width) - margins[i].limited(from);
    }

    /** The split of {@code CELLS} among the perils with the smallest total cost, by dynamic programming. */
    private static int[] cheapest(double[][] cost) {
        int d = cost.length;
        int[][] taken = new int[d][CELLS + 1];
        double[] total = cost[0].clone();
        for (int k = 0; k <= CELLS; k++) {
            taken[0][k] = k;
        }
        for (int i = 1; i < d; i++) {
            double[] next = new double[CELLS + 1];
            Arrays.fill(next, Double.POSITIVE_INFINITY);
            for (int k = 0; k <= CELLS; k++) {
                for (int own = 0; own <= k; own++) {
                    double value = total[k - own] + cost[i][own];
                    if (value < next[k]) {
                        next[k] = value;
                        taken[i][k] = own;
                    }
                }
            }
            total = next;
        }
        int[] split = new int[d];
        int left = CELLS;
        for (int i = d - 1; i >= 0; i--) {
            split[i] = taken[i][left];
            left -= split[i];
        }
        return split;
    }

    /** Moves the split by ever smaller steps from one peril to another while that helps. */
    private double refined(double[] at, double firstStep, double w) {
        double[] cost = new double[at.length];
        for (int i = 0; i < at.length; i++) {
            cost[i] = ramp(i, at[i], w);
        }
        double step = firstStep;
        for (int halving = 0; halving < 24 && step > 0; halving++, step /= 2) {
            for (int i = 0; i < at.length; i++) {
                for (int j = 0; j < at.length; j++) {
                    if (i == j || at[i] < step) {
                        continue;
                    }
                    double less = ramp(i, at[i] - step, w);
                    double more = ramp(j, at[j] + step, w);
                    if (less + more < cost[i] + cost[j]) {
                        at[i] -= step;
                        at[j] += step;
                        cost[i] = less;
                        cost[j] = more;
                    }
                }
            }
        }
        return Arrays.stream(cost).sum();
    }
}
