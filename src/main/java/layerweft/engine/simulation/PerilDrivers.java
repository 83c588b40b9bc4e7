package layerweft.engine.simulation;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import layerweft.engine.RunControl;
import layerweft.figures.Figure;
import layerweft.model.treaty.LayerTerms;
import layerweft.model.treaty.Treaty;

/**
 * Which peril drives each layer and what the buyer keeps (gross less recoveries), in all years and in the bad ones: those with at least the value at
 * risk. The years are those that {@link Simulation} draws for the same seed. They are run twice: first for the values at risk, then for the parts.
 */
public final class PerilDrivers {
    private static final int BITS = 11;
    /** Amounts at a limit may be off it by a rounding. */
    private static final double ROUNDING = 1e-12;
    private final Treaty treaty;
    private final double level;
    private final SimulationSettings settings;
    private final RunControl control;
    private final YearDraw draw;
    private final Batches batches;
    private final int amounts;

    private PerilDrivers(Treaty treaty, double level, SimulationSettings settings, RunControl control) {
        this.treaty = treaty;
        this.level = level;
        this.settings = settings;
        this.control = control;
        draw = new YearDraw(treaty.portfolio(), settings.seed());
        batches = Batches.of(settings.years(), draw);
        amounts = treaty.layers() + 1;
    }

    /**
     * @param level of the value at risk from which years are bad
     * @return for each layer at its share, then for what is kept of all losses
     * @throws java.util.concurrent.CancellationException if the control says so or the calling thread is interrupted
     */
    public static List<PerilShares> run(Treaty treaty, double level, SimulationSettings settings, RunControl control) {
        return new PerilDrivers(treaty, level, settings, control).run();
    }

    private List<PerilShares> run() {
        double[] threshold = thresholds();
        PerilSums[][] byBatch = new PerilSums[batches.count()][];
        new Blocks(batches.count(), batches::yearsOf, settings.years(), new SecondHalf(control)).run(settings.threads(), Workspace::new, (own, batch, years) -> {
            PerilSums[] sums = new PerilSums[amounts];
            Arrays.setAll(sums, k -> new PerilSums(draw.perils()));
            own.run(batch, (count, at) -> {
                for (int k = 0; k < amounts; k++) {
                    sums[k].add(own.whole[k], own.parts[k], at, threshold[k]);
                }
            });
            byBatch[(int) batch] = sums;
        });
        List<PerilShares> shares = new ArrayList<>();
        for (int k = 0; k < amounts; k++) {
            shares.add(shares(byBatch, k, threshold[k]));
        }
        return shares;
    }

    /** The value at risk of each amount, or the smallest one above 0 where that is higher. */
    private double[] thresholds() {
        AmountSketch[] sketches = null;
        for (Sketched one : new Blocks(batches.count(), batches::yearsOf, settings.years(), new FirstHalf(control)).run(settings.threads(), Sketched::new,
                (own, batch, years) -> own.workspace.run(batch, (count, at) -> own.add(at)))) {
            if (sketches == null) {
                sketches = one.sketches;
            } else {
                for (int k = 0; k < amounts; k++) {
                    sketches[k].merge(one.sketches[k]);
                }
            }
        }
        return Arrays.stream(sketches).mapToDouble(s -> Math.max(Double.MIN_VALUE, s.law().quantile(level) * (1 - ROUNDING))).toArray();
    }

    private PerilShares shares(PerilSums[][] byBatch, int amount, double threshold) {
        PerilSums all = new PerilSums(draw.perils());
        double[][][] each = new double[byBatch.length][][];
        for (int b = 0; b < byBatch.length; b++) {
            all.add(byBatch[b][amount]);
            each[b] = byBatch[b][amount].figures();
        }
        double[][] pooled = all.figures();
        List<List<Figure>> figures = new ArrayList<>();
        for (int f = 0; f < pooled.length; f++) {
            List<Figure> ofPerils = new ArrayList<>();
            for (int i = 0; i < draw.perils(); i++) {
                int kind = f;
                int peril = i;
                // a batch without a bad year says nothing of bad years
                double[] values = Arrays.stream(each).mapToDouble(e -> e[kind][peril]).filter(v -> !Double.isNaN(v)).toArray();
                ofPerils.add(Double.isNaN(pooled[f][i]) ? Figure.UNDEFINED : Batches.figure(pooled[f][i], values));
            }
            figures.add(ofPerils);
        }
        return new PerilShares(threshold, (double) all.badYears / all.years, figures.get(0), figures.get(1), figures.get(2), figures.get(3));
    }

    /** What is done with the amounts of a block. */
    private interface Each {
        void block(long block, int years);
    }

    /** What one thread works with: the years of a block as whole amounts and parts by peril. */
    private final class Workspace {
        private final PerilYears[] perils = draw.workspace(batches.mostYears());
        private final double[][] scores = new double[draw.perils()][batches.mostYears()];
        private final TermsApplied applied = TermsApplied.of(treaty);
        private final YearAmounts out = YearAmounts.byPeril(treaty, batches.mostYears());
        private final double[][] whole = new double[amounts][batches.mostYears()];
        private final double[][][] parts = new double[amounts][draw.perils()][batches.mostYears()];

        void run(long batch, Each each) {
            for (long block = batches.firstBlock(batch); block < batches.firstBlock(batch + 1); block++) {
                int years = batches.yearsOfBlock(block);
                draw.draw(block, years, perils, scores);
                out.clear(years);
                applied.apply(perils, years, draw, block, out);
                split(years);
                each.block(block, years);
            }
        }

        private void split(int years) {
            int kept = amounts - 1;
            for (int i = 0; i < draw.perils(); i++) {
                System.arraycopy(out.grossOf[i], 0, parts[kept][i], 0, years);
            }
            System.arraycopy(out.gross, 0, whole[kept], 0, years);
            for (int j = 0; j < kept; j++) {
                LayerTerms terms = treaty.layer(j).terms();
                double share = treaty.layer(j).share();
                for (int y = 0; y < years; y++) {
                    double loss = share * terms.annualLoss(out.sum[j][y]);
                    double perSum = loss > 0 ? loss / out.sum[j][y] : 0;
                    whole[j][y] = loss;
                    whole[kept][y] -= loss;
                    for (int i = 0; i < draw.perils(); i++) {
                        double part = perSum * out.sumOf[j][i][y];
                        parts[j][i][y] = part;
                        parts[kept][i][y] -= part;
                    }
                }
            }
        }
    }

    /** A workspace with the laws of the amounts. */
    private final class Sketched {
        private final Workspace workspace = new Workspace();
        private final AmountSketch[] sketches = new AmountSketch[amounts];

        Sketched() {
            for (int k = 0; k < amounts; k++) {
                double unit = k < treaty.layers() ? AmountSketch.unitFor(treaty.layer(k).share() * treaty.layer(k).terms().line(), BITS) : 1;
                sketches[k] = new AmountSketch(BITS, unit);
            }
        }

        void add(int years) {
            for (int k = 0; k < amounts; k++) {
                sketches[k].add(workspace.whole[k], years);
            }
        }
    }

    /** The first of two runs. */
    private record FirstHalf(RunControl whole) implements RunControl {
        @Override
        public void progress(long done, long total) {
            whole.progress(done, 2 * total);
        }

        @Override
        public boolean cancelled() {
            return whole.cancelled();
        }
    }

    /** The second of two runs. */
    private record SecondHalf(RunControl whole) implements RunControl {
        @Override
        public void progress(long done, long total) {
            whole.progress(total + done, 2 * total);
        }

        @Override
        public boolean cancelled() {
            return whole.cancelled();
        }
    }
}
