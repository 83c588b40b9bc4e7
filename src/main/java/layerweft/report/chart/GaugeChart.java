package layerweft.report.chart;

import java.awt.Graphics2D;
import java.awt.Shape;
import java.awt.geom.Path2D;
import java.awt.geom.Rectangle2D;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import layerweft.figures.FigureText;

/**
 * Everything any dependence could do to a figure, on a scale of its own: filled where a joint law reaches it, dashed where none goes beyond, ticks at the
 * lowest, the comonotone and the highest, and a funnel to the range of the families beside it.
 *
 * @param reason why there are no bounds, in words; empty where there are
 * @param lowest proven lower bound
 * @param attainedLow lowest value that a joint law is known to reach
 * @param comonotone with comonotonic annual losses; NaN for none
 * @param attainedHigh highest value that a joint law is known to reach
 * @param highest proven upper bound
 * @param now the figure at present
 * @param familiesLow least value on the axis beside
 * @param familiesHigh largest value on the axis beside
 */
public record GaugeChart(String reason, double lowest, double attainedLow, double comonotone, double attainedHigh, double highest, double now,
        double familiesLow, double familiesHigh) implements ChartPicture {
    private static final double BAR_LEFT = 46;
    private static final double BAR_WIDTH = 28;
    private static final double TOP = 26;
    private static final double BOTTOM = 44;

    @Override
    public String title() {
        return "What any dependence could do";
    }

    @Override
    public void draw(Graphics2D g, Rectangle2D area, Palette palette) {
        Marks.smooth(g);
        g.setColor(palette.surface());
        g.fill(area);
        Marks.left(g, "any dependence", area.getX(), area.getY() + 8, ChartFonts.regular(12), palette.ink2());
        Rectangle2D bar = new Rectangle2D.Double(area.getX() + BAR_LEFT, area.getY() + TOP, BAR_WIDTH, area.getHeight() - TOP - BOTTOM);
        if (!reason.isEmpty()) {
            hatched(g, bar, palette);
            words(g, "no bounds: " + reason, area, bar.getMaxY() + 12, palette);
            return;
        }
        double most = Math.max(highest, familiesHigh);
        double step = Axes.step(Math.max(most, 1e-12));
        double top = Math.ceil(most / step - 1e-9) * step;
        for (double v = 0; v <= top + step / 2; v += step) {
            double y = y(bar, v, top);
            Marks.line(g, bar.getX() - 5, y, bar.getMaxX(), y, palette.grid(), 1);
            Marks.right(g, Axes.number(Double.parseDouble(String.format(Locale.ROOT, "%.6g", v))), bar.getX() - 8, y, ChartFonts.regular(12), palette.ink2());
        }
        g.setColor(palette.edge());
        g.setStroke(Marks.stroke(1.2, 4, 3));
        g.draw(new Rectangle2D.Double(bar.getX(), y(bar, highest, top), BAR_WIDTH, y(bar, lowest, top) - y(bar, highest, top)));
        g.setColor(palette.accentGround());
        g.fill(new Rectangle2D.Double(bar.getX(), y(bar, attainedHigh, top), BAR_WIDTH, Math.max(1, y(bar, attainedLow, top) - y(bar, attainedHigh, top))));
        double upper = y(bar, familiesHigh, top);
        double lower = y(bar, Math.max(0, familiesLow), top);
        g.setColor(palette.steps().get(2));
        g.fill(new Rectangle2D.Double(bar.getX(), upper, BAR_WIDTH, Math.max(2, lower - upper)));
        Path2D funnel = new Path2D.Double();
        funnel.moveTo(bar.getMaxX(), upper);
        funnel.lineTo(area.getMaxX(), area.getY() + TOP);
        funnel.lineTo(area.getMaxX(), bar.getMaxY());
        funnel.lineTo(bar.getMaxX(), lower);
        funnel.closePath();
        g.setColor(palette.sunken());
        g.fill(funnel);
        ticks(g, bar, top, palette);
        double y = y(bar, now, top);
        Marks.line(g, bar.getX() - 3, y, bar.getMaxX() + 3, y, palette.tau(), 2.4);
        words(g, "filled: reached; dashed: not beyond " + text(lowest) + " to " + text(highest), area, bar.getMaxY() + 14, palette);
    }

    private void ticks(Graphics2D g, Rectangle2D bar, double top, Palette palette) {
        List<Double> values = new ArrayList<>(List.of(attainedHigh, attainedLow));
        if (Double.isFinite(comonotone)) {
            values.add(comonotone);
        }
        values.sort((a, b) -> Double.compare(b, a));
        double[] heights = new double[values.size()];
        Arrays.fill(heights, 15);
        double[] at = NamesBeside.spread(values.stream().mapToDouble(v -> y(bar, v, top)).toArray(), heights, bar.getMinY() - 6, bar.getMaxY() + 6);
        for (int k = 0; k < at.length; k++) {
            double y = y(bar, values.get(k), top);
            Marks.line(g, bar.getX(), y, bar.getMaxX(), y, palette.ink(), 1.6);
            Marks.left(g, text(values.get(k)), bar.getMaxX() + 6, at[k], ChartFonts.regular(12), palette.ink());
        }
    }

    private static String text(double value) {
        return FigureText.plain(Double.parseDouble(String.format(Locale.ROOT, "%.3g", value)));
    }

    private static double y(Rectangle2D bar, double value, double top) {
        return bar.getMaxY() - bar.getHeight() * Math.max(0, Math.min(1, value / top));
    }

    private static void hatched(Graphics2D g, Rectangle2D bar, Palette palette) {
        Shape clip = g.getClip();
        g.clip(bar);
        for (double y = bar.getMinY(); y < bar.getMaxY() + bar.getWidth(); y += 7) {
            Marks.line(g, bar.getX(), y, bar.getMaxX(), y - bar.getWidth(), palette.line(), 1);
        }
        g.setClip(clip);
        g.setColor(palette.edge());
        g.setStroke(Marks.stroke(1));
        g.draw(bar);
    }

    private static void words(Graphics2D g, String text, Rectangle2D area, double y, Palette palette) {
        StringBuilder line = new StringBuilder();
        double at = y;
        for (String word : text.split(" ")) {
            String longer = line.isEmpty() ? word : line + " " + word;
            if (Marks.width(g, longer, ChartFonts.regular(12)) > area.getWidth() - 4 && !line.isEmpty()) {
                Marks.left(g, line.toString(), area.getX(), at, ChartFonts.regular(12), palette.ink2());
                at += 14;
                line = new StringBuilder(word);
            } else {
                line = new StringBuilder(longer);
            }
        }
        Marks.left(g, line.toString(), area.getX(), at, ChartFonts.regular(12), palette.ink2());
    }

    @Override
    public ChartTable table() {
        return new ChartTable(List.of("bound", "value"), List.of(List.of("lowest", Double.toString(lowest)), List.of("reached low", Double.toString(attainedLow)),
                List.of("comonotone", Double.toString(comonotone)), List.of("reached high", Double.toString(attainedHigh)), List.of("highest", Double.toString(highest))));
    }
}
