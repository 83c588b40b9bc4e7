package layerweft.file;

import java.math.BigDecimal;
import java.math.MathContext;

/** Figures in the sentences that say what a change has kept. */
final class Shown {
    private static final int DIGITS = 4;
    private static final int TIDY_DIGITS = 12;
    private static final double TOLERANCE = 1e-6;

    private Shown() {}

    /** Four significant digits. */
    static String number(double value) {
        if (Double.isInfinite(value)) {
            return "infinite";
        }
        return Double.isNaN(value) ? "undefined" : new BigDecimal(value).round(new MathContext(DIGITS)).stripTrailingZeros().toPlainString();
    }

    static boolean same(double one, double other) {
        return one == other || Double.isFinite(one) && Math.abs(one - other) <= TOLERANCE * Math.abs(one);
    }

    /** E.g. "The mean, 14, is kept." or "The mean was 14 and is now 15." */
    static String kept(String figure, double before, double now) {
        if (same(before, now)) {
            return "The " + figure + ", " + number(before) + ", is kept.";
        }
        return "The " + figure + " was " + number(before) + " and is now " + number(now) + ".";
    }

    /** Without the last digits that computing has left: 14 for 13.999999999999998. */
    static double tidy(double value) {
        return value == 0 || !Double.isFinite(value) ? value : new BigDecimal(value).round(new MathContext(TIDY_DIGITS)).doubleValue();
    }
}
