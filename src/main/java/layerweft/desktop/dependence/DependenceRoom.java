package layerweft.desktop.dependence;

import java.awt.geom.Rectangle2D;
import java.time.Duration;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.stream.Stream;
import javafx.beans.property.ReadOnlyObjectWrapper;
import javafx.beans.value.ObservableValue;
import javafx.geometry.Pos;
import javafx.scene.Node;
import javafx.scene.control.ComboBox;
import javafx.scene.control.Label;
import javafx.scene.layout.ColumnConstraints;
import javafx.scene.layout.GridPane;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import javafx.scene.layout.RowConstraints;
import javafx.scene.layout.VBox;
import layerweft.desktop.Reading;
import layerweft.desktop.Room;
import layerweft.desktop.RoomTools;
import layerweft.desktop.control.ChartView;
import layerweft.desktop.control.FigureTable;
import layerweft.desktop.control.Panel;
import layerweft.desktop.control.SegmentedSwitch;
import layerweft.desktop.session.FamilyName;
import layerweft.desktop.session.FigureShown;
import layerweft.desktop.session.LivePrices;
import layerweft.desktop.session.Session;
import layerweft.desktop.session.TauState;
import layerweft.figures.Figure;
import layerweft.figures.FigureText;
import layerweft.model.copula.Copula;
import layerweft.model.copula.CopulaFamily;
import layerweft.model.copula.Independence;
import layerweft.model.portfolio.Dependence;
import layerweft.model.portfolio.Peril;
import layerweft.model.portfolio.Portfolio;
import layerweft.model.treaty.Treaty;
import layerweft.report.chart.FamilyTileChart;
import layerweft.report.chart.JointYearsChart;
import layerweft.study.BadYears;
import layerweft.study.CopulaDensity;
import layerweft.study.CountConcordance;
import layerweft.study.JointYears;
import layerweft.study.LiveLayer;
import layerweft.study.LivePricing;

/** The families at the present τ, the joint years of two perils, how often both are bad, and what the counts make of it. */
public final class DependenceRoom implements Room {
    private static final List<CopulaFamily> TILES = Stream.of("gumbel", "survival-clayton", "joe", "student:4", "gaussian", "frank", "clayton", "independence")
            .map(CopulaFamily::parse).toList();
    private static final int YEARS = 4_000;
    private static final long SEED = 1;
    private static final int CELLS = 72;
    private static final double REACH = 3.1;
    private static final List<Double> PERIODS = List.of(10.0, 50.0, 100.0, 200.0);
    private static final double LEAST_CORNER = 5;
    private static final double MOST_CORNER = 100;
    private static final Duration REST = Duration.ofMillis(60);

    private final Session session;
    private final List<FamilyTile> tiles = new ArrayList<>();
    private final ComboBox<String> first = new ComboBox<>();
    private final ComboBox<String> second = new ComboBox<>();
    private final SegmentedSwitch<Boolean> ranks = new SegmentedSwitch<>(List.of(false, true), r -> r ? "Rank" : "Return period");
    private final SegmentedSwitch<String> links = new SegmentedSwitch<>(List.of("counts", "annualTotals"), l -> l.equals("counts") ? "Counts" : "Annual totals");
    private final ChartView years;
    private final FigureTable bad = new FigureTable(1);
    private final FigureTable facts = new FigureTable(1);
    private final FigureTable pairs = new FigureTable(1);
    private final Label count = new Label();
    private final Label pairsNote = new Label();
    private final Panel badPanel = new Panel("Bad years together", bad);
    private final Label tilesHead = new Label();
    private final HBox view;
    private final ReadOnlyObjectWrapper<Reading> reading = new ReadOnlyObjectWrapper<>(Reading.EMPTY);
    private final Map<CopulaFamily, CopulaDensity> densities = new HashMap<>();
    private final Map<CopulaFamily, Figure> figures = new HashMap<>();
    private double densitiesAt = Double.NaN;
    private double corner = 10;
    private boolean shown;
    private boolean filling;

