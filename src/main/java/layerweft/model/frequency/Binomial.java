package layerweft.model.frequency;

import layerweft.model.Check;
import org.apache.commons.math3.complex.Complex;
import org.apache.commons.statistics.distribution.BinomialDistribution;

/**
 * Binomial: so many independent chances of an event, each at most once a year; counts that vary less than Poisson ones.
 *
 * @param trials number of chances, 1 to 1,000,000,000
 * @param chance probability of the event at each, above 0 and at most 1
 */
public record Binomial(int trials, double chance) implements FrequencyModel {

    /** @throws layerweft.model.InadmissibleException if a parameter is out of its range */
    public Binomial {
        new Check().that(trials >= 1 && trials <= MOST_EVENTS, "trials", trials, "a whole number from 1 to 1,000,000,000")
                .that(chance > 0 && chance <= 1, "chance", chance, "above 0 and at most 1")
                .orThrow();
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
        return LowerTail.holds(this, n) ? LowerTail.cdf(this, n) : law().cumulativeProbability(n);
    }

    @Override
    public double survival(int n) {
        return LowerTail.holds(this, n) ? 1 - LowerTail.cdf(this, n) : law().survivalProbability(n);
    }

    @Override
    public int quantile(double p) {
        return CountSearch.quantile(this, p);
    }

    @Override
    public int largest() {
        return trials;
    }

    /** (1 + chance (z - 1))^trials. */
    @Override
    public Complex generatingFunction(Complex z) {
        return ComplexPower.ofOnePlus(z.subtract(1).multiply(chance), trials);
    }

    private BinomialDistribution law() {
        return BinomialDistribution.of(trials, chance);
    }
}
