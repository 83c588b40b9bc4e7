package layerweft.engine.simulation;

import java.util.Arrays;
import layerweft.model.random.KeyedStream;

/**
 * Rearranges a peril's years within a block so that the ranks of their totals are those of given scores (Iman &amp; Conover 1982 in
 * spirit, with scores drawn from the copula itself). The margin stays exactly what it was, and the events of a year stay together.
 */
final class RankOrder {

    private RankOrder() {}

    /** Sets {@code work.target}. Equal totals, such as loss-free years, are ordered at random. */
    static void rearrange(PerilYears work, int years, double[] scores, KeyedStream ties) {
        double[] totals = new double[years];
        work.totals(years, totals);
        ties.seek(0);
        int[] tieBreak = ties.ints(years).toArray();
        int[] byTotal = order(totals, tieBreak, years);
        int[] byScore = order(scores, tieBreak, years);
        if (work.target == null) {
            work.target = new int[work.counts.length];
        }
        for (int rank = 0; rank < years; rank++) {
            work.target[byTotal[rank]] = byScore[rank];
        }
    }

    /** Positions in rising order of value, then of tie break. */
    private static int[] order(double[] values, int[] tieBreak, int years) {
        Integer[] positions = new Integer[years];
        Arrays.setAll(positions, y -> y);
        Arrays.sort(positions, (a, b) -> {
            int c = Double.compare(values[a], values[b]);
            return c != 0 ? c : Integer.compare(tieBreak[a], tieBreak[b]);
        });
        int[] order = new int[years];
        for (int y = 0; y < years; y++) {
            order[y] = positions[y];
        }
        return order;
    }
}
