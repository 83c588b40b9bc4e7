package layerweft.command;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.security.MessageDigest;
import java.util.ArrayList;
import java.util.HexFormat;
import java.util.List;
import java.util.Locale;
import javax.xml.parsers.DocumentBuilderFactory;
import org.apache.pdfbox.Loader;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.apache.pdfbox.text.PDFTextStripper;
import org.dhatim.fastexcel.reader.ReadableWorkbook;
import org.dhatim.fastexcel.reader.Row;
import org.dhatim.fastexcel.reader.Sheet;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class ReportCommandTest {
    private static final String PORTFOLIO = """
            {"format": "layerweft/portfolio/1", "name": "=Book <b>", "currency": "EUR", "unit": "million", "perils": [
              {"name": "wind & rain", "frequency": {"model": "poisson", "mean": 1}, "severity": {"model": "exponential", "mean": 10}},
              {"name": "@flood", "frequency": {"model": "poisson", "mean": 0.5}, "severity": {"model": "exponential", "mean": 20}}],
             "dependence": {"links": "counts", "copula": {"family": "gumbel", "kendallTau": 0.3}}}""";
    private static final String PROGRAMME = """
            {"format": "layerweft/programme/1", "name": "%s", "layers": [
              {"name": "+Layer", "occurrence": {"retention": 20, "limit": %s}, "reinstatements": [1.0], "premium": 6.5},
              {"name": "Stop loss", "annual": {"deductible": 40, "limit": 60}}]}""";

    @TempDir
    private Path folder;

    private Path file(String name, String content) throws IOException {
        return Files.writeString(folder.resolve(name), content);
    }

    private Path report(String out, Path... programmes) throws IOException {
        Path target = folder.resolve(out);
        List<Object> arguments = new ArrayList<>(List.of("report", file("book.json", PORTFOLIO)));
        arguments.addAll(List.of(programmes));
        arguments.addAll(List.of("--years", 2000, "--seed", 3, "--families", "none", "--out", target));
        assertEquals("", Run.of(arguments.toArray()).done().out());
        return target;
    }

    private static List<Row> rows(Sheet sheet) {
        try {
            return sheet.read();
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    @Test
    void threeFormsSayTheSameFiguresAndHowToMakeThemAgain() throws Exception {
        Path one = file("one.json", PROGRAMME.formatted("One", "30"));
        String hash = HexFormat.of().formatHex(MessageDigest.getInstance("SHA-256").digest(Files.readAllBytes(one)));
        String html = DocumentBuilderFactory.newInstance().newDocumentBuilder().parse(new ByteArrayInputStream(Files.readAllBytes(report("a.html", one))))
                .getDocumentElement().getTextContent();
        String pdf;
        try (PDDocument document = Loader.loadPDF(Files.readAllBytes(report("a.pdf", one)))) {
            pdf = new PDFTextStripper().getText(document).replaceAll("\\s+", " ");
        }
        StringBuilder xlsx = new StringBuilder();
        double expected = Double.NaN;
        try (ReadableWorkbook book = new ReadableWorkbook(Files.newInputStream(report("a.xlsx", one)))) {
            for (Sheet sheet : book.getSheets().toList()) {
                for (Row row : rows(sheet)) {
                    row.forEach(cell -> xlsx.append(cell == null ? "" : cell.getText()).append('\n'));
                    if (sheet.getIndex() == 0 && row.getCellCount() > 2 && "+Layer".equals(row.getCellText(0))) {
                        expected = row.getCellAsNumber(2).orElseThrow().doubleValue();
                    }
                }
            }
        }
        assertTrue(expected > 0, "no number in the summary");
        String shown = String.format(Locale.ROOT, "%.3f", expected);
        assertTrue(html.contains(shown) && pdf.contains(shown), shown);
        for (String part : List.of(hash, "=Book <b>", "wind & rain", "@flood", "Layerweft " + Version.current(), "severity.mean")) {
            assertTrue(html.contains(part), () -> "HTML without " + part);
            assertTrue(pdf.contains(part), () -> "PDF without " + part);
            assertTrue(xlsx.toString().contains(part), () -> "XLSX without " + part);
        }
    }

    @Test
    void sameInputGivesTheSameBytesAndSeveralProgrammesAreCompared() throws Exception {
        Path one = file("one.json", PROGRAMME.formatted("One", "30"));
        Path other = file("other.json", PROGRAMME.formatted("Other", "60"));
        byte[] first = Files.readAllBytes(report("a.html", one, other));
        assertArrayEquals(first, Files.readAllBytes(report("b.html", one, other)));
        String text = new String(first, StandardCharsets.UTF_8);
        assertTrue(text.contains("One less Other") && text.contains("cost of cover"));
        assertFalse(text.contains(folder.toString()), "the folder of the writer is in the document");
    }

    @Test
    void refusesWhatIsNoFormOfADocumentBeforeAnythingIsComputed() throws IOException {
        Path book = file("book.json", PORTFOLIO);
        Path one = file("one.json", PROGRAMME.formatted("One", "30"));
        assertTrue(Run.of("report", book, one, "--out", folder.resolve("quote.doc")).refused().err().contains(".html, .pdf or .xlsx"));
        assertTrue(Run.of("report", book, one, "--out", folder.resolve("no/such/quote.pdf")).refused().err().contains("cannot write"));
        Run.of("report", book, one).refused();
        assertTrue(Run.of("report", book, one, one, "--out", folder.resolve("q.html")).refused().err().contains("a second time"));
    }
}
