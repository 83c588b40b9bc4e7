package layerweft.engine.bounds;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.stream.DoubleStream;
import java.util.stream.IntStream;
import org.junit.jupiter.api.DynamicTest;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestFactory;

/** The rearrangement algorithm against worst values at risk: the smallest sum in the upper part of a joint law, made as large as it can be. */
class RearrangementTest {
    private static final int ROWS = 10_000;

    /** The tail of Pareto II laws above the level, in slices represented by their smallest value, so that the smallest sum is attained. */
    private static double worstValueAtRisk(int perils, double alpha, double level) {
        double[] tail = new double[ROWS];
        for (int r = 0; r < ROWS; r++) {
            tail[r] = Math.pow((1 - level) * (r + 1) / ROWS, -1 / alpha) - 1;
        }
        double[][] columns = new double[perils][];
        Arrays.fill(columns, tail);
        Rearrangement matrix = new Rearrangement(columns);
        matrix.flatten(0, ROWS, 100);
        return Arrays.stream(matrix.rowSums()).min().orElseThrow();
    }

    /** worst-var.json: dual bound minimised at 25 digits, checked against the mean condition of the completely mixable tail block. */
    @TestFactory
    List<DynamicTest> reachesWorstValuesAtRisk() throws IOException {
        List<DynamicTest> tests = new ArrayList<>();
        for (JsonNode c : new ObjectMapper().readTree(getClass().getResourceAsStream("/reference/worst-var.json")).get("cases")) {
            tests.add(DynamicTest.dynamicTest(c.toString(), () -> {
                double worst = c.get("worstValueAtRisk").doubleValue();
                double found = worstValueAtRisk(c.get("perils").intValue(), c.get("alpha").doubleValue(), c.get("level").doubleValue());
                // slices stand for their smallest value, which costs most where the mean is infinite
                double coarse = c.get("alpha").doubleValue() < 1 ? 2e-2 : 2e-3;
                assertTrue(found > c.get("comonotone").doubleValue() && found <= worst * (1 + 1e-8) && found > worst * (1 - coarse),
                        () -> found + " of " + worst);
            }));
        }
        return tests;
    }

    /** Embrechts, Puccetti &amp; Rüschendorf (2013), "Model uncertainty and VaR aggregation", table for 8 Pareto(2) risks, as printed. */
    @Test
    void eightParetoRisks() throws IOException {
        JsonNode check = ParallelRunTest.published("du-epr-d8");
        for (int k = 0; k < 3; k++) {
            double level = check.get("inputs").get("levels").get(k).doubleValue();
            double printed = check.get("printed").get("worst").get("value").get(k).doubleValue();
            assertEquals(printed, worstValueAtRisk(8, 2, level), 2e-3 * printed);
        }
    }

    /** Wang, Peng &amp; Yang (2013), "Bounds for the sum of dependent risks and worst Value-at-Risk with monotone marginal densities". */
    @Test
    void homogeneousSumsWithDecreasingDensity() throws IOException {
        JsonNode check = ParallelRunTest.published("du-wpy-formula");
        for (int k = 0; k < 4; k++) {
            double worst = check.get("recomputed").get("worst VaR").get(k).doubleValue();
            assertEquals(worst, worstValueAtRisk(check.get("inputs").get("d").get(k).intValue(), 2, 0.99), 2e-3 * worst);
        }
    }

    /** Makarov (1981); Rüschendorf (1982); Embrechts, Höing &amp; Puccetti (2005), "Worst VaR scenarios": 2 F^{-1}((1 + α)/2). */
    @Test
    void twoRisks() throws IOException {
        JsonNode check = ParallelRunTest.published("du-makarov-2");
        for (int k = 0; k < 3; k++) {
            double worst = check.get("recomputed").get("worst VaR").get(k).doubleValue();
            assertEquals(worst, worstValueAtRisk(2, 2, check.get("inputs").get("levels").get(k).doubleValue()), 1e-3 * worst);
        }
    }

    @Test
    void flatteningKeepsEveryColumn() {
        double[][] columns = {{9, 5, 2, 1, 0}, {7, 7, 3, 3, 1}, {4, 3, 2, 1, 0}};
        Rearrangement matrix = new Rearrangement(columns);
        matrix.flatten(0, 5, 20);
        matrix.exchange(new AnnualLayer(5, 4), 1, 1000);
        for (int i = 0; i < columns.length; i++) {
            int peril = i;
            assertArrayEquals(new int[] {0, 1, 2, 3, 4}, IntStream.range(0, 5).map(row -> matrix.rank(peril, row)).sorted().toArray());
        }
        assertEquals(Arrays.stream(columns).flatMapToDouble(DoubleStream::of).sum(), Arrays.stream(matrix.rowSums()).sum(), 1e-12);
    }

    @Test
    void orderRidesInTheLowestBits() {
        int[] order = new int[5];
        new RankedRows(5).falling(new double[] {1, 3, 0, 3, 2}, 0, 5, order);
        assertArrayEquals(new int[] {1, 3, 4, 0, 2}, order);
    }
}
