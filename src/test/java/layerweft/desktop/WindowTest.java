package layerweft.desktop;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertNull;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Files;
import java.nio.file.Path;
import java.util.concurrent.Callable;
import java.util.concurrent.TimeUnit;
import java.util.concurrent.TimeoutException;
import javafx.geometry.Bounds;
import javafx.scene.Node;
import javafx.scene.control.Label;
import javafx.scene.control.Labeled;
import javafx.scene.input.KeyCode;
import javafx.scene.input.MouseButton;
import javafx.stage.Stage;
import layerweft.desktop.session.Background;
import layerweft.desktop.session.Document;
import layerweft.desktop.session.Session;
import layerweft.engine.simulation.SimulationSettings;
import layerweft.file.FileTree;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.extension.ExtendWith;
import org.testfx.api.FxRobot;
import org.testfx.framework.junit5.ApplicationExtension;
import org.testfx.framework.junit5.Start;
import org.testfx.util.WaitForAsyncUtils;

/** The real window, driven by mouse and keys. */
@ExtendWith(ApplicationExtension.class)
class WindowTest {
    private static final SimulationSettings SHORT = new SimulationSettings(2_000, 1, 1);

    private final ScriptedDialogs dialogs = new ScriptedDialogs();
    private Path folder;
    private DesktopWindow window;
    private Session session;

    @Start
    void start(Stage stage) throws Exception {
        folder = Files.createTempDirectory("layerweft-window");
        window = new DesktopWindow(stage, folder, Background.ofWindow(), SHORT, dialogs);
        window.show();
        session = window.session();
        session.open(small());
    }

    /** Quick to price: a layer by the event, one of a single peril, an aggregate layer that τ moves. */
    private static Document small() {
        FileTree portfolio = FileTree.parse("portfolio", """
                {"format": "layerweft/portfolio/1", "name": "Two perils", "currency": "EUR", "unit": "million", "perils": [
                  {"name": "a", "frequency": {"model": "poisson", "mean": 1}, "severity": {"model": "exponential", "mean": 10}},
                  {"name": "b", "frequency": {"model": "poisson", "mean": 2}, "severity": {"model": "exponential", "mean": 5}}],
                 "dependence": {"links": "counts", "copula": {"family": "gumbel", "kendallTau": 0.3}}}
                """);
        FileTree programme = FileTree.parse("programme", """
                {"format": "layerweft/programme/1", "name": "Three layers", "layers": [
                  {"name": "Each event", "occurrence": {"retention": 10, "limit": 10}},
                  {"name": "Only a", "perils": ["a"], "occurrence": {"retention": 20, "limit": 30}, "reinstatements": [1.0]},
                  {"name": "Aggregate", "annual": {"deductible": 30, "limit": 20}}]}
                """);
        return new Document(portfolio, programme, null, null);
    }

    private static void until(Callable<Boolean> condition) throws TimeoutException {
        WaitForAsyncUtils.waitFor(20, TimeUnit.SECONDS, () -> WaitForAsyncUtils.asyncFx(condition).get());
    }

    private void settled() throws TimeoutException {
        until(() -> session.prices().get() != null && session.background().running().isEmpty());
        WaitForAsyncUtils.waitForFxEvents();
    }

    private String text(FxRobot robot, String query) {
        return robot.lookup(query).queryAs(Labeled.class).getText();
    }

    private String lossOnLine(FxRobot robot, int layer) {
        return robot.lookup("#layer-cell-" + layer).lookup(".lw-cell-value").queryAs(Label.class).getText();
    }

    private void dragRing(FxRobot robot, double pixels) {
        Node ring = robot.lookup(".lw-tau-ring").query();
        robot.moveTo(ring).press(MouseButton.PRIMARY).moveBy(pixels / 2, 0).moveBy(pixels / 2, 0).release(MouseButton.PRIMARY);
    }

    @Test
    void draggingTauChangesTheStripAndIsOneStep(FxRobot robot) throws Exception {
        settled();
        String before = lossOnLine(robot, 2);
        dragRing(robot, 100);
        settled();
        double tau = session.tau().get().tau();
        assertTrue(tau > 0.5 && tau < 0.7, () -> "tau " + tau);
        assertEquals(Math.rint(tau * 100), tau * 100, 1e-6, "steps of 0.01");
        assertNotEquals(before, lossOnLine(robot, 2));
        assertTrue(session.unsaved().get());
        robot.press(KeyCode.CONTROL).type(KeyCode.Z).release(KeyCode.CONTROL);
        settled();
        assertEquals(before, lossOnLine(robot, 2));
        assertNull(session.undoable().get(), "one drag is one step");
        robot.press(KeyCode.CONTROL).type(KeyCode.Y).release(KeyCode.CONTROL);
        settled();
        assertEquals(tau, session.tau().get().tau(), 1e-9);
    }

