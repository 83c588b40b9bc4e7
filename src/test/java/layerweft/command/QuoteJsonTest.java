package layerweft.command;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** What {@code quote --format json} promises to programs that read it: every field, its type, its keys, and an error for every figure. */
class QuoteJsonTest {
    private static final List<String> LAYER_FIGURES = List.of("expectedLoss", "standardDeviation", "lossOnLine", "attachmentProbability",
            "exhaustionProbability", "expectedEvents", "paidUpFactor", "technicalPremium", "technicalRateOnLine", "payback");

    static final String PORTFOLIO = """
            {"format": "layerweft/portfolio/1", "name": "Book", "currency": "EUR", "unit": "million",
             "perils": [
               {"name": "wind", "frequency": {"model": "negativeBinomial", "mean": 1.5, "varianceToMean": 1.3},
                "severity": {"model": "pareto", "threshold": 5, "alpha": ALPHA}},
               {"name": "flood", "frequency": {"model": "poisson", "mean": 0.8}, "severity": {"model": "lognormal", "mean": 12, "cv": 1.5}}],
             "dependence": {"links": "counts", "copula": {"family": "gumbel", "kendallTau": 0.3}}}
            """;
    static final String PROGRAMME = """
            {"format": "layerweft/programme/1", "name": "Cover",
             "layers": [
               {"name": "Cat", "occurrence": {"retention": 20, "limit": 30}, "reinstatements": [1.0, 0.5], "share": 0.8, "premium": 6.5},
               {"name": "Open", "occurrence": {"retention": 10}},
               {"name": "Rest", "inuring": ["Cat"], "annual": {"deductible": 40, "limit": 60}}],
             "pricing": {"loading": {"principle": "standardDeviation", "factor": 0.2}, "brokerage": 0.1},
             "buyer": {"returnPeriods": [10, 100, 200, 3], "tailLevel": 0.985}}
            """;

    @TempDir
    private Path folder;

    private JsonNode quote(String alpha, String programme, Object... more) throws IOException {
        List<Object> arguments = new ArrayList<>(List.of("quote", Files.writeString(folder.resolve("book.json"), PORTFOLIO.replace("ALPHA", alpha)),
                Files.writeString(folder.resolve("cover.json"), programme), "--format", "json", "--years", "20000"));
        arguments.addAll(List.of(more));
        return tree(Run.of(arguments.toArray()).done());
    }

    private static JsonNode tree(Run run) throws JsonProcessingException {
        return new ObjectMapper().readTree(run.out());
    }

    private static Set<String> keys(JsonNode object) {
        Set<String> keys = new java.util.TreeSet<>();
        object.fieldNames().forEachRemaining(keys::add);
        return keys;
    }

    @Test
    void everyFieldIsThere() throws IOException {
        JsonNode quote = quote("1.6", PROGRAMME, "--seed", 7);
        assertEquals("Book", quote.get("portfolio").textValue());
        assertEquals("Cover", quote.get("programme").textValue());
        assertEquals(7, quote.get("seed").longValue());
        assertEquals(20_000, quote.get("years").longValue());
        assertEquals(List.of("Cat", "Open", "Rest"), quote.get("layers").findValuesAsText("name"));
        assertEquals(List.of("transform", "transform", "simulation"), quote.get("layers").findValuesAsText("engine"));
        Set<String> levels = Set.of("0.9", "0.99", "0.995", "0.985", "0.6666666666666667");
        for (JsonNode layer : quote.get("layers")) {
            for (String figure : LAYER_FIGURES) {
                assertTrue(layer.has(figure) && layer.get("errors").has(figure), figure);
            }
            assertEquals(layer.get("errors").get("expectedLoss"), layer.get("error"));
            for (JsonNode both : List.of(layer, layer.get("errors"))) {
                assertEquals(levels, keys(both.get("valueAtRisk")));
                assertEquals(Set.of("0.985"), keys(both.get("tailValueAtRisk")));
                assertEquals(Set.of("3", "10", "100", "200"), keys(both.get("exceedance").get("occurrence")));
                assertEquals(Set.of("3", "10", "100", "200"), keys(both.get("exceedance").get("aggregate")));
            }
            assertEquals(layer.get("valueAtRisk").get("0.995"), layer.get("exceedance").get("aggregate").get("200"));
        }
        for (String side : List.of("gross", "ceded", "net")) {
            JsonNode position = quote.get("whole").get(side);
            for (String figure : List.of("mean", "standardDeviation", "valueAtRisk", "tailValueAtRisk", "exceedance")) {
                assertTrue(position.has(figure) && position.get("errors").has(figure), side + " " + figure);
            }
            assertEquals(levels, keys(position.get("valueAtRisk")));
            assertEquals(Set.of("0.985"), keys(position.get("tailValueAtRisk")));
        }
    }

