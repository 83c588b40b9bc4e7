package layerweft.report.chart;

import java.awt.Color;
import java.awt.Graphics2D;
import java.awt.geom.Path2D;
import java.awt.geom.Rectangle2D;
import java.awt.geom.RoundRectangle2D;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Locale;
import layerweft.figures.FigureText;
import layerweft.model.copula.CopulaFamily;
import org.jfree.chart.ChartRenderingInfo;
import org.jfree.chart.axis.NumberAxis;
import org.jfree.chart.plot.XYPlot;
import org.jfree.chart.ui.RectangleEdge;
import org.jfree.chart.ui.RectangleInsets;

/**
 * A figure of one layer against Kendall's τ, family by family. Families that tie the worst years (λ_U above 0) are solid, the others dashed; the warm
 * line is the τ at present.
 *
 * @param lines one for each family
 * @param tau at present
 * @param now the figure at present
 * @param nowText as written
 * @param independent the figure of independent perils, NaN for none
 * @param comonotone the figure of comonotonic perils, NaN for none
 * @param checks simulated points of the chosen family
 * @param dataLow the range that the data leave open; NaN where nothing is known
 * @param pinned the pinned figure, null for none
 * @param low of a band that any dependence keeps to, NaN for no band
 * @param high of the band
 */
public record SensitivityChart(String title, String unit, List<Line> lines, double tau, double now, String nowText, double independent, double comonotone,
        List<Check> checks, double dataLow, double dataHigh, Pinned pinned, double low, double high) implements ChartPicture {
    private static final double FLAG = 30;
    private static final double NAME_ROW = 26;

    /**
     * A family's curve.
     *
     * @param solid whether λ_U is above 0
     * @param chosen whether it is the family at present
     * @param values as shown on the axis, by τ
     */
    public record Line(CopulaFamily family, String name, boolean solid, boolean chosen, List<Double> taus, List<Double> values) {

        double at(double tau) {
            int k = 1;
            while (k < taus.size() - 1 && taus.get(k) < tau) {
                k++;
            }
            if (taus.size() == 1) {
                return values.get(0);
            }
            double w = (tau - taus.get(k - 1)) / (taus.get(k) - taus.get(k - 1));
            return values.get(k - 1) + w * (values.get(k) - values.get(k - 1));
        }
    }

    /** A simulated point with the half width of its 95 % range. */
    public record Check(double tau, double value, double half) {}

    /** What was pinned. */
    public record Pinned(double tau, double value, String text) {}

    public SensitivityChart {
        lines = List.copyOf(lines);
        checks = List.copyOf(checks);
    }

    @Override
    public void draw(Graphics2D g, Rectangle2D area, Palette palette) {
        Marks.smooth(g);
        double[] range = range();
        double leastTau = lines.stream().mapToDouble(l -> l.taus.get(0)).min().orElse(0);
        NumberAxis x = Axes.linear(Math.min(0, leastTau), 1, palette);
        NumberAxis y = Axes.linear(range[0], range[1], palette);
        XYPlot plot = Axes.plot(x, y, palette);
        plot.setDomainGridlinesVisible(false);
        ChartRenderingInfo info = new ChartRenderingInfo();
        Axes.chart(plot, new RectangleInsets(FLAG, 0, 20, 8), palette.surface()).draw(g, area, info);
        Rectangle2D data = info.getPlotInfo().getDataArea();
        Marks.right(g, "Kendall's τ", data.getMaxX(), area.getMaxY() - 8, ChartFonts.regular(12), palette.ink2());
        Scale s = new Scale(data, x, y);
        grounds(g, s, area, palette);
        levels(g, s, palette);
        for (Line line : lines) {
            if (!line.chosen) {
                curve(g, s, line, palette);
            }
        }
        lines.stream().filter(Line::chosen).forEach(line -> curve(g, s, line, palette));
        names(g, s, palette);
        checks(g, s, palette);
        present(g, s, area, palette);
    }

    private record Scale(Rectangle2D data, NumberAxis x, NumberAxis y) {
        double x(double tau) {
            return x.valueToJava2D(tau, data, RectangleEdge.BOTTOM);
        }

        double y(double value) {
            return y.valueToJava2D(value, data, RectangleEdge.LEFT);
        }
    }

    private double[] range() {
        List<Double> all = new ArrayList<>();
        lines.forEach(l -> all.addAll(l.values));
        checks.forEach(c -> all.addAll(List.of(c.value - c.half, c.value + c.half)));
        all.addAll(List.of(independent, comonotone, now, low, high));
        double least = all.stream().filter(Double::isFinite).min(Comparator.naturalOrder()).orElse(0.0);
        double most = all.stream().filter(Double::isFinite).max(Comparator.naturalOrder()).orElse(1.0);
        double room = Math.max(0.09 * (most - least), 0.02 * Math.abs(most) + 1e-12);
        return new double[] {least >= 0 ? Math.max(0, least - room) : least - room, most + room};
    }

    private void grounds(Graphics2D g, Scale s, Rectangle2D area, Palette palette) {
        if (Double.isFinite(dataLow)) {
            g.setColor(palette.tauGround());
            g.fill(new Rectangle2D.Double(s.x(dataLow), s.data.getMinY(), s.x(dataHigh) - s.x(dataLow), s.data.getHeight()));
            Marks.centred(g, "range the data leave open", 0.5 * (s.x(dataLow) + s.x(dataHigh)), area.getMaxY() - 8, ChartFonts.regular(12), palette.tau());
        }
        if (Double.isFinite(low) && Double.isFinite(high)) {
            g.setColor(palette.accentGround());
            g.fill(new Rectangle2D.Double(s.data.getX(), s.y(high), s.data.getWidth(), s.y(low) - s.y(high)));
        }
    }

    private void levels(Graphics2D g, Scale s, Palette palette) {
        level(g, s, independent, "independent ", false, palette);
        level(g, s, comonotone, "comonotone ", true, palette);
    }

    private void level(Graphics2D g, Scale s, double value, String name, boolean above, Palette palette) {
        if (Double.isFinite(value)) {
            Marks.line(g, s.data.getX(), s.y(value), s.data.getMaxX(), s.y(value), palette.ink2(), 1.2, 2, 3);
            String text = name + FigureText.plain(Double.parseDouble(String.format(Locale.ROOT, "%.4g", value)));
            if (above) {
                Marks.left(g, text, s.data.getX() + 8, s.y(value) - 10, ChartFonts.regular(12), palette.ink2());
            } else {
                Marks.right(g, text, s.data.getMaxX() - 8, s.y(value) + 11, ChartFonts.regular(12), palette.ink2());
            }
        }
    }

    private void curve(Graphics2D g, Scale s, Line line, Palette palette) {
        Path2D path = new Path2D.Double();
        boolean begun = false;
        for (int k = 0; k < line.taus.size(); k++) {
            if (Double.isFinite(line.values.get(k))) {
                if (begun) {
                    path.lineTo(s.x(line.taus.get(k)), s.y(line.values.get(k)));
                } else {
                    path.moveTo(s.x(line.taus.get(k)), s.y(line.values.get(k)));
                    begun = true;
                }
            }
        }
        g.setColor(colour(line, palette));
        double width = line.chosen ? 3.2 : 1.8;
        g.setStroke(line.solid ? Marks.stroke(width) : Marks.stroke(width, 7, 4));
        g.draw(path);
    }

    private static Color colour(Line line, Palette palette) {
        return palette.family(line.family);
    }

    /** The higher families are named in the empty upper left, the lower ones in the empty lower right, each with a leader to its curve. */
    private void names(Graphics2D g, Scale s, Palette palette) {
        if (lines.isEmpty()) {
            return;
        }
        double middle = 0.45;
        List<Line> sorted = new ArrayList<>(lines);
        sorted.sort(Comparator.comparingDouble((Line l) -> l.at(middle)).reversed());
        int upper = (sorted.size() + 1) / 2;
        boolean rising = sorted.get(0).at(0.9) >= sorted.get(0).at(0.05);
        double widest = lines.stream().mapToDouble(l -> Marks.width(g, l.name, ChartFonts.semibold(12))).max().orElse(0);
        for (int k = 0; k < sorted.size(); k++) {
            Line line = sorted.get(k);
            boolean above = k < upper;
            int place = above ? k : k - upper;
            int count = above ? upper : sorted.size() - upper;
            double tau = above ? 0.42 - 0.06 * place : 0.50 + 0.06 * (count - 1 - place) * -1 + 0.04;
            double x = above == rising ? s.data.getX() + 12 : s.data.getMaxX() - 12 - widest;
            double y = above ? s.data.getY() + 44 + NAME_ROW * place : s.data.getMaxY() - 44 - NAME_ROW * (count - 1 - place);
            double end = above == rising ? x + Marks.width(g, line.name, ChartFonts.semibold(12)) + 6 : x - 6;
            double cx = s.x(Math.max(line.taus.get(0), tau));
            double cy = s.y(line.at(Math.max(line.taus.get(0), tau)));
            Marks.line(g, end, y, cx, cy, colour(line, palette), 1);
            Marks.disc(g, cx, cy, 2.5, colour(line, palette), colour(line, palette), 1);
            Marks.left(g, line.name, x, y, line.chosen ? ChartFonts.semibold(12) : ChartFonts.regular(12), palette.ink());
        }
    }

    private void checks(Graphics2D g, Scale s, Palette palette) {
        for (Check check : checks) {
            double x = s.x(check.tau);
            Marks.line(g, x, s.y(check.value - check.half), x, s.y(check.value + check.half), palette.ink(), 1.4);
            for (double end : new double[] {check.value - check.half, check.value + check.half}) {
                Marks.line(g, x - 3, s.y(end), x + 3, s.y(end), palette.ink(), 1.4);
            }
            Marks.disc(g, x, s.y(check.value), 3, palette.sunken(), palette.ink(), 1.4);
        }
        if (!checks.isEmpty()) {
            Marks.right(g, "circles: simulation with 95 % bars", s.data.getMaxX() - 8, s.data.getY() + 12, ChartFonts.regular(12), palette.ink2());
        }
    }

    private void present(Graphics2D g, Scale s, Rectangle2D area, Palette palette) {
        if (pinned != null && Double.isFinite(pinned.value)) {
            Marks.disc(g, s.x(pinned.tau), s.y(pinned.value), Marks.RING, palette.surface(), palette.ink(), 1.6);
            Marks.left(g, "pinned " + pinned.text, s.x(pinned.tau) + 8, s.y(pinned.value) + 14, ChartFonts.regular(12), palette.ink2());
        }
        double x = s.x(tau);
        Marks.line(g, x, s.data.getMinY(), x, s.data.getMaxY(), palette.tau(), 1.4);
        if (Double.isFinite(now)) {
            Marks.disc(g, x, s.y(now), Marks.RING + 0.5, palette.tau(), palette.surface(), 1.6);
        }
        double width = Marks.width(g, nowText, ChartFonts.semibold(13)) + 16;
        double left = Math.max(area.getX(), Math.min(area.getMaxX() - width, x - width / 2));
        g.setColor(palette.tau());
        g.fill(new RoundRectangle2D.Double(left, s.data.getMinY() - 24, width, 21, 6, 6));
        Marks.centred(g, nowText, left + width / 2, s.data.getMinY() - 13.5, ChartFonts.semibold(13), palette.surface());
    }

    @Override
    public ChartTable table() {
        List<String> header = new ArrayList<>(List.of("τ"));
        lines.forEach(l -> header.add(l.name));
        List<List<String>> rows = new ArrayList<>();
        List<Double> taus = lines.stream().flatMap(l -> l.taus.stream()).distinct().sorted().toList();
        for (double t : taus) {
            List<String> row = new ArrayList<>(List.of(FigureText.plain(t)));
            lines.forEach(l -> row.add(l.taus.contains(t) ? Double.toString(l.values.get(l.taus.indexOf(t))) : ""));
            rows.add(row);
        }
        return new ChartTable(header, rows);
    }
}
