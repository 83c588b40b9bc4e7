package layerweft.engine.simulation;

import java.util.Arrays;

/**
 * The events of one peril in the years of one block: a workspace that is filled again for every block and grows only when a block
 * brings more events than any before.
 *
 * <p>Events stand year by year in the order in which they were drawn; {@link #target} says to which year of the block a drawn year
 * belongs (its own, unless annual totals are rearranged).
 */
final class PerilYears {
    /** Events of each drawn year. */
    final int[] counts;
    /** Year of the block of each drawn year, or null where each stands in its own place. */
    int[] target;
    /** Loss of each event: {@code parts[k][e]} for part k of the event loss, 0 where a sub-peril does not occur. */
    final double[][] parts;
    /** Number of events in the block. */
    int events;

    PerilYears(int years, int partCount, int expectedEvents) {
        counts = new int[years];
        parts = new double[partCount][expectedEvents + expectedEvents / 4 + 64];
    }

    void reserve(long total) {
        if (total > Integer.MAX_VALUE - 64) {
            throw new IllegalStateException("more than " + Integer.MAX_VALUE + " events in one block of years: lower the mean frequency");
        }
        events = (int) total;
        if (parts[0].length < events) {
            for (int k = 0; k < parts.length; k++) {
                parts[k] = new double[events + events / 4];
            }
        }
    }

    /** Ground-up loss of event e, all parts. */
    double groundUp(int e) {
        double sum = 0;
        for (double[] part : parts) {
            sum += part[e];
        }
        return sum;
    }

    /** The year of the block to which drawn year y belongs. */
    int year(int y) {
        return target == null ? y : target[y];
    }

    /** Ground-up totals of the drawn years, into {@code totals}. */
    void totals(int years, double[] totals) {
        Arrays.fill(totals, 0, years, 0);
        int e = 0;
        for (int y = 0; y < years; y++) {
            for (int j = counts[y]; j > 0; j--) {
                totals[y] += groundUp(e++);
            }
        }
    }
}
