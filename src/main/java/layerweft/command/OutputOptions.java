package layerweft.command;

import java.io.PrintWriter;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
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
        if (out != null) {
            new OutputFile(out).check();
        }
    }

    /** Writes the whole answer, or nothing. */
    void write(String answer, PrintWriter standardOutput) {
        if (out == null) {
            standardOutput.print(answer);
            standardOutput.flush();
            return;
        }
        new OutputFile(out).write(answer.getBytes(StandardCharsets.UTF_8));
    }
}
