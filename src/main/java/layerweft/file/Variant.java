package layerweft.file;

import java.util.List;
import java.util.function.BiFunction;
import java.util.function.Function;

/**
 * One way to give an object: its fields, and what is built of them. The constructor's findings become faults of the file.
 *
 * @param build called only with values that could all be read
 */
record Variant<T>(List<Field<?>> fields, Function<Values, T> build) {

    static <T> Variant<T> of(Function<Values, T> build, Field<?>... fields) {
        return new Variant<>(List.of(fields), build);
    }

    static <A, T> Variant<T> of(Field<A> a, Function<A, T> build) {
        return of(v -> build.apply(v.get(a)), a);
    }

    static <A, B, T> Variant<T> of(Field<A> a, Field<B> b, BiFunction<A, B, T> build) {
        return of(v -> build.apply(v.get(a), v.get(b)), a, b);
    }

    static <A, B, C, T> Variant<T> of(Field<A> a, Field<B> b, Field<C> c, Three<A, B, C, T> build) {
        return of(v -> build.apply(v.get(a), v.get(b), v.get(c)), a, b, c);
    }

    static <A, B, C, D, T> Variant<T> of(Field<A> a, Field<B> b, Field<C> c, Field<D> d, Four<A, B, C, D, T> build) {
        return of(v -> build.apply(v.get(a), v.get(b), v.get(c), v.get(d)), a, b, c, d);
    }

    boolean has(String name) {
        return fields.stream().anyMatch(f -> f.name().equals(name));
    }

    boolean requires(String name) {
        return fields.stream().anyMatch(f -> f.required() && f.name().equals(name));
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
