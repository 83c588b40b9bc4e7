package layerweft.engine.transform;

import java.util.ArrayList;
import java.util.List;
import layerweft.model.copula.Generator;
import layerweft.model.copula.Group;
import layerweft.model.copula.GroupedArchimedean;

/**
 * Nodes for a grouped (nested) Archimedean copula: over the root's frailty V, and, inside each group of two or more perils, over the
 * counts of all its perils but one. Given V = v the group's counts have the distribution function exp(−v ψ₀⁻¹(C_group)) with C_group
 * the group's own copula (McNeil 2008), which is differenced on the lattice of counts.
 */
final class GroupedNodes {
    private final GroupedArchimedean copula;
    private final int[] perils;
    private final CountMargin[] margins;
    private final Generator root;

    private GroupedNodes(GroupedArchimedean copula, int[] perils, CountMargin[] margins) {
        this.copula = copula;
        this.perils = perils;
        this.margins = margins;
        this.root = copula.generator(copula.root());
    }

    /** The branches of the root that hold any of these perils, as positions in {@code perils}. */
    static List<int[]> branches(GroupedArchimedean copula, int[] perils) {
        List<int[]> branches = new ArrayList<>();
        boolean[] taken = new boolean[perils.length];
        for (Group group : copula.root().groups()) {
            int[] inside = java.util.stream.IntStream.range(0, perils.length).filter(i -> holds(group, perils[i])).toArray();
            if (inside.length > 0) {
                branches.add(inside);
            }
            for (int i : inside) {
                taken[i] = true;
            }
        }
        for (int i = 0; i < perils.length; i++) {
            if (!taken[i]) {
                branches.add(new int[] {i});
            }
        }
        return branches;
    }

    static boolean holds(Group group, int peril) {
        return group.members().contains(peril) || group.groups().stream().anyMatch(g -> holds(g, peril));
    }

    /** Nodes for each node of the root's frailty. */
    static long cost(GroupedArchimedean copula, int[] perils, CountMargin[] margins) {
        long cost = 1;
        for (int[] branch : branches(copula, perils)) {
            for (int k = 0; k + 1 < branch.length; k++) {
                cost = Math.min(1L << 40, cost * (margins[branch[k]].size() + 1));
            }
        }
        return cost;
    }

    static LatentNodes of(GroupedArchimedean copula, int[] perils, CountMargin[] margins, double error) {
        return new GroupedNodes(copula, perils, margins).nodes(error);
    }

    private LatentNodes nodes(double error) {
        // the root's rule is made for the perils one by one: a group is nowhere wider than its members
        double theta = copula.root().theta();
        LatentNodes flat = FrailtyNodes.of(copula.family(), theta, root, copula.survival(), margins, error);
        FrailtyRule rule = FrailtyNodes.rule(copula.family(), theta, root, copula.survival(), margins, error);
        List<int[]> branches = branches(copula, perils);
        List<Double> weights = new ArrayList<>();
        List<double[][]> rows = new ArrayList<>();
        double[][] logs = new double[branches.size()][];
        for (int b = 0; b < logs.length; b++) {
            logs[b] = branches.get(b).length > 1 ? logInverses(branches.get(b)) : null;
        }
        for (int k = 0; k < rule.logs().length; k++) {
            List<LatentNodes> parts = new ArrayList<>();
            for (int b = 0; b < logs.length; b++) {
                int[] branch = branches.get(b);
                parts.add(logs[b] == null ? new LatentNodes(new double[] {1}, new double[][][] {{flat.survival()[branch[0]][k]}}, 0)
                        : group(branch, logs[b], rule.logs()[k]));
            }
            product(branches, parts, 0, rule.weights()[k], new double[perils.length][], weights, rows);
        }
        double[][][] survival = new double[perils.length][rows.size()][];
        for (int i = 0; i < perils.length; i++) {
            for (int k = 0; k < rows.size(); k++) {
                survival[i][k] = rows.get(k)[i];
            }
        }
        return new LatentNodes(weights.stream().mapToDouble(Double::doubleValue).toArray(), survival, flat.error() + 1e-14);
    }

