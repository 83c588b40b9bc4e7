package layerweft.report.chart;

import java.awt.Color;
import java.awt.Graphics2D;
import java.awt.Shape;
import java.awt.geom.Path2D;
import java.awt.geom.Rectangle2D;
import java.util.ArrayList;
import java.util.List;
import java.util.function.DoubleUnaryOperator;
import layerweft.figures.FigureText;
import org.jfree.chart.ChartRenderingInfo;
import org.jfree.chart.axis.LogAxis;
import org.jfree.chart.plot.XYPlot;
import org.jfree.chart.ui.RectangleEdge;
import org.jfree.chart.ui.RectangleInsets;

/**
 * Events a year above an amount, both on logarithmic axes: one peril in its colour, the others in grey at the same scale.
 *
 * @param perils in the order of the file
 * @param chosen position of the peril in colour
 * @param from least amount shown
 * @param to largest amount shown
 */
public record EventsAboveChart(List<Peril> perils, int chosen, double from, double to) implements ChartPicture {
    private static final int POINTS = 120;
    private static final double RAREST = 0.001;

    /** @param above events a year as a function of the amount; null where it is not known */
    public record Peril(String name, DoubleUnaryOperator above) {}

    public EventsAboveChart {
        perils = List.copyOf(perils);
    }

    @Override
    public String title() {
        return perils.get(chosen).name + ": events a year above an amount";
    }

    private double most() {
        double most = RAREST * 10;
        for (Peril peril : perils) {
            most = peril.above == null ? most : Math.max(most, peril.above.applyAsDouble(from));
        }
        return most * 1.3;
    }

    @Override
    public void draw(Graphics2D g, Rectangle2D area, Palette palette) {
        Marks.smooth(g);
        LogAxis x = Axes.logarithmic(from, to, palette);
        LogAxis y = Axes.logarithmic(RAREST, most(), palette);
        XYPlot plot = Axes.plot(x, y, palette);
        plot.setBackgroundPaint(palette.surface());
        ChartRenderingInfo info = new ChartRenderingInfo();
        Axes.chart(plot, new RectangleInsets(20, 0, 0, 20), palette.surface()).draw(g, area, info);
        Rectangle2D data = info.getPlotInfo().getDataArea();
        Marks.right(g, "events a year above", area.getMaxX() - 6, area.getY() + 8, ChartFonts.regular(Axes.LABEL), palette.ink2());
        Shape clip = g.getClip();
        g.clip(data);
        for (int i = 0; i < perils.size(); i++) {
            if (i != chosen) {
                curve(g, perils.get(i), data, x, y, palette.edge(), 1);
            }
        }
        curve(g, perils.get(chosen), data, x, y, palette.peril(chosen), 2.6);
        g.setClip(clip);
        if (perils.get(chosen).above == null) {
            Marks.centred(g, "—", data.getCenterX(), data.getCenterY(), ChartFonts.semibold(18), palette.ink2());
        }
    }

    private void curve(Graphics2D g, Peril peril, Rectangle2D data, LogAxis x, LogAxis y, Color colour, double width) {
        if (peril.above == null) {
            return;
        }
        Path2D path = new Path2D.Double();
        for (int k = 0; k <= POINTS; k++) {
            double amount = from * Math.pow(to / from, (double) k / POINTS);
            double events = Math.max(RAREST / 10, peril.above.applyAsDouble(amount));
            double px = x.valueToJava2D(amount, data, RectangleEdge.BOTTOM);
            double py = y.valueToJava2D(events, data, RectangleEdge.LEFT);
            if (k == 0) {
                path.moveTo(px, py);
            } else {
                path.lineTo(px, py);
            }
        }
        g.setColor(colour);
        g.setStroke(Marks.stroke(width));
        g.draw(path);
    }

    @Override
    public ChartTable table() {
        List<String> header = new ArrayList<>(List.of("amount"));
        perils.forEach(p -> header.add(p.name));
        List<List<String>> rows = new ArrayList<>();
        for (int k = 0; k <= POINTS; k += 4) {
            double amount = from * Math.pow(to / from, (double) k / POINTS);
            List<String> row = new ArrayList<>(List.of(FigureText.plain(amount)));
            perils.forEach(p -> row.add(p.above == null ? "" : Double.toString(p.above.applyAsDouble(amount))));
            rows.add(row);
        }
        return new ChartTable(header, rows);
    }
}
