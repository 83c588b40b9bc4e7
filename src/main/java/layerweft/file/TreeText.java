package layerweft.file;

import com.fasterxml.jackson.core.io.JsonStringEncoder;
import java.util.Iterator;
import java.util.List;
import java.util.Map;

/**
 * JSON as people lay it out: two spaces for a level; the file's object, and its lists of objects, over several lines, of everything else what
 * fits on one line; lists of plain values fill their lines.
 */
final class TreeText {
    /** Characters of a value on one line, with what it is indented by. */
    private static final int WIDTH = 112;
    private static final int INDENT = 2;

    private final StringBuilder out = new StringBuilder();

    private TreeText() {}

    static String of(Node.Members root) {
        TreeText text = new TreeText();
        text.object(root, 0);
        return text.out.append('\n').toString();
    }

    private void value(Node node, int level) {
        boolean rootList = level == 1 && node instanceof Node.Elements list && list.items().stream().anyMatch(Node.Members.class::isInstance);
        int start = out.length();
        if (!rootList && compact(node, start + WIDTH - level * INDENT)) {
            return;
        }
        out.setLength(start);
        if (node instanceof Node.Members object) {
            object(object, level);
        } else if (node instanceof Node.Elements list && !list.items().isEmpty()) {
            list(list.items(), level);
        } else {
            compact(node, Integer.MAX_VALUE);
        }
    }

    private void object(Node.Members object, int level) {
        out.append('{');
        for (Iterator<Map.Entry<String, Node.Member>> fields = object.fields().entrySet().iterator(); fields.hasNext();) {
            Map.Entry<String, Node.Member> field = fields.next();
            line(level + 1);
            quoted(field.getKey());
            out.append(": ");
            value(field.getValue().value(), level + 1);
            out.append(fields.hasNext() ? "," : "");
        }
        line(level);
        out.append('}');
    }

    private void list(List<Node> items, int level) {
        boolean plain = items.stream().noneMatch(item -> item instanceof Node.Members || item instanceof Node.Elements);
        out.append('[');
        int lineStart = Integer.MIN_VALUE / 2;
        for (int k = 0; k < items.size(); k++) {
            int before = out.length();
            out.append(' ');
            compact(items.get(k), Integer.MAX_VALUE);
            if (!plain || out.length() - lineStart >= WIDTH) {
                out.setLength(before);
                line(level + 1);
                lineStart = before + 1;
                value(items.get(k), level + 1);
            }
            out.append(k + 1 < items.size() ? "," : "");
        }
        line(level);
        out.append(']');
    }

    /** All on one line; false if that reaches beyond the given length of the output. */
    private boolean compact(Node node, int end) {
        if (node instanceof Node.Members object) {
            String separator = "{";
            for (Map.Entry<String, Node.Member> field : object.fields().entrySet()) {
                out.append(separator);
                quoted(field.getKey());
                out.append(": ");
                if (!compact(field.getValue().value(), end)) {
                    return false;
                }
                separator = ", ";
            }
            out.append(object.fields().isEmpty() ? "{}" : "}");
        } else if (node instanceof Node.Elements list) {
            String separator = "[";
            for (Node item : list.items()) {
                out.append(separator);
                if (!compact(item, end)) {
                    return false;
                }
                separator = ", ";
            }
            out.append(list.items().isEmpty() ? "[]" : "]");
        } else if (node instanceof Node.Text text) {
            quoted(text.text());
        } else {
            out.append(node instanceof Node.Decimal number ? number.written() : node.shown());
        }
        return out.length() <= end;
    }

    private void line(int level) {
        out.append('\n').append(" ".repeat(level * INDENT));
    }

    private void quoted(String text) {
        out.append('"');
        int start = out.length();
        JsonStringEncoder.getInstance().quoteAsString(text, out);
        for (int i = start; i < out.length(); i += Character.charCount(out.codePointAt(i))) {
            int c = out.codePointAt(i);
            if (Character.getType(c) == Character.SURROGATE) { // unpaired: UTF-8 has no form for it
                out.replace(i, i + 1, String.format("\\u%04X", c));
            }
        }
        out.append('"');
    }
}
