package layerweft.report.chart;

import java.awt.Color;
import java.awt.Graphics2D;
import java.awt.geom.Rectangle2D;
import java.util.List;

/**
 * What moves a figure most: bars from the figure at one end of an assumption to the figure at the other, about the figure as it is, widest first.
 *
 * @param base the figure as it is
 * @param baseText as written
 */
public record RankingChart(String title, double base, String baseText, List<Bar> bars) implements ChartPicture {
    private static final double WORDS = 168;
    private static final double VALUES = 58;
    private static final double HEAD = 30;

    /**
     * A bar.
     *
     * @param note below the name
     * @param peril position of the peril for its colour; −1 for what is due to dependence; −2 for the family
     */
    public record Bar(String name, String note, int peril, double low, double high, String lowText, String highText) {}

    public RankingChart {
        bars = List.copyOf(bars);
    }

    @Override
    public void draw(Graphics2D g, Rectangle2D area, Palette palette) {
        Marks.smooth(g);
        g.setColor(palette.surface());
        g.fill(area);
        double least = Math.min(base, bars.stream().mapToDouble(Bar::low).filter(Double::isFinite).min().orElse(base));
        double most = Math.max(base, bars.stream().mapToDouble(Bar::high).filter(Double::isFinite).max().orElse(base));
        double left = area.getX() + Math.min(WORDS, 0.4 * area.getWidth()) + VALUES;
        double right = area.getMaxX() - VALUES;
        double scale = most > least ? (right - left) / (most - least) : 0;
        double row = Math.min(50, (area.getHeight() - HEAD) / Math.max(1, bars.size()));
        double middleX = left + scale * (base - least);
        for (int k = 0; k < bars.size(); k++) {
            Bar bar = bars.get(k);
            double middle = area.getY() + HEAD + (k + 0.5) * row;
            double room = left - VALUES - area.getX() - 8;
            boolean notes = row >= 30;
            Marks.left(g, Marks.fitting(g, bar.name, ChartFonts.semibold(13), room), area.getX(), notes ? middle - 8 : middle, ChartFonts.semibold(13), palette.ink());
            if (notes) {
                Marks.left(g, Marks.fitting(g, bar.note, ChartFonts.regular(12), room), area.getX(), middle + 8, ChartFonts.regular(12), palette.ink2());
            }
            double from = left + scale * (bar.low - least);
            double to = left + scale * (bar.high - least);
            double height = Math.min(20, 0.45 * row);
            g.setColor(colour(bar, palette));
            g.fill(new Rectangle2D.Double(from, middle - height / 2, Math.max(1.5, to - from), height));
            Marks.right(g, bar.lowText, from - 6, middle, ChartFonts.regular(12), palette.ink2());
            Marks.left(g, bar.highText, Math.max(to, from + 1.5) + 6, middle, ChartFonts.regular(12), palette.ink2());
            if (k + 1 < bars.size()) {
                Marks.line(g, area.getX(), middle + row / 2, area.getMaxX(), middle + row / 2, palette.line(), 1);
            }
        }
        Marks.line(g, middleX, area.getY() + HEAD - 6, middleX, area.getY() + HEAD + bars.size() * row, palette.tau(), 1.4);
        Marks.centred(g, baseText, Math.max(left, Math.min(right, middleX)), area.getY() + 12, ChartFonts.semibold(13), palette.tau());
    }

    private static Color colour(Bar bar, Palette palette) {
        return bar.peril == -1 ? palette.tau() : bar.peril < 0 ? palette.edge() : palette.peril(bar.peril);
    }

    @Override
    public ChartTable table() {
        return new ChartTable(List.of("assumption", "range", "low", "high"),
                bars.stream().map(b -> List.of(b.name, b.note, Double.toString(b.low), Double.toString(b.high))).toList());
    }
}
