package layerweft.desktop;

import java.nio.file.Path;
import java.util.concurrent.CountDownLatch;
import java.util.logging.Level;
import java.util.logging.Logger;
import javafx.application.Platform;
import javafx.stage.Stage;
import layerweft.desktop.habit.Preferences;
import layerweft.desktop.session.Background;

/** Starts the window and waits for its end. */
public final class Desktop {

    private Desktop() {}

    /**
     * Shows the window until it is closed.
     *
     * @return whether there is a display to show it on; false at once where there is none
     */
    public static boolean show() {
        if (!display()) {
            return false;
        }
        // started from the class path, the toolkit warns that it is not started from modules; nothing follows from that
        Logger toolkit = Logger.getLogger("javafx");
        toolkit.setLevel(Level.SEVERE);
        CountDownLatch closed = new CountDownLatch(1);
        try {
            Platform.startup(() -> open(Preferences.usualFolder(), closed));
        } catch (UnsupportedOperationException e) {
            // no display, or none that the toolkit can use
            return false;
        }
        try {
            closed.await();
        } catch (InterruptedException e) {
            Thread.currentThread().interrupt();
        }
        return true;
    }

    /** Whether one is named, where displays have names; the toolkit itself would first complain and then fail. */
    private static boolean display() {
        boolean named = System.getProperty("os.name", "").startsWith("Linux") && System.getProperty("glass.platform") == null;
        return !named || System.getenv("DISPLAY") != null || System.getenv("WAYLAND_DISPLAY") != null;
    }

    private static void open(Path folder, CountDownLatch closed) {
        DesktopWindow window = new DesktopWindow(new Stage(), folder, Background.ofWindow());
        window.onClosed(closed::countDown);
        window.show();
    }
}
