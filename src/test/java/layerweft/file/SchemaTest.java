package layerweft.file;

import static layerweft.file.Examples.bytes;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import com.networknt.schema.JsonSchema;
import com.networknt.schema.JsonSchemaFactory;
import com.networknt.schema.SpecVersion;
import java.io.IOException;
import java.io.InputStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeMap;
import java.util.TreeSet;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;

/** The published JSON Schemas say the same as the readers, as far as a schema can. */
class SchemaTest {
    private static final ObjectMapper MAPPER = new ObjectMapper();
    /** Cases whose fault no schema can express: between objects, or of a law's range that depends on others. */
    private static final Set<String> BEYOND_A_SCHEMA = Set.of("k05-correlation-not-definite", "k06-unknown-peril", "k09-duplicate-peril",
            "k10-inuring-cycle");
    /** Not JSON numbers or no JSON at all: refused before a schema has its say. */
    private static final Set<String> NOT_JSON = Set.of("k08-nan-literal", "k11-overflow-number", "k14-empty-file");

    private static JsonNode json(String kind) throws IOException {
        try (InputStream in = SchemaTest.class.getResourceAsStream("/layerweft/schema/" + kind + "-1.schema.json")) {
            return MAPPER.readTree(in);
        }
    }

    private static JsonSchema schema(String kind) throws IOException {
        return JsonSchemaFactory.getInstance(SpecVersion.VersionFlag.V202012).getSchema(json(kind));
    }

    private static String kind(Path file) {
        return file.getFileName().toString().equals("programme.json") || file.startsWith("treaties") ? "programme" : "portfolio";
    }

    static List<Path> validFiles() throws IOException {
        List<Path> files = new ArrayList<>(json(Path.of("demo-portfolios")));
        files.addAll(json(Path.of("treaties")));
        for (Path folder : ReferenceRefusalTest.read()) {
            files.add(folder.resolve("portfolio.json"));
            files.add(folder.resolve("programme.json"));
        }
        return files;
    }

    private static List<Path> json(Path folder) throws IOException {
        try (Stream<Path> files = Files.list(folder)) {
            return files.filter(f -> f.toString().endsWith(".json")).sorted().toList();
        }
    }

    @ParameterizedTest
    @MethodSource("validFiles")
    void everyValidFileFitsItsSchema(Path file) throws IOException {
        assertEquals(Set.of(), schema(kind(file)).validate(MAPPER.readTree(file.toFile())));
    }

    static List<Path> refusedCases() throws IOException {
        return ReferenceRefusalTest.refused().stream()
                .filter(c -> !BEYOND_A_SCHEMA.contains(c.getFileName().toString()) && !NOT_JSON.contains(c.getFileName().toString())).toList();
    }

    @ParameterizedTest
    @MethodSource("refusedCases")
    void faultsThatASchemaCanExpressAreRefusedByIt(Path folder) throws IOException {
        int violations = 0;
        for (String kind : List.of("portfolio", "programme")) {
            violations += schema(kind).validate(MAPPER.readTree(folder.resolve(kind + ".json").toFile())).size();
        }
        assertTrue(violations > 0);
    }

    @Test
    void objectsAndFieldsAreTheSameInSchemaAndReader() throws IOException {
        assertEquals(fields(PortfolioMapping.shapes(), "peril", PortfolioMapping.LOSS_TABLES), fields(json("portfolio"), "portfolio"));
        assertEquals(fields(ProgrammeMapping.shapes(), "", List.of()), fields(json("programme"), "programme"));
    }

    private static Map<String, Set<String>> fields(List<Shape<?>> shapes, String with, List<String> more) {
        Map<String, Set<String>> fields = new TreeMap<>();
        for (Shape<?> shape : shapes) {
            fields.put(shape.name(), new TreeSet<>(shape.fieldNames()));
        }
        if (!with.isEmpty()) {
            fields.get(with).addAll(more);
        }
        return fields;
    }

    private static Map<String, Set<String>> fields(JsonNode schema, String root) {
        Map<String, Set<String>> fields = new TreeMap<>();
        fields.put(root, names(schema));
        schema.get("$defs").properties().forEach(def -> {
            if (def.getValue().has("properties")) {
                assertFalse(def.getValue().get("additionalProperties").asBoolean(), def.getKey());
                fields.put(def.getKey(), names(def.getValue()));
            }
        });
        return fields;
    }

    private static Set<String> names(JsonNode object) {
        Set<String> names = new TreeSet<>();
        object.get("properties").fieldNames().forEachRemaining(names::add);
        return names;
    }

