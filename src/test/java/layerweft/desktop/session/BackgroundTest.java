package layerweft.desktop.session;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.time.Duration;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.BlockingQueue;
import java.util.concurrent.CancellationException;
import java.util.concurrent.CountDownLatch;
import java.util.concurrent.LinkedBlockingQueue;
import java.util.concurrent.TimeUnit;
import layerweft.engine.RunControl;
import org.junit.jupiter.api.Test;

class BackgroundTest {
    private final BlockingQueue<Runnable> window = new LinkedBlockingQueue<>();
    private final Background background = Background.publishing(window::add);
    private final List<String> done = new ArrayList<>();

    /** Plays the window's thread until a task has ended. */
    private void playUntilEnd(Task task) throws InterruptedException {
        while (task.active()) {
            Runnable next = window.poll(10, TimeUnit.SECONDS);
            assertTrue(next != null, "nothing comes");
            next.run();
        }
    }

    private static String untilCancelled(RunControl control) {
        while (!control.cancelled()) {
            Thread.onSpinWait();
        }
        throw new CancellationException("asked to");
    }

    @Test
    void resultsArriveOnTheWindowsThread() throws InterruptedException {
        Task task = background.run("work", control -> "a", done::add);
        assertEquals(List.of(), done);
        playUntilEnd(task);
        assertEquals(List.of("a"), done);
        assertEquals(Task.State.DONE, task.state().get());
        assertTrue(background.running().isEmpty());
    }

    @Test
    void theNewestOfANameWins() throws InterruptedException {
        Task older = background.run("work", BackgroundTest::untilCancelled, done::add);
        Task newer = background.run("work", control -> "newer", done::add);
        assertEquals(Task.State.STOPPED, older.state().get());
        playUntilEnd(newer);
        assertEquals(List.of("newer"), done);
    }

    @Test
    void aResultThatComesTooLateIsDropped() throws InterruptedException {
        CountDownLatch finished = new CountDownLatch(1);
        Task older = background.run("work", control -> {
            finished.countDown();
            return "older";
        }, done::add);
        finished.await();
        Task newer = background.run("work", control -> "newer", done::add);
        playUntilEnd(newer);
        assertEquals(List.of("newer"), done);
        assertEquals(Task.State.STOPPED, older.state().get());
    }

    @Test
    void whatFollowsAHandMayFinishButWhatWaitsGivesWay() throws InterruptedException {
        CountDownLatch atWork = new CountDownLatch(1);
        CountDownLatch go = new CountDownLatch(1);
        Duration patience = Duration.ofMinutes(1);
        background.follow("price", patience, Duration.ZERO, control -> {
            atWork.countDown();
            await(go);
            return control.cancelled() ? "stopped" : "first";
        }, done::add);
        atWork.await();
        Task second = background.follow("price", patience, Duration.ZERO, control -> "second", done::add);
        Task third = background.follow("price", patience, Duration.ZERO, control -> "third", done::add);
        assertEquals(Task.State.STOPPED, second.state().get());
        go.countDown();
        playUntilEnd(third);
        assertEquals(List.of("first", "third"), done);
    }

    private static void await(CountDownLatch latch) {
        try {
            latch.await();
        } catch (InterruptedException e) {
            throw new IllegalStateException(e);
        }
    }

    @Test
    void patienceEnds() throws InterruptedException {
        CountDownLatch atWork = new CountDownLatch(1);
        Task first = background.follow("price", Duration.ofMillis(1), Duration.ZERO, control -> {
            atWork.countDown();
            return untilCancelled(control);
        }, done::add);
        atWork.await();
        Task second = background.follow("price", Duration.ofMillis(1), Duration.ZERO, control -> "second", done::add);
        playUntilEnd(second);
        assertEquals(List.of("second"), done);
        assertEquals(Task.State.STOPPED, first.state().get());
    }

    @Test
    void failuresAreKeptForTelling() throws InterruptedException {
        Task task = background.run("work", control -> {
            throw new IllegalStateException("broken");
        }, value -> done.add("never"));
        playUntilEnd(task);
        assertEquals(Task.State.FAILED, task.state().get());
        assertInstanceOf(IllegalStateException.class, task.failure());
        assertEquals(List.of(), done);
    }

    @Test
    void progressTellsPartAndTimeLeft() throws InterruptedException {
        CountDownLatch seen = new CountDownLatch(1);
        Task task = background.run("work", control -> {
            control.progress(1, 4);
            await(seen);
            return "done";
        }, done::add);
        while (task.progress().get() < 0) {
            window.poll(10, TimeUnit.SECONDS).run();
        }
        assertEquals(0.25, task.progress().get());
        assertTrue(task.secondsLeft().get() >= 0);
        seen.countDown();
        playUntilEnd(task);
    }

    @Test
    void oneThatRestsIsStoppedAtOnce() {
        Task resting = background.runAfter(Duration.ofMinutes(10), "work", control -> "never", done::add);
        resting.stop();
        assertEquals(Task.State.STOPPED, resting.state().get());
        assertTrue(background.running().isEmpty());
    }
}
