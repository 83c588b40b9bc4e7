package layerweft.engine.transform;

import java.util.Arrays;
import layerweft.model.copula.Correlation;
import org.apache.commons.math3.analysis.integration.gauss.GaussIntegrator;
import org.apache.commons.math3.analysis.integration.gauss.GaussIntegratorFactory;

/**
 * Nodes for three perils under a normal or t copula with any correlation matrix. Given the first peril's score the other two have one
 * factor, so the joint law of the three counts is an integral over that score, interval by interval of the first count (Gauss–Legendre),
 * of products over the factor; then it is read as nodes.
 */
final class ThreePerilNodes {
    private static final int POINTS = 12;
    private static final double REACH = 7.5;

    private ThreePerilNodes() {
    }

    static LatentNodes of(Correlation correlation, int[] perils, double degreesOfFreedom, CountMargin[] margins, double error) {
        double first = correlation.rho(perils[0], perils[1]);
        double second = correlation.rho(perils[0], perils[2]);
        double ownFirst = Math.sqrt(Math.max(1e-12, 1 - first * first));
        double ownSecond = Math.sqrt(Math.max(1e-12, 1 - second * second));
        double partial = Math.max(-1, Math.min(1, (correlation.rho(perils[1], perils[2]) - first * second) / (ownFirst * ownSecond)));
        double loading = Math.sqrt(Math.abs(partial));
        double[][] scores = FactorNodes.scores(degreesOfFreedom, margins);
        FactorNodes.MixingRule mixing = FactorNodes.MixingRule.of(degreesOfFreedom, error);
        int[] sizes = {margins[0].size() + 1, margins[1].size() + 1, margins[2].size() + 1};
        double[] joint = new double[sizes[0] * sizes[1] * sizes[2]];
        for (int m = 0; m < mixing.roots().length; m++) {
            double root = mixing.roots()[m];
            for (int n = 0; n < sizes[0]; n++) {
                double from = n == 0 ? -REACH : Math.max(-REACH, scores[0][n - 1] * root);
                double to = n == sizes[0] - 1 ? REACH : Math.min(REACH, scores[0][n] * root);
                int pieces = (int) Math.ceil((to - from) / 1.5);
                for (int piece = 0; piece < pieces; piece++) {
                    GaussIntegrator rule = new GaussIntegratorFactory()
                            .legendre(POINTS, from + (to - from) * piece / pieces, from + (to - from) * (piece + 1) / pieces);
                    for (int g = 0; g < POINTS; g++) {
                        double x = rule.getPoint(g);
                        double weight = mixing.weights()[m] * rule.getWeight(g) * Math.exp(-x * x / 2) / Math.sqrt(2 * Math.PI);
                        double[] b = shifted(scores[1], root, first * x, ownFirst);
                        double[] c = shifted(scores[2], root, second * x, ownSecond);
                        addPair(joint, n * sizes[1] * sizes[2], b, c, loading, Math.signum(partial) * loading, weight);
                    }
                }
            }
        }
        double missing = Math.abs(1 - Arrays.stream(joint).sum());
        return DifferencedNodes.fromJoint(joint, sizes, missing + error);
    }

    private static double[] shifted(double[] scores, double root, double shift, double own) {
        return Arrays.stream(scores).map(s -> (s * root - shift) / own).toArray();
    }

    /** Adds the joint law of two counts whose normal scores have one factor. */
    private static void addPair(double[] joint, int offset, double[] b, double[] c, double loadingB, double loadingC, double weight) {
        double sharpness = loadingB / Math.sqrt(Math.max(1e-12, 1 - loadingB * loadingB));
        double step = 0.95 / Math.sqrt(1 + sharpness * sharpness);
        int half = (int) Math.ceil(REACH / step);
        double norm = step / Math.sqrt(2 * Math.PI);
        for (int j = -half; j <= half; j++) {
            double z = j * step;
            double w = weight * norm * Math.exp(-z * z / 2);
            double[] p = masses(FactorNodes.conditional(b, loadingB, z, 1, 6));
            double[] q = masses(FactorNodes.conditional(c, loadingC, z, 1, 6));
            for (int n = 0, k = offset; n < p.length; n++) {
                double wp = w * p[n];
                for (double mass : q) {
                    joint[k++] += wp * mass;
                }
            }
        }
    }

    private static double[] masses(double[] survival) {
        double[] p = new double[survival.length + 1];
        double above = 1;
        for (int n = 0; n < survival.length; n++) {
            p[n] = above - survival[n];
            above = survival[n];
        }
        p[survival.length] = above;
        return p;
    }
}
