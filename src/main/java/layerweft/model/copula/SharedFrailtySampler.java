package layerweft.model.copula;

import layerweft.model.random.KeyedStream;
import org.apache.commons.rng.sampling.distribution.ZigguratSampler;

/**
 * Marshall &amp; Olkin's (1988) sampler: U_i = ψ(E_i/V), with score ln V − ln E_i. The d exponentials are drawn before the frailty, so
 * that all families see the same ones in the same year. A flipped variable is 1 − U_i, with the score's sign turned; it takes
 * −ln(1 − e^−E_i), the exponential at the other end, so that a large loss of one family meets a large loss of the other.
 */
final class SharedFrailtySampler extends YearSampler {
    private final Generator generator;
    private final boolean[] flipped;

    SharedFrailtySampler(Generator generator, boolean... flipped) {
        super(flipped.length);
        this.generator = generator;
        this.flipped = flipped;
    }

    @Override
    Drawer drawer(KeyedStream stream) {
        int d = dimension();
        double[] e = new double[d];
        FrailtySampler frailty = generator.frailty(stream);
        ZigguratSampler.Exponential exponential = ZigguratSampler.Exponential.of(stream);
        return (scores, year) -> {
            for (int i = 0; i < d; i++) {
                e[i] = exponential.sample() + Double.MIN_NORMAL;
            }
            double lnV = frailty.logSample();
            for (int i = 0; i < d; i++) {
                scores[i][year] = flipped[i] ? LogScale.logMinusLog1mExp(e[i]) - lnV : lnV - Math.log(e[i]);
            }
        };
    }

    @Override
    public double score(int i, double p, double q) {
        return flipped[i] ? generator.logInverse(q, p) : -generator.logInverse(p, q);
    }

    @Override
    public double uniform(int i, double score) {
        return flipped[i] ? generator.complementOfLog(score) : generator.psiOfLog(-score);
    }

    @Override
    public double complement(int i, double score) {
        return flipped[i] ? generator.psiOfLog(score) : generator.complementOfLog(-score);
    }
}
