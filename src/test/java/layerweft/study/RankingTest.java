package layerweft.study;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Optional;
import layerweft.engine.RunControl;
import layerweft.figures.Engine;
import layerweft.model.InadmissibleException;
import layerweft.model.portfolio.Dependence;
import layerweft.model.severity.Exponential;
import layerweft.model.severity.Pareto;
import layerweft.model.treaty.Layer;
import layerweft.model.treaty.Treaty;
import org.junit.jupiter.api.Test;

class RankingTest {

    private static Ranking rank(Treaty treaty, String layer, FigureKind figure) {
        return Ranking.of(treaty, Optional.ofNullable(layer), figure, TwoPerils.SETTINGS, RunControl.NONE);
    }

    private static Sensitivity of(Ranking ranking, Sensitivity.Lever lever, String subject) {
        return ranking.sensitivities().stream().filter(s -> s.lever() == lever && s.subject().equals(subject)).findFirst().orElseThrow();
    }

    @Test
    void withoutAnnualTermsTheExpectedLossIsInProportionToFrequency() {
        Ranking both = rank(TwoPerils.treaty(TwoPerils.eachEvent()), "Each event", FigureKind.EXPECTED_LOSS);
        double sum = of(both, Sensitivity.Lever.FREQUENCY, "wind").change().value() + of(both, Sensitivity.Lever.FREQUENCY, "flood").change().value();
        assertEquals(0.1 * both.base().value(), sum, 1e-9 * both.base().value());
        Ranking wind = rank(TwoPerils.treaty(TwoPerils.eachEvent().covering("wind")), "Each event", FigureKind.EXPECTED_LOSS);
        // 1.5 events a year, E[o] = ∫_10^30 (5/x)^1.6 dx
        double perEvent = Math.pow(5, 1.6) * (Math.pow(10, -0.6) - Math.pow(30, -0.6)) / 0.6;
        assertEquals(0.15 * perEvent, of(wind, Sensitivity.Lever.FREQUENCY, "wind").change().value(), 1e-9);
    }

    @Test
    void dearerEventsOfParetoLossesFollowTheClosedForm() {
        Ranking wind = rank(TwoPerils.treaty(TwoPerils.eachEvent().covering("wind")), "Each event", FigureKind.EXPECTED_LOSS);
        // above the threshold the survival function of 1.1·X is 1.1^1.6 times that of X
        assertEquals((Math.pow(1.1, 1.6) - 1) * wind.base().value(), of(wind, Sensitivity.Lever.SEVERITY, "wind").change().value(), 1e-9);
    }

    @Test
    void stopLossesRiseWithEveryAssumption() {
        Ranking ranking = rank(TwoPerils.treaty(TwoPerils.stopLoss()), null, FigureKind.EXPECTED_LOSS);
        for (Sensitivity s : ranking.sensitivities()) {
            if (s.lever() != Sensitivity.Lever.FAMILY && s.lever() != Sensitivity.Lever.TAIL) {
                assertTrue(s.change().value() > 0, s.toString());
            }
        }
        Sensitivity.Reach reach = of(ranking, Sensitivity.Lever.STRENGTH, "").reach().orElseThrow();
        assertEquals("independent", reach.lowest());
        assertEquals("comonotonic", reach.highest());
        assertTrue(reach.atLowest().value() < ranking.base().value() && ranking.base().value() < reach.atHighest().value());
    }

    @Test
    void theLargestChangeComesFirst() {
        List<Sensitivity> ranked = rank(TwoPerils.treaty(TwoPerils.stopLoss()), null, FigureKind.EXPECTED_LOSS).sensitivities();
        for (int k = 1; k < ranked.size(); k++) {
            assertTrue(Math.abs(ranked.get(k).change().value()) <= Math.abs(ranked.get(k - 1).change().value()));
        }
        assertEquals(7, ranked.size(), "strength, family, frequency and severity of two perils, the tail of one");
    }

