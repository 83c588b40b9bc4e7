package layerweft.engine.simulation;

import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.Stream;
import layerweft.engine.RunControl;
import layerweft.figures.Figure;
import layerweft.figures.LayerFigures;
import layerweft.model.treaty.Treaty;
import layerweft.reference.ReferenceCase;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/**
 * Every reference case of one or several perils, all dependence families, sub-perils, annual totals, inuring and premium principles,
 * against independently computed values: within the value's own tolerance and 3.5 of the simulation's own standard errors.
 */
class SimulationReferenceTest {
    private static final long YEARS = 500_000;
    /** The false alarm rate of one quantity is 1 in 2,150; with this seed, fixed, there is none. */
    private static final double STANDARD_ERRORS = 3.5;
    private static final long SEED = 20;

    static Stream<ReferenceCase> cases() {
        return ReferenceCase.ofKinds("abcdefghi").stream();
    }

    @ParameterizedTest
    @MethodSource("cases")
    void figuresAgreeWithIndependentValues(ReferenceCase reference) {
        Treaty treaty = reference.treaty();
        SimulationResult result = Simulation.run(treaty, new SimulationSettings(YEARS, SEED, 2), RunControl.NONE);
        List<LayerFigures> layers = new ArrayList<>();
        for (int j = 0; j < treaty.layers(); j++) {
            layers.add(LayerFigures.of(treaty.layer(j), treaty.programme().buyer(), result.layers().get(j)));
        }
        List<String> off = new ArrayList<>();
        for (ReferenceCase.Expected e : reference.expected()) {
            Figure figure = ReferenceCase.figure(e.path(), layers, result.whole());
            double allowed = e.tolerance() + STANDARD_ERRORS * figure.error() + unresolved(e);
            if (!(figure.value() == e.value() || Math.abs(figure.value() - e.value()) <= allowed)) {
                off.add(String.format("%s: %s, expected %.8g (%s), off by %.2f errors", e.path(), figure, e.value(), e.how(),
                        (figure.value() - e.value()) / figure.error()));
            }
        }
        assertTrue(off.isEmpty(), () -> reference + ":\n" + String.join("\n", off));
    }

    /**
     * What a simulation of this length cannot see: a quantile is known to the width of a cell of the sketch where it stands on an atom, and a
     * chance of a few hits in all years is not yet normal.
     */
    private static double unresolved(ReferenceCase.Expected e) {
        if (e.path().contains("alueAtRisk")) {
            return Math.scalb(e.value(), -11);
        }
        if (e.path().equals("whole/gross/mean")) {
            // the table's value of a capped severity's mean is off its closed form E[N]·E[min(X, cap)] by up to 2.1e-4 of it
            return 2.5e-4 * e.value();
        }
        return e.path().endsWith("Probability") ? 4.0 / YEARS : 1e-12 * Math.abs(e.value());
    }
}
