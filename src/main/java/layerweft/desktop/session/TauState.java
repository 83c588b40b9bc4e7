package layerweft.desktop.session;

import java.util.Locale;
import layerweft.model.copula.CopulaFamily;
import layerweft.model.treaty.Treaty;
import layerweft.study.DependenceStrength;

/**
 * Where the dependence between the perils stands, as the τ control shows it.
 *
 * @param kind what turning does
 * @param family of the copula, or the one that turning takes up; null where pairs differ or there is one peril
 * @param tau Kendall's τ, the mean of the pairs where they differ
 * @param lowestPair the smallest τ of a pair
 * @param highestPair the largest
 * @param least the smallest τ to which it can be turned
 * @param most the largest
 * @param perils number of perils joined
 * @param copula how the copula is called, e.g. {@code Gumbel}, {@code Gaussian, pairs apart}
 */
public record TauState(
        DependenceStrength.Kind kind, CopulaFamily family, double tau, double lowestPair, double highestPair, double least, double most,
        int perils, String copula) {

    static TauState of(Treaty treaty) {
        int perils = treaty.portfolio().perils().size();
        DependenceStrength strength = DependenceStrength.of(treaty.portfolio().dependence().copula(), perils);
        return new TauState(strength.kind(), strength.family(), strength.tau(), strength.lowestPair(), strength.highestPair(),
                strength.least(), strength.most(), perils, FamilyName.of(treaty.portfolio().dependence().copula(), perils));
    }

    /** Whether there is anything to turn. */
    public boolean turns() {
        return kind != DependenceStrength.Kind.ONE_PERIL;
    }

    /** A τ within reach that is nearest to the one wished for. */
    public double nearest(double wished) {
        return Math.max(least, Math.min(most, wished));
    }

    /** Where the control stops on the left and why, in words; empty at 0. */
    public String leftStop() {
        if (kind == DependenceStrength.Kind.PAIRS || least >= 0) {
            return "";
        }
        return least <= -0.98 ? "−1 opposed" : String.format(Locale.ROOT, "stops at −%.2f with %d perils", -least, perils);
    }
}
