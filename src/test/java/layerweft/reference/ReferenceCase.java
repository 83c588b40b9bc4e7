package layerweft.reference;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.net.URISyntaxException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Iterator;
import java.util.List;
import java.util.Map;
import java.util.stream.Stream;
import layerweft.file.TreatyReader;
import layerweft.figures.Figure;
import layerweft.figures.LayerFigures;
import layerweft.figures.PositionStatistics;
import layerweft.figures.WholeStatistics;
import layerweft.model.treaty.Treaty;

/**
 * A whole priced case: two files and the values expected of them, computed independently of this program (Python with SciPy and mpmath:
 * high-precision arithmetic, lattice transforms with extrapolation, or long simulations; {@code how} says which).
 */
public record ReferenceCase(String id, Path folder, List<Expected> expected) {

    /**
     * One quantity.
     *
     * @param path e.g. {@code layers/First cat layer/expectedLoss}
     * @param tolerance absolute, the uncertainty of the value itself
     */
    public record Expected(String path, double value, double tolerance, String how) {}

    /** The cases whose names start with one of the letters. */
    public static List<ReferenceCase> ofKinds(String letters) {
        try (Stream<Path> folders = Files.list(Path.of(ReferenceCase.class.getResource("/reference/cases").toURI()))) {
            return folders.filter(f -> letters.indexOf(f.getFileName().toString().charAt(0)) >= 0).sorted().map(ReferenceCase::read).toList();
        } catch (IOException | URISyntaxException e) {
            throw new IllegalStateException(e);
        }
    }

    private static ReferenceCase read(Path folder) {
        try {
            JsonNode tree = new ObjectMapper().readTree(folder.resolve("expected.json").toFile());
            List<Expected> expected = new ArrayList<>();
            for (Iterator<Map.Entry<String, JsonNode>> fields = tree.fields(); fields.hasNext();) {
                Map.Entry<String, JsonNode> field = fields.next();
                JsonNode value = field.getValue().get("value");
                if (value != null) {
                    double number = value.isTextual() ? Double.POSITIVE_INFINITY : value.doubleValue();
                    expected.add(new Expected(field.getKey(), number, field.getValue().get("tolerance").doubleValue(),
                            field.getValue().get("how").asText()));
                }
            }
            return new ReferenceCase(folder.getFileName().toString(), folder, expected);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    public Treaty treaty() {
        return TreatyReader.read(folder.resolve("portfolio.json"), folder.resolve("programme.json"));
    }

    /** The figure that a path names. */
    public static Figure figure(String path, List<LayerFigures> layers, WholeStatistics whole) {
        String[] parts = path.split("/");
        if (parts[0].equals("layers")) {
            LayerFigures layer = layers.stream().filter(l -> l.name().equals(parts[1])).findFirst().orElseThrow();
            return layerFigure(layer, parts);
        }
        PositionStatistics side = switch (parts[1]) {
            case "gross" -> whole.gross();
            case "ceded" -> whole.ceded();
            case "net" -> whole.net();
            default -> throw new IllegalArgumentException(path);
        };
        return switch (parts[2]) {
            case "mean" -> side.mean();
            case "standardDeviation" -> side.standardDeviation();
            case "valueAtRisk" -> side.valueAtRisk().get(Double.valueOf(parts[3]));
            case "tailValueAtRisk" -> side.tailValueAtRisk();
            default -> throw new IllegalArgumentException(path);
        };
    }

    private static Figure layerFigure(LayerFigures layer, String[] parts) {
        return switch (parts[2]) {
            case "expectedLoss" -> layer.expectedLoss();
            case "standardDeviation" -> layer.standardDeviation();
            case "lossOnLine" -> layer.lossOnLine();
            case "attachmentProbability" -> layer.attachmentProbability();
            case "exhaustionProbability" -> layer.exhaustionProbability();
            case "expectedEvents" -> layer.expectedEvents();
            case "paidUpFactor" -> layer.paidUpFactor();
            case "technicalPremium" -> layer.technicalPremium();
            case "technicalRateOnLine" -> layer.technicalRateOnLine();
            case "valueAtRisk" -> layer.valueAtRisk().get(Double.valueOf(parts[3]));
            case "tailValueAtRisk" -> layer.tailValueAtRisk();
            default -> throw new IllegalArgumentException(String.join("/", parts));
        };
    }

    @Override
    public String toString() {
        return id;
    }
}
