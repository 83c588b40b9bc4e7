package layerweft.desktop.sensitivity;

import java.time.Duration;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import javafx.beans.property.ReadOnlyObjectWrapper;
import javafx.beans.value.ObservableValue;
import javafx.scene.Node;
import javafx.scene.control.ComboBox;
import javafx.scene.control.Label;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;
import javafx.scene.shape.Line;
import javafx.util.StringConverter;
import layerweft.desktop.Reading;
import layerweft.desktop.Room;
import layerweft.desktop.RoomTools;
import layerweft.desktop.control.ChartView;
import layerweft.desktop.control.FigureTable;
import layerweft.desktop.control.Panel;
import layerweft.desktop.control.SegmentedSwitch;
import layerweft.desktop.session.FigureShown;
import layerweft.desktop.session.LivePrices;
import layerweft.desktop.session.Session;
import layerweft.desktop.session.TauState;
import layerweft.engine.bounds.LayerRange;
import layerweft.engine.simulation.SimulationSettings;
import layerweft.figures.Figure;
import layerweft.figures.LayerFigures;
import layerweft.model.copula.CopulaFamily;
import layerweft.model.treaty.LayerTerms;
import layerweft.model.treaty.Treaty;
import layerweft.report.chart.ChartExport;
import layerweft.report.chart.GaugeChart;
import layerweft.report.chart.RankingChart;
import layerweft.report.chart.SensitivityChart;
import layerweft.study.Bounds;
import layerweft.study.FigureKind;
import layerweft.study.Ranking;
import layerweft.study.Sensitivity;

/** How far τ, the family, any dependence at all and every other assumption move one figure of the selected layer. */
public final class SensitivityRoom implements Room {
    private static final Duration REST = Duration.ofMillis(300);
    private static final SimulationSettings SIMULATED = new SimulationSettings(50_000, SimulationSettings.usual().seed(), SimulationSettings.usual().threads());

    private final RoomTools tools;
    private final Session session;
    private final ComboBox<FigureKind> figure = new ComboBox<>();
    private final Label of = new Label();
    private final SegmentedSwitch<Boolean> scope = new SegmentedSwitch<>(List.of(false, true), all -> all ? "All dependence" : "Families");
    private final ChartView gauge;
    private final ChartView curves;
    private final ChartView ranking;
    private final FigureTable table = new FigureTable(1);
    private final Panel tablePanel = new Panel("", table);
    private final Panel rankingPanel;
    private final Label still = new Label();
    private final VBox left;
    private final HBox view;
    private final ReadOnlyObjectWrapper<Reading> reading = new ReadOnlyObjectWrapper<>(Reading.EMPTY);
    private SweptFamilies swept;
    private Bounds bounds;
    private boolean shown;

    public SensitivityRoom(RoomTools tools) {
        this.tools = tools;
        this.session = tools.session();
        figure.getItems().setAll(FigureKind.values());
        figure.setValue(FigureKind.LOSS_ON_LINE);
        figure.setConverter(new StringConverter<>() {
            @Override
            public String toString(FigureKind kind) {
                return kind == null ? "" : kind.words().substring(0, 1).toUpperCase(Locale.ROOT) + kind.words().substring(1);
            }

            @Override
            public FigureKind fromString(String text) {
                throw new UnsupportedOperationException("the list of figures is not typed into");
            }
        });
        figure.setAccessibleText("Figure");
        of.getStyleClass().add("lw-label");
        still.getStyleClass().add("lw-note");
        still.setWrapText(true);
        gauge = new ChartView(tools.theme()).captioned(() -> caption("What any dependence could do"));
        curves = new ChartView(tools.theme()).captioned(() -> caption(curves().title()));
        ranking = new ChartView(tools.theme()).captioned(() -> caption("What moves the price most"));
        gauge.setMinWidth(136);
        gauge.setPrefWidth(136);
        Region gap = new Region();
        HBox.setHgrow(gap, Priority.ALWAYS);
        HBox head = new HBox(figure, of, gap, scope);
        head.getStyleClass().add("lw-controls");
        HBox charts = new HBox(gauge, curves);
        charts.getStyleClass().add("lw-charts");
        HBox.setHgrow(curves, Priority.ALWAYS);
        VBox.setVgrow(charts, Priority.ALWAYS);
        VBox inside = new VBox(head, still, charts);
        inside.getStyleClass().add("lw-column-tight");
        Panel main = new Panel(inside);
        VBox.setVgrow(main, Priority.ALWAYS);
        left = new VBox(main, tablePanel);
        left.getStyleClass().add("lw-column");
        HBox.setHgrow(left, Priority.ALWAYS);
        rankingPanel = new Panel("What moves the price most", ranking);
        rankingPanel.setPrefWidth(420);
        rankingPanel.setMinWidth(330);
        view = new HBox(left, rankingPanel);
        view.getStyleClass().add("lw-row");
        figure.valueProperty().addListener((is, was, now) -> changed());
        scope.value().addListener((is, was, now) -> show());
        session.prices().addListener((is, was, now) -> show());
        session.pinned().addListener((is, was, now) -> show());
        session.selectedLayer().addListener((is, was, now) -> {
            show();
            rank();
        });
        session.treaty().addListener((is, was, now) -> changed());
        session.dataRange().addListener((is, was, now) -> show());
    }

