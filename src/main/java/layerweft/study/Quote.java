package layerweft.study;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import layerweft.engine.RunControl;
import layerweft.engine.simulation.Simulation;
import layerweft.engine.simulation.SimulationResult;
import layerweft.engine.simulation.SimulationSettings;
import layerweft.engine.transform.Accuracy;
import layerweft.engine.transform.TransformEngine;
import layerweft.figures.BuyerPosition;
import layerweft.figures.Figure;
import layerweft.figures.LayerFigures;
import layerweft.figures.LayerStatistics;
import layerweft.figures.WholeStatistics;
import layerweft.model.treaty.Treaty;

/**
 * The figures of a treaty: of each layer, of the whole, and the buyer's. Money is in the portfolio's unit, layers at their shares.
 *
 * @param layers in the order of the programme
 * @param notes for each layer what a reader should know of it, possibly nothing
 * @param whole gross, ceded and net: simulated, but for the ceded mean, which is the sum of the layers'
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
     * Prices a treaty: each layer by the engine that is asked for, the whole by simulation.
     *
     * @throws EngineRefusedException if the transform is asked for and cannot price a layer
     * @throws java.util.concurrent.CancellationException if the control stops it
     */
    public static Quote of(Treaty treaty, EngineChoice choice, SimulationSettings settings, RunControl control) {
        List<Optional<String>> refusals = refusals(treaty, choice);
        List<LayerStatistics> priced = new ArrayList<>();
        TransformEngine transform = new TransformEngine(treaty, Accuracy.USUAL);
        for (int j = 0; j < treaty.layers(); j++) {
            priced.add(choice != EngineChoice.SIMULATION && refusals.get(j).isEmpty() ? transform.price(j) : null);
        }
        SimulationResult simulated = Simulation.run(treaty, settings, control);
        List<LayerFigures> layers = new ArrayList<>();
        List<List<String>> notes = new ArrayList<>();
        for (int j = 0; j < treaty.layers(); j++) {
            LayerStatistics simulation = simulated.layers().get(j);
            LayerStatistics statistics = priced.get(j) == null ? simulation : largestEventKnown(priced.get(j), simulation);
            layers.add(LayerFigures.of(treaty.layer(j), treaty.programme().buyer(), statistics));
            notes.add(LayerNotes.of(treaty, j, refusals.get(j)));
        }
        WholeStatistics whole = simulated.whole().withCeded(layers);
        return new Quote(treaty, settings, layers, notes, whole, BuyerPosition.of(layers, whole));
    }

    /**
     * Where annual totals are joined, a copula of totals says nothing of a year's largest event, and the transform leaves it undefined;
     * the simulation, which rearranges whole years, has it.
     */
    private static LayerStatistics largestEventKnown(LayerStatistics priced, LayerStatistics simulated) {
        boolean known = priced.occurrenceValueAtRisk().values().stream().allMatch(Figure::defined);
        return known ? priced : priced.withOccurrence(simulated.occurrenceValueAtRisk());
    }

    /** For each layer why the transform is not used, where it would have been; the one place where the engine is decided. */
    private static List<Optional<String>> refusals(Treaty treaty, EngineChoice choice) {
        List<Optional<String>> refusals = new ArrayList<>();
        for (int j = 0; j < treaty.layers(); j++) {
            Optional<String> refusal = choice == EngineChoice.SIMULATION ? Optional.empty() : TransformEngine.refusal(treaty, j);
            if (choice == EngineChoice.TRANSFORM && refusal.isPresent()) {
                throw new EngineRefusedException(treaty.layer(j).name(), refusal.get());
            }
            refusals.add(refusal);
        }
        return refusals;
    }
}
