package layerweft.engine.transform;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import layerweft.model.severity.Lognormal;
import layerweft.model.severity.Pareto;
import layerweft.model.severity.SeverityModel;
import layerweft.model.treaty.AnnualTerms;
import layerweft.model.treaty.Layer;
import layerweft.model.treaty.LayerTerms;
import layerweft.model.treaty.OccurrenceTerms;
import org.junit.jupiter.api.Test;

class FusedLawTest {

    @Test
    void liesBelowInIncreasingConvexOrderAndSpreadMassAbove() {
        for (SeverityModel severity : List.of(Lognormal.ofMeanAndCv(10, 2), new Pareto(5, 1.2), Models.losses(new double[] {1, 7, 11.3, 40}, new double[] {0.2, 0.3, 0.3, 0.2}))) {
            LayerTerms terms = Layer.of("x", OccurrenceTerms.excess(30, 4), AnnualTerms.NONE).terms();
            SingleEvent event = new SingleEvent(severity, terms, 30);
            for (int cells : new int[] {8, 30, 96}) {
                double step = 30.0 / cells;
                double[] lower = event.ordered(step, cells).lower();
                double[] upper = event.cellSurvival(step, cells);
                double below = 0;
                double above = 0;
                for (int k = cells - 1; k >= 0; k--) {
                    below += step * lower[k];
                    above += step * upper[k];
                    // E[(o − kh)+] of the three laws
                    double exact = severity.limitedMean(34) - severity.limitedMean(4 + k * step);
                    assertTrue(below <= exact + 1e-11, severity + " " + cells + " " + k);
                    assertEquals(exact, above, 1e-11);
                    assertTrue(lower[k] >= -1e-15 && (k == 0 || lower[k] <= lower[k - 1] + 1e-15));
                }
                assertTrue(above - below < 2.5 * step * step, "gap of second order: " + (above - below) + " at step " + step);
            }
        }
    }
}
