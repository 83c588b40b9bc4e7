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
        double mean = 0;
        boolean finite = true;
        for (Peril peril : portfolio.perils()) {
            double n = peril.frequency().mean();
            if (peril.eventLoss() instanceof EventLoss.Split split) {
                for (SubPeril part : split.subPerils()) {
                    mean += n * part.chance() * part.severity().mean();
                    finite &= finiteVariance(part.severity());
                }
            } else {
                SeverityModel severity = ((EventLoss.Single) peril.eventLoss()).severity();
                mean += n * severity.mean();
                finite &= finiteVariance(severity);
            }
        }
        return new GrossMoments(mean, finite);
    }

    private static boolean finiteVariance(SeverityModel severity) {
        return severity.limitedSecondMoment(Double.POSITIVE_INFINITY) < Double.POSITIVE_INFINITY;
    }
}
