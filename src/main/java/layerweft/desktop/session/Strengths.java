package layerweft.desktop.session;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;

/** The numbers in a portfolio file that say how strong its dependence is: those that the τ control turns. */
final class Strengths {
    private static final String COPULA = "dependence.copula";
    /** Scaled strengths are written with six digits after the point. */
    private static final double ROUNDING = 1e-4;

    private Strengths() {}

    /** Whether two documents differ in nothing but the strength of the dependence, all of it turned together. */
    static boolean only(Document a, Document b) {
        if (!a.programme().equals(b.programme()) || !a.portfolio().remove(COPULA).equals(b.portfolio().remove(COPULA))) {
            return false;
        }
        List<Double> ofA = new ArrayList<>();
        List<Double> ofB = new ArrayList<>();
        return shape(a.portfolio().get(COPULA), ofA).equals(shape(b.portfolio().get(COPULA), ofB)) && proportional(ofA, ofB);
    }

    /** The copula without its strengths, which are gathered. */
    private static Object shape(Object of, List<Double> strengths) {
        if (of instanceof Map<?, ?> object) {
            List<Object> fields = new ArrayList<>();
            object.forEach((name, value) -> {
                boolean strength = name.equals("kendallTau") || name.equals("correlation");
                fields.add(name);
                fields.add(strength ? gathered(value, strengths) : shape(value, strengths));
            });
            return fields;
        }
        return of instanceof List<?> list ? list.stream().map(member -> shape(member, strengths)).toList() : String.valueOf(of);
    }

    private static String gathered(Object value, List<Double> strengths) {
        if (value instanceof List<?> list) {
            list.forEach(member -> gathered(member, strengths));
        } else if (value instanceof Double number && number != 1) {
            strengths.add(number);
        }
        return "strength";
    }

    private static boolean proportional(List<Double> a, List<Double> b) {
        if (a.size() != b.size() || a.size() < 2) {
            return a.size() == b.size();
        }
        double lengthA = Math.sqrt(a.stream().mapToDouble(x -> x * x).sum());
        double lengthB = Math.sqrt(b.stream().mapToDouble(x -> x * x).sum());
        for (int k = 0; k < a.size(); k++) {
            if (!(Math.abs(a.get(k) * lengthB - b.get(k) * lengthA) <= ROUNDING * lengthA * lengthB)) {
                return false;
            }
        }
        return true;
    }
}
