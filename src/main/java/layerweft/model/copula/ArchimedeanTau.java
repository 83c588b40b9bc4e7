package layerweft.model.copula;

import java.util.function.DoubleUnaryOperator;
import org.apache.commons.math3.analysis.solvers.BrentSolver;
import org.apache.commons.numbers.gamma.Digamma;
import org.apache.commons.numbers.gamma.Trigamma;

/** Kendall's τ of the Frank and Joe families, and the strength θ that has a given τ. */
final class ArchimedeanTau {

    private ArchimedeanTau() {
    }

    /**
     * Frank: τ = 1 − 4(1 − D₁(θ))/θ with Debye's function D₁(θ) = (1/θ)∫₀^θ t/(e^t − 1)dt (Nelsen 2006, section 5.1), in the equal
     * form (4/θ²)∫₀^θ ((t/2)coth(t/2) − 1)dt, which does not cancel at small θ. Odd in θ.
     */
    static double frank(double theta) {
        double size = Math.abs(theta);
        if (size < 1e-4) {
            return theta / 9;
        }
        double integral = AdaptiveQuadrature.integrate(ArchimedeanTau::halfCothExcess, 0, size, 0, 1e-14);
        return Math.signum(theta) * 4 * integral / (size * size);
    }

    /** (t/2)coth(t/2) − 1. */
    private static double halfCothExcess(double t) {
        if (t < 0.2) {
            double s = t * t;
            return s * (1.0 / 12 - s * (1.0 / 720 - s * (1.0 / 30240 - s * (1.0 / 1209600 - s / 47900160))));
        }
        return t / 2 / Math.tanh(t / 2) - 1;
    }

    static double frankTheta(double tau) {
        return Math.signum(tau) * inverse(ArchimedeanTau::frank, 0, Math.abs(tau));
    }

    /**
     * Joe: τ = 1 − (2/θ)·(Ψ(2) − Ψ(x))/(2 − x), x = 2/θ + 1, Ψ the digamma function; where x is next to 2 the quotient is the
     * trigamma function in between.
     */
    static double joe(double theta) {
        double x = 2 / theta + 1;
        double gap = (theta - 2) / theta;
        double quotient = Math.abs(gap) < 1e-5 ? Trigamma.value(2 - gap / 2) : (Digamma.value(2) - Digamma.value(x)) / gap;
        return 1 - 2 / theta * quotient;
    }

    static double joeTheta(double tau) {
        return inverse(ArchimedeanTau::joe, 1, tau);
    }

    /** Solves tau(θ) = target, for tau rising from 0 at θ = least towards 1. */
    private static double inverse(DoubleUnaryOperator tau, double least, double target) {
        if (target == 0) {
            return least;
        }
        double high = least + 1;
        while (tau.applyAsDouble(high) < target) {
            high = least + 2 * (high - least);
        }
        double low = high - least <= 1 ? least : least + (high - least) / 2;
        return new BrentSolver(1e-15, 1e-15, 1e-16).solve(200, t -> tau.applyAsDouble(t) - target, low, high);
    }
}
