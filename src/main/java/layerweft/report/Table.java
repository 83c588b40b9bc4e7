package layerweft.report;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.IntStream;

/**
 * A table.
 *
 * @param title what it shows, with the unit of its amounts; may be empty
 * @param header a title for each column; the first column names the rows
 * @param rows each as long as the header
 */
public record Table(String title, List<String> header, List<List<Cell>> rows) implements Block {

    public Table {
        title = Letters.admissible(title);
        header = header.stream().map(Letters::admissible).toList();
        rows = rows.stream().map(List::copyOf).toList();
        for (List<Cell> row : rows) {
            if (row.size() != header.size()) {
                throw new IllegalArgumentException("a row of " + row.size() + " cells in a table of " + header.size() + " columns: " + title);
            }
        }
    }

    /** Whether column k holds words, which are set from the left. */
    public boolean words(int k) {
        return rows.stream().allMatch(row -> row.get(k) instanceof Cell.Words);
    }

    /** Whether any figure of column k has an error. */
    public boolean errors(int k) {
        return rows.stream().anyMatch(row -> !row.get(k).error().isEmpty());
    }

    /** The same as tables of at most so many columns beside the first, which each of them repeats, so that all fit on a page. */
    public List<Table> narrow(int most) {
        int others = header.size() - 1;
        if (others <= most) {
            return List.of(this);
        }
        List<Table> parts = new ArrayList<>();
        int pieces = (others + most - 1) / most;
        for (int p = 0; p < pieces; p++) {
            int from = 1 + others * p / pieces;
            int to = 1 + others * (p + 1) / pieces;
            parts.add(new Table(p == 0 || title.isEmpty() ? title : title + " (continued)", columns(header, from, to),
                    rows.stream().map(row -> columns(row, from, to)).toList()));
        }
        return parts;
    }

    private static <T> List<T> columns(List<T> row, int from, int to) {
        return IntStream.concat(IntStream.of(0), IntStream.range(from, to)).mapToObj(row::get).toList();
    }
}
