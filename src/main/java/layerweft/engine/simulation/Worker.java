package layerweft.engine.simulation;

import java.util.Arrays;
import layerweft.model.treaty.Layer;
import layerweft.model.treaty.LayerTerms;
import layerweft.model.treaty.Treaty;

/** One thread's workspaces: draws a block, applies the terms and counts the years. Nothing is allocated per year or event. */
final class Worker {
    private final LayerTerms[] terms;
    private final double[] share;
    private final YearDraw draw;
    private final PerilYears[] perils;
    private final double[][] scores;
    private final TermsApplied applied;
    private final YearAmounts amounts;
    private final double[] ceded;
    private final double[] net;

    Worker(Treaty treaty, YearDraw draw, int years) {
        this.draw = draw;
        int layers = treaty.layers();
        terms = new LayerTerms[layers];
        share = new double[layers];
        for (int j = 0; j < layers; j++) {
            Layer layer = treaty.layer(j);
            terms[j] = layer.terms();
            share[j] = layer.share();
        }
        perils = draw.workspace(years);
        scores = new double[draw.perils()][years];
        applied = TermsApplied.of(treaty);
        amounts = YearAmounts.of(treaty, years);
        ceded = new double[years];
        net = new double[years];
    }

    /** Simulates a block, counts its years into the sketches and returns its sums. */
    BlockSums simulate(long block, int years, Sketches sketches) {
        draw.draw(block, years, perils, scores);
        amounts.clear(years);
        applied.apply(perils, years, draw, block, amounts);
        wholeTotals(years);
        LayerSums[] layers = new LayerSums[terms.length];
        for (int j = 0; j < layers.length; j++) {
            layers[j] = LayerSums.of(terms[j], amounts, j, years);
            sketches.sums[j].add(amounts.sum[j], amounts.hitYear[j], amounts.hitYears[j], years);
            sketches.largest[j].add(amounts.largest[j], amounts.hitYear[j], amounts.hitYears[j], years);
        }
        double[][] totals = {amounts.gross, ceded, net};
        double[][] largest = {amounts.grossLargest, amounts.cededLargest, amounts.netLargest};
        PositionSums[] positions = new PositionSums[totals.length];
        for (int k = 0; k < totals.length; k++) {
            positions[k] = PositionSums.of(totals[k], amounts.gross, years);
            sketches.totals[k].add(totals[k], years);
            sketches.largestEvents[k].add(largest[k], years);
        }
        return new BlockSums(layers, positions);
    }

    private void wholeTotals(int years) {
        Arrays.fill(ceded, 0, years, 0);
        for (int j = 0; j < terms.length; j++) {
            for (int k = 0; k < amounts.hitYears[j]; k++) {
                int y = amounts.hitYear[j][k];
                ceded[y] += share[j] * terms[j].annualLoss(amounts.sum[j][y]);
            }
        }
        for (int y = 0; y < years; y++) {
            net[y] = amounts.gross[y] - ceded[y];
        }
    }
}
