package layerweft.desktop.session;

import java.util.List;
import java.util.stream.Stream;
import layerweft.figures.FigureText;
import layerweft.model.copula.Copula;
import layerweft.model.copula.CopulaFamily;
import layerweft.model.copula.GroupedArchimedean;
import layerweft.model.copula.MixtureCopula;
import layerweft.study.DependenceStrength;

/** What families are called on screen, and their order there. */
public final class FamilyName {
    /** Those that tie the worst years first, then the others; the order of tiles, menus and of stepping through. */
    public static final List<CopulaFamily> IN_ORDER = Stream.of(
            "gumbel", "survival-clayton", "joe", "student:4", "frank", "gaussian", "clayton", "survival-gumbel", "survival-joe")
            .map(CopulaFamily::parse).toList();

    private FamilyName() {}

    /** E.g. {@code Survival Clayton}, {@code Student (ν 4)}. */
    public static String of(CopulaFamily family) {
        String name = switch (family.kind()) {
            case INDEPENDENCE -> "Independent";
            case GAUSSIAN -> "Gaussian";
            case STUDENT -> "Student (ν " + FigureText.plain(family.degreesOfFreedom()) + ")";
            case CLAYTON -> "Clayton";
            case GUMBEL -> "Gumbel";
            case FRANK -> "Frank";
            case JOE -> "Joe";
            case COMONOTONIC -> "Comonotone";
            case COUNTERMONOTONIC -> "Countermonotone";
        };
        return family.survival() ? "Survival " + name : name;
    }

    /** Of any copula: mixtures and groups by what they are, the others by their family. */
    static String of(Copula copula, int perils) {
        if (perils < 2) {
            return "No copula";
        }
        if (copula instanceof MixtureCopula) {
            return "Mixture";
        }
        String family = of(CopulaFamily.parse(copula.label()));
        boolean apart = DependenceStrength.of(copula, perils).kind() == DependenceStrength.Kind.PAIRS;
        return family + (copula instanceof GroupedArchimedean ? ", groups" : apart ? ", matrix" : "");
    }
}
