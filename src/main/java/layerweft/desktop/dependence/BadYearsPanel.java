package layerweft.desktop.dependence;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.function.Consumer;
import javafx.scene.layout.Pane;
import javafx.scene.shape.Rectangle;
import layerweft.desktop.control.FigureTable;
import layerweft.desktop.control.Panel;
import layerweft.desktop.session.FamilyName;
import layerweft.desktop.session.TauState;
import layerweft.desktop.theme.Theme;
import layerweft.model.copula.Copula;
import layerweft.model.copula.CopulaFamily;
import layerweft.model.copula.Independence;
import layerweft.study.BadYears;

/** How often two perils both have a bad year, by family at the same τ, ordered by the 1-in-50 year; the bars are on a logarithmic scale. */
final class BadYearsPanel {
    static final List<Double> PERIODS = List.of(10.0, 50.0, 100.0, 200.0);
    private static final double ORDERED_BY = 50;
    private static final double BAR = 62;

    private final Theme theme;
    private final FigureTable table = new FigureTable(2);
    private final Panel panel = new Panel("Bad years together", table);

    BadYearsPanel(Theme theme) {
        this.theme = theme;
    }

    Panel panel() {
        return panel;
    }

    /** @param onChoose receives a family that is clicked */
    void show(Copula pair, String first, String second, TauState tau, Consumer<CopulaFamily> onChoose) {
        double at = pair instanceof Independence ? tau.tau() : pair.kendallTau(0, 1);
        List<CopulaFamily> families = FamilyTiles.families(tau).stream().filter(CopulaFamily::hasStrength).toList();
        List<BadYears> rows = BadYears.ofFamilies(families, at, PERIODS, ORDERED_BY);
        double most = rows.stream().mapToDouble(r -> Math.abs(Math.log(Math.max(1e-3, r.timesIndependent(ORDERED_BY))))).max().orElse(1);
        List<List<String>> cells = new ArrayList<>();
        int present = -1;
        for (BadYears row : rows) {
            double times = row.timesIndependent(ORDERED_BY);
            String often = times == 1 ? "1" : String.format(Locale.ROOT, times >= 10 ? "%.0f×" : "%.1f×", times);
            CopulaFamily family = CopulaFamily.parse(row.label());
            List<String> line = new ArrayList<>(List.of(family.hasStrength() ? FamilyName.of(family) : "Independence", "", often));
            PERIODS.forEach(t -> line.add(Digits.years(1 / row.chance(t))));
            present = row.label().equals(pair.label()) ? cells.size() : present;
            cells.add(line);
        }
        List<String> header = new ArrayList<>(List.of("family", "more often", ""));
        PERIODS.forEach(t -> header.add(String.format(Locale.ROOT, "1 in %.0f", t)));
        panel.note().set(String.format(Locale.ROOT, "%s and %s both at least this bad, τ %.2f: once in … years", first, second, at).replace('-', '−'));
        table.show(header, cells);
        table.choose(present);
        table.onChoose(r -> onChoose.accept(CopulaFamily.parse(rows.get(r).label())));
        for (int r = 0; r < rows.size(); r++) {
            double part = Math.log(Math.max(1e-3, rows.get(r).timesIndependent(ORDERED_BY))) / Math.max(most, 1e-9);
            table.mark(r, 1, bar(CopulaFamily.parse(rows.get(r).label()), Math.max(0, part)));
        }
    }

    private Pane bar(CopulaFamily family, double part) {
        Rectangle bar = new Rectangle(0, 0, theme.px(Math.max(1, BAR * part)), theme.px(9));
        bar.getStyleClass().add(fill(family));
        Pane room = new Pane(bar);
        room.setMinSize(theme.px(BAR), theme.px(9));
        room.setMaxSize(theme.px(BAR), theme.px(9));
        return room;
    }

    /** The family's colour of the stylesheet. */
    private static String fill(CopulaFamily family) {
        return switch (family.kind()) {
            case GUMBEL -> "lw-fill-1";
            case STUDENT -> "lw-fill-2";
            case FRANK -> "lw-fill-3";
            case CLAYTON -> family.survival() ? "lw-fill-4" : "lw-fill-7";
            case JOE -> "lw-fill-5";
            case GAUSSIAN -> "lw-fill-6";
            case INDEPENDENCE, COMONOTONIC, COUNTERMONOTONIC -> "lw-fill-ink";
        };
    }
}
