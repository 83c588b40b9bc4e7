package layerweft.command;

import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.Map;
import java.util.TreeMap;
import layerweft.model.treaty.Buyer;
import layerweft.study.Comparison;
import layerweft.study.NetFigures;
import layerweft.study.Preference;
import layerweft.study.Structure;
import layerweft.study.StructurePair;

/** A comparison as JSON; every figure has its error under the same name in the {@code errors} object beside it. */
final class CompareJson {

    private CompareJson() {}

    static String of(Comparison found) {
        Buyer buyer = found.buyer();
        ObjectNode root = Json.object();
        root.put("portfolio", found.portfolio().name());
        root.put("currency", found.portfolio().currency());
        root.put("unit", found.portfolio().unit());
        root.put("seed", found.settings().seed());
        root.put("years", found.settings().years());
        root.put("version", Version.current());
        net(root.putObject("gross"), found.gross(), buyer);
        ArrayNode structures = root.putArray("structures");
        for (int k = 0; k < found.structures().size(); k++) {
            structure(structures.addObject(), found.structures().get(k), found.undominated().contains(k), buyer);
        }
        ArrayNode differences = root.putArray("differences");
        ArrayNode breakEvens = root.putArray("breakEven");
        for (StructurePair pair : found.pairs()) {
            difference(differences.addObject(), found, pair);
            pair.breakEvens().forEach(b -> b.answers().forEach(a -> BreakEvenOutput.answer(breakEvens.addObject(), b, a)));
        }
        ArrayNode preferences = root.putArray("preferred");
        Preference.of(found).forEach(p -> preference(preferences.addObject(), found, p));
        return Json.write(root);
    }

    private static void structure(ObjectNode node, Structure s, boolean undominated, Buyer buyer) {
        ObjectNode errors = Json.object();
        node.put("programme", s.programme().name());
        Json.put(node, errors, "upfrontPremium", s.cost().upfrontPremium());
        Json.put(node, errors, "reinstatementPremium", s.cost().reinstatementPremium());
        Json.put(node, errors, "expectedRecoveries", s.cost().expectedRecoveries());
        Json.put(node, errors, "costOfCover", s.cost().costOfCover());
        Json.put(node, errors, "costOfRisk", s.costOfRisk());
        Json.put(node, errors, "costPerUnitOfTailRelief", s.costPerUnitOfTailRelief());
        Json.put(node, errors, "reinsurersCapital", s.reinsurersCapital());
        Json.put(node, errors, "reinsurersReturn", s.reinsurersReturn());
        node.put("undominated", undominated);
        node.set("errors", errors);
        net(node.putObject("net"), s.net(), buyer);
        net(node.putObject("relief"), s.relief(), buyer);
        ArrayNode layers = node.putArray("layers");
        for (int j = 0; j < s.layers().size(); j++) {
            Structure.LayerWorth worth = s.worths().get(j);
            ObjectNode layer = layers.addObject();
            ObjectNode layerErrors = Json.object();
            layer.put("name", worth.layer());
            layer.put("engine", s.layers().get(j).engine().label());
            Json.put(layer, layerErrors, "premium", s.layers().get(j).premium());
            Json.put(layer, layerErrors, "expectedLoss", s.layers().get(j).expectedLoss());
            Json.put(layer, layerErrors, "costOfCover", worth.costOfCover());
            Json.put(layer, layerErrors, "costPerUnitOfTailRelief", worth.costPerUnitOfTailRelief());
            layer.set("errors", layerErrors);
            net(layer.putObject("relief"), worth.relief(), buyer);
        }
    }

    private static void net(ObjectNode node, NetFigures net, Buyer buyer) {
        ObjectNode errors = Json.object();
        Json.put(node, errors, "mean", net.mean());
        Json.put(node, errors, "standardDeviation", net.standardDeviation());
        Json.put(node, errors, "valueAtRisk", net.valueAtRisk());
        Json.put(node, errors, "tailValueAtRisk", new TreeMap<>(Map.of(buyer.tailLevel(), net.tailValueAtRisk())));
        node.set("errors", errors);
    }

    private static void difference(ObjectNode node, Comparison found, StructurePair pair) {
        ObjectNode errors = Json.object();
        node.put("first", found.structures().get(pair.first()).programme().name());
        node.put("second", found.structures().get(pair.second()).programme().name());
        Json.put(node, errors, "costOfCover", pair.costOfCover());
        Json.put(node, errors, "costOfRisk", pair.costOfRisk());
        node.set("errors", errors);
        net(node.putObject("net"), pair.net(), found.buyer());
    }

    private static void preference(ObjectNode node, Comparison found, Preference preference) {
        node.put("family", preference.family().label());
        node.put("measure", preference.measure().label());
        ArrayNode spans = node.putArray("spans");
        for (Preference.Span span : preference.spans()) {
            ObjectNode one = spans.addObject();
            one.put("from", span.from());
            one.put("to", span.to());
            ArrayNode best = one.putArray("best");
            span.best().forEach(k -> best.add(found.structures().get(k).programme().name()));
        }
    }
}
