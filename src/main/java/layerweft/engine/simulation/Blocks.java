package layerweft.engine.simulation;

import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.CancellationException;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;
import java.util.concurrent.atomic.AtomicLong;
import java.util.function.LongToIntFunction;
import java.util.function.Supplier;
import layerweft.engine.RunControl;

/**
 * Hands pieces of work (blocks of years, or runs of such blocks) to threads as they come free. What is made of a piece must not depend on
 * the thread, so that results do not depend on their number.
 */
final class Blocks {
    private final long count;
    private final LongToIntFunction years;
    private final long allYears;
    private final RunControl control;
    private final AtomicLong next = new AtomicLong();
    private final AtomicLong yearsDone = new AtomicLong();
    private volatile boolean failed;

    /** What is done with one piece. */
    interface Task<W> {
        void piece(W workspace, long piece, int years);
    }

    /**
     * @param count of pieces
     * @param years of each, for the progress
     */
    Blocks(long count, LongToIntFunction years, long allYears, RunControl control) {
        this.count = count;
        this.years = years;
        this.allYears = allYears;
        this.control = control;
    }

    /**
     * Runs all pieces to their end.
     *
     * @param workspace makes what a thread works with
     * @return the workspaces, in no order that means anything
     * @throws CancellationException if the control says so or the calling thread is interrupted
     */
    <W> List<W> run(int threads, Supplier<W> workspace, Task<W> task) {
        ExecutorService pool = Executors.newFixedThreadPool((int) Math.min(threads, count), work -> {
            Thread thread = new Thread(work, "simulation");
            thread.setDaemon(true);
            return thread;
        });
        try {
            List<Future<W>> running = new ArrayList<>();
            for (int t = 0; t < Math.min(threads, count); t++) {
                running.add(pool.submit(() -> work(workspace.get(), task)));
            }
            List<W> done = new ArrayList<>();
            for (Future<W> thread : running) {
                done.add(thread.get());
            }
            return done;
        } catch (InterruptedException e) {
            failed = true;
            Thread.currentThread().interrupt();
            throw new CancellationException("the simulation was interrupted");
        } catch (ExecutionException e) {
            failed = true;
            if (e.getCause() instanceof RuntimeException cause) {
                throw cause;
            }
            if (e.getCause() instanceof Error cause) {
                throw cause;
            }
            throw new IllegalStateException(e.getCause());
        } finally {
            pool.shutdown();
        }
    }

    /** One thread: takes pieces until there are none left. */
    private <W> W work(W workspace, Task<W> task) {
        for (long piece = next.getAndIncrement(); piece < count; piece = next.getAndIncrement()) {
            if (failed || control.cancelled()) {
                failed = true;
                throw new CancellationException("the simulation was stopped");
            }
            int ofPiece = years.applyAsInt(piece);
            task.piece(workspace, piece, ofPiece);
            control.progress(yearsDone.addAndGet(ofPiece), allYears);
        }
        return workspace;
    }
}
