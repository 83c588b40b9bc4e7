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
        int[] visit = visits(years, ties);
        int[] rankOfTotal = ranks(totals, visit);
        int[] rankOfScore = ranks(Arrays.copyOf(scores, years), visit);
        int[] yearOfRank = new int[years];
        for (int y = 0; y < years; y++) {
            yearOfRank[rankOfScore[y]] = y;
        }
        if (work.target == null) {
            work.target = new int[work.counts.length];
        }
        for (int y = 0; y < years; y++) {
            work.target[y] = yearOfRank[rankOfTotal[y]];
        }
    }

    /** The years in random order (Fisher &amp; Yates 1938). */
    private static int[] visits(int years, KeyedStream random) {
        random.seek(0);
        int[] visit = new int[years];
        for (int y = 0; y < years; y++) {
            int at = random.nextInt(y + 1);
            visit[y] = visit[at];
            visit[at] = y;
        }
        return visit;
    }

    /** Ranks from 0; equal values get theirs in the order of the visits. Sorting plain numbers and searching is faster than sorting places. */
    private static int[] ranks(double[] values, int[] visit) {
        double[] sorted = values.clone();
        Arrays.sort(sorted);
        int[] equalSoFar = new int[values.length];
        int[] rank = new int[values.length];
        for (int y : visit) {
            int first = firstOf(sorted, values[y]);
            rank[y] = first + equalSoFar[first]++;
        }
        return rank;
    }

    private static int firstOf(double[] sorted, double value) {
        int low = 0;
        int high = sorted.length - 1;
        while (low < high) {
            int middle = (low + high) >>> 1;
            if (sorted[middle] < value) {
                low = middle + 1;
            } else {
                high = middle;
            }
        }
        return low;
    }
}
