package layerweft.report;

import java.awt.Graphics2D;
import java.util.function.Consumer;

/**
 * A picture, drawn into each form by the same strokes.
 *
 * @param title what it shows
 * @param description what is to be seen on it, for those who cannot see it; also its caption
 * @param width of the drawing in points, of which a page is {@value #PAGE_WIDTH} wide
 * @param height in points
 * @param drawing draws on an empty ground from (0, 0) to (width, height)
 */
public record Picture(String title, String description, int width, int height, Consumer<Graphics2D> drawing) implements Block {
    /** Points of an A4 page between its margins. */
    public static final int PAGE_WIDTH = 499;

    public Picture {
        title = Letters.admissible(title);
        description = Letters.admissible(description);
    }
}
