package layerweft.model.severity;

import java.util.function.DoubleUnaryOperator;
import layerweft.model.Check;

/**
 * Damage ratio of the class of Bernegger (1997, "The Swiss Re exposure curves and the MBBEFD distribution class", ASTIN Bulletin 27) times
 * the exposed value: for ratios below 1, P(R &gt; r) = (1 − b)/((g − 1)·b^(1−r) + 1 − g·b), and a total loss with chance 1/g.
 *
 * <p>Written as P(R &gt; r) = 1/(1 + (g − 1)·h(r)) with h(r) = b·(b^(−r) − 1)/(1 − b), rising from 0 to 1, it needs no special case but b = 1,
 * where h(r) = r.
 *
 * @param b above 0
 * @param g at least 1; 1/g is the chance of a total loss
 * @param exposedValue the total loss, above 0, in the portfolio's unit
 */
public record Mbbefd(double b, double g, double exposedValue) implements SeverityModel {
    /** Nearer than this to the limits b = 1 and bg = 1, or as far up, the closed form loses more digits than quadrature. */
    private static final double NEAR_LIMIT = 0.01;

    public Mbbefd {
        new Check().positive("b", b).that(g >= 1 && g < Double.POSITIVE_INFINITY, "g", g, "a finite number of at least 1")
                .positive("exposedValue", exposedValue).orThrow();
    }

    /**
     * Bernegger's one-parameter subclass: b = exp(3.1 − 0.15·(1 + c)·c), g = exp((0.78 + 0.12·c)·c).
     *
     * @param c at least 0
     */
    public static Mbbefd ofC(double c, double exposedValue) {
        new Check().notNegative("c", c).positive("exposedValue", exposedValue).orThrow();
        return new Mbbefd(Math.exp(3.1 - 0.15 * (1 + c) * c), Math.exp((0.78 + 0.12 * c) * c), exposedValue);
    }

    @Override
    public double cdf(double x) {
        if (x >= exposedValue) {
            return 1;
        }
        double rise = rise(x);
        return rise / (1 + rise);
    }

    @Override
    public double survival(double x) {
        return x >= exposedValue ? 0 : 1 / (1 + rise(x));
    }

    @Override
    public double atom(double x) {
        return x == exposedValue ? 1 / g : 0;
    }

    @Override
    public double quantile(double p) {
        Probability.check(p);
        return at(p / (1 - p));
    }

    @Override
    public double survivalQuantile(double q) {
        Probability.check(q);
        return at((1 - q) / q);
    }

    @Override
    public double mean() {
        return limitedMean(exposedValue);
    }

    @Override
    public double limitedMean(double x) {
        return layerMean(0, x);
    }

    /** (r + ln(1 + (g − 1)·h(r))/ln b)·(1 − b)/(1 − gb) between the ratios, or quadrature near its limits. */
    @Override
    public double layerMean(double from, double to) {
        double start = Math.min(Math.max(from, 0), exposedValue);
        double end = Math.min(Math.max(to, 0), exposedValue);
        if (end <= start) {
            return 0;
        }
        double lnB = Math.log(b);
        double a = (1 - g * b) / (1 - b);
        if (Math.abs(lnB) < NEAR_LIMIT || Math.abs(a) * survival(start) < NEAR_LIMIT) {
            return integral(this::survival, start, end);
        }
        double growth = Math.log1p((rise(end) - rise(start)) / (1 + rise(start)));
        return exposedValue * ((end - start) / exposedValue + growth / lnB) / a;
    }

    @Override
    public double limitedSecondMoment(double x) {
        return integral(u -> 2 * u * survival(u), 0, Math.min(Math.max(x, 0), exposedValue));
    }

    @Override
    public double upperEnd() {
        return exposedValue;
    }

    @Override
    public SeveritySampler sampler() {
        return stream -> () -> survivalQuantile(stream.nextOpen());
    }

    private double integral(DoubleUnaryOperator f, double from, double to) {
        return to <= from ? 0 : LogQuadrature.integral(f, from, to, 1 / (1 + 0.2 * Math.abs(Math.log(b))));
    }

    /** (g − 1)·h(x/exposedValue). */
    private double rise(double x) {
        double r = Math.min(Math.max(x / exposedValue, 0), 1);
        return b == 1 ? (g - 1) * r : (g - 1) * b * Math.expm1(-r * Math.log(b)) / (1 - b);
    }

    /** The smallest loss whose odds P(X ≤ x)/P(X &gt; x) reach a value. */
    private double at(double odds) {
        if (!(odds < g - 1)) {
            return exposedValue;
        }
        double h = odds / (g - 1);
        double r = b == 1 ? h : -Math.log1p(h * (1 - b) / b) / Math.log(b);
        return exposedValue * Math.min(Math.max(r, 0), 1);
    }
}
