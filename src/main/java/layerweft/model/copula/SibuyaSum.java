package layerweft.model.copula;

import layerweft.model.random.KeyedStream;

/**
 * Sum of V_0 independent Sibuya(α) variables, the inner frailty of nested Joe copulas.
 *
 * <p>Exact up to {@link CompoundFrailty#MOST_TERMS} terms. Beyond, (1 − x)^n with x = (1 − e^−t)^α is taken as exp(−(n + 0.65)x): a
 * Poisson variable whose mean is (n + 0.65)^(1/α) S, S positive stable. For y = nx the two differ by |y²/2 − 0.65y|e^−y/n, at most
 * 0.13/n, so by less than 1.5e-4 in any conditional probability, and by less the larger V_0.
 */
final class SibuyaSum extends CompoundFrailty {
    private final double power;
    private final Sibuya term;
    private final PositiveStable stable;

    SibuyaSum(double outer, double inner, KeyedStream stream) {
        super(stream);
        this.power = inner / outer;
        this.term = new Sibuya(outer, inner, stream);
        this.stable = new PositiveStable(outer, inner, stream);
    }

    @Override
    double logTerm() {
        return term.logSample();
    }

    @Override
    double logMeanOfMany(double logCount) {
        return logCount * power + stable.logSample();
    }
}
