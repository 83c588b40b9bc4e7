package layerweft.report;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.ByteArrayInputStream;
import java.nio.charset.StandardCharsets;
import java.util.HashSet;
import java.util.Set;
import javax.xml.parsers.DocumentBuilderFactory;
import org.junit.jupiter.api.Test;
import org.w3c.dom.Document;
import org.w3c.dom.Element;
import org.w3c.dom.NodeList;

class HtmlWriterTest {

    private static Document parsed(byte[] html) throws Exception {
        return DocumentBuilderFactory.newInstance().newDocumentBuilder().parse(new ByteArrayInputStream(html));
    }

    @Test
    void isWellFormedXmlWhateverNamesSay() throws Exception {
        Document document = parsed(HtmlWriter.write(Sample.model()));
        assertEquals("Quote " + Sample.HOSTILE, document.getElementsByTagName("h1").item(0).getTextContent());
        assertEquals(Sample.HOSTILE, document.getElementsByTagName("tbody").item(0).getChildNodes().item(1).getFirstChild().getTextContent());
    }

    @Test
    void hasNoScriptAndAsksForNothingOutside() throws Exception {
        byte[] html = HtmlWriter.write(Sample.model());
        Document document = parsed(html);
        assertEquals(0, document.getElementsByTagName("script").getLength());
        NodeList all = document.getElementsByTagName("*");
        for (int k = 0; k < all.getLength(); k++) {
            Element element = (Element) all.item(k);
            assertFalse(element.hasAttribute("src") || element.hasAttribute("onload"), element::toString);
            assertTrue(!element.hasAttribute("href") || element.getAttribute("href").startsWith("#"), element::toString);
        }
        assertFalse(new String(html, StandardCharsets.UTF_8).contains("url(http"));
    }

    @Test
    void figuresCarryTheirErrors() throws Exception {
        NodeList cells = parsed(HtmlWriter.write(Sample.model())).getElementsByTagName("td");
        assertEquals("14.87 ± 0.03", cells.item(0).getTextContent());
        assertEquals("10.33 % ± 0.02", cells.item(1).getTextContent());
        assertEquals("1 in 83.3", cells.item(2).getTextContent());
        assertEquals("∞", cells.item(3).getTextContent());
        assertEquals("—", cells.item(4).getTextContent());
        assertEquals("12,500.75", cells.item(6).getTextContent());
        assertEquals("−3.250", cells.item(9).getTextContent());
    }

    @Test
    void namesOfPartsAreUniqueOnThePage() throws Exception {
        NodeList all = parsed(HtmlWriter.write(Sample.model())).getElementsByTagName("*");
        Set<String> seen = new HashSet<>();
        for (int k = 0; k < all.getLength(); k++) {
            String id = ((Element) all.item(k)).getAttribute("id");
            assertTrue(id.isEmpty() || seen.add(id), () -> "twice: " + id);
        }
    }

    @Test
    void sameModelGivesTheSameBytes() {
        assertArrayEquals(HtmlWriter.write(Sample.model()), HtmlWriter.write(Sample.model()));
    }
}
