package layerweft.model.severity;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class BisectionTest {

    @ParameterizedTest
    @ValueSource(doubles = {0, Double.MIN_VALUE, 1e-200, 0.1, 1, Math.PI, 1e300, Double.MAX_VALUE, Double.POSITIVE_INFINITY})
    void findsTheAmountToTheLastBit(double amount) {
        assertEquals(amount, Bisection.smallest(0, Double.POSITIVE_INFINITY, x -> x >= amount));
    }

    @ParameterizedTest
    @ValueSource(doubles = {0, 1, 50})
    void staysWithinItsEnds(double low) {
        assertEquals(low, Bisection.smallest(low, 50, x -> true));
        assertEquals(50, Bisection.smallest(low, 50, x -> false));
        assertEquals(low, Bisection.smallest(-0.0 + low, low, x -> false));
    }
}
