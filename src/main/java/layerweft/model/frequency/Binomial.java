package layerweft.model.frequency;

import layerweft.model.Check;
import org.apache.commons.math3.complex.Complex;
import org.apache.commons.statistics.distribution.BinomialDistribution;

/**
 * Binomial counts: each of a number of trials brings an event or none, so counts vary less than Poisson ones.
 *
 * @param trials at least 1
 * @param chance of an event in each trial, above 0 and at most 1
 */
public record Binomial(int trials, double chance) implements FrequencyModel {

    public Binomial {
        new Check().that(trials >= 1, "trials", trials, "a whole number of at least 1")
                .that(chance > 0 && chance <= 1, "chance", chance, "above 0 and at most 1").orThrow();
    }

    @Override
    public double mean() {
        return trials * chance;
    }

    @Override
    public double variance() {
        return trials * chance * (1 - chance);
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
        return trials;
    }

    /** (1 + chance·(z − 1))^trials. */
    @Override
    public Complex generatingFunction(Complex z) {
        Complex base = z.subtract(1).multiply(chance).add(1);
        return base.equals(Complex.ZERO) ? Complex.ZERO : base.log().multiply(trials).exp();
    }

    private BinomialDistribution law() {
        return BinomialDistribution.of(trials, chance);
    }
}
