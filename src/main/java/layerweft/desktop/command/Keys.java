package layerweft.desktop.command;

import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyCodeCombination;
import javafx.scene.input.KeyCombination;

/** Shortcuts, made and written. */
public final class Keys {

    private Keys() {}

    public static KeyCombination ctrl(KeyCode key) {
        return new KeyCodeCombination(key, KeyCombination.SHORTCUT_DOWN);
    }

    public static KeyCombination ctrlShift(KeyCode key) {
        return new KeyCodeCombination(key, KeyCombination.SHORTCUT_DOWN, KeyCombination.SHIFT_DOWN);
    }

    public static KeyCombination plain(KeyCode key) {
        return new KeyCodeCombination(key);
    }

    /** As on the keys: {@code Ctrl Shift B}. */
    public static String text(KeyCombination keys) {
        return keys.getDisplayText().replace("+", " ").replace("  ", " +").strip();
    }
}
