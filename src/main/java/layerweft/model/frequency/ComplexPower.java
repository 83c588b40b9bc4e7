package layerweft.model.frequency;

import org.apache.commons.math3.complex.Complex;

/** Powers of complex numbers close to 1. */
final class ComplexPower {
    /** Below this value of |1 + w|² - 1 the modulus itself is accurate, and log1p would cancel. */
    private static final double FAR_FROM_ONE = -0.75;

    private ComplexPower() {
    }

    /**
     * (1 + w)^exponent on the principal branch as exp(exponent · log(1 + w)). The logarithm of the modulus is ½ log1p(2a + a² + b²) for
     * w = a + bi: 1 + w is never formed where it is near 1, for a large exponent would magnify its rounding.
     */
    static Complex ofOnePlus(Complex w, double exponent) {
        double a = w.getReal();
        double b = w.getImaginary();
        if (a == -1 && b == 0) {
            return exponent > 0 ? Complex.ZERO : Complex.INF;
        }
        double squareLessOne = a * (2 + a) + b * b;
        double logModulus = squareLessOne > FAR_FROM_ONE ? Math.log1p(squareLessOne) / 2 : Math.log(Math.hypot(1 + a, b));
        double modulus = Math.exp(exponent * logModulus);
        double angle = exponent * Math.atan2(b, 1 + a);
        return new Complex(modulus * Math.cos(angle), modulus * Math.sin(angle));
    }
}
