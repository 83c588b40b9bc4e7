package layerweft.command;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** Every demo programme and every valid reference case is priced, and where the transform answers it agrees with simulation. */
class EnginesAgreeTest {
    private static final int YEARS = 200_000;
    /** Where only the transform's layers are looked at. */
    private static final int FEW = 1_000;
    /** Odds of a false alarm of one figure 1 in 147,000; with this seed, fixed, there is none. */
    private static final double STANDARD_ERRORS = 4.5;
    private static final int SEED = 12;
    /** Whole priced cases, computed independently with 34-digit quadrature, Panjer's recursion and convolution. */
    private static final Path CASES = Path.of("src/test/resources/reference/cases");

    /** A portfolio and a programme on it. */
    record BookAndProgramme(Path portfolio, Path programme) {
        @Override
        public String toString() {
            return programme.startsWith("treaties") ? programme.toString() : programme.getParent().getFileName().toString();
        }
    }

    static List<BookAndProgramme> treaties() throws IOException {
        List<BookAndProgramme> treaties = new ArrayList<>();
        for (Path programme : list(Path.of("treaties"), ".json")) {
            String name = programme.getFileName().toString();
            treaties.add(new BookAndProgramme(list(Path.of("demo-portfolios"), ".json").stream()
                    .filter(f -> name.startsWith(f.getFileName().toString().replace(".json", "-"))).findFirst().orElseThrow(), programme));
        }
        for (Path folder : list(CASES, "")) {
            // cases k are files with faults
            if (!folder.getFileName().toString().startsWith("k")) {
                treaties.add(new BookAndProgramme(folder.resolve("portfolio.json"), folder.resolve("programme.json")));
            }
        }
        return treaties;
    }

    private static List<Path> list(Path folder, String ending) throws IOException {
        try (Stream<Path> files = Files.list(folder)) {
            return files.filter(f -> f.toString().endsWith(ending)).sorted().toList();
        }
    }

    private static JsonNode quote(BookAndProgramme treaty, String engine, int years) throws IOException {
        return new ObjectMapper().readTree(Run.of("quote", treaty.portfolio(), treaty.programme(), "--engine", engine, "--years", years, "--seed", SEED,
                "--format", "json").done().out());
    }

    @ParameterizedTest
    @MethodSource("treaties")
    void enginesAgree(BookAndProgramme treaty) throws IOException {
        JsonNode auto = quote(treaty, "auto", FEW);
        JsonNode simulated = quote(treaty, "simulation", YEARS);
        assertTrue(auto.get("layers").size() > 0);
        for (int j = 0; j < auto.get("layers").size(); j++) {
            JsonNode a = auto.get("layers").get(j);
            JsonNode s = simulated.get("layers").get(j);
            assertEquals("simulation", s.get("engine").asText());
            assertTrue(s.get("expectedLoss").doubleValue() > 0, s.toString());
            if (a.get("engine").asText().equals("simulation")) {
                assertTrue(a.get("notes").get(0).asText().startsWith("simulated, because"), a.toString());
                continue;
            }
            for (String figure : List.of("expectedLoss", "standardDeviation", "lossOnLine", "attachmentProbability", "exhaustionProbability",
                    "expectedEvents", "paidUpFactor", "netPremium", "technicalPremium")) {
                agree(treaty + ", " + a.get("name") + ", " + figure, a.get(figure), a.get("errors").get(figure), s.get(figure), s.get("errors").get(figure), 1e-5);
            }
            for (String curve : List.of("valueAtRisk", "tailValueAtRisk")) {
                a.get(curve).fieldNames().forEachRemaining(level -> agree(treaty + ", " + a.get("name") + ", " + curve + " " + level, a.get(curve).get(level),
                        a.get("errors").get(curve).get(level), s.get(curve).get(level), s.get("errors").get(curve).get(level), 1e-3));
            }
        }
    }

    private static void agree(String what, JsonNode value, JsonNode error, JsonNode other, JsonNode otherError, double relative) {
        if (!value.isNumber() || !other.isNumber()) {
            assertEquals(value, other, what);
            return;
        }
        double allowed = STANDARD_ERRORS * otherError.doubleValue() + error.doubleValue() + relative * Math.abs(value.doubleValue());
        assertEquals(value.doubleValue(), other.doubleValue(), allowed, () -> what + ": " + value + " ± " + error + " against " + other + " ± " + otherError
                + ", seed " + SEED);
    }
}
