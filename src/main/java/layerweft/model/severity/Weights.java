package layerweft.model.severity;

import java.util.List;
import layerweft.model.Check;

/** Probabilities of the parts of a law: each at least 0, with a sum of 1 within {@value #TOLERANCE}, then scaled to exactly 1. */
final class Weights {
    static final double TOLERANCE = 1e-9;

    private Weights() {}

    /** Adds findings on the field for weights that are not admissible. */
    static void check(Check check, String field, List<Double> weights) {
        for (int k = 0; k < weights.size(); k++) {
            check.notNegative(field + "[" + k + "]", weights.get(k));
        }
        double sum = sum(weights);
        check.that(Math.abs(sum - 1) <= TOLERANCE, field, "a sum of " + sum, "a sum of 1 (within 1e-9)");
    }

    static double[] scaled(List<Double> weights) {
        double sum = sum(weights);
        return weights.stream().mapToDouble(w -> w / sum).toArray();
    }

    private static double sum(List<Double> weights) {
        return weights.stream().mapToDouble(Double::doubleValue).sum();
    }
}
