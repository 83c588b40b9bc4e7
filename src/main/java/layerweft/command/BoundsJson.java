package layerweft.command;

import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import layerweft.engine.bounds.LayerRange;
import layerweft.study.Bounds;

/**
 * Bounds as JSON. A layer without bounds has null values and a {@code reason}; one that dependence does not move has equal values and a
 * {@code note}.
 */
final class BoundsJson {

    private BoundsJson() {}

    static String of(Bounds bounds) {
        ObjectNode root = Json.object();
        root.put("portfolio", bounds.treaty().portfolio().name());
        root.put("programme", bounds.treaty().programme().name());
        root.put("currency", bounds.treaty().portfolio().currency());
        root.put("unit", bounds.treaty().portfolio().unit());
        root.put("version", Version.current());
        ArrayNode layers = root.putArray("layers");
        for (Bounds.Answer answer : bounds.layers()) {
            layer(layers.addObject(), answer);
        }
        return Json.write(root);
    }

    private static void layer(ObjectNode node, Bounds.Answer answer) {
        LayerRange range = answer.range();
        node.put("name", answer.name());
        Json.put(node, "lowest", range == null ? Double.NaN : range.lowest());
        Json.put(node, "attainedLow", range == null ? Double.NaN : range.attainedLow());
        Json.put(node, "independent", range == null ? Double.NaN : range.independent());
        Json.put(node, "comonotone", range == null ? Double.NaN : range.comonotone());
        Json.put(node, "attainedHigh", range == null ? Double.NaN : range.attainedHigh());
        Json.put(node, "highest", range == null ? Double.NaN : range.highest());
        Json.put(node, "error", range == null ? Double.NaN : range.error());
        if (answer.note() != null) {
            node.put(range == null ? "reason" : "note", answer.note());
        }
    }
}
