package layerweft.model.frequency;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.stream.Stream;
import layerweft.model.InadmissibleException;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;

class CountTableTest {
    /** Below the normal range of doubles there are fewer digits. */
    private static final double SUBNORMAL = 1e-305;

    static Stream<FrequencyModel> models() {
        return Stream.of(new Poisson(1e-12), new Poisson(1.8), new Poisson(60), new Poisson(1e4), new NegativeBinomial(1.8, 1.4),
                new NegativeBinomial(0.5, 6), new NegativeBinomial(30, 1 + 0x1p-26), new NegativeBinomial(2000, 50), new Binomial(8, 0.2),
                new Binomial(3, 1), new Binomial(1_000_000_000, 3e-8), new EmpiricalCounts(List.of(1.0)),
                new EmpiricalCounts(List.of(0.5, 0.25, 0.15, 0.0, 0.1, 0.0)), new EmpiricalCounts(List.of(0.0, 0.0, 0.3, 0.7)));
    }

    @ParameterizedTest
    @MethodSource("models")
    void holdsTheValuesOfTheModel(FrequencyModel model) {
        CountTable table = CountTable.of(model);
        for (int n = 0; n < table.size(); n++) {
            assertEquals(model.probability(n), table.probability(n));
            double tail = model.survival(n);
            double head = model.cdf(n);
            assertEquals(tail, table.survival(n), 3e-12 * tail + SUBNORMAL, "P(N > " + n + ")");
            assertEquals(head, table.cdf(n), 3e-12 * head + SUBNORMAL, "P(N <= " + n + ")");
        }
    }

    @ParameterizedTest
    @MethodSource("models")
    void endsAtTheFirstCountWhoseSurvivalIsBelowTheTail(FrequencyModel model) {
        for (double tail : new double[] {1e-17, 1e-300, 1e-6, 0.3}) {
            int last = CountTable.of(model, tail).size() - 1;
            assertTrue(model.survival(last) < tail, () -> "survival of the last at " + tail);
            assertTrue(last == 0 || model.survival(last - 1) >= tail, () -> "survival of the last but one at " + tail);
        }
    }

    @Test
    void usuallyEndsBelowOneHundredMillionBillionth() {
        assertEquals(CountTable.of(new Poisson(1.8), 1e-17).size(), CountTable.of(new Poisson(1.8)).size());
    }

    @ParameterizedTest
    @MethodSource("models")
    void cdfNeverFallsAndAddsUpWithTheSurvival(FrequencyModel model) {
        assertRisesAndAddsUp(CountTable.of(model));
    }

    @ParameterizedTest
    @ValueSource(doubles = {1.0000001, 1.1, 3, 100})
    void aMillionEventsAreTabulated(double varianceToMean) {
        FrequencyModel model = new NegativeBinomial(1e6, varianceToMean);
        CountTable table = CountTable.of(model);
        assertRisesAndAddsUp(table);
        assertEquals(0, table.cdf(0));
        int middle = model.quantile(0.5);
        assertEquals(model.cdf(middle), table.cdf(middle), 1e-9);
        assertEquals(1, table.cdf(table.size() - 1), 1e-15);
    }

    @Test
    void aMillionPoissonEventsAreTabulated() {
        FrequencyModel model = new Poisson(1e6);
        CountTable table = CountTable.of(model);
        assertRisesAndAddsUp(table);
        assertEquals(model.cdf(999_000), table.cdf(999_000), 1e-11);
        assertEquals(model.survival(1_005_000), table.survival(1_005_000), 1e-10 * model.survival(1_005_000));
    }

    private static void assertRisesAndAddsUp(CountTable table) {
        double before = 0;
        double above = 1;
        for (int n = 0; n < table.size(); n++) {
            assertTrue(table.cdf(n) >= before, "cdf falls at " + n);
            assertTrue(table.survival(n) <= above, "survival rises at " + n);
            assertEquals(1, table.cdf(n) + table.survival(n), 4e-16, "at " + n);
            before = table.cdf(n);
            above = table.survival(n);
        }
    }

    @Test
    void tooManyEntriesAreRefused() {
        for (FrequencyModel model : List.of(new Poisson(1e7), new Poisson(1e9), new NegativeBinomial(100, 1e7),
                new Binomial(1_000_000_000, 0.5))) {
            InadmissibleException e = assertThrows(InadmissibleException.class, () -> CountTable.of(model), model::toString);
            assertEquals(List.of("mean"), e.findings().stream().map(f -> f.field()).toList());
        }
    }

    @ParameterizedTest
    @ValueSource(doubles = {0, 1, -1, 2, Double.NaN, Double.POSITIVE_INFINITY})
    void tailThatIsNoProbabilityIsRefused(double tail) {
        InadmissibleException e = assertThrows(InadmissibleException.class, () -> CountTable.of(new Poisson(1), tail));
        assertEquals("tailProbability", e.findings().get(0).field());
    }

    @Test
    void lookingBeyondTheTableFails() {
        CountTable table = CountTable.of(new Poisson(1));
        assertThrows(IndexOutOfBoundsException.class, () -> table.cdf(table.size()));
        assertThrows(IndexOutOfBoundsException.class, () -> table.survival(-1));
    }
}
