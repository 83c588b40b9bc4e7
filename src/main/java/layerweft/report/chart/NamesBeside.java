package layerweft.report.chart;

import java.awt.Color;
import java.awt.Graphics2D;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;

/** Names in a column, each at the height of what it names or as near as the others leave room, with a leader to it. */
final class NamesBeside {
    private static final double GAP = 3;

    /**
     * A name.
     *
     * @param note in smaller type below; empty for none
     * @param x where the leader ends
     * @param y height of what is named
     */
    record Name(String text, String note, double x, double y, Color colour, boolean strong) {}

    private NamesBeside() {}

    /**
     * Draws the column.
     *
     * @param left where the names begin
     * @param width room for them
     * @param top and bottom: the names stay between
     */
    static void draw(Graphics2D g, List<Name> names, double left, double width, double top, double bottom, Palette palette) {
        List<Name> sorted = new ArrayList<>(names);
        sorted.sort(Comparator.comparingDouble(Name::y));
        double[] heights = sorted.stream().mapToDouble(n -> n.note.isEmpty() ? Axes.LABEL + GAP : 2 * Axes.LABEL + GAP).toArray();
        double[] middles = spread(sorted.stream().mapToDouble(Name::y).toArray(), heights, top, bottom);
        for (int k = 0; k < middles.length; k++) {
            Name name = sorted.get(k);
            double first = name.note.isEmpty() ? middles[k] : middles[k] - 0.5 * Axes.LABEL;
            Marks.line(g, name.x, name.y, left - 4, first, name.colour, 1);
            var font = name.strong ? ChartFonts.semibold(Axes.LABEL) : ChartFonts.regular(Axes.LABEL);
            Marks.left(g, Marks.fitting(g, name.text, font, width), left, first, font, palette.ink());
            if (!name.note.isEmpty()) {
                Marks.left(g, Marks.fitting(g, name.note, ChartFonts.regular(Axes.LABEL), width), left, first + Axes.LABEL, ChartFonts.regular(Axes.LABEL), palette.ink2());
            }
        }
    }

    /** Middles as near as possible to those wished, in the same order, apart by the heights, inside the range where there is room. */
    static double[] spread(double[] wished, double[] heights, double top, double bottom) {
        double[] middles = wished.clone();
        double at = top;
        for (int k = 0; k < middles.length; k++) {
            middles[k] = Math.max(middles[k], at + heights[k] / 2);
            at = middles[k] + heights[k] / 2;
        }
        at = bottom;
        for (int k = middles.length - 1; k >= 0; k--) {
            middles[k] = Math.min(middles[k], at - heights[k] / 2);
            at = middles[k] - heights[k] / 2;
        }
        return middles;
    }
}
