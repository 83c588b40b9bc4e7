package layerweft.desktop.dependence;

import java.time.Duration;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.stream.Stream;
import javafx.scene.control.Label;
import javafx.scene.layout.ColumnConstraints;
import javafx.scene.layout.GridPane;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import javafx.scene.layout.RowConstraints;
import javafx.scene.layout.VBox;
import layerweft.desktop.picture.FamilyShape;
import layerweft.desktop.picture.FamilyTile;
import layerweft.desktop.picture.TileActions;
import layerweft.desktop.session.FamilyName;
import layerweft.desktop.session.FigureShown;
import layerweft.desktop.session.LivePrices;
import layerweft.desktop.session.Session;
import layerweft.desktop.session.TauState;
import layerweft.desktop.theme.Theme;
import layerweft.engine.RunControl;
import layerweft.figures.Figure;
import layerweft.model.copula.Copula;
import layerweft.model.copula.CopulaFamily;
import layerweft.model.copula.Independence;
import layerweft.model.treaty.Treaty;
import layerweft.study.LiveLayer;
import layerweft.study.LivePricing;

/** Eight families at the present τ: those that tie the worst years above, the others below, each with the selected layer's loss on line at the same τ. */
final class FamilyTiles extends VBox {
    private static final int COLUMNS = 4;
    private static final String WORK = "Families at the same τ";
    private static final Duration PATIENCE = Duration.ofMillis(1_500);
    private static final Duration REST = Duration.ofMillis(120);
    private static final double USUAL_FREEDOM = 4;

    private final Session session;
    private final List<FamilyTile> tiles = new ArrayList<>();
    private final Label head = new Label();
    private final Label layerName = new Label();
    private LivePricing pricing;
    private Map<CopulaFamily, List<LiveLayer>> priced = Map.of();
    private Treaty pricedOf;
    private Object press;

    FamilyTiles(Session session, Theme theme) {
        this.session = session;
        getStyleClass().add("lw-column-tight");
        head.getStyleClass().add("lw-panel-title");
        layerName.getStyleClass().add("lw-note");
        Region gap = new Region();
        HBox.setHgrow(gap, Priority.ALWAYS);
        head.setMinWidth(USE_PREF_SIZE);
        HBox line = new HBox(head, gap, layerName);
        GridPane grid = new GridPane();
        grid.getStyleClass().add("lw-tiles");
        TileActions actions = new Actions();
        for (int k = 0; k < 2 * COLUMNS; k++) {
            FamilyTile tile = new FamilyTile(theme, actions);
            tile.setPrefSize(theme.px(152), theme.px(170));
            tile.setMaxSize(Double.MAX_VALUE, Double.MAX_VALUE);
            tiles.add(tile);
            grid.add(tile, k % COLUMNS, k / COLUMNS);
        }
        for (int c = 0; c < COLUMNS; c++) {
            ColumnConstraints column = new ColumnConstraints();
            column.setPercentWidth(100.0 / COLUMNS);
            grid.getColumnConstraints().add(column);
        }
        for (int r = 0; r < 2; r++) {
            RowConstraints row = new RowConstraints();
            row.setPercentHeight(50);
            row.setVgrow(Priority.ALWAYS);
            grid.getRowConstraints().add(row);
        }
        VBox.setVgrow(grid, Priority.ALWAYS);
        getChildren().addAll(line, grid);
    }

    /** A press shows what a family would do and is one step of undo once it has become a click. */
    private final class Actions implements TileActions {
        @Override
        public void preview(CopulaFamily family) {
            press = new Object();
            set(family);
        }

        @Override
        public void take(CopulaFamily family) {
            set(family);
            press = null;
        }

        @Override
        public void giveUp(CopulaFamily family) {
            session.giveUp(press);
            press = null;
        }

        private void set(CopulaFamily family) {
            if (family.hasStrength()) {
                session.setFamily(family, press);
            } else {
                session.edit("independence", press, d -> d.withPortfolio(p -> p.set("dependence.copula", Map.of("family", "independence"))));
            }
        }
    }

    /** The families of the tiles; Student with the degrees of freedom of the file. */
    static List<CopulaFamily> families(TauState tau) {
        double freedom = tau.family() != null && tau.family().kind() == CopulaFamily.Kind.STUDENT ? tau.family().degreesOfFreedom() : USUAL_FREEDOM;
        return Stream.of(CopulaFamily.parse("gumbel"), CopulaFamily.parse("survival-clayton"), CopulaFamily.parse("joe"),
                new CopulaFamily(CopulaFamily.Kind.STUDENT, false, freedom), CopulaFamily.parse("gaussian"), CopulaFamily.parse("frank"), CopulaFamily.parse("clayton"),
                CopulaFamily.parse("independence")).toList();
    }