    public DependenceRoom(RoomTools tools) {
        this.session = tools.session();
        GridPane grid = new GridPane();
        grid.getStyleClass().add("lw-tiles");
        for (int k = 0; k < TILES.size(); k++) {
            FamilyTile tile = new FamilyTile(tools.theme());
            tiles.add(tile);
            grid.add(tile, k % 4, k / 4);
        }
        for (int c = 0; c < 4; c++) {
            ColumnConstraints column = new ColumnConstraints();
            column.setPercentWidth(25);
            grid.getColumnConstraints().add(column);
        }
        for (int r = 0; r < 2; r++) {
            RowConstraints row = new RowConstraints();
            row.setPercentHeight(50);
            row.setVgrow(Priority.ALWAYS);
            grid.getRowConstraints().add(row);
        }
        tilesHead.getStyleClass().add("lw-panel-title");
        VBox.setVgrow(grid, Priority.ALWAYS);
        VBox left = new VBox(tilesHead, grid, badPanel);
        left.getStyleClass().add("lw-column-tight");

        years = new ChartView(tools.theme());
        years.setOnMouseDragged(drag -> moveCorner(drag.getX(), drag.getY()));
        HBox.setHgrow(years, Priority.ALWAYS);
        Label title = new Label("Both bad");
        title.getStyleClass().addAll("lw-panel-title", "lw-warm-text");
        count.setWrapText(true);
        Label note = new Label("The copula joins annual counts or totals. Ties between counts make their own rank correlation differ from the latent τ. Drag the warm corner.");
        note.getStyleClass().add("lw-note");
        note.setWrapText(true);
        VBox words = new VBox(title, count, facts, note);
        words.getStyleClass().add("lw-column-tight");
        words.setMinWidth(210);
        words.setPrefWidth(250);
        HBox inside = new HBox(years, words);
        inside.getStyleClass().add("lw-row");
        Label of = new Label("Years of");
        of.getStyleClass().add("lw-panel-title");
        first.setAccessibleText("First peril");
        second.setAccessibleText("Second peril");
        HBox chooser = new HBox(of, first, new Label("×"), second);
        chooser.getStyleClass().add("lw-controls");
        chooser.setAlignment(Pos.CENTER_LEFT);
        Region gap = new Region();
        HBox.setHgrow(gap, Priority.ALWAYS);
        chooser.getChildren().addAll(gap, ranks);
        VBox.setVgrow(inside, Priority.ALWAYS);
        VBox yearsBox = new VBox(chooser, inside);
        yearsBox.getStyleClass().add("lw-column-tight");
        Panel yearsPanel = new Panel(yearsBox);
        VBox.setVgrow(yearsPanel, Priority.ALWAYS);

        pairsNote.getStyleClass().add("lw-note");
        pairsNote.setWrapText(true);
        Label linked = new Label("Links");
        linked.getStyleClass().add("lw-label");
        HBox linksRow = new HBox(linked, links);
        linksRow.getStyleClass().add("lw-controls");
        VBox pairsBox = new VBox(pairs, pairsNote, linksRow);
        pairsBox.getStyleClass().add("lw-column-tight");
        Panel pairsPanel = new Panel("Pairs", pairsBox);
        pairsPanel.note().set("above: latent τ, below: counts’ τ-b");
        VBox right = new VBox(yearsPanel, pairsPanel);
        right.getStyleClass().add("lw-column");
        HBox.setHgrow(left, Priority.ALWAYS);
        HBox.setHgrow(right, Priority.ALWAYS);
        left.setPrefWidth(640);
        right.setPrefWidth(660);
        view = new HBox(left, right);
        view.getStyleClass().add("lw-row");

        first.valueProperty().addListener((is, was, now) -> chosen());
        second.valueProperty().addListener((is, was, now) -> chosen());
        ranks.value().addListener((is, was, now) -> show());
        links.value().addListener((is, was, now) -> {
            if (!filling && session.document().get().portfolio().has("dependence")) {
                session.edit("change of links", d -> d.withPortfolio(t -> t.set("dependence.links", now)));
            }
        });
        session.prices().addListener((is, was, now) -> changed());
        session.selectedLayer().addListener((is, was, now) -> changed());
    }

    @Override
    public void entered() {
        shown = true;
        changed();
    }

    @Override
    public void left() {
        shown = false;
    }

    private void chosen() {
        if (!filling) {
            show();
        }
    }

    private void moveCorner(double x, double y) {
        if (years.picture().get() instanceof JointYearsChart chart) {
            var square = chart.square(new Rectangle2D.Double(0, 0, years.getWidth(), years.getHeight()));
            double part = Math.max((x - square.getX()) / square.getWidth(), (square.getMaxY() - y) / square.getHeight());
            double wished = chart.returnPeriod(Math.max(0.01, Math.min(0.999, part)));
            corner = Math.rint(Math.max(LEAST_CORNER, Math.min(MOST_CORNER, wished)));
            show();
        }
    }

