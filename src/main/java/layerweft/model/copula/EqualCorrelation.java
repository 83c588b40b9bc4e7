package layerweft.model.copula;

import java.util.Locale;
import java.util.OptionalDouble;
import layerweft.model.Check;

/** The same ρ in every pair, for any number of variables with ρ ≥ −1/(d − 1). */
public record EqualCorrelation(double value) implements Correlation {

    public EqualCorrelation {
        new Check().within("correlation", value, -1, 1).orThrow();
    }

    /** ρ = sin(πτ/2). */
    static EqualCorrelation ofKendallTau(double tau) {
        TauRange.elliptical(2).check(tau);
        return new EqualCorrelation(Math.sin(Math.PI / 2 * tau));
    }

    @Override
    public double rho(int i, int j) {
        return i == j ? 1 : value;
    }

    @Override
    public OptionalDouble common(int dimension) {
        return OptionalDouble.of(value);
    }

    @Override
    public void requireDimension(int dimension) {
        // an ulp of grace: sin(asin x) need not be x
        new Check().that(dimension <= 2 || value >= -1.0 / (dimension - 1) - 1e-15, "kendallTau",
                String.format(Locale.ROOT, "%.6g (correlation %.6g)", 2 / Math.PI * Math.asin(value), value),
                String.format(Locale.ROOT, "%s for %d perils (correlation of at least %.6g)",
                        TauRange.elliptical(dimension), dimension, -1.0 / (dimension - 1))).orThrow();
    }
}
