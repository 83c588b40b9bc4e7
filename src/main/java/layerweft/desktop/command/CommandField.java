package layerweft.desktop.command;

import java.util.Arrays;
import java.util.Comparator;
import java.util.List;
import java.util.Locale;
import java.util.function.Supplier;
import javafx.geometry.Bounds;
import javafx.geometry.Pos;
import javafx.scene.control.Label;
import javafx.scene.control.ListCell;
import javafx.scene.control.ListView;
import javafx.scene.control.TextField;
import javafx.scene.input.KeyEvent;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import javafx.scene.layout.StackPane;
import javafx.stage.Popup;

/** Finds any command by a few letters of its words. */
public final class CommandField extends StackPane {
    private static final double ROW = 30;
    private static final int MOST_ROWS = 12;
    private static final double LIST_WIDTH = 420;

    private final Supplier<List<Command>> commands;
    private final TextField field = new TextField();
    private final Label keys = new Label("Ctrl K");
    private final ListView<Command> found = new ListView<>();
    private final Popup popup = new Popup();

    /** @param commands all that there are at the time of asking */
    public CommandField(Supplier<List<Command>> commands) {
        this.commands = commands;
        getStyleClass().add("lw-command-field");
        field.setPromptText("Find a command");
        field.setId("command-field");
        field.setAccessibleText("Find a command");
        keys.getStyleClass().add("lw-note");
        keys.setMouseTransparent(true);
        StackPane.setAlignment(keys, Pos.CENTER_RIGHT);
        getChildren().addAll(field, keys);
        found.getStyleClass().add("lw-found");
        found.setCellFactory(list -> new Row());
        found.setFixedCellSize(ROW);
        found.setPrefWidth(LIST_WIDTH);
        found.setOnMouseClicked(clicked -> run());
        // keys go to the field, which moves the choice
        found.setFocusTraversable(false);
        popup.getContent().add(found);
        popup.setAutoHide(true);
        field.textProperty().addListener((is, was, now) -> look());
        field.setOnMouseClicked(clicked -> look());
        field.focusedProperty().addListener((is, was, now) -> {
            keys.setVisible(!now);
            if (!now) {
                close();
            }
        });
        field.addEventFilter(KeyEvent.KEY_PRESSED, this::key);
    }

    /** Brings the keyboard here. */
    public void ask() {
        field.requestFocus();
        field.clear();
        look();
    }

    /** The commands that hold every word, those that begin with the text first. */
    static List<Command> matching(List<Command> all, String text) {
        List<String> words = Arrays.stream(text.toLowerCase(Locale.ROOT).split("\\s+")).filter(word -> !word.isEmpty()).toList();
        return all.stream().filter(command -> words.stream().allMatch(searched(command)::contains))
                .sorted(Comparator.comparing(command -> !begins(command, text))).toList();
    }

    private static String searched(Command command) {
        return (command.menu() + " " + command.name().getValue()).toLowerCase(Locale.ROOT);
    }

    private static boolean begins(Command command, String text) {
        return command.name().getValue().toLowerCase(Locale.ROOT).startsWith(text.strip().toLowerCase(Locale.ROOT));
    }

    private void look() {
        List<Command> matching = matching(commands.get(), field.getText());
        found.getItems().setAll(matching);
        found.getSelectionModel().selectFirst();
        found.setPrefHeight(ROW * Math.max(1, Math.min(MOST_ROWS, matching.size())) + 4);
        if (!popup.isShowing() && field.isFocused() && getScene().getWindow() != null) {
            Bounds at = localToScreen(getBoundsInLocal());
            popup.show(this, at.getMaxX() - LIST_WIDTH, at.getMaxY() + 4);
        }
    }

    private void key(KeyEvent event) {
        int at = found.getSelectionModel().getSelectedIndex();
        switch (event.getCode()) {
            case DOWN -> select(at + 1);
            case UP -> select(at - 1);
            case ENTER -> run();
            case ESCAPE -> {
                close();
                getParent().requestFocus();
            }
            default -> {
                return;
            }
        }
        event.consume();
    }

    private void select(int row) {
        if (row >= 0 && row < found.getItems().size()) {
            found.getSelectionModel().select(row);
            found.scrollTo(Math.max(0, row - MOST_ROWS / 2));
        }
    }

    private void run() {
        Command command = found.getSelectionModel().getSelectedItem();
        close();
        if (command != null) {
            getParent().requestFocus();
            command.run();
        }
    }

    private void close() {
        field.clear();
        popup.hide();
    }

    /** One command: its name, where it is, its keys; greyed with the reason where it is refused. */
    private static final class Row extends ListCell<Command> {
        private final Label name = new Label();
        private final Label where = new Label();
        private final Label keys = new Label();
        private final HBox line = new HBox(name, where, new Region(), keys);

        Row() {
            where.getStyleClass().add("lw-note");
            keys.getStyleClass().add("lw-note");
            line.getStyleClass().add("lw-found-row");
            line.setAlignment(Pos.BASELINE_LEFT);
            HBox.setHgrow(line.getChildren().get(2), Priority.ALWAYS);
        }

        @Override
        protected void updateItem(Command command, boolean empty) {
            super.updateItem(command, empty);
            setGraphic(empty ? null : line);
            if (!empty) {
                String refusal = command.refusal().getValue();
                name.setText(command.name().getValue());
                name.setDisable(!refusal.isEmpty());
                where.setText(refusal.isEmpty() ? command.menu() : refusal);
                keys.setText(command.keys() == null ? "" : Keys.text(command.keys()));
            }
        }
    }
}
