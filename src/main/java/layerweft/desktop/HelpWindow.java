package layerweft.desktop;

import java.util.List;
import javafx.scene.Scene;
import javafx.scene.control.Label;
import javafx.scene.control.ScrollPane;
import javafx.scene.layout.GridPane;
import javafx.scene.layout.VBox;
import javafx.stage.Stage;
import javafx.stage.Window;
import layerweft.desktop.command.Command;
import layerweft.desktop.command.Keys;
import layerweft.desktop.theme.Theme;

/** Help without a network: how the window works and which keys there are. */
final class HelpWindow {
    private static final List<String> PARAGRAPHS = List.of(
            "The strip at the bottom is the same in every room. At its left stands τ, the strength with which the perils' bad years go together: "
                    + "drag it and watch what each layer costs. Each cell shows a layer's loss on line, its error, its change since the pin and, "
                    + "on an axis that all cells share, how far τ moves it.",
            "Pin figures keeps the present figures as a base line; everything that changes from then on is told against it.",
            "Amounts take 12.5m, 1,200 or 35%. Enter takes what is typed, Esc brings back what was there. Undo takes back anything.",
            "A price supports the judgement of qualified people. It leaves out error of models and parameters, perils that are not in the file, "
                    + "contract wording and credit risk.");
    private static final List<String[]> HAND = List.of(
            new String[] {"Drag τ, or sideways on a layer's curve", "turns τ by 0.01; with Shift on the track by 0.001"},
            new String[] {"Arrows on the track", "turn τ by 0.01; with Shift by 0.001"},
            new String[] {"Page Up, Page Down on the track", "turn τ by 0.1"},
            new String[] {"Double click on τ, or Enter on the track", "types a number"},
            new String[] {"Arrows on a layer's cell", "select its neighbour"});

    private HelpWindow() {}

    static Stage open(Window owner, Theme theme, List<Command> commands) {
        VBox page = new VBox();
        page.getStyleClass().add("lw-help");
        page.getChildren().add(styled("Layerweft in short", "lw-title"));
        for (String paragraph : PARAGRAPHS) {
            Label text = styled(paragraph, "lw-help-text");
            text.setWrapText(true);
            page.getChildren().add(text);
        }
        page.getChildren().add(styled("By hand", "lw-panel-title"));
        GridPane hand = table();
        for (int k = 0; k < HAND.size(); k++) {
            hand.addRow(k, styled(HAND.get(k)[0], "lw-help-key"), styled(HAND.get(k)[1], "lw-help-text"));
        }
        page.getChildren().addAll(hand, styled("By keys", "lw-panel-title"));
        GridPane keys = table();
        int row = 0;
        for (Command command : commands) {
            if (command.keys() != null) {
                keys.addRow(row++, styled(Keys.text(command.keys()), "lw-help-key"), styled(command.name().getValue(), "lw-help-text"));
            }
        }
        page.getChildren().add(keys);
        ScrollPane scroll = new ScrollPane(page);
        scroll.setFitToWidth(true);
        Stage stage = new Stage();
        stage.initOwner(owner);
        stage.setTitle("Layerweft help");
        Scene scene = new Scene(scroll, theme.px(680), theme.px(760));
        theme.dress(scene);
        stage.setScene(scene);
        stage.show();
        return stage;
    }

    private static GridPane table() {
        GridPane grid = new GridPane();
        grid.getStyleClass().add("lw-help-table");
        return grid;
    }

    private static Label styled(String text, String style) {
        Label label = new Label(text);
        label.getStyleClass().add(style);
        return label;
    }
}
