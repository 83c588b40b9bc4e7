package layerweft.desktop.quote;

import java.time.Duration;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import javafx.beans.property.ReadOnlyObjectWrapper;
import javafx.beans.value.ObservableValue;
import javafx.scene.Node;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.VBox;
import layerweft.desktop.Reading;
import layerweft.desktop.Room;
import layerweft.desktop.RoomTools;
import layerweft.desktop.control.ChartView;
import layerweft.desktop.control.FigureTable;
import layerweft.desktop.control.Panel;
import layerweft.desktop.control.SegmentedSwitch;
import layerweft.desktop.session.FigureShown;
import layerweft.desktop.session.LivePrices;
import layerweft.engine.simulation.SimulationSettings;
import layerweft.figures.FigureText;
import layerweft.figures.LayerFigures;
import layerweft.report.chart.ChartExport;
import layerweft.report.chart.ChartPicture;
import layerweft.report.chart.ExceedanceChart;
import layerweft.report.chart.ExceedanceChart.Line;
import layerweft.study.ExceedanceCurves;

/** The figures of all layers, the build-up of one premium, and the exceedance curves of the whole programme. */
public final class QuoteRoom implements Room {
    private static final double MARKED_PERIOD = 100;
    /** Enough for a curve to the 1-in-1,000 year, soon enough to be there when one looks up. */
    private static final SimulationSettings CURVE_YEARS = new SimulationSettings(400_000, SimulationSettings.usual().seed(), SimulationSettings.usual().threads());

    private enum Curves { TOTAL, EVENT, BOTH }

    private final RoomTools tools;
    private final FigureTable table = new FigureTable(1);
    private final SegmentedSwitch<Boolean> share = new SegmentedSwitch<>(List.of(false, true), at -> at ? "Our share" : "100\u2009%");
    private final SegmentedSwitch<Curves> which = new SegmentedSwitch<>(List.of(Curves.TOTAL, Curves.EVENT, Curves.BOTH),
            c -> switch (c) {
                case TOTAL -> "Year total";
                case EVENT -> "Largest event";
                case BOTH -> "Both";
            });
    private final ChartView buildUp;
    private final ChartView exceedance;
    private final Panel figures;
    private final Panel build;
    private final VBox view;
    private final ReadOnlyObjectWrapper<Reading> reading = new ReadOnlyObjectWrapper<>(Reading.EMPTY);
    private ExceedanceCurves curves;
    private boolean shown;

    public QuoteRoom(RoomTools tools) {
        this.tools = tools;
        buildUp = new ChartView(tools.theme()).captioned(() -> caption(buildUp().title()));
        exceedance = new ChartView(tools.theme()).captioned(() -> caption("Exceedance of the whole account"));
        which.value().set(Curves.BOTH);
        figures = new Panel("Figures", table).withControls(share);
        build = new Panel("From expected loss to upfront premium", buildUp);
        Panel exceed = new Panel("Exceedance", exceedance).withControls(which);
        exceed.note().set("whole account");
        HBox below = new HBox(build, exceed);
        below.getStyleClass().add("lw-row");
        build.setPrefWidth(560);
        HBox.setHgrow(build, Priority.SOMETIMES);
        HBox.setHgrow(exceed, Priority.ALWAYS);
        VBox.setVgrow(below, Priority.ALWAYS);
        view = new VBox(figures, below);
        view.getStyleClass().add("lw-column");
        table.onChoose(row -> tools.session().selectedLayer().set(row));
        tools.session().prices().addListener((is, was, now) -> show());
        tools.session().selectedLayer().addListener((is, was, now) -> show());
        share.value().addListener((is, was, now) -> show());
        which.value().addListener((is, was, now) -> drawCurves());
        tools.session().treaty().addListener((is, was, now) -> recompute());
        show();
    }

    private ChartPicture buildUp() {
        return buildUp.picture().get();
    }

    private ChartExport.Caption caption(String title) {
        return new ChartExport.Caption(title, reading.get().text(), List.of(tools.session().document().get().name(),
                "seed " + CURVE_YEARS.seed(), "layers by the engine named in the strip, curves by simulation"));
    }

    private void show() {
        LivePrices prices = tools.session().prices().get();
        if (prices == null) {
            return;
        }
        List<LayerFigures> layers = prices.layers();
        int chosen = Math.max(0, Math.min(layers.size() - 1, tools.session().selectedLayer().get()));
        boolean atShare = share.value().get();
        QuoteTable now = QuoteTable.of(prices.treaty(), layers, atShare);
        table.show(now.header(), now.rows());
        table.choose(chosen);
        figures.note().set(tools.session().document().get().currencyAndUnit() + (atShare ? " at our share" : " at 100\u2009%"));
        LayerFigures layer = layers.get(chosen);
        build.note().set(layer.name());
        buildUp.picture().set(PremiumSteps.chart(layer, prices.treaty().programme().pricing(), atShare ? 1 : 1 / prices.treaty().layer(chosen).share()));
        reading.set(reading(layer));
    }

    private static Reading reading(LayerFigures layer) {
        FigureShown technical = FigureShown.of(layer.technicalPremium(), "");
        String attaches = layer.attachmentProbability().value() > 0
                ? "; it pays something once in " + FigureText.oneIn(layer.attachmentProbability()).replace("1 in ", "") + " years." : "; it never pays.";
        double against = QuoteTable.againstTechnical(layer);
        if (Double.isNaN(against)) {
            return Reading.of(layer.name() + " has a technical premium of ").strong(technical.text()).plain(attaches);
        }
        String part = String.format(Locale.ROOT, "%.1f", Math.abs(100 * against)) + FigureShown.THIN_SPACE + "% " + (against < 0 ? "below" : "above");
        return Reading.of(layer.name() + " is quoted at ")
                .strong(FigureText.groupedPlain(Double.parseDouble(String.format(Locale.ROOT, "%.6g", layer.quotedPremium()))))
                .plain(", which is ").strong(part).plain(" its technical premium of ").strong(technical.text()).plain(attaches);
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

    /** Curves are simulated only while somebody looks, and only for a treaty that they are not of yet. */
    private void recompute() {
        var treaty = tools.session().treaty().get();
        if (!shown || treaty == null || curves != null && curves.treaty() == treaty) {
            return;
        }
        tools.session().background().runAfter(Duration.ofMillis(250), "Exceedance curves", control -> ExceedanceCurves.of(treaty, CURVE_YEARS, control), found -> {
            curves = found;
            drawCurves();
        });
    }

    private void drawCurves() {
        if (curves == null) {
            return;
        }
        List<Line> lines = new ArrayList<>();
        if (which.value().get() != Curves.EVENT) {
            lines.add(new Line("Year total", "gross", true, false, curves.gross().total()));
            lines.add(new Line("Year total", "net", false, false, curves.net().total()));
        }
        if (which.value().get() != Curves.TOTAL) {
            lines.add(new Line("Largest event", "gross", true, true, curves.gross().largestEvent()));
            lines.add(new Line("Largest event", "net", false, true, curves.net().largestEvent()));
        }
        exceedance.picture().set(new ExceedanceChart("Exceedance", "loss", lines, MARKED_PERIOD));
    }

    @Override
    public String name() {
        return "Quote";
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
