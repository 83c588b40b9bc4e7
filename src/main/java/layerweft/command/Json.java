package layerweft.command;

import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import com.fasterxml.jackson.databind.SerializationFeature;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.Map;
import java.util.SortedMap;
import layerweft.figures.Figure;
import layerweft.figures.FigureText;

/** Figures as JSON: an infinite figure is the text "infinity", an undefined one null. */
final class Json {
    private static final ObjectMapper MAPPER = new ObjectMapper().enable(SerializationFeature.INDENT_OUTPUT);

    private Json() {}

    static ObjectNode object() {
        return MAPPER.createObjectNode();
    }

    static String write(JsonNode node) {
        try {
            return MAPPER.writeValueAsString(node) + "\n";
        } catch (JsonProcessingException e) {
            throw new IllegalStateException("a tree of plain values cannot fail to be written", e);
        }
    }

    static void put(ObjectNode object, String name, double value) {
        if (Double.isNaN(value)) {
            object.putNull(name);
        } else if (Double.isInfinite(value)) {
            object.put(name, value > 0 ? "infinity" : "-infinity");
        } else {
            object.put(name, value);
        }
    }

    /** A figure's value under its name, and its error under the same name in {@code errors}. */
    static void put(ObjectNode object, ObjectNode errors, String name, Figure figure) {
        put(object, name, figure.value());
        put(errors, name, figure.error());
    }

    /** Figures by level or return period, the key written as the shortest decimal that reads back the same. */
    static void put(ObjectNode object, ObjectNode errors, String name, SortedMap<Double, Figure> figures) {
        ObjectNode values = object.putObject(name);
        ObjectNode valueErrors = errors.putObject(name);
        for (Map.Entry<Double, Figure> entry : figures.entrySet()) {
            put(values, valueErrors, FigureText.plain(entry.getKey()), entry.getValue());
        }
    }
}
