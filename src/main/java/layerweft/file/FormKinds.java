package layerweft.file;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;

/**
 * What a form needs to know of the objects that come in kinds, and how one kind becomes another. It comes from the same lines that read and
 * write the files, so form, file and checks cannot drift apart.
 */
public final class FormKinds {
    private FormKinds() {}

    /** The objects that come in kinds. */
    public enum Subject {
        SEVERITY("model"), FREQUENCY("model"), COPULA("family"), LOADING("principle");

        private final String tag;

        Subject(String tag) {
            this.tag = tag;
        }

        /** The field that names the kind; a mixture of copulas has none and is told by its field {@code mixture}. */
        public String tag() {
            return tag;
        }

        /**
         * What the object at a path is, by the field that holds it.
         *
         * @throws IllegalArgumentException if it is none that comes in kinds
         */
        public static Subject at(String path) {
            List<Object> names = TreePath.steps(path).stream().filter(String.class::isInstance).toList();
            String last = names.isEmpty() ? "" : (String) names.get(names.size() - 1);
            return switch (last) {
                case "severity", "body", "tail", "components" -> SEVERITY;
                case "frequency" -> FREQUENCY;
                case "copula", "subPerilCopula" -> COPULA;
                case "loading" -> LOADING;
                default -> throw new IllegalArgumentException("what stands at " + path + " does not come in kinds");
            };
        }
    }

    /**
     * A kind.
     *
     * @param name in files
     * @param label what people call it, e.g. Generalised Pareto
     * @param ways to give its parameters, at least one
     */
    public record Kind(String name, String label, List<Way> ways) {}

    /**
     * One way to give a kind's parameters.
     *
     * @param name the required fields, e.g. {@code mean and cv}; empty where there are none
     * @param fields in order, without the one that names the kind
     */
    public record Way(String name, List<FormField> fields) {}

    /**
     * A field of a form.
     *
     * @param fallback the value where it is left out: a Double, Boolean or empty List; null where that is nothing
     */
    public record FormField(String name, FieldType type, boolean required, Object fallback) {}

    /**
     * An object's kind and way.
     *
     * @param way position in {@link Kind#ways}
     */
    public record Choice(String kind, int way) {}

    /**
     * A tree after a change of kind or way.
     *
     * @param kept in a sentence or two, what of the old object the new one has, and what not
     */
    public record Converted(FileTree tree, String kept) {}

    /** All kinds, in the order of the formats. */
    public static List<Kind> kinds(Subject subject) {
        Map<String, String> labels = KindTable.of(subject, List.of()).labels();
        return labels.keySet().stream().map(name -> new Kind(name, labels.get(name), ways(subject, name))).toList();
    }

    private static List<Way> ways(Subject subject, String kind) {
        List<Way> ways = new ArrayList<>();
        for (Variant<?> variant : KindTable.of(subject, List.of()).shape(kind).variants()) {
            List<FormField> fields = variant.fields().stream().filter(f -> !f.name().equals(subject.tag()))
                    .map(f -> new FormField(f.name(), f.type(), f.required(), f.fallback())).toList();
            ways.add(new Way(String.join(" and ", fields.stream().filter(FormField::required).map(FormField::name).toList()), fields));
        }
        return List.copyOf(ways);
    }

    /**
     * Kind and way of the object at a path, faulty or not: of the ways, the one that has most of its fields; null if its kind is none.
     *
     * @throws IllegalArgumentException if what stands there does not come in kinds
     */
    public static Choice choice(FileTree tree, String path) {
        Subject subject = Subject.at(path);
        if (!(tree.get(path) instanceof Map<?, ?> object)) {
            return null;
        }
        String kind = object.containsKey(CopulaMapping.MIXTURE) && subject == Subject.COPULA ? CopulaMapping.MIXTURE : String.valueOf(object.get(subject.tag()));
        Shape<?> shape = KindTable.of(subject, List.of()).shape(kind);
        if (shape == null) {
            return null;
        }
        int best = 0;
        long most = -1;
        for (int way = 0; way < shape.variants().size(); way++) {
            Variant<?> variant = shape.variants().get(way);
            long fitting = object.keySet().stream().filter(name -> variant.has((String) name)).count();
            if (fitting > most) {
                best = way;
                most = fitting;
            }
        }
        return new Choice(kind, best);
    }

    /**
     * Another kind, or another way to give the same one. Ways of one kind give the same model. Another severity keeps mean and standard
     * deviation where it can have them, else the mean, else the median, and its cap; a frequency the mean and, where it can, the variance; a
     * copula Kendall's τ and groups. What was there and could not be read gives way to usual values.
     *
     * @param path of a severity, frequency, copula or loading, which need not be there yet
     * @param way position in {@link Kind#ways}
     * @throws IllegalArgumentException if the path is none of those, or there is no such kind or way
     */
    public static Converted convert(FileTree tree, String path, String kind, int way) {
        Subject subject = Subject.at(path);
        return KindTable.of(subject, namesJoined(tree, path)).convert(tree, path, kind, way);
    }

    /** Names of what a copula at that path joins; null for one that is not there. */
    private static List<String> namesJoined(FileTree tree, String path) {
        int own = path.indexOf("subPerilCopula");
        String list = own > 0 ? path.substring(0, own) + "subPerils" : "perils";
        return PortfolioMapping.names(tree.node(list), Limits.PERILS);
    }
}
