package layerweft.command;

import java.util.List;
import layerweft.engine.bounds.LayerRange;
import layerweft.study.Bounds;

/** Bounds as a table for a spreadsheet, a row for each layer; empty cells where a layer has none, the reason in the last column. */
final class BoundsCsv {

    private BoundsCsv() {}

    static String of(Bounds bounds) {
        Csv csv = new Csv();
        List.of("layer", "lowest", "attainedLow", "independent", "comonotone", "attainedHigh", "highest", "error", "note").forEach(csv::cell);
        csv.endOfRow();
        for (Bounds.Answer answer : bounds.layers()) {
            csv.cell(answer.name());
            if (answer.range() == null) {
                for (int empty = 0; empty < 7; empty++) {
                    csv.cell("");
                }
            } else {
                range(csv, answer.range());
            }
            csv.cell(answer.note() == null ? "" : answer.note()).endOfRow();
        }
        return csv.toString();
    }

    private static void range(Csv csv, LayerRange r) {
        csv.cell(r.lowest()).cell(r.attainedLow()).cell(r.independent()).cell(r.comonotone()).cell(r.attainedHigh()).cell(r.highest())
                .cell(r.error());
    }
}
