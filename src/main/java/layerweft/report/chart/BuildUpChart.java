package layerweft.report.chart;

import java.awt.Color;
import java.awt.Font;
import java.awt.Graphics2D;
import java.awt.Shape;
import java.awt.geom.Rectangle2D;
import java.util.List;

/** From the expected loss to the upfront premium: bars that fall together, each with its formula in small type. */
public record BuildUpChart(String title, List<Step> steps) implements ChartPicture {
    private static final double WORDS = 0.38;
    private static final double VALUES = 76;

    /** What a bar is. */
    public enum Kind { LOSS, PART, TOTAL, EXPECTED, PREMIUM, QUOTED }

    /**
     * A bar.
     *
     * @param from where it begins, in money
     * @param to where it ends
     * @param value as written, with its sign
     * @param strong whether it is a sum
     */
    public record Step(String name, String formula, Kind kind, double from, double to, String value, boolean strong) {}

    public BuildUpChart {
        steps = List.copyOf(steps);
    }

    @Override
    public void draw(Graphics2D g, Rectangle2D area, Palette palette) {
        Marks.smooth(g);
        g.setColor(palette.surface());
        g.fill(area);
        double left = area.getX() + WORDS * area.getWidth();
        double right = area.getMaxX() - VALUES;
        double most = steps.stream().mapToDouble(s -> Math.max(s.from, s.to)).filter(Double::isFinite).max().orElse(1);
        double scale = most > 0 ? (right - left) / most : 0;
        double row = Math.min(48, area.getHeight() / Math.max(1, steps.size()));
        double bar = Math.min(24, 0.55 * row);
        for (int k = 0; k < steps.size(); k++) {
            Step step = steps.get(k);
            double middle = area.getY() + (k + 0.5) * row;
            double room = WORDS * area.getWidth() - 12;
            Marks.left(g, Marks.fitting(g, step.name, font(step), room), area.getX(), middle - 8, font(step), palette.ink());
            Marks.left(g, Marks.fitting(g, step.formula, ChartFonts.regular(12), room), area.getX(), middle + 8, ChartFonts.regular(12), palette.ink2());
            if (!Double.isFinite(step.from) || !Double.isFinite(step.to)) {
                Marks.left(g, step.value, left, middle, ChartFonts.semibold(13), palette.ink());
                continue;
            }
            double x = left + scale * Math.min(step.from, step.to);
            Rectangle2D shape = new Rectangle2D.Double(x, middle - bar / 2, Math.max(1.5, scale * Math.abs(step.to - step.from)), bar);
            fill(g, shape, step.kind, palette);
            if (k + 1 < steps.size() && steps.get(k + 1).kind != Kind.QUOTED) {
                double joint = left + scale * step.to;
                Marks.line(g, joint, middle + bar / 2, joint, middle + row - bar / 2, palette.edge(), 1, 2, 2);
            }
            Marks.left(g, step.value, shape.getMaxX() + 8, middle, step.strong ? ChartFonts.semibold(13) : ChartFonts.regular(13), palette.ink());
        }
    }

    private static Font font(Step step) {
        return step.strong ? ChartFonts.semibold(13) : ChartFonts.regular(13);
    }

    private static void fill(Graphics2D g, Rectangle2D bar, Kind kind, Palette palette) {
        Color colour = switch (kind) {
            case LOSS -> palette.steps().get(6);
            case PART -> palette.steps().get(4);
            case TOTAL -> palette.ink2();
            case PREMIUM -> palette.ink();
            case EXPECTED, QUOTED -> palette.surface();
        };
        g.setColor(colour);
        g.fill(bar);
        if (kind == Kind.EXPECTED) {
            Shape clip = g.getClip();
            g.clip(bar);
            for (double x = bar.getX() - bar.getHeight(); x < bar.getMaxX(); x += 6) {
                Marks.line(g, x, bar.getMaxY(), x + bar.getHeight(), bar.getY(), palette.ink2(), 1);
            }
            g.setClip(clip);
        }
        if (kind == Kind.EXPECTED || kind == Kind.QUOTED) {
            g.setColor(palette.ink());
            g.setStroke(Marks.stroke(1.6));
            g.draw(bar);
        }
    }

    @Override
    public ChartTable table() {
        return new ChartTable(List.of("step", "formula", "amount"), steps.stream().map(s -> List.of(s.name, s.formula, s.value)).toList());
    }
}
