package layerweft.engine.transform;

/**
 * The law of the occurrence loss o that one event of a peril brings to a layer, after quota share, retention or franchise and occurrence
 * limit, capped at {@link #cap} (the occurrence limit, or the amount beyond which the year's terms make no difference).
 */
interface EventLaw {

    /** The largest occurrence loss that counts. */
    double cap();

    /** The largest amount for which the law needs a lattice. */
    default double reach() {
        return cap();
    }

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

    /** Error of {@link #mean}. */
    default double meanError() {
        return 0;
    }

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

    /** Whether the gap between the {@link #ordered} laws is of second order in the step, not of first. */
    default boolean secondOrder() {
        return true;
    }

    /** Laws on the lattice above and below this one in their stop-loss transforms. */
    OrderedLaws ordered(double step, int cells);

    /** P(o = kh) for k = 0..cells, where o has atoms at points of the lattice below the cap; null where it has none between 0 and cap. */
    double[] atoms(double step, int cells);

    /** Amounts at which the law has a kink or an atom, that a lattice should hold if it can. */
    double[] landmarks();
}
