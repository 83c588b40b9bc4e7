package layerweft.model.copula;

import layerweft.model.random.KeyedStream;
import org.apache.commons.rng.sampling.distribution.ZigguratSampler;

/** An inner frailty that is the sum of V_0 independent integers: added up where V_0 is small, by the limit law where it is large. */
abstract class CompoundFrailty implements InnerFrailty {
    /** Up to so many terms are added one by one. */
    static final int MOST_TERMS = 1000;
    /** Shift of the count that balances the second-order error of the limit law. */
    private static final double SHIFT = 0.65;
    private static final double LARGEST_LINEAR = 600;

    private final ZigguratSampler.NormalizedGaussian normal;

    CompoundFrailty(KeyedStream stream) {
        this.normal = ZigguratSampler.NormalizedGaussian.of(stream);
    }

    /** ln of one term. */
    abstract double logTerm();

    /** ln of the mean of the Poisson variable that stands for the sum of e^logCount terms. */
    abstract double logMeanOfMany(double logCount);

    @Override
    public final double logSample(double logOuter) {
        double count = Math.rint(Math.exp(logOuter));
        return count <= MOST_TERMS ? logSum((int) count) : logOfMany(logOuter, count);
    }

    private double logSum(int count) {
        double sum = 0;
        double logOfLarge = Double.NEGATIVE_INFINITY;
        for (int k = 0; k < count; k++) {
            double term = logTerm();
            if (term < LARGEST_LINEAR) {
                sum += Math.exp(term);
            } else {
                logOfLarge = LogScale.logAdd(logOfLarge, term);
            }
        }
        return LogScale.logAdd(Math.log(sum), logOfLarge);
    }

    /** At a mean above 1000 the Poisson variable is normal; the sum is never below its count. */
    private double logOfMany(double logOuter, double count) {
        double logMean = logMeanOfMany(Double.isInfinite(count) ? logOuter : Math.log(count + SHIFT));
        double spread = Math.max(-0.9, normal.sample() * Math.exp(-logMean / 2));
        return Math.max(logOuter, logMean + Math.log1p(spread));
    }
}
