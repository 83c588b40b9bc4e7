package layerweft.reference;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.DoubleStream;
import layerweft.engine.transform.Accuracy;
import layerweft.engine.transform.Models;
import layerweft.engine.transform.TransformEngine;
import layerweft.figures.LayerStatistics;
import layerweft.model.copula.Independence;
import layerweft.model.frequency.Binomial;
import layerweft.model.frequency.EmpiricalCounts;
import layerweft.model.frequency.FrequencyModel;
import layerweft.model.frequency.Poisson;
import layerweft.model.portfolio.Peril;
import layerweft.model.severity.Beta;
import layerweft.model.severity.Burr;
import layerweft.model.severity.Exponential;
import layerweft.model.severity.Mixture;
import layerweft.model.severity.SeverityModel;
import layerweft.model.treaty.AnnualTerms;
import layerweft.model.treaty.Layer;
import layerweft.model.treaty.LayerTerms;
import layerweft.model.treaty.OccurrenceTerms;
import layerweft.model.treaty.Treaty;
import org.apache.commons.statistics.distribution.NormalDistribution;
import org.junit.jupiter.api.Test;

/**
 * Excess of loss and reinstatements as printed in textbooks, examinations, manuals and training material, to every printed digit. Where a
 * source has a slip, that is said, and the independently recomputed value is asked for.
 */
class PublishedExcessOfLossTest {
    private static final double UNLIMITED = Double.POSITIVE_INFINITY;
    /** Exactly one loss a year. */
    private static final FrequencyModel ONE = new Binomial(1, 1);

    private static LayerStatistics price(FrequencyModel frequency, SeverityModel severity, Layer layer) {
        return new TransformEngine(Models.single(frequency, severity, layer), Accuracy.of(1e-9)).price(0);
    }

    private static Layer excess(double limit, double retention) {
        return Layer.of("layer", OccurrenceTerms.excess(limit, retention), AnnualTerms.NONE);
    }

    /** Loss Data Analytics (ed. Frees 2023), Example 3.4.6: the insurer keeps 85 % of the loss up to 5,000. Text seen. */
    @Test
    void quotaShareUnderAnExcessOfLoss() {
        Layer kept = new Layer("kept", List.of(), OccurrenceTerms.excess(0.85 * 5000, 0), AnnualTerms.NONE, null, 0.85, 1, false, List.of(), null);
        LayerStatistics priced = price(ONE, new Burr(5, 1, 3600), kept);
        PublishedCheck.of("xl-lda-3.4.6").printed("mean paid per claim by insurer", priced.expectedLoss().value());
    }

    /** Loss Data Analytics (2023), Example 3.4.5, text seen. Slip: the book rounds the deflated limits before it evaluates the inflated layer. */
    @Test
    void exponentialLayerBeforeAndAfterInflation() {
        PublishedCheck check = PublishedCheck.of("xl-lda-3.4.5");
        LayerStatistics before = price(ONE, new Exponential(1000), excess(500, 100));
        LayerStatistics after = price(ONE, new Exponential(1050), excess(500, 100));
        double perPayment = before.expectedLoss().value() / before.attachmentProbability().value();
        double perPaymentAfter = after.expectedLoss().value() / after.attachmentProbability().value();
        check.printed("expected layer loss per loss, before", before.expectedLoss().value()).printed("per payment, before", perPayment)
                .printed("relative increase per payment", perPaymentAfter / perPayment - 1)
                .recomputed("after", 1e-9, after.expectedLoss().value()).recomputed("per payment, after", 1e-8, perPaymentAfter);
    }

    /** Loss Data Analytics (2023), Example 3.4.2, density 0.02x on (0, 10): a beta law. Text seen. */
    @Test
    void meanExcessOfATriangularLoss() {
        LayerStatistics priced = price(ONE, new Beta(2, 1, 10), excess(6, 4));
        PublishedCheck.of("xl-lda-3.4.2").printed("expected excess", priced.expectedLoss().value())
                .printed("P(X>4)", priced.attachmentProbability().value())
                .printed("mean payment per payment", priced.expectedLoss().value() / priced.attachmentProbability().value());
    }

    /** Loss Data Analytics (2023), Example 3.4.3: 70 % of an exponential loss is eliminated, then the deductible rises by a third. Text seen. */
    @Test
    void lossEliminationRatio() {
        SeverityModel loss = new Exponential(1);
        double deductible = -Math.log(0.3);
        assertEquals(0.7, loss.limitedMean(deductible) / loss.mean(), 1e-15);
        PublishedCheck.of("xl-lda-3.4.3").printed("new LER", loss.limitedMean(deductible * 4 / 3) / loss.mean());
    }

