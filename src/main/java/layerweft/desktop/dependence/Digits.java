package layerweft.desktop.dependence;

import java.util.Locale;
import layerweft.figures.FigureText;

/** Numbers as this room writes them. */
final class Digits {
    private static final double ENDLESS = 1e9;

    private Digits() {}

    /** Two decimals, exact zero without, a true minus; a dash where there is no number. */
    static String two(double value) {
        if (Double.isNaN(value)) {
            return "—";
        }
        return value == 0 ? "0" : String.format(Locale.ROOT, "%.2f", value).replace('-', '−').replace("−0.00", "0.00");
    }

    /** Years to three significant digits. */
    static String years(double years) {
        return !(years < ENDLESS) ? "∞" : FigureText.groupedPlain(Double.parseDouble(String.format(Locale.ROOT, "%.3g", years)));
    }
}
