package layerweft.file;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.function.BiFunction;
import java.util.function.Supplier;
import layerweft.file.FormKinds.Converted;
import layerweft.file.FormKinds.Subject;
import layerweft.model.InadmissibleException;
import layerweft.model.frequency.Poisson;
import layerweft.model.severity.Lognormal;
import layerweft.model.treaty.Loading;

/**
 * The kinds of one subject with their shapes, and how a model of one becomes a model of another.
 *
 * @param shapes by the kinds' names
 * @param labels by the same
 * @param all reads any kind
 * @param comparison what of one model a nearly equal one has
 * @param usual where there is nothing to go by
 */
record KindTable<T>(Map<String, Shape<T>> shapes, Map<String, String> labels, TwoWay<T> all, Matcher<T> matcher,
        BiFunction<T, T, String> comparison, Supplier<T> usual) {

    private static final String SAME = "The same in other parameters.";

    /** A model of another kind, and a sentence on what is kept. */
    record Match<T>(T model, String kept) {}

    /** How a model of one kind becomes one of another. */
    @FunctionalInterface
    interface Matcher<T> {

        /**
         * @param kind of the model to find
         * @param way in which it has to be given
         */
        Match<T> to(T from, String kind, Variant<T> way);
    }

    /** @param names of the perils that a copula joins */
    static KindTable<?> of(Subject subject, List<String> names) {
        return switch (subject) {
            case SEVERITY -> of(SeverityMapping.SEVERITY, (from, kind, way) -> SeverityMatch.to(from, kind), SeverityMatch::compare,
                    () -> Lognormal.ofMeanAndCv(10, 2));
            case FREQUENCY -> of(FrequencyMapping.FREQUENCY, (from, kind, way) -> FrequencyMatch.to(from, kind), (from, to) -> SAME,
                    () -> new Poisson(1));
            case LOADING -> of(LoadingMapping.LOADING, (from, kind, way) -> LoadingMatch.to(kind), (from, to) -> SAME, Loading.None::new);
            case COPULA -> {
                CopulaMatch match = new CopulaMatch(Math.max(2, names.size()));
                yield new KindTable<>(CopulaMapping.kinds(names), CopulaMapping.labels(), CopulaMapping.of(names), match::to, (from, to) -> SAME,
                        CopulaMatch::usual);
            }
        };
    }

    private static <T> KindTable<T> of(Tagged<T> tagged, Matcher<T> matcher, BiFunction<T, T, String> comparison, Supplier<T> usual) {
        Map<String, Shape<T>> shapes = new LinkedHashMap<>();
        tagged.labels().keySet().forEach(kind -> shapes.put(kind, tagged.kind(kind)));
        return new KindTable<>(shapes, tagged.labels(), tagged, matcher, comparison, usual);
    }

    /** Null if there is no such kind. */
    Shape<T> shape(String kind) {
        return shapes.get(kind);
    }

    Converted convert(FileTree tree, String path, String kind, int way) {
        Shape<T> shape = shapes.get(kind);
        if (shape == null || way < 0 || way >= shape.variants().size()) {
            throw new IllegalArgumentException("no way " + way + " of a kind " + kind + " among " + String.join(", ", shapes.keySet()));
        }
        Faults faults = new Faults(tree.fileName());
        T present = tree.has(path) ? all.read(tree.node(path), path, faults) : null;
        Variant<T> variant = shape.variants().get(way);
        if (present == null) {
            String why = tree.has(path) ? "What was there has faults, so these are usual values to start from." : "Usual values to start from.";
            return converted(tree, path, variant, matcher.to(usual.get(), kind, variant).model(), (from, to) -> why);
        }
        if (FormKinds.choice(tree, path).kind().equals(kind) && variant.values().apply(present) != null) {
            return converted(tree, path, variant, present, comparison);
        }
        Match<T> matched = matched(present, kind, variant);
        return converted(tree, path, variant, matched.model(), (from, to) -> matched.kept());
    }

    private Match<T> matched(T present, String kind, Variant<T> variant) {
        try {
            return matcher.to(present, kind, variant);
        } catch (InadmissibleException e) { // a mean of 0, say, that the kind cannot have
            return new Match<>(matcher.to(usual.get(), kind, variant).model(),
                    "The kind can have none of its figures; these are usual values to start from.");
        }
    }

    /** Gives the model in that way: exactly, else to rounding, else not at all. */
    private Converted converted(FileTree tree, String path, Variant<T> variant, T model, BiFunction<T, T, String> kept) {
        Values exact = variant.exact(model);
        Values values = exact == null ? variant.values().apply(model) : exact;
        try {
            T there = exact == null ? variant.build().apply(values) : model;
            return new Converted(tree.set(path, Shape.members(variant, values)), kept.apply(model, there));
        } catch (InadmissibleException e) {
            return new Converted(tree, "Nothing is changed: in this way the parameters would be out of their range.");
        }
    }
}
