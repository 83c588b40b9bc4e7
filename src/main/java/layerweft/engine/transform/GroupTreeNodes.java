package layerweft.engine.transform;

import java.util.ArrayList;
import java.util.List;
import layerweft.model.copula.ArchimedeanFamily;
import layerweft.model.copula.Generator;
import layerweft.model.copula.Group;
import layerweft.model.copula.GroupedArchimedean;

/**
 * Makes a {@link GroupTree}. Given the outer frailty v, whatever hangs on an inner group has the joint law ψ(Σ t_i | v) with
 * ψ(t | v) = exp(−v ψ_outer⁻¹(ψ_inner(t))) (McNeil 2008), again a mean of exp(−V t) over the inner frailty V.
 */
final class GroupTreeNodes {
    /** On measured errors of a fit. */
    private static final double SAFETY = 4;
    /** For survival copulas, whose joint probabilities are alternating sums of what is fitted. */
    private static final double ALTERNATING = 16;
    private final GroupedArchimedean copula;
    private final int[] perils;
    private final CountMargin[] margins;
    private final double wanted;
    private double error;

    private GroupTreeNodes(GroupedArchimedean copula, int[] perils, CountMargin[] margins, double wanted) {
        this.wanted = wanted;
        this.copula = copula;
        this.perils = perils;
        this.margins = margins;
    }

    /** A group with those of the perils asked for that it holds; groups of one, and as strong as the one around, are dissolved. */
    private record Part(Group group, List<Integer> members, List<Part> inside) {

        int size() {
            return members.size() + inside.stream().mapToInt(Part::size).sum();
        }

        List<Integer> all() {
            List<Integer> all = new ArrayList<>(members);
            inside.forEach(part -> all.addAll(part.all()));
            return all;
        }
    }

    static GroupTree of(GroupedArchimedean copula, int[] perils, CountMargin[] margins, double error) {
        return new GroupTreeNodes(copula, perils, margins, error).tree();
    }

    private GroupTree tree() {
        List<Integer> free = new ArrayList<>();
        for (int i = 0; i < perils.length; i++) {
            int peril = perils[i];
            if (copula.root().groups().stream().noneMatch(g -> GroupedNodes.holds(g, peril))) {
                free.add(i);
            }
        }
        Part root = part(copula.root(), free);
        ArchimedeanFamily family = copula.family();
        double theta = copula.root().theta();
        boolean independent = theta == family.independentTheta();
        FrailtyRule rule = independent ? new FrailtyRule(new double[] {0}, new double[] {1})
                : FrailtyNodes.rule(family, theta, copula.generator(copula.root()), copula.survival(), margins, wanted);
        error = independent ? 0 : FrailtyNodes.error(copula.generator(copula.root()), rule, copula.survival(), margins);
        GroupTree.Branch branch = branch(root, rule.logs(), rule.weights());
        return new GroupTree(rule.weights(), branch, perils.length, error);
    }

    private Part part(Group group, List<Integer> own) {
        List<Integer> members = new ArrayList<>(own);
        List<Part> inside = new ArrayList<>();
        for (Group inner : group.groups()) {
            List<Integer> hung = new ArrayList<>();
            for (int i = 0; i < perils.length; i++) {
                if (inner.members().contains(perils[i])) {
                    hung.add(i);
                }
            }
            Part part = part(inner, hung);
            if (part.size() == 1 || part.group.theta() == group.theta()) {
                members.addAll(part.members);
                inside.addAll(part.inside);
            } else if (part.members.isEmpty() && part.inside.size() == 1) {
                inside.add(part.inside.get(0));
            } else if (part.size() > 0) {
                inside.add(part);
            }
        }
        return new Part(group, members, inside);
    }

    private GroupTree.Branch branch(Part part, double[] logs, double[] masses) {
        Generator generator = copula.generator(part.group);
        int[] members = part.members.stream().mapToInt(Integer::intValue).toArray();
        double[][][] survival = new double[members.length][logs.length][];
        for (int i = 0; i < members.length; i++) {
            double[] inverse = FrailtyNodes.logInverse(generator, copula.survival(), margins[members[i]]);
            for (int k = 0; k < logs.length; k++) {
                survival[i][k] = FrailtyNodes.conditional(inverse, logs[k], copula.survival());
            }
        }
        List<GroupTree.Branch> inside = new ArrayList<>();
        List<double[][]> transitions = new ArrayList<>();
        for (Part inner : part.inside) {
            Generator own = copula.generator(inner.group);
            double[][] inverses = inner.all().stream().map(i -> FrailtyNodes.logInverse(own, copula.survival(), margins[i])).toArray(double[][]::new);
            FrailtyFit fit = FrailtyFit.of(generator, own, inverses, logs, masses, 0.1 * wanted);
            error += (copula.survival() ? ALTERNATING : SAFETY) * fit.error();
            transitions.add(fit.weights());
            inside.add(branch(inner, fit.logs(), fit.masses(masses)));
        }
        return new GroupTree.Branch(members, survival, inside, transitions);
    }
}
