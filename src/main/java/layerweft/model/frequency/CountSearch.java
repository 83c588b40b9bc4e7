package layerweft.model.frequency;

import java.util.function.IntPredicate;

/** Finds the first count with a property that holds from some count on, in a number of steps that grows with the logarithm of its distance. */
final class CountSearch {
    private CountSearch() {
    }

    /**
     * The smallest n with P(N ≤ n) ≥ p. The cdf as it is computed decides, so that {@code quantile(cdf(n))} gives n back wherever n and
     * n - 1 have different values of the cdf.
     *
     * @throws IllegalArgumentException if p is outside [0, 1]
     */
    static int quantile(FrequencyModel model, double p) {
        if (!(p >= 0 && p <= 1)) {
            throw new IllegalArgumentException("p: found " + p + "; admissible: from 0 to 1");
        }
        if (p == 1) {
            return model.largest();
        }
        return first(n -> model.cdf(n) >= p, model, model.largest());
    }

    /**
     * The smallest n in 0..last with the property, which holds for every count above that n too; {@code last} if it holds for none below.
     * The search starts at the mean and goes outwards in steps that double from one standard deviation, then halves the interval found.
     */
    static int first(IntPredicate property, FrequencyModel model, int last) {
        long step = Math.max(1, (long) Math.min(Math.sqrt(model.variance()), last));
        long start = (long) Math.min(model.mean(), last);
        long without = start;
        long with = start;
        if (start == last || property.test((int) start)) {
            do {
                with = without;
                without = Math.max(-1, without - step);
                step *= 2;
            } while (without >= 0 && property.test((int) without));
        } else {
            do {
                without = with;
                with = Math.min(last, with + step);
                step *= 2;
            } while (with < last && !property.test((int) with));
        }
        while (with - without > 1) {
            long middle = (with + without) >>> 1;
            if (property.test((int) middle)) {
                with = middle;
            } else {
                without = middle;
            }
        }
        return (int) with;
    }
}
