package layerweft.model.severity;

import java.util.List;
import layerweft.model.Check;

/** Probabilities of the parts of a law: each at least 0, with a sum of 1 within {@value #TOLERANCE}, then scaled to 1. */
final class Weights {
    static final double TOLERANCE = 1e-9;
    private static final double ROUNDING = 8 * Math.ulp(1.0);

    private Weights() {}

    /** Adds findings on the field for weights that are not admissible. */
    static void check(Check check, String field, List<Double> weights) {
        for (int k = 0; k < weights.size(); k++) {
            check.notNegative(field + "[" + k + "]", weights.get(k));
        }
        double sum = sum(weights);
        check.that(Math.abs(sum - 1) <= TOLERANCE, field, "a sum of " + sum, "a sum of 1 (within 1e-9)");
    }

    /** With a sum of 1 to rounding; weights that have it already, such as 0.1, 0.2, 0.7, stay digit by digit as they are. */
    static double[] scaled(List<Double> weights) {
        double found = sum(weights);
        double sum = Math.abs(found - 1) <= ROUNDING ? 1 : found;
        return weights.stream().mapToDouble(w -> w / sum).toArray();
    }

    private static double sum(List<Double> weights) {
        return weights.stream().mapToDouble(Double::doubleValue).sum();
    }
}
