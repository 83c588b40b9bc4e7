package layerweft.report.chart;

import java.awt.Color;
import java.awt.Graphics2D;
import java.awt.geom.AffineTransform;
import java.awt.geom.Ellipse2D;
import java.awt.geom.Rectangle2D;
import java.util.ArrayList;
import java.util.List;
import layerweft.study.JointYears;

/**
 * Drawn years of two perils: by return period, which gives the corner of joint bad years a third of the square, or by rank.
 *
 * @param corner return period from which years are bad
 * @param ranks whether the axes are ranks
 */
public record JointYearsChart(String first, String second, JointYears years, double corner, boolean ranks) implements ChartPicture {
    private static final double LEFT = 52;
    private static final double BOTTOM = 38;
    private static final double RAREST = 400;
    private static final List<Double> PERIODS = List.of(1.0, 2.0, 5.0, 10.0, 20.0, 50.0, 100.0, 200.0);
    private static final List<Double> RANKS = List.of(0.0, 0.2, 0.4, 0.6, 0.8, 1.0);

    @Override
    public String title() {
        return "Years of " + first + " and " + second;
    }

    /** The square of years inside the area drawn in. */
    public Rectangle2D square(Rectangle2D area) {
        double side = Math.max(20, Math.min(area.getWidth() - LEFT - 4, area.getHeight() - BOTTOM - 4));
        return new Rectangle2D.Double(area.getX() + LEFT, area.getY() + 4, side, side);
    }

    private double part(double chance) {
        return ranks ? 1 - chance : Math.min(1, -Math.log10(Math.max(chance, 1e-9)) / Math.log10(RAREST));
    }

    /** The return period at a height or width of the square, as a part of it. */
    public double returnPeriod(double part) {
        return ranks ? 1 / Math.max(1e-9, 1 - part) : Math.pow(RAREST, part);
    }

    @Override
    public void draw(Graphics2D g, Rectangle2D area, Palette palette) {
        Marks.smooth(g);
        g.setColor(palette.surface());
        g.fill(area);
        Rectangle2D square = square(area);
        double side = square.getWidth();
        g.setColor(palette.sunken());
        g.fill(square);
        double edge = part(1 / corner) * side;
        g.setColor(palette.tauGround());
        g.fill(new Rectangle2D.Double(square.getX() + edge, square.getY(), side - edge, side - edge));
        for (double tick : ranks ? RANKS : PERIODS) {
            double at = (ranks ? tick : part(1 / tick)) * side;
            Marks.line(g, square.getX() + at, square.getY(), square.getX() + at, square.getMaxY(), palette.grid(), 1);
            Marks.line(g, square.getX(), square.getMaxY() - at, square.getMaxX(), square.getMaxY() - at, palette.grid(), 1);
            Marks.centred(g, Axes.number(tick), square.getX() + at, square.getMaxY() + 11, ChartFonts.regular(12), palette.ink2());
            Marks.right(g, Axes.number(tick), square.getX() - 6, square.getMaxY() - at, ChartFonts.regular(12), palette.ink2());
        }
        Color plain = new Color(palette.ink2().getRed(), palette.ink2().getGreen(), palette.ink2().getBlue(), 110);
        for (int y = 0; y < years.first().length; y++) {
            double a = years.first()[y];
            double b = years.second()[y];
            boolean bad = a <= 1 / corner && b <= 1 / corner;
            double size = bad ? 3.6 : 2.2;
            g.setColor(bad ? palette.tau() : plain);
            g.fill(new Ellipse2D.Double(square.getX() + part(a) * side - size / 2, square.getMaxY() - part(b) * side - size / 2, size, size));
        }
        Marks.line(g, square.getX() + edge, square.getY(), square.getX() + edge, square.getMaxY(), palette.tau(), 1.4, 4, 3);
        Marks.line(g, square.getX(), square.getMaxY() - edge, square.getMaxX(), square.getMaxY() - edge, palette.tau(), 1.4, 4, 3);
        String words = ranks ? " year, rank" : " year, 1 in …";
        Marks.centred(g, Marks.fitting(g, first + words, ChartFonts.regular(12), side), square.getCenterX(), square.getMaxY() + 28, ChartFonts.regular(12), palette.ink2());
        AffineTransform upright = g.getTransform();
        g.rotate(-Math.PI / 2, area.getX() + 8, square.getCenterY());
        Marks.centred(g, Marks.fitting(g, second + words, ChartFonts.regular(12), side), area.getX() + 8, square.getCenterY(), ChartFonts.regular(12), palette.ink2());
        g.setTransform(upright);
    }

    @Override
    public ChartTable table() {
        List<List<String>> rows = new ArrayList<>();
        for (int y = 0; y < years.first().length; y++) {
            rows.add(List.of(Double.toString(1 / years.first()[y]), Double.toString(1 / years.second()[y])));
        }
        return new ChartTable(List.of(first + ", 1 in … years", second + ", 1 in … years"), rows);
    }
}
