package layerweft.file;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.function.BiFunction;
import java.util.function.Function;
import java.util.function.UnaryOperator;
import java.util.stream.Collectors;
import layerweft.model.InadmissibleException;

/**
 * An object of a file: the ways to give it. Where there are several, the fields that are there choose between them; fields of two ways
 * together are a fault.
 *
 * @param name of this kind of object, as the JSON Schema calls it, e.g. {@code severity.pareto}
 */
record Shape<T>(String name, List<Variant<T>> variants) implements TwoWay<T> {
    /** Unknown fields of one object that are held against the known ones: more are no misspellings. */
    private static final int MOST_HINTS = 20;

    @SafeVarargs
    @SuppressWarnings("varargs") // copied at once
    static <T> Shape<T> of(String name, Variant<T>... variants) {
        return new Shape<>(name, List.of(variants));
    }

    /**
     * The same with one field more in every variant.
     *
     * @param change what the field changes in what is built
     * @param inner undoes the change
     * @param value of the field
     */
    <U> Shape<T> with(Field<U> extra, BiFunction<T, U, T> change, UnaryOperator<T> inner, Function<T, U> value) {
        List<Variant<T>> extended = new ArrayList<>();
        for (Variant<T> variant : variants) {
            List<Field<?>> fields = new ArrayList<>(variant.fields());
            fields.add(extra);
            extended.add(new Variant<>(List.copyOf(fields), v -> change.apply(variant.build().apply(v), v.get(extra)), t -> {
                Values values = variant.values().apply(inner.apply(t));
                return values == null ? null : values.with(extra, value.apply(t));
            }));
        }
        return new Shape<>(name, List.copyOf(extended));
    }

    /** The same with the field that names the kind, before the others. */
    Shape<T> tagged(Field<String> tag, String kind) {
        List<Variant<T>> extended = new ArrayList<>();
        for (Variant<T> variant : variants) {
            List<Field<?>> fields = new ArrayList<>(List.of(tag));
            fields.addAll(variant.fields());
            extended.add(new Variant<>(List.copyOf(fields), variant.build(), t -> {
                Values values = variant.values().apply(t);
                return values == null ? null : values.with(tag, kind);
            }));
        }
        return new Shape<>(name, List.copyOf(extended));
    }

    /** In the way that gives exactly the value in the fewest digits, else in the first that gives it to rounding. */
    @Override
    public Node write(T value) {
        Node node = attempt(value);
        if (node == null) {
            throw new IllegalArgumentException("no " + name + " of a file is " + value);
        }
        return node;
    }

    /** Null where this shape has no way to give the value. */
    Node attempt(T value) {
        Node shortest = null;
        int least = Integer.MAX_VALUE;
        for (Variant<T> variant : variants) {
            Values exact = variant.exact(value);
            if (exact != null && variant.digits(exact) < least) {
                shortest = members(variant, exact);
                least = variant.digits(exact);
            }
        }
        if (shortest != null) {
            return shortest;
        }
        for (Variant<T> variant : variants) {
            Values near = variant.values().apply(value);
            if (near != null) {
                return members(variant, near);
            }
        }
        return null;
    }

    static Node members(Variant<?> variant, Values values) {
        Map<String, Node.Member> fields = new LinkedHashMap<>();
        for (Field<?> field : variant.fields()) {
            Node node = field.write(values);
            if (node != null) {
                fields.put(field.name(), new Node.Member(Place.NONE, node));
            }
        }
        return new Node.Members(Place.NONE, fields);
    }

    /** Names of all fields of all variants, in order. */
    Set<String> fieldNames() {
        return variants.stream().flatMap(v -> v.fields().stream()).map(Field::name).collect(Collectors.toCollection(LinkedHashSet::new));
    }

