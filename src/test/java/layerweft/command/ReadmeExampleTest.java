package layerweft.command;

import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;

/** The README's worked example is what the program prints. Its layers are priced by transform, so the number of years does not matter. */
class ReadmeExampleTest {

    @Test
    void theWorkedExampleIsWhatTheProgramPrints() throws IOException {
        String readme = Files.readString(Path.of("README.md"));
        int start = readme.indexOf("```\nHarrow Coast") + "```\n".length();
        List<String> shown = readme.substring(start, readme.indexOf("```", start)).lines().filter(l -> !l.contains("years simulated")).toList();
        String printed = Run.of("quote", Path.of("demo-portfolios/harrow-coast.json"), Path.of("treaties/harrow-coast-two-layers.json"), "--years", 1_000)
                .done().out();
        assertTrue(shown.size() > 6, "the example is there");
        shown.forEach(line -> assertTrue(printed.contains(line + "\n"), () -> "not printed: " + line));
    }
}
