package layerweft.model.frequency;

import layerweft.model.Check;
import org.apache.commons.math3.complex.Complex;
import org.apache.commons.statistics.distribution.PoissonDistribution;

/**
 * Poisson counts: events come independently of each other.
 *
 * @param mean E[N], events a year, above 0
 */
public record Poisson(double mean) implements FrequencyModel {

    public Poisson {
        new Check().positive("mean", mean).orThrow();
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

    /** exp(mean·(z − 1)). */
    @Override
    public Complex generatingFunction(Complex z) {
        return z.subtract(1).multiply(mean).exp();
    }

    private PoissonDistribution law() {
        return PoissonDistribution.of(mean);
    }
}
