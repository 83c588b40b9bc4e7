package layerweft.command;

import de.siegmar.fastcsv.writer.CsvWriter;
import java.io.IOException;
import java.io.StringWriter;
import java.io.UncheckedIOException;
import layerweft.engine.bounds.LayerRange;
import layerweft.study.Bounds;

/** Bounds as a table for a spreadsheet, a row for each layer; empty cells where a layer has none, the reason in the last column. */
final class BoundsCsv {

    private BoundsCsv() {}

    static String of(Bounds bounds) {
        StringWriter text = new StringWriter();
        try (CsvWriter csv = CsvWriter.builder().build(text)) {
            csv.writeRecord("layer", "lowest", "attainedLow", "independent", "comonotone", "attainedHigh", "highest", "error", "note");
            for (Bounds.Answer answer : bounds.layers()) {
                LayerRange r = answer.range();
                String note = answer.note() == null ? "" : answer.note();
                if (r == null) {
                    csv.writeRecord(answer.name(), "", "", "", "", "", "", "", note);
                } else {
                    csv.writeRecord(answer.name(), number(r.lowest()), number(r.attainedLow()), number(r.independent()), number(r.comonotone()),
                            number(r.attainedHigh()), number(r.highest()), number(r.error()), note);
                }
            }
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
        return text.toString();
    }

    private static String number(double value) {
        return Double.isInfinite(value) ? "infinity" : Double.toString(value);
    }
}
