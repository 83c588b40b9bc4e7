package layerweft.model.severity;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class ExponentialIntegralTest {
    private static final double INFINITY = Double.POSITIVE_INFINITY;

    @ParameterizedTest
    @ValueSource(doubles = {-3, -1e-3, -1e-12, 0, 1e-12, 1e-3, 0.7, 5})
    void integralOfTheExponential(double k) {
        for (double y : new double[]{1e-9, 0.3, 4, 20}) {
            double expected = LogQuadrature.integral(u -> Math.exp(-k * u), 0, y, 0.25);
            assertEquals(expected, ExponentialIntegral.of(k, y), 1e-12 * expected, "up to " + y);
        }
        assertEquals(0, ExponentialIntegral.of(k, 0));
        assertEquals(k > 0 ? 1 / k : INFINITY, ExponentialIntegral.of(k, INFINITY));
    }

    @ParameterizedTest
    @ValueSource(doubles = {1e-3, 0.7, 1, 5})
    void integralOfTheFirstMoment(double k) {
        for (double y : new double[]{1e-9, 0.02, 0.0999 / k, 0.1001 / k, 0.3, 4, 20}) {
            double expected = LogQuadrature.integral(u -> u * Math.exp(-k * u), 0, y, 0.25);
            assertEquals(expected, ExponentialIntegral.first(k, y), 1e-11 * expected, "up to " + y);
        }
        assertEquals(1 / (k * k), ExponentialIntegral.first(k, INFINITY));
    }

    @Test
    void nothingIsLostNextToZero() {
        assertEquals(2, ExponentialIntegral.of(1e-300, 2));
        assertEquals(2e-30, ExponentialIntegral.first(1, 2e-15), 1e-44);
    }
}