    @ParameterizedTest
    @ValueSource(strings = {"portfolio", "programme"})
    void everyFieldIsDescribed(String kind) throws IOException {
        JsonNode schema = json(kind);
        assertTrue(schema.hasNonNull("title") && schema.hasNonNull("description"));
        schema.get("$defs").properties().forEach(def -> {
            assertTrue(def.getValue().hasNonNull("title") && def.getValue().hasNonNull("description"), def.getKey());
            if (def.getValue().has("properties")) {
                def.getValue().get("properties").properties().forEach(p -> assertTrue(
                        p.getValue().has("description") || p.getValue().has("$ref"), def.getKey() + "." + p.getKey()));
            }
        });
    }

    /** The demo files and the cases of one layer and of sub-perils: every kind of object is among them. */
    static List<Path> variedFiles() throws IOException {
        return validFiles().stream().filter(f -> f.getNameCount() == 2 || f.getParent().getFileName().toString().matches("[adgi].*")).toList();
    }

    /** Takes away each field of each object in turn, and turns each value into one of another type: reader and schema agree. */
    @ParameterizedTest
    @MethodSource("variedFiles")
    void readerAndSchemaAgreeOnWhatIsRequiredAndOnTypes(Path file) throws IOException {
        String kind = kind(file);
        JsonSchema schema = schema(kind);
        JsonNode root = MAPPER.readTree(file.toFile());
        List<ObjectNode> objects = new ArrayList<>();
        collect(root, objects);
        for (ObjectNode object : objects) {
            List<String> names = new ArrayList<>();
            object.fieldNames().forEachRemaining(names::add);
            for (String name : names) {
                JsonNode value = object.remove(name);
                agree(schema, kind, root, "without " + name);
                object.set(name, value.isBoolean() ? MAPPER.getNodeFactory().numberNode(1) : MAPPER.getNodeFactory().booleanNode(true));
                agree(schema, kind, root, name + " of another type");
                object.set(name, MAPPER.getNodeFactory().nullNode());
                agree(schema, kind, root, name + " null");
                object.set(name, value);
            }
        }
    }

    /** Puts values at and beyond the ends of ranges in the place of each number: what the reader takes, the schema takes. */
    @ParameterizedTest
    @MethodSource("variedFiles")
    void theSchemaIsNeverStricterThanTheReader(Path file) throws IOException {
        String kind = kind(file);
        JsonSchema schema = schema(kind);
        JsonNode root = MAPPER.readTree(file.toFile());
        List<ObjectNode> objects = new ArrayList<>();
        collect(root, objects);
        for (ObjectNode object : objects) {
            List<String> names = new ArrayList<>();
            object.fieldNames().forEachRemaining(names::add);
            for (String name : names) {
                JsonNode value = object.get(name);
                for (double tried : value.isNumber() ? new double[] {-2, -1, 0, 0.5, 1, 1.5, 3} : new double[0]) {
                    object.put(name, tried);
                    if (faults(kind, root).isEmpty()) {
                        assertEquals(Set.of(), schema.validate(root), name + " " + tried);
                    }
                }
                object.set(name, value);
            }
        }
    }

    private static List<Fault> faults(String kind, JsonNode root) throws IOException {
        byte[] text = bytes(MAPPER.writeValueAsString(root));
        try {
            if (kind.equals("portfolio")) {
                PortfolioReader.read("file.json", text);
            } else {
                ProgrammeReader.read("file.json", text);
            }
            return List.of();
        } catch (FaultyFileException e) {
            return e.faults();
        }
    }

    private static void agree(JsonSchema schema, String kind, JsonNode root, String what) throws IOException {
        boolean fits = schema.validate(root).isEmpty();
        List<Fault> faults = faults(kind, root);
        // a layer whose inuring layer lost its name, and the like, is between objects
        boolean between = fits && !faults.isEmpty() && faults.stream().noneMatch(f -> f.found().equals("nothing") || f.found().equals("true")
                || f.found().equals("null"));
        assertTrue(fits == faults.isEmpty() || between, what + ": schema " + fits + ", reader " + faults);
    }

    private static void collect(JsonNode node, List<ObjectNode> objects) {
        if (node instanceof ObjectNode object) {
            objects.add(object);
            object.forEach(child -> collect(child, objects));
        } else if (node instanceof ArrayNode list) {
            list.forEach(child -> collect(child, objects));
        }
    }
}
