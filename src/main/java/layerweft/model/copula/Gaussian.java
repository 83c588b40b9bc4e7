package layerweft.model.copula;

/**
 * The normal copula.
 *
 * @param correlation of the normal scores
 */
public record Gaussian(Correlation correlation) implements Copula {

    /** The same ρ = sin(πτ/2) in every pair. */
    public static Gaussian ofKendallTau(double tau) {
        return new Gaussian(EqualCorrelation.ofKendallTau(tau));
    }

    public static Gaussian ofCorrelation(double[][] matrix) {
        return new Gaussian(CorrelationMatrix.of(matrix));
    }

    @Override
    public String label() {
        return "gaussian";
    }

    @Override
    public void requireDimension(int dimension) {
        correlation.requireDimension(dimension);
    }

    /**
     * {@inheritDoc} To 1e-12 for two or three variables and where all pairs have one ρ ≥ 0; otherwise to about 1e-5.
     */
    @Override
    public double cdf(double... u) {
        requireDimension(u.length);
        OpenCoordinates open = OpenCoordinates.of(u);
        if (open.impossible()) {
            return 0;
        }
        return NormalProbability.of(open.correlation(correlation), open.common(correlation)).at(open.quantiles(NormalScale::quantile));
    }

    @Override
    public double kendallTau(int i, int j) {
        return 2 / Math.PI * Math.asin(correlation.rho(i, j));
    }

    @Override
    public double upperTail(int i, int j) {
        return correlation.rho(i, j) == 1 ? 1 : 0;
    }

    @Override
    public double lowerTail(int i, int j) {
        return upperTail(i, j);
    }

    /** ρ_S = (6/π) asin(ρ/2). */
    @Override
    public double spearmanRho(int i, int j) {
        return 6 / Math.PI * Math.asin(correlation.rho(i, j) / 2);
    }

    @Override
    public Copula pair(int i, int j) {
        return new Gaussian(new EqualCorrelation(correlation.rho(i, j)));
    }

    @Override
    public ScoreSampler sampler(int dimension) {
        requireDimension(dimension);
        return new NormalSampler(correlation, dimension);
    }
}
