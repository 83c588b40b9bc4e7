package layerweft.reference;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.List;
import java.util.stream.Stream;
import layerweft.engine.RunControl;
import layerweft.engine.simulation.Simulation;
import layerweft.engine.simulation.SimulationSettings;
import layerweft.engine.transform.Accuracy;
import layerweft.engine.transform.Models;
import layerweft.engine.transform.TransformEngine;
import layerweft.figures.Figure;
import layerweft.figures.LayerStatistics;
import layerweft.model.frequency.Binomial;
import layerweft.model.portfolio.Dependence;
import layerweft.model.portfolio.Portfolio;
import layerweft.model.severity.Beta;
import layerweft.model.severity.Burr;
import layerweft.model.severity.Exponential;
import layerweft.model.severity.Lognormal;
import layerweft.model.severity.SeverityModel;
import layerweft.model.treaty.AnnualTerms;
import layerweft.model.treaty.Buyer;
import layerweft.model.treaty.Layer;
import layerweft.model.treaty.Loading;
import layerweft.model.treaty.OccurrenceTerms;
import layerweft.model.treaty.Pricing;
import layerweft.model.treaty.Programme;
import layerweft.model.treaty.Treaty;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;

/** Risk measures and premium principles: one sure loss a year, in full, so that a layer's figures are those of its severity. Both engines. */
class PublishedRiskMeasuresTest {
    private static final SimulationSettings SETTINGS = new SimulationSettings(400_000, 6, 2);
    /** Odds of a false alarm of one figure 1 in 147,000; with this seed, fixed, there is none. */
    private static final double STANDARD_ERRORS = 4.5;

    /** A distortion of an unlimited loss weighs what lies beyond any lattice: the transform comes within half a percent. */
    private static final double BEYOND_THE_LATTICE = 5e-3;

    private static Treaty oneLoss(SeverityModel severity, Loading loading, double tailLevel, Double... returnPeriods) {
        Portfolio portfolio = new Portfolio("One loss", "EUR", "", List.of(Models.peril("loss", new Binomial(1, 1), severity)), Dependence.NONE);
        return new Treaty(portfolio, new Programme("In full", List.of(Layer.of("all", OccurrenceTerms.NONE, AnnualTerms.NONE)),
                new Pricing(loading, 0, 0, true), new Buyer(List.of(returnPeriods), tailLevel, 0)));
    }

    private static LayerStatistics transform(Treaty treaty) {
        return new TransformEngine(treaty, Accuracy.of(1e-8)).price(0);
    }

    private static void simulated(double expected, Figure figure, double resolution, String what) {
        assertEquals(expected, figure.value(), STANDARD_ERRORS * figure.error() + resolution * expected, () -> what + " simulated: " + figure);
    }

    static Stream<Arguments> lossesWithTheSameValueAtRisk() {
        return Stream.of(Arguments.of("X", new Beta(1, 1, 100)), Arguments.of("Y", new Exponential(31.71)));
    }

    /** Loss Data Analytics (ed. Frees 2023), Example 10.3.5: the same value at risk, different tails. Text seen. */
    @ParameterizedTest
    @MethodSource("lossesWithTheSameValueAtRisk")
    void twoRisksWithTheSameValueAtRisk(String name, SeverityModel severity) {
        PublishedCheck check = PublishedCheck.of("rm-lda-10.3.5");
        Treaty treaty = oneLoss(severity, new Loading.None(), 0.95, 20.0);
        LayerStatistics exact = transform(treaty);
        check.printed("VaR of " + name, exact.valueAtRisk().get(0.95).value()).recomputed("VaR of " + name, 1e-4, exact.valueAtRisk().get(0.95).value())
                .recomputed("TVaR of " + name, 1e-6, exact.tailValueAtRisk().value());
        LayerStatistics drawn = Simulation.run(treaty, SETTINGS, RunControl.NONE).layers().get(0);
        simulated(check.recomputed("VaR of " + name), drawn.valueAtRisk().get(0.95), Math.scalb(1, -11), "VaR");
        simulated(check.recomputed("TVaR of " + name), drawn.tailValueAtRisk(), 0, "TVaR");
    }

    /** An examination question: a Pareto law by two quantiles, its tail mean asked for. Text seen. The page's answer, 479.60, is a slip: 446.33. */
    @Test
    void tailMeanOfAPareto() {
        PublishedCheck check = PublishedCheck.of("rm-pareto-tvar-446");
        Treaty treaty = oneLoss(new Burr(3, 1, 200), new Loading.None(), 0.9, 10.0, 100.0);
        LayerStatistics exact = transform(treaty);
        assertEquals(230.887, exact.valueAtRisk().get(0.9).value(), 0.02);
        assertEquals(728.318, exact.valueAtRisk().get(0.99).value(), 0.07);
        check.printed("choice B", exact.tailValueAtRisk().value());
        simulated(check.recomputed("choice B"), Simulation.run(treaty, SETTINGS, RunControl.NONE).layers().get(0).tailValueAtRisk(), 0, "TVaR");
    }

    static Stream<Arguments> proportionalHazards() {
        return Stream.of(Arguments.of("exponential mean 100, closed", new Exponential(100)), Arguments.of("Pareto(3,200), closed", new Burr(3, 1, 200)),
                Arguments.of("uniform(0,100), closed", new Beta(1, 1, 100)));
    }

    /**
     * Wang (1995), "Insurance pricing and increased limits ratemaking by proportional hazards transforms", Insurance: Mathematics and
     * Economics 17, 43-54: θ/r, θ/(αr − 1) and b/(1 + r) at r = 0.8 (from memory).
     */
    @ParameterizedTest
    @MethodSource("proportionalHazards")
    void proportionalHazardsInClosedForm(String label, SeverityModel severity) {
        PublishedCheck check = PublishedCheck.of("rm-ph-closed-forms");
        Treaty treaty = oneLoss(severity, new Loading.ProportionalHazard(1 / 0.8), 0.99, 10.0);
        check.recomputed(label, BEYOND_THE_LATTICE, transform(treaty).technicalPremium().value());
        simulated(check.recomputed(label), Simulation.run(treaty, SETTINGS, RunControl.NONE).layers().get(0).technicalPremium(), 1e-3, label);
    }

    /**
     * Wang (2000), "A class of distortion operators for pricing financial and insurance risks", Journal of Risk and Insurance 67(1), 15-36: a
     * lognormal stays lognormal, with μ + λσ (from memory).
     */
    @Test
    void wangTransformOfALognormal() {
        PublishedCheck check = PublishedCheck.of("rm-wang-transform-lognormal");
        Treaty treaty = oneLoss(new Lognormal(2, 0.8), new Loading.Wang(0.3), 0.99, 10.0);
        check.recomputed("closed", BEYOND_THE_LATTICE, transform(treaty).technicalPremium().value());
        assertEquals(Math.exp(2 + 0.3 * 0.8 + 0.32), check.recomputed("closed"), 1e-9);
        simulated(check.recomputed("closed"), Simulation.run(treaty, SETTINGS, RunControl.NONE).layers().get(0).technicalPremium(), 1e-3, "premium");
    }
}
