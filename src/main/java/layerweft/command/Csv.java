package layerweft.command;

import de.siegmar.fastcsv.writer.CsvWriter;
import java.io.IOException;
import java.io.StringWriter;
import java.io.UncheckedIOException;
import java.util.ArrayList;
import java.util.List;
import layerweft.figures.Figure;

/** Tables for a spreadsheet, with each figure's error in the column after it. An infinite figure is a word, an undefined one an empty cell. */
final class Csv {
    private final StringWriter text = new StringWriter();
    private final List<String> cells = new ArrayList<>();
    private final CsvWriter writer = CsvWriter.builder().build(text);

    Csv cell(String value) {
        cells.add(value);
        return this;
    }

    Csv cell(double value) {
        return cell(Double.isNaN(value) ? "" : Double.isInfinite(value) ? (value > 0 ? "infinity" : "-infinity") : Double.toString(value));
    }

    /** A figure and its error. */
    Csv pair(Figure figure) {
        return cell(figure.value()).cell(figure.defined() ? figure.error() : Double.NaN);
    }

    /** The headers of a figure and its error. */
    Csv pair(String name) {
        return cell(name).cell(name + " error");
    }

    Csv endOfRow() {
        writer.writeRecord(cells);
        cells.clear();
        return this;
    }

    @Override
    public String toString() {
        try {
            writer.flush();
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
        return text.toString();
    }
}
