package layerweft.model.copula;

import layerweft.model.random.KeyedStream;
import org.apache.commons.rng.sampling.distribution.AhrensDieterMarsagliaTsangGammaSampler;
import org.apache.commons.rng.sampling.distribution.SharedStateContinuousSampler;
import org.apache.commons.rng.sampling.distribution.ZigguratSampler;

/**
 * Clayton's pair with −1 ≤ θ &lt; 0, which no frailty gives. In the form of McNeil &amp; Nešlehová (2009, "Multivariate Archimedean copulas,
 * d-monotone functions and l1-norm symmetric distributions") U_i = (1 − X_i)^(−1/θ), (X_1, X_2) = R·(S, 1 − S) with S uniform; here
 * the radius R has the law beta(2, b), b = −1/θ − 1, so that X_i = E_i/(E_1 + E_2 + G) with two exponentials and a gamma(b).
 * The score is the logit of 1 − X_i: ln(E_j + G) − ln E_i.
 */
final class NegativeClaytonSampler extends YearSampler {
    private final double strength;
    private final boolean survival;

    /** @param strength −θ, in (0, 1] */
    NegativeClaytonSampler(double strength, boolean survival) {
        super(2);
        this.strength = strength;
        this.survival = survival;
    }

    @Override
    Drawer drawer(KeyedStream stream) {
        double shape = (1 - strength) / strength;
        double sign = survival ? -1 : 1;
        ZigguratSampler.Exponential exponential = ZigguratSampler.Exponential.of(stream);
        SharedStateContinuousSampler gamma = shape > 0 ? AhrensDieterMarsagliaTsangGammaSampler.of(stream, shape, 1) : null;
        return (scores, year) -> {
            double first = exponential.sample() + Double.MIN_NORMAL;
            double second = exponential.sample() + Double.MIN_NORMAL;
            double g = gamma == null ? 0 : gamma.sample();
            scores[0][year] = sign * (Math.log(second + g) - Math.log(first));
            scores[1][year] = sign * (Math.log(first + g) - Math.log(second));
        };
    }

    @Override
    public double score(int i, double p, double q) {
        return survival ? -logit(q, p) : logit(p, q);
    }

    /** ln(p^a/(1 − p^a)), a = −θ. */
    private double logit(double p, double q) {
        double y = strength * LogScale.minusLog(p, q);
        return -y - LogScale.log1mExp(y);
    }

    @Override
    public double uniform(int i, double score) {
        return survival ? upper(-score) : lower(score);
    }

    @Override
    public double complement(int i, double score) {
        return survival ? lower(-score) : upper(score);
    }

    private double lower(double score) {
        return Math.exp(-LogScale.softplus(-score) / strength);
    }

    private double upper(double score) {
        return -Math.expm1(-LogScale.softplus(-score) / strength);
    }
}
