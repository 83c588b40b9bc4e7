package layerweft.model.severity;

/**
 * The law of the loss X ≥ 0 that one event brings, ground up, in the portfolio's unit. Kinds are immutable records, valid by
 * construction. Infinite means and moments are legal and given as {@link Double#POSITIVE_INFINITY}, never as NaN.
 */
public sealed interface SeverityModel permits Lognormal, Pareto, GeneralizedPareto, Gamma, Weibull, Burr, Loglogistic, Exponential,
        InverseGaussian, Beta, Mbbefd, DiscreteLosses, Spliced, Mixture, Capped {

    /** P(X ≤ x); 0 below the support. */
    double cdf(double x);

    /** P(X > x), computed directly and so exact far in the tail. */
    double survival(double x);

    /** P(X = x): 0 except at the atoms of discrete laws, caps and total losses. */
    double atom(double x);

    /**
     * inf{x : P(X ≤ x) ≥ p}.
     *
     * @param p in [0, 1]; at 0 the lower, at 1 the upper end of the support
     * @throws IllegalArgumentException if p is outside [0, 1]
     */
    double quantile(double p);

    /** inf{x : P(X > x) ≤ q}, the same as {@code quantile(1 - q)} but exact for small q. */
    double survivalQuantile(double q);

    /** E[X], in the portfolio's unit; may be infinite. */
    double mean();

    /** Limited expected value E[min(X, x)] for x ≥ 0; at infinity the mean. */
    double limitedMean(double x);

    /**
     * E[min(X, to)] − E[min(X, from)] = ∫_from^to P(X &gt; x) dx, the mean of a layer's part of one loss, with its full relative precision
     * however far up the layer stands; kinds override the difference where it loses digits.
     *
     * @param to at least {@code from}, possibly infinite
     */
    default double layerMean(double from, double to) {
        return limitedMean(to) - limitedMean(from);
    }

    /** Second limited moment E[min(X, x)²] for x ≥ 0, in unit²; at infinity the second moment, which may be infinite. */
    double limitedSecondMoment(double x);

    /** Supremum of the support, possibly infinite. */
    double upperEnd();

    /** Draws losses. The sampler is immutable and may be shared between threads. */
    SeveritySampler sampler();
}
