package layerweft.command;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;

/** What is wrong with a command or a file is said on standard error, with status 2 and nothing on standard output. */
class CommandFaultsTest {
    private static final String BOOK = "demo-portfolios/harrow-coast.json";
    private static final String COVER = "treaties/harrow-coast-two-layers.json";
    private static final Path CASES = Path.of("src/test/resources/reference/cases");

    @TempDir
    private Path folder;

    static Stream<Arguments> wrongCommands() {
        return Stream.of(
                Arguments.of(List.of(), "quote"),
                Arguments.of(List.of("qoute", BOOK, COVER), "quote"),
                Arguments.of(List.of("quote", BOOK), "PROGRAMME"),
                Arguments.of(List.of("quote"), "PORTFOLIO"),
                Arguments.of(List.of("quote", BOOK, COVER, "one-too-many"), "one-too-many"),
                Arguments.of(List.of("quote", BOOK, COVER, "--speed", "7"), "--speed"),
                Arguments.of(List.of("quote", BOOK, COVER, "--years"), "--years"),
                Arguments.of(List.of("quote", BOOK, COVER, "--years", "many"), "--years"),
                Arguments.of(List.of("quote", BOOK, COVER, "--years", "1e6"), "1e6"),
                Arguments.of(List.of("quote", BOOK, COVER, "--years", "0"), "--years: found 0"),
                Arguments.of(List.of("quote", BOOK, COVER, "--years", "-5"), "-5"),
                Arguments.of(List.of("quote", BOOK, COVER, "--years", "3000000000"), "2000000000"),
                Arguments.of(List.of("quote", BOOK, COVER, "--years", "99999999999999999999"), "99999999999999999999"),
                Arguments.of(List.of("quote", BOOK, COVER, "--seed", "1.5"), "1.5"),
                Arguments.of(List.of("quote", BOOK, COVER, "--threads", "0"), "--threads: found 0"),
                Arguments.of(List.of("quote", BOOK, COVER, "--threads", "5000"), "1024"),
                Arguments.of(List.of("quote", BOOK, COVER, "--engine", "magic"), "SIMULATION"),
                Arguments.of(List.of("quote", BOOK, COVER, "--format", "xml"), "JSON"),
                Arguments.of(List.of("quote", COVER, BOOK), "format"),
                Arguments.of(List.of("quote", BOOK, "no-such-file.json"), "no-such-file.json"),
                Arguments.of(List.of("quote", BOOK, "treaties"), "treaties"),
                Arguments.of(List.of("check"), "FILE"));
    }

    @ParameterizedTest
    @MethodSource("wrongCommands")
    void wrongCommandsAreRefusedInWords(List<String> arguments, String mentioned) {
        Run run = Run.of(arguments.toArray()).refused();
        assertTrue(run.err().contains(mentioned), run.err());
    }

    static List<Path> refusedCases() throws IOException {
        try (Stream<Path> folders = Files.list(CASES)) {
            return folders.filter(f -> f.getFileName().toString().startsWith("k")).sorted().toList();
        }
    }

    /** File, line, column and path of the field, and what {@code expected.json} asks the message to say. */
    @ParameterizedTest
    @MethodSource("refusedCases")
    void faultyFilesAreRefusedWithFileLineColumnAndPath(Path files) throws IOException {
        JsonNode refused = new ObjectMapper().readTree(files.resolve("expected.json").toFile()).get("refused");
        Path portfolio = files.resolve("portfolio.json");
        Path programme = files.resolve("programme.json");
        String message = Run.of("quote", portfolio, programme, "--years", 1000).refused().err();
        for (JsonNode alternatives : refused.get("mentions")) {
            boolean met = false;
            for (JsonNode alternative : alternatives) {
                met |= message.contains(alternative.asText());
            }
            assertTrue(met, message + " mentions none of " + alternatives);
        }
        Path file = files.resolve(refused.get("file").asText());
        // a file that is no JSON at all has no path to a field
        String place = java.util.regex.Pattern.quote(file.toString()) + ":\\d+:\\d+: (?s:.+)";
        assertTrue(message.matches(place), message);
        assertTrue(message.contains("found ") && message.contains("admissible: "), message);
        assertEquals(2, Run.of("check", portfolio, programme).refused().status());
    }

