package layerweft.desktop.form;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.Collectors;
import javafx.collections.ListChangeListener;
import javafx.css.PseudoClass;
import javafx.scene.control.Label;
import javafx.scene.control.TextField;
import javafx.scene.layout.VBox;
import layerweft.desktop.control.AmountText;
import layerweft.desktop.session.Session;
import layerweft.file.Fault;
import layerweft.file.FileTree;

/** A list of numbers of a file as one line of text, {@code 100 %; 50 %}. Left blank, the field of the file is left out; {@code none} is an empty list. */
public final class TreeNumbers extends VBox {
    private static final PseudoClass INVALID = PseudoClass.getPseudoClass("invalid");
    private static final String NONE = "none";
    private final Session session;
    private final Side side;
    private final String path;
    private final AmountText.Kind kind;
    private final TextField field = new TextField();
    private final Label message = new Label();

    /**
     * @param blank what a blank field means, e.g. {@code no limit on their number}
     * @param what for the menu: "Undo change of …"
     */
    public TreeNumbers(Session session, Side side, String path, String label, String blank, String what, AmountText.Kind kind) {
        this.session = session;
        this.side = side;
        this.path = path;
        this.kind = kind;
        getStyleClass().add("lw-amount-field");
        Label name = new Label(label);
        name.getStyleClass().add("lw-label");
        name.setLabelFor(field);
        field.setAccessibleText(label);
        field.setPromptText(blank);
        message.getStyleClass().add("lw-field-message");
        message.setWrapText(true);
        getChildren().addAll(name, field, message);
        field.setOnAction(done -> commit(what));
        field.focusedProperty().addListener((is, was, now) -> {
            if (!now) {
                commit(what);
            }
        });
        session.document().addListener((is, was, now) -> refresh());
        side.faults(session).addListener((ListChangeListener<Fault>) change -> faults());
        refresh();
    }

    public TextField textField() {
        return field;
    }

    private void refresh() {
        FileTree tree = side.tree(session.document().get());
        String text = "";
        if (tree.get(path) instanceof List<?> numbers) {
            text = numbers.isEmpty() ? NONE : numbers.stream().map(n -> n instanceof Double d ? AmountText.write(d, kind) + (kind == AmountText.Kind.PART ? " %" : "") : "?")
                    .collect(Collectors.joining("; "));
        }
        field.setText(text);
        faults();
    }

    private void commit(String what) {
        String text = field.getText().strip();
        List<Double> numbers = new ArrayList<>();
        if (!text.equalsIgnoreCase(NONE)) {
            for (String part : text.isEmpty() ? new String[0] : text.split("[;\\s]+(?!%)")) {
                AmountText.Read read = AmountText.read(part, kind, session.document().get().unit());
                if (!read.refusal().isEmpty()) {
                    say("Type " + read.refusal() + " between semicolons, or none.");
                    return;
                }
                numbers.add(read.value());
            }
        }
        say("");
        session.edit("change of " + what, document -> side.with(document, tree -> text.isEmpty() ? tree.remove(path) : numbers.equals(tree.get(path)) ? tree : tree.set(path, numbers)));
    }

    private void faults() {
        say(side.faults(session).stream().filter(f -> f.path().startsWith(path)).findFirst().map(f -> "Admissible: " + f.admissible() + ".").orElse(""));
    }

    private void say(String words) {
        message.setText(words);
        message.setVisible(!words.isEmpty());
        message.setManaged(!words.isEmpty());
        pseudoClassStateChanged(INVALID, !words.isEmpty());
    }
}
