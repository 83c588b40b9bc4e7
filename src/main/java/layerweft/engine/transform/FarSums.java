package layerweft.engine.transform;

import layerweft.figures.Bracket;

/**
 * Annual sums for a layer that is reached only far up the law of A, through its annual deductible: the transforms are tilted upwards by
 * e^(rate·A), with the rate at which the tilted law has its mass about the deductible (the saddle point, Daniels 1954), so that rounding is
 * relative to the probabilities there (exponential tilting, Grübel &amp; Hermesmeier 1999). Counts are cut far later than usual.
 */
final class FarSums implements AnnualSums {
    /** Counts are cut where this part of their probability is left. */
    static final double COUNT_TAIL = 1e-32;
    /** Error asked for of joint probabilities: what double precision gives. */
    static final double PROBABILITIES = 1e-15;
    private static final double LARGEST_EXPONENT = 500;
    private final PreparedLayer layer;
    private final AnnualSums usual;
    private final JointLaw nodes;
    private final LayerLattice lattice;
    private final double rate;
    private final double[] atomSurvival;

    /**
     * @param usual the same sums, which are better below the deductible
     * @param nodes the counts' joint law, with {@link #COUNT_TAIL} and {@link #PROBABILITIES}
     */
    FarSums(PreparedLayer layer, AnnualSums usual, JointLaw nodes) {
        this.layer = layer;
        this.usual = usual;
        this.nodes = nodes;
        this.rate = saddlePoint();
        this.lattice = layer.lattice().upward(rate);
        this.atomSurvival = lattice.atomSurvival(nodes);
    }

    /** The minimum of ln E[e^(rA)] − rD, a convex function of r, by golden section. */
    private double saddlePoint() {
        double low = 0;
        double high = LARGEST_EXPONENT / (5 * end());
        double golden = (Math.sqrt(5) - 1) / 2;
        for (int step = 0; step < 40; step++) {
            double a = high - golden * (high - low);
            double b = low + golden * (high - low);
            if (exponent(a) < exponent(b)) {
                high = b;
            } else {
                low = a;
            }
        }
        return 0.5 * (low + high);
    }

    private double exponent(double r) {
        return Math.log(layer.lattice().exponentialMoment(nodes, r)) - r * layer.terms().deductible();
    }

    /** Rounding where the layer is, of the size of the largest tilted value; wrap-around by Chernoff's bound at twice the rate. */
    @Override
    public LatticeSum sum(int level) {
        LatticeSum sum = lattice.sum(nodes, level, atomSurvival);
        double largest = 0;
        for (int k = 0; k < sum.mean().length; k++) {
            largest = Math.max(largest, sum.mean()[k] * Math.exp(rate * (k * sum.step() - layer.terms().deductible())));
        }
        double apart = 4 * end();
        double wrapped = Math.exp(Math.log(layer.lattice().exponentialMoment(nodes, 2 * rate)) - 2 * rate * (layer.terms().deductible() + apart) + rate * apart);
        return new LatticeSum(sum.step(), sum.mean(), sum.atomStep(), sum.atomSurvival(), 1e-14 * largest + wrapped);
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
    public double end() {
        return usual.end();
    }

    @Override
    public double cap() {
        return usual.cap();
    }

    @Override
    public double capPassed() {
        return usual.capPassed();
    }

    @Override
    public SumFacts facts(LatticeSum finest) {
        return usual.facts(finest);
    }

    @Override
    public Bracket bracket(int level) {
        return usual.bracket(level);
    }

    @Override
    public int mostBracketCells() {
        return usual.mostBracketCells();
    }

    @Override
    public double meanError() {
        return usual.meanError();
    }

    /** The quadrature's error is absolute; without a quadrature the error is what the chances of events leave. */
    @Override
    public double jointError() {
        return nodes.error() + layer.chanceError();
    }

    @Override
    public double weightOfErrors() {
        return usual.weightOfErrors();
    }

    @Override
    public double largestEvent(double level) {
        return usual.largestEvent(level);
    }

    @Override
    public boolean sharpen() {
        return false;
    }
}
