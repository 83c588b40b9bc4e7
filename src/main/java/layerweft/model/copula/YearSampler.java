package layerweft.model.copula;

import layerweft.model.random.KeyedStream;

/** A sampler said by how one year is drawn from where the stream stands, so that a mixture can draw from its components. */
abstract class YearSampler implements ScoreSampler {
    private final int dimension;

    YearSampler(int dimension) {
        this.dimension = dimension;
    }

    /** Draws one year after another from the stream it was bound to; holds the buffers, so one for each thread. */
    @FunctionalInterface
    interface Drawer {
        void draw(double[][] scores, int year);
    }

    abstract Drawer drawer(KeyedStream stream);

    @Override
    public final int dimension() {
        return dimension;
    }

    @Override
    public final void draw(KeyedStream stream, long firstSlot, int years, double[][] scores) {
        Drawer drawer = drawer(stream);
        for (int y = 0; y < years; y++) {
            stream.seek(firstSlot + y);
            drawer.draw(scores, y);
        }
    }

    @Override
    public final void fill(KeyedStream stream, long firstSlot, int[] counts, int years, double[][] scores) {
        Drawer drawer = drawer(stream);
        int k = 0;
        for (int y = 0; y < years; y++) {
            if (counts[y] > 0) {
                stream.seek(firstSlot + y);
                for (int j = counts[y]; j > 0; j--) {
                    drawer.draw(scores, k++);
                }
            }
        }
    }
}
