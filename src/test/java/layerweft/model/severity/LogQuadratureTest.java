package layerweft.model.severity;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class LogQuadratureTest {

    @ParameterizedTest
    @ValueSource(doubles = {0.2, 0.9, 1.5, 2.5, 7})
    void powersOverManyMagnitudes(double alpha) {
        for (double from : new double[]{1e-90, 1, 7e20}) {
            for (double ratio : new double[]{1.001, 50, 1e40}) {
                double first = from * -Math.expm1((1 - alpha) * Math.log(ratio)) / (alpha - 1);
                assertEquals(first, LogQuadrature.integral(x -> Math.pow(from / x, alpha), 1, from, from * ratio, 1), 1e-12 * first);
                double second = 2 * from * from * -Math.expm1((2 - alpha) * Math.log(ratio)) / (alpha - 2);
                assertEquals(second, LogQuadrature.integral(x -> Math.pow(from / x, alpha), 2, from, from * ratio, 1), 1e-12 * second);
            }
        }
    }

    @ParameterizedTest
    @ValueSource(doubles = {1e-30, 0.01, 1, 40, 1e10, 1e100, 1e150})
    void fromZero(double to) {
        double first = -Math.expm1(-to);
        assertEquals(first, LogQuadrature.integral(x -> Math.exp(-x), 1, 0, to, 1), 1e-13 * first);
        assertEquals(Math.atan(to), LogQuadrature.integral(x -> 1 / (1 + x * x), 1, 0, to, 1), 1e-13 * Math.atan(to));
        assertEquals(Math.log1p(to * to), LogQuadrature.integral(x -> 1 / (1 + x * x), 2, 0, to, 1), 1e-13 * Math.log1p(to * to));
    }

    @Test
    void amountsAtTheEndsOfTheNumbers() {
        assertEquals(0, LogQuadrature.integral(x -> 1, 1, 0, Double.MIN_VALUE, 1), Double.MIN_VALUE);
        assertEquals(1e-310, LogQuadrature.integral(x -> 1, 1, 0, 1e-310, 1), 1e-320);
        assertEquals(2, LogQuadrature.integral(x -> 1 / x / x, 1, 0.5, Double.MAX_VALUE, 1), 1e-12);
    }
}
