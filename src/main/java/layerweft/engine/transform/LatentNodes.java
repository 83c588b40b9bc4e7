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
record LatentNodes(double[] weights, double[][][] survival, double error) implements JointLaw {

    int size() {
        return weights.length;
    }

    int perils() {
        return survival.length;
    }

    @Override
    public double[][] deficit(double[][][] deficits, double negligible) {
        return JointDeficit.of(this, deficits, negligible);
    }

    @Override
    public double at(double[] deficits) {
        return JointDeficit.at(this, deficits);
    }

    @Override
    public double productMoment(double[] losses) {
        double moment = 0;
        for (int k = 0; k < size(); k++) {
            double sum = 0;
            double ownPairs = 0;
            for (int i = 0; i < losses.length; i++) {
                double conditional = mean(i, k) * losses[i];
                sum += conditional;
                ownPairs += factorialMoment(i, k) * losses[i] * losses[i] - conditional * conditional;
            }
            moment += weights[k] * (sum * sum + ownPairs);
        }
        return moment;
    }

    @Override
    public JointLaw hits(double[] chances, double budget) {
        double any = at(chances);
        double[][][] thinned = new double[perils()][size()][];
        for (int i = 0; i < perils(); i++) {
            int longest = 0;
            for (double[] s : survival[i]) {
                longest = Math.max(longest, s.length);
            }
            double[] mean = mean(i, 0, size(), 1, longest);
            Thinning thinning = Thinning.of(chances[i], longest);
            double[] all = thinning.of(mean);
            int kept = longest;
            while (kept > 1 && all[kept - 1] < 1e-4 * NEGLIGIBLE * any) {
                kept--;
            }
            thinning = thinning.first(kept);
            for (int k = 0; k < size(); k++) {
                thinned[i][k] = thinning.of(survival[i][k]);
            }
        }
        double half = 0.5 * budget * Math.min(1, any);
        return new HitCounts(GaussNodes.of(new LatentNodes(weights, thinned, error).merged(half), half), chances);
    }

    /** E[N_i | node k] for counts cut at the last threshold. */
    private double mean(int peril, int node) {
        double sum = 0;
        for (double s : survival[peril][node]) {
            sum += s;
        }
        return sum;
    }

    /** E[N_i(N_i − 1) | node k]. */
    private double factorialMoment(int peril, int node) {
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
                mean[i][g] = mean(i, start, ends[g], merged[g], survival[i][start].length);
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

    private double[] mean(int peril, int start, int end, double weight, int length) {
        double[] mean = new double[length];
        for (int k = start; k < end; k++) {
            double part = weight > 0 ? weights[k] / weight : 1.0 / (end - start);
            double[] s = survival[peril][k];
            for (int n = 0; n < s.length; n++) {
                mean[n] += part * s[n];
            }
        }
        return mean;
    }
}
