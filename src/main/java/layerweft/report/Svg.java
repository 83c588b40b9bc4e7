package layerweft.report;

import java.awt.Dimension;
import java.io.IOException;
import java.io.StringWriter;
import java.io.UncheckedIOException;
import javax.xml.parsers.DocumentBuilderFactory;
import javax.xml.parsers.ParserConfigurationException;
import org.apache.batik.svggen.SVGGeneratorContext;
import org.apache.batik.svggen.SVGGraphics2D;
import org.apache.batik.svggen.SVGIDGenerator;
import org.w3c.dom.Document;
import org.w3c.dom.Element;
import org.w3c.dom.NodeList;

/** A picture as SVG inside a page: letters as outlines, names of its parts that no other picture of the page has. */
final class Svg {
    private static final String NAMESPACE = "http://www.w3.org/2000/svg";

    private Svg() {}

    /** @param prefix of the names of its parts, different for each picture of a page */
    static String of(Picture picture, String prefix) {
        Document document = document();
        SVGGeneratorContext context = SVGGeneratorContext.createDefault(document);
        context.setComment("");
        context.setIDGenerator(new Names(prefix));
        SVGGraphics2D graphics = new SVGGraphics2D(context, true);
        graphics.setSVGCanvasSize(new Dimension(picture.width(), picture.height()));
        picture.drawing().accept(graphics);
        Element root = graphics.getRoot();
        root.setAttribute("viewBox", "0 0 " + picture.width() + " " + picture.height());
        root.setAttribute("role", "img");
        root.setAttribute("aria-label", picture.title() + ". " + picture.description());
        NodeList definitions = root.getElementsByTagName("defs");
        for (int k = 0; k < definitions.getLength(); k++) {
            ((Element) definitions.item(k)).removeAttribute("id");
        }
        StringWriter out = new StringWriter();
        try {
            graphics.stream(root, out, true, false);
        } catch (IOException e) {
            throw new UncheckedIOException("writing a picture", e);
        }
        String text = out.toString();
        return text.substring(text.indexOf("<svg"));
    }

    private static Document document() {
        try {
            return DocumentBuilderFactory.newInstance().newDocumentBuilder().getDOMImplementation().createDocument(NAMESPACE, "svg", null);
        } catch (ParserConfigurationException e) {
            throw new IllegalStateException("no XML parser", e);
        }
    }

    /** Names counted from 1 within a picture. */
    private static final class Names extends SVGIDGenerator {
        private final String prefix;

        Names(String prefix) {
            this.prefix = prefix;
        }

        @Override
        public String generateID(String kind) {
            return super.generateID(prefix + kind);
        }
    }
}
