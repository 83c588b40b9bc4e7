package layerweft.desktop.control;

import java.util.List;
import java.util.function.IntConsumer;
import javafx.css.PseudoClass;
import javafx.geometry.HPos;
import javafx.geometry.VPos;
import javafx.scene.Node;
import javafx.scene.control.ContextMenu;
import javafx.scene.control.Label;
import javafx.scene.control.MenuItem;
import javafx.scene.input.Clipboard;
import javafx.scene.input.ClipboardContent;
import javafx.scene.input.KeyCode;
import javafx.scene.layout.ColumnConstraints;
import javafx.scene.layout.GridPane;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import layerweft.report.chart.ChartTable;

/**
 * Figures in rows and columns: names to the left, numbers to the right, one row chosen. Copies itself as tab-separated text. Its cells are made
 * anew only where the number of rows or columns changes, so that figures keep their places.
 */
public final class FigureTable extends GridPane {
    private static final PseudoClass CHOSEN = PseudoClass.getPseudoClass("chosen");
    private final int nameColumns;
    private List<String> header = List.of();
    private List<List<String>> rows = List.of();
    private int chosen = -1;
    private int warmColumn = -1;
    private IntConsumer onChoose = row -> {};
    private Label[][] cells = new Label[0][0];
    private Region[] grounds = new Region[0];

    /** @param nameColumns columns from the left that hold words, aligned to the left */
    public FigureTable(int nameColumns) {
        this.nameColumns = nameColumns;
        getStyleClass().add("lw-table");
        setFocusTraversable(true);
        MenuItem copy = new MenuItem("Copy table");
        copy.setOnAction(asked -> copy());
        ContextMenu menu = new ContextMenu(copy);
        setOnContextMenuRequested(asked -> menu.show(this, asked.getScreenX(), asked.getScreenY()));
        setOnKeyPressed(key -> {
            if (key.getCode() == KeyCode.C && key.isShortcutDown()) {
                copy();
                key.consume();
            } else if (key.getCode() == KeyCode.DOWN && chosen >= 0 && chosen + 1 < rows.size()) {
                onChoose.accept(chosen + 1);
                key.consume();
            } else if (key.getCode() == KeyCode.UP && chosen > 0) {
                onChoose.accept(chosen - 1);
                key.consume();
            }
        });
    }

    /** Called with the row that is clicked or reached with the arrow keys. */
    public FigureTable onChoose(IntConsumer action) {
        onChoose = action;
        return this;
    }

    /** Shows figures. */
    public void show(List<String> newHeader, List<List<String>> newRows) {
        boolean same = header.size() == newHeader.size() && rows.size() == newRows.size();
        header = List.copyOf(newHeader);
        rows = newRows.stream().map(List::copyOf).toList();
        if (!same) {
            build();
        }
        for (int c = 0; c < header.size(); c++) {
            cells[0][c].setText(header.get(c));
            for (int r = 0; r < rows.size(); r++) {
                cells[r + 1][c].setText(rows.get(r).get(c));
            }
        }
        dress();
    }

    /** The row set apart; −1 for none. */
    public void choose(int row) {
        chosen = row;
        dress();
    }

    /** The column of the present τ; −1 for none. */
    public void warm(int column) {
        warmColumn = column;
        dress();
    }

    private void build() {
        getChildren().clear();
        getColumnConstraints().clear();
        cells = new Label[rows.size() + 1][header.size()];
        grounds = new Region[rows.size()];
        for (int r = 0; r < grounds.length; r++) {
            Region ground = new Region();
            ground.getStyleClass().add("lw-table-row");
            int row = r;
            ground.setOnMouseClicked(clicked -> onChoose.accept(row));
            add(ground, 0, r + 1, Math.max(1, header.size()), 1);
            grounds[r] = ground;
        }
        for (int c = 0; c < header.size(); c++) {
            ColumnConstraints column = new ColumnConstraints();
            column.setHalignment(c < nameColumns ? HPos.LEFT : HPos.RIGHT);
            column.setHgrow(Priority.ALWAYS);
            if (c >= nameColumns) {
                column.setMinWidth(Region.USE_PREF_SIZE);
            }
            getColumnConstraints().add(column);
            for (int r = 0; r <= rows.size(); r++) {
                Label cell = new Label();
                cell.setMouseTransparent(true);
                cell.getStyleClass().add(r == 0 ? "lw-table-head" : c == 0 ? "lw-table-name" : "lw-table-cell");
                if (c >= nameColumns) {
                    cell.setMinWidth(Region.USE_PREF_SIZE);
                }
                GridPane.setValignment(cell, VPos.CENTER);
                cells[r][c] = cell;
                add(cell, c, r);
            }
        }
    }

    private void dress() {
        for (int r = 0; r < grounds.length; r++) {
            grounds[r].pseudoClassStateChanged(CHOSEN, r == chosen);
        }
        for (int r = 0; r < cells.length; r++) {
            for (int c = 0; c < cells[r].length; c++) {
                cells[r][c].pseudoClassStateChanged(CHOSEN, r > 0 && r - 1 == chosen);
                cells[r][c].getStyleClass().remove("lw-warm");
                if (c == warmColumn) {
                    cells[r][c].getStyleClass().add("lw-warm");
                }
            }
        }
    }

    /** A node in front of a row's name, e.g. a line in the colour of a family. */
    public void mark(int row, Node node) {
        mark(row, 0, node);
    }

    /** A node in a cell, in front of its text, e.g. a bar. */
    public void mark(int row, int column, Node node) {
        cells[row + 1][column].setGraphic(node);
    }

    /** What is shown, as text. */
    public ChartTable table() {
        return new ChartTable(header, rows);
    }

    /** Puts the table on the clipboard, tab-separated. */
    public void copy() {
        ClipboardContent content = new ClipboardContent();
        content.putString(table().tabSeparated());
        Clipboard.getSystemClipboard().setContent(content);
    }
}
