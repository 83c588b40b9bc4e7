package layerweft.file;

import static layerweft.file.Field.number;
import static layerweft.file.Field.optional;
import static layerweft.file.Field.required;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Set;
import java.util.stream.IntStream;
import layerweft.file.Tagged.Kind;
import layerweft.model.Finding;
import layerweft.model.InadmissibleException;
import layerweft.model.copula.Archimedean;
import layerweft.model.copula.ArchimedeanFamily;
import layerweft.model.copula.Comonotonic;
import layerweft.model.copula.Copula;
import layerweft.model.copula.Countermonotonic;
import layerweft.model.copula.Gaussian;
import layerweft.model.copula.Group;
import layerweft.model.copula.GroupedArchimedean;
import layerweft.model.copula.Independence;
import layerweft.model.copula.MixtureCopula;
import layerweft.model.copula.Student;

/** A copula in a portfolio file, between perils that have names: its kinds, one line each, groups and mixtures. */
final class CopulaMapping {
    /** The kind that has no family. */
    static final String MIXTURE = "mixture";

    private static final Field<Double> TAU = number("kendallTau");
    private static final Field<Double> THETA = number("theta");
    private static final Field<Double> DEGREES_OF_FREEDOM = number("degreesOfFreedom");
    private static final Field<List<List<Double>>> CORRELATION =
            required("correlation", Lists.of(Lists.of(Scalars.NUMBER, Limits.PERILS), Limits.PERILS));
    private static final Field<Boolean> SURVIVAL = optional("survival", Scalars.TRUTH, false);

    /** One part of a mixture. */
    private record Component(double weight, Copula copula) {}

    private final List<String> names;
    private final Set<String> grouped = new HashSet<>();
    private final Tagged<Copula> families = Tagged.of("copula", "family", List.of(
            Kind.of("independence", "Independence", Independence.class, Variant.of(v -> new Independence())),
            Kind.of("comonotonic", "Comonotonic", Comonotonic.class, Variant.of(v -> new Comonotonic())),
            Kind.of("countermonotonic", "Countermonotonic", Countermonotonic.class, Variant.of(v -> new Countermonotonic())),
            Kind.of("gaussian", "Gaussian", Gaussian.class,
                    Variant.of(TAU.of(c -> EllipticalForm.tau(c.correlation())), Gaussian::ofKendallTau),
                    Variant.of(CORRELATION.of(c -> EllipticalForm.rows(c.correlation())), rows -> Gaussian.ofCorrelation(matrix(rows)))),
            Kind.of("student", "Student t", Student.class,
                    Variant.of(TAU.of(c -> EllipticalForm.tau(c.correlation())), DEGREES_OF_FREEDOM.of(Student::degreesOfFreedom),
                            Student::ofKendallTau),
                    Variant.of(CORRELATION.of(c -> EllipticalForm.rows(c.correlation())), DEGREES_OF_FREEDOM.of(Student::degreesOfFreedom),
                            (rows, nu) -> Student.ofCorrelation(matrix(rows), nu))),
            archimedean(ArchimedeanFamily.CLAYTON),
            archimedean(ArchimedeanFamily.GUMBEL),
            archimedean(ArchimedeanFamily.FRANK),
            archimedean(ArchimedeanFamily.JOE)));
    private final Shape<Component> component;
    private final Shape<Copula> mixture;

    private CopulaMapping(List<String> names) {
        this.names = new ArrayList<>(names);
        this.component = Shape.of("mixtureComponent",
                Variant.of(number("weight").of(Component::weight), required("copula", of(names)).of(Component::copula), Component::new));
        this.mixture = Shape.of("copula.mixture", Variant.of(
                required("mixture", Lists.of(component, Limits.LIST).as(FieldType.COPULAS)).of(CopulaMapping::components),
                parts -> new MixtureCopula(parts.stream().map(Component::weight).toList(), parts.stream().map(Component::copula).toList())));
    }

    /**
     * @param names of the perils joined, in order; null for a name that could not be read
     */
    static TwoWay<Copula> of(List<String> names) {
        return TwoWay.of(FieldType.OBJECT, (node, path, faults) -> new CopulaMapping(names).read(node, path, faults),
                copula -> new CopulaMapping(names).write(copula));
    }

    /** The shapes of all objects that a copula may consist of. */
    static List<Shape<?>> shapes() {
        CopulaMapping mapping = new CopulaMapping(List.of());
        List<Shape<?>> shapes = new ArrayList<>(mapping.families.shapes());
        shapes.addAll(List.of(mapping.mixture, mapping.component, mapping.group(ArchimedeanFamily.CLAYTON)));
        return shapes;
    }

    /** The shapes of all kinds between perils of those names, by the kinds' names; that of a mixture too. */
    static Map<String, Shape<Copula>> kinds(List<String> names) {
        CopulaMapping mapping = new CopulaMapping(names);
        Map<String, Shape<Copula>> kinds = new LinkedHashMap<>();
        mapping.families.labels().keySet().forEach(kind -> kinds.put(kind, mapping.families.kind(kind)));
        kinds.put(MIXTURE, mapping.mixture);
        return kinds;
    }

