package layerweft.desktop.session;

import java.util.Locale;
import layerweft.figures.Figure;
import layerweft.figures.FigureText;

/**
 * A figure as it stands on screen.
 *
 * @param value digits that follow the error; {@code ∞}, {@code —} and {@code < 0.01} where these are the answer
 * @param unit smaller and lighter beside the value; may be empty
 * @param error e.g. {@code ± 0.03}; empty where the figure is exact
 */
public record FigureShown(String value, String unit, String error) {
    /** Thin, so that a unit stays with its number. */
    public static final String THIN_SPACE = "\u2009";
    private static final char MINUS = '−';

    /** A ratio or chance in percent. */
    public static FigureShown percent(Figure ratio) {
        return of(ratio.times(100), "%");
    }

    /** Any figure in a unit. */
    public static FigureShown of(Figure figure, String unit) {
        String value = figure.value() > 0 && figure.value() < figure.error() && figure.error() < Double.POSITIVE_INFINITY
                ? "< " + FigureText.value(new Figure(figure.error(), figure.error())) : FigureText.value(figure);
        boolean number = figure.defined() && !figure.infinite();
        return new FigureShown(value.replace('-', MINUS), number ? unit : "", FigureText.error(figure));
    }

    /**
     * A change of this figure, to its last place: with a sign, but without one where nothing of it shows.
     *
     * @param difference in the figure's unit
     */
    public String change(double difference) {
        if (Double.isNaN(difference)) {
            return "—";
        }
        int point = value.indexOf('.');
        int places = point < 0 ? 0 : value.length() - point - 1;
        String digits = String.format(Locale.ROOT, "%,." + places + "f", Math.abs(difference));
        boolean nothing = digits.chars().noneMatch(c -> c >= '1' && c <= '9');
        return nothing ? digits : (difference > 0 ? "+" : "−") + digits;
    }

    /** Value and unit in one text. */
    public String text() {
        return unit.isEmpty() ? value : value + THIN_SPACE + unit;
    }

    /** Every digit there is, for hover texts and copies. */
    public static String allDigits(Figure figure) {
        if (!figure.defined()) {
            return "not defined";
        }
        if (figure.infinite()) {
            return "infinite";
        }
        return FigureText.plain(figure.value()) + (figure.error() > 0 ? String.format(Locale.ROOT, " ± %.2g", figure.error()) : "");
    }
}
