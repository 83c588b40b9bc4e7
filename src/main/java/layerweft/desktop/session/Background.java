package layerweft.desktop.session;

import java.time.Duration;
import java.util.HashMap;
import java.util.Map;
import java.util.Set;
import java.util.concurrent.Executor;
import java.util.concurrent.Executors;
import java.util.function.Consumer;
import java.util.function.Function;
import javafx.application.Platform;
import javafx.beans.property.ReadOnlyObjectProperty;
import javafx.beans.property.ReadOnlyObjectWrapper;
import javafx.collections.FXCollections;
import javafx.collections.ObservableList;
import layerweft.engine.RunControl;

/**
 * Runs what takes long away from the window, under a name for each kind of work. Of one name the newest wins: an older one is told to stop,
 * its result is dropped, and the newest waits until it has. Results arrive on the window's thread. Call all methods from that thread.
 */
public final class Background {
    private final Executor publish;
    private final Function<String, Executor> lanes;
    private final Map<String, Task> newest = new HashMap<>();
    private final ObservableList<Task> running = FXCollections.observableArrayList();
    private final ReadOnlyObjectWrapper<Task> failed = new ReadOnlyObjectWrapper<>();

    private Background(Executor publish, Function<String, Executor> lanes) {
        this.publish = publish;
        this.lanes = lanes;
    }

    /** With a thread for each name, publishing on the JavaFX thread. */
    public static Background ofWindow() {
        return publishing(Platform::runLater);
    }

    /** With a thread for each name, publishing through an executor. */
    public static Background publishing(Executor publish) {
        Map<String, Executor> threads = new HashMap<>();
        return new Background(publish, name -> threads.computeIfAbsent(name, Background::thread));
    }

    /** Everything on the calling thread and at once: for tests, and for programs without a window. */
    public static Background immediate() {
        return new Background(Runnable::run, name -> Runnable::run);
    }

    /** The same, but work of these names never begins. */
    static Background immediateWithout(Set<String> names) {
        return new Background(Runnable::run, name -> names.contains(name) ? work -> {} : Runnable::run);
    }

    private static Executor thread(String name) {
        return Executors.newSingleThreadExecutor(work -> {
            Thread thread = new Thread(work, name);
            thread.setDaemon(true);
            return thread;
        });
    }

    /**
     * Starts work.
     *
     * @param name of the kind of work, shown to the user, e.g. {@code "Sweeping families"}
     * @param work computes, telling the control its progress and asking it whether to stop
     * @param onDone receives the result on the window's thread; never called once the task is stopped or a newer one of the name started
     */
    public <T> Task run(String name, Function<RunControl, T> work, Consumer<T> onDone) {
        return runAfter(Duration.ZERO, name, work, onDone);
    }

    /** The same after a rest, within which a newer task of the name takes its place at no cost. */
    public <T> Task runAfter(Duration rest, String name, Function<RunControl, T> work, Consumer<T> onDone) {
        Task older = newest.get(name);
        if (older != null) {
            older.stop();
        }
        return start(new Task(name, publish, rest, Duration.ZERO), work, onDone);
    }

    /**
     * Starts work that follows a hand: one that still waits gives way to the newer, but one that is at work may go on for a while and show
     * its result, since otherwise nothing would be seen as long as the hand moves.
     *
     * @param patience how long, from its start, an older one may be at work once there is a newer one
     * @param rest before it begins
     */
    public <T> Task follow(String name, Duration patience, Duration rest, Function<RunControl, T> work, Consumer<T> onDone) {
        Task older = newest.get(name);
        if (older != null) {
            older.supersede();
        }
        return start(new Task(name, publish, rest, patience), work, onDone);
    }

    private <T> Task start(Task task, Function<RunControl, T> work, Consumer<T> onDone) {
        newest.put(task.name(), task);
        running.add(task);
        task.onEnd(() -> {
            running.remove(task);
            if (task.state().get() == Task.State.FAILED) {
                failed.set(task);
            }
        });
        lanes.apply(task.name()).execute(task.job(work, onDone));
        return task;
    }

    /** Stops the work of a name, if any. */
    public void stop(String name) {
        Task task = newest.get(name);
        if (task != null) {
            task.stop();
        }
    }

    /** The last task that failed, for telling the user; null as long as none has. */
    public ReadOnlyObjectProperty<Task> failed() {
        return failed.getReadOnlyProperty();
    }

    /** What is waiting or at work, oldest first. */
    public ObservableList<Task> running() {
        return FXCollections.unmodifiableObservableList(running);
    }
}
