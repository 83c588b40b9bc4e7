package layerweft.study;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import layerweft.engine.RunControl;
import layerweft.engine.simulation.SimulationSettings;
import layerweft.figures.Figure;
import layerweft.model.InadmissibleException;
import layerweft.model.copula.CopulaFamily;
import layerweft.model.treaty.Programme;
import org.junit.jupiter.api.Test;

class ComparisonTest {
    private static final SimulationSettings SETTINGS = new SimulationSettings(50_000, 1, 2);
    private static final Programme EVENTS = TwoPerils.programme("Events", TwoPerils.quoted(TwoPerils.eachEvent(), 9));
    private static final Programme YEAR = TwoPerils.programme("Year", TwoPerils.quoted(TwoPerils.stopLoss(), 12));
    private static final Programme DEAR = TwoPerils.programme("Dear", TwoPerils.quoted(TwoPerils.stopLoss(), 20));
    private static final List<CopulaFamily> NONE = List.of();

    private static Comparison compare(List<CopulaFamily> families, Programme... programmes) {
        return Comparison.of(TwoPerils.portfolio(TwoPerils.GUMBEL), List.of(programmes), families, SETTINGS, RunControl.NONE);
    }

    @Test
    void theMeanPositionIsTheExpectedLossWithTheCostOfCover() {
        Comparison found = compare(NONE, EVENTS, YEAR);
        double gross = TwoPerils.portfolio(TwoPerils.GUMBEL).expectedLoss();
        assertEquals(1.5 * 5 * 1.6 / 0.6 + 0.8 * 12, gross, 1e-9);
        for (Structure s : found.structures()) {
            assertEquals(gross + s.cost().costOfCover().value(), s.net().mean().value(), 1e-9);
            assertEquals(s.cost().upfrontPremium().value() + s.cost().reinstatementPremium().value() - s.cost().expectedRecoveries().value(),
                    s.cost().costOfCover().value(), 1e-9);
        }
    }

    @Test
    void theSameCoverForMoreMoneyIsBeaten() {
        Comparison found = compare(NONE, EVENTS, YEAR, DEAR);
        assertTrue(found.undominated().contains(1), found.undominated().toString());
        assertTrue(!found.undominated().contains(2), found.undominated().toString());
        StructurePair pair = found.pairs().get(2);
        assertEquals(-8, pair.costOfCover().value(), 1e-9);
        // a premium moves the position by itself in every year, and its tail with it
        assertEquals(-8, pair.net().tailValueAtRisk().value(), 1e-2);
        // the variance of the wind's losses is infinite, and what is left under a stop loss as well
        assertTrue(!pair.net().standardDeviation().defined(), pair.net().standardDeviation().toString());
    }

    @Test
    void aLayerAloneIsWorthTheWholeProgramme() {
        Structure s = compare(NONE, EVENTS, YEAR).structures().get(0);
        assertEquals(s.relief().valueAtRisk(), s.worths().get(0).relief().valueAtRisk());
    }

    /** One layer over the other pays nothing that the other does: what the two are worth adds up in the mean. */
    @Test
    void meansOfWorthAddUp() {
        Programme both = TwoPerils.programme("Both", TwoPerils.quoted(TwoPerils.eachEvent(), 9), TwoPerils.quoted(TwoPerils.stopLoss(), 12));
        Structure s = compare(NONE, both, YEAR).structures().get(0);
        double sum = s.worths().stream().mapToDouble(w -> w.relief().mean().value()).sum();
        assertEquals(s.relief().mean().value(), sum, 1e-9);
    }

    @Test
    void breakEvensOfBothMeasuresAndThePreferencesFitTogether() {
        List<CopulaFamily> families = List.of(CopulaFamily.parse("gumbel"));
        Comparison found = compare(families, YEAR, DEAR);
        List<BreakEven> breakEvens = found.pairs().get(0).breakEvens();
        assertEquals(List.of(BreakEven.Measure.EXPECTED_COST, BreakEven.Measure.COST_OF_RISK), breakEvens.stream().map(BreakEven::measure).toList());
        breakEvens.forEach(b -> assertEquals(BreakEven.Outcome.ALWAYS, b.answers().get(0).outcome(), b.toString()));
        for (Preference p : Preference.of(found)) {
            assertEquals(1, p.spans().size());
            assertEquals(List.of(0), p.spans().get(0).best());
        }
    }

    /** The stop loss recovers more the more the perils go together; at this premium that turns the choice, and the preference turns where the break-even is. */
    @Test
    void thePreferenceTurnsAtTheBreakEven() {
        List<CopulaFamily> families = List.of(CopulaFamily.parse("gumbel"));
        Figure independent = compare(NONE, YEAR, EVENTS).structures().get(0).cost().expectedRecoveries();
        Programme stop = TwoPerils.programme("Stop", TwoPerils.quoted(TwoPerils.stopLoss(), independent.value()));
        Programme nothing = TwoPerils.programme("Free of charge at even odds", TwoPerils.quoted(TwoPerils.eachEvent(),
                compare(NONE, EVENTS, YEAR).structures().get(0).cost().expectedRecoveries().value()));
        Comparison found = compare(families, stop, nothing);
        BreakEven.Answer answer = found.pairs().get(0).breakEvens().get(0).answers().get(0);
        assertEquals(BreakEven.Outcome.CROSSES, answer.outcome());
        assertEquals(0.3, answer.taus().get(0).value(), 1e-3);
        Preference byCost = Preference.of(found).get(0);
        assertEquals(2, byCost.spans().size());
        assertEquals(answer.taus().get(0).value(), byCost.spans().get(0).to(), 0);
        assertEquals(List.of(1), byCost.spans().get(0).best());
        assertEquals(List.of(0), byCost.spans().get(1).best());
    }

    @Test
    void fewerThanTwoOrTwoOfOneNameAreRefused() {
        assertThrows(InadmissibleException.class, () -> compare(NONE, EVENTS));
        InadmissibleException e = assertThrows(InadmissibleException.class, () -> compare(NONE, EVENTS, YEAR, EVENTS));
        assertTrue(e.getMessage().contains("programmes[2].name"), e.getMessage());
    }
}
