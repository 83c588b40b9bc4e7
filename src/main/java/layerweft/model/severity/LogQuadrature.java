package layerweft.model.severity;

import java.util.function.DoubleUnaryOperator;
import org.apache.commons.math3.analysis.integration.gauss.GaussIntegrator;
import org.apache.commons.math3.analysis.integration.gauss.GaussIntegratorFactory;

/** Integrals of survival functions by Gauss–Legendre panels in the logarithm of the amount, from the top down: for laws smooth on that scale. */
final class LogQuadrature {
    private static final int NODES = 20;
    /** Part of an integral below which nothing is left of it. */
    private static final double LEAST = 1e-17;
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
     * ∫_from^to m·x^(m−1)·P(X &gt; x) dx, between the limited moments of order m.
     *
     * @param survival P(X &gt; x)
     * @param m order of the moment, 1 or 2
     * @param from at least 0
     * @param to above {@code from}, finite
     * @param scale length in ln x over which the survival function may change its course
     */
    static double integral(DoubleUnaryOperator survival, int m, double from, double to, double scale) {
        double length = to < 2 * from ? Math.log1p((to - from) / from) : Math.log(to) - Math.log(from);
        double panels = Math.max(1, Math.ceil(length / Math.min(1, scale)));
        double width = from > 0 ? length / panels : Math.min(1, scale);
        double sum = 0;
        for (int p = 1; p <= panels; p++) {
            sum += panel(survival, m, to, (p - 0.5) * width, width);
            // a survival function is at most 1, so what is still to come is at most start^m
            double start = to * Math.exp(-p * width);
            double rest = m == 1 ? start : start * start;
            if (p < panels && !(rest > LEAST * sum)) {
                return sum + (rest - (m == 1 ? from : from * from)) * survival.applyAsDouble(start);
            }
        }
        return sum;
    }

    /** The panel whose middle lies a length in ln x below the end. */
    private static double panel(DoubleUnaryOperator survival, int m, double to, double middle, double width) {
        double sum = 0;
        for (int k = 0; k < NODES; k++) {
            double x = to * Math.exp(-middle + 0.5 * width * POINTS[k]);
            double f = x * survival.applyAsDouble(x);
            sum += WEIGHTS[k] * (m == 1 ? f : 2 * (x * f));
        }
        return 0.5 * width * sum;
    }
}
