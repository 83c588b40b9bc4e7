package layerweft.engine.simulation;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import layerweft.engine.RunControl;
import layerweft.figures.Figure;
import layerweft.model.copula.CopulaFamily;
import layerweft.model.frequency.Poisson;
import layerweft.model.portfolio.Dependence;
import layerweft.model.portfolio.EventLoss;
import layerweft.model.portfolio.Peril;
import layerweft.model.portfolio.Portfolio;
import layerweft.model.severity.Exponential;
import layerweft.model.severity.Pareto;
import layerweft.model.treaty.AnnualTerms;
import layerweft.model.treaty.Buyer;
import layerweft.model.treaty.Layer;
import layerweft.model.treaty.OccurrenceTerms;
import layerweft.model.treaty.Pricing;
import layerweft.model.treaty.Programme;
import layerweft.model.treaty.Treaty;
import org.junit.jupiter.api.Test;

class NetPositionsTest {
    private static final long YEARS = 100_000;
    private static final Portfolio PORTFOLIO = new Portfolio("Two perils", "EUR", "million", List.of(
            new Peril("wind", new Poisson(1.5), new EventLoss.Single(new Pareto(5, 2.4))),
            new Peril("flood", new Poisson(0.8), new EventLoss.Single(new Exponential(12)))),
            new Dependence(Dependence.Links.COUNTS, CopulaFamily.parse("gumbel").at(0.3)));
    private static final Layer CAT = Layer.of("Cat", OccurrenceTerms.excess(30, 20), AnnualTerms.NONE).withReinstatements(List.of(1.0, 0.5));
    private static final Layer STOP = Layer.of("Stop loss", OccurrenceTerms.NONE, new AnnualTerms(40, 60));

    private static NetPositions.Structure structure(double[] upfront, Layer... layers) {
        return new NetPositions.Structure(new Treaty(PORTFOLIO, new Programme("Programme", List.of(layers), Pricing.PLAIN, Buyer.USUAL)), upfront);
    }

    private static NetPositions.Result run(int threads, long seed, NetPositions.Structure... structures) {
        return NetPositions.run(PORTFOLIO, List.of(structures), List.of(0.9, 0.99), 0.99, new SimulationSettings(YEARS, seed, threads), RunControl.NONE);
    }

    /** Gross less recoveries with premiums is the net position in every year; a year's reinstatement premium is that of its own loss. */
    @Test
    void theIdentityOfTheNetPositionHoldsInEveryYear() {
        NetPositions.Structure structure = structure(new double[] {6, 8}, CAT, STOP);
        int years = 4_000;
        YearDraw draw = new YearDraw(PORTFOLIO, 3);
        PerilYears[] perils = draw.workspace(years);
        draw.draw(0, years, perils, new double[2][years]);
        YearAmounts amounts = YearAmounts.of(structure.treaty(), years);
        TermsApplied.of(structure.treaty()).apply(perils, years, draw, 0, amounts);
        NetYears net = new NetYears(structure.treaty(), structure.upfront(), years);
        net.of(amounts, years);
        int paid = 0;
        for (int y = 0; y < years; y++) {
            double cat = CAT.terms().annualLoss(amounts.sum[0][y]);
            double stop = STOP.terms().annualLoss(amounts.sum[1][y]);
            assertEquals(cat + stop, net.recoveries[y], 0);
            // 30 a limit: the first reinstatement at 100 %, the second at 50 %
            assertEquals(14 + 6 * (Math.min(cat, 30) / 30 + 0.5 * Math.min(Math.max(cat - 30, 0), 30) / 30), net.premiums[y], 1e-12);
            assertEquals(amounts.gross[y] - net.recoveries[y] + net.premiums[y], net.net[y], 0);
            paid += net.premiums[y] > 14 ? 1 : 0;
        }
        assertTrue(paid > 100, "years with reinstatement premium: " + paid);
    }

    @Test
    void theSameSeedGivesTheSameBitsOnAnyNumberOfThreads() {
        NetPositions.Structure structure = structure(new double[] {6}, CAT);
        PositionSample one = run(1, 5, structure).net().get(0);
        PositionSample three = run(3, 5, structure).net().get(0);
        assertEquals(one.mean(), three.mean());
        assertEquals(one.tailValueAtRisk(), three.tailValueAtRisk());
        assertEquals(one.valueAtRisk(), three.valueAtRisk());
    }

