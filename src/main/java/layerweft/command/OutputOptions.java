package layerweft.command;

import java.io.IOException;
import java.io.PrintWriter;
import java.nio.charset.StandardCharsets;
import java.nio.file.AtomicMoveNotSupportedException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import picocli.CommandLine.Option;

/** Where the answer goes and in which form. */
final class OutputOptions {

    /** Forms of an answer. */
    enum Format {
        TEXT,
        JSON,
        CSV
    }

    @Option(names = "--format", paramLabel = "text|json|csv", defaultValue = "text", description = "Form of the answer (default: ${DEFAULT-VALUE}).")
    private Format format;

    @Option(names = "--out", paramLabel = "FILE", description = "Write the answer to a file instead of standard output.")
    private Path out;

    Format format() {
        return format;
    }

    /** Refuses a target that cannot be written before time is spent on computing. */
    void checkTarget() {
        if (out == null) {
            return;
        }
        Path folder = out.toAbsolutePath().getParent();
        if (Files.isDirectory(out) || folder == null || !Files.isDirectory(folder) || !Files.isWritable(folder)) {
            throw new RunFailedException("--out: cannot write " + out + ": admissible is a file in a folder that exists and can be written to");
        }
    }

    /** Writes the whole answer, or nothing: a file is first written beside its name, then moved onto it. */
    void write(String answer, PrintWriter standardOutput) {
        if (out == null) {
            standardOutput.print(answer);
            standardOutput.flush();
            return;
        }
        try {
            Path target = out.toAbsolutePath();
            Path beside = Files.createTempFile(target.getParent(), target.getFileName().toString(), ".part");
            try {
                Files.writeString(beside, answer, StandardCharsets.UTF_8);
                move(beside, target);
            } finally {
                Files.deleteIfExists(beside);
            }
        } catch (IOException e) {
            throw new RunFailedException("--out: cannot write " + out + ": " + e.getMessage());
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
