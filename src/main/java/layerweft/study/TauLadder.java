package layerweft.study;

import java.util.List;
import java.util.TreeSet;
import java.util.function.DoubleFunction;
import layerweft.figures.Figure;
import layerweft.model.copula.TauRange;

/**
 * The values of τ at which a family is priced: those asked for and, where these are far apart, neighbours from which the slope dφ/dτ is
 * taken.
 */
final class TauLadder {
    /** Neighbours that are asked for anyway serve for the slope up to this distance. */
    private static final double NEAR = 0.05 + 1e-9;
    private static final double STEP = 0.02;

    private final List<Double> asked;
    private final TauRange range;
    private final boolean extra;

    /** @param extra whether more values may be priced than are asked for: not where each is a simulation */
    TauLadder(List<Double> asked, TauRange range, boolean extra) {
        this.asked = asked.stream().sorted().toList();
        this.range = range;
        this.extra = extra;
    }

    /** All values to price, rising. */
    List<Double> taus() {
        TreeSet<Double> all = new TreeSet<>(asked);
        if (extra) {
            asked.forEach(tau -> all.addAll(stencil(tau)));
        }
        return List.copyOf(all);
    }

    /** The values from whose figures the slope at τ is taken: three, fewer where there are not as many. */
    private List<Double> stencil(double tau) {
        int at = asked.indexOf(tau);
        boolean near = at > 0 && at < asked.size() - 1 && asked.get(at + 1) - tau <= NEAR && tau - asked.get(at - 1) <= NEAR;
        if (near || !extra) {
            int from = Math.max(0, Math.min(at - 1, asked.size() - 3));
            return asked.subList(from, Math.min(asked.size(), from + 3));
        }
        // not across 0: more than two perils may have a common factor on one side only
        if (!range.contains(tau - STEP) || tau >= 0 && tau < STEP) {
            return List.of(tau, tau + STEP, tau + 2 * STEP);
        }
        return range.contains(tau + STEP) ? List.of(tau - STEP, tau, tau + STEP) : List.of(tau - 2 * STEP, tau - STEP, tau);
    }

    /**
     * Derivative at τ of the parabola through the figures at three neighbouring values (a straight line where there are two, undefined with
     * one). Its error is what the figures' errors can do to it, without the curvature between the points.
     */
    Figure slope(double tau, DoubleFunction<Figure> at) {
        List<Double> x = stencil(tau);
        if (x.size() < 2) {
            return Figure.UNDEFINED;
        }
        Figure slope = Figure.exact(0);
        for (int i = 0; i < x.size(); i++) {
            slope = slope.plus(at.apply(x.get(i)).times(weight(x, i, tau)));
        }
        return Double.isFinite(slope.value()) ? slope : Figure.UNDEFINED;
    }

    /** Derivative at τ of the Lagrange polynomial that is 1 at x_i and 0 at the others. */
    private static double weight(List<Double> x, int i, double tau) {
        double sum = 0;
        for (int skipped = 0; skipped < x.size(); skipped++) {
            if (skipped != i) {
                double product = 1 / (x.get(i) - x.get(skipped));
                for (int k = 0; k < x.size(); k++) {
                    product *= k == i || k == skipped ? 1 : (tau - x.get(k)) / (x.get(i) - x.get(k));
                }
                sum += product;
            }
        }
        return sum;
    }
}
