package layerweft.command;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;

import java.io.PrintWriter;
import java.io.StringWriter;
import java.util.List;

/** One run of the command line inside the test: its exit status and what it wrote. */
record Run(List<String> arguments, int status, String out, String err) {

    static Run of(Object... arguments) {
        String[] args = java.util.Arrays.stream(arguments).map(Object::toString).toArray(String[]::new);
        StringWriter out = new StringWriter();
        StringWriter err = new StringWriter();
        int status = CommandLineProgram.run(args, new PrintWriter(out), new PrintWriter(err));
        return new Run(List.of(args), status, out.toString(), err.toString());
    }

    /** Done: status 0, nothing on standard error. */
    Run done() {
        assertEquals(0, status, this::toString);
        assertEquals("", err, this::toString);
        return this;
    }

    /** Refused: status 2, the reason on standard error and nothing on standard output, in words rather than a stack trace. */
    Run refused() {
        assertEquals(2, status, this::toString);
        assertEquals("", out, this::toString);
        assertFalse(err.isBlank(), this::toString);
        assertFalse(err.contains("Exception") || err.contains("\tat ") || err.contains("fault of the program"), this::toString);
        return this;
    }
}
