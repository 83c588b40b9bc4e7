package layerweft.report;

import java.awt.Color;
import java.io.IOException;
import java.util.ArrayList;
import java.util.List;
import org.apache.fontbox.ttf.TTFParser;
import org.apache.fontbox.ttf.TrueTypeFont;
import org.apache.pdfbox.io.RandomAccessReadBuffer;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.apache.pdfbox.pdmodel.PDPage;
import org.apache.pdfbox.pdmodel.PDPageContentStream;
import org.apache.pdfbox.pdmodel.PDPageContentStream.AppendMode;
import org.apache.pdfbox.pdmodel.common.PDRectangle;
import org.apache.pdfbox.pdmodel.font.PDType0Font;
import org.apache.pdfbox.pdmodel.graphics.form.PDFormXObject;
import org.apache.pdfbox.util.Matrix;

/** A4 pages that are filled from above; a new one begins where the last is full. Lengths in points, y from the upper edge. */
final class PdfPages {
    static final float LEFT = 48;
    static final float WIDTH = PDRectangle.A4.getWidth() - 2 * LEFT;
    static final float LEADING = 1.32f;
    private static final float TOP = 50;
    private static final float BOTTOM = PDRectangle.A4.getHeight() - 56;
    private static final float FOOT = PDRectangle.A4.getHeight() - 32;
    private static final float FOOT_SIZE = 8;
    private static final float INDENT = 10;
    private static final Color INK = new Color(0x16232A);
    private static final Color INK_2 = new Color(0x51626B);
    private static final Color LINE = new Color(0xD5DDDE);

    private final PDDocument document;
    private final PDType0Font regular;
    private final PDType0Font semibold;
    private PDPageContentStream stream;
    private float y;

    PdfPages(PDDocument document) throws IOException {
        this.document = document;
        this.regular = load(document, Typeface.REGULAR);
        this.semibold = load(document, Typeface.SEMIBOLD);
    }

    /** Without ligatures, which could be neither searched nor copied. The font is read while the document is saved, so it is left open: it is in memory. */
    private static PDType0Font load(PDDocument document, Typeface face) throws IOException {
        TrueTypeFont font = new TTFParser().parse(new RandomAccessReadBuffer(face.open()));
        font.setEnableGsub(false);
        return PDType0Font.load(document, font, true);
    }

    void startPage() throws IOException {
        if (stream != null) {
            stream.close();
        }
        PDPage page = new PDPage(PDRectangle.A4);
        document.addPage(page);
        stream = new PDPageContentStream(document, page, AppendMode.APPEND, true);
        y = TOP;
    }

    /** The page that is being filled. */
    PDPage page() {
        return document.getPage(document.getNumberOfPages() - 1);
    }

    /** Points left on the page. */
    float left() {
        return BOTTOM - y;
    }

    /** Points of an empty page. */
    static float whole() {
        return BOTTOM - TOP;
    }

    /** A new page where so much does not fit on this one. */
    void need(float height) throws IOException {
        if (height > left() && y > TOP) {
            startPage();
        }
    }

    void space(float height) {
        y += height;
    }

    /** Running text over the whole width. */
    void text(String text, Typeface face, float size, boolean dark) throws IOException {
        lines(wrap(text, face, size, WIDTH), 0, face, size, dark);
    }

    /** An item of a list. */
    void point(String text, float size) throws IOException {
        need(size * LEADING);
        put("•", LEFT, y + size, Typeface.REGULAR, size, true);
        lines(wrap(text, Typeface.REGULAR, size, WIDTH - INDENT), INDENT, Typeface.REGULAR, size, true);
        space(2);
    }

    private void lines(List<String> lines, float indent, Typeface face, float size, boolean dark) throws IOException {
        for (String line : lines) {
            need(size * LEADING);
            put(line, LEFT + indent, y + size, face, size, dark);
            y += size * LEADING;
        }
    }

