package layerweft.engine.transform;

import layerweft.model.copula.Generator;
import org.apache.commons.math3.linear.Array2DRowRealMatrix;
import org.apache.commons.math3.linear.QRDecomposition;
import org.apache.commons.math3.linear.RealMatrix;

/**
 * The law of a group's frailty V given the frailty v around it, on one set of nodes for all v: weights, of either sign, for which
 * Σ_m w_m exp(−V_m t) is ψ(t | v) = exp(−v ψ_outer⁻¹(ψ_inner(t))) for all t that matter, by least squares with a small penalty on the weights.
 * Only means of exp(−V t) are ever taken, so that no density of V is needed. In ln V these functions are translates of exp(−e^y), analytic
 * in a strip of half-width π/2, which even steps represent to e^(−π²/(2·step)) (sampling series, Stenger 1993).
 *
 * @param logs ln V_m, even
 * @param weights outer node × m
 * @param error largest residual, also between the points of the fit
 */
record FrailtyFit(double[] logs, double[][] weights, double error) {
    private static final double USUAL_STEP = 0.25;
    /** Where the usual step is not enough: inner laws of one integer. */
    private static final double FINE_STEP = 0.18;
    /** The fit goes on so far beyond the ends, where nothing else holds it between its points. */
    private static final double BEYOND = 1;
    private static final double PENALTY = 3e-12;
    /** What counts as 0 where the functions are flat. */
    private static final double NOTHING = 1e-10;
    private static final double FLAT_BELOW = Math.log(NOTHING);
    private static final double FLAT_ABOVE = Math.log(-Math.log(NOTHING));

    /**
     * @param inverses ln ψ_inner⁻¹ of the probabilities of the counts' thresholds, by peril
     * @param outerLogs ln v of the nodes around
     * @param masses of these nodes, for the error
     * @param wanted error
     */
    static FrailtyFit of(Generator outer, Generator inner, double[][] inverses, double[] outerLogs, double[] masses, double wanted) {
        double least = Double.POSITIVE_INFINITY;
        double most = Double.NEGATIVE_INFINITY;
        for (double[] logs : inverses) {
            for (double a : logs) {
                if (!Double.isInfinite(a)) {
                    least = Math.min(least, a);
                    most = Math.max(most, a);
                }
            }
        }
        if (least > most) {
            return new FrailtyFit(new double[] {0}, ones(outerLogs.length), 0);
        }
        most += Math.log(inverses.length);
        FrailtyFit usual = of(outer, inner, least, most, outerLogs, masses, USUAL_STEP);
        return usual.error <= wanted ? usual : of(outer, inner, least, most, outerLogs, masses, FINE_STEP);
    }

    private static FrailtyFit of(Generator outer, Generator inner, double least, double most, double[] outerLogs, double[] masses, double step) {
        double from = least - BEYOND;
        double to = most + BEYOND;
        int columns = (int) Math.ceil((to - from + FLAT_ABOVE - FLAT_BELOW) / step) + 1;
        int rows = (int) Math.ceil(2 * (to - from) / step) + 2;
        double[] logs = new double[columns];
        for (int m = 0; m < columns; m++) {
            logs[m] = FLAT_BELOW - to + m * step;
        }
        double[][] a = new double[rows + columns][columns];
        double[][] b = new double[rows + columns][outerLogs.length];
        for (int r = 0; r < rows; r++) {
            double lnT = r == 0 ? Double.NEGATIVE_INFINITY : from + (r - 1) * step / 2;
            for (int m = 0; m < columns; m++) {
                a[r][m] = Math.exp(-Math.exp(lnT + logs[m]));
            }
            for (int k = 0; k < outerLogs.length; k++) {
                b[r][k] = given(outer, inner, lnT, outerLogs[k]);
            }
        }
        for (int m = 0; m < columns; m++) {
            a[rows + m][m] = PENALTY;
        }
        RealMatrix solved = new QRDecomposition(new Array2DRowRealMatrix(a, false)).getSolver().solve(new Array2DRowRealMatrix(b, false));
        double[][] weights = solved.transpose().getData();
        return new FrailtyFit(logs, weights, residual(outer, inner, least, most, outerLogs, masses, logs, weights, 0.19 * step));
    }

    private static double[][] ones(int nodes) {
        double[][] weights = new double[nodes][1];
        for (double[] row : weights) {
            row[0] = 1;
        }
        return weights;
    }

    /** ψ(t | v). */
    private static double given(Generator outer, Generator inner, double lnT, double lnV) {
        return lnT == Double.NEGATIVE_INFINITY ? 1 : Math.exp(-Math.exp(lnV + outer.logInverse(inner.psiOfLog(lnT), inner.complementOfLog(lnT))));
    }

    /** Σ over the outer nodes of their mass times their largest residual. */
    private static double residual(Generator outer, Generator inner, double least, double most, double[] outerLogs, double[] masses,
            double[] logs, double[][] weights, double step) {
        double[] worst = new double[outerLogs.length];
        double[] e = new double[logs.length];
        for (double lnT = least; lnT <= most; lnT += step) {
            for (int m = 0; m < e.length; m++) {
                e[m] = Math.exp(-Math.exp(lnT + logs[m]));
            }
            double inverse = outer.logInverse(inner.psiOfLog(lnT), inner.complementOfLog(lnT));
            for (int k = 0; k < outerLogs.length; k++) {
                double sum = -Math.exp(-Math.exp(outerLogs[k] + inverse));
                for (int m = 0; m < e.length; m++) {
                    sum += weights[k][m] * e[m];
                }
                worst[k] = Math.max(worst[k], Math.abs(sum));
            }
        }
        double total = 0;
        for (int k = 0; k < worst.length; k++) {
            total += masses[k] * worst[k];
        }
        return total;
    }

    /** Masses of the inner nodes, signs left off. */
    double[] masses(double[] outer) {
        double[] masses = new double[logs.length];
        for (int k = 0; k < outer.length; k++) {
            for (int m = 0; m < masses.length; m++) {
                masses[m] += outer[k] * Math.abs(weights[k][m]);
            }
        }
        return masses;
    }
}
