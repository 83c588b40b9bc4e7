package layerweft.model.copula;

import java.util.Arrays;

/** The upper Fréchet bound C(u) = min u_i: all variables are one. */
public record Comonotonic() implements Copula {

    @Override
    public String label() {
        return "comonotonic";
    }

    /** Any. */
    @Override
    public void requireDimension(int dimension) {
    }

    @Override
    public double cdf(double... u) {
        return Arrays.stream(u).min().orElse(1);
    }

    @Override
    public double kendallTau(int i, int j) {
        return 1;
    }

    @Override
    public double upperTail(int i, int j) {
        return 1;
    }

    @Override
    public double lowerTail(int i, int j) {
        return 1;
    }

    @Override
    public double spearmanRho(int i, int j) {
        return 1;
    }

    @Override
    public Copula pair(int i, int j) {
        return this;
    }

    @Override
    public ScoreSampler sampler(int dimension) {
        return new ExponentialSampler(ExponentialSampler.Kind.COMONOTONIC, dimension);
    }
}
