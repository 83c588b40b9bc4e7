package layerweft.engine.simulation;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import java.util.concurrent.CancellationException;
import layerweft.engine.RunControl;
import layerweft.figures.LayerStatistics;
import layerweft.figures.WholeStatistics;
import layerweft.model.treaty.Treaty;

/**
 * Prices any treaty by simulating years in blocks. Every block has streams of its own keyed by (seed, block); blocks are handed to the
 * threads as they come free, counts are integers and sums are added in the order of the blocks: the same seed gives the same bits
 * with any number of threads. Memory does not grow with the number of years.
 */
public final class Simulation {
    /** Years of a block where years are independent: workspaces stay in the processor's cache. */
    static final int BLOCK = 4_096;
    /** Years of a block within which annual totals are rearranged. */
    static final int REARRANGED_BLOCK = 65_536;
    /** Fewest full blocks from which batch means give a standard error worth having. */
    private static final int FEWEST_BATCHES = 8;
    /** Beyond this many years quantiles are so sharp that finer cells are worth their memory. */
    private static final long FINE_FROM = 4_000_000;
    private static final int BITS = 11;
    private static final int FINE_BITS = 13;

    private final Treaty treaty;
    private final SimulationSettings settings;
    private final RunControl control;
    private final YearDraw draw;
    private final int blockYears;
    private final long blocks;
    private final int bits;
    private final Estimates estimates;

    private final OrderedSums sums = new OrderedSums();
    private final Map<Long, List<LayerStatistics>> layersByBlock = new TreeMap<>();
    private final Map<Long, WholeStatistics> wholeByBlock = new TreeMap<>();

    private Simulation(Treaty treaty, SimulationSettings settings, RunControl control) {
        this.treaty = treaty;
        this.settings = settings;
        this.control = control;
        draw = new YearDraw(treaty.portfolio(), settings.seed());
        blockYears = draw.rearranges() ? REARRANGED_BLOCK : BLOCK;
        blocks = (settings.years() + blockYears - 1) / blockYears;
        bits = settings.years() > FINE_FROM ? FINE_BITS : BITS;
        estimates = new Estimates(treaty);
    }

    /**
     * Runs a simulation to its end.
     *
     * @throws CancellationException if the control says so or the calling thread is interrupted
     */
    public static SimulationResult run(Treaty treaty, SimulationSettings settings, RunControl control) {
        return new Simulation(treaty, settings, control).run();
    }

    private SimulationResult run() {
        Sketches all = null;
        for (Workspace one : new Blocks(blocks, this::years, settings.years(), control).run(settings.threads(), this::workspace, this::block)) {
            if (all == null) {
                all = one.sketches;
            } else {
                all.merge(one.sketches);
            }
        }
        return result(sums.total(), all);
    }

    private int years(long block) {
        return (int) Math.min(blockYears, settings.years() - block * blockYears);
    }

    /** What one thread works with. */
    private record Workspace(Worker worker, Sketches sketches) {}

    private Workspace workspace() {
        return new Workspace(new Worker(treaty, draw, (int) Math.min(blockYears, settings.years())), new Sketches(treaty, bits));
    }

    private void block(Workspace own, long block, int years) {
        if (!draw.rearranges()) {
            sums.add(block, own.worker.simulate(block, years, own.sketches));
            return;
        }
        Sketches ofBlock = new Sketches(treaty, bits);
        BlockSums blockSums = own.worker.simulate(block, years, ofBlock);
        keepBatch(block, years, blockSums, ofBlock);
        own.sketches.merge(ofBlock);
        sums.add(block, blockSums);
    }

    private void keepBatch(long block, int years, BlockSums blockSums, Sketches ofBlock) {
        if (years == blockYears) {
            List<LayerStatistics> layers = estimates.layers(blockSums, ofBlock);
            WholeStatistics whole = estimates.whole(blockSums, ofBlock);
            synchronized (layersByBlock) {
                layersByBlock.put(block, layers);
                wholeByBlock.put(block, whole);
            }
        }
    }

    private SimulationResult result(BlockSums total, Sketches all) {
        List<LayerStatistics> layers = estimates.layers(total, all);
        WholeStatistics whole = estimates.whole(total, all);
        if (layersByBlock.size() >= FEWEST_BATCHES) {
            List<LayerStatistics> batched = new ArrayList<>();
            for (int j = 0; j < layers.size(); j++) {
                int layer = j;
                batched.add(BlockMeans.layer(layers.get(j), layersByBlock.values().stream().map(b -> b.get(layer)).toList()));
            }
            return new SimulationResult(settings, batched, BlockMeans.whole(whole, List.copyOf(wholeByBlock.values())));
        }
        return new SimulationResult(settings, layers, whole);
    }
}
