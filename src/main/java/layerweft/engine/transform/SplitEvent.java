package layerweft.engine.transform;

import java.util.stream.IntStream;
import layerweft.figures.Figure;
import layerweft.model.portfolio.EventLoss;
import layerweft.model.portfolio.SubPeril;
import layerweft.model.treaty.LayerTerms;

/**
 * The occurrence loss of an event whose loss is the sum of covered sub-perils, each of which occurs with its own chance, their sizes
 * joined by a copula. The sum's law lives on lattices only, so that every figure carries a lattice error, of second order.
 */
final class SplitEvent implements EventLaw {
    private static final int REFERENCE_CELLS = 1024;
    /** What quadrature and merged nodes may do to a probability of the sum, with much to spare. */
    private static final double SAFE_ERROR = 100 * PartsSum.JOINT_ERROR;
    private final PartsSum sum;
    private final LayerTerms terms;
    private final double cap;
    private final double hit;
    private final double full;
    private double chanceError;

    private SplitEvent(PartsSum sum, LayerTerms terms, double cap) {
        this.sum = sum;
        this.terms = terms;
        this.cap = cap;
        this.hit = start() > 0 ? extrapolated(start()) : sum.positive();
        this.full = extrapolated(top());
    }

    /** A single covered sub-peril is an event with one loss that occurs with its chance; more are a sum. */
    static EventLaw of(EventLoss.Split loss, boolean[] covered, LayerTerms terms, double cap) {
        int[] members = IntStream.range(0, covered.length).filter(k -> covered[k]).toArray();
        if (members.length == 1) {
            SubPeril only = loss.subPerils().get(members[0]);
            return new ThinnedEvent(new SingleEvent(only.severity(), terms, cap), only.chance());
        }
        return new SplitEvent(new PartsSum(loss, members, terms.quotaShare()), terms, cap);
    }

    /** The subject loss at which the layer begins to pay. */
    private double start() {
        return terms.hasFranchise() ? terms.franchise() : terms.retention();
    }

    /** The subject loss at which o reaches the cap. */
    private double top() {
        return terms.hasFranchise() ? Math.max(cap, terms.franchise()) : terms.retention() + cap;
    }

    /** P(s &gt; amount) from lattices that hold it, extrapolated. */
    private double extrapolated(double amount) {
        int cells = REFERENCE_CELLS;
        double coarse = at(sum.spread(amount / cells, cells + 3), cells);
        double fine = at(sum.spread(amount / (2 * cells), 2 * cells + 3), 2 * cells);
        chanceError = Math.max(chanceError, Math.abs(fine - coarse) / 3 + PartsSum.JOINT_ERROR);
        return Math.max(0, Math.min(1, (4 * fine - coarse) / 3));
    }

    /** Survival function at point k from the averages over four cells around it. */
    private static double at(double[] mean, int k) {
        return (7 * (mean[k - 1] + mean[k]) - mean[k - 2] - mean[k + 1]) / 12;
    }

    @Override
    public double cap() {
        return cap;
    }

    @Override
    public double reach() {
        return top();
    }

    @Override
    public double hitChance() {
        return hit;
    }

    @Override
    public double fullChance() {
        return full;
    }

    @Override
    public double chanceError() {
        return chanceError;
    }

    @Override
    public double mean() {
        return meanFigure().value();
    }

    @Override
    public double meanError() {
        return meanFigure().error();
    }

    /** Without occurrence limit E[s] is known, and only what lies below the layer needs the joint law. */
    private Figure meanFigure() {
        if (terms.occurrenceLimit() < Double.POSITIVE_INFINITY) {
            return extrapolated(this::cappedMean);
        }
        Figure all = Figure.exact(sum.mean());
        if (start() == 0 || all.infinite()) {
            return all;
        }
        Figure excess = all.minus(extrapolated(cells -> below(start(), cells)));
        return terms.hasFranchise() ? excess.plus(new Figure(start() * hit, start() * chanceError)) : excess;
    }

    private interface OnLattice {
        double at(int cells);
    }

    private static Figure extrapolated(OnLattice figure) {
        return Extrapolation.of(figure.at(REFERENCE_CELLS / 2), figure.at(REFERENCE_CELLS), figure.at(2 * REFERENCE_CELLS));
    }

    private double cappedMean(int cells) {
        return OrderedLaws.limited(cellSurvival(cap / cells, cells), cap / cells, cap);
    }

