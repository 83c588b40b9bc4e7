package layerweft.model.frequency;

/**
 * P(N ≤ n) of small counts as a sum of probabilities. The incomplete beta function, for whole arguments of which one is below 40, raises
 * 1 - x to the power of the other: with a million trials of a rare event that magnifies the rounding of 1 - x a million times. The
 * probabilities themselves do not suffer.
 */
final class LowerTail {
    private static final int SUMMED = 40;

    private LowerTail() {
    }

    /** Whether n lies in the part that is summed: below the mean, where the sum is not near 1, and of few terms. */
    static boolean holds(FrequencyModel model, int n) {
        return n < SUMMED && n < model.mean();
    }

    /** P(N ≤ n). */
    static double cdf(FrequencyModel model, int n) {
        double sum = 0;
        for (int k = 0; k <= n; k++) {
            sum += model.probability(k);
        }
        return sum;
    }
}
