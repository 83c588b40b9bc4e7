package layerweft.engine.transform;

import java.util.Arrays;

/**
 * Where one uniform decides everything: between two steps of the perils' quantile functions all counts are fixed, and nodes are exact.
 *
 * @param weights of the intervals between steps
 * @param counts interval × peril
 */
record OrderedNodes(double[] weights, int[][] counts) {

    /** @param falling for each peril whether its count falls in the common uniform (countermonotonic) */
    static OrderedNodes of(CountMargin[] margins, boolean[] falling) {
        // each step both as a distance from 0 and from 1, so that rare counts keep their probabilities
        int total = Arrays.stream(margins).mapToInt(CountMargin::size).sum();
        double[] from = new double[total];
        double[] toEnd = new double[total];
        int[] peril = new int[total];
        int s = 0;
        for (int i = 0; i < margins.length; i++) {
            for (int n = 0; n < margins[i].size(); n++) {
                from[s] = falling[i] ? margins[i].survival()[n] : margins[i].cdf()[n];
                toEnd[s] = falling[i] ? margins[i].cdf()[n] : margins[i].survival()[n];
                peril[s++] = i;
            }
        }
        Integer[] order = new Integer[total];
        Arrays.setAll(order, k -> k);
        Arrays.sort(order, (a, b) -> from[a] != from[b] ? Double.compare(from[a], from[b]) : Double.compare(toEnd[b], toEnd[a]));
        int[] now = new int[margins.length];
        for (int i = 0; i < now.length; i++) {
            now[i] = falling[i] ? margins[i].size() : 0;
        }
        double[] weights = new double[total + 1];
        int[][] counts = new int[total + 1][];
        double last = 0;
        double lastToEnd = 1;
        int kept = 0;
        for (int k = 0; k <= total; k++) {
            double next = k == total ? 1 : from[order[k]];
            double nextToEnd = k == total ? 0 : toEnd[order[k]];
            double weight = next < 0.5 ? next - last : lastToEnd - nextToEnd;
            if (weight > 0) {
                weights[kept] = weight;
                counts[kept++] = now.clone();
                last = next;
                lastToEnd = nextToEnd;
            }
            if (k < total) {
                now[peril[order[k]]] += falling[peril[order[k]]] ? -1 : 1;
            }
        }
        return new OrderedNodes(Arrays.copyOf(weights, kept), Arrays.copyOf(counts, kept));
    }

    LatentNodes nodes(CountMargin[] margins) {
        double[][][] survival = new double[margins.length][weights.length][];
        for (int i = 0; i < margins.length; i++) {
            for (int k = 0; k < weights.length; k++) {
                survival[i][k] = DifferencedNodes.sure(counts[k][i], margins[i].size());
            }
        }
        return new LatentNodes(weights, survival, 0);
    }
}
