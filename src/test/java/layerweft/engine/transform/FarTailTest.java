package layerweft.engine.transform;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.Arrays;
import java.util.List;
import layerweft.figures.LayerStatistics;
import layerweft.model.copula.Independence;
import layerweft.model.frequency.Poisson;
import layerweft.model.treaty.AnnualTerms;
import layerweft.model.treaty.Layer;
import layerweft.model.treaty.OccurrenceTerms;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Layers reached only through a high annual deductible, against Panjer's (1981) recursion in 60-digit arithmetic. */
class FarTailTest {
    private static final MathContext DIGITS = new MathContext(60);

    /** P(ΣX = s) for a Poisson number with this mean of losses 1, 2, 4, 5 with probabilities 0.4, 0.3, 0.2, 0.1. */
    private static BigDecimal[] poisson(double mean, int most) {
        double[] tenths = {0, 4, 3, 0, 2, 1};
        BigDecimal[] g = new BigDecimal[most];
        g[0] = exp(new BigDecimal(mean).negate());
        for (int s = 1; s < most; s++) {
            BigDecimal sum = BigDecimal.ZERO;
            for (int x = 1; x < Math.min(6, s + 1); x++) {
                sum = sum.add(g[s - x].multiply(new BigDecimal(tenths[x] * x)));
            }
            g[s] = sum.multiply(new BigDecimal(mean)).divide(new BigDecimal(10 * s), DIGITS);
        }
        return g;
    }

    private static BigDecimal exp(BigDecimal x) {
        BigDecimal sum = BigDecimal.ONE;
        BigDecimal term = BigDecimal.ONE;
        for (int n = 1; n < 120; n++) {
            term = term.multiply(x).divide(new BigDecimal(n), DIGITS);
            sum = sum.add(term);
        }
        return sum;
    }

    @ParameterizedTest
    @ValueSource(ints = {20, 30, 38, 44, 60})
    void keepTheirDigitsDownToVerySmallChances(int deductible) {
        BigDecimal[] g = poisson(1.25, 200);
        double attached = Arrays.stream(g).skip(deductible + 1L).reduce(BigDecimal.ZERO, BigDecimal::add).doubleValue();
        double expected = 0;
        for (int s = g.length - 1; s > deductible; s--) {
            expected += Math.min(6, s - deductible) * g[s].doubleValue();
        }
        double exhausted = Arrays.stream(g).skip(deductible + 6L).reduce(BigDecimal.ZERO, BigDecimal::add).doubleValue();
        var losses = Models.losses(new double[] {1, 2, 4, 5}, new double[] {0.4, 0.3, 0.2, 0.1});
        Layer layer = Layer.of("far", OccurrenceTerms.NONE, new AnnualTerms(deductible, 6));
        for (LayerStatistics s : List.of(new TransformEngine(Models.single(new Poisson(1.25), losses, layer), Accuracy.USUAL).price(0),
                new TransformEngine(Models.counts(List.of(Models.peril("a", new Poisson(0.5), losses), Models.peril("b", new Poisson(0.75), losses)),
                        new Independence(), layer), Accuracy.USUAL).price(0))) {
            String of = "deductible " + deductible + ", attached " + attached + ": " + s;
            assertEquals(attached, s.attachmentProbability().value(), 1e-6 * attached, of);
            assertEquals(exhausted, s.exhaustionProbability().value(), 1e-6 * exhausted, of);
            assertEquals(expected, s.expectedLoss().value(), 1e-6 * expected, of);
            assertEquals(expected, s.expectedLoss().value(), 3 * s.expectedLoss().error() + 1e-13 * expected, of);
            assertEquals(0, s.attachmentProbability().error(), 1e-3 * attached, of);
        }
    }
}
