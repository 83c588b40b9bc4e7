package layerweft.engine.transform;

import java.util.Arrays;
import java.util.function.DoubleUnaryOperator;
import layerweft.model.copula.ArchimedeanFamily;
import org.apache.commons.numbers.gamma.LogGamma;

/**
 * A quadrature rule for means over the frailty V of an Archimedean copula: E[f(ln V)] ≈ Σ w_k f(y_k), meant for functions made of
 * exp(−V a). In y = ln V these are translates of exp(−e^y), analytic in a strip of half-width π/2, and so the trapezoidal rule with a
 * step of 1/2 is good to e^(−2π²) ≈ 3e-9 of what changes there, whatever the family and however wide the law of V (Trefethen &amp;
 * Weideman 2014, "The exponentially convergent trapezoidal rule"). Where the law itself is narrow the step shrinks with it.
 *
 * @param logs y_k, rising
 * @param weights w_k, sum 1
 */
record FrailtyRule(double[] logs, double[] weights) {
    private static final double STEP = 0.48;
    /** Nodes per unit of asinh near a narrow core. */
    private static final double DENSITY = 2.6;
    /** Where integer frailties hand over from terms of their own to the integral: ln of the middle, and the width. */
    private static final double HANDOVER = Math.log(12);
    private static final double HANDOVER_WIDTH = 0.3;
    private static final int TERMS = 76;

    /**
     * @param low nothing changes below: ln V there counts as {@code low}
     * @param high nothing changes above
     */
    static FrailtyRule of(ArchimedeanFamily family, double theta, double low, double high) {
        return switch (family) {
            case CLAYTON -> clayton(1 / theta, low, high);
            case GUMBEL -> gumbel(1 / theta, low, high);
            case FRANK -> {
                double logP = Math.log(-Math.expm1(-theta));
                yield integers(k -> Math.exp(k * logP) / (k * theta), low, high);
            }
            case JOE -> {
                double alpha = 1 / theta;
                double constant = Math.log(alpha) - LogGamma.value(1 - alpha);
                yield integers(k -> Math.exp(constant + logGammaRatio(k, alpha)), low, high);
            }
        };
    }

    /** ln Γ(k − α) − ln Γ(k + 1), k &gt; 0; the difference of two large logarithms by Stirling's series where k is large. */
    private static double logGammaRatio(double k, double alpha) {
        if (k < 20) {
            return (k > alpha ? LogGamma.value(k - alpha) : Double.NEGATIVE_INFINITY) - LogGamma.value(k + 1);
        }
        double x = k - alpha;
        double z = k + 1;
        // (x − ½)ln x − x − (z − ½)ln z + z with ln x = ln z + ln(1 − (1+α)/z)
        double ratio = Math.log1p(-(1 + alpha) / z);
        return (x - 0.5) * ratio - (1 + alpha) * Math.log(z) + (1 + alpha) + stirling(x) - stirling(z);
    }

    private static double stirling(double x) {
        double r = 1 / (x * x);
        return (1.0 / 12 - r * (1.0 / 360 - r * (1.0 / 1260 - r / 1680))) / x;
    }

    /** V is gamma with shape k: the density of ln V is e^(ky − e^y)/Γ(k). */
    private static FrailtyRule clayton(double k, double low, double high) {
        double constant = LogGamma.value(k);
        double width = 1 / Math.sqrt(k);
        double centre = k > 1 ? Math.log(k) : 0;
        double least = Math.max(low, Math.min(centre - 9 * width, centre - 9 * width - 34 / k));
        double most = Math.min(high, centre + Math.min(9 * width, 3.8));
        return trapezoid(y -> Math.exp(k * y - Math.exp(y) - constant), centre, width, least, most);
    }

    /** V is positive stable with index α. */
    private static FrailtyRule gumbel(double alpha, double low, double high) {
        StableDensity density = new StableDensity(alpha);
        double least = Math.max(low, density.least());
        double most = Math.max(least, Math.min(high, 36 / alpha));
        return trapezoid(density::of, density.centre(), density.width(), least, most);
    }

    /** V is an integer: the first terms one by one, the rest as an integral, with a smooth hand-over that hides the integers. */
    private static FrailtyRule integers(DoubleUnaryOperator probability, double low, double high) {
        double[] logs = new double[TERMS];
        double[] weights = new double[TERMS];
        for (int k = 1; k <= TERMS; k++) {
            logs[k - 1] = Math.log(k);
            weights[k - 1] = probability.applyAsDouble(k) * (1 - handover(logs[k - 1]));
        }
        FrailtyRule terms = new FrailtyRule(logs, weights).clustered(Math.log(7.5), 0.4);
        if (high <= 0) {
            return lumped(new double[] {0}, new double[] {1});
        }
        double least = HANDOVER - 7.5 * HANDOVER_WIDTH;
        FrailtyRule rest = grid(y -> probability.applyAsDouble(Math.exp(y)) * Math.exp(y) * handover(y), HANDOVER, 0.5, least,
                Math.max(least + 1, Math.min(high, 700)));
        return terms.joined(rest).within(low, high);
    }

