package layerweft.file;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.function.UnaryOperator;

/** Changes of trees: what lies beside the path of the change is shared between the old and the new tree. */
final class TreeEdit {
    private TreeEdit() {}

    /** The value at the end of the path replaced; objects on the way that are not there are made. */
    static Node set(Node root, List<Object> steps, Node value) {
        if (steps.isEmpty()) {
            return value;
        }
        Object step = steps.get(0);
        List<Object> rest = steps.subList(1, steps.size());
        Node child = TreePath.next(root, step);
        if (step instanceof Integer k) {
            Node.Elements list = list(root, k);
            List<Node> items = new ArrayList<>(list.items());
            if (child == null) {
                items.add(set(null, rest, value));
            } else {
                items.set(k, set(child, rest, value));
            }
            return new Node.Elements(Place.NONE, items);
        }
        Node.Members object = object(root, (String) step);
        Node.Member member = new Node.Member(Place.NONE, set(child, rest, value));
        if (child == null) {
            return new Node.Members(Place.NONE, FieldOrder.with(object.fields(), (String) step, member));
        }
        Map<String, Node.Member> fields = new LinkedHashMap<>(object.fields());
        fields.put((String) step, member);
        return new Node.Members(Place.NONE, fields);
    }

    /** The object or list that holds the last step, changed; the same tree if it is not there. */
    static Node within(Node root, List<Object> steps, UnaryOperator<Node> change) {
        if (steps.isEmpty()) {
            return change.apply(root);
        }
        Node child = TreePath.next(root, steps.get(0));
        if (child == null) {
            return root;
        }
        Node changed = within(child, steps.subList(1, steps.size()), change);
        return changed == child ? root : set(root, steps.subList(0, 1), changed);
    }

    static Node without(Node holder, Object step) {
        if (TreePath.next(holder, step) == null) {
            return holder;
        }
        if (step instanceof Integer k) {
            List<Node> items = new ArrayList<>(((Node.Elements) holder).items());
            items.remove((int) k);
            return new Node.Elements(Place.NONE, items);
        }
        Map<String, Node.Member> fields = new LinkedHashMap<>(((Node.Members) holder).fields());
        fields.remove((String) step);
        return new Node.Members(Place.NONE, fields);
    }

    /** The list, where an item may be set: at a position it has, or the one behind its end; a new list where there is none. */
    private static Node.Elements list(Node node, int k) {
        Node.Elements list = node == null ? new Node.Elements(Place.NONE, List.of()) : elements(node);
        if (k > list.items().size()) {
            throw new IllegalArgumentException("a list of " + list.items().size() + " has no item [" + k + "], and none may be left out");
        }
        return list;
    }

    static Node.Elements elements(Node node) {
        if (node instanceof Node.Elements list) {
            return list;
        }
        throw new IllegalArgumentException("a list is needed, and there is " + (node == null ? "nothing" : node.shown()));
    }

    private static Node.Members object(Node node, String name) {
        if (node == null) {
            return new Node.Members(Place.NONE, Map.of());
        }
        if (node instanceof Node.Members object) {
            return object;
        }
        throw new IllegalArgumentException("an object is needed for the field " + name + ", and there is " + node.shown());
    }
}
