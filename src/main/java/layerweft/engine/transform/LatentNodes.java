package layerweft.engine.transform;

/**
 * The joint law of the perils' counts as a mixture of independent ones: with probability {@code weights[k]} the year is at node k, where
 * the counts are independent with P(N_i &gt; n) = {@code survival[i][k][n]}. Every copula comes to this form, by quadrature over a latent
 * factor or, exactly, by conditioning on some of the counts themselves.
 *
 * @param weights of the nodes, at least 0, sum 1
 * @param survival peril × node × threshold, each in [0, 1] and falling in n
 * @param error largest error of a joint probability of the counts, as measured or bounded where the nodes were made
 */
record LatentNodes(double[] weights, double[][][] survival, double error) {

    int size() {
        return weights.length;
    }

    int perils() {
        return survival.length;
    }

    /** E[N_i | node k] for counts cut at the last threshold. */
    double mean(int peril, int node) {
        double sum = 0;
        for (double s : survival[peril][node]) {
            sum += s;
        }
        return sum;
    }

    /** E[N_i(N_i − 1) | node k]. */
    double factorialMoment(int peril, int node) {
        double sum = 0;
        double[] s = survival[peril][node];
        for (int n = 1; n < s.length; n++) {
            sum += 2 * n * s[n];
        }
        return sum;
    }

    /**
     * The same law with fewer nodes. Neighbours become one node with their mean law; because the joint law is affine in the law of each
     * peril, the error of any joint probability is a covariance between perils inside the group, at most w·Σ_{i&lt;j} r_i·r_j/4 with r_i
     * the range of peril i's conditional probabilities over the group. Where one peril moves alone nothing is lost at all.
     *
     * @param budget for the error of all groups together: half is shared out by their weights, half evenly
     */
    LatentNodes merged(double budget) {
        double each = 0.5 * budget / Math.min(size(), 100);
        int[] ends = new int[size()];
        int groups = 0;
        double total = 0;
        for (int start = 0; start < size();) {
            double weight = weights[start];
            int end = start + 1;
            double cost = 0;
            while (end < size()) {
                double larger = cost(start, end, weight + weights[end]);
                if (larger > 0.5 * budget * Math.abs(weight + weights[end]) + each) {
                    break;
                }
                cost = larger;
                weight += weights[end++];
            }
            total += cost;
            ends[groups++] = end;
            start = end;
        }
        double[] merged = new double[groups];
        double[][][] mean = new double[perils()][groups][];
        for (int g = 0, start = 0; g < groups; start = ends[g++]) {
            for (int k = start; k < ends[g]; k++) {
                merged[g] += weights[k];
            }
            for (int i = 0; i < perils(); i++) {
                mean[i][g] = mean(i, start, ends[g], merged[g]);
            }
        }
        return new LatentNodes(merged, mean, error + total);
    }

    private double cost(int first, int last, double weight) {
        double sum = 0;
        double sumOfSquares = 0;
        for (double[][] peril : survival) {
            double range = 0;
            for (int n = 0; n < peril[first].length; n++) {
                range = Math.max(range, Math.abs(peril[last][n] - peril[first][n]));
            }
            sum += range;
            sumOfSquares += range * range;
        }
        return Math.abs(weight) * (sum * sum - sumOfSquares) / 8;
    }

    private double[] mean(int peril, int start, int end, double weight) {
        double[] mean = new double[survival[peril][start].length];
        for (int k = start; k < end; k++) {
            double part = weight > 0 ? weights[k] / weight : 1.0 / (end - start);
            double[] s = survival[peril][k];
            for (int n = 0; n < mean.length; n++) {
                mean[n] += part * s[n];
            }
        }
        return mean;
    }
}
