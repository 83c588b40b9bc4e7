package layerweft.desktop.command;

import javafx.beans.binding.Bindings;
import javafx.beans.value.ObservableValue;
import javafx.scene.input.KeyCombination;

/**
 * Something that a user can ask for.
 *
 * @param menu the menu that holds it: File, Edit, View, Layer, Help, or the name of a room; also where the command field says it is
 * @param name as in menus; may change, as "Undo change of τ" does
 * @param keys its shortcut; null where it has none
 * @param refusal why it cannot be done at present, in words; empty where it can
 * @param action what it does
 */
public record Command(String menu, ObservableValue<String> name, KeyCombination keys, ObservableValue<String> refusal, Runnable action) {

    /** A command that can always be given. */
    public static Command of(String menu, String name, KeyCombination keys, Runnable action) {
        return new Command(menu, constant(name), keys, constant(""), action);
    }

    /** The same with times at which it cannot be given. */
    public Command unless(ObservableValue<String> why) {
        return new Command(menu, name, keys, why, action);
    }

    /** Does it, unless it is refused at present. */
    public void run() {
        if (refusal.getValue().isEmpty()) {
            action.run();
        }
    }

    private static ObservableValue<String> constant(String text) {
        return Bindings.createStringBinding(() -> text);
    }
}
