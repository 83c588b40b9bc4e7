package layerweft.command;

import layerweft.figures.FigureText;
import layerweft.study.Comparison;
import layerweft.study.NetFigures;
import layerweft.study.Structure;
import layerweft.study.StructurePair;

/** A comparison as a table: gross, a row for each structure, then a row for the difference of each pair. */
final class CompareCsv {

    private CompareCsv() {}

    static String of(Comparison found) {
        Csv csv = new Csv();
        csv.cell("position").pair("upfront premium").pair("reinstatement premium").pair("expected recoveries").pair("cost of cover").pair("cost of risk");
        csv.pair("mean").pair("standard deviation");
        found.buyer().levels().forEach(level -> csv.pair("value at risk " + FigureText.plain(level)));
        csv.pair("tail value at risk " + FigureText.plain(found.buyer().tailLevel()));
        csv.pair("cost per unit of tail relief").pair("reinsurer's return").cell("undominated").endOfRow();
        csv.cell("gross");
        blank(csv, 10);
        net(csv, found.gross());
        blank(csv, 5);
        csv.endOfRow();
        for (int k = 0; k < found.structures().size(); k++) {
            Structure s = found.structures().get(k);
            csv.cell(s.programme().name()).pair(s.cost().upfrontPremium()).pair(s.cost().reinstatementPremium()).pair(s.cost().expectedRecoveries());
            csv.pair(s.cost().costOfCover()).pair(s.costOfRisk());
            net(csv, s.net());
            csv.pair(s.costPerUnitOfTailRelief()).pair(s.reinsurersReturn()).cell(found.undominated().contains(k) ? "yes" : "no").endOfRow();
        }
        for (StructurePair pair : found.pairs()) {
            csv.cell(found.structures().get(pair.first()).programme().name() + " less " + found.structures().get(pair.second()).programme().name());
            blank(csv, 6);
            csv.pair(pair.costOfCover()).pair(pair.costOfRisk());
            net(csv, pair.net());
            blank(csv, 5);
            csv.endOfRow();
        }
        return csv.toString();
    }

    private static void net(Csv csv, NetFigures net) {
        csv.pair(net.mean()).pair(net.standardDeviation());
        net.valueAtRisk().values().forEach(csv::pair);
        csv.pair(net.tailValueAtRisk());
    }

    private static void blank(Csv csv, int cells) {
        for (int k = 0; k < cells; k++) {
            csv.cell("");
        }
    }
}
