package layerweft.model.severity;

import java.util.function.DoubleUnaryOperator;
import org.apache.commons.math3.analysis.integration.gauss.GaussIntegrator;
import org.apache.commons.math3.analysis.integration.gauss.GaussIntegratorFactory;

/** Composite Gauss–Legendre quadrature in the logarithm of the amount: for survival functions of power-law kind, smooth on that scale. */
final class LogQuadrature {
    private static final int NODES = 20;
    /** Logarithm of the multiple of the upper end below which nothing is left of an integrand that is bounded at 0. */
    private static final double LN_LEAST = Math.log(1e-18);
    private static final double[] POINTS = new double[NODES];
    private static final double[] WEIGHTS = new double[NODES];

    static {
        GaussIntegrator rule = new GaussIntegratorFactory().legendre(NODES);
        for (int k = 0; k < NODES; k++) {
            POINTS[k] = rule.getPoint(k);
            WEIGHTS[k] = rule.getWeight(k);
        }
    }

    private LogQuadrature() {}

    /**
     * ∫_from^to f(x) dx for f bounded at 0.
     *
     * @param from at least 0
     * @param to above {@code from}, finite
     * @param scale length in ln x over which f may change its course
     */
    static double integral(DoubleUnaryOperator f, double from, double to, double scale) {
        double high = Math.log(to);
        double low = Math.max(Math.log(from), high + LN_LEAST);
        int panels = (int) Math.max(1, Math.ceil((high - low) / Math.min(1, scale)));
        double width = (high - low) / panels;
        double sum = 0;
        for (int p = 0; p < panels; p++) {
            double middle = low + (p + 0.5) * width;
            for (int k = 0; k < NODES; k++) {
                double x = Math.min(to, Math.exp(middle + 0.5 * width * POINTS[k]));
                sum += WEIGHTS[k] * x * f.applyAsDouble(x);
            }
        }
        double start = Math.exp(low);
        return 0.5 * width * sum + (start > from ? (start - from) * f.applyAsDouble(start) : 0);
    }
}
