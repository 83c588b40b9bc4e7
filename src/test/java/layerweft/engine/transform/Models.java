package layerweft.engine.transform;

import java.util.ArrayList;
import java.util.List;
import layerweft.model.copula.Copula;
import layerweft.model.copula.Independence;
import layerweft.model.frequency.FrequencyModel;
import layerweft.model.portfolio.Dependence;
import layerweft.model.portfolio.EventLoss;
import layerweft.model.portfolio.Peril;
import layerweft.model.portfolio.Portfolio;
import layerweft.model.severity.DiscreteLosses;
import layerweft.model.severity.SeverityModel;
import layerweft.model.treaty.AnnualTerms;
import layerweft.model.treaty.Buyer;
import layerweft.model.treaty.Layer;
import layerweft.model.treaty.OccurrenceTerms;
import layerweft.model.treaty.Pricing;
import layerweft.model.treaty.Programme;
import layerweft.model.treaty.Treaty;

/** Small treaties for tests. */
public final class Models {

    private Models() {
    }

    public static Peril peril(String name, FrequencyModel frequency, SeverityModel severity) {
        return new Peril(name, frequency, new EventLoss.Single(severity));
    }

    public static Treaty treaty(List<Peril> perils, Dependence dependence, Layer... layers) {
        return new Treaty(new Portfolio("test", "EUR", "million", perils, dependence), new Programme("test", List.of(layers), Pricing.PLAIN, Buyer.USUAL));
    }

    public static Treaty counts(List<Peril> perils, Copula copula, Layer... layers) {
        return treaty(perils, new Dependence(Dependence.Links.COUNTS, copula), layers);
    }

    public static Treaty single(FrequencyModel frequency, SeverityModel severity, Layer... layers) {
        return counts(List.of(peril("only", frequency, severity)), new Independence(), layers);
    }

    /** Stop loss: limit in excess of deductible for the year, no occurrence terms. */
    public static Layer stopLoss(double limit, double deductible) {
        return Layer.of("stop " + limit + " xs " + deductible, OccurrenceTerms.NONE, new AnnualTerms(deductible, limit));
    }

    public static DiscreteLosses losses(double[] amounts, double[] probabilities) {
        List<Double> a = new ArrayList<>();
        List<Double> p = new ArrayList<>();
        for (int k = 0; k < amounts.length; k++) {
            a.add(amounts[k]);
            p.add(probabilities[k]);
        }
        return new DiscreteLosses(a, p);
    }
}
