package layerweft.file;

import static layerweft.file.Examples.PORTFOLIO;
import static layerweft.file.Examples.PROGRAMME;
import static layerweft.file.Examples.bytes;
import static layerweft.file.Examples.changed;
import static layerweft.file.Examples.lines;
import static org.junit.jupiter.api.Assertions.assertEquals;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class FileCheckTest {
    @TempDir
    private Path folder;

    private Path file(String name, String text) throws IOException {
        return Files.write(folder.resolve(name), bytes(text));
    }

    @Test
    void validFilesAreDescribedInTheirOrder() throws IOException {
        Path programme = file("q.json", PROGRAMME);
        Path portfolio = file("p.json", PORTFOLIO);
        List<String> valid = new ArrayList<>();
        assertEquals(List.of(), FileCheck.of(List.of(programme, portfolio), valid::add));
        assertEquals(List.of(programme + ": a valid programme, \"Cover\", of 2 layers", portfolio + ": a valid portfolio, \"Book\", of 2 perils"),
                valid);
    }

    @Test
    void aProgrammeIsCheckedAgainstThePortfolioBesideIt() throws IOException {
        String text = changed(PROGRAMME, "\"flood/sea\"", "\"flood/lake\"");
        Path programme = file("q.json", text);
        assertEquals(List.of(), FileCheck.of(List.of(programme), line -> { }));
        List<String> valid = new ArrayList<>();
        assertEquals(List.of(programme + ":5:40: layers[0].perils[1]: found \"flood/lake\"; admissible: a peril or peril/sub-peril of the portfolio: "
                + "wind, flood, flood/river, flood/sea"), lines(FileCheck.of(List.of(programme, file("p.json", PORTFOLIO)), valid::add)));
        assertEquals(1, valid.size());
    }

    @Test
    void aFileOfUnknownFormatSaysWhatIsKnown() throws IOException {
        String admissible = "; admissible: \"layerweft/portfolio/1\" or \"layerweft/programme/1\"";
        Path other = file("other.json", "{\"format\": \"something\"}");
        Path none = file("none.json", "{}");
        Path missing = folder.resolve("missing.json");
        assertEquals(List.of(other + ":1:12: format: found \"something\"" + admissible, none + ":1:1: format: found nothing" + admissible,
                missing + ": found no such file; admissible: a file that is there"),
                lines(FileCheck.of(List.of(other, none, missing), line -> { })));
    }
}
