package layerweft.engine.transform;

import java.util.Arrays;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import layerweft.figures.Bracket;
import layerweft.model.copula.Copula;
import layerweft.model.copula.Student;
import layerweft.model.treaty.LayerTerms;

/**
 * Annual sums where the copula joins the perils' annual totals: stop-loss layers of whole perils. Each total's law comes from a lattice
 * of its own; given the copula's latent factor the totals are independent.
 */
final class TotalSums implements AnnualSums {
    private static final double JOINT_ERROR = 2e-9;
    /** For Student copulas, whose quadrature runs over two variables. */
    private static final double STUDENT_ERROR = 5e-9;
    /** In a range of first order, beside whose width this is small. */
    private static final double ROUNDED_ERROR = 2e-7;
    /** Factor on the error of the quadrature in a guaranteed range: merged nodes are within it too. */
    private static final double SAFETY = 100;
    private final PreparedLayer layer;
    private final List<LayerLattice> totals;
    private final LatentNodes[] alone;
    private final Copula copula;
    private final double nothing;
    private final Map<Integer, LatticeSum> known = new HashMap<>();
    /** E[min(S_i, end)²] of each total, by the number of the lattice's cells. */
    private final Map<Integer, double[]> secondMomentsToEnd = new HashMap<>();

    /**
     * @param totals for each peril that can reach the layer the lattice of its total
     * @param alone its counts, as one node
     * @param nothing P(no loss from any peril)
     */
    TotalSums(PreparedLayer layer, List<LayerLattice> totals, LatentNodes[] alone, Copula copula, double nothing) {
        this.layer = layer;
        this.totals = totals;
        this.alone = alone;
        this.copula = copula;
        this.nothing = nothing;
    }

    @Override
    public LatticeSum sum(int level) {
        return known.computeIfAbsent(level, this::make);
    }

    private LatticeSum make(int level) {
        if (totals.isEmpty()) {
            return new LatticeSum(layer.lattice().step(level), new double[cells(level) + 4], 2 * end(), new double[] {0}, 0);
        }
        CountMargin[] margins = new CountMargin[totals.size()];
        double noise = 0;
        double[] secondMoments = new double[margins.length];
        for (int i = 0; i < margins.length; i++) {
            LatticeSum total = totals.get(i).sum(alone[i], level, new double[] {0});
            secondMoments[i] = total.pieces(0, end()).secondMoment();
            noise += total.noise();
            margins[i] = margin(total.mean());
        }
        double[] mean = DependentSum.survival(copula, layer.perils(), margins, wantedError());
        secondMomentsToEnd.put(mean.length, secondMoments);
        return new LatticeSum(layer.lattice().step(level), mean, 2 * end(), new double[] {0}, noise + 1e-14);
    }

    private double wantedError() {
        return copula instanceof Student ? STUDENT_ERROR : JOINT_ERROR;
    }

    private static CountMargin margin(double[] survival) {
        double[] falling = survival.clone();
        for (int k = 1; k < falling.length; k++) {
            falling[k] = Math.min(falling[k], falling[k - 1]);
        }
        return new CountMargin(Arrays.stream(falling).map(s -> 1 - s).toArray(), falling);
    }

    @Override
    public int cells(int level) {
        return layer.lattice().cells(level);
    }

    @Override
    public double end() {
        return layer.lattice().end();
    }

    @Override
    public double cap() {
        return layer.cap();
    }

    /** The second moment of dependent totals is read from the lattice, which ends. */
    @Override
    public double capPassed() {
        return Double.NaN;
    }

    @Override
    public SumFacts facts(LatticeSum finest) {
        double mean = 0;
        double expectedEvents = 0;
        for (int i = 0; i < layer.events().size(); i++) {
            mean += layer.meanCounts()[i] * layer.moments()[i].mean();
            expectedEvents += layer.meanCounts()[i] * layer.moments()[i].hitChance();
        }
        if (Arrays.stream(layer.moments()).anyMatch(e -> Double.isInfinite(e.secondMoment()))) {
            return new SumFacts(1 - nothing, mean, Double.POSITIVE_INFINITY, 0, expectedEvents);
        }
        double upToEnd = finest.pieces(0, end()).secondMoment();
        double[] whole = new double[totals.size()];
        double[] beyond = new double[whole.length];
        Arrays.setAll(whole, this::secondMomentAlone);
        Arrays.setAll(beyond, i -> Math.max(0, whole[i] - secondMomentsToEnd.get(finest.mean().length)[i]));
        return new SumFacts(1 - nothing, mean, upToEnd + Arrays.stream(beyond).sum(), crossTerms(beyond, whole), expectedEvents);
    }

