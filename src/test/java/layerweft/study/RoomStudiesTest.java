package layerweft.study;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;
import java.util.List;
import java.util.Random;
import java.util.function.DoubleUnaryOperator;
import layerweft.engine.RunControl;
import layerweft.engine.simulation.SimulationSettings;
import layerweft.figures.Figure;
import layerweft.file.DemoFiles;
import layerweft.model.copula.Comonotonic;
import layerweft.model.copula.Copula;
import layerweft.model.copula.CopulaFamily;
import layerweft.model.copula.Independence;
import layerweft.model.frequency.Binomial;
import layerweft.model.frequency.FrequencyModel;
import layerweft.model.frequency.NegativeBinomial;
import layerweft.model.frequency.Poisson;
import layerweft.model.portfolio.EventLoss;
import layerweft.model.portfolio.Peril;
import layerweft.model.portfolio.SubPeril;
import layerweft.model.random.KeyedStream;
import layerweft.model.severity.Exponential;
import layerweft.model.treaty.Treaty;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Studies that explain a price: bad years together, rank correlation of counts, totals by peril, curves, use of each limit. */
class RoomStudiesTest {
    private static final SimulationSettings SETTINGS = new SimulationSettings(100_000, 1, 2);
    private static final Treaty DEMO = DemoFiles.treaty();

    /** Gumbel: C(u, u) = u^(2^(1/θ)), θ = 1/(1 − τ), λ_U = 2 − 2^(1/θ) (Nelsen 2006, "An Introduction to Copulas", table 4.1 and example 5.21). */
    @Test
    void bothBadTogetherUnderGumbelFollowsItsDiagonal() {
        double power = Math.pow(2, 0.7);
        BadYears bad = BadYears.of(CopulaFamily.parse("gumbel").at(0.3), List.of(10.0, 50.0, 200.0));
        assertEquals(1 - 2 * 0.9 + Math.pow(0.9, power), bad.chance(10), 1e-12);
        assertEquals(1 - 2 * 0.995 + Math.pow(0.995, power), bad.chance(200), 1e-12);
        assertEquals(2 - power, bad.upperTail(), 1e-12);
        assertEquals(bad.chance(50) * 2500, bad.timesIndependent(50), 1e-9);
    }

    @Test
    void independenceIsTheProductAndComonotonicTheWhole() {
        assertEquals(1e-4, BadYears.bothBeyond(new Independence(), 100), 1e-15);
        assertEquals(0.01, BadYears.bothBeyond(new Comonotonic(), 100), 1e-15);
    }

    @Test
    void familiesAreOrderedByHowOftenBothAreBad() {
        List<BadYears> rows = BadYears.ofFamilies(SweepRequest.USUAL_FAMILIES, 0.3, List.of(10.0, 50.0), 50.0);
        assertEquals("joe", rows.get(0).label());
        assertEquals("independence", rows.get(rows.size() - 1).label());
        for (int k = 1; k < rows.size(); k++) {
            assertTrue(rows.get(k - 1).chance(50) >= rows.get(k).chance(50));
        }
        // negative τ: all but Gumbel and Joe, and independence
        assertEquals(6, BadYears.ofFamilies(SweepRequest.USUAL_FAMILIES, -0.2, List.of(10.0), 10.0).size());
    }

    /** Against pairs of drawn years, all of them compared. Odds of a false alarm at 4.5 standard errors: 1 in 147,000. */
    @ParameterizedTest
    @ValueSource(strings = {"gumbel", "clayton", "gaussian"})
    void tauBOfCountsIsThatOfDrawnYears(String family) {
        Copula copula = CopulaFamily.parse(family).at(0.5);
        FrequencyModel first = new NegativeBinomial(1.8, 1.4);
        FrequencyModel second = new Poisson(0.9);
        double exact = CountConcordance.tauB(copula, first, second);
        int years = 4_000;
        int batches = 20;
        double[] seen = new double[batches];
        for (int b = 0; b < batches; b++) {
            seen[b] = drawnTauB(copula, first, second, years, b + 1);
        }
        double mean = Arrays.stream(seen).average().orElseThrow();
        double error = Math.sqrt(Arrays.stream(seen).map(v -> (v - mean) * (v - mean)).sum() / (batches - 1) / batches);
        assertEquals(exact, mean, 4.5 * error);
    }

    private static double drawnTauB(Copula copula, FrequencyModel first, FrequencyModel second, int years, int seed) {
        double[][] scores = new double[2][years];
        var sampler = copula.sampler(2);
        sampler.draw(new KeyedStream(seed), 0, years, scores);
        int[] n = new int[years];
        int[] m = new int[years];
        for (int y = 0; y < years; y++) {
            n[y] = first.quantile(sampler.uniform(0, scores[0][y]));
            m[y] = second.quantile(sampler.uniform(1, scores[1][y]));
        }
        long difference = 0;
        long untiedFirst = 0;
        long untiedSecond = 0;
        for (int y = 0; y < years; y++) {
            for (int z = 0; z < y; z++) {
                difference += Integer.signum(n[y] - n[z]) * Integer.signum(m[y] - m[z]);
                untiedFirst += n[y] == n[z] ? 0 : 1;
                untiedSecond += m[y] == m[z] ? 0 : 1;
            }
        }
        return difference / Math.sqrt((double) untiedFirst * untiedSecond);
    }