    private void product(List<int[]> branches, List<LatentNodes> parts, int b, double weight, double[][] row, List<Double> weights,
            List<double[][]> rows) {
        if (weight < 1e-16) {
            return;
        }
        if (b == parts.size()) {
            weights.add(weight);
            rows.add(row.clone());
            return;
        }
        LatentNodes part = parts.get(b);
        for (int k = 0; k < part.size(); k++) {
            for (int i = 0; i < part.perils(); i++) {
                row[branches.get(b)[i]] = part.survival()[i][k];
            }
            product(branches, parts, b + 1, weight * part.weights()[k], row, weights, rows);
        }
    }

    /** ln ψ₀⁻¹ of the group's own copula at every combination of thresholds; the last peril runs fastest, −∞ where all are unbounded. */
    private double[] logInverses(int[] branch) {
        int[] sizes = sizes(branch);
        int cells = 1;
        for (int size : sizes) {
            cells *= size;
        }
        double[] logs = new double[cells];
        int[] n = new int[branch.length];
        for (int c = 0; c < cells; c++) {
            double[] low = new double[perils.length];
            double[] high = new double[perils.length];
            java.util.Arrays.fill(low, 1);
            for (int k = 0; k < branch.length; k++) {
                CountMargin margin = margins[branch[k]];
                // for the survival version thresholds of 1 − U: N ≥ n, from the top
                if (copula.survival()) {
                    low[branch[k]] = n[k] == 0 ? 1 : margin.survival()[n[k] - 1];
                    high[branch[k]] = n[k] == 0 ? 0 : margin.cdf()[n[k] - 1];
                } else if (n[k] < margin.size()) {
                    low[branch[k]] = margin.cdf()[n[k]];
                    high[branch[k]] = margin.survival()[n[k]];
                }
            }
            logs[c] = inRoot(copula.root(), low, high);
            for (int k = branch.length - 1; k >= 0 && ++n[k] == sizes[k]; k--) {
                n[k] = 0;
            }
        }
        return logs;
    }

    /** ln of the sum of generator inverses under a group, members and inner groups. */
    private double inRoot(Group group, double[] p, double[] q) {
        Generator generator = copula.generator(group);
        double sum = Double.NEGATIVE_INFINITY;
        for (int i = 0; i < perils.length; i++) {
            int peril = perils[i];
            if (q[i] > 0 && group.groups().stream().noneMatch(g -> holds(g, peril)) && (group == copula.root() || holds(group, peril))) {
                sum = add(sum, generator.logInverse(p[i], q[i]));
            }
        }
        for (Group inner : group.groups()) {
            double own = inRoot(inner, p, q);
            if (own > Double.NEGATIVE_INFINITY) {
                Generator innerGenerator = copula.generator(inner);
                sum = add(sum, generator.logInverse(innerGenerator.psiOfLog(own), innerGenerator.complementOfLog(own)));
            }
        }
        return sum;
    }

    private static double add(double a, double b) {
        double high = Math.max(a, b);
        return Double.isInfinite(high) ? high : high + Math.log1p(Math.exp(Math.min(a, b) - high));
    }

    private int[] sizes(int[] branch) {
        return java.util.Arrays.stream(branch).map(i -> margins[i].size() + 1).toArray();
    }

    /** The group's nodes given the root's frailty. */
    private LatentNodes group(int[] branch, double[] logs, double logFrailty) {
        int[] sizes = sizes(branch);
        double[] joint = new double[logs.length];
        for (int c = 0; c < joint.length; c++) {
            joint[c] = Math.exp(-Math.exp(logs[c] + logFrailty));
        }
        if (copula.survival()) {
            DifferencedNodes.differenceFromAbove(joint, sizes);
        } else {
            DifferencedNodes.difference(joint, sizes);
        }
        return DifferencedNodes.fromJoint(joint, sizes, 0);
    }
}
