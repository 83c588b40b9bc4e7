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
        double[] mean = PartsSum.layered(sum.spread(step, LatticeStep.cells(top(), step) + 3), retained(), step, cells);
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

    @Override
    public boolean secondOrder() {
        return new SplitBounds(sum, terms, cap).secondOrder();
    }

    @Override
    public OrderedLaws ordered(double step, int cells) {
        return new SplitBounds(sum, terms, cap).ordered(step, cells);
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
