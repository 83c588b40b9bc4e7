package layerweft.command;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import java.io.PrintWriter;
import java.io.StringWriter;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;

class BoundsCommandTest {
    private static final String COAST = "demo-portfolios/harrow-coast.json";
    private static final List<String> VALUES = List.of("lowest", "attainedLow", "independent", "comonotone", "attainedHigh", "highest");

    private static String run(String... arguments) {
        StringWriter out = new StringWriter();
        StringWriter err = new StringWriter();
        assertEquals(0, CommandLineProgram.run(arguments, new PrintWriter(out), new PrintWriter(err)), err::toString);
        return out.toString();
    }

    private static JsonNode layers(String programme) throws IOException {
        return new ObjectMapper().readTree(run("bounds", COAST, programme, "--format", "json")).get("layers");
    }

    @Test
    void jsonHoldsSixValuesForEachLayer() throws IOException {
        JsonNode layers = layers("treaties/harrow-coast-two-layers.json");
        assertEquals(3, layers.size());
        for (JsonNode layer : layers) {
            double before = 0;
            for (String name : List.of("lowest", "attainedLow", "independent", "attainedHigh", "highest")) {
                assertTrue(layer.get(name).doubleValue() >= before, () -> name + " of " + layer);
                before = layer.get(name).doubleValue();
            }
            assertFalse(layer.has("reason"));
        }
    }

    @Test
    void layersWithInuringHaveNoBoundsAndAReason() throws IOException {
        JsonNode layers = layers("treaties/harrow-coast-inuring.json");
        JsonNode cat = layers.get(1);
        VALUES.forEach(name -> assertTrue(cat.get(name).isNull(), name));
        assertTrue(cat.get("reason").asText().contains("inure"));
        assertTrue(layers.get(0).get("note").asText().contains("one peril"));
        VALUES.forEach(name -> assertEquals(layers.get(0).get("independent"), layers.get(0).get(name)));
    }

    @Test
    void textAndTableNameTheSameLayers() {
        String text = run("bounds", COAST, "treaties/harrow-coast-inuring.json");
        assertTrue(text.contains("proven") && text.contains("attained") && text.contains("no bounds, because"), text);
        List<String> rows = new ArrayList<>(run("bounds", COAST, "treaties/harrow-coast-inuring.json", "--format", "csv").lines().toList());
        assertEquals("layer,lowest,attainedLow,independent,comonotone,attainedHigh,highest,error,note", rows.get(0));
        assertEquals(4, rows.size());
        assertTrue(rows.get(2).startsWith("Cat layer,,,,,,,,"), rows.get(2));
    }
}
