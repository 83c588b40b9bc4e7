package layerweft.model.copula;

import layerweft.model.random.KeyedStream;
import org.apache.commons.rng.sampling.distribution.ZigguratSampler;

/**
 * Sum of V_0 independent variables with generating function (1 − (1 − p_1 s)^α)/p_0, p_i = 1 − e^−θ_i: the inner frailty of nested Frank
 * copulas. One term is a Sibuya(α) variable tilted by p_1^k, drawn by rejection as in Hofert (2011): from Sibuya with probability
 * p_1^(k−1), or from the logarithmic series of θ_1 with the probability that a Sibuya variable is at least k. The better of the two
 * accepts at least 63 %.
 *
 * <p>For many terms, as in {@link SibuyaSum}: a Poisson variable whose mean follows the tilted stable law of
 * exp(−n((e^−θ_1 + s)^α − e^−θ_0)).
 */
final class TiltedSibuyaSum extends CompoundFrailty {
    private final double outer;
    private final double inner;
    private final Sibuya sibuya;
    private final LogarithmicSeries series;
    private final TiltedStable stable;
    private final double logOfMinusLogP;
    private final ZigguratSampler.Exponential exponential;

    TiltedSibuyaSum(double outer, double inner, KeyedStream stream) {
        super(stream);
        this.outer = outer;
        this.inner = inner;
        this.sibuya = new Sibuya(outer, inner, stream);
        this.series = new LogarithmicSeries(inner, stream);
        this.stable = new TiltedStable(outer, inner, stream);
        this.logOfMinusLogP = LogScale.logMinusLog1mExp(inner);
        this.exponential = ZigguratSampler.Exponential.of(stream);
    }

    @Override
    double logTerm() {
        return outer < -Math.expm1(-inner) ? fromSeries() : fromSibuya();
    }

    private double fromSeries() {
        while (true) {
            double logK = series.logSample();
            // both are logarithms of integers, hence the small allowance
            if (sibuya.logSample() >= logK - 1e-12) {
                return logK;
            }
        }
    }

    private double fromSibuya() {
        while (true) {
            double logK = sibuya.logSample();
            // −(k − 1) ln p_1 against an exponential; p_1 is 1 in a double from θ_1 = 37 on
            if (logK == 0 || exponential.sample() >= Math.exp(LogScale.logExpm1(logK) + logOfMinusLogP)) {
                return logK;
            }
        }
    }

    @Override
    double logMeanOfMany(double logCount) {
        return stable.logSample(logCount - outer) + LogScale.logExpm1(inner);
    }
}
