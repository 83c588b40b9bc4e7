package layerweft.engine.bounds;

import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.stream.Stream;
import layerweft.model.treaty.Treaty;
import layerweft.reference.ReferenceCase;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** Linear programmes over all joint laws and lattice quantile functions with extrapolation, computed independently with SciPy. */
class BoundsReferenceTest {
    private static final double RELATIVE = 1e-5;

    static Stream<ReferenceCase> cases() {
        return ReferenceCase.ofKinds("j").stream();
    }

    @ParameterizedTest
    @MethodSource("cases")
    void boundsAgreeWithIndependentValues(ReferenceCase reference) throws IOException {
        Treaty treaty = reference.treaty();
        BoundsEngine engine = new BoundsEngine(treaty);
        List<String> off = new ArrayList<>();
        JsonNode expected = new ObjectMapper().readTree(reference.folder().resolve("expected.json").toFile());
        for (Map.Entry<String, JsonNode> field : expected.properties()) {
            String[] path = field.getKey().split("/");
            double got = value(engine.range(treaty.programme().indexOf(path[1])), path[2]);
            JsonNode e = field.getValue();
            double least = e.path("atLeast").asDouble(e.path("value").asDouble(Double.NEGATIVE_INFINITY));
            double most = e.path("atMost").asDouble(e.path("value").asDouble(Double.POSITIVE_INFINITY));
            double allowed = e.get("tolerance").doubleValue() + RELATIVE * Math.abs(got);
            if (!(got >= least - allowed && got <= most + allowed)) {
                off.add(field.getKey() + ": " + got + ", expected " + e);
            }
        }
        assertTrue(expected.size() >= 12 && off.isEmpty(), () -> String.join("\n", off));
    }

    private static double value(LayerRange range, String name) {
        return switch (name) {
            case "lowest" -> range.lowest();
            case "attainedLow" -> range.attainedLow();
            case "independent" -> range.independent();
            case "comonotone" -> range.comonotone();
            case "attainedHigh" -> range.attainedHigh();
            case "highest" -> range.highest();
            default -> throw new IllegalArgumentException(name);
        };
    }
}
