package layerweft.report;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertNull;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;
import java.util.regex.Pattern;
import java.util.zip.ZipEntry;
import java.util.zip.ZipInputStream;
import org.dhatim.fastexcel.reader.Cell;
import org.dhatim.fastexcel.reader.CellType;
import org.dhatim.fastexcel.reader.ReadableWorkbook;
import org.dhatim.fastexcel.reader.ReadingOptions;
import org.dhatim.fastexcel.reader.Row;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Workbooks read back with fastexcel-reader, which shares no code with the writer. */
class XlsxWriterTest {

    private static List<Row> firstSheet() throws IOException {
        try (ReadableWorkbook book = new ReadableWorkbook(new ByteArrayInputStream(XlsxWriter.write(Sample.model())), new ReadingOptions(true, false))) {
            return book.getFirstSheet().read();
        }
    }

    private static Row row(String name) throws IOException {
        return firstSheet().stream().filter(row -> row.getCellCount() > 1 && name.equals(row.getCellText(0))).findFirst().orElseThrow();
    }

    @Test
    void numbersAreNumbersWithAllDigitsAndErrorsBeside() throws IOException {
        Row row = row(Sample.HOSTILE);
        assertEquals(CellType.NUMBER, row.getCell(1).getType());
        assertEquals(14.8712, row.getCellAsNumber(1).orElseThrow().doubleValue());
        assertEquals(0.0312, row.getCellAsNumber(2).orElseThrow().doubleValue());
        assertEquals("#,##0.00", row.getCell(1).getDataFormatString());
        assertEquals(0.10332, row.getCellAsNumber(3).orElseThrow().doubleValue());
        assertEquals("0.00%", row.getCell(3).getDataFormatString());
        assertEquals(0.012, row.getCellAsNumber(5).orElseThrow().doubleValue());
        assertEquals(-3.25, row("@SUM(A1)").getCellAsNumber(1).orElseThrow().doubleValue());
        assertEquals(12500.75, row("-1").getCellAsNumber(1).orElseThrow().doubleValue());
    }

    @Test
    void whatIsNotANumberIsSaidAsInTheOtherForms() throws IOException {
        assertEquals("∞", row("+1").getCellText(1));
        assertEquals("—", row("+1").getCellText(3));
    }

    @ParameterizedTest
    @ValueSource(strings = {Sample.HOSTILE, "+1", "-1", "@SUM(A1)"})
    void textThatLooksLikeAFormulaStaysText(String name) throws IOException {
        Cell cell = row(name).getCell(0);
        assertEquals(CellType.STRING, cell.getType());
        assertNull(cell.getFormula());
    }

    /** A cell of the format "text" keeps what is typed into it as it is; the reader does not tell the format of a text cell, so this is read from the parts. */
    @Test
    void everyTextCellHasTheFormatOfText() throws IOException {
        Map<String, String> parts = parts();
        String styles = parts.get("xl/styles.xml");
        String text = group(styles, "numFmtId=\"(\\d+)\" formatCode=\"@\"").get(0);
        List<String> formats = group(styles.substring(styles.indexOf("<cellXfs")), "<xf numFmtId=\"(\\d+)\"");
        List<String> used = group(parts.get("xl/worksheets/sheet1.xml"), "<c r=\"[A-Z]+\\d+\" s=\"(\\d+)\" t=\"s\"");
        assertTrue(used.size() > 20, used::toString);
        used.forEach(style -> assertEquals(text, formats.get(Integer.parseInt(style))));
        assertFalse(parts.get("xl/worksheets/sheet1.xml").contains("t=\"s\" s="), "an order of attributes that this test does not see");
    }

    @Test
    void noPartHoldsAFormulaOrATime() throws IOException {
        parts().forEach((name, content) -> assertFalse(content.contains("<f>") || content.contains("dcterms:created>"), name));
    }

    private static Map<String, String> parts() throws IOException {
        Map<String, String> parts = new TreeMap<>();
        try (ZipInputStream zip = new ZipInputStream(new ByteArrayInputStream(XlsxWriter.write(Sample.model())))) {
            for (ZipEntry entry = zip.getNextEntry(); entry != null; entry = zip.getNextEntry()) {
                parts.put(entry.getName(), new String(zip.readAllBytes(), StandardCharsets.UTF_8));
            }
        }
        return parts;
    }

    private static List<String> group(String text, String pattern) {
        return Pattern.compile(pattern).matcher(text).results().map(match -> match.group(1)).toList();
    }

    @Test
    void sectionsOfOneTitleAreSheetsOfTwoNames() throws IOException {
        try (ReadableWorkbook book = new ReadableWorkbook(new ByteArrayInputStream(XlsxWriter.write(Sample.model())))) {
            assertEquals(List.of("Summary", "Summary 2"), book.getSheets().map(sheet -> sheet.getName()).toList());
            assertEquals(Optional.of("A second of the same name."), book.getSheet(1).orElseThrow().read().stream()
                    .map(row -> row.getCellText(0)).filter(text -> text.startsWith("A second")).findFirst());
        }
    }

    @Test
    void sameModelGivesTheSameBytes() {
        assertArrayEquals(XlsxWriter.write(Sample.model()), XlsxWriter.write(Sample.model()));
    }
}
