package layerweft.desktop;

import javafx.beans.property.ReadOnlyObjectWrapper;
import javafx.beans.value.ObservableValue;
import javafx.scene.Node;
import javafx.scene.layout.Pane;

/** A room with its place on the rail and nothing in it. */
final class EmptyRoom implements Room {
    private final String name;
    private final Pane view = new Pane();
    private final ReadOnlyObjectWrapper<Reading> reading = new ReadOnlyObjectWrapper<>(Reading.EMPTY);

    EmptyRoom(String name) {
        this.name = name;
    }

    @Override
    public String name() {
        return name;
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
