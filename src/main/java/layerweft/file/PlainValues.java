package layerweft.file;

import java.util.ArrayList;
import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/** Values of a file as plain Java values, and back. */
final class PlainValues {

    private PlainValues() {}

    static Object plain(Node node) {
        if (node instanceof Node.Text text) {
            return text.text();
        }
        if (node instanceof Node.Decimal number) {
            return number.value();
        }
        if (node instanceof Node.Truth truth) {
            return truth.value();
        }
        if (node instanceof Node.Elements list) {
            List<Object> items = new ArrayList<>();
            list.items().forEach(item -> items.add(plain(item)));
            return Collections.unmodifiableList(items);
        }
        if (node instanceof Node.Members object) {
            Map<String, Object> fields = new LinkedHashMap<>();
            object.fields().forEach((name, member) -> fields.put(name, plain(member.value())));
            return Collections.unmodifiableMap(fields);
        }
        return null;
    }

    /** @throws IllegalArgumentException for a value of another kind, or a number that is not finite */
    static Node node(Object value) {
        if (value == null) {
            return new Node.Nothing(Place.NONE);
        }
        if (value instanceof String text) {
            return new Node.Text(Place.NONE, text);
        }
        if (value instanceof Boolean truth) {
            return new Node.Truth(Place.NONE, truth);
        }
        if (value instanceof Number number && Double.isFinite(number.doubleValue())) {
            return new Node.Decimal(Place.NONE, number.doubleValue(), null);
        }
        if (value instanceof List<?> list) {
            return new Node.Elements(Place.NONE, list.stream().map(PlainValues::node).toList());
        }
        if (value instanceof Map<?, ?> map) {
            Map<String, Node.Member> fields = new LinkedHashMap<>();
            map.forEach((name, field) -> fields.put((String) name, new Node.Member(Place.NONE, node(field))));
            return new Node.Members(Place.NONE, fields);
        }
        throw new IllegalArgumentException("no value of a file: " + value);
    }
}
