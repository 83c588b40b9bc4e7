package layerweft.file;

import com.fasterxml.jackson.core.JsonFactory;
import com.fasterxml.jackson.core.JsonLocation;
import com.fasterxml.jackson.core.JsonParser;
import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.core.JsonStreamContext;
import com.fasterxml.jackson.core.JsonToken;
import com.fasterxml.jackson.core.StreamReadConstraints;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/**
 * Reads JSON strictly into located {@link Node}s. A field given twice is one fault and the reading goes on; anything that is not JSON, text
 * after the end, too deep nesting or too many values ends the reading with one fault more.
 */
final class TreeParser {
    /** Sizes are bounded by that of the file, so the parser's own limits are lifted; nesting is counted here, where its place is known. */
    private static final JsonFactory FACTORY = JsonFactory.builder()
            .configure(JsonFactory.Feature.CANONICALIZE_FIELD_NAMES, false)
            .configure(JsonFactory.Feature.INTERN_FIELD_NAMES, false)
            .streamReadConstraints(StreamReadConstraints.builder().maxNestingDepth(Limits.NESTING + 2)
                    .maxNumberLength(Integer.MAX_VALUE).maxStringLength(Integer.MAX_VALUE).maxNameLength(Integer.MAX_VALUE).build())
            .build();

    private final JsonParser parser;
    private final Faults faults;
    private int depth;
    private int values;

    private TreeParser(JsonParser parser, Faults faults) {
        this.parser = parser;
        this.faults = faults;
    }

    /**
     * @return the object that the text is; null if it is none, with the fault added
     */
    static Node.Members parse(String text, Faults faults) {
        if (text.isBlank()) {
            faults.add(new Place(1, 1), "", "an empty file", "a JSON object");
            return null;
        }
        try (JsonParser parser = FACTORY.createParser(text)) {
            return new TreeParser(parser, faults).file(text);
        } catch (IOException e) {
            throw new UncheckedIOException("reading from memory", e);
        }
    }

    private Node.Members file(String text) throws IOException {
        try {
            JsonToken first = parser.nextToken();
            Node root = value(first);
            if (parser.nextToken() != null) {
                throw fault("text after the end of the file's object", "nothing after it");
            }
            if (root instanceof Node.Members members) {
                return members;
            }
            faults.wrongType(root, "", "a JSON object");
        } catch (JsonProcessingException e) {
            SyntaxFault.add(e, text, path(parser.getParsingContext()), faults);
        } catch (EndOfReading e) {
            faults.add(place(), path(parser.getParsingContext()), e.found, e.admissible);
        }
        return null;
    }

    private Node value(JsonToken token) throws IOException {
        if (++values > Limits.VALUES) {
            throw fault("more than " + Limits.VALUES + " values", "at most as many");
        }
        Place place = place();
        return switch (token) {
            case START_OBJECT -> members(place);
            case START_ARRAY -> elements(place);
            case VALUE_STRING -> new Node.Text(place, parser.getText());
            case VALUE_NUMBER_INT, VALUE_NUMBER_FLOAT -> new Node.Decimal(place, Double.parseDouble(parser.getText()), parser.getText());
            case VALUE_TRUE, VALUE_FALSE -> new Node.Truth(place, token == JsonToken.VALUE_TRUE);
            case VALUE_NULL -> new Node.Nothing(place);
            default -> throw new IllegalStateException("no value starts with " + token);
        };
    }

    private Node members(Place place) throws IOException {
        deeper();
        Map<String, Node.Member> fields = new LinkedHashMap<>();
        while (parser.nextToken() != JsonToken.END_OBJECT) {
            String name = parser.currentName();
            Place namePlace = place();
            if (fields.containsKey(name)) {
                faults.add(namePlace, path(parser.getParsingContext()), "the field " + Excerpt.quoted(name) + " a second time", "each field once");
            }
            Node value = value(parser.nextToken());
            fields.putIfAbsent(name, new Node.Member(namePlace, value));
        }
        depth--;
        return new Node.Members(place, fields);
    }

    private Node elements(Place place) throws IOException {
        deeper();
        List<Node> items = new ArrayList<>();
        for (JsonToken token = parser.nextToken(); token != JsonToken.END_ARRAY; token = parser.nextToken()) {
            items.add(value(token));
        }
        depth--;
        return new Node.Elements(place, items);
    }

    private void deeper() {
        if (++depth > Limits.NESTING) {
            throw fault("objects and lists nested more than " + Limits.NESTING + " deep", "nesting of at most " + Limits.NESTING);
        }
    }

    private Place place() {
        JsonLocation location = parser.currentTokenLocation();
        return new Place(location.getLineNr(), location.getColumnNr());
    }

    private static String path(JsonStreamContext context) {
        if (context == null || context.inRoot()) {
            return "";
        }
        String outer = path(context.getParent());
        if (context.inArray()) {
            return FieldPath.item(outer, context.getCurrentIndex());
        }
        return context.hasCurrentName() ? FieldPath.field(outer, context.getCurrentName()) : outer;
    }

    private static EndOfReading fault(String found, String admissible) {
        return new EndOfReading(found, admissible);
    }

    /** Ends the reading at the current token. */
    private static final class EndOfReading extends RuntimeException {
        private static final long serialVersionUID = 1L;
        private final String found;
        private final String admissible;

        EndOfReading(String found, String admissible) {
            super(found, null, false, false);
            this.found = found;
            this.admissible = admissible;
        }
    }
}
