package layerweft.engine.transform;

import java.util.Arrays;
import layerweft.model.copula.Archimedean;
import layerweft.model.copula.Comonotonic;
import layerweft.model.copula.Copula;
import layerweft.model.copula.Gaussian;
import layerweft.model.copula.GroupedArchimedean;
import layerweft.model.copula.Independence;
import layerweft.model.copula.MixtureCopula;

/**
 * Whether sums keep the convex order of their parts under one copula: X_i ≤cx Y_i for every i, both joined by the copula, then ΣX_i ≤cx
 * ΣY_i. It is so for conditionally increasing copulas (Müller &amp; Scarsini 2001, "Stochastic comparison of random vectors with a common
 * copula", Mathematics of Operations Research 26) and their mixtures; with ≤icx in place of ≤cx as well, as a law below in increasing
 * convex order is one below a law that is below in convex order.
 */
final class ConvexOrder {
    private ConvexOrder() {
    }

    /**
     * Proven: independence; comonotonicity (Dhaene et al. 2002); Archimedean copulas with a frailty and their survival versions, whose
     * densities are totally positive (Müller &amp; Scarsini 2005, "Archimedean copulae and positive dependence"); normal copulas with one factor
     * and loadings of one sign, whose precision matrix has no positive entry off the diagonal. Student copulas are not conditionally
     * increasing, as their scale grows with the other variables, nor is anything with negative dependence.
     *
     * @param members positions in the copula of the parts summed
     */
    static boolean keptBy(Copula copula, int[] members) {
        if (members.length < 2 || copula instanceof Independence || copula instanceof Comonotonic) {
            return true;
        }
        if (copula instanceof MixtureCopula mixture) {
            return mixture.components().stream().allMatch(c -> keptBy(c, members));
        }
        if (copula instanceof Archimedean archimedean) {
            return archimedean.hasFrailty();
        }
        if (copula instanceof GroupedArchimedean grouped) {
            return members.length == 2 && grouped.pair(members[0], members[1]).hasFrailty();
        }
        if (copula instanceof Gaussian gaussian) {
            double[] loadings = FactorNodes.loadings(gaussian.correlation(), members);
            return loadings != null && (Arrays.stream(loadings).allMatch(l -> l >= 0) || Arrays.stream(loadings).allMatch(l -> l <= 0));
        }
        return false;
    }
}
