package layerweft.model.severity;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.List;
import java.util.Set;
import java.util.TreeSet;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/**
 * Every kind against reference/severity.json: computed independently with mpmath in 34-digit arithmetic, limited moments by quadrature of
 * the survival function, means in closed form; relative tolerance 1e-10.
 */
class SeverityTableTest {

    static List<SeverityTable.Case> cases() {
        return SeverityTable.cases();
    }

    @Test
    void theTableHoldsAllItsCasesAndEveryKind() {
        Set<String> kinds = new TreeSet<>();
        cases().forEach(c -> kinds.add(c.model().getClass().getSimpleName()));
        assertEquals(39, cases().size());
        Set<String> permitted = new TreeSet<>();
        for (Class<?> kind : SeverityModel.class.getPermittedSubclasses()) {
            permitted.add(kind.getSimpleName());
        }
        assertEquals(permitted, kinds);
    }

    @ParameterizedTest
    @MethodSource("cases")
    void mean(SeverityTable.Case c) {
        assertClose(c.expected().get("mean"), c.model().mean(), "mean");
    }

    @ParameterizedTest
    @MethodSource("cases")
    void probabilitiesAndLimitedMoments(SeverityTable.Case c) {
        assertTrue(c.expected().get("points").size() > 0);
        for (JsonNode point : c.expected().get("points")) {
            double x = point.get("x").doubleValue();
            assertClose(point.get("cdf"), c.model().cdf(x), "cdf at " + x);
            assertClose(point.get("survival"), c.model().survival(x), "survival at " + x);
            assertClose(point.get("limitedExpectedValue"), c.model().limitedMean(x), "limited mean at " + x);
            assertClose(point.get("secondLimitedMoment"), c.model().limitedSecondMoment(x), "limited second moment at " + x);
        }
    }

    @ParameterizedTest
    @MethodSource("cases")
    void quantiles(SeverityTable.Case c) {
        assertTrue(c.expected().get("quantiles").size() > 0);
        for (JsonNode quantile : c.expected().get("quantiles")) {
            double p = quantile.get("p").doubleValue();
            assertClose(quantile.get("x"), c.model().quantile(p), "quantile at " + p);
        }
    }

    private static void assertClose(JsonNode expected, double found, String what) {
        double value = SeverityTable.number(expected);
        assertEquals(value, found, value == Double.POSITIVE_INFINITY ? 0 : SeverityTable.relativeTolerance() * Math.abs(value), what);
    }
}
