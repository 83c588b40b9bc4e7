package layerweft.report;

import java.awt.Font;
import java.awt.FontFormatException;
import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;

/** The letters that documents are set in: Source Sans 3, which travels with the program (SIL Open Font License 1.1). */
enum Typeface {
    REGULAR("SourceSans3_400Regular.ttf"),
    SEMIBOLD("SourceSans3_600SemiBold.ttf");

    private final byte[] bytes;
    private final Font font;

    Typeface(String file) {
        try (InputStream in = Typeface.class.getResourceAsStream("/layerweft/fonts/" + file)) {
            bytes = in.readAllBytes();
            font = Font.createFont(Font.TRUETYPE_FONT, new ByteArrayInputStream(bytes));
        } catch (IOException e) {
            throw new UncheckedIOException("reading the font " + file, e);
        } catch (FontFormatException e) {
            throw new IllegalStateException("the font " + file + " is damaged", e);
        }
    }

    /** The font file. */
    InputStream open() {
        return new ByteArrayInputStream(bytes);
    }

    /** For drawing, at a size in points. */
    Font at(float size) {
        return font.deriveFont(size);
    }

    boolean has(int letter) {
        return font.canDisplay(letter);
    }
}
