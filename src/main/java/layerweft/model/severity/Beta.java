package layerweft.model.severity;

import layerweft.model.Check;
import org.apache.commons.numbers.gamma.RegularizedBeta;
import org.apache.commons.rng.sampling.distribution.ChengBetaSampler;
import org.apache.commons.rng.sampling.distribution.SharedStateContinuousSampler;
import org.apache.commons.statistics.distribution.BetaDistribution;

/**
 * A beta distributed damage ratio times the exposed value.
 *
 * @param a first parameter of the ratio, above 0
 * @param b second parameter of the ratio, above 0
 * @param exposedValue largest loss, above 0, in the portfolio's unit
 */
public record Beta(double a, double b, double exposedValue) implements SeverityModel {

    public Beta {
        new Check().positive("a", a).positive("b", b).positive("exposedValue", exposedValue).orThrow();
    }

    @Override
    public double cdf(double x) {
        return RegularizedBeta.value(ratio(x), a, b);
    }

    @Override
    public double survival(double x) {
        return RegularizedBeta.complement(ratio(x), a, b);
    }

    @Override
    public double atom(double x) {
        return 0;
    }

    @Override
    public double quantile(double p) {
        return exposedValue * BetaDistribution.of(a, b).inverseCumulativeProbability(p);
    }

    @Override
    public double survivalQuantile(double q) {
        return exposedValue * BetaDistribution.of(a, b).inverseSurvivalProbability(q);
    }

    @Override
    public double mean() {
        return exposedValue * a / (a + b);
    }

    /** E[X]·I(a + 1, b) + x·P(X &gt; x). */
    @Override
    public double limitedMean(double x) {
        double r = ratio(x);
        return mean() * RegularizedBeta.value(r, a + 1, b) + r * exposedValue * RegularizedBeta.complement(r, a, b);
    }

    @Override
    public double limitedSecondMoment(double x) {
        double r = ratio(x);
        double square = exposedValue * exposedValue;
        return square * (a / (a + b) * (a + 1) / (a + b + 1) * RegularizedBeta.value(r, a + 2, b) + r * r * RegularizedBeta.complement(r, a, b));
    }

    @Override
    public double layerMean(double from, double to) {
        return from < mean() ? limitedMean(to) - limitedMean(from) : stopLoss(from) - stopLoss(to);
    }

    @Override
    public double upperEnd() {
        return exposedValue;
    }

    @Override
    public SeveritySampler sampler() {
        return stream -> {
            SharedStateContinuousSampler ratios = ChengBetaSampler.of(stream, a, b);
            return () -> exposedValue * ratios.sample();
        };
    }

    private double ratio(double x) {
        return Math.min(Math.max(x / exposedValue, 0), 1);
    }

    /** E[(X − d)+] from the law of what is left of the exposed value, a beta law with a and b exchanged: no digits are lost near the top. */
    private double stopLoss(double d) {
        double below = (exposedValue - Math.min(Math.max(d, 0), exposedValue)) / exposedValue;
        return exposedValue * (below * RegularizedBeta.value(below, b, a) - b / (a + b) * RegularizedBeta.value(below, b + 1, a));
    }
}
