package layerweft.file;

/** Paths of values in a file, e.g. {@code perils[1].severity.alpha}; the whole file is the empty path. */
final class FieldPath {
    private FieldPath() {}

    static String field(String path, String name) {
        return path.isEmpty() ? name : path + "." + name;
    }

    static String item(String path, int k) {
        return path + "[" + k + "]";
    }

    /** A path below another: a field, an item, or nothing. */
    static String below(String path, String rest) {
        return rest.isEmpty() || rest.startsWith("[") ? path + rest : field(path, rest);
    }
}
