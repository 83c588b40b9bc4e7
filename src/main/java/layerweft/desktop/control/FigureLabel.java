package layerweft.desktop.control;

import javafx.beans.property.BooleanProperty;
import javafx.beans.property.SimpleBooleanProperty;
import javafx.css.PseudoClass;
import javafx.geometry.Pos;
import javafx.scene.control.Label;
import javafx.scene.control.Tooltip;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;

/** A figure with its unit and, below, its error or what there is to say of it. The last valid figure of a faulty document is greyed. */
public final class FigureLabel extends VBox {
    private static final PseudoClass LAST_VALID = PseudoClass.getPseudoClass("last-valid");

    private final Label value = new Label();
    private final Label unit = new Label();
    private final Label note = new Label();
    private final BooleanProperty lastValid = new SimpleBooleanProperty();

    /** @param size of the value: {@code lw-figure-26}, {@code lw-figure-18} or another style class of the stylesheet */
    public FigureLabel(String size) {
        getStyleClass().add("lw-figure");
        value.getStyleClass().addAll("lw-figure-value", size);
        value.setMinWidth(Region.USE_PREF_SIZE);
        unit.getStyleClass().add("lw-figure-unit");
        unit.setMinWidth(Region.USE_PREF_SIZE);
        note.getStyleClass().add("lw-note");
        HBox line = new HBox(value, unit);
        line.setAlignment(Pos.BASELINE_LEFT);
        getChildren().addAll(line, note);
        lastValid.addListener((is, was, now) -> pseudoClassStateChanged(LAST_VALID, now));
    }

    /** Shows a figure. @param note below it; empty for none */
    public void show(String value, String unit, String note) {
        this.value.setText(value);
        this.unit.setText(unit);
        this.note.setText(note);
        this.note.setVisible(!note.isEmpty());
        this.note.setManaged(!note.isEmpty());
    }

    /** Definition, formula, all digits and engine. */
    public void hover(String text) {
        Tooltip.install(this, new Tooltip(text));
    }

    /** Whether it is the last valid figure of a document that has faults. */
    public BooleanProperty lastValid() {
        return lastValid;
    }

    /** What is shown, in one text. */
    public String text() {
        return unit.getText().isEmpty() ? value.getText() : value.getText() + " " + unit.getText();
    }
}
