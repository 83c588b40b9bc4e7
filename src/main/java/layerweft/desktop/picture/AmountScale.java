package layerweft.desktop.picture;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;

/**
 * Amounts against heights on the sheet, linear from 0 or logarithmic.
 *
 * @param low amount at {@code bottom}; above 0 if logarithmic
 * @param high amount at {@code top}
 */
record AmountScale(double low, double high, boolean log, double top, double bottom) {
    private static final int MOST_TICKS = 7;
    /** A hand cannot aim at less. */
    private static final double AIM = 6;

    static AmountScale of(Tower tower, boolean log, double top, double bottom) {
        double high = 1.04 * tower.highest();
        return new AmountScale(log ? Math.min(tower.lowest() / 2, high / 4) : 0, high, log, top, bottom);
    }

    /** Height of an amount; below the axis stays at its bottom. */
    double y(double amount) {
        if (amount <= low) {
            return bottom;
        }
        if (amount == Double.POSITIVE_INFINITY) {
            return top;
        }
        double part = log ? Math.log(amount / low) / Math.log(high / low) : (amount - low) / (high - low);
        return bottom - part * (bottom - top);
    }

    /** Amount at a height, also above the axis. */
    double amount(double y) {
        double part = Math.max(0, (bottom - y) / (bottom - top));
        return log ? low * Math.pow(high / low, part) : low + part * (high - low);
    }

    /** The least step of 1, 2 or 5 times a power of ten that a hand can aim at near an amount. */
    double step(double amount) {
        double y = Math.max(top, Math.min(bottom, y(amount)));
        return stepOf(amount(y - AIM / 2) - amount(y + AIM / 2 > bottom ? bottom : y + AIM / 2));
    }

    double snapped(double amount) {
        double step = step(amount);
        return tidy(Math.rint(amount / step) * step);
    }

    /** Amounts to be written at the axis. */
    List<Double> ticks() {
        List<Double> ticks = new ArrayList<>();
        if (!log) {
            double step = stepOf((high - low) / MOST_TICKS);
            for (int k = 0; k * step <= high; k++) {
                ticks.add(tidy(k * step));
            }
            return ticks;
        }
        for (int power = (int) Math.floor(Math.log10(low)); Math.pow(10, power) <= high; power++) {
            for (int digit : new int[] {1, 2, 5}) {
                double amount = tidy(digit * Math.pow(10, power));
                if (amount >= low && amount <= high) {
                    ticks.add(amount);
                }
            }
        }
        return ticks;
    }

    /** The least of 1, 2, 5 times a power of ten that is no smaller. */
    static double stepOf(double size) {
        double power = Math.pow(10, Math.floor(Math.log10(size)));
        for (double digit : new double[] {1, 2, 5}) {
            if (digit * power >= size * (1 - 1e-9)) {
                return tidy(digit * power);
            }
        }
        return tidy(10 * power);
    }

    static double tidy(double amount) {
        return Double.parseDouble(String.format(Locale.ROOT, "%.10g", amount));
    }
}