    /** Another treaty, τ or layer: shapes and figures of the families at the same τ are computed behind. */
    private void changed() {
        LivePrices prices = session.prices().get();
        TauState tau = session.tau().get();
        if (!shown || prices == null || tau == null) {
            return;
        }
        fillPerils(prices.treaty().portfolio());
        show();
        if (!tau.turns()) {
            return;
        }
        double at = tau.tau();
        if (at != densitiesAt) {
            session.background().runAfter(REST, "Shapes of the families", control -> shapes(at), found -> {
                densities.clear();
                densities.putAll(found);
                densitiesAt = at;
                show();
            });
        }
        Treaty treaty = prices.treaty();
        int layer = selected(prices);
        session.background().runAfter(Duration.ofMillis(150), "Families at the same τ", control -> {
            Map<CopulaFamily, Figure> found = new HashMap<>();
            LivePricing pricing = new LivePricing(treaty, LivePricing.shortRun());
            for (CopulaFamily family : TILES) {
                if (can(family, at, treaty.portfolio().perils().size())) {
                    List<LiveLayer> priced = pricing.with(family.hasStrength() ? family.at(at) : new Independence()).price(control);
                    found.put(family, priced.get(layer).figures().lossOnLine());
                }
            }
            return found;
        }, found -> {
            figures.clear();
            figures.putAll(found);
            show();
        });
    }

    private static boolean can(CopulaFamily family, double tau, int perils) {
        return !family.hasStrength() || family.tauRange(perils).contains(tau);
    }

    private static Map<CopulaFamily, CopulaDensity> shapes(double tau) {
        Map<CopulaFamily, CopulaDensity> found = new HashMap<>();
        for (CopulaFamily family : TILES) {
            if (can(family, tau, 2)) {
                found.put(family, CopulaDensity.of(family.hasStrength() ? family.at(tau) : new Independence(), CELLS, REACH));
            }
        }
        return found;
    }

    private int selected(LivePrices prices) {
        return Math.max(0, Math.min(prices.layers().size() - 1, session.selectedLayer().get()));
    }

    private void fillPerils(Portfolio portfolio) {
        List<String> names = portfolio.perils().stream().map(Peril::name).toList();
        if (!names.equals(first.getItems())) {
            filling = true;
            String a = first.getValue();
            String b = second.getValue();
            first.getItems().setAll(names);
            second.getItems().setAll(names);
            first.setValue(names.contains(a) ? a : names.get(0));
            second.setValue(names.contains(b) && !first.getValue().equals(b) ? b : names.get(Math.min(1, names.size() - 1)));
            filling = false;
        }
    }

    private void show() {
        LivePrices prices = session.prices().get();
        TauState tau = session.tau().get();
        if (prices == null || tau == null) {
            return;
        }
        Portfolio portfolio = prices.treaty().portfolio();
        filling = true;
        links.value().set(portfolio.dependence().links() == Dependence.Links.COUNTS ? "counts" : "annualTotals");
        filling = false;
        if (!tau.turns()) {
            reading.set(Reading.of("One peril: there is nothing to depend on. Add a peril in Perils."));
            tiles.forEach(tile -> tile.setVisible(false));
            tilesHead.setText("");
            return;
        }
        String layer = prices.layers().get(selected(prices)).name();
        tilesHead.setText(String.format(Locale.ROOT, "Family: the shape of years at τ %.2f, with the loss on line of %s", tau.tau(), layer));
        for (int k = 0; k < TILES.size(); k++) {
            tile(tiles.get(k), TILES.get(k), tau, portfolio);
        }
        int i = portfolio.indexOf(first.getValue());
        int j = portfolio.indexOf(second.getValue());
        if (i < 0 || j < 0 || i == j) {
            count.setText("Choose two different perils.");
            return;
        }
        Copula pair = portfolio.dependence().copula().pair(i, j);
        JointYears drawn = JointYears.of(pair, YEARS, SEED);
        years.picture().set(new JointYearsChart(first.getValue(), second.getValue(), drawn, corner, ranks.value().get()));
        count.setText(String.format(Locale.ROOT, "%,d of these %,d years lie in the shaded corner (both 1 in %.0f or worse); independence: %.0f.", drawn.bothBeyond(corner), YEARS, corner,
                YEARS / (corner * corner)));
        showFacts(pair, portfolio, i, j);
        showBad(pair, tau);
        showPairs(portfolio);
        double both = BadYears.bothBeyond(pair, 50);
        reading.set(Reading.of(first.getValue() + " and " + second.getValue() + " both have a 1-in-50 year ").strong("once in " + years(1 / both) + " years")
                .plain("; were they independent, once in 2,500."));
    }

    private void tile(FamilyTile tile, CopulaFamily family, TauState tau, Portfolio portfolio) {
        boolean possible = can(family, tau.tau(), portfolio.perils().size());
        boolean same = densitiesAt == tau.tau();
        tile.setVisible(true);
        tile.setDisable(!possible);
        Figure figure = figures.get(family);
        boolean chosen = family.equals(tau.family()) || !family.hasStrength() && portfolio.dependence().copula() instanceof Independence;
        String lambda = possible && family.hasStrength() ? "λU " + digits(family.at(tau.tau()).upperTail(0, 1)) : possible ? "λU 0" : "cannot have this τ";
        tile.show(new FamilyTileChart(family, FamilyName.of(family), same || densities.containsKey(family) ? densities.get(family) : null, corner), lambda,
                figure == null ? "" : FigureShown.percent(figure).text(), chosen, () -> {
                    if (family.hasStrength()) {
                        session.setFamily(family);
                    } else {
                        session.edit("independence", d -> d.withPortfolio(t -> t.set("dependence.copula", Map.of("family", "independence"))));
                    }
                });
    }