    @Test
    void whatCannotBeVariedIsSaid() {
        Ranking ranking = rank(TwoPerils.treaty(TwoPerils.stopLoss()), null, FigureKind.EXPECTED_LOSS);
        assertEquals(List.of("flood, tail: its severity has no tail parameter that could be 10 % heavier"), ranking.notVaried());
        List<String> still = rank(TwoPerils.treaty(TwoPerils.eachEvent().covering("wind")), null, FigureKind.EXPECTED_LOSS).notVaried();
        assertEquals(List.of("dependence: expected loss does not depend on it, because it covers one peril", "flood: not covered"), still);
    }

    @Test
    void independentPerilsAreTriedWithAFirstBitOfDependence() {
        Treaty treaty = new Treaty(TwoPerils.portfolio(Dependence.NONE), TwoPerils.programme("P", TwoPerils.stopLoss()));
        Ranking ranking = rank(treaty, null, FigureKind.EXPECTED_LOSS);
        assertEquals("τ 0 → 0.1, gumbel", of(ranking, Sensitivity.Lever.STRENGTH, "").step());
        assertTrue(ranking.notVaried().contains("family: independent perils have none"));
    }

    @Test
    void heavierTailsKeepTheMeanOrSayThatTheyCannot() {
        Treaty treaty = new Treaty(TwoPerils.portfolio(TwoPerils.GUMBEL, new Pareto(5, 1.05), new Exponential(12)),
                TwoPerils.programme("P", TwoPerils.stopLoss()));
        assertEquals("tail 10 % heavier, mean infinite", of(rank(treaty, null, FigureKind.EXPECTED_LOSS), Sensitivity.Lever.TAIL, "wind").step());
        assertEquals("tail 10 % heavier, same mean",
                of(rank(TwoPerils.treaty(TwoPerils.stopLoss()), null, FigureKind.EXPECTED_LOSS), Sensitivity.Lever.TAIL, "wind").step());
    }

    @Test
    void programmesAreRankedByFiguresThatAdd() {
        Layer[] layers = {TwoPerils.stopLoss(), TwoPerils.eachEvent()};
        Ranking whole = rank(TwoPerils.treaty(layers), null, FigureKind.EXPECTED_LOSS);
        double one = of(rank(TwoPerils.treaty(layers), "Stop loss", FigureKind.EXPECTED_LOSS), Sensitivity.Lever.SEVERITY, "wind").change().value();
        double other = of(rank(TwoPerils.treaty(layers), "Each event", FigureKind.EXPECTED_LOSS), Sensitivity.Lever.SEVERITY, "wind").change().value();
        assertEquals(one + other, of(whole, Sensitivity.Lever.SEVERITY, "wind").change().value(), 1e-5);
        InadmissibleException e = assertThrows(InadmissibleException.class, () -> rank(TwoPerils.treaty(layers), null, FigureKind.LOSS_ON_LINE));
        assertEquals("figure", e.findings().get(0).field());
    }

    @Test
    void layersAreNamed() {
        InadmissibleException e = assertThrows(InadmissibleException.class,
                () -> rank(TwoPerils.treaty(TwoPerils.stopLoss()), "Top", FigureKind.EXPECTED_LOSS));
        assertEquals("layer: found \"Top\"; admissible: one of Stop loss", e.getMessage());
    }

    @Test
    void simulatedLayersAreRankedOnTheSameYears() {
        Ranking ranking = rank(TwoPerils.treaty(TwoPerils.proRataTime()), null, FigureKind.EXPECTED_LOSS);
        assertEquals(Engine.SIMULATION, new CopulaPricing(TwoPerils.treaty(TwoPerils.proRataTime()), TwoPerils.SETTINGS, RunControl.NONE)
                .price(TwoPerils.GUMBEL.copula(), List.of(0)).get(0).engine());
        assertTrue(of(ranking, Sensitivity.Lever.SEVERITY, "wind").change().value() > 0);
    }
}
