package layerweft.figures;

import java.util.SortedMap;

/**
 * The year's total of one side of the whole programme: gross (all perils, ground up), ceded (all layers at their shares) or net
 * (gross less ceded). Losses only, no premiums; in the portfolio's unit.
 *
 * @param valueAtRisk of the year's total, by level
 * @param tailValueAtRisk of the year's total at the buyer's tail level
 * @param occurrenceValueAtRisk of the year's largest event, each event taken as the first of its year, by level
 */
public record PositionStatistics(
        Figure mean,
        Figure standardDeviation,
        SortedMap<Double, Figure> valueAtRisk,
        Figure tailValueAtRisk,
        SortedMap<Double, Figure> occurrenceValueAtRisk) {

    PositionStatistics withMean(Figure other) {
        return new PositionStatistics(other, standardDeviation, valueAtRisk, tailValueAtRisk, occurrenceValueAtRisk);
    }
}
