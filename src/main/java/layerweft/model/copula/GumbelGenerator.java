package layerweft.model.copula;

import layerweft.model.random.KeyedStream;

/** ψ(t) = exp(−t^(1/θ)), θ &gt; 1; V is positive stable with index 1/θ. */
record GumbelGenerator(double theta) implements Generator {

    @Override
    public double psiOfLog(double lnT) {
        return Math.exp(-Math.exp(lnT / theta));
    }

    @Override
    public double complementOfLog(double lnT) {
        return -Math.expm1(-Math.exp(lnT / theta));
    }

    @Override
    public double logInverse(double p, double q) {
        return theta * Math.log(LogScale.minusLog(p, q));
    }

    @Override
    public FrailtySampler frailty(KeyedStream stream) {
        return new PositiveStable(1, theta, stream);
    }
}
