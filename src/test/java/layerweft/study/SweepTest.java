package layerweft.study;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.stream.Stream;
import layerweft.engine.RunControl;
import layerweft.engine.simulation.SimulationSettings;
import layerweft.engine.transform.Accuracy;
import layerweft.engine.transform.TransformEngine;
import layerweft.figures.Engine;
import layerweft.model.InadmissibleException;
import layerweft.model.copula.CopulaFamily;
import layerweft.model.portfolio.Dependence;
import layerweft.model.treaty.AnnualTerms;
import layerweft.model.treaty.Layer;
import layerweft.model.treaty.OccurrenceTerms;
import layerweft.model.treaty.Treaty;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class SweepTest {

    private static List<CopulaFamily> families(String... labels) {
        return Stream.of(labels).map(CopulaFamily::parse).toList();
    }

    private static SweepRequest request(List<CopulaFamily> families, Double... taus) {
        return new SweepRequest(families, List.of(taus), FigureKind.EXPECTED_LOSS, 0);
    }

    private static Sweep sweep(Treaty treaty, SweepRequest request) {
        return Sweep.of(treaty, request, TwoPerils.SETTINGS, RunControl.NONE);
    }

    @Test
    void independenceIsTheStartOfEveryFamilyButStudent() {
        LayerSweep layer = sweep(TwoPerils.treaty(TwoPerils.stopLoss()), request(SweepRequest.USUAL_FAMILIES, 0.0)).layers().get(0);
        for (SweepPoint point : layer.points()) {
            if (point.family().label().equals("student:4")) {
                assertTrue(Math.abs(point.lift().value()) > 1e-4, "the common mixing variable is felt at τ = 0: " + point.lift());
            } else {
                assertEquals(0, point.lift().value(), 1e-6, point.family().label());
            }
        }
    }

    @ParameterizedTest
    @ValueSource(strings = {"gumbel", "survival-clayton", "frank", "gaussian", "clayton"})
    void unlimitedStopLossesRiseToTheComonotoneCeiling(String label) {
        Layer unlimited = Layer.of("Unlimited", new OccurrenceTerms(0, null, 200), new AnnualTerms(30, TwoPerils.NONE));
        LayerSweep layer = sweep(TwoPerils.treaty(unlimited), request(families(label), 0.0, 0.5, 0.9, 0.99)).layers().get(0);
        double ceiling = layer.comonotoneValue().value();
        double last = -1;
        for (SweepPoint point : layer.points()) {
            assertTrue(point.value().value() > last, "rises with τ");
            last = point.value().value();
            assertTrue(last <= ceiling + 1e-4, "no dependence makes more of it than " + ceiling);
        }
        assertEquals(ceiling, last, 0.005 * ceiling);
    }

    @Test
    void layersOfOnePerilDoNotMove() {
        Layer flood = TwoPerils.stopLoss().covering("flood");
        LayerSweep layer = sweep(TwoPerils.treaty(flood), request(SweepRequest.USUAL_FAMILIES, 0.0, 0.3, 0.9)).layers().get(0);
        assertEquals("it covers one peril", layer.still().orElseThrow());
        for (SweepPoint point : layer.points()) {
            assertEquals(layer.independent(), point.figures());
            assertEquals(0, point.lift().value());
            assertEquals(0, point.slope().value());
        }
        assertEquals(0, layer.comonotoneLift().value());
    }

    @Test
    void withoutAnnualTermsTheMeanRestsAndTheDeviationMoves() {
        Treaty treaty = TwoPerils.treaty(TwoPerils.eachEvent());
        LayerSweep mean = sweep(treaty, request(families("gumbel"), 0.0, 0.6)).layers().get(0);
        assertTrue(mean.still().isPresent());
        assertEquals(0, mean.points().get(1).lift().value());
        assertEquals(mean.points().get(0).figures().expectedLoss().value(), mean.points().get(1).figures().expectedLoss().value(), 1e-9);
        LayerSweep deviation = sweep(treaty, new SweepRequest(families("gumbel"), List.of(0.0, 0.6), FigureKind.STANDARD_DEVIATION, 0)).layers().get(0);
        assertTrue(deviation.still().isEmpty());
        assertTrue(deviation.points().get(1).valueLift().value() > 0.01);
        assertEquals(0, deviation.points().get(1).lift().value(), "lift stays that of the expected loss");
    }

    @Test
    void neitherOrderNorThreadsChangeAValue() {
        Treaty treaty = TwoPerils.treaty(TwoPerils.stopLoss(), TwoPerils.eachEvent());
        Sweep one = sweep(treaty, request(families("gumbel", "clayton"), 0.1, 0.4, 0.7));
        Sweep other = Sweep.of(treaty, request(families("clayton", "gumbel"), 0.7, 0.1, 0.4), new SimulationSettings(20_000, 1, 1), RunControl.NONE);
        for (int j = 0; j < 2; j++) {
            for (SweepPoint point : one.layers().get(j).points()) {
                SweepPoint same =
                        other.layers().get(j).of(point.family()).stream().filter(p -> p.kendallTau() == point.kendallTau()).findFirst().orElseThrow();
                assertEquals(point, same);
            }
        }
    }

    @Test
    void linksAreKept() {
        Dependence totals = new Dependence(Dependence.Links.ANNUAL_TOTALS, CopulaFamily.parse("gumbel").at(0.5));
        Treaty treaty = new Treaty(TwoPerils.portfolio(totals), TwoPerils.programme("P", TwoPerils.stopLoss()));
        SweepPoint point = sweep(treaty, request(families("gumbel"), 0.5)).layers().get(0).points().get(0);
        double direct = new TransformEngine(treaty, Accuracy.USUAL).price(0).expectedLoss().value();
        assertEquals(direct, point.value().value(), 1e-5);
        double counts = sweep(TwoPerils.treaty(TwoPerils.stopLoss()), request(families("gumbel"), 0.5)).layers().get(0).points().get(0).value().value();
        assertTrue(Math.abs(direct - counts) > 0.01, direct + " is not " + counts);
    }

    @Test
    void layersThatTheTransformRefusesAreSimulatedAndSaySo() {
        LayerSweep layer = sweep(TwoPerils.treaty(TwoPerils.proRataTime()), request(families("gumbel"), 0.0, 0.5)).layers().get(0);
        assertEquals(List.of("its reinstatement premium is pro rata as to time"), layer.refusals());
        for (SweepPoint point : layer.points()) {
            assertEquals(Engine.SIMULATION, point.figures().engine());
        }
        // τ = 0 draws the same numbers as independence: no noise at all
        assertEquals(0, layer.points().get(0).lift().value(), 1e-12);
        assertTrue(layer.points().get(0).slope().defined(), "a straight line between two simulated points");
    }

    /** Odds of a false alarm below 1e-5: 6 points at 5 standard errors, seed fixed. */
    @Test
    void checkPointsAgreeWithTheCurve() {
        SweepRequest request = new SweepRequest(families("gumbel", "frank"), List.of(0.0, 0.3, 0.6), FigureKind.EXPECTED_LOSS, 50_000);
        for (SweepPoint point : sweep(TwoPerils.treaty(TwoPerils.stopLoss()), request).layers().get(0).points()) {
            assertEquals(point.value().value(), point.check().expectedLoss().value(), 5 * point.check().expectedLoss().error(),
                    point.family().label() + " τ " + point.kendallTau());
            assertFalse(point.check().expectedLoss().error() == 0);
        }
    }

    @Test
    void slopesFollowTheCurve() {
        SweepPoint point = sweep(TwoPerils.treaty(TwoPerils.stopLoss()), request(families("gaussian"), 0.3)).layers().get(0).points().get(0);
        List<SweepPoint> around = sweep(TwoPerils.treaty(TwoPerils.stopLoss()), request(families("gaussian"), 0.299, 0.301)).layers().get(0).points();
        double central = (around.get(1).value().value() - around.get(0).value().value()) / 0.002;
        assertEquals(central, point.slope().value(), 0.01 * central);
    }

    @Test
    void spreadIsHighestLessLowestOfTheFamilies() {
        LayerSweep layer = sweep(TwoPerils.treaty(TwoPerils.stopLoss()), request(families("gumbel", "clayton", "frank"), 0.4)).layers().get(0);
        LayerSweep.Spread spread = layer.spreads().get(0);
        assertEquals(layer.points().stream().mapToDouble(p -> p.value().value()).max().orElseThrow(), spread.highest().value());
        assertEquals(layer.points().stream().mapToDouble(p -> p.value().value()).min().orElseThrow(), spread.lowest().value());
        assertEquals(spread.highest().value() - spread.lowest().value(), spread.width().value());
    }

    @Test
    void strengthsThatAFamilyCannotHaveAreRefusedByName() {
        InadmissibleException e = assertThrows(InadmissibleException.class,
                () -> sweep(TwoPerils.treaty(TwoPerils.stopLoss()), request(families("gumbel", "gaussian"), -0.2)));
        assertEquals(1, e.findings().size(), "gaussian between two perils may be negative");
        assertEquals("taus: found -0.2; admissible: gumbel between 2 perils has τ from 0 up to below 1", e.getMessage());
    }

    @Test
    void repetitionsAndFamiliesWithoutStrengthAreRefused() {
        assertThrows(InadmissibleException.class, () -> request(families("gumbel", "gumbel"), 0.1));
        assertThrows(InadmissibleException.class, () -> request(families("gumbel"), 0.1, 0.1));
        assertThrows(InadmissibleException.class, () -> request(families("comonotonic"), 1.0));
        assertThrows(InadmissibleException.class, () -> request(List.of(), 0.1));
        assertThrows(InadmissibleException.class, () -> request(families("gumbel")));
    }
}
