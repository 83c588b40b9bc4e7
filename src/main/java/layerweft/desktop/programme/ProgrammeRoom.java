package layerweft.desktop.programme;

import java.time.Duration;
import java.util.List;
import java.util.SortedMap;
import java.util.TreeMap;
import javafx.beans.property.ReadOnlyObjectWrapper;
import javafx.beans.value.ObservableValue;
import javafx.scene.Node;
import javafx.scene.control.Button;
import javafx.scene.control.ScrollPane;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyEvent;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.VBox;
import layerweft.desktop.Reading;
import layerweft.desktop.Room;
import layerweft.desktop.RoomTools;
import layerweft.desktop.control.Panel;
import layerweft.desktop.control.SegmentedSwitch;
import layerweft.desktop.picture.TowerPicture;
import layerweft.desktop.session.FigureShown;
import layerweft.desktop.session.LayerEdit;
import layerweft.desktop.session.LivePrices;
import layerweft.desktop.session.Session;
import layerweft.engine.RunControl;
import layerweft.engine.simulation.SimulationSettings;
import layerweft.figures.Figure;
import layerweft.file.FileTree;
import layerweft.model.treaty.Treaty;
import layerweft.study.Drivers;
import layerweft.study.ExceedanceCurves;
import layerweft.study.LimitUse;

/** The tower to scale, whose edges can be dragged, and the form of the selected layer. */
public final class ProgrammeRoom implements Room {
    private static final SimulationSettings YEARS = new SimulationSettings(100_000, SimulationSettings.usual().seed(), SimulationSettings.usual().threads());
    private static final Duration REST = Duration.ofMillis(200);
    private static final Duration PATIENCE = Duration.ofMillis(1_000);
    private static final String USES = "Use of each limit";
    private static final String BEHIND = "Largest events and drivers";
    private static final String[] NUMBERS = {"No", "One", "Two", "Three", "Four", "Five", "Six", "Seven", "Eight", "Nine", "Ten", "Eleven", "Twelve"};

    private final Session session;
    private final TowerPicture tower;
    private final SegmentedSwitch<Boolean> scale = new SegmentedSwitch<>(List.of(false, true), log -> log ? "Log" : "Linear");
    private final SegmentedSwitch<Boolean> forms = new SegmentedSwitch<>(List.of(false, true), p -> p ? "Pricing and buyer" : "Layer");
    private final VBox formBox = new VBox();
    private final Button copy = button("Copy layer");
    private final Button delete = button("Delete layer");
    private final HBox view;
    private final ReadOnlyObjectWrapper<Reading> reading = new ReadOnlyObjectWrapper<>(Reading.EMPTY);
    private LayerForm form;
    private String formShape = "";
    private SortedMap<Double, Double> largest = new TreeMap<>();
    private Drivers drivers;
    private List<LimitUse> uses = List.of();
    private Treaty usesOf;
    private Treaty behindOf;
    private boolean shown;

    public ProgrammeRoom(RoomTools tools) {
        this.session = tools.session();
        tower = new TowerPicture(tools.theme(), new TowerEdits(session));
        tower.logarithmic().bind(scale.value());
        Button add = button("New layer");
        add.setOnAction(asked -> addLayer());
        copy.setOnAction(asked -> session.edit("copy of a layer", d -> d.withProgramme(t -> LayerEdit.duplicated(t, session.selectedLayer().get()))));
        delete.setOnAction(asked -> deleteLayer());
        Panel towerPanel = new Panel("", tower).withControls(add, copy, delete, scale);
        towerPanel.note().set("Height: what one event costs. Width: how many full limits the year can use.");
        towerPanel.addEventHandler(KeyEvent.KEY_PRESSED, this::key);
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
        forms.value().addListener((is, was, now) -> buildForm());
        session.prices().addListener((is, was, now) -> changed());
        session.document().addListener((is, was, now) -> {
            buildForm();
            draw();
        });
        session.selectedLayer().addListener((is, was, now) -> {
            buildForm();
            draw();
        });
        buildForm();
    }

    private static Button button(String words) {
        Button button = new Button(words);
        button.getStyleClass().add("lw-small-button");
        return button;
    }

