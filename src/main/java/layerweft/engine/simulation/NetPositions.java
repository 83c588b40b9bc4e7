package layerweft.engine.simulation;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.stream.IntStream;
import layerweft.engine.RunControl;
import layerweft.model.portfolio.Portfolio;
import layerweft.model.treaty.LayerTerms;
import layerweft.model.treaty.Treaty;

/**
 * The buyer's net positions under several programmes on one portfolio, from the same years: events, counts and times are those that
 * {@link Simulation} draws for the same seed, so that differences between programmes have only the noise of what differs.
 * Errors are by {@link Batches}.
 */
public final class NetPositions {
    private static final int BITS = 11;

    /**
     * A programme with what is paid for it.
     *
     * @param upfront premium of each layer at its share, finite, in the portfolio's unit
     */
    public record Structure(Treaty treaty, double[] upfront) {}

    /**
     * Samples of the same years.
     *
     * @param net position under each programme, in order
     * @param recovered under each programme
     */
    public record Result(PositionSample gross, List<PositionSample> net, List<PositionSample> recovered) {}

    private final Portfolio portfolio;
    private final List<Structure> structures;
    private final List<Double> levels;
    private final double tailLevel;
    private final SimulationSettings settings;
    private final RunControl control;
    private final YearDraw draw;
    private final Batches batches;
    /** By batch: gross, then net position and recoveries of each programme. */
    private final YearTotals[][] byBatch;

    private NetPositions(Portfolio portfolio, List<Structure> structures, List<Double> levels, double tailLevel, SimulationSettings settings,
            RunControl control) {
        this.portfolio = portfolio;
        this.structures = structures;
        this.levels = levels;
        this.tailLevel = tailLevel;
        this.settings = settings;
        this.control = control;
        draw = new YearDraw(portfolio, settings.seed());
        batches = Batches.of(settings.years(), draw);
        byBatch = new YearTotals[batches.count()][];
    }

    /**
     * Runs the years through all programmes.
     *
     * @param levels of the values at risk
     * @param tailLevel of the tail value at risk
     * @return gross, and for each programme the net position and what is recovered
     * @throws java.util.concurrent.CancellationException if the control says so or the calling thread is interrupted
     */
    public static Result run(Portfolio portfolio, List<Structure> structures, List<Double> levels, double tailLevel,
            SimulationSettings settings, RunControl control) {
        return new NetPositions(portfolio, List.copyOf(structures), List.copyOf(levels), tailLevel, settings, control).run();
    }

    private Result run() {
        new Blocks(batches.count(), batches::yearsOf, settings.years(), control).run(settings.threads(), this::workspace, this::batch);
        GrossMoments known = GrossMoments.of(portfolio);
        boolean infiniteMean = known.mean() == Double.POSITIVE_INFINITY;
        List<PositionSample> net = new ArrayList<>();
        List<PositionSample> recovered = new ArrayList<>();
        for (int s = 0; s < structures.size(); s++) {
            Treaty treaty = structures.get(s).treaty();
            int[] open = IntStream.range(0, treaty.layers()).filter(j -> open(treaty.layer(j).terms())).toArray();
            // what is kept of an unlimited loss is unlimited, unless a layer takes it without a limit
            net.add(sample(1 + 2 * s, open.length == 0 && infiniteMean, open.length == 0 && !known.finiteVariance()));
            recovered.add(sample(2 + 2 * s, Arrays.stream(open).anyMatch(j -> OccurrenceMoments.of(treaty, j).mean() == Double.POSITIVE_INFINITY),
                    Arrays.stream(open).anyMatch(j -> !OccurrenceMoments.of(treaty, j).finiteVariance())));
        }
        return new Result(sample(0, infiniteMean, !known.finiteVariance()), net, recovered);
    }

    private static boolean open(LayerTerms terms) {
        return terms.annualLimit() == Double.POSITIVE_INFINITY && terms.occurrenceLimit() == Double.POSITIVE_INFINITY;
    }

    private PositionSample sample(int position, boolean infiniteMean, boolean infiniteVariance) {
        YearTotals all = new YearTotals(BITS);
        double[][] figures = new double[batches.count()][];
        for (int b = 0; b < figures.length; b++) {
            figures[b] = byBatch[b][position].figures(levels, tailLevel);
            all.add(byBatch[b][position]);
        }
        return new PositionSample(levels, all.figures(levels, tailLevel), figures, infiniteMean, infiniteVariance);
    }

    /** What one thread works with. */
    private final class Workspace {
        private final PerilYears[] perils;
        private final double[][] scores;
        private final TermsApplied[] applied;
        private final YearAmounts[] amounts;
        private final NetYears[] net;

        Workspace() {
            int years = batches.mostYears();
            perils = draw.workspace(years);
            scores = new double[draw.perils()][years];
            applied = structures.stream().map(s -> TermsApplied.of(s.treaty())).toArray(TermsApplied[]::new);
            amounts = structures.stream().map(s -> YearAmounts.of(s.treaty(), years)).toArray(YearAmounts[]::new);
            net = structures.stream().map(s -> new NetYears(s.treaty(), s.upfront(), years)).toArray(NetYears[]::new);
        }
    }

    private Workspace workspace() {
        return new Workspace();
    }

    private void batch(Workspace own, long batch, int yearsOfBatch) {
        YearTotals[] totals = new YearTotals[1 + 2 * structures.size()];
        Arrays.setAll(totals, s -> new YearTotals(BITS));
        for (long block = batches.firstBlock(batch); block < batches.firstBlock(batch + 1); block++) {
            int years = batches.yearsOfBlock(block);
            draw.draw(block, years, own.perils, own.scores);
            for (int s = 0; s < own.net.length; s++) {
                own.amounts[s].clear(years);
                own.applied[s].apply(own.perils, years, draw, block, own.amounts[s]);
                own.net[s].of(own.amounts[s], years);
                if (s == 0) {
                    totals[0].add(own.amounts[s].gross, years);
                }
                totals[1 + 2 * s].add(own.net[s].net, years);
                totals[2 + 2 * s].add(own.net[s].recoveries, years);
            }
        }
        byBatch[(int) batch] = totals;
    }
}
