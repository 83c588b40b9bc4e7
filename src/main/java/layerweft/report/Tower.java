package layerweft.report;

import java.awt.BasicStroke;
import java.awt.Color;
import java.awt.Graphics2D;
import java.awt.RenderingHints;
import java.awt.geom.Line2D;
import java.awt.geom.Rectangle2D;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import layerweft.figures.Figure;
import layerweft.figures.FigureText;
import layerweft.figures.LayerFigures;
import layerweft.figures.LayerTermsText;
import layerweft.model.treaty.Layer;
import layerweft.model.treaty.LayerTerms;
import layerweft.study.LimitUse;
import layerweft.study.Quote;

/**
 * The programme drawn to scale: height is what one event costs, width is how many full limits the year can use, colour is how much of each
 * limit is used in a year on average. Covers of the year's total stand in a column of their own at the right.
 */
final class Tower {
    private static final int HEIGHT = 330;
    private static final double LEFT = 52;
    private static final double TOP = 26;
    private static final double BOTTOM = 306;
    private static final double GAP = 6;
    /** Beyond this ratio of the highest edge to the lowest the amounts are drawn on a logarithmic scale. */
    private static final double WIDE = 40;
    private static final double[] EDGES = {0.002, 0.005, 0.01, 0.02, 0.05, 0.1, 0.2};
    private static final int[] STEPS = {0xEAF3F0, 0xCFE5E0, 0xAFD5D1, 0x88C0C2, 0x5FA5B0, 0x33758F, 0x235477, 0x1A365A};
    private static final Color INK = new Color(0x16232A);
    private static final Color INK_2 = new Color(0x51626B);
    private static final Color LINE = new Color(0xD5DDDE);
    private static final Color PAPER = Color.WHITE;

    private final List<Band> bands = new ArrayList<>();
    private boolean log;
    private double low;
    private double high;
    private int columns;

    /**
     * A layer as it stands.
     *
     * @param from lower edge, of one event or of the year's total
     * @param to upper edge, possibly infinite
     * @param column place side by side with layers that it overlaps
     */
    private record Band(String name, String terms, double from, double to, boolean annual, int column, List<Figure> uses, boolean open) {
        Band at(int place) {
            return new Band(name, terms, from, to, annual, place, uses, open);
        }
    }

    private Tower(Quote quote, List<LimitUse> uses) {
        List<Band> found = new ArrayList<>();
        for (int j = 0; j < quote.layers().size(); j++) {
            found.add(band(quote.treaty().layer(j), quote.layers().get(j), uses.get(j)));
        }
        found.sort(Comparator.comparing(Band::annual).thenComparingDouble(Band::from));
        for (Band band : found) {
            int column = 0;
            while (taken(band, column)) {
                column++;
            }
            bands.add(band.at(column));
        }
        columns = bands.stream().mapToInt(Band::column).max().orElse(0) + 1;
        scale();
    }

    static Picture of(Quote quote, List<LimitUse> uses) {
        Tower tower = new Tower(quote, uses);
        String amounts = Report.money(quote.treaty().portfolio());
        return new Picture("The programme to scale", "Height: amount of one event" + (tower.bands.stream().anyMatch(Band::annual) ? ", for covers of the year (marked) the year's total" : "")
                + ", in " + amounts + (tower.log ? ", logarithmic" : "") + ". Width: the first limit, then one for each reinstatement. In each cell the part of that limit used in a year "
                + "on average, darker where more is used.", Picture.PAGE_WIDTH, HEIGHT, tower::draw);
    }

    private static Band band(Layer layer, LayerFigures figures, LimitUse use) {
        LayerTerms t = layer.terms();
        boolean ofTheYear = t.deductible() > 0 || t.occurrenceLimit() == Double.POSITIVE_INFINITY && t.retention() == 0 && !t.hasFranchise();
        if (ofTheYear) {
            Figure used = figures.expectedLoss().times(1 / layer.share()).over(t.annualLimit());
            return new Band(layer.name(), LayerTermsText.of(t), t.deductible(), t.deductible() + t.annualLimit(), true, 0, List.of(used), false);
        }
        double from = t.hasFranchise() ? t.franchise() : t.retention();
        double to = t.hasFranchise() ? Math.max(t.occurrenceLimit(), from) : from + t.occurrenceLimit();
        List<Figure> uses = use.uses().isEmpty() ? List.of(figures.lossOnLine()) : use.uses();
        return new Band(layer.name(), LayerTermsText.of(t), from, to, false, 0, uses, use.limits() > uses.size());
    }

    private boolean taken(Band band, int column) {
        // covers of the year stand to the right of all layers of events
        return bands.stream().anyMatch(b -> b.column() == column && (b.annual() != band.annual() || b.from() < band.to() && band.from() < b.to()))
                || bands.stream().anyMatch(b -> !b.annual() && band.annual() && b.column() >= column);
    }

    private void scale() {
        double most = 0;
        double least = Double.POSITIVE_INFINITY;
        for (Band b : bands) {
            most = Math.max(most, Double.isInfinite(b.to()) ? 2 * b.from() : b.to());
            least = b.from() > 0 ? Math.min(least, b.from()) : least;
        }
        high = most > 0 ? most : 1;
        log = least < Double.POSITIVE_INFINITY && high / least > WIDE;
        low = log ? least / 2 : 0;
    }

