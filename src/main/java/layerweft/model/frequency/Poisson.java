package layerweft.model.frequency;

import layerweft.model.Check;
import org.apache.commons.math3.complex.Complex;
import org.apache.commons.statistics.distribution.PoissonDistribution;

/**
 * Poisson: P(N = n) = e^-m mⁿ / n!, the count of events that come singly and independently at a constant rate.
 *
 * @param mean events a year, m; above 0 and at most 1,000,000,000
 */
public record Poisson(double mean) implements FrequencyModel {

    /** @throws layerweft.model.InadmissibleException if the mean is out of its range */
    public Poisson {
        new Check().that(mean > 0 && mean <= MOST_EVENTS, "mean", mean, MEAN_RANGE).orThrow();
    }

    @Override
    public double variance() {
        return mean;
    }

    @Override
    public double probability(int n) {
        return law().probability(n);
    }

    @Override
    public double cdf(int n) {
        return law().cumulativeProbability(n);
    }

    @Override
    public double survival(int n) {
        return law().survivalProbability(n);
    }

    @Override
    public int quantile(double p) {
        return CountSearch.quantile(this, p);
    }

    @Override
    public int largest() {
        return Integer.MAX_VALUE;
    }

    /** exp(m(z - 1)). */
    @Override
    public Complex generatingFunction(Complex z) {
        return z.subtract(1).multiply(mean).exp();
    }

    private PoissonDistribution law() {
        return PoissonDistribution.of(mean);
    }
}
