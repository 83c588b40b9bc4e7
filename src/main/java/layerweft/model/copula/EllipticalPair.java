package layerweft.model.copula;

import java.util.Arrays;

/**
 * The bivariate normal and t distribution function. From ∂/∂ρ of either (Plackett 1954; Genz 2004, "Numerical computation of
 * rectangular bivariate and trivariate normal and t probabilities"), with ρ = sin φ and starting from ρ = −1,
 *
 * <pre>P(X ≤ h, Y ≤ k) = max(F(h) + F(k) − 1, 0) + (1/2π) ∫_{−π/2}^{asin ρ} w((h² − 2hk sin φ + k²)/cos²φ) dφ,</pre>
 *
 * w(x) = e^(−x/2) for the normal, (1 + x/ν)^(−ν/2) for t with any ν &gt; 0. Every term is positive, so small probabilities keep their
 * digits.
 */
final class EllipticalPair {
    private static final double[] SPREADS = {0.2, 2};

    private EllipticalPair() {
    }

    /**
     * @param h,k quantiles, finite
     * @param marginH,marginK their cumulative probabilities
     * @param degreesOfFreedom ν, infinite for the normal
     */
    static double cdf(double h, double k, double marginH, double marginK, double rho, double degreesOfFreedom) {
        double least = Math.max(marginH + marginK - 1, 0);
        double most = Math.min(marginH, marginK);
        if (rho >= 1) {
            return most;
        }
        if (rho <= -1) {
            return least;
        }
        double end = Math.asin(rho);
        // the integrand turns within |h − k| of π/2 and within |h + k| of −π/2
        double[] cuts = new double[2 * SPREADS.length + 1];
        for (int s = 0; s < SPREADS.length; s++) {
            cuts[2 * s] = Math.min(end, Math.PI / 2 - SPREADS[s] * Math.abs(h - k));
            cuts[2 * s + 1] = Math.min(end, SPREADS[s] * Math.abs(h + k) - Math.PI / 2);
        }
        cuts[2 * SPREADS.length] = end;
        Arrays.sort(cuts);
        double sum = 0;
        double from = -Math.PI / 2;
        for (double to : cuts) {
            if (to > from) {
                sum += AdaptiveQuadrature.integrate(phi -> weight(h, k, phi, degreesOfFreedom), from, to, 1e-15, 1e-11);
                from = to;
            }
        }
        return Math.min(most, least + sum / (2 * Math.PI));
    }

    private static double weight(double h, double k, double phi, double degreesOfFreedom) {
        double sine = Math.sin(phi);
        double cosine = Math.cos(phi);
        // h² − 2hk sin φ + k² = (h ∓ k)² ± 2hk(1 ∓ sin φ): the form in which nothing cancels
        double x = sine >= 0 ? square((h - k) / cosine) + 2 * h * k / (1 + sine) : square((h + k) / cosine) - 2 * h * k / (1 - sine);
        return Double.isInfinite(degreesOfFreedom) ? Math.exp(-x / 2)
                : Math.exp(-degreesOfFreedom / 2 * Math.log1p(x / degreesOfFreedom));
    }

    private static double square(double x) {
        return x * x;
    }
}
