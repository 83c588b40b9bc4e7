package layerweft.desktop.picture;

import static layerweft.desktop.picture.Picture.Anchor.LEFT;
import static layerweft.desktop.picture.Picture.Anchor.MIDDLE;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.stream.Collectors;
import javafx.scene.shape.Polyline;
import javafx.scene.text.Text;
import layerweft.figures.FigureText;
import layerweft.report.chart.Palette;

/** Names beside the blocks, the headings above and the legend below. */
final class TowerLabels {
    private static final double TWO_LINES = 34;
    private static final double ONE_LINE = 17;
    private static final double LEAST_NAME = 36;
    private static final double STEP_WIDTH = 30;
    private static final double KEPT_LEGEND = 140;
    private static final double LEAST_LEGEND = 270;

    private TowerLabels() {}

    static void paint(TowerSheet s) {
        int lanes = s.layout().blocks().stream().mapToInt(b -> b.lane() + 1).max().orElse(0);
        for (int lane = 0; lane < lanes; lane++) {
            int now = lane;
            names(s, s.layout().blocks().stream().filter(b -> b.lane() == now).sorted(Comparator.comparingDouble(b -> -b.middle())).toList());
        }
        headings(s, lanes);
        legend(s);
    }

    /** From the lowest up; a name that would cover the one below moves up, with a leader to its block. */
    private static void names(TowerSheet s, List<TowerLayout.Block> upward) {
        double free = s.layout().scale().bottom() + 14;
        for (TowerLayout.Block block : upward) {
            boolean two = block.height() >= TWO_LINES;
            double high = two ? TWO_LINES : ONE_LINE;
            double middle = Math.min(block.middle(), free - high / 2);
            free = middle - high / 2;
            boolean led = block.height() < TowerLayout.SMALL || Math.abs(middle - block.middle()) > 1;
            double beside = middle;
            double clear = led ? upward.stream().filter(b -> b.top() < beside + ONE_LINE / 2 && b.bottom() > beside - ONE_LINE / 2).mapToDouble(TowerLayout.Block::right)
                    .reduce(block.right(), Math::max) : block.right();
            double x = clear + (led ? 24 : 10);
            if (led) {
                Polyline leader = new Polyline(block.right() + 3, block.middle(), clear + 10, block.middle(), clear + 14, middle, clear + 20, middle);
                leader.setStroke(s.colours().ink2());
                leader.setMouseTransparent(true);
                s.add(leader);
            }
            Tower.Layer layer = s.layer(block);
            double room = block.labelWidth() - (x - block.right() - 10);
            if (two) {
                s.add(Picture.at(Picture.within(Picture.text(layer.name(), 13.5, true, s.colours().ink()), room), x, middle - 3, LEFT));
                s.add(Picture.at(Picture.within(Picture.text(layer.terms(), 12, false, s.colours().ink2()), room), x, middle + 14, LEFT));
            } else {
                oneLine(s, block, layer, x, middle + 4.5, room);
            }
        }
    }

    /** Beside a low block its numbers come first; where they do not fit, their sum, the loss on line, and the hover text has the rest. */
    private static void oneLine(TowerSheet s, TowerLayout.Block block, Tower.Layer layer, double x, double baseline, double room) {
        double left = x;
        boolean low = block.height() < TowerLayout.SMALL;
        if (low) {
            Text numbers = Picture.text(TowerCells.of(layer).stream().filter(c -> c.kind() == TowerCells.Kind.USED).map(c -> TowerText.number(c.use()))
                    .collect(Collectors.joining(" · ")) + "\u2009%", 13.5, true, s.colours().ink());
            if (Picture.widthOf(numbers) > room) {
                numbers.setText(TowerText.part(layer.lossOnLine()));
            }
            s.add(Picture.at(numbers, left, baseline, LEFT));
            left += Picture.widthOf(numbers) + 8;
        }
        double rest = room - (left - x);
        if (rest < LEAST_NAME) {
            return;
        }
        Text name = Picture.within(Picture.text(layer.name(), 13.5, !low, s.colours().ink()), rest);
        s.add(Picture.at(name, left, baseline, LEFT));
        Text more = Picture.text(block.toScale() ? layer.terms() : "not to scale", 12, false, s.colours().ink2());
        if (Picture.widthOf(name) + 8 + Picture.widthOf(more) <= rest) {
            s.add(Picture.at(more, left + Picture.widthOf(name) + 8, baseline, LEFT));
        }
    }

    private static void headings(TowerSheet s, int lanes) {
        double top = s.layout().scale().top();
        boolean slanting = s.layout().threads().slanting();
        if (s.layout().threads().size() > 0 && !slanting) {
            s.note("share of its loss by peril,\u2009%", s.layout().threadsLeft(), top - 48, LEFT);
        }
        if (lanes != 1) {
            s.note(lanes == 0 ? "" : "chance-weighted use of each limit in the year", s.layout().cellsLeft(), top - 48, LEFT);
            return;
        }
        double x = s.layout().cellsLeft();
        s.note("chance-weighted use of each limit in the year", x + (slanting ? 64 : 0), top - (slanting ? 36 : 48), LEFT);
        List<List<TowerCells.Cell>> rows = new ArrayList<>(s.layout().blocks().stream().map(b -> TowerCells.of(s.layer(b))).toList());
        int columns = rows.stream().mapToInt(cells -> (int) cells.stream().filter(c -> c.kind() != TowerCells.Kind.MORE && c.kind() != TowerCells.Kind.OPEN).count()).max().orElse(0);
        boolean whole = rows.stream().allMatch(cells -> cells.stream().limit(Math.max(0, cells.size() - 1)).allMatch(c -> c.size() == 1));
        for (int k = 0; whole && k < columns; k++) {
            s.note(TowerText.place(k) + (k == 0 && s.layout().pitch() > 52 ? " limit" : ""), x + s.layout().pitch() * (k + 0.5) - 1, top - 16 + (slanting ? 2 : 0), MIDDLE);
        }
    }

    private static void legend(TowerSheet s) {
        double baseline = s.layout().scale().bottom() + 19.5;
        double x = s.layout().cellsLeft();
        if (s.tower().layers().stream().anyMatch(l -> l.kept() > 0 && !l.ofYear())) {
            boolean beside = x + KEPT_LEGEND + LEAST_LEGEND <= s.layout().width();
            double left = beside ? x : s.layout().threadsLeft();
            double below = beside ? 0 : 17;
            TowerBlocks.hatched(s, left, baseline - 11 + below, 14, 12);
            s.note("annual deductible", left + 20, baseline + below, LEFT);
            x += beside ? KEPT_LEGEND : 0;
        }
        int steps = s.colours().steps().size();
        double room = s.layout().width() - x - 86;
        double each = Math.min(STEP_WIDTH, room / steps);
        s.note("loss on line,\u2009%", x, baseline, LEFT);
        x += 84;
        List<Double> edges = Palette.STEP_EDGES;
        for (int k = 0; k < steps; k++) {
            s.add(Picture.box(x + k * each, baseline - 11, each, 12, s.colours().steps().get(k), s.colours().edge()));
            if (k < edges.size()) {
                s.note(FigureText.groupedPlain(AmountScale.tidy(100 * edges.get(k))), x + (k + 1) * each, baseline + 15, MIDDLE);
            }
        }
    }
}
