package layerweft.command;

import java.util.Locale;
import layerweft.figures.Figure;
import layerweft.figures.FigureText;
import layerweft.model.portfolio.Portfolio;
import layerweft.study.FigureKind;

/** Figures of a study in the unit that they are measured in. */
final class FigureKindText {

    private FigureKindText() {}

    static String value(FigureKind kind, Figure figure) {
        return kind.measured() == FigureKind.Measured.AS_PART ? FigureText.percent(figure) : FigureText.value(figure);
    }

    static String error(FigureKind kind, Figure figure) {
        return kind.measured() == FigureKind.Measured.AS_PART ? FigureText.percentError(figure) : FigureText.error(figure);
    }

    /** With a sign, so that it reads as a change; of a part in percentage points. */
    static String change(FigureKind kind, Figure change) {
        boolean part = kind.measured() == FigureKind.Measured.AS_PART;
        String text = FigureText.value(part ? change.times(100) : change) + (part && change.defined() ? " points" : "");
        return change.value() > 0 && !change.infinite() ? "+" + text : text;
    }

    /** A change relative to what it was, in percent with a sign. */
    static String lift(Figure lift) {
        return lift.defined() ? String.format(Locale.ROOT, "%+.1f %%", 100 * lift.value() + 0.0) : "—";
    }

    /** The figure's words, with the currency where it is money. */
    static String title(FigureKind kind, Portfolio portfolio) {
        boolean money = kind.measured() == FigureKind.Measured.IN_MONEY;
        return money ? (kind.words() + ", " + portfolio.currency() + " " + portfolio.unit()).strip() : kind.words();
    }

    /** At the beginning of a sentence. */
    static String capital(String words) {
        return words.substring(0, 1).toUpperCase(Locale.ROOT) + words.substring(1);
    }

    /** The title of an axis whose numbers stand alone. */
    static String axis(FigureKind kind, Portfolio portfolio) {
        return title(kind, portfolio) + (kind.measured() == FigureKind.Measured.AS_PART ? ", %" : "");
    }
}
