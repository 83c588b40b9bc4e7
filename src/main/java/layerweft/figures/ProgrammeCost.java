package layerweft.figures;

import java.util.List;

/**
 * What a programme is expected to cost its buyer, money at the layers' shares. Premiums are the quoted ones, technical where none is quoted.
 *
 * @param upfrontPremium Σ P
 * @param reinstatementPremium expected, Σ P·Σ c_k E[u_k]
 * @param expectedRecoveries Σ E[Y]
 * @param costOfCover premiums with expected reinstatement premiums less expected recoveries
 */
public record ProgrammeCost(Figure upfrontPremium, Figure reinstatementPremium, Figure expectedRecoveries, Figure costOfCover) {

    public static ProgrammeCost of(List<LayerFigures> layers) {
        Figure upfront = Figure.exact(0);
        Figure reinstatement = Figure.exact(0);
        Figure recoveries = Figure.exact(0);
        Figure cost = Figure.exact(0);
        for (LayerFigures layer : layers) {
            upfront = upfront.plus(layer.premium());
            reinstatement = reinstatement.plus(layer.reinstatementPremium());
            recoveries = recoveries.plus(layer.expectedLoss());
            cost = cost.plus(layer.costOfCover());
        }
        return new ProgrammeCost(upfront, reinstatement, recoveries, cost);
    }
}
