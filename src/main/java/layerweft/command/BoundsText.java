package layerweft.command;

import layerweft.engine.bounds.LayerRange;
import layerweft.figures.Figure;
import layerweft.figures.FigureText;
import layerweft.model.portfolio.Portfolio;
import layerweft.study.Bounds;

/** Bounds as text that can be pasted into a mail. */
final class BoundsText {

    private BoundsText() {}

    static String of(Bounds bounds) {
        Portfolio portfolio = bounds.treaty().portfolio();
        StringBuilder text = new StringBuilder();
        text.append(portfolio.name()).append(": ").append(bounds.treaty().programme().name()).append('\n');
        text.append("Range of the expected loss over every dependence between the perils' annual losses, ")
                .append((portfolio.currency() + " " + portfolio.unit()).strip()).append(", layers at their placed shares.\n\n");
        TextTable table = new TextTable("", "lowest", "attained low", "independent", "comonotone", "attained high", "highest", "error");
        for (Bounds.Answer answer : bounds.layers()) {
            LayerRange r = answer.range();
            if (r == null) {
                table.row(answer.name(), "—", "—", "—", "—", "—", "—", "—");
            } else {
                table.row(answer.name(), value(r.lowest(), r), value(r.attainedLow(), r), value(r.independent(), r),
                        value(r.comonotone(), r), value(r.attainedHigh(), r), value(r.highest(), r), FigureText.error(new Figure(r.independent(), r.error())));
            }
        }
        text.append(table).append('\n');
        text.append("Lowest and highest are proven: no dependence passes them; an attained value is reached by a dependence that was found, "
                + "so the true extreme lies between the two.\n");
        for (Bounds.Answer answer : bounds.layers()) {
            if (answer.note() != null) {
                text.append("* ").append(answer.name()).append(": ").append(answer.range() == null ? "no bounds, because " : "").append(answer.note())
                        .append(".\n");
            }
        }
        return text.toString();
    }

    private static String value(double value, LayerRange range) {
        return FigureText.value(new Figure(value, range.error()));
    }
}
