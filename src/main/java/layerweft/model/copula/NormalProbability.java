package layerweft.model.copula;

import java.util.OptionalDouble;
import java.util.function.DoubleUnaryOperator;

/** P(Z_1 ≤ x_1, …, Z_d ≤ x_d) of correlated standard normals, by the best method for the correlation at hand. */
@FunctionalInterface
interface NormalProbability {
    double at(double[] x);

    /**
     * One variable or two: {@link EllipticalPair}; one common factor, or three variables: a quadrature over one of them, good to 1e-12;
     * otherwise {@link SeparatedNormal}, good to about 1e-5.
     */
    static NormalProbability of(double[][] correlation, OptionalDouble common) {
        return switch (correlation.length) {
            case 0 -> x -> 1;
            case 1 -> x -> NormalScale.cdf(x[0]);
            case 2 -> x -> pair(x[0], x[1], correlation[0][1]);
            default -> {
                if (common.isPresent() && common.getAsDouble() >= 0) {
                    double rho = common.getAsDouble();
                    yield x -> oneFactor(x, rho);
                }
                yield correlation.length == 3 ? x -> ThreeNormals.cdf(x, correlation) : new SeparatedNormal(correlation);
            }
        };
    }

    static double pair(double h, double k, double rho) {
        return EllipticalPair.cdf(h, k, NormalScale.cdf(h), NormalScale.cdf(k), rho, Double.POSITIVE_INFINITY);
    }

    /** ∫ φ(m) Π Φ((x_i − √ρ m)/√(1−ρ)) dm. */
    private static double oneFactor(double[] x, double rho) {
        if (rho == 1) {
            double least = Double.POSITIVE_INFINITY;
            for (double xi : x) {
                least = Math.min(least, xi);
            }
            return NormalScale.cdf(least);
        }
        double loading = Math.sqrt(rho);
        double own = Math.sqrt(1 - rho);
        return overNormal(m -> {
            double product = 1;
            for (double xi : x) {
                product *= NormalScale.cdf((xi - loading * m) / own);
            }
            return product;
        }, Double.POSITIVE_INFINITY);
    }

    /** ∫_{−∞}^{end} φ(m) f(m) dm, in steps short enough that no feature is missed. */
    static double overNormal(DoubleUnaryOperator f, double end) {
        double reach = 10;
        double width = 2;
        double sum = 0;
        for (double from = -reach; from < Math.min(end, reach); from += width) {
            sum += AdaptiveQuadrature.integrate(m -> Math.exp(-m * m / 2) * f.applyAsDouble(m), from,
                    Math.min(from + width, Math.min(end, reach)), 1e-13, 1e-10);
        }
        return sum / Math.sqrt(2 * Math.PI);
    }
}
