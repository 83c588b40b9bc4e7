package layerweft.model.severity;

import java.util.function.DoubleSupplier;
import layerweft.model.random.KeyedStream;

/** Draws losses of one severity law. */
@FunctionalInterface
public interface SeveritySampler {

    /**
     * A source of losses that draws from a stream, to be used by one thread: whatever sampling needs is made here, once, so that a draw
     * allocates nothing.
     */
    DoubleSupplier bind(KeyedStream stream);

    /** One loss, in the portfolio's unit. */
    default double draw(KeyedStream stream) {
        return bind(stream).getAsDouble();
    }

    /**
     * The losses of consecutive years. Year y draws from slot {@code firstSlot + y} of the stream, so that its losses depend
     * neither on other years nor, for its first k losses, on how many follow.
     *
     * <p>Kinds override this only to give the compiler a loop of their own; the values are those of a bound source.
     *
     * @param counts number of losses of each year, length at least {@code years}
     * @param out receives Σ counts losses, year by year
     * @return the number of losses written
     */
    default int fill(KeyedStream stream, long firstSlot, int[] counts, int years, double[] out) {
        DoubleSupplier losses = bind(stream);
        int k = 0;
        for (int y = 0; y < years; y++) {
            int n = counts[y];
            if (n > 0) {
                stream.seek(firstSlot + y);
                for (int j = 0; j < n; j++) {
                    out[k++] = losses.getAsDouble();
                }
            }
        }
        return k;
    }
}
