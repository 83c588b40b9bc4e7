package layerweft.file;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.IntStream;

/**
 * Ready values for new objects of a portfolio or programme: valid where the file is, named as nothing else in it, and of a size with what is
 * there. They go in with {@link FileTree#insert}.
 */
public final class FreshParts {
    private static final double USUAL_MEAN = 10;
    private static final double USUAL_TAU = 0.3;

    private FreshParts() {}

    /** For the list {@code perils}: one event a year, lognormal losses about as large as the first peril's. */
    public static Map<String, Object> peril(FileTree portfolio) {
        return ordered("name", unused(portfolio, "perils", "New peril"), "frequency", ordered("model", "poisson", "mean", 1.0),
                "severity", severity(portfolio, "perils"));
    }

    /** For a list {@code perils[i].subPerils}: in every second event, lognormal losses about as large as the first sub-peril's. */
    public static Map<String, Object> subPeril(FileTree portfolio, String listPath) {
        return ordered("name", unused(portfolio, listPath, "New sub-peril"), "chance", 0.5, "severity", severity(portfolio, listPath));
    }

    /**
     * For the list {@code layers}: all perils, on top of the layer that stands before the given position where that has an occurrence limit,
     * with the same limit and one reinstatement.
     *
     * @param index position of the new layer
     */
    public static Map<String, Object> layer(FileTree programme, int index) {
        String below = "layers[" + Math.max(0, index - 1) + "].occurrence";
        double limit = programme.get(below + ".limit") instanceof Double d && d > 0 && Double.isFinite(d) ? d : USUAL_MEAN;
        boolean stands = programme.get(below + ".limit") instanceof Double && !programme.has(below + ".franchise");
        double retention = stands && programme.get(below + ".retention") instanceof Double d && d >= 0 ? d : 0;
        return ordered("name", unused(programme, "layers", "New layer"),
                "occurrence", ordered("retention", Shown.tidy(stands ? retention + limit : limit), "limit", limit), "reinstatements", List.of(1.0));
    }

    /** For a list {@code reinstatements}: the rate of the last one there, else 1. */
    public static double reinstatement(FileTree programme, String listPath) {
        int n = programme.size(listPath);
        return n > 0 && programme.get(listPath + "[" + (n - 1) + "]") instanceof Double rate ? rate : 1;
    }

    /**
     * For the list {@code groups} of a copula: those perils, more strongly joined than by the copula around them.
     *
     * @param copulaPath of the copula or group that will hold the new one
     */
    public static Map<String, Object> group(FileTree portfolio, String copulaPath, List<String> perils) {
        if (portfolio.get(copulaPath + ".theta") instanceof Double theta) {
            return ordered("perils", perils, "theta", theta);
        }
        double around = portfolio.get(copulaPath + ".kendallTau") instanceof Double tau && tau >= 0 && tau < 1 ? tau : USUAL_TAU;
        return ordered("perils", perils, "kendallTau", Math.rint(100 * (around + (1 - around) / 4)) / 100);
    }

    private static Map<String, Object> severity(FileTree portfolio, String listPath) {
        String first = listPath + "[0].severity";
        Faults faults = new Faults(portfolio.fileName());
        var model = portfolio.has(first) ? SeverityMapping.SEVERITY.read(portfolio.node(first), first, faults) : null;
        double mean = model != null && Double.isFinite(model.mean()) && model.mean() > 0 ? oneDigit(model.mean()) : USUAL_MEAN;
        return ordered("model", "lognormal", "mean", mean, "cv", 2.0);
    }

    private static double oneDigit(double value) {
        return new BigDecimal(value).round(new MathContext(1)).doubleValue();
    }

    /** The name itself, or with the first number from 2 that nothing in the list has. */
    private static String unused(FileTree tree, String listPath, String name) {
        List<String> names = IntStream.range(0, tree.size(listPath)).mapToObj(k -> String.valueOf(tree.get(listPath + "[" + k + "].name"))).toList();
        return IntStream.iterate(1, n -> n + 1).mapToObj(n -> n == 1 ? name : name + " " + n).filter(n -> !names.contains(n)).findFirst()
                .orElseThrow();
    }

    private static Map<String, Object> ordered(Object... namesAndValues) {
        Map<String, Object> fields = new LinkedHashMap<>();
        for (int k = 0; k < namesAndValues.length; k += 2) {
            fields.put((String) namesAndValues[k], namesAndValues[k + 1]);
        }
        return fields;
    }
}
