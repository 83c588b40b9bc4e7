package layerweft.engine;

/** How a long computation talks to whoever started it. Methods are called from the threads that compute, often: they must be quick. */
public interface RunControl {

    /** Nobody listens and nobody stops it. */
    RunControl NONE = new RunControl() {
        @Override
        public void progress(long done, long total) {}

        @Override
        public boolean cancelled() {
            return false;
        }
    };

    /** {@code done} of {@code total} units of work (years for a simulation) are finished. */
    void progress(long done, long total);

    /** Whether the computation should end as soon as it can, with a {@link java.util.concurrent.CancellationException}. */
    boolean cancelled();
}
