package layerweft.file;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/**
 * A portfolio or programme file as it is written, valid or not: an immutable tree of values. Edits give a new tree that shares what they do not
 * touch; fields keep their order and numbers the digits they were written with, so that a file that is opened, edited in one place and
 * saved differs in that place only.
 *
 * <p>Paths are those of {@link Fault#path}: {@code perils[1].severity.alpha}. Values are plain ones: {@code String}, {@code Double},
 * {@code Boolean}, {@code List}, {@code Map} from names to values, or null.
 */
public final class FileTree {
    private final Node.Members root;

    FileTree(Node.Members root) {
        this.root = root;
    }

    /**
     * Reads a file.
     *
     * @throws FaultyFileException if there is no such file, it cannot be read, or it is not a JSON object
     */
    public static FileTree read(Path path) {
        Faults faults = new Faults(path.toString());
        return of(Format.parse(path, faults), faults);
    }

    /**
     * @param fileName what to call the text in faults
     * @throws FaultyFileException if it is not a JSON object
     */
    public static FileTree parse(String fileName, String text) {
        Faults faults = new Faults(fileName);
        return of(TreeParser.parse(text, faults), faults);
    }

    /** From plain values, in the order of the map. */
    public static FileTree of(Map<String, ?> fields) {
        return new FileTree((Node.Members) PlainValues.node(fields));
    }

    private static FileTree of(Node.Members root, Faults faults) {
        faults.orThrow();
        return new FileTree(root);
    }

    Node.Members root() {
        return root;
    }

    /** The value at a path; null where there is none or it is null. The empty path is the whole file. */
    public Object get(String path) {
        Node node = node(path);
        return node == null ? null : PlainValues.plain(node);
    }

    /** Whether there is a value at a path. */
    public boolean has(String path) {
        return node(path) != null;
    }

    /** The number at a path; NaN where there is none. */
    public double number(String path) {
        return node(path) instanceof Node.Decimal number ? number.value() : Double.NaN;
    }

    /** The text at a path; null where there is none. */
    public String text(String path) {
        return node(path) instanceof Node.Text text ? text.text() : null;
    }

    /** Items of the list at a path; 0 where there is none. */
    public int size(String path) {
        return node(path) instanceof Node.Elements list ? list.items().size() : 0;
    }

    /** Names of the fields of the object at a path, in the order of the file; none where there is no object. */
    public List<String> fields(String path) {
        return node(path) instanceof Node.Members object ? List.copyOf(object.fields().keySet()) : List.of();
    }

    private Node node(String path) {
        Node at = root;
        for (String step : FieldPath.steps(path)) {
            at = child(at, step);
        }
        return at;
    }

    private static Node child(Node at, String step) {
        if (FieldPath.isItem(step)) {
            int k = FieldPath.index(step);
            return at instanceof Node.Elements list && k < list.items().size() ? list.items().get(k) : null;
        }
        return at instanceof Node.Members object ? object.get(step) : null;
    }

    /**
     * The tree with a value at a path: in place of the one there, or as a new field at the place that the format gives it. Objects on the way
     * that are not there are made.
     *
     * @throws IllegalArgumentException if the path leads through an item that is not there, or a value of another kind
     */
    public FileTree set(String path, Object value) {
        return new FileTree((Node.Members) set(root, FieldPath.steps(path), 0, PlainValues.node(value)));
    }