    @Test
    void checkListsEveryFaultOfEveryFile() {
        Path first = CASES.resolve("k03-negative-mean/portfolio.json");
        Path second = CASES.resolve("k07-limit-zero/programme.json");
        String message = Run.of("check", first, second).refused().err();
        assertTrue(message.contains(first + ":") && message.contains(second + ":"), message);
        assertTrue(message.contains("2 faults"), message);
    }

    @Test
    void checkListsSeveralFaultsOfOneFile() throws IOException {
        Path portfolio = Files.writeString(folder.resolve("book.json"), QuoteJsonTest.PORTFOLIO.replace("ALPHA", "-1")
                .replace("\"mean\": 0.8", "\"mean\": -0.8").replace("\"cv\": 1.5", "\"cv\": true"));
        String message = Run.of("check", portfolio).refused().err();
        for (String path : List.of("perils[0].severity.alpha", "perils[1].frequency.mean", "perils[1].severity.cv", "3 faults")) {
            assertTrue(message.contains(path), message);
        }
    }

    @Test
    void checkPassesGoodFiles() {
        String text = Run.of("check", BOOK, COVER).done().out();
        assertEquals(2, text.lines().count(), text);
        assertTrue(text.contains(BOOK) && text.contains(COVER), text);
    }

    @ParameterizedTest
    @ValueSource(strings = {"quote", "check"})
    void helpShowsExamples(String command) {
        String help = Run.of(command, "--help").done().out();
        assertTrue(help.contains("Examples:") && help.contains("  " + command + " book.json"), help);
        help.lines().forEach(line -> assertTrue(line.length() <= 110, line));
    }

    @Test
    void helpNamesTheCommandsAndVersionIsOneLine() {
        String help = Run.of("--help").done().out();
        assertTrue(help.contains("quote") && help.contains("check"), help);
        String version = Run.of("--version").done().out();
        assertEquals(1, version.strip().lines().count(), version);
        assertTrue(version.matches("(?s).*\\d+\\.\\d+.*") && !version.contains("$"), version);
        assertEquals(version, Run.of("quote", "--version").done().out());
    }

    @Test
    void answersGoToTheFileAndNowhereElse() throws IOException {
        Path target = folder.resolve("quote.json");
        Files.writeString(target, "old");
        Run run = Run.of("quote", BOOK, COVER, "--years", 2000, "--format", "json", "--out", target).done();
        assertEquals("", run.out());
        assertEquals(Run.of("quote", BOOK, COVER, "--years", 2000, "--format", "json").done().out(), Files.readString(target));
        try (Stream<Path> files = Files.list(folder)) {
            assertEquals(List.of(target), files.toList(), "nothing is left beside the file");
        }
    }

    @Test
    void aFolderThatIsNotThereIsRefusedAndNothingIsWritten() {
        Path target = folder.resolve("missing").resolve("quote.json");
        String message = Run.of("quote", BOOK, COVER, "--years", 2000, "--out", target).refused().err();
        assertTrue(message.contains("--out") && message.contains(target.toString()), message);
        assertTrue(Files.notExists(target.getParent()));
        Run.of("quote", BOOK, COVER, "--years", 2000, "--out", folder).refused();
    }

    @Test
    void aRefusedRunLeavesTheOldAnswerAlone() throws IOException {
        Path target = Files.writeString(folder.resolve("quote.txt"), "old");
        Run.of("quote", BOOK, CASES.resolve("k07-limit-zero/programme.json"), "--out", target).refused();
        assertEquals("old", Files.readString(target));
    }
}
