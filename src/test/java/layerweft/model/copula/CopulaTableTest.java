package layerweft.model.copula;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import java.io.InputStream;
import java.util.List;
import java.util.stream.Stream;
import java.util.stream.StreamSupport;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/**
 * Strengths, tail coefficients, Spearman's ρ and values of C against reference/copulas.json: computed independently in Python with mpmath
 * (Archimedean, 40 digits) and by trapezoidal quadrature over the factors (gaussian, student, 1e-12).
 */
class CopulaTableTest {
    private static final JsonNode TABLE = read();

    private static JsonNode read() {
        try (InputStream in = CopulaTableTest.class.getResourceAsStream("/reference/copulas.json")) {
            return new ObjectMapper().readTree(in);
        } catch (IOException e) {
            throw new IllegalStateException(e);
        }
    }

    record Case(String id, Copula copula, JsonNode expected) {
        @Override
        public String toString() {
            return id;
        }
    }

    static Stream<Case> cases() {
        return StreamSupport.stream(TABLE.get("cases").spliterator(), false)
                .map(c -> new Case(c.get("id").asText(), copula(c.get("copula")), c));
    }

    private static Copula copula(JsonNode json) {
        String name = json.get("family").asText();
        boolean survival = json.path("survival").asBoolean(false);
        String text = (survival ? "survival-" : "") + name + (json.has("degreesOfFreedom") ? ":" + json.get("degreesOfFreedom") : "");
        CopulaFamily family = CopulaFamily.parse(text);
        double tau = json.path("kendallTau").asDouble(0);
        if (json.has("groups")) {
            ArchimedeanFamily archimedean = family.archimedean().orElseThrow();
            Group inner = Group.ofKendallTau(archimedean, json.get("groups").get(0).get("kendallTau").asDouble(), List.of(0, 1), List.of());
            return GroupedArchimedean.of(archimedean, survival, Group.ofKendallTau(archimedean, tau, List.of(), List.of(inner)));
        }
        return family.at(tau);
    }

    private static void assertClose(double expected, double found, String what) {
        double tolerance = TABLE.get("relativeTolerance").asDouble() * Math.abs(expected) + TABLE.get("absoluteTolerance").asDouble();
        assertEquals(expected, found, tolerance, what);
    }

    @Test
    void theTableHoldsAllItsCases() {
        assertEquals(68, cases().count());
    }

    @ParameterizedTest
    @MethodSource("cases")
    void strengthHasItsKendallTau(Case c) {
        if (c.expected.has("theta")) {
            double theta = c.copula instanceof GroupedArchimedean g ? g.root().theta() : ((Archimedean) c.copula).theta();
            double expected = c.expected.get("theta").asDouble();
            assertEquals(expected, theta, 1e-11 * Math.abs(expected) + 1e-13);
        } else if (c.expected.has("rho")) {
            Correlation correlation = c.copula instanceof Student s ? s.correlation() : ((Gaussian) c.copula).correlation();
            assertEquals(c.expected.get("rho").asDouble(), correlation.rho(0, 1), 1e-15);
        }
        if (c.expected.get("copula").has("kendallTau")) {
            int other = c.copula instanceof GroupedArchimedean ? 2 : 1;
            assertEquals(c.expected.get("copula").get("kendallTau").asDouble(), c.copula.kendallTau(0, other), 1e-12);
        }
    }

    @ParameterizedTest
    @MethodSource("cases")
    void rankAndTailCoefficients(Case c) {
        if (!c.expected.has("spearman")) {
            assertTrue(c.copula instanceof GroupedArchimedean);
            return;
        }
        assertClose(c.expected.get("lambdaUpper").asDouble(), c.copula.upperTail(0, 1), "upper tail");
        assertClose(c.expected.get("lambdaLower").asDouble(), c.copula.lowerTail(0, 1), "lower tail");
        assertEquals(c.expected.get("spearman").asDouble(), c.copula.spearmanRho(0, 1), c.expected.get("spearmanTolerance").asDouble());
    }

    @ParameterizedTest
    @MethodSource("cases")
    void distributionFunction(Case c) {
        int checked = 0;
        for (String list : List.of("C2", "C3")) {
            for (JsonNode point : c.expected.path(list)) {
                double[] u = StreamSupport.stream(point.get("u").spliterator(), false).mapToDouble(JsonNode::asDouble).toArray();
                assertClose(point.get("C").asDouble(), c.copula.cdf(u), list + " at " + point.get("u"));
                checked++;
            }
        }
        assertTrue(checked >= 4, "points checked: " + checked);
    }
}
