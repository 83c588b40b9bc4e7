package layerweft.engine.transform;

import java.util.Arrays;

/**
 * The count of those events that pass an independent trial of chance p each (binomial thinning): P(M &gt; m) = Σ_n P(N &gt; n)·P(event n + 1
 * passes, m of the first n passed), a sum of terms above 0, so that the rarest keep their digits.
 *
 * @param factors m × n: C(n, m) p^(m+1) (1 − p)^(n−m)
 */
record Thinning(double[][] factors) {

    /** @param size thresholds of N, and at most so many of M */
    static Thinning of(double chance, int size) {
        double[][] factors = new double[size][size];
        for (int n = 0; n < size; n++) {
            // Pascal's rule: m of n passed
            for (int m = n; m >= 0; m--) {
                double stayed = n > 0 && m < n ? (1 - chance) * factors[m][n - 1] : 0;
                double passed = n > 0 && m > 0 ? chance * factors[m - 1][n - 1] : 0;
                factors[m][n] = n == 0 ? chance : stayed + passed;
            }
        }
        return new Thinning(factors);
    }

    /** The first thresholds of this thinning. */
    Thinning first(int thresholds) {
        return new Thinning(Arrays.copyOf(factors, thresholds));
    }

    double[] of(double[] survival) {
        double[] thinned = new double[factors.length];
        for (int m = 0; m < thinned.length; m++) {
            double[] row = factors[m];
            double sum = 0;
            for (int n = m; n < survival.length; n++) {
                sum += row[n] * survival[n];
            }
            thinned[m] = sum;
        }
        return thinned;
    }

    /** The thinned laws of all nodes, as far as any of them has a chance above rounding. */
    double[][] ofAll(double[][] survival) {
        double[][] thinned = new double[survival.length][];
        int kept = 1;
        for (int k = 0; k < survival.length; k++) {
            thinned[k] = of(survival[k]);
            while (kept < thinned[k].length && thinned[k][kept] > 1e-15 * thinned[k][0]) {
                kept++;
            }
        }
        for (int k = 0; k < thinned.length; k++) {
            thinned[k] = Arrays.copyOf(thinned[k], kept);
        }
        return thinned;
    }
}
