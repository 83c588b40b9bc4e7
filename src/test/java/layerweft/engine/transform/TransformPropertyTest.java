package layerweft.engine.transform;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.SplittableRandom;
import java.util.stream.LongStream;
import layerweft.figures.LayerStatistics;
import layerweft.model.copula.Archimedean;
import layerweft.model.copula.ArchimedeanFamily;
import layerweft.model.copula.Comonotonic;
import layerweft.model.copula.Copula;
import layerweft.model.copula.Gaussian;
import layerweft.model.copula.Independence;
import layerweft.model.copula.Student;
import layerweft.model.frequency.NegativeBinomial;
import layerweft.model.frequency.Poisson;
import layerweft.model.portfolio.Peril;
import layerweft.model.severity.Capped;
import layerweft.model.severity.GeneralizedPareto;
import layerweft.model.severity.Lognormal;
import layerweft.model.severity.Pareto;
import layerweft.model.severity.SeverityModel;
import layerweft.model.treaty.AnnualTerms;
import layerweft.model.treaty.Layer;
import layerweft.model.treaty.OccurrenceTerms;
import layerweft.model.treaty.Treaty;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** What holds for any model, on seeded random ones; nothing here is a matter of chance once the seed is given. */
class TransformPropertyTest {

    static LongStream seeds() {
        return LongStream.range(1, 9);
    }

    private static Treaty random(SplittableRandom random, Layer... layers) {
        List<Peril> perils = new ArrayList<>();
        int d = 2 + random.nextInt(3);
        for (int i = 0; i < d; i++) {
            double mean = Math.exp(random.nextDouble(-4, 1.2));
            SeverityModel severity = switch (random.nextInt(3)) {
                case 0 -> Lognormal.ofMeanAndCv(random.nextDouble(5, 30), random.nextDouble(0.5, 3));
                case 1 -> new Capped(new Pareto(random.nextDouble(2, 15), random.nextDouble(0.9, 3)), 800);
                default -> new GeneralizedPareto(2, random.nextDouble(4, 12), random.nextDouble(-0.2, 0.5));
            };
            perils.add(Models.peril("peril " + i, random.nextBoolean() ? new Poisson(mean) : new NegativeBinomial(mean, 1 + random.nextDouble()), severity));
        }
        double tau = random.nextDouble(0.02, 0.95);
        Copula copula = switch (random.nextInt(4)) {
            case 0 -> Gaussian.ofKendallTau(tau);
            case 1 -> Student.ofKendallTau(Math.min(tau, 0.6), random.nextDouble(2, 12));
            default -> Archimedean.ofKendallTau(ArchimedeanFamily.values()[random.nextInt(4)], random.nextBoolean(), tau);
        };
        return Models.counts(perils, copula, layers);
    }

    private static Layer layer(SplittableRandom random) {
        double limit = random.nextDouble(5, 60);
        double deductible = random.nextBoolean() ? 0 : random.nextDouble(0, 2) * limit;
        return Layer.of("layer", OccurrenceTerms.excess(limit, random.nextDouble(0, 40)), new AnnualTerms(deductible, random.nextDouble(1, 4) * limit));
    }

    @ParameterizedTest
    @MethodSource("seeds")
    void figuresKeepTheirRanges(long seed) {
        SplittableRandom random = new SplittableRandom(seed);
        Layer layer = layer(random);
        Treaty treaty = random(random, layer);
        LayerStatistics s = new TransformEngine(treaty, Accuracy.USUAL).price(0);
        String of = "seed " + seed + " " + treaty.portfolio() + layer + s;
        double limit = layer.terms().annualLimit();
        assertTrue(s.expectedLoss().value() >= 0 && s.expectedLoss().value() <= limit, of);
        assertTrue(s.standardDeviation().value() >= 0 && s.standardDeviation().value() <= limit, of);
        assertTrue(s.exhaustionProbability().value() >= 0 && s.exhaustionProbability().value() <= s.attachmentProbability().value(), of);
        assertTrue(s.attachmentProbability().value() <= 1, of);
        assertTrue(s.bracket().low() <= s.bracket().high() && s.bracket().contains(s.expectedLoss().value()), of);
        assertTrue(s.tailValueAtRisk().value() >= s.valueAtRisk().get(0.99).value() - s.valueAtRisk().get(0.99).error() - 1e-9 * limit, of);
        double before = 0;
        for (var value : s.valueAtRisk().values()) {
            assertTrue(value.value() >= before - value.error() && value.value() <= limit, of);
            before = value.value();
        }
        // E[Y] lies between M·P(exhausted) and M·P(attached)
        assertTrue(s.expectedLoss().value() >= limit * s.exhaustionProbability().value() - 1e-6 * limit, of);
        assertTrue(s.expectedLoss().value() <= limit * s.attachmentProbability().value() + 1e-6 * limit, of);
    }

