package layerweft.engine.transform;

import java.util.Arrays;

/** Exact nodes where one uniform decides everything: between two steps of the perils' quantile functions all counts are fixed. */
final class OrderedNodes {

    private OrderedNodes() {
    }

    /** @param falling for each peril whether its count falls in the common uniform (countermonotonic) */
    static LatentNodes of(CountMargin[] margins, boolean[] falling) {
        // steps are measured from whichever end they are nearer to, so that rare counts keep their probabilities
        double[] steps = new double[Arrays.stream(margins).mapToInt(CountMargin::size).sum() + 1];
        double[] toEnd = new double[steps.length];
        int s = 0;
        for (int i = 0; i < margins.length; i++) {
            for (int n = 0; n < margins[i].size(); n++) {
                steps[s] = falling[i] ? margins[i].survival()[n] : margins[i].cdf()[n];
                toEnd[s++] = falling[i] ? margins[i].cdf()[n] : margins[i].survival()[n];
            }
        }
        steps[s] = 1;
        Arrays.sort(steps);
        Arrays.sort(toEnd);
        double[] weights = new double[steps.length];
        double[][][] survival = new double[margins.length][steps.length][];
        int kept = 0;
        for (int k = 0; k < steps.length; k++) {
            double from = k == 0 ? 0 : steps[k - 1];
            double fromEnd = k == 0 ? 1 : toEnd[steps.length - k];
            double weight = from < 0.5 ? steps[k] - from : fromEnd - toEnd[steps.length - 1 - k];
            if (weight <= 0) {
                continue;
            }
            weights[kept] = weight;
            for (int i = 0; i < margins.length; i++) {
                survival[i][kept] = DifferencedNodes.sure(count(margins[i], falling[i], from, fromEnd, weight), margins[i].size());
            }
            kept++;
        }
        for (int i = 0; i < margins.length; i++) {
            survival[i] = Arrays.copyOf(survival[i], kept);
        }
        return new LatentNodes(Arrays.copyOf(weights, kept), survival, 0);
    }

    /** The count on the interval that starts at u = from: how many thresholds lie at or before it. */
    private static int count(CountMargin margin, boolean falling, double from, double fromEnd, double weight) {
        int n = 0;
        while (n < margin.size() && (falling ? above(margin.cdf()[n], fromEnd, weight) : passed(margin, n, from, fromEnd))) {
            n++;
        }
        return n;
    }

    private static boolean passed(CountMargin margin, int n, double from, double fromEnd) {
        return from < 0.5 ? margin.cdf()[n] <= from : margin.survival()[n] >= fromEnd;
    }

    /** With u falling, N > n while 1 − u > F(n): on the whole interval when its far end still is. */
    private static boolean above(double cdf, double fromEnd, double weight) {
        return cdf <= fromEnd - weight * (1 - 1e-9);
    }
}
