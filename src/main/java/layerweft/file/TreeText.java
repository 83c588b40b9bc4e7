package layerweft.file;

import com.fasterxml.jackson.core.io.JsonStringEncoder;
import java.util.Iterator;
import java.util.Map;

/** A file's values as JSON text: what fits stands on one line, the rest is broken, two spaces for each level. */
final class TreeText {
    private static final int WIDTH = 120;
    private static final String STEP = "  ";
    private final StringBuilder text = new StringBuilder();

    private TreeText() {}

    static String of(Node.Members root) {
        TreeText text = new TreeText();
        text.broken(root, "");
        return text.text.append('\n').toString();
    }

    /** @param behind characters that follow on the same line */
    private void value(Node node, String indent, int column, int behind) {
        String line = line(node);
        boolean fits = line != null && column + line.length() + behind <= WIDTH;
        if (fits || !(node instanceof Node.Members || node instanceof Node.Elements)) {
            text.append(line);
        } else {
            broken(node, indent);
        }
    }

    private void broken(Node node, String indent) {
        boolean members = node instanceof Node.Members;
        if (members && ((Node.Members) node).fields().isEmpty() || node instanceof Node.Elements list && list.items().isEmpty()) {
            text.append(members ? "{}" : "[]");
            return;
        }
        String inner = indent + STEP;
        text.append(members ? "{\n" : "[\n");
        if (node instanceof Node.Members object) {
            for (Iterator<Map.Entry<String, Node.Member>> it = object.fields().entrySet().iterator(); it.hasNext();) {
                Map.Entry<String, Node.Member> field = it.next();
                String name = quoted(field.getKey()) + ": ";
                text.append(inner).append(name);
                value(field.getValue().value(), inner, inner.length() + name.length(), it.hasNext() ? 1 : 0);
                text.append(it.hasNext() ? ",\n" : "\n");
            }
        } else if (node instanceof Node.Elements list) {
            for (Iterator<Node> it = list.items().iterator(); it.hasNext();) {
                text.append(inner);
                value(it.next(), inner, inner.length(), it.hasNext() ? 1 : 0);
                text.append(it.hasNext() ? ",\n" : "\n");
            }
        }
        text.append(indent).append(members ? '}' : ']');
    }

    /** On one line; null where that is surely too long. */
    private static String line(Node node) {
        StringBuilder line = new StringBuilder();
        return line(node, line) ? line.toString() : null;
    }

    private static boolean line(Node node, StringBuilder line) {
        if (node instanceof Node.Text text) {
            line.append(quoted(text.text()));
        } else if (node instanceof Node.Decimal number) {
            line.append(number.literal());
        } else if (node instanceof Node.Truth truth) {
            line.append(truth.value());
        } else if (node instanceof Node.Nothing) {
            line.append("null");
        } else if (node instanceof Node.Elements list) {
            line.append('[');
            for (int k = 0; k < list.items().size(); k++) {
                line.append(k > 0 ? ", " : "");
                if (!line(list.items().get(k), line) || line.length() > WIDTH) {
                    return false;
                }
            }
            line.append(']');
        } else if (node instanceof Node.Members object) {
            line.append('{');
            boolean first = true;
            for (Map.Entry<String, Node.Member> field : object.fields().entrySet()) {
                line.append(first ? "" : ", ").append(quoted(field.getKey())).append(": ");
                first = false;
                if (!line(field.getValue().value(), line) || line.length() > WIDTH) {
                    return false;
                }
            }
            line.append('}');
        }
        return true;
    }

    private static String quoted(String text) {
        return '"' + String.valueOf(JsonStringEncoder.getInstance().quoteAsString(text)) + '"';
    }
}
