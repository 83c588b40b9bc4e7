package layerweft.figures;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.text.DecimalFormat;
import java.text.DecimalFormatSymbols;
import java.util.Locale;

/**
 * Numbers as a practitioner reads them: digits follow the error (one significant digit of it, the value to the same place), at most four
 * significant digits where there is no error to speak of; thousands are grouped.
 */
public final class FigureText {
    private static final int SIGNIFICANT = 4;
    /** Most places of an agreed percentage: 99.9999999 %, 66.6666667 %. */
    private static final int PERCENT_PLACES = 7;
    /** Places to which the error of an exact-looking 0 is told. */
    private static final int PLACES_OF_ZERO = 2;

    private FigureText() {}

    /** The value alone. */
    public static String value(Figure figure) {
        return special(figure) != null ? special(figure) : grouped(figure.value(), places(figure));
    }

    /** The error alone, to the places of the value; empty where the figure is exact. */
    public static String error(Figure figure) {
        if (!figure.defined() || figure.infinite() || figure.error() == 0) {
            return "";
        }
        if (figure.error() == Double.POSITIVE_INFINITY) {
            return "± ∞";
        }
        int places = figure.value() == 0 ? Math.min(PLACES_OF_ZERO, places(figure)) : places(figure);
        double unit = Math.pow(10, -places);
        return figure.error() < 0.5 * unit ? "± < " + grouped(unit, places) : "± " + grouped(figure.error(), places);
    }

    /** A chance or ratio in percent. */
    public static String percent(Figure figure) {
        String text = value(figure.times(100));
        return special(figure) != null ? text : text + " %";
    }

    public static String percentError(Figure figure) {
        return error(figure.times(100));
    }

    /** "1 in 83 years" for a chance a year: three significant digits at most. */
    public static String oneIn(Figure chance) {
        if (!(chance.value() > 0)) {
            // none seen: rarer than the simulation can show
            return chance.error() > 0 && chance.error() < 1 ? "< 1 in " + grouped(Math.rint(1 / chance.error()), 0) : "never";
        }
        double years = 1 / chance.value();
        return "1 in " + grouped(years, Math.min(2, Math.max(0, 2 - (int) Math.floor(Math.log10(years)))));
    }

    /** A part that a person has agreed, in percent, with the digits given: 90 %, 99.5 %. */
    public static String plainPercent(double part) {
        return new BigDecimal(Double.toString(part)).movePointRight(2).setScale(PERCENT_PLACES, RoundingMode.HALF_UP).stripTrailingZeros()
                .toPlainString() + " %";
    }

    /** The shortest plain decimal that reads back the same. */
    public static String plain(double value) {
        BigDecimal decimal = new BigDecimal(Double.toString(value)).stripTrailingZeros();
        return decimal.scale() < 0 ? decimal.setScale(0).toPlainString() : decimal.toPlainString();
    }

    /** An agreed amount with the digits given, thousands grouped: 12,500 or 0.75. */
    public static String groupedPlain(double value) {
        return grouped(value, new BigDecimal(plain(value)).scale());
    }

    private static String special(Figure figure) {
        if (!figure.defined()) {
            return "—";
        }
        if (figure.infinite()) {
            return "∞";
        }
        return figure.value() == 0 ? "0" : null;
    }

    /** Decimal places: to the first digit of the error, but not beyond the fourth significant digit of the value. */
    private static int places(Figure figure) {
        boolean known = figure.error() > 0 && figure.error() < Double.POSITIVE_INFINITY;
        double size = Math.max(Math.abs(figure.value()), known ? figure.error() : 0);
        if (size == 0) {
            return 0;
        }
        int most = SIGNIFICANT - 1 - (int) Math.floor(Math.log10(size));
        if (!known) {
            return most;
        }
        double rounded = new BigDecimal(figure.error()).round(new java.math.MathContext(1, RoundingMode.HALF_UP)).doubleValue();
        return Math.min(most, -(int) Math.floor(Math.log10(rounded)));
    }

    private static String grouped(double value, int places) {
        DecimalFormat format = new DecimalFormat("#,##0", DecimalFormatSymbols.getInstance(Locale.ROOT));
        format.setMinimumFractionDigits(Math.max(0, places));
        format.setMaximumFractionDigits(Math.max(0, places));
        format.setRoundingMode(RoundingMode.HALF_UP);
        BigDecimal exact = new BigDecimal(value).setScale(Math.max(places, -12), RoundingMode.HALF_UP);
        return format.format(exact);
    }
}
