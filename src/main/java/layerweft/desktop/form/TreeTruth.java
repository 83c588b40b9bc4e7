package layerweft.desktop.form;

import javafx.scene.control.CheckBox;
import layerweft.desktop.session.Session;

/** A yes or no of a file; what holds without the field is not written. */
public final class TreeTruth extends CheckBox {

    /** @param usual what holds where the file says nothing */
    public TreeTruth(Session session, Side side, String path, String label, boolean usual, String what) {
        super(label);
        Runnable refresh = () -> setSelected(side.tree(session.document().get()).get(path) instanceof Boolean truth ? truth : usual);
        setOnAction(pressed -> {
            boolean now = isSelected();
            session.edit("change of " + what, document -> side.with(document, tree -> now == usual ? tree.remove(path) : tree.set(path, now)));
        });
        session.document().addListener((is, was, now) -> refresh.run());
        refresh.run();
    }
}
