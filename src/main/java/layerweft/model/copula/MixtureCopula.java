package layerweft.model.copula;

import java.util.List;
import java.util.function.ToDoubleFunction;
import java.util.stream.IntStream;
import layerweft.model.Check;
import layerweft.model.InadmissibleException;

/**
 * C = Σ w_k C_k: in a share w_k of the years the perils are joined by C_k.
 *
 * @param weights above 0, sum 1 within 1e-9, then scaled to 1
 * @param components as many; mixtures may hold mixtures
 */
public record MixtureCopula(List<Double> weights, List<Copula> components) implements Copula {
    private static final double ROUNDING = 8 * Math.ulp(1.0);

    public MixtureCopula {
        Check check = new Check();
        check.that(!components.isEmpty() && weights.size() == components.size(), "mixture",
                weights.size() + " weights and " + components.size() + " copulas", "at least one copula, and one weight for each");
        for (int k = 0; k < weights.size(); k++) {
            check.that(weights.get(k) > 0 && weights.get(k) <= 1 + 1e-9, "mixture[" + k + "].weight", weights.get(k), "above 0 and at most 1");
        }
        double sum = weights.stream().mapToDouble(Double::doubleValue).sum();
        if (check.clean()) {
            check.that(Math.abs(sum - 1) <= 1e-9, "mixture", "weights with the sum " + sum, "weights with the sum 1");
        }
        check.orThrow();
        // weights with the sum 1 to rounding stay digit by digit as they are, so that scaling twice is scaling once
        double scale = Math.abs(sum - 1) <= ROUNDING ? 1 : sum;
        weights = weights.stream().map(w -> w / scale).toList();
        components = List.copyOf(components);
    }

    @Override
    public String label() {
        return "mixture";
    }

    @Override
    public void requireDimension(int dimension) {
        Check check = new Check();
        for (int k = 0; k < components.size(); k++) {
            try {
                components.get(k).requireDimension(dimension);
            } catch (InadmissibleException e) {
                check.within("mixture[" + k + "].copula", e);
            }
        }
        check.orThrow();
    }

    @Override
    public double cdf(double... u) {
        return mean(c -> c.cdf(u));
    }

    double mean(ToDoubleFunction<Copula> value) {
        double sum = 0;
        for (int k = 0; k < components.size(); k++) {
            sum += weights.get(k) * value.applyAsDouble(components.get(k));
        }
        return sum;
    }

    /** {@inheritDoc} Quadratic in the weights: Σ w_k w_l Q(C_k, C_l) with {@link Concordance}; good to about 5e-4. */
    @Override
    public double kendallTau(int i, int j) {
        return mean(first -> mean(second -> Concordance.of(first.pair(i, j), second.pair(i, j))));
    }

    @Override
    public double upperTail(int i, int j) {
        return mean(c -> c.upperTail(i, j));
    }

    @Override
    public double lowerTail(int i, int j) {
        return mean(c -> c.lowerTail(i, j));
    }

    @Override
    public double spearmanRho(int i, int j) {
        return mean(c -> c.spearmanRho(i, j));
    }

    @Override
    public Copula pair(int i, int j) {
        return new MixtureCopula(weights, components.stream().map(c -> c.pair(i, j)).toList());
    }

    @Override
    public ScoreSampler sampler(int dimension) {
        requireDimension(dimension);
        // every sampler of this package draws year by year
        List<YearSampler> samplers = IntStream.range(0, components.size())
                .mapToObj(k -> (YearSampler) components.get(k).sampler(dimension)).toList();
        return new MixtureSampler(weights, samplers, dimension);
    }
}
