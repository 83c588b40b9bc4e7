package layerweft.engine.transform;

import java.util.Collection;
import java.util.Locale;
import java.util.concurrent.TimeUnit;
import layerweft.engine.RunControl;
import layerweft.engine.simulation.FourPerils;
import layerweft.engine.simulation.Simulation;
import layerweft.engine.simulation.SimulationResult;
import layerweft.engine.simulation.SimulationSettings;
import layerweft.figures.Figure;
import layerweft.model.copula.Archimedean;
import layerweft.model.copula.ArchimedeanFamily;
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
import org.openjdk.jmh.results.RunResult;
import org.openjdk.jmh.runner.Runner;
import org.openjdk.jmh.runner.RunnerException;
import org.openjdk.jmh.runner.options.OptionsBuilder;

/**
 * How much longer a simulation takes than the transform to the same error of the expected loss, layer by layer, both on one thread in one
 * run. The simulation's error falls with the square root of its years, the transform's is a bound: years·(standard error ÷ bound)² years
 * would do. {@link #main} runs both and prints the ratios.
 */
@State(Scope.Benchmark)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MILLISECONDS)
@Warmup(iterations = 4, time = 1)
@Measurement(iterations = 7, time = 1)
@Fork(1)
public class EqualErrorBenchmark {
    private static final int YEARS = 1_000_000;

    private final Treaty treaty = FourPerils.treaty();
    private final TransformEngine engine = new TransformEngine(treaty, Accuracy.USUAL);
    private int turn;
    private long seed;

    @Benchmark
    public double transform() {
        turn = (turn + 1) % 100;
        TransformEngine other = engine.with(Archimedean.ofKendallTau(ArchimedeanFamily.GUMBEL, false, FourPerils.TAU + turn * 1e-5));
        double sum = 0;
        for (int j = 0; j < treaty.layers(); j++) {
            sum += other.price(j).expectedLoss().value();
        }
        return sum;
    }

    @Benchmark
    public SimulationResult simulation() {
        return Simulation.run(treaty, new SimulationSettings(YEARS, seed++, 1), RunControl.NONE);
    }

    public static void main(String[] args) throws RunnerException {
        Collection<RunResult> results = new Runner(new OptionsBuilder().include(EqualErrorBenchmark.class.getSimpleName()).build()).run();
        double transform = time(results, "transform");
        double simulation = time(results, "simulation");
        Treaty treaty = FourPerils.treaty();
        TransformEngine engine = new TransformEngine(treaty, Accuracy.USUAL);
        SimulationResult drawn = Simulation.run(treaty, new SimulationSettings(YEARS, 1, 1), RunControl.NONE);
        System.out.printf(Locale.ROOT, "all layers: transform %.2f ms, simulation of %,d years %.0f ms%n", transform, YEARS, simulation);
        for (int j = 0; j < treaty.layers(); j++) {
            Figure exact = engine.price(j).expectedLoss();
            Figure estimate = drawn.layers().get(j).expectedLoss();
            double ratio = simulation / transform * Math.pow(estimate.error() / exact.error(), 2);
            System.out.printf(Locale.ROOT, "%-14s bound %.1e, standard error %.1e: %,.0f times as long%n", treaty.layer(j).name(), exact.error(),
                    estimate.error(), ratio);
        }
    }

    private static double time(Collection<RunResult> results, String method) {
        return results.stream().filter(r -> r.getParams().getBenchmark().endsWith("." + method)).findFirst().orElseThrow()
                .getPrimaryResult().getScore();
    }
}
