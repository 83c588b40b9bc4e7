package layerweft.desktop;

import java.io.File;
import java.nio.file.Path;
import java.time.format.DateTimeFormatter;
import java.util.List;
import java.util.Optional;
import javafx.animation.PauseTransition;
import javafx.beans.value.ChangeListener;
import javafx.beans.value.ObservableValue;
import javafx.geometry.Rectangle2D;
import javafx.scene.Scene;
import javafx.scene.control.TextInputControl;
import javafx.scene.input.DragEvent;
import javafx.scene.input.KeyEvent;
import javafx.scene.input.TransferMode;
import javafx.stage.Screen;
import javafx.stage.Stage;
import javafx.stage.WindowEvent;
import javafx.util.Duration;
import layerweft.desktop.command.Command;
import layerweft.desktop.habit.DocumentFiles;
import layerweft.desktop.habit.Preferences;
import layerweft.desktop.habit.Recovery;
import layerweft.desktop.session.Background;
import layerweft.desktop.session.Document;
import layerweft.desktop.session.LiftCurves;
import layerweft.desktop.session.Session;
import layerweft.desktop.session.TauState;
import layerweft.desktop.theme.Theme;
import layerweft.engine.simulation.SimulationSettings;

/** The program's window with all its habits: what it remembers, what it asks before it closes, what it keeps in case of a crash. */
public final class DesktopWindow {
    private static final double WIDTH = 1440;
    private static final double HEIGHT = 900;
    private static final double LEAST_WIDTH = 1180;
    private static final double LEAST_HEIGHT = 720;
    private static final Duration BEFORE_KEEPING = Duration.seconds(1.5);
    private static final String KEEPING = "Keeping a recovery copy";
    private static final String RECOVER = "Recover";
    private static final String DISCARD = "Discard";

    private final Stage stage;
    private final Session session;
    private final Theme theme = new Theme();
    private final Preferences preferences;
    private final Recovery recovery;
    private final Dialogs dialogs;
    private final DocumentFiles files;
    private final Commands commands;
    private final Frame frame;
    private final boolean first;
    private Runnable onClosed = () -> {};

    /** @param folder of preferences and recovery copies */
    public DesktopWindow(Stage stage, Path folder, Background background) {
        this(stage, folder, background, SimulationSettings.usual(), null);
    }

    /**
     * With parts of its own.
     *
     * @param longRun the simulation that is run behind each treaty
     * @param given the dialogs; null for those of the window
     */
    DesktopWindow(Stage stage, Path folder, Background background, SimulationSettings longRun, Dialogs given) {
        this.stage = stage;
        preferences = new Preferences(folder);
        first = preferences.first();
        recovery = new Recovery(folder);
        theme.dark().set(Boolean.parseBoolean(preferences.get("dark", "false")));
        theme.textPercent().set((int) Math.max(Theme.SMALLEST_TEXT, Math.min(Theme.LARGEST_TEXT, preferences.number("text", 100))));
        session = new Session(Document.demo(), background, longRun);
        session.dark().bindBidirectional(theme.dark());
        dialogs = given == null ? new WindowDialogs(stage, theme) : given;
        files = new DocumentFiles(session, dialogs, preferences);
        commands = new Commands(session, theme, files, preferences, new Commands.Window(this::help, this::about, this::close));
        frame = new Frame(session, theme, dialogs, commands);
        keepCopies();
    }

    public Session session() {
        return session;
    }

    public Theme theme() {
        return theme;
    }

    public Frame frame() {
        return frame;
    }

    DocumentFiles files() {
        return files;
    }

    void onClosed(Runnable action) {
        onClosed = action;
    }

    public void show() {
        Rectangle2D screen = Screen.getPrimary().getVisualBounds();
        Scene scene = new Scene(frame, Math.min(screen.getWidth(), preferences.number("width", WIDTH)),
                Math.min(screen.getHeight(), preferences.number("height", HEIGHT)));
        theme.dress(scene);
        plainKeys(scene);
        dropping(scene);
        stage.setScene(scene);
        stage.setMinWidth(LEAST_WIDTH);
        stage.setMinHeight(LEAST_HEIGHT);
        stage.titleProperty().bind(session.document().map(document -> document.name() + " – Layerweft"));
        stage.setMaximized(Boolean.parseBoolean(preferences.get("maximized", "false")));
        stage.setOnCloseRequest(this::closing);
        frame.open(preferences.get("room", Rooms.FIRST));
        stage.show();
        if (first) {
            welcome();
        }
        offerRecovery();
    }

