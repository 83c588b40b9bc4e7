package layerweft.report.chart;

import java.awt.Color;
import java.awt.Graphics2D;
import java.awt.Shape;
import java.awt.geom.Line2D;
import java.awt.geom.Rectangle2D;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.SortedMap;

/**
 * A programme to scale: height is what one event costs, width is how many full limits the year can use. A layer is a row of cells, the first limit, then
 * one for each reinstatement, each coloured by its chance-weighted use; an annual deductible is hatched cells before them. Threads are perils, as wide as
 * their share of the layer's expected loss. Covers of the year's total stand in a column of their own at the right.
 *
 * @param layers those with an occurrence limit
 * @param covers those without one: of the year's total
 * @param perils names, in the order of the file
 * @param haze amount that the year's largest event passes once in so many years, by return period
 * @param logarithmic whether the axis is
 * @param selected name of the layer set apart; null for none
 */
public record TowerChart(List<Block> layers, List<Cover> covers, List<String> perils, SortedMap<Double, Double> haze, boolean logarithmic, String selected)
        implements ChartPicture {
    private static final double AXIS = 44;
    private static final double HAZE = 34;
    private static final double PERIODS = 62;
    private static final double THREAD = 30;
    private static final double CELL = 68;
    private static final double RIGHT = 120;
    private static final double TOP = 64;
    private static final double BOTTOM = 44;
    /** Blocks lower than this carry their number at the side. */
    private static final double LOW = 20;
    private static final double LEAST = 4;
    private static final int MOST_THREADS = 6;
    private static final List<Double> TICKS = List.of(2.0, 5.0, 10.0, 20.0, 50.0, 100.0, 200.0, 500.0);

    /**
     * A layer of single events.
     *
     * @param terms in words, e.g. {@code 30 xs 30, 2 at 100 %}
     * @param deductible annual deductible in limits
     * @param uses of each limit, as parts; the first ones
     * @param limits that the year can use, infinite for no end
     * @param shares of each peril in the expected loss; NaN where it is not covered or not known
     */
    public record Block(String name, String terms, double retention, double limit, double deductible, List<Double> uses, double limits, List<Double> shares) {}

    /**
     * A cover of the year's total.
     *
     * @param from its deductible
     * @param limit of the year; infinite for none
     * @param use its loss by its limit; NaN where there is no limit
     * @param inuring whether recoveries of other layers come off first
     */
    public record Cover(String name, String terms, double from, double limit, double use, boolean inuring) {}

    /** Where things are: what a hand can hold. */
    public record Place(String name, Rectangle2D cells, boolean cover) {}

    public TowerChart {
        layers = List.copyOf(layers);
        covers = List.copyOf(covers);
        perils = List.copyOf(perils);
    }

    @Override
    public String title() {
        return "Programme";
    }

    private double least() {
        double lowest = layers.stream().mapToDouble(Block::retention).filter(r -> r > 0).min().orElse(1);
        return logarithmic ? lowest / 2 : 0;
    }

    private double most() {
        double top = layers.stream().mapToDouble(b -> b.retention + b.limit).filter(Double::isFinite).max().orElse(0);
        double ofCovers = covers.stream().mapToDouble(c -> c.from + (Double.isFinite(c.limit) ? c.limit : c.from)).max().orElse(0);
        double drawn = Math.max(top, ofCovers);
        return (drawn > 0 ? drawn : haze.isEmpty() ? 100 : Math.max(1, haze.get(haze.lastKey()))) * 1.03;
    }

    private Rectangle2D body(Rectangle2D area) {
        return new Rectangle2D.Double(area.getX(), area.getY() + TOP, area.getWidth(), area.getHeight() - TOP - BOTTOM);
    }

    /** Height of an amount in the area that the picture is drawn in. */
    public double y(double amount, Rectangle2D area) {
        Rectangle2D body = body(area);
        double part = logarithmic ? Math.log(Math.max(amount, least()) / least()) / Math.log(most() / least()) : amount / most();
        return body.getMaxY() - body.getHeight() * Math.max(0, Math.min(1.02, part));
    }

    /** The amount at a height. */
    public double amount(double y, Rectangle2D area) {
        Rectangle2D body = body(area);
        double part = (body.getMaxY() - y) / body.getHeight();
        return logarithmic ? least() * Math.pow(most() / least(), part) : part * most();
    }

    /** The distance of lines on the axis, to which a moving edge snaps. */
    public double snap() {
        return Axes.step(most()) / 10;
    }

    private int threads() {
        return perils.size() == 1 ? 0 : Math.min(MOST_THREADS, perils.size());
    }

    private double threadsLeft(Rectangle2D area) {
        return area.getX() + AXIS + HAZE + PERIODS;
    }

    private double cellsLeft(Rectangle2D area) {
        return threadsLeft(area) + (threads() == 0 ? 0 : threads() * THREAD + 12);
    }

    private double cellsRight(Rectangle2D area) {
        return area.getMaxX() - (covers.isEmpty() ? 0 : RIGHT + 40);
    }

    /** Column of each layer: layers that overlap stand side by side. */
    private int[] columns() {
        int[] columns = new int[layers.size()];
        for (int j = 0; j < columns.length; j++) {
            boolean free = false;
            for (int c = 0; !free; c++) {
                free = true;
                for (int i = 0; i < j; i++) {
                    free &= columns[i] != c || !overlap(layers.get(i), layers.get(j));
                }
                columns[j] = free ? c : columns[j];
            }
        }
        return columns;
    }

    private static boolean overlap(Block a, Block b) {
        double slack = 1e-9 * (a.limit + b.limit);
        return a.retention < b.retention + b.limit - slack && b.retention < a.retention + a.limit - slack;
    }

    /** Where each layer and cover is, in the order of the layers, then of the covers. */
    public List<Place> places(Rectangle2D area) {
        List<Place> places = new ArrayList<>();
        int[] columns = columns();
        int count = 1;
        for (int c : columns) {
            count = Math.max(count, c + 1);
        }
        double width = (cellsRight(area) - cellsLeft(area)) / count;
        for (int j = 0; j < layers.size(); j++) {
            Block b = layers.get(j);
            double top = y(b.retention + b.limit, area);
            double height = Math.max(LEAST, y(b.retention, area) - top - 2);
            double cell = cell(b, width, count);
            places.add(new Place(b.name, new Rectangle2D.Double(cellsLeft(area) + columns[j] * width, top + 1, cell * cellsOf(b), height), false));
        }
        for (Cover c : covers) {
            double end = c.from + (Double.isFinite(c.limit) ? c.limit : most());
            double top = y(Math.min(end, most()), area);
            places.add(new Place(c.name, new Rectangle2D.Double(area.getMaxX() - RIGHT, top, RIGHT - 4, Math.max(LEAST, y(c.from, area) - top)), true));
        }
        return places;
    }

    private static double cellsOf(Block b) {
        return Math.min(b.deductible, 4) + b.uses.size();
    }

    private static double cell(Block b, double width, int columns) {
        double room = columns > 1 ? width - 70 : Math.max(width - 190, 0.5 * width);
        return Math.min(CELL, room / Math.max(1, cellsOf(b)));
    }

    @Override
    public void draw(Graphics2D g, Rectangle2D area, Palette palette) {
        Marks.smooth(g);
        g.setColor(palette.surface());
        g.fill(area);
        axis(g, area, palette);
        haze(g, area, palette);
        List<Place> places = places(area);
        for (int j = 0; j < layers.size(); j++) {
            ground(g, area, places.get(j), palette);
        }
        threads(g, area, places, palette);
        for (int j = 0; j < layers.size(); j++) {
            cells(g, area, layers.get(j), places.get(j), palette);
        }
        if (!covers.isEmpty()) {
            covers(g, area, places, palette);
        }
        legend(g, area, palette);
        if (layers.isEmpty() && covers.isEmpty()) {
            Marks.centred(g, "No layer yet: add one with +, or with Layer, New layer.", area.getCenterX() + 40, area.getCenterY(), ChartFonts.regular(14), palette.ink2());
        }
    }

    private void axis(Graphics2D g, Rectangle2D area, Palette palette) {
        Marks.left(g, "the year's largest event:", area.getX(), area.getY() + 34, ChartFonts.regular(12), palette.ink2());
        Marks.left(g, "amount and return period", area.getX(), area.getY() + 50, ChartFonts.regular(12), palette.ink2());
        for (double v : levels()) {
            double y = y(v, area);
            Marks.right(g, Axes.number(v), area.getX() + AXIS - 10, y, ChartFonts.regular(12), palette.ink2());
            Marks.line(g, area.getX() + AXIS - 6, y, area.getX() + AXIS - 2, y, palette.edge(), 1);
        }
    }

    private List<Double> levels() {
        List<Double> levels = new ArrayList<>();
        if (!logarithmic) {
            double step = Axes.step(most());
            for (double v = 0; v <= most(); v += step) {
                levels.add(Double.parseDouble(String.format(Locale.ROOT, "%.6g", v)));
            }
            return levels;
        }
        for (int decade = (int) Math.floor(Math.log10(least())); decade <= Math.log10(most()); decade++) {
            for (double factor : new double[] {1, 2, 5}) {
                double v = Double.parseDouble(String.format(Locale.ROOT, "%.6g", factor * Math.pow(10, decade)));
                if (v >= least() && v <= most()) {
                    levels.add(v);
                }
            }
        }
        return levels;
    }

    /** A column as dark as the root of the chance that the year's largest event passes each height. */
    private void haze(Graphics2D g, Rectangle2D area, Palette palette) {
        Rectangle2D column = new Rectangle2D.Double(area.getX() + AXIS, body(area).getY(), HAZE, body(area).getHeight());
        g.setColor(palette.sunken());
        g.fill(column);
        if (!haze.isEmpty()) {
            Color ink = palette.ink2();
            for (double y = column.getMinY(); y < column.getMaxY(); y += 2) {
                double chance = chance(amount(y + 1, area));
                g.setColor(new Color(ink.getRed(), ink.getGreen(), ink.getBlue(), (int) Math.round(200 * Math.sqrt(chance))));
                g.fill(new Rectangle2D.Double(column.getX(), y, column.getWidth(), Math.min(2, column.getMaxY() - y)));
            }
            double last = Double.POSITIVE_INFINITY;
            for (double years : TICKS) {
                Double amount = amountAt(years);
                double y = amount == null || amount <= least() || amount > most() ? Double.NaN : y(amount, area);
                if (!Double.isNaN(y) && last - y > 13) {
                    Marks.line(g, column.getMaxX(), y, column.getMaxX() + 5, y, palette.edge(), 1);
                    Marks.left(g, "1 in " + Axes.number(years), column.getMaxX() + 8, y, ChartFonts.regular(12), palette.ink2());
                    last = y;
                }
            }
        }
        g.setColor(palette.edge());
        g.setStroke(Marks.stroke(1));
        g.draw(column);
    }

    private Double amountAt(double years) {
        Map.Entry<Double, Double> below = null;
        for (Map.Entry<Double, Double> at : haze.entrySet()) {
            if (at.getKey() >= years) {
                if (below == null || at.getKey() == years) {
                    return at.getKey() == years ? at.getValue() : null;
                }
                double w = (years - below.getKey()) / (at.getKey() - below.getKey());
                return below.getValue() + w * (at.getValue() - below.getValue());
            }
            below = at;
        }
        return null;
    }

    private double chance(double amount) {
        double chance = 1;
        double above = 0;
        double aboveChance = 1;
        for (Map.Entry<Double, Double> at : haze.entrySet()) {
            chance = 1 / at.getKey();
            if (at.getValue() >= amount) {
                double w = at.getValue() > above ? (amount - above) / (at.getValue() - above) : 1;
                return aboveChance + w * (chance - aboveChance);
            }
            above = at.getValue();
            aboveChance = chance;
        }
        return 0;
    }

    private void ground(Graphics2D g, Rectangle2D area, Place place, Palette palette) {
        boolean chosen = place.name.equals(selected);
        Rectangle2D cells = place.cells;
        Rectangle2D row = new Rectangle2D.Double(threadsLeft(area), cells.getY(), cells.getMaxX() - threadsLeft(area), cells.getHeight());
        g.setColor(chosen ? palette.accentGround() : palette.sunken());
        g.fill(row);
        g.setColor(chosen ? palette.accent() : palette.edge());
        g.setStroke(Marks.stroke(chosen ? 2.4 : 1));
        g.draw(row);
    }

    private void threads(Graphics2D g, Rectangle2D area, List<Place> places, Palette palette) {
        int drawn = threads();
        if (drawn == 0) {
            return;
        }
        double left = threadsLeft(area);
        Marks.left(g, "share of its loss by peril, %", left, area.getY() + 8, ChartFonts.regular(12), palette.ink2());
        Rectangle2D body = body(area);
        for (int t = 0; t < drawn; t++) {
            double x = left + (t + 0.5) * THREAD + 4;
            boolean others = perils.size() > MOST_THREADS && t == drawn - 1;
            Color colour = others ? palette.edge() : palette.peril(t);
            Marks.line(g, x, body.getY() - 10, x, body.getMaxY() + 4, colour, 1.4);
            String name = others ? "others" : perils.get(t);
            double room = drawn > 4 ? THREAD * 1.8 : THREAD * 2.2;
            Marks.centred(g, Marks.fitting(g, name, ChartFonts.semibold(12), room), x, area.getY() + (t % 2 == 0 ? 28 : 44), ChartFonts.semibold(12), palette.ink());
            for (int j = 0; j < layers.size(); j++) {
                double share = share(layers.get(j), t, others);
                Rectangle2D cells = places.get(j).cells;
                if (Double.isNaN(share)) {
                    // behind the layer: not covered
                    g.setColor(places.get(j).name.equals(selected) ? palette.accentGround() : palette.sunken());
                    g.fill(new Rectangle2D.Double(x - 2, cells.getY() + 1, 4, cells.getHeight() - 2));
                    continue;
                }
                double width = Math.max(2.5, share * (THREAD - 6));
                g.setColor(colour);
                g.fill(new Rectangle2D.Double(x - width / 2, cells.getY(), width, cells.getHeight()));
                if (cells.getHeight() >= 14) {
                    String number = String.format(Locale.ROOT, "%.0f", 100 * share);
                    boolean inside = width > Marks.width(g, number, ChartFonts.regular(12)) + 2;
                    if (inside) {
                        Marks.centred(g, number, x, cells.getCenterY(), ChartFonts.semibold(12), Palette.textOn(colour));
                    } else {
                        Marks.left(g, number, x + width / 2 + 2, cells.getCenterY(), ChartFonts.regular(12), palette.ink2());
                    }
                }
            }
        }
    }

    private double share(Block block, int thread, boolean others) {
        if (!others) {
            return thread < block.shares.size() ? block.shares.get(thread) : Double.NaN;
        }
        double sum = Double.NaN;
        for (int i = thread; i < block.shares.size(); i++) {
            double s = block.shares.get(i);
            sum = Double.isNaN(s) ? sum : Double.isNaN(sum) ? s : sum + s;
        }
        return sum;
    }

    private void cells(Graphics2D g, Rectangle2D area, Block block, Place place, Palette palette) {
        Rectangle2D all = place.cells;
        double width = cellsOf(block) == 0 ? 0 : all.getWidth() / cellsOf(block);
        double x = all.getX();
        double deductible = Math.min(block.deductible, 4);
        for (double left = deductible; left > 1e-9; left -= 1) {
            Rectangle2D cell = new Rectangle2D.Double(x, all.getY(), width * Math.min(1, left), all.getHeight());
            hatch(g, cell, palette);
            x = cell.getMaxX();
        }
        for (int k = 0; k < block.uses.size(); k++) {
            double use = block.uses.get(k);
            boolean fading = Double.isInfinite(block.limits) && k == block.uses.size() - 1;
            double part = Double.isInfinite(block.limits) ? 1 : Math.min(1, block.limits - k);
            Rectangle2D cell = new Rectangle2D.Double(x, all.getY(), width * part, all.getHeight());
            Color colour = palette.lossOnLine(use);
            g.setColor(colour);
            g.fill(cell);
            g.setColor(palette.edge());
            g.setStroke(fading ? Marks.stroke(1, 3, 3) : Marks.stroke(1));
            g.draw(cell);
            String text = percent(use);
            if (cell.getHeight() >= LOW && cell.getWidth() > Marks.width(g, text, ChartFonts.semibold(13)) + 4) {
                Marks.centred(g, text, cell.getCenterX(), cell.getCenterY(), ChartFonts.semibold(13), Palette.textOn(colour));
            }
            x = cell.getMaxX();
        }
        x = Math.max(x, all.getMaxX());
        double room = Math.max(20, cellsRight(area) - x - 16);
        if (all.getHeight() >= 30) {
            Marks.left(g, Marks.fitting(g, block.name, ChartFonts.semibold(13), room), x + 10, all.getCenterY() - 8, ChartFonts.semibold(13), palette.ink());
            Marks.left(g, Marks.fitting(g, block.terms, ChartFonts.regular(12), room), x + 10, all.getCenterY() + 9, ChartFonts.regular(12), palette.ink2());
        } else {
            String first = all.getHeight() < LOW && !block.uses.isEmpty() ? percent(block.uses.get(0)) + "  " : "";
            Marks.left(g, Marks.fitting(g, first + block.name + "  " + block.terms, ChartFonts.regular(12), room), x + 10, all.getCenterY(), ChartFonts.regular(12), palette.ink());
        }
    }

    private static String percent(double use) {
        double p = 100 * use;
        return Double.isNaN(use) ? "" : p >= 10 ? String.format(Locale.ROOT, "%.1f %%", p) : p >= 0.1 ? String.format(Locale.ROOT, "%.1f %%", p)
                : p >= 0.01 ? String.format(Locale.ROOT, "%.2f %%", p) : p > 0 ? "< 0.01 %" : "0";
    }

    private static void hatch(Graphics2D g, Rectangle2D cell, Palette palette) {
        Shape clip = g.getClip();
        g.setColor(palette.surface());
        g.fill(cell);
        g.clip(cell);
        g.setColor(palette.edge());
        g.setStroke(Marks.stroke(1));
        for (double x = cell.getX() - cell.getHeight(); x < cell.getMaxX(); x += 7) {
            g.draw(new Line2D.Double(x, cell.getMaxY(), x + cell.getHeight(), cell.getY()));
        }
        g.setClip(clip);
        g.draw(cell);
    }

    private void covers(Graphics2D g, Rectangle2D area, List<Place> places, Palette palette) {
        Rectangle2D body = body(area);
        double x = area.getMaxX() - RIGHT;
        Marks.left(g, "year total", x, area.getY() + 50, ChartFonts.regular(12), palette.ink2());
        g.setColor(palette.sunken());
        g.fill(new Rectangle2D.Double(x, body.getY(), RIGHT - 4, body.getHeight()));
        for (int c = 0; c < covers.size(); c++) {
            Cover cover = covers.get(c);
            Rectangle2D block = places.get(layers.size() + c).cells;
            Color colour = Double.isNaN(cover.use) ? palette.surface() : palette.lossOnLine(cover.use);
            g.setColor(colour);
            g.fill(block);
            g.setColor(cover.name.equals(selected) ? palette.accent() : palette.edge());
            g.setStroke(Marks.stroke(cover.name.equals(selected) ? 2.4 : 1));
            g.draw(block);
            Marks.centred(g, percent(cover.use), block.getCenterX(), block.getCenterY() - (block.getHeight() > 36 ? 8 : 0), ChartFonts.semibold(13), Palette.textOn(colour));
            if (block.getHeight() > 36) {
                Marks.centred(g, Marks.fitting(g, cover.terms, ChartFonts.regular(12), RIGHT - 12), block.getCenterX(), block.getCenterY() + 9, ChartFonts.regular(12),
                        Palette.textOn(colour));
            }
            Marks.centred(g, Marks.fitting(g, cover.name, ChartFonts.semibold(12), RIGHT), block.getCenterX(), block.getY() - 10, ChartFonts.semibold(12), palette.ink());
            if (cover.inuring) {
                double spine = x - 18;
                Marks.line(g, spine, body.getY() + 10, spine, block.getCenterY(), palette.ink2(), 1.4);
                Marks.line(g, spine, block.getCenterY(), x - 2, block.getCenterY(), palette.ink2(), 1.4);
                for (Place place : places.subList(0, layers.size())) {
                    Marks.disc(g, spine, Math.min(place.cells.getCenterY(), body.getMaxY()), 2.5, palette.ink2(), palette.ink2(), 1);
                }
                Marks.right(g, "recovered before", spine - 4, body.getY() + 8, ChartFonts.regular(12), palette.ink2());
            }
        }
    }

    private void legend(Graphics2D g, Rectangle2D area, Palette palette) {
        double y = area.getMaxY() - 22;
        double x = cellsLeft(area);
        hatch(g, new Rectangle2D.Double(x, y - 6, 14, 12), palette);
        Marks.left(g, "annual deductible", x + 20, y, ChartFonts.regular(12), palette.ink2());
        double right = Math.min(cellsRight(area), x + 480);
        double step = 32;
        double first = right - 8 * step;
        Marks.right(g, "use in a year, %", first - 8, y, ChartFonts.regular(12), palette.ink2());
        for (int k = 0; k < 8; k++) {
            g.setColor(palette.steps().get(k));
            g.fill(new Rectangle2D.Double(first + k * step, y - 6, step, 12));
            if (k < 7) {
                Marks.centred(g, Axes.number(100 * Palette.STEP_EDGES.get(k)), first + (k + 1) * step, y + 15, ChartFonts.regular(11), palette.ink2());
            }
        }
    }

    @Override
    public ChartTable table() {
        List<List<String>> rows = new ArrayList<>();
        for (Block b : layers) {
            rows.add(List.of(b.name, b.terms, Double.toString(b.retention), Double.toString(b.limit), b.uses.isEmpty() ? "" : Double.toString(b.uses.get(0))));
        }
        for (Cover c : covers) {
            rows.add(List.of(c.name, c.terms, Double.toString(c.from), Double.toString(c.limit), Double.toString(c.use)));
        }
        return new ChartTable(List.of("layer", "terms", "from", "limit", "use of the first limit"), rows);
    }
}
