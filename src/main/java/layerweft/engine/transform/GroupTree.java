package layerweft.engine.transform;

import java.util.List;

/**
 * Counts joined by a grouped Archimedean copula, as a tree of latent factors: given a group's frailty its own perils and the groups inside
 * are independent, and a group inside has a law of its frailty given the outer one. All frailties of a group share one set of nodes, so
 * the work is that of the nodes of every group, and never of combinations of them.
 *
 * @param weights of the root's nodes
 * @param root the outermost group
 * @param perils how many there are in all
 * @param error of joint probabilities
 */
record GroupTree(double[] weights, Branch root, int perils, double error) implements JointLaw {
    /**
     * A group.
     *
     * @param members its own perils, as positions among those of the layer
     * @param survival P(N &gt; n | node), member × node × threshold
     * @param inside groups in it
     * @param transitions for each of them, node × node of the inner group: weights, of either sign, sum 1
     */
    record Branch(int[] members, double[][][] survival, List<Branch> inside, List<double[][]> transitions) {

        int nodes() {
            return survival.length > 0 ? survival[0].length : transitions.get(0).length;
        }
    }

    @Override
    public double[][] deficit(double[][][] deficits, double negligible) {
        int count = deficits[0][0].length;
        double[][] out = new double[2][count];
        for (int from = 0; from < count; from += JointDeficit.BLOCK) {
            int size = Math.min(JointDeficit.BLOCK, count - from);
            double[][][] values = values(root, deficits, from, size);
            for (int k = 0; k < weights.length; k++) {
                for (int f = 0; f < size; f++) {
                    out[0][from + f] += weights[k] * values[k][0][f];
                    out[1][from + f] += weights[k] * values[k][1][f];
                }
            }
        }
        return out;
    }

    /** Deficits of all that a branch holds: node × {real, imaginary} × frequency of the block. */
    private static double[][][] values(Branch branch, double[][][] deficits, int from, int size) {
        double[][][] values = new double[branch.nodes()][2][size];
        double[][] h = new double[2][size];
        JointDeficit.Points points = new JointDeficit.Points();
        for (int i = 0; i < branch.members.length; i++) {
            points.set(deficits[branch.members[i]], from, size);
            for (int k = 0; k < values.length; k++) {
                JointDeficit.join(branch.survival[i][k], points, h, values[k], size);
            }
        }
        for (int g = 0; g < branch.inside.size(); g++) {
            double[][][] inner = values(branch.inside.get(g), deficits, from, size);
            for (int k = 0; k < values.length; k++) {
                double[] row = branch.transitions.get(g)[k];
                double[] x = new double[size];
                double[] y = new double[size];
                for (int m = 0; m < row.length; m++) {
                    double part = row[m];
                    double[][] value = inner[m];
                    for (int f = 0; f < size; f++) {
                        x[f] += part * value[0][f];
                        y[f] += part * value[1][f];
                    }
                }
                JointDeficit.join(x, y, values[k], size);
            }
        }
        return values;
    }

    @Override
    public double at(double[] deficits) {
        double[][][] points = new double[deficits.length][2][1];
        for (int i = 0; i < deficits.length; i++) {
            points[i][0][0] = deficits[i];
        }
        return deficit(points, 0)[0][0];
    }

    @Override
    public double productMoment(double[] losses) {
        double[] moments = moments(root, losses)[1];
        double sum = 0;
        for (int k = 0; k < weights.length; k++) {
            sum += weights[k] * moments[k];
        }
        return sum;
    }

    /** Conditional mean of the sum and {@link #productMoment}, by node. */
    private static double[][] moments(Branch branch, double[] losses) {
        int nodes = branch.nodes();
        double[][] out = new double[2][nodes];
        for (int i = 0; i < branch.members.length; i++) {
            double loss = losses[branch.members[i]];
            for (int k = 0; k < nodes; k++) {
                double mean = 0;
                double pairs = 0;
                double[] s = branch.survival[i][k];
                for (int n = 0; n < s.length; n++) {
                    mean += loss * s[n];
                    pairs += loss * loss * 2 * n * s[n];
                }
                add(out, k, mean, pairs);
            }
        }
        for (int g = 0; g < branch.inside.size(); g++) {
            double[][] inner = moments(branch.inside.get(g), losses);
            for (int k = 0; k < nodes; k++) {
                double[] row = branch.transitions.get(g)[k];
                double mean = 0;
                double pairs = 0;
                for (int m = 0; m < row.length; m++) {
                    mean += row[m] * inner[0][m];
                    pairs += row[m] * inner[1][m];
                }
                add(out, k, mean, pairs);
            }
        }
        return out;
    }

    private static void add(double[][] moments, int node, double mean, double pairs) {
        moments[1][node] += pairs + 2 * moments[0][node] * mean;
        moments[0][node] += mean;
    }

    @Override
    public JointLaw hits(double[] chances, double budget) {
        return new HitCounts(new GroupTree(weights, thinned(root, chances), perils, error), chances);
    }

    private static Branch thinned(Branch branch, double[] chances) {
        double[][][] survival = new double[branch.members.length][][];
        for (int i = 0; i < survival.length; i++) {
            double[][] rows = branch.survival[i];
            survival[i] = Thinning.of(chances[branch.members[i]], rows[0].length).ofAll(rows);
        }
        return new Branch(branch.members, survival, branch.inside.stream().map(b -> thinned(b, chances)).toList(), branch.transitions);
    }
}
