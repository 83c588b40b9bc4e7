package layerweft.desktop.picture;

import java.util.Locale;
import layerweft.figures.FigureText;

/** Numbers as the tower writes them, briefly: the strip has the digits. */
final class TowerText {
    private static final double LEAST = 0.00005;

    private TowerText() {}

    /** A part in percent: one decimal, below 0.1 % one significant digit. */
    static String part(double part) {
        return number(part).equals("—") ? "—" : number(part) + "\u2009%";
    }

    /** The same without its sign. */
    static String number(double part) {
        if (Double.isNaN(part)) {
            return "—";
        }
        if (part <= 0) {
            return "0";
        }
        if (part < LEAST) {
            return "< 0.01";
        }
        double percent = 100 * part;
        return String.format(Locale.ROOT, percent < 0.095 ? "%.2f" : "%.1f", percent);
    }

    /** 1st, 2nd, 3rd, … of a position from 0. */
    static String place(int position) {
        int n = position + 1;
        boolean teens = n % 100 >= 11 && n % 100 <= 13;
        return n + (teens || n % 10 > 3 || n % 10 == 0 ? "th" : n % 10 == 1 ? "st" : n % 10 == 2 ? "nd" : "rd");
    }

    /** Limit and retention as the trade says them. */
    static String terms(double limit, double retention) {
        String size = limit < Double.POSITIVE_INFINITY ? FigureText.groupedPlain(limit) : "unlimited";
        return size + " xs " + FigureText.groupedPlain(retention);
    }

    /** A number of full limits, with a broken part to one decimal. */
    static String count(double limits) {
        return FigureText.groupedPlain(Math.round(10 * limits) / 10.0);
    }

    static String times(double limits) {
        return count(limits) + "\u2009×";
    }
}
