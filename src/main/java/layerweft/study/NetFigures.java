package layerweft.study;

import java.util.SortedMap;
import layerweft.engine.simulation.PositionSample;
import layerweft.figures.Figure;

/**
 * Figures of a buyer's annual position, or differences of such figures, in the portfolio's unit.
 *
 * @param valueAtRisk by level
 * @param tailValueAtRisk at the buyer's tail level
 */
public record NetFigures(Figure mean, Figure standardDeviation, SortedMap<Double, Figure> valueAtRisk, Figure tailValueAtRisk) {

    /** @param mean known better than from the sample */
    static NetFigures of(Figure mean, PositionSample sample) {
        return new NetFigures(mean, sample.standardDeviation(), sample.valueAtRisk(), sample.tailValueAtRisk());
    }
}
