package layerweft.engine.bounds;

import java.util.Arrays;

/**
 * A discrete law of one peril's annual sum, capped where more of it does not matter. Probabilities are kept from above, so that rare
 * sums keep their digits, and places in the law are named by their chance t of being passed: t = 0 is the largest value.
 */
final class Margin {
    private final double[] values;
    private final double[] above;
    private final double[] limited;

    private Margin(double[] values, double[] above) {
        this.values = values;
        this.above = above;
        this.limited = new double[values.length];
        limited[0] = values[0];
        for (int k = 1; k < values.length; k++) {
            limited[k] = limited[k - 1] + above[k - 1] * (values[k] - values[k - 1]);
        }
    }

    /**
     * @param values rising, at least 0
     * @param above P(A &gt; value), the last taken as 0; rounding that makes them rise is flattened
     */
    static Margin of(double[] values, double[] above) {
        double[] kept = new double[values.length];
        double[] tail = new double[values.length];
        double before = 1;
        int n = 0;
        for (int k = 0; k < values.length; k++) {
            double here = k == values.length - 1 ? 0 : Math.min(before, Math.max(0, above[k]));
            if (here < before) {
                kept[n] = values[k];
                tail[n++] = here;
                before = here;
            }
        }
        return new Margin(Arrays.copyOf(kept, n), Arrays.copyOf(tail, n));
    }

    int atoms() {
        return values.length;
    }

    double value(int atom) {
        return values[atom];
    }

    /** P(A &gt; value of the atom). */
    double above(int atom) {
        return above[atom];
    }

    double largest() {
        return values[values.length - 1];
    }

    double mean() {
        return limited[limited.length - 1];
    }

    /** P(A &gt; 0). */
    double chance() {
        return values[0] > 0 ? 1 : above[0];
    }

    /** E[min(A, y)], y ≥ 0. */
    double limited(double y) {
        int k = Arrays.binarySearch(values, y);
        if (k >= 0) {
            return limited[k];
        }
        int below = -k - 2;
        return below < 0 ? y : limited[below] + above[below] * (y - values[below]);
    }

    /** The atom that is taken on [t, t + dt): the smallest whose value is passed with a chance of at most t. */
    int atomFrom(double t) {
        return first(t, false);
    }

    /** The atom that is taken on (t − dt, t]. */
    int atomBelow(double t) {
        return first(t, true);
    }

    private int first(double t, boolean strictly) {
        int low = 0;
        int high = above.length - 1;
        while (low < high) {
            int middle = (low + high) >>> 1;
            if (above[middle] < t || (!strictly && above[middle] == t)) {
                high = middle;
            } else {
                low = middle + 1;
            }
        }
        return low;
    }

    /** The law of top − A, top at least the largest value. */
    Margin mirrored(double top) {
        int n = values.length;
        double[] turned = new double[n];
        double[] tail = new double[n];
        for (int k = 0; k < n; k++) {
            turned[k] = top - values[n - 1 - k];
            tail[k] = k == n - 1 ? 0 : 1 - above[n - 2 - k];
        }
        return of(turned, tail);
    }

    /** Means of A over n parts of [0, width], each of the same chance, from the largest values down. */
    double[] slices(double width, int n) {
        double[] upTo = new double[n + 1];
        int atom = values.length - 1;
        double done = 0;
        double sum = 0;
        for (int r = 1; r <= n; r++) {
            double t = r == n ? width : width * r / n;
            while (atom > 0 && above[atom - 1] <= t) {
                sum += values[atom] * (above[atom - 1] - done);
                done = above[--atom];
            }
            sum += values[atom] * (t - done);
            done = t;
            upTo[r] = sum;
        }
        double[] means = new double[n];
        for (int r = 0; r < n; r++) {
            means[r] = Math.min(largest(), (upTo[r + 1] - upTo[r]) * n / width);
        }
        return means;
    }
}
