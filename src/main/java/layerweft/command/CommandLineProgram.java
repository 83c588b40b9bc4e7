package layerweft.command;

import java.io.PrintWriter;
import java.nio.charset.StandardCharsets;
import java.util.concurrent.CancellationException;
import layerweft.file.FaultyFileException;
import layerweft.model.Finding;
import layerweft.model.InadmissibleException;
import layerweft.study.EngineRefusedException;
import picocli.CommandLine;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Spec;

/**
 * The command line: commands in, text out, and an exit status: 0 done, 2 the command or a file is wrong (said on standard error, nothing
 * on standard output), 1 a failure of the program.
 */
@Command(name = "layerweft", mixinStandardHelpOptions = true, versionProvider = Version.class,
        subcommands = {QuoteCommand.class, SweepCommand.class, BoundsCommand.class, BreakEvenCommand.class, CompareCommand.class, DriversCommand.class,
            RankCommand.class, ReportCommand.class, CheckCommand.class},
        description = "Prices reinsurance layers over dependent perils.",
        footer = {"", "A price supports qualified judgement; it does not replace it, and it defers to local regulation and licensed practice."})
public final class CommandLineProgram implements Runnable {
    private static final int WRONG = 2;
    private static final int FAILED = 1;

    @Spec
    private CommandSpec spec;

    private CommandLineProgram() {}

    /** Runs one command; returns the exit status. Both writers are flushed. */
    public static int run(String[] args, PrintWriter out, PrintWriter err) {
        CommandLine line = new CommandLine(new CommandLineProgram());
        line.setOut(out).setErr(err).setCaseInsensitiveEnumValuesAllowed(true).setUsageHelpWidth(110);
        line.setParameterExceptionHandler((e, unused) -> {
            err.println(e.getMessage());
            CommandLine.UnmatchedArgumentException.printSuggestions(e, err);
            err.println("Try: " + e.getCommandLine().getCommandSpec().qualifiedName() + " --help");
            err.flush();
            return WRONG;
        });
        line.setExecutionExceptionHandler((e, unused, result) -> explain(e, err));
        int status = line.execute(args);
        out.flush();
        err.flush();
        return status;
    }

    /** UTF-8 whatever the platform's default, so that ±, τ and ∞ arrive. */
    public static PrintWriter writer(java.io.OutputStream stream) {
        return new PrintWriter(new java.io.OutputStreamWriter(stream, StandardCharsets.UTF_8), false);
    }

    @Override
    public void run() {
        throw new CommandLine.ParameterException(spec.commandLine(), "A command is missing: "
                + String.join(", ", spec.subcommands().keySet()));
    }

    /** Faults of the user's input in plain words; anything else is a failure of the program and passes on. */
    private static int explain(Exception e, PrintWriter err) throws Exception {
        if (e instanceof FaultyFileException faulty) {
            faulty.faults().forEach(fault -> err.println(fault));
            return WRONG;
        }
        if (e instanceof InadmissibleException inadmissible) {
            for (Finding finding : inadmissible.findings()) {
                err.println("--" + finding);
            }
            return WRONG;
        }
        if (e instanceof RunFailedException || e instanceof EngineRefusedException) {
            err.println(e.getMessage());
            return WRONG;
        }
        if (e instanceof CancellationException) {
            err.println("Stopped.");
            return FAILED;
        }
        err.println("Layerweft failed: " + e);
        err.println("This is a fault of the program, not of your files. What it was doing:");
        e.printStackTrace(err);
        return FAILED;
    }
}
