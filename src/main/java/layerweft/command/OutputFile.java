package layerweft.command;

import java.io.IOException;
import java.nio.file.AtomicMoveNotSupportedException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;

/** A file that an answer goes to, as given with {@code --out}. */
record OutputFile(Path path) {

    /** Refuses a target that cannot be written before time is spent on computing. */
    void check() {
        Path folder = path.toAbsolutePath().getParent();
        if (Files.isDirectory(path) || folder == null || !Files.isDirectory(folder) || !Files.isWritable(folder)) {
            throw new RunFailedException("--out: cannot write " + path + ": admissible is a file in a folder that exists and can be written to");
        }
    }

    /** Writes all of it, or nothing: a file is first written beside its name, then moved onto it. */
    void write(byte[] answer) {
        try {
            Path target = path.toAbsolutePath();
            Path beside = Files.createTempFile(target.getParent(), target.getFileName().toString(), ".part");
            try {
                Files.write(beside, answer);
                move(beside, target);
            } finally {
                Files.deleteIfExists(beside);
            }
        } catch (IOException e) {
            throw new RunFailedException("--out: cannot write " + path + ": " + e.getMessage());
        }
    }

    private static void move(Path from, Path to) throws IOException {
        try {
            Files.move(from, to, StandardCopyOption.ATOMIC_MOVE);
        } catch (AtomicMoveNotSupportedException e) {
            Files.move(from, to, StandardCopyOption.REPLACE_EXISTING);
        }
    }
}
