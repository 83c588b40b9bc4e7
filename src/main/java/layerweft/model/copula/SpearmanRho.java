package layerweft.model.copula;

/** Spearman's ρ = 12∫∫C(u, v)du dv − 3 by quadrature, for pairs whose two variables may be exchanged. */
final class SpearmanRho {
    private static final double ABSOLUTE = 1e-9;

    private SpearmanRho() {
    }

    /** The triangle v &lt; u, twice: a strong copula has its ridge along the edge, where the quadrature can reach it. */
    static double of(Copula pair) {
        double triangle = AdaptiveQuadrature.integrate(
                u -> AdaptiveQuadrature.integrate(v -> pair.cdf(u, v), 0, u, ABSOLUTE, ABSOLUTE), 0, 1, ABSOLUTE, ABSOLUTE);
        return 24 * triangle - 3;
    }
}
