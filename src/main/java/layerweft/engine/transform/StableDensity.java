package layerweft.engine.transform;

import org.apache.commons.numbers.gamma.LogGamma;

/**
 * The density of Y = ln V for V positive stable with index α in (0, 1), E[e^(−tV)] = e^(−t^α): the frailty of the Gumbel copula.
 *
 * <p>In the lower part by Kanter's representation (1975) V = (A(U)/E)^b, b = (1 − α)/α, U uniform on (0, π), E exponential:
 * h(y) = (1/b)·E[x e^(−x)], x = A(U)e^(−y/b). In the upper part, where A(0)e^(−y/b) is small, by Humbert's series (1945; Feller 1971,
 * XVII.6), which in y is h(y) = (1/π) Σ_{k≥1} (−1)^(k+1) Γ(kα + 1)/k! · sin(kπα) e^(−kαy).
 */
final class StableDensity {
    /** ln(A(0)e^(−y/b)) from which the integral takes over from the series. */
    private static final double INTEGRAL_FROM = -1;
    private final double alpha;
    private final double b;
    private final double[] series;
    private final double[] logA;
    private final double[] weights;

    StableDensity(double alpha) {
        this.alpha = alpha;
        this.b = (1 - alpha) / alpha;
        series = coefficients(alpha);
        int half = 84;
        double step = 0.04;
        logA = new double[2 * half + 1];
        weights = new double[2 * half + 1];
        for (int j = -half; j <= half; j++) {
            // tanh-sinh rule (Takahasi & Mori 1974) for u in (0, π), the distance to π kept exact
            double s = Math.PI / 2 * Math.sinh(j * step);
            double u = Math.PI / (1 + Math.exp(-2 * s));
            double toEnd = Math.PI / (1 + Math.exp(2 * s));
            double cosh = Math.cosh(s);
            logA[j + half] = logA(u, toEnd);
            weights[j + half] = step * Math.PI / 4 * Math.cosh(j * step) / (cosh * cosh);
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
        return logLeast() - y / b > INTEGRAL_FROM ? integral(y) : series(y);
    }

    private double series(double y) {
        double ratio = Math.exp(-alpha * y);
        double power = 1;
        double sum = 0;
        for (int k = 1; k < series.length && power > 1e-40; k++) {
            power *= ratio;
            sum += series[k] * power;
        }
        return Math.max(0, sum);
    }

    private double integral(double y) {
        double sum = 0;
        for (int j = 0; j < logA.length; j++) {
            double logX = logA[j] - y / b;
            if (logX < 4) {
                sum += weights[j] * Math.exp(logX - Math.exp(logX));
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
