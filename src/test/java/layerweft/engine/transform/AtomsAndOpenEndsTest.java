package layerweft.engine.transform;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import layerweft.figures.Figure;
import layerweft.figures.LayerStatistics;
import layerweft.model.copula.Independence;
import layerweft.model.frequency.Binomial;
import layerweft.model.frequency.Poisson;
import layerweft.model.portfolio.Dependence;
import layerweft.model.portfolio.EventLoss;
import layerweft.model.portfolio.Peril;
import layerweft.model.portfolio.Portfolio;
import layerweft.model.portfolio.SubPeril;
import layerweft.model.severity.Exponential;
import layerweft.model.severity.Pareto;
import layerweft.model.treaty.AnnualTerms;
import layerweft.model.treaty.Buyer;
import layerweft.model.treaty.Layer;
import layerweft.model.treaty.Loading;
import layerweft.model.treaty.OccurrenceTerms;
import layerweft.model.treaty.Pricing;
import layerweft.model.treaty.Programme;
import layerweft.model.treaty.Treaty;
import org.junit.jupiter.api.Test;

class AtomsAndOpenEndsTest {

    @Test
    void quantilesOnAtomsAreExactAndOthersAreNot() {
        Layer layer = Layer.of("cat", OccurrenceTerms.excess(10, 12), new AnnualTerms(0, 20));
        LayerStatistics s = new TransformEngine(Models.single(new Poisson(0.5), new Pareto(5, 1.1), layer), Accuracy.USUAL).price(0);
        // P(hit) = 0.5·(5/12)^1.1 = 0.19 > 0.1 > P(full) = 0.5·(5/22)^1.1 = 0.098 > 0.02 > P(two full) = 0.0046
        assertTrue(s.valueAtRisk().get(0.9).error() > 0, s.toString());
        assertEquals(new Figure(10, 0), s.valueAtRisk().get(0.98), s.toString());
        LayerStatistics rare = new TransformEngine(Models.single(new Poisson(0.05), new Pareto(5, 1.1), layer), Accuracy.USUAL).price(0);
        assertEquals(new Figure(0, 0), rare.valueAtRisk().get(0.9), rare.toString());
        LayerStatistics often = new TransformEngine(Models.single(new Poisson(9), new Pareto(5, 1.1), layer), Accuracy.USUAL).price(0);
        assertEquals(new Figure(20, 0), often.valueAtRisk().get(0.995), often.toString());
    }

    @Test
    void discreteSubPerilsAreRefusedByNameUnlessCoveredAlone() {
        var lumps = Models.losses(new double[] {3, 7.7}, new double[] {0.5, 0.5});
        Peril storm = new Peril("storm", new Poisson(1), new EventLoss.Split(
                List.of(new SubPeril("wind", 1, new Exponential(4)), new SubPeril("debris", 0.5, lumps)), new Independence()));
        Layer both = Layer.of("both", OccurrenceTerms.excess(10, 5), AnnualTerms.NONE);
        Layer alone = Layer.of("alone", OccurrenceTerms.excess(10, 5), AnnualTerms.NONE).covering("storm/debris");
        Treaty treaty = Models.counts(List.of(storm), new Independence(), both, alone);
        assertTrue(TransformEngine.refusal(treaty, 0).orElse("").contains("storm/debris are discrete"));
        assertTrue(TransformEngine.refusal(treaty, 1).isEmpty());
    }

    /** One sure exponential loss of mean m: ∫ e^(−y/(mρ)) dy = ρm. */
    @Test
    void anOpenLayersDistortionIsWithinItsStatedError() {
        Pricing pricing = new Pricing(new Loading.ProportionalHazard(1.25), 0, 0, true);
        Layer open = Layer.of("open", OccurrenceTerms.NONE, AnnualTerms.NONE);
        Portfolio portfolio = new Portfolio("test", "EUR", "million", List.of(Models.peril("only", new Binomial(1, 1.0), new Exponential(4))),
                new Dependence(Dependence.Links.COUNTS, new Independence()));
        Figure net = new TransformEngine(new Treaty(portfolio, new Programme("test", List.of(open), pricing, Buyer.USUAL)), Accuracy.USUAL).price(0).netPremium();
        assertEquals(5, net.value(), net.error(), net.toString());
        assertTrue(net.error() < 0.05 * net.value(), net.toString());
    }

    @Test
    void aTailWithoutVarianceIsLeftToSimulationWhereItIsDistorted() {
        Pricing pricing = new Pricing(new Loading.ProportionalHazard(1.25), 0, 0, true);
        Layer open = Layer.of("open", OccurrenceTerms.NONE, AnnualTerms.NONE);
        Layer limited = Layer.of("limited", OccurrenceTerms.excess(1000, 5), AnnualTerms.NONE);
        Portfolio portfolio = new Portfolio("test", "EUR", "million", List.of(Models.peril("only", new Poisson(1), new Pareto(5, 1.6))),
                new Dependence(Dependence.Links.COUNTS, new Independence()));
        TransformEngine engine = new TransformEngine(new Treaty(portfolio, new Programme("test", List.of(open, limited), pricing, Buyer.USUAL)), Accuracy.USUAL);
        assertTrue(engine.refusal(0).orElseThrow().contains("a tail without a limit"), engine.refusal(0).toString());
        Figure net = engine.price(1).netPremium();
        assertTrue(net.error() < 1e-4 * net.value(), net.toString());
    }
}
