package layerweft.model.copula;

import java.util.Arrays;
import java.util.HashSet;
import java.util.List;
import java.util.Locale;
import java.util.Set;
import java.util.stream.IntStream;
import layerweft.model.Check;

/**
 * A nested Archimedean copula, e.g. C(u_1, C_inner(u_2, u_3)), of one family, with strengths that grow inwards: θ_inner ≥ θ_outer is
 * sufficient in the families here (McNeil 2008, "Sampling nested Archimedean copulas"; Hofert 2011). Two perils have the strength of the
 * innermost group that holds both.
 *
 * @param family of all generators
 * @param survival whether U is replaced by 1 − U
 * @param root the whole; perils that no group names hang on it
 */
public record GroupedArchimedean(ArchimedeanFamily family, boolean survival, Group root) implements Copula {

    public GroupedArchimedean {
        Check check = new Check();
        double least = family.independentTheta();
        check.that(root.theta() >= least && root.theta() < Double.POSITIVE_INFINITY, "kendallTau", describe(family, root.theta()),
                "from 0 up to below 1 in a grouped copula");
        checkGroups(family, root, "", new HashSet<>(root.members()), check);
        check.that(root.members().stream().allMatch(i -> i >= 0), "groups", root.members(), "perils by their index, from 0");
        check.orThrow();
    }

    public static GroupedArchimedean of(ArchimedeanFamily family, boolean survival, Group root) {
        return new GroupedArchimedean(family, survival, root);
    }

    private static void checkGroups(ArchimedeanFamily family, Group outer, String path, Set<Integer> seen, Check check) {
        for (int k = 0; k < outer.groups().size(); k++) {
            Group inner = outer.groups().get(k);
            String field = path + "groups[" + k + "]";
            check.that(inner.theta() >= outer.theta() && inner.theta() < Double.POSITIVE_INFINITY, field,
                    "kendallTau " + describe(family, inner.theta()),
                    "kendallTau of at least that around the group, " + describe(family, outer.theta()) + ", and below 1");
            check.that(inner.perils().findAny().isPresent(), field + ".perils", "none", "at least one peril");
            for (int peril : inner.members()) {
                check.that(peril >= 0, field + ".perils", peril, "an index of at least 0");
                check.that(seen.add(peril), field + ".perils", "peril " + peril + " again", "each peril in one group only");
            }
            checkGroups(family, inner, field + ".", seen, check);
        }
    }

    private static String describe(ArchimedeanFamily family, double theta) {
        boolean known = theta >= family.independentTheta() && theta < Double.POSITIVE_INFINITY;
        return known ? String.format(Locale.ROOT, "%.6g (theta %.6g)", family.tauOf(theta), theta)
                : String.format(Locale.ROOT, "of theta %.6g", theta);
    }

    @Override
    public String label() {
        return survival ? "survival-" + family.label() : family.label();
    }

    @Override
    public void requireDimension(int dimension) {
        int beyond = root.perils().filter(i -> i >= dimension).findFirst().orElse(-1);
        new Check().that(beyond < 0, "groups", "peril " + beyond, "perils from 0 to " + (dimension - 1)).orThrow();
    }

    /** The perils that hang on the root of so many: those it names and those that no group names. */
    public List<Integer> rootMembers(int dimension) {
        return IntStream.range(0, dimension).filter(i -> root.groups().stream().noneMatch(g -> g.holds(i))).boxed().toList();
    }

    /** The generator at a group's θ; of 1 − U for a survival copula. */
    public Generator generator(Group group) {
        return family.generator(group.theta());
    }

    /** {@inheritDoc} The survival version takes at most 20 coordinates below 1 (others throw UnsupportedOperationException). */
    @Override
    public double cdf(double... u) {
        requireDimension(u.length);
        Group whole = new Group(root.theta(), rootMembers(u.length), root.groups());
        if (survival) {
            return SurvivalSum.cdf(u, (p, q) -> generator(root).complementOfLog(logSum(whole, p, q)));
        }
        double[] q = Arrays.stream(u).map(p -> 1 - p).toArray();
        return generator(root).psiOfLog(logSum(whole, u, q));
    }

    private double logSum(Group group, double[] p, double[] q) {
        Generator generator = generator(group);
        double lnT = Double.NEGATIVE_INFINITY;
        for (int i : group.members()) {
            lnT = LogScale.logAdd(lnT, generator.logInverse(p[i], q[i]));
        }
        for (Group inner : group.groups()) {
            double lnInner = logSum(inner, p, q);
            Generator own = generator(inner);
            lnT = LogScale.logAdd(lnT, generator.logInverse(own.psiOfLog(lnInner), own.complementOfLog(lnInner)));
        }
        return lnT;
    }

    /** θ of the innermost group that holds both. */
    public double theta(int i, int j) {
        Group group = root;
        while (true) {
            Group within = group.groups().stream().filter(g -> g.holds(i) && g.holds(j)).findAny().orElse(null);
            if (within == null) {
                return group.theta();
            }
            group = within;
        }
    }

    @Override
    public Archimedean pair(int i, int j) {
        return new Archimedean(family, theta(i, j), survival);
    }

    @Override
    public double kendallTau(int i, int j) {
        return family.tauOf(theta(i, j));
    }

    @Override
    public double upperTail(int i, int j) {
        return pair(i, j).upperTail(i, j);
    }

    @Override
    public double lowerTail(int i, int j) {
        return pair(i, j).lowerTail(i, j);
    }

    @Override
    public double spearmanRho(int i, int j) {
        return pair(i, j).spearmanRho(i, j);
    }

    @Override
    public ScoreSampler sampler(int dimension) {
        requireDimension(dimension);
        return new GroupedSampler(this, dimension);
    }
}
