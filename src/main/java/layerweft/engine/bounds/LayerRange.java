package layerweft.engine.bounds;

/**
 * The range of a layer's expected loss over every dependence between its perils, in the portfolio's unit. Each peril's law of its annual
 * sum A_i of occurrence losses is kept.
 *
 * @param lowest no dependence gives less (proven)
 * @param attainedLow a joint law that was found gives as little as this
 * @param independent where the A_i are independent
 * @param comonotone where the A_i rise and fall together
 * @param attainedHigh a joint law that was found gives as much as this
 * @param highest no dependence gives more (proven)
 * @param error of any of the six, from the lattices on which the laws of the A_i are known
 * @param free whether dependence cannot matter, so that all six are E[Y]
 */
public record LayerRange(double lowest, double attainedLow, double independent, double comonotone, double attainedHigh, double highest,
        double error, boolean free) {

    /** A layer that no dependence moves. */
    static LayerRange free(double expectedLoss, double error) {
        return new LayerRange(expectedLoss, expectedLoss, expectedLoss, expectedLoss, expectedLoss, expectedLoss, error, true);
    }

    /** All money times a factor above 0. */
    public LayerRange times(double factor) {
        return new LayerRange(lowest * factor, attainedLow * factor, independent * factor, comonotone * factor, attainedHigh * factor,
                highest * factor, error * factor, free);
    }

    /** A constant more in all six. */
    LayerRange plus(double amount, double itsError) {
        return new LayerRange(lowest + amount, attainedLow + amount, independent + amount, comonotone + amount, attainedHigh + amount,
                highest + amount, error + itsError, free);
    }
}
