package layerweft.figures;

import java.util.SortedMap;

/**
 * What an engine says of one layer's annual loss Y, everything at 100 % of the layer and in the portfolio's unit. The share and the
 * ratios are put on top by {@link LayerFigures}, the same way for both engines.
 *
 * @param engine which engine this comes from
 * @param expectedLoss E[Y]
 * @param bracket guaranteed range of E[Y]; null where the engine has none
 * @param standardDeviation σ(Y)
 * @param attachmentProbability P(Y &gt; 0)
 * @param exhaustionProbability P(Y = M); 0 where the layer has no annual limit
 * @param expectedEvents events a year with an occurrence loss above 0
 * @param reinstatementFactor Σ c_k E[u_k]
 * @param netPremium E[Y] and the loading, by the treaty's principle
 * @param technicalPremium the upfront premium P
 * @param valueAtRisk by level, for the buyer's levels
 * @param tailValueAtRisk at the buyer's tail level
 * @param occurrenceValueAtRisk the largest recovery from one event in the year, by level; the same levels as {@code valueAtRisk};
 *     undefined where the engine cannot know them
 */
public record LayerStatistics(
        Engine engine,
        Figure expectedLoss,
        Bracket bracket,
        Figure standardDeviation,
        Figure attachmentProbability,
        Figure exhaustionProbability,
        Figure expectedEvents,
        Figure reinstatementFactor,
        Figure netPremium,
        Figure technicalPremium,
        SortedMap<Double, Figure> valueAtRisk,
        Figure tailValueAtRisk,
        SortedMap<Double, Figure> occurrenceValueAtRisk) {

    /** The same with another law of the year's largest recovery. */
    public LayerStatistics withOccurrence(SortedMap<Double, Figure> other) {
        return new LayerStatistics(engine, expectedLoss, bracket, standardDeviation, attachmentProbability, exhaustionProbability, expectedEvents,
                reinstatementFactor, netPremium, technicalPremium, valueAtRisk, tailValueAtRisk, other);
    }
}
