package layerweft.desktop.dependence;

import javafx.css.PseudoClass;
import javafx.scene.control.Label;
import javafx.scene.input.KeyCode;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;
import layerweft.desktop.control.ChartView;
import layerweft.desktop.theme.Theme;
import layerweft.report.chart.FamilyTileChart;

/** A family to choose: its name, its shape at the present τ, λ_U and the selected layer's figure at the same τ. */
final class FamilyTile extends VBox {
    private static final PseudoClass CHOSEN = PseudoClass.getPseudoClass("chosen");
    private final Label name = new Label();
    private final ChartView shape;
    private final Label tail = new Label();
    private final Label figure = new Label();
    private Runnable onChoose = () -> {};

    FamilyTile(Theme theme) {
        getStyleClass().addAll("lw-panel", "lw-tile");
        name.getStyleClass().add("lw-panel-title");
        shape = new ChartView(theme);
        shape.setFocusTraversable(false);
        shape.setMouseTransparent(true);
        VBox.setVgrow(shape, Priority.ALWAYS);
        tail.getStyleClass().add("lw-note");
        figure.getStyleClass().add("lw-strong");
        Region gap = new Region();
        HBox.setHgrow(gap, Priority.ALWAYS);
        getChildren().addAll(name, shape, new HBox(tail, gap, figure));
        setFocusTraversable(true);
        setOnMouseClicked(clicked -> onChoose.run());
        setOnKeyPressed(key -> {
            if (key.getCode() == KeyCode.ENTER || key.getCode() == KeyCode.SPACE) {
                onChoose.run();
                key.consume();
            }
        });
    }

    void show(FamilyTileChart chart, String lambda, String value, boolean chosen, Runnable choose) {
        name.setText(chart.name());
        shape.picture().set(chart);
        tail.setText(lambda);
        figure.setText(value);
        pseudoClassStateChanged(CHOSEN, chosen);
        setAccessibleText(chart.name() + ", " + lambda + ", " + value);
        onChoose = choose;
    }

    String shownName() {
        return name.getText();
    }
}
