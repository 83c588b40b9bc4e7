package layerweft.file;

import java.util.function.Function;

/**
 * A field of an object in a file.
 *
 * @param required whether it must be there
 * @param fallback its value where it is left out; may be null
 */
record Field<T>(String name, TwoWay<T> reading, boolean required, T fallback) {

    static <T> Field<T> required(String name, TwoWay<T> reading) {
        return new Field<>(name, reading, true, null);
    }

    static <T> Field<T> optional(String name, TwoWay<T> reading, T fallback) {
        return new Field<>(name, reading, false, fallback);
    }

    static Field<Double> number(String name) {
        return required(name, Scalars.NUMBER);
    }

    static Field<Double> number(String name, Double fallback) {
        return optional(name, Scalars.NUMBER, fallback);
    }

    FieldType type() {
        return reading.type();
    }

    /** With where the model has its value. */
    <M> Part<M, T> of(Function<? super M, T> value) {
        return new Part<>(this, value);
    }

    /** The value as the file has it; null where it is left out, because the fallback says the same. */
    Node write(Values values) {
        T value = values.get(this);
        return value == null || !required && value.equals(fallback) ? null : reading.write(value);
    }
}
