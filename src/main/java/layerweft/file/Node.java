package layerweft.file;

import java.util.List;
import java.util.Map;

/** A value of a JSON file with the place where it starts. */
sealed interface Node {
    Place place();

    /** The value as a message would show it. */
    String shown();

    /** An object: its fields in the order of the file. */
    record Members(Place place, Map<String, Member> fields) implements Node {
        @Override
        public String shown() {
            return "an object";
        }

        /** The value of that field, or null. */
        Node get(String name) {
            Member member = fields.get(name);
            return member == null ? null : member.value();
        }
    }

    /** A field: where its name stands, and its value. */
    record Member(Place namePlace, Node value) {}

    /** A list. */
    record Elements(Place place, List<Node> items) implements Node {
        @Override
        public String shown() {
            return items.isEmpty() ? "an empty list" : "a list";
        }
    }

    record Text(Place place, String text) implements Node {
        @Override
        public String shown() {
            return Excerpt.quoted(text);
        }
    }

    /**
     * A number, to the nearest double.
     *
     * @param value infinite where the number is beyond the range of a double
     * @param written how it was written, so that saving a file changes no number that nobody edited
     */
    record Decimal(Place place, double value, String written) implements Node {
        @Override
        public String shown() {
            return Double.isInfinite(value) ? Excerpt.plain(written) : value == Math.rint(value) && Math.abs(value) < 1e15
                    ? Long.toString((long) value) : Double.toString(value);
        }
    }

    record Truth(Place place, boolean value) implements Node {
        @Override
        public String shown() {
            return Boolean.toString(value);
        }
    }

    record Nothing(Place place) implements Node {
        @Override
        public String shown() {
            return "null";
        }
    }

    /**
     * The place of a path such as {@code groups[1].theta} below this value; of the innermost part that is there, if not all of it is.
     */
    default Place placeOf(String path) {
        Node at = this;
        for (String step : path.split("\\.|(?=\\[)")) {
            Node next = step.isEmpty() ? at : step.startsWith("[") ? item(at, step) : at instanceof Members m ? m.get(step) : null;
            if (next == null) {
                break;
            }
            at = next;
        }
        return at.place();
    }

    private static Node item(Node list, String step) {
        int k = Integer.parseInt(step.substring(1, step.length() - 1));
        return list instanceof Elements elements && k < elements.items().size() ? elements.items().get(k) : null;
    }
}
