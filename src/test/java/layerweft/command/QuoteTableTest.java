package layerweft.command;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import de.siegmar.fastcsv.reader.CsvReader;
import de.siegmar.fastcsv.reader.NamedCsvRecord;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Quotes as text and as a table for a spreadsheet. */
class QuoteTableTest {
    private static final String BOOK = "demo-portfolios/harrow-coast.json";
    private static final String COVER = "treaties/harrow-coast-inuring.json";

    @TempDir
    private Path folder;

    private static List<NamedCsvRecord> records(String text) throws IOException {
        try (CsvReader<NamedCsvRecord> csv = CsvReader.builder().ofNamedCsvRecord(text)) {
            return csv.stream().toList();
        }
    }

    private Path file(String name, String text) throws IOException {
        return Files.writeString(folder.resolve(name), text);
    }

    @Test
    void textIsAlignedAndNarrow() {
        String text = Run.of("quote", BOOK, COVER, "--years", 5_000).done().out();
        text.lines().forEach(line -> assertTrue(line.length() <= 200, line.length() + ": " + line));
        assertFalse(text.contains("NaN") || text.contains("null") || text.contains("Infinity"), text);
        List<String> lines = text.lines().toList();
        int tables = 0;
        for (int k = 1; k < lines.size(); k++) {
            if (lines.get(k).startsWith("─")) {
                tables++;
                int width = lines.get(k).length();
                for (int row = k + 1; row < lines.size() && !lines.get(row).isBlank(); row++) {
                    assertTrue(lines.get(row).length() <= width, lines.get(row));
                }
                assertTrue(lines.get(k - 1).length() <= width, lines.get(k - 1));
            }
        }
        assertEquals(5, tables, text);
    }

    /** Cells of a column end at the same place: the expected loss of each layer ends where its header does. */
    @Test
    void expectedLossesStandUnderTheirHeaderWithTheirErrors() {
        List<String> lines = Run.of("quote", BOOK, COVER, "--years", 5_000, "--engine", "simulation").done().out().lines().toList();
        int header = 0;
        while (!lines.get(header).contains("expected loss")) {
            header++;
        }
        int end = lines.get(header).indexOf("expected loss") + "expected loss".length();
        int rows = 0;
        for (int k = header + 2; !lines.get(k).isBlank(); k++, rows++) {
            String line = lines.get(k);
            assertTrue(Character.isDigit(line.charAt(end - 1)), line);
            assertTrue(line.substring(end).matches(" ± .*"), line);
        }
        assertTrue(rows >= 2);
    }

    /** Simulated figures of the whole programme and the buyer's carry their error in the same line. */
    @Test
    void everySimulatedRowHasItsError() {
        List<String> lines = Run.of("quote", BOOK, COVER, "--years", 5_000, "--engine", "simulation").done().out().lines().toList();
        for (String row : List.of("gross, year", "ceded, year", "net, year", "gross, largest event", "net, largest event", "expected recoveries",
                "cost of cover", "expected net position", "relief of standard deviation", "cost per unit of tail relief")) {
            List<String> found = lines.stream().filter(l -> l.startsWith(row)).toList();
            assertEquals(1, found.size(), row);
            assertTrue(found.get(0).contains("±"), found.get(0));
        }
    }

    @Test
    void csvHasARowPerLayerThenGrossCededAndNet() throws IOException {
        Run run = Run.of("quote", BOOK, COVER, "--years", 5_000, "--format", "csv").done();
        List<NamedCsvRecord> records = records(run.out());
        List<String> names = new ArrayList<>(layerweft.file.ProgrammeReader.read(Path.of(COVER)).layers().stream().map(l -> l.name()).toList());
        names.addAll(List.of("gross", "ceded", "net"));
        assertEquals(names, records.stream().map(r -> r.getField("layer")).toList());
        for (NamedCsvRecord row : records) {
            assertEquals(row.getHeader().size(), row.getFieldCount());
            assertTrue(Double.parseDouble(row.getField("expectedLoss")) > 0);
            assertTrue(Double.parseDouble(row.getField("expectedLoss error")) >= 0);
            assertTrue(Double.parseDouble(row.getField("valueAtRisk 0.995")) > 0);
        }
        double gross = Double.parseDouble(records.get(records.size() - 3).getField("expectedLoss"));
        double ceded = Double.parseDouble(records.get(records.size() - 2).getField("expectedLoss"));
        assertEquals(gross - ceded, Double.parseDouble(records.get(records.size() - 1).getField("expectedLoss")), 1e-12 * gross);
        assertEquals(ceded, records.subList(0, records.size() - 3).stream().mapToDouble(r -> Double.parseDouble(r.getField("expectedLoss"))).sum(), 1e-12 * ceded);
    }

    @Test
    void namesThatNeedQuotesReadBack() throws IOException {
        String name = "Cat, \\\"first\\\"";
        Path cover = file("cover.json", QuoteJsonTest.PROGRAMME.replace("\"Cat\"", "\"" + name + "\""));
        Path book = file("book.json", QuoteJsonTest.PORTFOLIO.replace("ALPHA", "1.6"));
        assertEquals("Cat, \"first\"", records(Run.of("quote", book, cover, "--years", 2_000, "--format", "csv").done().out()).get(0).getField("layer"));
    }

    /** Return periods may stand in any order and repeat: each amount stands under its own return period. */
    @Test
    void amountsStandUnderTheirReturnPeriodsWhateverTheirOrder() throws IOException {
        Path book = file("book.json", QuoteJsonTest.PORTFOLIO.replace("ALPHA", "1.6"));
        String periods = "[10, 100, 200, 3]";
        Path sorted = file("sorted.json", QuoteJsonTest.PROGRAMME.replace(periods, "[3, 10, 100, 200]"));
        for (String other : List.of(periods, "[200, 100, 10, 3]", "[3, 10, 10, 100, 200, 3]")) {
            Path shuffled = file("shuffled.json", QuoteJsonTest.PROGRAMME.replace(periods, other));
            for (String format : List.of("text", "csv", "json")) {
                assertEquals(Run.of("quote", book, sorted, "--years", 2_000, "--format", format).done().out(),
                        Run.of("quote", book, shuffled, "--years", 2_000, "--format", format).done().out(), other + " as " + format);
            }
        }
    }

    /** Short runs and empty books have no errors to speak of, and still print. */
    @ParameterizedTest
    @ValueSource(ints = {100, 1_000})
    void shortRunsPrintInEveryForm(int years) throws IOException {
        Path book = file("book.json", QuoteJsonTest.PORTFOLIO.replace("ALPHA", "1.6"));
        Path cover = file("cover.json", QuoteJsonTest.PROGRAMME);
        for (String format : List.of("text", "csv", "json")) {
            Run run = Run.of("quote", book, cover, "--years", years, "--format", format, "--engine", "simulation").done();
            assertFalse(run.out().contains("NaN"), run.out());
        }
    }
}
