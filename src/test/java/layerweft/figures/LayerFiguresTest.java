package layerweft.figures;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertNull;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Map;
import java.util.SortedMap;
import java.util.TreeMap;
import layerweft.model.treaty.AnnualTerms;
import layerweft.model.treaty.Buyer;
import layerweft.model.treaty.Layer;
import layerweft.model.treaty.OccurrenceTerms;
import org.junit.jupiter.api.Test;

/** Share and ratios on a layer's statistics, the whole programme and the buyer's position, as arithmetic. */
class LayerFiguresTest {
    private static final Buyer BUYER = new Buyer(List.of(100.0, 10.0), 0.99, 0.06);

    private static SortedMap<Double, Figure> levels(double ninety, double ninetyNine) {
        return new TreeMap<>(Map.of(0.9, new Figure(ninety, 0.5), 0.99, new Figure(ninetyNine, 1)));
    }

    private static LayerStatistics statistics(double loss, double premium) {
        return new LayerStatistics(Engine.TRANSFORM, new Figure(loss, 0.01), new Bracket(loss - 0.1, loss + 0.2), new Figure(8, 0.02), new Figure(0.2, 0.001),
                new Figure(0.03, 0.002), Figure.exact(0.4), new Figure(0.25, 0.005), new Figure(5, 0.03), new Figure(premium, 0.04), levels(10, 30),
                new Figure(33, 0.7), levels(9, 20));
    }

    private static Layer layer(double limit, double share, Double premium) {
        return new Layer("layer", List.of(), OccurrenceTerms.excess(limit, 5), AnnualTerms.NONE, null, 1, share, false, List.of(), premium);
    }

    private static void figure(double value, double error, Figure found) {
        assertEquals(value, found.value(), 1e-12);
        assertEquals(error, found.error(), 1e-12);
    }

    @Test
    void shareScalesMoneyAndNotRatios() {
        LayerFigures half = LayerFigures.of(layer(20, 0.5, 6.0), BUYER, statistics(3, 4));
        figure(1.5, 0.005, half.expectedLoss());
        assertEquals(new Bracket(0.5 * 2.9, 0.5 * 3.2), half.bracket());
        figure(4, 0.01, half.standardDeviation());
        figure(2.5, 0.015, half.netPremium());
        figure(2, 0.02, half.technicalPremium());
        figure(5, 0.25, half.valueAtRisk().get(0.9));
        figure(16.5, 0.35, half.tailValueAtRisk());
        figure(4.5, 0.25, half.occurrence().get(10.0));
        figure(15, 0.5, half.aggregate().get(100.0));
        assertEquals(List.of(10.0, 100.0), List.copyOf(half.aggregate().keySet()));
        assertEquals(3, half.quotedPremium());

        figure(3 / 20.0, 0.01 / 20, half.lossOnLine());
        figure(4 / 20.0, 0.04 / 20, half.technicalRateOnLine());
        figure(0.2, 0.001, half.attachmentProbability());
        figure(0.03, 0.002, half.exhaustionProbability());
        figure(0.4, 0, half.expectedEvents());
        figure(1.25, 0.005, half.paidUpFactor());
        assertEquals(6 / 20.0, half.quotedRateOnLine());
        figure(20 / 6.0, 0, half.payback());
    }

    @Test
    void withoutAQuoteThePremiumAndThePaybackAreTechnical() {
        LayerFigures figures = LayerFigures.of(layer(20, 1, null), BUYER, statistics(3, 4));
        assertNull(figures.quotedPremium());
        assertNull(figures.quotedRateOnLine());
        figure(5, 0.04 / 20 * 25, figures.payback());
        assertEquals(figures.technicalPremium(), figures.premium());
    }

    @Test
    void withoutALineRatiosAreUndefined() {
        LayerFigures figures = LayerFigures.of(layer(Double.POSITIVE_INFINITY, 1, 6.0), BUYER, statistics(3, 4));
        assertFalse(figures.lossOnLine().defined() || figures.technicalRateOnLine().defined() || figures.payback().defined());
        assertNull(figures.quotedRateOnLine());
        assertEquals(6, figures.quotedPremium());
    }

    @Test
    void aLayerThatCostsNothingIsNeverPaidBack() {
        assertFalse(LayerFigures.of(layer(20, 1, 0.0), BUYER, statistics(3, 4)).payback().defined());
        assertFalse(LayerFigures.of(layer(20, 1, null), BUYER, statistics(3, 0)).payback().defined());
    }

    private static PositionStatistics position(double mean, double sd, double ninety, double ninetyNine, double tail) {
        return new PositionStatistics(new Figure(mean, 0.2), new Figure(sd, 0.1), levels(ninety, ninetyNine), new Figure(tail, 0.3), levels(1, 2));
    }

