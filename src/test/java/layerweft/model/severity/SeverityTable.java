package layerweft.model.severity;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.stream.StreamSupport;
import layerweft.file.PortfolioReader;
import layerweft.model.portfolio.EventLoss;

/** The cases of reference/severity.json, each severity read as it would be from a portfolio file. */
final class SeverityTable {
    private static final JsonNode TABLE = read();

    /**
     * @param expected mean, points and quantiles as they stand in the table
     */
    record Case(String id, SeverityModel model, JsonNode expected) {
        @Override
        public String toString() {
            return id;
        }
    }

    private SeverityTable() {}

    static List<Case> cases() {
        return StreamSupport.stream(TABLE.get("cases").spliterator(), false)
                .map(c -> new Case(c.get("id").asText(), model(c.get("severity")), c)).toList();
    }

    static double relativeTolerance() {
        return TABLE.get("relativeTolerance").asDouble();
    }

    /** A number of the table, which writes an infinite one as a text. */
    static double number(JsonNode value) {
        return value.isTextual() ? Double.POSITIVE_INFINITY : value.doubleValue();
    }

    private static SeverityModel model(JsonNode severity) {
        String portfolio = """
                {"format": "layerweft/portfolio/1", "name": "Table", "currency": "EUR", "unit": "million",
                 "perils": [{"name": "p", "frequency": {"model": "poisson", "mean": 1}, "severity": %s}]}""".formatted(severity);
        EventLoss loss = PortfolioReader.read("table.json", portfolio.getBytes(StandardCharsets.UTF_8)).perils().get(0).eventLoss();
        return ((EventLoss.Single) loss).severity();
    }

    private static JsonNode read() {
        try (InputStream in = SeverityTable.class.getResourceAsStream("/reference/severity.json")) {
            return new ObjectMapper().readTree(in);
        } catch (IOException e) {
            throw new IllegalStateException(e);
        }
    }
}
