package layerweft.report.chart;

import java.awt.BasicStroke;
import java.awt.Color;
import java.awt.Font;
import java.awt.Graphics2D;
import java.awt.RenderingHints;
import java.awt.geom.Ellipse2D;
import java.awt.geom.Line2D;
import java.awt.geom.Rectangle2D;

/** Text, leaders and marks on a plot. */
final class Marks {
    static final double RING = 4.5;

    private Marks() {}

    static void smooth(Graphics2D g) {
        g.setRenderingHint(RenderingHints.KEY_ANTIALIASING, RenderingHints.VALUE_ANTIALIAS_ON);
        g.setRenderingHint(RenderingHints.KEY_TEXT_ANTIALIASING, RenderingHints.VALUE_TEXT_ANTIALIAS_ON);
        g.setRenderingHint(RenderingHints.KEY_STROKE_CONTROL, RenderingHints.VALUE_STROKE_PURE);
        g.setRenderingHint(RenderingHints.KEY_FRACTIONALMETRICS, RenderingHints.VALUE_FRACTIONALMETRICS_ON);
    }

    /** Text with its left end and its middle height at a point. */
    static Rectangle2D left(Graphics2D g, String text, double x, double y, Font font, Color colour) {
        return text(g, text, x, y, font, colour, 0);
    }

    static Rectangle2D centred(Graphics2D g, String text, double x, double y, Font font, Color colour) {
        return text(g, text, x, y, font, colour, 0.5);
    }

    static Rectangle2D right(Graphics2D g, String text, double x, double y, Font font, Color colour) {
        return text(g, text, x, y, font, colour, 1);
    }

    private static Rectangle2D text(Graphics2D g, String text, double x, double y, Font font, Color colour, double part) {
        g.setFont(font);
        g.setColor(colour);
        double width = width(g, text, font);
        double size = font.getSize2D();
        g.drawString(text, (float) (x - part * width), (float) (y + 0.34 * size));
        return new Rectangle2D.Double(x - part * width, y - 0.5 * size, width, size);
    }

    static double width(Graphics2D g, String text, Font font) {
        return font.getStringBounds(text, g.getFontRenderContext()).getWidth();
    }

    /** A text no wider than there is room, ended by … where it has to be. */
    static String fitting(Graphics2D g, String text, Font font, double room) {
        if (width(g, text, font) <= room) {
            return text;
        }
        int end = text.length();
        while (end > 0 && width(g, text.substring(0, end).stripTrailing() + "…", font) > room) {
            end = text.offsetByCodePoints(end, -1);
        }
        return text.substring(0, end).stripTrailing() + "…";
    }

    static void line(Graphics2D g, double x1, double y1, double x2, double y2, Color colour, double width, float... dash) {
        g.setColor(colour);
        g.setStroke(stroke(width, dash));
        g.draw(new Line2D.Double(x1, y1, x2, y2));
    }

    static BasicStroke stroke(double width, float... dash) {
        return dash.length == 0 ? new BasicStroke((float) width, BasicStroke.CAP_ROUND, BasicStroke.JOIN_ROUND)
                : new BasicStroke((float) width, BasicStroke.CAP_BUTT, BasicStroke.JOIN_ROUND, 1, dash, 0);
    }

    /** A disc, or a ring where it is hollow. */
    static void disc(Graphics2D g, double x, double y, double radius, Color fill, Color edge, double width) {
        Ellipse2D shape = new Ellipse2D.Double(x - radius, y - radius, 2 * radius, 2 * radius);
        g.setColor(fill);
        g.fill(shape);
        g.setColor(edge);
        g.setStroke(stroke(width));
        g.draw(shape);
    }
}