    @Override
    public T read(Node node, String path, Faults faults) {
        if (!(node instanceof Node.Members object)) {
            faults.wrongType(node, path, "an object with the fields " + String.join(", ", fieldNames()));
            return null;
        }
        int before = faults.count();
        Set<String> hinted = unknownFields(object, path, faults);
        Variant<T> variant = choose(object, path, hinted, faults);
        Map<String, Object> values = readFields(object, path, faults);
        if (faults.count() > before) {
            return null;
        }
        try {
            return variant.build().apply(new Values(values));
        } catch (InadmissibleException e) {
            faults.add(node, path, e);
            return null;
        }
    }

    /** Reports unknown fields; returns the missing fields that they seem to be meant for. */
    private Set<String> unknownFields(Node.Members object, String path, Faults faults) {
        Set<String> known = fieldNames();
        Set<String> hinted = new LinkedHashSet<>();
        int unknown = 0;
        for (Map.Entry<String, Node.Member> field : object.fields().entrySet()) {
            if (!known.contains(field.getKey())) {
                List<String> missing = known.stream().filter(n -> object.get(n) == null && !hinted.contains(n)).toList();
                String near = ++unknown > MOST_HINTS ? null : NearMiss.of(field.getKey(), missing);
                if (near != null) {
                    hinted.add(near);
                }
                faults.add(field.getValue().namePlace(), FieldPath.field(path, Excerpt.plain(field.getKey())), "an unknown field",
                        "the fields " + String.join(", ", known) + (near == null ? "" : " (did you mean " + near + "?)"));
            }
        }
        return hinted;
    }

    /** Every field that is there, whichever variant it belongs to, so that no fault waits for another. */
    private Map<String, Object> readFields(Node.Members object, String path, Faults faults) {
        Map<String, Object> values = new HashMap<>();
        for (Variant<T> variant : variants) {
            for (Field<?> field : variant.fields()) {
                Node value = object.get(field.name());
                if (value != null && !values.containsKey(field.name())) {
                    values.put(field.name(), field.reading().read(value, FieldPath.field(path, field.name()), faults));
                }
            }
        }
        return values;
    }

    /** The variant that the fields belong to, with its missing fields reported; null if that is not clear. */
    private Variant<T> choose(Node.Members object, String path, Set<String> hinted, Faults faults) {
        Set<String> given = new LinkedHashSet<>(object.fields().keySet());
        given.retainAll(fieldNames());
        given.addAll(hinted);
        List<Variant<T>> fitting = variants.stream().filter(v -> given.stream().allMatch(v::has)).toList();
        for (String name : fieldNames()) {
            boolean always = (fitting.isEmpty() ? variants : fitting).stream().allMatch(v -> v.requires(name));
            if (always && !given.contains(name)) {
                faults.add(object.place(), FieldPath.field(path, name), "nothing", "the field " + name + ", which is missing");
            }
        }
        if (fitting.isEmpty()) {
            String beside = given.stream().filter(n -> !variants.stream().allMatch(v -> v.has(n))).collect(Collectors.joining(" beside "));
            faults.add(object.place(), path, beside, ways(variants));
            return null;
        }
        List<Variant<T>> complete = fitting.stream()
                .filter(v -> v.fields().stream().allMatch(f -> !f.required() || given.contains(f.name()))).toList();
        if (complete.isEmpty() && fitting.size() > 1 && !ways(fitting).isEmpty()) {
            faults.add(object.place(), path, "none of them", ways(fitting));
        }
        return complete.isEmpty() ? fitting.get(0) : complete.get(0);
    }

    /** The fields in which the variants differ, e.g. {@code mu and sigma, or mean and cv}. */
    private static <T> String ways(List<Variant<T>> variants) {
        return variants.stream().map(v -> v.fields().stream().map(Field::name)
                        .filter(n -> !variants.stream().allMatch(w -> w.has(n))).collect(Collectors.joining(" and ")))
                .filter(way -> !way.isEmpty()).collect(Collectors.joining(", or "));
    }
}
