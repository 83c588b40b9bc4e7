package layerweft.engine.transform;

import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.stream.IntStream;
import java.util.stream.Stream;
import layerweft.figures.Bracket;
import layerweft.figures.Figure;
import layerweft.file.DemoFiles;
import layerweft.model.copula.Archimedean;
import layerweft.model.copula.ArchimedeanFamily;
import layerweft.model.copula.Copula;
import layerweft.model.copula.Countermonotonic;
import layerweft.model.copula.Gaussian;
import layerweft.model.copula.Student;
import layerweft.model.frequency.NegativeBinomial;
import layerweft.model.frequency.Poisson;
import layerweft.model.portfolio.Dependence;
import layerweft.model.portfolio.EventLoss;
import layerweft.model.portfolio.Peril;
import layerweft.model.portfolio.SubPeril;
import layerweft.model.severity.Lognormal;
import layerweft.model.severity.Pareto;
import layerweft.model.treaty.AnnualTerms;
import layerweft.model.treaty.Layer;
import layerweft.model.treaty.OccurrenceTerms;
import layerweft.model.treaty.Treaty;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** Guaranteed ranges of expected losses: narrow, and around what ten times closer lattices say. */
class BracketTest {

    private static final double FOREVER = Double.POSITIVE_INFINITY;

    static Stream<Treaty> demos() {
        return Stream.of(DemoFiles.treaty("demo-portfolios/harrow-coast.json", "treaties/harrow-coast-two-layers.json"),
                DemoFiles.treaty("demo-portfolios/harrow-coast.json", "treaties/harrow-coast-one-layer.json"),
                DemoFiles.treaty("demo-portfolios/tolvane-ridge.json", "treaties/tolvane-ridge-tower.json"),
                DemoFiles.treaty("demo-portfolios/brindle-vale.json", "treaties/brindle-vale-stop-loss.json"));
    }

    @ParameterizedTest
    @MethodSource("demos")
    void ofTheDemosAreNarrowAndTrue(Treaty treaty) {
        for (int j = 0; j < treaty.layers(); j++) {
            narrowAndTrue(treaty, j, 1e-4);
        }
    }

    private static void narrowAndTrue(Treaty treaty, int j, double width) {
        Bracket bracket = new TransformEngine(treaty, Accuracy.USUAL).price(j).bracket();
        Figure finer = new TransformEngine(treaty, Accuracy.of(1e-7)).price(j).expectedLoss();
        double line = treaty.layer(j).terms().line();
        String of = treaty.portfolio().name() + ", " + treaty.layer(j).name() + ": " + finer + " in " + bracket;
        assertTrue(bracket.high() - bracket.low() <= width * (line < FOREVER ? line : finer.value()), of);
        assertTrue(bracket.contains(finer.value()), of);
        // the estimate's own error fits into the range with room to spare, or the range would prove nothing
        assertTrue(finer.error() < 0.5 * (bracket.high() - bracket.low()) + 1e-12 * finer.value(), of);
    }

    private static Peril storm(Copula copula) {
        return new Peril("storm", new NegativeBinomial(1.3, 1.5), new EventLoss.Split(List.of(new SubPeril("wind", 1, Lognormal.ofMeanAndCv(12, 2)),
                new SubPeril("surge", 0.4, new Pareto(3, 1.7))), copula));
    }

    /** Occurrence layers without annual limit, off and on common lattices, without any limit, with an annual deductible, with annual limits. */
    private static final Layer[] TERMS = {Layer.of("free", OccurrenceTerms.excess(40, 15), AnnualTerms.NONE),
        Layer.of("odd retention", OccurrenceTerms.excess(40, 13.7), AnnualTerms.NONE),
        Layer.of("no limit", OccurrenceTerms.excess(FOREVER, 20), AnnualTerms.NONE),
        Layer.of("deductible", OccurrenceTerms.excess(40, 10), new AnnualTerms(30, FOREVER)),
        Layer.of("annual limit", OccurrenceTerms.excess(30, 17.3), new AnnualTerms(20, 70)), Models.stopLoss(50, 40)};

    @Test
    void ofSubPerilsUnderCopulasThatKeepConvexOrderAreNarrow() {
        for (Copula copula : List.of(Archimedean.ofKendallTau(ArchimedeanFamily.CLAYTON, true, 0.5), Gaussian.ofKendallTau(0.4))) {
            Treaty treaty = Models.counts(List.of(storm(copula), Models.peril("flood", new Poisson(0.7), new Pareto(5, 1.6))),
                    Archimedean.ofKendallTau(ArchimedeanFamily.GUMBEL, false, 0.3), TERMS);
            IntStream.range(0, TERMS.length).forEach(j -> narrowAndTrue(treaty, j, 1e-4));
        }
    }

    @Test
    void ofSubPerilsUnderOtherCopulasAndWithAFranchiseAreWiderButTrue() {
        Layer franchise = Layer.of("franchise", new OccurrenceTerms(0, 15.0, 50), new AnnualTerms(0, 100));
        Treaty student = Models.counts(List.of(storm(Student.ofKendallTau(0.3, 4))), Gaussian.ofKendallTau(0), TERMS[0], TERMS[2], franchise);
        IntStream.range(0, 3).forEach(j -> narrowAndTrue(student, j, 5e-3));
    }

    @Test
    void ofJoinedTotalsAreNarrowWhereTheCopulaKeepsConvexOrder() {
        for (Copula copula : List.of(Archimedean.ofKendallTau(ArchimedeanFamily.FRANK, false, 0.4), Gaussian.ofKendallTau(0.4))) {
            Treaty treaty = totals(copula, Models.stopLoss(50, 40));
            narrowAndTrue(treaty, 0, 1e-4);
        }
        for (Copula copula : List.of(Student.ofKendallTau(0.4, 5), Gaussian.ofKendallTau(-0.3), new Countermonotonic())) {
            narrowAndTrue(totals(copula, Models.stopLoss(50, 40)), 0, 2e-2);
        }
    }

    private static Treaty totals(Copula copula, Layer... layers) {
        List<Peril> perils = List.of(storm(Archimedean.ofKendallTau(ArchimedeanFamily.GUMBEL, false, 0.5)),
                Models.peril("hail", new Poisson(2.5), Lognormal.ofMeanAndCv(6, 1.5)));
        return Models.treaty(perils, new Dependence(Dependence.Links.ANNUAL_TOTALS, copula), layers);
    }
}
