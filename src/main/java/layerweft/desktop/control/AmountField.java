package layerweft.desktop.control;

import java.util.function.Consumer;
import javafx.animation.PauseTransition;
import javafx.beans.property.ObjectProperty;
import javafx.beans.property.SimpleObjectProperty;
import javafx.beans.property.SimpleStringProperty;
import javafx.beans.property.StringProperty;
import javafx.css.PseudoClass;
import javafx.geometry.Pos;
import javafx.scene.control.Label;
import javafx.scene.control.TextField;
import javafx.scene.control.Tooltip;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyEvent;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.StackPane;
import javafx.scene.layout.VBox;
import javafx.util.Duration;
import layerweft.desktop.control.AmountText.Kind;
import layerweft.desktop.control.AmountText.Read;

/**
 * A field for a number, with its label above and its unit inside. What is typed is checked while it is typed; what is wrong is said below
 * the field after 0.6 s or on leaving. Enter commits, and so does leaving; Esc brings the last value back.
 */
public final class AmountField extends VBox {
    private static final PseudoClass INVALID = PseudoClass.getPseudoClass("invalid");
    private static final Duration BEFORE_SAYING = Duration.millis(600);

    private final String unit;
    private final Kind kind;
    private final TextField field = new TextField();
    private final Label label = new Label();
    private final Label sign = new Label();
    private final Label dot = new Label("●");
    private final Label message = new Label();
    private final Label warning = new Label("⚠");
    private final ObjectProperty<Double> value = new SimpleObjectProperty<>();
    private final StringProperty fault = new SimpleStringProperty("");
    private final StringProperty reason = new SimpleStringProperty("");
    private final StringProperty changedFrom = new SimpleStringProperty("");
    private final PauseTransition patience = new PauseTransition(BEFORE_SAYING);
    private Consumer<Double> onCommit = committed -> {};
    private String blank;
    private String typing = "";

    /**
     * @param name above the field, e.g. {@code Limit}
     * @param unit of the file, e.g. {@code million}
     */
    public AmountField(String name, Kind kind, String unit) {
        this.unit = unit;
        this.kind = kind;
        getStyleClass().add("lw-amount-field");
        label.setText(name);
        label.getStyleClass().add("lw-label");
        label.setLabelFor(field);
        sign.setText(AmountText.sign(kind, unit));
        sign.getStyleClass().add("lw-unit");
        sign.setMouseTransparent(true);
        dot.getStyleClass().add("lw-changed-dot");
        dot.setMouseTransparent(true);
        warning.getStyleClass().add("lw-warning");
        message.getStyleClass().add("lw-field-message");
        message.setWrapText(true);
        field.getStyleClass().add("lw-number");
        field.setAlignment(Pos.CENTER_RIGHT);
        field.setAccessibleText(name);
        StackPane.setAlignment(sign, Pos.CENTER_RIGHT);
        StackPane.setAlignment(dot, Pos.CENTER_LEFT);
        StackPane box = new StackPane(field, sign, dot);
        HBox line = new HBox(box, warning);
        line.setAlignment(Pos.CENTER_LEFT);
        HBox.setHgrow(box, Priority.ALWAYS);
        getChildren().addAll(label, line, message);

        value.addListener((is, was, now) -> rest());
        fault.addListener((is, was, now) -> dress());
        reason.addListener((is, was, now) -> dress());
        changedFrom.addListener((is, was, now) -> dress());
        field.textProperty().addListener((is, was, now) -> typed());
        field.focusedProperty().addListener((is, was, now) -> {
            if (!now) {
                leave();
            }
        });
        field.addEventFilter(KeyEvent.KEY_PRESSED, this::key);
        patience.setOnFinished(done -> dress());
        rest();
    }

    /** The last number committed or set, in the file's unit, a part as a fraction; null for a blank field. */
    public ObjectProperty<Double> value() {
        return value;
    }

    /** What is wrong with the committed number, in a sentence that says what is admissible; empty where nothing is. */
    public StringProperty fault() {
        return fault;
    }

    /** Why the field does not apply at present; empty where it does. It is shown disabled with the reason, never hidden. */
    public StringProperty reason() {
        return reason;
    }

    /** What the number was at the pin, e.g. {@code 30}; empty where it has not changed. */
    public StringProperty changedFrom() {
        return changedFrom;
    }

    /** Lets the field be blank. @param meaning shown in the blank field, e.g. {@code no limit} */
    public AmountField orBlank(String meaning) {
        blank = meaning;
        field.setPromptText(meaning);
        return this;
    }

    /** Called with each number that the user commits; null for a blank field. */
    public AmountField onCommit(Consumer<Double> action) {
        onCommit = action;
        return this;
    }

    /** The text field itself, for focus. */
    public TextField textField() {
        return field;
    }

    private void key(KeyEvent event) {
        if (event.getCode() == KeyCode.ENTER) {
            leave();
            field.selectAll();
            event.consume();
        } else if (event.getCode() == KeyCode.ESCAPE && editing()) {
            rest();
            event.consume();
        }
    }

    private boolean editing() {
        return !field.getText().equals(shown());
    }

    private String shown() {
        return value.get() == null ? "" : AmountText.write(value.get(), kind);
    }

    private void rest() {
        typing = "";
        field.setText(shown());
        patience.stop();
        dress();
    }

    private void typed() {
        if (!editing()) {
            typing = "";
            dress();
            return;
        }
        boolean empty = field.getText().isBlank();
        Read read = AmountText.read(field.getText(), kind, unit);
        typing = empty ? blank == null ? "a number is needed here" : "" : read.refusal();
        patience.playFromStart();
        if (typing.isEmpty()) {
            dress();
        }
    }

    private void leave() {
        patience.stop();
        if (editing() && typing.isEmpty()) {
            Double next = field.getText().isBlank() ? null : (Double) AmountText.read(field.getText(), kind, unit).value();
            value.set(next);
            rest();
            onCommit.accept(next);
        }
        dress();
    }

    /** Shows the state: at rest, not valid, changed since the pin, not available. */
    private void dress() {
        boolean available = reason.get().isEmpty();
        String wrong = !typing.isEmpty() ? "Type " + typing + ". " + stillPrices() : fault.get();
        boolean invalid = available && !wrong.isEmpty();
        field.setDisable(!available);
        sign.setVisible(available);
        field.setPromptText(available ? blank : "—");
        pseudoClassStateChanged(INVALID, invalid);
        warning.setVisible(invalid);
        warning.setManaged(invalid);
        message.setText(available ? wrong : reason.get());
        message.setVisible(!message.getText().isEmpty());
        message.setManaged(message.isVisible());
        boolean changed = !changedFrom.get().isEmpty();
        dot.setVisible(changed);
        field.setTooltip(changed ? new Tooltip("was " + changedFrom.get()) : null);
        field.setAccessibleHelp(message.getText());
    }

    private String stillPrices() {
        return value.get() == null ? "" : "The last valid value, " + shown() + ", still prices the layer.";
    }
}
