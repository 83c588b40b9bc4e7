package layerweft.report.chart;

import java.awt.Color;
import java.awt.Graphics2D;
import java.awt.geom.Line2D;
import java.awt.geom.Rectangle2D;
import java.util.List;
import layerweft.model.copula.CopulaFamily;
import layerweft.study.CopulaDensity;
import org.apache.commons.statistics.distribution.NormalDistribution;

/**
 * The shape of a family at one τ: contours of its density with normal margins that enclose given parts of the years, and the corner of joint bad years.
 *
 * @param density null as long as it is on its way
 * @param corner return period from which years are bad
 */
public record FamilyTileChart(CopulaFamily family, String name, CopulaDensity density, double corner) implements ChartPicture {

    @Override
    public String title() {
        return name;
    }

    @Override
    public void draw(Graphics2D g, Rectangle2D area, Palette palette) {
        Marks.smooth(g);
        double side = Math.min(area.getWidth(), area.getHeight());
        Rectangle2D square = new Rectangle2D.Double(area.getCenterX() - side / 2, area.getCenterY() - side / 2, side, side);
        g.setColor(palette.sunken());
        g.fill(square);
        if (density == null) {
            return;
        }
        Color colour = palette.family(family);
        double[] levels = density.levels();
        for (int l = 0; l < levels.length; l++) {
            int strength = 90 + 165 * (l + 1) / levels.length;
            g.setColor(new Color(colour.getRed(), colour.getGreen(), colour.getBlue(), strength));
            g.setStroke(Marks.stroke(0.9 + 0.9 * l / levels.length));
            contour(g, square, levels[l]);
        }
        double z = NormalDistribution.of(0, 1).inverseSurvivalProbability(1 / corner);
        double x = square.getX() + side * (z + density.reach()) / (2 * density.reach());
        double y = square.getMaxY() - side * (z + density.reach()) / (2 * density.reach());
        Marks.line(g, x, y, square.getMaxX(), y, palette.tau(), 1.2, 3, 2);
        Marks.line(g, x, y, x, square.getY(), palette.tau(), 1.2, 3, 2);
    }

    /** Marching squares between the middles of the cells (Lorensen &amp; Cline 1987 in the plane). */
    private void contour(Graphics2D g, Rectangle2D square, double level) {
        double[][] d = density.density();
        int n = d.length;
        double cell = square.getWidth() / n;
        for (int i = 0; i + 1 < n; i++) {
            for (int j = 0; j + 1 < n; j++) {
                double[] corners = {d[i][j], d[i + 1][j], d[i + 1][j + 1], d[i][j + 1]};
                double[][] at = {{i, j}, {i + 1, j}, {i + 1, j + 1}, {i, j + 1}};
                double[][] crossings = new double[4][];
                int count = 0;
                for (int e = 0; e < 4; e++) {
                    double a = corners[e] - level;
                    double b = corners[(e + 1) % 4] - level;
                    if (a > 0 != b > 0) {
                        double w = a / (a - b);
                        crossings[count++] = new double[] {at[e][0] + w * (at[(e + 1) % 4][0] - at[e][0]), at[e][1] + w * (at[(e + 1) % 4][1] - at[e][1])};
                    }
                }
                for (int c = 0; c + 1 < count; c += 2) {
                    g.draw(new Line2D.Double(square.getX() + (crossings[c][0] + 0.5) * cell, square.getMaxY() - (crossings[c][1] + 0.5) * cell,
                            square.getX() + (crossings[c + 1][0] + 0.5) * cell, square.getMaxY() - (crossings[c + 1][1] + 0.5) * cell));
                }
            }
        }
    }

    @Override
    public ChartTable table() {
        return new ChartTable(List.of("family"), List.of(List.of(name)));
    }
}
