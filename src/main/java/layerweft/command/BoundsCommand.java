package layerweft.command;

import java.util.concurrent.Callable;
import layerweft.model.treaty.Treaty;
import layerweft.study.Bounds;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Spec;

/** {@code bounds}: the range of each layer's expected loss over every dependence. */
@Command(name = "bounds", sortOptions = false, mixinStandardHelpOptions = true, versionProvider = Version.class,
        description = "The lowest and highest expected loss of each layer over every dependence between the perils' annual losses: what is "
                + "proven, and what a dependence that was found attains.",
        footerHeading = "%nExamples:%n", footer = {
            "  bounds book.json cats.json",
            "  bounds book.json cats.json --format json --out bounds.json",
            "", "Exit status: 0 done, 1 a failure of the program, 2 the command or a file is wrong."})
final class BoundsCommand implements Callable<Integer> {
    @Spec
    private CommandSpec spec;

    @Mixin
    private TreatyFiles files;

    @Mixin
    private OutputOptions output;

    @Override
    public Integer call() {
        output.checkTarget();
        Treaty treaty = files.read();
        try (Progress progress = new Progress("bounds")) {
            output.write(answer(Bounds.of(treaty, progress)), spec.commandLine().getOut());
        }
        return 0;
    }

    private String answer(Bounds bounds) {
        return switch (output.format()) {
            case TEXT -> BoundsText.of(bounds);
            case JSON -> BoundsJson.of(bounds);
            case CSV -> BoundsCsv.of(bounds);
        };
    }
}
