package layerweft.file;

import java.util.HashMap;
import java.util.Map;

/** The values of an object's fields, once all of them could be read. */
final class Values {
    private final Map<String, Object> byName;

    Values(Map<String, Object> byName) {
        this.byName = byName;
    }

    /** These and one more, which may be null. */
    <T> Values with(Field<T> field, T value) {
        Map<String, Object> extended = new HashMap<>(byName);
        extended.put(field.name(), value);
        return new Values(extended);
    }

    /** The field's value, or its fallback where it was left out. */
    @SuppressWarnings("unchecked") // put there by the field's own reading
    <T> T get(Field<T> field) {
        Object value = byName.get(field.name());
        return value == null ? field.fallback() : (T) value;
    }
}
