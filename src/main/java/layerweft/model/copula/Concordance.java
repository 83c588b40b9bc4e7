package layerweft.model.copula;

/**
 * The concordance function Q(C, D) = 4∫∫C dD − 1 of two pair copulas (Kruskal 1958; Nelsen 2006, section 5.1.1); Q(C, C) is Kendall's τ.
 * Symmetric, and linear in each. Exact to 1e-9 against a Fréchet bound, to 1e-7 against independence; otherwise good to about 5e-4.
 */
final class Concordance {
    private static final int CELLS = 48;

    private Concordance() {
    }

    static double of(Copula first, Copula second) {
        if (first.equals(second)) {
            return first.kendallTau(0, 1);
        }
        if (first instanceof MixtureCopula mixture) {
            return mixture.mean(component -> of(component, second));
        }
        if (second instanceof MixtureCopula) {
            return of(second, first);
        }
        if (first instanceof Independence) {
            return second.spearmanRho(0, 1) / 3;
        }
        if (first instanceof Comonotonic) {
            return 4 * AdaptiveQuadrature.integrate(u -> second.cdf(u, u), 0, 1, 1e-10, 1e-10) - 1;
        }
        if (first instanceof Countermonotonic) {
            return 4 * AdaptiveQuadrature.integrate(u -> second.cdf(u, 1 - u), 0, 1, 1e-10, 1e-10) - 1;
        }
        if (second instanceof Independence || second instanceof Comonotonic || second instanceof Countermonotonic) {
            return of(second, first);
        }
        return (4 * onLattice(first, second, 2 * CELLS) - onLattice(first, second, CELLS)) / 3;
    }

    /** The trapezoidal value on a lattice of cells × cells, with an error in the square of the step. */
    private static double onLattice(Copula first, Copula second, int cells) {
        double sum = 0;
        double[] c = new double[cells + 1];
        double[] d = new double[cells + 1];
        for (int i = 1; i <= cells; i++) {
            double leftC = 0;
            double leftD = 0;
            double leftOldC = 0;
            double leftOldD = 0;
            for (int j = 1; j <= cells; j++) {
                double oldC = c[j];
                double oldD = d[j];
                c[j] = first.cdf((double) i / cells, (double) j / cells);
                d[j] = second.cdf((double) i / cells, (double) j / cells);
                sum += (c[j] + oldC + leftC + leftOldC) / 4 * (d[j] - oldD - leftD + leftOldD);
                leftC = c[j];
                leftD = d[j];
                leftOldC = oldC;
                leftOldD = oldD;
            }
        }
        return 4 * sum - 1;
    }
}
