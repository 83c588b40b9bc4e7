package layerweft.report.chart;

import java.awt.Graphics2D;
import java.awt.geom.Rectangle2D;

/** A chart that can be drawn at any size, in light and dark, and read as a table. Immutable. */
public interface ChartPicture {

    /** A short name, for files and screen readers. */
    String title();

    /** Draws all of it, its ground included. */
    void draw(Graphics2D g, Rectangle2D area, Palette palette);

    /** What it shows, as numbers. */
    ChartTable table();
}
