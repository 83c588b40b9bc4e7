package layerweft.model.copula;

import layerweft.model.random.KeyedStream;

/**
 * The generator ψ of an Archimedean copula C(u) = ψ(ψ⁻¹(u_1) + … + ψ⁻¹(u_d)): a Laplace transform ψ(t) = E[e^−tV] of a positive
 * frailty V. Given V the variables U_i = ψ(E_i/V), E_i standard exponential, are independent (Marshall &amp; Olkin 1988), with
 * P(U_i ≤ u | V) = exp(−V ψ⁻¹(u)).
 *
 * <p>Everything is said in ln t, because t itself leaves the range of a double at strong dependence.
 */
public sealed interface Generator
        permits IndependenceGenerator, ClaytonGenerator, GumbelGenerator, FrankGenerator, JoeGenerator {

    /** ψ(e^lnT), exact where it is small. */
    double psiOfLog(double lnT);

    /** 1 − ψ(e^lnT), exact where it is small. */
    double complementOfLog(double lnT);

    /**
     * ln ψ⁻¹(p).
     *
     * @param p in [0, 1]
     * @param q 1 − p, given apart so that neither end loses digits
     * @return +∞ at p = 0, −∞ at q = 0
     */
    double logInverse(double p, double q);

    /** A sampler of the frailty bound to a stream; exact at every strength. */
    FrailtySampler frailty(KeyedStream stream);

    /** ψ(t), t ≥ 0. */
    default double psi(double t) {
        return psiOfLog(Math.log(t));
    }

    /** ln V of one frailty drawn from the stream where it stands. */
    default double logFrailty(KeyedStream stream) {
        return frailty(stream).logSample();
    }
}
