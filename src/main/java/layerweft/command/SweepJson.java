package layerweft.command;

import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import layerweft.figures.LayerFigures;
import layerweft.study.FigureKind;
import layerweft.study.LayerSweep;
import layerweft.study.Sweep;
import layerweft.study.SweepPoint;

/**
 * A sweep as JSON: a row for each family, τ and layer, and for each layer what holds over all of them. {@code value}, {@code valueLift} and
 * {@code slope} are those of the swept figure; each has its error in {@code errors}.
 */
final class SweepJson {

    private SweepJson() {}

    static String of(Sweep sweep) {
        FigureKind kind = sweep.request().figure();
        ObjectNode root = Json.object();
        root.put("portfolio", sweep.treaty().portfolio().name());
        root.put("programme", sweep.treaty().programme().name());
        root.put("currency", sweep.treaty().portfolio().currency());
        root.put("unit", sweep.treaty().portfolio().unit());
        root.put("figure", kind.label());
        if (sweep.simulated()) {
            root.put("seed", sweep.settings().seed());
            root.put("years", sweep.settings().years());
        }
        root.put("version", Version.current());
        ArrayNode rows = root.putArray("rows");
        ArrayNode layers = root.putArray("layers");
        for (LayerSweep layer : sweep.layers()) {
            layer.points().forEach(point -> row(rows.addObject(), layer, point, sweep));
            layer(layers.addObject(), layer, kind);
        }
        return Json.write(root);
    }

    private static void row(ObjectNode node, LayerSweep layer, SweepPoint point, Sweep sweep) {
        LayerFigures f = point.figures();
        ObjectNode errors = Json.object();
        node.put("family", point.family().label());
        node.put("kendallTau", point.kendallTau());
        node.put("layer", layer.name());
        node.put("engine", f.engine().label());
        Json.put(node, errors, "expectedLoss", f.expectedLoss());
        Json.put(node, "error", f.expectedLoss().error());
        Json.put(node, errors, "standardDeviation", f.standardDeviation());
        Json.put(node, errors, "lossOnLine", f.lossOnLine());
        Json.put(node, errors, "technicalPremium", f.technicalPremium());
        Json.put(node, errors, "lift", point.lift());
        Json.put(node, errors, "value", point.value());
        Json.put(node, errors, "valueLift", point.valueLift());
        Json.put(node, errors, "slope", point.slope());
        if (point.check() != null) {
            ObjectNode check = node.putObject("check");
            check.put("years", sweep.request().check());
            Json.put(check, "value", sweep.request().figure().of(point.check()).value());
            Json.put(check, "error", sweep.request().figure().of(point.check()).error());
        }
        node.set("errors", errors);
    }

    private static void layer(ObjectNode node, LayerSweep layer, FigureKind kind) {
        ObjectNode errors = Json.object();
        node.put("name", layer.name());
        node.put("dependsOnCopula", layer.still().isEmpty());
        layer.still().ifPresent(reason -> node.put("because", reason));
        ArrayNode refusals = node.putArray("simulatedBecause");
        layer.refusals().forEach(refusals::add);
        Json.put(node, errors, "independent", kind.of(layer.independent()));
        Json.put(node, errors, "comonotone", layer.comonotoneValue());
        Json.put(node, errors, "comonotoneLift", layer.comonotoneLift());
        ArrayNode spreads = node.putArray("spread");
        for (LayerSweep.Spread spread : layer.spreads()) {
            ObjectNode one = spreads.addObject();
            one.put("kendallTau", spread.kendallTau());
            Json.put(one, "lowest", spread.lowest().value());
            one.put("lowestFamily", spread.lowestFamily().label());
            Json.put(one, "highest", spread.highest().value());
            one.put("highestFamily", spread.highestFamily().label());
            Json.put(one, "width", spread.width().value());
            Json.put(one, "error", spread.width().error());
        }
        node.set("errors", errors);
    }
}
