package layerweft.model.frequency;

import java.util.List;
import layerweft.model.Check;
import org.apache.commons.math3.complex.Complex;

/** Counts by a table of probabilities. */
public final class EmpiricalCounts implements FrequencyModel {
    private static final double TOLERANCE = 1e-9;

    private final List<Double> probabilities;
    private final double[] probability;
    private final double[] upTo;
    /** P(N &gt; n), summed from the top. */
    private final double[] above;

    /** @param probabilities of 0, 1, 2, … events, each at least 0, with sum 1 (within 1e-9, then scaled to 1) */
    public EmpiricalCounts(List<Double> probabilities) {
        this.probabilities = List.copyOf(probabilities);
        Check check = new Check().that(!probabilities.isEmpty(), "probabilities", "an empty list", "at least one probability");
        for (int n = 0; n < probabilities.size(); n++) {
            check.notNegative("probabilities[" + n + "]", probabilities.get(n));
        }
        double sum = probabilities.stream().mapToDouble(Double::doubleValue).sum();
        check.that(Math.abs(sum - 1) <= TOLERANCE, "probabilities", "a sum of " + sum, "a sum of 1 (within 1e-9)").orThrow();

        int size = probabilities.size();
        while (size > 1 && probabilities.get(size - 1) == 0) {
            size--;
        }
        probability = new double[size];
        upTo = new double[size];
        above = new double[size];
        double soFar = 0;
        for (int n = 0; n < size; n++) {
            probability[n] = probabilities.get(n) / sum;
            soFar += probability[n];
            upTo[n] = Math.min(1, soFar);
        }
        upTo[size - 1] = 1;
        for (int n = size - 2; n >= 0; n--) {
            above[n] = above[n + 1] + probability[n + 1];
        }
    }

    /** As given. */
    public List<Double> probabilities() {
        return probabilities;
    }

    @Override
    public double mean() {
        double sum = 0;
        for (int n = 0; n < probability.length; n++) {
            sum += n * probability[n];
        }
        return sum;
    }

    @Override
    public double variance() {
        double mean = mean();
        double sum = 0;
        for (int n = 0; n < probability.length; n++) {
            sum += (n - mean) * (n - mean) * probability[n];
        }
        return sum;
    }

    @Override
    public double probability(int n) {
        return n < 0 || n >= probability.length ? 0 : probability[n];
    }

    @Override
    public double cdf(int n) {
        return n < 0 ? 0 : n >= upTo.length ? 1 : upTo[n];
    }

    @Override
    public double survival(int n) {
        return n < 0 ? 1 : n >= above.length ? 0 : above[n];
    }

    @Override
    public int quantile(double p) {
        return CountSearch.quantile(this, p);
    }

    @Override
    public int largest() {
        return probability.length - 1;
    }

    /** Σ p_n·z^n, by Horner's rule. */
    @Override
    public Complex generatingFunction(Complex z) {
        Complex value = Complex.ZERO;
        for (int n = probability.length - 1; n >= 0; n--) {
            value = value.multiply(z).add(probability[n]);
        }
        return value;
    }

    @Override
    public boolean equals(Object other) {
        return other instanceof EmpiricalCounts o && probabilities.equals(o.probabilities);
    }

    @Override
    public int hashCode() {
        return probabilities.hashCode();
    }

    @Override
    public String toString() {
        return "EmpiricalCounts" + (probability.length <= 8 ? probabilities : "[up to " + largest() + "]");
    }
}
