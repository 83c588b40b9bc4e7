package layerweft.desktop;

import java.util.ArrayList;
import java.util.List;
import java.util.function.Consumer;
import javafx.beans.binding.Bindings;
import javafx.beans.value.ObservableValue;
import javafx.scene.control.Menu;
import javafx.scene.control.MenuItem;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyCodeCombination;
import javafx.scene.input.KeyCombination;
import layerweft.desktop.command.Command;
import layerweft.desktop.command.Keys;
import layerweft.desktop.habit.DocumentFiles;
import layerweft.desktop.habit.Preferences;
import layerweft.desktop.session.LayerEdit;
import layerweft.desktop.session.Session;
import layerweft.desktop.theme.Theme;

/** What can be asked of the window in every room, each declared once. */
public final class Commands {
    private static final List<String> MENUS = List.of("File", "Edit", "View", "Layer", "Help");
    private static final int TEXT_STEP = 10;

    private final Session session;
    private final Theme theme;
    private final DocumentFiles files;
    private final Preferences preferences;
    private final List<Command> all = new ArrayList<>();
    private final Command undo;
    private final Command redo;
    private final Command lightOrDark;
    private Consumer<String> goTo = room -> {};
    private Runnable find = () -> {};

    /**
     * What only the window itself can do.
     *
     * @param close ends the program, after asking
     */
    public record Window(Runnable help, Runnable about, Runnable close) {}

    public Commands(Session session, Theme theme, DocumentFiles files, Preferences preferences, Window window) {
        this.session = session;
        this.theme = theme;
        this.files = files;
        this.preferences = preferences;
        undo = new Command("Edit", named("Undo", session.undoable()), Keys.ctrl(KeyCode.Z), refused(session.undoable(), "nothing to undo"), session::undo);
        redo = new Command("Edit", named("Redo", session.redoable()), Keys.ctrl(KeyCode.Y), refused(session.redoable(), "nothing to redo"), session::redo);
        lightOrDark = new Command("View", Bindings.when(theme.dark()).then("Light theme").otherwise("Dark theme"), Keys.ctrlShift(KeyCode.L),
                always(), () -> theme.dark().set(!theme.dark().get()));
        file(window);
        edit();
        view();
        layer();
        all.add(Command.of("Help", "Shortcuts and help", Keys.plain(KeyCode.F1), window.help()));
        all.add(Command.of("Help", "Open the demo", null, files::openDemo));
        all.add(Command.of("Help", "About Layerweft", null, window.about()));
    }

    private void file(Window window) {
        all.add(Command.of("File", "Open…", Keys.ctrl(KeyCode.O), files::open));
        all.add(Command.of("File", "Save", Keys.ctrl(KeyCode.S), files::save));
        all.add(Command.of("File", "Save as…", Keys.ctrlShift(KeyCode.S), files::saveAs));
        all.add(Command.of("File", "Close the window", Keys.ctrl(KeyCode.Q), window.close()));
    }

    private void edit() {
        all.add(undo);
        all.add(redo);
        all.add(Command.of("Edit", "Pin figures", Keys.ctrl(KeyCode.B), session::pin));
        all.add(Command.of("Edit", "Remove the pin", Keys.ctrlShift(KeyCode.B), session::unpin).unless(refused(session.pinned(), "nothing is pinned")));
        all.add(Command.of("Edit", "Next family", Keys.plain(KeyCode.CLOSE_BRACKET), () -> session.stepFamily(1)));
        all.add(Command.of("Edit", "Previous family", Keys.plain(KeyCode.OPEN_BRACKET), () -> session.stepFamily(-1)));
        all.add(Command.of("Edit", "Find a command", Keys.ctrl(KeyCode.K), () -> find.run()));
    }

    private void view() {
        List<Rooms.Place> places = Rooms.all();
        for (int k = 0; k < places.size(); k++) {
            Rooms.Place place = places.get(k);
            Command command = Command.of("View", place.name(), Keys.ctrl(KeyCode.valueOf("DIGIT" + (k + 1))), () -> goTo.accept(place.name()));
            all.add(command.unless(Bindings.createStringBinding(() -> place.reason())));
        }
        all.add(lightOrDark);
        all.add(Command.of("View", "Larger text", Keys.ctrl(KeyCode.PLUS), () -> textSize(TEXT_STEP)));
        all.add(Command.of("View", "Smaller text", Keys.ctrl(KeyCode.MINUS), () -> textSize(-TEXT_STEP)));
        all.add(Command.of("View", "Text at 100 %", Keys.ctrl(KeyCode.DIGIT0), () -> theme.textPercent().set(100)));
    }

    private void textSize(int step) {
        theme.textPercent().set(Math.max(Theme.SMALLEST_TEXT, Math.min(Theme.LARGEST_TEXT, theme.textPercent().get() + step)));
    }

