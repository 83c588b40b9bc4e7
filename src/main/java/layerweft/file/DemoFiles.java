package layerweft.file;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import layerweft.model.portfolio.Portfolio;
import layerweft.model.treaty.Programme;
import layerweft.model.treaty.Treaty;

/** The demo portfolios and programmes that travel with the program, named as in its source folders. All of it is invented. */
public final class DemoFiles {
    /** The portfolio shown first. */
    public static final String PORTFOLIO = "demo-portfolios/harrow-coast.json";
    /** The programme shown first. */
    public static final String PROGRAMME = "treaties/harrow-coast-two-layers.json";

    private static final String FOLDER = "/layerweft/demo/";

    private DemoFiles() {}

    /** The treaty shown first. */
    public static Treaty treaty() {
        return treaty(PORTFOLIO, PROGRAMME);
    }

    /** A demo portfolio under a demo programme, both by name, e.g. {@link #PORTFOLIO} and {@link #PROGRAMME}. */
    public static Treaty treaty(String portfolio, String programme) {
        return new Treaty(portfolio(portfolio), programme(programme));
    }

    /** The demo portfolio of that name. */
    public static Portfolio portfolio(String name) {
        return PortfolioReader.read(name, bytes(name));
    }

    /** The demo programme of that name. */
    public static Programme programme(String name) {
        return ProgrammeReader.read(name, bytes(name));
    }

    /**
     * The demo file of that name, as it is.
     *
     * @throws IllegalArgumentException if there is no such demo file
     */
    public static byte[] bytes(String name) {
        try (InputStream in = DemoFiles.class.getResourceAsStream(FOLDER + name)) {
            if (in == null) {
                throw new IllegalArgumentException("no demo file " + name);
            }
            return in.readAllBytes();
        } catch (IOException e) {
            throw new UncheckedIOException("reading the demo file " + name, e);
        }
    }
}
