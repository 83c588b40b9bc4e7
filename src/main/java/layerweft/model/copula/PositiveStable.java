package layerweft.model.copula;

import layerweft.model.random.KeyedStream;
import org.apache.commons.rng.sampling.distribution.ZigguratSampler;

/**
 * The positive stable law with index α in (0, 1], Laplace transform exp(−t^α), by the representation of Kanter (1975, "Stable
 * densities under change of scale and total variation inequalities", Lemma 4.1), a case of Chambers, Mallows &amp; Stuck (1976):
 *
 * <pre>ln V = ln(sin αΘ / sin Θ) + (1−α)/α · ln(sin (1−α)Θ / (E sin Θ)),  Θ uniform on (0, π), E standard exponential.</pre>
 *
 * Taken by logarithms, it holds at any index: at α = 0.01 both V and 1/V often exceed the range of a double.
 */
final class PositiveStable implements FrailtySampler {
    private final double alpha;
    private final double rest;
    private final double power;
    private final KeyedStream stream;
    private final ZigguratSampler.Exponential exponential;

    /** Index outer/inner, given by its two parts (inner ≥ outer) so that 1 − α keeps its digits. */
    PositiveStable(double outer, double inner, KeyedStream stream) {
        this.alpha = outer / inner;
        this.rest = (inner - outer) / inner;
        this.power = (inner - outer) / outer;
        this.stream = stream;
        this.exponential = ZigguratSampler.Exponential.of(stream);
    }

    @Override
    public double logSample() {
        double u = stream.nextOpen();
        double angle = Math.PI * u;
        double sine = Math.sin(Math.PI * Math.min(u, 1 - u));
        double e = exponential.sample();
        if (rest == 0) {
            return 0;
        }
        return Math.log(Math.sin(alpha * angle) / sine) + power * Math.log(Math.sin(rest * angle) / (sine * e));
    }
}
