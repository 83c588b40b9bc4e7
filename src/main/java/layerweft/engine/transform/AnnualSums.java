package layerweft.engine.transform;

import layerweft.figures.Bracket;

/** A layer's annual sum A of occurrence losses under one copula, on lattices of any level, with what else is known of it. */
interface AnnualSums {
    /** Cells up to which a range of first order is refined. */
    int ROUNDED_CELLS = 4096;

    /** A on the lattice of a level. */
    LatticeSum sum(int level);

    /** Cells of the lattice of a level. */
    int cells(int level);

    /** Cells of the longest lattice that a level needs. */
    int longest(int level);

    /** Where the lattice ends: D + M, or above all that matters where there is no M. */
    double end();

    /** The largest loss of one event that the lattices keep. */
    double cap();

    /** At most the chance that an event of the year passes {@link #cap}, as matters where nothing limits it; NaN where E[A²] is not known so far up. */
    double capPassed();

    SumFacts facts(LatticeSum finest);

    /** A range that holds E[Y], from the lattice of a level. */
    Bracket bracket(int level);

    /** Cells up to which it is worth refining a lattice for a narrower range. */
    int mostBracketCells();

    /** Error of E[A] where it is not known in closed form. */
    double meanError();

    /** Largest error of joint probabilities of what the copula joins. */
    double jointError();

    /** Bound on what an error of 1 in the joint probabilities, as {@link #jointError}, would do to E[Y]. */
    double weightOfErrors();

    /** The year's largest event at a level; NaN where the model leaves it open. */
    double largestEvent(double level);

    /** Asks for lattices that keep the digits of rare sums; false where they already do. */
    boolean sharpen();
}
