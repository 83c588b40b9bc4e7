package layerweft.study;

import java.util.ArrayList;
import java.util.List;
import java.util.SortedMap;
import java.util.TreeMap;
import java.util.function.DoubleFunction;
import layerweft.figures.Figure;
import org.apache.commons.math3.analysis.solvers.BrentSolver;
import org.apache.commons.math3.optim.MaxEval;
import org.apache.commons.math3.optim.nonlinear.scalar.GoalType;
import org.apache.commons.math3.optim.univariate.BrentOptimizer;
import org.apache.commons.math3.optim.univariate.SearchInterval;
import org.apache.commons.math3.optim.univariate.UnivariateObjectiveFunction;

/**
 * Finds where a difference, known with an error, changes its sign on a range of τ: looks at a grid first, then between grid points at
 * which it comes close to 0 and turns away, then closes in by Brent's method (Brent 1973, "Algorithms for minimization without
 * derivatives"). A value within its error has no sign.
 */
final class TauScan {
    private static final double STEP = 0.05;
    private static final int MOST_STEPS = 60;
    /** Between grid points a difference may fall so many times as much as from one to the next. */
    private static final double SUDDEN = 4;

    private final DoubleFunction<Figure> difference;
    private final double tolerance;
    private final SortedMap<Double, Figure> seen = new TreeMap<>();

    /** @param tolerance of τ, to which roots are found and nearly touching curves are followed */
    TauScan(DoubleFunction<Figure> difference, double tolerance) {
        this.difference = difference;
        this.tolerance = tolerance;
    }

    /**
     * The roots.
     *
     * @param signBelow of the difference below the first root: −1, 1, or 0 where it has none anywhere; for NaN see {@code defined}
     * @param roots rising, each with the error that the difference's own error makes
     * @param atLow the difference at the low end of the range
     * @param atHigh the difference at the high end
     */
    record Roots(boolean defined, int signBelow, List<Figure> roots, Figure atLow, Figure atHigh) {}

    Roots on(double low, double high) {
        int steps = Math.max(2, (int) Math.ceil((high - low) / STEP - 1e-9));
        for (int k = 0; k <= steps; k++) {
            at(k == steps ? high : low + (high - low) * k / steps);
        }
        if (!seen.values().stream().allMatch(d -> Double.isFinite(d.value()))) {
            return new Roots(false, 0, List.of(), at(low), at(high));
        }
        lookAtTurns(List.copyOf(seen.keySet()));
        List<Figure> roots = new ArrayList<>();
        int signBelow = 0;
        int sign = 0;
        double since = low;
        for (double tau : List.copyOf(seen.keySet())) {
            int here = sign(at(tau));
            if (here != 0 && sign != 0 && here != sign) {
                roots.add(root(since, tau));
            }
            if (here != 0) {
                signBelow = signBelow == 0 ? here : signBelow;
                sign = here;
                since = tau;
            }
        }
        return new Roots(true, signBelow, roots, at(low), at(high));
    }

    private Figure at(double tau) {
        return seen.computeIfAbsent(tau, difference::apply);
    }

    private static int sign(Figure d) {
        return Math.abs(d.value()) <= d.error() ? 0 : (int) Math.signum(d.value());
    }

    /** Where the difference comes closer to 0 at a grid point than at both its neighbours, two roots may hide between them. */
    private void lookAtTurns(List<Double> grid) {
        for (int k = 1; k < grid.size() - 1; k++) {
            int sign = sign(at(grid.get(k)));
            double here = sign * at(grid.get(k)).value();
            double left = sign * at(grid.get(k - 1)).value();
            double right = sign * at(grid.get(k + 1)).value();
            // a curve that turns gently far from 0 does not come down to it between grid points
            if (sign != 0 && here < left && here < right && here < SUDDEN * (Math.max(left, right) - here)) {
                new BrentOptimizer(tolerance, tolerance).optimize(new UnivariateObjectiveFunction(tau -> sign * at(tau).value()),
                        GoalType.MINIMIZE, new SearchInterval(grid.get(k - 1), grid.get(k + 1), grid.get(k)), new MaxEval(MOST_STEPS));
            }
        }
    }

    private Figure root(double below, double above) {
        double tau = new BrentSolver(tolerance).solve(MOST_STEPS, t -> at(t).value(), below, above);
        double slope = Math.abs((at(above).value() - at(below).value()) / (above - below));
        return new Figure(tau, tolerance + at(tau).error() / slope);
    }
}
