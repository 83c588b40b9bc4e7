package layerweft.engine.transform;

import java.nio.file.Path;
import java.util.concurrent.TimeUnit;
import layerweft.file.TreatyReader;
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
 * Pricing of a treaty's layers when only the copula changes, on one thread. The treaty is read from the folder given by
 * {@code -Dlayerweft.treaty} (portfolio.json, programme.json).
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
        Path folder = Path.of(System.getProperty("layerweft.treaty", "src/test/resources/reference/cases/e07-gumbel-3"));
        treaty = TreatyReader.read(folder.resolve("portfolio.json"), folder.resolve("programme.json"));
        engine = new TransformEngine(treaty, Accuracy.USUAL);
        price(engine);
    }

    /** All layers after a change of the dependence alone. */
    @Benchmark
    public double anotherTau() {
        turn = (turn + 1) % 100;
        return price(engine.with(copula(tau + turn * 1e-5)));
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
