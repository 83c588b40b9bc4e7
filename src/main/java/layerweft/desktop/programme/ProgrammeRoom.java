package layerweft.desktop.programme;

import java.awt.geom.Rectangle2D;
import java.time.Duration;
import java.util.ArrayList;
import java.util.List;
import java.util.SortedMap;
import java.util.TreeMap;
import javafx.beans.property.ReadOnlyObjectWrapper;
import javafx.beans.value.ObservableValue;
import javafx.scene.Cursor;
import javafx.scene.Node;
import javafx.scene.control.Button;
import javafx.scene.control.ScrollPane;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyEvent;
import javafx.scene.input.MouseEvent;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.VBox;
import layerweft.desktop.Reading;
import layerweft.desktop.Room;
import layerweft.desktop.RoomTools;
import layerweft.desktop.control.ChartView;
import layerweft.desktop.control.Panel;
import layerweft.desktop.control.SegmentedSwitch;
import layerweft.desktop.session.FigureShown;
import layerweft.desktop.session.LayerEdit;
import layerweft.desktop.session.LivePrices;
import layerweft.desktop.session.Session;
import layerweft.desktop.theme.Theme;
import layerweft.engine.simulation.PerilShares;
import layerweft.engine.simulation.SimulationSettings;
import layerweft.figures.Figure;
import layerweft.figures.FigureText;
import layerweft.file.FileTree;
import layerweft.model.portfolio.Peril;
import layerweft.model.treaty.Layer;
import layerweft.model.treaty.LayerTerms;
import layerweft.model.treaty.Treaty;
import layerweft.report.chart.TowerChart;
import layerweft.study.Drivers;
import layerweft.study.ExceedanceCurves;
import layerweft.study.LimitUse;

/** The tower to scale, whose edges can be dragged, and the form of the selected layer. */
public final class ProgrammeRoom implements Room {
    private static final SimulationSettings YEARS = new SimulationSettings(100_000, SimulationSettings.usual().seed(), SimulationSettings.usual().threads());
    private static final Duration REST = Duration.ofMillis(200);
    private static final double GRIP = 6;

    /** What a hand moves. */
    private enum Grip { NONE, TOP, BOTTOM, BODY }

    private final Session session;
    private final Theme theme;
    private final ChartView tower;
    private final SegmentedSwitch<Boolean> scale = new SegmentedSwitch<>(List.of(false, true), log -> log ? "Log" : "Linear");
    private final SegmentedSwitch<Boolean> forms = new SegmentedSwitch<>(List.of(false, true), p -> p ? "Pricing and buyer" : "Layer");
    private final VBox formBox = new VBox();
    private final HBox view;
    private final ReadOnlyObjectWrapper<Reading> reading = new ReadOnlyObjectWrapper<>(Reading.EMPTY);
    private LayerForm form;
    private String formShape = "";
    private SortedMap<Double, Double> haze = new TreeMap<>();
    private Treaty hazeOf;
    private Drivers drivers;
    private List<LimitUse> uses = List.of();
    private Treaty usesOf;
    private boolean shown;
    private Grip grip = Grip.NONE;
    private int held;
    private double from;
    private FileTree before;
    private Object gesture;

