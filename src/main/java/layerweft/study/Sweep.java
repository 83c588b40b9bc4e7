package layerweft.study;

import java.util.List;
import layerweft.engine.RunControl;
import layerweft.engine.simulation.SimulationSettings;
import layerweft.model.treaty.Treaty;

/**
 * The layers of a treaty under families of copulas of rising strength: how far dependence between the perils can move a price. The links of
 * the portfolio's dependence (counts or annual totals) are kept, its own copula is not looked at.
 *
 * @param settings of the layers that the transform cannot price, which are simulated with the same random numbers at every point
 * @param layers in the order of the programme
 */
public record Sweep(Treaty treaty, SweepRequest request, SimulationSettings settings, List<LayerSweep> layers) {

    public Sweep {
        layers = List.copyOf(layers);
    }

    /**
     * Sweeps.
     *
     * @throws layerweft.model.InadmissibleException if a family cannot have one of the τ between the portfolio's perils, or a check is asked
     *     for that is longer than a simulation can be
     * @throws java.util.concurrent.CancellationException if the control stops it
     */
    public static Sweep of(Treaty treaty, SweepRequest request, SimulationSettings settings, RunControl control) {
        request.requireAdmissible(treaty.portfolio().perils().size());
        return new Sweep(treaty, request, settings, new SweepRun(treaty, request, settings, control).layers());
    }

    /** Whether any point comes from a simulation. */
    public boolean simulated() {
        return request.check() > 0 || layers.stream().anyMatch(layer -> !layer.refusals().isEmpty());
    }
}
