package layerweft.engine.simulation;

/** Applies a programme's occurrence terms to the events of a block. Holds workspaces: one instance for each thread. */
interface TermsApplied {

    /** @param out cleared for these years; receives the amounts of the years at 100 % of each layer */
    void apply(PerilYears[] work, int years, YearDraw draw, long block, YearAmounts out);
}
