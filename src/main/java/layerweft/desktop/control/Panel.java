package layerweft.desktop.control;

import javafx.beans.property.StringProperty;
import javafx.scene.Node;
import javafx.scene.control.Label;
import javafx.scene.layout.BorderPane;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;

/** A sheet on the window's ground that holds one matter: a title with a note beside it, controls at the right, and its content. */
public final class Panel extends BorderPane {
    private final Label title = new Label();
    private final Label note = new Label();
    private final HBox head = new HBox(title, note);

    /** A panel without a title. */
    public Panel(Node content) {
        getStyleClass().add("lw-panel");
        title.getStyleClass().add("lw-panel-title");
        title.setMinWidth(Region.USE_PREF_SIZE);
        note.getStyleClass().add("lw-note");
        head.getStyleClass().add("lw-panel-head");
        setCenter(content);
    }

    /** A panel with a title. */
    public Panel(String title, Node content) {
        this(content);
        this.title.setText(title);
        setTop(head);
    }

    public StringProperty title() {
        return title.textProperty();
    }

    /** A few words beside the title, e.g. the unit of all amounts in the panel. */
    public StringProperty note() {
        return note.textProperty();
    }

    /** Puts controls at the right end of the title's line. */
    public Panel withControls(Node... controls) {
        Region gap = new Region();
        HBox.setHgrow(gap, Priority.ALWAYS);
        head.getChildren().add(gap);
        head.getChildren().addAll(controls);
        setTop(head);
        return this;
    }
}
