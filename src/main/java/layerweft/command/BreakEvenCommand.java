package layerweft.command;

import java.nio.file.Path;
import java.util.concurrent.Callable;
import layerweft.file.TreatyReader;
import layerweft.model.treaty.Treaty;
import layerweft.study.BreakEven;
import layerweft.study.SweepRequest;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;

/** {@code break-even}: at which strength of dependence one programme becomes cheaper than another. */
@Command(name = "break-even", sortOptions = false, mixinStandardHelpOptions = true, versionProvider = Version.class,
        description = "Find the strength of dependence at which one programme becomes cheaper for the buyer than another; quoted premiums, "
                + "technical where none is quoted.",
        footerHeading = "%nExamples:%n", footer = {
            "  break-even book.json cats.json aggregate.json",
            "  break-even book.json cats.json aggregate.json --families gumbel,clayton --format json",
            "", "Exit status: 0 done, 1 a failure of the program, 2 the command or a file is wrong."})
final class BreakEvenCommand implements Callable<Integer> {
    @Spec
    private CommandSpec spec;

    @Parameters(index = "0", paramLabel = "PORTFOLIO", description = "Portfolio file (JSON). Its own copula is not looked at, its links are.")
    private Path portfolio;

    @Parameters(index = "1", paramLabel = "PROGRAMME", description = "First programme file (JSON).")
    private Path first;

    @Parameters(index = "2", paramLabel = "PROGRAMME", description = "Second programme file (JSON).")
    private Path second;

    @Option(names = "--families", paramLabel = "A,B,…", description = "Families, written as gumbel, survival-clayton, student:4 "
            + "(default: gumbel,student:4,frank,survival-clayton,joe,gaussian,clayton).")
    private String families;

    @Option(names = "--measure", paramLabel = "expectedCost|costOfRisk", defaultValue = "expectedCost", converter = MeasureConverter.class,
            description = "expectedCost: premiums with expected reinstatement premium less expected recoveries. costOfRisk: expected net position and "
                    + "the first programme's cost of capital on its tail (default: ${DEFAULT-VALUE}).")
    private BreakEven.Measure measure;

    @Mixin
    private SimulationOptions simulation;

    @Mixin
    private OutputOptions output;

    @Override
    public Integer call() {
        output.checkTarget();
        var asked = StudyOptions.families(families, SweepRequest.USUAL_FAMILIES);
        Treaty one = TreatyReader.read(portfolio, first);
        Treaty other = TreatyReader.read(portfolio, second);
        try (Progress progress = new Progress("break-even")) {
            BreakEven found = BreakEven.of(one.portfolio(), one.programme(), other.programme(), measure, asked, simulation.settings(), progress);
            output.write(answer(found), spec.commandLine().getOut());
        }
        return 0;
    }

    private String answer(BreakEven found) {
        return switch (output.format()) {
            case TEXT -> BreakEvenText.of(found);
            case JSON -> BreakEvenOutput.json(found);
            case CSV -> BreakEvenOutput.csv(found);
        };
    }
}
