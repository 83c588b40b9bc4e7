package layerweft.file;

import java.util.function.Function;

/** How a value of a file becomes a value of the model, and back. */
interface TwoWay<T> extends Reading<T> {

    /**
     * What would be read as that value.
     *
     * @throws IllegalArgumentException if nothing would
     */
    Node write(T value);

    default FieldType type() {
        return FieldType.OBJECT;
    }

    /** @param plain the value as {@link TreeValues#node} takes it */
    static <T> TwoWay<T> of(FieldType type, Reading<T> reading, Function<T, Object> plain) {
        return new TwoWay<>() {
            @Override
            public T read(Node node, String path, Faults faults) {
                return reading.read(node, path, faults);
            }

            @Override
            public Node write(T value) {
                return TreeValues.node(plain.apply(value));
            }

            @Override
            public FieldType type() {
                return type;
            }
        };
    }

    /** Written as this, but read with more checks. */
    default TwoWay<T> reading(Reading<T> stricter) {
        return of(type(), stricter, this::write);
    }

    /** The same under another type. */
    default TwoWay<T> as(FieldType type) {
        return of(type, this, this::write);
    }
}
