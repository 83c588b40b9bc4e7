package layerweft.engine.transform;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.stream.Stream;
import layerweft.model.frequency.FrequencyModel;
import layerweft.model.frequency.NegativeBinomial;
import layerweft.model.frequency.Poisson;
import layerweft.model.severity.DiscreteLosses;
import layerweft.model.treaty.AnnualTerms;
import layerweft.model.treaty.Layer;
import layerweft.model.treaty.OccurrenceTerms;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;

/** One peril against Panjer's recursion (1981, "Recursive evaluation of a family of compound distributions"), a second way altogether. */
class PanjerTest {

    /** P(A = k) of a compound (a, b, 0) law. */
    private static double[] panjer(double a, double b, double none, double generatingAtZero, double[] f, int length) {
        double[] g = new double[length];
        g[0] = generatingAtZero;
        for (int s = 1; s < length; s++) {
            for (int k = 1; k <= Math.min(s, f.length - 1); k++) {
                g[s] += (a + b * k / s) * f[k] * g[s - k];
            }
            g[s] /= 1 - a * f[0];
        }
        return g;
    }

    static Stream<Arguments> laws() {
        return Stream.of(Arguments.of(new Poisson(0.001), 0.0, 0.001, Math.exp(-0.001)), Arguments.of(new Poisson(3.2), 0.0, 3.2, Math.exp(-3.2)),
                Arguments.of(new Poisson(200), 0.0, 200.0, Math.exp(-200)),
                // r = mean/(v − 1), a = 1 − 1/v, b = (r − 1)a, P(N = 0) = v^−r
                Arguments.of(new NegativeBinomial(1.8, 1.4), 1 - 1 / 1.4, (4.5 - 1) * (1 - 1 / 1.4), Math.pow(1.4, -4.5)));
    }

    @ParameterizedTest
    @MethodSource("laws")
    void stopLossesOfALatticeLawAreThoseOfTheRecursion(FrequencyModel frequency, double a, double b, double none) {
        double[] f = {0, 0.4, 0.3, 0, 0.2, 0.1};
        double[] g = panjer(a, b, none, none, f, 1400);
        DiscreteLosses losses = Models.losses(new double[] {1, 2, 4, 5}, new double[] {0.4, 0.3, 0.2, 0.1});
        double mean = frequency.mean() * 2.3;
        for (int d : new int[] {0, 1, 5, (int) mean, (int) (mean + 3 * Math.sqrt(frequency.variance() * 8))}) {
            double expected = 0;
            for (int s = d; s < g.length; s++) {
                expected += Math.min(s - d, 7) * g[s];
            }
            var priced = new TransformEngine(Models.single(frequency, losses, Models.stopLoss(7, d)), Accuracy.of(1e-9)).price(0);
            assertEquals(expected, priced.expectedLoss().value(), 1e-8 + 1e-8 * expected, "deductible " + d);
            assertEquals(expected, priced.expectedLoss().value(), 3 * priced.expectedLoss().error() + 1e-13);
        }
    }

    @ParameterizedTest
    @MethodSource("laws")
    void occurrenceLayersOfALatticeLawAreThoseOfTheRecursion(FrequencyModel frequency, double a, double b, double none) {
        // 3 xs 1 turns losses 1, 2, 4, 5 into 0, 1, 3, 3
        double[] f = {0.4, 0.3, 0, 0.3};
        double atZero = frequency instanceof Poisson ? Math.exp(-frequency.mean() * 0.6) : Math.pow(1 + 0.4 * 0.6, -4.5);
        double[] g = panjer(a, b, none, atZero, f, 1400);
        double expected = 0;
        for (int s = 2; s < g.length; s++) {
            expected += Math.min(s - 2, 6) * g[s];
        }
        Layer layer = Layer.of("3 xs 1", OccurrenceTerms.excess(3, 1), new AnnualTerms(2, 6));
        DiscreteLosses losses = Models.losses(new double[] {1, 2, 4, 5}, new double[] {0.4, 0.3, 0.2, 0.1});
        var priced = new TransformEngine(Models.single(frequency, losses, layer), Accuracy.of(1e-9)).price(0);
        assertEquals(expected, priced.expectedLoss().value(), 1e-9 + 1e-8 * expected);
        double attached = 1 - g[0] - g[1] - g[2];
        assertEquals(attached, priced.attachmentProbability().value(), 1e-9);
    }
}
