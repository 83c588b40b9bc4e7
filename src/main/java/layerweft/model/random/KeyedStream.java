package layerweft.model.random;

import org.apache.commons.rng.UniformRandomProvider;

/**
 * A stream of random bits that can be placed at once at any (key, slot), at the cost of two multiplications. The same key and slot
 * always give the same bits, whatever was drawn before: this is what makes results independent of the number of threads, and
 * lets two structures or two copulas see the same losses in the same year (common random numbers).
 *
 * <p>The generator is SplitMix64 (Steele, Lea &amp; Flood 2014, "Fast splittable pseudorandom number generators", with the
 * output function "variant 13" of Stafford). Each (key, slot) is hashed to a start on its single cycle of 2^64; with n draws
 * in all over m starts, the chance that any two runs overlap is about n·m/2^64.
 */
public final class KeyedStream implements UniformRandomProvider {
    private static final long GOLDEN = 0x9e3779b97f4a7c15L;
    private static final double TWO_TO_MINUS_53 = 0x1.0p-53;

    private final long key;
    private long state;

    /** A stream for the given key, placed at slot 0. */
    public KeyedStream(long key) {
        this.key = key;
        seek(0);
    }

    /** A key made of a parent key and a part, e.g. (seed, block), then (that, peril). Order matters. */
    public static long key(long parent, long part) {
        return mix(mix(parent + GOLDEN) ^ (part * 0xd1342543de82ef95L + 0x632be59bd9b4e019L));
    }

    /** Places the stream at the start of a slot (in the engine: a year of the block). */
    public void seek(long slot) {
        state = mix(key + slot * GOLDEN);
    }

    @Override
    public long nextLong() {
        return mix(state += GOLDEN);
    }

    @Override
    public int nextInt() {
        return (int) (nextLong() >>> 32);
    }

    /** Uniform on [0, 1), a multiple of 2^-53. */
    @Override
    public double nextDouble() {
        return (nextLong() >>> 11) * TWO_TO_MINUS_53;
    }

    /** Uniform on (0, 1): the middle of each cell, so that logarithms and powers are finite. */
    public double nextOpen() {
        return ((nextLong() >>> 12) + 0.5) * 0x1.0p-52;
    }

    private static long mix(long z) {
        z = (z ^ (z >>> 30)) * 0xbf58476d1ce4e5b9L;
        z = (z ^ (z >>> 27)) * 0x94d049bb133111ebL;
        return z ^ (z >>> 31);
    }
}
