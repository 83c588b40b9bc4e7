package layerweft.engine.bounds;

import java.util.Arrays;

/** Rows of a matrix in order of a key, quickly. */
final class RankedRows {
    private final long[] keys;
    private final int bits;

    RankedRows(int rows) {
        keys = new long[rows];
        bits = 64 - Long.numberOfLeadingZeros(Math.max(1, rows - 1));
    }

    /**
     * Rows from {@code from} on, the largest key first; ties (to about 1e-9) in order of the rows.
     *
     * @param key not negative, by row; the bits of such doubles are ordered as the doubles are, so the row rides in the lowest of them
     * @param to row after the last
     */
    void falling(double[] key, int from, int to, int[] order) {
        long mask = (1L << bits) - 1;
        for (int r = from; r < to; r++) {
            keys[r] = ~((Double.doubleToRawLongBits(Math.max(0, key[r])) & ~mask) | (mask - r));
        }
        Arrays.sort(keys, from, to);
        for (int r = from; r < to; r++) {
            order[r] = (int) (mask - (~keys[r] & mask));
        }
    }
}
