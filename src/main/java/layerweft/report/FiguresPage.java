package layerweft.report;

import java.util.ArrayList;
import java.util.List;
import java.util.SortedMap;
import layerweft.figures.BuyerPosition;
import layerweft.figures.Figure;
import layerweft.figures.FigureText;
import layerweft.figures.LayerFigures;
import layerweft.figures.LayerTermsText;
import layerweft.figures.PositionStatistics;
import layerweft.figures.ReturnPeriods;
import layerweft.model.treaty.Buyer;
import layerweft.model.treaty.Layer;
import layerweft.report.ReportInput.OfProgramme;
import layerweft.report.ReportModel.Section;
import layerweft.study.Quote;

/** The programme, drawn, and every figure of its layers and of the whole. */
final class FiguresPage {
    /** Columns that fit on a page beside the first. */
    private static final int COLUMNS = 5;

    private final Quote quote;
    private final Buyer buyer;
    private final String money;
    private final List<Block> blocks = new ArrayList<>();

    private FiguresPage(Quote quote) {
        this.quote = quote;
        this.buyer = quote.treaty().programme().buyer();
        this.money = Report.money(quote.treaty().portfolio());
    }

    static Section of(OfProgramme programme, String title) {
        FiguresPage page = new FiguresPage(programme.quote());
        page.blocks.add(Tower.of(programme.quote(), programme.uses()));
        page.terms();
        page.losses();
        page.curves();
        page.whole();
        page.buyer();
        page.notes();
        return new Section(title, page.blocks);
    }

    private void table(String title, List<String> header, List<List<Cell>> rows) {
        blocks.addAll(new Table(title, header, rows).narrow(COLUMNS));
    }

    private void terms() {
        List<List<Cell>> rows = new ArrayList<>();
        for (int j = 0; j < quote.layers().size(); j++) {
            Layer layer = quote.treaty().layer(j);
            rows.add(List.of(Cell.words(layer.name()), Cell.words(layer.perils().isEmpty() ? "all" : String.join(", ", layer.perils())),
                    Cell.words(LayerTermsText.of(layer.terms())), Cell.words(reinstatements(layer)), Cell.agreedPercent(layer.share()),
                    Cell.words(layer.inuring().isEmpty() ? "—" : String.join(", ", layer.inuring()))));
        }
        table("Terms at 100 %, in " + money, List.of("Layer", "perils", "terms", "reinstatements", "placed", "recovered before it"), rows);
    }

    private static String reinstatements(Layer layer) {
        if (layer.reinstatements() == null) {
            return "no limit on their number";
        }
        if (layer.reinstatements().isEmpty()) {
            return "none";
        }
        return layer.reinstatements().size() + " at " + String.join(", ", layer.reinstatements().stream().map(FigureText::plainPercent).toList())
                + (layer.proRataTime() ? ", pro rata of time" : "");
    }

    private void losses() {
        List<List<Cell>> rows = new ArrayList<>();
        boolean bracket = quote.layers().stream().anyMatch(f -> f.bracket() != null);
        for (LayerFigures f : quote.layers()) {
            List<Cell> row = new ArrayList<>(List.of(Cell.words(f.name()), Cell.number(f.expectedLoss()), Cell.number(f.standardDeviation()), Cell.percent(f.lossOnLine()),
                    Cell.number(f.expectedEvents()), Cell.percent(f.attachmentProbability()), Cell.oneIn(f.attachmentProbability()), Cell.percent(f.exhaustionProbability()),
                    Cell.oneIn(f.exhaustionProbability()), Cell.words(f.engine().label())));
            if (bracket) {
                row.add(f.bracket() == null ? Cell.words("—") : Cell.words(range(f.bracket().low(), f.bracket().high(), f.expectedLoss())));
            }
            rows.add(row);
        }
        List<String> header = new ArrayList<>(List.of("Layer", "expected loss", "standard deviation", "loss on line", "events a year", "attaches, chance",
                "attaches, years", "exhausts, chance", "exhausts, years", "engine"));
        if (bracket) {
            header.add("expected loss lies in");
        }
        table("The year's layer loss, in " + money, header, rows);
    }

