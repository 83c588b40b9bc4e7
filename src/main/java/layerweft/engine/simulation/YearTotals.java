package layerweft.engine.simulation;

import java.util.List;

/** Annual totals of some years as sums and counts, from which the figures of their law are read. */
final class YearTotals {
    private final AmountSketch sketch;
    private long years;
    private double sum;
    private double squares;

    YearTotals(int bits) {
        sketch = new AmountSketch(bits, 1);
    }

    void add(double[] totals, int count) {
        sketch.add(totals, count);
        years += count;
        for (int y = 0; y < count; y++) {
            sum += totals[y];
            squares += totals[y] * totals[y];
        }
    }

    void add(YearTotals other) {
        sketch.merge(other.sketch);
        years += other.years;
        sum += other.sum;
        squares += other.squares;
    }

    /** Mean, standard deviation, tail value at risk, then the values at risk: as {@link PositionSample} has them. */
    double[] figures(List<Double> levels, double tailLevel) {
        double[] figures = new double[PositionSample.FIRST_LEVEL + levels.size()];
        AmountLaw law = sketch.law();
        double mean = sum / years;
        figures[PositionSample.MEAN] = mean;
        figures[PositionSample.DEVIATION] = Math.sqrt(Math.max(0, squares / years - mean * mean));
        figures[PositionSample.TAIL] = law.tailMean(tailLevel);
        for (int k = 0; k < levels.size(); k++) {
            figures[PositionSample.FIRST_LEVEL + k] = law.quantile(levels.get(k));
        }
        return figures;
    }
}