    private SensitivityChart curves() {
        return (SensitivityChart) curves.picture().get();
    }

    private ChartExport.Caption caption(String title) {
        return new ChartExport.Caption(title, reading.get().text(),
                List.of(session.document().get().name(), "seed " + SIMULATED.seed() + " where simulated", "engine: transform where it can price the layer"));
    }

    private int chosen(LivePrices prices) {
        return Math.max(0, Math.min(prices.layers().size() - 1, session.selectedLayer().get()));
    }

    @Override
    public void entered() {
        shown = true;
        changed();
    }

    @Override
    public void left() {
        shown = false;
        session.background().stop("Sweeping families");
        session.background().stop("Bounds");
        session.background().stop("Ranking");
    }

    /** Computes again what the change has made another, as long as somebody looks. */
    private void changed() {
        Treaty treaty = session.treaty().get();
        if (!shown || treaty == null) {
            return;
        }
        FigureKind kind = figure.getValue();
        if (treaty.portfolio().perils().size() > 1 && (swept == null || !swept.fits(treaty, kind))) {
            swept = null;
            bounds = null;
            session.background().runAfter(REST, "Sweeping families", control -> SweptFamilies.of(treaty, kind, control), found -> {
                swept = found;
                show();
            });
            session.background().runAfter(REST, "Bounds", control -> Bounds.of(treaty, control), found -> {
                bounds = found;
                show();
            });
        }
        rank();
        show();
    }

    private void rank() {
        Treaty treaty = session.treaty().get();
        LivePrices prices = session.prices().get();
        if (!shown || treaty == null || prices == null || prices.treaty() != treaty) {
            return;
        }
        String layer = treaty.layer(chosen(prices)).name();
        FigureKind kind = figure.getValue();
        session.background().runAfter(REST, "Ranking", control -> Ranking.of(treaty, Optional.of(layer), kind, SIMULATED, control), this::showRanking);
    }

    private void showRanking(Ranking found) {
        double scale = SweptFamilies.scale(found.figure());
        double base = scale * found.base().value();
        List<RankingChart.Bar> bars = new ArrayList<>();
        for (Sensitivity s : found.sensitivities()) {
            double end = scale * s.value().value();
            if (Double.isFinite(end) && Double.isFinite(base)) {
                int peril = found.treaty().portfolio().indexOf(s.subject());
                int colour = peril >= 0 ? peril : s.lever() == Sensitivity.Lever.FAMILY ? -2 : -1;
                String name = peril >= 0 ? s.subject() + " " + s.lever().words() : sentence(s.lever().words());
                String text = shown(s.value()).value();
                bars.add(new RankingChart.Bar(name, s.step(), colour, Math.min(base, end), Math.max(base, end), end < base ? text : "", end < base ? "" : text));
            }
        }
        rankingPanel.note().set(found.layer().orElse(""));
        ranking.picture().set(new RankingChart("What moves the price most", base, shown(found.base()).text(), bars));
    }

