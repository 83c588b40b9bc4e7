package layerweft.model.portfolio;

import layerweft.model.Check;
import layerweft.model.copula.Copula;
import layerweft.model.copula.Independence;

/** What the copula joins across the perils, and the copula, in the order of the perils. */
public record Dependence(Links links, Copula copula) {

    /** The quantity of each peril that the copula joins. */
    public enum Links {
        /** The annual event counts: U ~ C, N_i = F_i^{-1}(U_i). */
        COUNTS,
        /** The annual ground-up totals, by rearranging the years of each peril block by block so that their ranks follow C. */
        ANNUAL_TOTALS
    }

    public static final Dependence NONE = new Dependence(Links.COUNTS, new Independence());

    public Dependence {
        new Check().that(links != null, "links", "nothing", "counts or annualTotals")
                .that(copula != null, "copula", "nothing", "a copula").orThrow();
    }
}
