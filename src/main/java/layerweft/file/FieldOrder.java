package layerweft.file;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;

/** Where a new field of an object goes: in the order in which the formats' shapes have their fields. */
final class FieldOrder {
    private static final List<List<String>> ORDERS = orders();

    private FieldOrder() {}

    private static List<List<String>> orders() {
        List<Shape<?>> shapes = new ArrayList<>(PortfolioMapping.shapes());
        shapes.addAll(ProgrammeMapping.shapes());
        return shapes.stream().map(shape -> List.copyOf(shape.fieldNames())).toList();
    }

    /** The fields with one more; the order of those that are there does not change. */
    static Map<String, Node.Member> with(Map<String, Node.Member> fields, String name, Node.Member value) {
        List<String> order = order(fields.keySet(), name);
        int own = order.indexOf(name);
        // behind the last field that the format has before it; fields of no format stay where they are
        String before = null;
        for (String there : fields.keySet()) {
            int rank = order.indexOf(there);
            if (rank >= 0 && rank < own) {
                before = there;
            }
        }
        Map<String, Node.Member> extended = new LinkedHashMap<>();
        if (own >= 0 && before == null) {
            extended.put(name, value);
        }
        for (Map.Entry<String, Node.Member> field : fields.entrySet()) {
            extended.put(field.getKey(), field.getValue());
            if (field.getKey().equals(before)) {
                extended.put(name, value);
            }
        }
        extended.putIfAbsent(name, value);
        return extended;
    }

    /** The fields of the shape that has the new field and most of those that are there; empty if none has the new one. */
    private static List<String> order(Set<String> there, String name) {
        List<String> best = List.of();
        long most = -1;
        for (List<String> order : ORDERS) {
            long known = order.contains(name) ? there.stream().filter(order::contains).count() : -1;
            if (known > most) {
                best = order;
                most = known;
            }
        }
        return best;
    }
}
