package layerweft.engine.simulation;

import java.util.Arrays;

/**
 * The amounts of each year of a block, at 100 % of each layer: what the terms make of the events. A workspace, zeroed for each block.
 */
final class YearAmounts {
    /** A: annual sum of occurrence losses, {@code sum[layer][year]}. */
    final double[][] sum;
    /** Events of the year with an occurrence loss above 0. */
    final int[][] hits;
    /** Largest recovery from one event, taken as the first of its year. */
    final double[][] largest;
    /** Reinstatement premium as a multiple of the upfront premium, only for layers pro rata as to time; otherwise null. */
    final double[][] timedFactor;
    /** Ground-up total of all perils, and its largest event. */
    final double[] gross;
    final double[] grossLargest;
    /** The largest of one event's recoveries of all layers at their shares, and of what remains of an event. */
    final double[] cededLargest;
    final double[] netLargest;

    YearAmounts(int years, boolean[] proRataTime) {
        int layers = proRataTime.length;
        sum = new double[layers][years];
        hits = new int[layers][years];
        largest = new double[layers][years];
        timedFactor = new double[layers][];
        for (int j = 0; j < layers; j++) {
            timedFactor[j] = proRataTime[j] ? new double[years] : null;
        }
        gross = new double[years];
        grossLargest = new double[years];
        cededLargest = new double[years];
        netLargest = new double[years];
    }

    void clear(int years) {
        for (int j = 0; j < sum.length; j++) {
            Arrays.fill(sum[j], 0, years, 0);
            Arrays.fill(hits[j], 0, years, 0);
            Arrays.fill(largest[j], 0, years, 0);
            if (timedFactor[j] != null) {
                Arrays.fill(timedFactor[j], 0, years, 0);
            }
        }
        Arrays.fill(gross, 0, years, 0);
        Arrays.fill(grossLargest, 0, years, 0);
        Arrays.fill(cededLargest, 0, years, 0);
        Arrays.fill(netLargest, 0, years, 0);
    }
}
