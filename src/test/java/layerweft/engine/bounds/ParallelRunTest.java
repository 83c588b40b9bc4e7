package layerweft.engine.bounds;

import static org.junit.jupiter.api.Assertions.assertEquals;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import org.apache.commons.statistics.distribution.LogNormalDistribution;
import org.junit.jupiter.api.Test;

class ParallelRunTest {
    private final Margin first = Margin.of(new double[] {1, 10, 30}, new double[] {0.5, 0.2, 0});
    private final Margin second = Margin.of(new double[] {2, 20, 50}, new double[] {0.4, 0.1, 0});
    private final Margin[] both = {first, second};

    @Test
    void comonotoneSumsAreTakenQuantileByQuantile() {
        // from the top: 0.1 of 30 + 50, 0.1 of 30 + 20, 0.2 of 10 + 20, 0.1 of 10 + 2, 0.5 of 1 + 2
        assertEquals(0.1 * 60 + 0.1 * 30 + 0.2 * 10, ParallelRun.comonotone(both, new AnnualLayer(20, Double.POSITIVE_INFINITY)), 1e-14);
        assertEquals(0.1 * 20 + 0.1 * 20 + 0.2 * 10, ParallelRun.comonotone(both, new AnnualLayer(20, 20)), 1e-14);
    }

    @Test
    void countermonotoneSumsAreTakenAgainstEachOther() {
        // 0.2 of 30 + 2, 0.3 of 10 + 2, then 1 with 2 for 0.1, with 20 for 0.3, with 50 for 0.1
        assertEquals(0.2 * 12 + 0.3 * 1 + 0.1 * 31, ParallelRun.countermonotone(first, second, new AnnualLayer(20, 100)), 1e-14);
    }

    @Test
    void piecesAddUpToTheWhole() {
        AnnualLayer layer = new AnnualLayer(20, 20);
        ParallelRun run = new ParallelRun(both, layer);
        double sum = 0;
        for (int r = 0; r < 7; r++) {
            sum += run.integral(new double[] {r / 7.0, r / 7.0}, 1 / 7.0, -1);
        }
        assertEquals(ParallelRun.comonotone(both, layer), sum, 1e-13);
    }

    /**
     * Dhaene, Denuit, Goovaerts, Kaas &amp; Vyncke (2002), "The concept of comonotonicity in actuarial science and finance: theory", Insurance:
     * Mathematics and Economics 31, E[(S^c − d)+] = ΣE[(X_i − F_i^{-1}(F_S(d)))+]; LN(0, 1) and LN(−1, 4) recomputed twice with SciPy.
     */
    @Test
    void comonotoneStopLossOfLognormals() throws IOException {
        JsonNode check = published("du-comonotonic-stoploss");
        Margin[] margins = {lognormal(0, 1), lognormal(-1, 2)};
        for (int k = 0; k < 4; k++) {
            double retention = check.get("inputs").get("retentions").get(k).doubleValue();
            double value = check.get("recomputed").get("by decomposition").get(k).doubleValue();
            assertEquals(value, ParallelRun.comonotone(margins, new AnnualLayer(retention, Double.POSITIVE_INFINITY)), 2e-5 * value);
        }
    }

    /** Mass spread, mean by mean, to a grid in logarithms: the stop-loss at points of the grid is exact. */
    private static Margin lognormal(double mu, double sigma) {
        LogNormalDistribution law = LogNormalDistribution.of(mu, sigma);
        int cells = 40_000;
        double[] values = new double[cells + 1];
        double[] above = new double[cells + 1];
        for (int k = 1; k <= cells; k++) {
            values[k] = Math.exp(mu + sigma * (-8 + 17.0 * k / cells));
        }
        for (int k = 0; k < cells; k++) {
            above[k] = (stopLoss(law, mu, sigma, values[k]) - stopLoss(law, mu, sigma, values[k + 1])) / (values[k + 1] - values[k]);
        }
        return Margin.of(values, above);
    }

    private static double stopLoss(LogNormalDistribution law, double mu, double sigma, double d) {
        double above = d == 0 ? 1 : LogNormalDistribution.of(mu + sigma * sigma, sigma).survivalProbability(d);
        return law.getMean() * above - d * law.survivalProbability(d);
    }

    static JsonNode published(String id) throws IOException {
        JsonNode tree = new ObjectMapper().readTree(ParallelRunTest.class.getResourceAsStream("/reference/published-checks.json"));
        return tree.findParents("id").stream().filter(n -> n.get("id").asText().equals(id)).findFirst().orElseThrow();
    }
}
