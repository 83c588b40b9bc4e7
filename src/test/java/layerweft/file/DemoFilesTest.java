package layerweft.file;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import layerweft.model.treaty.Layer;
import layerweft.model.treaty.Treaty;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** The demo files are valid, belong together and travel with the program. */
class DemoFilesTest {

    static List<String> treaties() {
        return Examples.demoFiles("treaties");
    }

    @ParameterizedTest
    @MethodSource("treaties")
    void everyProgrammeFormsATreatyWithTheBookOfItsName(String programme) throws IOException {
        String name = programme.substring("treaties/".length());
        List<String> books = Examples.demoFiles("demo-portfolios").stream()
                .filter(p -> name.startsWith(p.substring("demo-portfolios/".length()).replace(".json", "-"))).toList();
        assertEquals(1, books.size(), "books for " + programme);
        assertTrue(TreatyReader.read(Path.of(books.get(0)), Path.of(programme)).layers() > 0);
        assertArrayEquals(Files.readAllBytes(Path.of(programme)), DemoFiles.bytes(programme));
        assertArrayEquals(Files.readAllBytes(Path.of(books.get(0))), DemoFiles.bytes(books.get(0)));
    }

    @Test
    void theDemoShownFirstNeedsNoSimulation() {
        Treaty treaty = DemoFiles.treaty();
        assertTrue(treaty.programme().layers().stream().allMatch(l -> l.inuring().isEmpty() && !l.proRataTime()));
    }

    @Test
    void layersQuotePremiumsAndReadmesNameEveryFile() throws IOException {
        for (String folder : List.of("demo-portfolios", "treaties")) {
            String readme = Files.readString(Path.of(folder, "README.md"));
            Examples.demoFiles(folder).forEach(f -> assertTrue(readme.contains("`" + f.substring(f.indexOf('/') + 1) + "`"), f));
        }
        assertTrue(DemoFiles.treaty().programme().layers().stream().map(Layer::premium).anyMatch(p -> p != null));
    }

    @Test
    void anUnknownDemoIsRefusedByName() {
        assertTrue(assertThrows(IllegalArgumentException.class, () -> DemoFiles.bytes("treaties/none.json")).getMessage().contains("none.json"));
    }
}