    @ParameterizedTest
    @MethodSource("seeds")
    void statedErrorsAreHonest(long seed) {
        SplittableRandom random = new SplittableRandom(100 + seed);
        Layer layer = layer(random);
        Treaty treaty = random(random, layer);
        LayerStatistics coarse = new TransformEngine(treaty, Accuracy.of(1e-4)).price(0);
        LayerStatistics fine = new TransformEngine(treaty, Accuracy.of(1e-7)).price(0);
        String of = "seed " + (100 + seed) + " " + treaty.portfolio() + layer;
        assertTrue(fine.expectedLoss().error() <= 1e-5 * layer.terms().line(), of + fine.expectedLoss());
        assertEquals(fine.expectedLoss().value(), coarse.expectedLoss().value(), 3 * coarse.expectedLoss().error() + fine.expectedLoss().error(), of);
        assertEquals(fine.standardDeviation().value(), coarse.standardDeviation().value(),
                3 * coarse.standardDeviation().error() + fine.standardDeviation().error(), of);
        assertEquals(fine.attachmentProbability().value(), coarse.attachmentProbability().value(),
                3 * coarse.attachmentProbability().error() + fine.attachmentProbability().error(), of);
        assertEquals(fine.exhaustionProbability().value(), coarse.exhaustionProbability().value(),
                3 * coarse.exhaustionProbability().error() + fine.exhaustionProbability().error(), of);
        assertTrue(coarse.bracket().contains(fine.expectedLoss().value()), of + coarse.bracket() + fine.expectedLoss());
    }

    @ParameterizedTest
    @MethodSource("seeds")
    void layersOfATowerAddUpAndMoreLimitCostsMore(long seed) {
        SplittableRandom random = new SplittableRandom(200 + seed);
        double first = random.nextDouble(20, 60);
        double second = random.nextDouble(20, 60);
        Treaty treaty = random(random, Models.stopLoss(first, 25), Models.stopLoss(second, 25 + first), Models.stopLoss(first + second, 25),
                Layer.of("free", OccurrenceTerms.excess(first, 10), AnnualTerms.NONE));
        TransformEngine engine = new TransformEngine(treaty, Accuracy.USUAL);
        double low = engine.price(0).expectedLoss().value();
        double high = engine.price(1).expectedLoss().value();
        double whole = engine.price(2).expectedLoss().value();
        assertEquals(whole, low + high, 2e-6 * (first + second), "seed " + (200 + seed));
        assertTrue(whole >= low);
        double mean = 0;
        for (Peril peril : treaty.portfolio().perils()) {
            SeverityModel severity = ((layerweft.model.portfolio.EventLoss.Single) peril.eventLoss()).severity();
            mean += peril.frequency().mean() * (severity.limitedMean(10 + first) - severity.limitedMean(10));
        }
        assertEquals(mean, engine.price(3).expectedLoss().value(), 1e-10 * mean + 1e-12);
    }

    @Test
    void dependenceRunsFromIndependenceToComonotone() {
        List<Peril> perils = List.of(Models.peril("a", new Poisson(0.8), Lognormal.ofMeanAndCv(14, 2)), Models.peril("b", new Poisson(0.5), new Pareto(5, 1.5)),
                Models.peril("c", new NegativeBinomial(1.1, 1.3), new Pareto(4, 2)));
        Layer layer = Layer.of("aggregate", OccurrenceTerms.excess(30, 5), new AnnualTerms(30, 60));
        TransformEngine engine = new TransformEngine(Models.counts(perils, new Independence(), layer), Accuracy.USUAL);
        double independent = engine.price(0).expectedLoss().value();
        double comonotone = engine.with(new Comonotonic()).price(0).expectedLoss().value();
        for (ArchimedeanFamily family : ArchimedeanFamily.values()) {
            for (boolean survival : new boolean[] {false, true}) {
                double before = independent;
                for (double tau : new double[] {1e-7, 0.2, 0.5, 0.8, 0.95, 0.995}) {
                    double value = engine.with(Archimedean.ofKendallTau(family, survival, tau)).price(0).expectedLoss().value();
                    assertTrue(value >= before - 1e-5, family + " " + survival + " " + tau);
                    before = value;
                    if (tau == 1e-7) {
                        assertEquals(independent, value, 1e-5, family + " near 0");
                    }
                }
                assertEquals(comonotone, before, 1e-2 * comonotone, family + " " + survival + " near 1");
            }
        }
    }

    @Test
    void rareLayersKeepTheirDigits() {
        // P(an event hits) = (5/5e6)^1.5 by two independent perils; nearly all years that attach see one event
        List<Peril> perils = List.of(Models.peril("a", new Poisson(0.9), new Pareto(5, 1.5)), Models.peril("b", new Poisson(0.4), new Pareto(5, 1.5)));
        Layer layer = Layer.of("remote", OccurrenceTerms.excess(1e6, 5e6), new AnnualTerms(0, 1e6));
        Copula copula = Archimedean.ofKendallTau(ArchimedeanFamily.GUMBEL, false, 0.5);
        LayerStatistics s = new TransformEngine(Models.counts(perils, copula, layer), Accuracy.USUAL).price(0);
        double hit = Math.pow(1e-6, 1.5);
        assertEquals(1.3 * hit, s.attachmentProbability().value(), 1e-8 * hit);
        assertEquals(1.3 * Math.pow(5 / 6e6, 1.5), s.exhaustionProbability().value(), 1e-6 * hit);
        double mean = 1.3 * 2 * Math.pow(5, 1.5) * (Math.pow(5e6, -0.5) - Math.pow(6e6, -0.5));
        assertEquals(mean, s.expectedLoss().value(), 1e-7 * mean);
    }
}