    /** Loss Data Analytics (2023), Example 3.4.4: x(4 − x)/9 on (0, 3) is half 2x/9 and half 2x(3 − x)/9, two beta laws. Text seen. */
    @Test
    void limitedExpectedValueOfAPolynomialDensity() {
        SeverityModel loss = new Mixture(List.of(0.5, 0.5), List.of(new Beta(2, 1, 3), new Beta(2, 2, 3)));
        PublishedCheck.of("xl-lda-3.4.4").printed("E[min(X,1)]", loss.limitedMean(1)).recomputed("E[min(X,1)]", 1e-11, loss.limitedMean(1));
    }

    /** Loss Data Analytics (2023), Example 5.5.7: 80 % of 20 losses, exponential with mean 200, deductible 100. Text seen. */
    @Test
    void exposureCutAndDeductible() {
        LayerStatistics priced = price(new Poisson(0.8 * 20), new Exponential(200), excess(UNLIMITED, 100));
        PublishedCheck.of("xl-lda-5.5.7").printed("E[S]", priced.expectedLoss().value())
                .printed("E[(X-100)+]", new Exponential(200).layerMean(100, UNLIMITED));
    }

    /**
     * Loss Data Analytics (2023), Example 5.5.4: payments above a deductible of 30 from a zero-modified Poisson count. Text seen. Slip: the
     * book keeps the zero mass of 0.5 for the payments, against its own generating function; thinned, E = 0.3854 and Var = 0.5191.
     */
    @Test
    void thinnedZeroModifiedPoisson() {
        PublishedCheck check = PublishedCheck.of("xl-lda-5.5.4");
        SeverityModel loss = new Burr(3, 1, 50);
        double v = loss.survival(30);
        check.printed("v=P(X>30)", v).printed("lambda*", 3 * v);
        List<Double> counts = new ArrayList<>(List.of(0.5));
        for (int n = 1; n <= 60; n++) {
            counts.add(0.5 * new Poisson(3).probability(n) / new Poisson(3).survival(0));
        }
        check.recomputed("E[N_P]", 1e-9, price(new EmpiricalCounts(counts), loss, excess(UNLIMITED, 30)).expectedEvents().value());
        // one unit for each payment: its annual sum is the number of payments
        LayerStatistics payments = price(new EmpiricalCounts(counts), Models.losses(new double[] {0, 1}, new double[] {1 - v, v}), excess(UNLIMITED, 0));
        check.recomputed("E[N_P]", 1e-9, payments.expectedLoss().value())
                .recomputed("Var[N_P]", 1e-8, Math.pow(payments.standardDeviation().value(), 2));
    }

    /** Avanzi (2023), lecture notes, General Insurance Modelling, module 3, after Bowers et al. (1997), chapter 2: 16,000 lives. Text seen. */
    @Test
    void retentionOnALifePortfolio() {
        PublishedCheck check = PublishedCheck.of("xl-um-eol-16000");
        double[] benefits = {1, 2, 3, 5, 10};
        int[] policies = {8000, 3500, 2500, 1500, 500};
        List<Peril> lives = new ArrayList<>();
        for (int k = 0; k < benefits.length; k++) {
            lives.add(Models.peril("benefit " + benefits[k], new Binomial(policies[k], 0.02), Models.losses(new double[] {benefits[k]}, new double[] {1})));
        }
        Treaty treaty = Models.counts(lives, new Independence(), excess(3, 0),
                Layer.of("ceded", OccurrenceTerms.excess(UNLIMITED, 3), AnnualTerms.NONE), Layer.of("all", OccurrenceTerms.NONE, AnnualTerms.NONE));
        TransformEngine engine = new TransformEngine(treaty, Accuracy.of(1e-9));
        LayerStatistics retained = engine.price(0);
        double sd = retained.standardDeviation().value();
        // cover at 125 % of the expected claims ceded, 0.025 against a death rate of 0.02
        double cost = 1.25 * engine.price(1).expectedLoss().value();
        double z = (825 - retained.expectedLoss().value() - cost) / sd;
        check.printed("retained mean", retained.expectedLoss().value()).printed("retained variance", sd * sd).printed("reinsurance cost", cost)
                .printed("z with cover", z).printed("P(total cost > 825)", NormalDistribution.of(0, 1).survivalProbability(z));
        LayerStatistics all = engine.price(2);
        check.printed("variance without cover", Math.pow(all.standardDeviation().value(), 2))
                .printed("z without cover", (825 - all.expectedLoss().value()) / all.standardDeviation().value());
    }

