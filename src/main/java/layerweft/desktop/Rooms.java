package layerweft.desktop;

import java.util.List;
import java.util.function.Function;
import layerweft.desktop.dependence.DependenceRoom;
import layerweft.desktop.perils.PerilsRoom;
import layerweft.desktop.programme.ProgrammeRoom;
import layerweft.desktop.quote.QuoteRoom;
import layerweft.desktop.sensitivity.SensitivityRoom;
import layerweft.desktop.theme.Icons;

/** The rooms, in the order of the rail: one line each. */
public final class Rooms {

    /** The room of a first start. */
    public static final String FIRST = "Sensitivity";

    /**
     * A place on the rail.
     *
     * @param icon an outline of {@link Icons}
     * @param reason why it cannot be entered, in words; empty where it can
     * @param make makes the room when it is first entered
     */
    public record Place(String name, String icon, String reason, Function<RoomTools, Room> make) {

        static Place of(String name, String icon, Function<RoomTools, Room> make) {
            return new Place(name, icon, "", make);
        }

        static Place later(String name, String icon, String reason) {
            return new Place(name, icon, reason, tools -> new EmptyRoom(name));
        }
    }

    private Rooms() {}

    public static List<Place> all() {
        return List.of(
                Place.of("Perils", Icons.PERILS, PerilsRoom::new),
                Place.of("Dependence", Icons.DEPENDENCE, DependenceRoom::new),
                Place.of("Programme", Icons.PROGRAMME, ProgrammeRoom::new),
                Place.of("Quote", Icons.QUOTE, QuoteRoom::new),
                Place.of("Sensitivity", Icons.SENSITIVITY, SensitivityRoom::new),
                Place.later("Structures", Icons.STRUCTURES, "comes with the comparison of programmes"),
                Place.later("Evidence", Icons.EVIDENCE, "comes with the fitting of loss histories"));
    }
}
