package layerweft.command;

import java.io.PrintWriter;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.Callable;
import layerweft.file.Fault;
import layerweft.file.FileCheck;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;

/** {@code check}: every fault of the files, not just the first. */
@Command(name = "check", mixinStandardHelpOptions = true, versionProvider = Version.class,
        description = "Say whether portfolio and programme files are valid, with every fault they have. Programmes given with a portfolio "
                + "are also checked against it.",
        footerHeading = "%nExamples:%n", footer = {"  check book.json", "  check book.json cats.json aggregate.json"})
final class CheckCommand implements Callable<Integer> {
    @Spec
    private CommandSpec spec;

    @Parameters(arity = "1..*", paramLabel = "FILE", description = "Portfolio and programme files, in any order.")
    private List<Path> files;

    @Override
    public Integer call() {
        List<String> valid = new ArrayList<>();
        List<Fault> faults = FileCheck.of(files, valid::add);
        if (!faults.isEmpty()) {
            PrintWriter err = spec.commandLine().getErr();
            faults.forEach(err::println);
            err.println(faults.size() == 1 ? "1 fault" : faults.size() + " faults");
            return 2;
        }
        valid.forEach(spec.commandLine().getOut()::println);
        return 0;
    }
}
