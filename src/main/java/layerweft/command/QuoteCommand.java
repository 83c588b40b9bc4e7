package layerweft.command;

import java.util.concurrent.Callable;
import layerweft.model.treaty.Treaty;
import layerweft.study.EngineChoice;
import layerweft.study.Quote;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Spec;

/** {@code quote}: the figures of a programme on a portfolio. */
@Command(name = "quote", sortOptions = false, mixinStandardHelpOptions = true, versionProvider = Version.class,
        description = "Price a programme on a portfolio: expected layer loss, loss on line, technical premium, each with its error.",
        footerHeading = "%nExamples:%n", footer = {
            "  quote book.json cats.json",
            "  quote book.json cats.json --years 5000000 --seed 7 --format json --out quote.json",
            "  quote book.json cats.json --engine simulation --threads 1",
            "", "Exit status: 0 done, 1 a failure of the program, 2 the command or a file is wrong."})
final class QuoteCommand implements Callable<Integer> {
    @Spec
    private CommandSpec spec;

    @Mixin
    private TreatyFiles files;

    @Option(names = "--engine", paramLabel = "auto|transform|simulation", defaultValue = "auto",
            description = "auto: the transform for each layer that it can price, simulation for the rest (default: ${DEFAULT-VALUE}).")
    private EngineChoice engine;

    @Mixin
    private SimulationOptions simulation;

    @Mixin
    private OutputOptions output;

    @Override
    public Integer call() {
        output.checkTarget();
        Treaty treaty = files.read();
        try (Progress progress = new Progress("quote")) {
            Quote quote = Quote.of(treaty, engine, simulation.settings(), progress);
            output.write(answer(quote), spec.commandLine().getOut());
        }
        return 0;
    }

    private String answer(Quote quote) {
        return switch (output.format()) {
            case TEXT -> QuoteText.of(quote);
            case JSON -> QuoteJson.of(quote);
            case CSV -> QuoteCsv.of(quote);
        };
    }
}
