package layerweft.study;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import layerweft.model.frequency.Binomial;
import layerweft.model.frequency.EmpiricalCounts;
import layerweft.model.frequency.FrequencyModel;
import layerweft.model.frequency.NegativeBinomial;
import layerweft.model.frequency.Poisson;
import layerweft.model.severity.Beta;
import layerweft.model.severity.Burr;
import layerweft.model.severity.Capped;
import layerweft.model.severity.DiscreteLosses;
import layerweft.model.severity.Exponential;
import layerweft.model.severity.Gamma;
import layerweft.model.severity.GeneralizedPareto;
import layerweft.model.severity.InverseGaussian;
import layerweft.model.severity.Loglogistic;
import layerweft.model.severity.Lognormal;
import layerweft.model.severity.Mbbefd;
import layerweft.model.severity.Mixture;
import layerweft.model.severity.Pareto;
import layerweft.model.severity.SeverityModel;
import layerweft.model.severity.Spliced;
import layerweft.model.severity.Weibull;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

class StressTest {
    private static final double FACTOR = 1.1;

    static Stream<SeverityModel> withTail() {
        return Stream.of(new Lognormal(2, 1.2), new Pareto(5, 1.6), new GeneralizedPareto(2, 6, 0.3), new GeneralizedPareto(2, 6, -0.3),
                new Gamma(2, 5), new Weibull(0.8, 10), new Burr(2, 1.5, 10), new Loglogistic(2.5, 8), new InverseGaussian(10, 6),
                new Beta(1.2, 6, 100), new Mbbefd(0.5, 20, 100), new Capped(new Pareto(10, 1.1), 1000), new Capped(new Lognormal(2, 1.5), 200),
                new Mixture(List.of(0.4, 0.6), List.of(new Exponential(5), new Pareto(5, 2.2))));
    }

    static Stream<SeverityModel> all() {
        return Stream.concat(withTail(), Stream.of(new Exponential(3), new DiscreteLosses(List.of(1.0, 4.0, 9.0), List.of(0.5, 0.3, 0.2)),
                new Spliced(new Lognormal(1, 1), 20, new Pareto(20, 1.8), 0.05)));
    }

    @ParameterizedTest
    @MethodSource("withTail")
    void heavierTailsHoldTheMeanAndSpreadTheLosses(SeverityModel model) {
        SeverityModel heavier = TailStress.heavier(model, FACTOR).orElseThrow();
        assertEquals(model.mean(), heavier.mean(), 1e-9 * model.mean());
        double large = 2 * model.mean();
        assertTrue(heavier.limitedMean(large) < model.limitedMean(large), "a stop loss at twice the mean costs more");
        SeverityModel lighter = TailStress.heavier(model, 1 / FACTOR).orElseThrow();
        assertTrue(lighter.limitedMean(large) > model.limitedMean(large));
    }

    @Test
    void parametersMoveAsDocumented() {
        assertEquals(1.6 / FACTOR, ((Pareto) TailStress.heavier(new Pareto(5, 1.6), FACTOR).orElseThrow()).alpha(), 1e-12);
        assertEquals(0.33, ((GeneralizedPareto) TailStress.heavier(new GeneralizedPareto(2, 6, 0.3), FACTOR).orElseThrow()).shape(), 1e-12);
        assertEquals(-0.27, ((GeneralizedPareto) TailStress.heavier(new GeneralizedPareto(2, 6, -0.3), FACTOR).orElseThrow()).shape(), 1e-12);
        assertEquals(2, ((GeneralizedPareto) TailStress.heavier(new GeneralizedPareto(2, 6, 0.3), FACTOR).orElseThrow()).threshold());
        Gamma gamma = (Gamma) TailStress.heavier(new Gamma(2, 5), FACTOR).orElseThrow();
        assertEquals(FACTOR / Math.sqrt(2), 1 / Math.sqrt(gamma.shape()), 1e-12, "coefficient of variation");
        Mbbefd mbbefd = (Mbbefd) TailStress.heavier(new Mbbefd(0.5, 20, 100), FACTOR).orElseThrow();
        assertEquals(FACTOR / 20, 1 / mbbefd.g(), 1e-12, "chance of a total loss");
    }

    @Test
    void infiniteMeansAreLeftInfinite() {
        Pareto heavier = (Pareto) TailStress.heavier(new Pareto(5, 0.9), FACTOR).orElseThrow();
        assertEquals(5, heavier.threshold());
        assertEquals(5, ((Pareto) TailStress.heavier(new Pareto(5, 1.05), FACTOR).orElseThrow()).threshold());
    }

    @Test
    void splicedLawsChangeAboveTheirThresholdOnly() {
        Spliced spliced = new Spliced(new Lognormal(1, 1), 20, new Pareto(20, 1.8), 0.05);
        SeverityModel heavier = TailStress.heavier(spliced, FACTOR).orElseThrow();
        assertEquals(spliced.survival(7), heavier.survival(7), 1e-14);
        assertEquals(0.05, heavier.survival(20), 1e-14);
        assertEquals(0.05 * Math.pow(0.2, 1.8 / FACTOR), heavier.survival(100), 1e-12);
    }

    @Test
    void lawsWithoutATailParameterSaySo() {
        assertEquals(Optional.empty(), TailStress.heavier(new Exponential(3), FACTOR));
        assertEquals(Optional.empty(), TailStress.heavier(new GeneralizedPareto(0, 3, 0), FACTOR));
        assertEquals(Optional.empty(), TailStress.heavier(new DiscreteLosses(List.of(1.0), List.of(1.0)), FACTOR));
        assertEquals(Optional.empty(), TailStress.heavier(new Capped(new Exponential(3), 10), FACTOR));
        assertEquals(Optional.empty(), TailStress.heavier(new Mixture(List.of(1.0), List.of(new Exponential(3))), FACTOR));
        assertEquals(Optional.empty(), TailStress.heavier(new Mbbefd(0.5, 1.05, 10), FACTOR));
    }

    @ParameterizedTest
    @MethodSource("all")
    void scalingMultipliesEveryAmount(SeverityModel model) {
        SeverityModel scaled = SeverityScale.scaled(model, 2.5);
        assertEquals(2.5 * model.mean(), scaled.mean(), 1e-9 * model.mean());
        for (double x : new double[] {0.7, 3, 12, 60, 250}) {
            assertEquals(model.survival(x), scaled.survival(2.5 * x), 1e-10, "at " + x);
        }
    }

    static Stream<FrequencyModel> counts() {
        return Stream.of(new Poisson(2), new NegativeBinomial(2, 1.4), new Binomial(5, 0.4), new EmpiricalCounts(List.of(0.5, 0.3, 0.2)));
    }

    @ParameterizedTest
    @MethodSource("counts")
    void frequenciesKeepTheirKind(FrequencyModel model) {
        FrequencyModel more = FrequencyStress.meanTimes(model, FACTOR).orElseThrow();
        assertEquals(FACTOR * model.mean(), more.mean(), 1e-12 * model.mean());
        assertEquals(model.getClass(), more.getClass());
    }

    @Test
    void chancesStayBelowOne() {
        assertEquals(Optional.empty(), FrequencyStress.meanTimes(new Binomial(5, 0.95), FACTOR));
        assertEquals(Optional.empty(), FrequencyStress.meanTimes(new EmpiricalCounts(List.of(0.05, 0.95)), FACTOR));
    }
}
