package layerweft.desktop.habit;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;

/** Writes a file whole or not at all. */
final class WholeFile {

    private WholeFile() {}

    /** @throws UncheckedIOException if it cannot be written; the file is then as it was */
    static void write(Path file, String text) {
        Path folder = file.toAbsolutePath().getParent();
        try {
            Path temporary = Files.createTempFile(folder, ".layerweft", ".tmp");
            Files.writeString(temporary, text);
            Files.move(temporary, file, StandardCopyOption.REPLACE_EXISTING, StandardCopyOption.ATOMIC_MOVE);
        } catch (IOException e) {
            throw new UncheckedIOException("writing " + file + " failed: " + e.getMessage(), e);
        }
    }
}
