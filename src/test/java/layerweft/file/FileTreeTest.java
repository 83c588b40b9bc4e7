package layerweft.file;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertNull;
import static org.junit.jupiter.api.Assertions.assertSame;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Map;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;

class FileTreeTest {
    private static final FileTree COAST = Examples.demo(DemoFiles.PORTFOLIO);

    private static String text(String name) {
        return new String(DemoFiles.bytes(name), StandardCharsets.UTF_8);
    }

    private static FileTree parse(String text) {
        return FileTree.parse("test.json", text);
    }

    static List<String> demoFiles() {
        return Examples.demoFiles();
    }

    @ParameterizedTest
    @MethodSource("demoFiles")
    void everyDemoFileReadsBackTheSameFromItsText(String name) {
        FileTree tree = Examples.demo(name);
        FileTree again = parse(tree.text());
        assertEquals(tree, again);
        assertEquals(tree.text(), again.text());
        assertEquals(text(name).replaceAll("\\s", ""), tree.text().replaceAll("\\s", ""), "characters other than white space");
    }

    @ParameterizedTest
    @ValueSource(strings = {"demo-portfolios/harrow-coast.json", "demo-portfolios/brindle-vale.json", "demo-portfolios/eastmere-group.json",
        "treaties/harrow-coast-two-layers.json", "treaties/tolvane-ridge-tower.json", "treaties/brindle-vale-stop-loss.json"})
    void demoFilesKeepTheirLayout(String name) {
        assertEquals(text(name), Examples.demo(name).text());
    }

    @Test
    void valuesAreFoundByTheirPaths() {
        assertEquals(1.6, COAST.get("perils[1].severity.alpha"));
        assertEquals("windstorm", COAST.get("perils[0].name"));
        assertEquals(List.of(1.0, 1.0), Examples.demo(DemoFiles.PROGRAMME).get("layers[0].reinstatements"));
        assertEquals(Map.of("family", "gumbel", "kendallTau", 0.3), COAST.get("dependence.copula"));
        assertEquals(true, parse("{\"a\": [[1, true]]}").get("a[0][1]"));
        assertNull(COAST.get("perils[9].name"));
        assertFalse(COAST.has("perils[1].severity.beta"));
        assertTrue(parse("{\"a\": null}").has("a"));
        assertNull(parse("{\"a\": null}").get("a"));
        assertEquals(3, COAST.size("perils"));
        assertEquals(0, COAST.size("layers"));
    }

    @ParameterizedTest
    @ValueSource(strings = {".", "a.", "a..b", "[0", "a[0]b", "a[x]", "a.[0]", "]", "a[-1]"})
    void whatIsNoPathIsRefused(String path) {
        assertThrows(IllegalArgumentException.class, () -> COAST.get(path));
    }

    @Test
    void editsLeaveTheOldTreeAndShareTheRest() {
        String before = COAST.text();
        FileTree edited = COAST.set("perils[1].severity.alpha", 1.8);
        assertEquals(1.8, edited.get("perils[1].severity.alpha"));
        assertEquals(before, COAST.text());
        assertSame(TreePath.next(COAST.root().get("perils"), 0), TreePath.next(edited.root().get("perils"), 0));
        assertNotEquals(COAST, edited);
        assertEquals(COAST, edited.set("perils[1].severity.alpha", 1.6));
    }

    @Test
    void numbersStayAsTheyWereWritten() {
        FileTree tree = parse("{\"a\": 1.0, \"b\": [14, 1e3, 0.10], \"c\": 1e999}");
        assertEquals("{\n  \"a\": 1.0,\n  \"b\": [14, 1e3, 0.10],\n  \"c\": 1e999\n}\n", tree.text());
        assertSame(tree, tree.set("b[1]", 1000));
        assertSame(tree, tree.set("b", List.of(14.0, 1000.0, 0.1)));
        assertEquals("[14, 1e3, 0.10]", tree.set("a", 2).text().lines().filter(l -> l.contains("b")).findAny().orElseThrow()
                .replaceAll(".*: |,$", ""));
    }

    @Test
    void newNumbersAreWrittenAsShortAsTheyReadBack() {
        assertEquals("14", TreeValues.shortest(14.0));
        assertEquals("0.05", TreeValues.shortest(0.05));
        assertEquals("2e-9", TreeValues.shortest(2e-9));
        assertEquals("-1.25e300", TreeValues.shortest(-1.25e300));
        assertEquals("2e23", TreeValues.shortest(2e23));
        assertEquals("12500000", TreeValues.shortest(1.25e7));
        assertEquals("5e-324", TreeValues.shortest(Double.MIN_VALUE));
        assertEquals("-0.0", TreeValues.shortest(-0.0));
    }

    @Test
    void newFieldsGoWhereTheFormatHasThem() {
        assertEquals("[name, perils, occurrence, reinstatements, share, premium]", fields(Examples.demo(DemoFiles.PROGRAMME).set("layers[0].share", 0.9)
                .set("layers[0].perils", List.of("hail")), "layers[0]"));
        assertEquals("[name, chance, severity]", fields(COAST.set("perils[0].subPerils[0].chance", 0.5), "perils[0].subPerils[0]"));
        assertEquals("[model, threshold, alpha, cap]",
                fields(parse("{\"severity\": {\"model\": \"pareto\", \"alpha\": 2, \"cap\": 5}}").set("severity.threshold", 1), "severity"));
        assertEquals("[a, z]", fields(parse("{\"a\": 1}").set("z", 1), ""));
    }

