package layerweft.report.chart;

import java.awt.Font;
import java.awt.FontFormatException;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;

/** The type of all charts, which comes with the program: Source Sans 3, figures of equal width. */
public final class ChartFonts {
    private static final Font REGULAR = load("SourceSans3_400Regular");
    private static final Font SEMIBOLD = load("SourceSans3_600SemiBold");

    private ChartFonts() {}

    public static Font regular(double size) {
        return REGULAR.deriveFont((float) size);
    }

    public static Font semibold(double size) {
        return SEMIBOLD.deriveFont((float) size);
    }

    private static Font load(String face) {
        try (InputStream in = ChartFonts.class.getResourceAsStream("/layerweft/fonts/" + face + ".ttf")) {
            return Font.createFont(Font.TRUETYPE_FONT, in);
        } catch (IOException e) {
            throw new UncheckedIOException("reading the font " + face, e);
        } catch (FontFormatException e) {
            throw new IllegalStateException("the font " + face + " that comes with the program is broken", e);
        }
    }
}