    /** Two counts of 0 or 1 have τ-b = φ, the coefficient of the 2 × 2 table (Agresti 2002, "Categorical Data Analysis", ch. 2). */
    @Test
    void tauBOfTwoIndicatorsIsTheirPhi() {
        Copula copula = CopulaFamily.parse("frank").at(0.4);
        double p = 0.3;
        double q = 0.2;
        double both = p + q - 1 + copula.cdf(1 - p, 1 - q);
        double phi = (both - p * q) / Math.sqrt(p * (1 - p) * q * (1 - q));
        assertEquals(phi, CountConcordance.tauB(copula, new Binomial(1, p), new Binomial(1, q)), 1e-12);
        assertEquals(0, CountConcordance.tauB(new Independence(), new Poisson(1), new Poisson(2)), 1e-6);
        assertEquals(1, CountConcordance.tauB(new Comonotonic(), new Poisson(1), new Poisson(1)), 1e-6);
    }

    @Test
    void totalsOfPerilsHaveTheirOwnMeansAndTheWholeIsMoreThanEach() {
        PerilTotals totals = PerilTotals.of(DEMO.portfolio(), List.of(2.0, 10.0, 100.0), SETTINGS, RunControl.NONE);
        assertEquals(DEMO.portfolio().expectedLoss(), totals.all().mean().value(), 1e-9);
        assertEquals(totals.all().mean().value(), totals.perils().stream().mapToDouble(t -> t.mean().value()).sum(), 1e-9);
        for (PerilTotals.Total peril : totals.perils()) {
            assertTrue(peril.byReturnPeriod().get(100.0).value() <= totals.all().byReturnPeriod().get(100.0).value());
            assertTrue(peril.byReturnPeriod().get(10.0).value() <= peril.byReturnPeriod().get(100.0).value());
        }
    }

    @Test
    void exceedanceCurvesRiseAndNetIsNoMoreThanGross() {
        ExceedanceCurves curves = ExceedanceCurves.of(DEMO, SETTINGS, RunControl.NONE);
        double before = 0;
        for (double years : ExceedanceCurves.RETURN_PERIODS) {
            double gross = curves.gross().total().get(years).value();
            assertTrue(gross >= before && curves.net().total().get(years).value() <= gross + 1e-9);
            assertTrue(curves.gross().largestEvent().get(years).value() <= gross + 1e-9);
            before = gross;
        }
        assertEquals(61, ExceedanceCurves.RETURN_PERIODS.size());
        assertEquals(1000, ExceedanceCurves.RETURN_PERIODS.get(60), 1e-9);
    }

    @Test
    void usesOfTheLimitsAddUpToTheLossOnLine() {
        List<LimitUse> uses = LimitUse.of(DEMO, SETTINGS, RunControl.NONE);
        Quote quote = Quote.of(DEMO, EngineChoice.AUTO, SETTINGS, RunControl.NONE);
        for (int j = 0; j < uses.size(); j++) {
            assertEquals(quote.layers().get(j).lossOnLine().value(), uses.get(j).uses().stream().mapToDouble(Figure::value).sum(), 2e-6, uses.get(j).name());
        }
        assertEquals(3, uses.get(0).uses().size());
        assertEquals(1.5, uses.get(2).limits(), 1e-12);
        assertTrue(uses.get(0).uses().get(0).value() > uses.get(0).uses().get(1).value());
    }

    @Test
    void usesOfSimulatedLayersAddUpAsWell() {
        Treaty inuring = DemoFiles.treaty(DemoFiles.PORTFOLIO, "treaties/harrow-coast-inuring.json");
        List<LimitUse> uses = LimitUse.of(inuring, SETTINGS, RunControl.NONE);
        Quote quote = Quote.of(inuring, EngineChoice.SIMULATION, SETTINGS, RunControl.NONE);
        for (int j = 0; j < uses.size(); j++) {
            if (!uses.get(j).uses().isEmpty()) {
                Figure lossOnLine = quote.layers().get(j).lossOnLine();
                assertEquals(lossOnLine.value(), uses.get(j).uses().stream().mapToDouble(Figure::value).sum(), 5 * lossOnLine.error() + 1e-9, uses.get(j).name());
            }
        }
    }

    /** The sum of two independent exponential parts, one of which comes with a chance: P(X > x) in closed form. */
    @Test
    void eventsAboveAnAmountOfTwoPartsFollowTheirSum() {
        double chance = 0.3;
        Peril peril = new Peril("wind", new Poisson(2), new EventLoss.Split(
                List.of(new SubPeril("wind", 1, new Exponential(10)), new SubPeril("surge", chance, new Exponential(4))), new Independence()));
        DoubleUnaryOperator above = EventsAbove.of(peril).orElseThrow();
        Random random = new Random(1);
        for (int k = 0; k < 50; k++) {
            double x = 0.1 + 60 * random.nextDouble();
            double sum = (10 * Math.exp(-x / 10) - 4 * Math.exp(-x / 4)) / 6;
            double exact = 2 * ((1 - chance) * Math.exp(-x / 10) + chance * sum);
            assertEquals(exact, above.applyAsDouble(x), 1e-3 * exact, "at " + x);
        }
    }
}
