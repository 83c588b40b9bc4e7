package layerweft.report;

import java.awt.Color;
import java.util.ArrayList;
import java.util.List;
import layerweft.figures.Figure;

/** A small document of every kind of block, with names that try to be something else. */
final class Sample {
    static final String HOSTILE = "=HYPERLINK(\"http://x\")<script>alert('1')</script>&amp; \"q\"";

    private Sample() {}

    static ReportModel model() {
        List<List<Cell>> rows = new ArrayList<>();
        rows.add(List.of(Cell.words(HOSTILE), Cell.number(new Figure(14.8712, 0.0312)), Cell.percent(new Figure(0.10332, 0.0002)), Cell.oneIn(new Figure(0.012, 0.0001))));
        rows.add(List.of(Cell.words("+1"), Cell.number(Figure.INFINITE), Cell.percent(Figure.UNDEFINED), Cell.oneIn(Figure.exact(0))));
        rows.add(List.of(Cell.words("-1"), Cell.agreed(12500.75), Cell.agreedPercent(0.995), Cell.oneIn(Figure.exact(0.5))));
        rows.add(List.of(Cell.words("@SUM(A1)"), Cell.number(new Figure(-3.25, 0)), Cell.percent(Figure.exact(-0.25)), Cell.words("none")));
        Table table = new Table("Amounts in EUR million <b>", List.of("", "expected loss", "loss on line", "attaches"), rows);
        Picture picture = new Picture("A square & more", "It is <filled>.", Picture.PAGE_WIDTH, 60, g -> {
            g.setColor(new Color(0x1D5C86));
            g.fillRect(10, 10, 40, 40);
            g.setFont(Typeface.REGULAR.at(10));
            g.drawString("τ ≤ 1", 60, 30);
        });
        return new ReportModel("Quote " + HOSTILE, "τ = 0.3, ∞ ≥ 1", List.of(
                new ReportModel.Section("Summary", List.of(new Block.Heading("Heading <i>"), new Block.Paragraph("One & two < three. \u0007\u202E"), new Block.Note("small"),
                        new Block.Points(List.of("first", "=second")), table, picture, picture)),
                new ReportModel.Section("Summary", List.of(new Block.Paragraph("A second of the same name.")))));
    }
}