    private static Copula at(CopulaFamily family, double tau, int perils) {
        if (!family.hasStrength()) {
            return new Independence();
        }
        return family.tauRange(perils).contains(tau) ? family.at(tau) : null;
    }

    void stop() {
        session.background().stop(WORK);
    }

    /** Prices the families behind, unless that has been done for this treaty. */
    void price(LivePrices prices, TauState tau) {
        Treaty treaty = prices.treaty();
        if (!tau.turns() || treaty == pricedOf) {
            return;
        }
        session.background().follow(WORK, PATIENCE, REST, control -> priced(treaty, tau, control), found -> {
            priced = found;
            pricedOf = treaty;
            show(session.prices().get(), session.tau().get());
        });
    }

    /** On the thread of this work alone. */
    private Map<CopulaFamily, List<LiveLayer>> priced(Treaty treaty, TauState tau, RunControl control) {
        pricing = pricing == null ? new LivePricing(treaty, LivePricing.shortRun()) : pricing.of(treaty);
        List<CopulaFamily> families = families(tau).stream().filter(f -> at(f, tau.tau(), tau.perils()) != null).toList();
        List<List<LiveLayer>> layers = pricing.along(families.stream().map(f -> at(f, tau.tau(), tau.perils())).toList(), control);
        Map<CopulaFamily, List<LiveLayer>> found = new HashMap<>();
        for (int k = 0; k < families.size(); k++) {
            found.put(families.get(k), layers.get(k));
        }
        return found;
    }

    void show(LivePrices prices, TauState tau) {
        boolean any = tau.turns();
        setVisible(any);
        setManaged(any);
        if (!any) {
            return;
        }
        int layer = Math.max(0, Math.min(prices.layers().size() - 1, session.selectedLayer().get()));
        head.setText(String.format(Locale.ROOT, "Family: the shape of years at τ %.2f", tau.tau()).replace('-', '−'));
        layerName.setText(prices.layers().get(layer).name() + " at this τ");
        List<CopulaFamily> families = families(tau);
        boolean independent = prices.treaty().portfolio().dependence().copula() instanceof Independence;
        for (int k = 0; k < families.size(); k++) {
            CopulaFamily family = families.get(k);
            boolean taken = family.hasStrength() ? family.equals(tau.family()) && !independent : independent;
            Copula pair = at(family, tau.tau(), 2);
            String reason = at(family, tau.tau(), tau.perils()) != null ? "" : tau.tau() < 0 ? "only from τ 0 up" : "not at this τ";
            Figure figure = figure(prices, family, layer, taken);
            String name = family.hasStrength() ? FamilyName.of(family) : "Independence";
            double upper = pair == null ? 0 : pair.upperTail(0, 1);
            tiles.get(k).show(new FamilyShape(family, name, pair, upper, figure == null ? "" : FigureShown.percent(figure).text(), taken || prices.treaty() == pricedOf, taken, reason));
            tiles.get(k).hover(hover(name, family, pair, prices.layers().get(layer).name(), figure));
        }
    }

    /** The present family's figure is the one of the strip; the others come from behind. */
    private Figure figure(LivePrices prices, CopulaFamily family, int layer, boolean taken) {
        if (taken) {
            return prices.layers().get(layer).lossOnLine();
        }
        List<LiveLayer> layers = priced.get(family);
        return layers == null || layer >= layers.size() ? null : layers.get(layer).figures().lossOnLine();
    }

    private static String hover(String name, CopulaFamily family, Copula pair, String layer, Figure figure) {
        StringBuilder words = new StringBuilder(name);
        if (pair != null && family.hasStrength()) {
            words.append(String.format(Locale.ROOT, "%nλU %.4g: chance that one peril's year is extreme given that the other's is%nλL %.4g: the same of extremely good years",
                    pair.upperTail(0, 1), pair.lowerTail(0, 1)));
        }
        if (figure != null) {
            words.append("\nloss on line of ").append(layer).append(": ").append(FigureShown.allDigits(figure));
        }
        return words.append("\nContours enclose 10 to 96 % of all years, with normal margins; the dashed corner is a year of 1 in 10 for both.").toString();
    }
}
