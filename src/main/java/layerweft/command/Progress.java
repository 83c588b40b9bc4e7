package layerweft.command;

import java.util.concurrent.atomic.AtomicLong;
import layerweft.engine.RunControl;
import me.tongfei.progressbar.ProgressBar;
import me.tongfei.progressbar.ProgressBarBuilder;
import me.tongfei.progressbar.ProgressBarStyle;

/**
 * Shows how far a long run is, on standard error and only on a terminal, and stops it when the program is interrupted. Close it when the
 * run has ended.
 */
final class Progress implements RunControl, AutoCloseable {
    /** Runs that end sooner show nothing. */
    private static final long SHOW_AFTER_NANOS = 1_000_000_000L;

    private final String task;
    private final boolean terminal = System.console() != null;
    private final long start = System.nanoTime();
    private final AtomicLong done = new AtomicLong();
    private final Thread hook = new Thread(this::stop, "stop");
    private ProgressBar bar;
    private volatile boolean stopped;

    Progress(String task) {
        this.task = task;
        Runtime.getRuntime().addShutdownHook(hook);
    }

    @Override
    public void progress(long doneSoFar, long total) {
        if (!terminal || System.nanoTime() - start < SHOW_AFTER_NANOS || stopped) {
            return;
        }
        long most = done.accumulateAndGet(doneSoFar, Math::max);
        synchronized (this) {
            if (bar == null) {
                bar = new ProgressBarBuilder().setTaskName(task).setInitialMax(total).setStyle(ProgressBarStyle.ASCII)
                        .setUpdateIntervalMillis(200).build();
            }
            bar.stepTo(most);
        }
    }

    @Override
    public boolean cancelled() {
        return stopped;
    }

    /** Ctrl-C: the computation ends at its next block; nothing half-written is left, as answers are written whole or not at all. */
    private void stop() {
        stopped = true;
        closeBar();
    }

    private synchronized void closeBar() {
        if (bar != null) {
            bar.close();
            bar = null;
        }
    }

    @Override
    public void close() {
        if (!stopped) {
            Runtime.getRuntime().removeShutdownHook(hook);
            closeBar();
        }
    }
}
