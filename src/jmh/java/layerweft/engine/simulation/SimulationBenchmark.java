package layerweft.engine.simulation;

import java.util.concurrent.TimeUnit;
import layerweft.engine.RunControl;
import layerweft.model.treaty.Treaty;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Warmup;

/**
 * 1,000,000 years of four perils under five layers, all figures included, on one thread and on two, beside the bare loop of draws on one
 * thread. Read the ratios: the machine's own speed cancels.
 */
@State(Scope.Benchmark)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MILLISECONDS)
@Warmup(iterations = 4, time = 1)
@Measurement(iterations = 7, time = 1)
@Fork(1)
public class SimulationBenchmark {
    private static final int YEARS = 1_000_000;

    private final Treaty treaty = FourPerils.treaty();
    private final BareLoop bare = new BareLoop(treaty.portfolio());
    private long seed;

    @Benchmark
    public double bareLoop() {
        return bare.run(seed++, YEARS);
    }

    @Benchmark
    public SimulationResult oneThread() {
        return Simulation.run(treaty, new SimulationSettings(YEARS, seed++, 1), RunControl.NONE);
    }

    @Benchmark
    public SimulationResult twoThreads() {
        return Simulation.run(treaty, new SimulationSettings(YEARS, seed++, 2), RunControl.NONE);
    }
}
