package layerweft.command;

import de.siegmar.fastcsv.writer.CsvWriter;
import java.io.IOException;
import java.io.StringWriter;
import java.io.UncheckedIOException;
import java.util.ArrayList;
import java.util.List;
import java.util.SortedMap;
import layerweft.figures.Figure;
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
        StringWriter text = new StringWriter();
        try (CsvWriter csv = CsvWriter.builder().build(text)) {
            csv.writeRecord(header());
            for (LayerFigures layer : quote.layers()) {
                csv.writeRecord(row(layer));
            }
            csv.writeRecord(row("gross", quote.whole().gross()));
            csv.writeRecord(row("ceded", quote.whole().ceded()));
            csv.writeRecord(row("net", quote.whole().net()));
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
        return text.toString();
    }

    private List<String> header() {
        List<String> cells = new ArrayList<>(List.of("layer", "engine", "share", "quotedPremium", "quotedRateOnLine"));
        for (String name : List.of("expectedLoss", "standardDeviation", "lossOnLine", "attachmentProbability", "exhaustionProbability",
                "expectedEvents", "paidUpFactor", "netPremium", "technicalPremium", "technicalRateOnLine", "payback")) {
            pair(cells, name);
        }
        buyer.levels().forEach(level -> pair(cells, "valueAtRisk " + FigureText.plain(level)));
        pair(cells, "tailValueAtRisk " + FigureText.plain(buyer.tailLevel()));
        ReturnPeriods.inOrder(buyer).forEach(t -> pair(cells, "largest event 1 in " + FigureText.plain(t)));
        return cells;
    }

    private static void pair(List<String> cells, String name) {
        cells.add(name);
        cells.add(name + " error");
    }

    private List<String> row(LayerFigures f) {
        double share = quote.treaty().layer(quote.layers().indexOf(f)).share();
        List<String> cells = new ArrayList<>(List.of(f.name(), f.engine().label(), number(share),
                f.quotedPremium() == null ? "" : number(f.quotedPremium()), f.quotedRateOnLine() == null ? "" : number(f.quotedRateOnLine())));
        for (Figure figure : List.of(f.expectedLoss(), f.standardDeviation(), f.lossOnLine(), f.attachmentProbability(),
                f.exhaustionProbability(), f.expectedEvents(), f.paidUpFactor(), f.netPremium(), f.technicalPremium(), f.technicalRateOnLine(),
                f.payback())) {
            pair(cells, figure);
        }
        tail(cells, f.valueAtRisk(), f.tailValueAtRisk(), f.occurrence());
        return cells;
    }

    private List<String> row(String side, PositionStatistics p) {
        List<String> cells = new ArrayList<>(List.of(side, "simulation", "", "", ""));
        pair(cells, p.mean());
        pair(cells, p.standardDeviation());
        for (int empty = 0; empty < 18; empty++) {
            cells.add("");
        }
        tail(cells, p.valueAtRisk(), p.tailValueAtRisk(), ReturnPeriods.of(p.occurrenceValueAtRisk(), buyer));
        return cells;
    }

    private static void tail(List<String> cells, SortedMap<Double, Figure> atRisk, Figure tail, SortedMap<Double, Figure> occurrence) {
        atRisk.values().forEach(figure -> pair(cells, figure));
        pair(cells, tail);
        occurrence.values().forEach(figure -> pair(cells, figure));
    }

    private static void pair(List<String> cells, Figure figure) {
        cells.add(number(figure.value()));
        cells.add(figure.defined() ? number(figure.error()) : "");
    }

    private static String number(double value) {
        return Double.isNaN(value) ? "" : Double.isInfinite(value) ? "infinity" : Double.toString(value);
    }
}
