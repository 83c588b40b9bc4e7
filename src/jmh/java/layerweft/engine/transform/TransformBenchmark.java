package layerweft.engine.transform;

import java.util.concurrent.TimeUnit;
import layerweft.engine.simulation.FourPerils;
import layerweft.model.copula.Archimedean;
import layerweft.model.copula.ArchimedeanFamily;
import layerweft.model.copula.Copula;
import layerweft.model.copula.Gaussian;
import layerweft.model.copula.Student;
import layerweft.model.treaty.Treaty;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Param;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.Setup;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Warmup;

/**
 * Pricing of four perils under five layers when only the copula changes, and from nothing, on one thread.
 */
@State(Scope.Thread)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MILLISECONDS)
@Fork(1)
@Warmup(iterations = 3, time = 1)
@Measurement(iterations = 5, time = 1)
public class TransformBenchmark {

    @Param({"clayton", "gumbel", "frank", "joe", "survival-clayton", "gaussian", "student"})
    public String family;

    @Param({"0.3", "0.9"})
    public double tau;

    private Treaty treaty;
    private TransformEngine engine;
    private int turn;

    @Setup
    public void read() {
        treaty = FourPerils.treaty();
        engine = new TransformEngine(treaty, Accuracy.USUAL);
        price(engine);
    }

    /** All layers after a change of the dependence alone. */
    @Benchmark
    public double anotherTau() {
        turn = (turn + 1) % 100;
        return price(engine.with(copula(tau + turn * 1e-5)));
    }

    /** Five layers for the family at 21 strengths. */
    @Benchmark
    public double sweep() {
        double sum = 0;
        for (int k = 0; k <= 20; k++) {
            sum += price(engine.with(copula(Math.max(1e-3, Math.min(0.99, k * 0.05)))));
        }
        return sum;
    }

    /** All layers from nothing. */
    @Benchmark
    public double fromNothing() {
        return price(new TransformEngine(treaty, Accuracy.USUAL).with(copula(tau)));
    }

    private double price(TransformEngine which) {
        double sum = 0;
        for (int j = 0; j < treaty.layers(); j++) {
            sum += which.price(j).expectedLoss().value();
        }
        return sum;
    }

    private Copula copula(double strength) {
        return switch (family) {
            case "gaussian" -> Gaussian.ofKendallTau(strength);
            case "student" -> Student.ofKendallTau(strength, 4);
            case "survival-clayton" -> Archimedean.ofKendallTau(ArchimedeanFamily.CLAYTON, true, strength);
            default -> Archimedean.ofKendallTau(ArchimedeanFamily.valueOf(family.toUpperCase(java.util.Locale.ROOT)), false, strength);
        };
    }
}
