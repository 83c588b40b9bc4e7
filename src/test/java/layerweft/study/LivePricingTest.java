package layerweft.study;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertSame;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.concurrent.CancellationException;
import layerweft.engine.RunControl;
import layerweft.engine.simulation.SimulationSettings;
import layerweft.engine.transform.Accuracy;
import layerweft.engine.transform.TransformEngine;
import layerweft.figures.Engine;
import layerweft.file.DemoFiles;
import layerweft.model.copula.CopulaFamily;
import layerweft.model.copula.Independence;
import layerweft.model.portfolio.Dependence;
import layerweft.model.treaty.Treaty;
import org.junit.jupiter.api.Test;

class LivePricingTest {
    private static final SimulationSettings SHORT = new SimulationSettings(5_000, 1, 1);

    private final Treaty demo = DemoFiles.treaty();

    private static Treaty at(Treaty treaty, double tau) {
        Dependence dependence = new Dependence(treaty.portfolio().dependence().links(), CopulaFamily.parse("gumbel").at(tau));
        return treaty.on(treaty.portfolio().with(dependence));
    }

    @Test
    void theNextCopulaIsPricedAsByANewEngine() {
        LivePricing pricing = new LivePricing(demo, SHORT);
        pricing.price(RunControl.NONE);
        Treaty turned = at(demo, 0.6);
        List<LiveLayer> layers = pricing.of(turned).price(RunControl.NONE);
        TransformEngine fresh = new TransformEngine(turned, Accuracy.USUAL);
        for (int j = 0; j < 3; j++) {
            double expected = fresh.price(j).expectedLoss().value() * demo.layer(j).share();
            assertEquals(expected, layers.get(j).figures().expectedLoss().value(), 1e-6 * expected);
        }
    }

    @Test
    void layersThatTheTransformRefusesAreSimulatedWithTheReason() {
        Treaty inuring = DemoFiles.treaty("demo-portfolios/harrow-coast.json", "treaties/harrow-coast-inuring.json");
        List<LiveLayer> layers = new LivePricing(inuring, SHORT).price(RunControl.NONE);
        assertEquals(List.of(Engine.TRANSFORM, Engine.SIMULATION, Engine.SIMULATION), layers.stream().map(l -> l.figures().engine()).toList());
        assertTrue(layers.get(1).simulatedBecause().orElseThrow().contains("inure"));
        assertEquals("it covers one peril", layers.get(0).unmoved().orElseThrow());
    }

    @Test
    void aRoughAnswerKeepsWhatNoCopulaMoves() {
        Treaty inuring = DemoFiles.treaty("demo-portfolios/harrow-coast.json", "treaties/harrow-coast-inuring.json");
        LivePricing pricing = new LivePricing(inuring, SHORT);
        LiveLayer surge = pricing.price(RunControl.NONE).get(0);
        assertSame(surge, pricing.rough(at(inuring, 0.5), RunControl.NONE).get(0));
        List<LiveLayer> fresh = LivePricing.rough(inuring, SHORT, RunControl.NONE);
        assertEquals(Engine.SIMULATION, fresh.get(0).figures().engine());
    }

    @Test
    void aCurveHasTheSameEngineAlongIt() {
        List<List<LiveLayer>> along = new LivePricing(demo, SHORT)
                .along(List.of(CopulaFamily.parse("gumbel").at(0.4), new Independence()), RunControl.NONE);
        double dependent = along.get(0).get(2).figures().expectedLoss().value();
        double independent = along.get(1).get(2).figures().expectedLoss().value();
        assertTrue(dependent > 1.5 * independent);
        assertEquals(along.get(0).get(2).figures().engine(), along.get(1).get(2).figures().engine());
    }

    @Test
    void aStopIsObeyed() {
        RunControl stopped = new RunControl() {
            @Override
            public void progress(long done, long total) {
                // nobody listens
            }

            @Override
            public boolean cancelled() {
                return true;
            }
        };
        assertThrows(CancellationException.class, () -> new LivePricing(demo, SHORT).price(stopped));
    }
}
