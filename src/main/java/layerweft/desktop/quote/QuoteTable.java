package layerweft.desktop.quote;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import layerweft.desktop.session.FigureShown;
import layerweft.figures.Figure;
import layerweft.figures.FigureText;
import layerweft.figures.LayerFigures;
import layerweft.model.treaty.Treaty;

/** The figures of all layers as the Quote room tells them, at the placed shares or at 100 %. */
record QuoteTable(List<String> header, List<List<String>> rows) {

    static QuoteTable of(Treaty treaty, List<LayerFigures> layers, boolean atShare) {
        List<String> header = List.of("", "expected loss", "error", "std dev", "loss on line", "attaches", "exhausts",
                "TVaR " + FigureText.plainPercent(treaty.programme().buyer().tailLevel()), "paid-up factor", "technical", "rate on line", "quoted", "against technical");
        List<List<String>> rows = new ArrayList<>();
        for (int j = 0; j < layers.size(); j++) {
            rows.add(row(layers.get(j), atShare ? 1 : 1 / treaty.layer(j).share()));
        }
        return new QuoteTable(header, rows);
    }

    private static List<String> row(LayerFigures layer, double part) {
        FigureShown loss = FigureShown.of(layer.expectedLoss().times(part), "");
        String quoted = layer.quotedPremium() == null ? "—" : FigureText.groupedPlain(tidy(layer.quotedPremium() * part));
        return List.of(layer.name(), loss.value(), loss.error(), value(layer.standardDeviation().times(part)), percent(layer.lossOnLine()),
                percent(layer.attachmentProbability()), percent(layer.exhaustionProbability()), value(layer.tailValueAtRisk().times(part)),
                value(layer.paidUpFactor()), value(layer.technicalPremium().times(part)), percent(layer.technicalRateOnLine()), quoted, against(layer));
    }

    /** Quoted by technical premium less 1; — where none is quoted. */
    static double againstTechnical(LayerFigures layer) {
        boolean known = layer.quotedPremium() != null && layer.technicalPremium().value() > 0 && !layer.technicalPremium().infinite();
        return known ? layer.quotedPremium() / layer.technicalPremium().value() - 1 : Double.NaN;
    }

    private static String against(LayerFigures layer) {
        double ratio = againstTechnical(layer);
        if (Double.isNaN(ratio)) {
            return "—";
        }
        double error = layer.technicalPremium().error() / layer.technicalPremium().value();
        FigureShown shown = FigureShown.of(new Figure(Math.abs(100 * ratio), Math.max(0.05, 100 * error)), "%");
        return shown.change(100 * ratio) + FigureShown.THIN_SPACE + "%";
    }

    private static double tidy(double value) {
        return Double.parseDouble(String.format(Locale.ROOT, "%.6g", value));
    }

    private static String value(Figure figure) {
        return FigureShown.of(figure, "").text();
    }

    private static String percent(Figure figure) {
        return FigureShown.percent(figure).text();
    }
}
