package layerweft.study;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNull;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import layerweft.engine.RunControl;
import layerweft.engine.transform.Accuracy;
import layerweft.engine.transform.TransformEngine;
import layerweft.model.copula.CopulaFamily;
import layerweft.model.treaty.Layer;
import layerweft.model.treaty.Programme;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/**
 * The stop loss recovers more as τ rises, the cover of each event always the same. With quoted premiums their costs cross where the
 * premiums are chosen so.
 */
class BreakEvenTest {
    private static final double COST_OF_EACH_EVENT = 1;

    private static double expectedLoss(Layer layer, CopulaFamily family, double tau) {
        return new TransformEngine(TwoPerils.treaty(layer), Accuracy.USUAL).with(family.at(tau)).price(0).expectedLoss().value();
    }

    private static BreakEven.Answer compare(double premiumOfStopLoss, CopulaFamily family) {
        double events = expectedLoss(TwoPerils.eachEvent(), family, 0.5) + COST_OF_EACH_EVENT;
        Programme first = TwoPerils.programme("Year", TwoPerils.quoted(TwoPerils.stopLoss(), premiumOfStopLoss));
        Programme second = TwoPerils.programme("Event", TwoPerils.quoted(TwoPerils.eachEvent(), events));
        return BreakEven.of(TwoPerils.portfolio(TwoPerils.GUMBEL), first, second, BreakEven.Measure.EXPECTED_COST, List.of(family), TwoPerils.SETTINGS, RunControl.NONE)
                .answers().get(0);
    }

    @ParameterizedTest
    @CsvSource({"gumbel, 0.37", "survival-clayton, 0.62", "frank, -0.44", "gaussian, 0.05"})
    void costsCrossWhereTheyWereMadeToCross(String label, double tau) {
        CopulaFamily family = CopulaFamily.parse(label);
        BreakEven.Answer answer = compare(expectedLoss(TwoPerils.stopLoss(), family, tau) + COST_OF_EACH_EVENT, family);
        assertEquals(BreakEven.Outcome.CROSSES, answer.outcome());
        assertEquals(1, answer.taus().size());
        assertEquals(tau, answer.taus().get(0).value(), answer.taus().get(0).error() + 1e-4);
        assertTrue(answer.taus().get(0).error() < 1e-3, "error of τ " + answer.taus().get(0).error());
        assertEquals("Event", answer.cheaperBelow(), "at low τ the stop loss recovers less than it costs");
        assertTrue(answer.differenceFrom().value() > 0 && answer.differenceTo().value() < 0);
    }

    @Test
    void aProgrammeMayBeCheaperAtEveryStrengthOrAtNone() {
        CopulaFamily gumbel = CopulaFamily.parse("gumbel");
        BreakEven.Answer always = compare(0, gumbel);
        assertEquals(BreakEven.Outcome.ALWAYS, always.outcome());
        assertEquals("Year", always.cheaperBelow());
        assertTrue(always.taus().isEmpty());
        BreakEven.Answer never = compare(1000, gumbel);
        assertEquals(BreakEven.Outcome.NEVER, never.outcome());
        assertEquals("Event", never.cheaperBelow());
    }

    @Test
    void aProgrammeAgainstItselfIsEqual() {
        Programme programme = TwoPerils.programme("Year", TwoPerils.quoted(TwoPerils.stopLoss(), 3));
        BreakEven.Answer answer = BreakEven.of(TwoPerils.portfolio(TwoPerils.GUMBEL), programme, programme, BreakEven.Measure.EXPECTED_COST, List.of(CopulaFamily.parse("joe")),
                TwoPerils.SETTINGS, RunControl.NONE).answers().get(0);
        assertEquals(BreakEven.Outcome.EQUAL, answer.outcome());
        assertNull(answer.cheaperBelow());
    }

    @Test
    void reinstatementPremiumsBelongToTheCost() {
        Layer paid = TwoPerils.quoted(TwoPerils.eachEvent().withReinstatements(List.of(1.0)), 4);
        Layer free = TwoPerils.quoted(TwoPerils.eachEvent().withReinstatements(List.of(0.0)), 4);
        BreakEven.Answer answer = BreakEven.of(TwoPerils.portfolio(TwoPerils.GUMBEL), TwoPerils.programme("Paid", paid),
                TwoPerils.programme("Free", free), BreakEven.Measure.EXPECTED_COST, List.of(CopulaFamily.parse("gumbel")), TwoPerils.SETTINGS, RunControl.NONE).answers().get(0);
        assertEquals(BreakEven.Outcome.NEVER, answer.outcome());
        assertEquals("Free", answer.cheaperBelow());
    }

    @Test
    void layersThatNeedSimulationAreComparedOnTheSameYears() {
        Programme first = TwoPerils.programme("Cheap", TwoPerils.quoted(TwoPerils.proRataTime(), 1));
        Programme second = TwoPerils.programme("Dear", TwoPerils.quoted(TwoPerils.proRataTime(), 30));
        BreakEven.Answer answer = BreakEven.of(TwoPerils.portfolio(TwoPerils.GUMBEL), first, second, BreakEven.Measure.EXPECTED_COST, List.of(CopulaFamily.parse("gumbel")),
                TwoPerils.SETTINGS, RunControl.NONE).answers().get(0);
        assertEquals(BreakEven.Outcome.ALWAYS, answer.outcome());
        assertEquals("Cheap", answer.cheaperBelow());
    }
}