    /** HM Revenue &amp; Customs, General Insurance Manual, GIM8070, worked example. Text seen. */
    @Test
    void recoveriesOfARiskCover() {
        LayerTerms terms = excess(20_000, 10_000).terms();
        PublishedCheck.of("xl-hmrc-gim8070").printed("recoveries", DoubleStream.of(12_000, 35_000, 60_000).map(terms::occurrenceLoss).toArray());
    }

    /** Chartered Insurance Institute (2018), M97 Reinsurance, Example 5.16: reinstatement premium, first on the deposit premium. Text seen. */
    @Test
    void reinstatementPremiumOnAnAdjustablePremium() {
        LayerTerms terms = excess(100_000, 100_000).withReinstatements(List.of(1.0)).terms();
        double factor = terms.reinstatementFactor(terms.annualLoss(terms.occurrenceLoss(150_000)));
        PublishedCheck.of("xl-cii-5.16").printed("initial reinstatement premium", factor * 10_000)
                .printed("final reinstatement premium", factor * 0.01 * 1_200_000).printed("further payment", factor * (12_000 - 10_000));
    }

    /** Premium adjustment, training slides (2017), scenario 1. Text seen. */
    @Test
    void reinstatementPremiumProRataToAmount() {
        LayerTerms terms = excess(5_000_000, 400_000).withReinstatements(List.of(1.0)).terms();
        double recovery = terms.occurrenceLoss(800_000);
        PublishedCheck.of("xl-rp-5m-xs-400k").printed("recovery", recovery).printed("reinstatement premium", 50_000 * terms.reinstatementFactor(recovery));
    }

    /** Parodi (2014), Pricing in General Insurance, an exercise without printed answer (attribution from memory): 3m xs 5m, one free, one at 50 %. */
    @Test
    void oneFreeAndOnePaidReinstatement() {
        LayerTerms terms = excess(3, 5).withReinstatements(List.of(0.0, 0.5)).terms();
        double[] recoveries = DoubleStream.of(7.5, 11.7).map(terms::occurrenceLoss).toArray();
        double total = terms.annualLoss(DoubleStream.of(recoveries).sum());
        double reinstatement = 400_000 * terms.reinstatementFactor(total);
        PublishedCheck.of("xl-parodi-two-reinst").recomputed("maximum recoverable (m)", 0, terms.annualLimit()).recomputed("recoveries (m)", 0, recoveries)
                .recomputed("total recovered (m)", 0, total).recomputed("reinstatement premium", 1e-11, reinstatement)
                .recomputed("total premium", 1e-11, 400_000 + reinstatement);
    }

    /** Society of Actuaries, Exam P sample question: 1,000 for each event of a Poisson year beyond two. Text seen. */
    @Test
    void excessOfAPoissonCount() {
        LayerStatistics priced = price(new Poisson(1), Models.losses(new double[] {1000}, new double[] {1}), Models.stopLoss(UNLIMITED, 2000));
        PublishedCheck.of("xl-soa-poisson-104").printed("expected payment", priced.expectedLoss().value())
                .recomputed("expected payment", 1e-9, priced.expectedLoss().value());
    }

    /**
     * Sundt (1991), "On excess of loss reinsurance with reinstatements", Bulletin of the Swiss Association of Actuaries 1991(1), 51-66: the
     * premium equation (from memory), on full-limit losses with a Poisson count of mean 1, one reinstatement.
     */
    @Test
    void premiumEquationWithReinstatements() {
        PublishedCheck check = PublishedCheck.of("xl-sundt-premium-equation");
        SeverityModel full = Models.losses(new double[] {1}, new double[] {1});
        Layer layer = excess(1, 0);
        check.recomputed("d_0", 1e-10, price(new Poisson(1), full, layer.withReinstatements(List.of())).expectedLoss().value())
                .recomputed("d_1", 1e-10, price(new Poisson(1), full, Models.stopLoss(1, 1)).expectedLoss().value())
                .recomputed("P", 1e-10, price(new Poisson(1), full, layer.withReinstatements(List.of(1.0))).technicalPremium().value())
                .recomputed("P with one free reinstatement", 1e-10,
                        price(new Poisson(1), full, layer.withReinstatements(List.of(0.0))).technicalPremium().value());
    }
}
