package layerweft.engine.bounds;

import java.util.List;
import java.util.Optional;
import layerweft.engine.transform.Accuracy;
import layerweft.figures.Figure;
import layerweft.model.treaty.Layer;
import layerweft.model.treaty.LayerTerms;
import layerweft.model.treaty.Treaty;

/**
 * The range of a layer's expected loss, at 100 %, over every dependence between the perils' annual sums A_i of occurrence losses. What
 * the portfolio says of dependence between perils is not used; the copula of sub-perils inside an event is.
 */
public final class BoundsEngine {
    /** Errors of a millionth of the limit and less, where the lattice has so many cells. */
    private static final Accuracy FINE = new Accuracy(1e-9, 1 << 13);
    /** The same with half the cells: what the values change by is their error. */
    private static final Accuracy HALF = new Accuracy(1e-9, 1 << 12);
    private final Treaty treaty;

    public BoundsEngine(Treaty treaty) {
        this.treaty = treaty;
    }

    /** Why a layer has no such range, in plain words; empty where it has one. */
    public Optional<String> refusal(int layer) {
        if (!treaty.layer(layer).inuring().isEmpty()) {
            return Optional.of("recoveries of other layers inure to it, event by event");
        }
        return new AloneLayers(treaty, layer, FINE).refusal();
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
        AloneLayers alone = new AloneLayers(treaty, j, FINE);
        Figure independent = alone.independent();
        LayerTerms terms = treaty.layer(j).terms();
        if (!terms.hasAnnualTerms() || alone.perils() == 1 || independent.infinite()) {
            return LayerRange.free(independent.value(), independent.error());
        }
        AnnualLayer layer = new AnnualLayer(terms.deductible(), terms.annualLimit());
        Figure beyond = layer.limited() ? Figure.exact(0) : alone.beyond(terms.deductible());
        Margin[] margins = reaching(alone.margins(layer.cap()));
        if (margins.length < 2) {
            return LayerRange.free(independent.value(), independent.error());
        }
        Margin[] coarse = reaching(new AloneLayers(treaty, j, HALF).margins(layer.cap()));
        double error = Math.abs(ParallelRun.comonotone(margins, layer) - ParallelRun.comonotone(coarse, layer)) + independent.error();
        return SumRange.of(margins, layer, independent.value() - beyond.value(), error).plus(beyond.value(), beyond.error());
    }

    /** Margins without those perils that never reach the layer. */
    private static Margin[] reaching(List<Margin> margins) {
        return margins.stream().filter(m -> m.largest() > 0).toArray(Margin[]::new);
    }

    /** The same for a layer as it is placed. */
    public LayerRange placedRange(int j) {
        Layer layer = treaty.layer(j);
        return range(j).times(layer.share());
    }
}
