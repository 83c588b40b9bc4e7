package layerweft.command;

import java.io.PrintWriter;
import layerweft.engine.simulation.SimulationSettings;
import layerweft.file.DemoFiles;
import layerweft.model.treaty.Treaty;
import layerweft.study.EngineChoice;
import layerweft.study.Quote;

/** What a newcomer sees without a display: the demo portfolio priced under its programme, and how to go on. */
public final class Demo {

    private Demo() {}

    /** Prints the demo's quote; returns the exit status. */
    public static int show(PrintWriter out, PrintWriter err) {
        Treaty treaty = DemoFiles.treaty();
        try (Progress progress = new Progress("demo")) {
            out.print(QuoteText.of(Quote.of(treaty, EngineChoice.AUTO, SimulationSettings.usual(), progress)));
        }
        out.println();
        out.println("This is the demo, " + DemoFiles.PORTFOLIO + " under " + DemoFiles.PROGRAMME + ". To price files of your own: "
                + "quote PORTFOLIO PROGRAMME; for all commands: --help.");
        return 0;
    }
}