    @Test
    void aFirstStartSelectsTheLayerThatTauMovesMostAndSaysWhatToDo(FxRobot robot) throws Exception {
        settled();
        assertEquals("Sensitivity", text(robot, "#room-title"));
        assertEquals(2, session.selectedLayer().get());
        assertEquals("Drag τ.", text(robot, "#notice"));
        dragRing(robot, 40);
        until(() -> !robot.lookup("#notice").query().isVisible());
    }

    @Test
    void shiftDragsInThousandths(FxRobot robot) throws Exception {
        settled();
        robot.press(KeyCode.SHIFT);
        dragRing(robot, 21);
        robot.release(KeyCode.SHIFT);
        double tau = session.tau().get().tau();
        assertEquals(Math.rint(tau * 1000), tau * 1000, 1e-6);
        assertNotEquals(Math.rint(tau * 100), tau * 100, 1e-3);
    }

    @Test
    void draggingOnACurveTurnsTau(FxRobot robot) throws Exception {
        settled();
        Node picture = robot.lookup("#layer-cell-2").lookup(".lw-lift").query();
        Bounds at = robot.bounds(picture).query();
        robot.moveTo(at.getMinX() + at.getWidth() * 0.3, at.getCenterY()).press(MouseButton.PRIMARY)
                .moveTo(at.getMinX() + at.getWidth() * 0.7, at.getCenterY()).moveBy(3, 0).release(MouseButton.PRIMARY);
        double tau = session.tau().get().tau();
        assertTrue(tau > 0.65 && tau < 0.8, () -> "tau " + tau);
        assertEquals(2, session.selectedLayer().get());
    }

    @Test
    void tauIsTypedAfterADoubleClick(FxRobot robot) throws Exception {
        settled();
        robot.doubleClickOn("#tau-value").write("0.45").type(KeyCode.ENTER);
        assertEquals(0.45, session.tau().get().tau(), 1e-9);
        robot.doubleClickOn("#tau-value").write("nonsense").type(KeyCode.ENTER).type(KeyCode.ESCAPE);
        assertEquals(0.45, session.tau().get().tau(), 1e-9);
        assertEquals("0.45", text(robot, "#tau-value"));
    }

    @Test
    void tauByKeysAndFamiliesByBrackets(FxRobot robot) throws Exception {
        settled();
        robot.clickOn("#tau-track");
        robot.interact(() -> session.setTau(0.3, null));
        robot.type(KeyCode.RIGHT).type(KeyCode.RIGHT).type(KeyCode.LEFT).type(KeyCode.PAGE_UP);
        assertEquals(0.41, session.tau().get().tau(), 1e-9);
        robot.press(KeyCode.SHIFT).type(KeyCode.RIGHT).release(KeyCode.SHIFT);
        assertEquals(0.411, session.tau().get().tau(), 1e-9);
        robot.write("]");
        assertEquals("Survival Clayton", text(robot, "#family"));
        robot.write("[");
        assertEquals("Gumbel", text(robot, "#family"));
    }

    @Test
    void thePinShowsChangesAndIsTakenAway(FxRobot robot) throws Exception {
        settled();
        robot.press(KeyCode.CONTROL).type(KeyCode.B).release(KeyCode.CONTROL);
        assertTrue(text(robot, "#pinned").startsWith("Pinned: Gumbel 0.30, "));
        robot.interact(() -> session.setTau(0.5, null));
        settled();
        String change = robot.lookup("#layer-cell-2").lookup(".lw-cell-change").queryAs(Label.class).getText();
        assertTrue(change.startsWith("+"), change);
        robot.press(KeyCode.CONTROL, KeyCode.SHIFT).type(KeyCode.B).release(KeyCode.SHIFT, KeyCode.CONTROL);
        assertNull(session.pinned().get());
    }

    @Test
    void keysLeadToTheRoomsThatThereAre(FxRobot robot) throws Exception {
        settled();
        robot.press(KeyCode.CONTROL).type(KeyCode.DIGIT4).release(KeyCode.CONTROL);
        assertEquals("Quote", text(robot, "#room-title"));
        robot.press(KeyCode.CONTROL).type(KeyCode.DIGIT6).release(KeyCode.CONTROL);
        assertEquals("Quote", text(robot, "#room-title"), "Structures is not there yet");
        robot.clickOn("#rail-perils");
        assertEquals("Perils", text(robot, "#room-title"));
    }

