package layerweft.desktop;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.function.Consumer;
import javafx.css.PseudoClass;
import javafx.scene.Group;
import javafx.scene.Node;
import javafx.scene.control.Button;
import javafx.scene.control.ContentDisplay;
import javafx.scene.control.Tooltip;
import javafx.scene.layout.StackPane;
import javafx.scene.layout.VBox;
import javafx.scene.shape.SVGPath;
import layerweft.desktop.theme.Icons;

/** The rail at the left: the mark of the program and the way to its rooms. */
final class Rail extends VBox {
    private static final PseudoClass HERE = PseudoClass.getPseudoClass("here");

    private final List<Button> buttons = new ArrayList<>();

    Rail(List<Rooms.Place> places, Consumer<String> goTo) {
        getStyleClass().add("lw-rail");
        getChildren().add(mark());
        for (int k = 0; k < places.size(); k++) {
            Rooms.Place place = places.get(k);
            Button button = new Button(place.name(), Icons.stroked(place.icon()));
            button.setId("rail-" + place.name().toLowerCase(Locale.ROOT));
            button.setContentDisplay(ContentDisplay.TOP);
            button.getStyleClass().setAll("lw-rail-button");
            button.setMaxWidth(Double.MAX_VALUE);
            button.setOnAction(pressed -> goTo.accept(place.name()));
            Node shown = button;
            if (place.reason().isEmpty()) {
                button.setTooltip(new Tooltip(place.name() + "  Ctrl " + (k + 1)));
            } else {
                // a disabled button has no hover text of its own
                button.setDisable(true);
                shown = new StackPane(button);
                Tooltip.install(shown, new Tooltip(place.name() + " " + place.reason()));
                button.setAccessibleHelp(place.reason());
            }
            buttons.add(button);
            getChildren().add(shown);
        }
    }

    private static Node mark() {
        SVGPath threads = Icons.stroked(Icons.MARK_THREADS);
        SVGPath band = Icons.stroked(Icons.MARK_BAND);
        SVGPath warm = Icons.stroked(Icons.MARK_WARM);
        SVGPath over = Icons.stroked(Icons.MARK_OVER);
        threads.getStyleClass().setAll("lw-mark-thread");
        band.getStyleClass().setAll("lw-mark-band");
        warm.getStyleClass().setAll("lw-mark-warm");
        over.getStyleClass().setAll("lw-mark-thread");
        StackPane mark = new StackPane(new Group(threads, band, warm, over));
        mark.getStyleClass().add("lw-rail-mark");
        mark.setAccessibleText("Layerweft");
        return mark;
    }

    void here(String room) {
        buttons.forEach(button -> button.pseudoClassStateChanged(HERE, button.getText().equals(room)));
    }
}
