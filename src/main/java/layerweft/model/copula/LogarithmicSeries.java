package layerweft.model.copula;

import layerweft.model.random.KeyedStream;
import org.apache.commons.rng.sampling.distribution.ZigguratSampler;

/**
 * The logarithmic series law P(V = k) = p^k/(kθ), p = 1 − e^−θ, k ≥ 1, by Kemp (1981, "Efficient generation of logarithmically
 * distributed pseudo-random variables"): given a uniform S, V is geometric with ratio 1 − e^−θS. All is said in θ, never in p,
 * which is 1 in a double from θ = 37 on; once the geometric mean e^θS is above 10^17 the step of 1 is below a double's
 * resolution and V is its exponential limit.
 */
final class LogarithmicSeries implements FrailtySampler {
    private final double theta;
    private final KeyedStream stream;
    private final ZigguratSampler.Exponential exponential;

    LogarithmicSeries(double theta, KeyedStream stream) {
        this.theta = theta;
        this.stream = stream;
        this.exponential = ZigguratSampler.Exponential.of(stream);
    }

    @Override
    public double logSample() {
        double e = exponential.sample();
        double logMean = theta * stream.nextOpen();
        if (logMean > 40) {
            return Math.log(e) + logMean;
        }
        double rate = -LogScale.log1mExp(logMean);
        return e < rate ? 0 : Math.log(1 + Math.floor(e / rate));
    }
}
