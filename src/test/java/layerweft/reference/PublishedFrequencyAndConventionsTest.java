package layerweft.reference;

import static org.junit.jupiter.api.Assertions.assertEquals;

import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.stream.DoubleStream;
import java.util.stream.IntStream;
import layerweft.engine.transform.Accuracy;
import layerweft.engine.transform.Models;
import layerweft.engine.transform.TransformEngine;
import layerweft.figures.LayerFigures;
import layerweft.figures.LayerStatistics;
import layerweft.model.frequency.Binomial;
import layerweft.model.frequency.FrequencyModel;
import layerweft.model.frequency.NegativeBinomial;
import layerweft.model.frequency.Poisson;
import layerweft.model.severity.Burr;
import layerweft.model.severity.Exponential;
import layerweft.model.severity.SeverityModel;
import layerweft.model.treaty.AnnualTerms;
import layerweft.model.treaty.Buyer;
import layerweft.model.treaty.Layer;
import layerweft.model.treaty.LayerTerms;
import layerweft.model.treaty.OccurrenceTerms;
import org.apache.commons.statistics.distribution.ChiSquaredDistribution;
import org.junit.jupiter.api.Test;

/** Event frequencies and trade conventions as printed, to every printed digit. */
class PublishedFrequencyAndConventionsTest {
    private static final double UNLIMITED = Double.POSITIVE_INFINITY;

    private static LayerStatistics price(FrequencyModel frequency, SeverityModel severity, Layer layer) {
        return new TransformEngine(Models.single(frequency, severity, layer), Accuracy.of(1e-9)).price(0);
    }

    private static Layer above(double amount) {
        return Layer.of("above", OccurrenceTerms.excess(UNLIMITED, amount), AnnualTerms.NONE);
    }

    private static FrequencyModel ofSize(double mean, double size) {
        return new NegativeBinomial(mean, 1 + mean / size);
    }

    private static double logLikelihood(FrequencyModel model, int[] counts, double[] observed) {
        return IntStream.range(0, counts.length).mapToDouble(k -> observed[k] * Math.log(model.probability(counts[k]))).sum();
    }

    /** Annual numbers of Atlantic hurricanes 1940-2015, a textbook exercise (2016): inputs printed, fits recomputed. Text seen. */
    @Test
    void atlanticHurricanesAreOverdispersed() {
        PublishedCheck check = PublishedCheck.of("fq-atlantic-1940-2015");
        int[] counts = {0, 1, 2, 3, 4, 5, 6, 7, 8, 10, 12};
        double[] years = {5, 16, 20, 14, 4, 5, 5, 3, 2, 1, 1};
        FrequencyModel poisson = new Poisson(3);
        FrequencyModel clustered = ofSize(3, check.recomputed("negative binomial size (ML)"));
        check.printed("years in table", DoubleStream.of(years).sum())
                .recomputed("P(0) Poisson", 1e-11, poisson.probability(0)).recomputed("P(0) negative binomial", 1e-9, clustered.probability(0))
                .recomputed("log-likelihood Poisson", 1e-11, logLikelihood(poisson, counts, years))
                .recomputed("log-likelihood negative binomial", 1e-11, logLikelihood(clustered, counts, years))
                .recomputed("moment size m^2/(v-m)", 1e-11, 3 / (check.recomputed("variance/mean") - 1));
    }

    /** Elsner &amp; Jagger (2013), Hurricane Climatology, chapter 7: 271 hurricanes in 160 years. Text seen. */
    @Test
    void hurricanesOfTheUnitedStates() {
        PublishedCheck.of("fq-us-hurricanes-rate").printed("rate", new Poisson(271 / 160.0).mean())
                .recomputed("P(no hurricane), Poisson", 1e-11, new Poisson(271 / 160.0).probability(0));
    }

    /** Clarke (1946), "An application of the Poisson distribution", Journal of the Institute of Actuaries 72, 481. Text seen. */
    @Test
    void flyingBombs() {
        double[] observed = {229, 211, 93, 35, 7, 1};
        FrequencyModel hits = new Poisson(537.0 / 576);
        double[] expected = IntStream.range(0, 6).mapToDouble(n -> 576 * (n < 5 ? hits.probability(n) : hits.survival(4))).toArray();
        double chiSquare = IntStream.range(0, 6).mapToDouble(n -> Math.pow(observed[n] - expected[n], 2) / expected[n]).sum();
        PublishedCheck.of("fq-clarke-bombs").recomputed("expected", 1e-11, expected).printed("chi-square", chiSquare)
                .printed("P", ChiSquaredDistribution.of(4).survivalProbability(chiSquare));
    }

