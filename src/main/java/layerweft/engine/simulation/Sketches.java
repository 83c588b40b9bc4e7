package layerweft.engine.simulation;

import layerweft.model.treaty.Treaty;

/** The counts by amount of every annual amount that a quote reads quantiles of. */
final class Sketches {
    final AmountSketch[] sums;
    final AmountSketch[] largest;
    /** Totals of gross, ceded and net, in this order. */
    final AmountSketch[] totals = new AmountSketch[3];
    final AmountSketch[] largestEvents = new AmountSketch[3];

    /** @param bits resolution, see {@link AmountSketch} */
    Sketches(Treaty treaty, int bits) {
        int layers = treaty.layers();
        sums = new AmountSketch[layers];
        largest = new AmountSketch[layers];
        for (int j = 0; j < layers; j++) {
            double unit = AmountSketch.unitFor(treaty.layer(j).terms().line(), bits);
            sums[j] = new AmountSketch(bits, unit);
            largest[j] = new AmountSketch(bits, unit);
        }
        for (int k = 0; k < 3; k++) {
            totals[k] = new AmountSketch(bits, 1);
            largestEvents[k] = new AmountSketch(bits, 1);
        }
    }

    void merge(Sketches other) {
        for (int j = 0; j < sums.length; j++) {
            sums[j].merge(other.sums[j]);
            largest[j].merge(other.largest[j]);
        }
        for (int k = 0; k < 3; k++) {
            totals[k].merge(other.totals[k]);
            largestEvents[k].merge(other.largestEvents[k]);
        }
    }
}
