package layerweft.engine.transform;

import java.util.Optional;
import layerweft.model.copula.Comonotonic;
import layerweft.model.copula.Copula;
import layerweft.model.copula.Countermonotonic;
import layerweft.model.copula.Gaussian;
import layerweft.model.copula.GroupedArchimedean;
import layerweft.model.copula.MixtureCopula;
import layerweft.model.copula.Student;

/**
 * The law of a sum of amounts on one lattice whose ranks a copula joins: parts of an event, or annual totals of perils. Given the latent
 * factor the amounts are independent, so transforms multiply; then the mean over the factor.
 */
final class DependentSum {
    private DependentSum() {
    }

    /** Why the copula cannot join these amounts; empty where it can. */
    static Optional<String> refusal(Copula copula, int[] members) {
        if (copula instanceof MixtureCopula mixture) {
            return mixture.components().stream().map(c -> refusal(c, members)).flatMap(Optional::stream).findFirst();
        }
        if (members.length <= 2) {
            return Optional.empty();
        }
        if (copula instanceof GroupedArchimedean) {
            return Optional.of("a grouped copula joins amounts of " + members.length + " perils or sub-perils, and the transform takes at most 2");
        }
        boolean factor = !(copula instanceof Gaussian g && FactorNodes.loadings(g.correlation(), members) == null)
                && !(copula instanceof Student s && FactorNodes.loadings(s.correlation(), members) == null);
        return factor ? Optional.empty()
                : Optional.of("a correlation matrix without a common factor joins amounts of " + members.length + " perils or sub-perils");
    }

    /**
     * @param members positions in the copula
     * @param margins amounts in steps of the lattice, each with the same number of thresholds
     * @param error wanted of probabilities
     * @return P(sum &gt; k), k = 0..thresholds−1
     */
    static double[] survival(Copula copula, int[] members, CountMargin[] margins, double error) {
        int n = margins[0].size();
        if (margins.length == 1) {
            return margins[0].survival().clone();
        }
        if (copula instanceof MixtureCopula mixture) {
            double[] sum = new double[n];
            for (int c = 0; c < mixture.components().size(); c++) {
                double[] part = survival(mixture.components().get(c), members, margins, error);
                for (int k = 0; k < n; k++) {
                    sum[k] += mixture.weights().get(c) * part[k];
                }
            }
            return sum;
        }
        if (copula instanceof Comonotonic || copula instanceof Countermonotonic) {
            return ordered(OrderedNodes.of(margins, falling(copula, margins.length)), n);
        }
        return overNodes(LatentModel.ofAmounts(copula, members, margins, error), n);
    }

    private static boolean[] falling(Copula copula, int amounts) {
        boolean[] falling = new boolean[amounts];
        falling[1] = copula instanceof Countermonotonic;
        return falling;
    }

    private static double[] ordered(OrderedNodes nodes, int n) {
        double[] mass = new double[n + 1];
        for (int k = 0; k < nodes.weights().length; k++) {
            int total = 0;
            for (int count : nodes.counts()[k]) {
                total += count;
            }
            mass[Math.min(n, total)] += nodes.weights()[k];
        }
        double[] survival = new double[n];
        double above = mass[n];
        for (int k = n - 1; k >= 0; k--) {
            survival[k] = above;
            above += mass[k];
        }
        return survival;
    }

    private static double[] overNodes(LatentNodes nodes, int n) {
        int length = Spectrum.goodLength(2 * n);
        Spectrum spectrum = new Spectrum(length, 30.0 / (length + n));
        double[] re = new double[spectrum.frequencies()];
        double[] im = new double[spectrum.frequencies()];
        for (int k = 0; k < nodes.size(); k++) {
            double[][] r = spectrum.deficit(nodes.survival()[0][k]);
            for (int i = 1; i < nodes.perils(); i++) {
                double[][] x = spectrum.deficit(nodes.survival()[i][k]);
                for (int f = 0; f < re.length; f++) {
                    double a = r[0][f];
                    double b = r[1][f];
                    r[0][f] = a + x[0][f] - (a * x[0][f] - b * x[1][f]);
                    r[1][f] = b + x[1][f] - (a * x[1][f] + b * x[0][f]);
                }
            }
            for (int f = 0; f < re.length; f++) {
                re[f] += nodes.weights()[k] * r[0][f];
                im[f] += nodes.weights()[k] * r[1][f];
            }
        }
        double[] survival = spectrum.survival(re, im, n);
        double most = 1;
        for (int k = 0; k < n; k++) {
            most = Math.min(most, Math.max(0, survival[k]));
            survival[k] = most;
        }
        return survival;
    }
}
