package layerweft.file;

/** What the value of a field is, as far as a form needs to know it. */
public enum FieldType {
    NUMBER,
    WHOLE_NUMBER,
    TRUTH,
    TEXT,
    /** A list of numbers. */
    NUMBERS,
    /** A list of rows, each a list of numbers. */
    MATRIX,
    /** A list of names. */
    TEXTS,
    /** A severity inside another, as the body of a spliced one. */
    SEVERITY,
    /** A list of such. */
    SEVERITIES,
    /** Groups of perils of a copula: objects with {@code kendallTau} or {@code theta}, {@code perils} and {@code groups}. */
    GROUPS,
    /** Parts of a mixture of copulas: objects with {@code weight} and {@code copula}. */
    COPULAS,
    /** Any other object. */
    OBJECT,
    /** Any other list. */
    LIST;

    /** What a list of such values is. */
    FieldType list() {
        return switch (this) {
            case NUMBER -> NUMBERS;
            case NUMBERS -> MATRIX;
            case TEXT -> TEXTS;
            case SEVERITY -> SEVERITIES;
            default -> LIST;
        };
    }
}
