package layerweft.engine.simulation;

import java.util.List;
import layerweft.figures.LayerStatistics;
import layerweft.figures.WholeStatistics;

/**
 * What a simulation found.
 *
 * @param layers in the order of the programme, at 100 %
 * @param whole gross, ceded (at the layers' shares) and net
 */
public record SimulationResult(SimulationSettings settings, List<LayerStatistics> layers, WholeStatistics whole) {}
