package layerweft.desktop.picture;

import static layerweft.desktop.picture.TowerGrip.Part.BODY;
import static layerweft.desktop.picture.TowerGrip.Part.RIGHT;
import static layerweft.desktop.picture.TowerGrip.Part.TOP;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import javafx.geometry.Point2D;
import javafx.scene.Node;
import javafx.scene.Scene;
import javafx.scene.input.KeyCode;
import javafx.scene.input.MouseButton;
import javafx.scene.layout.StackPane;
import javafx.stage.Stage;
import layerweft.desktop.theme.Theme;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.extension.ExtendWith;
import org.testfx.api.FxRobot;
import org.testfx.framework.junit5.ApplicationExtension;
import org.testfx.framework.junit5.Start;
import org.testfx.util.WaitForAsyncUtils;

/** A real hand and real keys on a tower of 884 × 600, where the layout says that things are. */
@ExtendWith(ApplicationExtension.class)
class TowerPictureTest {
    private static final int WIDTH = 884;
    private static final int HEIGHT = 600;

    private final TowerRecorder owner = new TowerRecorder();
    private TowerPicture picture;

    @Start
    void start(Stage stage) {
        picture = new TowerPicture(new Theme(), owner);
        stage.setScene(new Scene(new StackPane(picture), WIDTH, HEIGHT));
        stage.show();
        picture.show(TowerExamples.five(), 0);
    }

    private TowerLayout layout() {
        return TowerLayout.of(TowerExamples.five(), false, WIDTH, HEIGHT);
    }

    private Point2D at(double x, double y) {
        return picture.localToScreen(x, y);
    }

    private void press(FxRobot hand, double x, double y) {
        dragTo(hand, x, y);
        hand.press(MouseButton.PRIMARY);
    }

    private void dragTo(FxRobot hand, double x, double y) {
        hand.robotContext().getBaseRobot().moveMouse(at(x, y));
        WaitForAsyncUtils.waitForFxEvents();
    }

    @Test
    void draggingTheTopEdgeMovesTheLimitInStepsAndHoldsTheRetention(FxRobot hand) {
        TowerLayout.Block block = layout().blockOf(0);
        AmountScale scale = layout().scale();
        press(hand, 400, block.top() + 1);
        dragTo(hand, 400, block.top() + 1 + scale.y(81.3) - scale.y(60));
        assertEquals("terms MOVING", owner.lastAsked());
        hand.release(MouseButton.PRIMARY);
        assertEquals("terms DONE", owner.lastAsked());
        TowerChange change = owner.last.get(0);
        assertEquals(1, owner.last.size());
        assertEquals(30, change.retention());
        assertEquals(50, change.limit(), "81.3 is nearest to 80, in steps of 5");
    }

    @Test
    void draggingTheBottomEdgeMovesTheRetentionAndHoldsTheTop(FxRobot hand) {
        TowerLayout.Block block = layout().blockOf(0);
        press(hand, 400, block.bottom() - 1);
        dragTo(hand, 400, layout().scale().y(45));
        hand.release(MouseButton.PRIMARY);
        assertEquals(List.of(new TowerChange(0, 45, 15)), owner.last);
    }

    @Test
    void draggingTheBodyMovesBothAndSelectsTheLayer(FxRobot hand) {
        TowerLayout.Block block = layout().blockOf(2);
        double from = block.middle();
        press(hand, 400, from);
        assertEquals("select 2", owner.lastAsked());
        dragTo(hand, 400, from + layout().scale().y(100) - layout().scale().y(150));
        hand.release(MouseButton.PRIMARY);
        assertEquals(List.of(new TowerChange(2, 100, 150)), owner.last);
    }

    @Test
    void shiftMovesAdjoiningLayersTogether(FxRobot hand) {
        TowerLayout.Block block = layout().blockOf(0);
        hand.press(KeyCode.SHIFT);
        press(hand, 400, block.top() + 1);
        dragTo(hand, 400, layout().scale().y(80));
        hand.release(MouseButton.PRIMARY).release(KeyCode.SHIFT);
        assertEquals(List.of(new TowerChange(0, 30, 50), new TowerChange(1, 80, 70)), owner.last);
    }

