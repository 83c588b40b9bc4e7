package layerweft.engine.transform;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.List;
import java.util.stream.IntStream;
import layerweft.model.copula.Independence;
import layerweft.model.frequency.Binomial;
import layerweft.model.frequency.EmpiricalCounts;
import layerweft.model.frequency.NegativeBinomial;
import layerweft.model.frequency.Poisson;
import layerweft.model.portfolio.Peril;
import layerweft.model.severity.DiscreteLosses;
import layerweft.model.severity.SeverityModel;
import layerweft.model.frequency.FrequencyModel;
import layerweft.model.treaty.Layer;
import layerweft.model.treaty.Treaty;
import org.junit.jupiter.api.Test;

/** Aggregate laws and stop-loss premiums printed in textbooks and examinations, to every printed digit. */
class PublishedAggregatesTest {

    /** P(S > d) for a whole number d: a stop-loss layer of width 1. */
    private static double above(FrequencyModel frequency, SeverityModel severity, int d) {
        return new TransformEngine(Models.single(frequency, severity, Models.stopLoss(1, d)), Accuracy.of(1e-10)).price(0).expectedLoss().value();
    }

    private static double probability(FrequencyModel frequency, SeverityModel severity, int s) {
        return (s == 0 ? 1 : above(frequency, severity, s - 1)) - above(frequency, severity, s);
    }

    /** E[(S − d)+] of perils that are independent. */
    private static double stopLoss(List<Peril> perils, double d) {
        Treaty treaty = Models.counts(perils, new Independence(), Models.stopLoss(Double.POSITIVE_INFINITY, d));
        return new TransformEngine(treaty, Accuracy.of(1e-10)).price(0).expectedLoss().value();
    }

    private static double rounded(double value, int decimals) {
        return Math.round(value * Math.pow(10, decimals)) / Math.pow(10, decimals);
    }

    /** Bowers et al. (1997), Actuarial Mathematics, 2nd ed., Example 12.2.2. */
    @Test
    void convolutionOfUpToThreeClaims() {
        FrequencyModel counts = new EmpiricalCounts(List.of(0.1, 0.3, 0.4, 0.2));
        DiscreteLosses claims = Models.losses(new double[] {1, 2, 3}, new double[] {0.5, 0.4, 0.1});
        double[] printed = {0.1, 0.15, 0.22, 0.215, 0.164, 0.095, 0.0408, 0.0126, 0.0024, 0.0002};
        for (int s = 0; s < printed.length; s++) {
            assertEquals(printed[s], rounded(probability(counts, claims, s), 4), 1e-12, "f(" + s + ")");
        }
        assertEquals(2.72, stopLoss(List.of(Models.peril("all", counts, claims)), 0), 1e-12);
    }

    /** Loss Data Analytics (ed. Frees 2023), Examples 5.3.3 and 5.4.1: geometric count with mean 4, claims 1 to 4 equally likely. */
    @Test
    void compoundGeometric() {
        FrequencyModel geometric = new NegativeBinomial(4, 5);
        DiscreteLosses claims = Models.losses(new double[] {1, 2, 3, 4}, new double[] {0.25, 0.25, 0.25, 0.25});
        double[] printed = {0.2, 0.04, 0.048, 0.0576};
        for (int s = 0; s < printed.length; s++) {
            assertEquals(printed[s], rounded(probability(geometric, claims, s), 4), 1e-12, "f(" + s + ")");
        }
        assertEquals(0.3456, rounded(1 - above(geometric, claims, 3), 4), 1e-12);
    }

    /** Loss Data Analytics (ed. Frees 2023), Example 5.3.2: mean 204, variance 98344. */
    @Test
    void meanAndVarianceOfACompoundSum() {
        Treaty treaty = Models.single(new EmpiricalCounts(List.of(0.0, 0.8, 0.2)), Models.losses(new double[] {0, 100, 1000}, new double[] {0.2, 0.7, 0.1}),
                Models.stopLoss(Double.POSITIVE_INFINITY, 0));
        var statistics = new TransformEngine(treaty, Accuracy.USUAL).price(0);
        assertEquals(204, statistics.expectedLoss().value(), 1e-9);
        assertEquals(98344, Math.pow(statistics.standardDeviation().value(), 2), 1e-6);
    }

    /** Avanzi (2023), lecture notes, General Insurance Modelling, modules 2 and 3: 32 times the law and the stop-loss premiums. */
    @Test
    void convolutionOfThreeLaws() {
        FrequencyModel one = new Binomial(1, 1);
        List<Peril> perils = List.of(
                Models.peril("1", one, Models.losses(new double[] {0, 1, 2}, new double[] {0.25, 0.5, 0.25})),
                Models.peril("2", one, Models.losses(new double[] {0, 2}, new double[] {0.5, 0.5})),
                Models.peril("3", one, Models.losses(new double[] {0, 2, 4}, new double[] {0.25, 0.5, 0.25})));
        double[] premiums = {128, 97, 68, 43, 24, 11, 4, 1, 0};
        for (int d = 0; d < premiums.length; d++) {
            assertEquals(premiums[d], rounded(32 * stopLoss(perils, d), 6), 1e-9, "P_" + d);
        }
        assertEquals(53, rounded(32 * stopLoss(perils, 2.6), 6), 1e-9);
        double[] variances = {3.5, 3.28, 2.797, 2.038, 1.188, 0.538, 0.172, 0.03};
        for (int d = 0; d < variances.length; d++) {
            Layer layer = Models.stopLoss(Double.POSITIVE_INFINITY, d);
            var statistics = new TransformEngine(Models.counts(perils, new Independence(), layer), Accuracy.of(1e-9)).price(0);
            // 1.1875 is printed as 1.188, half up
            assertEquals(variances[d], rounded(Math.pow(statistics.standardDeviation().value(), 2) + 1e-9, 3), 1e-12, "variance " + d);
        }
    }

    /** Society of Actuaries, sample questions (2018): E[(S − 2)+] with exact probabilities is 2.36089, printed 2.3608 from rounded ones. */
    @Test
    void stopLossOfACompoundPoisson() {
        DiscreteLosses claims = Models.losses(new double[] {1, 2, 3}, new double[] {1 / 3.0, 1 / 3.0, 1 / 3.0});
        assertEquals(0.1353, rounded(probability(new Poisson(2), claims, 0), 4), 1e-12);
        assertEquals(0.0902, rounded(probability(new Poisson(2), claims, 1), 4), 1e-12);
        assertEquals(2.36089408863, stopLoss(List.of(Models.peril("all", new Poisson(2), claims)), 2), 1e-10);
    }

    /** Society of Actuaries, sample questions (2018): geometric count with mean 4, claims of 40, deductible 100: 92.16. */
    @Test
    void stopLossWithFixedClaims() {
        Peril peril = Models.peril("all", new NegativeBinomial(4, 5), Models.losses(new double[] {40}, new double[] {1}));
        assertEquals(92.16, stopLoss(List.of(peril), 100), 1e-8);
    }

    /** Society of Actuaries examination question on three persons, deductible 1: 2.064, printed 2.06. */
    @Test
    void stopLossOfThreePersons() {
        FrequencyModel one = new Binomial(1, 1);
        List<Peril> perils = IntStream.range(0, 3)
                .mapToObj(i -> Models.peril("person " + i, one, Models.losses(new double[] {0, 1, 2, 3}, new double[] {0.4, 0.3, 0.2, 0.1}))).toList();
        assertEquals(2.064, stopLoss(perils, 1), 1e-9);
    }
}
