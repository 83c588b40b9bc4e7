package layerweft.command;

import java.util.Optional;
import java.util.concurrent.Callable;
import layerweft.model.treaty.Treaty;
import layerweft.study.FigureKind;
import layerweft.study.Ranking;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Spec;

/** {@code rank}: which assumption moves a price most. */
@Command(name = "rank", sortOptions = false, mixinStandardHelpOptions = true, versionProvider = Version.class,
        description = "Rank assumptions by how much they move a figure: 0.1 of Kendall's τ, another family, 10 %% of each peril's frequency, "
                + "severity and tail, one at a time.",
        footerHeading = "%nExamples:%n", footer = {
            "  rank book.json cats.json",
            "  rank book.json cats.json --layer \"First cat layer\" --figure lossOnLine --format csv",
            "", "Exit status: 0 done, 1 a failure of the program, 2 the command or a file is wrong."})
final class RankCommand implements Callable<Integer> {
    @Spec
    private CommandSpec spec;

    @Mixin
    private TreatyFiles files;

    @Option(names = "--layer", paramLabel = "NAME", description = "Layer to look at (default: the sum over the programme).")
    private String layer;

    @Option(names = "--figure", paramLabel = "NAME", defaultValue = "expectedLoss", description = "Figure (default: ${DEFAULT-VALUE}).")
    private String figure;

    @Mixin
    private SimulationOptions simulation;

    @Mixin
    private OutputOptions output;

    @Override
    public Integer call() {
        output.checkTarget();
        FigureKind kind = FigureKind.parse(figure);
        Treaty treaty = files.read();
        try (Progress progress = new Progress("rank")) {
            Ranking ranking = Ranking.of(treaty, Optional.ofNullable(layer), kind, simulation.settings(), progress);
            output.write(answer(ranking), spec.commandLine().getOut());
        }
        return 0;
    }

    private String answer(Ranking ranking) {
        return switch (output.format()) {
            case TEXT -> RankText.of(ranking);
            case JSON -> RankOutput.json(ranking);
            case CSV -> RankOutput.csv(ranking);
        };
    }
}
