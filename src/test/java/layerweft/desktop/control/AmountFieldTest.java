package layerweft.desktop.control;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertNull;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import javafx.scene.Scene;
import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.input.KeyCode;
import javafx.scene.layout.VBox;
import javafx.stage.Stage;
import layerweft.desktop.theme.Theme;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.extension.ExtendWith;
import org.testfx.api.FxRobot;
import org.testfx.framework.junit5.ApplicationExtension;
import org.testfx.framework.junit5.Start;

@ExtendWith(ApplicationExtension.class)
class AmountFieldTest {
    private final List<Double> committed = new ArrayList<>();
    private AmountField field;
    private Button elsewhere;

    @Start
    void start(Stage stage) {
        field = new AmountField("Limit", AmountText.Kind.AMOUNT, "million").onCommit(committed::add);
        field.value().set(30.0);
        elsewhere = new Button("elsewhere");
        Scene scene = new Scene(new VBox(20, field, elsewhere), 300, 200);
        new Theme().dress(scene);
        stage.setScene(scene);
        stage.show();
    }

    private void type(FxRobot robot, String text) {
        robot.interact(() -> {
            field.textField().requestFocus();
            field.textField().selectAll();
        });
        robot.write(text);
    }

    private String message() {
        Label label = (Label) field.lookup(".lw-field-message");
        return label.isVisible() ? label.getText() : "";
    }

    @Test
    void enterCommitsInTheUnitOfTheFile(FxRobot robot) {
        type(robot, "2,500k");
        robot.type(KeyCode.ENTER);
        assertEquals(List.of(2.5), committed);
        assertEquals("2.5", field.textField().getText());
    }

    @Test
    void leavingCommitsOnce(FxRobot robot) {
        type(robot, "12.5m");
        robot.clickOn(elsewhere);
        assertEquals(List.of(12.5), committed);
    }

    @Test
    void escapeBringsTheLastValueBack(FxRobot robot) {
        type(robot, "99");
        robot.type(KeyCode.ESCAPE);
        assertEquals("30", field.textField().getText());
        robot.clickOn(elsewhere);
        assertTrue(committed.isEmpty());
    }

    @Test
    void whatIsNoNumberIsSaidOnLeavingAndTheLastValueStays(FxRobot robot) {
        type(robot, "ten");
        robot.clickOn(elsewhere);
        assertEquals("Type a number, as 12.5m or 1,200. The last valid value, 30, still prices the layer.", message());
        assertEquals(30.0, field.value().get());
        assertTrue(committed.isEmpty());
        assertEquals("ten", field.textField().getText());
    }

    @Test
    void aFaultOfTheDocumentIsShownBesideTheField(FxRobot robot) {
        robot.interact(() -> field.fault().set("Limit must be more than 0."));
        assertEquals("Limit must be more than 0.", message());
        robot.interact(() -> field.fault().set(""));
        assertEquals("", message());
    }

    @Test
    void whatDoesNotApplyIsDisabledWithTheReason(FxRobot robot) {
        robot.interact(() -> field.reason().set("needs an occurrence limit"));
        assertTrue(field.textField().isDisabled());
        assertEquals("needs an occurrence limit", message());
        robot.interact(() -> field.reason().set(""));
        assertFalse(field.textField().isDisabled());
    }

    @Test
    void aFieldMayBeBlankWhereThatMeansSomething(FxRobot robot) {
        robot.interact(() -> field.orBlank("no limit"));
        type(robot, " ");
        robot.type(KeyCode.ENTER);
        assertEquals(1, committed.size());
        assertNull(committed.get(0));
    }
}
