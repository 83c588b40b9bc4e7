package layerweft.desktop.picture;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import javafx.scene.Node;
import javafx.scene.Scene;
import javafx.scene.input.KeyCode;
import javafx.scene.input.MouseButton;
import javafx.scene.layout.HBox;
import javafx.stage.Stage;
import layerweft.desktop.theme.Theme;
import layerweft.model.copula.CopulaFamily;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.extension.ExtendWith;
import org.testfx.api.FxRobot;
import org.testfx.framework.junit5.ApplicationExtension;
import org.testfx.framework.junit5.Start;
import org.testfx.util.WaitForAsyncUtils;

/** A real hand and real keys on a tile and on the joint years. */
@ExtendWith(ApplicationExtension.class)
class DependencePicturesTest {
    private static final CopulaFamily GUMBEL = CopulaFamily.parse("gumbel");

    private final TileRecorder owner = new TileRecorder();
    private FamilyTile tile;
    private JointYearsPicture years;

    @Start
    void start(Stage stage) {
        Theme theme = new Theme();
        tile = new FamilyTile(theme, owner);
        tile.setMinSize(150, 170);
        tile.setMaxSize(150, 170);
        years = new JointYearsPicture(theme);
        years.setMinSize(354, 348);
        years.setMaxSize(354, 348);
        stage.setScene(new Scene(new HBox(tile, years), 600, 360));
        stage.show();
        tile.show(shape(""));
        years.show(JointYears.drawn("Windstorm", "Flood", GUMBEL.at(0.3), 20_000, 7));
    }

    private static FamilyShape shape(String reason) {
        return new FamilyShape(GUMBEL, "Gumbel", GUMBEL.at(0.3), 0.38, "4.62\u2009%", true, false, reason);
    }

    private void moveTo(FxRobot hand, Node picture, double x, double y) {
        hand.robotContext().getBaseRobot().moveMouse(picture.localToScreen(x, y));
        WaitForAsyncUtils.waitForFxEvents();
    }

    @Test
    void pressingPreviewsAndLettingGoTakes(FxRobot hand) {
        moveTo(hand, tile, 70, 80);
        hand.press(MouseButton.PRIMARY);
        assertEquals(List.of("preview gumbel"), owner.asked);
        hand.release(MouseButton.PRIMARY);
        assertEquals(List.of("preview gumbel", "take gumbel"), owner.asked);
    }

    @Test
    void escapeLetsGoWithoutAChange(FxRobot hand) {
        moveTo(hand, tile, 70, 80);
        hand.press(MouseButton.PRIMARY).press(KeyCode.ESCAPE).release(KeyCode.ESCAPE).release(MouseButton.PRIMARY);
        assertEquals(List.of("preview gumbel", "give up gumbel"), owner.asked);
    }

    @Test
    void aFamilyOutOfReachIsNotTaken(FxRobot hand) {
        hand.interact(() -> tile.show(shape("begins at τ 0")));
        hand.sleep(80);
        hand.clickOn(tile);
        assertEquals(List.of(), owner.asked);
        assertTrue(tile.getAccessibleText().contains("begins at τ 0"), tile.getAccessibleText());
    }

    @Test
    void theWarmCornerIsDraggedAlongTheDiagonalInRoundSteps(FxRobot hand) {
        double side = 300;
        double ten = side * Math.log10(10) / 2.5;
        double fifty = side * Math.log10(50) / 2.5;
        moveTo(hand, years, 50 + ten + 20, 8 + side - ten - 20);
        hand.press(MouseButton.PRIMARY);
        moveTo(hand, years, 50 + fifty + 20, 8 + side - fifty - 20);
        hand.release(MouseButton.PRIMARY);
        assertEquals(50, years.corner().get());
        moveTo(hand, years, 50 + fifty, 200);
        hand.press(MouseButton.PRIMARY);
        moveTo(hand, years, 0, 340);
        hand.release(MouseButton.PRIMARY);
        assertEquals(5, years.corner().get(), "no further than 1 in 5");
    }

    @Test
    void arrowsMoveTheCornerAndItsCountIsSaid(FxRobot hand) {
        hand.interact(years::requestFocus);
        hand.press(KeyCode.UP).release(KeyCode.UP);
        assertEquals(12, years.corner().get());
        assertTrue(years.getAccessibleText().contains("of 20000"), years.getAccessibleText());
    }
}
