package layerweft.engine.simulation;

import layerweft.model.Check;

/**
 * How much is simulated, and from which seed. The number of threads never changes a result.
 *
 * @param years simulated years, from {@value #FEWEST_YEARS} to {@value #MOST_YEARS}
 * @param seed any number; the same seed gives the same bits
 * @param threads working threads, from 1 to 1,024
 */
public record SimulationSettings(long years, long seed, int threads) {

    /** With fewer there is no standard error worth the name. */
    public static final long FEWEST_YEARS = 100;

    /** Beyond this the integer counts of a thread could overflow. */
    public static final long MOST_YEARS = 2_000_000_000L;

    public SimulationSettings {
        new Check().that(years >= FEWEST_YEARS && years <= MOST_YEARS, "years", years, "from " + FEWEST_YEARS + " to " + MOST_YEARS)
                .that(threads >= 1 && threads <= 1024, "threads", threads, "from 1 to 1024").orThrow();
    }

    /** 1,000,000 years, seed 1, all cores. */
    public static SimulationSettings usual() {
        return new SimulationSettings(1_000_000, 1, Math.min(1024, Runtime.getRuntime().availableProcessors()));
    }
}
