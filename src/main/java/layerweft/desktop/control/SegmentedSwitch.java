package layerweft.desktop.control;

import java.util.List;
import java.util.function.Function;
import javafx.beans.property.ObjectProperty;
import javafx.beans.property.SimpleObjectProperty;
import javafx.scene.control.Toggle;
import javafx.scene.control.ToggleButton;
import javafx.scene.control.ToggleGroup;
import javafx.scene.layout.HBox;

/** A choice of few, all in view, exactly one taken. */
public final class SegmentedSwitch<T> extends HBox {
    private final ToggleGroup group = new ToggleGroup();
    private final ObjectProperty<T> value = new SimpleObjectProperty<>();

    /** @param choices the first is taken to begin with */
    public SegmentedSwitch(List<T> choices, Function<T, String> name) {
        getStyleClass().add("lw-segments");
        for (T choice : choices) {
            ToggleButton button = new ToggleButton(name.apply(choice));
            button.getStyleClass().add("lw-segment");
            button.setToggleGroup(group);
            button.setUserData(choice);
            button.setOnAction(pressed -> {
                button.setSelected(true); // pressing the taken one does not let go of it
                value.set(choice);
            });
            getChildren().add(button);
        }
        value.addListener((is, was, now) -> select(now));
        value.set(choices.get(0));
    }

    public ObjectProperty<T> value() {
        return value;
    }

    private void select(T choice) {
        for (Toggle toggle : group.getToggles()) {
            if (toggle.getUserData().equals(choice)) {
                toggle.setSelected(true);
            }
        }
    }
}
