package layerweft.desktop.habit;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertNull;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Set;
import java.util.stream.Stream;
import layerweft.desktop.ScriptedDialogs;
import layerweft.desktop.session.Background;
import layerweft.desktop.session.Document;
import layerweft.desktop.session.Session;
import layerweft.file.FileTree;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** Files, recent files, the question before leaving, preferences and recovery, without a window. */
class HabitsTest {
    @TempDir
    private Path folder;
    private final ScriptedDialogs dialogs = new ScriptedDialogs();
    private Session session;
    private Preferences preferences;
    private DocumentFiles files;

    @BeforeEach
    void open() {
        // nothing is priced here
        session = new Session(Document.demo(), Background.publishing(published -> {}));
        preferences = new Preferences(folder.resolve("preferences"));
        files = new DocumentFiles(session, dialogs, preferences);
    }

    private void change() {
        session.edit("name", d -> d.withPortfolio(p -> p.set("name", "Changed")));
    }

    private Path demo(String name) throws IOException {
        Path file = folder.resolve(Path.of(name).getFileName());
        Files.writeString(file, Document.demo(name).text());
        return file;
    }

    @Test
    void savingAsksWhereAndOpeningBringsTheSameBack() throws IOException {
        change();
        Path portfolio = folder.resolve("p.json");
        Path programme = folder.resolve("q.json");
        dialogs.save(portfolio, programme);
        assertTrue(files.save());
        assertEquals(List.of("Save the portfolio: changed.json", "Save the programme: two-cat-layers-and-an-aggregate-cover.json"), dialogs.said());
        assertFalse(session.unsaved().get());
        Document saved = session.document().get();
        session.open(Document.demo());
        files.open(List.of(programme, portfolio));
        assertEquals(saved, session.document().get());
        assertEquals(List.of(new Preferences.Recent(portfolio, programme)), preferences.recent());
        change();
        session.edit("name", d -> d.withPortfolio(p -> p.set("name", "Again")));
        assertTrue(files.save(), "a second time without asking");
        assertEquals("Again", FileTree.read(portfolio).text("name"));
    }

    @Test
    void givingUpTheQuestionWhereToSaveSavesNothing() {
        change();
        assertFalse(files.save());
        dialogs.save(folder.resolve("only-the-portfolio.json"));
        assertFalse(files.save());
        assertTrue(session.unsaved().get());
        assertFalse(Files.exists(folder.resolve("only-the-portfolio.json")));
    }

    @Test
    void aFolderThatIsNotThereIsToldAndTheDocumentStaysUnsaved() {
        change();
        dialogs.save(folder.resolve("nowhere/p.json"), folder.resolve("q.json"));
        assertFalse(files.save());
        assertTrue(session.unsaved().get());
        assertTrue(dialogs.said().get(2).startsWith("The file was not saved: "), dialogs.said()::toString);
    }

    @Test
    void unsavedChangesAreAskedAboutBeforeAnotherFileOpens() throws IOException {
        Path other = demo("demo-portfolios/tolvane-ridge.json");
        change();
        files.open(List.of(other));
        assertEquals("Changed", session.document().get().name(), "no answer: nothing happens");
        dialogs.answer("Don't save");
        files.open(List.of(other));
        assertEquals("Tolvane Ridge earthquake 2027", session.document().get().name());
        files.open(List.of(other));
        assertEquals(List.of("Save changes?", "Save changes?"), dialogs.said(), "nothing changed, nothing asked");
    }

    @Test
    void aPortfolioThatTheProgrammeDoesNotFitOpensWithAnEmptyOne() throws IOException {
        files.open(List.of(demo("demo-portfolios/tolvane-ridge.json")));
        assertEquals(0, session.document().get().programme().size("layers"));
        assertNull(session.document().get().programmeFile());
        files.open(List.of(demo("treaties/tolvane-ridge-tower.json")));
        assertTrue(session.faults().isEmpty(), session.faults()::toString);
        assertEquals(1, preferences.recent().size());
    }

    @Test
    void aFileThatIsNeitherIsRefusedInWords() throws IOException {
        Path broken = Files.writeString(folder.resolve("broken.json"), "{\"format\": ");
        Path other = Files.writeString(folder.resolve("other.json"), "{\"format\": \"something/1\"}");
        Document before = session.document().get();
        files.open(List.of(broken));
        files.open(List.of(other));
        files.open(List.of(folder.resolve("missing.json")));
        assertEquals(before, session.document().get());
        assertEquals(3, dialogs.said().size());
        assertTrue(dialogs.said().get(1).contains("something/1"), dialogs.said()::toString);
    }

    @Test
    void preferencesComeBackAndBrokenOnesAreNone() throws IOException {
        preferences.set("width", 1300.5);
        assertTrue(preferences.save());
        assertEquals(1300.5, new Preferences(folder.resolve("preferences")).number("width", 0));
        Files.writeString(folder.resolve("preferences/window.properties"), "width=wide\nbroken=\\u00");
        assertEquals(7, new Preferences(folder.resolve("preferences")).number("width", 7));
    }

    @Test
    void recentFilesAreTheNewestOnceAndOnlyThoseThatAreThere() throws IOException {
        Path a = demo("demo-portfolios/tolvane-ridge.json");
        Path b = demo("treaties/tolvane-ridge-tower.json");
        Path gone = folder.resolve("gone.json");
        preferences.opened(a, b);
        preferences.opened(gone, b);
        preferences.opened(a, b);
        assertEquals(List.of(new Preferences.Recent(a, b)), preferences.recent());
    }

    @Test
    void aCopyOfAProgramThatRunsNoLongerIsFound() throws IOException {
        Recovery recovery = new Recovery(folder);
        change();
        Document changed = session.document().get().withFiles(folder.resolve("p.json"), null);
        recovery.keep(changed);
        assertEquals(List.of(), recovery.lost(), "the copy of a running program is not lost");
        Path copies = folder.resolve("recovery");
        // no process has the largest number
        Files.move(copies.resolve(String.valueOf(ProcessHandle.current().pid())), copies.resolve("999999999999999999"));
        Recovery.Found found = recovery.lost().get(0);
        assertEquals(changed, found.document());
        recovery.forget(found);
        assertEquals(List.of(), recovery.lost());
    }

    @Test
    void aSavedDocumentLeavesNoCopy() throws IOException {
        Recovery recovery = new Recovery(folder);
        recovery.keep(session.document().get());
        recovery.forget();
        recovery.forget();
        try (Stream<Path> left = Files.list(folder.resolve("recovery"))) {
            assertEquals(Set.of(), Set.copyOf(left.toList()));
        }
    }

    @Test
    void aCopyCutShortIsPassedOver() throws IOException {
        Path copy = Files.createDirectories(folder.resolve("recovery/999999999999999999"));
        Files.writeString(copy.resolve("portfolio.json"), "{\"form");
        assertEquals(List.of(), new Recovery(folder).lost());
        Files.writeString(copy.resolve("programme.json"), "{}");
        assertEquals(List.of(), new Recovery(folder).lost());
    }
}
