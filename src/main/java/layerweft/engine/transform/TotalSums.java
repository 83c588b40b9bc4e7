package layerweft.engine.transform;

import java.util.Arrays;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import layerweft.figures.Bracket;
import layerweft.model.copula.Copula;
import layerweft.model.treaty.LayerTerms;

/**
 * Annual sums where the copula joins the perils' annual totals: stop-loss layers of whole perils. Each total's law comes from a lattice
 * of its own; given the copula's latent factor the totals are independent.
 */
final class TotalSums implements AnnualSums {
    private static final double JOINT_ERROR = 2e-9;
    /** Cells wanted for the guaranteed range, whose width is of first order here. */
    private static final int BRACKET_CELLS = 4096;
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
        double[] mean = DependentSum.survival(copula, layer.perils(), margins, JOINT_ERROR);
        secondMomentsToEnd.put(mean.length, secondMoments);
        return new LatticeSum(layer.lattice().step(level), mean, 2 * end(), new double[] {0}, noise + 1e-14);
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
     * Totals rounded down and up with their ranks kept. Their survival functions at points of the lattice lie between averages over the
     * cells above and below, and these between the bounds from convex order for each total alone.
     */
    @Override
    public Bracket bracket(int level, LatticeSum finest) {
        LayerTerms terms = layer.terms();
        if (Double.isInfinite(terms.annualLimit()) || layer.splitEvents()) {
            return null;
        }
        if (totals.isEmpty()) {
            return new Bracket(0, 0);
        }
        int fine = level;
        while (cells(fine) < BRACKET_CELLS) {
            fine++;
        }
        CountMargin[] low = new CountMargin[totals.size()];
        CountMargin[] high = new CountMargin[totals.size()];
        double step = layer.lattice().step(fine);
        for (int i = 0; i < low.length; i++) {
            LayerLattice lattice = totals.get(i);
            LatticeSum spread = lattice.sum(alone[i], fine, new double[] {0});
            double[] fused = lattice.lowerSum(alone[i], fine);
            double lost = lattice.lostMean(fine, new double[] {layer.meanCounts()[i]}) + spread.noise() * end() + layer.cutCounts() * end();
            int n = fused.length;
            double[] under = new double[n];
            double[] over = new double[n];
            double least = 0;
            double most = lost;
            over[0] = JointDeficit.at(alone[i], new double[] {layer.events().get(i).hitChance()});
            for (int k = 0; k + 1 < n; k++) {
                // `least` and `most` hold E[min(S, kh)]
                double nextLeast = least + step * spread.mean()[k];
                double nextMost = most + step * fused[k];
                double average = (nextLeast - (k == 0 ? 0 : most)) / step;
                if (k > 0) {
                    under[k - 1] = Math.max(0, average);
                }
                over[k + 1] = Math.min(over[0], (nextMost - least) / step);
                least = nextLeast;
                most = nextMost;
            }
            for (int k = n - 2; k >= 0; k--) {
                under[k] = Math.max(under[k], under[k + 1]);
            }
            low[i] = margin(under);
            high[i] = margin(over);
        }
        double slack = 10 * (jointError() + finest.noise()) * (end() - terms.deductible());
        double[] down = DependentSum.survival(copula, layer.perils(), low, JOINT_ERROR);
        double[] up = DependentSum.survival(copula, layer.perils(), high, JOINT_ERROR);
        return new Bracket(Math.max(0, within(down, step, terms) - slack), within(up, step, terms) + slack);
    }

    private double within(double[] survival, double step, LayerTerms terms) {
        return CountSums.limited(survival, step, end()) - CountSums.limited(survival, step, terms.deductible());
    }

    @Override
    public double weightOfErrors() {
        return end() - layer.terms().deductible();
    }

    @Override
    public double jointError() {
        return 10 * JOINT_ERROR + layer.cutCounts() + layer.chanceError();
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
