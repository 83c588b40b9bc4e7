package layerweft.desktop.session;

import java.nio.file.Path;
import java.time.LocalTime;
import java.util.ArrayList;
import java.util.List;
import java.util.function.UnaryOperator;
import javafx.beans.property.BooleanProperty;
import javafx.beans.property.IntegerProperty;
import javafx.beans.property.ObjectProperty;
import javafx.beans.property.ReadOnlyBooleanProperty;
import javafx.beans.property.ReadOnlyBooleanWrapper;
import javafx.beans.property.ReadOnlyObjectProperty;
import javafx.beans.property.ReadOnlyObjectWrapper;
import javafx.beans.property.SimpleBooleanProperty;
import javafx.beans.property.SimpleIntegerProperty;
import javafx.beans.property.SimpleObjectProperty;
import javafx.collections.FXCollections;
import javafx.collections.ObservableList;
import layerweft.engine.simulation.SimulationSettings;
import layerweft.file.Fault;
import layerweft.file.FileTree;
import layerweft.file.TreatyCheck;
import layerweft.model.copula.CopulaFamily;
import layerweft.model.treaty.Treaty;
import layerweft.study.DependenceStrength;

/**
 * What one window works on: a document, its history, its price, and what is selected. All methods and properties belong to the window's
 * thread; nothing here waits.
 */
public final class Session {
    private final Background background;
    private final Pricing pricing;
    private final History history = new History();

    private final ReadOnlyObjectWrapper<Document> document = new ReadOnlyObjectWrapper<>();
    private final ReadOnlyObjectWrapper<Treaty> treaty = new ReadOnlyObjectWrapper<>();
    private final ReadOnlyObjectWrapper<TauState> tau = new ReadOnlyObjectWrapper<>();
    private final ObservableList<Fault> faults = FXCollections.observableArrayList();
    private final ObservableList<Fault> portfolioFaults = FXCollections.observableArrayList();
    private final ObservableList<Fault> programmeFaults = FXCollections.observableArrayList();
    private final ReadOnlyObjectWrapper<String> undoable = new ReadOnlyObjectWrapper<>();
    private final ReadOnlyObjectWrapper<String> redoable = new ReadOnlyObjectWrapper<>();
    private final ReadOnlyBooleanWrapper unsaved = new ReadOnlyBooleanWrapper();
    private final IntegerProperty selectedLayer = new SimpleIntegerProperty();
    private final BooleanProperty dark = new SimpleBooleanProperty();
    private final ReadOnlyObjectWrapper<Pin> pin = new ReadOnlyObjectWrapper<>();
    private final ObjectProperty<DataRange> dataRange = new SimpleObjectProperty<>();
    private Document saved;
    /** The document from which the treaty was read. */
    private Document valid;

    public Session(Document first, Background background) {
        this(first, background, SimulationSettings.usual());
    }

    /** @param longRun the simulation that is run behind each treaty once the hand rests */
    public Session(Document first, Background background, SimulationSettings longRun) {
        this.background = background;
        this.pricing = new Pricing(background, longRun);
        open(first);
    }

    /** Works on another document; history, pin and prices of the present one are left behind. */
    public void open(Document other) {
        history.clear();
        pin.set(null);
        pricing.forget();
        valid = null;
        treaty.set(null);
        tau.set(null);
        saved = other;
        selectedLayer.set(0);
        show(other);
    }

    /** The document as it stands on screen, with or without faults. */
    public ReadOnlyObjectProperty<Document> document() {
        return document.getReadOnlyProperty();
    }

    /** The last valid treaty; null as long as there was none. */
    public ReadOnlyObjectProperty<Treaty> treaty() {
        return treaty.getReadOnlyProperty();
    }

    /** The faults of the document on screen, the portfolio's first. */
    public ObservableList<Fault> faults() {
        return FXCollections.unmodifiableObservableList(faults);
    }

    public ObservableList<Fault> portfolioFaults() {
        return FXCollections.unmodifiableObservableList(portfolioFaults);
    }

    public ObservableList<Fault> programmeFaults() {
        return FXCollections.unmodifiableObservableList(programmeFaults);
    }

