package layerweft.command;

import java.util.ArrayList;
import java.util.List;

/**
 * Aligned columns for a terminal or a mail in a fixed font: the first to the left, the others to the right. A column with an empty header
 * holds the errors of the column before it and stands close to it, to the left.
 */
final class TextTable {
    private static final String GAP = "  ";
    private final List<String[]> rows = new ArrayList<>();
    private final int columns;

    TextTable(String... header) {
        columns = header.length;
        rows.add(header);
    }

    /** A row of as many cells as the header. */
    TextTable row(String... cells) {
        if (cells.length != columns) {
            throw new IllegalArgumentException(cells.length + " cells in a table of " + columns + " columns");
        }
        rows.add(cells);
        return this;
    }

    @Override
    public String toString() {
        int[] width = new int[columns];
        for (String[] row : rows) {
            for (int c = 0; c < columns; c++) {
                width[c] = Math.max(width[c], length(row[c]));
            }
        }
        StringBuilder text = new StringBuilder();
        for (String[] row : rows) {
            StringBuilder line = new StringBuilder();
            for (int c = 0; c < columns; c++) {
                if (width[c] == 0) {
                    continue;
                }
                String padding = " ".repeat(width[c] - length(row[c]));
                boolean error = rows.get(0)[c].isEmpty();
                line.append(c == 0 ? "" : error ? " " : GAP).append(c == 0 || error ? row[c] + padding : padding + row[c]);
            }
            text.append(line.toString().stripTrailing()).append('\n');
            if (row == rows.get(0)) {
                text.append("─".repeat(lineWidth(width))).append('\n');
            }
        }
        return text.toString();
    }

    private int lineWidth(int[] width) {
        int sum = 0;
        for (int c = 0; c < columns; c++) {
            sum += width[c] == 0 ? 0 : width[c] + (c == 0 ? 0 : rows.get(0)[c].isEmpty() ? 1 : GAP.length());
        }
        return sum;
    }

    private static int length(String cell) {
        return cell.codePointCount(0, cell.length());
    }
}
