package layerweft.desktop.session;

import java.util.ArrayList;
import java.util.List;
import layerweft.engine.RunControl;
import layerweft.figures.Figure;
import layerweft.figures.LayerFigures;
import layerweft.model.copula.Copula;
import layerweft.model.copula.Independence;
import layerweft.model.treaty.Treaty;
import layerweft.study.DependenceStrength;
import layerweft.study.LiveLayer;
import layerweft.study.LivePricing;

/**
 * Each layer's loss on line as the strength of the dependence is turned from 0 to 1, family and proportions of the pairs kept.
 *
 * @param treaty of which family, or proportions, are taken
 * @param taus rising; those within the family's reach
 * @param layers in the order of the programme
 * @param current false while newer ones are on their way
 */
public record LiftCurves(Treaty treaty, List<Double> taus, List<Curve> layers, boolean current) {
    private static final int STEPS = 19;
    private static final double STEP = 0.05;

    /**
     * One layer's curve.
     *
     * @param independent the layer with independent perils
     * @param figures at each τ
     */
    public record Curve(LayerFigures independent, List<LayerFigures> figures) {
        public Curve {
            figures = List.copyOf(figures);
        }

        /** Loss on line at each τ. */
        public List<Figure> lossOnLine() {
            return figures.stream().map(LayerFigures::lossOnLine).toList();
        }

        /** φ/φ_0 − 1 of any figures of this layer; NaN where φ_0 is 0 or infinite. */
        public double lift(LayerFigures of) {
            double base = independent.expectedLoss().value();
            return base > 0 && base < Double.POSITIVE_INFINITY ? of.expectedLoss().value() / base - 1 : Double.NaN;
        }

        /** The lift at any τ on the curve, by the straight line between its neighbours; NaN beyond the curve's ends. */
        double liftAt(List<Double> taus, double tau) {
            List<Double> lifts = lifts();
            for (int k = 1; k < taus.size(); k++) {
                if (tau >= taus.get(k - 1) - 1e-9 && tau <= taus.get(k) + 1e-9) {
                    double part = (tau - taus.get(k - 1)) / (taus.get(k) - taus.get(k - 1));
                    return (1 - part) * lifts.get(k - 1) + part * lifts.get(k);
                }
            }
            return Double.NaN;
        }

        /** The lift at each τ. */
        public List<Double> lifts() {
            return figures.stream().map(this::lift).toList();
        }
    }

    public LiftCurves {
        taus = List.copyOf(taus);
        layers = List.copyOf(layers);
    }

    LiftCurves outdated() {
        return new LiftCurves(treaty, taus, layers, false);
    }

    /** The largest lift of any layer on the curves, at least 0: the end of the axis that all cells share. */
    public double highestLift() {
        return layers.stream().flatMap(curve -> curve.lifts().stream()).filter(Double::isFinite).mapToDouble(Double::doubleValue).max().orElse(0);
    }

    /** The smallest lift of any layer on the curves, at most 0. */
    public double lowestLift() {
        return Math.min(0, layers.stream().flatMap(curve -> curve.lifts().stream()).filter(Double::isFinite).mapToDouble(Double::doubleValue)
                .min().orElse(0));
    }

    /** The layer that the dependence moves most, by the width of its curve. */
    public int mostMoved() {
        int most = 0;
        double widest = 0;
        for (int j = 0; j < layers.size(); j++) {
            var lifts = layers.get(j).lifts().stream().filter(Double::isFinite).mapToDouble(Double::doubleValue).summaryStatistics();
            if (lifts.getMax() - lifts.getMin() > widest) {
                widest = lifts.getMax() - lifts.getMin();
                most = j;
            }
        }
        return most;
    }

    /** Prices the curves; none where there is one peril. */
    static LiftCurves of(Treaty treaty, RunControl control) {
        DependenceStrength strength = DependenceStrength.of(treaty.portfolio().dependence().copula(), treaty.portfolio().perils().size());
        List<Double> taus = new ArrayList<>();
        for (int k = 0; k <= STEPS && strength.kind() != DependenceStrength.Kind.ONE_PERIL; k++) {
            double tau = Math.round(100 * k * STEP) / 100.0;
            if (tau >= strength.least() && tau <= strength.most()) {
                taus.add(tau);
            }
        }
        // the middle first: there the transform works hardest of those that tell it apart from independence
        List<Copula> copulas = new ArrayList<>();
        if (!taus.isEmpty()) {
            copulas.add(strength.at(taus.get(taus.size() / 2)));
        }
        copulas.add(new Independence());
        taus.forEach(tau -> copulas.add(strength.at(tau)));
        int before = copulas.size() - taus.size();
        List<List<LiveLayer>> priced = new LivePricing(treaty, LivePricing.shortRun()).along(copulas, control);
        List<Curve> curves = new ArrayList<>();
        for (int j = 0; j < treaty.layers(); j++) {
            int layer = j;
            curves.add(new Curve(priced.get(before - 1).get(j).figures(),
                    priced.subList(before, priced.size()).stream().map(at -> at.get(layer).figures()).toList()));
        }
        return new LiftCurves(treaty, taus, curves, true);
    }
}
