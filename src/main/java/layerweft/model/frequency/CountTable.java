package layerweft.model.frequency;

import layerweft.model.Check;

/**
 * Probabilities of the counts from 0 up to the first one whose survival is below a tail probability: what an engine looks up in place of
 * special functions. Immutable.
 */
public final class CountTable {
    /** Tail probability of {@link #of(FrequencyModel)}: below half the distance from 1 to the double next below it. */
    public static final double DEFAULT_TAIL = 1e-17;

    private static final int MOST_ENTRIES = 10_000_000;

    private final double[] probability;
    private final double[] cdf;
    private final double[] survival;

    private CountTable(FrequencyModel model, int size) {
        probability = new double[size];
        cdf = new double[size];
        survival = new double[size];
        for (int n = 0; n < size; n++) {
            probability[n] = model.probability(n);
        }
        // sums of positive terms from either end keep their relative precision in their own tail
        survival[size - 1] = model.survival(size - 1);
        for (int n = size - 1; n > 0; n--) {
            survival[n - 1] = survival[n] + probability[n];
        }
        double below = 0;
        for (int n = 0; n < size; n++) {
            below += probability[n];
            if (below < survival[n]) {
                cdf[n] = below;
                survival[n] = 1 - below;
            } else {
                cdf[n] = Math.max(n == 0 ? 0 : cdf[n - 1], 1 - survival[n]);
            }
        }
    }

    /**
     * Table up to the first count whose survival is below 1e-17.
     *
     * @throws layerweft.model.InadmissibleException on field {@code mean} if it would need more than 10,000,000 entries
     */
    public static CountTable of(FrequencyModel model) {
        return of(model, DEFAULT_TAIL);
    }

    /**
     * Table up to the first count whose survival is below the tail probability.
     *
     * @param tailProbability above 0 and below 1
     * @throws layerweft.model.InadmissibleException on field {@code mean} if it would need more than 10,000,000 entries, on
     *     {@code tailProbability} if that is out of range
     */
    public static CountTable of(FrequencyModel model, double tailProbability) {
        new Check().between("tailProbability", tailProbability, 0, 1).orThrow();
        int last = Math.min(model.largest(), MOST_ENTRIES - 1);
        new Check().that(model.survival(last) < tailProbability, "mean", model.mean(),
                "few enough events that P(N > 9999999) is below " + tailProbability).orThrow();
        return new CountTable(model, 1 + CountSearch.first(n -> model.survival(n) < tailProbability, model, last));
    }

    /** Number of entries; the counts are 0 to size() - 1. */
    public int size() {
        return probability.length;
    }

    /** P(N = n) for n from 0 to size() - 1. */
    public double probability(int n) {
        return probability[n];
    }

    /** P(N ≤ n) for n from 0 to size() - 1; never falls as n grows. */
    public double cdf(int n) {
        return cdf[n];
    }

    /** P(N > n) for n from 0 to size() - 1. */
    public double survival(int n) {
        return survival[n];
    }
}
