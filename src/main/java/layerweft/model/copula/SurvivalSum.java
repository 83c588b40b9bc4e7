package layerweft.model.copula;

import java.util.Arrays;

/**
 * The survival version of a copula, P(1 − U_i ≤ u_i for all i) = P(U_i ≥ 1 − u_i), by inclusion and exclusion over the subsets of the
 * variables: Σ over S not empty of (−1)^(|S|+1) (1 − C(1 − u_S, 1)). Coordinates at 1 fall away first.
 */
final class SurvivalSum {
    /** 2^20 terms of at most 1: about 1e-13 of error and a tenth of a second. */
    private static final int MOST = 20;

    private SurvivalSum() {
    }

    /** 1 − C at a point whose coordinates p are given with their complements q = 1 − p. */
    @FunctionalInterface
    interface Complement {
        double at(double[] p, double[] q);
    }

    /** @throws UnsupportedOperationException if more than 20 coordinates are below 1 */
    static double cdf(double[] u, Complement complement) {
        int[] open = new int[u.length];
        int n = 0;
        for (int i = 0; i < u.length; i++) {
            if (u[i] == 0) {
                return 0;
            }
            if (u[i] < 1) {
                open[n++] = i;
            }
        }
        if (n > MOST) {
            throw new UnsupportedOperationException("the distribution function of a survival copula is given for at most " + MOST
                    + " coordinates below 1, found " + n);
        }
        if (n == 0) {
            return 1;
        }
        double[] p = new double[u.length];
        double[] q = new double[u.length];
        Arrays.fill(p, 1);
        double sum = subsets(u, open, n, 0, -1, p, q, complement);
        return Math.max(0, Math.min(1, sum));
    }

    private static double subsets(double[] u, int[] open, int n, int k, int sign, double[] p, double[] q, Complement complement) {
        if (k == n) {
            return sign * complement.at(p, q);
        }
        int i = open[k];
        double without = subsets(u, open, n, k + 1, sign, p, q, complement);
        p[i] = 1 - u[i];
        q[i] = u[i];
        double with = subsets(u, open, n, k + 1, -sign, p, q, complement);
        p[i] = 1;
        q[i] = 0;
        return without + with;
    }
}