    /** One line at x, its base line so far below the present height. */
    void putBelow(String text, float x, float below, Typeface face, float size, boolean dark) throws IOException {
        put(text, x, y + below, face, size, dark);
    }

    private void put(String text, float x, float base, Typeface face, float size, boolean dark) throws IOException {
        put(stream, text, x, base, face, size, dark);
    }

    private void put(PDPageContentStream to, String text, float x, float base, Typeface face, float size, boolean dark) throws IOException {
        to.beginText();
        to.setFont(font(face), size);
        to.setNonStrokingColor(dark ? INK : INK_2);
        to.newLineAtOffset(x, PDRectangle.A4.getHeight() - base);
        to.showText(known(text, face));
        to.endText();
    }

    /** A hairline over the whole width at the present height. */
    void rule(boolean dark) throws IOException {
        stream.setStrokingColor(dark ? INK_2 : LINE);
        stream.setLineWidth(0.5f);
        stream.moveTo(LEFT, PDRectangle.A4.getHeight() - y);
        stream.lineTo(LEFT + WIDTH, PDRectangle.A4.getHeight() - y);
        stream.stroke();
    }

    void form(PDFormXObject form, float height, float scale) throws IOException {
        stream.saveGraphicsState();
        stream.transform(new Matrix(scale, 0, 0, scale, LEFT, PDRectangle.A4.getHeight() - y - height));
        stream.drawForm(form);
        stream.restoreGraphicsState();
        y += height;
    }

    float width(String text, Typeface face, float size) throws IOException {
        return font(face).getStringWidth(known(text, face)) / 1000 * size;
    }

    private PDType0Font font(Typeface face) {
        return face == Typeface.REGULAR ? regular : semibold;
    }

    /** What the font does not have is shown as a question mark: a document with a letter less is better than none. */
    private static String known(String text, Typeface face) {
        StringBuilder out = new StringBuilder(text.length());
        text.codePoints().forEach(c -> out.appendCodePoint(face.has(c) ? c : '?'));
        return out.toString();
    }

    /** Lines no wider than the width; words that are wider are broken. */
    List<String> wrap(String text, Typeface face, float size, float width) throws IOException {
        List<String> lines = new ArrayList<>();
        String line = "";
        for (String word : text.split(" ")) {
            String longer = line.isEmpty() ? word : line + " " + word;
            if (width(longer, face, size) <= width) {
                line = longer;
                continue;
            }
            if (!line.isEmpty()) {
                lines.add(line);
            }
            line = word;
            while (width(line, face, size) > width && line.codePointCount(0, line.length()) > 1) {
                int end = fitting(line, face, size, width);
                lines.add(line.substring(0, end));
                line = line.substring(end);
            }
        }
        lines.add(line);
        return lines;
    }

    private int fitting(String word, Typeface face, float size, float width) throws IOException {
        int end = word.offsetByCodePoints(0, 1);
        while (end < word.length() && width(word.substring(0, word.offsetByCodePoints(end, 1)), face, size) <= width) {
            end = word.offsetByCodePoints(end, 1);
        }
        return end;
    }

    /** Ends the last page and numbers all. */
    void finish(String title) throws IOException {
        stream.close();
        int pages = document.getNumberOfPages();
        for (int k = 0; k < pages; k++) {
            try (PDPageContentStream foot = new PDPageContentStream(document, document.getPage(k), AppendMode.APPEND, true)) {
                String number = (k + 1) + " of " + pages;
                float wide = width(number, Typeface.REGULAR, FOOT_SIZE);
                put(foot, wrap(title, Typeface.REGULAR, FOOT_SIZE, WIDTH - wide - 20).get(0), LEFT, FOOT, Typeface.REGULAR, FOOT_SIZE, false);
                put(foot, number, LEFT + WIDTH - wide, FOOT, Typeface.REGULAR, FOOT_SIZE, false);
            }
        }
    }
}
