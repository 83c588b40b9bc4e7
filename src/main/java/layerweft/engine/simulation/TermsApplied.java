package layerweft.engine.simulation;

import layerweft.model.treaty.Treaty;

/** Applies a programme's occurrence terms to the events of a block. Holds workspaces: one instance for each thread. */
interface TermsApplied {

    /** Event by event where the order of events matters, at once elsewhere. */
    static TermsApplied of(Treaty treaty) {
        boolean ordered = treaty.programme().layers().stream().anyMatch(layer -> layer.proRataTime() || !layer.inuring().isEmpty());
        return ordered ? new TermsInOrder(treaty) : new TermsAtOnce(treaty);
    }

    /** @param out cleared for these years; receives the amounts of the years at 100 % of each layer */
    void apply(PerilYears[] work, int years, YearDraw draw, long block, YearAmounts out);
}
