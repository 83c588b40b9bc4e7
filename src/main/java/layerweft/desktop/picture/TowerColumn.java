package layerweft.desktop.picture;

import static layerweft.desktop.picture.Picture.Anchor.MIDDLE;
import static layerweft.desktop.picture.Picture.Anchor.RIGHT;
import static layerweft.desktop.picture.Picture.box;
import static layerweft.desktop.picture.Picture.line;

import java.util.List;
import javafx.scene.paint.Color;
import javafx.scene.shape.Circle;
import javafx.scene.shape.Polyline;
import javafx.scene.text.Text;

/** The right of a tower: covers of the year's total on the same scale, and the spines that join layers with what is recovered before them. */
final class TowerColumn {
    private static final double ARM = 8;
    /** Room that a name is likely to take. */
    private static final double NAME = 110;

    private TowerColumn() {}

    static void paint(TowerSheet s) {
        TowerLayout layout = s.layout();
        if (!Double.isNaN(layout.columnLeft())) {
            AmountScale scale = layout.scale();
            s.note("year total left over", layout.width(), scale.top() - 16, RIGHT);
            s.add(box(layout.columnLeft(), scale.top(), TowerLayout.COLUMN_WIDTH, scale.bottom() - scale.top(), s.colours().sunken(), s.colours().line()));
            layout.covers().forEach(cover -> cover(s, cover));
        }
        spines(s);
    }

    private static void cover(TowerSheet s, TowerLayout.Block block) {
        Tower.Layer layer = s.layer(block);
        double rate = layer.lossOnLine();
        Color fill = Double.isNaN(rate) ? s.colours().sunken() : s.colours().lossOnLine(rate);
        s.add(box(block.left(), block.top(), block.right() - block.left(), block.height(), fill, s.colours().edge()));
        double middle = (block.left() + block.right()) / 2;
        Color on = Double.isNaN(rate) ? s.colours().ink2() : PictureColours.textOn(fill);
        boolean roomy = block.height() >= 40;
        if (block.height() >= TowerLayout.SMALL) {
            s.words(TowerText.part(rate), 15, true, on, middle, block.middle() + (roomy ? -1 : 5), MIDDLE);
        }
        if (roomy) {
            s.add(Picture.at(Picture.within(Picture.text(TowerText.terms(layer.limit(), layer.retention()), 12, false, on), block.labelWidth() - 6), middle,
                    block.middle() + 15, MIDDLE));
        }
        String name = block.height() < TowerLayout.SMALL ? TowerText.part(rate) + " " + layer.name() : layer.name();
        List<Text> lines = wrapped(name, block.labelWidth(), s.colours().ink());
        boolean above = block.top() - 16.0 * lines.size() > s.layout().scale().top();
        for (int k = 0; k < lines.size(); k++) {
            double baseline = above ? block.top() - 9 - 16.0 * (lines.size() - 1 - k) : block.bottom() + 18 + 16.0 * k;
            s.add(Picture.at(lines.get(k), middle, baseline, MIDDLE));
        }
    }

    /** Two lines at most, the second cut if it must be. */
    private static List<Text> wrapped(String name, double width, Color ink) {
        Text whole = Picture.text(name, 13.5, true, ink);
        String[] words = name.split(" ");
        if (Picture.widthOf(whole) <= width || words.length == 1) {
            return List.of(Picture.within(whole, width));
        }
        int taken = words.length - 1;
        Text first = Picture.text(String.join(" ", List.of(words).subList(0, taken)), 13.5, true, ink);
        while (taken > 1 && Picture.widthOf(first) > width) {
            taken--;
            first = Picture.text(String.join(" ", List.of(words).subList(0, taken)), 13.5, true, ink);
        }
        Text second = Picture.text(String.join(" ", List.of(words).subList(taken, words.length)), 13.5, true, ink);
        return List.of(Picture.within(first, width), Picture.within(second, width));
    }

    /** One spine for each layer that others are recovered before, the first nearest to the column. */
    private static void spines(TowerSheet s) {
        TowerLayout layout = s.layout();
        double right = Double.isNaN(layout.columnLeft()) ? layout.width() - 6 : layout.columnLeft() - 14;
        double highest = Double.POSITIVE_INFINITY;
        int drawn = 0;
        for (TowerLayout.Block target : layout.all()) {
            List<Integer> sources = s.layer(target).recoveredBefore();
            if (sources.isEmpty()) {
                continue;
            }
            double x = Math.round(right - 10 * drawn++) + 0.5;
            Color colour = sources.equals(s.lit()) ? s.colours().accent() : s.colours().ink2();
            double top = target.middle();
            double bottom = target.middle();
            for (int source : sources) {
                TowerLayout.Block from = layout.blockOf(source);
                double y = Math.round(from.middle()) + 0.5;
                s.add(line(x - ARM, y, x, y, colour, 1.3), new Circle(x - ARM, y, 2.6, colour));
                top = Math.min(top, y);
                bottom = Math.max(bottom, y);
            }
            s.add(line(x, top, x, bottom, colour, 1.3));
            arrow(s, target, x, colour);
            highest = Math.min(highest, top);
        }
        if (drawn > 0) {
            double left = right - 108;
            double mid = highest;
            boolean free = layout.blocks().stream().noneMatch(b -> Math.abs(b.middle() - mid) < 30 && b.right() + 10 + NAME > left);
            s.note("recovered before", free ? right - 4 : layout.width(), free ? highest - 10 : layout.scale().top() - 32, RIGHT);
        }
    }

    /** To a cover of the year at the right, or back to a layer of each event at the left. */
    private static void arrow(TowerSheet s, TowerLayout.Block target, double x, Color colour) {
        boolean toRight = s.layer(target).ofYear();
        double y = Math.round(target.middle()) + 0.5;
        double end = toRight ? target.left() - 3 : x - ARM - 4;
        double back = toRight ? -6 : 6;
        Polyline head = new Polyline(end + back, y - 4, end, y, end + back, y + 4);
        head.setStroke(colour);
        head.setStrokeWidth(1.4);
        head.setMouseTransparent(true);
        s.add(line(x, y, end, y, colour, 1.3), head);
    }
}
