package layerweft.model.copula;

import java.util.Optional;
import java.util.function.DoubleBinaryOperator;
import org.apache.commons.numbers.gamma.LogGamma;

/** Densities of the normal and the t copula: the bivariate density over the product of its margins (Joe 2014, sections 4.3.1 and 4.13). */
final class EllipticalDensity {

    private EllipticalDensity() {
    }

    /** @param degreesOfFreedom ν, infinite for the normal */
    static Optional<DoubleBinaryOperator> of(double rho, double degreesOfFreedom) {
        if (Math.abs(rho) >= 1) {
            return Optional.empty();
        }
        return Optional.of(Double.isInfinite(degreesOfFreedom) ? normal(rho) : student(rho, degreesOfFreedom));
    }

    /** (1 − ρ²)^(−1/2) exp(−(ρ²(x² + y²) − 2ρxy)/(2(1 − ρ²))), x and y the normal quantiles. */
    private static DoubleBinaryOperator normal(double rho) {
        double rest = 1 - rho * rho;
        double scale = 1 / Math.sqrt(rest);
        return (u, v) -> {
            double x = NormalScale.quantile(u, 1 - u);
            double y = NormalScale.quantile(v, 1 - v);
            return scale * Math.exp(-(rho * rho * (x * x + y * y) - 2 * rho * x * y) / (2 * rest));
        };
    }

    /** Γ((ν+2)/2)Γ(ν/2)/Γ((ν+1)/2)² (1 − ρ²)^(−1/2) (1 + q/ν)^(−(ν+2)/2) ((1 + x²/ν)(1 + y²/ν))^((ν+1)/2), q = (x² − 2ρxy + y²)/(1 − ρ²). */
    private static DoubleBinaryOperator student(double rho, double nu) {
        double rest = 1 - rho * rho;
        double logScale = LogGamma.value((nu + 2) / 2) + LogGamma.value(nu / 2) - 2 * LogGamma.value((nu + 1) / 2) - Math.log(rest) / 2;
        StudentScale law = new StudentScale(nu);
        return (u, v) -> {
            double x = law.quantile(u, 1 - u);
            double y = law.quantile(v, 1 - v);
            double q = (x * x - 2 * rho * x * y + y * y) / rest;
            return Math.exp(logScale - (nu + 2) / 2 * Math.log1p(q / nu) + (nu + 1) / 2 * (Math.log1p(x * x / nu) + Math.log1p(y * y / nu)));
        };
    }
}
