package layerweft.report.chart;

import java.awt.Dimension;
import java.awt.Graphics2D;
import java.awt.geom.Rectangle2D;
import java.awt.image.BufferedImage;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.StringWriter;
import java.io.UncheckedIOException;
import java.util.List;
import javax.imageio.ImageIO;
import javax.xml.parsers.DocumentBuilderFactory;
import javax.xml.parsers.ParserConfigurationException;
import org.apache.batik.svggen.SVGGeneratorContext;
import org.apache.batik.svggen.SVGGraphics2D;
import org.apache.batik.svggen.SVGGraphics2DIOException;
import org.w3c.dom.Document;

/** Charts as files: always in light, with their title, the reading and what it takes to make them again; text as outlines. */
public final class ChartExport {
    private static final double MARGIN = 16;
    private static final double HEAD = 46;
    private static final double FOOT = 22;

    private ChartExport() {}

    /**
     * What stands around a picture.
     *
     * @param title above it
     * @param reading a sentence below the title; empty for none
     * @param source below the picture: file, seed, engine
     */
    public record Caption(String title, String reading, List<String> source) {
        public Caption {
            source = List.copyOf(source);
        }
    }

    /** @param scale pixels for each unit of length */
    public static byte[] png(ChartPicture picture, Caption caption, double width, double height, double scale) {
        BufferedImage image = new BufferedImage((int) Math.round(width * scale), (int) Math.round(height * scale), BufferedImage.TYPE_INT_RGB);
        Graphics2D g = image.createGraphics();
        g.scale(scale, scale);
        draw(g, picture, caption, width, height);
        g.dispose();
        try {
            ByteArrayOutputStream bytes = new ByteArrayOutputStream();
            ImageIO.write(image, "png", bytes);
            return bytes.toByteArray();
        } catch (IOException e) {
            throw new UncheckedIOException("writing to memory", e);
        }
    }

    public static String svg(ChartPicture picture, Caption caption, double width, double height) {
        Document document = document();
        SVGGeneratorContext context = SVGGeneratorContext.createDefault(document);
        context.setComment(null);
        SVGGraphics2D g = new SVGGraphics2D(context, true);
        g.setSVGCanvasSize(new Dimension((int) Math.round(width), (int) Math.round(height)));
        draw(g, picture, caption, width, height);
        try {
            StringWriter text = new StringWriter();
            g.stream(text, true);
            return text.toString();
        } catch (SVGGraphics2DIOException e) {
            throw new UncheckedIOException("writing to memory", new IOException(e));
        }
    }

    private static Document document() {
        try {
            return DocumentBuilderFactory.newInstance().newDocumentBuilder().getDOMImplementation().createDocument("http://www.w3.org/2000/svg", "svg", null);
        } catch (ParserConfigurationException e) {
            throw new IllegalStateException("the platform's own XML cannot be missing", e);
        }
    }

    private static void draw(Graphics2D g, ChartPicture picture, Caption caption, double width, double height) {
        Palette palette = Palette.LIGHT;
        Marks.smooth(g);
        g.setColor(palette.surface());
        g.fill(new Rectangle2D.Double(0, 0, width, height));
        double room = width - 2 * MARGIN;
        Marks.left(g, Marks.fitting(g, caption.title, ChartFonts.semibold(16), room), MARGIN, MARGIN + 6, ChartFonts.semibold(16), palette.ink());
        Marks.left(g, Marks.fitting(g, caption.reading, ChartFonts.regular(13), room), MARGIN, MARGIN + 27, ChartFonts.regular(13), palette.ink2());
        String source = String.join(" · ", caption.source);
        Marks.left(g, Marks.fitting(g, source, ChartFonts.regular(11), room), MARGIN, height - MARGIN + 2, ChartFonts.regular(11), palette.ink2());
        picture.draw(g, new Rectangle2D.Double(MARGIN, MARGIN + HEAD, room, height - 2 * MARGIN - HEAD - FOOT), palette);
    }
}
