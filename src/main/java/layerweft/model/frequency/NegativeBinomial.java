package layerweft.model.frequency;

import layerweft.model.Check;
import org.apache.commons.math3.complex.Complex;
import org.apache.commons.numbers.gamma.RegularizedBeta;

/**
 * Negative binomial counts: a Poisson law whose mean is itself gamma distributed, so that events cluster in some years. With
 * r = mean/(varianceToMean − 1), any positive real, and p = 1/varianceToMean, P(N ≤ n) = I_p(r, n + 1).
 *
 * @param mean E[N], events a year, above 0
 * @param varianceToMean Var[N]/E[N], above 1
 */
public record NegativeBinomial(double mean, double varianceToMean) implements FrequencyModel {

    public NegativeBinomial {
        new Check().positive("mean", mean).between("varianceToMean", varianceToMean, 1, Double.POSITIVE_INFINITY).orThrow();
    }

    @Override
    public double variance() {
        return mean * varianceToMean;
    }

    /** Γ(n + r)/(n!·Γ(r))·p^r·(1 − p)^n, through the density of the beta law. */
    @Override
    public double probability(int n) {
        if (n < 0) {
            return 0;
        }
        if (n == 0) {
            return Math.exp(-r() * Math.log(varianceToMean));
        }
        double p = 1 / varianceToMean;
        return RegularizedBeta.derivative(p, r(), n) * p * (varianceToMean - 1) / varianceToMean / n;
    }

    @Override
    public double cdf(int n) {
        return n < 0 ? 0 : RegularizedBeta.value(1 / varianceToMean, r(), n + 1.0);
    }

    @Override
    public double survival(int n) {
        return n < 0 ? 1 : RegularizedBeta.complement(1 / varianceToMean, r(), n + 1.0);
    }

    @Override
    public int quantile(double p) {
        return CountSearch.quantile(this, p);
    }

    @Override
    public int largest() {
        return Integer.MAX_VALUE;
    }

    /** (1 + (varianceToMean − 1)·(1 − z))^(−r); the base has a positive real part for |z| ≤ 1. */
    @Override
    public Complex generatingFunction(Complex z) {
        return Complex.ONE.subtract(z).multiply(varianceToMean - 1).add(1).log().multiply(-r()).exp();
    }

    private double r() {
        return mean / (varianceToMean - 1);
    }
}
