package layerweft.engine.simulation;

import java.util.SortedMap;
import java.util.TreeMap;
import layerweft.figures.Figure;
import layerweft.figures.PositionStatistics;
import layerweft.model.treaty.Buyer;

/** From the sums and laws of an annual total to its figures. The ground-up total, whose mean is known exactly, is the control variate. */
final class PositionEstimates {

    private PositionEstimates() {}

    /**
     * @param gross sums of the ground-up total
     * @param known its exact moments; control variate where its variance is finite
     * @param infiniteMean whether this side's mean is known to be infinite
     * @param infiniteVariance whether its variance is
     */
    static PositionStatistics of(PositionSums sums, PositionSums gross, GrossMoments known, boolean infiniteMean, boolean infiniteVariance,
            AmountLaw totals, AmountLaw largest, Buyer buyer) {
        double n = sums.years;
        double mean = sums.x / n;
        double variance = Math.max(0, sums.xx / n - mean * mean);
        double grossMean = gross.x / n;
        double grossVariance = gross.xx / n - grossMean * grossMean;
        double covariance = sums.xGross / n - mean * grossMean;
        double slope = known.finiteVariance() && grossVariance > 0 ? covariance / grossVariance : 0;
        Figure expected = infiniteMean ? Figure.INFINITE : new Figure(mean - (slope == 0 ? 0 : slope * (grossMean - known.mean())),
                Math.sqrt(Math.max(0, variance - slope * covariance) / n));
        double sd = Math.sqrt(variance);
        double fourth = totals.mean(a -> Math.pow(a - mean, 4));
        Figure deviation = infiniteVariance ? Figure.INFINITE : new Figure(sd, sd == 0 ? 0 : Math.sqrt(Math.max(0, fourth - variance * variance) / n) / (2 * sd));
        SortedMap<Double, Figure> atRisk = new TreeMap<>();
        SortedMap<Double, Figure> occurrence = new TreeMap<>();
        for (double level : buyer.levels()) {
            atRisk.put(level, new Figure(totals.quantile(level), totals.quantileError(level)));
            occurrence.put(level, new Figure(largest.quantile(level), largest.quantileError(level)));
        }
        double level = buyer.tailLevel();
        double q = totals.quantile(level);
        double excess = totals.mean(a -> Math.max(a - q, 0));
        double excessSquared = totals.mean(a -> Math.max(a - q, 0) * Math.max(a - q, 0));
        Figure tail = infiniteMean ? Figure.INFINITE : new Figure(q + excess / (1 - level), Math.sqrt(Math.max(0, excessSquared - excess * excess) / n) / (1 - level));
        return new PositionStatistics(expected, deviation, atRisk, tail, occurrence);
    }
}
