package layerweft.model.copula;

import layerweft.model.random.KeyedStream;

/** ψ(t) = 1 − (1 − e^−t)^(1/θ), θ &gt; 1; V has the Sibuya law with parameter 1/θ. */
record JoeGenerator(double theta) implements Generator {

    @Override
    public double psiOfLog(double lnT) {
        return -Math.expm1(LogScale.log1mExpOfLog(lnT) / theta);
    }

    @Override
    public double complementOfLog(double lnT) {
        return Math.exp(LogScale.log1mExpOfLog(lnT) / theta);
    }

    /** ψ⁻¹(p) = −ln(1 − q^θ). */
    @Override
    public double logInverse(double p, double q) {
        return LogScale.logMinusLog1mExp(theta * LogScale.minusLog(q, p));
    }

    @Override
    public FrailtySampler frailty(KeyedStream stream) {
        return new Sibuya(1, theta, stream);
    }
}
