package layerweft.model.severity;

import layerweft.model.Check;
import org.apache.commons.numbers.gamma.LogBeta;
import org.apache.commons.numbers.gamma.RegularizedBeta;

/**
 * Burr law (type XII): P(X &gt; x) = (1 + (x/θ)^γ)^(−α). The moment of order m is finite for αγ &gt; m. Limited moments as in Klugman, Panjer
 * &amp; Willmot, "Loss Models", appendix A, where the incomplete beta function exists; by quadrature of the survival function elsewhere.
 *
 * @param alpha α, above 0
 * @param gamma γ, above 0
 * @param theta θ, above 0, in the portfolio's unit
 */
public record Burr(double alpha, double gamma, double theta) implements SeverityModel {
    /** Second parameter of the incomplete beta function from which its values keep their digits. */
    private static final double SAFE = 0.05;

    public Burr {
        new Check().positive("alpha", alpha).positive("gamma", gamma).positive("theta", theta).orThrow();
    }

    @Override
    public double cdf(double x) {
        return x <= 0 ? 0 : -Math.expm1(-alpha * Math.log1p(Math.pow(x / theta, gamma)));
    }

    /** (1 + (x/θ)^γ)^(−α), by (x/θ)^(−γ) where that is the smaller, so that nothing overflows. */
    @Override
    public double survival(double x) {
        if (x <= 0) {
            return 1;
        }
        double lnZ = gamma * Math.log(x / theta);
        return lnZ <= 0 ? Math.exp(-alpha * Math.log1p(Math.exp(lnZ))) : Math.exp(-alpha * (lnZ + Math.log1p(Math.exp(-lnZ))));
    }

    @Override
    public double atom(double x) {
        return 0;
    }

    @Override
    public double quantile(double p) {
        Probability.check(p);
        return theta * Math.pow(Math.expm1(-Math.log1p(-p) / alpha), 1 / gamma);
    }

    @Override
    public double survivalQuantile(double q) {
        Probability.check(q);
        return theta * Math.pow(Math.expm1(-Math.log(q) / alpha), 1 / gamma);
    }

    @Override
    public double mean() {
        return moment(1);
    }

    @Override
    public double limitedMean(double x) {
        if (x == Double.POSITIVE_INFINITY) {
            return mean();
        }
        if (x <= 0) {
            return 0;
        }
        return beyond(1) > SAFE ? moment(1) * partBelow(1, x) + x * survival(x) : integral(this::survival, 0, x);
    }

    @Override
    public double limitedSecondMoment(double x) {
        if (x == Double.POSITIVE_INFINITY) {
            return moment(2);
        }
        if (x <= 0) {
            return 0;
        }
        return beyond(2) > SAFE ? moment(2) * partBelow(2, x) + x * x * survival(x) : integral(u -> 2 * u * survival(u), 0, x);
    }

    @Override
    public double layerMean(double from, double to) {
        double start = Math.max(from, 0);
        if (to <= start) {
            return 0;
        }
        if (to < Double.POSITIVE_INFINITY) {
            return integral(this::survival, start, to);
        }
        return start < theta || beyond(1) <= SAFE ? mean() - limitedMean(start)
                : moment(1) * RegularizedBeta.complement(share(start), 1 + 1 / gamma, beyond(1)) - start * survival(start);
    }

    @Override
    public double upperEnd() {
        return Double.POSITIVE_INFINITY;
    }

    @Override
    public SeveritySampler sampler() {
        return stream -> () -> survivalQuantile(stream.nextOpen());
    }

    private double integral(java.util.function.DoubleUnaryOperator f, double from, double to) {
        return LogQuadrature.integral(f, from, to, 2 / gamma);
    }

    /** α − m/γ: positive where the moment of order m is finite. */
    private double beyond(int m) {
        return alpha - m / gamma;
    }

    /** θ^m·Γ(1 + m/γ)·Γ(α − m/γ)/Γ(α). */
    private double moment(int m) {
        return beyond(m) <= 0 ? Double.POSITIVE_INFINITY
                : Math.pow(theta, m) * alpha * Math.exp(LogBeta.value(1 + m / gamma, beyond(m)));
    }

    /** Part of the moment of order m from losses up to x. */
    private double partBelow(int m, double x) {
        return RegularizedBeta.value(share(x), 1 + m / gamma, beyond(m));
    }

    /** z/(1 + z), z = (x/θ)^γ. */
    private double share(double x) {
        return 1 / (1 + Math.pow(theta / x, gamma));
    }
}