    @Test
    void theThemeTurnsDarkAndBack(FxRobot robot) throws Exception {
        settled();
        robot.clickOn("#theme");
        assertTrue(window.theme().dark().get());
        robot.press(KeyCode.CONTROL, KeyCode.SHIFT).type(KeyCode.L).release(KeyCode.SHIFT, KeyCode.CONTROL);
        assertFalse(window.theme().dark().get());
    }

    @Test
    void theCommandFieldFindsACommandByItsWords(FxRobot robot) throws Exception {
        settled();
        robot.press(KeyCode.CONTROL).type(KeyCode.K).release(KeyCode.CONTROL);
        robot.write("dark th");
        robot.type(KeyCode.ENTER);
        assertTrue(window.theme().dark().get());
    }

    @Test
    void layersAreAddedAndDeletedByKeys(FxRobot robot) throws Exception {
        settled();
        robot.clickOn("#layer-cell-1");
        assertEquals(1, session.selectedLayer().get());
        robot.write('+');
        settled();
        assertEquals(4, session.prices().get().layers().size());
        assertEquals(2, session.selectedLayer().get());
        assertEquals(50, session.treaty().get().layer(2).occurrence().retention());
        robot.type(KeyCode.DELETE);
        settled();
        assertEquals(3, session.prices().get().layers().size());
    }

    @Test
    void typingIntoAFieldGivesNoCommands(FxRobot robot) throws Exception {
        settled();
        robot.clickOn("#command-field").write("a+]").type(KeyCode.DELETE);
        assertEquals(3, session.treaty().get().layers());
        assertEquals("Gumbel", text(robot, "#family"));
    }

    @Test
    void closingAsksAboutUnsavedChangesAndRemembersTheWindow(FxRobot robot) throws Exception {
        settled();
        robot.interact(() -> session.setTau(0.5, null));
        robot.press(KeyCode.CONTROL).type(KeyCode.DIGIT1).release(KeyCode.CONTROL);
        robot.press(KeyCode.CONTROL).type(KeyCode.Q).release(KeyCode.CONTROL);
        assertTrue(window.frame().getScene().getWindow().isShowing(), "no answer: stays");
        Path portfolio = folder.resolve("mine.json");
        Path programme = folder.resolve("its.json");
        dialogs.answer("Save").save(portfolio, programme);
        robot.press(KeyCode.CONTROL).type(KeyCode.Q).release(KeyCode.CONTROL);
        until(() -> !window.frame().getScene().getWindow().isShowing());
        assertTrue(Files.readString(portfolio).contains("\"kendallTau\": 0.5"));
        assertTrue(Files.readString(folder.resolve("window.properties")).contains("room=Perils"));
        assertTrue(dialogs.said().get(0).contains("Save changes?"));
    }

    @Test
    void whatACrashLostIsOfferedAtTheNextStart(FxRobot robot) throws Exception {
        settled();
        robot.interact(() -> session.setTau(0.5, null));
        Path copies = folder.resolve("recovery");
        Path mine = copies.resolve(String.valueOf(ProcessHandle.current().pid()));
        until(() -> Files.exists(mine.resolve("programme.json")));
        settled();
        // no process has the largest number
        Files.move(mine, copies.resolve("999999999999999999"));
        dialogs.answer("Recover");
        robot.interact(() -> {
            DesktopWindow next = new DesktopWindow(new Stage(), folder, Background.ofWindow(), SHORT, dialogs);
            next.show();
            assertEquals(0.5, next.session().tau().get().tau(), 1e-9);
            assertTrue(next.session().unsaved().get());
            assertFalse(Files.exists(copies.resolve("999999999999999999")));
            next.frame().getScene().getWindow().hide();
        });
        assertEquals("Recover unsaved changes?", dialogs.said().get(0));
    }

    @Test
    void aFaultGreysTheFiguresUntilItIsUndone(FxRobot robot) throws Exception {
        settled();
        String before = lossOnLine(robot, 0);
        robot.interact(() -> session.edit("limit", d -> d.withProgramme(p -> p.set("layers[0].occurrence.limit", -5))));
        Node cell = robot.lookup("#layer-cell-0").query();
        assertTrue(cell.getPseudoClassStates().stream().anyMatch(state -> state.getPseudoClassName().equals("last-valid")));
        assertEquals(before, lossOnLine(robot, 0));
        robot.press(KeyCode.CONTROL).type(KeyCode.Z).release(KeyCode.CONTROL);
        assertFalse(cell.getPseudoClassStates().stream().anyMatch(state -> state.getPseudoClassName().equals("last-valid")));
    }
}
