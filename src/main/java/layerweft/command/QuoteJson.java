package layerweft.command;

import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.List;
import java.util.TreeMap;
import layerweft.figures.BuyerPosition;
import layerweft.figures.Figure;
import layerweft.figures.LayerFigures;
import layerweft.figures.PositionStatistics;
import layerweft.figures.ReturnPeriods;
import layerweft.model.treaty.Buyer;
import layerweft.study.Quote;

/** A quote as JSON; every figure has its error under the same name in the {@code errors} object beside it. */
final class QuoteJson {

    private QuoteJson() {}

    static String of(Quote quote) {
        Buyer buyer = quote.treaty().programme().buyer();
        ObjectNode root = Json.object();
        root.put("portfolio", quote.treaty().portfolio().name());
        root.put("programme", quote.treaty().programme().name());
        root.put("currency", quote.treaty().portfolio().currency());
        root.put("unit", quote.treaty().portfolio().unit());
        root.put("seed", quote.settings().seed());
        root.put("years", quote.settings().years());
        root.put("version", Version.current());
        ArrayNode layers = root.putArray("layers");
        for (int j = 0; j < quote.layers().size(); j++) {
            layer(layers.addObject(), quote.layers().get(j), buyer, quote.notes().get(j));
        }
        ObjectNode whole = root.putObject("whole");
        position(whole.putObject("gross"), quote.whole().gross(), buyer);
        position(whole.putObject("ceded"), quote.whole().ceded(), buyer);
        position(whole.putObject("net"), quote.whole().net(), buyer);
        buyer(root.putObject("buyer"), quote.buyer(), buyer);
        return Json.write(root);
    }

    private static void layer(ObjectNode node, LayerFigures f, Buyer buyer, List<String> notes) {
        ObjectNode errors = Json.object();
        node.put("name", f.name());
        node.put("engine", f.engine().label());
        Json.put(node, errors, "expectedLoss", f.expectedLoss());
        Json.put(node, "error", f.expectedLoss().error());
        if (f.bracket() != null) {
            ArrayNode bracket = node.putArray("bracket");
            bracket.add(f.bracket().low());
            bracket.add(f.bracket().high());
        }
        Json.put(node, errors, "standardDeviation", f.standardDeviation());
        Json.put(node, errors, "lossOnLine", f.lossOnLine());
        Json.put(node, errors, "attachmentProbability", f.attachmentProbability());
        Json.put(node, errors, "exhaustionProbability", f.exhaustionProbability());
        Json.put(node, errors, "expectedEvents", f.expectedEvents());
        Json.put(node, errors, "paidUpFactor", f.paidUpFactor());
        Json.put(node, errors, "netPremium", f.netPremium());
        Json.put(node, errors, "technicalPremium", f.technicalPremium());
        Json.put(node, errors, "technicalRateOnLine", f.technicalRateOnLine());
        if (f.quotedPremium() != null) {
            Json.put(node, "quotedPremium", f.quotedPremium());
            Json.put(node, "quotedRateOnLine", f.quotedRateOnLine() == null ? Double.NaN : f.quotedRateOnLine());
        }
        Json.put(node, errors, "payback", f.payback());
        Json.put(node, errors, "valueAtRisk", f.valueAtRisk());
        Json.put(node, errors, "tailValueAtRisk", atTailLevel(f.tailValueAtRisk(), buyer));
        ObjectNode exceedance = node.putObject("exceedance");
        ObjectNode exceedanceErrors = errors.putObject("exceedance");
        Json.put(exceedance, exceedanceErrors, "occurrence", f.occurrence());
        Json.put(exceedance, exceedanceErrors, "aggregate", f.aggregate());
        node.set("errors", errors);
        ArrayNode words = node.putArray("notes");
        notes.forEach(words::add);
    }

    private static void position(ObjectNode node, PositionStatistics p, Buyer buyer) {
        ObjectNode errors = Json.object();
        Json.put(node, errors, "mean", p.mean());
        Json.put(node, errors, "standardDeviation", p.standardDeviation());
        Json.put(node, errors, "valueAtRisk", p.valueAtRisk());
        Json.put(node, errors, "tailValueAtRisk", atTailLevel(p.tailValueAtRisk(), buyer));
        ObjectNode exceedance = node.putObject("exceedance");
        ObjectNode exceedanceErrors = errors.putObject("exceedance");
        Json.put(exceedance, exceedanceErrors, "occurrence", ReturnPeriods.of(p.occurrenceValueAtRisk(), buyer));
        Json.put(exceedance, exceedanceErrors, "aggregate", ReturnPeriods.of(p.valueAtRisk(), buyer));
        node.set("errors", errors);
    }

    private static void buyer(ObjectNode node, BuyerPosition b, Buyer buyer) {
        ObjectNode errors = Json.object();
        Json.put(node, errors, "upfrontPremium", b.upfrontPremium());
        Json.put(node, errors, "reinstatementPremium", b.reinstatementPremium());
        Json.put(node, errors, "expectedRecoveries", b.expectedRecoveries());
        Json.put(node, errors, "costOfCover", b.costOfCover());
        Json.put(node, errors, "netPosition", b.netPosition());
        Json.put(node, errors, "reliefOfStandardDeviation", b.reliefOfStandardDeviation());
        Json.put(node, errors, "reliefOfValueAtRisk", b.reliefOfValueAtRisk());
        Json.put(node, errors, "reliefOfTailValueAtRisk", atTailLevel(b.reliefOfTailValueAtRisk(), buyer));
        Json.put(node, errors, "costPerUnitOfTailRelief", b.costPerUnitOfTailRelief());
        node.set("errors", errors);
    }

    private static TreeMap<Double, Figure> atTailLevel(Figure figure, Buyer buyer) {
        TreeMap<Double, Figure> map = new TreeMap<>();
        map.put(buyer.tailLevel(), figure);
        return map;
    }
}
