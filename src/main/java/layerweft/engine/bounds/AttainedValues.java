package layerweft.engine.bounds;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;

/**
 * Extreme values of a layer's expected loss that joint laws reach. The laws' upper parts, as far down as any peril has losses, are cut into
 * slices of the same chance; rearranging the slices gives a joint law (inside a row of slices the perils run in parallel), and the
 * value stated is the exact expectation under that law.
 */
final class AttainedValues {
    private static final int SLICES = 2048;
    private static final int STARTS_KEPT = 2;
    private static final int EXCHANGES = 200_000;
    private final Margin[] margins;
    private final AnnualLayer layer;
    private final double width;
    private final double[][] columns;

    AttainedValues(Margin[] margins, AnnualLayer layer) {
        this.margins = margins;
        this.layer = layer;
        double chance = 0;
        for (Margin m : margins) {
            chance += m.chance();
        }
        // below this chance all perils are free of loss: enough room for losses that exclude each other, and finer slices where it matters
        this.width = Math.min(1, chance);
        this.columns = new double[margins.length][];
        for (int i = 0; i < margins.length; i++) {
            columns[i] = margins[i].slices(width, SLICES);
        }
    }

    double high() {
        return search(1);
    }

    double low() {
        return search(-1);
    }

    private record Start(int block, double value) {}

    private double search(int sign) {
        List<Start> starts = new ArrayList<>();
        Rearrangement matrix = new Rearrangement(columns);
        for (int block : blocks()) {
            arrange(matrix, block, sign, 6);
            starts.add(new Start(block, sign * matrix.mean(layer)));
        }
        starts.sort(Comparator.comparingDouble(Start::value).reversed());
        double best = Double.NEGATIVE_INFINITY;
        for (Start start : starts.subList(0, Math.min(STARTS_KEPT, starts.size()))) {
            arrange(matrix, start.block, sign, 40);
            matrix.improve(layer, sign, 20);
            matrix.exchange(layer, sign, EXCHANGES);
            best = Math.max(best, sign * expectation(matrix, sign));
        }
        return sign * best;
    }

    /** Sizes of the upper block that are tried. */
    private static int[] blocks() {
        return new int[] {0, SLICES / 256, SLICES / 128, SLICES / 64, SLICES / 32, SLICES / 16, SLICES / 11, SLICES / 8, SLICES * 3 / 16,
            SLICES / 4, SLICES * 3 / 8, SLICES / 2, SLICES * 3 / 4, SLICES};
    }

    /** Upper block flattened and the rest alongside to raise the mean; upper block alongside and the rest flattened to lower it. */
    private static void arrange(Rearrangement matrix, int block, int sign, int sweeps) {
        matrix.alongside();
        if (sign > 0) {
            matrix.flatten(0, block, sweeps);
        } else {
            matrix.flatten(block, SLICES, sweeps);
        }
    }

    /** Row by row: all perils the same way, or the widest slice the other way, whichever is better. */
    private double expectation(Rearrangement matrix, int sign) {
        ParallelRun run = new ParallelRun(margins, layer);
        double length = width / SLICES;
        double[] from = new double[margins.length];
        double total = 0;
        for (int r = 0; r < SLICES; r++) {
            int widest = 0;
            double most = -1;
            for (int i = 0; i < margins.length; i++) {
                int rank = matrix.rank(i, r);
                from[i] = rank * length;
                double range = margins[i].value(margins[i].atomFrom(from[i])) - margins[i].value(margins[i].atomBelow(from[i] + length));
                if (range > most) {
                    most = range;
                    widest = i;
                }
            }
            double along = run.integral(from, length, -1);
            double against = run.integral(from, length, widest);
            total += sign * Math.max(sign * along, sign * against);
        }
        return total;
    }
}
