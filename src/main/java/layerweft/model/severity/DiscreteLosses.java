package layerweft.model.severity;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Collections;
import java.util.List;
import java.util.Objects;
import java.util.function.IntPredicate;
import java.util.stream.IntStream;
import layerweft.model.Check;
import layerweft.model.random.KeyedStream;
import org.apache.commons.numbers.core.Sum;

/** A law on finitely many losses. Losses may repeat and stand in any order; those without probability are ignored. */
public final class DiscreteLosses implements SeverityModel {
    /** Sums of probabilities that meet a level within this are taken to reach it: 0.7 + 0.2 is 0.9. */
    private static final double ROUNDING = 8 * Math.ulp(1.0);

    private final List<Double> losses;
    private final List<Double> probabilities;
    /** Distinct losses of positive probability, rising. */
    private final double[] at;
    private final double[] weight;
    /** P(X ≤ at[k]). */
    private final double[] upTo;
    /** P(X &gt; at[k]), summed from the top. */
    private final double[] above;
    /** E[X; X ≤ at[k]] and E[X²; X ≤ at[k]]. */
    private final double[] firstUpTo;
    private final double[] secondUpTo;

    /**
     * @param losses each finite and at least 0, at least one
     * @param probabilities as many, each at least 0, with sum 1 (within 1e-9)
     */
    public DiscreteLosses(List<Double> losses, List<Double> probabilities) {
        this.losses = List.copyOf(losses);
        this.probabilities = List.copyOf(probabilities);
        Check check = new Check().that(!losses.isEmpty(), "losses", "an empty list", "at least one loss")
                .that(losses.size() == probabilities.size(), "probabilities", probabilities.size() + " probabilities for " + losses.size() + " losses",
                        "a probability for each loss");
        for (int k = 0; k < losses.size(); k++) {
            check.notNegative("losses[" + k + "]", losses.get(k));
        }
        if (check.clean()) {
            Weights.check(check, "probabilities", probabilities);
        }
        check.orThrow();

        double[] scaled = Weights.scaled(probabilities);
        int[] order = IntStream.range(0, scaled.length).filter(k -> scaled[k] > 0).boxed()
                .sorted((a, b) -> Double.compare(losses.get(a), losses.get(b))).mapToInt(Integer::intValue).toArray();
        double[] distinct = new double[order.length];
        double[] mass = new double[order.length];
        int n = 0;
        for (int k : order) {
            double x = losses.get(k) + 0.0;
            if (n == 0 || distinct[n - 1] != x) {
                distinct[n++] = x;
            }
            mass[n - 1] += scaled[k];
        }
        at = Arrays.copyOf(distinct, n);
        weight = Arrays.copyOf(mass, n);
        upTo = new double[n];
        above = new double[n];
        firstUpTo = new double[n];
        secondUpTo = new double[n];
        Sum sum = Sum.create();
        double first = 0;
        double second = 0;
        for (int k = 0; k < n; k++) {
            // to the last bit, so that k of n equally likely losses have the chance k/n
            upTo[k] = Math.min(1, sum.add(weight[k]).getAsDouble());
            firstUpTo[k] = first += weight[k] * at[k];
            secondUpTo[k] = second += weight[k] * at[k] * at[k];
        }
        upTo[n - 1] = 1;
        Sum rest = Sum.create();
        for (int k = n - 2; k >= 0; k--) {
            above[k] = rest.add(weight[k + 1]).getAsDouble();
        }
    }

    /** Each of the losses with the same probability. */
    public static DiscreteLosses ofEquallyLikely(List<Double> losses) {
        new Check().that(!losses.isEmpty(), "losses", "an empty list", "at least one loss").orThrow();
        return new DiscreteLosses(losses, new ArrayList<>(Collections.nCopies(losses.size(), 1.0 / losses.size())));
    }

    /** As given. */
    public List<Double> losses() {
        return losses;
    }

    /** As given, in the order of the losses. */
    public List<Double> probabilities() {
        return probabilities;
    }

    @Override
    public double cdf(double x) {
        int k = last(x);
        return k < 0 ? 0 : upTo[k];
    }

    @Override
    public double survival(double x) {
        int k = last(x);
        return k < 0 ? 1 : above[k];
    }

    @Override
    public double atom(double x) {
        int k = Arrays.binarySearch(at, x + 0.0);
        return k < 0 ? 0 : weight[k];
    }

    @Override
    public double quantile(double p) {
        Probability.check(p);
        return p == 1 ? upperEnd() : at[first(k -> upTo[k] >= p * (1 - ROUNDING) || above[k] <= (1 - p) * (1 + ROUNDING))];
    }

    @Override
    public double survivalQuantile(double q) {
        Probability.check(q);
        return q == 0 ? upperEnd() : at[first(k -> above[k] <= q * (1 + ROUNDING))];
    }

    /** The first position at which a rising condition holds, the last where it holds nowhere before. */
    private int first(IntPredicate holds) {
        int low = 0;
        int high = at.length - 1;
        while (low < high) {
            int middle = (low + high) >>> 1;
            if (holds.test(middle)) {
                high = middle;
            } else {
                low = middle + 1;
            }
        }
        return low;
    }

    @Override
    public double mean() {
        return firstUpTo[at.length - 1];
    }

    @Override
    public double limitedMean(double x) {
        int k = last(x);
        return k < 0 ? Math.max(x, 0) : k == at.length - 1 ? mean() : firstUpTo[k] + x * above[k];
    }

    @Override
    public double limitedSecondMoment(double x) {
        int k = last(x);
        return k < 0 ? Math.max(x, 0) * Math.max(x, 0) : k == at.length - 1 ? secondUpTo[k] : secondUpTo[k] + x * x * above[k];
    }

    /** Far up, from the losses above alone: Σ p·min(x − from, to − from). */
    @Override
    public double layerMean(double from, double to) {
        int k = last(from);
        if (k < 0 || above[k] > 0.5) {
            return limitedMean(to) - limitedMean(from);
        }
        double sum = 0;
        for (int i = at.length - 1; i > k; i--) {
            sum += weight[i] * (Math.min(at[i], to) - from);
        }
        return sum;
    }

    @Override
    public double upperEnd() {
        return at[at.length - 1];
    }

    /** By a guide table (Chen &amp; Asau 1974): about one comparison a draw, however many losses there are. */
    @Override
    public SeveritySampler sampler() {
        int[] guide = new int[at.length];
        for (int g = 0, k = 0; g < guide.length; g++) {
            while (upTo[k] <= (double) g / guide.length) {
                k++;
            }
            guide[g] = k;
        }
        return stream -> () -> draw(guide, stream);
    }

    private double draw(int[] guide, KeyedStream stream) {
        double u = stream.nextDouble();
        int k = guide[(int) (u * guide.length)];
        while (upTo[k] <= u) {
            k++;
        }
        return at[k];
    }

    /** Position of the largest loss that is at most x, -1 where there is none. */
    private int last(double x) {
        int k = Arrays.binarySearch(at, x + 0.0);
        return k < 0 ? -k - 2 : k;
    }

    @Override
    public boolean equals(Object other) {
        return other instanceof DiscreteLosses o && losses.equals(o.losses) && probabilities.equals(o.probabilities);
    }

    @Override
    public int hashCode() {
        return Objects.hash(losses, probabilities);
    }

    @Override
    public String toString() {
        return at.length <= 8 ? "DiscreteLosses[" + losses + ", " + probabilities + "]" : "DiscreteLosses[" + at.length + " losses]";
    }
}
