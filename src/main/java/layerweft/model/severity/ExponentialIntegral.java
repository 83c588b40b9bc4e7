package layerweft.model.severity;

/** The integral that all power-law and exponential tails share. */
final class ExponentialIntegral {

    private ExponentialIntegral() {}

    /**
     * ∫_0^y e^(−k·u) du = (1 − e^(−k·y))/k, y at k = 0; for y ≥ 0, y possibly infinite, k of either sign. Infinite where the integral is.
     */
    static double of(double k, double y) {
        if (y == Double.POSITIVE_INFINITY) {
            return k > 0 ? 1 / k : Double.POSITIVE_INFINITY;
        }
        return k == 0 ? y : -Math.expm1(-k * y) / k;
    }

    /** ∫_0^y u·e^(−k·u) du = (1 − e^(−k·y)·(1 + k·y))/k², for k above 0. */
    static double first(double k, double y) {
        if (y == Double.POSITIVE_INFINITY) {
            return 1 / (k * k);
        }
        double t = k * y;
        if (t < 0.1) {
            // the closed form loses digits here: Σ_{m≥2} (−1)^m·(m−1)·t^m/m!, over k²
            double term = t * t / 2;
            double sum = 0;
            for (int m = 2; m < 14; m++) {
                sum += (m - 1) * term * (m % 2 == 0 ? 1 : -1);
                term *= t / (m + 1);
            }
            return sum / (k * k);
        }
        return (-Math.expm1(-t) - t * Math.exp(-t)) / (k * k);
    }
}
