package layerweft.desktop.dependence;

import java.util.List;
import java.util.Optional;
import java.util.function.BiFunction;
import javafx.scene.Node;
import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.control.TextField;
import javafx.scene.control.Tooltip;
import javafx.scene.input.ClipboardContent;
import javafx.scene.input.KeyCode;
import javafx.scene.input.TransferMode;
import javafx.scene.layout.ColumnConstraints;
import javafx.scene.layout.GridPane;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.VBox;
import layerweft.desktop.control.AmountText;
import layerweft.desktop.session.Session;
import layerweft.model.copula.Copula;
import layerweft.model.copula.Independence;
import layerweft.model.portfolio.Dependence;
import layerweft.model.portfolio.Peril;
import layerweft.model.portfolio.Portfolio;
import layerweft.study.CountConcordance;

/**
 * τ of every pair: above the diagonal what is set, below what follows for the counts. A normal or t copula opens the upper half for editing; a matrix that
 * cannot exist is explained, and the nearest one that can is offered.
 */
final class PairsPanel extends VBox {
    private final Session session;
    private final GridPane grid = new GridPane();
    private final Label note = new Label();
    private final HBox offer = new HBox();
    private final GridPane nearest = new GridPane();
    private final Button use = new Button("Use the nearest");
    private String shape = "";

    PairsPanel(Session session) {
        this.session = session;
        getStyleClass().add("lw-column-tight");
        grid.getStyleClass().add("lw-pairs");
        nearest.getStyleClass().add("lw-pairs");
        note.getStyleClass().add("lw-note");
        note.setWrapText(true);
        note.setMinHeight(USE_PREF_SIZE);
        use.getStyleClass().addAll("lw-main-button", "lw-small-main");
        use.setOnAction(asked -> PairMatrix.of(session.document().get().portfolio()).map(PairMatrix::nearest)
                .ifPresent(found -> session.edit("nearest admissible matrix", d -> d.withPortfolio(found::in))));
        Label back = new Label("or go on editing: the last valid matrix still prices the layers.");
        back.getStyleClass().add("lw-note");
        back.setWrapText(true);
        HBox.setHgrow(back, Priority.ALWAYS);
        offer.getStyleClass().add("lw-controls");
        offer.getChildren().addAll(use, back);
        getChildren().addAll(grid, note, nearest, offer);
    }

    /** @param portfolio the last valid one; the file may be ahead of it */
    void show(Portfolio portfolio) {
        Optional<PairMatrix> matrix = PairMatrix.of(session.document().get().portfolio()).filter(m -> m.correlation().length == portfolio.perils().size());
        boolean impossible = matrix.isPresent() && !matrix.get().exists();
        List<String> names = portfolio.perils().stream().map(Peril::name).toList();
        String now = names + " " + matrix.isPresent();
        if (!now.equals(shape)) {
            shape = now;
            build(names, matrix.isPresent());
        }
        Copula copula = portfolio.dependence().copula();
        boolean counts = portfolio.dependence().links() == Dependence.Links.COUNTS;
        fill(grid, names.size(), (i, j) -> matrix.map(m -> m.tau(i, j)).orElseGet(() -> copula instanceof Independence ? 0 : copula.kendallTau(i, j)), impossible);
        for (int i = 0; i < names.size(); i++) {
            for (int j = 0; j < i; j++) {
                Peril first = portfolio.perils().get(j);
                Peril second = portfolio.perils().get(i);
                double tauB = counts ? CountConcordance.tauB(copula.pair(j, i), first.frequency(), second.frequency()) : Double.NaN;
                ((Label) cell(grid, i, j)).setText(Digits.two(tauB));
            }
        }
        for (Node node : List.of(nearest, offer)) {
            node.setVisible(impossible);
            node.setManaged(impossible);
        }
        note.getStyleClass().remove("lw-invalid-text");
        if (impossible) {
            note.getStyleClass().add("lw-invalid-text");
            note.setText(matrix.get().why(names) + " Nearest matrix that exists:");
            showNearest(names, matrix.get().nearest());
        } else {
            note.setText(matrix.isPresent() ? "Each pair can be set. Turning τ in the strip scales all pairs together."
                    : "One τ for all pairs. To set each pair by itself, choose Gaussian or Student. A matrix that cannot exist is explained and its nearest valid one offered.");
        }
    }

