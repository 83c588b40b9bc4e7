package layerweft.engine.simulation;

import layerweft.model.portfolio.EventLoss;
import layerweft.model.portfolio.Peril;
import layerweft.model.portfolio.Portfolio;
import layerweft.model.portfolio.SubPeril;
import layerweft.model.severity.SeverityModel;

/**
 * The exact mean of the ground-up annual total, Σ E[N_i]·E[X_i], and whether its variance is finite.
 *
 * @param mean possibly infinite
 */
record GrossMoments(double mean, boolean finiteVariance) {

    static GrossMoments of(Portfolio portfolio) {
        boolean finite = true;
        for (Peril peril : portfolio.perils()) {
            if (peril.eventLoss() instanceof EventLoss.Split split) {
                for (SubPeril part : split.subPerils()) {
                    finite &= finiteVariance(part.severity());
                }
            } else {
                finite &= finiteVariance(((EventLoss.Single) peril.eventLoss()).severity());
            }
        }
        return new GrossMoments(portfolio.expectedLoss(), finite);
    }

    private static boolean finiteVariance(SeverityModel severity) {
        return severity.limitedSecondMoment(Double.POSITIVE_INFINITY) < Double.POSITIVE_INFINITY;
    }
}
