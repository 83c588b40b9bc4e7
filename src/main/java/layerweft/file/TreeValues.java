package layerweft.file;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.ArrayList;
import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/** Nodes without a place, as they are in a tree that is edited, and the plain Java values they stand for. */
final class TreeValues {
    /** Decimal exponents beyond which a number is written with an exponent. */
    private static final int SMALLEST_PLAIN = -6;
    private static final int LARGEST_PLAIN = 15;

    private TreeValues() {}

    /**
     * @param value a String, Number, Boolean, FileTree or Node, or a List or a Map with String keys of such
     * @throws IllegalArgumentException for anything else, null, and numbers that are not finite
     */
    static Node node(Object value) {
        if (value instanceof Node node) {
            return node;
        }
        if (value instanceof FileTree tree) {
            return tree.root();
        }
        if (value instanceof String text) {
            return new Node.Text(Place.NONE, text);
        }
        if (value instanceof Boolean truth) {
            return new Node.Truth(Place.NONE, truth);
        }
        if (value instanceof Number number) {
            return decimal(number);
        }
        if (value instanceof List<?> items) {
            return new Node.Elements(Place.NONE, items.stream().map(TreeValues::node).toList());
        }
        if (value instanceof Map<?, ?> fields) {
            Map<String, Node.Member> members = new LinkedHashMap<>();
            fields.forEach((name, field) -> members.put((String) name, new Node.Member(Place.NONE, node(field))));
            return new Node.Members(Place.NONE, members);
        }
        throw new IllegalArgumentException("a file cannot hold " + value);
    }

    private static Node decimal(Number number) {
        double value = number.doubleValue();
        if (!Double.isFinite(value)) {
            throw new IllegalArgumentException("a file cannot hold the number " + value);
        }
        boolean whole = number instanceof Integer || number instanceof Long;
        return new Node.Decimal(Place.NONE, value, whole ? number.toString() : shortest(value));
    }

    /** The shortest decimal that reads back the same, e.g. 14, 0.05 or 2.5e-9. */
    static String shortest(double value) {
        if (value == 0) {
            return 1 / value < 0 ? "-0.0" : "0";
        }
        BigDecimal exact = new BigDecimal(Double.toString(value));
        // Double.toString is not always the shortest: one digit too many at most
        BigDecimal rounded = exact.round(new MathContext(Math.max(1, exact.precision() - 1)));
        BigDecimal decimal = (rounded.doubleValue() == value ? rounded : exact).stripTrailingZeros();
        int exponent = decimal.precision() - decimal.scale() - 1;
        if (exponent >= SMALLEST_PLAIN && exponent <= LARGEST_PLAIN) {
            return decimal.toPlainString();
        }
        return decimal.movePointLeft(exponent).toPlainString() + "e" + exponent;
    }

    /** The value as String, Double, Boolean, unmodifiable List or Map, or null. */
    static Object plain(Node node) {
        if (node instanceof Node.Members object) {
            Map<String, Object> fields = new LinkedHashMap<>();
            object.fields().forEach((name, member) -> fields.put(name, plain(member.value())));
            return Collections.unmodifiableMap(fields);
        }
        if (node instanceof Node.Elements list) {
            List<Object> items = new ArrayList<>();
            list.items().forEach(item -> items.add(plain(item)));
            return Collections.unmodifiableList(items);
        }
        if (node instanceof Node.Decimal number) {
            return number.value();
        }
        if (node instanceof Node.Truth truth) {
            return truth.value();
        }
        return node instanceof Node.Text text ? text.text() : null;
    }

    /** The same without places, which an edit would make wrong. */
    static Node unplaced(Node node) {
        if (node instanceof Node.Members object) {
            Map<String, Node.Member> fields = new LinkedHashMap<>();
            object.fields().forEach((name, member) -> fields.put(name, new Node.Member(Place.NONE, unplaced(member.value()))));
            return new Node.Members(Place.NONE, fields);
        }
        if (node instanceof Node.Elements list) {
            return new Node.Elements(Place.NONE, list.items().stream().map(TreeValues::unplaced).toList());
        }
        if (node instanceof Node.Decimal number) {
            return new Node.Decimal(Place.NONE, number.value(), number.written());
        }
        if (node instanceof Node.Truth truth) {
            return new Node.Truth(Place.NONE, truth.value());
        }
        return node instanceof Node.Text text ? new Node.Text(Place.NONE, text.text()) : new Node.Nothing(Place.NONE);
    }
}
