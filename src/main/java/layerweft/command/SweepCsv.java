package layerweft.command;

import java.util.List;
import layerweft.figures.LayerFigures;
import layerweft.study.LayerSweep;
import layerweft.study.Sweep;
import layerweft.study.SweepPoint;

/** A sweep as a table for a spreadsheet: a row for each layer, family and τ. */
final class SweepCsv {

    private SweepCsv() {}

    static String of(Sweep sweep) {
        Csv csv = new Csv();
        List.of("family", "kendallTau", "layer", "engine").forEach(csv::cell);
        List.of("expectedLoss", "standardDeviation", "lossOnLine", "technicalPremium", "lift", sweep.request().figure().label() + " swept",
                "lift of swept", "slope of swept").forEach(csv::pair);
        if (sweep.request().check() > 0) {
            csv.pair("simulated");
        }
        csv.endOfRow();
        for (LayerSweep layer : sweep.layers()) {
            for (SweepPoint p : layer.points()) {
                LayerFigures f = p.figures();
                csv.cell(p.family().label()).cell(p.kendallTau()).cell(layer.name()).cell(f.engine().label());
                csv.pair(f.expectedLoss()).pair(f.standardDeviation()).pair(f.lossOnLine()).pair(f.technicalPremium());
                csv.pair(p.lift()).pair(p.value()).pair(p.valueLift()).pair(p.slope());
                if (p.check() != null) {
                    csv.pair(sweep.request().figure().of(p.check()));
                }
                csv.endOfRow();
            }
        }
        return csv.toString();
    }
}
