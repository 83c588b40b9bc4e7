package layerweft.engine.transform;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.util.List;
import layerweft.figures.Bracket;
import layerweft.figures.Figure;
import layerweft.figures.LayerStatistics;
import layerweft.model.frequency.Poisson;
import layerweft.model.portfolio.Dependence;
import layerweft.model.portfolio.EventLoss;
import layerweft.model.portfolio.Peril;
import layerweft.model.portfolio.Portfolio;
import layerweft.model.severity.Capped;
import layerweft.model.severity.Pareto;
import layerweft.model.treaty.AnnualTerms;
import layerweft.model.treaty.Buyer;
import layerweft.model.treaty.Layer;
import layerweft.model.treaty.OccurrenceTerms;
import layerweft.model.treaty.Pricing;
import layerweft.model.treaty.Programme;
import layerweft.model.treaty.Treaty;
import org.junit.jupiter.api.Test;

class UnreachableLayerTest {

    @Test
    void aLayerAboveEveryLossCostsNothingExactly() {
        Peril capped = new Peril("p", new Poisson(1), new EventLoss.Single(new Capped(new Pareto(1, 2), 10)));
        Layer layer = Layer.of("far up", OccurrenceTerms.excess(10, 50), AnnualTerms.NONE).withReinstatements(List.of(1.0));
        Treaty treaty = new Treaty(new Portfolio("one", "EUR", "", List.of(capped), Dependence.NONE),
                new Programme("p", List.of(layer), Pricing.PLAIN, Buyer.USUAL));
        TransformEngine engine = new TransformEngine(treaty, Accuracy.USUAL);
        LayerStatistics nothing = engine.price(0);
        assertEquals(Figure.exact(0), nothing.expectedLoss());
        assertEquals(new Bracket(0, 0), nothing.bracket());
        assertEquals(Figure.exact(0), nothing.valueAtRisk().get(0.99));
        assertThrows(IllegalArgumentException.class, () -> engine.law(0));
    }
}
