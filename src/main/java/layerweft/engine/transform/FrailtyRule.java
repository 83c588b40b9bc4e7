package layerweft.engine.transform;

import java.util.Arrays;
import layerweft.model.copula.ArchimedeanFamily;
import org.apache.commons.numbers.gamma.LogGamma;

/**
 * A quadrature rule for means over the frailty V of an Archimedean copula: E[f(ln V)] ≈ Σ w_k f(y_k), meant for functions made of
 * exp(−V a). In y = ln V these are translates of exp(−e^y), analytic in a strip of half-width π/2, and so the trapezoidal rule with step
 * δ is good to about e^(−π²/δ), whatever the family and however wide the law of V (Trefethen &amp; Weideman 2014, "The exponentially
 * convergent trapezoidal rule"). Where the law itself is narrow the step shrinks with it. What lies beyond the interval on which the
 * functions change is gathered at its ends.
 *
 * @param logs y_k, rising
 * @param weights w_k, sum 1
 */
record FrailtyRule(double[] logs, double[] weights) {
    /** The step for an error of 1e-9, for which grids of narrow laws are tuned. */
    private static final double USUAL_STEP = 0.4525;

    /**
     * @param low nothing changes below: ln V there counts as {@code low}
     * @param high nothing changes above
     * @param error wanted of the mean of a function of height 1
     */
    static FrailtyRule of(ArchimedeanFamily family, double theta, double low, double high, double error) {
        double step = Math.PI * Math.PI / Math.log(3 / error);
        double denser = USUAL_STEP / step;
        return switch (family) {
            case CLAYTON -> clayton(1 / theta, low, high, step, denser);
            case GUMBEL -> gumbel(1 / theta, low, high, step, denser);
            case FRANK -> IntegerFrailty.logSeries(theta).rule(low, high, step, denser);
            case JOE -> IntegerFrailty.sibuya(1 / theta).rule(low, high, step, denser);
        };
    }

    /** V is gamma with shape k: the density of ln V is e^(ky − e^y)/Γ(k). A wide law reaches far down. */
    private static FrailtyRule clayton(double k, double low, double high, double step, double denser) {
        double constant = LogGamma.value(k);
        double width = 1 / Math.sqrt(k);
        double centre = k > 1 ? Math.log(k) : 0;
        double least = centre - 9 * width - 34 / k;
        double most = centre + Math.min(9 * width, 3.8);
        LogGrid grid = width < 1 ? LogGrid.dense(centre, step, 3 * width, 4.0 * denser) : LogGrid.even(centre, step);
        return grid.rule(y -> Math.exp(k * y - Math.exp(y) - constant), Math.max(least, low - 2), most).gathered(low, high, true);
    }

    /** V is positive stable with index α. A wide law reaches far up. */
    private static FrailtyRule gumbel(double alpha, double low, double high, double step, double denser) {
        StableDensity density = new StableDensity(alpha);
        double width = density.width();
        double least = density.least();
        double most = Math.max(least, Math.min(high + 2, 36 / alpha));
        LogGrid grid = width < 1 ? LogGrid.dense(density.centre(), step, 2.5 * width, 7.5 * denser) : LogGrid.even(density.centre(), step);
        return grid.rule(density::of, least, most).gathered(low, high, false);
    }

    /**
     * Nodes beyond the ends moved to them, and the weight that is missing to 1 put at one end: it belongs to the far side that the grid
     * did not reach.
     */
    FrailtyRule gathered(double low, double high, boolean missingBelow) {
        double[] y = new double[logs.length + 2];
        double[] w = new double[logs.length + 2];
        int n = 1;
        y[0] = low;
        double above = 0;
        double sum = 0;
        for (int k = 0; k < logs.length; k++) {
            sum += weights[k];
            if (logs[k] <= low) {
                w[0] += weights[k];
            } else if (logs[k] >= high) {
                above += weights[k];
            } else if (weights[k] > 1e-17) {
                y[n] = logs[k];
                w[n++] = weights[k];
            }
        }
        y[n] = high;
        w[n] = above;
        w[missingBelow ? 0 : n] += 1 - sum;
        return new FrailtyRule(Arrays.copyOf(y, n + 1), Arrays.copyOf(w, n + 1));
    }

    /** Both sets of nodes in one rising row. */
    FrailtyRule joined(FrailtyRule other) {
        int n = logs.length;
        int m = other.logs.length;
        double[] y = new double[n + m];
        double[] w = new double[n + m];
        for (int i = 0, j = 0, k = 0; k < n + m; k++) {
            boolean own = j == m || i < n && logs[i] <= other.logs[j];
            y[k] = own ? logs[i] : other.logs[j];
            w[k] = own ? weights[i++] : other.weights[j++];
        }
        return new FrailtyRule(y, w);
    }

    /** Nodes above {@code from} gathered in groups of the given width in ln V, each replaced by its three-point Gauss rule in V. */
    FrailtyRule clustered(double from, double width) {
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
