package layerweft.model.copula;

import layerweft.model.random.KeyedStream;

/** ψ(t) = −ln(1 − (1 − e^−θ)e^−t)/θ, θ &gt; 0; V has the logarithmic series law with parameter 1 − e^−θ. */
record FrankGenerator(double theta) implements Generator {

    /** For ψ near 1 the logarithm's argument is written (1 − e^−t) + e^(−θ−t), two positive terms, added by their logarithms. */
    @Override
    public double psiOfLog(double lnT) {
        double t = Math.exp(lnT);
        double part = -Math.expm1(-theta) * Math.exp(-t);
        return part < 0.5 ? -Math.log1p(-part) / theta : -LogScale.logAdd(LogScale.log1mExpOfLog(lnT), -theta - t) / theta;
    }

    /** 1 − ψ(t) = ln(1 + (e^θ − 1)(1 − e^−t))/θ. */
    @Override
    public double complementOfLog(double lnT) {
        return Math.min(1, LogScale.softplus(LogScale.logExpm1(theta) + LogScale.log1mExpOfLog(lnT)) / theta);
    }

    /** ψ⁻¹(p) = −ln((1 − e^−θp)/(1 − e^−θ)); where that is small, −ln(1 − r) with r = e^−θp (1 − e^−θq)/(1 − e^−θ). */
    @Override
    public double logInverse(double p, double q) {
        double ratio = Math.expm1(-theta * p) / Math.expm1(-theta);
        if (ratio < 0.5) {
            return Math.log(-Math.log(ratio));
        }
        return LogScale.logMinusLog1mExp(theta * p - LogScale.log1mExp(theta * q) + LogScale.log1mExp(theta));
    }

    @Override
    public FrailtySampler frailty(KeyedStream stream) {
        return new LogarithmicSeries(theta, stream);
    }
}
