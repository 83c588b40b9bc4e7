package layerweft.file;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import layerweft.file.KindTable.Match;
import layerweft.model.InadmissibleException;
import layerweft.model.copula.Archimedean;
import layerweft.model.copula.ArchimedeanFamily;
import layerweft.model.copula.Comonotonic;
import layerweft.model.copula.Copula;
import layerweft.model.copula.CopulaFamily;
import layerweft.model.copula.Correlation;
import layerweft.model.copula.CorrelationMatrix;
import layerweft.model.copula.Countermonotonic;
import layerweft.model.copula.Gaussian;
import layerweft.model.copula.Group;
import layerweft.model.copula.GroupedArchimedean;
import layerweft.model.copula.Independence;
import layerweft.model.copula.MixtureCopula;
import layerweft.model.copula.Student;
import layerweft.model.copula.TauRange;

/**
 * Copulas of another kind with the same Kendall's τ in every pair, where they can have it.
 *
 * @param dimension number of perils joined
 */
record CopulaMatch(int dimension) {
    private static final double USUAL_TAU = 0.3;
    private static final double USUAL_DEGREES_OF_FREEDOM = 4;
    /** The strongest τ taken for a family that cannot have 1. */
    private static final double NEARLY_ONE = 0.95;

    static Copula usual() {
        return Archimedean.ofKendallTau(ArchimedeanFamily.GUMBEL, false, USUAL_TAU);
    }

    Match<Copula> to(Copula from, String kind, Variant<Copula> way) {
        return switch (kind) {
            case "independence" -> new Match<>(new Independence(), "No dependence: nothing is kept.");
            case "comonotonic" -> new Match<>(new Comonotonic(), "The strongest dependence: nothing is kept.");
            case "countermonotonic" -> new Match<>(new Countermonotonic(), "The strongest opposite dependence: nothing is kept.");
            case CopulaMapping.MIXTURE -> new Match<>(new MixtureCopula(List.of(0.5, 0.5), List.of(from, from)),
                    "The same dependence, as a mixture of itself in equal parts.");
            case "gaussian", "student" -> elliptical(from, kind, way.has("correlation"));
            default -> archimedean(from, ArchimedeanFamily.valueOf(kind.toUpperCase(Locale.ROOT)));
        };
    }

    private Match<Copula> elliptical(Copula from, String kind, boolean matrix) {
        double degrees = from instanceof Student student ? student.degreesOfFreedom() : USUAL_DEGREES_OF_FREEDOM;
        boolean student = kind.equals("student");
        if (matrix) {
            Correlation present = from instanceof Gaussian g ? g.correlation() : from instanceof Student s ? s.correlation() : null;
            double[][] rows = present == null ? correlationOfTau(from) : present.matrix(dimension);
            try {
                return new Match<>(student ? Student.ofCorrelation(rows, degrees) : Gaussian.ofCorrelation(rows),
                        from instanceof MixtureCopula ? "The mean of the parts' Kendall's τ is now that of every pair."
                                : present == null ? "Kendall's τ of every pair is kept." : "The correlation of every pair is kept.");
            } catch (InadmissibleException e) {
                double[][] equal = new Gaussian(Gaussian.ofKendallTau(mean(from)).correlation()).correlation().matrix(dimension);
                return new Match<>(student ? Student.ofCorrelation(equal, degrees) : Gaussian.ofCorrelation(equal),
                        "The pairs' own values of Kendall's τ are no correlation matrix together; their mean is now that of every pair.");
            }
        }
        double tau = inRange(new CopulaFamily(student ? CopulaFamily.Kind.STUDENT : CopulaFamily.Kind.GAUSSIAN, false, student ? degrees : 0), mean(from));
        return new Match<>(student ? Student.ofKendallTau(tau, degrees) : Gaussian.ofKendallTau(tau), said(from, tau));
    }

