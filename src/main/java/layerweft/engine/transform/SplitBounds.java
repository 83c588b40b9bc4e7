package layerweft.engine.transform;

import layerweft.model.treaty.LayerTerms;

/**
 * Laws above and below that of the occurrence loss of a split event, in their stop-loss transforms.
 *
 * @param sum the subject loss
 * @param cap largest occurrence loss that counts
 */
record SplitBounds(PartsSum sum, LayerTerms terms, double cap) {
    /** What quadrature and merged nodes may do to a probability of the sum, with much to spare. */
    private static final double SAFE_ERROR = 100 * PartsSum.JOINT_ERROR;
    private static final int RETENTION_CELLS = 4096;

    /** The subject loss at which the layer begins to pay. */
    private double start() {
        return terms.hasFranchise() ? terms.franchise() : terms.retention();
    }

    private double retained() {
        return terms.hasFranchise() ? 0 : terms.retention();
    }

    /** The subject loss at which o reaches the cap. */
    private double top() {
        return terms.hasFranchise() ? Math.max(cap, terms.franchise()) : terms.retention() + cap;
    }

    /** Whether convex order can be used: the gap between the laws is of second order then. */
    boolean secondOrder() {
        return sum.ordered() && !terms.hasFranchise();
    }

    /**
     * Where the sub-peril copula keeps convex order, from the sums s' and s'' of spread and of fused parts: E[(s'' − y)+] ≤ E[(s − y)+] ≤
     * E[(s' − y)+], and o = min((s − R)+, L) has E[(o − y)+] = E[(s − R − y)+] − E[(s − R − L)+], so that the gap at R + L is the slack. Else,
     * and with a franchise, parts are rounded and the gap is of first order. Proven but for the quadrature over the copula's factor, for
     * whose error there is room.
     */
    OrderedLaws ordered(double step, int cells) {
        boolean convex = secondOrder();
        Below below = new Below(step, LatticeStep.cells(top(), step) + 3, convex);
        double[] upper = convex ? PartsSum.layered(below.upper, retained(), step, cells) : roundedUp(below.upper, step, cells);
        double[] lower = convex ? fusedLayer(below.lower, step, cells) : roundedDown(below.lower, step, cells);
        double margin = SAFE_ERROR * cap;
        double low = convex ? below.least(top()) - below.most(retained()) : OrderedLaws.limited(lower, step, cap) - margin;
        double high = convex ? below.most(top()) - below.least(retained()) : OrderedLaws.limited(upper, step, cap) + margin;
        double slack = convex ? below.most(top()) - below.least(top()) : margin;
        if (terms.occurrenceLimit() < Double.POSITIVE_INFINITY) {
            return new OrderedLaws(step, upper, lower, slack, Math.max(0, low), high, 0, 0, Math.max(0, low), high);
        }
        double all = sum.mean();
        double allLow = all;
        double allHigh = all;
        if (start() > 0) {
            // only what lies below the layer matters: a lattice of its own
            Below retention = new Below(start() / (RETENTION_CELLS), RETENTION_CELLS + 3, convex);
            double jump = terms.hasFranchise() ? start() : 0;
            allLow = all - retention.most(start()) + jump * retention.lower[RETENTION_CELLS];
            allHigh = all - retention.least(start()) + jump * retention.upper[RETENTION_CELLS];
        }
        return new OrderedLaws(step, upper, lower, slack, Math.max(0, low), high, Math.max(0, all - below.most(top())), all - below.least(top()),
                Math.max(0, allLow), allHigh);
    }

    /** Bounds of E[min(s, y)] on a lattice. */
    private final class Below {
        private final double step;
        private final double[] upper;
        private final double[] lower;
        private final boolean convex;
        private final double lost;

        Below(double step, int cells, boolean convex) {
            this.step = step;
            this.convex = convex;
            this.upper = convex ? sum.spread(step, cells) : sum.roundedUp(step, cells);
            this.lower = convex ? sum.fused(step, cells) : sum.roundedDown(step, cells);
            this.lost = convex ? Math.max(0, sum.limitedParts(cells * step) - sum.fusedMean(step, cells)) : 0;
        }

        double least(double y) {
            return OrderedLaws.limited(convex ? upper : lower, step, y) - SAFE_ERROR * y;
        }

        double most(double y) {
            return OrderedLaws.limited(convex ? lower : upper, step, y) + lost + SAFE_ERROR * y;
        }
    }

    /** The law of the layer's part of a loss on the lattice, fused where the retention is not on it. */
    private double[] fusedLayer(double[] fused, double step, int cells) {
        double[] mean = PartsSum.layered(fused, retained(), step, cells);
        int shift = (int) Math.floor(retained() / step + 1e-7);
        if (retained() / step - shift < 1e-7) {
            return mean;
        }
        double[] passes = new double[cells];
        System.arraycopy(fused, shift + 1, passes, 0, cells);
        return FusedLaw.survival(fused[shift], mean, passes, passes);
    }

    /** P(o' ≥ (k+1)h): o' ≥ (k+1)h where s' ≥ (k+1)h + R; with a franchise where s' ≥ (k+1)h and s' &gt; F. */
    private double[] roundedDown(double[] down, double step, int cells) {
        int shift = (int) Math.floor(start() / step + 1e-7);
        boolean even = LatticeStep.holds(start(), step);
        double[] law = new double[cells];
        for (int k = 0; k < cells; k++) {
            int at = terms.hasFranchise() ? Math.max(k, even ? shift : shift + 1) : even ? shift + k : shift + k + 1;
            law[k] = down[at];
        }
        return law;
    }

    /** P(o' &gt; kh): s' &gt; kh + R; with a franchise s' &gt; kh and s' &gt; F. */
    private double[] roundedUp(double[] up, double step, int cells) {
        int shift = (int) Math.floor(start() / step + 1e-7);
        double[] law = new double[cells];
        for (int k = 0; k < cells; k++) {
            law[k] = up[terms.hasFranchise() ? Math.max(k, shift) : shift + k];
        }
        return law;
    }
}
