package layerweft.desktop.session;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import layerweft.figures.Engine;
import layerweft.figures.Figure;
import layerweft.figures.LayerFigures;
import layerweft.model.treaty.Treaty;
import layerweft.study.LiveLayer;

/**
 * What the strip says of one layer.
 *
 * @param figure its loss on line
 * @param simulated whether that comes from a simulation
 * @param change since the pin, with its sign; empty where nothing is pinned
 * @param unmoved why no copula moves the layer; empty where one does
 * @param lift of the expected loss now against independence; NaN where it is not known yet
 * @param pinnedLift the same at the pin, NaN where there is none
 * @param pinnedTau τ at the pin
 * @param curve lifts over {@code taus}; empty where it is not known yet
 * @param hover definition, formula, all digits, engine
 */
public record StripCell(
        String name, FigureShown figure, boolean simulated, String change, Optional<String> unmoved, double lift, double pinnedLift,
        double pinnedTau, List<Double> taus, List<Double> curve, String hover) {

    /**
     * The cells of all layers.
     *
     * @param curves null where there are none yet
     * @param pin null where nothing is pinned
     */
    public static List<StripCell> of(LivePrices prices, LiftCurves curves, Pin pin) {
        List<StripCell> cells = new ArrayList<>();
        for (int j = 0; j < prices.live().size(); j++) {
            cells.add(of(prices.treaty(), prices.tau().tau(), prices.live().get(j), curve(curves, j, prices), curves, pin));
        }
        return cells;
    }

    /** Curves belong to the layers of another treaty as long as newer ones are on their way. */
    private static LiftCurves.Curve curve(LiftCurves curves, int j, LivePrices prices) {
        return curves != null && curves.current() && curves.layers().size() == prices.live().size() ? curves.layers().get(j) : null;
    }

    private static StripCell of(Treaty treaty, double tau, LiveLayer live, LiftCurves.Curve curve, LiftCurves curves, Pin pin) {
        LayerFigures figures = live.figures();
        FigureShown shown = FigureShown.percent(figures.lossOnLine());
        Optional<LayerFigures> pinned = pin == null ? Optional.empty() : pin.layer(figures.name());
        String change = pinned.map(base -> shown.change(100 * (figures.lossOnLine().value() - base.lossOnLine().value()))).orElse("");
        // a short simulation drew the curve: a mark from a longer one would stand beside it
        boolean simulated = figures.engine() == Engine.SIMULATION;
        double lift = curve == null ? Double.NaN : simulated ? curve.liftAt(curves.taus(), tau) : curve.lift(figures);
        double pinnedLift = curve == null || pinned.isEmpty() ? Double.NaN : curve.lift(pinned.get());
        return new StripCell(figures.name(), shown, simulated, change, live.unmoved(), lift, pinnedLift,
                pin == null ? Double.NaN : pin.tau().tau(), curve == null ? List.of() : curves.taus(), curve == null ? List.of() : curve.lifts(),
                hover(treaty, live));
    }

    private static String hover(Treaty treaty, LiveLayer live) {
        LayerFigures figures = live.figures();
        Figure percent = figures.lossOnLine().times(100);
        String digits = percent.defined() ? FigureShown.allDigits(percent) + " %" : "not defined: the layer has no limit";
        String engine = live.simulatedBecause().map(reason -> "Simulated: " + reason)
                .orElse("Priced by transform: no sampling noise");
        String expected = FigureShown.allDigits(figures.expectedLoss()) + " " + treaty.portfolio().unit();
        return figures.name() + "\nLoss on line: expected annual loss to the layer by its limit, E[Y] / line\n" + digits
                + "\nExpected loss at the placed share " + expected + "\n" + engine
                + live.unmoved().map(reason -> "\nNo copula: " + reason).orElse("");
    }
}
