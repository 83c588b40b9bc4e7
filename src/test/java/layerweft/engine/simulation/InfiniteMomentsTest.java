package layerweft.engine.simulation;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import layerweft.engine.RunControl;
import layerweft.engine.transform.Accuracy;
import layerweft.engine.transform.Models;
import layerweft.engine.transform.TransformEngine;
import layerweft.figures.LayerStatistics;
import layerweft.figures.PositionStatistics;
import layerweft.model.copula.Independence;
import layerweft.model.frequency.Poisson;
import layerweft.model.portfolio.EventLoss;
import layerweft.model.portfolio.Peril;
import layerweft.model.portfolio.SubPeril;
import layerweft.model.severity.Exponential;
import layerweft.model.severity.Pareto;
import layerweft.model.treaty.AnnualTerms;
import layerweft.model.treaty.Layer;
import layerweft.model.treaty.OccurrenceTerms;
import layerweft.model.treaty.Treaty;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Figures that are infinite are shown as infinite, whatever a sample says: of layers, and of what is ceded. */
class InfiniteMomentsTest {
    private static final Layer OPEN = Layer.of("open", OccurrenceTerms.excess(Double.POSITIVE_INFINITY, 1), AnnualTerms.NONE);
    private static final Layer LIMITED = Layer.of("limited", OccurrenceTerms.excess(5, 1), AnnualTerms.NONE);

    private static Peril single(double alpha) {
        return Models.peril("fire", new Poisson(1), new Pareto(1, alpha));
    }

    private static Peril split(double alpha) {
        return new Peril("storm", new Poisson(1), new EventLoss.Split(List.of(new SubPeril("wind", 1, new Exponential(2)),
                new SubPeril("surge", 0.5, new Pareto(1, alpha))), new Independence()));
    }

    private static void assertInfinite(boolean mean, LayerStatistics layer, PositionStatistics side) {
        assertEquals(mean, layer.expectedLoss().infinite(), layer.expectedLoss()::toString);
        assertTrue(layer.standardDeviation().infinite(), layer.standardDeviation()::toString);
        assertEquals(mean, layer.tailValueAtRisk().infinite());
        assertEquals(mean, side.mean().infinite());
        assertTrue(side.standardDeviation().infinite());
        assertEquals(mean, side.tailValueAtRisk().infinite());
    }

    @ParameterizedTest
    @ValueSource(doubles = {0.9, 1.5})
    void unlimitedLayersOfHeavyTails(double alpha) {
        for (Peril peril : List.of(single(alpha), split(alpha))) {
            Treaty treaty = Models.counts(List.of(peril), new Independence(), OPEN, LIMITED);
            SimulationResult result = Simulation.run(treaty, new SimulationSettings(5000, 1, 1), RunControl.NONE);
            assertInfinite(alpha < 1, result.layers().get(0), result.whole().ceded());
            assertEquals(new TransformEngine(treaty, Accuracy.of(1e-4)).price(0).expectedLoss().infinite(), result.layers().get(0).expectedLoss().infinite());
            assertFalse(result.layers().get(1).standardDeviation().infinite());
        }
    }

    @ParameterizedTest
    @ValueSource(doubles = {0.9, 1.5})
    void limitedLayersCedeFiniteAmounts(double alpha) {
        Treaty treaty = Models.counts(List.of(split(alpha), single(alpha)), new Independence(), LIMITED,
                Layer.of("year", OccurrenceTerms.NONE, new AnnualTerms(2, 10)));
        SimulationResult result = Simulation.run(treaty, new SimulationSettings(5000, 1, 1), RunControl.NONE);
        assertFalse(result.whole().ceded().standardDeviation().infinite() || result.whole().ceded().mean().infinite());
        assertTrue(result.whole().gross().standardDeviation().infinite());
    }
}