    private static WholeStatistics whole() {
        return new WholeStatistics(position(12, 20, 40, 90, 120), position(4.6, 7, 10, 50, 60), position(7.4, 13, 30, 45, 70));
    }

    private static List<LayerFigures> layers() {
        return List.of(LayerFigures.of(layer(20, 1, 6.0), BUYER, statistics(3, 4)), LayerFigures.of(layer(20, 0.5, null), BUYER, statistics(3, 4)));
    }

    @Test
    void grossLessCededIsNetAndTheLayersAddUp() {
        WholeStatistics whole = whole().withCeded(layers());
        assertEquals(3 + 1.5, whole.ceded().mean().value());
        assertEquals(whole.gross().mean().value() - whole.ceded().mean().value(), whole.net().mean().value());
        figure(7.5, 0.2 + 0.015, whole.net().mean());
        assertEquals(whole().ceded().standardDeviation(), whole.ceded().standardDeviation());
        assertEquals(whole().net().valueAtRisk(), whole.net().valueAtRisk());
    }

    @Test
    void whereBothMeansAreInfiniteTheNetMeanIsTheSimulatedOne() {
        WholeStatistics infinite = new WholeStatistics(whole().gross().withMean(Figure.INFINITE), whole().ceded(), whole().net());
        List<LayerFigures> open = List.of(LayerFigures.of(layer(20, 1, 6.0), BUYER, statistics(Double.POSITIVE_INFINITY, 4)));
        assertTrue(infinite.withCeded(open).ceded().mean().infinite());
        assertEquals(7.4, infinite.withCeded(open).net().mean().value());
        assertTrue(infinite.withCeded(layers()).net().mean().infinite());
    }

    @Test
    void costOfCoverIsPremiumsLessRecoveries() {
        BuyerPosition buyer = BuyerPosition.of(layers(), whole());
        // quoted 6 at full share, technical 4 at half; a quarter of each is expected as reinstatement premium
        figure(6 + 2, 0.02, buyer.upfrontPremium());
        figure(0.25 * 8, 0.02 * 0.25 + 0.005 * 8, buyer.reinstatementPremium());
        figure(4.5, 0.015, buyer.expectedRecoveries());
        figure(8 + 2 - 4.5, 0.02 + 0.045 + 0.015, buyer.costOfCover());
        figure(12 + 5.5, 0.2 + 0.08, buyer.netPosition());
        figure(7, 0.2, buyer.reliefOfStandardDeviation());
        figure(10, 1, buyer.reliefOfValueAtRisk().get(0.9));
        figure(45, 2, buyer.reliefOfValueAtRisk().get(0.99));
        figure(50, 0.6, buyer.reliefOfTailValueAtRisk());
        figure(5.5 / 50, (0.08 + 5.5 / 50 * 0.6) / 50, buyer.costPerUnitOfTailRelief());
    }

    @Test
    void reliefOfTwoInfinitiesIsUndefinedAndSoIsItsCost() {
        WholeStatistics infinite = new WholeStatistics(
                new PositionStatistics(Figure.INFINITE, Figure.INFINITE, levels(1, 2), Figure.INFINITE, levels(1, 2)), whole().ceded(),
                new PositionStatistics(Figure.INFINITE, Figure.INFINITE, levels(1, 2), Figure.INFINITE, levels(1, 2)));
        BuyerPosition buyer = BuyerPosition.of(layers(), infinite);
        assertFalse(buyer.reliefOfTailValueAtRisk().defined() || buyer.reliefOfStandardDeviation().defined() || buyer.costPerUnitOfTailRelief().defined());
        assertTrue(buyer.netPosition().infinite());
    }

    /** An infinite premium without reinstatements brings no reinstatement premium, and an infinite cost rather than an undefined one. */
    @Test
    void anInfinitePremiumWithoutReinstatementsHasNoReinstatementPremium() {
        LayerStatistics s = statistics(3, 4);
        LayerStatistics infinite = new LayerStatistics(s.engine(), s.expectedLoss(), null, Figure.INFINITE, s.attachmentProbability(), Figure.exact(0),
                s.expectedEvents(), Figure.exact(0), Figure.INFINITE, new Figure(Double.POSITIVE_INFINITY, Double.POSITIVE_INFINITY), s.valueAtRisk(),
                s.tailValueAtRisk(), s.occurrenceValueAtRisk());
        BuyerPosition buyer = BuyerPosition.of(List.of(LayerFigures.of(layer(Double.POSITIVE_INFINITY, 1, null), BUYER, infinite)), whole());
        figure(0, 0, buyer.reinstatementPremium());
        assertEquals(Double.POSITIVE_INFINITY, buyer.costOfCover().value());
        assertEquals(Double.POSITIVE_INFINITY, buyer.upfrontPremium().value());
    }
}
