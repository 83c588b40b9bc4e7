package layerweft.desktop;

import java.util.List;
import javafx.beans.value.ObservableValue;
import javafx.scene.Node;
import layerweft.desktop.command.Command;

/** One of the places from which a treaty is looked at. */
public interface Room {

    /** The name on the rail and before the reading, e.g. {@code Sensitivity}. */
    String name();

    /** What fills the room's area; the same node at every call. */
    Node view();

    /** The sentence beside the name; {@link Reading#EMPTY} where there is nothing to say. */
    ObservableValue<Reading> reading();

    /** Commands of the room, in the command field while the room is shown. */
    default List<Command> commands() {
        return List.of();
    }

    /** Called each time the room comes into view: the moment to begin what takes long. */
    default void entered() {}

    /** Called each time the room goes out of view: the moment to stop what nobody looks at. */
    default void left() {}
}