    private static String digits(double value) {
        return FigureText.plain(Math.round(100 * value) / 100.0);
    }

    private static String years(double value) {
        return Double.isInfinite(value) || value > 1e9 ? "∞" : FigureText.groupedPlain(Double.parseDouble(String.format(Locale.ROOT, "%.3g", value)));
    }

    private void showFacts(Copula pair, Portfolio portfolio, int i, int j) {
        boolean counts = portfolio.dependence().links() == Dependence.Links.COUNTS;
        double tauB = counts ? CountConcordance.tauB(pair, portfolio.perils().get(i).frequency(), portfolio.perils().get(j).frequency()) : Double.NaN;
        double tau = pair instanceof Independence ? 0 : pair.kendallTau(0, 1);
        List<List<String>> rows = new ArrayList<>();
        rows.add(List.of("latent τ", digits(tau)));
        rows.add(List.of("counts’ τ-b", Double.isNaN(tauB) ? "—" : digits(tauB)));
        rows.add(List.of("upper tail λU", digits(pair.upperTail(0, 1))));
        rows.add(List.of("lower tail λL", digits(pair.lowerTail(0, 1))));
        facts.show(List.of("", ""), rows);
    }

    private void showBad(Copula pair, TauState tau) {
        double at = pair instanceof Independence ? tau.tau() : pair.kendallTau(0, 1);
        List<CopulaFamily> families = TILES.stream().filter(CopulaFamily::hasStrength).toList();
        List<BadYears> rows = BadYears.ofFamilies(families, at, PERIODS, 50);
        List<List<String>> cells = new ArrayList<>();
        for (BadYears row : rows) {
            List<String> line = new ArrayList<>(List.of(FamilyName.of(CopulaFamily.parse(row.label()))));
            line.add(String.format(Locale.ROOT, row.timesIndependent(50) >= 10 ? "%.0f×" : "%.1f×", row.timesIndependent(50)));
            PERIODS.forEach(t -> line.add(years(1 / row.chance(t))));
            cells.add(line);
        }
        List<String> header = new ArrayList<>(List.of("family", "more often"));
        PERIODS.forEach(t -> header.add(String.format(Locale.ROOT, "1 in %.0f", t)));
        badPanel.note().set(String.format(Locale.ROOT, "both at least this bad, τ %.2f: once in … years", at));
        bad.show(header, cells);
        int present = -1;
        for (int r = 0; r < rows.size(); r++) {
            present = rows.get(r).label().equals(pair.label()) ? r : present;
        }
        bad.choose(present);
        bad.onChoose(r -> {
            CopulaFamily family = CopulaFamily.parse(rows.get(r).label());
            if (family.hasStrength()) {
                session.setFamily(family);
            }
        });
    }

    private void showPairs(Portfolio portfolio) {
        List<Peril> perils = portfolio.perils();
        int n = Math.min(8, perils.size());
        boolean counts = portfolio.dependence().links() == Dependence.Links.COUNTS;
        Copula copula = portfolio.dependence().copula();
        List<String> header = new ArrayList<>(List.of(""));
        List<List<String>> rows = new ArrayList<>();
        for (int i = 0; i < n; i++) {
            header.add(perils.get(i).name());
            List<String> row = new ArrayList<>(List.of(perils.get(i).name()));
            for (int j = 0; j < n; j++) {
                if (i == j) {
                    row.add("");
                } else if (j > i) {
                    row.add(digits(copula instanceof Independence ? 0 : copula.kendallTau(i, j)));
                } else {
                    double tauB = counts ? CountConcordance.tauB(copula.pair(j, i), perils.get(j).frequency(), perils.get(i).frequency()) : Double.NaN;
                    row.add(Double.isNaN(tauB) ? "—" : digits(tauB));
                }
            }
            rows.add(row);
        }
        pairs.show(header, rows);
        pairsNote.setText(perils.size() > n ? "The first eight perils." : "The strength is turned in the strip below; pairs that differ are scaled together.");
    }

    @Override
    public String name() {
        return "Dependence";
    }

    @Override
    public Node view() {
        return view;
    }

    @Override
    public ObservableValue<Reading> reading() {
        return reading.getReadOnlyProperty();
    }
}
