package layerweft.model.severity;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;
import umontreal.ssj.probdist.BetaDist;
import umontreal.ssj.probdist.ContinuousDistribution;
import umontreal.ssj.probdist.ExponentialDist;
import umontreal.ssj.probdist.GammaDist;
import umontreal.ssj.probdist.InverseGaussianDist;
import umontreal.ssj.probdist.LoglogisticDist;
import umontreal.ssj.probdist.LognormalDist;
import umontreal.ssj.probdist.ParetoDist;
import umontreal.ssj.probdist.Pearson6Dist;
import umontreal.ssj.probdist.WeibullDist;

/** Kinds over grids of their parameters against SSJ (L'Ecuyer, Université de Montréal), a library that shares no code with ours. */
class SeverityAgainstLibraryTest {
    private static final double[] SHAPES = {0.3, 0.8, 1, 1.7, 3, 12};
    private static final double[] SCALES = {0.01, 5, 3e4};
    private static final double[] PROBABILITIES = {1e-4, 0.01, 0.1, 0.3, 0.5, 0.8, 0.95, 0.999};

    static List<Arguments> pairs() {
        List<Arguments> all = new ArrayList<>();
        for (double shape : SHAPES) {
            for (double scale : SCALES) {
                add(all, new Lognormal(Math.log(scale), shape / 4), new LognormalDist(Math.log(scale), shape / 4), 1e-12);
                add(all, new Pareto(scale, shape), new ParetoDist(shape, scale), 1e-12);
                add(all, new Gamma(shape, scale), new GammaDist(shape, 1 / scale), 1e-11);
                add(all, new Weibull(shape, scale), new WeibullDist(shape, 1 / scale, 0), 1e-12);
                add(all, new Loglogistic(shape, scale), new LoglogisticDist(shape, scale), 1e-12);
                add(all, new Exponential(shape * scale), new ExponentialDist(1 / (shape * scale)), 1e-12);
                add(all, new InverseGaussian(scale, shape * scale), new InverseGaussianDist(scale, shape * scale), 1e-11);
                // the Lomax law: Burr's with γ = 1, and the generalized Pareto law with ξ = 1/α, σ = θ/α
                add(all, new Burr(shape, 1, scale), new Pearson6Dist(1, shape, scale), 1e-11);
                add(all, new GeneralizedPareto(0, scale / shape, 1 / shape), new Pearson6Dist(1, shape, scale), 1e-11);
                // ξ < 0: a beta law with a = 1
                add(all, new GeneralizedPareto(0, scale / shape, -1 / shape), new BetaDist(1, shape, 0, scale), 1e-11);
                for (double b : SHAPES) {
                    add(all, new Beta(shape, b, scale), new BetaDist(shape, b, 0, scale), 1e-11);
                }
            }
        }
        return all;
    }

    private static void add(List<Arguments> all, SeverityModel model, ContinuousDistribution library, double tolerance) {
        all.add(Arguments.of(model, library, tolerance));
    }

    @ParameterizedTest
    @MethodSource("pairs")
    void probabilities(SeverityModel model, ContinuousDistribution library, double tolerance) {
        for (double p : PROBABILITIES) {
            double x = model.quantile(p);
            assertEquals(library.cdf(x), model.cdf(x), tolerance * library.cdf(x) + 1e-13, "cdf at " + x);
            assertEquals(library.barF(x), model.survival(x), tolerance * library.barF(x) + 1e-13, "survival at " + x);
        }
    }

    @ParameterizedTest
    @MethodSource("pairs")
    void quantilesAndMean(SeverityModel model, ContinuousDistribution library, double tolerance) {
        for (double p : PROBABILITIES) {
            double x = library.inverseF(p);
            assertEquals(p, model.cdf(x), 1e-10, "the library's quantile of " + p + ": " + x);
            assertEquals(x, model.quantile(p), 1e-7 * x, "quantile of " + p);
        }
        if (model.mean() < Double.POSITIVE_INFINITY) {
            assertEquals(library.getMean(), model.mean(), tolerance * model.mean());
        }
    }
}