    private double y(double amount) {
        double part = log ? Math.log(Math.max(amount, low) / low) / Math.log(high / low) : amount / high;
        return BOTTOM - Math.min(1, part) * (BOTTOM - TOP);
    }

    private void draw(Graphics2D g) {
        g.setRenderingHint(RenderingHints.KEY_ANTIALIASING, RenderingHints.VALUE_ANTIALIAS_ON);
        axis(g);
        double width = (Picture.PAGE_WIDTH - LEFT) / columns;
        bands.forEach(band -> draw(g, band, LEFT + band.column() * width, width - GAP));
    }

    private void axis(Graphics2D g) {
        g.setFont(Typeface.REGULAR.at(8));
        for (double tick : ticks()) {
            g.setColor(LINE);
            g.setStroke(new BasicStroke(0.5f));
            g.draw(new Line2D.Double(LEFT - 4, y(tick), Picture.PAGE_WIDTH, y(tick)));
            g.setColor(INK_2);
            String text = FigureText.groupedPlain(tick);
            g.drawString(text, (float) (LEFT - 8 - g.getFontMetrics().stringWidth(text)), (float) y(tick) + 2.8f);
        }
    }

    private List<Double> ticks() {
        List<Double> ticks = new ArrayList<>();
        if (log) {
            for (int e = (int) Math.floor(Math.log10(low)); e <= Math.log10(high); e++) {
                for (int m : new int[] {1, 2, 5}) {
                    double tick = e >= 0 ? m * Math.pow(10, e) : m / Math.pow(10, -e);
                    if (tick >= low && tick <= high) {
                        ticks.add(tick);
                    }
                }
            }
            return ticks.size() <= 8 ? ticks : ticks.stream().filter(t -> Math.abs(Math.log10(t) - Math.rint(Math.log10(t))) < 1e-9).toList();
        }
        int e = (int) Math.floor(Math.log10(high / 5));
        double unit = e >= 0 ? Math.pow(10, e) : 1 / Math.pow(10, -e);
        double step = high / unit > 25 ? 5 : high / unit > 12 ? 2 : 1;
        for (int k = 0; k * step * unit <= high * (1 + 1e-12); k++) {
            ticks.add(e >= 0 ? k * step * unit : k * step / Math.pow(10, -e));
        }
        return ticks;
    }

    private void draw(Graphics2D g, Band band, double x, double width) {
        double top = y(band.to());
        double height = Math.max(4, y(band.from()) - top);
        int cells = band.uses().size() + (band.open() ? 1 : 0);
        double cell = width / cells;
        for (int k = 0; k < cells; k++) {
            Rectangle2D box = new Rectangle2D.Double(x + k * cell, top, cell, height);
            boolean open = k == band.uses().size();
            g.setColor(open ? PAPER : colour(band.uses().get(k).value()));
            g.fill(box);
            g.setColor(INK_2);
            g.setStroke(open ? new BasicStroke(0.6f, BasicStroke.CAP_BUTT, BasicStroke.JOIN_MITER, 10, new float[] {3, 3}, 0) : new BasicStroke(0.6f));
            g.draw(box);
            g.setFont(Typeface.SEMIBOLD.at(8.5f));
            String use = open ? "…" : FigureText.percent(band.uses().get(k));
            int wide = g.getFontMetrics().stringWidth(use);
            if (wide + 4 < cell && height >= 24) {
                g.setColor(open ? INK_2 : ink(band.uses().get(k).value()));
                g.drawString(use, (float) (x + k * cell + (cell - wide) / 2), (float) (top + height - 5));
            }
        }
        label(g, band, x, top, height, width);
    }

    /** The name at the top of the block on paper of its own; above it where the block is thin. */
    private static void label(Graphics2D g, Band band, double x, double top, double height, double width) {
        g.setFont(Typeface.REGULAR.at(8));
        String text = fit(g, (band.annual() ? "year: " : "") + band.name() + ", " + band.terms(), width - 10);
        double wide = g.getFontMetrics().stringWidth(text);
        double base = height >= 14 ? top + 10 : top - 3;
        g.setColor(PAPER);
        g.fill(new Rectangle2D.Double(x + 1.5, base - 8.5, wide + 5, 11));
        g.setColor(INK);
        g.drawString(text, (float) x + 4, (float) base);
    }

    private static String fit(Graphics2D g, String text, double width) {
        String shown = text;
        while (g.getFontMetrics().stringWidth(shown) > width && shown.length() > 2) {
            shown = shown.substring(0, shown.offsetByCodePoints(shown.length(), shown.endsWith("…") ? -2 : -1)).stripTrailing() + "…";
        }
        return shown;
    }

    private static int step(double use) {
        int k = 0;
        while (k < EDGES.length && use >= EDGES[k]) {
            k++;
        }
        return k;
    }

    private static Color colour(double use) {
        return Double.isNaN(use) ? PAPER : new Color(STEPS[step(use)]);
    }

    private static Color ink(double use) {
        return step(use) >= 5 ? PAPER : INK;
    }
}
