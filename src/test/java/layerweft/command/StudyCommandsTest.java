package layerweft.command;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import de.siegmar.fastcsv.reader.CsvReader;
import de.siegmar.fastcsv.reader.CsvRecord;
import java.io.IOException;
import java.io.PrintWriter;
import java.io.StringWriter;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import layerweft.reference.ReferenceCase;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class StudyCommandsTest {
    private static final Path FOLDER = ReferenceCase.ofKinds("s").get(0).folder();
    private static final String PORTFOLIO = FOLDER.resolve("portfolio.json").toString();
    private static final String PROGRAMME = FOLDER.resolve("programme.json").toString();

    private record Run(int status, String out, String err) {}

    private static Run run(String command, String... options) {
        List<String> args = new ArrayList<>(List.of(command, PORTFOLIO, PROGRAMME));
        if (command.equals("break-even")) {
            args.add(PROGRAMME);
        }
        args.addAll(List.of(options));
        StringWriter out = new StringWriter();
        StringWriter err = new StringWriter();
        int status = CommandLineProgram.run(args.toArray(String[]::new), new PrintWriter(out), new PrintWriter(err));
        return new Run(status, out.toString(), err.toString());
    }

    private static JsonNode json(String command, String... options) throws IOException {
        Run run = run(command, options);
        assertEquals(0, run.status, run.err);
        return new ObjectMapper().readTree(run.out);
    }

    private static List<CsvRecord> csv(String command, String... options) throws IOException {
        Run run = run(command, options);
        assertEquals(0, run.status, run.err);
        try (CsvReader<CsvRecord> reader = CsvReader.builder().ofCsvRecord(run.out)) {
            return reader.stream().toList();
        }
    }

    @Test
    void sweepWritesARowForEachFamilyStrengthAndLayer() throws IOException {
        JsonNode tree = json("sweep", "--families", "gumbel,student:4", "--taus", "0,0.3", "--format", "json");
        assertEquals(2 * 2 * 4, tree.get("rows").size());
        JsonNode row = tree.get("rows").get(3);
        assertEquals("student:4", row.get("family").asText());
        assertEquals(0.3, row.get("kendallTau").asDouble());
        for (String field : List.of("layer", "engine", "expectedLoss", "error", "standardDeviation", "lossOnLine", "technicalPremium", "lift", "slope")) {
            assertTrue(row.has(field), field);
        }
        JsonNode layer = tree.get("layers").get(3);
        assertEquals("flood only", layer.get("name").asText());
        assertFalse(layer.get("dependsOnCopula").asBoolean());
        assertEquals("it covers one peril", layer.get("because").asText());
        assertEquals(2, tree.get("layers").get(0).get("spread").size());
        assertTrue(tree.get("layers").get(1).get("comonotone").asDouble() > tree.get("layers").get(1).get("independent").asDouble());
    }

    @Test
    void sweepFollowsAnotherFigureAndKeepsTheLiftOfTheExpectedLoss() throws IOException {
        JsonNode loss = json("sweep", "--families", "gumbel", "--taus", "0.3", "--format", "json").get("rows").get(1);
        JsonNode chance = json("sweep", "--families", "gumbel", "--taus", "0.3", "--figure", "exhaustionProbability", "--check", "5000", "--format", "json")
                .get("rows").get(1);
        assertEquals(loss.get("lift").asDouble(), chance.get("lift").asDouble());
        assertEquals(loss.get("lift").asDouble(), loss.get("valueLift").asDouble());
        assertTrue(chance.get("value").asDouble() < 1);
        assertEquals(5000, chance.get("check").get("years").asInt());
        assertTrue(chance.get("check").get("error").asDouble() > 0);
    }

    @Test
    void sweepTablesHaveAsManyCellsAsTheirHeader() throws IOException {
        List<CsvRecord> records = csv("sweep", "--families", "gumbel,frank", "--taus", "0,0.3,0.6", "--format", "csv");
        assertEquals(1 + 2 * 3 * 4, records.size());
        records.forEach(record -> assertEquals(records.get(0).getFieldCount(), record.getFieldCount()));
    }

    @Test
    void sweepTextDrawsLayersThatMoveAndNamesThoseThatDoNot() {
        String text = run("sweep", "--families", "gumbel,clayton", "--taus", "0,0.3,0.6").out;
        assertTrue(text.contains("flood only does not depend on the copula: it covers one peril."), text);
        assertTrue(text.contains("expected loss, EUR million"), text);
        assertTrue(text.contains("G gumbel  C clayton  ┄ comonotonic"), text);
        assertFalse(text.contains("NaN"), text);
    }

    @Test
    void breakEvenAnswersForEachFamily() throws IOException {
        JsonNode answer = json("break-even", "--families", "gumbel", "--format", "json").get("breakEven").get(0);
        assertEquals("expectedCost", answer.get("measure").asText());
        assertEquals("equal", answer.get("answer").asText());
        assertTrue(answer.get("taus").isArray() && answer.get("cheaperBelow").isNull());
        assertEquals(2, csv("break-even", "--families", "gumbel", "--format", "csv").size());
        assertTrue(run("break-even", "--families", "gumbel").out.contains("do not differ by more than their errors"));
    }

    @Test
    void rankingIsSortedAndDrawn() throws IOException {
        JsonNode tree = json("rank", "--layer", "aggregate", "--format", "json");
        double last = Double.POSITIVE_INFINITY;
        for (JsonNode s : tree.get("ranking")) {
            assertTrue(Math.abs(s.get("change").asDouble()) <= last);
            last = Math.abs(s.get("change").asDouble());
        }
        assertEquals(2 + 3 * 3, tree.get("ranking").size());
        List<CsvRecord> records = csv("rank", "--layer", "aggregate", "--format", "csv");
        records.forEach(record -> assertEquals(records.get(0).getFieldCount(), record.getFieldCount()));
        assertTrue(run("rank", "--layer", "aggregate").out.contains("│████████████████████"));
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', value = {
        "sweep | --families | gumble | --families: found \"gumble\"; admissible: one of gaussian, student:4",
        "sweep | --families | student:x | --families",
        "sweep | --families | comonotonic | a family with a strength",
        "sweep | --families | gumbel,gumbel | each family once",
        "sweep | --taus | 0,,1 | --taus: found \"\"; admissible: numbers separated by commas",
        "sweep | --taus | 0.1;0.2 | --taus",
        "sweep | --taus | NaN | --taus: found NaN; admissible: gumbel between 3 perils has τ from 0 up to below 1",
        "sweep | --taus | 1 | --taus: found 1; admissible: gumbel between 3 perils has τ from 0 up to below 1",
        "sweep | --taus | -0.9 | gaussian between 3 perils has τ from -0.333333 to 1",
        "sweep | --figure | loss | --figure: found \"loss\"; admissible: one of expectedLoss",
        "sweep | --check | -5 | --check",
        "sweep | --years | 0 | --years",
        "break-even | --families | none | --families",
        "rank | --layer | top | --layer: found \"top\"; admissible: one of cat, cat aad, aggregate, flood only",
        "rank | --figure | lossOnLine | --figure",
        "rank | --figure | x | --figure"})
    void wrongOptionsEndWithTwoAndSayWhatIsAdmissible(String command, String option, String value, String message) {
        Run run = run(command, option + "=" + value);
        assertEquals(2, run.status, run.err);
        assertEquals("", run.out);
        assertTrue(run.err.contains(message), run.err);
        assertFalse(run.err.contains("\tat "), run.err);
    }

    @Test
    void compareNamesEachStructureAndPair() throws IOException {
        Path treaties = Path.of("treaties");
        layerweft.command.Run run = layerweft.command.Run.of("compare", Path.of("demo-portfolios", "harrow-coast.json"), treaties.resolve("harrow-coast-one-layer.json"),
                treaties.resolve("harrow-coast-two-layers.json"), "--years", 40_000, "--families", "gumbel", "--format", "json").done();
        JsonNode tree = new ObjectMapper().readTree(run.out());
        assertEquals(2, tree.get("structures").size());
        JsonNode first = tree.get("structures").get(0);
        assertEquals(first.get("upfrontPremium").doubleValue() + first.get("reinstatementPremium").doubleValue() - first.get("expectedRecoveries").doubleValue(),
                first.get("costOfCover").doubleValue(), 1e-9);
        assertEquals(first.get("net").get("mean").doubleValue(), tree.get("gross").get("mean").doubleValue() + first.get("costOfCover").doubleValue(), 1e-9);
        assertEquals(2, tree.get("breakEven").size());
        assertEquals("expectedCost", tree.get("breakEven").get(0).get("measure").asText());
        assertEquals("costOfRisk", tree.get("breakEven").get(1).get("measure").asText());
        assertEquals(2, tree.get("preferred").size());
        String text = layerweft.command.Run.of("compare", Path.of("demo-portfolios", "harrow-coast.json"), treaties.resolve("harrow-coast-one-layer.json"),
                treaties.resolve("harrow-coast-two-layers.json"), "--years", 40_000, "--families", "none").done().out();
        assertTrue(text.contains("what each layer is worth"), text);
        layerweft.command.Run.of("compare", Path.of("demo-portfolios", "harrow-coast.json"), treaties.resolve("harrow-coast-one-layer.json")).refused();
    }

    @Test
    void driversAddUpInEveryForm() throws IOException {
        JsonNode tree = json("drivers", "--years", "20000", "--format", "json");
        for (JsonNode layer : tree.get("layers")) {
            double sum = 0;
            for (JsonNode peril : layer.get("perils")) {
                sum += peril.get("expectedShare").doubleValue();
            }
            assertEquals(1, sum, 1e-12);
        }
        assertTrue(tree.has("kept"));
        List<CsvRecord> rows = csv("drivers", "--years", "20000", "--format", "csv");
        assertEquals(1 + (tree.get("layers").size() + 1) * tree.get("kept").get("perils").size(), rows.size());
        assertTrue(run("drivers", "--years", "20000").out.contains("share in bad years"));
    }
}
