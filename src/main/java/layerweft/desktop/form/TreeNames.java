package layerweft.desktop.form;

import java.util.ArrayList;
import java.util.List;
import java.util.function.Supplier;
import javafx.scene.control.ToggleButton;
import javafx.scene.layout.FlowPane;
import layerweft.desktop.session.Session;
import layerweft.file.FileTree;

/** A list of names of a file as buttons to press, of which any number may be down. */
public final class TreeNames extends FlowPane {
    private final Session session;
    private final Side side;
    private final String path;
    private final Supplier<List<String>> names;
    private final boolean absentIsAll;
    private final String what;

    /**
     * @param names to choose from
     * @param absentIsAll whether no list in the file means all of them; otherwise it means none
     * @param what for the menu: "Undo change of …"
     */
    public TreeNames(Session session, Side side, String path, Supplier<List<String>> names, boolean absentIsAll, String what) {
        this.session = session;
        this.side = side;
        this.path = path;
        this.names = names;
        this.absentIsAll = absentIsAll;
        this.what = what;
        getStyleClass().add("lw-chips");
        session.document().addListener((is, was, now) -> refresh());
        refresh();
    }

    private void refresh() {
        List<String> all = names.get();
        List<String> taken = taken(all);
        getChildren().clear();
        for (String name : all) {
            ToggleButton chip = new ToggleButton(name);
            chip.getStyleClass().add("lw-chip");
            chip.setSelected(taken.contains(name));
            chip.setOnAction(pressed -> toggle(name));
            getChildren().add(chip);
        }
    }

    private List<String> taken(List<String> all) {
        FileTree tree = side.tree(session.document().get());
        if (!(tree.get(path) instanceof List<?> list)) {
            return absentIsAll ? all.stream().filter(n -> !n.contains("/")).toList() : List.of();
        }
        return list.stream().map(String::valueOf).toList();
    }

    private void toggle(String name) {
        List<String> all = names.get();
        List<String> left = new ArrayList<>(taken(all));
        if (!left.remove(name)) {
            // a peril and its own parts exclude each other
            left.removeIf(n -> n.startsWith(name + "/") || name.startsWith(n + "/"));
            left.add(name);
        }
        left.sort((a, b) -> Integer.compare(all.indexOf(a), all.indexOf(b)));
        boolean whole = absentIsAll && left.equals(all.stream().filter(n -> !n.contains("/")).toList());
        session.edit("change of " + what, document -> side.with(document, tree -> left.isEmpty() || whole ? tree.remove(path) : tree.set(path, left)));
        refresh();
    }
}
