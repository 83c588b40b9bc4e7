package layerweft.command;

import java.util.List;
import java.util.SortedMap;
import layerweft.figures.Figure;
import layerweft.figures.FigureText;
import layerweft.figures.LayerFigures;
import layerweft.figures.PositionStatistics;
import layerweft.figures.ReturnPeriods;
import layerweft.model.treaty.Buyer;
import layerweft.study.Quote;

/**
 * A quote as a table for a spreadsheet: a row for each layer, then gross, ceded and net; each figure's error in the column after it. An
 * infinite figure is the word infinity, an undefined one an empty cell.
 */
final class QuoteCsv {
    private final Csv csv = new Csv();
    private final Quote quote;
    private final Buyer buyer;

    private QuoteCsv(Quote quote) {
        this.quote = quote;
        this.buyer = quote.treaty().programme().buyer();
    }

    static String of(Quote quote) {
        return new QuoteCsv(quote).write();
    }

    private String write() {
        header();
        for (LayerFigures layer : quote.layers()) {
            row(layer);
        }
        row("gross", quote.whole().gross());
        row("ceded", quote.whole().ceded());
        row("net", quote.whole().net());
        return csv.toString();
    }

    private void header() {
        List.of("layer", "engine", "share", "quotedPremium", "quotedRateOnLine").forEach(csv::cell);
        List.of("expectedLoss", "standardDeviation", "lossOnLine", "attachmentProbability", "exhaustionProbability", "expectedEvents",
                "paidUpFactor", "netPremium", "technicalPremium", "technicalRateOnLine", "payback").forEach(csv::pair);
        buyer.levels().forEach(level -> csv.pair("valueAtRisk " + FigureText.plain(level)));
        csv.pair("tailValueAtRisk " + FigureText.plain(buyer.tailLevel()));
        ReturnPeriods.inOrder(buyer).forEach(t -> csv.pair("largest event 1 in " + FigureText.plain(t)));
        csv.endOfRow();
    }

    private void row(LayerFigures f) {
        double share = quote.treaty().layer(quote.layers().indexOf(f)).share();
        csv.cell(f.name()).cell(f.engine().label()).cell(share).cell(f.quotedPremium() == null ? Double.NaN : f.quotedPremium())
                .cell(f.quotedRateOnLine() == null ? Double.NaN : f.quotedRateOnLine());
        List.of(f.expectedLoss(), f.standardDeviation(), f.lossOnLine(), f.attachmentProbability(), f.exhaustionProbability(), f.expectedEvents(),
                f.paidUpFactor(), f.netPremium(), f.technicalPremium(), f.technicalRateOnLine(), f.payback()).forEach(csv::pair);
        tail(f.valueAtRisk(), f.tailValueAtRisk(), f.occurrence());
    }

    private void row(String side, PositionStatistics p) {
        csv.cell(side).cell("simulation").cell("").cell("").cell("").pair(p.mean()).pair(p.standardDeviation());
        for (int empty = 0; empty < 9; empty++) {
            csv.pair(Figure.UNDEFINED);
        }
        tail(p.valueAtRisk(), p.tailValueAtRisk(), ReturnPeriods.of(p.occurrenceValueAtRisk(), buyer));
    }

    private void tail(SortedMap<Double, Figure> atRisk, Figure tail, SortedMap<Double, Figure> occurrence) {
        atRisk.values().forEach(csv::pair);
        csv.pair(tail);
        occurrence.values().forEach(csv::pair);
        csv.endOfRow();
    }
}
