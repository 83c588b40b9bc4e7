package layerweft.engine.simulation;

/**
 * Counts the years by annual amount, in cells whose width is a fixed fraction of the amount, so that quantiles, tail means and curves
 * can be read afterwards with memory that does not grow with the number of years. Counts are integers: merging is exact and does
 * not depend on its order, and so neither do the results on the number of threads.
 *
 * <p>Every octave is cut into 2^bits cells, and every cell into its lower edge alone and its inside. Whole numbers, and whole
 * multiples of the unit (a layer's limit), stand on edges as long as they have few binary digits: such atoms are kept exactly. Inside a
 * cell the law is read as uniform; the error of a quantile of a continuous law is of second order in the cell's width, 2^-bits
 * relative, far below the sampling error of the quantile itself; at worst (an atom inside a cell) it is the width.
 */
final class AmountSketch {
    private static final int FIRST_EXPONENT = -1022;
    private static final int OCTAVES = 2046;
    /** Units in the last place within which an amount counts as standing on an edge. */
    private static final long ROUNDING = 8;

    private final int bits;
    private final int shift;
    private final long low;
    private final int inOctave;
    private final double unit;
    private final double perUnit;
    private final int[][] cells = new int[OCTAVES][];
    /** Amounts below 0, by their size; null where there are none. */
    private AmountSketch negative;
    private long zeros;
    private long infinite;
    private long count;

    /**
     * @param bits binary digits that tell cells of an octave apart
     * @param unit amounts are counted in multiples of this
     */
    AmountSketch(int bits, double unit) {
        this.bits = bits;
        this.shift = 52 - bits;
        this.low = (1L << shift) - 1;
        this.inOctave = (1 << bits) - 1;
        this.unit = unit;
        this.perUnit = 1 / unit;
    }

    /** The unit in which multiples of a layer's limit and plain whole numbers both stand on edges, where possible. */
    static double unitFor(double limit, int bits) {
        boolean few = limit < Double.POSITIVE_INFINITY && (Double.doubleToRawLongBits(limit) & ((1L << (56 - bits)) - 1)) == 0;
        return few || limit == Double.POSITIVE_INFINITY ? 1 : limit;
    }

    /** Counts the first {@code years} amounts. */
    void add(double[] amounts, int years) {
        count += years;
        for (int y = 0; y < years; y++) {
            add(amounts[y]);
        }
    }

    /** Counts {@code years} amounts of which all are 0 but those of the years listed, which come first in {@code listed}. */
    void add(double[] amounts, int[] listed, int listedYears, int years) {
        count += years;
        zeros += years - listedYears;
        for (int k = 0; k < listedYears; k++) {
            add(amounts[listed[k]]);
        }
    }

    private void add(double amount) {
        if (amount <= 0) {
            if (amount < 0) {
                below().add(-amount);
            } else {
                zeros++;
            }
            return;
        }
        // a sum of limits may be off its edge by a rounding or two: read it as on the edge
        long raw = Double.doubleToRawLongBits(amount * perUnit) + ROUNDING;
        int octave = (int) (raw >>> 52) - 1;
        if (octave < 0 || octave >= OCTAVES) {
            outside(octave);
            return;
        }
        int[] cell = cells[octave];
        if (cell == null) {
            cell = cells[octave] = new int[2 << bits];
        }
        int at = (int) (raw >>> shift) & inOctave;
        cell[2 * at + ((raw & low) <= 2 * ROUNDING ? 0 : 1)]++;
    }

    private AmountSketch below() {
        if (negative == null) {
            negative = new AmountSketch(bits, unit);
        }
        return negative;
    }

    private void outside(int octave) {
        if (octave < 0) {
            zeros++;
        } else {
            infinite++;
        }
    }

    /** Takes over the counts of a sketch with the same cells. */
    void merge(AmountSketch other) {
        count += other.count;
        zeros += other.zeros;
        infinite += other.infinite;
        if (other.negative != null) {
            below().merge(other.negative);
        }
        for (int o = 0; o < OCTAVES; o++) {
            if (other.cells[o] == null) {
                continue;
            }
            if (cells[o] == null) {
                cells[o] = new int[2 << bits];
            }
            for (int c = 0; c < cells[o].length; c++) {
                cells[o][c] += other.cells[o][c];
            }
        }
    }

    /** The law of the amounts counted so far. */
    AmountLaw law() {
        AmountLaw.Builder law = new AmountLaw.Builder(count);
        if (negative != null) {
            for (int o = OCTAVES - 1; o >= 0; o--) {
                for (int c = negative.cells[o] == null ? -1 : negative.cells[o].length - 1; c >= 0; c--) {
                    law.add(-high(o, c), -low(o, c), negative.cells[o][c]);
                }
            }
        }
        law.add(0, 0, zeros + (negative == null ? 0 : negative.zeros));
        for (int o = 0; o < OCTAVES; o++) {
            for (int c = 0; cells[o] != null && c < cells[o].length; c++) {
                law.add(low(o, c), high(o, c), cells[o][c]);
            }
        }
        law.add(Double.POSITIVE_INFINITY, Double.POSITIVE_INFINITY, infinite);
        return law.build();
    }

    /** The lower end of cell c of an octave, in money. */
    private double low(int octave, int c) {
        return Math.scalb(1 + Math.scalb((double) (c >> 1), -bits), octave + FIRST_EXPONENT) * unit;
    }

    /** The upper end: the lower one for the edge alone, that of the next cell for the inside. */
    private double high(int octave, int c) {
        return low(octave, (c & 1) == 0 ? c : c + 1);
    }
}
