package layerweft.file;

/**
 * A field of an object in a file.
 *
 * @param required whether it must be there
 * @param fallback its value where it is left out; may be null
 */
record Field<T>(String name, Reading<T> reading, boolean required, T fallback) {

    static <T> Field<T> required(String name, Reading<T> reading) {
        return new Field<>(name, reading, true, null);
    }

    static <T> Field<T> optional(String name, Reading<T> reading, T fallback) {
        return new Field<>(name, reading, false, fallback);
    }

    static Field<Double> number(String name) {
        return required(name, Scalars.NUMBER);
    }

    static Field<Double> number(String name, Double fallback) {
        return optional(name, Scalars.NUMBER, fallback);
    }
}
