package layerweft.model.copula;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;
import java.util.stream.Stream;
import layerweft.model.random.KeyedStream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;

/** Laplace transforms of drawn frailties. Fixed seeds; with fresh ones the odds of false alarm are 6e-7 a check, 1 in 5,000 runs. */
class FrailtyTest {
    private static final int DRAWS = 40_000;
    private static final double MOST = 5;

    static Stream<Arguments> generators() {
        return Stream.of(
                Arguments.of(new ClaytonGenerator(0.01), "gamma of shape 100"),
                Arguments.of(new ClaytonGenerator(2), "gamma of shape 1/2"),
                Arguments.of(new ClaytonGenerator(200), "gamma of shape 0.005"),
                Arguments.of(new GumbelGenerator(1.0001), "stable of index next to 1"),
                Arguments.of(new GumbelGenerator(2), "stable of index 1/2"),
                Arguments.of(new GumbelGenerator(100), "stable of index 0.01"),
                Arguments.of(new GumbelGenerator(1000), "stable of index 0.001"),
                Arguments.of(new FrankGenerator(0.001), "logarithmic series next to 1"),
                Arguments.of(new FrankGenerator(5), "logarithmic series"),
                Arguments.of(new FrankGenerator(40), "logarithmic series, p = 1 in a double"),
                Arguments.of(new FrankGenerator(300), "logarithmic series of huge mean"),
                Arguments.of(new FrankGenerator(2000), "logarithmic series beyond a double"),
                Arguments.of(new JoeGenerator(1.001), "Sibuya next to 1"),
                Arguments.of(new JoeGenerator(1.8), "Sibuya"),
                Arguments.of(new JoeGenerator(20), "Sibuya of 0.05"),
                Arguments.of(new JoeGenerator(100), "Sibuya of 0.01"));
    }

    @ParameterizedTest(name = "{1}")
    @MethodSource("generators")
    void laplaceTransformIsTheGenerator(Generator generator, String what) {
        KeyedStream stream = new KeyedStream(20);
        FrailtySampler frailty = generator.frailty(stream);
        double[] logs = new double[DRAWS];
        for (int k = 0; k < DRAWS; k++) {
            logs[k] = frailty.logSample();
            assertTrue(Double.isFinite(logs[k]), what);
        }
        for (double psi : new double[]{0.02, 0.2, 0.5, 0.8, 0.98}) {
            assertMean(logs, generator.logInverse(psi, 1 - psi), psi, what);
        }
    }

    /** The mean of exp(−tV), a number within [0, 1] whose variance is at most p(1 − p). */
    private static void assertMean(double[] logs, double lnT, double expected, String what) {
        double mean = Arrays.stream(logs).map(lnV -> Math.exp(-Math.exp(lnT + lnV))).average().orElseThrow();
        double error = Math.sqrt(expected * (1 - expected) / logs.length);
        assertEquals(expected, mean, MOST * error + 1.0 / logs.length, what + " at ln t = " + lnT);
    }

    @ParameterizedTest
    @CsvSource({"CLAYTON, 0.1, 0.5", "CLAYTON, 0.5, 0.9", "CLAYTON, 0.9, 0.99", "CLAYTON, 0.001, 0.3", "CLAYTON, 0.3, 0.301",
        "GUMBEL, 0.1, 0.5", "GUMBEL, 0.9, 0.99", "GUMBEL, 0.3, 0.301",
        "FRANK, 0.0001, 0.5", "FRANK, 0.1, 0.5", "FRANK, 0.5, 0.9", "FRANK, 0.9, 0.95", "FRANK, 0.9, 0.99",
        "JOE, 0.001, 0.5", "JOE, 0.1, 0.5", "JOE, 0.5, 0.9", "JOE, 0.9, 0.95", "JOE, 0.9, 0.99"})
    void innerFrailtyHasItsConditionalTransform(ArchimedeanFamily family, double outerTau, double innerTau) {
        double outer = family.thetaOf(outerTau);
        double inner = family.thetaOf(innerTau);
        Generator outerGenerator = family.generator(outer);
        Generator innerGenerator = family.generator(inner);
        KeyedStream stream = new KeyedStream(9);
        InnerFrailty frailty = InnerFrailty.of(family, outer, inner, stream);
        for (double level : new double[]{0.001, 0.1, 0.5, 0.9, 0.999}) {
            // a frailty about which 1/V runs through the outer generator's range; an integer for Frank and Joe
            double logOuter = -outerGenerator.logInverse(level, 1 - level);
            if (family == ArchimedeanFamily.FRANK || family == ArchimedeanFamily.JOE) {
                logOuter = logOuter > 30 ? logOuter : Math.log(Math.ceil(Math.exp(logOuter)));
            }
            double[] logs = new double[3000];
            for (int k = 0; k < logs.length; k++) {
                logs[k] = frailty.logSample(logOuter);
                assertFalse(Double.isNaN(logs[k]));
            }
            for (double u : new double[]{0.1, 0.5, 0.9}) {
                double expected = Math.exp(-Math.exp(logOuter + outerGenerator.logInverse(u, 1 - u)));
                assertMean(logs, innerGenerator.logInverse(u, 1 - u), expected, "ln V_0 = " + logOuter + ", u = " + u);
            }
        }
    }
}
