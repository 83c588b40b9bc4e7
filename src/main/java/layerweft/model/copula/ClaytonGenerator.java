package layerweft.model.copula;

import layerweft.model.random.KeyedStream;
import org.apache.commons.rng.sampling.distribution.AhrensDieterMarsagliaTsangGammaSampler;
import org.apache.commons.rng.sampling.distribution.SharedStateContinuousSampler;
import org.apache.commons.rng.sampling.distribution.ZigguratSampler;

/** ψ(t) = (1 + t)^(−1/θ), θ &gt; 0; V is gamma with shape 1/θ and scale 1. */
record ClaytonGenerator(double theta) implements Generator {

    @Override
    public double psiOfLog(double lnT) {
        return Math.exp(-LogScale.softplus(lnT) / theta);
    }

    @Override
    public double complementOfLog(double lnT) {
        return -Math.expm1(-LogScale.softplus(lnT) / theta);
    }

    @Override
    public double logInverse(double p, double q) {
        return LogScale.logExpm1(theta * LogScale.minusLog(p, q));
    }

    /**
     * Marsaglia &amp; Tsang (2000) for shapes of at least 1. Below, a gamma(shape + 1) times U^(1/shape), by logarithms: at a shape of
     * 0.005 half of all V lie below 1e-60.
     */
    @Override
    public FrailtySampler frailty(KeyedStream stream) {
        double shape = 1 / theta;
        if (shape >= 1) {
            SharedStateContinuousSampler gamma = AhrensDieterMarsagliaTsangGammaSampler.of(stream, shape, 1);
            return () -> Math.log(gamma.sample());
        }
        SharedStateContinuousSampler gamma = AhrensDieterMarsagliaTsangGammaSampler.of(stream, shape + 1, 1);
        ZigguratSampler.Exponential exponential = ZigguratSampler.Exponential.of(stream);
        return () -> Math.log(gamma.sample()) - theta * exponential.sample();
    }
}
