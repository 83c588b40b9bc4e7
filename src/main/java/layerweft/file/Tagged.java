package layerweft.file;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.function.Function;
import java.util.function.UnaryOperator;

/** An object whose kind stands in one of its fields, such as {@code "model": "pareto"}. */
final class Tagged<T> implements TwoWay<T> {
    private final String object;
    private final String tag;
    private final Map<String, Shape<T>> kinds = new LinkedHashMap<>();
    private final Map<String, String> labels = new LinkedHashMap<>();

    /**
     * @param object what the kinds are kinds of; with the kind's name, the name of its shape
     * @param tag the field that names the kind
     */
    private Tagged(String object, String tag, List<Kind<? extends T>> kinds, UnaryOperator<Shape<T>> common) {
        this.object = object;
        this.tag = tag;
        for (Kind<? extends T> kind : kinds) {
            Field<String> constant = Field.required(tag, Scalars.constant(kind.name()));
            Shape<T> shape = new Shape<T>(object + "." + kind.name(), kind.widened()).tagged(constant, kind.name());
            this.kinds.put(kind.name(), common.apply(shape));
            labels.put(kind.name(), kind.label());
        }
    }

    static <T> Tagged<T> of(String object, String tag, List<Kind<? extends T>> kinds) {
        return new Tagged<>(object, tag, kinds, UnaryOperator.identity());
    }

    /** Kinds that all have some more fields. */
    static <T> Tagged<T> of(String object, String tag, List<Kind<? extends T>> kinds, UnaryOperator<Shape<T>> common) {
        return new Tagged<>(object, tag, kinds, common);
    }

    List<Shape<T>> shapes() {
        return List.copyOf(kinds.values());
    }

    String object() {
        return object;
    }

    String tag() {
        return tag;
    }

    /** What people call the kinds, by their names in the tag. */
    Map<String, String> labels() {
        return labels;
    }

    /** Null if there is no such kind. */
    Shape<T> kind(String name) {
        return kinds.get(name);
    }

    @Override
    public Node write(T value) {
        return kinds.values().stream().map(shape -> shape.attempt(value)).filter(Objects::nonNull).findFirst()
                .orElseThrow(() -> new IllegalArgumentException("no " + object + " of a file is " + value));
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

    /**
     * One kind.
     *
     * @param name in the tag
     * @param label what people call it
     * @param type of the models of this kind
     * @param variants the ways to give its parameters
     */
    record Kind<M>(String name, String label, Class<M> type, List<Variant<M>> variants) {
        @SafeVarargs
        @SuppressWarnings("varargs") // copied at once
        static <M> Kind<M> of(String name, String label, Class<M> type, Variant<M>... variants) {
            return new Kind<>(name, label, type, List.of(variants));
        }

        /** The variants as ways to give a model of any kind, of which only this kind's can be given. */
        private <T> List<Variant<T>> widened() {
            return variants.stream().map(variant -> new Variant<T>(variant.fields(), cast(variant.build()),
                    model -> type.isInstance(model) ? variant.values().apply(type.cast(model)) : null)).toList();
        }

        @SuppressWarnings("unchecked") // T is a supertype of M wherever this is called
        private static <T> Function<Values, T> cast(Function<Values, ?> build) {
            return (Function<Values, T>) build;
        }
    }
}
