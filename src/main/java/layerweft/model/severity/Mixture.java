package layerweft.model.severity;

import java.util.Arrays;
import java.util.List;
import java.util.function.DoublePredicate;
import java.util.function.DoubleSupplier;
import java.util.function.ToDoubleFunction;
import layerweft.model.Check;
import layerweft.model.random.KeyedStream;

/**
 * A law that is one of several, each with its weight: all functionals that are linear in the law are weighted sums.
 *
 * @param weights as many as components, each at least 0, with sum 1 (within 1e-9)
 * @param components at least one
 */
public record Mixture(List<Double> weights, List<SeverityModel> components) implements SeverityModel {

    public Mixture {
        weights = List.copyOf(weights);
        components = List.copyOf(components);
        Check check = new Check().that(!components.isEmpty(), "components", "an empty list", "at least one component")
                .that(weights.size() == components.size(), "weights", weights.size() + " weights for " + components.size() + " components",
                        "a weight for each component");
        if (check.clean()) {
            Weights.check(check, "weights", weights);
        }
        check.orThrow();
        weights = Arrays.stream(Weights.scaled(weights)).boxed().toList();
    }

    @Override
    public double cdf(double x) {
        return Math.min(1, sum(c -> c.cdf(x)));
    }

    @Override
    public double survival(double x) {
        return Math.min(1, sum(c -> c.survival(x)));
    }

    @Override
    public double atom(double x) {
        return sum(c -> c.atom(x));
    }

    @Override
    public double quantile(double p) {
        Probability.check(p);
        return p == 1 ? upperEnd() : smallest(c -> c.quantile(p), x -> cdf(x) >= p);
    }

    @Override
    public double survivalQuantile(double q) {
        Probability.check(q);
        return q == 0 ? upperEnd() : smallest(c -> c.survivalQuantile(q), x -> survival(x) <= q);
    }

    @Override
    public double mean() {
        return sum(SeverityModel::mean);
    }

    @Override
    public double limitedMean(double x) {
        return sum(c -> c.limitedMean(x));
    }

    @Override
    public double limitedSecondMoment(double x) {
        return sum(c -> c.limitedSecondMoment(x));
    }

    @Override
    public double layerMean(double from, double to) {
        return sum(c -> c.layerMean(from, to));
    }

    @Override
    public double upperEnd() {
        double end = 0;
        for (int k = 0; k < components.size(); k++) {
            end = weights.get(k) > 0 ? Math.max(end, components.get(k).upperEnd()) : end;
        }
        return end;
    }

    @Override
    public SeveritySampler sampler() {
        double[] w = weights.stream().mapToDouble(Double::doubleValue).toArray();
        SeveritySampler[] samplers = components.stream().map(SeverityModel::sampler).toArray(SeveritySampler[]::new);
        return stream -> {
            DoubleSupplier[] losses = Arrays.stream(samplers).map(s -> s.bind(stream)).toArray(DoubleSupplier[]::new);
            return () -> losses[choose(w, stream)].getAsDouble();
        };
    }

    private static int choose(double[] weights, KeyedStream stream) {
        double u = stream.nextDouble();
        int k = 0;
        for (double upTo = weights[0]; u >= upTo && k < weights.length - 1; upTo += weights[k]) {
            k++;
        }
        return k;
    }

    private double sum(ToDoubleFunction<SeverityModel> f) {
        double sum = 0;
        for (int k = 0; k < components.size(); k++) {
            double w = weights.get(k);
            sum += w == 0 ? 0 : w * f.applyAsDouble(components.get(k));
        }
        return sum;
    }

    /** The smallest amount at which a rising condition holds: it lies between the least and the greatest of the components' own. */
    private double smallest(ToDoubleFunction<SeverityModel> own, DoublePredicate holds) {
        double least = Double.POSITIVE_INFINITY;
        double greatest = 0;
        for (int k = 0; k < components.size(); k++) {
            if (weights.get(k) > 0) {
                double x = own.applyAsDouble(components.get(k));
                least = Math.min(least, x);
                greatest = Math.max(greatest, x);
            }
        }
        return Bisection.smallest(least, greatest, holds);
    }
}
