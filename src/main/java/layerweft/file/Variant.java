package layerweft.file;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.Arrays;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.function.BiFunction;
import java.util.function.Function;
import layerweft.model.InadmissibleException;

/**
 * One way to give an object: its fields, what is built of them, and how their values are found again. The constructor's findings become
 * faults of the file.
 *
 * @param build called only with values that could all be read
 * @param values the fields' values for an object of the model; null where it cannot be given in this way
 */
record Variant<T>(List<Field<?>> fields, Function<Values, T> build, Function<T, Values> values) {
    /** Enough significant digits for any double. */
    private static final int MOST_DIGITS = 17;

    @SafeVarargs
    @SuppressWarnings("varargs") // copied at once
    static <T> Variant<T> of(Function<Values, T> build, Part<T, ?>... parts) {
        List<Part<T, ?>> all = List.copyOf(Arrays.asList(parts));
        return new Variant<>(all.stream().<Field<?>>map(Part::field).toList(), build, value -> values(all, value));
    }

    static <A, T> Variant<T> of(Part<T, A> a, Function<A, T> build) {
        return of(v -> build.apply(v.get(a.field())), a);
    }

    static <A, B, T> Variant<T> of(Part<T, A> a, Part<T, B> b, BiFunction<A, B, T> build) {
        return of(v -> build.apply(v.get(a.field()), v.get(b.field())), a, b);
    }

    static <A, B, C, T> Variant<T> of(Part<T, A> a, Part<T, B> b, Part<T, C> c, Three<A, B, C, T> build) {
        return of(v -> build.apply(v.get(a.field()), v.get(b.field()), v.get(c.field())), a, b, c);
    }

    static <A, B, C, D, T> Variant<T> of(Part<T, A> a, Part<T, B> b, Part<T, C> c, Part<T, D> d, Four<A, B, C, D, T> build) {
        return of(v -> build.apply(v.get(a.field()), v.get(b.field()), v.get(c.field()), v.get(d.field())), a, b, c, d);
    }

    private static <T> Values values(List<Part<T, ?>> parts, T value) {
        Map<String, Object> found = new HashMap<>();
        for (Part<T, ?> part : parts) {
            Object of = part.value().apply(value);
            if (of != null) {
                found.put(part.field().name(), of);
            } else if (part.field().required()) {
                return null;
            }
        }
        return new Values(found);
    }

    boolean has(String name) {
        return fields.stream().anyMatch(f -> f.name().equals(name));
    }

    boolean requires(String name) {
        return fields.stream().anyMatch(f -> f.required() && f.name().equals(name));
    }

    /**
     * The values that build exactly the given object, with as few digits as they can; null if there are none. A mean of 14 that became
     * parameters with many digits is found again as 14, not as 13.999999999999998.
     */
    Values exact(T value) {
        Values given = values.apply(value);
        if (given == null || fields.stream().noneMatch(f -> f.type() == FieldType.NUMBER)) {
            return given == null || builds(given, value) ? given : null;
        }
        for (int digits = 1; digits < MOST_DIGITS; digits++) {
            Values rounded = rounded(given, digits);
            if (builds(rounded, value)) {
                return rounded;
            }
        }
        return builds(given, value) ? given : null;
    }

    /** Significant digits of all numbers, by which ways to say the same are compared. */
    int digits(Values given) {
        return fields.stream().map(field -> field.write(given)).mapToInt(node -> node instanceof Node.Decimal number
                ? new BigDecimal(number.written()).stripTrailingZeros().precision() : 0).sum();
    }

    private Values rounded(Values given, int digits) {
        Map<String, Object> rounded = new HashMap<>();
        for (Field<?> field : fields) {
            Object value = given.get(field);
            boolean number = field.type() == FieldType.NUMBER && value instanceof Double d && Double.isFinite(d) && d != 0;
            rounded.put(field.name(), number ? (Object) new BigDecimal((Double) value).round(new MathContext(digits)).doubleValue() : value);
        }
        return new Values(rounded);
    }

    private boolean builds(Values given, T value) {
        try {
            return build.apply(given).equals(value);
        } catch (InadmissibleException e) {
            return false; // rounded out of its range
        }
    }

    /** A function of three values. */
    @FunctionalInterface
    interface Three<A, B, C, T> {
        T apply(A a, B b, C c);
    }

    /** A function of four values. */
    @FunctionalInterface
    interface Four<A, B, C, D, T> {
        T apply(A a, B b, C c, D d);
    }
}