    private void addLayer() {
        session.edit("a new layer", d -> d.withProgramme(t -> {
            int count = LayerEdit.count(t);
            return count == 0 ? LayerEdit.added(t, 0, 20, 30) : LayerEdit.addedAbove(t, Math.min(session.selectedLayer().get(), count - 1));
        }));
    }

    private void deleteLayer() {
        int place = session.selectedLayer().get();
        if (place < LayerEdit.count(session.document().get().programme())) {
            session.edit("deletion of a layer", d -> d.withProgramme(t -> LayerEdit.removed(t, place)));
        }
    }

    private void key(KeyEvent event) {
        if (event.getCode() == KeyCode.DELETE) {
            deleteLayer();
            event.consume();
        } else if (event.getCode() == KeyCode.ADD || "+".equals(event.getText())) {
            addLayer();
            event.consume();
        }
    }

    @Override
    public void entered() {
        shown = true;
        changed();
    }

    @Override
    public void left() {
        shown = false;
        session.background().stop(USES);
        session.background().stop(BEHIND);
    }

    private int chosen(int layers) {
        return Math.max(0, Math.min(layers - 1, session.selectedLayer().get()));
    }

    private void buildForm() {
        FileTree tree = session.document().get().programme();
        int count = LayerEdit.count(tree);
        copy.setDisable(count == 0);
        delete.setDisable(count == 0);
        int place = chosen(count);
        boolean pricing = forms.value().get() || count == 0;
        String at = "layers[" + place + "]";
        String shape = pricing ? "pricing" : place + " " + count + " " + tree.has(at + ".occurrence.franchise");
        if (shape.equals(formShape)) {
            return;
        }
        formShape = shape;
        form = pricing ? null : new LayerForm(session, place);
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
            session.background().follow(USES, PATIENCE, Duration.ZERO, control -> LimitUse.of(treaty, YEARS, control), found -> {
                uses = found;
                usesOf = treaty;
                draw();
            });
        }
        if (shown && behindOf != treaty) {
            session.background().runAfter(REST, BEHIND, control -> Behind.of(treaty, control), found -> {
                largest = found.largest();
                drivers = found.drivers();
                behindOf = treaty;
                draw();
            });
        }
        draw();
        read();
    }

    /** What the tower shows beside prices and takes a simulation. */
    private record Behind(SortedMap<Double, Double> largest, Drivers drivers) {

        static Behind of(Treaty treaty, RunControl control) {
            SortedMap<Double, Double> largest = new TreeMap<>();
            ExceedanceCurves.of(treaty, YEARS, control).gross().largestEvent().forEach((years, amount) -> largest.put(years, amount.value()));
            return new Behind(largest, Drivers.of(treaty, YEARS, control));
        }
    }

    private void read() {
        LivePrices prices = session.prices().get();
        double taken = prices.layers().stream().mapToDouble(l -> l.expectedLoss().value()).sum();
        double all = prices.treaty().portfolio().expectedLoss();
        int n = prices.layers().size();
        String count = n < NUMBERS.length ? NUMBERS[n] : String.valueOf(n);
        Reading words = Reading.of(count + (n == 1 ? " layer takes " : " layers take ")).strong(three(taken)).plain(" of the ").strong(three(all)).plain(" expected in a year");
        reading.set(prices.whole().map(whole -> words.plain("; the retained 1-in-100 year falls from ").strong(at100(whole.gross().valueAtRisk())).plain(" to ")
                .strong(at100(whole.net().valueAtRisk())).plain(".")).orElse(words.plain(".")));
    }

    /** To three significant digits. */
    private static String three(double value) {
        return FigureShown.of(Double.isInfinite(value) ? Figure.INFINITE : new Figure(value, Math.abs(value) * 1e-3), "").value();
    }

    private static String at100(SortedMap<Double, Figure> byLevel) {
        Figure at = byLevel.get(0.99);
        return at == null ? "—" : three(at.value());
    }

    private void draw() {
        LivePrices prices = session.prices().get();
        if (LayerEdit.count(session.document().get().programme()) == 0) {
            tower.show(TowerOf.empty(session.treaty().get(), largest), -1);
        } else if (prices != null) {
            tower.show(TowerOf.treaty(prices, uses, drivers, largest), chosen(prices.treaty().layers()));
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
