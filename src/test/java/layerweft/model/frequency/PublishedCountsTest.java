package layerweft.model.frequency;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.apache.commons.statistics.distribution.ChiSquaredDistribution;
import org.junit.jupiter.api.Test;

/** Values printed in papers, books and examinations, to the digits printed, and recomputed to more digits. */
class PublishedCountsTest {

    /** Σ (observed - expected)² / expected, the last class open above. */
    private static double chiSquare(double[] observed, double[] expected) {
        double sum = 0;
        for (int n = 0; n < observed.length; n++) {
            double off = observed[n] - expected[n];
            sum += off * off / expected[n];
        }
        return sum;
    }

    /** Expected numbers of 0, 1, …, last - 1, and of last and more. */
    private static double[] expected(FrequencyModel model, double total, int last) {
        double[] expected = new double[last + 1];
        for (int n = 0; n < last; n++) {
            expected[n] = total * model.probability(n);
        }
        expected[last] = total * model.survival(last - 1);
        return expected;
    }

    /** Society of Actuaries, Exam P sample question 104 (key B): 1000 for each event above two, N Poisson with mean 1; printed 104. */
    @Test
    void paymentForEventsAboveTwo() {
        Poisson count = new Poisson(1);
        double payment = 0;
        for (int n = 2; n < 60; n++) {
            payment += 1000 * count.survival(n);
        }
        assertEquals(104, payment, 0.5);
        assertEquals(103.638323514, payment, 1e-9);
    }

    /**
     * Clarke (1946), An application of the Poisson distribution, Journal of the Institute of Actuaries 72, 481: 537 flying bombs on 576
     * squares of South London; χ² = 1.17, P = 0.88 with 4 degrees of freedom.
     */
    @Test
    void flyingBombs() {
        double[] expected = expected(new Poisson(537.0 / 576), 576, 5);
        double[] recomputed = {226.742722583, 211.390350742, 98.5387312051, 30.6222793155, 7.13722395504, 1.56869219948};
        for (int n = 0; n < recomputed.length; n++) {
            assertEquals(recomputed[n], expected[n], 1e-11 * recomputed[n] + 1e-9, "squares with " + n);
        }
        double chiSquare = chiSquare(new double[] {229, 211, 93, 35, 7, 1}, expected);
        assertEquals(1.17, chiSquare, 0.005);
        assertEquals(1.16915467518, chiSquare, 1e-10);
        double p = ChiSquaredDistribution.of(4).survivalProbability(chiSquare);
        assertEquals(0.88, p, 0.005);
        assertEquals(0.883150518919, p, 1e-11);
    }

    /**
     * Frees and others (2023), Loss Data Analytics, Tables 2.4 and 2.5: motor claims of 7483 policies in Singapore; fitted 6977.86, 487.70,
     * 17.04, 0.40, 0.01 and χ² = 41.98. The book fits with the mean rounded to 0.06989, which makes 487.6948 into 487.70.
     */
    @Test
    void motorClaims() {
        double mean = (455 + 2 * 28 + 3 * 4) / 7483.0;
        assertEquals(0.06989, mean, 5e-6);
        double[] expected = expected(new Poisson(mean), 7483, 4);
        double[] printed = {6977.86, 487.70, 17.04, 0.40, 0.01};
        double[] recomputed = {6977.85823423, 487.694755646, 17.0429211014, 0.39705322001, 0.00703580500775};
        for (int n = 0; n < printed.length; n++) {
            assertEquals(printed[n], expected[n], n == 1 ? 0.006 : 0.005, "policies with " + n);
            assertEquals(recomputed[n], expected[n], 1e-10 * recomputed[n], "policies with " + n);
        }
        double chiSquare = chiSquare(new double[] {6996, 455, 28, 4, 0}, expected);
        assertEquals(41.98, chiSquare, 0.005);
        assertEquals(41.9843820415, chiSquare, 1e-8);
    }

    /**
     * The same claims, log-likelihoods recomputed at the maximum: Poisson -1941.17753165, negative binomial -1932.38341527 at size r =
     * 0.874018916909 with the mean of the data.
     */
    @Test
    void logLikelihoodsOfTheMotorClaims() {
        double mean = (455 + 2 * 28 + 3 * 4) / 7483.0;
        assertEquals(-1941.17753165, logLikelihood(new Poisson(mean)), 1e-8);
        NegativeBinomial clustered = new NegativeBinomial(mean, 1 + mean / 0.874018916909);
        assertEquals(0.874018916909, clustered.size(), 1e-12);
        assertEquals(-1932.38341527, logLikelihood(clustered), 1e-8);
    }

    private static double logLikelihood(FrequencyModel model) {
        int[] policies = {6996, 455, 28, 4};
        double sum = 0;
        for (int n = 0; n < policies.length; n++) {
            sum += policies[n] * Math.log(model.probability(n));
        }
        return sum;
    }

    /** Elsner and Jagger (2013), Hurricane Climatology, chapter 7: 271 hurricanes in the 160 years 1851-2010, 1.694 a year. */
    @Test
    void hurricanesOfTheUnitedStates() {
        Poisson count = new Poisson(271.0 / 160);
        assertEquals(1.694, count.mean(), 5e-4);
        assertEquals(0.183828871561, count.probability(0), 1e-12);
        assertEquals(0.183828871561, count.cdf(0), 1e-12);
    }
}
