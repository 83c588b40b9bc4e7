package layerweft.model.severity;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.Stream;
import java.util.stream.StreamSupport;
import layerweft.file.PortfolioReader;
import layerweft.model.portfolio.EventLoss;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/**
 * Every kind of severity against independently computed values (mpmath, 34-digit arithmetic; limited moments by quadrature of the survival
 * function, means in closed form), at the table's relative tolerance.
 */
class SeverityReferenceTest {
    private static final double RELATIVE = 1e-10;

    static Stream<JsonNode> cases() throws IOException {
        try (InputStream in = SeverityReferenceTest.class.getResourceAsStream("/reference/severity.json")) {
            JsonNode cases = new ObjectMapper().readTree(in).get("cases");
            return StreamSupport.stream(cases.spliterator(), false);
        }
    }

    @ParameterizedTest
    @MethodSource("cases")
    void valuesAgreeWithTheTable(JsonNode reference) {
        SeverityModel model = model(reference.get("severity"));
        List<String> off = new ArrayList<>();
        check(off, "mean", reference.get("mean"), model.mean());
        for (JsonNode point : reference.get("points")) {
            double x = point.get("x").doubleValue();
            check(off, "cdf at " + x, point.get("cdf"), model.cdf(x));
            check(off, "survival at " + x, point.get("survival"), model.survival(x));
            check(off, "limited mean at " + x, point.get("limitedExpectedValue"), model.limitedMean(x));
            check(off, "second limited moment at " + x, point.get("secondLimitedMoment"), model.limitedSecondMoment(x));
        }
        for (JsonNode quantile : reference.get("quantiles")) {
            double p = quantile.get("p").doubleValue();
            check(off, "quantile at " + p, quantile.get("x"), model.quantile(p));
        }
        assertTrue(off.isEmpty(), () -> reference.get("id").asText() + ":\n" + String.join("\n", off));
    }

    private static void check(List<String> off, String what, JsonNode expected, double actual) {
        double value = expected.isTextual() ? Double.POSITIVE_INFINITY : expected.doubleValue();
        if (!(actual == value || Math.abs(actual - value) <= RELATIVE * Math.abs(value))) {
            off.add(what + ": " + actual + ", expected " + value);
        }
    }

    private static SeverityModel model(JsonNode severity) {
        String portfolio = "{\"format\": \"layerweft/portfolio/1\", \"name\": \"one\", \"currency\": \"EUR\", \"unit\": \"\", \"perils\": [{\"name\": \"p\","
                + "\"frequency\": {\"model\": \"poisson\", \"mean\": 1}, \"severity\": " + severity + "}]}";
        EventLoss loss = PortfolioReader.read("one.json", portfolio.getBytes(StandardCharsets.UTF_8)).perils().get(0).eventLoss();
        return ((EventLoss.Single) loss).severity();
    }

    /** The far end of the tail, where 1 − F has no digits left: a layer's mean against the integral of the survival function. */
    @ParameterizedTest
    @MethodSource("cases")
    void aLayerFarUpKeepsItsRelativePrecision(JsonNode reference) {
        SeverityModel model = model(reference.get("severity"));
        for (double q : new double[] {1e-4, 1e-8, 1e-12}) {
            double from = model.survivalQuantile(q);
            double to = model.survivalQuantile(q / 3);
            if (from < to && model.upperEnd() > to) {
                double expected = simpson(model, from, to);
                assertEquals(expected, model.layerMean(from, to), 2e-7 * expected, reference.get("id").asText() + " at survival " + q);
            }
        }
    }

    /** Simpson's rule on the survival function. */
    private static double simpson(SeverityModel model, double from, double to) {
        int panels = 2000;
        double h = (to - from) / panels;
        double sum = model.survival(from) + model.survival(to);
        for (int k = 1; k < panels; k++) {
            sum += (k % 2 == 0 ? 2 : 4) * model.survival(from + k * h);
        }
        return sum * h / 3;
    }
}
