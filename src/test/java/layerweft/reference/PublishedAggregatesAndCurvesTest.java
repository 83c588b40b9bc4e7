package layerweft.reference;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.List;
import java.util.stream.DoubleStream;
import java.util.stream.IntStream;
import layerweft.engine.transform.Accuracy;
import layerweft.engine.transform.Models;
import layerweft.engine.transform.TransformEngine;
import layerweft.figures.LayerStatistics;
import layerweft.model.frequency.FrequencyModel;
import layerweft.model.frequency.NegativeBinomial;
import layerweft.model.frequency.Poisson;
import layerweft.model.severity.Lognormal;
import layerweft.model.severity.Mbbefd;
import layerweft.model.severity.SeverityModel;
import layerweft.model.treaty.AnnualTerms;
import layerweft.model.treaty.Layer;
import layerweft.model.treaty.OccurrenceTerms;
import org.apache.commons.statistics.distribution.NormalDistribution;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Moments of aggregate losses, exposure curves and increased limits as printed, to every printed digit. */
class PublishedAggregatesAndCurvesTest {
    private static final double UNLIMITED = Double.POSITIVE_INFINITY;

    private static LayerStatistics price(FrequencyModel frequency, SeverityModel severity, Layer layer) {
        return new TransformEngine(Models.single(frequency, severity, layer), Accuracy.of(1e-9)).price(0);
    }

    /** Loss Data Analytics (ed. Frees 2023), Example 5.3.1: λE[X²] = 40. Text seen. */
    @Test
    void varianceOfACompoundPoisson() {
        SeverityModel claims = Models.losses(new double[] {1, 2, 3}, new double[] {1 / 2.0, 1 / 3.0, 1 / 6.0});
        double sd = price(new Poisson(12), claims, Models.stopLoss(UNLIMITED, 0)).standardDeviation().value();
        PublishedCheck.of("ag-lda-5.3.1").printed("variance", sd * sd).recomputed("variance", 1e-9, sd * sd);
    }

    /** Loss Data Analytics (2023), Example 5.3.4: moments from any law with the stated mean and deviation. Text seen. */
    @Test
    void normalApproximationOfAnAggregateTail() {
        LayerStatistics priced = price(new NegativeBinomial(8, 9 / 8.0), Lognormal.ofMeanAndCv(10_000, 0.3937), Models.stopLoss(UNLIMITED, 0));
        double sd = priced.standardDeviation().value();
        PublishedCheck.of("ag-lda-5.3.4").printed("variance", sd * sd)
                .printed("P(S>1.5 E[S])", NormalDistribution.of(0, 1).survivalProbability(0.5 * priced.expectedLoss().value() / sd));
    }

    /** Society of Actuaries (2018), STAM sample questions: three losses with the moments that the solution uses; text seen. */
    @Test
    void varianceOfPaymentsAboveADeductible() {
        SeverityModel loss = Models.losses(new double[] {10, 60, 120}, new double[] {0.25, 0.375, 0.375});
        assertEquals(0.25, loss.cdf(30), 1e-15);
        assertEquals(25, loss.limitedMean(30), 1e-13);
        assertEquals(70, loss.mean(), 1e-13);
        LayerStatistics priced = price(new Poisson(20), loss, Layer.of("excess", OccurrenceTerms.excess(UNLIMITED, 30), AnnualTerms.NONE));
        double variance = Math.pow(priced.standardDeviation().value(), 2);
        PublishedCheck.of("ag-soa-67500").printed("payment rate", priced.expectedEvents().value()).printed("variance", variance)
                .printed("E[(X-30)^2 | X>30]", variance / priced.expectedEvents().value());
    }

    /** Homework after Bowers et al. (1997), chapter 14: E[(3 − S)+] = 3 − E[min(S, 3)]. Text seen. */
    @Test
    void experienceDividend() {
        SeverityModel claims = Models.losses(new double[] {1, 2}, new double[] {0.5, 0.5});
        double dividend = 3 - price(new Poisson(1), claims, Models.stopLoss(3, 0)).expectedLoss().value();
        PublishedCheck.of("ag-dividend-1.701").printed("expected dividend", dividend).recomputed("expected dividend", 1e-9, dividend);
    }

