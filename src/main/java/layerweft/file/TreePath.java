package layerweft.file;

import java.util.ArrayList;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * The steps of a path such as {@code perils[1].severity.alpha}: names of fields and, as {@link Integer}s, positions in lists.
 * Fields whose names hold a dot or a bracket are in no format and have no path.
 */
final class TreePath {
    private static final Pattern STEP = Pattern.compile("\\G(?:(?:^|(?<!^)\\.)(?<name>[^.\\[\\]]+)|\\[(?<item>\\d{1,9})])");

    private TreePath() {}

    /**
     * @param path empty for the whole file
     * @throws IllegalArgumentException if that is no path
     */
    static List<Object> steps(String path) {
        List<Object> steps = new ArrayList<>();
        Matcher matcher = STEP.matcher(path);
        int end = 0;
        while (matcher.find()) {
            steps.add(matcher.group("name") != null ? matcher.group("name") : Integer.valueOf(matcher.group("item")));
            end = matcher.end();
        }
        if (end < path.length()) {
            throw new IllegalArgumentException("\"" + path + "\" is no path such as perils[1].severity.alpha");
        }
        return steps;
    }

    /** The value a step leads to; null if there is none. */
    static Node next(Node node, Object step) {
        if (step instanceof Integer k) {
            return node instanceof Node.Elements list && k < list.items().size() ? list.items().get(k) : null;
        }
        return node instanceof Node.Members object ? object.get((String) step) : null;
    }
}
