package layerweft.desktop.session;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.function.DoubleUnaryOperator;
import layerweft.file.FileTree;
import layerweft.model.copula.ArchimedeanFamily;
import layerweft.model.copula.CopulaFamily;
import layerweft.study.DependenceStrength;

/** Turns the dependence of a portfolio file stronger or weaker, and changes its family, touching no other field. */
final class DependenceEdit {
    private static final String COPULA = "dependence.copula";
    /** Digits that scaled strengths are written with. */
    private static final double DIGITS = 1e6;

    private DependenceEdit() {}

    /**
     * The portfolio with its dependence at a τ.
     *
     * @param strength of the portfolio as it is
     */
    static FileTree turned(FileTree portfolio, DependenceStrength strength, double tau) {
        return switch (strength.kind()) {
            case ONE_PERIL -> portfolio;
            case INDEPENDENT, FIXED -> withCopula(portfolio, fresh(strength.family(), tau));
            case ONE_TAU -> portfolio.remove(COPULA + ".theta").remove(COPULA + ".correlation").set(COPULA + ".kendallTau", tau);
            case PAIRS -> scaled(portfolio, COPULA, strength.factor(tau));
        };
    }

    /**
     * The portfolio with another family at a τ; a matrix stays where the family can have one, groups do where it can have them.
     *
     * @param tau within the family's reach
     */
    static FileTree withFamily(FileTree portfolio, CopulaFamily family, double tau) {
        boolean matrix = portfolio.has(COPULA + ".correlation") && elliptical(family);
        boolean groups = portfolio.has(COPULA + ".groups") && family.archimedean().isPresent();
        if (!matrix && !groups) {
            return withCopula(portfolio, fresh(family, tau));
        }
        FileTree kept = groups ? byTau(portfolio, COPULA, CopulaFamily.parse((String) portfolio.get(COPULA + ".family")).archimedean().orElseThrow())
                : portfolio;
        for (Map.Entry<String, Object> field : fresh(family, tau).entrySet()) {
            if (!field.getKey().equals("kendallTau")) {
                kept = kept.set(COPULA + "." + field.getKey(), field.getValue());
            }
        }
        if (!family.survival()) {
            kept = kept.remove(COPULA + ".survival");
        }
        return family.kind() == CopulaFamily.Kind.STUDENT ? kept : kept.remove(COPULA + ".degreesOfFreedom");
    }

    private static boolean elliptical(CopulaFamily family) {
        return family.kind() == CopulaFamily.Kind.GAUSSIAN || family.kind() == CopulaFamily.Kind.STUDENT;
    }

    private static FileTree withCopula(FileTree portfolio, Map<String, Object> copula) {
        FileTree linked = portfolio.has("dependence.links") ? portfolio : portfolio.set("dependence.links", "counts");
        return linked.set(COPULA, copula);
    }

    private static Map<String, Object> fresh(CopulaFamily family, double tau) {
        Map<String, Object> copula = new LinkedHashMap<>();
        copula.put("family", family.kind().name().toLowerCase(Locale.ROOT));
        if (family.hasStrength()) {
            copula.put("kendallTau", tau);
        }
        if (family.kind() == CopulaFamily.Kind.STUDENT) {
            copula.put("degreesOfFreedom", family.degreesOfFreedom());
        }
        if (family.survival()) {
            copula.put("survival", true);
        }
        return copula;
    }

    private static FileTree scaled(FileTree tree, String path, double factor) {
        if (tree.get(path + ".mixture") instanceof List<?> parts) {
            for (int k = 0; k < parts.size(); k++) {
                tree = scaled(tree, path + ".mixture[" + k + "].copula", factor);
            }
            return tree;
        }
        if (tree.get(path + ".correlation") instanceof List<?> rows) {
            return tree.set(path + ".correlation", scaled(rows, factor));
        }
        if (!tree.has(path + ".kendallTau") && !tree.has(path + ".theta")) {
            return tree;
        }
        CopulaFamily family = CopulaFamily.parse(familyText(tree, path));
        FileTree byTau = family.archimedean().isPresent() ? byTau(tree, path, family.archimedean().get()) : tree;
        return eachTau(byTau, path, tau -> rounded(tau * factor));
    }

    private static String familyText(FileTree tree, String path) {
        Object family = tree.get(path + ".family");
        return "student".equals(family) ? "student:" + tree.get(path + ".degreesOfFreedom") : (String) family;
    }

    /** Strengths given as θ are given as τ. */
    private static FileTree byTau(FileTree tree, String path, ArchimedeanFamily family) {
        if (tree.get(path + ".theta") instanceof Double theta) {
            tree = tree.remove(path + ".theta").set(path + ".kendallTau", rounded(family.tauOf(theta)));
        }
        for (int k = 0; tree.has(path + ".groups[" + k + "]"); k++) {
            tree = byTau(tree, path + ".groups[" + k + "]", family);
        }
        return tree;
    }

    private static FileTree eachTau(FileTree tree, String path, DoubleUnaryOperator change) {
        if (tree.get(path + ".kendallTau") instanceof Double tau) {
            tree = tree.set(path + ".kendallTau", change.applyAsDouble(tau));
        }
        for (int k = 0; tree.has(path + ".groups[" + k + "]"); k++) {
            tree = eachTau(tree, path + ".groups[" + k + "]", change);
        }
        return tree;
    }

    private static List<List<Double>> scaled(List<?> rows, double factor) {
        List<List<Double>> scaled = new ArrayList<>();
        for (int i = 0; i < rows.size(); i++) {
            List<Double> row = new ArrayList<>();
            List<?> numbers = (List<?>) rows.get(i);
            for (int j = 0; j < numbers.size(); j++) {
                double value = ((Number) numbers.get(j)).doubleValue();
                row.add(i == j ? value : rounded(value * factor));
            }
            scaled.add(row);
        }
        return scaled;
    }

    private static double rounded(double value) {
        return Math.rint(value * DIGITS) / DIGITS;
    }
}
