package layerweft.engine.transform;

import layerweft.model.copula.Copula;

/**
 * Exact nodes for a few perils: a node for each combination of counts of all perils but the last, the last one's law given them from
 * differences of C on the lattice of counts. No latent factor is needed, so it serves negative dependence and every other copula.
 * A difference of C carries a rounding error of about 1e-16, absolute, in the joint law of the counts.
 */
final class DifferencedNodes {
    private static final double ROUNDING = 1e-15;

    private DifferencedNodes() {
    }

    /** Evaluations of C that {@link #of} takes. */
    static long cost(CountMargin[] margins) {
        long cost = 1;
        for (CountMargin margin : margins) {
            cost *= margin.size() + 1;
        }
        return cost;
    }

    static LatentNodes of(Copula copula, CountMargin[] margins) {
        int d = margins.length;
        int[] sizes = new int[d];
        int cells = 1;
        for (int i = 0; i < d; i++) {
            sizes[i] = margins[i].size() + 1;
            cells *= sizes[i];
        }
        double[] joint = new double[cells];
        double[] u = new double[d];
        int[] n = new int[d];
        for (int c = 0; c < cells; c++) {
            boolean whole = true;
            for (int i = 0; i < d; i++) {
                u[i] = n[i] == margins[i].size() ? 1 : margins[i].cdf()[n[i]];
                whole &= u[i] == 1;
            }
            joint[c] = whole ? 1 : copula.cdf(u);
            for (int i = d - 1; i >= 0 && ++n[i] == sizes[i]; i--) {
                n[i] = 0;
            }
        }
        difference(joint, sizes);
        return fromJoint(joint, sizes, ROUNDING * (1 << d));
    }

    /** From P(N ≤ n) to P(N = n), in place, one dimension after another; the last dimension runs fastest. */
    static void difference(double[] joint, int[] sizes) {
        int stride = 1;
        for (int i = sizes.length - 1; i >= 0; i--) {
            for (int c = joint.length - 1; c >= 0; c--) {
                if (c / stride % sizes[i] > 0) {
                    joint[c] -= joint[c - stride];
                }
            }
            stride *= sizes[i];
        }
    }

    /** From P(N ≥ n) to P(N = n), in place. */
    static void differenceFromAbove(double[] joint, int[] sizes) {
        int stride = 1;
        for (int i = sizes.length - 1; i >= 0; i--) {
            for (int c = 0; c < joint.length; c++) {
                if (c / stride % sizes[i] < sizes[i] - 1) {
                    joint[c] -= joint[c + stride];
                }
            }
            stride *= sizes[i];
        }
    }

    /** Nodes from a joint law of counts 0..sizes_i − 1, the last dimension running fastest. */
    static LatentNodes fromJoint(double[] joint, int[] sizes, double error) {
        int d = sizes.length;
        int last = sizes[d - 1];
        int rows = joint.length / last;
        double[] weights = new double[rows];
        double[][][] survival = new double[d][rows][];
        int kept = 0;
        double total = 0;
        for (int r = 0; r < rows; r++) {
            double weight = 0;
            double[] tail = new double[last - 1];
            for (int n = last - 1; n >= 0; n--) {
                weight += Math.max(0, joint[r * last + n]);
                if (n > 0) {
                    tail[n - 1] = weight;
                }
            }
            if (weight <= 0) {
                continue;
            }
            for (int n = 0; n < tail.length; n++) {
                tail[n] /= weight;
            }
            weights[kept] = weight;
            total += weight;
            survival[d - 1][kept] = tail;
            int rest = r;
            for (int i = d - 2; i >= 0; i--) {
                survival[i][kept] = sure(rest % sizes[i], sizes[i] - 1);
                rest /= sizes[i];
            }
            kept++;
        }
        weights = java.util.Arrays.copyOf(weights, kept);
        for (int k = 0; k < kept; k++) {
            weights[k] /= total;
        }
        for (int i = 0; i < d; i++) {
            survival[i] = java.util.Arrays.copyOf(survival[i], kept);
        }
        return new LatentNodes(weights, survival, error);
    }

    /** The law of a count that is n for sure. */
    static double[] sure(int n, int thresholds) {
        double[] survival = new double[thresholds];
        java.util.Arrays.fill(survival, 0, n, 1);
        return survival;
    }
}
