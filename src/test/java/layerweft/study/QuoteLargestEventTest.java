package layerweft.study;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import layerweft.engine.RunControl;
import layerweft.engine.simulation.Simulation;
import layerweft.engine.simulation.SimulationSettings;
import layerweft.figures.Engine;
import layerweft.figures.Figure;
import layerweft.file.DemoFiles;
import layerweft.model.treaty.Treaty;
import org.junit.jupiter.api.Test;

class QuoteLargestEventTest {

    @Test
    void joinedTotalsTakeTheLargestEventFromTheSimulation() {
        Treaty treaty = DemoFiles.treaty("demo-portfolios/brindle-vale.json", "treaties/brindle-vale-stop-loss.json");
        SimulationSettings settings = new SimulationSettings(131_072, 1, 2);
        Quote quote = Quote.of(treaty, EngineChoice.AUTO, settings, RunControl.NONE);
        var layer = quote.layers().get(2);
        assertEquals(Engine.TRANSFORM, layer.engine());
        var simulated = Simulation.run(treaty, settings, RunControl.NONE).layers().get(2);
        double share = treaty.layer(2).share();
        var occurrence = simulated.occurrenceValueAtRisk().values().stream().map(f -> f.times(share)).toList();
        for (Figure figure : layer.occurrence().values()) {
            assertTrue(figure.defined());
            assertTrue(occurrence.contains(figure), figure + " of " + occurrence);
        }
        assertEquals(5, layer.occurrence().size());
    }
}
