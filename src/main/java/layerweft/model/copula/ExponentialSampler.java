package layerweft.model.copula;

import layerweft.model.random.KeyedStream;
import org.apache.commons.rng.sampling.distribution.ZigguratSampler;

/**
 * Independent, comonotonic and countermonotonic variables on the scale of one or more standard exponentials: score −E, U = e^−E, as the
 * Archimedean families have it in the limit of τ = 0. A countermonotonic partner has score E, U = 1 − e^−E.
 */
final class ExponentialSampler extends YearSampler {
    enum Kind { INDEPENDENT, COMONOTONIC, COUNTERMONOTONIC }

    private final Kind kind;

    ExponentialSampler(Kind kind, int dimension) {
        super(dimension);
        this.kind = kind;
    }

    @Override
    Drawer drawer(KeyedStream stream) {
        ZigguratSampler.Exponential exponential = ZigguratSampler.Exponential.of(stream);
        int d = dimension();
        if (kind == Kind.INDEPENDENT) {
            return (scores, year) -> {
                for (int i = 0; i < d; i++) {
                    scores[i][year] = -exponential.sample();
                }
            };
        }
        return (scores, year) -> {
            double e = exponential.sample();
            for (int i = 0; i < d; i++) {
                scores[i][year] = turned(i) ? e : -e;
            }
        };
    }

    private boolean turned(int i) {
        return kind == Kind.COUNTERMONOTONIC && i == 1;
    }

    @Override
    public double score(int i, double p, double q) {
        return turned(i) ? LogScale.minusLog(q, p) : -LogScale.minusLog(p, q);
    }

    @Override
    public double uniform(int i, double score) {
        return turned(i) ? -Math.expm1(-score) : Math.exp(score);
    }

    @Override
    public double complement(int i, double score) {
        return turned(i) ? Math.exp(-score) : -Math.expm1(score);
    }
}
