package layerweft.model.frequency;

import java.util.List;
import layerweft.model.Check;
import org.apache.commons.math3.complex.Complex;

/** A count given by its probabilities, as from an event history or the years of a catastrophe model. Equal if the probabilities are. */
public final class EmpiricalCounts implements FrequencyModel {
    private static final double SUM_TOLERANCE = 1e-9;

    private final List<Double> given;
    private final double[] pmf;
    private final double[] cdf;
    private final double[] survival;
    private final double mean;
    private final double variance;

    /**
     * @param probabilities of the counts 0, 1, 2, …, each from 0 to 1; their sum is 1 within 1e-9, and is scaled to 1
     * @throws layerweft.model.InadmissibleException for a probability out of range, or another sum
     */
    public EmpiricalCounts(List<Double> probabilities) {
        check(probabilities);
        given = List.copyOf(probabilities);
        int last = given.size() - 1;
        while (given.get(last) == 0) {
            last--;
        }
        double sum = sum(given);
        pmf = given.stream().limit(last + 1).mapToDouble(p -> p / sum).toArray();
        survival = new double[last + 1];
        for (int n = last; n > 0; n--) {
            survival[n - 1] = survival[n] + pmf[n];
        }
        cdf = new double[last + 1];
        double below = 0;
        double first = 0;
        for (int n = 0; n <= last; n++) {
            below += pmf[n];
            cdf[n] = survival[n] < 0.5 ? 1 - survival[n] : below;
            first += n * pmf[n];
        }
        double second = 0;
        for (int n = 0; n <= last; n++) {
            second += (n - first) * (n - first) * pmf[n];
        }
        mean = first;
        variance = second;
    }

    private static void check(List<Double> probabilities) {
        Check check = new Check().that(probabilities != null && !probabilities.isEmpty(), "probabilities",
                probabilities == null ? "nothing" : "an empty list", "the probabilities of 0, 1, 2, … events");
        check.orThrow();
        for (int n = 0; n < probabilities.size(); n++) {
            Double p = probabilities.get(n);
            check.that(p != null && p >= 0 && p <= 1 + SUM_TOLERANCE, "probabilities[" + n + "]", p == null ? "nothing" : p, "from 0 to 1");
        }
        if (check.clean()) {
            double sum = sum(probabilities);
            check.that(Math.abs(sum - 1) <= SUM_TOLERANCE, "probabilities", "the sum " + sum, "a sum of 1 within 1e-9");
        }
        check.orThrow();
    }

    private static double sum(List<Double> probabilities) {
        return probabilities.stream().mapToDouble(Double::doubleValue).sum();
    }

    /** The probabilities of 0, 1, 2, … as given, before they were scaled to a sum of exactly 1. Immutable. */
    public List<Double> probabilities() {
        return given;
    }

    @Override
    public double mean() {
        return mean;
    }

    @Override
    public double variance() {
        return variance;
    }

    @Override
    public double probability(int n) {
        return n < 0 || n >= pmf.length ? 0 : pmf[n];
    }

    @Override
    public double cdf(int n) {
        return n < 0 ? 0 : cdf[Math.min(n, largest())];
    }

    @Override
    public double survival(int n) {
        return n < 0 ? 1 : survival[Math.min(n, largest())];
    }

    @Override
    public int quantile(double p) {
        return CountSearch.quantile(this, p);
    }

    @Override
    public int largest() {
        return pmf.length - 1;
    }

    /** Σ p_n zⁿ, by Horner's rule. */
    @Override
    public Complex generatingFunction(Complex z) {
        double re = 0;
        double im = 0;
        for (int n = largest(); n >= 0; n--) {
            double next = re * z.getReal() - im * z.getImaginary() + pmf[n];
            im = re * z.getImaginary() + im * z.getReal();
            re = next;
        }
        return new Complex(re, im);
    }

    @Override
    public boolean equals(Object other) {
        return other instanceof EmpiricalCounts that && given.equals(that.given);
    }

    @Override
    public int hashCode() {
        return given.hashCode();
    }

    @Override
    public String toString() {
        return "EmpiricalCounts[probabilities=" + given + "]";
    }
}
