package layerweft.reference;

import org.apache.commons.math3.optim.MaxEval;
import org.apache.commons.math3.optim.nonlinear.scalar.GoalType;
import org.apache.commons.math3.optim.univariate.BrentOptimizer;
import org.apache.commons.math3.optim.univariate.SearchInterval;
import org.apache.commons.math3.optim.univariate.UnivariateObjectiveFunction;

/**
 * Generalized Pareto tail above a threshold by maximum likelihood, for papers that print the shape alone. With t = shape/scale the
 * likelihood has its maximum over the shape at the mean of ln(1 + t·excess), which leaves one dimension (Grimshaw 1993, "Computing maximum
 * likelihood estimates for the generalized Pareto distribution"). Positive shapes only.
 *
 * @param exceedances number of losses above the threshold
 */
record TailFit(double threshold, int exceedances, double shape, double scale) {

    static TailFit above(double threshold, double[] losses) {
        double[] excess = java.util.Arrays.stream(losses).filter(x -> x > threshold).map(x -> x - threshold).toArray();
        double logT = new BrentOptimizer(1e-12, 1e-12).optimize(new MaxEval(1000), GoalType.MAXIMIZE,
                new UnivariateObjectiveFunction(s -> profile(Math.exp(s), excess)), new SearchInterval(Math.log(1e-4), Math.log(10))).getPoint();
        double t = Math.exp(logT);
        return new TailFit(threshold, excess.length, shape(t, excess), shape(t, excess) / t);
    }

    private static double profile(double t, double[] excess) {
        double shape = shape(t, excess);
        return -excess.length * (Math.log(shape / t) + shape + 1);
    }

    private static double shape(double t, double[] excess) {
        return java.util.Arrays.stream(excess).map(y -> Math.log1p(t * y)).average().orElseThrow();
    }
}
