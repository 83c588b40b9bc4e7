package layerweft.file;

import static layerweft.file.Examples.PORTFOLIO;
import static layerweft.file.Examples.PROGRAMME;
import static layerweft.file.Examples.bytes;
import static layerweft.file.Examples.changed;
import static layerweft.file.Examples.faults;
import static layerweft.file.Examples.lines;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTimeoutPreemptively;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.RandomAccessFile;
import java.nio.charset.Charset;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Duration;
import java.util.List;
import java.util.Random;
import java.util.function.Supplier;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Files that no one wrote in good faith end soon, with one short fault that says why. The time allowed only tells an end from none. */
class HostileFileTest {

    private static Fault one(Supplier<List<Fault>> reading) {
        List<Fault> faults = assertTimeoutPreemptively(Duration.ofSeconds(20), reading::get);
        assertEquals(1, faults.size(), String.join("\n", lines(faults)));
        assertTrue(faults.get(0).toString().length() < 1000, "too long a message");
        assertTrue(faults.get(0).toString().codePoints().allMatch(Excerpt::isPrintable), "unprintable message");
        return faults.get(0);
    }

    @Test
    void aHugeFileIsRefusedBeforeItIsRead(@TempDir Path folder) throws IOException {
        Path huge = folder.resolve("huge.json");
        try (RandomAccessFile file = new RandomAccessFile(huge.toFile(), "rw")) {
            file.setLength(100L * 1024 * 1024);
        }
        Fault fault = one(() -> assertThrows(FaultyFileException.class, () -> PortfolioReader.read(huge)).faults());
        assertEquals(huge + ": found a file of more than 64 MB; admissible: a file of at most 64 MB", fault.toString());
    }

    @Test
    void noiseIsRefused() {
        byte[] noise = new byte[8 * 1024 * 1024];
        new Random(7).nextBytes(noise);
        noise[0] = 'x';
        noise[1] = 'x';
        assertTrue(one(() -> faults(noise, false)).found().contains("which is not UTF-8 here"));
    }

    @ParameterizedTest
    @ValueSource(strings = {"[", "{\"a\":"})
    void deepNestingIsRefusedAtItsPlace(String opening) {
        Fault fault = one(() -> faults(opening.repeat(100_000)));
        assertEquals("objects and lists nested more than 64 deep", fault.found());
        assertEquals(64 * opening.length() + 1, fault.column());
    }

    @Test
    void nestingOfSixtyFourIsStillRead() {
        assertEquals("a list", one(() -> faults("[".repeat(64) + "]".repeat(64))).found());
    }

    @Test
    void aNumberOfAMillionDigitsIsOutOfRange() {
        Fault fault = one(() -> faults(changed(PORTFOLIO, "\"alpha\": 1.6", "\"alpha\": " + "9".repeat(1_000_000))));
        assertEquals("perils[0].severity.alpha", fault.path());
        assertTrue(fault.found().startsWith("999"));
    }

    @Test
    void aNameOfAMillionCharactersIsQuotedInPart() {
        Fault fault = one(() -> faults(changed(PORTFOLIO, "\"name\": \"wind\"", "\"name\": \"" + "w".repeat(1_000_000) + "\"")));
        assertTrue(fault.found().endsWith("…\" (1000000 characters)"), fault.found());
    }

    @Test
    void aFieldNameOfAMillionCharactersIsQuotedInPart() {
        assertTrue(one(() -> faults(changed(PORTFOLIO, "\"unit\": ", "\"" + "n".repeat(1_000_000) + "\": 1, \"unit\": "))).path().length() < 100);
    }

    @Test
    void tooManyPerilsLayersOrValuesAreRefused() {
        String peril = "{\"name\": \"p\"}";
        Fault perils = one(() -> faults("{\"format\": \"layerweft/portfolio/1\", \"name\": \"n\", \"currency\": \"\", \"unit\": \"\", \"perils\": ["
                + (peril + ",").repeat(256) + peril + "]}"));
        assertEquals("a list of 257", perils.found());
        Fault layers = one(() -> faults("{\"format\": \"layerweft/programme/1\", \"name\": \"n\", \"layers\": ["
                + (peril + ",").repeat(1000) + peril + "]}"));
        assertEquals("a list of 1001", layers.found());
        assertEquals("more than 2500000 values", one(() -> faults("[" + "1,".repeat(3_000_000) + "1]")).found());
    }

