package layerweft.model.treaty;

import java.util.List;
import java.util.TreeSet;
import layerweft.model.Check;

/**
 * What the buyer looks at.
 *
 * @param returnPeriods years, each above 1 and at most {@value #RAREST}
 * @param tailLevel level of the tail value at risk, above 0 and at most 1 − 1e-9
 * @param capitalCost yearly cost of a unit of capital, at least 0
 */
public record Buyer(List<Double> returnPeriods, double tailLevel, double capitalCost) {

    /** Rarer than any model of losses can tell, and than the digits of a probability near 1 can hold. */
    public static final double RAREST = 1e9;

    public static final Buyer USUAL = new Buyer(List.of(10.0, 50.0, 100.0, 200.0, 250.0), 0.99, 0.06);

    public Buyer {
        returnPeriods = List.copyOf(returnPeriods);
        Check check = new Check().that(tailLevel > 0 && tailLevel <= 1 - 1 / RAREST, "tailLevel", tailLevel, "above 0 and at most 0.999999999")
                .notNegative("capitalCost", capitalCost);
        for (int k = 0; k < returnPeriods.size(); k++) {
            double years = returnPeriods.get(k);
            check.that(years > 1 && years <= RAREST, "returnPeriods[" + k + "]", years, "above 1 and at most 1000000000");
        }
        check.orThrow();
    }

    /** Levels of the value at risk: 1 − 1/T of each return period, and the tail level; rising, without repetition. */
    public List<Double> levels() {
        TreeSet<Double> levels = new TreeSet<>();
        for (double t : returnPeriods) {
            levels.add(levelOf(t));
        }
        levels.add(tailLevel);
        return List.copyOf(levels);
    }

    /** 1 − 1/T, as the decimal a person would write (0.995 for 200), not with the last digits of the division. */
    public static double levelOf(double returnPeriod) {
        double level = 1 - 1 / returnPeriod;
        double shown = Double.parseDouble(String.format(java.util.Locale.ROOT, "%.12g", level));
        return Math.abs(shown - level) < 1e-15 ? shown : level;
    }
}
