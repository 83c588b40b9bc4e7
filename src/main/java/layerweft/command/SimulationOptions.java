package layerweft.command;

import layerweft.engine.simulation.SimulationSettings;
import picocli.CommandLine.Option;

/** How much is simulated. */
final class SimulationOptions {

    @Option(names = "--years", paramLabel = "N", defaultValue = "1000000", description = "Simulated years (default: ${DEFAULT-VALUE}).")
    private long years;

    @Option(names = "--seed", paramLabel = "N", defaultValue = "1",
            description = "Seed of the simulation (default: ${DEFAULT-VALUE}). The same seed gives the same digits.")
    private long seed;

    @Option(names = "--threads", paramLabel = "N", description = "Working threads (default: all cores). Never changes a result.")
    private Integer threads;

    /** @throws layerweft.model.InadmissibleException naming the option's field */
    SimulationSettings settings() {
        return new SimulationSettings(years, seed, threads == null ? SimulationSettings.usual().threads() : threads);
    }
}
