package layerweft.figures;

import java.util.List;
import java.util.Map;
import java.util.SortedMap;
import java.util.TreeMap;

/**
 * What the programme costs its buyer and what it takes away, money at the layers' shares. Premiums are the quoted ones, technical where
 * none is quoted.
 *
 * @param upfrontPremium Σ P
 * @param reinstatementPremium expected, Σ P·Σ c_k E[u_k]
 * @param expectedRecoveries Σ E[Y]
 * @param costOfCover premiums with expected reinstatement premiums less expected recoveries
 * @param netPosition expected gross losses less recoveries, with all premiums
 * @param reliefOfStandardDeviation gross less net
 * @param reliefOfValueAtRisk gross less net, by level
 * @param reliefOfTailValueAtRisk gross less net, at the buyer's tail level
 * @param costPerUnitOfTailRelief cost of cover by relief of the tail value at risk; undefined without relief
 */
public record BuyerPosition(
        Figure upfrontPremium,
        Figure reinstatementPremium,
        Figure expectedRecoveries,
        Figure costOfCover,
        Figure netPosition,
        Figure reliefOfStandardDeviation,
        SortedMap<Double, Figure> reliefOfValueAtRisk,
        Figure reliefOfTailValueAtRisk,
        Figure costPerUnitOfTailRelief) {

    public static BuyerPosition of(List<LayerFigures> layers, WholeStatistics whole) {
        ProgrammeCost programme = ProgrammeCost.of(layers);
        Figure cost = programme.costOfCover();
        SortedMap<Double, Figure> relief = new TreeMap<>();
        for (Map.Entry<Double, Figure> gross : whole.gross().valueAtRisk().entrySet()) {
            relief.put(gross.getKey(), fall(gross.getValue(), whole.net().valueAtRisk().get(gross.getKey())));
        }
        Figure tail = fall(whole.gross().tailValueAtRisk(), whole.net().tailValueAtRisk());
        Figure perUnit = tail.value() > 0 && tail.value() < Double.POSITIVE_INFINITY
                ? new Figure(cost.value() / tail.value(), (cost.error() + Math.abs(cost.value() / tail.value()) * tail.error()) / tail.value())
                : Figure.UNDEFINED;
        return new BuyerPosition(programme.upfrontPremium(), programme.reinstatementPremium(), programme.expectedRecoveries(), cost, whole.gross().mean().plus(cost),
                fall(whole.gross().standardDeviation(), whole.net().standardDeviation()), relief, tail, perUnit);
    }

    /** Undefined where both are infinite. */
    private static Figure fall(Figure gross, Figure net) {
        return gross.infinite() && net.infinite() ? Figure.UNDEFINED : gross.minus(net);
    }
}
