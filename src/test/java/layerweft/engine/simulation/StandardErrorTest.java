package layerweft.engine.simulation;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.function.Function;
import java.util.stream.Stream;
import layerweft.engine.RunControl;
import layerweft.figures.Figure;
import layerweft.figures.LayerStatistics;
import layerweft.model.portfolio.Dependence;
import layerweft.model.treaty.AnnualTerms;
import layerweft.model.treaty.Buyer;
import layerweft.model.treaty.Layer;
import layerweft.model.treaty.Loading;
import layerweft.model.treaty.OccurrenceTerms;
import layerweft.model.treaty.Pricing;
import layerweft.model.treaty.Programme;
import layerweft.model.treaty.Treaty;
import layerweft.reference.ReferenceCase;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/**
 * The standard errors themselves: over many seeds the reported errors must be as large as the figures' real scatter around a long
 * run, and 95 % intervals must hold the truth about 95 times in 100.
 */
class StandardErrorTest {
    private static final int SEEDS = 300;
    private static final int YEARS = 10_000;

    static Stream<Loading> loadings() {
        return Stream.of(new Loading.None(), new Loading.StandardDeviation(0.3), new Loading.Variance(0.01), new Loading.CostOfCapital(0.1, 0.95),
                new Loading.ProportionalHazard(1.2), new Loading.Wang(0.3));
    }

    @ParameterizedTest
    @MethodSource("loadings")
    void intervalsHoldTheTruthAsOftenAsTheySay(Loading loading) {
        Layer layer = Layer.of("cat", OccurrenceTerms.excess(30, 10), new AnnualTerms(10, 60)).withReinstatements(List.of(1.0, 0.5));
        Treaty base = SimulationTest.treaty(SimulationTest.gumbel(Dependence.Links.COUNTS), layer);
        Treaty treaty = new Treaty(base.portfolio(), new Programme("p", List.of(layer), new Pricing(loading, 0.1, 0.05, true), Buyer.USUAL));
        Map<String, Function<LayerStatistics, Figure>> figures = new LinkedHashMap<>();
        figures.put("technical premium", LayerStatistics::technicalPremium);
        figures.put("net premium", LayerStatistics::netPremium);
        if (loading instanceof Loading.None) {
            figures.put("expected loss", LayerStatistics::expectedLoss);
            figures.put("standard deviation", LayerStatistics::standardDeviation);
            figures.put("attachment", LayerStatistics::attachmentProbability);
            figures.put("exhaustion", LayerStatistics::exhaustionProbability);
            figures.put("reinstatement factor", LayerStatistics::reinstatementFactor);
            figures.put("tail value at risk", LayerStatistics::tailValueAtRisk);
            figures.put("value at risk 0.9", s -> s.valueAtRisk().get(0.9));
            figures.put("largest event 0.9", s -> s.occurrenceValueAtRisk().get(0.9));
        }
        check(treaty, figures, YEARS, SEEDS, 4_000_000);
    }

    /**
     * Years depend on each other within blocks: batch means over 10 blocks, so a t law with 9 degrees of freedom (2.26 for 95 %). The
     * truth is the independently computed value of the reference case.
     */
    @Test
    void batchMeansHoldForRearrangedTotals() {
        ReferenceCase reference = ReferenceCase.ofKinds("f").get(0);
        Treaty treaty = reference.treaty();
        ReferenceCase.Expected expected = reference.expected().stream().filter(e -> e.path().endsWith("/expectedLoss")).findFirst().orElseThrow();
        int inside = 0;
        int seeds = 24;
        for (int seed = 0; seed < seeds; seed++) {
            Figure f = run(treaty, seed, 10 * Simulation.REARRANGED_BLOCK).expectedLoss();
            inside += Math.abs(f.value() - expected.value()) <= 2.26 * f.error() + expected.tolerance() ? 1 : 0;
        }
        // binomial(24, 0.95): below 19 with a chance of 1 in 1,000
        assertTrue(inside >= 19, inside + " of " + seeds);
    }

    private static void check(Treaty treaty, Map<String, Function<LayerStatistics, Figure>> figures, int years, int seeds, int longRun) {
        LayerStatistics truth = run(treaty, 987_654_321, longRun);
        LayerStatistics[] runs = new LayerStatistics[seeds];
        for (int seed = 0; seed < seeds; seed++) {
            runs[seed] = run(treaty, seed, years);
        }
        figures.forEach((name, figure) -> {
            double exact = figure.apply(truth).value();
            int inside = 0;
            double square = 0;
            for (LayerStatistics r : runs) {
                Figure f = figure.apply(r);
                double z = (f.value() - exact) / f.error();
                inside += Math.abs(z) <= 1.96 ? 1 : 0;
                square += z * z;
            }
            // binomial(300, 0.95): outside 273..297 with a chance of 1 in 500; the z values' spread has a standard error of 4 %
            double coverage = (double) inside / seeds;
            // the law of a quantile near an atom is not normal, and its interval only about as wide as it says
            boolean quantile = name.endsWith("0.9");
            assertEquals(0.95, coverage, quantile ? 0.07 : 0.045, name + ": coverage " + coverage);
            assertEquals(1, Math.sqrt(square / seeds), quantile ? 0.3 : 0.17, name + ": spread of the z values");
        });
    }

    private static LayerStatistics run(Treaty treaty, long seed, int years) {
        return Simulation.run(treaty, new SimulationSettings(years, seed, 2), RunControl.NONE).layers().get(0);
    }
}
