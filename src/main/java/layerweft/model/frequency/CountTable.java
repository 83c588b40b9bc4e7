package layerweft.model.frequency;

import layerweft.model.Check;

/** The law of a count tabulated from 0 up to where almost nothing is left: what both engines read. */
public final class CountTable {
    /** The chance that is left above a table. */
    public static final double TAIL = 1e-17;
    /** Most entries of a table. */
    public static final int MOST = 10_000_000;

    private final double[] probability;
    private final double[] upTo;
    private final double[] above;

    private CountTable(FrequencyModel model, int size) {
        probability = new double[size];
        upTo = new double[size];
        above = new double[size];
        for (int n = 0; n < size; n++) {
            probability[n] = model.probability(n);
            upTo[n] = model.cdf(n);
            above[n] = model.survival(n);
        }
    }

    /** Up to the first count that is passed with a chance below {@value #TAIL}. */
    public static CountTable of(FrequencyModel model) {
        return of(model, TAIL);
    }

    /**
     * Up to the first count that is passed with a chance below {@code tail}.
     *
     * @throws layerweft.model.InadmissibleException on {@code mean} if that takes more than {@value #MOST} entries
     */
    public static CountTable of(FrequencyModel model, double tail) {
        new Check().that(model.largest() < MOST || model.survival(MOST - 1) < tail, "mean", model.mean(),
                "a frequency whose counts stay below " + MOST).orThrow();
        int low = 1;
        int high = Math.min(MOST, model.largest() == Integer.MAX_VALUE ? MOST : model.largest() + 1);
        while (low < high) {
            int middle = (low + high) >>> 1;
            if (model.survival(middle - 1) < tail) {
                high = middle;
            } else {
                low = middle + 1;
            }
        }
        return new CountTable(model, low);
    }

    /** Number of counts tabulated: 0 to size − 1. */
    public int size() {
        return probability.length;
    }

    /** P(N = n), n below the size. */
    public double probability(int n) {
        return probability[n];
    }

    /** P(N ≤ n), n below the size. */
    public double cdf(int n) {
        return upTo[n];
    }

    /** P(N &gt; n), n below the size; exact in the tail. */
    public double survival(int n) {
        return above[n];
    }
}
