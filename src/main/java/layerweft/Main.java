package layerweft;

import java.io.PrintWriter;
import layerweft.command.CommandLineProgram;
import layerweft.command.Demo;
import layerweft.desktop.Desktop;

/** Starts the program: with arguments the command line; without any the window, or the demo in text where there is no display. */
public final class Main {

    private Main() {}

    public static void main(String[] args) {
        if (args.length == 0 && Desktop.show()) {
            return;
        }
        PrintWriter out = CommandLineProgram.writer(System.out);
        PrintWriter err = CommandLineProgram.writer(System.err);
        int status = args.length == 0 ? Demo.show(out, err) : CommandLineProgram.run(args, out, err);
        out.flush();
        err.flush();
        System.exit(status);
    }
}
