package layerweft.engine.simulation;

import java.util.List;
import java.util.SortedMap;
import java.util.TreeMap;
import layerweft.figures.Figure;

/**
 * Figures of an annual total, or differences of the figures of two totals of the same years, with errors by batch means.
 */
public final class PositionSample {
    static final int MEAN = 0;
    static final int DEVIATION = 1;
    static final int TAIL = 2;
    static final int FIRST_LEVEL = 3;

    private final List<Double> levels;
    private final double[] pooled;
    private final double[][] batches;
    /** What is known of the mean, the deviation and the tail beyond any sample: finite, infinite, or an infinite less an infinite one. */
    private final Known[] known;

    /** What no sample can show. */
    private enum Known { FINITE, INFINITE, MINUS_INFINITE, UNDEFINED }

    /**
     * @param pooled by the constants of this class, of all years
     * @param batches the same of each batch
     */
    PositionSample(List<Double> levels, double[] pooled, double[][] batches, boolean infiniteMean, boolean infiniteVariance) {
        this(levels, pooled, batches, new Known[] {known(infiniteMean), known(infiniteVariance), known(infiniteMean)});
    }

    private PositionSample(List<Double> levels, double[] pooled, double[][] batches, Known[] known) {
        this.levels = levels;
        this.pooled = pooled;
        this.batches = batches;
        this.known = known;
    }

    private static Known known(boolean infinite) {
        return infinite ? Known.INFINITE : Known.FINITE;
    }

    public Figure mean() {
        return moment(MEAN);
    }

    public Figure standardDeviation() {
        return moment(DEVIATION);
    }

    /** At the tail level of the run. */
    public Figure tailValueAtRisk() {
        return moment(TAIL);
    }

    /** By level. */
    public SortedMap<Double, Figure> valueAtRisk() {
        SortedMap<Double, Figure> values = new TreeMap<>();
        for (int k = 0; k < levels.size(); k++) {
            values.put(levels.get(k), figure(FIRST_LEVEL + k));
        }
        return values;
    }

    /** TVaR − E, what a year may bring beyond the expected one. */
    public Figure tailBeyondMean() {
        if (known[TAIL] != Known.FINITE) {
            return moment(TAIL);
        }
        double[] each = new double[batches.length];
        for (int b = 0; b < each.length; b++) {
            each[b] = batches[b][TAIL] - batches[b][MEAN];
        }
        return Batches.figure(pooled[TAIL] - pooled[MEAN], each);
    }

    /** This sample's figures less another's from the same years: the errors are those of the differences. */
    public PositionSample minus(PositionSample other) {
        double[][] differences = new double[batches.length][];
        for (int b = 0; b < differences.length; b++) {
            differences[b] = difference(batches[b], other.batches[b]);
        }
        Known[] left = new Known[known.length];
        for (int k = 0; k < left.length; k++) {
            boolean here = known[k] == Known.INFINITE;
            boolean there = other.known[k] == Known.INFINITE;
            // two positions on the same losses differ by recoveries and premiums, whose mean is finite; their deviations and tails do not compare
            Known both = k == MEAN ? Known.FINITE : Known.UNDEFINED;
            left[k] = here && there ? both : here ? Known.INFINITE : there ? Known.MINUS_INFINITE : Known.FINITE;
        }
        return new PositionSample(levels, difference(pooled, other.pooled), differences, left);
    }

    private static double[] difference(double[] a, double[] b) {
        double[] d = new double[a.length];
        for (int k = 0; k < d.length; k++) {
            d[k] = a[k] - b[k];
        }
        return d;
    }

    private Figure moment(int k) {
        return switch (known[k]) {
            case FINITE -> figure(k);
            case INFINITE -> Figure.INFINITE;
            case MINUS_INFINITE -> Figure.exact(Double.NEGATIVE_INFINITY);
            case UNDEFINED -> Figure.UNDEFINED;
        };
    }

    private Figure figure(int k) {
        double[] each = new double[batches.length];
        for (int b = 0; b < each.length; b++) {
            each[b] = batches[b][k];
        }
        return Batches.figure(pooled[k], each);
    }
}
