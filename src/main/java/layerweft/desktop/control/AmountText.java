package layerweft.desktop.control;

import java.util.Locale;
import java.util.Map;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import layerweft.figures.FigureText;

/** Numbers as people type them: {@code 12.5m}, {@code 1,200}, {@code 35%}. */
public final class AmountText {
    private static final Pattern NUMBER = Pattern.compile("([+-]?)((?:\\d{1,3}(?:,\\d{3})+|\\d+)?(?:\\.\\d*)?(?:[eE][+-]?\\d+)?)(k|m|bn|%)?");
    private static final Map<String, Double> SUFFIXES = Map.of("k", 1e3, "m", 1e6, "bn", 1e9);
    private static final Map<String, Double> UNITS = Map.of("one", 1.0, "thousand", 1e3, "million", 1e6, "billion", 1e9);
    private static final Map<String, String> SHORT = Map.of("thousand", "k", "million", "m", "billion", "bn");

    /** What a field holds. */
    public enum Kind {
        /** Money in the file's unit; takes k, m and bn. */
        AMOUNT,
        /** A plain number. */
        NUMBER,
        /** A part of 1, typed and shown in percent. */
        PART
    }

    /**
     * What was made of a text.
     *
     * @param value in the file's unit, a part as a fraction; NaN where the text is no number
     * @param refusal what would have been admissible, in words; empty where the text is a number
     */
    public record Read(double value, String refusal) {}

    private AmountText() {}

    /**
     * Reads a number.
     *
     * @param unit of the file, e.g. {@code million}
     */
    public static Read read(String text, Kind kind, String unit) {
        String typed = text.strip().replace('−', '-').replaceAll("[\\s'\u2009\u202f\u00a0]", "");
        Matcher number = NUMBER.matcher(typed);
        if (!number.matches() || number.group(2).isEmpty() || number.group(2).equals(".")) {
            return refused(typed.contains(",") ? "a number; a comma separates thousands, as in 1,200" : "a number, as " + example(kind));
        }
        double value = Double.parseDouble(number.group(1) + number.group(2).replace(",", ""));
        String suffix = number.group(3) == null ? "" : number.group(3);
        if (!Double.isFinite(value)) {
            return refused("a finite number");
        }
        if (suffix.equals("%")) {
            return kind == Kind.AMOUNT ? refused("an amount, not a percentage") : new Read(value / 100, "");
        }
        if (suffix.isEmpty()) {
            return new Read(kind == Kind.PART ? value / 100 : value, "");
        }
        if (kind != Kind.AMOUNT) {
            return refused("a number without " + suffix);
        }
        Double file = UNITS.get(unit.strip().toLowerCase(Locale.ROOT));
        return file == null ? refused("an amount without " + suffix + ": the file counts in " + (unit.isBlank() ? "an unnamed unit" : unit))
                : new Read(tidy(value * (SUFFIXES.get(suffix) / file)), "");
    }

    private static Read refused(String admissible) {
        return new Read(Double.NaN, admissible);
    }

    private static String example(Kind kind) {
        return switch (kind) {
            case AMOUNT -> "12.5m or 1,200";
            case NUMBER -> "0.3 or 1,200";
            case PART -> "35%";
        };
    }

    /** 0.1 × 1000 is 100, not 100.00000000000001. */
    private static double tidy(double value) {
        return Double.parseDouble(String.format(Locale.ROOT, "%.15g", value));
    }

    /** The number as a field shows it at rest. */
    public static String write(double value, Kind kind) {
        String text = FigureText.groupedPlain(kind == Kind.PART ? tidy(100 * value) : value);
        return text.replace('-', '−');
    }

    /** The sign of the unit inside a field: {@code m}, {@code bn}, {@code k}, {@code %}, or nothing. */
    public static String sign(Kind kind, String unit) {
        return switch (kind) {
            case AMOUNT -> SHORT.getOrDefault(unit.strip().toLowerCase(Locale.ROOT), "");
            case NUMBER -> "";
            case PART -> "%";
        };
    }
}
