package layerweft.file;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;

/**
 * The JSON object of a file, of whatever format and however faulty, for editing: immutable, with its fields in order and its numbers as they
 * were written. Every edit gives a new tree that shares with the old one what it did not touch.
 *
 * <p>Values have paths, e.g. {@code perils[1].severity.alpha}; the whole object is the empty path. They go in and out as plain Java values:
 * String, Double, Boolean, List and Map with String keys. Two trees are equal if they hold the same fields and values: neither the order of
 * fields, nor how a number is written, nor the name of the file counts.
 */
public final class FileTree {
    private final String fileName;
    private final Node.Members root;

    private FileTree(String fileName, Node.Members root) {
        this.fileName = fileName;
        this.root = root;
    }

    /**
     * @throws FaultyFileException if the file cannot be read or is not a JSON object; of its format nothing is checked
     */
    public static FileTree read(Path path) {
        return parse(path.toString(), SourceText.read(path));
    }

    /**
     * @param fileName what to call the file in faults
     * @throws FaultyFileException if the text is not a JSON object; of its format nothing is checked
     */
    public static FileTree parse(String fileName, String text) {
        Faults faults = new Faults(fileName);
        Node.Members root = TreeParser.parse(text, faults);
        faults.orThrow();
        return new FileTree(fileName, (Node.Members) TreeValues.unplaced(root));
    }

    /**
     * @param fileName what to call the file in faults
     * @param fields plain Java values by name
     */
    public static FileTree of(String fileName, Map<String, ?> fields) {
        return new FileTree(fileName, (Node.Members) TreeValues.node(fields));
    }

    static FileTree of(String fileName, Node root) {
        return new FileTree(fileName, (Node.Members) root);
    }

    Node.Members root() {
        return root;
    }

    /** What the file is called in faults. */
    public String fileName() {
        return fileName;
    }

    /** The same tree under another name, as after saving it elsewhere. */
    public FileTree named(String name) {
        return new FileTree(name, root);
    }

    /**
     * The value there: String, Double (infinite where the number written is beyond its range), Boolean, unmodifiable List or Map; null where
     * there is nothing, or null.
     *
     * @throws IllegalArgumentException if the path is none
     */
    public Object get(String path) {
        return TreeValues.plain(node(path));
    }

    /** Whether there is a value, which may be null. */
    public boolean has(String path) {
        return node(path) != null;
    }

    /**
     * The object there as a tree of its own, which {@link #set} and {@link #insert} take with its numbers as they were written.
     *
     * @throws IllegalArgumentException if there is no object
     */
    public FileTree at(String path) {
        if (node(path) instanceof Node.Members object) {
            return new FileTree(fileName, object);
        }
        throw new IllegalArgumentException("no object at " + path);
    }

    /** The number there; NaN where there is none. */
    public double number(String path) {
        return node(path) instanceof Node.Decimal number ? number.value() : Double.NaN;
    }

    /** The text there; null where there is none. */
    public String text(String path) {
        return node(path) instanceof Node.Text text ? text.text() : null;
    }

    /** Names of the fields of the object there, in the order of the file; none where there is no object. */
    public List<String> fields(String path) {
        return node(path) instanceof Node.Members object ? List.copyOf(object.fields().keySet()) : List.of();
    }

    /** How many items the list there has; 0 where there is no list. */
    public int size(String listPath) {
        return node(listPath) instanceof Node.Elements list ? list.items().size() : 0;
    }

    /**
     * The value put there, and objects and lists on the way made where they are not there. A new field goes where the format has it; a number
     * that is there already stays as it is written.
     *
     * @param path an item of a list may be the one behind its end
     * @param value a String, Number, Boolean or FileTree, or a List or Map with String keys of such
     * @throws IllegalArgumentException for null and other values, numbers that are not finite, and paths that lead through a plain value or
     *     beyond the end of a list
     */
    public FileTree set(String path, Object value) {
        Node node = TreeValues.node(value);
        Node present = node(path);
        if (present != null && TreeValues.plain(present) != null && TreeValues.plain(present).equals(TreeValues.plain(node))) {
            return this;
        }
        return edited(TreeEdit.set(root, TreePath.steps(path), node));
    }

    /** What stands at one path put at another as well, with its numbers as they are written. */
    public FileTree copy(String from, String to) {
        Node node = node(from);
        if (node == null) {
            throw new IllegalArgumentException("nothing at " + from);
        }
        return edited(TreeEdit.set(root, TreePath.steps(to), node));
    }

    /** Without the value there; the same where there is none. */
    public FileTree remove(String path) {
        List<Object> steps = TreePath.steps(path);
        if (steps.isEmpty()) {
            throw new IllegalArgumentException("the whole file cannot be removed from itself");
        }
        int last = steps.size() - 1;
        return edited(TreeEdit.within(root, steps.subList(0, last), holder -> TreeEdit.without(holder, steps.get(last))));
    }

    /**
     * A list with one item more; a list of one where there is none.
     *
     * @param index the item's position afterwards, from 0 to the present length
     * @param value as for {@link #set}
     */
    public FileTree insert(String listPath, int index, Object value) {
        List<Node> items = has(listPath) ? items(listPath) : new ArrayList<>();
        items.add(checked(index, items.size() + 1), TreeValues.node(value));
        return setList(listPath, items);
    }

    /**
     * A list with one item elsewhere.
     *
     * @param to its position afterwards
     */
    public FileTree move(String listPath, int from, int to) {
        List<Node> items = items(listPath);
        Node moved = items.remove(checked(from, items.size()));
        items.add(checked(to, items.size() + 1), moved);
        return setList(listPath, items);
    }

    /** The JSON as people lay it out, ending with a line break. */
    public String text() {
        return TreeText.of(root);
    }

    /** Null where there is nothing. */
    Node node(String path) {
        Node at = root;
        for (Object step : TreePath.steps(path)) {
            at = TreePath.next(at, step);
        }
        return at;
    }

    private List<Node> items(String listPath) {
        return new ArrayList<>(TreeEdit.elements(node(listPath)).items());
    }

    private FileTree setList(String listPath, List<Node> items) {
        return edited(TreeEdit.set(root, TreePath.steps(listPath), new Node.Elements(Place.NONE, items)));
    }

    private FileTree edited(Node changed) {
        if (changed instanceof Node.Members object) {
            return object == root ? this : new FileTree(fileName, object);
        }
        throw new IllegalArgumentException("a file is an object, not " + changed.shown());
    }

    private static int checked(int index, int count) {
        if (index < 0 || index >= count) {
            throw new IllegalArgumentException("position " + index + " is not from 0 to " + (count - 1));
        }
        return index;
    }

    @Override
    public boolean equals(Object other) {
        return this == other || other instanceof FileTree tree
                && (root == tree.root || TreeValues.plain(root).equals(TreeValues.plain(tree.root)));
    }

    @Override
    public int hashCode() {
        return TreeValues.plain(root).hashCode();
    }

    @Override
    public String toString() {
        return text();
    }
}
