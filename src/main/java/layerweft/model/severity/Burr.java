package layerweft.model.severity;

import layerweft.model.Check;
import org.apache.commons.numbers.gamma.LogBeta;
import org.apache.commons.numbers.gamma.RegularizedBeta;

/**
 * Burr law (type XII): P(X &gt; x) = (1 + z)^(−α), z = (x/θ)^γ. The moment of order m is finite for αγ &gt; m. With v = 1/(1 + z),
 * ∫_0^x m·u^(m−1)·P(X &gt; u) du is an integral of v^(α−m/γ−1)·(1 − v)^(m/γ−1), so E[min(X, x)^m] = E[X^m]·I_(1−v)(m/γ, α − m/γ), I the
 * regularized incomplete beta function, where it exists; elsewhere the integral is taken by quadrature.
 *
 * @param alpha α, above 0
 * @param gamma γ, above 0
 * @param theta θ, above 0, in the portfolio's unit
 */
public record Burr(double alpha, double gamma, double theta) implements SeverityModel {
    /** Second parameter of the incomplete beta function from which its product with the moment keeps its digits. */
    private static final double SAFE = 0.05;
    /** Argument below which the library's complement loses digits where both parameters are 1/2, while 1 less the value is as good. */
    private static final double NEARLY_NOTHING = 1e-6;

    public Burr {
        new Check().positive("alpha", alpha).positive("gamma", gamma).positive("theta", theta).orThrow();
    }

    @Override
    public double cdf(double x) {
        return x <= 0 ? 0 : -Math.expm1(-alpha * exponent(x));
    }

    @Override
    public double survival(double x) {
        return x <= 0 ? 1 : Math.exp(-alpha * exponent(x));
    }

    @Override
    public double atom(double x) {
        return 0;
    }

    @Override
    public double quantile(double p) {
        Probability.check(p);
        return at(-Math.log1p(-p) / alpha);
    }

    @Override
    public double survivalQuantile(double q) {
        Probability.check(q);
        return at(-Math.log(q) / alpha);
    }

    @Override
    public double mean() {
        return moment(1);
    }

    @Override
    public double limitedMean(double x) {
        return limitedMoment(1, x);
    }

    @Override
    public double limitedSecondMoment(double x) {
        return limitedMoment(2, x);
    }

    /** Up to a finite amount by quadrature, without end E[X]·I_v(α − 1/γ, 1/γ). */
    @Override
    public double layerMean(double from, double to) {
        double start = Math.max(from, 0);
        if (to <= start) {
            return 0;
        }
        if (to < Double.POSITIVE_INFINITY) {
            return integral(1, start, to);
        }
        return beyond(1) <= 0 ? Double.POSITIVE_INFINITY : moment(1) * partAbove(1, start);
    }

    @Override
    public double upperEnd() {
        return Double.POSITIVE_INFINITY;
    }

    @Override
    public SeveritySampler sampler() {
        return stream -> () -> survivalQuantile(stream.nextOpen());
    }

    /** t = ln(1 + z), from the logarithm of z, so that nothing overflows. */
    private double exponent(double x) {
        double lnZ = gamma * Math.log(x / theta);
        return lnZ <= 0 ? Math.log1p(Math.exp(lnZ)) : lnZ + Math.log1p(Math.exp(-lnZ));
    }

    /** The loss at t = ln(1 + z): θ·(e^t − 1)^(1/γ), by e^(t/γ) where e^t would overflow. */
    private double at(double t) {
        return theta * (t < 700 ? Math.pow(Math.expm1(Math.max(t, 0)), 1 / gamma) : Math.exp(t / gamma));
    }

    private double limitedMoment(int m, double x) {
        if (x <= 0) {
            return 0;
        }
        if (x == Double.POSITIVE_INFINITY) {
            return moment(m);
        }
        if (beyond(m) <= SAFE) {
            return integral(m, 0, x);
        }
        return moment(m) * partBelow(m, x);
    }

    /** Part of E[X^m] from the survival function up to x. */
    private double partBelow(int m, double x) {
        return incompleteBeta(-Math.expm1(-exponent(x)), Math.exp(-exponent(x)), m / gamma, beyond(m));
    }

    /** Part of E[X^m] from the survival function above x. */
    private double partAbove(int m, double x) {
        return incompleteBeta(Math.exp(-exponent(x)), -Math.expm1(-exponent(x)), beyond(m), m / gamma);
    }

    /** I_v(a, b) for v + w = 1, from the smaller of v and w, which is known with all its digits. */
    private static double incompleteBeta(double v, double w, double a, double b) {
        if (v < w) {
            return RegularizedBeta.value(v, a, b);
        }
        return w < NEARLY_NOTHING ? 1 - RegularizedBeta.value(w, b, a) : RegularizedBeta.complement(w, b, a);
    }

    /** ∫ m·u^(m−1)·P(X &gt; u) du; the logarithm of P falls by at most some 10 over the length given as scale. */
    private double integral(int m, double from, double to) {
        return LogQuadrature.integral(u -> m == 1 ? survival(u) : 2 * (u * survival(u)), from, to,
                2 / gamma / Math.max(1, Math.min(alpha / 5, 6)));
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
}
