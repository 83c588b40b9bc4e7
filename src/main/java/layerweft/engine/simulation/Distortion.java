package layerweft.engine.simulation;

import java.util.function.DoubleUnaryOperator;
import layerweft.model.treaty.Loading;
import org.apache.commons.statistics.distribution.NormalDistribution;

/**
 * A distorted mean ∫ g(S(y)) dy of a law on finitely many points, g rising and concave with g(0) = 0 and g(1) = 1 (Wang 1995, 2000).
 *
 * @param g applied to survival probabilities
 */
record Distortion(DoubleUnaryOperator g) {
    private static final NormalDistribution NORMAL = NormalDistribution.of(0, 1);

    /** The distortion of a loading, or null where it is not one. */
    static Distortion of(Loading loading) {
        if (loading instanceof Loading.ProportionalHazard ph) {
            return new Distortion(s -> Math.pow(s, 1 / ph.rho()));
        }
        if (loading instanceof Loading.Wang wang) {
            return new Distortion(s -> s <= 0 ? 0 : s >= 1 ? 1
                    : NORMAL.cumulativeProbability(NORMAL.inverseCumulativeProbability(s) + wang.lambda()));
        }
        return null;
    }

    /** ∫ g(S(y)) dy. */
    double mean(AmountLaw law) {
        double integral = law.cells() == 0 ? 0 : law.point(0);
        for (int k = 0; k + 1 < law.cells(); k++) {
            integral += (law.point(k + 1) - law.point(k)) * g.applyAsDouble(law.above(k));
        }
        return integral;
    }

    /**
     * Influence of one more year in each cell, up to a constant: ∫_0^y g'(S(t)) dt, the slope of g taken over the width of one cell's
     * own probability.
     */
    double[] influence(AmountLaw law) {
        double[] influence = new double[law.cells()];
        for (int k = 0; k + 1 < influence.length; k++) {
            double s = law.above(k);
            double step = Math.min(0.5 * Math.min(s, 1 - s), Math.max(1.0 / law.years(), 1e-6));
            double slope = step == 0 ? 0 : (g.applyAsDouble(s + step) - g.applyAsDouble(s - step)) / (2 * step);
            influence[k + 1] = influence[k] + slope * (law.point(k + 1) - law.point(k));
        }
        return influence;
    }
}
