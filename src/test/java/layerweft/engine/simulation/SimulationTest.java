package layerweft.engine.simulation;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.concurrent.CancellationException;
import java.util.concurrent.atomic.AtomicLong;
import layerweft.engine.RunControl;
import layerweft.model.InadmissibleException;
import layerweft.model.copula.Archimedean;
import layerweft.model.copula.ArchimedeanFamily;
import layerweft.model.copula.Gaussian;
import layerweft.model.copula.Independence;
import layerweft.model.frequency.Poisson;
import layerweft.model.portfolio.Dependence;
import layerweft.model.portfolio.EventLoss;
import layerweft.model.portfolio.Peril;
import layerweft.model.portfolio.Portfolio;
import layerweft.model.severity.Lognormal;
import layerweft.model.severity.Pareto;
import layerweft.model.treaty.AnnualTerms;
import layerweft.model.treaty.Buyer;
import layerweft.model.treaty.Layer;
import layerweft.model.treaty.OccurrenceTerms;
import layerweft.model.treaty.Pricing;
import layerweft.model.treaty.Programme;
import layerweft.model.treaty.Treaty;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;

class SimulationTest {

    static Treaty treaty(Dependence dependence, Layer... layers) {
        Portfolio portfolio = new Portfolio("two perils", "EUR", "million", List.of(
                new Peril("storm", new Poisson(1.5), new EventLoss.Single(Lognormal.ofMeanAndCv(10, 2))),
                new Peril("flood", new Poisson(0.8), new EventLoss.Single(new Pareto(5, 1.8)))), dependence);
        return new Treaty(portfolio, new Programme("programme", List.of(layers), Pricing.PLAIN, Buyer.USUAL));
    }

    static Dependence gumbel(Dependence.Links links) {
        return new Dependence(links, Archimedean.ofKendallTau(ArchimedeanFamily.GUMBEL, false, 0.4));
    }

    private static final Layer CAT = Layer.of("cat", OccurrenceTerms.excess(30, 20), AnnualTerms.NONE).withReinstatements(List.of(1.0));
    private static final Layer STOP_LOSS = Layer.of("stop loss", OccurrenceTerms.NONE, new AnnualTerms(40, 60));

    @ParameterizedTest
    @EnumSource(Dependence.Links.class)
    void theNumberOfThreadsNeverChangesABit(Dependence.Links links) {
        Treaty treaty = treaty(gumbel(links), CAT, STOP_LOSS);
        long years = links == Dependence.Links.COUNTS ? 100_000 : 700_000;
        SimulationResult one = Simulation.run(treaty, new SimulationSettings(years, 3, 1), RunControl.NONE);
        for (int threads : new int[] {2, 8}) {
            SimulationResult more = Simulation.run(treaty, new SimulationSettings(years, 3, threads), RunControl.NONE);
            assertEquals(one.layers(), more.layers());
            assertEquals(one.whole(), more.whole());
        }
    }

    @Test
    void anotherSeedGivesAnotherSample() {
        Treaty treaty = treaty(gumbel(Dependence.Links.COUNTS), CAT);
        assertNotEquals(Simulation.run(treaty, new SimulationSettings(10_000, 3, 1), RunControl.NONE).layers(),
                Simulation.run(treaty, new SimulationSettings(10_000, 4, 1), RunControl.NONE).layers());
    }

    @Test
    void moreYearsContinueTheSameSample() {
        Treaty treaty = treaty(gumbel(Dependence.Links.COUNTS), STOP_LOSS);
        double few = Simulation.run(treaty, new SimulationSettings(200_000, 5, 2), RunControl.NONE).layers().get(0).expectedLoss().error();
        double many = Simulation.run(treaty, new SimulationSettings(800_000, 5, 2), RunControl.NONE).layers().get(0).expectedLoss().error();
        assertEquals(2, few / many, 0.1);
    }

    /**
     * Common random numbers: the difference of two structures, or of two copulas, is far less noisy than that of two runs apart. Over 24
     * seeds the variance of the paired difference is below a third of the unpaired one (a chance of about 1 in 1,000 to fail if the ratio
     * were one half; the observed ratios are below one tenth for structures).
     */
    @Test
    void structuresAndCopulasShareTheirRandomNumbers() {
        Layer higher = Layer.of("cat", OccurrenceTerms.excess(30, 22), new AnnualTerms(5, 60));
        Layer lower = Layer.of("cat", OccurrenceTerms.excess(30, 20), new AnnualTerms(5, 60));
        Treaty a = treaty(gumbel(Dependence.Links.COUNTS), lower);
        Treaty b = treaty(gumbel(Dependence.Links.COUNTS), higher);
        assertBelow(0.33, pairedToUnpaired(a, b));
        Treaty clayton = treaty(new Dependence(Dependence.Links.COUNTS, Archimedean.ofKendallTau(ArchimedeanFamily.CLAYTON, true, 0.4)), lower);
        assertBelow(0.6, pairedToUnpaired(a, clayton));
    }

    private static void assertBelow(double bound, double ratio) {
        assertTrue(ratio < bound, "variance of the paired difference by that of the unpaired: " + ratio);
    }

