package layerweft.report.chart;

import java.util.List;
import java.util.stream.Collectors;

/** What a chart or a table on screen shows, as text: for spreadsheets. */
public record ChartTable(List<String> header, List<List<String>> rows) {

    public ChartTable {
        header = List.copyOf(header);
        rows = rows.stream().map(List::copyOf).toList();
    }

    /** Tab-separated lines, as spreadsheets take them from the clipboard; tabs and line ends inside cells become spaces. */
    public String tabSeparated() {
        StringBuilder text = new StringBuilder(line(header));
        rows.forEach(row -> text.append(line(row)));
        return text.toString();
    }

    private static String line(List<String> cells) {
        return cells.stream().map(cell -> cell.replaceAll("[\\t\\r\\n]+", " ")).collect(Collectors.joining("\t")) + "\n";
    }
}
