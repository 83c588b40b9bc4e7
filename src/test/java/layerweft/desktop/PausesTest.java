package layerweft.desktop;

import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Files;
import java.util.concurrent.TimeUnit;
import javafx.animation.AnimationTimer;
import javafx.stage.Stage;
import layerweft.desktop.session.Background;
import layerweft.desktop.session.LivePrices;
import layerweft.desktop.session.Session;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.extension.ExtendWith;
import org.testfx.api.FxRobot;
import org.testfx.framework.junit5.ApplicationExtension;
import org.testfx.framework.junit5.Start;
import org.testfx.util.WaitForAsyncUtils;

/** How long the window stands still while τ is dragged, and how many answers the strip gives: told, not judged. */
@ExtendWith(ApplicationExtension.class)
class PausesTest {
    private static final int STEPS = 60;

    private DesktopWindow window;
    private int answers;

    /** Watches the time between pulses of the window. */
    private static final class Watch extends AnimationTimer {
        private long last;
        private long longest;

        @Override
        public void handle(long now) {
            longest = last == 0 ? 0 : Math.max(longest, now - last);
            last = now;
        }
    }

    @Start
    void start(Stage stage) throws Exception {
        window = new DesktopWindow(stage, Files.createTempDirectory("layerweft-pauses"), Background.ofWindow());
        window.show();
    }

    @Test
    void theLongestPauseOfADragIsTold(FxRobot robot) throws Exception {
        Session session = window.session();
        WaitForAsyncUtils.waitFor(30, TimeUnit.SECONDS, () -> WaitForAsyncUtils.asyncFx(() ->
                session.curves().get() != null && session.background().running().isEmpty()).get());
        session.prices().addListener((is, was, now) -> answers++);
        Watch watch = new Watch();
        long start = System.nanoTime();
        robot.interact(watch::start);
        Object drag = new Object();
        for (int k = 0; k < STEPS; k++) {
            double tau = 0.3 + 0.01 * k;
            robot.interact(() -> session.setTau(tau, drag));
            Thread.sleep(16);
        }
        long dragged = System.nanoTime();
        LivePrices last = session.prices().get();
        WaitForAsyncUtils.waitFor(10, TimeUnit.SECONDS, () -> WaitForAsyncUtils.asyncFx(() -> !session.pricingTask().get().active()).get());
        long settled = System.nanoTime();
        robot.interact(watch::stop);
        System.out.printf("%d steps of tau in %.1f s: %d answers of the strip, longest pause of the window %.0f ms, last answer after %.0f ms%n",
                STEPS, (dragged - start) * 1e-9, answers, watch.longest * 1e-6, (settled - dragged) * 1e-6);
        assertTrue(answers > 1 && last != null, "the strip answers while the hand moves");
    }
}
