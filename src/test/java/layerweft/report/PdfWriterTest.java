package layerweft.report;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.awt.image.BufferedImage;
import java.io.IOException;
import java.util.ArrayList;
import java.util.List;
import layerweft.figures.Figure;
import org.apache.pdfbox.Loader;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.apache.pdfbox.pdmodel.PDPage;
import org.apache.pdfbox.pdmodel.common.PDRectangle;
import org.apache.pdfbox.rendering.PDFRenderer;
import org.apache.pdfbox.text.PDFTextStripper;
import org.junit.jupiter.api.Test;

class PdfWriterTest {
    /** Points at the left, right and lower edge that stay empty. */
    private static final int MARGIN = 28;

    private static ReportModel longTable() {
        List<List<Cell>> rows = new ArrayList<>();
        for (int k = 0; k < 120; k++) {
            rows.add(List.of(Cell.words("row " + k + " " + "of a long name ".repeat(k % 5)), Cell.number(new Figure(1000 + k, 0.3)), Cell.percent(new Figure(k / 1000.0, 1e-5))));
        }
        rows.add(List.of(Cell.words("x".repeat(9000)), Cell.words("—"), Cell.words("—")));
        return new ReportModel("t".repeat(300), "", List.of(new ReportModel.Section("Long", List.of(new Table("A long one", List.of("name", "amount", "part"), rows)))));
    }

    @Test
    void saysWhatTheModelSays() throws IOException {
        try (PDDocument document = Loader.loadPDF(PdfWriter.write(Sample.model()))) {
            String text = new PDFTextStripper().getText(document).replaceAll("\\s+", " ");
            for (String part : List.of("14.87 ± 0.03", "10.33 % ± 0.02", "1 in 83.3", "∞", "12,500.75", "−3.250", "@SUM(A1)", "τ = 0.3, ∞ ≥ 1", "• =second", "1 of 2", "<script>")) {
                assertTrue(text.contains(part), () -> part + " is not in: " + text);
            }
        }
    }

    @Test
    void pagesAreA4WithEmptyMargins() throws IOException {
        for (ReportModel model : List.of(Sample.model(), longTable())) {
            try (PDDocument document = Loader.loadPDF(PdfWriter.write(model))) {
                for (int k = 0; k < document.getNumberOfPages(); k++) {
                    PDPage page = document.getPage(k);
                    assertEquals(PDRectangle.A4.getWidth(), page.getMediaBox().getWidth());
                    assertEquals(PDRectangle.A4.getHeight(), page.getMediaBox().getHeight());
                    assertEquals("", inked(new PDFRenderer(document).renderImageWithDPI(k, 72)), "page " + (k + 1));
                }
            }
        }
    }

    /** Where there is ink in the margins; empty where there is none. */
    private static String inked(BufferedImage image) {
        for (int x = 0; x < image.getWidth(); x++) {
            for (int y = 0; y < image.getHeight(); y++) {
                boolean margin = x < MARGIN || x >= image.getWidth() - MARGIN || y < MARGIN || y >= image.getHeight() - MARGIN;
                if (margin && (image.getRGB(x, y) & 0xFFFFFF) != 0xFFFFFF) {
                    return "ink at " + x + ", " + y;
                }
            }
        }
        return "";
    }

    @Test
    void headerRowIsRepeatedOnEveryPageOfATable() throws IOException {
        try (PDDocument document = Loader.loadPDF(PdfWriter.write(longTable()))) {
            assertTrue(document.getNumberOfPages() > 3);
            for (int k = 1; k <= document.getNumberOfPages(); k++) {
                PDFTextStripper stripper = new PDFTextStripper();
                stripper.setStartPage(k);
                stripper.setEndPage(k);
                assertTrue(stripper.getText(document).contains("amount"), "page " + k);
            }
            String all = new PDFTextStripper().getText(document);
            assertEquals(9000, all.chars().filter(c -> c == 'x').count());
        }
    }

    @Test
    void lettersThatTheFontLacksAreMarkedAndDoNotStopIt() throws IOException {
        ReportModel model = new ReportModel("日本", "", List.of(new ReportModel.Section("s", List.of(new Block.Paragraph("ab 日 \uD83D\uDE00 c")))));
        try (PDDocument document = Loader.loadPDF(PdfWriter.write(model))) {
            assertTrue(new PDFTextStripper().getText(document).contains("ab ? ? c"));
        }
    }

    @Test
    void wordsCanBeSearchedLetterByLetter() throws IOException {
        String words = "Layerweft, fit, office, flood, after";
        ReportModel model = new ReportModel("t", "", List.of(new ReportModel.Section("s", List.of(new Block.Heading(words), new Block.Paragraph(words)))));
        try (PDDocument document = Loader.loadPDF(PdfWriter.write(model))) {
            assertEquals(2, new PDFTextStripper().getText(document).split(words, -1).length - 1);
        }
    }

    @Test
    void sameModelGivesTheSameBytes() {
        assertArrayEquals(PdfWriter.write(Sample.model()), PdfWriter.write(Sample.model()));
    }
}
