package layerweft.study;

/** Which engine is asked for. */
public enum EngineChoice {
    /** The transform for each layer that it can price, simulation for the rest. */
    AUTO,
    /** The transform for every layer, or nothing. */
    TRANSFORM,
    /** Simulation for every layer. */
    SIMULATION
}