    private void layer() {
        ObservableValue<String> noLayer = Bindings.createStringBinding(
                () -> LayerEdit.count(session.document().get().programme()) == 0 ? "there is no layer" : "", session.document());
        all.add(Command.of("Layer", "New layer", new KeyCodeCombination(KeyCode.PLUS), this::newLayer));
        all.add(Command.of("Layer", "Duplicate layer", Keys.ctrl(KeyCode.D), this::duplicate).unless(noLayer));
        all.add(Command.of("Layer", "Delete layer", Keys.plain(KeyCode.DELETE), this::delete).unless(noLayer));
        KeyCombination.Modifier alt = KeyCombination.ALT_DOWN;
        all.add(Command.of("Layer", "Next layer", new KeyCodeCombination(KeyCode.RIGHT, alt), () -> select(1)).unless(noLayer));
        all.add(Command.of("Layer", "Previous layer", new KeyCodeCombination(KeyCode.LEFT, alt), () -> select(-1)).unless(noLayer));
    }

    private void newLayer() {
        int place = session.selectedLayer().get();
        session.edit("new layer", document -> document.withProgramme(programme -> LayerEdit.count(programme) == 0
                ? LayerEdit.added(programme, 0, 10, 10) : LayerEdit.addedAbove(programme, place)));
        session.selectedLayer().set(Math.min(place + 1, LayerEdit.count(session.document().get().programme()) - 1));
    }

    private void duplicate() {
        int place = session.selectedLayer().get();
        session.edit("copy of a layer", document -> document.withProgramme(programme -> LayerEdit.duplicated(programme, place)));
        session.selectedLayer().set(place + 1);
    }

    private void delete() {
        int place = session.selectedLayer().get();
        session.edit("removal of a layer", document -> document.withProgramme(programme -> LayerEdit.removed(programme, place)));
    }

    private void select(int step) {
        int layers = LayerEdit.count(session.document().get().programme());
        session.selectedLayer().set(Math.max(0, Math.min(layers - 1, session.selectedLayer().get() + step)));
    }

    private static ObservableValue<String> named(String verb, ObservableValue<String> what) {
        return Bindings.createStringBinding(() -> what.getValue() == null ? verb : verb + " " + what.getValue(), what);
    }

    private static ObservableValue<String> refused(ObservableValue<?> needed, String why) {
        return Bindings.createStringBinding(() -> needed.getValue() == null ? why : "", needed);
    }

    private static ObservableValue<String> always() {
        return Bindings.createStringBinding(() -> "");
    }

    void onGoTo(Consumer<String> action) {
        goTo = action;
    }

    void onFind(Runnable action) {
        find = action;
    }

    public List<Command> all() {
        return List.copyOf(all);
    }

    Command undo() {
        return undo;
    }

    Command redo() {
        return redo;
    }

    Command lightOrDark() {
        return lightOrDark;
    }

    /** The menus, with the recent files among them. */
    List<Menu> menus() {
        List<Menu> menus = new ArrayList<>();
        for (String name : MENUS) {
            Menu menu = new Menu(name);
            for (Command command : all) {
                if (command.menu().equals(name)) {
                    menu.getItems().add(item(command));
                }
            }
            menus.add(menu);
        }
        Menu recent = new Menu("Open recent");
        menus.get(0).getItems().add(1, recent);
        menus.get(0).setOnShowing(opening -> fill(recent));
        fill(recent);
        return menus;
    }

    private void fill(Menu recent) {
        recent.getItems().clear();
        for (Preferences.Recent one : preferences.recent()) {
            MenuItem item = new MenuItem(one.portfolio().getFileName() + ", " + one.programme().getFileName());
            item.setMnemonicParsing(false);
            item.setOnAction(chosen -> files.open(List.of(one.portfolio(), one.programme())));
            recent.getItems().add(item);
        }
        if (recent.getItems().isEmpty()) {
            MenuItem none = new MenuItem("Nothing opened yet");
            none.setDisable(true);
            recent.getItems().add(none);
        }
    }

    private static MenuItem item(Command command) {
        MenuItem item = new MenuItem();
        item.setMnemonicParsing(false);
        item.textProperty().bind(command.name());
        // plain keys are handled by the window, which knows whether somebody is typing
        if (command.keys() != null && command.keys() instanceof KeyCodeCombination keys && modified(keys)) {
            item.setAccelerator(keys);
        }
        item.setDisable(!command.refusal().getValue().isEmpty());
        command.refusal().addListener((is, was, now) -> item.setDisable(!now.isEmpty()));
        item.setOnAction(chosen -> command.run());
        return item;
    }

    private static boolean modified(KeyCodeCombination keys) {
        return keys.getShortcut() == KeyCombination.ModifierValue.DOWN || keys.getAlt() == KeyCombination.ModifierValue.DOWN
                || keys.getCode().isFunctionKey();
    }

    /** The command of a plain key such as {@code [} or {@code +}; null where there is none. */
    Command ofPlainKey(String typed, KeyCode code) {
        return switch (typed) {
            case "[" -> named("Previous family");
            case "]" -> named("Next family");
            case "+" -> named("New layer");
            default -> code == KeyCode.DELETE ? named("Delete layer") : null;
        };
    }

    private Command named(String name) {
        return all.stream().filter(command -> command.name().getValue().equals(name)).findFirst().orElseThrow();
    }
}
