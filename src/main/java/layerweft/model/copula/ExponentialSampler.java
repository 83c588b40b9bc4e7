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

    /** {@inheritDoc} Scores drawn end at 0, on one side; that end itself is at infinity, beyond them. */
    @Override
    public double score(int i, double p, double q) {
        if (turned(i)) {
            return p == 0 ? Double.NEGATIVE_INFINITY : LogScale.minusLog(q, p);
        }
        return q == 0 ? Double.POSITIVE_INFINITY : -LogScale.minusLog(p, q);
    }

    @Override
    public double uniform(int i, double score) {
        return turned(i) ? Math.max(0, -Math.expm1(-score)) : Math.min(1, Math.exp(score));
    }

    @Override
    public double complement(int i, double score) {
        return turned(i) ? Math.min(1, Math.exp(-score)) : Math.max(0, -Math.expm1(score));
    }
}
