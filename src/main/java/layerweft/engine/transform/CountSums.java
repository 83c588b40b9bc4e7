package layerweft.engine.transform;

import layerweft.figures.Bracket;
import layerweft.model.treaty.LayerTerms;

/** Annual sums where the copula joins the counts. */
final class CountSums implements AnnualSums {
    /** Factor on measured errors of joint probabilities in a guaranteed range. */
    private static final double SAFETY = 10;
    private final PreparedLayer layer;
    private final LatentNodes nodes;
    private final LayerLattice lattice;
    private final SumFacts facts;
    private final double[] atomSurvival;

    CountSums(PreparedLayer layer, LatentNodes nodes) {
        this.layer = layer;
        this.nodes = nodes;
        this.lattice = layer.lattice();
        this.facts = SumFacts.of(layer.moments(), layer.meanCounts(), nodes);
        this.atomSurvival = lattice.atomSurvival(nodes);
    }

    @Override
    public LatticeSum sum(int level) {
        return lattice.sum(nodes, level, atomSurvival);
    }

    @Override
    public int cells(int level) {
        return lattice.cells(level);
    }

    @Override
    public double end() {
        return lattice.end();
    }

    @Override
    public SumFacts facts(LatticeSum finest) {
        return facts;
    }

    @Override
    public double jointError() {
        return nodes.error() + layer.cutCounts() + layer.chanceError();
    }

    @Override
    public double weightOfErrors() {
        boolean limited = layer.terms().annualLimit() < Double.POSITIVE_INFINITY;
        double depth = limited ? end() - layer.terms().deductible() : layer.terms().deductible();
        return Math.min(depth, layer.weightOfCounts());
    }

    @Override
    public double largestEvent(double level) {
        return new LargestEvent(layer.events(), nodes, layer.terms()).quantile(level);
    }

    @Override
    public boolean sharpen() {
        if (lattice.reachesFar()) {
            return false;
        }
        lattice.reachFurther();
        return true;
    }

    @Override
    public Bracket bracket(int level, LatticeSum finest) {
        LayerTerms terms = layer.terms();
        double slack = (SAFETY * jointError() * Math.max(1, layer.events().size() - 1) + 2 * finest.noise()) * weightOfErrors();
        if (layer.events().isEmpty()) {
            return new Bracket(0, 0);
        }
        if (layer.splitEvents()) {
            double[][] rounded = lattice.roundedSums(nodes, level);
            double low = limited(rounded[0], lattice.step(level), end()) - limited(rounded[0], lattice.step(level), terms.deductible());
            double high = limited(rounded[1], lattice.step(level), end()) - limited(rounded[1], lattice.step(level), terms.deductible());
            return terms.annualLimit() < Double.POSITIVE_INFINITY ? new Bracket(Math.max(0, low - slack), high + slack) : null;
        }
        double step = lattice.step(level);
        double[] spread = finest.mean();
        double[] fused = lattice.lowerSum(nodes, level);
        double lost = lattice.lostMean(level, layer.meanCounts());
        double lowAtDeductible = limited(spread, step, terms.deductible());
        double highAtDeductible = terms.deductible() == 0 ? 0 : limited(fused, step, terms.deductible()) + lost;
        double slackBelow = terms.deductible() == 0 ? 0 : slack;
        if (Double.isInfinite(terms.annualLimit())) {
            double mean = facts.mean();
            return new Bracket(Math.max(0, mean - highAtDeductible - slackBelow), mean - lowAtDeductible + slackBelow);
        }
        double lowAtEnd = limited(spread, step, end());
        double highAtEnd = Math.min(limited(fused, step, end()) + lost, facts.mean());
        return new Bracket(Math.max(0, lowAtEnd - highAtDeductible - slack), highAtEnd - lowAtDeductible + slack);
    }

    /** E[min(A', y)] of a law on the lattice, linear between its points. */
    static double limited(double[] survival, double step, double y) {
        double cells = y / step;
        int k = (int) Math.min(survival.length - 1, Math.floor(cells + 1e-9));
        double sum = Math.max(0, cells - k) * survival[k];
        for (int j = k - 1; j >= 0; j--) {
            sum += survival[j];
        }
        return sum * step;
    }
}
