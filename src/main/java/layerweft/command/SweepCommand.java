package layerweft.command;

import java.util.concurrent.Callable;
import layerweft.model.treaty.Treaty;
import layerweft.study.FigureKind;
import layerweft.study.Sweep;
import layerweft.study.SweepRequest;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Spec;

/** {@code sweep}: how the layers move with the family and the strength of dependence. */
@Command(name = "sweep", sortOptions = false, mixinStandardHelpOptions = true, versionProvider = Version.class,
        description = "Price a programme under families of copulas of rising strength: how dependence between the perils moves each layer.",
        footerHeading = "%nExamples:%n", footer = {
            "  sweep book.json cats.json",
            "  sweep book.json cats.json --families gumbel,survival-clayton,student:4 --taus 0,0.2,0.4 --format csv --out sweep.csv",
            "  sweep book.json cats.json --figure exhaustionProbability --check 100000",
            "", "Exit status: 0 done, 1 a failure of the program, 2 the command or a file is wrong."})
final class SweepCommand implements Callable<Integer> {
    @Spec
    private CommandSpec spec;

    @Mixin
    private TreatyFiles files;

    @Option(names = "--families", paramLabel = "A,B,…", description = "Families, written as gumbel, survival-clayton, student:4 "
            + "(default: gumbel,student:4,frank,survival-clayton,joe,gaussian,clayton).")
    private String families;

    @Option(names = "--taus", paramLabel = "T,T,…", description = "Values of Kendall's τ (default: 0 to 0.9 by 0.1).")
    private String taus;

    @Option(names = "--figure", paramLabel = "NAME", defaultValue = "expectedLoss",
            description = "Figure whose value, lift, slope and spread are shown (default: ${DEFAULT-VALUE}).")
    private String figure;

    @Option(names = "--check", paramLabel = "N", defaultValue = "0",
            description = "Simulate so many years beside every point, for comparison (default: none).")
    private long check;

    @Mixin
    private SimulationOptions simulation;

    @Mixin
    private OutputOptions output;

    @Override
    public Integer call() {
        output.checkTarget();
        SweepRequest request = new SweepRequest(StudyOptions.families(families, SweepRequest.USUAL_FAMILIES),
                StudyOptions.taus(taus, SweepRequest.USUAL_TAUS), FigureKind.parse(figure), check);
        Treaty treaty = files.read();
        try (Progress progress = new Progress("sweep")) {
            Sweep sweep = Sweep.of(treaty, request, simulation.settings(), progress);
            output.write(answer(sweep), spec.commandLine().getOut());
        }
        return 0;
    }

    private String answer(Sweep sweep) {
        return switch (output.format()) {
            case TEXT -> SweepText.of(sweep);
            case JSON -> SweepJson.of(sweep);
            case CSV -> SweepCsv.of(sweep);
        };
    }
}
