package layerweft.model.copula;

import org.apache.commons.statistics.distribution.NormalDistribution;

/** The standard normal law with both tails exact. */
final class NormalScale {
    private static final NormalDistribution NORMAL = NormalDistribution.of(0, 1);

    private NormalScale() {
    }

    /** Φ(z). */
    static double cdf(double z) {
        return NORMAL.cumulativeProbability(z);
    }

    /** 1 − Φ(z). */
    static double survival(double z) {
        return NORMAL.survivalProbability(z);
    }

    /** Φ⁻¹(p), with q = 1 − p given apart. */
    static double quantile(double p, double q) {
        return p < q ? NORMAL.inverseCumulativeProbability(p) : NORMAL.inverseSurvivalProbability(q);
    }
}
