package layerweft.engine.transform;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.stream.IntStream;
import layerweft.model.copula.Archimedean;
import layerweft.model.copula.ArchimedeanFamily;
import layerweft.model.copula.Gaussian;
import layerweft.model.copula.Independence;
import layerweft.model.frequency.Poisson;
import layerweft.model.portfolio.Dependence;
import layerweft.model.portfolio.Peril;
import layerweft.model.severity.Exponential;
import layerweft.model.treaty.AnnualTerms;
import layerweft.model.treaty.Layer;
import layerweft.model.treaty.OccurrenceTerms;
import layerweft.model.treaty.Treaty;
import org.junit.jupiter.api.Test;

class RefusalTest {
    private static final Layer CAT = Layer.of("cat", OccurrenceTerms.excess(10, 5), AnnualTerms.NONE);

    private static final Layer OTHER = Layer.of("other", OccurrenceTerms.excess(10, 5), AnnualTerms.NONE);

    private static List<Peril> perils(int d) {
        return IntStream.range(0, d).mapToObj(i -> Models.peril("peril " + i, new Poisson(1), new Exponential(4))).toList();
    }

    private static String reason(Treaty treaty, int layer) {
        return TransformEngine.refusal(treaty, layer).orElse("none");
    }

    @Test
    void orderOfEventsNeedsSimulation() {
        Layer net = new Layer("net", List.of(), OccurrenceTerms.NONE, new AnnualTerms(5, 20), null, 1, 1, false, List.of("cat"), null);
        Layer timed = new Layer("timed", List.of(), OccurrenceTerms.excess(10, 5), AnnualTerms.NONE, List.of(1.0), 1, 1, true, List.of(), null);
        Treaty treaty = Models.counts(perils(2), new Independence(), CAT, net, timed);
        assertEquals("none", reason(treaty, 0));
        assertTrue(reason(treaty, 1).contains("inure"), reason(treaty, 1));
        assertTrue(reason(treaty, 2).contains("pro rata as to time"), reason(treaty, 2));
        String message = assertThrows(IllegalArgumentException.class, () -> new TransformEngine(treaty, Accuracy.USUAL).price(1)).getMessage();
        assertTrue(message.contains("\"net\" needs simulation"), message);
    }

    @Test
    void largeMatricesWithoutAFactorNeedSimulationUnlessTheLayerCoversFewOfThePerils() {
        double[][] rho = {{1, 0.5, 0.1, 0.3}, {0.5, 1, 0.4, 0.2}, {0.1, 0.4, 1, 0.6}, {0.3, 0.2, 0.6, 1}};
        Treaty treaty = Models.counts(perils(4), Gaussian.ofCorrelation(rho), CAT, OTHER.covering("peril 0", "peril 1", "peril 3"));
        assertTrue(reason(treaty, 0).contains("correlation matrix"), reason(treaty, 0));
        assertEquals("none", reason(treaty, 1));
    }

    @Test
    void joinedTotalsLeaveOccurrenceTermsToSimulationUnlessOnePerilIsCovered() {
        Dependence totals = new Dependence(Dependence.Links.ANNUAL_TOTALS, Archimedean.ofKendallTau(ArchimedeanFamily.GUMBEL, false, 0.3));
        Treaty treaty = Models.treaty(perils(2), totals, CAT, Models.stopLoss(10, 5), OTHER.covering("peril 1"));
        assertTrue(reason(treaty, 0).contains("annual totals"), reason(treaty, 0));
        assertEquals("none", reason(treaty, 1));
        assertEquals("none", reason(treaty, 2));
    }
}
