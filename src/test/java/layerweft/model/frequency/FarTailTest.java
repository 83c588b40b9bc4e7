package layerweft.model.frequency;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.stream.Stream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;

/** The survival keeps its relative precision far beyond where 1 - cdf is 0. */
class FarTailTest {

    static Stream<FrequencyModel> models() {
        return Stream.of(new Poisson(0.01), new Poisson(1.8), new Poisson(60), new Poisson(1e4), new NegativeBinomial(1.8, 1.4),
                new NegativeBinomial(0.5, 6), new NegativeBinomial(3, 1.00001), new NegativeBinomial(1e4, 1.5), new NegativeBinomial(200, 20),
                new Binomial(1000, 0.2), new Binomial(1_000_000_000, 3e-8), new Binomial(100_000, 0.5));
    }

    @ParameterizedTest
    @MethodSource("models")
    void survivalIsTheSumOfTheProbabilitiesBeyond(FrequencyModel model) {
        for (double level : new double[] {1e-20, 1e-50, 1e-100, 1e-200}) {
            int n = (int) model.mean();
            while (model.survival(n) > level) {
                n++;
            }
            double sum = 0;
            int k = n + 1;
            for (double p = model.probability(k); p > sum * 1e-18; p = model.probability(++k)) {
                sum += p;
            }
            assertTrue(sum > 0, () -> "nothing summed at " + level);
            assertEquals(sum, model.survival(n), 3e-12 * sum, "P(N > " + n + "), near " + level);
        }
    }

    @ParameterizedTest
    @MethodSource("models")
    void cdfIsTheSumOfTheProbabilitiesUpTo(FrequencyModel model) {
        int n = (int) Math.max(0, model.mean() - 12 * Math.sqrt(model.variance()));
        double sum = 0;
        for (int k = 0; k <= n; k++) {
            sum += model.probability(k);
        }
        assertTrue(sum > 0);
        assertEquals(sum, model.cdf(n), 3e-12 * sum, "P(N <= " + n + ")");
    }

    /** Independently summed with mpmath in 50-digit arithmetic, at the doubles given. */
    @ParameterizedTest
    @CsvSource({
        "poisson, 1.8, 0, 100, 1.0819296184216976e-135, 1e-12",
        "poisson, 60.0, 0, 292, 7.296350480672605e-103, 1e-12",
        "poisson, 1000000.0, 0, 1030000, 4.0727269007077213e-196, 1e-09",
        "negativeBinomial, 1.8, 1.4, 100, 3.3617181232962735e-50, 1e-12",
        "negativeBinomial, 3.0, 1.00001, 100, 8.548331328846737e-114, 1e-12",
        "negativeBinomial, 3.0, 1.0000000149011612, 100, 8.414137766602589e-114, 1e-12",
        "negativeBinomial, 30.0, 1.0000000149011612, 12, 0.9998323023365252, 1e-12",
        "negativeBinomial, 1000000.0, 1.1, 1031464, 7.747776921772972e-196, 1e-09",
        "negativeBinomial, 0.01, 1000.0, 94, 1.8756589214866356e-05, 1e-12",
        "binomial, 1000000000.0, 3e-08, 29, 0.5242830149831977, 1e-12",
        "binomial, 1000000000.0, 3e-08, 194, 4.65867616265348e-89, 1e-12",
        "binomial, 1000000.0, 0.999, 999316, 1.1940548381019663e-26, 1e-12"})
    void survivalInArithmeticOfFiftyDigits(String kind, double first, double second, int n, double expected, double tolerance) {
        FrequencyModel model = switch (kind) {
            case "poisson" -> new Poisson(first);
            case "negativeBinomial" -> new NegativeBinomial(first, second);
            default -> new Binomial((int) first, second);
        };
        assertEquals(expected, model.survival(n), tolerance * expected);
    }
}
