package layerweft.report.chart;

import java.awt.Color;
import java.awt.Graphics2D;
import java.awt.geom.Area;
import java.awt.geom.Path2D;
import java.awt.geom.Rectangle2D;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.SortedMap;
import layerweft.figures.Figure;
import layerweft.figures.FigureText;
import org.jfree.chart.ChartRenderingInfo;
import org.jfree.chart.JFreeChart;
import org.jfree.chart.axis.LogAxis;
import org.jfree.chart.axis.NumberAxis;
import org.jfree.chart.plot.XYPlot;
import org.jfree.chart.ui.RectangleEdge;
import org.jfree.chart.ui.RectangleInsets;

/**
 * Gross and net losses by return period on a logarithmic axis: year totals solid, largest events dashed, gross in ink, net in blue; what the programme
 * takes is shaded.
 *
 * @param money the unit of amounts, for the axis
 * @param lines to draw, of the four
 * @param markAt return period whose amounts are written at the lines; 0 for none
 */
public record ExceedanceChart(String title, String money, List<Line> lines, double markAt) implements ChartPicture {
    private static final double NAMES = 118;
    private static final double LOWEST_PERIOD = 1;

    /**
     * One curve.
     *
     * @param name beside its end
     * @param note below the name
     * @param gross whether it is in ink, else in blue
     * @param dashed for largest events
     * @param amounts by return period
     */
    public record Line(String name, String note, boolean gross, boolean dashed, SortedMap<Double, Figure> amounts) {}

    public ExceedanceChart {
        lines = List.copyOf(lines);
    }

    private Color colour(Line line, Palette palette) {
        return line.gross ? palette.ink() : palette.categories().get(0);
    }

    private double most() {
        double most = lines.stream().flatMap(l -> l.amounts.values().stream()).mapToDouble(Figure::value).filter(Double::isFinite).max().orElse(1);
        return most > 0 ? most * 1.04 : 1;
    }

    private double longest() {
        return lines.stream().mapToDouble(l -> l.amounts.lastKey()).max().orElse(1000);
    }

    @Override
    public void draw(Graphics2D g, Rectangle2D area, Palette palette) {
        Marks.smooth(g);
        LogAxis x = Axes.logarithmic(LOWEST_PERIOD, longest(), palette);
        NumberAxis y = Axes.linear(0, most(), palette);
        XYPlot plot = Axes.plot(x, y, palette);
        JFreeChart chart = Axes.chart(plot, new RectangleInsets(20, 0, 20, NAMES), palette.surface());
        ChartRenderingInfo info = new ChartRenderingInfo();
        chart.draw(g, area, info);
        Rectangle2D data = info.getPlotInfo().getDataArea();
        Marks.left(g, money, area.getX(), area.getY() + 8, ChartFonts.regular(Axes.LABEL), palette.ink2());
        Marks.right(g, "return period in years", data.getMaxX(), area.getMaxY() - 8, ChartFonts.regular(Axes.LABEL), palette.ink2());
        shade(g, data, x, y, palette);
        List<NamesBeside.Name> names = new ArrayList<>();
        for (Line line : lines) {
            Path2D path = path(line, data, x, y);
            if (path == null) {
                continue;
            }
            g.setColor(colour(line, palette));
            g.setStroke(line.dashed ? Marks.stroke(1.6, 6, 4) : Marks.stroke(2.4));
            g.draw(path);
            names.add(new NamesBeside.Name(line.name, line.note, data.getMaxX(), path.getCurrentPoint().getY(), colour(line, palette), !line.dashed));
        }
        mark(g, data, x, y, palette);
        NamesBeside.draw(g, names, data.getMaxX() + 14, NAMES - 16, data.getMinY() - 6, data.getMaxY() + 6, palette);
    }

    private static Path2D path(Line line, Rectangle2D data, LogAxis x, NumberAxis y) {
        Path2D path = null;
        for (Map.Entry<Double, Figure> at : line.amounts.entrySet()) {
            if (at.getKey() < LOWEST_PERIOD || !Double.isFinite(at.getValue().value())) {
                continue;
            }
            double px = x.valueToJava2D(at.getKey(), data, RectangleEdge.BOTTOM);
            double py = y.valueToJava2D(at.getValue().value(), data, RectangleEdge.LEFT);
            if (path == null) {
                path = new Path2D.Double();
                path.moveTo(px, py);
            } else {
                path.lineTo(px, py);
            }
        }
        return path;
    }

    /** Between gross and net of the year's total. */
    private void shade(Graphics2D g, Rectangle2D data, LogAxis x, NumberAxis y, Palette palette) {
        Line gross = lines.stream().filter(l -> l.gross && !l.dashed).findFirst().orElse(null);
        Line net = lines.stream().filter(l -> !l.gross && !l.dashed).findFirst().orElse(null);
        if (gross == null || net == null) {
            return;
        }
        Area between = new Area(closed(path(gross, data, x, y), data));
        between.subtract(new Area(closed(path(net, data, x, y), data)));
        g.setColor(palette.accentGround());
        g.fill(between);
        Marks.left(g, "shaded: what the programme takes", data.getX() + 12, data.getY() + 14, ChartFonts.regular(Axes.LABEL), palette.ink2());
    }

    private static Path2D closed(Path2D path, Rectangle2D data) {
        Path2D closed = new Path2D.Double(path);
        closed.lineTo(data.getMaxX(), data.getMaxY());
        closed.lineTo(data.getX(), data.getMaxY());
        closed.closePath();
        return closed;
    }

    private void mark(Graphics2D g, Rectangle2D data, LogAxis x, NumberAxis y, Palette palette) {
        if (markAt <= LOWEST_PERIOD) {
            return;
        }
        double px = x.valueToJava2D(markAt, data, RectangleEdge.BOTTOM);
        Marks.line(g, px, data.getMinY(), px, data.getMaxY(), palette.ink2(), 1, 2, 3);
        for (Line line : lines) {
            Figure amount = line.amounts.get(markAt);
            if (!line.dashed && amount != null && Double.isFinite(amount.value())) {
                double py = y.valueToJava2D(amount.value(), data, RectangleEdge.LEFT);
                Marks.disc(g, px, py, 3.5, colour(line, palette), palette.surface(), 1.5);
                if (line.gross) {
                    Marks.right(g, FigureText.value(amount), px - 8, py - 10, ChartFonts.semibold(Axes.LABEL), palette.ink());
                } else {
                    Marks.left(g, FigureText.value(amount), px + 8, py + 12, ChartFonts.semibold(Axes.LABEL), palette.ink());
                }
            }
        }
    }

    @Override
    public ChartTable table() {
        List<String> header = new ArrayList<>(List.of("return period in years"));
        lines.forEach(l -> {
            header.add(l.name + ", " + l.note);
            header.add("error");
        });
        List<List<String>> rows = new ArrayList<>();
        for (double years : lines.isEmpty() ? List.<Double>of() : List.copyOf(lines.get(0).amounts.keySet())) {
            List<String> row = new ArrayList<>(List.of(FigureText.plain(years)));
            lines.forEach(l -> {
                Figure f = l.amounts.getOrDefault(years, Figure.UNDEFINED);
                row.add(Double.toString(f.value()));
                row.add(Double.toString(f.error()));
            });
            rows.add(row);
        }
        return new ChartTable(header, rows);
    }
}
