package layerweft.model.copula;

import layerweft.model.random.KeyedStream;

/**
 * The frailty V_1 of an inner group given the frailty V_0 of the group around it: Laplace transform
 * exp(−V_0 ψ_0⁻¹(ψ_1(t))) (McNeil 2008; Hofert 2011). With α = θ_0/θ_1 (Gumbel, Clayton, Joe, Frank) it is
 *
 * <ul>
 * <li>Gumbel: exp(−V_0 t^α), V_1 = V_0^(1/α) S with S positive stable;
 * <li>Clayton: exp(−V_0((1+t)^α − 1)), an exponentially tilted stable law;
 * <li>Joe: (1 − (1−e^−t)^α)^V_0, a sum of V_0 Sibuya variables;
 * <li>Frank: the same with tilted Sibuya variables.
 * </ul>
 */
@FunctionalInterface
interface InnerFrailty {

    /** ln V_1 given ln V_0. */
    double logSample(double logOuter);

    static InnerFrailty of(ArchimedeanFamily family, double outer, double inner, KeyedStream stream) {
        if (inner == outer) {
            return logOuter -> logOuter;
        }
        if (outer == family.independentTheta()) {
            FrailtySampler own = family.generator(inner).frailty(stream);
            return logOuter -> own.logSample();
        }
        return switch (family) {
            case CLAYTON -> new TiltedStable(outer, inner, stream)::logSample;
            case GUMBEL -> {
                PositiveStable stable = new PositiveStable(outer, inner, stream);
                yield logOuter -> logOuter * inner / outer + stable.logSample();
            }
            case JOE -> new SibuyaSum(outer, inner, stream);
            case FRANK -> new TiltedSibuyaSum(outer, inner, stream);
        };
    }
}
