package layerweft.study;

import java.util.HashSet;
import java.util.List;
import java.util.Set;
import layerweft.model.Check;
import layerweft.model.copula.Archimedean;
import layerweft.model.copula.Copula;
import layerweft.model.copula.CopulaFamily;
import layerweft.model.copula.Gaussian;
import layerweft.model.copula.GroupedArchimedean;
import layerweft.model.copula.MixtureCopula;
import layerweft.model.copula.Student;

/** Families of copulas as studies vary them. */
final class Families {

    private Families() {}

    /** Findings on {@code families} that have no strength to vary, or come twice. */
    static void check(Check findings, List<CopulaFamily> families) {
        Set<CopulaFamily> seen = new HashSet<>();
        for (CopulaFamily family : families) {
            findings.that(family.hasStrength(), "families", "\"" + family.label() + "\"", "a family with a strength to vary")
                    .that(seen.add(family), "families", "\"" + family.label() + "\" a second time", "each family once");
        }
    }

    /** The family of a copula that one τ describes between so many variables; null for all others. */
    static CopulaFamily ofOneTau(Copula copula, int dimension) {
        if (dimension < 2 || copula instanceof MixtureCopula || copula instanceof GroupedArchimedean) {
            return null;
        }
        boolean oneCorrelation = copula instanceof Gaussian g && g.correlation().common(dimension).isPresent()
                || copula instanceof Student s && s.correlation().common(dimension).isPresent();
        return copula instanceof Archimedean || oneCorrelation ? CopulaFamily.parse(copula.label()) : null;
    }
}