    /** E[S_i²] of one total, exact. */
    private double secondMomentAlone(int i) {
        return SumFacts.of(new PreparedLayer.EventMoments[] {layer.moments()[i]}, new double[] {layer.meanCounts()[i]}, alone[i]).secondMoment();
    }

    /** Where one total alone is beyond the lattice, what it makes with the others: E[S_i S_j; S_i beyond]² ≤ E[S_i²; S_i beyond]·E[S_j²]. */
    private static double crossTerms(double[] beyond, double[] whole) {
        double sum = 0;
        for (int i = 0; i < beyond.length; i++) {
            for (int j = 0; j < whole.length; j++) {
                sum += i == j ? 0 : 2 * Math.sqrt(beyond[i] * whole[j]);
            }
        }
        return sum;
    }

    /**
     * Where the copula keeps convex order, totals above and below in their stop-loss transforms, joined with their ranks kept: proven but
     * for the quadrature over the copula's factor, for whose error there is room. Else totals rounded down and up, a range of first order.
     */
    @Override
    public Bracket bracket(int level) {
        if (totals.isEmpty()) {
            return new Bracket(0, 0);
        }
        int d = totals.size();
        StopLossRange[] ranges = new StopLossRange[d];
        double noise = 0;
        for (int i = 0; i < d; i++) {
            LatticeSum spread = totals.get(i).sum(alone[i], level, new double[] {0});
            noise += spread.noise();
            ranges[i] = totals.get(i).range(alone[i], level, spread, new double[] {layer.meanCounts()[i]});
        }
        double error = (SAFETY * (ordered() ? wantedError() : ROUNDED_ERROR) + 10 * layer.cutCounts() + 2 * noise) * end();
        return ordered() ? joined(ranges).of(layer.terms(), end(), error) : rounded(ranges, error);
    }

    private StopLossRange joined(StopLossRange[] ranges) {
        double[] totals = new double[9];
        CountMargin[] high = new CountMargin[ranges.length];
        CountMargin[] low = new CountMargin[ranges.length];
        for (int i = 0; i < ranges.length; i++) {
            StopLossRange r = ranges[i];
            high[i] = margin(r.upper());
            low[i] = margin(r.lower());
            double[] each = r.amounts();
            for (int k = 0; k < each.length; k++) {
                totals[k] += each[k];
            }
        }
        return StopLossRange.of(ranges[0].step(), joint(high), joint(low), totals);
    }

    private double[] joint(CountMargin[] margins) {
        return DependentSum.survival(copula, layer.perils(), margins, ordered() ? wantedError() : ROUNDED_ERROR);
    }

    /** The layer's loss rises with each total, so that totals rounded down and up give less and more of it under any copula. */
    private Bracket rounded(StopLossRange[] ranges, double error) {
        LayerTerms terms = layer.terms();
        double step = ranges[0].step();
        CountMargin[] low = new CountMargin[ranges.length];
        CountMargin[] high = new CountMargin[ranges.length];
        double least = -error;
        double most = error;
        for (int i = 0; i < ranges.length; i++) {
            double positive = JointDeficit.at(alone[i], new double[] {layer.events().get(i).hitChance()}) + layer.cutCounts();
            low[i] = margin(ranges[i].roundedDown());
            high[i] = margin(ranges[i].roundedUp(positive));
            least += ranges[i].allLow();
            most += ranges[i].allHigh();
        }
        double[] down = joint(low);
        double[] up = joint(high);
        double downAtDeductible = OrderedLaws.limited(down, step, terms.deductible());
        double upAtDeductible = OrderedLaws.limited(up, step, terms.deductible());
        if (Double.isInfinite(terms.annualLimit())) {
            return new Bracket(Math.max(0, least - upAtDeductible), most - downAtDeductible);
        }
        return new Bracket(Math.max(0, OrderedLaws.limited(down, step, end()) - downAtDeductible - error),
                OrderedLaws.limited(up, step, end()) - upAtDeductible + error);
    }

    private boolean ordered() {
        return ConvexOrder.keptBy(copula, layer.perils());
    }

    @Override
    public int mostBracketCells() {
        return ordered() && layer.events().stream().allMatch(EventLaw::secondOrder) ? Integer.MAX_VALUE : ROUNDED_CELLS;
    }

    @Override
    public double meanError() {
        return layer.meanError();
    }

    @Override
    public int longest(int level) {
        return layer.lattice().longest(level);
    }

    @Override
    public double weightOfErrors() {
        return end() - layer.terms().deductible();
    }

    @Override
    public double jointError() {
        return 10 * wantedError() + layer.cutCounts() + layer.chanceError();
    }

    /** The copula says nothing of how a year's total comes about. */
    @Override
    public double largestEvent(double level) {
        return Double.NaN;
    }

    @Override
    public boolean sharpen() {
        return false;
    }
}
