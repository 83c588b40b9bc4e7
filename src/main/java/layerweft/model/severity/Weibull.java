package layerweft.model.severity;

import layerweft.model.Check;
import org.apache.commons.numbers.gamma.RegularizedGamma;

/**
 * Weibull law: P(X &gt; x) = exp(−(x/scale)^shape). Limited moments as in Klugman, Panjer &amp; Willmot, "Loss Models", appendix A.
 *
 * @param shape k, above 0; below 1 the tail is heavier than exponential
 * @param scale λ, above 0, in the portfolio's unit
 */
public record Weibull(double shape, double scale) implements SeverityModel {

    public Weibull {
        new Check().positive("shape", shape).positive("scale", scale).orThrow();
    }

    @Override
    public double cdf(double x) {
        return x <= 0 ? 0 : -Math.expm1(-exponent(x));
    }

    @Override
    public double survival(double x) {
        return x <= 0 ? 1 : Math.exp(-exponent(x));
    }

    @Override
    public double atom(double x) {
        return 0;
    }

    @Override
    public double quantile(double p) {
        Probability.check(p);
        return scale * Math.pow(Math.max(0, -Math.log1p(-p)), 1 / shape);
    }

    @Override
    public double survivalQuantile(double q) {
        Probability.check(q);
        return scale * Math.pow(Math.max(0, -Math.log(q)), 1 / shape);
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

    /** Up to a finite amount by quadrature, without end E[X]·Q(1 + 1/k, (x/λ)^k) − x·P(X &gt; x) from the scale on. */
    @Override
    public double layerMean(double from, double to) {
        double start = Math.max(from, 0);
        if (to <= start) {
            return 0;
        }
        if (to < Double.POSITIVE_INFINITY) {
            return start == 0 ? limitedMean(to) : integral(1, start, to);
        }
        double mean = mean();
        return start < scale || mean == Double.POSITIVE_INFINITY ? mean - limitedMean(start)
                : mean * RegularizedGamma.Q.value(1 + 1 / shape, exponent(start)) - start * survival(start);
    }

    @Override
    public double upperEnd() {
        return Double.POSITIVE_INFINITY;
    }

    @Override
    public SeveritySampler sampler() {
        return stream -> () -> survivalQuantile(stream.nextOpen());
    }

    private double exponent(double x) {
        return Math.pow(x / scale, shape);
    }

    /** λ^m·Γ(1 + m/k). */
    private double moment(int m) {
        return Math.pow(scale, m) * org.apache.commons.numbers.gamma.Gamma.value(1 + m / shape);
    }

    /** E[X^m]·P(1 + m/k, (x/λ)^k) + x^m·P(X &gt; x); by quadrature for shapes so small that the moment exceeds every {@code double}. */
    private double limitedMoment(int m, double x) {
        double moment = moment(m);
        if (x == Double.POSITIVE_INFINITY) {
            return moment;
        }
        if (x <= 0) {
            return 0;
        }
        if (moment == Double.POSITIVE_INFINITY) {
            return integral(m, 0, x);
        }
        double beyond = m == 1 ? x * survival(x) : x * (x * survival(x));
        return moment * RegularizedGamma.P.value(1 + m / shape, exponent(x)) + beyond;
    }

    private double integral(int m, double from, double to) {
        return LogQuadrature.integral(this::survival, m, from, to, 1 / (3 * shape));
    }
}
