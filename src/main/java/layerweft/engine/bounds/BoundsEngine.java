package layerweft.engine.bounds;

import java.util.Optional;
import layerweft.figures.Figure;
import layerweft.model.treaty.Layer;
import layerweft.model.treaty.LayerTerms;
import layerweft.model.treaty.Treaty;

/**
 * The range of a layer's expected loss, at 100 %, over every dependence between the perils' annual sums A_i of occurrence losses. What
 * the portfolio says of dependence between perils is not used; the copula of sub-perils inside an event is.
 */
public final class BoundsEngine {
    private final Treaty treaty;

    public BoundsEngine(Treaty treaty) {
        this.treaty = treaty;
    }

    /** Why a layer has no such range, in plain words; empty where it has one. */
    public Optional<String> refusal(int layer) {
        if (!treaty.layer(layer).inuring().isEmpty()) {
            return Optional.of("recoveries of other layers inure to it, event by event");
        }
        return new AloneLayers(treaty, layer).refusal();
    }

    /**
     * The range of a layer at 100 %.
     *
     * @throws IllegalArgumentException if the layer is one of those that {@link #refusal} names
     */
    public LayerRange range(int j) {
        refusal(j).ifPresent(reason -> {
            throw new IllegalArgumentException("layer \"" + treaty.layer(j).name() + "\" has no bounds: " + reason);
        });
        AloneLayers alone = new AloneLayers(treaty, j);
        if (alone.perils() == 0) {
            return LayerRange.free(0, 0);
        }
        Figure independent = alone.independent();
        LayerTerms terms = treaty.layer(j).terms();
        if (!terms.hasAnnualTerms() || alone.perils() == 1 || independent.infinite()) {
            return LayerRange.free(independent.value(), independent.error());
        }
        AnnualLayer layer = new AnnualLayer(terms.deductible(), terms.annualLimit());
        Figure beyond = layer.limited() ? Figure.exact(0) : alone.beyond(terms.deductible());
        Margin[][] margins = alone.margins(layer.cap());
        double error = Math.abs(ParallelRun.comonotone(margins[0], layer) - ParallelRun.comonotone(margins[1], layer)) + independent.error();
        // rounding may leave a trace below 0
        double below = Math.max(0, independent.value() - beyond.value());
        return SumRange.of(margins[0], layer, below, error).plus(beyond.value(), beyond.error());
    }

    /** The same for a layer as it is placed. */
    public LayerRange placedRange(int j) {
        Layer layer = treaty.layer(j);
        return range(j).times(layer.share());
    }
}
