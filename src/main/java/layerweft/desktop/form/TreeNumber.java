package layerweft.desktop.form;

import javafx.collections.ListChangeListener;
import layerweft.desktop.control.AmountField;
import layerweft.desktop.control.AmountText;
import layerweft.desktop.session.Session;
import layerweft.file.Fault;
import layerweft.file.FileTree;

/** Binds an amount field to a number of a file. Left blank, the field of the file is left out. */
public final class TreeNumber {
    private final Session session;
    private final Side side;
    private final String path;
    private final AmountField field;

    /**
     * @param what for the menu: "Undo change of …"
     * @param path of the number in the file
     */
    public TreeNumber(Session session, Side side, String path, String label, String what, AmountText.Kind kind) {
        this.session = session;
        this.side = side;
        this.path = path;
        this.field = new AmountField(label, kind, session.document().get().unit());
        field.onCommit(value -> session.edit("change of " + what, document -> side.with(document, tree -> value == null ? tree.remove(path) : tree.set(path, value))));
        refresh();
        session.document().addListener((is, was, now) -> refresh());
        side.faults(session).addListener((ListChangeListener<Fault>) change -> faults());
    }

    public AmountField field() {
        return field;
    }

    private void refresh() {
        FileTree tree = side.tree(session.document().get());
        double value = tree.number(path);
        field.value().set(Double.isNaN(value) ? null : value);
        faults();
    }

    private void faults() {
        field.fault().set(side.faults(session).stream().filter(f -> f.path().equals(path)).findFirst()
                .map(f -> "Admissible: " + f.admissible() + ". The last valid value still prices.").orElse(""));
    }
}
