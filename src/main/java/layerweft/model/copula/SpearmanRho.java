package layerweft.model.copula;

/** Spearman's ρ = 12∫∫C(u, v)du dv − 3. */
final class SpearmanRho {
    private static final double INNER = 1e-10;
    private static final double OUTER = 3e-9;

    private SpearmanRho() {
    }

    /**
     * Frank: ρ = 1 − 12(D₁(θ) − D₂(θ))/θ with Debye's functions D_k(θ) = (k/θ^k)∫₀^θ t^k/(e^t − 1)dt (Nelsen 1986, "Properties of a
     * one-parameter family of bivariate distributions with specified marginals"); odd in θ.
     */
    static double frank(double theta) {
        double size = Math.abs(theta);
        if (size < 1e-4) {
            return theta / 6;
        }
        double difference = AdaptiveQuadrature.integrate(t -> (1 - 2 * t / size) * t / Math.expm1(t), 0, size, 1e-15, 1e-14);
        return Math.signum(theta) * (1 - 12 * difference / (size * size));
    }

    /**
     * Gumbel, as any extreme-value copula: ρ = 12∫₀¹ (1 + A(t))^−2 dt − 3 with Pickands' function A(t) = (t^θ + (1−t)^θ)^(1/θ)
     * (Hürlimann 2003, "Hutchinson-Lai's conjecture for bivariate extreme value copulas").
     */
    static double gumbel(double theta) {
        // symmetric about 1/2, where a strong copula has its kink
        double half = AdaptiveQuadrature.integrate(t -> {
            double a = Math.exp(LogScale.logAdd(theta * Math.log(t), theta * Math.log1p(-t)) / theta);
            return 1 / ((1 + a) * (1 + a));
        }, 0, 0.5, 1e-14, 1e-13);
        return 24 * half - 3;
    }

    /**
     * Any pair whose two variables may be exchanged, by quadrature. The triangle v &lt; u, twice: a strong copula has its ridge along the
     * edge, where the quadrature can reach it.
     */
    static double of(Copula pair) {
        double triangle = AdaptiveQuadrature.integrate(
                u -> AdaptiveQuadrature.integrate(v -> pair.cdf(u, v), 0, u, INNER, INNER), 0, 1, OUTER, OUTER);
        return 24 * triangle - 3;
    }
}
