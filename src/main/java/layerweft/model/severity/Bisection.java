package layerweft.model.severity;

import java.util.function.DoublePredicate;

/** Inverts a rising condition on amounts to the last bit. */
final class Bisection {

    private Bisection() {}

    /**
     * The smallest amount in [low, high] at which a rising condition holds, {@code high} where it holds nowhere below. Halves the bits of the
     * amounts, whose order is that of the amounts themselves: at most 64 steps, whatever the magnitudes.
     *
     * @param low at least 0
     * @param high at least {@code low}, possibly infinite
     */
    static double smallest(double low, double high, DoublePredicate holds) {
        long from = Double.doubleToRawLongBits(low + 0.0);
        long to = Double.doubleToRawLongBits(high + 0.0);
        while (from < to) {
            long middle = (from + to) >>> 1;
            if (holds.test(Double.longBitsToDouble(middle))) {
                to = middle;
            } else {
                from = middle + 1;
            }
        }
        return Double.longBitsToDouble(from);
    }
}