    public ProgrammeRoom(RoomTools tools) {
        this.session = tools.session();
        this.theme = tools.theme();
        tower = new ChartView(tools.theme());
        tower.addEventFilter(MouseEvent.MOUSE_MOVED, moved -> tower.setCursor(cursor(moved)));
        tower.addEventFilter(MouseEvent.MOUSE_PRESSED, this::take);
        tower.addEventFilter(MouseEvent.MOUSE_DRAGGED, this::move);
        tower.addEventFilter(MouseEvent.MOUSE_RELEASED, released -> grip = Grip.NONE);
        tower.addEventHandler(KeyEvent.KEY_PRESSED, key -> {
            if (key.getCode() == KeyCode.ESCAPE && grip != Grip.NONE) {
                session.giveUp(gesture);
                grip = Grip.NONE;
                key.consume();
            } else if (key.getCode() == KeyCode.UP || key.getCode() == KeyCode.DOWN) {
                nudge(key.getCode() == KeyCode.UP ? 1 : -1, key.isShiftDown());
                key.consume();
            }
        });
        Button add = new Button("New layer");
        add.setOnAction(asked -> session.edit("a new layer",
                d -> d.withProgramme(t -> LayerEdit.addedAbove(t, Math.min(session.selectedLayer().get(), LayerEdit.count(t) - 1)))));
        Button copy = new Button("Copy layer");
        copy.setOnAction(asked -> session.edit("copy of a layer", d -> d.withProgramme(t -> LayerEdit.duplicated(t, session.selectedLayer().get()))));
        Button delete = new Button("Delete layer");
        delete.setOnAction(asked -> {
            if (LayerEdit.count(session.document().get().programme()) > 1) {
                session.edit("deletion of a layer", d -> d.withProgramme(t -> LayerEdit.removed(t, session.selectedLayer().get())));
            }
        });
        for (Button button : List.of(add, copy, delete)) {
            button.getStyleClass().add("lw-small-button");
        }
        Panel towerPanel = new Panel("Height: what one event costs. Width: how many full limits the year can use.", tower).withControls(add, copy, delete, scale);
        HBox.setHgrow(towerPanel, Priority.ALWAYS);
        ScrollPane scroll = new ScrollPane(formBox);
        scroll.setFitToWidth(true);
        scroll.getStyleClass().add("lw-scroll");
        VBox.setVgrow(scroll, Priority.ALWAYS);
        VBox right = new VBox(forms, scroll);
        right.getStyleClass().add("lw-column-tight");
        Panel formPanel = new Panel(right);
        formPanel.setMinWidth(392);
        formPanel.setPrefWidth(392);
        formPanel.setMaxWidth(392);
        view = new HBox(towerPanel, formPanel);
        view.getStyleClass().add("lw-row");
        scale.value().addListener((is, was, now) -> draw());
        forms.value().addListener((is, was, now) -> buildForm());
        session.prices().addListener((is, was, now) -> changed());
        session.document().addListener((is, was, now) -> buildForm());
        session.selectedLayer().addListener((is, was, now) -> {
            buildForm();
            draw();
        });
        buildForm();
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

    private void buildForm() {
        FileTree tree = session.document().get().programme();
        int place = Math.max(0, Math.min(LayerEdit.count(tree) - 1, session.selectedLayer().get()));
        String at = "layers[" + place + "]";
        String shape = forms.value().get() ? "pricing" : place + " " + LayerEdit.count(tree) + " " + tree.has(at + ".occurrence.franchise");
        if (shape.equals(formShape)) {
            return;
        }
        formShape = shape;
        form = forms.value().get() ? null : new LayerForm(session, place);
        formBox.getChildren().setAll(form == null ? new PricingForm(session) : form);
        if (form != null && session.prices().get() != null) {
            form.show(session.prices().get());
        }
    }

    /** New prices: the form at once, the parts of the picture that take longer behind. */
    private void changed() {
        LivePrices prices = session.prices().get();
        if (prices == null) {
            return;
        }
        if (form != null) {
            form.show(prices);
        }
        Treaty treaty = prices.treaty();
        if (shown && usesOf != treaty) {
            session.background().runAfter(Duration.ZERO, "Use of each limit", control -> LimitUse.of(treaty, YEARS, control), found -> {
                uses = found;
                usesOf = treaty;
                draw();
            });
        }
        if (shown && hazeOf != treaty && grip == Grip.NONE) {
            session.background().runAfter(REST, "Largest events and drivers", control -> {
                SortedMap<Double, Double> largest = new TreeMap<>();
                ExceedanceCurves.of(treaty, YEARS, control).gross().largestEvent().forEach((years, amount) -> largest.put(years, amount.value()));
                return new Behind(largest, Drivers.of(treaty, YEARS, control));
            }, found -> {
                haze = found.largest;
                drivers = found.drivers;
                hazeOf = treaty;
                draw();
                read();
            });
        }
        draw();
        read();
    }

    private record Behind(SortedMap<Double, Double> largest, Drivers drivers) {}

    private void read() {
        LivePrices prices = session.prices().get();
        double taken = prices.layers().stream().mapToDouble(l -> l.expectedLoss().value()).sum();
        double all = prices.treaty().portfolio().expectedLoss();
        int n = prices.layers().size();
        Reading words = Reading.of(n == 1 ? "One layer takes " : n + " layers take ").strong(FigureShown.of(new Figure(taken, taken * 1e-3), "").value()).plain(" of the ")
                .strong(FigureShown.of(Double.isInfinite(all) ? Figure.INFINITE : Figure.exact(all), "").value()).plain(" expected in a year");
        reading.set(prices.whole().map(whole -> words.plain("; the retained 1-in-100 year falls from ").strong(at100(whole.gross().valueAtRisk())).plain(" to ")
                .strong(at100(whole.net().valueAtRisk())).plain(".")).orElse(words.plain(".")));
    }

    private static String at100(SortedMap<Double, Figure> byLevel) {
        Figure at = byLevel.get(0.99);
        return at == null ? "—" : FigureShown.of(at, "").value();
    }

    private void draw() {
        LivePrices prices = session.prices().get();
        if (prices == null) {
            return;
        }
        Treaty treaty = prices.treaty();
        List<TowerChart.Block> blocks = new ArrayList<>();
        List<TowerChart.Cover> covers = new ArrayList<>();
        for (int j = 0; j < treaty.layers(); j++) {
            Layer layer = treaty.layer(j);
            LayerTerms terms = layer.terms();
            if (terms.occurrenceLimit() < Double.POSITIVE_INFINITY) {
                blocks.add(block(treaty, j, layer, terms, prices));
            } else {
                covers.add(new TowerChart.Cover(layer.name(), words(layer, terms), terms.deductible(), terms.annualLimit(), prices.layers().get(j).lossOnLine().value(),
                        !layer.inuring().isEmpty()));
            }
        }
        int chosen = Math.max(0, Math.min(treaty.layers() - 1, session.selectedLayer().get()));
        tower.picture().set(new TowerChart(blocks, covers, treaty.portfolio().perils().stream().map(Peril::name).toList(), haze, scale.value().get(), treaty.layer(chosen).name()));
    }

    private TowerChart.Block block(Treaty treaty, int j, Layer layer, LayerTerms terms, LivePrices prices) {
        List<Double> use = uses.stream().filter(u -> u.name().equals(layer.name())).findFirst().map(u -> u.uses().stream().map(Figure::value).toList()).orElse(List.of());
        if (use.isEmpty() || usesOf != treaty) {
            use = List.of(prices.layers().get(j).lossOnLine().value());
        }
        List<Double> shares = new ArrayList<>();
        PerilShares known = drivers != null && j < drivers.layers().size() && drivers.treaty().layer(Math.min(j, drivers.treaty().layers() - 1)).name().equals(layer.name())
                && drivers.treaty().portfolio().perils().size() == treaty.portfolio().perils().size() ? drivers.layers().get(j) : null;
        for (int i = 0; i < treaty.portfolio().perils().size(); i++) {
            boolean covered = treaty.cover(j).covers(i);
            shares.add(covered && known != null ? known.expectedShare().get(i).value() : covered ? 0.1 : Double.NaN);
        }
        double retention = terms.hasFranchise() ? terms.franchise() : terms.retention();
        double q = terms.quotaShare();
        return new TowerChart.Block(layer.name(), words(layer, terms), retention / q, terms.occurrenceLimit() / q, terms.deductible() / terms.occurrenceLimit(), use,
                terms.annualLimit() / terms.occurrenceLimit(), shares);
    }

    /** The terms as one says them: 60 xs 40, 2 at 100 %. */
    private static String words(Layer layer, LayerTerms terms) {
        StringBuilder words = new StringBuilder();
        if (terms.occurrenceLimit() < Double.POSITIVE_INFINITY) {
            words.append(FigureText.groupedPlain(terms.occurrenceLimit())).append(terms.hasFranchise() ? " from " + FigureText.groupedPlain(terms.franchise()) + " on"
                    : " xs " + FigureText.groupedPlain(terms.retention()));
            if (layer.reinstatements() != null) {
                words.append(layer.reinstatements().isEmpty() ? ", none" : ", " + layer.reinstatements().size() + " at " + FigureText.plainPercent(layer.reinstatements().get(0)));
            }
            if (layer.annual().deductible() > 0 || layer.annual().limit() < Double.POSITIVE_INFINITY) {
                words.append(", year ").append(layer.annual().limit() < Double.POSITIVE_INFINITY ? FigureText.groupedPlain(layer.annual().limit()) : "no limit")
                        .append(" xs ").append(FigureText.groupedPlain(layer.annual().deductible()));
            }
        } else {
            words.append(terms.annualLimit() < Double.POSITIVE_INFINITY ? FigureText.groupedPlain(terms.annualLimit()) : "no limit").append(" xs ")
                    .append(FigureText.groupedPlain(terms.deductible()));
        }
        return words.toString();
    }

    /** The area that the picture is drawn in, in its own lengths. */
    private Rectangle2D area() {
        double size = theme.scale().get();
        return new Rectangle2D.Double(0, 0, tower.getWidth() / size, tower.getHeight() / size);
    }

    private TowerChart chart() {
        return tower.picture().get() instanceof TowerChart chart ? chart : null;
    }

    private record Held(int layer, Grip grip) {}

    private double x(MouseEvent at) {
        return at.getX() / theme.scale().get();
    }

    private double y(MouseEvent at) {
        return at.getY() / theme.scale().get();
    }

    /** What is under the hand. */
    private Held under(MouseEvent at) {
        TowerChart chart = chart();
        LivePrices prices = session.prices().get();
        if (chart == null || prices == null) {
            return new Held(-1, Grip.NONE);
        }
        for (TowerChart.Place place : chart.places(area())) {
            Rectangle2D cells = place.cells();
            int layer = prices.treaty().programme().indexOf(place.name());
            boolean across = place.cover() ? x(at) >= cells.getX() && x(at) <= cells.getMaxX() : x(at) <= cells.getMaxX() && x(at) >= cells.getX() - 220;
            if (across && y(at) >= cells.getY() - GRIP && y(at) <= cells.getMaxY() + GRIP) {
                boolean top = Math.abs(y(at) - cells.getY()) <= GRIP && cells.getHeight() > 2 * GRIP;
                boolean bottom = Math.abs(y(at) - cells.getMaxY()) <= GRIP && cells.getHeight() > 2 * GRIP;
                return new Held(layer, place.cover() ? Grip.NONE : top ? Grip.TOP : bottom ? Grip.BOTTOM : Grip.BODY);
            }
        }
        return new Held(-1, Grip.NONE);
    }

    private Cursor cursor(MouseEvent at) {
        return switch (under(at).grip) {
            case TOP, BOTTOM -> Cursor.V_RESIZE;
            case BODY -> Cursor.OPEN_HAND;
            case NONE -> Cursor.DEFAULT;
        };
    }

    private void take(MouseEvent pressed) {
        Held now = under(pressed);
        if (now.layer >= 0) {
            session.selectedLayer().set(now.layer);
            grip = now.grip;
            held = now.layer;
            from = chart().amount(y(pressed), area());
            before = session.document().get().programme();
            gesture = new Object();
        }
    }

    private void move(MouseEvent drag) {
        if (grip == Grip.NONE || chart() == null) {
            return;
        }
        double change = chart().amount(y(drag), area()) - from;
        double snap = drag.isAltDown() ? 0 : chart().snap();
        FileTree moved = LayerDrag.moved(before, held, grip == Grip.TOP, grip == Grip.BOTTOM, change, snap);
        session.edit("drag of a layer", gesture, d -> d.withProgramme(t -> moved));
        drag.consume();
    }

    /** Arrow keys move the selected layer's upper edge, with Shift the whole layer. */
    private void nudge(int steps, boolean body) {
        if (chart() != null) {
            double snap = chart().snap();
            session.edit("move of a layer", d -> d.withProgramme(t -> LayerDrag.moved(t, session.selectedLayer().get(), !body, false, steps * snap, snap)));
        }
    }

    @Override
    public String name() {
        return "Programme";
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
