package layerweft.model.copula;

import layerweft.model.Check;

/** The lower Fréchet bound of a pair, C(u, v) = max(u + v − 1, 0): V = 1 − U. */
public record Countermonotonic() implements Copula {

    @Override
    public String label() {
        return "countermonotonic";
    }

    /** Two; one variable alone has no partner to run against. */
    @Override
    public void requireDimension(int dimension) {
        new Check().that(dimension == 2, "family", "countermonotonic for " + dimension + " perils", "countermonotonic for two perils only")
                .orThrow();
    }

    @Override
    public double cdf(double... u) {
        requireDimension(u.length);
        return Math.max(u[0] + u[1] - 1, 0);
    }

    @Override
    public double kendallTau(int i, int j) {
        return -1;
    }

    @Override
    public double upperTail(int i, int j) {
        return 0;
    }

    @Override
    public double lowerTail(int i, int j) {
        return 0;
    }

    @Override
    public double spearmanRho(int i, int j) {
        return -1;
    }

    @Override
    public Copula pair(int i, int j) {
        return this;
    }

    @Override
    public ScoreSampler sampler(int dimension) {
        requireDimension(dimension);
        return new ExponentialSampler(ExponentialSampler.Kind.COUNTERMONOTONIC, dimension);
    }
}
