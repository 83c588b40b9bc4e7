package layerweft.file;

import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;

/** Where a new field goes: behind those that the format names before it. */
final class FieldOrder {
    /** All objects of both formats; an object is known by having all its fields among those of one shape. */
    private static final List<Set<String>> ORDERS = orders();

    private FieldOrder() {}

    private static List<Set<String>> orders() {
        Set<Set<String>> orders = new LinkedHashSet<>();
        PortfolioMapping.shapes().forEach(shape -> orders.add(shape.fieldNames()));
        ProgrammeMapping.shapes().forEach(shape -> orders.add(shape.fieldNames()));
        return List.copyOf(orders);
    }

    static Map<String, Node.Member> insert(Map<String, Node.Member> fields, String name, Node.Member member) {
        List<String> order = ORDERS.stream().filter(o -> o.contains(name) && o.containsAll(fields.keySet())).findFirst().map(List::copyOf).orElse(List.of());
        int place = order.indexOf(name);
        Map<String, Node.Member> with = new LinkedHashMap<>();
        boolean done = false;
        for (Map.Entry<String, Node.Member> field : fields.entrySet()) {
            if (!done && place >= 0 && order.indexOf(field.getKey()) > place) {
                with.put(name, member);
                done = true;
            }
            with.put(field.getKey(), field.getValue());
        }
        with.putIfAbsent(name, member);
        return with;
    }
}