    /** A guaranteed range, with more digits than the figure: the range is narrow. */
    private static String range(double low, double high, Figure middle) {
        Figure fine = new Figure(middle.value(), Math.max((high - low) / 10, Math.abs(middle.value()) * 1e-7));
        return FigureText.value(new Figure(low, fine.error())) + " to " + FigureText.value(new Figure(high, fine.error()));
    }

    private void curves() {
        List<String> header = new ArrayList<>(List.of("Layer"));
        ReturnPeriods.inOrder(buyer).forEach(t -> header.add("1 in " + FigureText.plain(t)));
        List<String> totals = new ArrayList<>(header);
        totals.add("tail mean " + FigureText.plainPercent(buyer.tailLevel()));
        table("Recovered in the year once in … years, in " + money, totals,
                quote.layers().stream().map(f -> row(f.name(), f.aggregate(), f.tailValueAtRisk())).toList());
        table("Recovered from the year's largest event once in … years, in " + money, header,
                quote.layers().stream().map(f -> row(f.name(), f.occurrence(), null)).toList());
    }

    private void whole() {
        List<String> header = new ArrayList<>(List.of("Losses", "mean", "standard deviation"));
        ReturnPeriods.inOrder(buyer).forEach(t -> header.add("1 in " + FigureText.plain(t)));
        header.add("tail mean " + FigureText.plainPercent(buyer.tailLevel()));
        List<List<Cell>> rows = List.of(position("gross", quote.whole().gross()), position("ceded", quote.whole().ceded()), position("net", quote.whole().net()));
        table("The whole programme: the year's losses, without premiums, in " + money, header, rows);
    }

    private List<Cell> position(String side, PositionStatistics p) {
        List<Cell> row = new ArrayList<>(List.of(Cell.words(side), Cell.number(p.mean()), Cell.number(p.standardDeviation())));
        ReturnPeriods.of(p.valueAtRisk(), buyer).values().forEach(f -> row.add(Cell.number(f)));
        row.add(Cell.number(p.tailValueAtRisk()));
        return row;
    }

    private static List<Cell> row(String name, SortedMap<Double, Figure> curve, Figure tail) {
        List<Cell> row = new ArrayList<>(List.of(Cell.words(name)));
        curve.values().forEach(f -> row.add(Cell.number(f)));
        if (tail != null) {
            row.add(Cell.number(tail));
        }
        return row;
    }

    private void buyer() {
        BuyerPosition b = quote.buyer();
        List<List<Cell>> rows = new ArrayList<>();
        rows.add(List.of(Cell.words("upfront premium"), Cell.number(b.upfrontPremium())));
        rows.add(List.of(Cell.words("expected reinstatement premium"), Cell.number(b.reinstatementPremium())));
        rows.add(List.of(Cell.words("expected recoveries"), Cell.number(b.expectedRecoveries())));
        rows.add(List.of(Cell.words("cost of cover: premiums less recoveries, expected"), Cell.number(b.costOfCover())));
        rows.add(List.of(Cell.words("expected net position"), Cell.number(b.netPosition())));
        rows.add(List.of(Cell.words("relief of standard deviation"), Cell.number(b.reliefOfStandardDeviation())));
        b.reliefOfValueAtRisk().forEach((level, relief) ->
                rows.add(List.of(Cell.words("relief of the value at risk at " + FigureText.plainPercent(level)), Cell.number(relief))));
        rows.add(List.of(Cell.words("relief of the tail mean at " + FigureText.plainPercent(buyer.tailLevel())), Cell.number(b.reliefOfTailValueAtRisk())));
        rows.add(List.of(Cell.words("cost per unit of tail relief (a ratio)"), Cell.number(b.costPerUnitOfTailRelief())));
        table("For the buyer: quoted premiums, technical where none is quoted", List.of("Buyer's figure", money), rows);
    }

    private void notes() {
        List<String> notes = new ArrayList<>();
        for (int j = 0; j < quote.layers().size(); j++) {
            for (String note : quote.notes().get(j)) {
                notes.add(quote.layers().get(j).name() + ": " + note + ".");
            }
        }
        if (!notes.isEmpty()) {
            blocks.add(new Block.Heading("To be known"));
            blocks.add(new Block.Points(notes));
        }
    }
}
