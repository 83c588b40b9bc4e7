package layerweft.file;

import static layerweft.file.Examples.bytes;
import static layerweft.file.Examples.faults;
import static layerweft.file.Examples.lines;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** Every fault is found in one round, at its line and column. */
class AllFaultsTest {
    private static final String EIGHT = """
            {
              "format": "layerweft/portfolio/1",
              "name": "Book",
              "unit": "million",
              "perils": [
                {"name": "wind", "frequency": {"model": "binomial", "trials": 1.5, "chance": 0.2},
                 "severity": {"model": "pareto", "treshold": 5, "alpha": "1.6"}},
                {"name": "wind", "frequency": {"model": "poison", "mean": 1},
                 "severity": {"model": "exponential", "mean": 1, "mean": 2}}
              ],
              "dependence": {"links": "counts", "copula": {"family": "joe", "kendallTau": -0.5}}
            }
            """;

    @Test
    void aFileWithManyFaultsListsThemAllInOrder() {
        assertEquals(List.of(
                "file.json:1:1: currency: found nothing; admissible: the field currency, which is missing",
                "file.json:6:67: perils[0].frequency.trials: found 1.5; admissible: a whole number, at most 2147483647 in size",
                "file.json:7:38: perils[0].severity.treshold: found an unknown field; admissible: the fields model, threshold, alpha, cap "
                        + "(did you mean threshold?)",
                "file.json:7:62: perils[0].severity.alpha: found \"1.6\"; admissible: a number",
                "file.json:8:14: perils[1].name: found \"wind\" a second time; admissible: a name of its own for each peril",
                "file.json:8:45: perils[1].frequency.model: found \"poison\"; admissible: one of poisson, negativeBinomial, binomial, "
                        + "empirical (did you mean poisson?)",
                "file.json:9:54: perils[1].severity.mean: found the field \"mean\" a second time; admissible: each field once",
                "file.json:11:79: dependence.copula.kendallTau: found -0.5; admissible: from 0 up to below 1"),
                lines(faults(EIGHT)));
    }

    @Test
    void aProgrammeWithManyFaultsListsThemAllInOrder() {
        String text = """
                {"format": "layerweft/programme/1", "name": "P",
                 "layers": [
                  {"name": "A", "inuring": ["B"], "share": 2},
                  {"name": "B", "inuring": ["A", "C"], "occurrence": {"limit": 0}, "annual": {"limit": -1}},
                  {"name": "A", "premium": true}],
                 "buyer": {"tailLevel": 2, "capitalCost": -1}, "extra": 0}
                """;
        List<String> paths = faults(text).stream().map(Fault::path).toList();
        assertEquals(List.of("layers[0].share", "layers[1].inuring[1]", "layers[1].occurrence.limit", "layers[1].annual.limit",
                "layers[2].name", "layers[2].premium", "buyer.tailLevel", "buyer.capitalCost", "extra"), paths);
    }

    @Test
    void faultsOfBothFilesAndBetweenThemComeTogether(@TempDir Path folder) throws IOException {
        Path portfolio = Files.write(folder.resolve("p.json"), bytes(Examples.changed(Examples.PORTFOLIO, "\"alpha\": 1.6", "\"alpha\": []")));
        Path programme = Files.write(folder.resolve("q.json"), bytes(Examples.changed(Examples.changed(Examples.PROGRAMME,
                "\"share\": 0.9", "\"share\": 9"), "\"flood/sea\"", "\"flood/lake\"")));
        List<Fault> faults = assertThrows(FaultyFileException.class, () -> TreatyReader.read(portfolio, programme)).faults();
        assertEquals(List.of("perils[0].severity.alpha", "layers[0].perils[1]", "layers[0].share"), faults.stream().map(Fault::path).toList());
        assertEquals(List.of(portfolio.toString(), programme.toString(), programme.toString()), faults.stream().map(Fault::file).toList());
        assertEquals(5, faults.get(1).line());
        assertEquals(40, faults.get(1).column());
    }

    @Test
    void aPerilWithoutANameDoesNotSpoilTheGroups() {
        String groups = "\"kendallTau\": 0.3, \"groups\": [{\"perils\": [\"gale\", \"flood\"], \"kendallTau\": 0.5}]";
        String text = Examples.changed(Examples.PORTFOLIO, "\"kendallTau\": 0.3", groups);
        assertEquals(List.of("perils[0].name"), faults(Examples.changed(text, "\"name\": \"wind\", ", "")).stream().map(Fault::path).toList());
        assertEquals(List.of("perils", "perrils"),
                faults("{\"format\": \"layerweft/portfolio/1\", \"name\": \"n\", \"currency\": \"\", \"unit\": \"\", \"perils\": [],\n"
                        + "\"perrils\": 1, \"dependence\": {\"links\": \"counts\", \"copula\": {\"family\": \"gumbel\", " + groups + "}}}").stream()
                        .map(Fault::path).toList());
    }

    @Test
    void moreFaultsThanAnyoneReadsAreCutOff() {
        String text = Examples.changed(Examples.PROGRAMME, "[10, 200]", "[" + "true,".repeat(999) + "true]");
        String more = Examples.changed(text, "[1.0, 0.5]", "[" + "true,".repeat(999) + "true]");
        List<Fault> faults = faults(more);
        assertEquals(Limits.FAULTS + 1, faults.size());
        assertTrue(faults.get(Limits.FAULTS).toString().contains("more than 1000 faults"));
    }
}