    @Test
    void altFreesTheEdgeFromItsSteps(FxRobot hand) {
        TowerLayout.Block block = layout().blockOf(0);
        hand.press(KeyCode.ALT);
        press(hand, 400, block.top() + 1);
        dragTo(hand, 400, block.top() + 1 - 3);
        hand.release(MouseButton.PRIMARY).release(KeyCode.ALT);
        double limit = owner.last.get(0).limit();
        assertEquals(30 + 3 * 312 / (layout().scale().bottom() - layout().scale().top()), limit, 0.2);
        assertTrue(limit % 5 != 0, "between the steps: " + limit);
    }

    @Test
    void escapeGivesTheMovementUp(FxRobot hand) {
        TowerLayout.Block block = layout().blockOf(0);
        press(hand, 400, block.top() + 1);
        dragTo(hand, 400, layout().scale().y(100));
        hand.press(KeyCode.ESCAPE).release(KeyCode.ESCAPE);
        assertEquals("terms GIVEN_UP", owner.lastAsked());
        assertEquals(List.of(new TowerChange(0, 30, 30)), owner.last);
        dragTo(hand, 400, layout().scale().y(120));
        hand.release(MouseButton.PRIMARY);
        assertEquals("terms GIVEN_UP", owner.lastAsked(), "nothing comes after a movement that was given up");
    }

    @Test
    void draggingTheRightEdgeAddsReinstatements(FxRobot hand) {
        TowerLayout.Block block = layout().blockOf(0);
        press(hand, block.right() - 1, block.middle());
        dragTo(hand, block.right() + layout().pitch(), block.middle());
        assertEquals("reinstatements 0 3 MOVING", owner.lastAsked());
        dragTo(hand, block.right() - 2 * layout().pitch(), block.middle());
        hand.release(MouseButton.PRIMARY);
        assertEquals("reinstatements 0 0 DONE", owner.lastAsked());
    }

    @Test
    void arrowsMoveTheFocusedEdgeByOneStep(FxRobot hand) {
        focus(hand, new TowerGrip(0, TOP));
        hand.press(KeyCode.UP).release(KeyCode.UP);
        assertEquals(List.of(new TowerChange(0, 30, 35)), owner.last);
        focus(hand, new TowerGrip(0, BODY));
        hand.press(KeyCode.DOWN).release(KeyCode.DOWN);
        assertEquals(25, owner.last.get(0).retention());
        focus(hand, new TowerGrip(0, RIGHT));
        hand.press(KeyCode.LEFT).release(KeyCode.LEFT);
        assertEquals("reinstatements 0 1 DONE", owner.lastAsked());
    }

    @Test
    void aLayerSaysWhatItIs(FxRobot hand) {
        String said = spot(hand, new TowerGrip(0, BODY)).getAccessibleText();
        assertTrue(said.contains("First cat") && said.contains("30 xs 30") && said.contains("1st limit used 22.6"), said);
        assertFalse(said.contains("NaN"), said);
    }

    @Test
    void draggingUpwardInAnEmptyProgrammeDrawsTheFirstLayer(FxRobot hand) {
        hand.interact(() -> picture.show(TowerExamples.empty(), -1));
        WaitForAsyncUtils.waitForFxEvents();
        AmountScale scale = TowerLayout.of(TowerExamples.empty(), false, WIDTH, HEIGHT).scale();
        press(hand, 600, scale.y(20));
        dragTo(hand, 600, scale.y(50));
        hand.release(MouseButton.PRIMARY);
        assertEquals(List.of("drawn 30 xs 20"), owner.asked);
    }

    private void focus(FxRobot hand, TowerGrip grip) {
        hand.interact(spot(hand, grip)::requestFocus);
    }

    private Node spot(FxRobot hand, TowerGrip grip) {
        WaitForAsyncUtils.waitForFxEvents();
        return hand.from(picture).lookup((Node node) -> grip.equals(node.getUserData())).query();
    }
}
