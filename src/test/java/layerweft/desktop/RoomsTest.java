package layerweft.desktop;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Set;
import java.util.concurrent.Callable;
import java.util.concurrent.TimeUnit;
import java.util.concurrent.TimeoutException;
import javafx.scene.Node;
import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.control.Labeled;
import javafx.scene.control.TextField;
import javafx.scene.input.KeyCode;
import javafx.scene.input.MouseButton;
import javafx.stage.Stage;
import layerweft.desktop.control.ChartView;
import layerweft.desktop.control.FigureTable;
import layerweft.desktop.picture.JointYearsPicture;
import layerweft.desktop.session.Background;
import layerweft.desktop.session.Session;
import layerweft.engine.RunControl;
import layerweft.engine.simulation.SimulationSettings;
import layerweft.file.FileTree;
import layerweft.file.TreatyCheck;
import layerweft.report.chart.ChartPicture;
import layerweft.report.chart.ExceedanceChart;
import layerweft.report.chart.SensitivityChart;
import layerweft.study.EngineChoice;
import layerweft.study.Quote;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.extension.ExtendWith;
import org.testfx.api.FxRobot;
import org.testfx.framework.junit5.ApplicationExtension;
import org.testfx.framework.junit5.Start;
import org.testfx.util.WaitForAsyncUtils;

/** The rooms of the real window, driven by mouse and keys. */
@ExtendWith(ApplicationExtension.class)
class RoomsTest {
    private static final SimulationSettings SHORT = new SimulationSettings(2_000, 1, 1);

    private static final Set<String> OF_PRICES = Set.of("Pricing", "First answer", "Curves against τ", "Simulating the whole treaty");

    private final ScriptedDialogs dialogs = new ScriptedDialogs();
    private DesktopWindow window;
    private Session session;

    @Start
    void start(Stage stage) throws Exception {
        Path folder = Files.createTempDirectory("layerweft-rooms");
        window = new DesktopWindow(stage, folder, Background.ofWindow(), SHORT, dialogs);
        window.show();
        session = window.session();
    }

    private static void until(Callable<Boolean> condition) throws TimeoutException {
        WaitForAsyncUtils.waitFor(60, TimeUnit.SECONDS, () -> WaitForAsyncUtils.asyncFx(condition).get());
    }

    /** Prices, curves and the long run are those of the document on screen; what rooms compute behind may still be on its way. */
    private void settled() throws TimeoutException {
        until(() -> session.prices().get() != null && session.background().running().stream().noneMatch(t -> OF_PRICES.contains(t.name())));
        WaitForAsyncUtils.waitForFxEvents();
    }

    private void enter(FxRobot robot, String room) throws TimeoutException {
        robot.interact(() -> window.frame().goTo(room));
        settled();
    }

    private static <P extends ChartPicture> P picture(FxRobot robot, Class<P> kind) throws TimeoutException {
        until(() -> robot.lookup(".lw-chart").queryAllAs(ChartView.class).stream().anyMatch(v -> v.isVisible() && kind.isInstance(v.picture().get())));
        return robot.lookup(".lw-chart").queryAllAs(ChartView.class).stream().filter(Node::isVisible).map(v -> v.picture().get()).filter(kind::isInstance).map(kind::cast)
                .findFirst().orElseThrow(() -> new AssertionError("no " + kind.getSimpleName() + " on screen"));
    }

    private static ChartView viewOf(FxRobot robot, Class<? extends ChartPicture> kind) {
        return robot.lookup(".lw-chart").queryAllAs(ChartView.class).stream().filter(v -> kind.isInstance(v.picture().get())).findFirst().orElseThrow();
    }

    private static TextField field(FxRobot robot, String label, int nth) {
        return robot.lookup(".text-field").queryAllAs(TextField.class).stream().filter(f -> label.equals(f.getAccessibleText())).toList().get(nth);
    }

    private static void type(FxRobot robot, TextField field, String text) {
        robot.interact(field::requestFocus);
        robot.interact(field::selectAll);
        robot.write(text).type(KeyCode.ENTER);
        WaitForAsyncUtils.waitForFxEvents();
    }

