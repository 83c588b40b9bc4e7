package layerweft.command;

import layerweft.figures.Figure;
import layerweft.study.FigureKind;
import layerweft.study.Ranking;
import layerweft.study.Sensitivity;

/** A ranking as text, with a bar for each change: to the right where the figure rises, to the left where it falls. */
final class RankText {
    private static final int HALF = 20;
    private static final String EIGHTHS = " ▏▎▍▌▋▊▉█";

    private RankText() {}

    static String of(Ranking ranking) {
        FigureKind kind = ranking.figure();
        StringBuilder text = new StringBuilder(ranking.treaty().portfolio().name()).append(": ")
                .append(ranking.treaty().programme().name()).append('\n');
        text.append(ranking.layer().orElse("Sum of the layers")).append(", ").append(FigureKindText.title(kind, ranking.treaty().portfolio()))
                .append(": ").append(FigureKindText.value(kind, ranking.base())).append(' ').append(FigureKindText.error(kind, ranking.base()))
                .append("\n\n");
        double largest = ranking.sensitivities().stream().mapToDouble(s -> Math.abs(s.change().value())).filter(Double::isFinite).max().orElse(0);
        TextTable table = new TextTable("", "step", "change", "", "relative", " ".repeat(HALF - 6) + "falls │ rises" + " ".repeat(HALF - 6));
        for (Sensitivity s : ranking.sensitivities()) {
            String name = s.subject().isEmpty() ? s.lever().words() : s.subject() + ", " + s.lever().words();
            table.row(name, s.step(), FigureKindText.change(kind, s.change()), FigureKindText.error(kind, s.change()),
                    FigureKindText.lift(relative(s.change(), ranking.base())),
                    bar(s.change().value(), largest));
        }
        text.append(table).append('\n');
        ranking.sensitivities().forEach(s -> s.reach().ifPresent(r ->
                text.append("The ").append(s.lever().words()).append(" can move it from ").append(reach(kind, r)).append(".\n")));
        ranking.notVaried().forEach(reason -> text.append("Not varied: ").append(reason).append(".\n"));
        return text.toString();
    }

    private static Figure relative(Figure change, Figure base) {
        return base.value() > 0 && !base.infinite() ? change.over(base.value()) : Figure.UNDEFINED;
    }

    private static String reach(FigureKind kind, Sensitivity.Reach r) {
        return FigureKindText.value(kind, r.atLowest()) + " (" + r.lowest() + ") to "
                + FigureKindText.value(kind, r.atHighest()) + " (" + r.highest() + ")";
    }

    /** Fixed width, zero in the middle; falls are drawn in whole characters, as there are no blocks that fill from the right. */
    static String bar(double change, double largest) {
        double length = largest > 0 && Double.isFinite(change) ? HALF * Math.abs(change) / largest : 0;
        if (change < 0) {
            int whole = (int) Math.round(length);
            return " ".repeat(HALF - whole) + "█".repeat(whole) + "│" + " ".repeat(HALF);
        }
        int eighths = (int) Math.round(8 * length);
        String blocks = "█".repeat(eighths / 8) + (eighths % 8 == 0 ? "" : String.valueOf(EIGHTHS.charAt(eighths % 8)));
        return " ".repeat(HALF) + "│" + blocks + " ".repeat(HALF - blocks.length());
    }
}
