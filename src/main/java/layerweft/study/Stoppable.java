package layerweft.study;

import layerweft.engine.RunControl;

/** One of many computations of a study: it can be stopped with the study, and its own progress is not that of the whole. */
record Stoppable(RunControl whole) implements RunControl {
    @Override
    public void progress(long done, long total) {
        // the study counts its own steps
    }

    @Override
    public boolean cancelled() {
        return whole.cancelled();
    }
}