    @Test
    void perilsAnEditedNumberMovesTheStripAndAWrongOneSaysWhatIsAdmissible(FxRobot robot) throws Exception {
        settled();
        enter(robot, "Perils");
        double before = session.prices().get().layers().get(0).expectedLoss().value();
        type(robot, field(robot, "Mean", 0), "3.6");
        settled();
        assertEquals(3.6, session.document().get().portfolio().number("perils[0].frequency.mean"));
        assertTrue(session.prices().get().layers().get(0).expectedLoss().value() > 1.5 * before);
        type(robot, field(robot, "Mean", 0), "-2");
        settled();
        assertFalse(session.faults().isEmpty());
        assertFalse(session.prices().get().valid());
        assertTrue(robot.lookup(".lw-field-message").queryAllAs(Label.class).stream().anyMatch(l -> l.isVisible() && l.getText().contains("above 0")));
        robot.interact(session::undo);
        settled();
        assertTrue(session.prices().get().valid());
    }

    @Test
    void perilsAreAddedAndDeletedAndTheProgrammeFollows(FxRobot robot) throws Exception {
        settled();
        enter(robot, "Perils");
        robot.interact(() -> robot.lookup("Add a peril").queryAllAs(Labeled.class).stream().filter(b -> b instanceof Button)
                .map(b -> (Button) b).findFirst().orElseThrow().fire());
        settled();
        assertEquals(4, session.treaty().get().portfolio().perils().size());
        robot.interact(session::undo);
        settled();
        assertEquals(3, session.treaty().get().portfolio().perils().size());
    }

    @Test
    void dependenceATileTakesItsFamilyAndTheCornerIsCounted(FxRobot robot) throws Exception {
        settled();
        enter(robot, "Dependence");
        until(() -> robot.lookup(n -> String.valueOf(n.getAccessibleText()).startsWith("Joe, upper tail")).tryQuery().isPresent());
        robot.clickOn(robot.lookup(n -> String.valueOf(n.getAccessibleText()).startsWith("Joe, upper tail")).<Node>query());
        settled();
        assertEquals("joe", session.document().get().portfolio().text("dependence.copula.family"));
        assertEquals(0.3, session.document().get().portfolio().number("dependence.copula.kendallTau"), 1e-9);
        JointYearsPicture years = robot.lookup(n -> n instanceof JointYearsPicture).queryAs(JointYearsPicture.class);
        String before = years.getAccessibleText();
        assertTrue(before.startsWith("years at least as bad as 1 in 10"), before);
        assertTrue(before.endsWith(" of 4000"), before);
    }

    @Test
    void programmeTheUpperEdgeIsDraggedAndOneUndoBringsItBack(FxRobot robot) throws Exception {
        settled();
        enter(robot, "Programme");
        robot.interact(() -> session.selectedLayer().set(1));
        WaitForAsyncUtils.waitForFxEvents();
        Node edge = robot.lookup(n -> String.valueOf(n.getAccessibleText()).startsWith("limit of Second cat layer")).query();
        robot.moveTo(edge).press(MouseButton.PRIMARY).moveBy(0, 30).moveBy(0, 30).release(MouseButton.PRIMARY);
        settled();
        double limit = session.document().get().programme().number("layers[1].occurrence.limit");
        assertTrue(limit < 150 && limit > 50, "limit " + limit);
        assertEquals(1, session.selectedLayer().get());
        robot.interact(session::undo);
        settled();
        assertEquals(150, session.document().get().programme().number("layers[1].occurrence.limit"));
    }

