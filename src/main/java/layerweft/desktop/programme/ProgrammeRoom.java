package layerweft.desktop.programme;

import java.time.Duration;
import java.util.ArrayList;
import java.util.List;
import java.util.SortedMap;
import java.util.function.UnaryOperator;
import java.util.stream.IntStream;
import javafx.beans.binding.Bindings;
import javafx.beans.property.ReadOnlyObjectWrapper;
import javafx.beans.value.ObservableValue;
import javafx.scene.Node;
import javafx.scene.control.Button;
import javafx.scene.control.ScrollPane;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.VBox;
import layerweft.desktop.Reading;
import layerweft.desktop.Room;
import layerweft.desktop.RoomTools;
import layerweft.desktop.control.Panel;
import layerweft.desktop.control.SegmentedSwitch;
import layerweft.desktop.picture.Tower;
import layerweft.desktop.picture.TowerActions;
import layerweft.desktop.picture.TowerChange;
import layerweft.desktop.picture.TowerPicture;
import layerweft.desktop.session.FigureShown;
import layerweft.desktop.session.LayerEdit;
import layerweft.desktop.session.LivePrices;
import layerweft.desktop.session.Session;
import layerweft.engine.simulation.PerilShares;
import layerweft.engine.simulation.SimulationSettings;
import layerweft.figures.Figure;
import layerweft.figures.FigureText;
import layerweft.file.FileTree;
import layerweft.model.portfolio.Peril;
import layerweft.model.treaty.Layer;
import layerweft.model.treaty.LayerTerms;
import layerweft.model.treaty.Treaty;
import layerweft.study.Drivers;
import layerweft.study.ExceedanceCurves;
import layerweft.study.LimitUse;

/** The tower to scale, whose edges can be dragged, and the form of the selected layer. */
public final class ProgrammeRoom implements Room {
    private static final SimulationSettings YEARS = new SimulationSettings(100_000, SimulationSettings.usual().seed(), SimulationSettings.usual().threads());
    private static final Duration REST = Duration.ofMillis(200);

    private final Session session;
    private final TowerPicture tower;
    private final SegmentedSwitch<Boolean> scale = new SegmentedSwitch<>(List.of(false, true), log -> log ? "Log" : "Linear");
    private final SegmentedSwitch<Boolean> forms = new SegmentedSwitch<>(List.of(false, true), p -> p ? "Pricing and buyer" : "Layer");
    private final VBox formBox = new VBox();
    private final HBox view;
    private final ReadOnlyObjectWrapper<Reading> reading = new ReadOnlyObjectWrapper<>(Reading.EMPTY);
    private LayerForm form;
    private String formShape = "";
    private List<Tower.Mark> haze = List.of();
    private Treaty hazeOf;
    private Drivers drivers;
    private List<LimitUse> uses = List.of();
    private Treaty usesOf;
    private boolean shown;
    private Object gesture = new Object();
    private boolean moving;

    public ProgrammeRoom(RoomTools tools) {
        this.session = tools.session();
        tower = new TowerPicture(tools.theme(), new Hand());
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
        tower.logarithmic().bind(Bindings.createBooleanBinding(() -> scale.value().get(), scale.value()));
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
        if (shown && hazeOf != treaty && !moving) {
            session.background().runAfter(REST, "Largest events and drivers", control -> {
                List<Tower.Mark> largest = new ArrayList<>();
                ExceedanceCurves.of(treaty, YEARS, control).gross().largestEvent().forEach((years, amount) -> addRising(largest, new Tower.Mark(amount.value(), years)));
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

    private record Behind(List<Tower.Mark> largest, Drivers drivers) {}

    /** Amounts have to rise: of several return periods with one amount the first stands. */
    private static void addRising(List<Tower.Mark> marks, Tower.Mark next) {
        if (next.amount() > 0 && Double.isFinite(next.amount()) && (marks.isEmpty() || next.amount() > marks.get(marks.size() - 1).amount())) {
            marks.add(next);
        }
    }

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
        List<Tower.Layer> layers = IntStream.range(0, treaty.layers()).mapToObj(j -> layer(treaty, j, prices)).toList();
        tower.show(new Tower(treaty.portfolio().perils().stream().map(Peril::name).toList(), layers, haze),
                Math.max(0, Math.min(treaty.layers() - 1, session.selectedLayer().get())));
    }

    private Tower.Layer layer(Treaty treaty, int j, LivePrices prices) {
        Layer layer = treaty.layer(j);
        LayerTerms terms = layer.terms();
        boolean ofYear = Double.isInfinite(terms.occurrenceLimit());
        List<Double> use = usesOf == treaty ? uses.get(j).uses().stream().map(Figure::value).toList() : List.of();
        List<Double> shares = new ArrayList<>();
        PerilShares known = drivers != null && j < drivers.layers().size() && drivers.treaty().layer(j).name().equals(layer.name())
                && drivers.treaty().portfolio().perils().size() == treaty.portfolio().perils().size() ? drivers.layers().get(j) : null;
        for (int i = 0; i < treaty.portfolio().perils().size(); i++) {
            boolean covered = treaty.cover(j).covers(i);
            double share = covered && known != null ? known.expectedShare().get(i).value() : 0;
            shares.add(covered ? Double.isNaN(share) ? 0 : share : Double.NaN);
        }
        double start = ofYear ? terms.deductible() : terms.hasFranchise() ? 0 : terms.retention();
        double limit = ofYear ? terms.annualLimit() : terms.occurrenceLimit();
        int reinstatements = layer.reinstatements() != null && layer.annual().limit() == Double.POSITIVE_INFINITY ? layer.reinstatements().size()
                : terms.annualLimit() == Double.POSITIVE_INFINITY ? Tower.UNLIMITED : Tower.BY_ANNUAL_LIMIT;
        double lossOnLine = prices.layers().get(j).lossOnLine().value();
        return new Tower.Layer(layer.name(), words(layer, terms), ofYear, start, limit, terms.hasFranchise() ? terms.franchise() : Double.NaN,
                ofYear ? 0 : terms.deductible() / limit, ofYear ? 1 : terms.annualLimit() / limit, reinstatements, use, shares,
                Double.isFinite(lossOnLine) ? lossOnLine : Double.NaN, layer.inuring().stream().map(n -> treaty.programme().indexOf(n)).toList());
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

    /** What a hand does to the tower, written into the programme: one movement is one step of undo. */
    private final class Hand implements TowerActions {

        @Override
        public void select(int layer) {
            session.selectedLayer().set(layer);
        }

        @Override
        public void terms(List<TowerChange> changes, Phase phase) {
            edit(phase, "drag of a layer", tree -> {
                FileTree changed = tree;
                for (TowerChange c : changes) {
                    changed = LayerTermsEdit.moved(changed, c.layer(), c.retention(), c.limit());
                }
                return changed;
            });
        }

        @Override
        public void reinstatements(int layer, int number, Phase phase) {
            edit(phase, "change of reinstatements", tree -> LayerTermsEdit.reinstated(tree, layer, number));
        }

        @Override
        public void drawn(double retention, double limit) {
            session.edit("a new layer", d -> d.withProgramme(t -> LayerEdit.added(t, 0, retention, limit)));
        }

        private void edit(Phase phase, String what, UnaryOperator<FileTree> change) {
            moving = phase == Phase.MOVING;
            if (phase == Phase.GIVEN_UP) {
                session.giveUp(gesture);
            } else {
                session.edit(what, gesture, d -> d.withProgramme(change));
            }
            if (!moving) {
                gesture = new Object();
                changed();
            }
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
