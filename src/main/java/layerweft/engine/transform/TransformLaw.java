package layerweft.engine.transform;

import layerweft.model.treaty.LayerTerms;
import layerweft.model.treaty.Loading;

/**
 * The law of a layer's annual loss Y at 100 %, on the finest lattice that its price needed. Between points of the lattice the survival
 * function is interpolated; its jumps (at 0, at multiples of the occurrence limit, at M) are exact.
 */
public final class TransformLaw {
    private final LatticeSum sum;
    private final LayerTerms terms;
    private final LevelFigures figures;
    private final AnnualSums sums;
    private final double end;
    private final SumFacts facts;
    private final LatticeSum before;

    /** @param before the sum on the lattice of twice the step, null where it is not kept */
    TransformLaw(AnnualSums sums, LatticeSum sum, LatticeSum before, SumFacts facts, LayerTerms terms) {
        this.sums = sums;
        this.facts = facts;
        this.before = before;
        this.sum = sum;
        this.terms = terms;
        this.end = sums.end();
        this.figures = new LevelFigures(sum, terms, facts, end);
    }

    /** The same law on the lattice of twice the step: what a figure changes by shows its error. Only the finest law has a coarser one. */
    public TransformLaw coarser() {
        if (before == null) {
            throw new IllegalStateException("only one coarser lattice is kept");
        }
        return new TransformLaw(sums, before, null, facts, terms);
    }

    /** Distance of the points of the lattice, in money. */
    public double step() {
        return sum.step();
    }

    /** The largest loss that the lattice knows: M, or an amount that is passed with a negligible chance where there is no M. */
    public double largest() {
        return end - terms.deductible();
    }

    /** Rising amounts from 0 to {@link #largest()} between which {@link #averages()} are known. */
    public double[] bounds() {
        double[] bounds = sum.pieces(terms.deductible(), end).bounds();
        for (int k = 0; k < bounds.length; k++) {
            bounds[k] -= terms.deductible();
        }
        return bounds;
    }

    /** Averages of P(Y &gt; y) between neighbouring {@link #bounds()}, for the law whose mass is spread, mean by mean, to the lattice. */
    public double[] averages() {
        return sum.pieces(terms.deductible(), end).average();
    }

    /** E[Y]. */
    public double mean() {
        return figures.expectedLoss();
    }

    /** P(Y &gt; y), y ≥ 0; 0 from M on. */
    public double survival(double y) {
        return y >= terms.annualLimit() ? 0 : figures.survival(y);
    }

    /** inf{y : P(Y ≤ y) ≥ level}, level in (0, 1). */
    public double quantile(double level) {
        return Math.min(figures.valueAtRisk(level), terms.annualLimit());
    }

    /** (1/(1 − level))∫_level^1 VaR_u du, level in (0, 1). */
    public double tailValueAtRisk(double level) {
        return figures.tailValueAtRisk(level);
    }

    /** ∫ g(P(Y &gt; y)) dy of a distortion principle; NaN for others. */
    public double distorted(Loading loading) {
        return figures.distorted(loading);
    }

    /** The quantile of the year's largest recovery from one event; NaN where the model leaves its law open (annual totals joined). */
    public double largestEvent(double level) {
        return sums.largestEvent(level);
    }
}
