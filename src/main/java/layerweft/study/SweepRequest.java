package layerweft.study;

import java.util.HashSet;
import java.util.List;
import java.util.Set;
import java.util.stream.Stream;
import layerweft.engine.simulation.SimulationSettings;
import layerweft.model.Check;
import layerweft.model.copula.CopulaFamily;
import layerweft.model.copula.TauRange;

/**
 * What a sweep goes through. Findings name the fields as the command line does.
 *
 * @param families at least one, each once, each with a strength
 * @param taus values of Kendall's τ, at least one, each once
 * @param figure the figure whose lift, slope and spread are wanted beside the expected loss
 * @param check years of a simulation beside every point of the sweep; 0 for none
 */
public record SweepRequest(List<CopulaFamily> families, List<Double> taus, FigureKind figure, long check) {
    /** One family for each way of depending: in the large, in the small, in both, in neither, weakly and strongly. */
    public static final List<CopulaFamily> USUAL_FAMILIES =
            Stream.of("gumbel", "student:4", "frank", "survival-clayton", "joe", "gaussian", "clayton").map(CopulaFamily::parse).toList();

    public static final List<Double> USUAL_TAUS = List.of(0.0, 0.1, 0.2, 0.3, 0.4, 0.5, 0.6, 0.7, 0.8, 0.9);

    public SweepRequest {
        families = List.copyOf(families);
        taus = List.copyOf(taus);
        Check findings = new Check().that(!families.isEmpty(), "families", "an empty list", "at least one family")
                .that(!taus.isEmpty(), "taus", "an empty list", "at least one value")
                .that(figure != null, "figure", "nothing", "a figure of a layer")
                .that(check >= 0 && check <= SimulationSettings.MOST_YEARS, "check", check,
                        "a number of years from 0 to " + SimulationSettings.MOST_YEARS);
        Families.check(findings, families);
        Set<Double> seen = new HashSet<>();
        taus.forEach(tau -> findings.that(seen.add(tau), "taus", tau + " a second time", "each value once"));
        findings.orThrow();
    }

    /** Families and τ as usual. */
    public static SweepRequest usual(FigureKind figure) {
        return new SweepRequest(USUAL_FAMILIES, USUAL_TAUS, figure, 0);
    }

    /** @throws layerweft.model.InadmissibleException naming each τ that a family cannot have between so many perils */
    void requireAdmissible(int perils) {
        Check check = new Check();
        for (CopulaFamily family : families) {
            TauRange range = family.tauRange(perils);
            for (double tau : taus) {
                check.that(range.contains(tau), "taus", tau, family.label() + " between " + perils + " perils has τ " + range);
            }
        }
        check.orThrow();
    }
}
