package layerweft.engine.simulation;

import java.util.Arrays;
import layerweft.model.treaty.LayerTerms;
import layerweft.model.treaty.Treaty;

/**
 * The buyer's year under one programme: net position = gross losses − recoveries + premiums, premiums upfront and for reinstatement, every
 * layer at its share. Workspaces of one thread.
 */
final class NetYears {
    private final LayerTerms[] terms;
    private final double[] share;
    private final double[] upfront;
    private final double allUpfront;
    final double[] recoveries;
    final double[] premiums;
    final double[] net;

    /** @param upfront premium of each layer at its share */
    NetYears(Treaty treaty, double[] upfront, int years) {
        this.upfront = upfront.clone();
        this.allUpfront = Arrays.stream(upfront).sum();
        terms = new LayerTerms[treaty.layers()];
        share = new double[terms.length];
        for (int j = 0; j < terms.length; j++) {
            terms[j] = treaty.layer(j).terms();
            share[j] = treaty.layer(j).share();
        }
        recoveries = new double[years];
        premiums = new double[years];
        net = new double[years];
    }

    /** Fills the arrays for the first {@code years} years. */
    void of(YearAmounts amounts, int years) {
        Arrays.fill(recoveries, 0, years, 0);
        Arrays.fill(premiums, 0, years, allUpfront);
        for (int j = 0; j < terms.length; j++) {
            boolean paid = amounts.timedFactor[j] != null || terms[j].hasPaidReinstatements();
            for (int k = 0; k < amounts.hitYears[j]; k++) {
                int y = amounts.hitYear[j][k];
                double loss = terms[j].annualLoss(amounts.sum[j][y]);
                recoveries[y] += share[j] * loss;
                if (paid) {
                    premiums[y] += upfront[j] * (amounts.timedFactor[j] == null ? terms[j].reinstatementFactor(loss) : amounts.timedFactor[j][y]);
                }
            }
        }
        for (int y = 0; y < years; y++) {
            net[y] = amounts.gross[y] - recoveries[y] + premiums[y];
        }
    }
}
