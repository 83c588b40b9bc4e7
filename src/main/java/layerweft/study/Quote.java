package layerweft.study;

import java.util.ArrayList;
import java.util.List;
import layerweft.engine.RunControl;
import layerweft.engine.simulation.Simulation;
import layerweft.engine.simulation.SimulationResult;
import layerweft.engine.simulation.SimulationSettings;
import layerweft.figures.BuyerPosition;
import layerweft.figures.LayerFigures;
import layerweft.figures.WholeStatistics;
import layerweft.model.treaty.Treaty;

/**
 * The figures of a treaty: of each layer, of the whole, and the buyer's. Money is in the portfolio's unit, layers at their shares.
 *
 * @param layers in the order of the programme
 * @param notes for each layer what a reader should know of it, possibly nothing
 * @param whole gross, ceded and net; always simulated
 */
public record Quote(
        Treaty treaty,
        SimulationSettings settings,
        List<LayerFigures> layers,
        List<List<String>> notes,
        WholeStatistics whole,
        BuyerPosition buyer) {

    public Quote {
        layers = List.copyOf(layers);
        notes = List.copyOf(notes);
    }

    /**
     * Prices a treaty.
     *
     * @throws java.util.concurrent.CancellationException if the control stops it
     */
    public static Quote of(Treaty treaty, EngineChoice engine, SimulationSettings settings, RunControl control) {
        SimulationResult simulated = Simulation.run(treaty, settings, control);
        List<LayerFigures> layers = new ArrayList<>();
        List<List<String>> notes = new ArrayList<>();
        for (int j = 0; j < treaty.layers(); j++) {
            layers.add(LayerFigures.of(treaty.layer(j), treaty.programme().buyer(), simulated.layers().get(j)));
            notes.add(LayerNotes.of(treaty, j));
        }
        return new Quote(treaty, settings, layers, notes, simulated.whole(), BuyerPosition.of(layers, simulated.whole()));
    }
}
