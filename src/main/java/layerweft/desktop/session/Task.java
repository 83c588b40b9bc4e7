package layerweft.desktop.session;

import java.time.Duration;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.CancellationException;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.Executor;
import java.util.concurrent.FutureTask;
import java.util.function.Consumer;
import java.util.function.Function;
import javafx.beans.property.ReadOnlyDoubleProperty;
import javafx.beans.property.ReadOnlyDoubleWrapper;
import javafx.beans.property.ReadOnlyObjectProperty;
import javafx.beans.property.ReadOnlyObjectWrapper;
import layerweft.engine.RunControl;

/** One piece of work behind the window. Properties change on the window's thread. */
public final class Task {
    /** Progress is told to the window no more often than this. */
    private static final long TELLING = Duration.ofMillis(80).toNanos();

    /** Where a task stands. */
    public enum State { WAITING, WORKING, DONE, STOPPED, FAILED }

    private final String name;
    private final Executor publish;
    private final Duration rest;
    private final Duration patience;
    private final ReadOnlyObjectWrapper<State> state = new ReadOnlyObjectWrapper<>(State.WAITING);
    private final ReadOnlyDoubleWrapper progress = new ReadOnlyDoubleWrapper(-1);
    private final ReadOnlyDoubleWrapper secondsLeft = new ReadOnlyDoubleWrapper(Double.NaN);
    private final List<Runnable> onEnd = new ArrayList<>();
    private Throwable failure;

    private volatile boolean stopped;
    private volatile boolean superseded;
    private volatile long startedAt;
    private volatile long toldAt;

    Task(String name, Executor publish, Duration rest, Duration patience) {
        this.name = name;
        this.publish = publish;
        this.rest = rest;
        this.patience = patience;
    }

    public String name() {
        return name;
    }

    public ReadOnlyObjectProperty<State> state() {
        return state.getReadOnlyProperty();
    }

    /** The part that is done, from 0 to 1; −1 where nothing is known. */
    public ReadOnlyDoubleProperty progress() {
        return progress.getReadOnlyProperty();
    }

    /** Seconds that the rest will take at the pace so far; NaN where nothing is known. */
    public ReadOnlyDoubleProperty secondsLeft() {
        return secondsLeft.getReadOnlyProperty();
    }

    /** Whether it waits or is at work. */
    public boolean active() {
        return state.get() == State.WAITING || state.get() == State.WORKING;
    }

    /** What went wrong; null unless it has failed. */
    public Throwable failure() {
        return failure;
    }

    /** Ends it as soon as it can; its result is dropped. */
    public void stop() {
        if (active()) {
            stopped = true;
            synchronized (this) {
                notifyAll();
            }
            end(State.STOPPED);
        }
    }

    /** A newer one has come: as {@link #stop} where it still waits; otherwise it may be at work for as long as there is patience. */
    void supersede() {
        if (state.get() == State.WAITING && startedAt == 0) {
            stop();
        } else {
            superseded = true;
        }
    }

    void onEnd(Runnable action) {
        onEnd.add(action);
    }

    private void end(State how) {
        state.set(how);
        onEnd.forEach(Runnable::run);
        onEnd.clear();
    }

    <T> Runnable job(Function<RunControl, T> work, Consumer<T> onDone) {
        FutureTask<T> result = new FutureTask<>(() -> {
            waitForRest();
            startedAt = System.nanoTime();
            publish.execute(() -> {
                if (state.get() == State.WAITING) {
                    state.set(State.WORKING);
                }
            });
            return work.apply(control());
        });
        return () -> {
            result.run();
            publish.execute(() -> finish(result, onDone));
        };
    }

    private synchronized void waitForRest() throws InterruptedException {
        long end = System.nanoTime() + rest.toNanos();
        for (long left = rest.toMillis(); left > 0 && !stopped; left = (end - System.nanoTime()) / 1_000_000) {
            wait(left);
        }
        if (stopped) {
            throw new CancellationException(name + " was stopped before it began");
        }
    }

    private <T> void finish(FutureTask<T> result, Consumer<T> onDone) {
        if (stopped) {
            return;
        }
        try {
            T value = result.get();
            end(State.DONE);
            onDone.accept(value);
        } catch (InterruptedException e) {
            throw new IllegalStateException("the result is there, nothing waits", e);
        } catch (ExecutionException e) {
            if (e.getCause() instanceof CancellationException) {
                end(State.STOPPED);
            } else {
                failure = e.getCause();
                end(State.FAILED);
            }
        }
    }

    private RunControl control() {
        return new RunControl() {
            @Override
            public void progress(long done, long total) {
                long now = System.nanoTime();
                if (now - toldAt > TELLING) {
                    toldAt = now;
                    double part = total > 0 ? (double) done / total : -1;
                    double left = part > 0 ? (now - startedAt) * 1e-9 * (1 - part) / part : Double.NaN;
                    publish.execute(() -> {
                        progress.set(part);
                        secondsLeft.set(left);
                    });
                }
            }

            @Override
            public boolean cancelled() {
                return stopped || superseded && System.nanoTime() - startedAt > patience.toNanos();
            }
        };
    }
}
