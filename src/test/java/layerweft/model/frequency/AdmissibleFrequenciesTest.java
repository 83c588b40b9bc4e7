package layerweft.model.frequency;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Collections;
import java.util.List;
import layerweft.model.Finding;
import layerweft.model.InadmissibleException;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.function.Executable;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** Bad parameters are refused by the names of their fields; the ends of the ranges pass. */
class AdmissibleFrequenciesTest {

    private static void assertRefused(List<String> fields, Executable construction) {
        List<Finding> findings = assertThrows(InadmissibleException.class, construction).findings();
        assertEquals(fields, findings.stream().map(Finding::field).toList());
    }

    @ParameterizedTest
    @ValueSource(doubles = {0, -1, -0.0, Double.NaN, Double.POSITIVE_INFINITY, Double.NEGATIVE_INFINITY, 1.0000001e9})
    void meanOutOfRange(double mean) {
        assertRefused(List.of("mean"), () -> new Poisson(mean));
        assertRefused(List.of("mean"), () -> new NegativeBinomial(mean, 1.5));
    }

    @ParameterizedTest
    @ValueSource(doubles = {1, 0.5, 0, -2, Double.NaN, Double.POSITIVE_INFINITY, Double.NEGATIVE_INFINITY, 1.1e9})
    void varianceToMeanOutOfRange(double varianceToMean) {
        assertRefused(List.of("varianceToMean"), () -> new NegativeBinomial(2, varianceToMean));
        assertRefused(List.of("mean", "varianceToMean"), () -> new NegativeBinomial(Double.NaN, varianceToMean));
    }

    @Test
    void meanTooSmallForItsClusters() {
        assertRefused(List.of("mean"), () -> new NegativeBinomial(1e-299, 1e9));
    }

    @ParameterizedTest
    @ValueSource(ints = {0, -1, 1_000_000_001, Integer.MAX_VALUE, Integer.MIN_VALUE})
    void trialsOutOfRange(int trials) {
        assertRefused(List.of("trials"), () -> new Binomial(trials, 0.5));
    }

    @ParameterizedTest
    @ValueSource(doubles = {0, -0.1, 1.0000000000000002, Double.NaN, Double.POSITIVE_INFINITY, Double.NEGATIVE_INFINITY})
    void chanceOutOfRange(double chance) {
        assertRefused(List.of("chance"), () -> new Binomial(3, chance));
        assertRefused(List.of("trials", "chance"), () -> new Binomial(0, chance));
    }

    @Test
    void findingsTellWhatWasFoundAndWhatIsAdmissible() {
        InadmissibleException e = assertThrows(InadmissibleException.class, () -> new Binomial(3, 1.5));
        assertEquals("chance: found 1.5; admissible: above 0 and at most 1", e.getMessage());
    }

    @ParameterizedTest
    @CsvSource({"1e-300, 1.0000000000000002", "1e-290, 1e9", "1e9, 1e9", "1e9, 1.0000000000000002", "4.9e-300, 2"})
    void endsOfTheRangesOfTheNegativeBinomialGiveProbabilities(double mean, double varianceToMean) {
        assertProbabilities(new NegativeBinomial(mean, varianceToMean));
    }

    @ParameterizedTest
    @ValueSource(doubles = {Double.MIN_VALUE, 1e-300, 1e9})
    void endsOfTheRangeOfThePoissonGiveProbabilities(double mean) {
        assertProbabilities(new Poisson(mean));
    }

    @ParameterizedTest
    @CsvSource({"1, 4.9e-324", "1000000000, 4.9e-324", "1000000000, 1", "1, 1", "1000000000, 0.9999999999999999"})
    void endsOfTheRangesOfTheBinomialGiveProbabilities(int trials, double chance) {
        assertProbabilities(new Binomial(trials, chance));
    }

    private static void assertProbabilities(FrequencyModel model) {
        int middle = model.quantile(0.5);
        for (int n : new int[] {0, 1, 2, middle, middle + 1, Integer.MAX_VALUE}) {
            for (double p : new double[] {model.probability(n), model.cdf(n), model.survival(n)}) {
                assertEquals(Math.min(1, Math.max(0, p)), p, "at " + n);
            }
            assertEquals(1, model.cdf(n) + model.survival(n), 1e-14, "at " + n);
        }
    }

    @ParameterizedTest
    @ValueSource(doubles = {-1e-9, 1.1, Double.NaN, Double.POSITIVE_INFINITY, Double.NEGATIVE_INFINITY})
    void everyProbabilityOutOfRangeIsNamed(double bad) {
        assertRefused(List.of("probabilities[3]"), () -> new EmpiricalCounts(List.of(0.5, 0.3, 0.2, bad)));
        assertRefused(List.of("probabilities[0]", "probabilities[2]"), () -> new EmpiricalCounts(List.of(bad, 1.0, bad)));
    }

    @Test
    void missingProbabilities() {
        assertRefused(List.of("probabilities"), () -> new EmpiricalCounts(null));
        assertRefused(List.of("probabilities"), () -> new EmpiricalCounts(List.of()));
        assertRefused(List.of("probabilities[1]"), () -> new EmpiricalCounts(Arrays.asList(1.0, null)));
    }

    @Test
    void sumsOtherThanOne() {
        assertRefused(List.of("probabilities"), () -> new EmpiricalCounts(List.of(0.5, 0.5 + 2e-9)));
        assertRefused(List.of("probabilities"), () -> new EmpiricalCounts(List.of(0.5, 0.5 - 2e-9)));
        assertRefused(List.of("probabilities"), () -> new EmpiricalCounts(List.of(0.0, 0.0)));
    }

    @Test
    void sumsNearOneAreScaled() {
        EmpiricalCounts counts = new EmpiricalCounts(List.of(0.25, 0.75 + 8e-10));
        assertEquals(0.25 / (1 + 8e-10), counts.probability(0), 1e-16);
        assertEquals(1, counts.cdf(1));
        assertEquals(List.of(0.25, 0.75 + 8e-10), counts.probabilities());
    }

    @Test
    void oneSureCountMayExceedOneByTheTolerance() {
        assertEquals(1, new EmpiricalCounts(List.of(0.0, 1 + 5e-10)).probability(1));
    }

    @Test
    void theLargestEmpiricalCountIsThePossibleOne() {
        EmpiricalCounts counts = new EmpiricalCounts(List.of(0.3, 0.0, 0.7, 0.0, 0.0));
        assertEquals(2, counts.largest());
        assertEquals(2, counts.quantile(1));
        assertEquals(1, counts.cdf(2));
    }

    @Test
    void empiricalCountsKeepTheirOwnCopy() {
        List<Double> probabilities = new ArrayList<>(List.of(0.5, 0.5));
        EmpiricalCounts counts = new EmpiricalCounts(probabilities);
        Collections.fill(probabilities, 0.0);
        assertEquals(List.of(0.5, 0.5), counts.probabilities());
        assertThrows(UnsupportedOperationException.class, () -> counts.probabilities().set(0, 1.0));
    }

    @Test
    void empiricalCountsAreEqualByTheirProbabilities() {
        EmpiricalCounts counts = new EmpiricalCounts(List.of(0.5, 0.5));
        assertEquals(new EmpiricalCounts(List.of(0.5, 0.5)), counts);
        assertEquals(new EmpiricalCounts(List.of(0.5, 0.5)).hashCode(), counts.hashCode());
        assertNotEquals(new EmpiricalCounts(List.of(0.4, 0.6)), counts);
        assertEquals("EmpiricalCounts[probabilities=[0.5, 0.5]]", counts.toString());
    }
}
