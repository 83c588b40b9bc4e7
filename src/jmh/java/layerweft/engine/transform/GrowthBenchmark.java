package layerweft.engine.transform;

import java.util.List;
import java.util.concurrent.TimeUnit;
import java.util.stream.IntStream;
import layerweft.model.copula.Archimedean;
import layerweft.model.copula.ArchimedeanFamily;
import layerweft.model.frequency.Poisson;
import layerweft.model.portfolio.Dependence;
import layerweft.model.portfolio.EventLoss;
import layerweft.model.portfolio.Peril;
import layerweft.model.portfolio.Portfolio;
import layerweft.model.severity.Capped;
import layerweft.model.severity.Lognormal;
import layerweft.model.treaty.AnnualTerms;
import layerweft.model.treaty.Buyer;
import layerweft.model.treaty.Layer;
import layerweft.model.treaty.OccurrenceTerms;
import layerweft.model.treaty.Pricing;
import layerweft.model.treaty.Programme;
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
 * How the time for another strength of dependence grows with the perils, among which the same events are shared out, and with the layers, all
 * alike. More events a year ask for finer lattices of their own: that is another growth, and is kept out.
 */
@State(Scope.Thread)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MILLISECONDS)
@Fork(1)
@Warmup(iterations = 3, time = 1)
@Measurement(iterations = 5, time = 1)
public class GrowthBenchmark {

    private static final double EVENTS = 8;

    @Param({"1", "2", "4", "8", "16", "32", "64"})
    public int perils;

    @Param({"1", "4"})
    public int layers;

    private TransformEngine engine;
    private int turn;

    @Setup
    public void make() {
        List<Peril> all = IntStream.range(0, perils).mapToObj(i -> new Peril("peril " + i, new Poisson(EVENTS / perils),
                new EventLoss.Single(new Capped(Lognormal.ofMeanAndCv(14, 2), 900)))).toList();
        List<Layer> alike = IntStream.range(0, layers).mapToObj(j -> Layer.of("cat " + j, OccurrenceTerms.excess(30, 20), new AnnualTerms(0, 90))).toList();
        Dependence dependence = new Dependence(Dependence.Links.COUNTS, Archimedean.ofKendallTau(ArchimedeanFamily.GUMBEL, false, 0.3));
        engine = new TransformEngine(new Treaty(new Portfolio("growth", "EUR", "million", all, dependence),
                new Programme("alike", alike, Pricing.PLAIN, new Buyer(List.of(10.0, 100.0, 200.0), 0.99, 0.06))), Accuracy.USUAL);
        anotherTau();
    }

    @Benchmark
    public double anotherTau() {
        turn = (turn + 1) % 100;
        TransformEngine other = engine.with(Archimedean.ofKendallTau(ArchimedeanFamily.GUMBEL, false, 0.3 + turn * 1e-5));
        double sum = 0;
        for (int j = 0; j < layers; j++) {
            sum += other.price(j).expectedLoss().value();
        }
        return sum;
    }
}
