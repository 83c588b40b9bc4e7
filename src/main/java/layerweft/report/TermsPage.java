package layerweft.report;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import layerweft.figures.FigureText;
import layerweft.report.ReportModel.Section;

/** A file in full: every field with its value, so that it could be typed in again. */
final class TermsPage {
    private final List<Block> blocks = new ArrayList<>();

    private TermsPage() {}

    static Section of(SourceFile file) {
        TermsPage page = new TermsPage();
        page.blocks.add(new Block.Note("Every field of the file as it was read; what is not there has its default. SHA-256 " + file.sha256()));
        List<List<Cell>> general = new ArrayList<>();
        for (String field : file.tree().fields("")) {
            Object value = file.tree().get(field);
            if (value instanceof List<?> items && items.stream().anyMatch(item -> item instanceof Map)) {
                page.table("In general", general);
                for (int k = 0; k < items.size(); k++) {
                    List<List<Cell>> rows = new ArrayList<>();
                    flatten(rows, "", items.get(k));
                    page.table(field + " " + (k + 1) + (items.get(k) instanceof Map<?, ?> map && map.get("name") != null ? ": " + map.get("name") : ""), rows);
                }
            } else {
                flatten(general, field, value);
            }
        }
        page.table("In general", general);
        return new Section("File " + file.name(), page.blocks);
    }

    /** Takes the rows; nothing where there are none. */
    private void table(String title, List<List<Cell>> rows) {
        if (!rows.isEmpty()) {
            blocks.add(new Table(title, List.of("Field", "value"), rows));
            rows.clear();
        }
    }

    private static void flatten(List<List<Cell>> rows, String path, Object value) {
        if (value instanceof Map<?, ?> map) {
            map.forEach((name, member) -> flatten(rows, path.isEmpty() ? String.valueOf(name) : path + "." + name, member));
        } else if (value instanceof List<?> items && items.stream().anyMatch(item -> item instanceof Map || item instanceof List)) {
            for (int k = 0; k < items.size(); k++) {
                flatten(rows, path + "[" + k + "]", items.get(k));
            }
        } else if (value instanceof List<?> items) {
            rows.add(List.of(Cell.words(path), Cell.words(items.isEmpty() ? "none" : String.join(", ", items.stream().map(TermsPage::plain).toList()))));
        } else if (value instanceof Double number) {
            rows.add(List.of(Cell.words(path), Cell.agreed(number)));
        } else {
            rows.add(List.of(Cell.words(path), Cell.words(plain(value))));
        }
    }

    private static String plain(Object value) {
        return value instanceof Double number ? FigureText.plain(number) : value == null ? "null" : value instanceof Boolean yes ? (yes ? "yes" : "no") : value.toString();
    }
}
