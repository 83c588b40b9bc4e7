package layerweft.desktop.sensitivity;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.IntStream;
import layerweft.desktop.session.FamilyName;
import layerweft.engine.RunControl;
import layerweft.engine.simulation.SimulationSettings;
import layerweft.model.copula.CopulaFamily;
import layerweft.model.portfolio.Dependence;
import layerweft.model.treaty.Treaty;
import layerweft.report.chart.SensitivityChart;
import layerweft.study.FigureKind;
import layerweft.study.LayerSweep;
import layerweft.study.Sweep;
import layerweft.study.SweepPoint;
import layerweft.study.SweepRequest;

/**
 * One figure of all layers under all families, as the room shows it: numbers are scaled to percent where the figure is a part.
 *
 * @param treaty whose layers are swept; its own copula does not matter
 * @param kind of figure
 * @param sweep of it
 */
record SweptFamilies(Treaty treaty, FigureKind kind, Sweep sweep) {
    /** Strengths swept: fine enough for a smooth line. */
    static final List<Double> TAUS = IntStream.rangeClosed(0, 20).mapToObj(k -> k == 20 ? 0.98 : Math.round(5 * k) / 100.0).toList();
    /** Strengths of the table below. */
    static final List<Double> SHOWN = IntStream.rangeClosed(0, 9).mapToObj(k -> k / 10.0).toList();
    private static final SimulationSettings SIMULATED = new SimulationSettings(20_000, SimulationSettings.usual().seed(), SimulationSettings.usual().threads());

    static SweptFamilies of(Treaty treaty, FigureKind kind, RunControl control) {
        return new SweptFamilies(treaty, kind, Sweep.of(treaty, new SweepRequest(SweepRequest.USUAL_FAMILIES, TAUS, kind, 0), SIMULATED, control));
    }

    /** Whether another treaty has the same layers on the same perils, joined in the same quantity. */
    boolean fits(Treaty other, FigureKind figure) {
        return figure == kind && other.programme().equals(treaty.programme())
                && other.portfolio().dependence().links() == treaty.portfolio().dependence().links()
                && other.portfolio().with(Dependence.NONE).equals(treaty.portfolio().with(Dependence.NONE));
    }

    static double scale(FigureKind kind) {
        return kind.measured() == FigureKind.Measured.AS_PART ? 100 : 1;
    }

    LayerSweep layer(int j) {
        return sweep.layers().get(j);
    }

    /** A curve for each family; the present one is set apart. */
    List<SensitivityChart.Line> lines(int j, CopulaFamily present) {
        List<SensitivityChart.Line> lines = new ArrayList<>();
        for (CopulaFamily family : sweep.request().families()) {
            List<SweepPoint> points = layer(j).of(family);
            boolean solid = family.at(0.5).upperTail(0, 1) > 0;
            lines.add(new SensitivityChart.Line(family, FamilyName.of(family), solid, family.equals(present), points.stream().map(SweepPoint::kendallTau).toList(),
                    points.stream().map(p -> scale(kind) * p.value().value()).toList()));
        }
        return lines;
    }

    /** The lowest and the highest family at a τ between those swept. */
    double[] spread(int j, double tau) {
        double low = Double.POSITIVE_INFINITY;
        double high = Double.NEGATIVE_INFINITY;
        for (SensitivityChart.Line line : lines(j, null)) {
            int k = 1;
            while (k < line.taus().size() - 1 && line.taus().get(k) < tau) {
                k++;
            }
            double w = (tau - line.taus().get(k - 1)) / (line.taus().get(k) - line.taus().get(k - 1));
            double value = (1 - w) * line.values().get(k - 1) + w * line.values().get(k);
            low = Math.min(low, value);
            high = Math.max(high, value);
        }
        return new double[] {low, high};
    }
}
