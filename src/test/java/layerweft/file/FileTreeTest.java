package layerweft.file;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertNull;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.Random;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;

class FileTreeTest {
    private static final FileTree TREE = FileTree.parse("tree.json", """
            {"format": "layerweft/programme/1", "name": "Two", "layers": [
              {"name": "First", "occurrence": {"retention": 1.50, "limit": 2e1}, "premium": 3},
              {"name": "Second", "reinstatements": [1.0, 0.5]}]}""");

    static List<Path> files() throws IOException {
        try (Stream<Path> demos = Stream.concat(Files.list(Path.of("demo-portfolios")), Files.list(Path.of("treaties")));
                Stream<Path> cases = Files.walk(Path.of("src/test/resources/reference/cases"))) {
            return Stream.concat(demos, cases.filter(p -> p.endsWith("portfolio.json") || p.endsWith("programme.json")))
                    .filter(p -> p.toString().endsWith(".json")).sorted().toList();
        }
    }

    /** Opened and saved, a file says the same; those that are not JSON objects or hold a field twice are refused. */
    @ParameterizedTest
    @MethodSource("files")
    void everyFileIsWrittenWithoutLoss(Path file) {
        FileTree tree;
        try {
            tree = FileTree.read(file);
        } catch (FaultyFileException e) {
            assertTrue(file.toString().contains("/k"), e.getMessage());
            return;
        }
        FileTree again = FileTree.parse("again", tree.text());
        assertEquals(tree, again);
        assertEquals(tree.get(""), again.get(""));
        assertTrue(tree.text().lines().allMatch(line -> line.length() <= 120), "long line in " + file);
    }

    @Test
    void numbersKeepTheirDigits() {
        assertTrue(TREE.text().contains("\"retention\": 1.50"), TREE.text());
        assertTrue(TREE.text().contains("\"limit\": 2e1"), TREE.text());
        assertEquals(20, TREE.number("layers[0].occurrence.limit"));
    }

    @Test
    void anEditTouchesItsPlaceOnlyAndLeavesTheOldTree() {
        FileTree edited = TREE.set("layers[0].occurrence.limit", 30);
        assertEquals(TREE.text().replace("2e1", "30"), edited.text());
        assertEquals(20, TREE.number("layers[0].occurrence.limit"));
    }

    @Test
    void aNewFieldStandsWhereTheFormatHasIt() {
        assertEquals(List.of("name", "perils", "occurrence", "premium"), TREE.set("layers[0].perils", List.of("wind")).fields("layers[0]"));
        assertEquals(List.of("name", "occurrence", "share", "premium"), TREE.set("layers[0].share", 0.5).fields("layers[0]"));
        assertEquals(List.of("format", "name", "layers", "pricing"), TREE.set("pricing.loading", Map.of("principle", "none")).fields(""));
        assertEquals("none", TREE.set("pricing.loading", Map.of("principle", "none")).get("pricing.loading.principle"));
    }

    @Test
    void itemsAreInsertedMovedCopiedAndRemoved() {
        FileTree three = TREE.insert("layers", 1, Map.of("name", "Between"));
        assertEquals("Between", three.text("layers[1].name"));
        assertEquals("Second", three.text("layers[2].name"));
        assertEquals("Second", three.move("layers", 2, 0).text("layers[0].name"));
        assertEquals(TREE, three.remove("layers[1]"));
        assertEquals(3, TREE.copy("layers[0]", "layers[1].annual").number("layers[1].annual.premium"));
        assertEquals(2, TREE.insert("layers[0].reinstatements", 0, 1.0).insert("layers[0].reinstatements", 1, 0.0).size("layers[0].reinstatements"));
    }

    @Test
    void whatIsNotThereIsNotThere() {
        assertNull(TREE.get("layers[2].name"));
        assertFalse(TREE.has("buyer"));
        assertTrue(Double.isNaN(TREE.number("layers[0].name")));
        assertEquals(TREE, TREE.remove("buyer.tailLevel"));
        assertThrows(IllegalArgumentException.class, () -> TREE.set("layers[5].name", "Sixth"));
        assertThrows(IllegalArgumentException.class, () -> TREE.set("name.first", "a"));
        assertThrows(IllegalArgumentException.class, () -> TREE.set("name", Double.NaN));
    }

    /** After any edits the text reads back as the same tree. */
    @ParameterizedTest
    @ValueSource(ints = {1, 2, 3, 4, 5})
    void anyEditsCanBeWrittenAndReadAgain(int seed) {
        Random random = new Random(seed);
        FileTree tree = TREE;
        for (int k = 0; k < 200; k++) {
            int layer = random.nextInt(Math.max(1, tree.size("layers")));
            tree = switch (random.nextInt(5)) {
                case 0 -> tree.insert("layers", random.nextInt(tree.size("layers") + 1), Map.of("name", "Layer \"" + k + "\" \n\u00fc\u4e2d"));
                case 1 -> tree.size("layers") > 1 ? tree.remove("layers[" + layer + "]") : tree;
                case 2 -> tree.set("layers[" + layer + "].premium", Math.exp(20 * random.nextGaussian()));
                case 3 -> tree.move("layers", layer, random.nextInt(tree.size("layers")));
                default -> tree.set("layers[" + layer + "].occurrence.retention", random.nextInt(100));
            };
            assertEquals(tree, FileTree.parse("again", tree.text()), "seed " + seed + " step " + k);
        }
    }

    @Test
    void faultsOfATreatyBeingEditedNameTheFieldAndTheFile() throws IOException {
        FileTree portfolio = FileTree.read(Path.of("demo-portfolios/harrow-coast.json"));
        FileTree programme = FileTree.read(Path.of("treaties/harrow-coast-two-layers.json"));
        assertTrue(TreatyCheck.of(portfolio, programme).treaty() != null);
        TreatyCheck limit = TreatyCheck.of(portfolio, programme.set("layers[0].occurrence.limit", -5));
        assertNull(limit.treaty());
        assertEquals("layers[0].occurrence.limit", limit.programmeFaults().get(0).path());
        assertTrue(limit.portfolioFaults().isEmpty());
        TreatyCheck renamed = TreatyCheck.of(portfolio.set("perils[0].name", "storm"), programme);
        assertNull(renamed.treaty());
        assertTrue(renamed.programmeFaults().get(0).path().startsWith("layers[2].perils"), renamed.toString());
        TreatyCheck both = TreatyCheck.of(portfolio.set("perils[0].frequency.mean", "many"), programme.remove("name"));
        assertEquals("perils[0].frequency.mean", both.portfolioFaults().get(0).path());
        assertEquals("name", both.programmeFaults().get(0).path());
    }
}
