package layerweft.model.frequency;

/** Quantiles of counts from their distribution function. */
final class CountSearch {

    private CountSearch() {}

    /**
     * The smallest n with P(N ≤ n) ≥ p: doubling steps up from 0, then bisection.
     *
     * @throws IllegalArgumentException if p is outside [0, 1]
     */
    static int quantile(FrequencyModel model, double p) {
        if (!(p >= 0 && p <= 1)) {
            throw new IllegalArgumentException("probability " + p + "; admissible: from 0 to 1");
        }
        if (p == 1) {
            return model.largest();
        }
        int below = -1;
        int reached = 0;
        while (!reaches(model, reached, p)) {
            below = reached;
            reached = (int) Math.min(model.largest(), 2L * reached + 1);
        }
        while (reached - below > 1) {
            int middle = below + (reached - below) / 2;
            if (reaches(model, middle, p)) {
                reached = middle;
            } else {
                below = middle;
            }
        }
        return reached;
    }

    /** Above one half by the survival function: there 1 − p is exact, and the distribution function has no digits left. */
    private static boolean reaches(FrequencyModel model, int n, double p) {
        return n == model.largest() || (p > 0.5 ? model.survival(n) <= 1 - p : model.cdf(n) >= p);
    }
}
