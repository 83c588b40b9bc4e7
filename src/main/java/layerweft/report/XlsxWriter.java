package layerweft.report;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.IntStream;
import layerweft.figures.Figure;
import org.dhatim.fastexcel.PaperSize;
import org.dhatim.fastexcel.Workbook;
import org.dhatim.fastexcel.Worksheet;

/**
 * A workbook with a sheet for each section. Numbers are numbers, with all their digits behind the ones shown, and have their errors in the
 * column after them; text is text, in cells of the format "text", so that it does not become a formula when a cell is opened and
 * left again either. Pictures are told by title and description: what they show stands in the tables.
 */
public final class XlsxWriter {
    private static final String TEXT_FORMAT = "@";
    private static final double FIRST_WIDTH = 42;
    private static final double WIDTH = 15;

    private final Worksheet sheet;
    private int row;
    private int columns = 1;

    private XlsxWriter(Worksheet sheet) {
        this.sheet = sheet;
    }

    /** The workbook; the same model gives the same bytes. */
    public static byte[] write(ReportModel model) {
        ByteArrayOutputStream out = new ByteArrayOutputStream();
        try (Workbook book = new Workbook(out, "Layerweft", null)) {
            book.setGlobalDefaultFont("Source Sans 3", 10.5);
            List<String> names = SheetNames.of(model.sections().stream().map(ReportModel.Section::title).toList());
            for (int k = 0; k < names.size(); k++) {
                XlsxWriter writer = new XlsxWriter(book.newWorksheet(names.get(k)));
                if (k == 0) {
                    writer.title(model);
                }
                writer.section(model.sections().get(k));
            }
            book.finish();
            return Archive.withoutTimes(out.toByteArray());
        } catch (IOException e) {
            throw new UncheckedIOException("writing a workbook", e);
        }
    }

    private void title(ReportModel model) {
        text(row, 0, model.title());
        sheet.style(row++, 0).bold().fontSize(16).set();
        text(row, 0, model.subtitle());
        row += 2;
    }

    private void section(ReportModel.Section section) {
        text(row, 0, section.title());
        sheet.style(row++, 0).bold().fontSize(14).set();
        row++;
        section.blocks().forEach(this::block);
        sheet.width(0, FIRST_WIDTH);
        for (int k = 1; k < columns; k++) {
            sheet.width(k, WIDTH);
        }
        sheet.paperSize(PaperSize.A4_PAPER);
        sheet.pageOrientation("landscape");
        sheet.fitToWidth((short) 1);
        sheet.fitToHeight((short) 999);
    }

    private void block(Block block) {
        if (block instanceof Block.Heading heading) {
            text(row, 0, heading.text());
            sheet.style(row++, 0).bold().fontSize(12).set();
        } else if (block instanceof Block.Paragraph paragraph) {
            line(paragraph.text());
        } else if (block instanceof Block.Note note) {
            line(note.text());
        } else if (block instanceof Block.Points points) {
            points.items().forEach(item -> line("• " + item));
        } else if (block instanceof Picture picture) {
            line(picture.title() + ": " + picture.description() + " (Drawn in the HTML and PDF forms of this document.)");
        } else if (block instanceof Table table) {
            table(table);
        }
        row++;
    }

    private void line(String text) {
        text(row++, 0, text);
    }

    private void table(Table table) {
        if (!table.title().isEmpty()) {
            line(table.title());
        }
        List<Integer> places = new ArrayList<>();
        int next = 0;
        for (int k = 0; k < table.header().size(); k++) {
            places.add(next);
            text(row, next, table.header().get(k));
            sheet.style(row, next).bold().wrapText(true).format(TEXT_FORMAT).horizontalAlignment(table.words(k) ? "left" : "right").set();
            if (table.errors(k)) {
                text(row, next + 1, "± " + table.header().get(k));
                sheet.style(row, next + 1).bold().wrapText(true).format(TEXT_FORMAT).horizontalAlignment("right").set();
            }
            next += table.errors(k) ? 2 : 1;
        }
        columns = Math.max(columns, next);
        row++;
        for (List<Cell> cells : table.rows()) {
            for (int k = 0; k < cells.size(); k++) {
                cell(places.get(k), cells.get(k), table.words(k));
            }
            row++;
        }
    }

    private void cell(int column, Cell cell, boolean words) {
        if (!(cell instanceof Cell.Number number) || !number.figure().defined() || number.figure().infinite()) {
            text(row, column, cell.text());
            sheet.style(row, column).format(TEXT_FORMAT).horizontalAlignment(words ? "left" : "right").set();
            return;
        }
        Figure figure = number.figure();
        String format = format(number);
        number(column, figure.value(), format);
        if (!number.error().isEmpty()) {
            if (Double.isInfinite(figure.error())) {
                text(row, column + 1, number.error());
            } else {
                number(column + 1, figure.error(), format);
            }
        }
    }

    private void number(int column, double value, String format) {
        sheet.value(row, column, value);
        sheet.style(row, column).format(format).set();
    }

    /** Shows the digits that the other forms show. */
    private static String format(Cell.Number number) {
        String shown = number.form() == Cell.Form.ONE_IN ? "" : number.text();
        int point = shown.indexOf('.');
        int places = point < 0 ? 0 : (int) shown.substring(point + 1).chars().takeWhile(Character::isDigit).count();
        return switch (number.form()) {
            case NUMBER, AGREED -> "#,##0" + decimals(places);
            case PERCENT, AGREED_PERCENT -> "0" + decimals(places) + "%";
            case ONE_IN -> "0.0000%";
        };
    }

    private static String decimals(int places) {
        return places == 0 ? "" : "." + "0".repeat(places);
    }

    private void text(int r, int column, String text) {
        sheet.value(r, column, text);
        sheet.style(r, column).format(TEXT_FORMAT).set();
    }

    /** Titles as names of sheets: at most 31 letters, none of {@code []:*?/\}, each once. */
    private static final class SheetNames {
        private static final int LONGEST = 31;

        static List<String> of(List<String> titles) {
            List<String> names = new ArrayList<>();
            for (String title : titles) {
                String plain = title.replaceAll("[\\[\\]:*?/\\\\']", " ").strip();
                String base = plain.isEmpty() ? "Sheet" : plain;
                names.add(IntStream.iterate(1, n -> n + 1).mapToObj(n -> numbered(base, n))
                        .filter(name -> names.stream().noneMatch(name::equalsIgnoreCase)).findFirst().orElseThrow());
            }
            return names;
        }

        private static String numbered(String name, int n) {
            String end = n == 1 ? "" : " " + n;
            int length = Math.min(name.length(), LONGEST - end.length());
            // never half of a letter outside the basic plane
            return name.substring(0, length > 0 && Character.isHighSurrogate(name.charAt(length - 1)) ? length - 1 : length).strip() + end;
        }
    }
}
