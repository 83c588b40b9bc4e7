package layerweft.model.copula;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Values printed in books and papers, to the digits printed. */
class PublishedCopulaValuesTest {

    /** Nelsen (2006), An Introduction to Copulas, section 5.1: τ = 1 − 4(1 − D₁(θ))/θ. */
    @ParameterizedTest
    @CsvSource({"0.25, 2.372, 5e-4", "0.5, 5.736, 5e-4", "0.75, 14.14, 5e-3"})
    void frankStrengthAtTau(double tau, double theta, double lastDigit) {
        assertEquals(theta, ArchimedeanFamily.FRANK.thetaOf(tau), lastDigit);
    }

    /** The usual Frank copula at θ = 5 has τ = +0.4567 (a printed form with the opposite sign is found in lecture notes). */
    @Test
    void frankIsPositiveAtPositiveTheta() {
        Archimedean frank = Archimedean.ofTheta(ArchimedeanFamily.FRANK, false, 5);
        assertEquals(0.45670095816, frank.kendallTau(0, 1), 1e-11);
        assertEquals(-0.45670095816, Archimedean.ofTheta(ArchimedeanFamily.FRANK, false, -5).kendallTau(0, 1), 1e-11);
        double numerator = Math.expm1(-5 * 0.3) * Math.expm1(-5 * 0.6);
        assertEquals(-Math.log(1 + numerator / Math.expm1(-5)) / 5, frank.cdf(0.3, 0.6), 1e-15);
    }

    /** Avanzi (2023), General Insurance Modelling, module 5: Gumbel with θ = 2. */
    @Test
    void gumbelOfTwo() {
        Archimedean gumbel = Archimedean.ofTheta(ArchimedeanFamily.GUMBEL, false, 2);
        assertEquals(0.5, gumbel.kendallTau(0, 1), 1e-15);
        assertEquals(0.59, gumbel.upperTail(0, 1), 5e-3);
        assertEquals(2 - Math.sqrt(2), gumbel.upperTail(0, 1), 1e-15);
    }

    @ParameterizedTest
    @CsvSource({"1.25", "2", "10"})
    void gumbelTauIsOneLessTheInverseOfTheta(double theta) {
        assertEquals(1 - 1 / theta, ArchimedeanFamily.GUMBEL.tauOf(theta), 1e-15);
    }

    /** Loss Data Analytics (2023), Table 14.8: Gumbel θ = 3, 0.74; t with ρ = 0.25 and ν = 5, 0.1066, cut to 0.10 there. */
    @Test
    void tailDependenceOfFourCopulas() {
        assertEquals(0.74, Archimedean.ofTheta(ArchimedeanFamily.GUMBEL, false, 3).upperTail(0, 1), 5e-3);
        Student student = new Student(new EqualCorrelation(0.25), 5);
        assertEquals(0.106558184639, student.upperTail(0, 1), 1e-12);
        assertEquals(student.upperTail(0, 1), student.lowerTail(0, 1));
        assertEquals(0, new Gaussian(new EqualCorrelation(0.25)).upperTail(0, 1));
        assertEquals(0, Archimedean.ofTheta(ArchimedeanFamily.FRANK, false, 0.05).upperTail(0, 1));
    }

    /** Joe (2014), τ = 1 − 4Σ1/(k(θk+2)(θ(k−1)+2)); recomputed as a series of two million terms. */
    @ParameterizedTest
    @CsvSource({"1.5, 0.219272460477, 0.412598948032", "2, 0.355065933152, 0.585786437627",
        "3, 0.51796249823, 0.740078950105", "5, 0.677220746878, 0.851301645003"})
    void joe(double theta, double tau, double upperTail) {
        Archimedean joe = Archimedean.ofTheta(ArchimedeanFamily.JOE, false, theta);
        assertEquals(tau, joe.kendallTau(0, 1), 1e-11);
        assertEquals(upperTail, joe.upperTail(0, 1), 1e-12);
        assertEquals(theta, ArchimedeanFamily.JOE.thetaOf(ArchimedeanFamily.JOE.tauOf(theta)), 1e-11);
    }