    /** Society of Actuaries (2018), STAM sample questions: with rounded probabilities 2.3608 is printed, exact is 2.36089. Text seen. */
    @Test
    void limitedAggregateLoss() {
        SeverityModel claims = Models.losses(new double[] {1, 2, 3}, new double[] {1 / 3.0, 1 / 3.0, 1 / 3.0});
        PublishedCheck.of("ag-soa-2.3608").recomputed("E[min(S,2)]", 1e-10, price(new Poisson(2), claims, Models.stopLoss(2, 0)).expectedLoss().value());
        SeverityModel forty = Models.losses(new double[] {40}, new double[] {1});
        PublishedCheck.of("ag-soa-92.16").printed("E[min(S,100)]", price(new NegativeBinomial(4, 5), forty, Models.stopLoss(100, 0)).expectedLoss().value());
    }

    /** Bernegger (1997), "The Swiss Re exposure curves and the MBBEFD distribution class", ASTIN Bulletin 27(1), 99-111: b and g (from memory). */
    @Test
    void curveParameters() {
        double[] c = {1.5, 2, 3, 4, 5};
        PublishedCheck.of("ex-bernegger-bg").printed("b", DoubleStream.of(c).map(x -> Mbbefd.ofC(x, 1).b()).toArray())
                .printed("g", DoubleStream.of(c).map(x -> Mbbefd.ofC(x, 1).g()).toArray());
    }

    /** The same paper: G(x) = E[min(X, x)]/E[X], here from a layer's price on one loss of an object worth 80. */
    @ParameterizedTest
    @CsvSource({"0, 1.5", "1, 2", "2, 3", "3, 4", "4, 5"})
    void exposureCurves(int row, double c) {
        PublishedCheck check = PublishedCheck.of("ex-bernegger-curve-values");
        Mbbefd loss = Mbbefd.ofC(c, 80);
        double[] x = {0.05, 0.1, 0.2, 0.3, 0.5, 0.7, 0.9};
        String label = "G, c=" + (c == 1.5 ? "1.5" : Integer.toString((int) c));
        check.recomputed(label, 1e-10, DoubleStream.of(x).map(part -> loss.limitedMean(80 * part) / loss.mean()).toArray());
        double[] priced = IntStream.range(0, x.length).mapToDouble(k -> price(new Poisson(0.01),
                loss, Layer.of("first", OccurrenceTerms.excess(80 * x[k], 0), AnnualTerms.NONE)).expectedLoss().value() / (0.01 * loss.mean())).toArray();
        check.recomputed(label, 1e-8, priced);
        assertEquals(check.entry().get("recomputed").get("mean damage ratio").get(row).doubleValue(), loss.mean() / 80, 1e-11);
        assertEquals(check.entry().get("recomputed").get("total-loss probability").get(row).doubleValue(), loss.atom(80), 1e-11);
    }

    /**
     * Society of Actuaries (2018), STAM sample questions: 300,000 xs 100,000 on policies of 500,000 by increased-limits factors 1, 1.6 and 1.7,
     * here those of a loss of 100, 400 or 500 (thousand). Text seen; 847,058.82 is cut to 847,058 there.
     */
    @Test
    void layerFromIncreasedLimitsFactors() {
        SeverityModel loss = Models.losses(new double[] {100, 400, 500}, new double[] {0.8, 0.1, 0.1});
        assertEquals(1.6, loss.limitedMean(400) / loss.limitedMean(100), 1e-15);
        assertEquals(1.7, loss.limitedMean(500) / loss.limitedMean(100), 1e-15);
        FrequencyModel events = new Poisson(4000 * 0.6 / loss.mean());
        double cost = price(events, loss, Layer.of("layer", OccurrenceTerms.excess(300, 100), AnnualTerms.NONE)).expectedLoss().value();
        PublishedCheck.of("ex-soa-ilf-layer").printed("share of losses in the layer", cost / 2400).recomputed("expected cost", 1e-11, 1000 * cost);
        assertEquals(List.of(847_058.0), List.of(Math.floor(1000 * cost)));
    }
}
