package layerweft.model.copula;

import layerweft.model.random.KeyedStream;

/** ψ(t) = e^−t, V = 1: the limit of every family at τ = 0. */
record IndependenceGenerator() implements Generator {

    @Override
    public double psiOfLog(double lnT) {
        return Math.exp(-Math.exp(lnT));
    }

    @Override
    public double complementOfLog(double lnT) {
        return -Math.expm1(-Math.exp(lnT));
    }

    @Override
    public double logInverse(double p, double q) {
        return Math.log(LogScale.minusLog(p, q));
    }

    @Override
    public FrailtySampler frailty(KeyedStream stream) {
        return () -> 0;
    }
}