    /** Loss Data Analytics (ed. Frees 2023), Tables 2.4 and 2.5, text seen: 487.6948 is printed as 487.70, from a rounded mean. */
    @Test
    void motorClaimsOfSingapore() {
        PublishedCheck check = PublishedCheck.of("fq-singapore-auto");
        double[] observed = {6996, 455, 28, 4, 0};
        FrequencyModel claims = new Poisson((455 + 2 * 28 + 3 * 4) / 7483.0);
        double[] fitted = IntStream.range(0, 5).mapToDouble(n -> 7483 * (n < 4 ? claims.probability(n) : claims.survival(3))).toArray();
        check.printed("mean", claims.mean()).recomputed("fitted 0..3, 4+", 1e-10, fitted)
                .printed("chi-square", IntStream.range(0, 5).mapToDouble(n -> Math.pow(observed[n] - fitted[n], 2) / fitted[n]).sum());
        int[] counts = {0, 1, 2, 3, 4};
        check.recomputed("log-likelihood Poisson", 1e-11, logLikelihood(claims, counts, observed))
                .recomputed("log-likelihood negative binomial", 1e-11,
                        logLikelihood(ofSize(claims.mean(), check.recomputed("negative binomial size (ML)")), counts, observed));
    }

    /** IRMI, Glossary of insurance and risk management terms: a premium of 2 million for a limit of 10 million. Text seen. */
    @Test
    void rateOnLineAndPayback() {
        Layer layer = new Layer("layer", List.of(), OccurrenceTerms.excess(10, 5), AnnualTerms.NONE, null, 1, 0.5, false, List.of(), 2.0);
        LayerFigures figures = LayerFigures.of(layer, Buyer.USUAL, price(new Poisson(0.3), new Exponential(6), layer));
        PublishedCheck.of("tc-rate-on-line-irmi").printed("rate on line", figures.quotedRateOnLine()).printed("payback (years)", figures.payback().value());
    }

    /** UCAR, NCL function reference, extval_return_prob, example 1 (after Maidment): 1 − (1 − 1/T)^5; its prose writes T for 1/T. Text seen. */
    @Test
    void chanceOfAnExceedanceInFiveYears() {
        PublishedCheck.of("tc-return-period-5-years").printed("probability", new Binomial(5, 2 / 106.0).survival(0), new Binomial(5, 7 / 106.0).survival(0));
    }

    /**
     * Embrechts, Resnick &amp; Samorodnitsky (1999), "Extreme value theory as a risk management tool", North American Actuarial Journal 3(2),
     * 30-41, as in Avanzi (2023), module 6, text seen: the largest of 100 losses. Slip: 0.4919 is printed where 0.4914 is right.
     */
    @Test
    void largestOfAHundredLosses() {
        PublishedCheck check = PublishedCheck.of("tc-max-of-100");
        SeverityModel loss = new Exponential(10);
        check.recomputed("exact at 50", 1e-10, price(new Binomial(100, 1), loss, above(50)).attachmentProbability().value())
                .printed("exact at 100", price(new Binomial(100, 1), loss, above(100)).attachmentProbability().value())
                .printed("Gumbel approximation at 50", price(new Poisson(100), loss, above(50)).attachmentProbability().value());
    }

    /** Market convention: occurrence terms first, then the annual limit of (reinstatements + 1) limits. */
    @Test
    void whatIsLeftOfTheAggregateLimit() {
        LayerTerms terms = Layer.of("layer", OccurrenceTerms.excess(2, 1), AnnualTerms.NONE).withReinstatements(List.of(1.0)).terms();
        double recovered = terms.annualLoss(DoubleStream.of(1.35, 2, 7).map(terms::occurrenceLoss).sum());
        PublishedCheck.of("tc-reinstatement-formula").recomputed("example: 2m limit, 1 reinstatement, losses to layer 0.35, 1, 2 (m), aggregate left (m)",
                1e-12, terms.annualLimit() - recovered);
    }

    /** Market convention: for Poisson events OEP(x) = 1 − exp(−λS(x)), and the year's total exceeds at least as often as its largest event. */
    @Test
    void occurrenceAndAggregateExceedance() {
        PublishedCheck check = PublishedCheck.of("tc-oep-aep");
        double occurrence = price(new Poisson(2), new Burr(2, 1, 1), above(9)).attachmentProbability().value();
        check.recomputed("OEP(9)", 1e-11, occurrence).recomputed("annual return period at 9", 1e-11, 1 / occurrence)
                .recomputed("event return period at 9", 1e-12, 1 / price(new Poisson(2), new Burr(2, 1, 1), above(9)).expectedEvents().value());
        double aggregate = price(new Poisson(2), new Burr(2, 1, 1), Models.stopLoss(1, 9)).attachmentProbability().value();
        assertTrue(aggregate > occurrence, aggregate + " against " + occurrence);
    }
}