    @Test
    void joeOfTwoInClosedForm() {
        assertEquals(2 - Math.PI * Math.PI / 6, ArchimedeanFamily.JOE.tauOf(2), 1e-12);
    }

    /** The formula for τ holds outside the admissible range too: τ = −1 at θ = 0.2387339899 (Joe 2014). */
    @Test
    void joeFormulaBelowItsRange() {
        assertEquals(-1, ArchimedeanFamily.JOE.tauOf(0.2387339899), 1e-8);
    }

    /**
     * McNeil, Frey &amp; Embrechts (2005), Quantitative Risk Management, Table 5.2: chance that both variables are above their p-quantile,
     * ρ = 0.5, and the ratio of the t copulas' to it. The table cuts rather than rounds some entries: one unit of the last digit.
     */
    @ParameterizedTest
    @CsvSource({"0.95, 1.21e-2, 1.20, 1.39, 1.50", "0.99, 1.29e-3, 1.65, 2.22, 2.55",
        "0.995, 4.96e-4, 1.94, 2.79, 3.26", "0.999, 5.42e-5, 3.01, 4.86, 5.83"})
    void jointExceedanceOfEqualQuantiles(double p, double normal, double ratio8, double ratio4, double ratio3) {
        EqualCorrelation half = new EqualCorrelation(0.5);
        double joint = new Gaussian(half).cdf(1 - p, 1 - p);
        double unit = 0.01 * Math.pow(10, Math.floor(Math.log10(normal)));
        assertEquals(normal, joint, unit);
        double[] ratios = {ratio8, ratio4, ratio3};
        double[] degrees = {8, 4, 3};
        for (int k = 0; k < 3; k++) {
            assertEquals(ratios[k], new Student(half, degrees[k]).cdf(1 - p, 1 - p) / joint, 0.0101);
        }
    }

    /** Five-dimensional logistic distribution with dependence 0.6 and GEV(1, 1, ξ) margins, as printed by Stephenson (2006). */
    @ParameterizedTest
    @CsvSource({"1, 1, 0.07233", "1.5, 1.5, 0.16387", "2, 2, 0.21949"})
    void fiveDimensionalLogistic(double x, double shape, double expected) {
        double margin = Math.exp(-Math.pow(1 + shape * (x - 1), -1 / shape));
        Archimedean gumbel = Archimedean.ofTheta(ArchimedeanFamily.GUMBEL, false, 1 / 0.6);
        assertEquals(expected, gumbel.cdf(margin, margin, margin, margin, margin), 5e-6);
    }

    /** Independence through its generator: −ln 0.6 − ln 0.7 = 0.51 + 0.36, and e to the minus that is 0.42. */
    @Test
    void independenceThroughItsGenerator() {
        Generator generator = Archimedean.ofKendallTau(ArchimedeanFamily.GUMBEL, false, 0).generator();
        double first = Math.exp(generator.logInverse(0.6, 0.4));
        double second = Math.exp(generator.logInverse(0.7, 0.3));
        assertEquals(0.51, first, 5e-3);
        assertEquals(0.36, second, 5e-3);
        assertEquals(0.42, generator.psi(first + second), 1e-15);
    }

    @Test
    void normalLetsJointExtremesFadeAndGumbelDoesNot() {
        Gaussian normal = Gaussian.ofKendallTau(0.5);
        Archimedean gumbel = Archimedean.ofKendallTau(ArchimedeanFamily.GUMBEL, true, 0.5);
        double last = 1;
        for (double q : new double[]{1e-1, 1e-2, 1e-4, 1e-8, 1e-12}) {
            double conditional = normal.cdf(q, q) / q;
            assertTrue(conditional < 0.8 * last, "normal at " + q);
            last = conditional;
            assertTrue(gumbel.cdf(q, q) / q > 0.58, "gumbel at " + q);
        }
        assertTrue(last < 0.02);
    }
}
