package layerweft.engine.bounds;

/**
 * Expectation over a piece of a joint law on which the perils run along their laws at the same speed, each up or down. A joint law made
 * of such pieces is a shuffle of the comonotone one (Mikusiński, Sherwood &amp; Taylor 1992, "Shuffles of Min", Stochastica): its margins
 * are exactly those given, so a value summed over its pieces is reached by a joint law.
 */
final class ParallelRun {
    private final Margin[] margins;
    private final AnnualLayer layer;
    private final int[] atom;
    private final double[] start;

    ParallelRun(Margin[] margins, AnnualLayer layer) {
        this.margins = margins;
        this.layer = layer;
        this.atom = new int[margins.length];
        this.start = new double[margins.length];
    }

    /** E of the layer where all sums rise together. */
    static double comonotone(Margin[] margins, AnnualLayer layer) {
        return new ParallelRun(margins, layer).integral(new double[margins.length], 1, -1);
    }

    /** E of the layer where the second sum falls as the first rises. */
    static double countermonotone(Margin first, Margin second, AnnualLayer layer) {
        return new ParallelRun(new Margin[] {first, second}, layer).integral(new double[2], 1, 1);
    }

    /**
     * ∫ of the layer's loss over a piece.
     *
     * @param from by peril, the smallest chance t of being passed in the piece
     * @param length of the piece, a probability
     * @param reversed the peril that runs the other way, −1 for none
     */
    double integral(double[] from, double length, int reversed) {
        double sum = 0;
        for (int i = 0; i < margins.length; i++) {
            start[i] = i == reversed ? from[i] + length : from[i];
            atom[i] = i == reversed ? margins[i].atomBelow(start[i]) : margins[i].atomFrom(start[i]);
            sum += margins[i].value(atom[i]);
        }
        double total = 0;
        double done = 0;
        while (done < length) {
            double next = length;
            int turning = -1;
            for (int i = 0; i < margins.length; i++) {
                double at = end(i, i == reversed);
                if (at < next) {
                    next = at;
                    turning = i;
                }
            }
            if (next > done) {
                total += layer.loss(sum) * (next - done);
                done = next;
            }
            if (turning < 0) {
                return total;
            }
            atom[turning] += turning == reversed ? 1 : -1;
            sum = 0;
            for (int i = 0; i < margins.length; i++) {
                sum += margins[i].value(atom[i]);
            }
        }
        return total;
    }

    /** How far into the piece a peril keeps its present atom. */
    private double end(int i, boolean reversed) {
        if (reversed) {
            return atom[i] == margins[i].atoms() - 1 ? Double.POSITIVE_INFINITY : start[i] - margins[i].above(atom[i]);
        }
        return atom[i] == 0 ? Double.POSITIVE_INFINITY : margins[i].above(atom[i] - 1) - start[i];
    }
}