    private static String sentence(String words) {
        return words.substring(0, 1).toUpperCase(Locale.ROOT) + words.substring(1);
    }

    private FigureShown shown(Figure value) {
        return switch (figure.getValue().measured()) {
            case AS_PART -> FigureShown.percent(value);
            case IN_MONEY, PLAINLY -> FigureShown.of(value, "");
        };
    }

    private void show() {
        LivePrices prices = session.prices().get();
        TauState tau = session.tau().get();
        if (prices == null || tau == null) {
            return;
        }
        int j = chosen(prices);
        LayerFigures layer = prices.layers().get(j);
        FigureKind kind = figure.getValue();
        Figure now = kind.of(layer);
        of.setText("of " + layer.name() + " against τ");
        String reason = prices.treaty().portfolio().perils().size() == 1 ? "One peril: there is no copula to move it."
                : swept == null ? "" : swept.layer(j).still().map(r -> "No copula moves it: " + r + ".").orElse("");
        still.setText(reason);
        still.setVisible(!reason.isEmpty());
        still.setManaged(!reason.isEmpty());
        if (swept == null || !swept.fits(prices.treaty(), kind)) {
            reading.set(Reading.of(sentence(kind.words()) + " of " + layer.name() + " is ").strong(shown(now).text()).plain("."));
            curves.picture().set(null);
            table.show(List.of(""), List.of());
            gauge.picture().set(null);
            return;
        }
        double scale = SweptFamilies.scale(kind);
        List<SensitivityChart.Line> lines = swept.lines(j, tau.family());
        LayerRange range = bounds == null ? null : bounds.layers().get(j).range();
        double perUnit = perUnit(prices.treaty(), j, kind);
        boolean all = scope.value().get() && range != null && Double.isFinite(perUnit);
        SensitivityChart.Pinned pinned = session.pinned().get() == null ? null : session.pinned().get().layer(layer.name())
                .map(l -> new SensitivityChart.Pinned(session.pinned().get().tau().tau(), scale * kind.of(l).value(), shown(kind.of(l)).value())).orElse(null);
        boolean data = session.dataRange().get() != null;
        curves.picture().set(new SensitivityChart(sentence(kind.words()) + " of " + layer.name() + " against Kendall's τ", kind.measured() == FigureKind.Measured.AS_PART ? "%" : "",
                lines, tau.tau(), scale * now.value(), shown(now).text(), scale * kind.of(swept.layer(j).independent()).value(),
                scale * swept.layer(j).comonotoneValue().value(), List.of(), data ? session.dataRange().get().low() : Double.NaN,
                data ? session.dataRange().get().high() : Double.NaN, pinned, all ? perUnit * range.lowest() : Double.NaN, all ? perUnit * range.highest() : Double.NaN));
        gauge(prices, j, range, perUnit, lines, scale * now.value());
        showTable(lines, j, tau);
        double[] spread = swept.spread(j, tau.tau());
        if (swept.layer(j).still().isPresent()) {
            reading.set(Reading.of(layer.name() + " stays at ").strong(shown(now).text()).plain(" under every copula."));
        } else {
            reading.set(Reading.of(String.format(Locale.ROOT, "At τ %.2f the family moves %s between ", tau.tau(), layer.name()))
                    .strong(plain(spread[0])).plain(" and ").strong(plain(spread[1]) + (kind.measured() == FigureKind.Measured.AS_PART ? FigureShown.THIN_SPACE + "%" : "")).plain("."));
        }
    }

    private static String plain(double value) {
        return String.format(Locale.ROOT, Math.abs(value) >= 100 ? "%,.0f" : Math.abs(value) >= 10 ? "%.1f" : "%.2f", value);
    }

