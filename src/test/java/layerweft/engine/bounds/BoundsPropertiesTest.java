package layerweft.engine.bounds;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.stream.IntStream;
import layerweft.engine.transform.Accuracy;
import layerweft.engine.transform.TransformEngine;
import layerweft.figures.Figure;
import layerweft.model.copula.Archimedean;
import layerweft.model.copula.ArchimedeanFamily;
import layerweft.model.copula.Comonotonic;
import layerweft.model.copula.Copula;
import layerweft.model.copula.Countermonotonic;
import layerweft.model.copula.Gaussian;
import layerweft.model.frequency.FrequencyModel;
import layerweft.model.frequency.NegativeBinomial;
import layerweft.model.frequency.Poisson;
import layerweft.model.portfolio.Dependence;
import layerweft.model.portfolio.EventLoss;
import layerweft.model.portfolio.Peril;
import layerweft.model.portfolio.Portfolio;
import layerweft.model.random.KeyedStream;
import layerweft.model.severity.Capped;
import layerweft.model.severity.Exponential;
import layerweft.model.severity.Lognormal;
import layerweft.model.severity.Pareto;
import layerweft.model.severity.SeverityModel;
import layerweft.model.treaty.AnnualTerms;
import layerweft.model.treaty.Buyer;
import layerweft.model.treaty.Layer;
import layerweft.model.treaty.OccurrenceTerms;
import layerweft.model.treaty.Pricing;
import layerweft.model.treaty.Programme;
import layerweft.model.treaty.Treaty;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** What must hold for any portfolio and layer. */
class BoundsPropertiesTest {

    static IntStream seeds() {
        return IntStream.range(0, 16);
    }

    @ParameterizedTest
    @MethodSource("seeds")
    void theSixValuesAreInOrder(int seed) {
        Treaty treaty = treaty(seed);
        LayerRange r = new BoundsEngine(treaty).range(0);
        assertTrue(0 <= r.lowest() && r.lowest() <= r.attainedLow() && r.attainedLow() <= Math.min(r.independent(), r.comonotone())
                && Math.max(r.independent(), r.comonotone()) <= r.attainedHigh() && r.attainedHigh() <= r.highest()
                && r.highest() <= treaty.layer(0).terms().annualLimit(), () -> "seed " + seed + ": " + r);
    }

    @ParameterizedTest
    @MethodSource("seeds")
    void pricesUnderAnyCopulaLieBetween(int seed) {
        Treaty treaty = treaty(seed);
        int perils = treaty.portfolio().perils().size();
        LayerRange r = new BoundsEngine(treaty).range(0);
        TransformEngine engine = new TransformEngine(treaty, Accuracy.USUAL);
        List<Copula> copulas = new ArrayList<>(List.of(Archimedean.ofKendallTau(ArchimedeanFamily.GUMBEL, false, 0.7),
                Archimedean.ofKendallTau(ArchimedeanFamily.CLAYTON, true, 0.4), Gaussian.ofKendallTau(0.5), new Comonotonic()));
        if (perils == 2) {
            copulas.add(new Countermonotonic());
            copulas.add(Archimedean.ofKendallTau(ArchimedeanFamily.FRANK, false, -0.6));
        }
        for (Copula copula : copulas) {
            Figure price = engine.with(copula).price(0).expectedLoss();
            double slack = r.error() + price.error() + 1e-9;
            assertTrue(price.value() >= r.lowest() - slack && price.value() <= r.highest() + slack,
                    () -> "seed " + seed + ", " + copula.label() + ": " + price + " outside " + r);
        }
    }

    @ParameterizedTest
    @MethodSource("seeds")
    void orderOfThePerilsDoesNotMatter(int seed) {
        Treaty treaty = treaty(seed);
        List<Peril> turned = new ArrayList<>(treaty.portfolio().perils());
        Collections.reverse(turned);
        LayerRange one = new BoundsEngine(treaty).range(0);
        LayerRange other = new BoundsEngine(new Treaty(portfolio(turned), treaty.programme())).range(0);
        String what = "seed " + seed + ": " + one + " and " + other;
        assertEquals(one.independent(), other.independent(), 1e-9 + one.error(), what);
        assertEquals(one.comonotone(), other.comonotone(), 1e-9 * one.comonotone(), what);
        // searches take other ways
        assertEquals(one.lowest(), other.lowest(), 2e-3 * one.highest(), what);
        assertEquals(one.highest(), other.highest(), 2e-3 * one.highest(), what);
    }

    @ParameterizedTest
    @MethodSource("seeds")
    void higherDeductiblesAndLowerLimitsNeverGiveMore(int seed) {
        Treaty treaty = treaty(seed);
        Layer layer = treaty.layer(0);
        AnnualTerms a = layer.annual();
        LayerRange range = new BoundsEngine(treaty).range(0);
        LayerRange later = new BoundsEngine(with(treaty, new AnnualTerms(a.deductible() + 4, a.limit()))).range(0);
        LayerRange less = new BoundsEngine(with(treaty, new AnnualTerms(a.deductible(), Math.min(a.limit(), 50) * 0.7))).range(0);
        double slack = 1e-3 * range.highest() + range.error();
        for (LayerRange smaller : List.of(later, less)) {
            assertTrue(smaller.lowest() <= range.lowest() + slack && smaller.comonotone() <= range.comonotone() + slack
                    && smaller.highest() <= range.highest() + slack, () -> "seed " + seed + ": " + smaller + " above " + range);
        }
    }

