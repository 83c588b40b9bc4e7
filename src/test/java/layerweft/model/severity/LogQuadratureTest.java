package layerweft.model.severity;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class LogQuadratureTest {

    @ParameterizedTest
    @ValueSource(doubles = {-0.999, -0.3, 0, 0.5, 3})
    void powersFromTheLeastToTheGreatest(double k) {
        for (double to : new double[]{1e-100, 1, 7e20}) {
            double expected = Math.pow(to, k + 1) / (k + 1) * -Math.expm1(-(k + 1) * Math.log(1e9));
            assertEquals(expected, LogQuadrature.integral(x -> Math.pow(x, k), to * 1e-9, to, 1), 1e-12 * expected);
        }
    }

    @Test
    void aBoundedIntegrandFromZero() {
        assertEquals(1 - Math.exp(-40), LogQuadrature.integral(x -> Math.exp(-x), 0, 40, 1), 1e-13);
        assertEquals(Math.atan(30), LogQuadrature.integral(x -> 1 / (1 + x * x), 0, 30, 1), 1e-13);
        assertEquals(5, LogQuadrature.integral(x -> 1, 0, 5, 1), 1e-14);
    }

    @Test
    void amountsAtTheEndsOfTheNumbers() {
        assertEquals(Double.MIN_VALUE, LogQuadrature.integral(x -> 1, 0, Double.MIN_VALUE, 1));
        assertEquals(1e-310, LogQuadrature.integral(x -> 1, 0, 1e-310, 1), 1e-320);
        assertEquals(2, LogQuadrature.integral(x -> 1 / x / x, 0.5, Double.MAX_VALUE, 1), 1e-13);
    }
}