    @Test
    void aMillionLossesAreReadAndOneMoreIsNot() {
        String severity = "\"model\": \"pareto\", \"threshold\": 5, \"alpha\": 1.6";
        String million = "1,".repeat(999_999) + "1";
        assertTimeoutPreemptively(Duration.ofSeconds(30), () -> PortfolioReader.read("file.json",
                bytes(changed(PORTFOLIO, severity, "\"model\": \"empirical\", \"losses\": [" + million + "]"))));
        assertEquals("a list of 1000001",
                one(() -> faults(changed(PORTFOLIO, severity, "\"model\": \"empirical\", \"losses\": [1," + million + "]"))).found());
    }

    @ParameterizedTest
    @ValueSource(strings = {"UTF-16", "UTF-16LE", "UTF-16BE", "UTF-32"})
    void otherUnicodeEncodingsAreRefusedByName(String encoding) {
        assertEquals("file.json:1:1: found text in UTF-16 or UTF-32; admissible: text in UTF-8",
                one(() -> faults(PORTFOLIO.getBytes(Charset.forName(encoding)), false)).toString());
    }

    @Test
    void aLatin1ByteIsRefusedAtItsPlace() {
        byte[] latin = changed(PROGRAMME, "\"Cover\"", "\"Pré\"").getBytes(StandardCharsets.ISO_8859_1);
        assertEquals("file.json:3:14: found the byte 0xE9, which is not UTF-8 here; admissible: text in UTF-8",
                one(() -> faults(latin, true)).toString());
    }

    @Test
    void aByteOrderMarkIsSkipped() throws IOException {
        ByteArrayOutputStream marked = new ByteArrayOutputStream();
        marked.write(new byte[] {(byte) 0xEF, (byte) 0xBB, (byte) 0xBF});
        marked.write(bytes(PORTFOLIO));
        assertEquals("Book", PortfolioReader.read("file.json", marked.toByteArray()).name());
    }

    @Test
    void noFileAndAFolderAreRefused(@TempDir Path folder) {
        Path none = folder.resolve("none.json");
        assertEquals(none + ": found no such file; admissible: a file that is there",
                one(() -> assertThrows(FaultyFileException.class, () -> PortfolioReader.read(none)).faults()).toString());
        assertEquals(folder + ": found a folder; admissible: a file",
                one(() -> assertThrows(FaultyFileException.class, () -> ProgrammeReader.read(folder)).faults()).toString());
    }

    @Test
    void fileNamesWithControlCharactersDoNotReachTheTerminal() {
        Path odd = Path.of("a\u001b[2Jb.json");
        assertEquals("a\\u001B[2Jb.json: found no such file; admissible: a file that is there",
                one(() -> assertThrows(FaultyFileException.class, () -> PortfolioReader.read(odd)).faults()).toString());
    }

    @Test
    void garbledValidFilesNeverCrashTheReader() {
        Random random = new Random(20270101);
        for (int n = 0; n < 5_000; n++) {
            byte[] text = bytes(n % 2 == 0 ? PORTFOLIO : PROGRAMME);
            int changes = 1 + random.nextInt(3);
            for (int k = 0; k < changes; k++) {
                int at = random.nextInt(text.length);
                text[at] = random.nextInt(4) == 0 ? (byte) random.nextInt(256) : text[random.nextInt(text.length)];
            }
            try {
                if (n % 2 == 0) {
                    PortfolioReader.read("file.json", text);
                } else {
                    ProgrammeReader.read("file.json", text);
                }
            } catch (FaultyFileException e) {
                assertTrue(e.faults().stream().allMatch(f -> f.toString().codePoints().allMatch(Excerpt::isPrintable)), "round " + n);
            } catch (RuntimeException e) {
                throw new AssertionError("seed 20270101, round " + n + ": " + new String(text, StandardCharsets.UTF_8), e);
            }
        }
    }
}