    /** E[min(s, y)]. */
    private double below(double y, int cells) {
        return OrderedLaws.limited(sum.spread(y / cells, cells + 3), y / cells, y);
    }

    /** Up to the cap; what lies beyond a cap that stands for no limit is left out. */
    @Override
    public double secondMoment() {
        if (Double.isInfinite(terms.occurrenceLimit()) && sum.infiniteVariance()) {
            return Double.POSITIVE_INFINITY;
        }
        double step = cap / REFERENCE_CELLS;
        return (4 * square(step / 2, 2 * REFERENCE_CELLS) - square(step, REFERENCE_CELLS)) / 3;
    }

    private double square(double step, int cells) {
        double[] survival = cellSurvival(step, cells);
        double total = 0;
        for (int k = 0; k < cells; k++) {
            total += (2 * k + 1) * step * step * survival[k];
        }
        return total;
    }

    @Override
    public double survival(double x) {
        double y = terms.hasFranchise() ? Math.max(x, terms.franchise()) : x + terms.retention();
        double step = (start() + cap) / (2 * REFERENCE_CELLS);
        double[] mean = sum.spread(step, 2 * REFERENCE_CELLS + 3);
        double cell = y / step - 0.5;
        int k = (int) Math.max(0, Math.min(mean.length - 2, Math.floor(cell)));
        double s = Math.min(1, Math.max(0, cell - k));
        return Math.min(hit, mean[k] + (mean[k + 1] - mean[k]) * s);
    }

    @Override
    public double[] cellSurvival(double step, int cells) {
        double[] mean = layered(sum.spread(step, cellsToTop(step)), step, cells);
        for (int k = 0; k < cells; k++) {
            if (terms.hasFranchise()) {
                double below = Math.min(1, Math.max(0, terms.franchise() / step - k));
                mean[k] = below * hit + (1 - below) * mean[k];
            }
            mean[k] = Math.min(hit, mean[k]);
        }
        return mean;
    }

    private double retained() {
        return terms.hasFranchise() ? 0 : terms.retention();
    }

    /** Cells of the subject loss up to the end of the layer, and some. */
    private int cellsToTop(double step) {
        return LatticeStep.cells(top(), step) + 3;
    }

    /** Averages over the layer's cells, which start at the retention, of a function that is constant on the lattice's cells. */
    private double[] layered(double[] survival, double step, int cells) {
        int shift = (int) Math.floor(retained() / step + 1e-7);
        double part = Math.max(0, retained() / step - shift);
        part = part < 1e-7 ? 0 : part;
        double[] mean = new double[cells];
        for (int k = 0; k < cells; k++) {
            mean[k] = (1 - part) * survival[shift + k] + part * survival[shift + k + 1];
        }
        return mean;
    }

    @Override
    public boolean secondOrder() {
        return sum.ordered() && !terms.hasFranchise();
    }

    /**
     * Where the sub-peril copula keeps convex order, from the sums s' and s'' of spread and of fused parts: E[(s'' − y)+] ≤ E[(s − y)+] ≤
     * E[(s' − y)+], and o = min((s − R)+, L) has E[(o − y)+] = E[(s − R − y)+] − E[(s − R − L)+], so that the gap at R + L is the slack. Else,
     * and with a franchise, parts are rounded and the gap is of first order. Proven but for the quadrature over the copula's factor, for
     * whose error there is room.
     */
    @Override
    public OrderedLaws ordered(double step, int cells) {
        boolean convex = secondOrder();
        Below below = new Below(step, cellsToTop(step), convex);
        double[] upper = convex ? layered(below.upper, step, cells) : roundedUp(below.upper, step, cells);
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
            Below retention = new Below(start() / (4 * REFERENCE_CELLS), 4 * REFERENCE_CELLS + 3, convex);
            double jump = terms.hasFranchise() ? start() : 0;
            allLow = all - retention.most(start()) + jump * retention.lower[4 * REFERENCE_CELLS];
            allHigh = all - retention.least(start()) + jump * retention.upper[4 * REFERENCE_CELLS];
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
        double[] mean = layered(fused, step, cells);
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

    @Override
    public double[] atoms(double step, int cells) {
        return null;
    }

    @Override
    public double[] landmarks() {
        return terms.retention() > 0 ? new double[] {terms.retention()} : new double[0];
    }
}
