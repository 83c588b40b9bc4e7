package layerweft.model.copula;

import layerweft.model.random.KeyedStream;
import org.apache.commons.numbers.gamma.LogGamma;

/**
 * The Sibuya law with parameter α in (0, 1]: P(V &gt; n) = Π_{k≤n}(1 − α/k), probability generating function 1 − (1 − s)^α; by
 * inversion as in Hofert (2011, "Efficiently sampling nested Archimedean copulas", Proposition 3.2): with G(u) = (uΓ(1−α))^(−1/α)
 * the quantile at survival probability u is ⌊G⌋ or ⌈G⌉. Where G is beyond the integers of a double, V = G.
 */
final class Sibuya implements FrailtySampler {
    private static final double LOG_LARGEST_INTEGER = 36;
    /** Up to this the survival function is kept multiplied out; beyond, Stirling's series holds. */
    private static final int SHORT_PRODUCT = 24;

    private final double alpha;
    private final double rest;
    private final double logGammaOfRest;
    private final double[] shortSurvival = new double[SHORT_PRODUCT + 1];
    private final KeyedStream stream;

    /** Parameter outer/inner, given by its two parts (inner ≥ outer) so that 1 − α keeps its digits. */
    Sibuya(double outer, double inner, KeyedStream stream) {
        this.alpha = outer / inner;
        this.rest = (inner - outer) / inner;
        this.logGammaOfRest = rest > 0 ? LogGamma.value(rest) : Double.POSITIVE_INFINITY;
        this.stream = stream;
        shortSurvival[0] = 1;
        for (int n = 1; n <= SHORT_PRODUCT; n++) {
            shortSurvival[n] = shortSurvival[n - 1] * (n - 1 + rest) / n;
        }
    }

    @Override
    public double logSample() {
        double u = stream.nextOpen();
        if (u >= rest) {
            return 0;
        }
        double lnU = Math.log(u);
        double logG = -(lnU + logGammaOfRest) / alpha;
        if (logG > LOG_LARGEST_INTEGER) {
            return logG;
        }
        double floor = Math.max(1, Math.floor(Math.exp(logG)));
        boolean above = floor <= SHORT_PRODUCT ? u < shortSurvival[(int) floor] : lnU < logGammaRatio(floor) - logGammaOfRest;
        return Math.log(above ? floor + 1 : floor);
    }

    /**
     * ln(Γ(n+1−α)/Γ(n+1)), which with −ln Γ(1−α) is ln P(V &gt; n), for n &gt; 24 by Stirling's series for both, the leading
     * terms taken together so that nothing cancels.
     */
    private double logGammaRatio(double n) {
        double z = n + 1;
        double y = z - alpha;
        return (y - 0.5) * Math.log1p(-alpha / z) - alpha * Math.log(z) + alpha + stirling(y) - stirling(z);
    }

    private static double stirling(double z) {
        double w = 1 / (z * z);
        return (1.0 / 12 - w * (1.0 / 360 - w * (1.0 / 1260 - w / 1680))) / z;
    }
}
