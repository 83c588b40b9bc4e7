package layerweft.engine.simulation;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import layerweft.engine.RunControl;
import layerweft.figures.Figure;
import layerweft.model.copula.Copula;
import layerweft.model.copula.CopulaFamily;
import layerweft.model.copula.Independence;
import layerweft.model.frequency.Binomial;
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
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class PerilDriversTest {
    private static final SimulationSettings SETTINGS = new SimulationSettings(200_000, 3, 2);
    private static final Layer CAT = Layer.of("Cat", OccurrenceTerms.excess(30, 20), AnnualTerms.NONE).withReinstatements(List.of(1.0));
    private static final Layer STOP = new Layer("Stop loss", List.of(), OccurrenceTerms.NONE, new AnnualTerms(40, 60), null, 1, 0.7, false, List.of("Cat"), null);

    private static Treaty treaty(Copula copula, Layer... layers) {
        Portfolio portfolio = new Portfolio("Two perils", "EUR", "million", List.of(peril("wind", 1.5, new Pareto(5, 1.6)), peril("flood", 0.8, new Exponential(12))),
                new Dependence(Dependence.Links.COUNTS, copula));
        return new Treaty(portfolio, new Programme("Programme", List.of(layers), Pricing.PLAIN, Buyer.USUAL));
    }

    private static Peril peril(String name, double mean, SeverityModel severity) {
        return new Peril(name, new Poisson(mean), new EventLoss.Single(severity));
    }

    private static double sum(List<Figure> figures) {
        return figures.stream().mapToDouble(Figure::value).sum();
    }

    @ParameterizedTest
    @ValueSource(booleans = {false, true})
    void partsAddUpToTheWhole(boolean inuring) {
        Treaty treaty = inuring ? treaty(CopulaFamily.parse("gumbel").at(0.3), CAT, STOP) : treaty(CopulaFamily.parse("gumbel").at(0.3), CAT);
        List<PerilShares> shares = PerilDrivers.run(treaty, 0.99, SETTINGS, RunControl.NONE);
        SimulationResult simulated = Simulation.run(treaty, SETTINGS, RunControl.NONE);
        for (int k = 0; k < shares.size(); k++) {
            assertEquals(1, sum(shares.get(k).expectedShare()), 1e-12);
            assertEquals(1, sum(shares.get(k).badShare()), 1e-12);
            assertTrue(shares.get(k).badChance() >= 0.0099, "bad years: " + shares.get(k).badChance());
        }
        // the same years as the simulation's: its plain mean of what is ceded, and the mean of bad years is no less than the value at risk
        double recovered = 0;
        for (int j = 0; j < treaty.layers(); j++) {
            recovered += sum(shares.get(j).expected());
            assertTrue(sum(shares.get(j).bad()) >= shares.get(j).badFrom());
        }
        assertEquals(simulated.whole().ceded().mean().value(), recovered, 5 * simulated.whole().ceded().mean().error());
        assertEquals(treaty.portfolio().expectedLoss() - recovered, sum(shares.get(treaty.layers()).expected()),
                5 * simulated.whole().gross().mean().error() + 0.02 * treaty.portfolio().expectedLoss());
    }

    /** Without annual terms a layer's mean is the sum of the perils' own, known in closed form: E[N]·E[min((X − R)+, L)]. */
    @Test
    void sharesOfTheExpectedLossAreThoseOfThePerilsAlone() {
        Layer each = Layer.of("Each", OccurrenceTerms.excess(30, 20), AnnualTerms.NONE);
        PerilShares found = PerilDrivers.run(treaty(CopulaFamily.parse("clayton").at(0.5), each), 0.99, SETTINGS, RunControl.NONE).get(0);
        double wind = 1.5 * new Pareto(5, 1.6).layerMean(20, 50);
        double flood = 0.8 * new Exponential(12).layerMean(20, 50);
        assertEquals(wind, found.expected().get(0).value(), 4.5 * found.expected().get(0).error());
        assertEquals(flood, found.expected().get(1).value(), 4.5 * found.expected().get(1).error());
        assertEquals(wind / (wind + flood), found.expectedShare().get(0).value(), 4.5 * found.expectedShare().get(0).error());
    }

    /** Two perils that bring one loss each year for sure and are alike bring half of everything, in bad years too; one that brings next to nothing has next to no part. */
    @Test
    void perilsThatAreAlikeHaveLikeParts() {
        Portfolio alike = new Portfolio("Alike", "EUR", "million", List.of(
                new Peril("one", new Binomial(1, 1.0), new EventLoss.Single(new Exponential(10))),
                new Peril("other", new Binomial(1, 1.0), new EventLoss.Single(new Exponential(10))),
                new Peril("small", new Poisson(1), new EventLoss.Single(new Exponential(1e-9)))),
                new Dependence(Dependence.Links.COUNTS, new Independence()));
        Layer stop = Layer.of("Stop", OccurrenceTerms.NONE, new AnnualTerms(20, 30));
        PerilShares found = PerilDrivers.run(new Treaty(alike, new Programme("Programme", List.of(stop), Pricing.PLAIN, Buyer.USUAL)), 0.95, SETTINGS, RunControl.NONE).get(0);
        for (List<Figure> shares : List.of(found.expectedShare(), found.badShare())) {
            assertEquals(0.5, shares.get(0).value(), 4.5 * shares.get(0).error());
            assertEquals(0, shares.get(2).value(), 1e-9);
        }
    }

    @Test
    void theSameSeedGivesTheSameBitsOnAnyNumberOfThreads() {
        Treaty treaty = treaty(CopulaFamily.parse("gumbel").at(0.3), CAT, STOP);
        assertEquals(PerilDrivers.run(treaty, 0.99, new SimulationSettings(50_000, 3, 1), RunControl.NONE),
                PerilDrivers.run(treaty, 0.99, new SimulationSettings(50_000, 3, 3), RunControl.NONE));
    }
}
