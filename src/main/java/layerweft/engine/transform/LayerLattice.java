package layerweft.engine.transform;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.DoubleStream;

/**
 * What a layer's annual sum needs that does not depend on the copula, level by level of refinement (level k halves the step of level
 * k − 1): the transforms of the perils' event laws. Made once, used for every copula.
 */
final class LayerLattice {
    /** Cells up to the cap at level 0, at least. */
    private static final int FIRST_CELLS = 16;
    /** Cells kept beyond the end, for one-sided slopes there. */
    private static final int MARGIN = 4;
    private final List<EventLaw> events;
    private final double[] hitChances;
    private final double cap;
    private final double end;
    private final double firstStep;
    private final List<Level> levels = new ArrayList<>();
    private final Map<Integer, Ordered> ordered = new HashMap<>();
    private Level atoms;
    private final double upward;
    private double reach = 1.6;

    /**
     * One lattice with the transforms on it.
     *
     * @param wanted cells of the annual sum
     * @param lost by peril, on the atoms' lattice, the chance that an event's loss is no atom; else null
     */
    record Level(double step, int wanted, Spectrum spectrum, double[][][] deficits, double[] lost) {}

    /** Event laws above and below the true ones, by peril, and their transforms. */
    private record Ordered(OrderedLaws[] laws, Level upper, Level lower) {}

    /**
     * @param events of the perils that can reach the layer, in their order
     * @param end the annual sum matters up to here
     * @param terms finite amounts at which the annual terms bend
     */
    LayerLattice(List<EventLaw> events, double cap, double end, double[] terms) {
        this.events = events;
        this.hitChances = events.stream().mapToDouble(EventLaw::hitChance).toArray();
        this.cap = cap;
        this.end = end;
        double[] landmarks = events.stream().flatMapToDouble(e -> DoubleStream.of(e.landmarks())).distinct().toArray();
        this.upward = 0;
        this.firstStep = LatticeStep.of(cap, terms, landmarks, end, FIRST_CELLS);
    }

    private LayerLattice(LayerLattice whole, List<EventLaw> events, double upward) {
        this.events = events;
        this.hitChances = events.stream().mapToDouble(EventLaw::hitChance).toArray();
        this.upward = upward;
        this.cap = whole.cap;
        this.end = whole.end;
        this.firstStep = whole.firstStep;
    }

    /** The same lattice for the sum of one peril's events alone. */
    LayerLattice of(EventLaw event) {
        return new LayerLattice(this, List.of(event), 0);
    }

    /** The same lattice with transforms tilted so that sums far up are weighted by e^(rate·A) and keep their digits. */
    LayerLattice upward(double rate) {
        LayerLattice tilted = new LayerLattice(this, events, rate);
        tilted.reach = 4;
        return tilted;
    }

    /** E[e^(rate·A)] for the capped losses on the coarsest lattice. */
    double exponentialMoment(JointLaw nodes, double rate) {
        double step = step(0);
        int cells = LatticeStep.cells(cap, step);
        double[] deficits = new double[events.size()];
        for (int i = 0; i < deficits.length; i++) {
            double[] survival = events.get(i).cellSurvival(step, cells);
            for (int k = 0; k < cells; k++) {
                deficits[i] -= Math.expm1(rate * step) * survival[k] * Math.exp(rate * step * k);
            }
        }
        return 1 - nodes.at(deficits);
    }

    double end() {
        return end;
    }

    double step(int level) {
        return firstStep / (1 << level);
    }

    /** Cells of the annual sum at a level. */
    int cells(int level) {
        return LatticeStep.cells(end, step(level));
    }

    /** Cells of the longest lattice that a level needs: of the annual sum, or of a subject loss from the ground up. */
    int longest(int level) {
        double reach = events.stream().mapToDouble(EventLaw::reach).max().orElse(0);
        return LatticeStep.cells(Math.max(end, reach), step(level));
    }

    /** Asks for longer transforms with less tilt: the digits of rare sums far up the lattice need them. */
    void reachFurther() {
        if (reach < 4) {
            reach = 4;
            levels.clear();
            ordered.clear();
        }
    }

    boolean reachesFar() {
        return reach >= 4;
    }

    /**
     * A on the lattice of a level, with mass spread to the lattice points.
     *
     * @param atomSurvival from {@link #atomSurvival}
     */
    LatticeSum sum(JointLaw nodes, int level, double[] atomSurvival) {
        Level at = level(level);
        double[] mean = survival(nodes, at);
        double top = mean.length > 0 ? mean[0] : 0;
        double wrapped = Math.exp(-at.spectrum.tilt() * at.spectrum.length()) * Math.max(0, mean[mean.length - 1]);
        double rounding = 2e-16 * top * Math.exp(at.spectrum.tilt() * at.wanted);
        return new LatticeSum(at.step, mean, atoms().step, atomSurvival, wrapped + rounding);
    }

    /**
     * Sums of event laws above and below the true ones in their stop-loss transforms.
     *
     * @param spread the sum of this level
     * @param meanCounts E[N_i] of the perils
     */
    StopLossRange range(JointLaw nodes, int level, LatticeSum spread, double[] meanCounts) {
        Ordered at = ordered.computeIfAbsent(level, this::ordered);
        double[] upper = at.upper == level(level) ? spread.mean() : survival(nodes, at.upper);
        double[] totals = new double[9];
        for (int i = 0; i < meanCounts.length; i++) {
            double[] each = at.laws[i].amounts();
            for (int k = 0; k < totals.length; k++) {
                totals[k] += meanCounts[i] * each[k];
            }
        }
        return StopLossRange.of(step(level), upper, survival(nodes, at.lower), totals);
    }

