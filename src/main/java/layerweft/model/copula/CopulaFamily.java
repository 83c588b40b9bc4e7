package layerweft.model.copula;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import layerweft.model.Check;
import layerweft.model.Finding;
import layerweft.model.InadmissibleException;

/**
 * A family of copulas without its strength, as it is named in sweeps.
 *
 * @param kind which
 * @param survival Archimedean families: whether U is replaced by 1 − U
 * @param degreesOfFreedom {@link Kind#STUDENT}: ν; 0 for the others
 */
public record CopulaFamily(Kind kind, boolean survival, double degreesOfFreedom) {
    private static final String SURVIVAL = "survival-";
    private static final String STUDENT = "student:";
    private static final double USUAL_DEGREES_OF_FREEDOM = 4;

    /** The kinds of families, in the order in which they are shown. */
    public enum Kind { INDEPENDENCE, GAUSSIAN, STUDENT, CLAYTON, GUMBEL, FRANK, JOE, COMONOTONIC, COUNTERMONOTONIC }

    public CopulaFamily {
        Check check = new Check();
        boolean archimedean = archimedean(kind).isPresent();
        check.that(archimedean || !survival, "survival", true, "false: only Archimedean families have a survival version");
        if (kind == Kind.STUDENT) {
            check.that(degreesOfFreedom >= 0.1 && degreesOfFreedom < Double.POSITIVE_INFINITY, "degreesOfFreedom", degreesOfFreedom,
                    "a finite number of at least 0.1");
        } else {
            check.that(degreesOfFreedom == 0, "degreesOfFreedom", degreesOfFreedom, "none: only student has them");
        }
        check.orThrow();
    }

    /**
     * Reads {@code gumbel}, {@code survival-clayton}, {@code student:4}, {@code independence}, …
     *
     * @throws InadmissibleException naming the field {@code family}
     */
    public static CopulaFamily parse(String text) {
        boolean survival = text.startsWith(SURVIVAL);
        String name = survival ? text.substring(SURVIVAL.length()) : text;
        if (name.startsWith(STUDENT)) {
            return new CopulaFamily(Kind.STUDENT, survival, number(text, name.substring(STUDENT.length())));
        }
        for (Kind kind : Kind.values()) {
            if (name.equals(nameOf(kind)) && kind != Kind.STUDENT && (!survival || archimedean(kind).isPresent())) {
                return new CopulaFamily(kind, survival, 0);
            }
        }
        throw unknown(text);
    }

    private static double number(String text, String degrees) {
        try {
            return Double.parseDouble(degrees);
        } catch (NumberFormatException e) {
            throw unknown(text);
        }
    }

    private static RuntimeException unknown(String text) {
        List<String> names = withStrength().stream().map(CopulaFamily::label).toList();
        return new InadmissibleException(List.of(new Finding("family", "\"" + text + "\"",
                "one of " + String.join(", ", names) + " (student: with any degrees of freedom), independence, comonotonic, countermonotonic")));
    }

    /** All families that have a strength: gaussian, student with 4 degrees of freedom, the Archimedean ones and their survival versions. */
    public static List<CopulaFamily> withStrength() {
        List<CopulaFamily> families = new ArrayList<>();
        for (Kind kind : Kind.values()) {
            if (kind == Kind.GAUSSIAN) {
                families.add(new CopulaFamily(kind, false, 0));
            } else if (kind == Kind.STUDENT) {
                families.add(new CopulaFamily(kind, false, USUAL_DEGREES_OF_FREEDOM));
            } else if (archimedean(kind).isPresent()) {
                families.add(new CopulaFamily(kind, false, 0));
                families.add(new CopulaFamily(kind, true, 0));
            }
        }
        return List.copyOf(families);
    }

    /** The Archimedean family, if it is one. */
    public Optional<ArchimedeanFamily> archimedean() {
        return archimedean(kind);
    }

    private static Optional<ArchimedeanFamily> archimedean(Kind kind) {
        return switch (kind) {
            case CLAYTON -> Optional.of(ArchimedeanFamily.CLAYTON);
            case GUMBEL -> Optional.of(ArchimedeanFamily.GUMBEL);
            case FRANK -> Optional.of(ArchimedeanFamily.FRANK);
            case JOE -> Optional.of(ArchimedeanFamily.JOE);
            default -> Optional.empty();
        };
    }

    /** Whether Kendall's τ may be chosen. */
    public boolean hasStrength() {
        return kind != Kind.INDEPENDENCE && kind != Kind.COMONOTONIC && kind != Kind.COUNTERMONOTONIC;
    }

    /** The text that {@link #parse} reads. */
    public String label() {
        if (kind == Kind.STUDENT) {
            return Student.label(degreesOfFreedom);
        }
        return (survival ? SURVIVAL : "") + nameOf(kind);
    }

    private static String nameOf(Kind kind) {
        return kind.name().toLowerCase(Locale.ROOT);
    }

    /** The τ that the family can have in every pair of so many variables; a single point for families without a strength. */
    public TauRange tauRange(int dimension) {
        return switch (kind) {
            case INDEPENDENCE -> new TauRange(0, false, 0, false);
            case COMONOTONIC -> new TauRange(1, false, 1, false);
            case COUNTERMONOTONIC -> new TauRange(-1, false, -1, false);
            case GAUSSIAN, STUDENT -> TauRange.elliptical(dimension);
            case CLAYTON, GUMBEL, FRANK, JOE -> TauRange.of(archimedean().orElseThrow(), dimension);
        };
    }

    /**
     * The copula with Kendall's τ in every pair; families without a strength pay no heed to τ.
     *
     * @throws InadmissibleException if not even two variables can have this τ
     */
    public Copula at(double kendallTau) {
        return switch (kind) {
            case INDEPENDENCE -> new Independence();
            case COMONOTONIC -> new Comonotonic();
            case COUNTERMONOTONIC -> new Countermonotonic();
            case GAUSSIAN -> Gaussian.ofKendallTau(kendallTau);
            case STUDENT -> Student.ofKendallTau(kendallTau, degreesOfFreedom);
            case CLAYTON, GUMBEL, FRANK, JOE -> Archimedean.ofKendallTau(archimedean().orElseThrow(), survival, kendallTau);
        };
    }
}
