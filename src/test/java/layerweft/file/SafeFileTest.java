package layerweft.file;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static org.junit.jupiter.api.Assumptions.assumeFalse;
import static org.junit.jupiter.api.Assumptions.assumeTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.attribute.PosixFilePermissions;
import java.util.List;
import java.util.stream.Stream;
import layerweft.file.UnsavedException.Reason;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class SafeFileTest {
    @TempDir
    private Path folder;
    private Path file;

    @BeforeEach
    void name() {
        file = folder.resolve("book.json");
    }

    private List<String> names() throws IOException {
        try (Stream<Path> files = Files.list(folder)) {
            return files.map(f -> f.getFileName().toString()).sorted().toList();
        }
    }

    private static UnsavedException unsaved(Reason reason, Path file, String lastSeen) {
        UnsavedException e = assertThrows(UnsavedException.class, () -> SafeFile.write(file, "new", lastSeen));
        assertEquals(reason, e.reason(), e.getMessage());
        assertEquals(file.toAbsolutePath(), e.file().toAbsolutePath());
        return e;
    }

    private boolean posix() {
        return folder.getFileSystem().supportedFileAttributeViews().contains("posix");
    }

    @Test
    void aNewFileHoldsTheTextAndNothingLiesBesideIt() throws IOException {
        SafeFile.write(file, "é 世 \ud83c\udf0a\n");
        assertEquals("é 世 \ud83c\udf0a\n", Files.readString(file));
        assertEquals(List.of("book.json"), names());
    }

    @Test
    void thePreviousVersionIsKept() throws IOException {
        SafeFile.write(file, "one");
        SafeFile.write(file, "two");
        SafeFile.write(file, "three");
        assertEquals("three", Files.readString(file));
        assertEquals("two", Files.readString(folder.resolve("book.json.bak")));
        assertEquals(List.of("book.json", "book.json.bak"), names());
    }

    @Test
    void permissionsAreKept() throws IOException {
        assumeTrue(posix());
        SafeFile.write(file, "one");
        Files.setPosixFilePermissions(file, PosixFilePermissions.fromString("rw-r-----"));
        SafeFile.write(file, "two");
        assertEquals("rw-r-----", PosixFilePermissions.toString(Files.getPosixFilePermissions(file)));
        assertEquals("rw-r-----", PosixFilePermissions.toString(Files.getPosixFilePermissions(folder.resolve("book.json.bak"))));
    }

    @Test
    void aLinkStaysALink() throws IOException {
        assumeTrue(posix());
        SafeFile.write(file, "one");
        Path link = Files.createSymbolicLink(folder.resolve("link.json"), file);
        SafeFile.write(link, "two");
        assertTrue(Files.isSymbolicLink(link));
        assertEquals("two", Files.readString(file));
    }

    @Test
    void whatSomebodyElseChangedIsNotOverwritten() throws IOException {
        String seen = SafeFile.write(file, "one");
        assertEquals(SafeFile.stamp("one"), seen);
        assertEquals(seen, SafeFile.stamp(file));
        Files.writeString(file, "theirs");
        assertTrue(unsaved(Reason.CHANGED_MEANWHILE, file, seen).getMessage().contains("changed by somebody else"));
        assertEquals("theirs", Files.readString(file));
        assertEquals(List.of("book.json"), names());
        assertNotEquals(seen, SafeFile.stamp(file));
        SafeFile.write(file, "mine", SafeFile.stamp(file));
        assertEquals("mine", Files.readString(file));
    }

    @Test
    void aFileThatCameOrWentMeanwhileIsToldToo() throws IOException {
        assertEquals(SafeFile.ABSENT, SafeFile.stamp(file));
        Files.writeString(file, "theirs");
        unsaved(Reason.CHANGED_MEANWHILE, file, SafeFile.ABSENT);
        String seen = SafeFile.stamp(file);
        Files.delete(file);
        assertTrue(unsaved(Reason.CHANGED_MEANWHILE, file, seen).getMessage().contains("no longer there"));
        SafeFile.write(file, "mine", SafeFile.ABSENT);
        assertEquals("mine", Files.readString(file));
    }

    @Test
    void aMissingFolderIsTold() {
        assertTrue(unsaved(Reason.NO_FOLDER, folder.resolve("none/book.json"), null).getMessage().contains("none"));
    }

    @Test
    void aFolderIsNotReplaced() throws IOException {
        Files.createDirectory(file);
        unsaved(Reason.IS_A_FOLDER, file, null);
        assertTrue(Files.isDirectory(file));
        assertEquals(List.of("book.json"), names());
    }

    @Test
    void aReadOnlyFileIsNotReplaced() throws IOException {
        assumeTrue(posix());
        SafeFile.write(file, "one");
        Files.setPosixFilePermissions(file, PosixFilePermissions.fromString("r--r--r--"));
        assumeFalse(Files.isWritable(file), "whoever runs this may write everything");
        unsaved(Reason.READ_ONLY, file, null);
        assertEquals("one", Files.readString(file));
    }

    @Test
    void aReadOnlyFolderIsTold() throws IOException {
        assumeTrue(posix());
        Files.setPosixFilePermissions(folder, PosixFilePermissions.fromString("r-xr-xr-x"));
        try {
            assumeFalse(Files.isWritable(folder), "whoever runs this may write everything");
            unsaved(Reason.READ_ONLY, file, null);
        } finally {
            Files.setPosixFilePermissions(folder, PosixFilePermissions.fromString("rwxr-xr-x"));
        }
    }

    @Test
    void whereTheBackupCannotBeKeptTheFileStaysAndNothingIsLeftBehind() throws IOException {
        SafeFile.write(file, "one");
        Files.createDirectories(folder.resolve("book.json.bak/inside"));
        unsaved(Reason.OTHER, file, null);
        assertEquals("one", Files.readString(file));
        assertEquals(List.of("book.json", "book.json.bak"), names());
    }

    @Test
    void aFullDiskIsToldAndLeavesNothingBehind() throws IOException {
        Path full = Path.of("/dev/full");
        assumeTrue(Files.exists(full));
        // the device refuses every byte, as a full disk does; it stands for the temporary file
        IOException refused = assertThrows(IOException.class, () -> Files.writeString(full, "text"));
        assertEquals(Reason.DISK_FULL, SafeFile.unsaved(file, refused).reason());
        assertFalse(Files.exists(file));
    }
}
