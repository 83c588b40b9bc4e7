package layerweft.engine.transform;

/**
 * The law of the occurrence loss o that one event of a peril brings to a layer, after quota share, retention or franchise and occurrence
 * limit, capped at {@link #cap} (the occurrence limit, or the amount beyond which the year's terms make no difference).
 */
interface EventLaw {

    /** The largest occurrence loss that counts. */
    double cap();

    /** P(o &gt; 0). */
    double hitChance();

    /** P(o = cap). */
    double fullChance();

    /** Error of the two chances and of {@link #survival}. */
    default double chanceError() {
        return 0;
    }

    /** E[o] without the cap, infinite where it is. */
    double mean();

    /** E[o²] without the cap. */
    double secondMoment();

    /** P(o &gt; x) without the cap, 0 ≤ x. */
    double survival(double x);

    /**
     * Averages of P(o &gt; x) over the cells [kh, (k+1)h), k = 0..cells−1, cells·h = cap. Read as the survival function of a law on the
     * lattice they are the law whose mass is spread to the lattice points with the mean kept in every cell: an upper bound in convex
     * order.
     */
    double[] cellSurvival(double step, int cells);

    /** Survival function on the lattice, P(o' &gt; kh), of a law below this one in increasing convex order. */
    double[] lowerSurvival(double step, int cells);

    /** Survival functions on the lattice of the loss rounded down (first) and up (second). */
    double[][] roundedSurvival(double step, int cells);

    /** P(o = kh) for k = 0..cells, where o has atoms at points of the lattice below the cap; null where it has none between 0 and cap. */
    double[] atoms(double step, int cells);

    /** Amounts at which the law has a kink or an atom, that a lattice should hold if it can. */
    double[] landmarks();
}
