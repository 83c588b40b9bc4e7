package layerweft.engine.simulation;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;

import java.util.ArrayList;
import java.util.List;
import java.util.SplittableRandom;
import layerweft.model.copula.Archimedean;
import layerweft.model.copula.ArchimedeanFamily;
import layerweft.model.frequency.Poisson;
import layerweft.model.portfolio.Dependence;
import layerweft.model.portfolio.EventLoss;
import layerweft.model.portfolio.Peril;
import layerweft.model.portfolio.Portfolio;
import layerweft.model.portfolio.SubPeril;
import layerweft.model.severity.Lognormal;
import layerweft.model.severity.Pareto;
import layerweft.model.treaty.AnnualTerms;
import layerweft.model.treaty.Buyer;
import layerweft.model.treaty.Layer;
import layerweft.model.treaty.OccurrenceTerms;
import layerweft.model.treaty.Pricing;
import layerweft.model.treaty.Programme;
import layerweft.model.treaty.Treaty;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Layer by layer and event by event are two ways to the same amounts wherever the order of events does not matter. */
class TermsAppliedTest {
    private static final int YEARS = 3_000;

    @ParameterizedTest
    @ValueSource(longs = {1, 2, 3, 4, 5, 6, 7, 8})
    void bothWaysGiveTheSameAmounts(long seed) {
        Treaty treaty = random(new SplittableRandom(seed), seed % 2 == 0 ? Dependence.Links.COUNTS : Dependence.Links.ANNUAL_TOTALS);
        YearDraw draw = new YearDraw(treaty.portfolio(), seed);
        PerilYears[] work = draw.workspace(YEARS);
        draw.draw(0, YEARS, work, new double[draw.perils()][YEARS]);
        YearAmounts atOnce = YearAmounts.of(treaty, YEARS);
        YearAmounts inOrder = YearAmounts.of(treaty, YEARS);
        new TermsAtOnce(treaty).apply(work, YEARS, draw, 0, atOnce);
        new TermsInOrder(treaty).apply(work, YEARS, draw, 0, inOrder);
        String message = "seed " + seed;
        for (int j = 0; j < treaty.layers(); j++) {
            assertArrayEquals(inOrder.sum[j], atOnce.sum[j], 1e-9, message);
            assertArrayEquals(inOrder.hits[j], atOnce.hits[j], message);
            assertArrayEquals(inOrder.largest[j], atOnce.largest[j], 1e-9, message);
        }
        assertArrayEquals(inOrder.gross, atOnce.gross, 1e-9, message);
        assertArrayEquals(inOrder.grossLargest, atOnce.grossLargest, 1e-9, message);
        assertArrayEquals(inOrder.cededLargest, atOnce.cededLargest, 1e-9, message);
        assertArrayEquals(inOrder.netLargest, atOnce.netLargest, 1e-9, message);
    }

    private static Treaty random(SplittableRandom random, Dependence.Links links) {
        List<Peril> perils = List.of(
                new Peril("storm", new Poisson(1.5), new EventLoss.Split(List.of(
                        new SubPeril("wind", 1, Lognormal.ofMeanAndCv(10, 2)),
                        new SubPeril("surge", 0.4, new Pareto(3, 1.5))), Archimedean.ofKendallTau(ArchimedeanFamily.GUMBEL, false, 0.5))),
                new Peril("flood", new Poisson(0.7), new EventLoss.Single(new Pareto(5, 1.4))),
                new Peril("hail", new Poisson(3), new EventLoss.Single(Lognormal.ofMeanAndCv(4, 1))));
        String[][] covers = {{}, {"storm"}, {"storm/surge", "flood"}, {"flood", "hail"}, {"storm/wind"}};
        List<Layer> layers = new ArrayList<>();
        for (int j = 0; j < 6; j++) {
            double retention = random.nextInt(4) == 0 ? 0 : random.nextDouble(25);
            double limit = random.nextInt(5) == 0 ? Double.POSITIVE_INFINITY : random.nextDouble(5, 60);
            OccurrenceTerms occurrence = random.nextInt(4) == 0 ? new OccurrenceTerms(0, retention, limit) : OccurrenceTerms.excess(limit, retention);
            AnnualTerms annual = random.nextBoolean() ? AnnualTerms.NONE : new AnnualTerms(random.nextDouble(20), random.nextDouble(20, 90));
            layers.add(new Layer("layer " + j, List.of(covers[random.nextInt(covers.length)]), occurrence, annual, null,
                    random.nextInt(3) == 0 ? random.nextDouble(0.2, 1) : 1, random.nextDouble(0.3, 1), false, List.of(), null));
        }
        Portfolio portfolio = new Portfolio("random", "EUR", "", perils, new Dependence(links, Archimedean.ofKendallTau(ArchimedeanFamily.CLAYTON, true, 0.3)));
        return new Treaty(portfolio, new Programme("random", layers, Pricing.PLAIN, Buyer.USUAL));
    }
}