    /** Where the dependence of the last valid treaty stands; null as long as there was none. */
    public ReadOnlyObjectProperty<TauState> tau() {
        return tau.getReadOnlyProperty();
    }

    /** The newest prices; null before the first. */
    public ReadOnlyObjectProperty<LivePrices> prices() {
        return pricing.prices();
    }

    /** The layers' curves against τ; null before the first. */
    public ReadOnlyObjectProperty<LiftCurves> curves() {
        return pricing.curves();
    }

    /** The pricing of the newest treaty, to see whether it is still at work; null before the first. */
    public ReadOnlyObjectProperty<Task> pricingTask() {
        return pricing.pricingTask();
    }

    /** The long run behind, to see its progress and to stop it; null where there is none. */
    public ReadOnlyObjectProperty<Task> longRun() {
        return pricing.longRun();
    }

    public Background background() {
        return background;
    }

    /** One edit, one step of undo. Nothing happens where it changes nothing. */
    public void edit(String what, UnaryOperator<Document> change) {
        edit(what, null, change);
    }

    /**
     * One edit of a movement of the hand: edits of the same gesture in a row are one step of undo.
     *
     * @param what for the menu: "Undo …", e.g. {@code "change of τ"}
     * @param gesture equal for all edits of one movement, different for another movement; null for an edit that stands alone
     */
    public void edit(String what, Object gesture, UnaryOperator<Document> change) {
        Document before = document.get();
        Document after = change.apply(before);
        if (!after.equals(before)) {
            history.note(what, gesture, before, after);
            show(after);
        }
    }

    /** Takes back a gesture as if it had not begun; nothing happens where another edit came after it. */
    public void giveUp(Object gesture) {
        show(history.giveUp(gesture, document.get()));
    }

    public void undo() {
        if (undoable.get() != null) {
            show(keepingFiles(history.undo()));
        }
    }

    public void redo() {
        if (redoable.get() != null) {
            show(keepingFiles(history.redo()));
        }
    }

    /** Where a document is kept is no part of its history. */
    private Document keepingFiles(Document past) {
        return past.withFiles(document.get().portfolioFile(), document.get().programmeFile());
    }

    /** What undo would take back, null where there is nothing. */
    public ReadOnlyObjectProperty<String> undoable() {
        return undoable.getReadOnlyProperty();
    }

    /** What redo would bring back, null where there is nothing. */
    public ReadOnlyObjectProperty<String> redoable() {
        return redoable.getReadOnlyProperty();
    }

    /** Whether the document differs from what was opened or last saved. */
    public ReadOnlyBooleanProperty unsaved() {
        return unsaved.getReadOnlyProperty();
    }

    /** Notes that the document has been written to these files. */
    public void savedAs(Path portfolioFile, Path programmeFile) {
        saved = document.get().withFiles(portfolioFile, programmeFile);
        document.set(saved);
        unsaved.set(false);
    }

    /** Notes that the document is not as any file has it, e.g. because it was recovered. */
    public void neverSaved() {
        saved = null;
        unsaved.set(true);
    }

    /** The selected layer, from 0, in every room. */
    public IntegerProperty selectedLayer() {
        return selectedLayer;
    }

    public BooleanProperty dark() {
        return dark;
    }

    /** The base line; null where there is none. */
    public ReadOnlyObjectProperty<Pin> pinned() {
        return pin.getReadOnlyProperty();
    }

    /** Keeps the newest prices as the base line. */
    public void pin() {
        if (prices().get() != null) {
            pin.set(new Pin(prices().get(), LocalTime.now()));
        }
    }

    public void unpin() {
        pin.set(null);
    }

    /** Brings the pinned document back, as one step that can be undone. */
    public void backToPin() {
        Document base = pin.get().prices().document();
        edit("return to the pinned state", present -> present.withPortfolio(p -> base.portfolio()).withProgramme(p -> base.programme()));
    }

    /** The range of τ that the data leave open; null where nothing is known. */
    public ObjectProperty<DataRange> dataRange() {
        return dataRange;
    }

