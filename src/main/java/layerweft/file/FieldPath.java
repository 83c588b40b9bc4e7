package layerweft.file;

import java.util.List;

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

    /** The steps of a path: names of fields, and items as {@code [k]}. */
    static List<String> steps(String path) {
        return path.isEmpty() ? List.of() : List.of(path.split("\\.|(?=\\[)"));
    }

    static boolean isItem(String step) {
        return step.startsWith("[");
    }

    static int index(String step) {
        return Integer.parseInt(step.substring(1, step.length() - 1));
    }
}
