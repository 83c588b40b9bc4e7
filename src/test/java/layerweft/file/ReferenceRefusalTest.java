package layerweft.file;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** The project's reference cases: those named k… are to be refused, with what {@code expected.json} says of the message; the others read. */
class ReferenceRefusalTest {
    private static final Path CASES = Path.of("src/test/resources/reference/cases");

    static List<Path> cases(boolean refused) throws IOException {
        try (Stream<Path> folders = Files.list(CASES)) {
            return folders.filter(c -> c.getFileName().toString().startsWith("k") == refused).sorted().toList();
        }
    }

    static List<Path> refused() throws IOException {
        return cases(true);
    }

    static List<Path> read() throws IOException {
        return cases(false);
    }

    @ParameterizedTest
    @MethodSource("refused")
    void aFaultyCaseIsRefusedWithItsFileAndField(Path folder) throws IOException {
        JsonNode refused = new ObjectMapper().readTree(folder.resolve("expected.json").toFile()).get("refused");
        FaultyFileException e = assertThrows(FaultyFileException.class,
                () -> TreatyReader.read(folder.resolve("portfolio.json"), folder.resolve("programme.json")));
        assertEquals(1, e.faults().size(), e.getMessage());
        assertTrue(e.faults().get(0).file().endsWith(refused.get("file").asText()), e.getMessage());
        for (JsonNode alternatives : refused.get("mentions")) {
            assertTrue(Stream.of(alternatives).flatMap(a -> {
                Stream.Builder<String> texts = Stream.builder();
                a.forEach(t -> texts.add(t.asText()));
                return texts.build();
            }).anyMatch(e.getMessage()::contains), e.getMessage() + " mentions none of " + alternatives);
        }
    }

    @ParameterizedTest
    @MethodSource("read")
    void aValidCaseIsRead(Path folder) {
        assertTrue(TreatyReader.read(folder.resolve("portfolio.json"), folder.resolve("programme.json")).layers() > 0);
    }

    @Test
    void thereAreCasesOfBothKinds() throws IOException {
        assertTrue(refused().size() >= 16 && read().size() >= 30);
    }
}
