package layerweft.engine.simulation;

import java.util.Arrays;
import layerweft.model.copula.ScoreSampler;
import layerweft.model.frequency.CountTable;

/**
 * Turns a copula's scores into counts: N = F⁻¹(U) is the number of n with U &gt; F(n), that is with a score above the score of F(n).
 * The thresholds are tabulated once, so a count costs a few comparisons and no uniform, exponential or power is ever formed.
 */
final class CountThresholds {
    /** Below this length a scan from 0 beats a binary search: most counts are small. */
    private static final int SCAN = 24;

    private static final int UNROLLED = 4;

    /** Rising; at least {@value #UNROLLED}, filled up with infinity. */
    private final double[] thresholds;

    CountThresholds(CountTable table, ScoreSampler sampler, int margin) {
        thresholds = new double[Math.max(UNROLLED, table.size())];
        Arrays.fill(thresholds, Double.POSITIVE_INFINITY);
        for (int n = 0; n < table.size(); n++) {
            thresholds[n] = sampler.score(margin, table.cdf(n), table.survival(n));
        }
    }

    /** The counts of {@code years} scores; returns their sum. */
    long counts(double[] scores, int years, int[] counts) {
        double[] t = thresholds;
        long sum = 0;
        if (t.length <= SCAN) {
            double t0 = t[0];
            double t1 = t[1];
            double t2 = t[2];
            double t3 = t[3];
            for (int y = 0; y < years; y++) {
                double score = scores[y];
                // most counts are decided by these four comparisons, which cost no wrong guess of a branch
                int n = (score > t0 ? 1 : 0) + (score > t1 ? 1 : 0) + (score > t2 ? 1 : 0) + (score > t3 ? 1 : 0);
                while (n >= UNROLLED && n < t.length && score > t[n]) {
                    n++;
                }
                counts[y] = n;
                sum += n;
            }
        } else {
            for (int y = 0; y < years; y++) {
                int at = Arrays.binarySearch(t, scores[y]);
                int n = at < 0 ? -at - 1 : firstOf(t, at);
                counts[y] = n;
                sum += n;
            }
        }
        return sum;
    }

    /** Thresholds can be equal where the cdf is flat or saturates: a score equal to them lies above none of them. */
    private static int firstOf(double[] t, int at) {
        int n = at;
        while (n > 0 && t[n - 1] == t[n]) {
            n--;
        }
        return n;
    }
}
