package layerweft.study;

import java.util.List;
import layerweft.engine.simulation.SimulationSettings;
import layerweft.model.copula.CopulaFamily;
import layerweft.model.frequency.Poisson;
import layerweft.model.portfolio.Dependence;
import layerweft.model.portfolio.EventLoss;
import layerweft.model.portfolio.Peril;
import layerweft.model.portfolio.Portfolio;
import layerweft.model.severity.Exponential;
import layerweft.model.severity.Pareto;
import layerweft.model.severity.SeverityModel;
import layerweft.model.treaty.AnnualTerms;
import layerweft.model.treaty.Buyer;
import layerweft.model.treaty.Layer;
import layerweft.model.treaty.OccurrenceTerms;
import layerweft.model.treaty.Pricing;
import layerweft.model.treaty.Programme;
import layerweft.model.treaty.Treaty;

/** A small portfolio, wind and flood, and layers on it, for tests of studies. */
final class TwoPerils {
    static final double NONE = Double.POSITIVE_INFINITY;
    static final SimulationSettings SETTINGS = new SimulationSettings(20_000, 1, 2);
    static final Dependence GUMBEL = new Dependence(Dependence.Links.COUNTS, CopulaFamily.parse("gumbel").at(0.3));

    private TwoPerils() {}

    static Portfolio portfolio(Dependence dependence) {
        return portfolio(dependence, new Pareto(5, 1.6), new Exponential(12));
    }

    static Portfolio portfolio(Dependence dependence, SeverityModel wind, SeverityModel flood) {
        return new Portfolio("Two perils", "EUR", "million", List.of(new Peril("wind", new Poisson(1.5), new EventLoss.Single(wind)),
                new Peril("flood", new Poisson(0.8), new EventLoss.Single(flood))), dependence);
    }

    static Programme programme(String name, Layer... layers) {
        return new Programme(name, List.of(layers), Pricing.PLAIN, Buyer.USUAL);
    }

    static Treaty treaty(Layer... layers) {
        return new Treaty(portfolio(GUMBEL), programme("Programme", layers));
    }

    /** 20 xs 10 each event, nothing in the year. */
    static Layer eachEvent() {
        return Layer.of("Each event", new OccurrenceTerms(10, null, 20), new AnnualTerms(0, NONE));
    }

    /** 40 xs 30 of the year's total. */
    static Layer stopLoss() {
        return Layer.of("Stop loss", new OccurrenceTerms(0, null, NONE), new AnnualTerms(30, 40));
    }

    /** A layer with one free reinstatement whose premium for a second is pro rata as to time, which the transform cannot price. */
    static Layer proRataTime() {
        return new Layer("Pro rata", List.of(), new OccurrenceTerms(10, null, 20), new AnnualTerms(0, NONE),
                List.of(1.0), 1, 1, true, List.of(), null);
    }

    /** With a quoted premium. */
    static Layer quoted(Layer layer, double premium) {
        return new Layer(layer.name(), layer.perils(), layer.occurrence(), layer.annual(), layer.reinstatements(), layer.quotaShare(), layer.share(),
                layer.proRataTime(), layer.inuring(), premium);
    }
}
