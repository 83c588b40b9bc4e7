package layerweft.command;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.Callable;
import layerweft.file.TreatyReader;
import layerweft.model.copula.CopulaFamily;
import layerweft.model.treaty.Programme;
import layerweft.model.treaty.Treaty;
import layerweft.study.Comparison;
import layerweft.study.SweepRequest;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;

/** {@code compare}: programmes side by side for their buyer. */
@Command(name = "compare", sortOptions = false, mixinStandardHelpOptions = true, versionProvider = Version.class,
        description = "Compare programmes on one portfolio, from the same simulated years: cost of cover, net position, relief, which are beaten, and "
                + "at which strength of dependence the choice turns. Quoted premiums, technical where none is quoted; return periods, tail level and "
                + "cost of capital are those of the first programme.",
        footerHeading = "%nExamples:%n", footer = {
            "  compare book.json cats.json aggregate.json",
            "  compare book.json cats.json aggregate.json drop-down.json --families gumbel,gaussian --format json",
            "  compare book.json cats.json aggregate.json --families none --years 5000000",
            "", "Exit status: 0 done, 1 a failure of the program, 2 the command or a file is wrong."})
final class CompareCommand implements Callable<Integer> {
    private static final String NONE = "none";

    @Spec
    private CommandSpec spec;

    @Parameters(index = "0", paramLabel = "PORTFOLIO", description = "Portfolio file (JSON).")
    private Path portfolio;

    @Parameters(index = "1..*", arity = "2..*", paramLabel = "PROGRAMME", description = "Programme files (JSON), two or more.")
    private List<Path> programmes;

    @Option(names = "--families", paramLabel = "A,B,…", description = "Families of the break-evens, written as gumbel, survival-clayton, student:4; "
            + "none: no break-evens (default: gumbel,student:4,frank,survival-clayton,joe,gaussian,clayton).")
    private String families;

    @Mixin
    private SimulationOptions simulation;

    @Mixin
    private OutputOptions output;

    @Override
    public Integer call() {
        output.checkTarget();
        var asked = NONE.equals(families) ? List.<CopulaFamily>of() : StudyOptions.families(families, SweepRequest.USUAL_FAMILIES);
        List<Programme> read = new ArrayList<>();
        Treaty last = null;
        for (Path file : programmes) {
            last = TreatyReader.read(portfolio, file);
            read.add(last.programme());
        }
        try (Progress progress = new Progress("compare")) {
            Comparison found = Comparison.of(last.portfolio(), read, asked, simulation.settings(), progress);
            output.write(answer(found), spec.commandLine().getOut());
        }
        return 0;
    }

    private String answer(Comparison found) {
        return switch (output.format()) {
            case TEXT -> CompareText.of(found);
            case JSON -> CompareJson.of(found);
            case CSV -> CompareCsv.of(found);
        };
    }
}
