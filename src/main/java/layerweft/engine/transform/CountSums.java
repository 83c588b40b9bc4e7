package layerweft.engine.transform;

import java.util.HashMap;
import java.util.Map;
import layerweft.figures.Bracket;

/** Annual sums where the copula joins the counts. */
final class CountSums implements AnnualSums {
    /** Factor on measured errors of joint probabilities in a guaranteed range. */
    private static final double SAFETY = 10;
    private final PreparedLayer layer;
    private final JointLaw nodes;
    private final LayerLattice lattice;
    private final SumFacts facts;
    private final double[] atomSurvival;
    private final Map<Integer, LatticeSum> known = new HashMap<>();

    /** @param nodes the joint law of the counts, best of those events alone that hit the layer */
    CountSums(PreparedLayer layer, JointLaw nodes) {
        this.layer = layer;
        this.nodes = nodes;
        this.lattice = layer.lattice();
        this.facts = SumFacts.of(layer.moments(), layer.meanCounts(), nodes);
        this.atomSurvival = lattice.atomSurvival(nodes);
    }

    @Override
    public LatticeSum sum(int level) {
        return known.computeIfAbsent(level, k -> lattice.sum(nodes, k, atomSurvival));
    }

    @Override
    public int cells(int level) {
        return lattice.cells(level);
    }

    @Override
    public int longest(int level) {
        return lattice.longest(level);
    }

    @Override
    public int mostBracketCells() {
        return layer.events().stream().allMatch(EventLaw::secondOrder) ? Integer.MAX_VALUE : AnnualSums.ROUNDED_CELLS;
    }

    @Override
    public double meanError() {
        return layer.meanError();
    }

    @Override
    public double end() {
        return lattice.end();
    }

    @Override
    public double cap() {
        return layer.cap();
    }

    @Override
    public double capPassed() {
        return layer.capPassed();
    }

    @Override
    public SumFacts facts(LatticeSum finest) {
        return facts;
    }

    @Override
    public double jointError() {
        return nodes.error() + JointLaw.NEGLIGIBLE + layer.cutCounts() + layer.chanceError();
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
        known.clear();
        return true;
    }

    @Override
    public Bracket bracket(int level) {
        if (layer.events().isEmpty()) {
            return new Bracket(0, 0);
        }
        LatticeSum spread = sum(level);
        double joint = SAFETY * (nodes.error() + JointLaw.NEGLIGIBLE + layer.cutCounts()) * Math.max(1, layer.events().size() - 1);
        return lattice.range(nodes, level, spread, layer.meanCounts()).of(layer.terms(), end(), (joint + 2 * spread.noise()) * weightOfErrors());
    }
}
