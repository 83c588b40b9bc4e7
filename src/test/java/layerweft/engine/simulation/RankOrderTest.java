package layerweft.engine.simulation;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;
import java.util.SplittableRandom;
import layerweft.model.random.KeyedStream;
import org.junit.jupiter.api.Test;

class RankOrderTest {

    @Test
    void totalsTakeTheRanksOfTheScoresAndTheMarginStays() {
        int years = 5_000;
        SplittableRandom random = new SplittableRandom(7);
        PerilYears work = new PerilYears(years, 1, years);
        long events = 0;
        for (int y = 0; y < years; y++) {
            work.counts[y] = random.nextInt(3);
            events += work.counts[y];
        }
        work.reserve(events);
        for (int e = 0; e < events; e++) {
            work.parts[0][e] = random.nextDouble(10);
        }
        double[] scores = random.doubles(years).toArray();
        RankOrder.rearrange(work, years, scores, new KeyedStream(3));
        double[] drawn = new double[years];
        work.totals(years, drawn);
        double[] placed = new double[years];
        boolean[] taken = new boolean[years];
        for (int y = 0; y < years; y++) {
            assertTrue(!taken[work.target[y]], "each year is taken once");
            taken[work.target[y]] = true;
            placed[work.target[y]] = drawn[y];
        }
        for (int a = 0; a < years; a++) {
            int b = (a * 31 + 17) % years;
            if (scores[a] < scores[b]) {
                assertTrue(placed[a] <= placed[b], "totals rise with scores");
            }
        }
        double[] before = drawn.clone();
        double[] after = placed.clone();
        Arrays.sort(before);
        Arrays.sort(after);
        assertArrayEquals(before, after, "the margin stays exactly what it was");
    }

    /** Half the years are loss-free; among them the order is random, so their scores' mean is that of the lower half's middle. */
    @Test
    void equalTotalsAreOrderedAtRandom() {
        int years = 20_000;
        PerilYears work = new PerilYears(years, 1, years);
        for (int y = 0; y < years; y++) {
            work.counts[y] = y < years / 2 ? 0 : 1;
        }
        work.reserve(years / 2);
        Arrays.fill(work.parts[0], 0, years / 2, 5);
        double[] scores = new double[years];
        Arrays.setAll(scores, y -> y);
        RankOrder.rearrange(work, years, scores, new KeyedStream(11));
        double slope = 0;
        for (int y = 0; y < years / 2; y++) {
            slope += (y - years / 4.0) * (work.target[y] - years / 4.0);
        }
        double correlation = slope / (years / 2.0 * (years / 2.0) * (years / 2.0) / 12);
        assertEquals(0, correlation, 4 / Math.sqrt(years / 2.0), "4 standard errors: a chance of 1 in 16,000 to fail");
    }
}