    /** A first start: the layer that τ moves most, and the one thing to do. */
    private void welcome() {
        session.curves().addListener(new ChangeListener<>() {
            @Override
            public void changed(ObservableValue<? extends LiftCurves> is, LiftCurves was, LiftCurves now) {
                if (now != null) {
                    session.curves().removeListener(this);
                    session.selectedLayer().set(now.mostMoved());
                }
            }
        });
        frame.hint().set("Drag τ.");
        session.tau().addListener(new ChangeListener<>() {
            @Override
            public void changed(ObservableValue<? extends TauState> is, TauState was, TauState now) {
                if (was != null && now != null) { // turned, not another document
                    session.tau().removeListener(this);
                    frame.hint().set("");
                }
            }
        });
    }

    private void offerRecovery() {
        for (Recovery.Found found : recovery.lost()) {
            String question = "Layerweft ended before " + found.document().name() + " was saved. Its copy is of "
                    + DateTimeFormatter.ofPattern("d MMMM, HH:mm").format(found.at()) + ".";
            Optional<String> answer = dialogs.ask("Recover unsaved changes?", question, List.of(RECOVER, DISCARD, "Cancel"));
            if (answer.isEmpty()) {
                return;
            }
            recovery.forget(found);
            if (answer.get().equals(RECOVER)) {
                session.open(found.document());
                session.neverSaved();
                return;
            }
        }
    }

    /** A copy is kept once the hand has rested, and removed once the document is saved. */
    private void keepCopies() {
        PauseTransition rest = new PauseTransition(BEFORE_KEEPING);
        rest.setOnFinished(rested -> keepCopy());
        session.document().addListener((is, was, now) -> rest.playFromStart());
        session.unsaved().addListener((is, was, now) -> rest.playFromStart());
    }

    private void keepCopy() {
        boolean unsaved = session.unsaved().get();
        Document document = session.document().get();
        session.background().run(KEEPING, control -> {
            if (unsaved) {
                recovery.keep(document);
            } else {
                recovery.forget();
            }
            return unsaved;
        }, kept -> {});
    }

    private void plainKeys(Scene scene) {
        scene.addEventHandler(KeyEvent.KEY_TYPED, event -> plainKey(event, event.getCharacter()));
        scene.addEventHandler(KeyEvent.KEY_PRESSED, event -> plainKey(event, ""));
    }

    /** Keys without Ctrl belong to whoever is being typed into, and to the window otherwise. */
    private void plainKey(KeyEvent event, String typed) {
        boolean chord = typed.isEmpty() && (event.isShortcutDown() || event.isAltDown()); // a sign may itself need Alt on a keyboard
        if (stage.getScene().getFocusOwner() instanceof TextInputControl || chord) {
            return;
        }
        Command command = commands.ofPlainKey(typed, event.getCode());
        if (command != null) {
            command.run();
            event.consume();
        }
    }

    private void dropping(Scene scene) {
        scene.setOnDragOver(event -> {
            if (event.getDragboard().hasFiles()) {
                event.acceptTransferModes(TransferMode.COPY);
            }
        });
        scene.setOnDragDropped(this::dropped);
    }

    private void dropped(DragEvent event) {
        if (event.getDragboard().hasFiles()) {
            files.open(event.getDragboard().getFiles().stream().map(File::toPath).toList());
            event.setDropCompleted(true);
        }
    }

    private void help() {
        HelpWindow.open(stage, theme, commands.all());
    }

    private void about() {
        dialogs.tell("Layerweft", AboutText.text());
    }

    private void close() {
        stage.fireEvent(new WindowEvent(stage, WindowEvent.WINDOW_CLOSE_REQUEST));
    }

    private void closing(WindowEvent event) {
        if (!files.mayLeave()) {
            event.consume();
            return;
        }
        preferences.set("dark", theme.dark().get());
        preferences.set("text", theme.textPercent().get());
        preferences.set("maximized", stage.isMaximized());
        if (!stage.isMaximized()) {
            preferences.set("width", stage.getScene().getWidth());
            preferences.set("height", stage.getScene().getHeight());
        }
        preferences.set("room", frame.room().get().name());
        preferences.save();
        session.background().stop(KEEPING);
        recovery.forget();
        stage.hide();
        onClosed.run();
    }
}
