package layerweft.model.copula;

/** C(u) = u_1 · … · u_d. */
public record Independence() implements Copula {

    @Override
    public String label() {
        return "independence";
    }

    /** Any. */
    @Override
    public void requireDimension(int dimension) {
    }

    @Override
    public double cdf(double... u) {
        double product = 1;
        for (double x : u) {
            product *= x;
        }
        return product;
    }

    @Override
    public double kendallTau(int i, int j) {
        return 0;
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
        return 0;
    }

    @Override
    public Copula pair(int i, int j) {
        return this;
    }

    @Override
    public ScoreSampler sampler(int dimension) {
        return new ExponentialSampler(ExponentialSampler.Kind.INDEPENDENT, dimension);
    }
}
