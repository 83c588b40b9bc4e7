package layerweft.desktop;

import javafx.beans.value.ChangeListener;
import javafx.beans.value.ObservableValue;
import javafx.css.PseudoClass;
import javafx.scene.AccessibleRole;
import javafx.scene.Cursor;
import javafx.scene.control.ContextMenu;
import javafx.scene.control.Label;
import javafx.scene.control.MenuItem;
import javafx.scene.input.Clipboard;
import javafx.scene.input.ClipboardContent;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyCodeCombination;
import javafx.scene.input.KeyCombination;
import javafx.scene.layout.Region;
import javafx.scene.text.Text;
import javafx.scene.text.TextFlow;
import layerweft.desktop.theme.Theme;

/** A room's name and its reading: after it on the same line or, where it is too long for that, in two lines of smaller type; never cut. */
final class TitleLine extends Region {
    private static final PseudoClass LONG = PseudoClass.getPseudoClass("long");
    private static final KeyCombination COPY = new KeyCodeCombination(KeyCode.C, KeyCombination.SHORTCUT_DOWN);
    private static final double BASELINE = 36;
    private static final double GAP = 18;

    private final Theme theme;
    private final Label title = new Label();
    private final TextFlow flow = new TextFlow();
    private final ChangeListener<Reading> listener = (is, was, now) -> show(now);
    private ObservableValue<Reading> source;
    private Reading reading = Reading.EMPTY;

    TitleLine(Theme theme) {
        this.theme = theme;
        getStyleClass().add("lw-title-line");
        title.getStyleClass().add("lw-title");
        title.setId("room-title");
        flow.getStyleClass().add("lw-reading");
        flow.setId("reading");
        flow.setFocusTraversable(true);
        flow.setAccessibleRole(AccessibleRole.TEXT);
        flow.setOnKeyPressed(pressed -> {
            if (COPY.match(pressed)) {
                copy();
                pressed.consume();
            }
        });
        MenuItem copy = new MenuItem("Copy the sentence");
        copy.setOnAction(chosen -> copy());
        ContextMenu menu = new ContextMenu(copy);
        flow.setOnContextMenuRequested(asked -> menu.show(flow, asked.getScreenX(), asked.getScreenY()));
        getChildren().addAll(title, flow);
    }

    void show(Room room) {
        title.setText(room.name());
        if (source != null) {
            source.removeListener(listener);
        }
        source = room.reading();
        source.addListener(listener);
        show(source.getValue());
    }

    Reading reading() {
        return reading;
    }

    private void show(Reading now) {
        reading = now;
        flow.getChildren().clear();
        for (Reading.Run run : now.runs()) {
            Text text = new Text(run.text());
            text.getStyleClass().add(run.strong() ? "lw-reading-figure" : "lw-reading-words");
            if (run.go() != null) {
                text.setCursor(Cursor.HAND);
                text.setOnMouseClicked(clicked -> run.go().run());
            }
            flow.getChildren().add(text);
        }
        flow.setAccessibleText(now.text());
        requestLayout();
    }

    private void copy() {
        ClipboardContent content = new ClipboardContent();
        content.putString(reading.text());
        Clipboard.getSystemClipboard().setContent(content);
    }

    @Override
    protected void layoutChildren() {
        double baseline = theme.px(BASELINE);
        double titleWidth = title.prefWidth(-1);
        title.resizeRelocate(0, baseline - title.getBaselineOffset(), titleWidth, title.prefHeight(-1));
        double from = titleWidth + theme.px(GAP);
        double room = Math.max(0, getWidth() - from);
        flow.pseudoClassStateChanged(LONG, false);
        flow.applyCss();
        boolean tooLong = flow.prefWidth(-1) > room;
        if (tooLong) {
            flow.pseudoClassStateChanged(LONG, true);
            flow.applyCss();
            double height = flow.prefHeight(room);
            flow.resizeRelocate(from, Math.max(0, theme.px(BASELINE + 11) - height), room, height);
        } else {
            flow.resizeRelocate(from, baseline - flow.getBaselineOffset(), room, flow.prefHeight(room));
        }
    }

    @Override
    protected double computePrefHeight(double width) {
        return theme.px(56);
    }
}
