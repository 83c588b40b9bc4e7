package layerweft.study;

import java.util.concurrent.atomic.AtomicLong;
import layerweft.engine.RunControl;

/** Tells whoever started a study how many of its steps are done; from any thread. */
final class Steps {
    private final RunControl control;
    private final long total;
    private final AtomicLong done = new AtomicLong();

    Steps(RunControl control, long total) {
        this.control = control;
        this.total = total;
    }

    void one() {
        control.progress(done.incrementAndGet(), total);
    }
}