    private Ordered ordered(int level) {
        double step = step(level);
        int cells = LatticeStep.cells(cap, step);
        OrderedLaws[] laws = events.stream().map(e -> e.ordered(step, cells)).toArray(OrderedLaws[]::new);
        boolean spread = true;
        double[][] upper = new double[laws.length][];
        double[][] lower = new double[laws.length][];
        for (int i = 0; i < laws.length; i++) {
            upper[i] = laws[i].upper();
            lower[i] = laws[i].lower();
            spread &= Arrays.equals(upper[i], events.get(i).cellSurvival(step, cells));
        }
        return new Ordered(laws, spread ? level(level) : make(upper, level), make(lower, level));
    }

    private double[] survival(JointLaw nodes, Level at) {
        double[][] deficit = deficit(nodes, at);
        double[] mean = at.spectrum.survival(deficit[0], deficit[1], at.wanted);
        // rounding may not make a probability negative or rise
        for (int k = mean.length - 1; k >= 0; k--) {
            mean[k] = Math.min(1, Math.max(mean[k], 0));
        }
        return mean;
    }

    private double[][] deficit(JointLaw nodes, Level at) {
        return nodes.deficit(at.deficits, upward > 0 ? 0 : JointLaw.NEGLIGIBLE * nodes.at(hitChances));
    }

    private Level level(int level) {
        while (levels.size() <= level) {
            levels.add(null);
        }
        if (levels.get(level) == null) {
            double step = step(level);
            int cells = LatticeStep.cells(cap, step);
            levels.set(level, make(events.stream().map(e -> e.cellSurvival(step, cells)).toArray(double[][]::new), level));
        }
        return levels.get(level);
    }

    private Level make(double[][] laws, int level) {
        int last = cells(level);
        int wanted = last + MARGIN;
        int length = Spectrum.goodLength((int) Math.ceil(reach * wanted));
        double tilt = upward > 0 ? -upward * step(level) : reachesFar() ? 14.0 / length : 36.0 / (length + wanted);
        Spectrum spectrum = new Spectrum(length, tilt);
        double[][][] deficits = new double[laws.length][][];
        Arrays.setAll(deficits, i -> spectrum.deficit(laws[i]));
        return new Level(step(level), wanted, spectrum, deficits, null);
    }

    /**
     * The atoms' own lattice: their event laws, with the rest of each law at infinity. Where all perils have atoms at 0 and at the cap
     * only, its step is the cap.
     */
    private Level atoms() {
        if (atoms == null) {
            double step = step(0);
            int cells = LatticeStep.cells(cap, step);
            double[][] at = events.stream().map(e -> e.atoms(step, cells)).toArray(double[][]::new);
            int stride = cells;
            for (double[] law : at) {
                for (int k = 1; law != null && k < cells; k++) {
                    stride = law[k] > 0 ? gcd(stride, k) : stride;
                }
            }
            int places = cells / stride;
            int wanted = (int) Math.ceil(end / (stride * step)) + 2;
            int length = Spectrum.goodLength(Math.max(8, (upward > 0 ? 4 : 2) * wanted));
            Spectrum spectrum = new Spectrum(length, upward > 0 ? -upward * stride * step : 30.0 / length);
            double[][][] deficits = new double[events.size()][][];
            double[] never = new double[events.size()];
            for (int i = 0; i < deficits.length; i++) {
                double inside = at[i] == null ? 0 : Arrays.stream(at[i], 1, cells).sum();
                never[i] = Math.max(0, events.get(i).hitChance() - events.get(i).fullChance() - inside);
                deficits[i] = atomDeficit(spectrum, events.get(i), at[i], places, stride);
            }
            atoms = new Level(stride * step, wanted, spectrum, deficits, never);
        }
        return atoms;
    }

    private static int gcd(int a, int b) {
        return b == 0 ? a : gcd(b, a % b);
    }

    /** 1 − Σ α_k z^k = (1 − z) Σ_{k &lt; places} U_k z^k + U z^places, U_k = P(o &gt; k or no atom), U = P(no atom). */
    private static double[][] atomDeficit(Spectrum spectrum, EventLaw event, double[] atoms, int places, int stride) {
        double[] rest = new double[places];
        double left = event.hitChance();
        for (int k = 0; k < places; k++) {
            rest[k] = left;
            left -= k + 1 == places ? event.fullChance() : atoms == null ? 0 : atoms[(k + 1) * stride];
        }
        double never = Math.max(0, left);
        double[][] deficit = spectrum.deficit(rest);
        for (int j = 0; j < spectrum.frequencies(); j++) {
            double size = Math.exp(-spectrum.tilt() * places) * never;
            double angle = -2 * Math.PI * ((long) j * places % spectrum.length()) / spectrum.length();
            deficit[0][j] += size * Math.cos(angle);
            deficit[1][j] += size * Math.sin(angle);
        }
        return deficit;
    }

    /** P(A &gt; k·(step of the atoms), A an atom), k = 0, 1, … */
    double[] atomSurvival(JointLaw nodes) {
        Level at = atoms();
        double[][] deficit = deficit(nodes, at);
        // a year with any loss that is no atom is no atom: U at infinity, taken off before the inverse transform
        double constant = nodes.at(at.lost);
        for (int j = 0; j < deficit[0].length; j++) {
            deficit[0][j] -= constant;
        }
        double[] survival = at.spectrum.survival(deficit[0], deficit[1], at.wanted);
        for (int k = 0; k < survival.length; k++) {
            survival[k] = Math.max(0, survival[k]);
        }
        return survival;
    }
}
