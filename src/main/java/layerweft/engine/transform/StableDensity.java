package layerweft.engine.transform;

import org.apache.commons.numbers.gamma.LogGamma;

/**
 * The density of Y = ln V for V positive stable with index α in (0, 1), E[e^(−tV)] = e^(−t^α): the frailty of the Gumbel copula.
 *
 * <p>For α ≥ 0.6 by Humbert's series (1945; Feller 1971, XVII.6), which in y is
 * h(y) = (1/π) Σ_{k≥1} (−1)^(k+1) Γ(kα + 1)/k! · sin(kπα) e^(−kαy). For smaller α by Kanter's representation (1975)
 * V = (A(U)/E)^b, b = (1 − α)/α, U uniform on (0, π), E exponential: h(y) = (1/b)·E[x e^(−x)], x = A(U)e^(−y/b).
 */
final class StableDensity {
    private static final double SERIES_FROM = 0.6;
    private final double alpha;
    private final double b;
    /** Series: coefficients; integral: A(u_j). */
    private final double[] first;
    /** Integral: weights. */
    private final double[] second;

    StableDensity(double alpha) {
        this.alpha = alpha;
        this.b = (1 - alpha) / alpha;
        if (alpha >= SERIES_FROM) {
            first = coefficients(alpha);
            second = null;
        } else {
            int half = 42;
            double step = 0.08;
            first = new double[2 * half + 1];
            second = new double[2 * half + 1];
            for (int j = -half; j <= half; j++) {
                // tanh-sinh rule (Takahasi & Mori 1974) for u in (0, π), the distance to π kept exact
                double s = Math.PI / 2 * Math.sinh(j * step);
                double u = Math.PI / (1 + Math.exp(-2 * s));
                double toEnd = Math.PI / (1 + Math.exp(2 * s));
                double cosh = Math.cosh(s);
                first[j + half] = logA(u, toEnd);
                second[j + half] = step * Math.PI / 4 * Math.cosh(j * step) / (cosh * cosh);
            }
        }
    }

    /** ln A(u) = (α ln sin αu + (1−α) ln sin (1−α)u − ln sin u)/(1 − α). */
    private double logA(double u, double toEnd) {
        return (alpha * Math.log(Math.sin(alpha * u)) + (1 - alpha) * Math.log(Math.sin((1 - alpha) * u)) - Math.log(Math.sin(Math.min(u, toEnd))))
                / (1 - alpha);
    }

    private static double[] coefficients(double alpha) {
        double[] c = new double[64];
        for (int k = 1;; k++) {
            if (k == c.length) {
                c = java.util.Arrays.copyOf(c, 2 * k);
            }
            double size = Math.exp(LogGamma.value(k * alpha + 1) - LogGamma.value(k + 1));
            // sin(kπα) = ∓ sin(kπ(1 − α)): the small angle keeps its digits
            c[k] = size * Math.sin(Math.IEEEremainder(k * (1 - alpha), 2) * Math.PI) / Math.PI;
            if (size < 1e-40 || k > 2_000_000) {
                return java.util.Arrays.copyOf(c, k + 1);
            }
        }
    }

    double of(double y) {
        return second == null ? series(y) : integral(y);
    }

    private double series(double y) {
        double ratio = Math.exp(-alpha * y);
        double power = 1;
        double sum = 0;
        for (int k = 1; k < first.length; k++) {
            power *= ratio;
            double term = first[k] * power;
            sum += term;
            if (power < 1e-40) {
                break;
            }
        }
        return Math.max(0, sum);
    }

    private double integral(double y) {
        double sum = 0;
        for (int j = 0; j < first.length; j++) {
            double logX = first[j] - y / b;
            if (logX < 4 && second[j] > 0) {
                sum += second[j] * Math.exp(logX - Math.exp(logX));
            }
        }
        return sum / b;
    }

    /** ln A at its least, u → 0. */
    private double logLeast() {
        return alpha / (1 - alpha) * Math.log(alpha) + Math.log1p(-alpha);
    }

    /** Below this the law has less than 1e-15. */
    double least() {
        return b * (logLeast() - Math.log(36));
    }

    /** Where the bulk lies. */
    double centre() {
        return b * logLeast();
    }

    /** The scale on which the density changes near its centre. */
    double width() {
        return b;
    }
}
