package layerweft.engine.simulation;

import layerweft.figures.Figure;

/**
 * The years of a simulation cut into runs of whole blocks, for errors by batch means (Law &amp; Kelton, "Simulation Modeling and Analysis", ch. 9):
 * a figure's error, or that of any function of figures of the same years, is its standard deviation over the runs by the root of their number.
 *
 * @param blockYears years of a block
 * @param blocks in all
 * @param count of batches
 */
record Batches(long years, int blockYears, long blocks, int count) {
    private static final int MOST = 64;
    /** With fewer batches their spread says nothing. */
    private static final int FEWEST = 8;

    static Batches of(long years, YearDraw draw) {
        int blockYears = draw.rearranges() ? Simulation.REARRANGED_BLOCK : Simulation.BLOCK;
        long blocks = (years + blockYears - 1) / blockYears;
        return new Batches(years, blockYears, blocks, (int) Math.min(MOST, blocks));
    }

    /** First block of a batch; of the one behind the last, the number of blocks. */
    long firstBlock(long batch) {
        return batch * blocks / count;
    }

    /** Years of a batch. */
    int yearsOf(long batch) {
        return (int) (Math.min(years, firstBlock(batch + 1) * blockYears) - firstBlock(batch) * blockYears);
    }

    /** Years of a block. */
    int yearsOfBlock(long block) {
        return (int) Math.min(blockYears, years - block * blockYears);
    }

    /** Years of the largest block. */
    int mostYears() {
        return (int) Math.min(blockYears, years);
    }

    /** A figure of all years with the error that its values in the batches show. */
    static Figure figure(double pooled, double[] each) {
        int n = each.length;
        if (n < FEWEST) {
            return new Figure(pooled, Double.POSITIVE_INFINITY);
        }
        double mean = 0;
        for (double v : each) {
            mean += v / n;
        }
        double square = 0;
        for (double v : each) {
            square += (v - mean) * (v - mean);
        }
        return new Figure(pooled, Math.sqrt(square / (n - 1) / n));
    }
}
