package layerweft.engine.simulation;

import java.util.ArrayList;
import java.util.List;
import java.util.function.Predicate;
import layerweft.figures.LayerStatistics;
import layerweft.figures.PositionStatistics;
import layerweft.figures.WholeStatistics;
import layerweft.model.treaty.Treaty;

/** From sums and sketches to the figures of all layers and of the whole. Immutable: serves every block and their total alike. */
final class Estimates {
    private final Treaty treaty;
    private final OccurrenceMoments[] known;
    private final GrossMoments gross;

    Estimates(Treaty treaty) {
        this.treaty = treaty;
        known = new OccurrenceMoments[treaty.layers()];
        for (int j = 0; j < known.length; j++) {
            known[j] = OccurrenceMoments.of(treaty, j);
        }
        gross = GrossMoments.of(treaty.portfolio());
    }

    List<LayerStatistics> layers(BlockSums sums, Sketches sketches) {
        List<LayerStatistics> layers = new ArrayList<>();
        for (int j = 0; j < known.length; j++) {
            layers.add(new LayerEstimates(treaty.layer(j), treaty.programme().pricing(), treaty.programme().buyer(), known[j], sums.layers[j],
                    sketches.sums[j].law(), sketches.largest[j].law()).statistics());
        }
        return layers;
    }

    WholeStatistics whole(BlockSums sums, Sketches sketches) {
        return new WholeStatistics(position(0, sums, sketches), position(1, sums, sketches), position(2, sums, sketches));
    }

    private PositionStatistics position(int side, BlockSums sums, Sketches sketches) {
        boolean asGross = side == 0 || (side == 2 && cededIsLimited());
        boolean infiniteMean = asGross ? gross.mean() == Double.POSITIVE_INFINITY
                : side == 1 && anyUnlimited(moments -> moments.mean() == Double.POSITIVE_INFINITY);
        boolean infiniteVariance = asGross ? !gross.finiteVariance() : side == 1 && anyUnlimited(moments -> !moments.finiteVariance());
        return PositionEstimates.of(sums.positions[side], sums.positions[0], gross, infiniteMean, infiniteVariance,
                sketches.totals[side].law(), sketches.largestEvents[side].law(), treaty.programme().buyer());
    }

    /** What is ceded is as infinite as the recovery of any layer without an annual limit. */
    private boolean anyUnlimited(Predicate<OccurrenceMoments> infinite) {
        for (int j = 0; j < known.length; j++) {
            if (treaty.layer(j).terms().annualLimit() == Double.POSITIVE_INFINITY && infinite.test(known[j])) {
                return true;
            }
        }
        return false;
    }

    /** With every layer limited, what is kept of an unlimited loss is unlimited. */
    private boolean cededIsLimited() {
        return treaty.programme().layers().stream().allMatch(layer -> layer.terms().annualLimit() < Double.POSITIVE_INFINITY);
    }
}
