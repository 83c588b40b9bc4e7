package layerweft.engine.transform;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import layerweft.model.copula.Archimedean;
import layerweft.model.copula.Comonotonic;
import layerweft.model.copula.Copula;
import layerweft.model.copula.Correlation;
import layerweft.model.copula.Countermonotonic;
import layerweft.model.copula.Gaussian;
import layerweft.model.copula.GroupedArchimedean;
import layerweft.model.copula.Independence;
import layerweft.model.copula.MixtureCopula;
import layerweft.model.copula.Student;

/** Chooses, for a copula and the perils that matter, how the joint law of their counts becomes {@link LatentNodes}. */
final class LatentModel {
    /** Differences of C are exact and cheap up to so many. */
    private static final int CHEAP_DIFFERENCES = 6_000;
    /** A pair without a latent factor may take so many. */
    private static final int MOST_DIFFERENCES = 4_000_000;
    /** Merging nodes may cost so many times the error wanted of a quadrature: its own error is bounded, not estimated. */
    static final double MERGING = 20;
    /**
     * Excess of θ over independence below which a copula is a mean of independence and the one at this excess: the difference is of the
     * order of WEAK², and a frailty law as narrow as a needle is avoided.
     */
    private static final double WEAK = 1e-4;
    private static final int MOST_GROUP_NODES = 3_000;

    private LatentModel() {
    }

    /** Why the copula cannot be used for these perils (indices in the portfolio); empty where it can. */
    static Optional<String> refusal(Copula copula, int[] perils, CountMargin[] margins) {
        if (copula instanceof MixtureCopula mixture) {
            return mixture.components().stream().map(c -> refusal(c, perils, margins)).flatMap(Optional::stream).findFirst();
        }
        if (copula instanceof Gaussian gaussian) {
            return refusal(gaussian.correlation(), perils);
        }
        if (copula instanceof Student student) {
            return refusal(student.correlation(), perils);
        }
        boolean pairOnly = copula instanceof Countermonotonic || copula instanceof Archimedean a && !a.hasFrailty();
        if (pairOnly && perils.length == 2 && DifferencedNodes.cost(margins) > MOST_DIFFERENCES) {
            return Optional.of("negative dependence between perils with too many events for the transform");
        }
        return Optional.empty();
    }

    private static Optional<String> refusal(Correlation correlation, int[] perils) {
        boolean possible = perils.length <= 3 || FactorNodes.loadings(correlation, perils) != null;
        return possible ? Optional.empty()
                : Optional.of("a correlation matrix without a common factor joins " + perils.length + " perils of the layer, and the transform takes at most 3");
    }

    /**
     * The joint law of the counts: as nodes, or as a tree of them where groups would take too many.
     *
     * @param perils indices in the portfolio of the perils wanted, rising
     * @param margins of these perils
     * @param error wanted of joint probabilities of the counts
     */
    static JointLaw law(Copula copula, int[] perils, CountMargin[] margins, double error) {
        return branched(copula, perils, margins) ? GroupTreeNodes.of((GroupedArchimedean) copula, perils, margins, error) : of(copula, perils, margins, error);
    }

    /** Whether groups take a tree of nodes, whose errors are small beside 1 but not beside chances far up the tail. */
    static boolean branched(Copula copula, int[] perils, CountMargin[] margins) {
        return copula instanceof GroupedArchimedean grouped && perils.length > 2 && GroupedNodes.cost(grouped, perils, margins) > MOST_GROUP_NODES;
    }

    /** The same, always as nodes. */
    static LatentNodes of(Copula copula, int[] perils, CountMargin[] margins, double error) {
        if (perils.length <= 1 || copula instanceof Independence) {
            return independent(margins);
        }
        if (copula instanceof MixtureCopula mixture) {
            return mixture(mixture, perils, margins, error);
        }
        if (copula instanceof Comonotonic) {
            return OrderedNodes.of(margins, new boolean[perils.length]).nodes(margins);
        }
        if (copula instanceof Countermonotonic) {
            return OrderedNodes.of(margins, new boolean[] {false, true}).nodes(margins);
        }
        if (copula instanceof Archimedean archimedean) {
            return archimedean(archimedean, margins, error);
        }
        if (copula instanceof GroupedArchimedean grouped) {
            return perils.length == 2 ? archimedean(grouped.pair(perils[0], perils[1]), margins, error)
                    : GroupedNodes.of(grouped, perils, margins, error).merged(MERGING * error);
        }
        if (copula instanceof Gaussian gaussian) {
            return elliptical(gaussian.correlation(), Double.POSITIVE_INFINITY, perils, margins, error);
        }
        Student student = (Student) copula;
        return elliptical(student.correlation(), student.degreesOfFreedom(), perils, margins, error);
    }

