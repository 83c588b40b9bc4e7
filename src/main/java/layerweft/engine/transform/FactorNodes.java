package layerweft.engine.transform;

import java.util.Arrays;
import layerweft.model.copula.Correlation;
import org.apache.commons.numbers.gamma.Erfc;
import org.apache.commons.numbers.gamma.LogGamma;
import org.apache.commons.statistics.distribution.ContinuousDistribution;
import org.apache.commons.statistics.distribution.NormalDistribution;
import org.apache.commons.statistics.distribution.TDistribution;

/**
 * Nodes over the latent factor of a normal or t copula. With X_i = λ_i Z + √(1 − λ_i²) ε_i and, for t, T_i = X_i/√W, W = χ²_ν/ν,
 * P(N_i &gt; n | z, w) = Φ((λ_i z − c_n √w)/√(1 − λ_i²)), c_n the normal or t quantile of F_i(n). Any two perils have such a factor, with
 * loadings of either sign, and so have equal correlations of at least 0. The trapezoidal rule over z (and ln w) converges
 * exponentially.
 */
final class FactorNodes {
    private FactorNodes() {
    }

    /** Loadings λ with λ_i λ_j = ρ_ij for i ≠ j, or null where the matrix has no single factor. */
    static double[] loadings(Correlation correlation, int[] perils) {
        int d = perils.length;
        double[] loadings = new double[d];
        if (d == 2) {
            double rho = correlation.rho(perils[0], perils[1]);
            loadings[0] = Math.sqrt(Math.abs(rho));
            loadings[1] = Math.signum(rho) * loadings[0];
            return loadings;
        }
        // λ_0² = ρ_0a ρ_0b/ρ_ab for the pair with the largest correlation between them
        for (int i = 0; i < d; i++) {
            double best = 0;
            for (int a = 0; a < d; a++) {
                for (int b = 0; b < a; b++) {
                    double rho = correlation.rho(perils[a], perils[b]);
                    if (a != i && b != i && Math.abs(rho) > best) {
                        best = Math.abs(rho);
                        double square = correlation.rho(perils[i], perils[a]) * correlation.rho(perils[i], perils[b]) / rho;
                        loadings[i] = Math.sqrt(Math.max(0, square));
                    }
                }
            }
        }
        int strongest = 0;
        for (int i = 1; i < d; i++) {
            strongest = loadings[i] > loadings[strongest] ? i : strongest;
        }
        for (int i = 0; i < d; i++) {
            if (i != strongest && correlation.rho(perils[i], perils[strongest]) < 0) {
                loadings[i] = -loadings[i];
            }
        }
        for (int i = 0; i < d; i++) {
            for (int j = 0; j < i; j++) {
                if (Math.abs(loadings[i] * loadings[j] - correlation.rho(perils[i], perils[j])) > 1e-12) {
                    return null;
                }
            }
            if (Math.abs(loadings[i]) > 1) {
                return null;
            }
        }
        return loadings;
    }

    /**
     * @param degreesOfFreedom ν, infinite for the normal copula
     * @param error wanted of joint probabilities
     */
    static LatentNodes of(double[] loadings, double degreesOfFreedom, CountMargin[] margins, double error) {
        double digits = digits(error);
        double[][] scores = scores(degreesOfFreedom, margins);
        double sharpest = 0;
        for (double loading : loadings) {
            sharpest = Math.max(sharpest, Math.abs(loading) / Math.sqrt(Math.max(1 - loading * loading, 1e-12)));
        }
        // at z = iη the normal density and d functions Φ of slope s grow as e^((1 + d s²)η²/2): error e^(−2π²/(h²(1 + d s²)))
        double step = Math.PI * Math.sqrt(2 / digits) / Math.sqrt(1 + loadings.length * sharpest * sharpest);
        int half = (int) Math.ceil(Math.sqrt(2 * digits) / step);
        MixingRule mixing = MixingRule.of(degreesOfFreedom, error);
        int count = (2 * half + 1) * mixing.roots.length;
        double nothing = nothing(error);
        double[] weights = new double[count];
        double[][][] survival = new double[margins.length][count][];
        int kept = 0;
        for (int m = 0; m < mixing.roots.length; m++) {
            for (int j = -half; j <= half; j++) {
                double z = j * step;
                double weight = mixing.weights[m] * Math.exp(-z * z / 2);
                // all that is left out together stays below a tenth of the error
                if (weight * step * count > 0.1 * error) {
                    weights[kept] = weight;
                    for (int i = 0; i < margins.length; i++) {
                        survival[i][kept] = conditional(scores[i], loadings[i], z, mixing.roots[m], nothing);
                    }
                    kept++;
                }
            }
        }
        weights = Arrays.copyOf(weights, kept);
        for (int i = 0; i < margins.length; i++) {
            survival[i] = Arrays.copyOf(survival[i], kept);
        }
        return scaled(weights, survival, margins);
    }

