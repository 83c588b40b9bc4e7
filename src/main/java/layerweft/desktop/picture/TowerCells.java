package layerweft.desktop.picture;

import java.util.ArrayList;
import java.util.List;

/** The cells of one layer, from left to right, in units of a full limit. */
final class TowerCells {
    /** More cells of an annual deductible than this are one cell with their number. */
    private static final int KEPT_SHOWN = 3;
    private static final int USED_SHOWN = 6;
    /** Before the open end of unlimited reinstatements. */
    private static final int SHOWN_BEFORE_OPEN = 3;
    private static final double PAPER = 0.0005;

    /** Kinds of cells. */
    enum Kind { KEPT, USED, MORE, OPEN }

    /**
     * A cell.
     *
     * @param size part of a full limit, in (0, 1]
     * @param use of a used cell; NaN where it is not known
     * @param words in place of a use
     */
    record Cell(Kind kind, double size, double use, String words) {}

    private TowerCells() {}

    static List<Cell> of(Tower.Layer layer) {
        List<Cell> cells = new ArrayList<>();
        if (layer.kept() > KEPT_SHOWN) {
            cells.add(new Cell(Kind.KEPT, 1, Double.NaN, TowerText.times(layer.kept())));
        } else {
            for (double rest = layer.kept(); rest > 1e-9; rest--) {
                cells.add(new Cell(Kind.KEPT, Math.min(1, rest), Double.NaN, ""));
            }
        }
        if (layer.limit() == Double.POSITIVE_INFINITY) {
            cells.add(used(1, layer.lossOnLine()));
            return cells;
        }
        boolean open = layer.limits() == Double.POSITIVE_INFINITY;
        int shown = open ? shownBeforeOpen(layer) : (int) Math.min(USED_SHOWN, Math.ceil(layer.limits() - 1e-9));
        for (int k = 0; k < shown; k++) {
            double size = open ? 1 : Math.min(1, layer.limits() - k);
            cells.add(used(size, k < layer.uses().size() ? layer.uses().get(k) / size : Double.NaN));
        }
        if (open) {
            cells.add(new Cell(Kind.OPEN, 1, Double.NaN, "no end"));
        } else if (layer.limits() > USED_SHOWN) {
            cells.add(new Cell(Kind.MORE, 1, Double.NaN, "+ " + TowerText.count(layer.limits() - USED_SHOWN)));
        }
        return cells;
    }

    private static Cell used(double size, double use) {
        return new Cell(Kind.USED, size, use, "");
    }

    private static int shownBeforeOpen(Tower.Layer layer) {
        int shown = 1;
        while (shown < SHOWN_BEFORE_OPEN && shown < layer.uses().size() && layer.uses().get(shown) > PAPER) {
            shown++;
        }
        return shown;
    }

    /** Width of all cells, in full limits. */
    static double size(List<Cell> cells) {
        return cells.stream().mapToDouble(Cell::size).sum();
    }
}
