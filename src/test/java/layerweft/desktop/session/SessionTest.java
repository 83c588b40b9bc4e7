package layerweft.desktop.session;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertNotNull;
import static org.junit.jupiter.api.Assertions.assertNull;
import static org.junit.jupiter.api.Assertions.assertSame;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Path;
import layerweft.engine.transform.Accuracy;
import layerweft.engine.transform.TransformEngine;
import org.junit.jupiter.api.Test;

class SessionTest {

    private final Session session = Sessions.of(Sessions.twoPerils(Sessions.gumbel(0.3)));

    private void limit(double limit, Object gesture) {
        session.edit("limit", gesture, d -> d.withProgramme(p -> p.set("layers[0].annual.limit", limit)));
    }

    private double limit() {
        return session.document().get().programme().number("layers[0].annual.limit");
    }

    @Test
    void pricesAreOfTheDocumentOnScreen() {
        limit(25, null);
        LivePrices prices = session.prices().get();
        assertSame(session.document().get(), prices.document());
        double expected = new TransformEngine(session.treaty().get(), Accuracy.USUAL).price(0).expectedLoss().value();
        assertEquals(expected, prices.layers().get(0).expectedLoss().value(), 1e-6 * expected);
    }

    @Test
    void pricesAfterTurningTauAreThoseOfANewEngine() {
        session.setTau(0.6, null);
        double expected = new TransformEngine(session.treaty().get(), Accuracy.USUAL).price(0).expectedLoss().value();
        assertEquals(0.6, session.treaty().get().portfolio().dependence().copula().kendallTau(0, 1), 1e-12);
        assertEquals(expected, session.prices().get().layers().get(0).expectedLoss().value(), 1e-6 * expected);
    }

    @Test
    void undoAndRedoGoThroughTheSteps() {
        limit(25, null);
        limit(30, null);
        assertEquals("limit", session.undoable().get());
        session.undo();
        assertEquals(25, limit());
        session.undo();
        assertEquals(20, limit());
        assertNull(session.undoable().get());
        session.redo();
        session.redo();
        assertEquals(30, limit());
        assertNull(session.redoable().get());
    }

    @Test
    void anEditAfterUndoLeavesNothingToRedo() {
        limit(25, null);
        session.undo();
        limit(35, null);
        assertNull(session.redoable().get());
    }

    @Test
    void editsOfOneGestureAreOneStep() {
        Object drag = new Object();
        limit(21, drag);
        limit(22, drag);
        limit(23, drag);
        limit(24, new Object());
        session.undo();
        assertEquals(23, limit());
        session.undo();
        assertEquals(20, limit());
    }

    @Test
    void aGestureThatComesBackToItsStartLeavesNoStep() {
        Object drag = new Object();
        limit(21, drag);
        limit(20, drag);
        assertNull(session.undoable().get());
    }

    @Test
    void aGestureGivenUpLeavesNoTrace() {
        limit(25, null);
        Object drag = new Object();
        limit(26, drag);
        limit(27, drag);
        session.giveUp(drag);
        assertEquals(25, limit());
        assertNull(session.redoable().get());
        session.undo();
        assertEquals(20, limit());
    }

    @Test
    void anEditThatChangesNothingIsNoStep() {
        session.edit("nothing", d -> d.withProgramme(p -> p.set("layers[0].annual.limit", p.get("layers[0].annual.limit"))));
        assertNull(session.undoable().get());
    }

    @Test
    void aFaultKeepsTheLastValidPriceAndSaysSo() {
        double before = session.prices().get().layers().get(0).expectedLoss().value();
        limit(-5, null);
        assertEquals("layers[0].annual.limit", session.programmeFaults().get(0).path());
        assertEquals(1, session.faults().size());
        assertFalse(session.prices().get().valid());
        assertEquals(before, session.prices().get().layers().get(0).expectedLoss().value());
        session.undo();
        assertTrue(session.faults().isEmpty());
        assertTrue(session.prices().get().valid());
    }

    @Test
    void tauIsNotTurnedInAFaultyDocument() {
        limit(-5, null);
        session.setTau(0.5, null);
        session.undo();
        assertEquals(0.3, session.tau().get().tau(), 1e-9);
    }

    @Test
    void unsavedIsWhatDiffersFromTheLastSaved() {
        assertFalse(session.unsaved().get());
        limit(25, null);
        assertTrue(session.unsaved().get());
        session.undo();
        assertFalse(session.unsaved().get());
        limit(25, null);
        session.savedAs(Path.of("p.json"), Path.of("q.json"));
        assertFalse(session.unsaved().get());
        session.undo();
        assertTrue(session.unsaved().get());
        assertEquals(Path.of("p.json"), session.document().get().portfolioFile(), "undo does not forget the file");
    }

    @Test
    void thePinHoldsWhileTheDocumentChanges() {
        session.pin();
        double pinned = session.pinned().get().layer("Aggregate").orElseThrow().expectedLoss().value();
        session.setTau(0.7, null);
        assertEquals(pinned, session.pinned().get().layer("Aggregate").orElseThrow().expectedLoss().value());
        assertNotEquals(pinned, session.prices().get().layers().get(0).expectedLoss().value());
        assertTrue(session.pinned().get().label().startsWith("Gumbel 0.30, "), session.pinned().get().label());
        session.backToPin();
        assertEquals(0.3, session.tau().get().tau(), 1e-9);
        assertEquals("return to the pinned state", session.undoable().get());
        session.unpin();
        assertNull(session.pinned().get());
    }

    @Test
    void curvesStayWhileOnlyTauIsTurned() {
        Session session = Sessions.complete(Sessions.twoPerils(Sessions.gumbel(0.3)));
        LiftCurves curves = session.curves().get();
        session.setTau(0.5, null);
        assertSame(curves, session.curves().get());
        session.edit("limit", d -> d.withProgramme(p -> p.set("layers[0].annual.limit", 25)));
        assertNotEquals(curves, session.curves().get());
        assertTrue(session.curves().get().current());
        assertSame(session.treaty().get(), session.curves().get().treaty());
        LiftCurves ofGumbel = session.curves().get();
        session.stepFamily(1);
        assertNotEquals(ofGumbel, session.curves().get(), "another family has other curves");
    }

    @Test
    void theLongRunBringsTheWholeTreaty() {
        Session session = Sessions.complete(Sessions.twoPerils(Sessions.gumbel(0.3)));
        assertNotNull(session.prices().get().whole().orElseThrow());
        assertEquals(1, session.prices().get().quote().orElseThrow().layers().size());
    }

    @Test
    void theSelectedLayerStaysAmongTheLayers() {
        session.edit("new", d -> d.withProgramme(p -> LayerEdit.added(p, 1, 10, 10)));
        session.selectedLayer().set(1);
        session.undo();
        assertEquals(0, session.selectedLayer().get());
    }

    @Test
    void openingLeavesHistoryAndPinBehind() {
        limit(25, null);
        session.pin();
        session.open(Sessions.twoPerils(null));
        assertNull(session.undoable().get());
        assertNull(session.pinned().get());
        assertFalse(session.unsaved().get());
        assertEquals(20, limit());
    }
}