    private void build(List<String> names, boolean editable) {
        grid.getChildren().clear();
        columns(grid, names.size(), true);
        for (int i = 0; i < names.size(); i++) {
            Label across = head(names.get(i));
            Label down = head(names.get(i));
            down.setGraphic(YearsPanel.thread(i));
            draggable(down, names.get(i));
            grid.add(across, i + 1, 0);
            grid.add(down, 0, i + 1);
            for (int j = 0; j < names.size(); j++) {
                grid.add(i == j ? cell("lw-pair-none") : j < i ? cell("lw-pair-follows") : editable ? field(names, i, j) : cell("lw-pair-set"), j + 1, i + 1);
            }
        }
    }

    private static void columns(GridPane pane, int n, boolean named) {
        pane.getColumnConstraints().clear();
        for (int c = 0; c < n + (named ? 1 : 0); c++) {
            ColumnConstraints column = new ColumnConstraints();
            column.setHgrow(Priority.SOMETIMES);
            column.setFillWidth(true);
            column.setMinWidth(named && c == 0 ? 60 : 34);
            column.setMaxWidth(named && c == 0 ? 150 : 84);
            column.setPrefWidth(named && c == 0 ? 110 : 84);
            pane.getColumnConstraints().add(column);
        }
    }

    private static Label head(String name) {
        Label head = new Label(name);
        head.getStyleClass().add("lw-pair-head");
        head.setMaxWidth(Double.MAX_VALUE);
        head.setTooltip(new Tooltip(name));
        return head;
    }

    /** A peril is dropped on a group by its name. */
    private static void draggable(Label head, String name) {
        head.setOnDragDetected(event -> {
            ClipboardContent content = new ClipboardContent();
            content.putString(GroupsPanel.PERIL + name);
            head.startDragAndDrop(TransferMode.COPY).setContent(content);
            event.consume();
        });
    }

    private static Label cell(String kind) {
        Label cell = new Label();
        cell.getStyleClass().addAll("lw-pair-cell", kind);
        return cell;
    }

    private TextField field(List<String> names, int i, int j) {
        TextField field = new TextField();
        field.getStyleClass().addAll("lw-pair-cell", "lw-pair-set");
        field.setAccessibleText("τ of " + names.get(i) + " and " + names.get(j));
        field.setOnAction(entered -> commit(field, i, j));
        field.focusedProperty().addListener((is, was, now) -> {
            if (!now) {
                commit(field, i, j);
            }
        });
        field.setOnKeyPressed(key -> {
            if (key.getCode() == KeyCode.ESCAPE) {
                restore(field, i, j);
                key.consume();
            }
        });
        return field;
    }

    private void restore(TextField field, int i, int j) {
        PairMatrix.of(session.document().get().portfolio()).ifPresent(m -> field.setText(Digits.two(m.tau(i, j))));
    }

    private void commit(TextField field, int i, int j) {
        Optional<PairMatrix> matrix = PairMatrix.of(session.document().get().portfolio());
        double tau = AmountText.read(field.getText(), AmountText.Kind.NUMBER, "").value();
        if (matrix.isEmpty() || field.getText().equals(Digits.two(matrix.get().tau(i, j)))) {
            return;
        }
        if (Math.abs(tau) <= 1) {
            session.edit("τ of a pair", d -> d.withPortfolio(matrix.get().with(i, j, tau)::in));
        } else {
            restore(field, i, j);
        }
    }

    private static Node cell(GridPane pane, int i, int j) {
        return pane.getChildren().stream().filter(n -> GridPane.getRowIndex(n) == i + 1 && GridPane.getColumnIndex(n) == j + 1).findFirst().orElseThrow();
    }

    private static void fill(GridPane pane, int n, BiFunction<Integer, Integer, Double> tau, boolean wrong) {
        for (int i = 0; i < n; i++) {
            for (int j = i + 1; j < n; j++) {
                Node cell = cell(pane, i, j);
                String text = Digits.two(tau.apply(i, j));
                cell.getStyleClass().remove("lw-pair-wrong");
                if (wrong) {
                    cell.getStyleClass().add("lw-pair-wrong");
                }
                if (cell instanceof TextField field) {
                    if (!field.isFocused() || wrong) {
                        field.setText(text);
                    }
                } else {
                    ((Label) cell).setText(text);
                }
            }
        }
    }

    private void showNearest(List<String> names, PairMatrix found) {
        nearest.getChildren().clear();
        columns(nearest, names.size(), true);
        for (int i = 0; i < names.size(); i++) {
            nearest.add(head(names.get(i)), 0, i);
            for (int j = i + 1; j < names.size(); j++) {
                Label cell = cell("lw-pair-set");
                cell.setText(Digits.two(found.tau(i, j)));
                nearest.add(cell, j + 1, i);
            }
        }
    }
}