    /** The years are those of the ordinary simulation, so its gross and ceded totals come out again. */
    @Test
    void theYearsAreThoseOfTheSimulation() {
        NetPositions.Structure structure = structure(new double[] {0, 0}, CAT, STOP);
        NetPositions.Result result = run(2, 7, structure);
        SimulationResult simulated = Simulation.run(structure.treaty(), new SimulationSettings(YEARS, 7, 2), RunControl.NONE);
        assertEquals(simulated.whole().gross().valueAtRisk().get(0.99).value(), result.gross().valueAtRisk().get(0.99).value(), 1e-12);
        assertEquals(simulated.whole().ceded().tailValueAtRisk().value(), result.recovered().get(0).tailValueAtRisk().value(), 1e-9);
        // without premiums what is left is the net loss
        assertEquals(simulated.whole().net().standardDeviation().value(), result.net().get(0).standardDeviation().value(), 1e-9);
    }

    /** Two programmes that differ a little: from the same years the difference is known at least five times better than from other years. */
    @Test
    void differencesFromTheSameYearsAreSharp() {
        Layer wider = Layer.of("Cat", OccurrenceTerms.excess(32, 20), AnnualTerms.NONE).withReinstatements(List.of(1.0, 0.5));
        NetPositions.Result result = run(2, 11, structure(new double[] {6}, CAT), structure(new double[] {6.2}, wider));
        PositionSample difference = result.net().get(0).minus(result.net().get(1));
        sharp(difference.mean(), result.net().get(0).mean(), result.net().get(1).mean());
        sharp(difference.standardDeviation(), result.net().get(0).standardDeviation(), result.net().get(1).standardDeviation());
        sharp(difference.tailValueAtRisk(), result.net().get(0).tailValueAtRisk(), result.net().get(1).tailValueAtRisk());
    }

    private static void sharp(Figure difference, Figure one, Figure other) {
        double apart = Math.hypot(one.error(), other.error());
        assertTrue(difference.error() > 0 && 5 * difference.error() < apart, difference + " against " + apart);
    }

    /** The errors are honest: over other seeds the tail value at risk spreads as much as they say (40 seeds: within a third of it, odds of a false alarm 1 in 200 for a fresh seed). */
    @Test
    void errorsAreThoseSeenOverManySeeds() {
        NetPositions.Structure structure = structure(new double[] {6}, CAT);
        double sum = 0;
        double squares = 0;
        double errors = 0;
        int seeds = 40;
        for (int seed = 0; seed < seeds; seed++) {
            Figure tail = run(2, 100 + seed, structure).net().get(0).tailValueAtRisk();
            sum += tail.value();
            squares += tail.value() * tail.value();
            errors += tail.error() / seeds;
        }
        double seen = Math.sqrt((squares - sum * sum / seeds) / (seeds - 1));
        assertEquals(seen, errors, seen / 3);
    }

    @Test
    void whatHasNoMeanIsInfiniteAndItsDifferencesAreNot() {
        Portfolio wild = new Portfolio("Wild", "EUR", "million", List.of(new Peril("wind", new Poisson(1.5), new EventLoss.Single(new Pareto(5, 0.9)))),
                Dependence.NONE);
        Treaty cat = new Treaty(wild, new Programme("Programme", List.of(CAT), Pricing.PLAIN, Buyer.USUAL));
        NetPositions.Result result = NetPositions.run(wild, List.of(new NetPositions.Structure(cat, new double[] {6})), List.of(0.9), 0.99,
                new SimulationSettings(YEARS, 1, 2), RunControl.NONE);
        assertEquals(Figure.INFINITE, result.gross().mean());
        assertEquals(Figure.INFINITE, result.net().get(0).tailValueAtRisk());
        PositionSample relief = result.gross().minus(result.net().get(0));
        assertTrue(Double.isFinite(relief.mean().value()), relief.mean().toString());
        assertTrue(!relief.tailValueAtRisk().defined(), relief.tailValueAtRisk().toString());
        assertTrue(Double.isFinite(relief.valueAtRisk().get(0.9).value()));
    }
}
