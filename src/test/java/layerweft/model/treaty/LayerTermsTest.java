package layerweft.model.treaty;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;
import java.util.List;
import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class LayerTermsTest {
    private static final double NONE = Double.POSITIVE_INFINITY;

    private static LayerTerms excess(double limit, double retention) {
        return Layer.of("layer", OccurrenceTerms.excess(limit, retention), AnnualTerms.NONE).terms();
    }

    /** HM Revenue and Customs, General Insurance Manual, GIM8070: 20,000 xs 10,000 on three claims. */
    @Test
    void riskCoverPaysThePublishedRecoveries() {
        LayerTerms terms = excess(20_000, 10_000);
        double[] recoveries = Arrays.stream(new double[] {12_000, 35_000, 60_000}).map(terms::occurrenceLoss).toArray();
        assertArrayEquals(new double[] {2_000, 20_000, 20_000}, recoveries);
    }

    @ParameterizedTest
    @CsvSource({"0, 0", "9.999, 0", "10, 0", "10.5, 0.5", "30, 20", "31, 20", "Infinity, 20"})
    void excessOfLossPaysBetweenRetentionAndTop(double loss, double paid) {
        assertEquals(paid, excess(20, 10).occurrenceLoss(loss), 1e-12);
    }

    @ParameterizedTest
    @CsvSource({"9.9, 0", "10, 0", "10.1, 10.1", "25, 20"})
    void franchisePaysFromTheGroundOnceItIsPassedStrictly(double loss, double paid) {
        LayerTerms terms = Layer.of("f", new OccurrenceTerms(0, 10.0, 20), AnnualTerms.NONE).terms();
        assertEquals(paid, terms.occurrenceLoss(loss), 1e-12);
    }

    @Test
    void quotaShareComesBeforeRetentionAndFranchise() {
        Layer excess = new Layer("q", List.of(), OccurrenceTerms.excess(20, 10), AnnualTerms.NONE, null, 0.5, 1, false, List.of(), null);
        assertEquals(5, excess.terms().occurrenceLoss(30), 1e-12);
        Layer franchise = new Layer("q", List.of(), new OccurrenceTerms(0, 10.0, NONE), AnnualTerms.NONE, null, 0.5, 1, false, List.of(), null);
        assertEquals(0, franchise.terms().occurrenceLoss(20), 1e-12);
        assertEquals(10.5, franchise.terms().occurrenceLoss(21), 1e-12);
    }

    /** Common practice, no source: losses to a 2m layer with one reinstatement of 0.35, 1 and 2 leave 0.65 of the aggregate. */
    @Test
    void reinstatementsLimitTheYear() {
        LayerTerms terms = Layer.of("r", OccurrenceTerms.excess(2, 5), AnnualTerms.NONE).withReinstatements(List.of(1.0)).terms();
        assertEquals(4, terms.annualLimit());
        assertEquals(0.65, terms.annualLimit() - terms.annualLoss(0.35 + 1 + 2), 1e-12);
    }

    /** Insurance Institute study text M97 (2018-19), example 5.16: 100,000 xs 100,000, a loss of 150,000, one reinstatement at 100 %. */
    @Test
    void reinstatementPremiumIsProRataToAmount() {
        LayerTerms terms = Layer.of("r", OccurrenceTerms.excess(100_000, 100_000), AnnualTerms.NONE).withReinstatements(List.of(1.0)).terms();
        double loss = terms.annualLoss(terms.occurrenceLoss(150_000));
        assertEquals(5_000, 10_000 * terms.reinstatementFactor(loss), 1e-9);
        assertEquals(6_000, 0.01 * 1_200_000 * terms.reinstatementFactor(loss), 1e-9);
    }

    /** Reinsurance training slides "Premium adjustment" (2017), scenario 1: 5,000,000 xs 400,000, premium 50,000, a loss of 800,000. */
    @Test
    void reinstatementPremiumOfASmallLossIsSmall() {
        LayerTerms terms = Layer.of("r", OccurrenceTerms.excess(5_000_000, 400_000), AnnualTerms.NONE).withReinstatements(List.of(1.0)).terms();
        double loss = terms.annualLoss(terms.occurrenceLoss(800_000));
        assertEquals(400_000, loss, 1e-9);
        assertEquals(4_000, 50_000 * terms.reinstatementFactor(loss), 1e-9);
    }

    /**
     * Parodi (2014), "Pricing in General Insurance", exercise (inputs; attribution from memory): 3m xs 5m, one free and one 50 %
     * reinstatement, premium 400,000, losses 7.5m and 11.7m. The values are recomputed by the usual rule.
     */
    @Test
    void freeReinstatementsAreUsedBeforePaidOnes() {
        LayerTerms terms = Layer.of("r", OccurrenceTerms.excess(3e6, 5e6), AnnualTerms.NONE).withReinstatements(List.of(0.0, 0.5)).terms();
        assertEquals(9e6, terms.annualLimit());
        double loss = terms.annualLoss(terms.occurrenceLoss(7.5e6) + terms.occurrenceLoss(11.7e6));
        assertEquals(5.5e6, loss, 1e-6);
        assertEquals(166_666.6667, 400_000 * terms.reinstatementFactor(loss), 1e-4);
    }

    @Test
    void secondEventCoverPaysTheSecondFullLossOnly() {
        LayerTerms terms = Layer.of("2nd", OccurrenceTerms.excess(30, 20), new AnnualTerms(30, 30)).terms();
        assertEquals(0, terms.annualLoss(30));
        assertEquals(30, terms.annualLoss(60));
        assertEquals(30, terms.annualLoss(90));
    }

    @Test
    void theLineIsTheOccurrenceLimitOrElseTheAnnualOne() {
        assertEquals(30, Layer.of("a", OccurrenceTerms.excess(30, 20), new AnnualTerms(0, 60)).terms().line());
        assertEquals(60, Layer.of("b", OccurrenceTerms.NONE, new AnnualTerms(40, 60)).terms().line());
        assertEquals(NONE, Layer.of("c", OccurrenceTerms.NONE, AnnualTerms.NONE).terms().line());
    }

    @Test
    void anAnnualLimitBelowTheReinstatedOneHolds() {
        assertEquals(45, Layer.of("a", OccurrenceTerms.excess(30, 20), new AnnualTerms(0, 45)).withReinstatements(List.of(1.0)).terms().annualLimit());
    }

    /** Before annual terms, the layers of a tower add up to the loss between its ends; a change of currency scales every amount. */
    @ParameterizedTest
    @ValueSource(longs = {1, 2, 3, 4, 5})
    void towersAddUpAndScale(long seed) {
        SplittableRandom random = new SplittableRandom(seed);
        for (int n = 0; n < 200; n++) {
            double a = random.nextDouble(50);
            double b = a + random.nextDouble(0.1, 50);
            double c = b + random.nextDouble(0.1, 50);
            double x = random.nextDouble(200);
            double factor = random.nextDouble(0.1, 10);
            double tower = excess(b - a, a).occurrenceLoss(x) + excess(c - b, b).occurrenceLoss(x);
            assertEquals(excess(c - a, a).occurrenceLoss(x), tower, 1e-9, "seed " + seed + ", x " + x);
            assertEquals(factor * excess(b - a, a).occurrenceLoss(x), excess(factor * (b - a), factor * a).occurrenceLoss(factor * x), 1e-9,
                    "seed " + seed);
            assertTrue(excess(b - a, a).occurrenceLoss(x) >= excess(b - a, b).occurrenceLoss(x), "a higher retention at the same limit never pays more");
        }
    }

    /** Cumulated recoveries rise, and event by event they add up to the annual loss. */
    @ParameterizedTest
    @ValueSource(longs = {11, 12, 13})
    void recoveriesByEventAddUpToTheYear(long seed) {
        SplittableRandom random = new SplittableRandom(seed);
        LayerTerms terms = Layer.of("a", OccurrenceTerms.excess(20, 10), new AnnualTerms(15, 50)).terms();
        double soFar = 0;
        double recovered = 0;
        for (int k = 0; k < 12; k++) {
            double before = terms.annualLoss(soFar);
            soFar += terms.occurrenceLoss(random.nextDouble(60));
            double piece = terms.annualLoss(soFar) - before;
            assertTrue(piece >= 0, "seed " + seed);
            recovered += piece;
        }
        assertEquals(terms.annualLoss(soFar), recovered, 1e-9, "seed " + seed);
    }
}
