package layerweft.command;

import java.nio.file.Path;
import layerweft.file.TreatyReader;
import layerweft.model.treaty.Treaty;
import picocli.CommandLine.Parameters;

/** The two files that most commands start from. */
final class TreatyFiles {

    @Parameters(index = "0", paramLabel = "PORTFOLIO", description = "Portfolio file (JSON).")
    private Path portfolio;

    @Parameters(index = "1", paramLabel = "PROGRAMME", description = "Programme file (JSON).")
    private Path programme;

    /** @throws layerweft.file.FaultyFileException with every fault of both */
    Treaty read() {
        return TreatyReader.read(portfolio, programme);
    }
}
