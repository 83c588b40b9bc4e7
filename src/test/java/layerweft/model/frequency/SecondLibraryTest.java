package layerweft.model.frequency;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.SplittableRandom;
import java.util.stream.LongStream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import umontreal.ssj.probdist.BinomialDist;
import umontreal.ssj.probdist.DiscreteDistributionInt;
import umontreal.ssj.probdist.NegativeBinomialDist;
import umontreal.ssj.probdist.PoissonDist;

/** The parametric kinds against the laws of SSJ (L'Ecuyer), which sums probabilities where these use incomplete gamma and beta functions. */
class SecondLibraryTest {
    /** Its tables leave out terms below 1e-16. */
    private static final double TOLERANCE = 1e-12;

    static LongStream seeds() {
        return LongStream.range(0, 20);
    }

    private static void assertSame(DiscreteDistributionInt peer, FrequencyModel model, long seed) {
        int last = (int) (model.mean() + 8 * Math.sqrt(model.variance()) + 10);
        for (int n = 0; n <= Math.min(last, model.largest()); n++) {
            String what = model + " at " + n + ", seed " + seed;
            assertEquals(peer.prob(n), model.probability(n), TOLERANCE, what);
            assertEquals(peer.cdf(n), model.cdf(n), TOLERANCE, what);
            assertEquals(peer.barF(n + 1), model.survival(n), TOLERANCE, what);
        }
    }

    private static double between(double low, double high, SplittableRandom random) {
        return low * Math.pow(high / low, random.nextDouble());
    }

    @ParameterizedTest
    @MethodSource("seeds")
    void poisson(long seed) {
        double mean = between(0.01, 80, new SplittableRandom(seed));
        assertSame(new PoissonDist(mean), new Poisson(mean), seed);
    }

    @ParameterizedTest
    @MethodSource("seeds")
    void negativeBinomialWithRealSize(long seed) {
        SplittableRandom random = new SplittableRandom(seed);
        double mean = between(0.05, 50, random);
        double varianceToMean = 1 + between(0.05, 20, random);
        NegativeBinomialDist peer = new NegativeBinomialDist(mean / (varianceToMean - 1), 1 / varianceToMean);
        assertSame(peer, new NegativeBinomial(mean, varianceToMean), seed);
    }

    @ParameterizedTest
    @MethodSource("seeds")
    void binomial(long seed) {
        SplittableRandom random = new SplittableRandom(seed);
        int trials = random.nextInt(1, 300);
        double chance = random.nextDouble(0.01, 0.99);
        assertSame(new BinomialDist(trials, chance), new Binomial(trials, chance), seed);
    }
}
