package layerweft.file;

import static layerweft.file.Field.number;
import static layerweft.file.Field.optional;
import static layerweft.file.Field.required;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
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
            Kind.of("independence", Variant.of(v -> new Independence())),
            Kind.of("comonotonic", Variant.of(v -> new Comonotonic())),
            Kind.of("countermonotonic", Variant.of(v -> new Countermonotonic())),
            Kind.of("gaussian", Variant.of(TAU, Gaussian::ofKendallTau), Variant.of(CORRELATION, rows -> Gaussian.ofCorrelation(matrix(rows)))),
            Kind.of("student", Variant.of(TAU, DEGREES_OF_FREEDOM, Student::ofKendallTau),
                    Variant.of(CORRELATION, DEGREES_OF_FREEDOM, (rows, nu) -> Student.ofCorrelation(matrix(rows), nu))),
            archimedean(ArchimedeanFamily.CLAYTON),
            archimedean(ArchimedeanFamily.GUMBEL),
            archimedean(ArchimedeanFamily.FRANK),
            archimedean(ArchimedeanFamily.JOE)));
    private final Shape<Component> component;
    private final Shape<Copula> mixture;

    private CopulaMapping(List<String> names) {
        this.names = new ArrayList<>(names);
        this.component = Shape.of("mixtureComponent", Variant.of(number("weight"), required("copula", of(names)), Component::new));
        this.mixture = Shape.of("copula.mixture", Variant.of(required("mixture", Lists.of(component, Limits.LIST)),
                parts -> new MixtureCopula(parts.stream().map(Component::weight).toList(), parts.stream().map(Component::copula).toList())));
    }

    /**
     * @param names of the perils joined, in order; null for a name that could not be read
     */
    static Reading<Copula> of(List<String> names) {
        return (node, path, faults) -> new CopulaMapping(names).read(node, path, faults);
    }

    /** The shapes of all objects that a copula may consist of. */
    static List<Shape<?>> shapes() {
        CopulaMapping mapping = new CopulaMapping(List.of());
        List<Shape<?>> shapes = new ArrayList<>(mapping.families.shapes());
        shapes.addAll(List.of(mapping.mixture, mapping.component, mapping.group(ArchimedeanFamily.CLAYTON)));
        return shapes;
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
        return Kind.of(family.label(),
                Variant.of(TAU, SURVIVAL, groups, (tau, survival, inner) -> inner.isEmpty() ? Archimedean.ofKendallTau(family, survival, tau)
                        : GroupedArchimedean.of(family, survival, Group.ofKendallTau(family, tau, List.of(), inner))),
                Variant.of(THETA, SURVIVAL, groups, (theta, survival, inner) -> inner.isEmpty() ? Archimedean.ofTheta(family, survival, theta)
                        : GroupedArchimedean.of(family, survival, new Group(theta, List.of(), inner))));
    }

    private Field<List<Group>> groups(ArchimedeanFamily family) {
        return optional("groups", Lists.of((node, path, faults) -> group(family).read(node, path, faults), Limits.PERILS), List.of());
    }

    private Shape<Group> group(ArchimedeanFamily family) {
        Field<List<Integer>> members = optional("perils", Lists.of(this::member, Limits.PERILS), List.of());
        Field<List<Group>> inner = groups(family);
        return Shape.of("group",
                Variant.of(TAU, members, inner, (tau, perils, groups) -> Group.ofKendallTau(family, tau, perils, groups)),
                Variant.of(THETA, members, inner, Group::new));
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
