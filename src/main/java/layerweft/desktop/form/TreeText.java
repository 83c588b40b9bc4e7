package layerweft.desktop.form;

import java.util.function.BiFunction;
import javafx.scene.control.Label;
import javafx.scene.control.TextField;
import javafx.scene.layout.VBox;
import layerweft.desktop.session.Document;
import layerweft.desktop.session.Session;

/** A text of a file. */
public final class TreeText extends VBox {
    private final TextField field = new TextField();

    /** @param change makes the document with another text, e.g. with all that names it */
    public TreeText(Session session, Side side, String path, String label, String what, BiFunction<Document, String, Document> change) {
        getStyleClass().add("lw-amount-field");
        Label name = new Label(label);
        name.getStyleClass().add("lw-label");
        name.setLabelFor(field);
        field.setAccessibleText(label);
        getChildren().addAll(name, field);
        Runnable refresh = () -> {
            String text = side.tree(session.document().get()).text(path);
            field.setText(text == null ? "" : text);
        };
        Runnable commit = () -> {
            String text = field.getText().strip();
            if (!text.isEmpty() && !text.equals(side.tree(session.document().get()).text(path))) {
                session.edit("change of " + what, document -> change.apply(document, text));
            }
            refresh.run();
        };
        field.setOnAction(done -> commit.run());
        field.focusedProperty().addListener((is, was, now) -> {
            if (!now) {
                commit.run();
            }
        });
        session.document().addListener((is, was, now) -> refresh.run());
        refresh.run();
    }

    public TextField textField() {
        return field;
    }
}