    /** What people call the kinds. */
    static Map<String, String> labels() {
        Map<String, String> labels = new LinkedHashMap<>(new CopulaMapping(List.of()).families.labels());
        labels.put(MIXTURE, "Mixture");
        return labels;
    }

    private Copula read(Node node, String path, Faults faults) {
        if (!(node instanceof Node.Members object)) {
            faults.wrongType(node, path, "an object with the field family or mixture");
            return null;
        }
        if (object.get("family") != null && object.get("mixture") != null) {
            faults.add(node.place(), path, "family beside mixture", "family, or mixture");
            return null;
        }
        Copula copula = (object.get("mixture") == null ? families : mixture).read(node, path, faults);
        if (copula == null || names.isEmpty()) {
            return copula;
        }
        try {
            copula.requireDimension(names.size());
            return copula;
        } catch (InadmissibleException e) {
            faults.add(node, path, asGiven(object, e));
            return null;
        }
    }

    private Node write(Copula copula) {
        return (copula instanceof MixtureCopula ? mixture : families).write(copula);
    }

    private static List<Component> components(Copula copula) {
        return copula instanceof MixtureCopula mixed ? IntStream.range(0, mixed.weights().size())
                .mapToObj(k -> new Component(mixed.weights().get(k), mixed.components().get(k))).toList() : null;
    }

    /** Where the strength was given as theta, findings are about that field. */
    private static InadmissibleException asGiven(Node.Members object, InadmissibleException e) {
        if (object.get("theta") == null) {
            return e;
        }
        return new InadmissibleException(e.findings().stream()
                .map(f -> f.field().equals("kendallTau") ? new Finding("theta", "kendallTau " + f.found(), "kendallTau " + f.admissible()) : f)
                .toList());
    }

    private Kind<Copula> archimedean(ArchimedeanFamily family) {
        Field<List<Group>> groups = groups(family);
        return Kind.of(family.label(), family.label().substring(0, 1).toUpperCase(Locale.ROOT) + family.label().substring(1), Copula.class,
                Variant.of(TAU.of(c -> ArchimedeanForm.tau(family, c)), SURVIVAL.of(ArchimedeanForm::survival), groups.of(ArchimedeanForm::groups),
                        (tau, survival, inner) -> inner.isEmpty() ? Archimedean.ofKendallTau(family, survival, tau)
                                : GroupedArchimedean.of(family, survival, Group.ofKendallTau(family, tau, List.of(), inner))),
                Variant.of(THETA.of(c -> ArchimedeanForm.theta(family, c)), SURVIVAL.of(ArchimedeanForm::survival),
                        groups.of(ArchimedeanForm::groups),
                        (theta, survival, inner) -> inner.isEmpty() ? Archimedean.ofTheta(family, survival, theta)
                                : GroupedArchimedean.of(family, survival, new Group(theta, List.of(), inner))));
    }

    private Field<List<Group>> groups(ArchimedeanFamily family) {
        TwoWay<Group> group = TwoWay.of(FieldType.OBJECT, (node, path, faults) -> group(family).read(node, path, faults),
                value -> group(family).write(value));
        return optional("groups", Lists.of(group, Limits.PERILS).as(FieldType.GROUPS), List.of());
    }

    private Shape<Group> group(ArchimedeanFamily family) {
        TwoWay<Integer> member = TwoWay.of(FieldType.TEXT, this::member, names::get);
        Part<Group, List<Integer>> members = optional("perils", Lists.of(member, Limits.PERILS), List.<Integer>of()).of(Group::members);
        Part<Group, List<Group>> inner = groups(family).of(Group::groups);
        return Shape.of("group",
                Variant.of(TAU.of(g -> ArchimedeanForm.tau(family, g.theta())), members, inner,
                        (tau, perils, groups) -> Group.ofKendallTau(family, tau, perils, groups)),
                Variant.of(THETA.of(Group::theta), members, inner, Group::new));
    }

    /** Index of a peril that a group names; each may be named once in all groups. */
    private Integer member(Node node, String path, Faults faults) {
        String name = Scalars.TEXT.read(node, path, faults);
        if (name == null) {
            return null;
        }
        if (!grouped.add(name)) {
            faults.wrongType(node, path, "each peril in one group only");
            return null;
        }
        if (names.isEmpty()) {
            return grouped.size() - 1; // a list of perils that is itself at fault: any index serves to read on
        }
        int index = names.indexOf(name);
        if (index < 0 && names.contains(null)) {
            index = names.indexOf(null);
            names.set(index, name); // the peril whose own name is at fault may be meant: that fault is enough
        }
        if (index < 0) {
            faults.wrongType(node, path, "one of the perils joined: " + String.join(", ", names));
            return null;
        }
        return index;
    }

    private static double[][] matrix(List<List<Double>> rows) {
        return rows.stream().map(Lists::array).toArray(double[][]::new);
    }
}
