package layerweft.engine.simulation;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;
import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class AmountSketchTest {
    private static final int BITS = 11;

    private static AmountLaw law(double unit, double... amounts) {
        AmountSketch sketch = new AmountSketch(BITS, unit);
        sketch.add(amounts, amounts.length);
        return sketch.law();
    }

    /** Against the order statistics themselves, on a heavy-tailed sample with many zeros. */
    @ParameterizedTest
    @ValueSource(longs = {1, 2, 3})
    void quantilesAreThoseOfTheSampleFarBelowTheirSamplingError(long seed) {
        SplittableRandom random = new SplittableRandom(seed);
        double[] amounts = new double[200_000];
        Arrays.setAll(amounts, i -> random.nextDouble() < 0.4 ? 0 : 3 * Math.pow(random.nextDouble(), -1 / 1.3));
        AmountLaw law = law(1, amounts);
        double[] sorted = amounts.clone();
        Arrays.sort(sorted);
        for (double level : new double[] {0.1, 0.5, 0.9, 0.99, 0.995, 0.999, 0.9999}) {
            double exact = sorted[(int) Math.ceil(level * sorted.length) - 1];
            assertEquals(exact, law.quantile(level), Math.scalb(exact, -BITS), "seed " + seed + ", level " + level);
            assertTrue(Math.abs(law.quantile(level) - exact) <= 0.3 * law.quantileError(level), "seed " + seed + ", level " + level);
        }
    }

    @Test
    void tailMeansAreThoseOfTheSample() {
        SplittableRandom random = new SplittableRandom(9);
        double[] amounts = new double[100_000];
        Arrays.setAll(amounts, i -> -10 * Math.log(1 - random.nextDouble()));
        double[] sorted = amounts.clone();
        Arrays.sort(sorted);
        double exact = Arrays.stream(sorted, 99_000, 100_000).average().orElseThrow();
        assertEquals(exact, law(1, amounts).tailMean(0.99), 1e-4 * exact);
    }

    @Test
    void atomsAtZeroAtWholeNumbersAndAtMultiplesOfTheUnitAreExact() {
        AmountLaw whole = law(1, 0, 0, 1, 3, 7, 640, 640);
        assertEquals(0, whole.quantile(2 / 7.0));
        assertEquals(7, whole.quantile(5 / 7.0));
        assertEquals(640, whole.quantile(1));
        double limit = 33.37;
        double unit = AmountSketch.unitFor(limit, BITS);
        assertEquals(limit, unit);
        AmountLaw limits = law(unit, limit, limit + limit, limit + limit + limit, 5 * limit, 7 * limit);
        assertEquals(3 * limit, limits.quantile(0.6), 1e-13);
        assertEquals(7 * limit, limits.quantile(1), 1e-13);
        assertEquals(1, AmountSketch.unitFor(30, BITS));
        assertEquals(1, AmountSketch.unitFor(Double.POSITIVE_INFINITY, BITS));
    }

    @Test
    void extremesNeitherOverflowNorVanish() {
        AmountLaw law = law(1, 0, Double.MIN_VALUE, 1e-300, 1e300, Double.MAX_VALUE, Double.POSITIVE_INFINITY);
        assertEquals(0, law.quantile(1 / 6.0));
        assertEquals(1e300, law.quantile(4 / 6.0), 1e297);
        assertEquals(Double.POSITIVE_INFINITY, law.quantile(1));
    }

    @Test
    void amountsBelowZeroKeepTheirPlace() {
        AmountLaw law = law(1, -100, -3, 0, 2.5, 7);
        assertEquals(-100, law.quantile(0.2));
        assertEquals(-3, law.quantile(0.4));
        assertEquals(0, law.quantile(0.6));
        assertEquals(7, law.quantile(1));
        assertEquals((-100 - 3 + 2.5 + 7) / 5, law.mean(a -> a), 1e-12);
    }

    @Test
    void aQuantileBeyondTheSampleHasNoError() {
        assertEquals(Double.POSITIVE_INFINITY, law(1, 1, 2, 3, 4, 5).quantileError(0.99));
    }

    @Test
    void mergingIsTheSameAsCountingTogether() {
        SplittableRandom random = new SplittableRandom(4);
        double[] amounts = random.doubles(10_000, 0, 50).toArray();
        AmountSketch first = new AmountSketch(BITS, 1);
        first.add(amounts, 4_000);
        AmountSketch second = new AmountSketch(BITS, 1);
        second.add(Arrays.copyOfRange(amounts, 4_000, 10_000), 6_000);
        second.merge(first);
        AmountLaw together = law(1, amounts);
        for (double level = 0.05; level < 1; level += 0.05) {
            assertEquals(together.quantile(level), second.law().quantile(level));
        }
    }

    @Test
    void aQuantileOnAnAtomHasNoError() {
        double[] amounts = new double[10_000];
        Arrays.fill(amounts, 9_000, 10_000, 30);
        assertEquals(0, law(1, amounts).quantileError(0.95));
        assertTrue(law(1, amounts).quantileError(0.9) > 0, "at the jump itself either side is possible");
    }
}
