package layerweft.model.severity;

import layerweft.model.random.KeyedStream;
import org.apache.commons.rng.sampling.distribution.ZigguratSampler;

/** Fills the years of a block with standard variates, by the ziggurat: the first half of a draw, the transform being the second. */
final class StandardVariates {

    private StandardVariates() {}

    /** Standard exponentials, laid out as in {@link SeveritySampler#fill}; returns their number. */
    static int exponentials(KeyedStream stream, long firstSlot, int[] counts, int years, double[] out) {
        ZigguratSampler.Exponential sampler = ZigguratSampler.Exponential.of(stream);
        int k = 0;
        for (int y = 0; y < years; y++) {
            int n = counts[y];
            if (n > 0) {
                stream.seek(firstSlot + y);
                for (int j = 0; j < n; j++) {
                    out[k++] = sampler.sample();
                }
            }
        }
        return k;
    }

    /** Standard normals, laid out as in {@link SeveritySampler#fill}; returns their number. */
    static int normals(KeyedStream stream, long firstSlot, int[] counts, int years, double[] out) {
        ZigguratSampler.NormalizedGaussian sampler = ZigguratSampler.NormalizedGaussian.of(stream);
        int k = 0;
        for (int y = 0; y < years; y++) {
            int n = counts[y];
            if (n > 0) {
                stream.seek(firstSlot + y);
                for (int j = 0; j < n; j++) {
                    out[k++] = sampler.sample();
                }
            }
        }
        return k;
    }
}
