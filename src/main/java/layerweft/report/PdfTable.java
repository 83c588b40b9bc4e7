package layerweft.report;

import java.io.IOException;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

/** A table set on pages: numbers never break, words do; where all is too wide the letters become smaller. */
final class PdfTable {
    private static final float SIZE = 8;
    private static final float LEAST_SIZE = 5.5f;
    private static final float PAD = 4;
    /** The widest that a column of words asks for before others are narrowed for it. */
    private static final float WORDS = 170;

    private final Table table;
    private final PdfPages pages;
    private final float size;
    private final float[] widths;

    private PdfTable(Table table, PdfPages pages) throws IOException {
        this.table = table;
        this.pages = pages;
        float tried = SIZE;
        float[] found = widths(tried);
        while (found == null && tried > LEAST_SIZE) {
            tried -= 0.5f;
            found = widths(tried);
        }
        this.size = tried;
        this.widths = found == null ? equal() : found;
    }

    static void draw(Table table, PdfPages pages) throws IOException {
        new PdfTable(table, pages).draw();
    }

    private float[] equal() {
        float[] equal = new float[table.header().size()];
        Arrays.fill(equal, PdfPages.WIDTH / equal.length);
        return equal;
    }

    /** Widths that fill the page; null where numbers and whole words do not fit at this size. */
    private float[] widths(float tried) throws IOException {
        int n = table.header().size();
        float[] least = new float[n];
        float[] wanted = new float[n];
        for (int k = 0; k < n; k++) {
            for (String word : table.header().get(k).split(" ")) {
                least[k] = Math.max(least[k], pages.width(word, Typeface.SEMIBOLD, tried) + 2 * PAD);
            }
            for (List<Cell> row : table.rows()) {
                String shown = shown(row.get(k));
                if (row.get(k) instanceof Cell.Words) {
                    wanted[k] = Math.max(wanted[k], Math.min(pages.width(shown, Typeface.REGULAR, tried) + 2 * PAD, k == n - 1 ? PdfPages.WIDTH : WORDS));
                    for (String word : shown.split(" ")) {
                        least[k] = Math.max(least[k], Math.min(pages.width(word, Typeface.REGULAR, tried) + 2 * PAD, WORDS / 2));
                    }
                } else {
                    least[k] = Math.max(least[k], pages.width(shown, Typeface.REGULAR, tried) + 2 * PAD);
                }
            }
            wanted[k] = Math.max(wanted[k], least[k]);
        }
        float sum = sum(least);
        if (sum > PdfPages.WIDTH) {
            return null;
        }
        float more = sum(wanted) - sum;
        float part = more > 0 ? Math.min(1, (PdfPages.WIDTH - sum) / more) : 0;
        float[] found = new float[n];
        for (int k = 0; k < n; k++) {
            found[k] = least[k] + part * (wanted[k] - least[k]);
        }
        float spare = PdfPages.WIDTH - sum(found);
        for (int k = 0; k < n; k++) {
            found[k] += spare / n;
        }
        return found;
    }

    private static float sum(float[] values) {
        float sum = 0;
        for (float value : values) {
            sum += value;
        }
        return sum;
    }

    private static String shown(Cell cell) {
        return cell.error().isEmpty() ? cell.text() : cell.text() + " " + cell.error();
    }

    private void draw() throws IOException {
        // never a header without a row below it
        pages.need((most(titles()) + (table.rows().isEmpty() ? 0 : most(cells(table.rows().get(0))))) * line() + 30);
        if (!table.title().isEmpty()) {
            pages.text(table.title(), Typeface.REGULAR, SIZE + 0.5f, false);
            pages.space(3);
        }
        header();
        for (List<Cell> row : table.rows()) {
            row(cells(row));
        }
    }

    private List<List<String>> cells(List<Cell> row) throws IOException {
        List<List<String>> cells = new ArrayList<>();
        for (int k = 0; k < row.size(); k++) {
            cells.add(row.get(k) instanceof Cell.Words ? pages.wrap(row.get(k).text(), Typeface.REGULAR, size, widths[k] - 2 * PAD) : List.of(shown(row.get(k))));
        }
        return cells;
    }

    private List<List<String>> titles() throws IOException {
        List<List<String>> cells = new ArrayList<>();
        for (int k = 0; k < widths.length; k++) {
            cells.add(pages.wrap(table.header().get(k), Typeface.SEMIBOLD, size, widths[k] - 2 * PAD));
        }
        return cells;
    }

    private void header() throws IOException {
        List<List<String>> cells = titles();
        lines(cells, 0, most(cells), Typeface.SEMIBOLD);
        pages.rule(true);
    }

    /** A row stays whole where a page can hold it. */
    private void row(List<List<String>> cells) throws IOException {
        int all = most(cells);
        int from = 0;
        while (from < all) {
            float height = (all - from) * line() + PAD;
            if (height > pages.left() && (height <= PdfPages.whole() / 2 || pages.left() < 4 * line())) {
                pages.startPage();
                header();
            }
            int to = Math.min(all, from + Math.max(1, (int) ((pages.left() - PAD) / line())));
            lines(cells, from, to, Typeface.REGULAR);
            pages.rule(false);
            from = to;
        }
    }

    private void lines(List<List<String>> cells, int from, int to, Typeface face) throws IOException {
        pages.space(PAD / 2);
        for (int l = from; l < to; l++) {
            float x = PdfPages.LEFT;
            for (int k = 0; k < cells.size(); k++) {
                if (l < cells.get(k).size()) {
                    String text = cells.get(k).get(l);
                    float at = table.words(k) ? x + PAD : x + widths[k] - PAD - pages.width(text, face, size);
                    pages.putBelow(text, k == 0 ? x : at, size, face, size, true);
                }
                x += widths[k];
            }
            pages.space(line());
        }
        pages.space(PAD / 2);
    }

    private static int most(List<List<String>> cells) {
        return cells.stream().mapToInt(List::size).max().orElse(0);
    }

    private float line() {
        return size * 1.25f;
    }
}
