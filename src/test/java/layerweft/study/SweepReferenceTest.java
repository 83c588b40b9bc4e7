package layerweft.study;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.Stream;
import layerweft.engine.RunControl;
import layerweft.engine.simulation.SimulationSettings;
import layerweft.figures.Figure;
import layerweft.model.copula.CopulaFamily;
import layerweft.reference.ReferenceCase;
import org.junit.jupiter.api.Test;

/** A sweep of three perils and four layers against values computed independently (lattice transforms with extrapolation, SciPy and mpmath). */
class SweepReferenceTest {
    /** Beside the uncertainty of the expected value, the accuracy that the transform is asked for. */
    private static final double RELATIVE = 1e-5;
    private static final double ABSOLUTE = 1e-9;

    @Test
    void everyPointAgrees() {
        ReferenceCase reference = ReferenceCase.ofKinds("s").get(0);
        List<CopulaFamily> families = Stream.of("clayton", "gumbel", "frank", "joe", "gaussian").map(CopulaFamily::parse).toList();
        Sweep sweep = Sweep.of(reference.treaty(), new SweepRequest(families, List.of(0.0, 0.2, 0.5), FigureKind.EXPECTED_LOSS, 0),
                SimulationSettings.usual(), RunControl.NONE);
        Map<String, Figure> found = new HashMap<>();
        for (LayerSweep layer : sweep.layers()) {
            for (SweepPoint p : layer.points()) {
                String path = "sweep/" + p.family().label() + "/" + p.kendallTau() + "/" + layer.name() + "/";
                found.put(path + "expectedLoss", p.figures().expectedLoss());
                found.put(path + "standardDeviation", p.figures().standardDeviation());
                found.put(path + "lossOnLine", p.figures().lossOnLine());
                found.put(path + "technicalPremium", p.figures().technicalPremium());
                found.put(path + "lift", p.lift());
            }
        }
        assertEquals(300, reference.expected().size());
        for (ReferenceCase.Expected expected : reference.expected()) {
            assertEquals(expected.value(), found.get(expected.path()).value(),
                    expected.tolerance() + RELATIVE * Math.abs(expected.value()) + ABSOLUTE, expected.path() + ", " + expected.how());
        }
    }
}
