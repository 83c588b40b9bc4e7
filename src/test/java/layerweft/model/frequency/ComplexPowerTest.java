package layerweft.model.frequency;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.apache.commons.math3.complex.Complex;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class ComplexPowerTest {

    @ParameterizedTest
    @CsvSource({"0.3, 0.4", "-0.7, 0.2", "-1.5, 0.9", "-0.999, 1e-9", "-2, 0", "3, -7", "1e-9, -1e-9"})
    void isTheProductForWholeExponents(double re, double im) {
        Complex w = new Complex(re, im);
        Complex product = Complex.ONE;
        for (int n = 1; n <= 6; n++) {
            product = product.multiply(w.add(1));
            assertEquals(0, ComplexPower.ofOnePlus(w, n).subtract(product).abs(), 1e-14 * product.abs(), "to the power " + n);
        }
    }

    /** (1 + w)^(1/w) goes to e as w goes to 0: log(1 + w)/w = 1 - w/2 + w²/3 - … */
    @ParameterizedTest
    @CsvSource({"1e-6", "1e-10", "1e-14"})
    void keepsSmallStepsUnderLargeExponents(double w) {
        assertEquals(Math.exp(1 - w / 2 + w * w / 3), ComplexPower.ofOnePlus(new Complex(w, 0), 1 / w).getReal(), 1e-14);
    }

    @Test
    void zeroToPositiveAndNegativeExponents() {
        assertEquals(Complex.ZERO, ComplexPower.ofOnePlus(new Complex(-1, 0), 3));
        assertEquals(Complex.INF, ComplexPower.ofOnePlus(new Complex(-1, 0), -3));
    }
}
