package layerweft.study;

import java.util.List;
import layerweft.engine.RunControl;
import layerweft.engine.simulation.PerilDrivers;
import layerweft.engine.simulation.PerilShares;
import layerweft.engine.simulation.SimulationSettings;
import layerweft.model.treaty.Treaty;

/**
 * Which perils drive each layer and what the buyer keeps, in all years and in bad ones: those from the value at risk at the buyer's tail level on.
 *
 * @param layers in the order of the programme, at their shares
 * @param kept gross less recoveries, without premiums
 */
public record Drivers(Treaty treaty, SimulationSettings settings, List<PerilShares> layers, PerilShares kept) {

    public Drivers {
        layers = List.copyOf(layers);
    }

    /** @throws java.util.concurrent.CancellationException if the control stops it */
    public static Drivers of(Treaty treaty, SimulationSettings settings, RunControl control) {
        List<PerilShares> shares = PerilDrivers.run(treaty, treaty.programme().buyer().tailLevel(), settings, control);
        int layers = treaty.layers();
        return new Drivers(treaty, settings, shares.subList(0, layers), shares.get(layers));
    }
}
