package layerweft.engine.transform;

import layerweft.model.frequency.FrequencyModel;

/**
 * One peril's annual count N as the engine uses it: P(N ≤ n) and P(N &gt; n) for n = 0..size−1. The year's count is cut at {@code size},
 * which more events than that pass with a negligible probability.
 *
 * @param cdf P(N ≤ n)
 * @param survival P(N &gt; n), exact where it is small
 */
record CountMargin(double[] cdf, double[] survival) {

    /** @param tail the cut is where P(N &gt; n) falls below this part of min(1, E[N]) */
    static CountMargin of(FrequencyModel frequency, double tail) {
        double negligible = tail * Math.min(1, frequency.mean());
        int size = 0;
        while (size < frequency.largest() && frequency.survival(size) > negligible) {
            size++;
        }
        int length = frequency.largest() == size ? size : size + 1;
        double[] cdf = new double[length];
        double[] survival = new double[length];
        for (int n = 0; n < length; n++) {
            cdf[n] = frequency.cdf(n);
            survival[n] = frequency.survival(n);
        }
        return new CountMargin(cdf, survival);
    }

    /** Number of thresholds: the largest count that is kept. */
    int size() {
        return survival.length;
    }

    /** P(N = n) for n = 0..size. */
    double probability(int n) {
        if (n == 0) {
            return size() == 0 ? 1 : cdf[0];
        }
        double above = n == size() ? 0 : survival[n];
        return above < 0.5 ? survival[n - 1] - above : cdf[n] - cdf[n - 1];
    }
}
