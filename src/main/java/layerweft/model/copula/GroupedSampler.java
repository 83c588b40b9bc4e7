package layerweft.model.copula;

import java.util.ArrayList;
import java.util.List;
import layerweft.model.random.KeyedStream;
import org.apache.commons.rng.sampling.distribution.ZigguratSampler;

/**
 * McNeil's (2008) sampler of a nested copula: a frailty for the root, one for each group given that of the group around it, and
 * U_i = ψ_g(E_i/V_g) with the group g that peril i hangs on. The d exponentials are drawn before the frailties.
 */
final class GroupedSampler extends YearSampler {
    private final GroupedArchimedean copula;
    /** Groups, each after the one around it; the root is first. */
    private final List<Group> nodes = new ArrayList<>();
    private final List<Integer> around = new ArrayList<>();
    private final int[] nodeOf;
    private final Generator[] generatorOf;

    GroupedSampler(GroupedArchimedean copula, int dimension) {
        super(dimension);
        this.copula = copula;
        this.nodeOf = new int[dimension];
        collect(copula.root(), 0);
        this.generatorOf = new Generator[dimension];
        for (int i = 0; i < dimension; i++) {
            generatorOf[i] = copula.generator(nodes.get(nodeOf[i]));
        }
    }

    private void collect(Group group, int outer) {
        int node = nodes.size();
        nodes.add(group);
        around.add(outer);
        group.members().forEach(i -> nodeOf[i] = node);
        group.groups().forEach(inner -> collect(inner, node));
    }

    @Override
    Drawer drawer(KeyedStream stream) {
        int d = dimension();
        int groups = nodes.size();
        boolean survival = copula.survival();
        double[] e = new double[d];
        double[] lnV = new double[groups];
        ZigguratSampler.Exponential exponential = ZigguratSampler.Exponential.of(stream);
        FrailtySampler root = copula.generator(copula.root()).frailty(stream);
        InnerFrailty[] inner = new InnerFrailty[groups];
        for (int g = 1; g < groups; g++) {
            inner[g] = InnerFrailty.of(copula.family(), nodes.get(around.get(g)).theta(), nodes.get(g).theta(), stream);
        }
        int[] outer = around.stream().mapToInt(Integer::intValue).toArray();
        return (scores, year) -> {
            for (int i = 0; i < d; i++) {
                e[i] = exponential.sample() + Double.MIN_NORMAL;
            }
            lnV[0] = root.logSample();
            for (int g = 1; g < groups; g++) {
                lnV[g] = inner[g].logSample(lnV[outer[g]]);
            }
            for (int i = 0; i < d; i++) {
                double lnE = survival ? LogScale.logMinusLog1mExp(e[i]) : Math.log(e[i]);
                double score = lnV[nodeOf[i]] - lnE;
                scores[i][year] = survival ? -score : score;
            }
        };
    }

    @Override
    public double score(int i, double p, double q) {
        return copula.survival() ? generatorOf[i].logInverse(q, p) : -generatorOf[i].logInverse(p, q);
    }

    @Override
    public double uniform(int i, double score) {
        return copula.survival() ? generatorOf[i].complementOfLog(score) : generatorOf[i].psiOfLog(-score);
    }

    @Override
    public double complement(int i, double score) {
        return copula.survival() ? generatorOf[i].psiOfLog(score) : generatorOf[i].complementOfLog(-score);
    }
}
