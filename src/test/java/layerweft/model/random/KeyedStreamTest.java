package layerweft.model.random;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.HashSet;
import java.util.Set;
import java.util.stream.LongStream;
import org.apache.commons.statistics.distribution.ChiSquaredDistribution;
import org.apache.commons.statistics.distribution.NormalDistribution;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Seeds are fixed; each random test fails for one seed in a million where the stream is what it claims to be. */
class KeyedStreamTest {
    private static final double ODDS = 1e-6;

    private static long[] draws(KeyedStream stream, int n) {
        return LongStream.generate(stream::nextLong).limit(n).toArray();
    }

    private static KeyedStream at(long key, long slot) {
        KeyedStream stream = new KeyedStream(key);
        stream.seek(slot);
        return stream;
    }

    @ParameterizedTest
    @ValueSource(longs = {0, 1, -1, Long.MIN_VALUE, 123456789})
    void theSameKeyAndSlotGiveTheSameBitsWhateverWasDrawnBefore(long key) {
        KeyedStream used = at(key, 99);
        draws(used, 1000);
        used.seek(7);
        assertArrayEquals(draws(at(key, 7), 50), draws(used, 50));
        assertArrayEquals(draws(at(key, 0), 50), draws(new KeyedStream(key), 50));
    }

    @Test
    void doublesStayInTheirIntervals() {
        KeyedStream stream = new KeyedStream(4);
        for (int k = 0; k < 100_000; k++) {
            double u = stream.nextDouble();
            double open = stream.nextOpen();
            assertTrue(u >= 0 && u < 1 && open > 0 && open < 1);
        }
        assertEquals(at(4, 3).nextLong() >>> 11, (long) (at(4, 3).nextDouble() * 0x1p53));
        assertEquals(at(4, 3).nextLong() >>> 32, Integer.toUnsignedLong(at(4, 3).nextInt()));
    }

    /** Each of the 64 bits is 1 half the time: the sum of 64 squared normal scores is chi-square with 64 degrees of freedom. */
    @ParameterizedTest
    @ValueSource(longs = {1, 2, 3, 0x9e3779b97f4a7c15L})
    void bitsAreFair(long key) {
        int n = 1 << 16;
        assertUniformBits(draws(new KeyedStream(key), n), "one slot, key " + key);
        assertUniformBits(LongStream.range(0, n).map(slot -> at(key, slot).nextLong()).toArray(), "first draws of slots, key " + key);
        assertUniformBits(LongStream.range(0, n).map(part -> new KeyedStream(KeyedStream.key(key, part)).nextLong()).toArray(), "keys below " + key);
    }

    private static void assertUniformBits(long[] draws, String what) {
        double chiSquare = 0;
        for (int bit = 0; bit < 64; bit++) {
            int at = bit;
            long ones = LongStream.of(draws).filter(d -> (d >>> at & 1) == 1).count();
            chiSquare += Math.pow(ones - draws.length / 2.0, 2) / (draws.length / 4.0);
        }
        double limit = ChiSquaredDistribution.of(64).inverseSurvivalProbability(ODDS);
        assertTrue(chiSquare < limit, what + ": " + chiSquare + " against " + limit);
    }

    @ParameterizedTest
    @ValueSource(longs = {5, 6, -17})
    void uniformsFillTheirInterval(long key) {
        int cells = 256;
        int n = 1 << 18;
        int[] counts = new int[cells];
        KeyedStream stream = new KeyedStream(key);
        for (int k = 0; k < n; k++) {
            counts[(int) (stream.nextDouble() * cells)]++;
        }
        double chiSquare = 0;
        for (int count : counts) {
            chiSquare += Math.pow(count - (double) n / cells, 2) * cells / n;
        }
        assertTrue(chiSquare < ChiSquaredDistribution.of(cells - 1).inverseSurvivalProbability(ODDS), "key " + key + ": " + chiSquare);
    }

    /** Neighbouring slots, keys and draws: the sample correlation of independent uniforms is normal with standard deviation 1/√n. */
    @Test
    void neighboursAreNotCorrelated() {
        int n = 1 << 18;
        double limit = NormalDistribution.of(0, 1).inverseSurvivalProbability(ODDS / 2) / Math.sqrt(n);
        double bySlot = 0;
        double byKey = 0;
        double byDraw = 0;
        for (int k = 0; k < n; k++) {
            bySlot += centred(at(8, k)) * centred(at(8, k + 1));
            byKey += centred(at(KeyedStream.key(8, k), 5)) * centred(at(KeyedStream.key(8, k + 1), 5));
            KeyedStream stream = at(9, k);
            byDraw += centred(stream) * centred(stream);
        }
        assertTrue(Math.abs(bySlot / n * 12) < limit, "slots " + bySlot / n * 12);
        assertTrue(Math.abs(byKey / n * 12) < limit, "keys " + byKey / n * 12);
        assertTrue(Math.abs(byDraw / n * 12) < limit, "draws " + byDraw / n * 12);
    }

    private static double centred(KeyedStream stream) {
        return stream.nextDouble() - 0.5;
    }

    /** 90,000 keys, all different: two of them would meet with a chance of 2e-10. */
    @Test
    void differentPartsGiveDifferentKeys() {
        Set<Long> keys = new HashSet<>();
        for (long parent = -150; parent < 150; parent++) {
            for (long part = -150; part < 150; part++) {
                keys.add(KeyedStream.key(parent, part));
            }
        }
        assertEquals(90_000, keys.size());
        assertNotEquals(KeyedStream.key(1, 2), KeyedStream.key(2, 1));
        assertNotEquals(KeyedStream.key(KeyedStream.key(1, 2), 3), KeyedStream.key(KeyedStream.key(1, 3), 2));
    }

    /** Neighbouring slots of one key do not replay one another's draws with a lag, as consecutive states of one counter would. */
    @Test
    void slotsDoNotOverlap() {
        Set<Long> seen = new HashSet<>();
        for (int slot = 0; slot < 1000; slot++) {
            for (long draw : draws(at(3, slot), 50)) {
                assertTrue(seen.add(draw), "slot " + slot);
            }
        }
    }
}
