package layerweft.model.frequency;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import java.io.InputStream;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.Stream;
import java.util.stream.StreamSupport;
import org.apache.commons.math3.complex.Complex;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** Values of every kind against reference/frequency.json: computed independently from the definitions in 40-digit arithmetic. */
class FrequencyTableTest {
    private static final JsonNode TABLE = read();

    private static JsonNode read() {
        try (InputStream in = FrequencyTableTest.class.getResourceAsStream("/reference/frequency.json")) {
            return new ObjectMapper().readTree(in);
        } catch (IOException e) {
            throw new IllegalStateException(e);
        }
    }

    record Case(String id, FrequencyModel model, JsonNode expected) {
        @Override
        public String toString() {
            return id;
        }
    }

    static Stream<Case> cases() {
        return StreamSupport.stream(TABLE.get("cases").spliterator(), false)
                .map(c -> new Case(c.get("id").asText(), model(c.get("frequency")), c));
    }

    private static FrequencyModel model(JsonNode json) {
        return switch (json.get("model").asText()) {
            case "poisson" -> new Poisson(json.get("mean").asDouble());
            case "negativeBinomial" -> new NegativeBinomial(json.get("mean").asDouble(), json.get("varianceToMean").asDouble());
            case "binomial" -> new Binomial(json.get("trials").asInt(), json.get("chance").asDouble());
            case "empirical" -> {
                List<Double> probabilities = new ArrayList<>();
                json.get("probabilities").forEach(p -> probabilities.add(p.asDouble()));
                yield new EmpiricalCounts(probabilities);
            }
            default -> throw new IllegalStateException(json.toString());
        };
    }

    private static void assertClose(double expected, double found, String what) {
        double tolerance = TABLE.get("relativeTolerance").asDouble() * Math.abs(expected) + TABLE.get("absoluteTolerance").asDouble();
        assertEquals(expected, found, tolerance, what);
    }

    @ParameterizedTest
    @MethodSource("cases")
    void moments(Case c) {
        assertClose(c.expected.get("mean").asDouble(), c.model.mean(), "mean");
        assertClose(c.expected.get("variance").asDouble(), c.model.variance(), "variance");
    }

    @ParameterizedTest
    @MethodSource("cases")
    void probabilities(Case c) {
        assertFalse(c.expected.get("points").isEmpty());
        for (JsonNode point : c.expected.get("points")) {
            int n = point.get("n").asInt();
            assertClose(point.get("pmf").asDouble(), c.model.probability(n), "P(N = " + n + ")");
            assertClose(point.get("cdf").asDouble(), c.model.cdf(n), "P(N <= " + n + ")");
            assertClose(1 - point.get("cdf").asDouble(), c.model.survival(n), "P(N > " + n + ")");
        }
    }

    @ParameterizedTest
    @MethodSource("cases")
    void generatingFunction(Case c) {
        assertFalse(c.expected.get("pgf").isEmpty());
        for (JsonNode point : c.expected.get("pgf")) {
            Complex z = new Complex(point.get("re").asDouble(), point.get("im").asDouble());
            Complex found = c.model.generatingFunction(z);
            assertClose(point.get("valueRe").asDouble(), found.getReal(), "real part at " + z);
            assertClose(point.get("valueIm").asDouble(), found.getImaginary(), "imaginary part at " + z);
        }
    }

    @ParameterizedTest
    @MethodSource("cases")
    void quantiles(Case c) {
        assertFalse(c.expected.get("quantiles").isEmpty());
        for (JsonNode q : c.expected.get("quantiles")) {
            assertEquals(q.get("n").asInt(), c.model.quantile(q.get("p").asDouble()), "quantile of " + q.get("p"));
        }
    }
}
