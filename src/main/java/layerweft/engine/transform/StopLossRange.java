package layerweft.engine.transform;

import layerweft.figures.Bracket;
import layerweft.model.treaty.LayerTerms;

/**
 * Bounds of the stop-loss transforms E[(A − y)+] of an annual sum, from two sums on one lattice that lie above and below it as
 * {@link OrderedLaws} do. A layer's expected loss is one such transform, or the difference of two.
 *
 * @param upper cell averages of P(A_upper &gt; y), as far as the layer reaches
 * @param lower of P(A_lower &gt; y)
 * @param upperMean E[A_upper], all of it
 * @param slack what the order may miss, over a year
 * @param meanLow E[A] of capped losses is at least this
 * @param meanHigh and at most this
 * @param beyondLow E[A] is at least so much above that of the sum of capped losses
 * @param beyondHigh and at most so much
 * @param allLow E[A] is at least this
 * @param allHigh and at most this
 */
record StopLossRange(double step, double[] upper, double[] lower, double upperMean, double lowerMean, double slack, double meanLow,
        double meanHigh, double beyondLow, double beyondHigh, double allLow, double allHigh) {
    /** Relative error of sums of many terms. */
    private static final double ROUNDING = 1e-13;

    /** From the {@link #amounts}. */
    static StopLossRange of(double step, double[] upper, double[] lower, double[] amounts) {
        return new StopLossRange(step, upper, lower, amounts[0], amounts[1], amounts[2], amounts[3], amounts[4], amounts[5], amounts[6],
                amounts[7], amounts[8]);
    }

    /** What adds up over perils: the amounts from the mean above to the last, in their order. */
    double[] amounts() {
        return new double[] {upperMean, lowerMean, slack, meanLow, meanHigh, beyondLow, beyondHigh, allLow, allHigh};
    }

    /** E[(A − y)+] is at most this. */
    double most(double y) {
        return y == 0 ? meanHigh : Math.min(meanHigh, Math.max(0, upperMean - OrderedLaws.limited(upper, step, y)) + slack);
    }

    /** E[(A − y)+] is at least this. */
    double least(double y) {
        double least = y == 0 ? meanLow : lowerMean - OrderedLaws.limited(lower, step, y) - slack;
        return Math.max(0, Math.max(least, meanLow - y));
    }

    /**
     * P(A' &gt; kh) of a law below P(A &gt; y): the average of P(A &gt; y) over cell k + 1 is (E[min(A, (k+2)h)] − E[min(A, (k+1)h)])/h,
     * no more than P(A ≥ (k+1)h).
     */
    double[] roundedDown() {
        double[] law = new double[upper.length];
        for (int k = upper.length - 3; k >= 0; k--) {
            law[k] = Math.max(law[k + 1], (limitedLeast((k + 2) * step) - limitedMost((k + 1) * step)) / step);
        }
        return law;
    }

    /**
     * P(A' &gt; kh) of a law above P(A &gt; y): the average over cell k − 1 is no less than P(A &gt; kh).
     *
     * @param positive P(A &gt; 0) at most
     */
    double[] roundedUp(double positive) {
        double[] law = new double[upper.length];
        law[0] = Math.min(1, positive);
        for (int k = 1; k < law.length; k++) {
            law[k] = Math.min(law[k - 1], Math.max(0, limitedMost(k * step) - limitedLeast((k - 1) * step)) / step);
        }
        return law;
    }

    /** E[min(A, y)] of the sum of capped losses is at least this. */
    private double limitedLeast(double y) {
        return Math.max(0, least(0) - most(y));
    }

    private double limitedMost(double y) {
        return Math.min(y, most(0) - least(y));
    }

    /**
     * The range of E[Y].
     *
     * @param end D + M, or anything where there is no M
     * @param error of E[min(A, y)] at the deductible and at the end, as measured in joint probabilities and bounded in rounding
     */
    Bracket of(LayerTerms terms, double end, double error) {
        double deductible = terms.deductible();
        if (Double.isInfinite(terms.annualLimit())) {
            return deductible == 0 ? bracket(allLow, allHigh, Double.POSITIVE_INFINITY)
                    : bracket(least(deductible) + beyondLow - error, most(deductible) + beyondHigh + error, Double.POSITIVE_INFINITY);
        }
        return bracket(least(deductible) - most(end) - error, most(deductible) - least(end) + error, terms.annualLimit());
    }

    private static Bracket bracket(double low, double high, double limit) {
        return new Bracket(Math.max(0, low * (1 - ROUNDING)), Math.min(limit, high * (1 + ROUNDING)));
    }
}