    private static double pairedToUnpaired(Treaty a, Treaty b) {
        int runs = 24;
        double[] x = new double[runs];
        double[] y = new double[runs];
        for (int r = 0; r < runs; r++) {
            x[r] = attachment(a, r);
            y[r] = attachment(b, r);
        }
        double[] paired = new double[runs];
        double[] apart = new double[runs];
        for (int r = 0; r < runs; r++) {
            paired[r] = x[r] - y[r];
            apart[r] = x[r] - y[(r + 1) % runs];
        }
        return variance(paired) / variance(apart);
    }

    private static double attachment(Treaty treaty, int seed) {
        return Simulation.run(treaty, new SimulationSettings(20_000, seed, 2), RunControl.NONE).layers().get(0).attachmentProbability().value();
    }

    private static double variance(double[] values) {
        double mean = java.util.Arrays.stream(values).average().orElseThrow();
        return java.util.Arrays.stream(values).map(v -> (v - mean) * (v - mean)).sum() / (values.length - 1);
    }

    @Test
    void itStopsWhenAskedTo() {
        Treaty treaty = treaty(gumbel(Dependence.Links.COUNTS), CAT);
        AtomicLong seen = new AtomicLong();
        RunControl stopAfterThreeBlocks = new RunControl() {
            @Override
            public void progress(long done, long total) {
                seen.incrementAndGet();
            }

            @Override
            public boolean cancelled() {
                return seen.get() >= 3;
            }
        };
        assertThrows(CancellationException.class,
                () -> Simulation.run(treaty, new SimulationSettings(SimulationSettings.MOST_YEARS, 1, 2), stopAfterThreeBlocks));
        assertTrue(seen.get() < 10, "blocks after the stop: " + seen.get());
    }

    @Test
    void anInterruptedCallerStopsIt() {
        Treaty treaty = treaty(gumbel(Dependence.Links.COUNTS), CAT);
        Thread.currentThread().interrupt();
        assertThrows(CancellationException.class, () -> Simulation.run(treaty, new SimulationSettings(1_000_000_000, 1, 1), RunControl.NONE));
        assertTrue(Thread.interrupted(), "the interrupt is kept for the caller");
    }

    @Test
    void progressEndsAtTheYearsAskedFor() {
        AtomicLong most = new AtomicLong();
        RunControl watch = new RunControl() {
            @Override
            public void progress(long done, long total) {
                assertEquals(50_000, total);
                most.accumulateAndGet(done, Math::max);
            }

            @Override
            public boolean cancelled() {
                return false;
            }
        };
        Simulation.run(treaty(gumbel(Dependence.Links.COUNTS), CAT), new SimulationSettings(50_000, 1, 2), watch);
        assertEquals(50_000, most.get());
    }

    @Test
    void settingsOutOfRangeAreRefusedByName() {
        assertEquals("years", assertThrows(InadmissibleException.class, () -> new SimulationSettings(0, 1, 1)).findings().get(0).field());
        assertEquals("threads", assertThrows(InadmissibleException.class, () -> new SimulationSettings(1_000, 1, 0)).findings().get(0).field());
    }

    @Test
    void infiniteMeansAreInfiniteAndNeverNaN() {
        Portfolio heavy = new Portfolio("heavy", "EUR", "", List.of(new Peril("p", new Poisson(1), new EventLoss.Single(new Pareto(1, 0.8)))),
                Dependence.NONE);
        Layer unlimited = Layer.of("unlimited", OccurrenceTerms.excess(Double.POSITIVE_INFINITY, 2), AnnualTerms.NONE);
        SimulationResult result = Simulation.run(new Treaty(heavy, new Programme("p", List.of(unlimited, CAT), Pricing.PLAIN, Buyer.USUAL)),
                new SimulationSettings(20_000, 1, 1), RunControl.NONE);
        assertEquals(Double.POSITIVE_INFINITY, result.layers().get(0).expectedLoss().value());
        assertEquals(Double.POSITIVE_INFINITY, result.layers().get(0).standardDeviation().value());
        assertEquals(Double.POSITIVE_INFINITY, result.layers().get(0).technicalPremium().value());
        assertEquals(Double.POSITIVE_INFINITY, result.whole().gross().mean().value());
        assertTrue(result.layers().get(1).expectedLoss().value() < 60);
        assertTrue(result.layers().get(1).expectedLoss().error() > 0);
    }

    /** The expected loss of an occurrence-only layer is known exactly whatever the copula: the control variate leaves no error at all. */
    @Test
    void occurrenceOnlyLayersHaveNoSamplingError() {
        Layer occurrence = Layer.of("occurrence", OccurrenceTerms.excess(30, 20), AnnualTerms.NONE);
        double independent = Simulation.run(treaty(new Dependence(Dependence.Links.COUNTS, new Independence()), occurrence),
                new SimulationSettings(10_000, 1, 1), RunControl.NONE).layers().get(0).expectedLoss().value();
        double gaussian = Simulation.run(treaty(new Dependence(Dependence.Links.COUNTS, Gaussian.ofKendallTau(0.7)), occurrence),
                new SimulationSettings(10_000, 2, 1), RunControl.NONE).layers().get(0).expectedLoss().value();
        assertEquals(independent, gaussian, 1e-9 * independent);
    }
}