    private static LatentNodes scaled(double[] weights, double[][][] survival, CountMargin[] margins) {
        double total = Arrays.stream(weights).sum();
        Arrays.setAll(weights, k -> weights[k] / total);
        LatentNodes nodes = new LatentNodes(weights, survival, 0);
        return new LatentNodes(weights, survival, measured(nodes, margins));
    }

    /** Normal or t scores of the counts' distribution functions. */
    static double[][] scores(double degreesOfFreedom, CountMargin[] margins) {
        double[][] scores = new double[margins.length][];
        for (int i = 0; i < margins.length; i++) {
            CountMargin margin = margins[i];
            scores[i] = new double[margin.size()];
            for (int n = 0; n < scores[i].length; n++) {
                scores[i][n] = score(degreesOfFreedom, margin.cdf()[n], margin.survival()[n]);
            }
        }
        return scores;
    }

    private static double score(double degreesOfFreedom, double p, double q) {
        ContinuousDistribution law = Double.isInfinite(degreesOfFreedom) ? NormalDistribution.of(0, 1) : TDistribution.of(degreesOfFreedom);
        return p < q ? law.inverseCumulativeProbability(p) : law.inverseSurvivalProbability(q);
    }

    /** Where ½·erfc(x) is far below the error of joint probabilities. */
    static double nothing(double error) {
        return Math.min(27, Math.sqrt(digits(1e-9 * error)));
    }

    private static double digits(double error) {
        return Math.log(3 / error);
    }

    /** @param nothing as of {@link #nothing} */
    static double[] conditional(double[] scores, double loading, double z, double root, double nothing) {
        double own = Math.sqrt(Math.max(1 - loading * loading, 1e-12)) * Math.sqrt(2);
        double[] s = new double[scores.length];
        for (int n = 0; n < s.length; n++) {
            double x = (scores[n] * root - loading * z) / own;
            s[n] = x > nothing ? 0 : x < -6 ? 1 : 0.5 * Erfc.value(x);
        }
        return s;
    }

    /** The worst error on the counts' own probabilities, which are known; the joint ones have the same integrand's smoothness. */
    private static double measured(LatentNodes nodes, CountMargin[] margins) {
        double worst = 0;
        for (int i = 0; i < margins.length; i++) {
            double[] sum = new double[margins[i].size()];
            for (int k = 0; k < nodes.size(); k++) {
                double weight = nodes.weights()[k];
                double[] conditional = nodes.survival()[i][k];
                for (int n = 0; n < sum.length; n++) {
                    sum[n] += weight * conditional[n];
                }
            }
            for (int n = 0; n < sum.length; n++) {
                worst = Math.max(worst, Math.abs(sum[n] - margins[i].survival()[n]));
            }
        }
        return worst;
    }

    /** The trapezoidal rule over s = ln w, w = χ²_ν/ν, whose density is proportional to exp(ν(s − e^s)/2). */
    record MixingRule(double[] roots, double[] weights) {

        /** @param error wanted of a mean; the steps were found by trial, the error falls exponentially in their inverse */
        static MixingRule of(double degreesOfFreedom, double error) {
            if (Double.isInfinite(degreesOfFreedom)) {
                return new MixingRule(new double[] {1}, new double[] {1});
            }
            double half = degreesOfFreedom / 2;
            double spread = 1 / Math.sqrt(half);
            double step = Math.min(8.7, 13 * spread) / Math.log(3 / error);
            double low = -Math.max(8 * spread, 24 / half + 1);
            double high = Math.min(8 * spread, Math.log(7 + 60 / half));
            double logConstant = half * Math.log(half) - LogGamma.value(half);
            int n = (int) Math.ceil((high - low) / step) + 1;
            double[] roots = new double[n];
            double[] weights = new double[n];
            for (int k = 0; k < n; k++) {
                double s = low + k * step;
                roots[k] = Math.exp(s / 2);
                weights[k] = step * Math.exp(logConstant + half * (s - Math.exp(s)));
            }
            return new MixingRule(roots, weights);
        }
    }
}
