package layerweft.model.copula;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Distribution functions of normal and t copulas against closed forms and against each other. */
class EllipticalCdfTest {

    /** Sheppard (1899): 1/4 + asin ρ/(2π), for every elliptical law. */
    @ParameterizedTest
    @ValueSource(doubles = {-1, -0.99999, -0.7, 0, 0.3, 0.95, 0.999999, 1})
    void quadrants(double rho) {
        double expected = 0.25 + Math.asin(rho) / (2 * Math.PI);
        EqualCorrelation correlation = new EqualCorrelation(rho);
        assertEquals(expected, new Gaussian(correlation).cdf(0.5, 0.5), 1e-14);
        for (double nu : new double[]{0.1, 1, 4.5, 300, 1e7}) {
            assertEquals(expected, new Student(correlation, nu).cdf(0.5, 0.5), 1e-14);
        }
    }

    @Test
    void octants() {
        double[][] matrix = {{1, 0.6, -0.3}, {0.6, 1, 0.2}, {-0.3, 0.2, 1}};
        double expected = 0.125 + (Math.asin(0.6) + Math.asin(-0.3) + Math.asin(0.2)) / (4 * Math.PI);
        assertEquals(expected, Gaussian.ofCorrelation(matrix).cdf(0.5, 0.5, 0.5), 1e-12);
        assertEquals(expected, Student.ofCorrelation(matrix, 3.5).cdf(0.5, 0.5, 0.5), 1e-11);
        double equal = 0.125 + 3 * Math.asin(-0.45) / (4 * Math.PI);
        assertEquals(equal, new Gaussian(new EqualCorrelation(-0.45)).cdf(0.5, 0.5, 0.5), 1e-12);
    }

    /** With ρ = 1/2 all of d normals are negative with probability 1/(d + 1). */
    @ParameterizedTest
    @ValueSource(ints = {3, 10, 64})
    void orthantsOfOneFactor(int d) {
        double[] medians = new double[d];
        Arrays.fill(medians, 0.5);
        assertEquals(1.0 / (d + 1), new Gaussian(new EqualCorrelation(0.5)).cdf(medians), 1e-12);
        assertEquals(1.0 / (d + 1), new Student(new EqualCorrelation(0.5), 4).cdf(medians), 1e-11);
    }

    /** Cauchy's bivariate law (ν = 1, ρ = 0): 1/4 + (atan h + atan k + atan(hk/√(1+h²+k²)))/(2π). */
    @Test
    void cauchyPair() {
        double h = 0.7;
        double k = -1.9;
        double expected = 0.25 + (Math.atan(h) + Math.atan(k) + Math.atan(h * k / Math.sqrt(1 + h * h + k * k))) / (2 * Math.PI);
        double found = Student.ofKendallTau(0, 1).cdf(0.5 + Math.atan(h) / Math.PI, 0.5 + Math.atan(k) / Math.PI);
        assertEquals(expected, found, 1e-14);
    }

    @Test
    void studentWithManyDegreesOfFreedomIsNormal() {
        double[] u = {0.02, 0.3, 0.9};
        assertEquals(Gaussian.ofKendallTau(0.4).cdf(u), Student.ofKendallTau(0.4, 1e8).cdf(u), 1e-7);
    }

    /** Conditioning on one variable, and one common factor, are two ways to the same number. */
    @Test
    void threeVariablesByTwoMethods() {
        double[][] equal = {{1, 0.8, 0.8}, {0.8, 1, 0.8}, {0.8, 0.8, 1}};
        for (double[] x : new double[][]{{0, 1, -1}, {-3, -3.1, -2}, {2, 2.5, 0.1}}) {
            assertEquals(NormalProbability.of(equal, OptionalDouble.of(0.8)).at(x), ThreeNormals.cdf(x, equal), 1e-12);
        }
    }

    @Test
    void generalMatricesAgainstTheCommonFactor() {
        int d = 6;
        double[][] matrix = new EqualCorrelation(0.5).matrix(d);
        double[] u = {0.9, 0.3, 0.7, 0.8, 0.95, 0.6};
        matrix[1][0] = matrix[0][1] = 0.5 + 1e-9;
        assertEquals(new Gaussian(new EqualCorrelation(0.5)).cdf(u), Gaussian.ofCorrelation(matrix).cdf(u), 2e-5);
        assertEquals(new Student(new EqualCorrelation(0.5), 3).cdf(u), Student.ofCorrelation(matrix, 3).cdf(u), 2e-5);
    }

    @Test
    void blocksMultiply() {
        double[][] matrix = {{1, 0.7, 0, 0}, {0.7, 1, 0, 0}, {0, 0, 1, -0.6}, {0, 0, -0.6, 1}};
        double expected = new Gaussian(new EqualCorrelation(0.7)).cdf(0.2, 0.6) * new Gaussian(new EqualCorrelation(-0.6)).cdf(0.7, 0.4);
        assertEquals(expected, Gaussian.ofCorrelation(matrix).cdf(0.2, 0.6, 0.7, 0.4), 2e-5);
        assertEquals(new Gaussian(new EqualCorrelation(-0.6)), Gaussian.ofCorrelation(matrix).pair(2, 3));
    }

    /** C(u, v) = ∫ P(V ≤ v | U) dU: nearly comonotonic pairs whose ridge is narrow. */
    @ParameterizedTest
    @ValueSource(doubles = {0.999, 0.99999, -0.99999})
    void nearlySingularPairs(double rho) {
        double u = 0.3;
        double v = 0.3004;
        double own = Math.sqrt((1 - rho) * (1 + rho));
        double expected = AdaptiveQuadrature.integrate(
                p -> NormalScale.cdf((NormalScale.quantile(v, 1 - v) - rho * NormalScale.quantile(p, 1 - p)) / own), 0, u, 1e-14, 1e-13);
        assertEquals(expected, new Gaussian(new EqualCorrelation(rho)).cdf(u, v), 1e-12);
        assertTrue(expected >= 0);
    }
}
