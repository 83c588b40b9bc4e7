package layerweft.file;

import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;

/** Dull valid files, and the faults of what a test makes of them. */
final class Examples {
    /** Two perils; the second has sub-perils. */
    static final String PORTFOLIO = """
            {
              "format": "layerweft/portfolio/1",
              "name": "Book",
              "currency": "EUR",
              "unit": "million",
              "perils": [
                {"name": "wind", "frequency": {"model": "poisson", "mean": 1.5},
                 "severity": {"model": "pareto", "threshold": 5, "alpha": 1.6}},
                {"name": "flood", "frequency": {"model": "binomial", "trials": 3, "chance": 0.2},
                 "subPerils": [
                   {"name": "river", "severity": {"model": "lognormal", "mean": 10, "cv": 2}},
                   {"name": "sea", "chance": 0.4, "severity": {"model": "exponential", "mean": 7}}]}
              ],
              "dependence": {"links": "counts", "copula": {"family": "gumbel", "kendallTau": 0.3}}
            }
            """;

    static final String PROGRAMME = """
            {
              "format": "layerweft/programme/1",
              "name": "Cover",
              "layers": [
                {"name": "Cat", "perils": ["wind", "flood/sea"], "occurrence": {"retention": 20, "limit": 30}, "reinstatements": [1.0, 0.5],
                 "share": 0.9, "premium": 6.5},
                {"name": "Aggregate", "inuring": ["Cat"], "annual": {"deductible": 40, "limit": 60}}
              ],
              "pricing": {"loading": {"principle": "standardDeviation", "factor": 0.25}, "brokerage": 0.1, "expenses": 0.05},
              "buyer": {"returnPeriods": [10, 200], "tailLevel": 0.99, "capitalCost": 0.07}
            }
            """;

    private Examples() {}

    static byte[] bytes(String text) {
        return text.getBytes(StandardCharsets.UTF_8);
    }

    /** The demo files of that folder of the source, as {@link DemoFiles} names them. */
    static List<String> demoFiles(String folder) {
        try (Stream<Path> files = Files.list(Path.of(folder))) {
            return files.map(f -> folder + "/" + f.getFileName()).filter(f -> f.endsWith(".json")).sorted().toList();
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    /** All demo files. */
    static List<String> demoFiles() {
        return Stream.of("demo-portfolios", "treaties").flatMap(folder -> demoFiles(folder).stream()).toList();
    }

    /** A demo file as it is, for editing. */
    static FileTree demo(String name) {
        return FileTree.parse(name, new String(DemoFiles.bytes(name), StandardCharsets.UTF_8));
    }

    /** The text with one piece changed, which must be there once. */
    static String changed(String text, String from, String to) {
        assertTrue(text.contains(from) && text.indexOf(from) == text.lastIndexOf(from), "once in the example: " + from);
        return text.replace(from, to);
    }

    /** The faults of a portfolio or programme, as its text says. */
    static List<Fault> faults(String text) {
        return faults(bytes(text), text.contains("layerweft/programme"));
    }

    static List<Fault> faults(byte[] bytes, boolean programme) {
        return assertThrows(FaultyFileException.class, () -> {
            if (programme) {
                ProgrammeReader.read("file.json", bytes);
            } else {
                PortfolioReader.read("file.json", bytes);
            }
        }).faults();
    }

    static List<String> lines(List<Fault> faults) {
        return faults.stream().map(Fault::toString).toList();
    }
}