    /** What a unit of expected loss is in the figure shown; NaN for figures without bounds. */
    private static double perUnit(Treaty treaty, int j, FigureKind kind) {
        LayerTerms terms = treaty.layer(j).terms();
        return switch (kind) {
            case EXPECTED_LOSS -> 1;
            case LOSS_ON_LINE -> terms.line() < Double.POSITIVE_INFINITY ? 100 / (treaty.layer(j).share() * terms.line()) : Double.NaN;
            default -> Double.NaN;
        };
    }

    private void gauge(LivePrices prices, int j, LayerRange range, double perUnit, List<SensitivityChart.Line> lines, double now) {
        String reason = Double.isNaN(perUnit) ? "of the expected loss only" : bounds == null ? "" : range == null ? bounds.layers().get(j).note() : "";
        if (bounds == null && reason.isEmpty()) {
            gauge.picture().set(null);
            return;
        }
        double low = lines.stream().flatMap(l -> l.values().stream()).filter(Double::isFinite).min(Comparator.naturalOrder()).orElse(0.0);
        double high = lines.stream().flatMap(l -> l.values().stream()).filter(Double::isFinite).max(Comparator.naturalOrder()).orElse(1.0);
        gauge.picture().set(range == null || !reason.isEmpty() ? new GaugeChart(reason, 0, 0, 0, 0, 0, 0, 0, 0)
                : new GaugeChart("", perUnit * range.lowest(), perUnit * range.attainedLow(), perUnit * range.comonotone(), perUnit * range.attainedHigh(),
                        perUnit * range.highest(), now, low, high));
    }

    private void showTable(List<SensitivityChart.Line> lines, int j, TauState tau) {
        List<SensitivityChart.Line> sorted = new ArrayList<>(lines);
        int column = (int) Math.round(Math.max(0, Math.min(0.9, tau.tau())) * 10);
        sorted.sort(Comparator.comparingDouble((SensitivityChart.Line l) -> l.values().get(SweptFamilies.TAUS.indexOf(SweptFamilies.SHOWN.get(column)))).reversed());
        List<String> header = new ArrayList<>(List.of(""));
        SweptFamilies.SHOWN.forEach(t -> header.add(String.format(Locale.ROOT, "%.1f", t)));
        List<List<String>> rows = new ArrayList<>();
        for (SensitivityChart.Line line : sorted) {
            List<String> row = new ArrayList<>(List.of(line.name()));
            SweptFamilies.SHOWN.forEach(t -> row.add(plain(line.values().get(SweptFamilies.TAUS.indexOf(t)))));
            rows.add(row);
        }
        tablePanel.title().set(sentence(figure.getValue().words()) + " by family and τ");
        tablePanel.note().set((figure.getValue().measured() == FigureKind.Measured.AS_PART ? "%" : "")
                + (swept.layer(j).refusals().isEmpty() ? "" : "; simulated, " + swept.layer(j).refusals().get(0)));
        table.show(header, rows);
        table.warm(column + 1);
        for (int r = 0; r < sorted.size(); r++) {
            table.mark(r, sample(sorted.get(r)));
            if (sorted.get(r).chosen()) {
                table.choose(r);
            }
        }
        if (sorted.stream().noneMatch(SensitivityChart.Line::chosen)) {
            table.choose(-1);
        }
        table.onChoose(r -> session.setFamily(sorted.get(r).family()));
    }

    private Node sample(SensitivityChart.Line line) {
        Line sample = new Line(0, 0, 28, 0);
        sample.getStyleClass().addAll("lw-family-line", "lw-family-" + place(line.family()));
        if (!line.solid()) {
            sample.getStrokeDashArray().setAll(7.0, 4.0);
        }
        return sample;
    }

    /** The place of a family among the eight colours. */
    private static int place(CopulaFamily family) {
        return switch (family.kind()) {
            case GUMBEL -> 1;
            case STUDENT -> 2;
            case FRANK -> 3;
            case CLAYTON -> family.survival() ? 4 : 7;
            case JOE -> 5;
            case GAUSSIAN -> 6;
            case INDEPENDENCE, COMONOTONIC, COUNTERMONOTONIC -> 8;
        };
    }

    @Override
    public String name() {
        return "Sensitivity";
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