    private Match<Copula> archimedean(Copula from, ArchimedeanFamily family) {
        boolean survival = ArchimedeanForm.survival(from);
        if (from instanceof GroupedArchimedean grouped) {
            Group root = grouped.root();
            Group other = new Group(strength(grouped.family(), family, root.theta()), List.of(), groups(grouped.family(), family, root.groups()));
            return new Match<>(GroupedArchimedean.of(family, survival, other), "Groups and Kendall's τ of every pair are kept.");
        }
        CopulaFamily.Kind kind = CopulaFamily.Kind.valueOf(family.name());
        double tau = inRange(new CopulaFamily(kind, survival, 0), mean(from));
        return new Match<>(Archimedean.ofKendallTau(family, survival, tau), said(from, tau));
    }

    private static List<Group> groups(ArchimedeanFamily from, ArchimedeanFamily to, List<Group> groups) {
        return groups.stream().map(g -> new Group(strength(from, to, g.theta()), g.members(), groups(from, to, g.groups()))).toList();
    }

    private static double strength(ArchimedeanFamily from, ArchimedeanFamily to, double theta) {
        return to.thetaOf(Shown.tidy(ArchimedeanForm.tau(from, theta)));
    }

    /** The τ, or the nearest that the family can have. */
    private double inRange(CopulaFamily family, double tau) {
        TauRange range = family.tauRange(dimension);
        if (range.contains(tau)) {
            return tau;
        }
        return tau > 0 ? NEARLY_ONE : range.lowOpen() ? -NEARLY_ONE : range.low();
    }

    private String said(Copula from, double tau) {
        double mean = mean(from);
        if (!Shown.same(mean, tau)) {
            return "Kendall's τ was " + Shown.number(mean) + " and is now " + Shown.number(tau) + ", the nearest of this family.";
        }
        if (from instanceof MixtureCopula) {
            return "The mean of the parts' Kendall's τ, " + Shown.number(tau) + ", is now that of every pair.";
        }
        return spread(from) < 1e-9 ? "Kendall's τ, " + Shown.number(tau) + ", is kept."
                : "The mean of the pairs' Kendall's τ, " + Shown.number(tau) + ", is now that of every pair.";
    }

    private double mean(Copula copula) {
        return Shown.tidy(pairs(copula).stream().mapToDouble(Double::doubleValue).average().orElse(0));
    }

    private double spread(Copula copula) {
        List<Double> taus = pairs(copula);
        return taus.stream().mapToDouble(Double::doubleValue).max().orElse(0) - taus.stream().mapToDouble(Double::doubleValue).min().orElse(0);
    }

    /** τ of all pairs; of the first where the copula treats all alike. */
    private List<Double> pairs(Copula copula) {
        boolean alike = !(copula instanceof GroupedArchimedean || copula instanceof MixtureCopula
                || copula instanceof Gaussian g && g.correlation() instanceof CorrelationMatrix
                || copula instanceof Student s && s.correlation() instanceof CorrelationMatrix);
        List<Double> taus = new ArrayList<>();
        for (int i = 0; i < dimension; i++) {
            for (int j = i + 1; j < dimension && (taus.isEmpty() || !alike); j++) {
                taus.add(tau(copula, i, j));
            }
        }
        return taus;
    }

    /** Of a mixture the mean of its parts, by weight: its own takes seconds to integrate and is no better to start from. */
    private static double tau(Copula copula, int i, int j) {
        if (!(copula instanceof MixtureCopula mixture)) {
            return copula.kendallTau(i, j);
        }
        double sum = 0;
        for (int k = 0; k < mixture.weights().size(); k++) {
            sum += mixture.weights().get(k) * tau(mixture.components().get(k), i, j);
        }
        return sum;
    }

    private double[][] correlationOfTau(Copula copula) {
        double[][] rows = new double[dimension][dimension];
        for (int i = 0; i < dimension; i++) {
            rows[i][i] = 1;
            for (int j = 0; j < i; j++) {
                rows[i][j] = Shown.tidy(Math.sin(Math.PI / 2 * tau(copula, i, j)));
                rows[j][i] = rows[i][j];
            }
        }
        return rows;
    }
}
