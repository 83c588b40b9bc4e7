package layerweft.study;

import java.util.ArrayList;
import java.util.List;
import java.util.SortedMap;
import java.util.TreeMap;
import layerweft.engine.RunControl;
import layerweft.engine.simulation.Simulation;
import layerweft.engine.simulation.SimulationSettings;
import layerweft.figures.Figure;
import layerweft.figures.LayerStatistics;
import layerweft.model.portfolio.Peril;
import layerweft.model.portfolio.Portfolio;
import layerweft.model.treaty.AnnualTerms;
import layerweft.model.treaty.Buyer;
import layerweft.model.treaty.Layer;
import layerweft.model.treaty.OccurrenceTerms;
import layerweft.model.treaty.Pricing;
import layerweft.model.treaty.Programme;
import layerweft.model.treaty.Treaty;

/**
 * Annual ground-up totals of each peril alone and of all together, by simulation; means are exact.
 *
 * @param perils in the order of the portfolio
 */
public record PerilTotals(Portfolio portfolio, SimulationSettings settings, List<Total> perils, Total all) {
    private static final double ANY_LEVEL = 0.99;

    public PerilTotals {
        perils = List.copyOf(perils);
    }

    /**
     * One total.
     *
     * @param byReturnPeriod amounts by return period in years
     */
    public record Total(String name, Figure mean, Figure standardDeviation, SortedMap<Double, Figure> byReturnPeriod) {}

    /** @throws java.util.concurrent.CancellationException if the control stops it */
    public static PerilTotals of(Portfolio portfolio, List<Double> returnPeriods, SimulationSettings settings, RunControl control) {
        List<Layer> layers = new ArrayList<>();
        for (Peril peril : portfolio.perils()) {
            layers.add(Layer.of("of " + peril.name(), OccurrenceTerms.NONE, AnnualTerms.NONE).covering(peril.name()));
        }
        layers.add(Layer.of("of all", OccurrenceTerms.NONE, AnnualTerms.NONE));
        Programme totals = new Programme("totals", layers, Pricing.PLAIN, new Buyer(returnPeriods, ANY_LEVEL, 0));
        List<LayerStatistics> found = Simulation.run(new Treaty(portfolio, totals), settings, control).layers();
        List<Total> perils = new ArrayList<>();
        for (int i = 0; i < portfolio.perils().size(); i++) {
            Peril peril = portfolio.perils().get(i);
            perils.add(total(peril.name(), peril.expectedLoss(), returnPeriods, found.get(i)));
        }
        return new PerilTotals(portfolio, settings, perils, total(portfolio.name(), portfolio.expectedLoss(), returnPeriods, found.get(perils.size())));
    }

    private static Total total(String name, double mean, List<Double> returnPeriods, LayerStatistics found) {
        SortedMap<Double, Figure> amounts = new TreeMap<>();
        for (double years : returnPeriods) {
            amounts.put(years, found.valueAtRisk().get(Buyer.levelOf(years)));
        }
        return new Total(name, Figure.exact(mean), found.standardDeviation(), amounts);
    }
}