    private static double handover(double y) {
        return 0.5 * org.apache.commons.numbers.gamma.Erfc.value((HANDOVER - y) / (HANDOVER_WIDTH * Math.sqrt(2)));
    }

    private static FrailtyRule trapezoid(DoubleUnaryOperator density, double centre, double width, double low, double high) {
        FrailtyRule rule = grid(density, centre, width, low, high);
        return lumped(rule.logs, rule.weights);
    }

    /** The trapezoidal rule in ζ(y) = (y − c)/STEP + DENSITY·asinh((y − c)/width): fine steps in a narrow core, STEP far from it. */
    private static FrailtyRule grid(DoubleUnaryOperator density, double centre, double width, double low, double high) {
        double dense = width < 1 ? DENSITY : 0;
        int first = (int) Math.floor(zeta(low - centre, dense, width));
        int last = (int) Math.ceil(zeta(high - centre, dense, width));
        double[] logs = new double[Math.max(1, last - first + 1)];
        double[] weights = new double[logs.length];
        double x = low - centre;
        for (int k = 0; k < logs.length; k++) {
            x = inverse(first + k, x, dense, width);
            logs[k] = centre + x;
            weights[k] = density.applyAsDouble(centre + x) / slope(x, dense, width);
        }
        return new FrailtyRule(logs, weights);
    }

    private static double zeta(double x, double dense, double width) {
        double r = Math.abs(x) / width;
        return x / STEP + (dense == 0 ? 0 : Math.signum(x) * dense * Math.log(r + Math.sqrt(r * r + 1)));
    }

    private static double slope(double x, double dense, double width) {
        return 1 / STEP + (dense == 0 ? 0 : dense / Math.sqrt(x * x + width * width));
    }

    /** Newton's method, safe because ζ is odd and concave above 0. */
    private static double inverse(double target, double start, double dense, double width) {
        if (dense == 0) {
            return target * STEP;
        }
        double goal = Math.abs(target);
        double x = 0;
        for (int step = 0; step < 60; step++) {
            double change = (goal - zeta(x, dense, width)) / slope(x, dense, width);
            x += change;
            if (Math.abs(change) <= 1e-15 * (x + width)) {
                break;
            }
        }
        return Math.signum(target) * x;
    }

    /** Weights to the sum 1: what the grid leaves out lies beyond its upper end when much is missing, and is rounding otherwise. */
    private static FrailtyRule lumped(double[] logs, double[] weights) {
        double sum = Arrays.stream(weights).sum();
        weights[weights.length - 1] += 1 - sum;
        return new FrailtyRule(logs, weights);
    }

    private FrailtyRule joined(FrailtyRule other) {
        int n = logs.length;
        int m = other.logs.length;
        Integer[] order = new Integer[n + m];
        Arrays.setAll(order, k -> k);
        double[] allLogs = Arrays.copyOf(logs, n + m);
        double[] allWeights = Arrays.copyOf(weights, n + m);
        System.arraycopy(other.logs, 0, allLogs, n, m);
        System.arraycopy(other.weights, 0, allWeights, n, m);
        Arrays.sort(order, (a, b) -> Double.compare(allLogs[a], allLogs[b]));
        double[] y = new double[n + m];
        double[] w = new double[n + m];
        for (int k = 0; k < n + m; k++) {
            y[k] = allLogs[order[k]];
            w[k] = allWeights[order[k]];
        }
        return new FrailtyRule(y, w);
    }

    private FrailtyRule within(double low, double high) {
        double[] y = logs.clone();
        double[] w = weights.clone();
        int n = 0;
        double above = 1;
        for (int k = 0; k < y.length; k++) {
            if (w[k] > 1e-17 && y[k] <= high + STEP) {
                y[n] = Math.max(y[k], low);
                w[n] = w[k];
                above -= w[k];
                n++;
            }
        }
        w[n - 1] += above;
        return new FrailtyRule(Arrays.copyOf(y, n), Arrays.copyOf(w, n));
    }

    /** Nodes above {@code from} gathered in groups of the given width in ln V, each replaced by its three-point Gauss rule in V. */
    private FrailtyRule clustered(double from, double width) {
        double[] y = new double[logs.length];
        double[] w = new double[logs.length];
        int n = 0;
        for (int k = 0; k < logs.length;) {
            int end = k + 1;
            while (end < logs.length && logs[k] > from && logs[end] < logs[k] + width) {
                end++;
            }
            if (end - k > 3 && weights[k] > 1e-300) {
                double[][] gauss = GaussCluster.threePoints(logs, weights, k, end);
                for (int j = 0; j < 3; j++) {
                    y[n] = gauss[0][j];
                    w[n++] = gauss[1][j];
                }
            } else {
                for (int j = k; j < end; j++) {
                    y[n] = logs[j];
                    w[n++] = weights[j];
                }
            }
            k = end;
        }
        return new FrailtyRule(Arrays.copyOf(y, n), Arrays.copyOf(w, n));
    }
}
