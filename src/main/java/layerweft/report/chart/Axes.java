package layerweft.report.chart;

import java.awt.BasicStroke;
import java.awt.Color;
import java.awt.Graphics2D;
import java.awt.geom.Rectangle2D;
import java.text.DecimalFormat;
import java.text.DecimalFormatSymbols;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import org.jfree.chart.JFreeChart;
import org.jfree.chart.axis.AxisState;
import org.jfree.chart.axis.LogAxis;
import org.jfree.chart.axis.NumberAxis;
import org.jfree.chart.axis.NumberTick;
import org.jfree.chart.axis.NumberTickUnit;
import org.jfree.chart.axis.ValueAxis;
import org.jfree.chart.plot.XYPlot;
import org.jfree.chart.ui.RectangleEdge;
import org.jfree.chart.ui.RectangleInsets;
import org.jfree.chart.ui.TextAnchor;

/** Axes and grounds of all plots: hairline grids, at most seven lines, labels in the second ink. */
final class Axes {
    /** Size of labels. */
    static final double LABEL = 12;
    private static final int MOST_LINES = 7;
    private static final double[] STEPS = {1, 2, 5};

    private Axes() {}

    /** A linear axis over a range. */
    static NumberAxis linear(double from, double to, Palette palette) {
        NumberAxis axis = new NumberAxis();
        axis.setAutoRange(false);
        axis.setRange(from, to);
        double step = step(to - from);
        axis.setTickUnit(new NumberTickUnit(step, new DecimalFormat(pattern(step), DecimalFormatSymbols.getInstance(Locale.ROOT))));
        return dress(axis, palette);
    }

    /** A logarithmic axis over a range, with lines at 1, 2 and 5, or at powers of ten where that is too many. */
    static LogAxis logarithmic(double from, double to, Palette palette) {
        LogAxis axis = new OneTwoFive();
        axis.setAutoRange(false);
        axis.setRange(from, to);
        return dress(axis, palette);
    }

    private static <A extends ValueAxis> A dress(A axis, Palette palette) {
        axis.setTickLabelFont(ChartFonts.regular(LABEL));
        axis.setTickLabelPaint(palette.ink2());
        axis.setAxisLineVisible(false);
        axis.setTickMarksVisible(false);
        axis.setMinorTickMarksVisible(false);
        return axis;
    }

    /** The distance of lines: 1, 2 or 5 times a power of ten, at most seven lines. */
    static double step(double range) {
        double power = Math.pow(10, Math.floor(Math.log10(range / MOST_LINES)));
        for (double factor : new double[] {1, 2, 5, 10}) {
            if (range / (power * factor) <= MOST_LINES) {
                return power * factor;
            }
        }
        return power * 10;
    }

    private static String pattern(double step) {
        int places = (int) Math.max(0, -Math.floor(Math.log10(step) + 1e-9));
        return places == 0 ? "#,##0" : "0." + "0".repeat(places);
    }

    /** A number on an axis: grouped, without needless zeros. */
    static String number(double value) {
        return new DecimalFormat("#,##0.######", DecimalFormatSymbols.getInstance(Locale.ROOT)).format(value);
    }

    /** A plot on its sunken ground. */
    static XYPlot plot(ValueAxis x, ValueAxis y, Palette palette) {
        XYPlot plot = new XYPlot();
        plot.setDomainAxis(x);
        plot.setRangeAxis(y);
        plot.setBackgroundPaint(palette.sunken());
        plot.setOutlineVisible(false);
        plot.setDomainGridlinePaint(palette.grid());
        plot.setRangeGridlinePaint(palette.grid());
        plot.setDomainGridlineStroke(new BasicStroke(1));
        plot.setRangeGridlineStroke(new BasicStroke(1));
        plot.setAxisOffset(new RectangleInsets(2, 2, 2, 2));
        plot.setInsets(RectangleInsets.ZERO_INSETS);
        return plot;
    }

    /** A chart without title and legend, with room around the plot. */
    static JFreeChart chart(XYPlot plot, RectangleInsets room, Color ground) {
        JFreeChart chart = new JFreeChart(null, null, plot, false);
        chart.setBackgroundPaint(ground);
        chart.setPadding(room);
        chart.setAntiAlias(true);
        chart.setTextAntiAlias(true);
        return chart;
    }

    /** Lines at 1, 2, 5, 10, … */
    private static final class OneTwoFive extends LogAxis {
        private static final long serialVersionUID = 1L;

        @Override
        @SuppressWarnings({"rawtypes", "unchecked"}) // the library's own signature
        public List refreshTicks(Graphics2D g, AxisState state, Rectangle2D area, RectangleEdge edge) {
            List<Double> all = new ArrayList<>();
            for (int decade = (int) Math.floor(Math.log10(getLowerBound())); decade <= Math.ceil(Math.log10(getUpperBound())); decade++) {
                for (double factor : STEPS) {
                    double value = Double.parseDouble(String.format(Locale.ROOT, "%.6g", factor * Math.pow(10, decade)));
                    if (value >= getLowerBound() * (1 - 1e-9) && value <= getUpperBound() * (1 + 1e-9)) {
                        all.add(value);
                    }
                }
            }
            boolean many = all.size() > (RectangleEdge.isTopOrBottom(edge) ? area.getWidth() / 45 : area.getHeight() / 30) || all.size() > 10;
            List ticks = new ArrayList();
            TextAnchor anchor = RectangleEdge.isTopOrBottom(edge) ? TextAnchor.TOP_CENTER : TextAnchor.CENTER_RIGHT;
            for (double value : all) {
                double leading = value / Math.pow(10, Math.floor(Math.log10(value) + 1e-9));
                if (!many || leading < 1.5) {
                    ticks.add(new NumberTick(value, number(value), anchor, TextAnchor.CENTER, 0));
                }
            }
            return ticks;
        }
    }
}
