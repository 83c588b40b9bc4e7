package layerweft.engine.transform;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.IntStream;
import layerweft.figures.Figure;
import layerweft.figures.LayerFigures;
import layerweft.model.treaty.Treaty;
import layerweft.reference.ReferenceCase;
import layerweft.reference.ReferenceCase.Expected;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** Whole cases against independently computed values; {@link ReferenceCase} says how they were obtained. */
class TransformReferenceTest {

    static List<ReferenceCase> cases() {
        return ReferenceCase.ofKinds("abcdefgi");
    }

    @ParameterizedTest
    @MethodSource("cases")
    void agreesWithIndependentValues(ReferenceCase reference) {
        Treaty treaty = reference.treaty();
        TransformEngine engine = new TransformEngine(treaty, Accuracy.USUAL);
        List<LayerFigures> layers = IntStream.range(0, treaty.layers()).filter(j -> engine.refusal(j).isEmpty())
                .mapToObj(j -> LayerFigures.of(treaty.layer(j), treaty.programme().buyer(), engine.price(j))).toList();
        List<String> wrong = new ArrayList<>();
        int checked = 0;
        for (Expected expected : reference.expected()) {
            String[] parts = expected.path().split("/");
            LayerFigures layer = layers.stream().filter(l -> parts[0].equals("layers") && l.name().equals(parts[1])).findFirst().orElse(null);
            if (layer == null) {
                continue;
            }
            checked++;
            Figure figure = ReferenceCase.figure(expected.path(), layers, null);
            boolean quantile = expected.path().contains("alueAtRisk");
            double allowed = expected.tolerance() + (quantile ? 1e-3 : 1e-5) * Math.abs(expected.value());
            if (figure.value() != expected.value() && !(Math.abs(figure.value() - expected.value()) <= allowed)) {
                wrong.add(expected.path() + ": " + figure + " instead of " + expected.value());
            }
            if (parts[2].equals("expectedLoss")) {
                // stated error and guaranteed range against the truth
                double error = Math.abs(figure.value() - expected.value());
                if (Double.isFinite(expected.value()) && !(error <= 3 * figure.error() + expected.tolerance() + 1e-13 * expected.value())) {
                    wrong.add(expected.path() + ": error " + error + " stated as " + figure.error());
                }
                if (layer.bracket() != null && !(layer.bracket().low() <= expected.value() + expected.tolerance()
                        && layer.bracket().high() >= expected.value() - expected.tolerance())) {
                    wrong.add(expected.path() + ": " + expected.value() + " outside " + layer.bracket());
                }
            }
        }
        assertEquals(List.of(), wrong);
        assertTrue(checked > 0);
    }
}
