package layerweft.model.copula;

import org.apache.commons.statistics.distribution.TDistribution;

/**
 * Student's t law with both tails exact. Beyond |t| = 1e100, where t² would leave the range of a double, the tail is its power law
 * P(T &gt; t) ∝ t^−ν; a quantile above the largest double is infinite (at ν = 0.1 from a probability of 1e-31 on).
 */
final class StudentScale {
    private static final double FAR = 1e100;

    private final double degreesOfFreedom;
    private final TDistribution law;
    private final double beyondFar;

    StudentScale(double degreesOfFreedom) {
        this.degreesOfFreedom = degreesOfFreedom;
        this.law = TDistribution.of(degreesOfFreedom);
        this.beyondFar = law.survivalProbability(FAR);
    }

    /** P(T ≤ t). */
    double cdf(double t) {
        return survival(-t);
    }

    /** P(T &gt; t). */
    double survival(double t) {
        if (t > FAR) {
            return beyondFar * Math.pow(t / FAR, -degreesOfFreedom);
        }
        return t < -FAR ? 1 - survival(-t) : law.survivalProbability(t);
    }

    /** The t with P(T ≤ t) = p, with q = 1 − p given apart. */
    double quantile(double p, double q) {
        return p < q ? -upperQuantile(p) : upperQuantile(q);
    }

    private double upperQuantile(double q) {
        if (q == 0) {
            return Double.POSITIVE_INFINITY;
        }
        return q < beyondFar ? FAR * Math.pow(q / beyondFar, -1 / degreesOfFreedom) : law.inverseSurvivalProbability(q);
    }
}
