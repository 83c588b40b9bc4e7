package layerweft.model.copula;

import layerweft.model.random.KeyedStream;
import org.apache.commons.rng.sampling.distribution.ZigguratSampler;

/**
 * The exponentially tilted positive stable law with Laplace transform exp(−v((1 + t)^α − 1)): the law of v^(1/α)S with density
 * multiplied by e^−x.
 *
 * <p>For v ≤ 1 by plain rejection, which accepts with probability e^−v; for larger v by the double rejection of Devroye (2009, "Random
 * variate generation for exponentially and polynomially tilted stable distributions"), whose cost is bounded for all v and α; notation as
 * there, with λ^α = v. Powers 1/α are taken by logarithms. Below α = 1e-6 the law is its limit, gamma with shape vα.
 */
final class TiltedStable {
    private static final double C1 = Math.sqrt(Math.PI / 2);
    private static final double SMALLEST_INDEX = 1e-6;

    private final double outer;
    private final double inner;
    private final double alpha;
    private final double rest;
    private final double b;
    private final KeyedStream stream;
    private final PositiveStable stable;
    private final ZigguratSampler.Exponential exponential;
    private final ZigguratSampler.NormalizedGaussian normal;

    /** Index α = outer/inner. */
    TiltedStable(double outer, double inner, KeyedStream stream) {
        this.outer = outer;
        this.inner = inner;
        this.alpha = outer / inner;
        this.rest = (inner - outer) / inner;
        this.b = rest / alpha;
        this.stream = stream;
        this.stable = new PositiveStable(outer, inner, stream);
        this.exponential = ZigguratSampler.Exponential.of(stream);
        this.normal = ZigguratSampler.NormalizedGaussian.of(stream);
    }

    /** ln X of the next X, given ln v. */
    double logSample(double lnV) {
        if (alpha < SMALLEST_INDEX) {
            return new ClaytonGenerator(inner / outer * Math.exp(-lnV)).logFrailty(stream);
        }
        return lnV <= 0 ? byPlainRejection(lnV) : byDoubleRejection(lnV, Math.exp(lnV));
    }

    private double byPlainRejection(double lnV) {
        while (true) {
            double lnX = lnV / alpha + stable.logSample();
            if (exponential.sample() >= Math.exp(lnX)) {
                return lnX;
            }
        }
    }

    private double byDoubleRejection(double lnV, double v) {
        double gamma = v * alpha * rest;
        double root = Math.sqrt(gamma);
        double c3 = (2 + C1) * root;
        double xi = (1 + Math.sqrt(2) * c3) / Math.PI;
        double psi = c3 * Math.exp(-gamma * Math.PI * Math.PI / 8) / Math.sqrt(Math.PI);
        while (true) {
            double u = angle(gamma, root, xi, psi);
            if (u >= Math.PI) {
                continue;
            }
            double zeta2 = sinc(u) / (Math.pow(sinc(alpha * u), alpha) * Math.pow(sinc(rest * u), rest));
            double zeta = Math.sqrt(zeta2);
            double z = -1 / Math.expm1(-Math.log1p(alpha * zeta / root) / alpha);
            double envelope = gamma >= 1 ? xi * Math.exp(-gamma * u * u / 2) : xi;
            envelope += psi / Math.sqrt(Math.PI - u);
            double lnZ = Math.log(stream.nextOpen() * Math.PI * envelope / ((1 + C1) * root / zeta + z)) - v * (1 - 1 / zeta2);
            if (lnZ > 0) {
                continue;
            }
            double x = radius(u, v, z, -lnZ);
            if (x > 0) {
                return lnV / alpha - b * Math.log(x);
            }
        }
    }

    /** The proposal of U; it may lie beyond π. */
    private double angle(double gamma, double root, double xi, double psi) {
        double tailWeight = 2 * Math.sqrt(Math.PI) * psi;
        double bodyWeight = gamma >= 1 ? C1 * xi / root : xi * Math.PI;
        if (stream.nextDouble() * (bodyWeight + tailWeight) >= bodyWeight) {
            double w = stream.nextOpen();
            return Math.PI * (1 - w * w);
        }
        return gamma >= 1 ? Math.abs(normal.sample()) / root : Math.PI * stream.nextOpen();
    }

    /** The inner rejection given U: the accepted X, or 0. */
    private double radius(double u, double v, double z, double e) {
        double a = Math.exp((alpha * Math.log(Math.sin(alpha * u)) + rest * Math.log(Math.sin(rest * u)) - Math.log(Math.sin(u))) / rest);
        double m = Math.pow(b / a, alpha) * v;
        double delta = Math.sqrt(m * alpha / a);
        double left = delta * C1;
        double right = z / a;
        double pick = stream.nextDouble() * (left + delta + right);
        double x;
        double credit = 0;
        if (pick < left) {
            double n = normal.sample();
            x = m - delta * Math.abs(n);
            credit = n * n / 2;
        } else if (pick < left + delta) {
            x = m + delta * stream.nextOpen();
        } else {
            credit = exponential.sample();
            x = m + delta + credit * right;
        }
        if (!(x > 0)) {
            return 0;
        }
        // λ(x^−b − m^−b) with λ m^−b = v (a/b)^(1−α)
        double cost = a * (x - m) + v * Math.pow(a / b, rest) * Math.expm1(b * Math.log(m / x)) - credit;
        return cost <= e ? x : 0;
    }

    private static double sinc(double x) {
        return x < 1e-4 ? 1 - x * x / 6 : Math.sin(x) / x;
    }
}
