package layerweft.model.copula;

import java.util.Optional;
import java.util.function.DoubleBinaryOperator;

/** Densities of the Archimedean pairs (Joe 2014, sections 4.5 to 4.8; Nelsen 2006, section 4.2), by logarithms where powers would leave the range of a double. */
final class ArchimedeanDensity {

    private ArchimedeanDensity() {
    }

    static Optional<DoubleBinaryOperator> of(Archimedean pair) {
        double theta = pair.theta();
        if (theta == pair.family().independentTheta()) {
            return Optional.of((u, v) -> 1);
        }
        if (pair.family() == ArchimedeanFamily.CLAYTON && theta == -1) {
            return Optional.empty();
        }
        DoubleBinaryOperator density = switch (pair.family()) {
            case CLAYTON -> (u, v) -> clayton(theta, u, v);
            case GUMBEL -> (u, v) -> gumbel(theta, u, v);
            case FRANK -> (u, v) -> frank(theta, u, v);
            case JOE -> (u, v) -> joe(theta, 1 - u, 1 - v);
        };
        return Optional.of(pair.survival() ? (u, v) -> density.applyAsDouble(1 - u, 1 - v) : density);
    }

    /** (1 + θ)(uv)^(−1−θ) (u^−θ + v^−θ − 1)^(−2−1/θ); 0 where the bracket is not positive, at θ below 0. */
    private static double clayton(double theta, double u, double v) {
        double a = -theta * Math.log(u);
        double b = -theta * Math.log(v);
        double high = Math.max(a, b);
        double bracket = Math.exp(a - high) + Math.exp(b - high) - Math.exp(-high);
        if (!(bracket > 0)) {
            return 0;
        }
        return (1 + theta) * Math.exp((1 + theta) / theta * (a + b) - (2 + 1 / theta) * (high + Math.log(bracket)));
    }

    /** e^−t (xy)^(θ−1) s^(1/θ−2) (t + θ − 1)/(uv), x = −ln u, y = −ln v, s = x^θ + y^θ, t = s^(1/θ). */
    private static double gumbel(double theta, double u, double v) {
        double x = -Math.log(u);
        double y = -Math.log(v);
        double lnS = LogScale.logAdd(theta * Math.log(x), theta * Math.log(y));
        double t = Math.exp(lnS / theta);
        return (t + theta - 1) * Math.exp(x + y - t + (theta - 1) * Math.log(x * y) + (1 / theta - 2) * lnS);
    }

    /** θ(1 − e^−θ)e^(−θ(u+v)) / (1 − e^−θ − (1 − e^−θu)(1 − e^−θv))²; Frank at −θ is the law of (U, 1 − V) at θ. */
    private static double frank(double theta, double u, double v) {
        if (theta < 0) {
            return frank(-theta, u, 1 - v);
        }
        // e^−θu + e^−θv − e^−θ(u+v) − e^−θ, taken out e^−θm with m the smaller
        double m = Math.min(u, v);
        double other = u + v - m;
        double bracket = 1 - Math.exp(-theta * other) + Math.exp(-theta * (other - m)) * -Math.expm1(-theta * (1 - other));
        return -theta * Math.expm1(-theta) * Math.exp(-theta * (other - m)) / (bracket * bracket);
    }

    /** (pq)^(θ−1) w^(1/θ−2) (θ − 1 + w), w = p^θ + q^θ − p^θ q^θ, p = 1 − u, q = 1 − v. */
    private static double joe(double theta, double p, double q) {
        double a = theta * Math.log(p);
        double b = theta * Math.log(q);
        double high = Math.max(a, b);
        double lnW = high + Math.log1p(Math.exp(Math.min(a, b) - high) - Math.exp(Math.min(a, b)));
        return (theta - 1 + Math.exp(lnW)) * Math.exp((theta - 1) * Math.log(p * q) + (1 / theta - 2) * lnW);
    }
}
