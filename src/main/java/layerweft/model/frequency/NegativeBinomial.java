package layerweft.model.frequency;

import layerweft.model.Check;
import org.apache.commons.math3.complex.Complex;
import org.apache.commons.numbers.gamma.RegularizedBeta;

/**
 * Negative binomial: a Poisson count whose mean is itself gamma distributed, for events that come in clusters (Greenwood and Yule 1920).
 * With c the ratio of variance to mean, r = mean/(c - 1) and p = 1/c: P(N = n) = Γ(n + r)/(Γ(r) n!) pʳ (1 - p)ⁿ. As c goes to 1 the law
 * goes to Poisson.
 *
 * @param mean events a year; above 0 and at most 1,000,000,000
 * @param varianceToMean variance of the count over its mean, c; above 1 and at most 1,000,000,000
 */
public record NegativeBinomial(double mean, double varianceToMean) implements FrequencyModel {
    /** The least r whose beta function is finite with room to spare. */
    private static final double LEAST_SIZE = 1e-300;

    /** @throws layerweft.model.InadmissibleException if a parameter is out of its range, or r = mean/(varianceToMean - 1) below 1e-300 */
    public NegativeBinomial {
        boolean ratio = varianceToMean > 1 && varianceToMean <= MOST_EVENTS;
        double least = ratio ? LEAST_SIZE * Math.max(1, varianceToMean - 1) : 0;
        new Check().that(mean > 0 && mean <= MOST_EVENTS, "mean", mean, MEAN_RANGE)
                .that(!(mean > 0) || mean >= least, "mean", mean, "at least 1e-300 times (varianceToMean - 1)")
                .that(ratio, "varianceToMean", varianceToMean, "above 1 and at most 1,000,000,000 (at 1 the law is poisson)")
                .orThrow();
    }

    /** The shape r of the gamma law mixed over, mean/(varianceToMean - 1); any positive number. */
    public double size() {
        return mean / (varianceToMean - 1);
    }

    @Override
    public double variance() {
        return mean * varianceToMean;
    }

    /** By the derivative of the incomplete beta function: P(N = n) = p/(n + r) · d/dq I_q(n + 1, r), q = 1 - p. */
    @Override
    public double probability(int n) {
        if (n < 0) {
            return 0;
        }
        double r = size();
        if (n == 0) {
            return Math.exp(-r * Math.log1p(varianceToMean - 1));
        }
        double slope = nearPoisson() ? RegularizedBeta.derivative(failure(), n + 1.0, r) : RegularizedBeta.derivative(success(), r, n + 1.0);
        return slope * success() / (n + r);
    }

    @Override
    public double cdf(int n) {
        if (n < 0) {
            return 0;
        }
        if (LowerTail.holds(this, n)) {
            return LowerTail.cdf(this, n);
        }
        return nearPoisson() ? RegularizedBeta.complement(failure(), n + 1.0, size()) : RegularizedBeta.value(success(), size(), n + 1.0);
    }

    @Override
    public double survival(int n) {
        if (n < 0) {
            return 1;
        }
        if (LowerTail.holds(this, n)) {
            return 1 - LowerTail.cdf(this, n);
        }
        return nearPoisson() ? RegularizedBeta.value(failure(), n + 1.0, size()) : RegularizedBeta.complement(success(), size(), n + 1.0);
    }

    @Override
    public int quantile(double p) {
        return CountSearch.quantile(this, p);
    }

    @Override
    public int largest() {
        return Integer.MAX_VALUE;
    }

    /** (1 + (c - 1)(1 - z))^-r. */
    @Override
    public Complex generatingFunction(Complex z) {
        return ComplexPower.ofOnePlus(z.negate().add(1).multiply(varianceToMean - 1), -size());
    }

    private double success() {
        return 1 / varianceToMean;
    }

    private double failure() {
        return (varianceToMean - 1) / varianceToMean;
    }

    /**
     * Whether 1 - p is the smaller of p and 1 - p. The beta functions take only one of the two and subtract it from 1; the smaller one must
     * be given, else near Poisson (p near 1, r large) its rounding comes back r times as large.
     */
    private boolean nearPoisson() {
        return varianceToMean < 2;
    }
}
