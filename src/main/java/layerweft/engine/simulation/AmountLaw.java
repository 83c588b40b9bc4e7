package layerweft.engine.simulation;

import java.util.Arrays;
import java.util.function.DoubleUnaryOperator;

/**
 * The law of an annual amount as counts of years on rising cells: an atom where a cell's ends are equal, otherwise spread evenly
 * over the cell.
 */
final class AmountLaw {
    private final double[] low;
    private final double[] high;
    /** Years in cells up to and including each. */
    private final long[] upTo;
    private final long years;

    private AmountLaw(double[] low, double[] high, long[] upTo, long years) {
        this.low = low;
        this.high = high;
        this.upTo = upTo;
        this.years = years;
    }

    /** Gathers cells in rising order. */
    static final class Builder {
        private double[] low = new double[256];
        private double[] high = new double[256];
        private long[] upTo = new long[256];
        private final long years;
        private int size;

        Builder(long years) {
            this.years = years;
        }

        void add(double from, double to, long count) {
            if (count == 0) {
                return;
            }
            if (size == low.length) {
                low = Arrays.copyOf(low, 2 * size);
                high = Arrays.copyOf(high, 2 * size);
                upTo = Arrays.copyOf(upTo, 2 * size);
            }
            low[size] = from;
            high[size] = to;
            upTo[size] = count + (size == 0 ? 0 : upTo[size - 1]);
            size++;
        }

        AmountLaw build() {
            return new AmountLaw(Arrays.copyOf(low, size), Arrays.copyOf(high, size), Arrays.copyOf(upTo, size), years);
        }
    }

    long years() {
        return years;
    }

    /** The law of a non-decreasing function of the amount. */
    AmountLaw map(DoubleUnaryOperator f) {
        return new AmountLaw(Arrays.stream(low).map(f).toArray(), Arrays.stream(high).map(f).toArray(), upTo, years);
    }

    int cells() {
        return low.length;
    }

    /** The amount that stands for cell k: its middle. */
    double point(int k) {
        return low[k] == high[k] ? low[k] : 0.5 * (low[k] + high[k]);
    }

    /** Part of the years in cell k. */
    double weight(int k) {
        return (double) (upTo[k] - (k == 0 ? 0 : upTo[k - 1])) / years;
    }

    /** Part of the years in cells above cell k. */
    double above(int k) {
        return (double) (years - upTo[k]) / years;
    }

    /** VaR: inf{x : F(x) ≥ level} of the years counted. */
    double quantile(double level) {
        long rank = Math.max(1, Math.min(years, (long) Math.ceil(level * years - 1e-9)));
        int k = Arrays.binarySearch(upTo, rank);
        k = k < 0 ? -k - 1 : k;
        if (low[k] == high[k]) {
            return low[k];
        }
        long before = k == 0 ? 0 : upTo[k - 1];
        return low[k] + (high[k] - low[k]) * (rank - before - 0.5) / (upTo[k] - before);
    }

    /** TVaR: VaR + E[(amount − VaR)+]/(1 − level). */
    double tailMean(double level) {
        double q = quantile(level);
        return q + mean(a -> Math.max(a - q, 0)) / (1 - level);
    }

    /** The mean of a function of the amount. */
    double mean(DoubleUnaryOperator f) {
        double sum = 0;
        for (int k = 0; k < low.length; k++) {
            double w = weight(k);
            sum += w * f.applyAsDouble(point(k));
        }
        return sum;
    }

    /**
     * Standard error of the quantile at a level: a quarter of the distance of the quantiles at the ends of the level's own 95 % interval
     * (order statistics; no density need be estimated, and well inside an atom it is 0). Infinite where no year of the sample is expected
     * to lie beyond the level.
     */
    double quantileError(double level) {
        if (years * (1 - level) < 1) {
            return Double.POSITIVE_INFINITY;
        }
        double s = 2 * Math.sqrt(level * (1 - level) / years);
        double from = quantile(Math.max(0, level - s));
        double to = quantile(Math.min(1, level + s));
        return to == from ? 0 : 0.25 * (to - from);
    }
}
