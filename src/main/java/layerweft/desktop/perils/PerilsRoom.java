package layerweft.desktop.perils;

import java.time.Duration;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.function.DoubleUnaryOperator;
import javafx.beans.property.ReadOnlyObjectWrapper;
import javafx.beans.value.ObservableValue;
import javafx.scene.Node;
import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.control.ScrollPane;
import javafx.scene.layout.FlowPane;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;
import layerweft.desktop.Reading;
import layerweft.desktop.Room;
import layerweft.desktop.RoomTools;
import layerweft.desktop.control.FigureTable;
import layerweft.desktop.control.Panel;
import layerweft.desktop.session.FigureShown;
import layerweft.desktop.session.Session;
import layerweft.engine.simulation.SimulationSettings;
import layerweft.file.FileTree;
import layerweft.model.portfolio.Peril;
import layerweft.model.portfolio.Portfolio;
import layerweft.report.chart.EventsAboveChart;
import layerweft.study.EventsAbove;
import layerweft.study.PerilTotals;

/** One card for each peril, annual totals by return period, and the place where a peril is added. */
public final class PerilsRoom implements Room {
    private static final List<Double> RETURN_PERIODS = List.of(2.0, 5.0, 10.0, 20.0, 50.0, 100.0, 200.0, 250.0, 500.0);
    private static final SimulationSettings YEARS = new SimulationSettings(200_000, SimulationSettings.usual().seed(), SimulationSettings.usual().threads());
    private static final Duration REST = Duration.ofMillis(200);

    private final RoomTools tools;
    private final Session session;
    private final FlowPane cards = new FlowPane();
    private final FigureTable table = new FigureTable(1);
    private final Panel totalsPanel = new Panel("Year totals by return period", table);
    private final ScrollPane view;
    private final List<PerilCard> shownCards = new ArrayList<>();
    private final ReadOnlyObjectWrapper<Reading> reading = new ReadOnlyObjectWrapper<>(Reading.EMPTY);
    private List<List<String>> shape = List.of();
    private PerilTotals totals;
    private boolean shown;

    public PerilsRoom(RoomTools tools) {
        this.tools = tools;
        this.session = tools.session();
        cards.getStyleClass().add("lw-cards");
        Label hint = new Label("A peril has a number of events a year and a loss for each event.");
        hint.getStyleClass().add("lw-note");
        hint.setWrapText(true);
        Button add = new Button("Add a peril");
        add.getStyleClass().add("lw-main-button");
        add.setOnAction(asked -> session.edit("a new peril", d -> d.withPortfolio(PerilEdit::added)));
        VBox adding = new VBox(hint, add);
        adding.getStyleClass().add("lw-column-tight");
        Panel addPanel = new Panel("Add a peril", adding);
        addPanel.setPrefWidth(322);
        addPanel.setMinWidth(240);
        HBox below = new HBox(totalsPanel, addPanel);
        below.getStyleClass().add("lw-row");
        HBox.setHgrow(totalsPanel, Priority.ALWAYS);
        VBox all = new VBox(cards, below);
        all.getStyleClass().add("lw-column");
        view = new ScrollPane(all);
        view.setFitToWidth(true);
        view.getStyleClass().add("lw-scroll");
        session.document().addListener((is, was, now) -> build());
        session.treaty().addListener((is, was, now) -> recompute());
        build();
    }

    private void build() {
        FileTree tree = session.document().get().portfolio();
        List<List<String>> now = new ArrayList<>();
        for (int i = 0; i < tree.size("perils"); i++) {
            now.add(PerilCard.shape(tree, i));
        }
        if (now.equals(shape)) {
            return;
        }
        shape = now;
        shownCards.clear();
        for (int i = 0; i < now.size(); i++) {
            shownCards.add(new PerilCard(tools, i));
        }
        cards.getChildren().setAll(shownCards);
        shownCards.forEach(card -> card.setMinWidth(Region.USE_PREF_SIZE));
        drawCurves();
        showTotals();
    }

    @Override
    public void entered() {
        shown = true;
        recompute();
    }

    @Override
    public void left() {
        shown = false;
    }

    private void recompute() {
        if (session.treaty().get() == null) {
            return;
        }
        Portfolio portfolio = session.treaty().get().portfolio();
        drawCurves();
        if (shown && (totals == null || totals.portfolio() != portfolio)) {
            session.background().runAfter(REST, "Year totals", control -> PerilTotals.of(portfolio, RETURN_PERIODS, YEARS, control), found -> {
                totals = found;
                showTotals();
            });
        }
    }

    private void drawCurves() {
        if (session.treaty().get() == null) {
            return;
        }
        List<Peril> perils = session.treaty().get().portfolio().perils();
        List<EventsAboveChart.Peril> curves = perils.stream()
                .map(p -> new EventsAboveChart.Peril(p.name(), EventsAbove.of(p).orElse((DoubleUnaryOperator) null))).toList();
        double to = largest(curves);
        shownCards.forEach(card -> card.show(curves, to / 1000, to));
    }

    /** The power of ten above which no peril has an event in a thousand years. */
    private static double largest(List<EventsAboveChart.Peril> curves) {
        double to = 1;
        for (int k = 0; k < 12 && any(curves, to); k++) {
            to *= 10;
        }
        return to;
    }

    private static boolean any(List<EventsAboveChart.Peril> curves, double amount) {
        return curves.stream().anyMatch(c -> c.above() != null && c.above().applyAsDouble(amount) > 0.0015);
    }

    private void showTotals() {
        if (totals == null) {
            return;
        }
        shownCards.forEach(card -> card.show(totals));
        List<String> header = new ArrayList<>(List.of(""));
        RETURN_PERIODS.forEach(t -> header.add(String.format(Locale.ROOT, "1 in %.0f", t)));
        List<List<String>> rows = new ArrayList<>();
        List<PerilTotals.Total> all = new ArrayList<>(totals.perils());
        all.add(totals.all());
        for (PerilTotals.Total total : all) {
            List<String> row = new ArrayList<>(List.of(total == totals.all() ? "All perils" : total.name()));
            total.byReturnPeriod().values().forEach(f -> row.add(FigureShown.of(f, "").value()));
            rows.add(row);
        }
        table.show(header, rows);
        table.choose(rows.size() - 1);
        totalsPanel.note().set(session.document().get().currencyAndUnit() + ", gross, simulated");
        PerilTotals.Total largest = totals.perils().stream().max((a, b) -> Double.compare(a.mean().value(), b.mean().value())).orElseThrow();
        if (Double.isFinite(totals.all().mean().value()) && totals.all().mean().value() > 0) {
            double part = largest.mean().value() / totals.all().mean().value();
            reading.set(Reading.of(largest.name() + " brings ").strong(String.format(Locale.ROOT, "%.0f%s%%", 100 * part, FigureShown.THIN_SPACE))
                    .plain(" of the ").strong(FigureShown.of(totals.all().mean(), "").value()).plain(" expected in a year; the 1-in-100 year costs ")
                    .strong(FigureShown.of(totals.all().byReturnPeriod().get(100.0), "").value()).plain("."));
        } else {
            reading.set(Reading.of("The expected loss of a year is ").strong("∞").plain(": the losses of " + largest.name() + " have no mean."));
        }
    }

    @Override
    public String name() {
        return "Perils";
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
