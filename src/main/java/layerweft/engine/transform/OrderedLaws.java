package layerweft.engine.transform;

import java.util.Arrays;

/**
 * Two laws on a lattice that hold an event's occurrence loss, capped, between them in their stop-loss transforms: for every y from 0 to the
 * cap E[(o_lower − y)+] − slack ≤ E[(min(o, cap) − y)+] ≤ E[(o_upper − y)+] + slack. Sums of independent losses inherit the order (Müller &amp;
 * Stoyan 2002, "Comparison methods for stochastic models and risks", theorem 1.5.5): the slack counts once for every event, as there is a
 * law above {@code upper} by a rare extra loss of that mean, and one below {@code lower} by a cut at the top, which are ordered strictly.
 *
 * @param step h, in money
 * @param upper P(o_upper &gt; kh), k = 0..cells−1
 * @param lower P(o_lower &gt; kh)
 * @param slack in money; 0 where the order holds as it stands
 * @param meanLow E[min(o, cap)] is at least this
 * @param meanHigh and at most this
 * @param beyondLow E[(o − cap)+] is at least this
 * @param beyondHigh and at most this, possibly infinite
 * @param allLow E[o] is at least this
 * @param allHigh and at most this
 */
record OrderedLaws(double step, double[] upper, double[] lower, double slack, double meanLow, double meanHigh,
        double beyondLow, double beyondHigh, double allLow, double allHigh) {

    /** In the order of {@link StopLossRange#amounts}. */
    double[] amounts() {
        return new double[] {step * Arrays.stream(upper).sum(), step * Arrays.stream(lower).sum(), slack, meanLow, meanHigh, beyondLow, beyondHigh,
            allLow, allHigh};
    }

    /** The laws of a loss that these bring with a chance only. */
    OrderedLaws thinned(double chance) {
        return new OrderedLaws(step, Arrays.stream(upper).map(p -> chance * p).toArray(), Arrays.stream(lower).map(p -> chance * p).toArray(),
                chance * slack, chance * meanLow, chance * meanHigh, chance * beyondLow, chance * beyondHigh, chance * allLow, chance * allHigh);
    }

    /** E[min(K, y)] of a law on the lattice, linear between its points. */
    static double limited(double[] survival, double step, double y) {
        double cells = y / step;
        int k = (int) Math.min(survival.length - 1, Math.floor(cells + 1e-9));
        double sum = Math.max(0, cells - k) * survival[k];
        for (int j = k - 1; j >= 0; j--) {
            sum += survival[j];
        }
        return sum * step;
    }
}
