package layerweft.engine.simulation;

import java.util.List;
import java.util.Map;
import java.util.SortedMap;
import java.util.TreeMap;
import java.util.function.Function;
import layerweft.figures.Figure;
import layerweft.figures.LayerStatistics;
import layerweft.figures.PositionStatistics;
import layerweft.figures.WholeStatistics;

/**
 * Standard errors by batch means, for years that depend on each other inside a block (rearranged annual totals): blocks are
 * independent and alike, so the error of a figure is its standard deviation over the blocks by the root of their number.
 */
final class BlockMeans {

    private BlockMeans() {}

    /** The pooled figures with the errors of the batches. */
    static LayerStatistics layer(LayerStatistics pooled, List<LayerStatistics> blocks) {
        Function<Function<LayerStatistics, Figure>, Figure> by = figure -> figure(pooled, blocks, figure);
        return new LayerStatistics(pooled.engine(), by.apply(LayerStatistics::expectedLoss), null, by.apply(LayerStatistics::standardDeviation),
                by.apply(LayerStatistics::attachmentProbability), by.apply(LayerStatistics::exhaustionProbability),
                by.apply(LayerStatistics::expectedEvents), by.apply(LayerStatistics::reinstatementFactor), by.apply(LayerStatistics::netPremium),
                by.apply(LayerStatistics::technicalPremium), map(pooled, blocks, LayerStatistics::valueAtRisk),
                by.apply(LayerStatistics::tailValueAtRisk), map(pooled, blocks, LayerStatistics::occurrenceValueAtRisk));
    }

    static WholeStatistics whole(WholeStatistics pooled, List<WholeStatistics> blocks) {
        return new WholeStatistics(position(pooled, blocks, WholeStatistics::gross), position(pooled, blocks, WholeStatistics::ceded),
                position(pooled, blocks, WholeStatistics::net));
    }

    private static PositionStatistics position(WholeStatistics whole, List<WholeStatistics> all, Function<WholeStatistics, PositionStatistics> side) {
        PositionStatistics pooled = side.apply(whole);
        List<PositionStatistics> blocks = all.stream().map(side).toList();
        return new PositionStatistics(figure(pooled, blocks, PositionStatistics::mean), figure(pooled, blocks, PositionStatistics::standardDeviation),
                map(pooled, blocks, PositionStatistics::valueAtRisk), figure(pooled, blocks, PositionStatistics::tailValueAtRisk),
                map(pooled, blocks, PositionStatistics::occurrenceValueAtRisk));
    }

    private static <S> SortedMap<Double, Figure> map(S pooled, List<S> blocks, Function<S, SortedMap<Double, Figure>> figures) {
        SortedMap<Double, Figure> map = new TreeMap<>();
        for (Map.Entry<Double, Figure> entry : figures.apply(pooled).entrySet()) {
            map.put(entry.getKey(), figure(pooled, blocks, s -> figures.apply(s).get(entry.getKey())));
        }
        return map;
    }

    private static <S> Figure figure(S pooled, List<S> blocks, Function<S, Figure> figure) {
        double value = figure.apply(pooled).value();
        int n = blocks.size();
        double mean = blocks.stream().mapToDouble(b -> figure.apply(b).value()).average().orElseThrow();
        double square = blocks.stream().mapToDouble(b -> Math.pow(figure.apply(b).value() - mean, 2)).sum() / (n - 1);
        return new Figure(value, Math.sqrt(square / n));
    }
}