    /** The families to choose from, in the order of the screen; a Student copula with the degrees of freedom of the file. */
    public List<CopulaFamily> families() {
        CopulaFamily now = tau.get() == null ? null : tau.get().family();
        boolean student = now != null && now.kind() == CopulaFamily.Kind.STUDENT;
        return FamilyName.IN_ORDER.stream().map(f -> student && f.kind() == CopulaFamily.Kind.STUDENT ? now : f).toList();
    }

    /** Takes the family that is so many places on in {@link #families}. */
    public void stepFamily(int places) {
        if (tau.get() != null && tau.get().turns()) {
            List<CopulaFamily> all = families();
            int at = all.indexOf(tau.get().family());
            setFamily(all.get(Math.floorMod(at < 0 ? 0 : at + places, all.size())));
        }
    }

    /**
     * Turns the dependence to a τ, or to the nearest within reach; all pairs together where they differ.
     *
     * @param gesture as in {@link #edit(String, Object, UnaryOperator)}
     */
    public void setTau(double wished, Object gesture) {
        TauState now = tau.get();
        if (now == null || !now.turns() || !faults.isEmpty()) {
            return;
        }
        // pairs are scaled from where the movement began, or they would lose their proportions on the way
        Document from = history.before(gesture, document.get());
        DependenceStrength strength = strength(from);
        double target = Math.max(strength.least(), Math.min(strength.most(), wished));
        FileTree turned = DependenceEdit.turned(from.portfolio(), strength, target);
        edit("change of τ", gesture, present -> present.withPortfolio(portfolio -> turned));
    }

    private DependenceStrength strength(Document of) {
        Treaty read = of.sameContent(valid) ? treaty.get() : TreatyCheck.of(of.portfolio(), of.programme()).treaty();
        return DependenceStrength.of(read.portfolio().dependence().copula(), read.portfolio().perils().size());
    }

    /** Changes the family, at the present τ or the nearest that the family can have. */
    public void setFamily(CopulaFamily family) {
        setFamily(family, null);
    }

    /** The same as part of a gesture, e.g. a preview that may be given up. */
    public void setFamily(CopulaFamily family, Object gesture) {
        TauState now = tau.get();
        if (now == null || !now.turns() || !faults.isEmpty()) {
            return;
        }
        double least = family.tauRange(now.perils()).low();
        double nearest = Math.max(least == -1 ? -0.99 : least, Math.min(0.99, now.tau()));
        double tidy = Math.rint(nearest * 1000) / 1000;
        edit("change of family", gesture, present -> present.withPortfolio(p -> DependenceEdit.withFamily(p, family, tidy)));
    }

    private void show(Document next) {
        Document before = document.get();
        document.set(next);
        undoable.set(history.undoable());
        redoable.set(history.redoable());
        unsaved.set(saved == null || !saved.sameContent(next));
        if (before != null && valid != null && before.sameContent(next)) {
            return;
        }
        TreatyCheck check = TreatyCheck.of(next.portfolio(), next.programme());
        portfolioFaults.setAll(check.portfolioFaults());
        programmeFaults.setAll(check.programmeFaults());
        List<Fault> all = new ArrayList<>(check.portfolioFaults());
        all.addAll(check.programmeFaults());
        if (check.treaty() == null) {
            pricing.invalid();
        } else {
            boolean strengthOnly = valid != null && Strengths.only(valid, next);
            Treaty shared = sharing(check.treaty(), next);
            valid = next;
            treaty.set(shared);
            tau.set(TauState.of(shared));
            selectedLayer.set(Math.max(0, Math.min(selectedLayer.get(), shared.layers() - 1)));
            pricing.price(next, shared, tau.get(), !strengthOnly);
        }
        faults.setAll(all);
    }

    /** The treaty on the perils and the programme of the last one where nothing but the dependence has changed: pricing goes on from there. */
    private Treaty sharing(Treaty read, Document next) {
        Treaty last = treaty.get();
        boolean same = valid != null && last != null && valid.programme().equals(next.programme())
                && valid.portfolio().remove("dependence").equals(next.portfolio().remove("dependence"));
        return same ? last.on(last.portfolio().with(read.portfolio().dependence())) : read;
    }
}