    private static String fields(FileTree tree, String path) {
        return tree.at(path).root().fields().keySet().toString();
    }

    @Test
    void missingParentsAreMade() {
        FileTree programme = Examples.demo(DemoFiles.PROGRAMME).remove("buyer").set("buyer.tailLevel", 0.995);
        assertEquals(Map.of("tailLevel", 0.995), programme.get("buyer"));
        assertEquals(List.of(0.5), programme.set("layers[2].reinstatements[0]", 0.5).get("layers[2].reinstatements"));
        assertThrows(IllegalArgumentException.class, () -> programme.set("layers[2].reinstatements[1]", 0.5));
        assertThrows(IllegalArgumentException.class, () -> programme.set("layers[2].name.first", "x"));
        assertThrows(IllegalArgumentException.class, () -> programme.set("name[0]", "x"));
    }

    @Test
    void fieldsAndItemsAreRemoved() {
        assertFalse(COAST.remove("dependence").has("dependence"));
        assertEquals("hail", COAST.remove("perils[1]").get("perils[1].name"));
        assertSame(COAST, COAST.remove("perils[7].name"));
        assertThrows(IllegalArgumentException.class, () -> COAST.remove(""));
    }

    @Test
    void itemsAreInsertedAndMoved() {
        FileTree tree = parse("{\"a\": [1, 2.0, 3]}");
        assertEquals(List.of(1.0, 9.0, 2.0, 3.0), tree.insert("a", 1, 9).get("a"));
        assertEquals(List.of(1.0, 2.0, 3.0, 9.0), tree.insert("a", 3, 9).get("a"));
        assertEquals(List.of("x"), tree.insert("b.c", 0, "x").get("b.c"));
        assertEquals("{\n  \"a\": [2.0, 3, 1]\n}\n", tree.move("a", 0, 2).text());
        assertEquals("{\n  \"a\": [3, 1, 2.0]\n}\n", tree.move("a", 2, 0).text());
        assertThrows(IllegalArgumentException.class, () -> tree.insert("a", 4, 9));
        assertThrows(IllegalArgumentException.class, () -> tree.move("a", 3, 0));
        assertThrows(IllegalArgumentException.class, () -> tree.move("b", 0, 0));
    }

    @Test
    void aPartMovesToAnotherPlaceWithItsNumbersAsWritten() {
        FileTree programme = Examples.demo(DemoFiles.PROGRAMME);
        FileTree doubled = programme.insert("layers", 1, programme.at("layers[0]").set("name", "Copy"));
        assertEquals("[1.0, 1.0]", doubled.text().lines().filter(l -> l.contains("reinstatements")).toList().get(1).replaceAll(".*: |,$", ""));
        assertThrows(IllegalArgumentException.class, () -> programme.at("layers"));
    }

    @Test
    void whatAFileCannotHoldIsRefused() {
        for (Object value : new Object[] {null, Double.NaN, Double.POSITIVE_INFINITY, 'c', new Object()}) {
            assertThrows(IllegalArgumentException.class, () -> COAST.set("name", value));
        }
        assertThrows(IllegalArgumentException.class, () -> COAST.set("", "x"));
    }

    @Test
    void neitherOrderNorNotationNorNameMakesTreesDiffer() {
        FileTree one = parse("{\"a\": 1, \"b\": \"x\"}");
        FileTree other = FileTree.of("other.json", Map.of("b", "x", "a", 1.0));
        assertEquals(one, other);
        assertEquals(one.hashCode(), other.hashCode());
        assertNotEquals(one, one.set("b", "y"));
    }

    @Test
    void textIsEscapedSoThatItReadsBack() {
        String odd = "quote \" slash \\ line \n tab \t bell \u0007 é 世 \ud83c\udf0a lone \ud83c end";
        FileTree tree = FileTree.of("test.json", Map.of("name", odd));
        byte[] bytes = tree.text().getBytes(StandardCharsets.UTF_8);
        assertEquals(odd, parse(new String(bytes, StandardCharsets.UTF_8)).get("name"));
    }

    @Test
    void longListsFillTheirLines() {
        List<Double> losses = IntStream.range(0, 200).mapToObj(k -> k / 8.0).toList();
        FileTree tree = FileTree.of("test.json", Map.of("a", Map.of("losses", losses)));
        List<String> lines = tree.text().lines().toList();
        assertTrue(lines.stream().allMatch(line -> line.length() <= 121), tree.text());
        assertTrue(lines.size() < 25, tree.text());
        assertEquals(tree, parse(tree.text()));
    }

    @Test
    void syntaxFaultsAreThrownAndFaultsOfTheFormatAreNot() {
        assertEquals(2, assertThrows(FaultyFileException.class, () -> parse("{\"a\": 1,\n \"b\" 2}")).faults().get(0).line());
        assertThrows(FaultyFileException.class, () -> parse("{\"a\": 1, \"a\": 2}"));
        assertThrows(FaultyFileException.class, () -> parse("[1]"));
        assertEquals(-3.0, parse("{\"format\": \"?\", \"share\": -3}").get("share"));
    }
}