    private static Node set(Node at, List<String> steps, int depth, Node value) {
        if (depth == steps.size()) {
            return value;
        }
        String step = steps.get(depth);
        if (FieldPath.isItem(step)) {
            int k = FieldPath.index(step);
            require(at instanceof Node.Elements list && k < list.items().size(), steps, depth);
            List<Node> items = new ArrayList<>(((Node.Elements) at).items());
            items.set(k, set(items.get(k), steps, depth + 1, value));
            return new Node.Elements(at.place(), items);
        }
        require(at == null || at instanceof Node.Members, steps, depth);
        Map<String, Node.Member> fields = at == null ? new LinkedHashMap<>() : new LinkedHashMap<>(((Node.Members) at).fields());
        Node.Member old = fields.get(step);
        Node.Member member = new Node.Member(old == null ? Place.NONE : old.namePlace(), set(old == null ? null : old.value(), steps, depth + 1, value));
        Place place = at == null ? Place.NONE : at.place();
        if (old != null) {
            fields.put(step, member);
            return new Node.Members(place, fields);
        }
        return new Node.Members(place, FieldOrder.insert(fields, step, member));
    }

    /** The tree without the field or item at a path; the same tree where there is none. */
    public FileTree remove(String path) {
        List<String> steps = FieldPath.steps(path);
        return steps.isEmpty() || !has(path) ? this : new FileTree((Node.Members) remove(root, steps, 0));
    }

    private static Node remove(Node at, List<String> steps, int depth) {
        String step = steps.get(depth);
        boolean last = depth + 1 == steps.size();
        if (at instanceof Node.Elements list) {
            List<Node> items = new ArrayList<>(list.items());
            int k = FieldPath.index(step);
            if (last) {
                items.remove(k);
            } else {
                items.set(k, remove(items.get(k), steps, depth + 1));
            }
            return new Node.Elements(at.place(), items);
        }
        Map<String, Node.Member> fields = new LinkedHashMap<>(((Node.Members) at).fields());
        Node.Member old = fields.get(step);
        if (last) {
            fields.remove(step);
        } else {
            fields.put(step, new Node.Member(old.namePlace(), remove(old.value(), steps, depth + 1)));
        }
        return new Node.Members(at.place(), fields);
    }

    /**
     * The tree with an item more in a list, which is made where there is none.
     *
     * @param index from 0 to the number of items
     */
    public FileTree insert(String listPath, int index, Object value) {
        FileTree with = has(listPath) ? this : set(listPath, List.of());
        Node node = with.node(listPath);
        require(node instanceof Node.Elements list && index >= 0 && index <= list.items().size(), List.of(listPath), 0);
        List<Node> items = new ArrayList<>(((Node.Elements) node).items());
        items.add(index, PlainValues.node(value));
        return with.replace(listPath, new Node.Elements(node.place(), items));
    }

    /** The tree with one item of a list moved to another place. */
    public FileTree move(String listPath, int from, int to) {
        Node node = node(listPath);
        require(node instanceof Node.Elements list && Math.min(from, to) >= 0 && Math.max(from, to) < list.items().size(), List.of(listPath), 0);
        List<Node> items = new ArrayList<>(((Node.Elements) node).items());
        items.add(to, items.remove(from));
        return replace(listPath, new Node.Elements(node.place(), items));
    }

    /** The tree with the value at one path copied, as it is written, to another. */
    public FileTree copy(String from, String to) {
        Node node = node(from);
        require(node != null, List.of(from), 0);
        return new FileTree((Node.Members) set(root, FieldPath.steps(to), 0, node));
    }

    private FileTree replace(String path, Node value) {
        return new FileTree((Node.Members) set(root, FieldPath.steps(path), 0, value));
    }

    private static void require(boolean there, List<String> steps, int depth) {
        if (!there) {
            throw new IllegalArgumentException("no such place in the file: " + String.join(".", steps) + " at " + steps.get(depth));
        }
    }

    /** The file as JSON, laid out as the files that come with the program. */
    public String text() {
        return TreeText.of(root);
    }

    /** Whether two files say the same in the same order, numbers by their digits. */
    @Override
    public boolean equals(Object other) {
        return other instanceof FileTree tree && (tree.root == root || tree.text().equals(text()));
    }

    @Override
    public int hashCode() {
        return text().hashCode();
    }

    @Override
    public String toString() {
        return text();
    }
}
