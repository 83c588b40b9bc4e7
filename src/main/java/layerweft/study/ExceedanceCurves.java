package layerweft.study;

import java.util.List;
import java.util.SortedMap;
import java.util.stream.IntStream;
import layerweft.engine.RunControl;
import layerweft.engine.simulation.Simulation;
import layerweft.engine.simulation.SimulationSettings;
import layerweft.figures.Figure;
import layerweft.figures.PositionStatistics;
import layerweft.figures.ReturnPeriods;
import layerweft.figures.WholeStatistics;
import layerweft.model.treaty.Buyer;
import layerweft.model.treaty.Programme;
import layerweft.model.treaty.Treaty;

/**
 * Gross, ceded and net losses by return period, of the year's total and of its largest event, finely enough to draw; by simulation.
 */
public record ExceedanceCurves(Treaty treaty, SimulationSettings settings, Side gross, Side ceded, Side net) {
    /** From 1 in 1.01 to 1 in 1,000 years, evenly in the logarithm. */
    public static final List<Double> RETURN_PERIODS =
            IntStream.rangeClosed(0, 60).mapToObj(k -> k == 0 ? 1.01 : Math.round(1e4 * Math.pow(10, k / 20.0)) / 1e4).toList();

    /**
     * One side of the programme: losses only, no premiums.
     *
     * @param total the year's total, by return period in years
     * @param largestEvent the year's largest event, each taken as the first of its year
     */
    public record Side(SortedMap<Double, Figure> total, SortedMap<Double, Figure> largestEvent) {}

    /** @throws java.util.concurrent.CancellationException if the control stops it */
    public static ExceedanceCurves of(Treaty treaty, SimulationSettings settings, RunControl control) {
        Programme p = treaty.programme();
        Buyer fine = new Buyer(RETURN_PERIODS, p.buyer().tailLevel(), p.buyer().capitalCost());
        Treaty looked = new Treaty(treaty.portfolio(), new Programme(p.name(), p.layers(), p.pricing(), fine));
        WholeStatistics whole = Simulation.run(looked, settings, control).whole();
        return new ExceedanceCurves(treaty, settings, side(whole.gross(), fine), side(whole.ceded(), fine), side(whole.net(), fine));
    }

    private static Side side(PositionStatistics position, Buyer buyer) {
        return new Side(ReturnPeriods.of(position.valueAtRisk(), buyer), ReturnPeriods.of(position.occurrenceValueAtRisk(), buyer));
    }
}
