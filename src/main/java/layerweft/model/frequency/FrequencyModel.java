package layerweft.model.frequency;

import org.apache.commons.math3.complex.Complex;

/** The law of the number N of events of one peril in the contract year. Kinds are immutable and valid by construction. */
public sealed interface FrequencyModel permits Poisson, NegativeBinomial, Binomial, EmpiricalCounts {
    /** The most events a year that a law may expect; counts are held as int and must have room above the mean. */
    double MOST_EVENTS = 1e9;

    /** The range of a mean in words, for findings. */
    String MEAN_RANGE = "above 0 and at most 1,000,000,000 events a year";

    /** Events a year, E[N]. */
    double mean();

    /** Var[N], in events². */
    double variance();

    /** P(N = n); 0 for a count that cannot be. */
    double probability(int n);

    /** P(N ≤ n); 0 for n below 0. */
    double cdf(int n);

    /** P(N > n), computed directly and so exact far in the tail; 1 for n below 0. */
    double survival(int n);

    /**
     * The smallest n with P(N ≤ n) ≥ p.
     *
     * @param p in [0, 1]; at 1 the largest possible count, or {@link Integer#MAX_VALUE} if there is none
     * @throws IllegalArgumentException if p is outside [0, 1]
     */
    int quantile(double p);

    /** The largest count of positive probability, {@link Integer#MAX_VALUE} if there is none. */
    int largest();

    /** Probability generating function E[z^N] for |z| ≤ 1. */
    Complex generatingFunction(Complex z);
}
