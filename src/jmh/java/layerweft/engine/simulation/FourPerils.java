package layerweft.engine.simulation;

import java.util.List;
import layerweft.model.copula.Archimedean;
import layerweft.model.copula.ArchimedeanFamily;
import layerweft.model.frequency.FrequencyModel;
import layerweft.model.frequency.NegativeBinomial;
import layerweft.model.frequency.Poisson;
import layerweft.model.portfolio.Dependence;
import layerweft.model.portfolio.EventLoss;
import layerweft.model.portfolio.Peril;
import layerweft.model.portfolio.Portfolio;
import layerweft.model.severity.Capped;
import layerweft.model.severity.GeneralizedPareto;
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

/** The benchmarks' treaty: four perils whose counts a Gumbel copula joins at τ = 0.3, 5.3 events a year, under five layers. */
public final class FourPerils {
    public static final double TAU = 0.3;

    private FourPerils() {}

    public static Treaty treaty() {
        return new Treaty(portfolio(), programme());
    }

    public static Portfolio portfolio() {
        List<Peril> perils = List.of(
                peril("windstorm", new NegativeBinomial(1.8, 1.4), new Capped(Lognormal.ofMeanAndCv(14, 2.1), 900)),
                peril("flood", new Poisson(0.9), new Capped(new Pareto(5, 1.6), 600)),
                peril("hail", new Poisson(2.4), new Capped(new GeneralizedPareto(2, 6, 0.3), 300)),
                peril("quake", new Poisson(0.2), new Capped(new Pareto(10, 1.1), 1000)));
        return new Portfolio("four perils", "EUR", "million", perils,
                new Dependence(Dependence.Links.COUNTS, Archimedean.ofKendallTau(ArchimedeanFamily.GUMBEL, false, TAU)));
    }

    public static Programme programme() {
        List<Layer> layers = List.of(
                Layer.of("working", OccurrenceTerms.excess(10, 10), new AnnualTerms(10, 40)),
                Layer.of("first cat", OccurrenceTerms.excess(30, 20), AnnualTerms.NONE).withReinstatements(List.of(1.0, 1.0)),
                Layer.of("second cat", OccurrenceTerms.excess(100, 50), AnnualTerms.NONE).withReinstatements(List.of(1.0)),
                Layer.of("top", OccurrenceTerms.excess(250, 150), AnnualTerms.NONE).withReinstatements(List.of(0.5)),
                Layer.of("second event", OccurrenceTerms.excess(30, 20), new AnnualTerms(30, 30)));
        return new Programme("five layers", layers, Pricing.PLAIN, new Buyer(List.of(10.0, 100.0, 200.0), 0.99, 0.06));
    }

    private static Peril peril(String name, FrequencyModel frequency, SeverityModel severity) {
        return new Peril(name, frequency, new EventLoss.Single(severity));
    }
}
