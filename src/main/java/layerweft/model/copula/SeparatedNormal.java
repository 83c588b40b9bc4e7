package layerweft.model.copula;

import java.util.function.DoubleUnaryOperator;

/**
 * Multivariate normal probabilities by separation of variables (Genz 1992, "Numerical computation of multivariate normal
 * probabilities"): with R = LLᵀ the integral becomes one over the unit cube, taken here on a Kronecker lattice (multiples of square
 * roots of primes, Richtmyer 1951) with the tent transformation. Deterministic; good to about 1e-5 for moderate dimensions.
 */
final class SeparatedNormal implements NormalProbability {
    private static final int POINTS = 1 << 15;

    private final double[][] lower;
    private final double[] steps;

    SeparatedNormal(double[][] correlation) {
        this.lower = CholeskyFactor.of(correlation);
        this.steps = squareRootsOfPrimes(correlation.length);
    }

    @Override
    public double at(double[] x) {
        return mean(x, null);
    }

    /** The mean over the lattice of P(Z ≤ x·scale(u)), u the lattice's own last coordinate; no scaling where scale is null. */
    double mean(double[] x, DoubleUnaryOperator scale) {
        double sum = 0;
        double[] y = new double[x.length];
        for (int n = 0; n < POINTS; n++) {
            double factor = scale == null ? 1 : scale.applyAsDouble((n + 0.5) / POINTS);
            sum += product(x, factor, n, y);
        }
        return sum / POINTS;
    }

    private double product(double[] x, double factor, int n, double[] y) {
        double product = 1;
        for (int i = 0; i < x.length; i++) {
            double bound = x[i] * factor;
            for (int k = 0; k < i; k++) {
                bound -= lower[i][k] * y[k];
            }
            double own = lower[i][i];
            double chance = own > 0 ? NormalScale.cdf(bound / own) : bound >= 0 ? 1 : 0;
            product *= chance;
            if (product == 0) {
                return 0;
            }
            double u = chance * tent(n, i);
            y[i] = NormalScale.quantile(u, 1 - u);
        }
        return product;
    }

    /** |2{(n + 1/2)·√prime} − 1|, kept off both ends. */
    private double tent(int n, int i) {
        double part = (n + 0.5) * steps[i];
        part -= Math.floor(part);
        return Math.max(1e-16, Math.min(1 - 1e-16, Math.abs(2 * part - 1)));
    }

    private static double[] squareRootsOfPrimes(int count) {
        double[] roots = new double[count];
        int found = 0;
        for (int n = 2; found < count; n++) {
            boolean prime = true;
            for (int k = 2; k * k <= n && prime; k++) {
                prime = n % k != 0;
            }
            if (prime) {
                roots[found++] = Math.sqrt(n);
            }
        }
        return roots;
    }
}
