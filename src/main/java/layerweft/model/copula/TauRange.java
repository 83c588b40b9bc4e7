package layerweft.model.copula;

import java.util.Locale;
import layerweft.model.Check;

/**
 * The values of Kendall's τ that a family can have for some number of variables.
 *
 * @param low the smallest or, if {@code lowOpen}, the bound below all
 * @param high the largest or, if {@code highOpen}, the bound above all
 */
public record TauRange(double low, boolean lowOpen, double high, boolean highOpen) {

    static TauRange of(ArchimedeanFamily family, int dimension) {
        double least = family.leastTheta(dimension);
        boolean open = least == Double.NEGATIVE_INFINITY;
        return new TauRange(least < family.independentTheta() ? -1 : 0, open, 1, true);
    }

    /** Elliptical families in every pair alike: ρ ≥ −1/(d − 1). */
    static TauRange elliptical(int dimension) {
        return new TauRange(dimension <= 2 ? -1 : 2 / Math.PI * Math.asin(-1.0 / (dimension - 1)), false, 1, false);
    }

    public boolean contains(double tau) {
        return (lowOpen ? tau > low : tau >= low) && (highOpen ? tau < high : tau <= high);
    }

    void check(double tau) {
        new Check().that(contains(tau), "kendallTau", tau, toString()).orThrow();
    }

    /** In words, e.g. {@code from 0 up to below 1}. */
    @Override
    public String toString() {
        return (lowOpen ? "above " : "from ") + show(low) + (highOpen ? " up to below " : " to ") + show(high);
    }

    private static String show(double value) {
        return value == Math.rint(value) ? String.format(Locale.ROOT, "%.0f", value) : String.format(Locale.ROOT, "%.6g", value);
    }
}
