package layerweft.report;

import java.util.ArrayList;
import java.util.List;
import layerweft.engine.RunControl;
import layerweft.engine.simulation.SimulationSettings;
import layerweft.model.copula.CopulaFamily;
import layerweft.model.portfolio.Portfolio;
import layerweft.model.treaty.Programme;
import layerweft.model.treaty.Treaty;
import layerweft.study.Bounds;
import layerweft.study.Comparison;
import layerweft.study.Drivers;
import layerweft.study.EngineChoice;
import layerweft.study.FigureKind;
import layerweft.study.LimitUse;
import layerweft.study.Quote;
import layerweft.study.Sweep;
import layerweft.study.SweepRequest;

/**
 * Everything that a document tells.
 *
 * @param programmes at least one
 * @param comparison null where there is one programme
 * @param files the portfolio's, then each programme's; empty where nothing was saved yet
 * @param version of the program
 */
public record ReportInput(Portfolio portfolio, SimulationSettings settings, List<OfProgramme> programmes, Comparison comparison,
        List<SourceFile> files, String version) {

    /**
     * The studies of one programme.
     *
     * @param sweep null where there is one peril
     */
    public record OfProgramme(Quote quote, List<LimitUse> uses, Sweep sweep, Bounds bounds, Drivers drivers) {

        public OfProgramme {
            uses = List.copyOf(uses);
        }

        Treaty treaty() {
            return quote.treaty();
        }
    }

    public ReportInput {
        programmes = List.copyOf(programmes);
        files = List.copyOf(files);
    }

    /**
     * Computes it.
     *
     * @param families of the break-evens between programmes; none for no break-evens
     * @throws layerweft.model.InadmissibleException if programmes cannot be compared
     * @throws java.util.concurrent.CancellationException if the control stops it
     */
    public static ReportInput of(Portfolio portfolio, List<Programme> programmes, List<CopulaFamily> families, SimulationSettings settings,
            List<SourceFile> files, String version, RunControl control) {
        Steps steps = new Steps(control, 5L * programmes.size() + 1);
        // first, as it is what can be refused
        Comparison comparison = programmes.size() < 2 ? null : Comparison.of(portfolio, programmes, families, settings, steps);
        steps.done();
        List<OfProgramme> studies = new ArrayList<>();
        for (Programme programme : programmes) {
            studies.add(of(new Treaty(portfolio, programme), settings, steps));
        }
        return new ReportInput(portfolio, settings, studies, comparison, files, version);
    }

    private static OfProgramme of(Treaty treaty, SimulationSettings settings, Steps steps) {
        Quote quote = Quote.of(treaty, EngineChoice.AUTO, settings, steps);
        steps.done();
        List<LimitUse> uses = LimitUse.of(treaty, settings, steps);
        steps.done();
        Sweep sweep = treaty.portfolio().perils().size() < 2 ? null : Sweep.of(treaty, SweepRequest.usual(FigureKind.EXPECTED_LOSS), settings, steps);
        steps.done();
        Bounds bounds = Bounds.of(treaty, steps);
        steps.done();
        Drivers drivers = Drivers.of(treaty, settings, steps);
        steps.done();
        return new OfProgramme(quote, uses, sweep, bounds, drivers);
    }

    /** Tells how many of the studies are done; each of them can be stopped on its way. */
    private static final class Steps implements RunControl {
        private final RunControl outer;
        private final long total;
        private long done;

        Steps(RunControl outer, long total) {
            this.outer = outer;
            this.total = total;
        }

        void done() {
            outer.progress(++done, total);
        }

        @Override
        public void progress(long doneSoFar, long ofAll) {
            // a study's own measure says nothing of the whole
        }

        @Override
        public boolean cancelled() {
            return outer.cancelled();
        }
    }
}
