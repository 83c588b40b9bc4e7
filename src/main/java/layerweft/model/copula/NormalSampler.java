package layerweft.model.copula;

import java.util.OptionalDouble;
import layerweft.model.random.KeyedStream;
import org.apache.commons.rng.sampling.distribution.ZigguratSampler;

/** Correlated standard normals; the score is the normal score. The d own normals are drawn before a common factor. */
final class NormalSampler extends YearSampler {
    private final Correlation correlation;

    NormalSampler(Correlation correlation, int dimension) {
        super(dimension);
        this.correlation = correlation;
    }

    @Override
    Drawer drawer(KeyedStream stream) {
        ZigguratSampler.NormalizedGaussian normal = ZigguratSampler.NormalizedGaussian.of(stream);
        OptionalDouble common = correlation.common(dimension());
        return common.isPresent() && common.getAsDouble() >= 0 ? oneFactor(normal, common.getAsDouble()) : triangular(normal);
    }

    private Drawer oneFactor(ZigguratSampler.NormalizedGaussian normal, double rho) {
        int d = dimension();
        double loading = Math.sqrt(rho);
        double own = Math.sqrt(1 - rho);
        return (scores, year) -> {
            for (int i = 0; i < d; i++) {
                scores[i][year] = own * normal.sample();
            }
            double part = loading * normal.sample();
            for (int i = 0; i < d; i++) {
                scores[i][year] += part;
            }
        };
    }

    private Drawer triangular(ZigguratSampler.NormalizedGaussian normal) {
        int d = dimension();
        double[][] lower = CholeskyFactor.of(correlation.matrix(d));
        double[] z = new double[d];
        return (scores, year) -> {
            for (int i = 0; i < d; i++) {
                z[i] = normal.sample();
                double sum = 0;
                for (int k = 0; k <= i; k++) {
                    sum += lower[i][k] * z[k];
                }
                scores[i][year] = sum;
            }
        };
    }

    @Override
    public double score(int i, double p, double q) {
        return NormalScale.quantile(p, q);
    }

    @Override
    public double uniform(int i, double score) {
        return NormalScale.cdf(score);
    }

    @Override
    public double complement(int i, double score) {
        return NormalScale.survival(score);
    }
}
