package layerweft.study;

import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.Callable;
import java.util.concurrent.CancellationException;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;

/** Runs the tasks of a study on several threads. */
final class Parallel {

    private Parallel() {}

    /**
     * Runs all tasks to their end; what one of them throws is thrown here, once no other is at work.
     *
     * @param steps told of each task's end
     * @throws CancellationException if the calling thread is interrupted
     */
    static void run(List<Callable<Void>> tasks, int threads, Steps steps) {
        if (tasks.isEmpty()) {
            return;
        }
        ExecutorService pool = Executors.newFixedThreadPool(Math.min(threads, tasks.size()), task -> {
            Thread thread = new Thread(task, "study");
            thread.setDaemon(true);
            return thread;
        });
        try {
            List<Future<?>> running = new ArrayList<>();
            for (Callable<Void> task : tasks) {
                running.add(pool.submit(() -> {
                    task.call();
                    steps.one();
                    return null;
                }));
            }
            for (Future<?> one : running) {
                one.get();
            }
        } catch (InterruptedException e) {
            Thread.currentThread().interrupt();
            throw new CancellationException("the study was interrupted");
        } catch (ExecutionException e) {
            throw unchecked(e.getCause());
        } finally {
            pool.shutdownNow();
        }
    }

    private static RuntimeException unchecked(Throwable cause) {
        if (cause instanceof Error error) {
            throw error;
        }
        return cause instanceof RuntimeException exception ? exception : new IllegalStateException(cause);
    }
}
