package layerweft.engine.transform;

import java.util.function.DoubleUnaryOperator;
import org.apache.commons.numbers.gamma.Erfc;
import org.apache.commons.numbers.gamma.LogGamma;

/**
 * Frailties that are integers: the logarithmic series law of Frank's copula and Sibuya's law of Joe's. The first terms stand one by one,
 * the rest as an integral over ln V; between them a smooth hand-over, wide enough that the sum over the integers and the integral agree
 * to 1e-10 (Poisson's summation formula).
 *
 * @param massOfLog v·P(V = v) at v = e^y, the probability continued between the integers
 */
record IntegerFrailty(DoubleUnaryOperator massOfLog) {
    private static final double MIDDLE = Math.log(12);
    private static final double WIDTH = 0.3;
    /** Beyond so many no term of its own has 1e-9 left. */
    private static final int TERMS = 76;

    /** P(V = k) = p^k/(kθ), p = 1 − e^−θ. */
    static IntegerFrailty logSeries(double theta) {
        double logRate = theta > 37 ? -theta : Math.log(-(theta < 0.7 ? Math.log(-Math.expm1(-theta)) : Math.log1p(-Math.exp(-theta))));
        return new IntegerFrailty(y -> Math.exp(-Math.exp(y + logRate)) / theta);
    }

    /** P(V = k) = α Γ(k − α)/(Γ(1 − α) k!). */
    static IntegerFrailty sibuya(double alpha) {
        double constant = Math.log(alpha) - LogGamma.value(1 - alpha);
        return new IntegerFrailty(y -> Math.exp(constant + (y > 36 ? -alpha * y : y + logGammaRatio(Math.exp(y), alpha))));
    }

    /** @param denser how many times as many nodes as for an error of 1e-9 */
    FrailtyRule rule(double low, double high, double step, double denser) {
        double[] logs = new double[TERMS];
        double[] weights = new double[TERMS];
        for (int k = 1; k <= TERMS; k++) {
            logs[k - 1] = Math.log(k);
            weights[k - 1] = massOfLog.applyAsDouble(logs[k - 1]) / k * (1 - handover(logs[k - 1]));
        }
        FrailtyRule terms = new FrailtyRule(logs, weights).clustered(Math.log(7.5), 0.28 / denser);
        double least = MIDDLE - 7.5 * WIDTH;
        FrailtyRule rest = LogGrid.dense(MIDDLE, step, 2.5 * WIDTH, 1.5 * denser).rule(y -> massOfLog.applyAsDouble(y) * handover(y), least,
                Math.max(least, high + 2));
        return terms.joined(rest).gathered(low, Math.max(high, 0.1), false);
    }

    /** Φ((y − MIDDLE)/WIDTH). */
    private static double handover(double y) {
        return 0.5 * Erfc.value((MIDDLE - y) / (WIDTH * Math.sqrt(2)));
    }

    /** ln Γ(k − α) − ln Γ(k + 1), k &gt; 0; the difference of two large logarithms by Stirling's series where k is large. */
    private static double logGammaRatio(double k, double alpha) {
        if (k < 20) {
            return (k > alpha ? LogGamma.value(k - alpha) : Double.NEGATIVE_INFINITY) - LogGamma.value(k + 1);
        }
        double x = k - alpha;
        double z = k + 1;
        // (x − ½)ln x − x − (z − ½)ln z + z with ln x = ln z + ln(1 − (1 + α)/z)
        double ratio = Math.log1p(-(1 + alpha) / z);
        return (x - 0.5) * ratio - (1 + alpha) * Math.log(z) + (1 + alpha) + stirling(x) - stirling(z);
    }

    private static double stirling(double x) {
        double r = 1 / (x * x);
        return (1.0 / 12 - r * (1.0 / 360 - r * (1.0 / 1260 - r / 1680))) / x;
    }
}
