package layerweft.study;

import java.util.List;
import java.util.concurrent.TimeUnit;
import java.util.stream.IntStream;
import layerweft.engine.RunControl;
import layerweft.engine.simulation.FourPerils;
import layerweft.engine.simulation.SimulationSettings;
import layerweft.model.copula.CopulaFamily;
import layerweft.model.treaty.Treaty;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Param;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Warmup;

/** Four perils under five layers, 7 families × 21 τ, all figures with lift, slope and spread, on one thread and on two. */
@State(Scope.Benchmark)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MILLISECONDS)
@Warmup(iterations = 3, time = 1)
@Measurement(iterations = 5, time = 1)
@Fork(1)
public class SweepBenchmark {
    private static final List<Double> TAUS = IntStream.range(0, 21).mapToObj(k -> k == 20 ? 0.97 : k * 0.05).toList();

    private final Treaty treaty = FourPerils.treaty();

    @Param({"1", "2"})
    private int threads;

    @Benchmark
    public Sweep usualFamilies() {
        return sweep(SweepRequest.USUAL_FAMILIES);
    }

    /** Without the family whose latent factor has two dimensions. */
    @Benchmark
    public Sweep withoutStudent() {
        return sweep(SweepRequest.USUAL_FAMILIES.stream().filter(f -> f.kind() != CopulaFamily.Kind.STUDENT).toList());
    }

    private Sweep sweep(List<CopulaFamily> families) {
        return Sweep.of(treaty, new SweepRequest(families, TAUS, FigureKind.EXPECTED_LOSS, 0), new SimulationSettings(1_000_000, 1, threads),
                RunControl.NONE);
    }
}