    /** The same for amounts on a lattice, with many thresholds each: by the latent factor wherever there is one. */
    static LatentNodes ofAmounts(Copula copula, int[] members, CountMargin[] margins, double error) {
        Copula joint = copula instanceof GroupedArchimedean grouped ? grouped.pair(members[0], members[1]) : copula;
        return of(joint, members, margins, error);
    }

    private static LatentNodes independent(CountMargin[] margins) {
        double[][][] survival = new double[margins.length][1][];
        for (int i = 0; i < margins.length; i++) {
            survival[i][0] = margins[i].survival();
        }
        return new LatentNodes(new double[] {1}, survival, 0);
    }

    private static LatentNodes archimedean(Archimedean copula, CountMargin[] margins, double error) {
        if (copula.theta() == copula.family().independentTheta()) {
            return independent(margins);
        }
        boolean cheap = margins.length == 2 && DifferencedNodes.cost(margins) <= CHEAP_DIFFERENCES;
        if (cheap || !copula.hasFrailty()) {
            return DifferencedNodes.of(copula, margins).merged(MERGING * error);
        }
        double excess = copula.theta() - copula.family().independentTheta();
        if (excess < 0.999 * WEAK) {
            Archimedean stronger = new Archimedean(copula.family(), copula.family().independentTheta() + WEAK, copula.survival());
            int[] all = java.util.stream.IntStream.range(0, margins.length).toArray();
            LatentNodes mean = mixture(new MixtureCopula(List.of(1 - excess / WEAK, excess / WEAK), List.of(new Independence(), stronger)), all,
                    margins, error);
            return new LatentNodes(mean.weights(), mean.survival(), mean.error() + WEAK * WEAK);
        }
        return FrailtyNodes.of(copula.family(), copula.theta(), copula.generator(), copula.survival(), margins, error).merged(MERGING * error);
    }

    private static LatentNodes elliptical(Correlation correlation, double degreesOfFreedom, int[] perils, CountMargin[] margins, double error) {
        double[] loadings = FactorNodes.loadings(correlation, perils);
        if (loadings == null) {
            return ThreePerilNodes.of(correlation, perils, degreesOfFreedom, margins, error).merged(MERGING * error);
        }
        boolean sure = Arrays.stream(loadings).allMatch(l -> Math.abs(l) > 1 - 1e-9);
        if (sure) {
            boolean[] falling = new boolean[loadings.length];
            for (int i = 0; i < falling.length; i++) {
                falling[i] = loadings[i] * loadings[0] < 0;
            }
            return OrderedNodes.of(margins, falling).nodes(margins);
        }
        return FactorNodes.of(loadings, degreesOfFreedom, margins, error).merged(4 * MERGING * error);
    }

    private static LatentNodes mixture(MixtureCopula mixture, int[] perils, CountMargin[] margins, double error) {
        List<LatentNodes> parts = new ArrayList<>();
        double total = 0;
        int size = 0;
        for (int c = 0; c < mixture.components().size(); c++) {
            parts.add(of(mixture.components().get(c), perils, margins, error));
            total += mixture.weights().get(c) * parts.get(c).error();
            size += parts.get(c).size();
        }
        double[] weights = new double[size];
        double[][][] survival = new double[margins.length][size][];
        int k = 0;
        for (int c = 0; c < parts.size(); c++) {
            LatentNodes part = parts.get(c);
            for (int j = 0; j < part.size(); j++, k++) {
                weights[k] = mixture.weights().get(c) * part.weights()[j];
                for (int i = 0; i < margins.length; i++) {
                    survival[i][k] = part.survival()[i][j];
                }
            }
        }
        return new LatentNodes(weights, survival, total);
    }
}