    @Test
    void numbersAreNumbersAtTheLayersShare() throws IOException {
        JsonNode layer = quote("2.6", PROGRAMME).get("layers").get(0);
        for (String figure : LAYER_FIGURES) {
            assertTrue(layer.get(figure).isNumber(), figure + " " + layer.get(figure));
        }
        JsonNode full = quote("2.6", PROGRAMME.replace("\"share\": 0.8, ", "")).get("layers").get(0);
        for (String money : List.of("expectedLoss", "error", "standardDeviation", "technicalPremium", "quotedPremium")) {
            assertEquals(0.8 * full.get(money).doubleValue(), layer.get(money).doubleValue(), 1e-12 * full.get(money).doubleValue(), money);
        }
        for (String ratio : List.of("lossOnLine", "attachmentProbability", "exhaustionProbability", "expectedEvents", "paidUpFactor",
                "technicalRateOnLine", "quotedRateOnLine", "payback")) {
            assertEquals(full.get(ratio), layer.get(ratio), ratio);
        }
        assertEquals(0.8 * 6.5, layer.get("quotedPremium").doubleValue(), 1e-15);
        assertEquals(6.5 / 30, layer.get("quotedRateOnLine").doubleValue(), 1e-15);
        assertEquals(30 / 6.5, layer.get("payback").doubleValue(), 1e-14);
        double low = layer.get("bracket").get(0).doubleValue();
        double high = layer.get("bracket").get(1).doubleValue();
        assertTrue(low <= layer.get("expectedLoss").doubleValue() && layer.get("expectedLoss").doubleValue() <= high, layer.get("bracket").toString());
        assertEquals(2, layer.get("bracket").size());
    }

    @ParameterizedTest
    @CsvSource({"auto", "transform", "simulation"})
    void infiniteIsAWordAndUndefinedIsNull(String engine) throws IOException {
        String open = PROGRAMME.replaceAll("(?s)\\{\"name\": \"Cat\".*?\\},\\s*\\{\"name\": \"Open\"", "{\"name\": \"Open\"").replaceAll(",\\s*\\{\"name\": \"Rest\"[^\\n]*\\]", "]");
        JsonNode quote = quote("0.9", open, "--engine", engine);
        JsonNode layer = quote.get("layers").get(0);
        for (String figure : List.of("expectedLoss", "standardDeviation", "technicalPremium")) {
            assertEquals("infinity", layer.get(figure).textValue(), figure);
        }
        assertEquals("infinity", layer.get("tailValueAtRisk").get("0.985").textValue());
        assertTrue(layer.get("lossOnLine").isNull() && layer.get("technicalRateOnLine").isNull() && layer.get("payback").isNull(), layer.toString());
        assertEquals("infinity", quote.get("whole").get("gross").get("mean").textValue());
        assertFalse(quote.toString().contains("NaN"), quote.toString());
        assertEquals(0, quote.get("buyer").get("reinstatementPremium").doubleValue(), quote.get("buyer").toString());
        assertEquals("infinity", quote.get("buyer").get("upfrontPremium").textValue());
    }

    @Test
    void sameSeedSameTextWhateverTheThreads() throws IOException {
        Path book = Files.writeString(folder.resolve("book.json"), PORTFOLIO.replace("ALPHA", "1.6"));
        Path cover = Files.writeString(folder.resolve("cover.json"), PROGRAMME);
        for (String format : List.of("json", "text", "csv")) {
            String first = Run.of("quote", book, cover, "--format", format, "--years", 50_000, "--seed", 3, "--threads", 1).done().out();
            assertEquals(first, Run.of("quote", book, cover, "--format", format, "--years", 50_000, "--seed", 3, "--threads", 3).done().out());
            assertEquals(first, Run.of("quote", book, cover, "--format", format, "--years", 50_000, "--seed", 3).done().out());
            assertNotEquals(first, Run.of("quote", book, cover, "--format", format, "--years", 50_000, "--seed", 4).done().out());
        }
    }

    @Test
    void transformRefusesInuringByNameAndReason() throws IOException {
        Path book = Files.writeString(folder.resolve("book.json"), PORTFOLIO.replace("ALPHA", "1.6"));
        Path cover = Files.writeString(folder.resolve("cover.json"), PROGRAMME);
        String message = Run.of("quote", book, cover, "--engine", "transform", "--years", 1000).refused().err();
        assertTrue(message.contains("\"Rest\"") && message.contains("inure"), message);
    }
}
