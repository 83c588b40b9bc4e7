package layerweft.engine.simulation;

import java.util.Arrays;
import layerweft.model.treaty.Treaty;

/**
 * The amounts of each year of a block, at 100 % of each layer: what the terms make of the events. A workspace, zeroed for each block.
 *
 * <p>Most layers are hit in few years: those years are listed, so that whatever follows passes over the others.
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
    /** The years in which the layer has any amount, in no order: the first {@code hitYears[layer]} of {@code hitYear[layer]}. */
    final int[][] hitYear;
    final int[] hitYears;
    /** Ground-up total of all perils, and its largest event. */
    final double[] gross;
    final double[] grossLargest;
    /** The largest of one event's recoveries of all layers at their shares, and of what remains of an event. */
    final double[] cededLargest;
    final double[] netLargest;
    /** Parts of {@link #sum} and {@link #gross} by peril, {@code [layer][peril][year]} and {@code [peril][year]}; null where nobody asks. */
    final double[][][] sumOf;
    final double[][] grossOf;

    static YearAmounts of(Treaty treaty, int years) {
        return of(treaty, years, false);
    }

    /** With what each peril brings. */
    static YearAmounts byPeril(Treaty treaty, int years) {
        return of(treaty, years, true);
    }

    private static YearAmounts of(Treaty treaty, int years, boolean byPeril) {
        boolean[] timed = new boolean[treaty.layers()];
        for (int j = 0; j < timed.length; j++) {
            timed[j] = treaty.layer(j).proRataTime();
        }
        return new YearAmounts(years, timed, byPeril ? treaty.portfolio().perils().size() : 0);
    }

    private YearAmounts(int years, boolean[] proRataTime, int perils) {
        int layers = proRataTime.length;
        sum = new double[layers][years];
        hits = new int[layers][years];
        largest = new double[layers][years];
        hitYear = new int[layers][years + 1];
        hitYears = new int[layers];
        timedFactor = new double[layers][];
        for (int j = 0; j < layers; j++) {
            timedFactor[j] = proRataTime[j] ? new double[years] : null;
        }
        gross = new double[years];
        grossLargest = new double[years];
        cededLargest = new double[years];
        netLargest = new double[years];
        sumOf = perils == 0 ? null : new double[layers][perils][years];
        grossOf = perils == 0 ? null : new double[perils][years];
    }

    /** Lists a year for a layer unless it is already; to be called before the layer's first amount of the year is put in. */
    void list(int layer, int year) {
        hitYear[layer][hitYears[layer]] = year;
        hitYears[layer] += sum[layer][year] == 0 && largest[layer][year] == 0 ? 1 : 0;
    }

    void clear(int years) {
        for (int j = 0; j < sum.length; j++) {
            for (int k = 0; k < hitYears[j]; k++) {
                int y = hitYear[j][k];
                sum[j][y] = 0;
                hits[j][y] = 0;
                largest[j][y] = 0;
                if (timedFactor[j] != null) {
                    timedFactor[j][y] = 0;
                }
            }
            hitYears[j] = 0;
        }
        for (int i = 0; grossOf != null && i < grossOf.length; i++) {
            Arrays.fill(grossOf[i], 0, years, 0);
            for (double[][] layer : sumOf) {
                Arrays.fill(layer[i], 0, years, 0);
            }
        }
        Arrays.fill(gross, 0, years, 0);
        Arrays.fill(grossLargest, 0, years, 0);
        Arrays.fill(cededLargest, 0, years, 0);
        Arrays.fill(netLargest, 0, years, 0);
    }
}