    @Test
    void programmeTheFormChangesTermsAndListsOfReinstatements(FxRobot robot) throws Exception {
        settled();
        robot.interact(() -> session.selectedLayer().set(0));
        enter(robot, "Programme");
        type(robot, field(robot, "Retention", 0), "35m");
        settled();
        assertEquals(35, session.document().get().programme().number("layers[0].occurrence.retention"));
        type(robot, field(robot, "Reinstatements, premium of each", 0), "100 %; 50 %; 0 %");
        settled();
        assertEquals(List.of(1.0, 0.5, 0.0), session.document().get().programme().get("layers[0].reinstatements"));
        type(robot, field(robot, "Name", 0), "Lower cat layer");
        settled();
        assertEquals("Lower cat layer", session.prices().get().layers().get(0).name());
    }

    @Test
    void quoteShowsTheFiguresOfTheStripAndTheCurves(FxRobot robot) throws Exception {
        settled();
        enter(robot, "Quote");
        FigureTable table = robot.lookup(".lw-table").queryAs(FigureTable.class);
        assertEquals("8.151", table.table().rows().get(0).get(1));
        assertEquals(4, picture(robot, ExceedanceChart.class).lines().size());
        assertTrue(window.frame() != null && table.table().tabSeparated().startsWith("\texpected loss\t"));
    }

    @Test
    void sensitivityHasACurveForEachFamilyThroughThePresentPoint(FxRobot robot) throws Exception {
        settled();
        enter(robot, "Sensitivity");
        SensitivityChart chart = picture(robot, SensitivityChart.class);
        assertEquals(7, chart.lines().size());
        SensitivityChart.Line gumbel = chart.lines().stream().filter(SensitivityChart.Line::chosen).findFirst().orElseThrow();
        double there = gumbel.values().get(gumbel.taus().indexOf(0.3));
        assertEquals(100 * session.prices().get().layers().get(2).lossOnLine().value(), there, 1e-3);
        robot.interact(() -> session.selectedLayer().set(0));
        settled();
        assertTrue(picture(robot, SensitivityChart.class).title().contains("First cat layer"));
    }

    /** After edits, undo and redo, what is on screen is what the saved files price to. */
    @Test
    void theStripIsWhatTheSavedFilesPriceTo(FxRobot robot) throws Exception {
        settled();
        robot.interact(() -> {
            session.setTau(0.55, null);
            session.edit("limit", d -> d.withProgramme(t -> t.set("layers[0].occurrence.limit", 70)));
            session.edit("mean", d -> d.withPortfolio(t -> t.set("perils[1].frequency.mean", 1.3)));
            session.undo();
            session.undo();
            session.redo();
        });
        settled();
        var read = TreatyCheck.of(FileTree.parse("p", session.document().get().portfolio().text()), FileTree.parse("q", session.document().get().programme().text()));
        Quote quote = Quote.of(read.treaty(), EngineChoice.AUTO, SHORT, RunControl.NONE);
        for (int j = 0; j < quote.layers().size(); j++) {
            assertEquals(quote.layers().get(j).lossOnLine().value(), session.prices().get().layers().get(j).lossOnLine().value(), 2e-6);
        }
    }

    /** The journey of a broker's analyst: open the demo, change a retention, pin, turn τ, take the picture and the table away. */
    @Test
    void aBrokersJourneyEndsWithAPictureAndATable(FxRobot robot) throws Exception {
        settled();
        robot.interact(session::pin);
        robot.interact(() -> session.selectedLayer().set(0));
        enter(robot, "Programme");
        type(robot, field(robot, "Retention", 0), "30");
        settled();
        enter(robot, "Quote");
        assertEquals(100, picture(robot, ExceedanceChart.class).markAt());
        Path folder = Files.createTempDirectory("layerweft-journey");
        robot.interact(() -> viewOf(robot, ExceedanceChart.class).write(folder.resolve("curves.svg").toFile()));
        robot.interact(() -> viewOf(robot, ExceedanceChart.class).write(folder.resolve("curves.png").toFile()));
        String svg = Files.readString(folder.resolve("curves.svg"));
        assertTrue(svg.contains("<svg") && !svg.contains("<text"), "text as outlines");
        assertTrue(Files.size(folder.resolve("curves.png")) > 10_000);
        assertTrue(session.pinned().get().layer("First cat layer").isPresent());
    }
}
