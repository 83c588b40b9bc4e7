package layerweft.file;

import java.util.function.Function;

/**
 * A field of an object in a file, and where the model has its value.
 *
 * @param value the field's value for an object of the model; null where it has none
 */
record Part<T, A>(Field<A> field, Function<? super T, A> value) {}
