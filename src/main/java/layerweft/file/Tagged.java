package layerweft.file;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.function.UnaryOperator;

/** An object whose kind stands in one of its fields, such as {@code "model": "pareto"}. */
final class Tagged<T> implements Reading<T> {
    private final String tag;
    private final Map<String, Shape<T>> kinds = new LinkedHashMap<>();

    /**
     * @param object what the kinds are kinds of; with the kind's name, the name of its shape
     * @param tag the field that names the kind
     */
    private Tagged(String object, String tag, List<Kind<T>> kinds, UnaryOperator<Shape<T>> common) {
        this.tag = tag;
        for (Kind<T> kind : kinds) {
            Field<String> constant = Field.required(tag, Scalars.constant(kind.name()));
            Shape<T> shape = new Shape<>(object + "." + kind.name(), kind.variants()).tagged(constant);
            this.kinds.put(kind.name(), common.apply(shape));
        }
    }

    static <T> Tagged<T> of(String object, String tag, List<Kind<T>> kinds) {
        return new Tagged<>(object, tag, kinds, UnaryOperator.identity());
    }

    /** Kinds that all have some more fields. */
    static <T> Tagged<T> of(String object, String tag, List<Kind<T>> kinds, UnaryOperator<Shape<T>> common) {
        return new Tagged<>(object, tag, kinds, common);
    }

    List<Shape<T>> shapes() {
        return List.copyOf(kinds.values());
    }

    @Override
    public T read(Node node, String path, Faults faults) {
        if (!(node instanceof Node.Members object)) {
            faults.wrongType(node, path, "an object with the field " + tag);
            return null;
        }
        Node given = object.get(tag);
        String kindPath = FieldPath.field(path, tag);
        String admissible = "one of " + String.join(", ", kinds.keySet());
        if (given == null) {
            faults.add(object.place(), kindPath, "nothing", admissible);
            return null;
        }
        if (!(given instanceof Node.Text text) || !kinds.containsKey(text.text())) {
            String near = given instanceof Node.Text text ? NearMiss.of(text.text(), kinds.keySet()) : null;
            faults.wrongType(given, kindPath, admissible + (near == null ? "" : " (did you mean " + near + "?)"));
            return null;
        }
        return kinds.get(text.text()).read(node, path, faults);
    }

    /** One kind: its name in the tag, and the ways to give its parameters. */
    record Kind<T>(String name, List<Variant<T>> variants) {
        @SafeVarargs
        @SuppressWarnings("varargs") // copied at once
        static <T> Kind<T> of(String name, Variant<T>... variants) {
            return new Kind<>(name, List.of(variants));
        }
    }
}