    @Test
    void comonotoneStopLossIsTheSumOfStopLossesAtEqualQuantiles() {
        Margin[] margins = {Margin.of(new double[] {0, 8, 20}, new double[] {0.6, 0.25, 0}),
            Margin.of(new double[] {1, 5, 30}, new double[] {0.5, 0.25, 0})};
        // at the quantile 0.75 the split of D = 13 is 8 and 5
        double parts = margins[0].mean() - margins[0].limited(8) + margins[1].mean() - margins[1].limited(5);
        assertEquals(parts, ParallelRun.comonotone(margins, new AnnualLayer(13, Double.POSITIVE_INFINITY)), 1e-14);
    }

    @Test
    void dependenceDoesNotMoveLayersWithoutAnnualTermsOrOfOnePeril() {
        Treaty treaty = treaty(3);
        LayerRange none = new BoundsEngine(with(treaty, AnnualTerms.NONE)).range(0);
        assertTrue(none.free() && none.lowest() == none.independent() && none.highest() == none.independent());
        Treaty one = new Treaty(portfolio(treaty.portfolio().perils().subList(0, 1)), treaty.programme());
        assertTrue(new BoundsEngine(one).range(0).free());
    }

    @Test
    void perilsThatCannotReachTheLayerAreNotCounted() {
        Peril small = peril("small", new Poisson(2), new Capped(new Exponential(1), 3));
        Peril large = peril("large", new Poisson(0.5), new Exponential(20));
        Layer layer = Layer.of("high", OccurrenceTerms.excess(20, 5), new AnnualTerms(10, 30));
        Treaty treaty = new Treaty(portfolio(List.of(small, large)), programme(layer));
        LayerRange range = new BoundsEngine(treaty).range(0);
        assertTrue(range.free());
        assertEquals(0, new BoundsEngine(new Treaty(portfolio(List.of(small)), programme(layer))).range(0).highest());
    }

    @Test
    void infiniteMeansAreInfiniteOrLimited() {
        Peril heavy = peril("heavy", new Poisson(0.5), new Pareto(1, 0.9));
        Peril light = peril("light", new Poisson(1), new Exponential(2));
        Layer open = Layer.of("open", OccurrenceTerms.NONE, new AnnualTerms(5, Double.POSITIVE_INFINITY));
        Layer closed = Layer.of("closed", OccurrenceTerms.NONE, new AnnualTerms(5, 10));
        Portfolio both = portfolio(List.of(heavy, light));
        assertEquals(Double.POSITIVE_INFINITY, new BoundsEngine(new Treaty(both, programme(open))).range(0).lowest());
        LayerRange limited = new BoundsEngine(new Treaty(both, programme(closed))).range(0);
        assertTrue(limited.lowest() > 0 && limited.highest() < 10, limited::toString);
    }

    private static Treaty with(Treaty treaty, AnnualTerms annual) {
        return new Treaty(treaty.portfolio(), programme(Layer.of("layer", treaty.layer(0).occurrence(), annual)));
    }

    private static Treaty treaty(int seed) {
        KeyedStream random = new KeyedStream(seed);
        List<Peril> perils = new ArrayList<>();
        for (int i = 0; i < 2 + seed % 3; i++) {
            double mean = 0.2 + 1.5 * random.nextDouble();
            FrequencyModel frequency = random.nextDouble() < 0.5 ? new Poisson(mean) : new NegativeBinomial(mean, 1.5);
            SeverityModel severity = switch (random.nextInt(3)) {
                case 0 -> new Lognormal(1.5, 0.5 + random.nextDouble());
                case 1 -> new Exponential(3 + 5 * random.nextDouble());
                default -> new Capped(new Pareto(2, 1 + random.nextDouble()), 200);
            };
            perils.add(peril("peril " + i, frequency, severity));
        }
        OccurrenceTerms occurrence = seed % 4 == 1 ? OccurrenceTerms.NONE : OccurrenceTerms.excess(16, 4.0 * (seed % 2));
        double deductible = seed % 5 == 2 ? 0 : 4.0 + 4 * random.nextInt(8);
        double limit = seed % 5 != 2 && seed % 3 == 0 ? Double.POSITIVE_INFINITY : 8.0 + 8 * random.nextInt(5);
        return new Treaty(portfolio(perils), programme(Layer.of("layer", occurrence, new AnnualTerms(deductible, limit))));
    }

    private static Peril peril(String name, FrequencyModel frequency, SeverityModel severity) {
        return new Peril(name, frequency, new EventLoss.Single(severity));
    }

    private static Portfolio portfolio(List<Peril> perils) {
        return new Portfolio("random", "EUR", "million", perils, Dependence.NONE);
    }

    private static Programme programme(Layer layer) {
        return new Programme("random", List.of(layer), Pricing.PLAIN, Buyer.USUAL);
    }
}
