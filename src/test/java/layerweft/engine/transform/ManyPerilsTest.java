package layerweft.engine.transform;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.IntStream;
import layerweft.engine.RunControl;
import layerweft.engine.simulation.Simulation;
import layerweft.engine.simulation.SimulationSettings;
import layerweft.figures.Figure;
import layerweft.figures.LayerStatistics;
import layerweft.model.copula.Archimedean;
import layerweft.model.copula.ArchimedeanFamily;
import layerweft.model.copula.Copula;
import layerweft.model.copula.Gaussian;
import layerweft.model.copula.Group;
import layerweft.model.copula.GroupedArchimedean;
import layerweft.model.copula.Student;
import layerweft.model.frequency.NegativeBinomial;
import layerweft.model.frequency.Poisson;
import layerweft.model.portfolio.Peril;
import layerweft.model.severity.Lognormal;
import layerweft.model.severity.Pareto;
import layerweft.model.treaty.AnnualTerms;
import layerweft.model.treaty.Layer;
import layerweft.model.treaty.OccurrenceTerms;
import layerweft.model.treaty.Treaty;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** Portfolios of eight and of 64 perils, priced without noise and by simulation. */
class ManyPerilsTest {
    private static final SimulationSettings SETTINGS = new SimulationSettings(200_000, 5, 2);
    /** Odds of a false alarm of one figure 1 in 147,000; with this seed, fixed, there is none. */
    private static final double STANDARD_ERRORS = 4.5;
    private static final Layer CAT = Layer.of("cat", OccurrenceTerms.excess(100, 50), new AnnualTerms(0, 300));
    private static final Layer AGGREGATE = Layer.of("aggregate", OccurrenceTerms.excess(45, 5), new AnnualTerms(100, 100));

    private static List<Peril> perils(int d, double meanOfAll) {
        return IntStream.range(0, d).mapToObj(i -> Models.peril("peril " + i,
                i % 3 == 0 ? new NegativeBinomial(meanOfAll / d, 1.4) : new Poisson(meanOfAll / d * (0.5 + i % 4 / 3.0)),
                i % 2 == 0 ? Lognormal.ofMeanAndCv(14, 2) : new Pareto(5, 1.6))).toList();
    }

    static List<Copula> grouped() {
        List<Copula> copulas = new ArrayList<>();
        for (ArchimedeanFamily family : ArchimedeanFamily.values()) {
            Group storm = Group.ofKendallTau(family, 0.5, List.of(0, 1), List.of());
            Group flood = Group.ofKendallTau(family, 0.4, List.of(2, 3), List.of());
            Group weather = Group.ofKendallTau(family, 0.2, List.of(4), List.of(storm, flood));
            Group fire = Group.ofKendallTau(family, 0.15, List.of(6, 7), List.of());
            copulas.add(GroupedArchimedean.of(family, family == ArchimedeanFamily.CLAYTON,
                    Group.ofKendallTau(family, 0.05, List.of(), List.of(weather, fire))));
        }
        return copulas;
    }

    @ParameterizedTest
    @MethodSource("grouped")
    void groupsOfEightPerilsAgreeWithSimulation(Copula copula) {
        assertBothEnginesAgree(Models.counts(perils(8, 8), copula, CAT, AGGREGATE), copula.label());
    }

    static List<Copula> ofManyPerils() {
        return List.of(Archimedean.ofKendallTau(ArchimedeanFamily.CLAYTON, true, 0.3), Archimedean.ofKendallTau(ArchimedeanFamily.GUMBEL, false, 0.2),
                Gaussian.ofKendallTau(0.3), Student.ofKendallTau(0.2, 4));
    }

    @ParameterizedTest
    @MethodSource("ofManyPerils")
    void sixtyFourPerilsAgreeWithSimulation(Copula copula) {
        assertBothEnginesAgree(Models.counts(perils(64, 8), copula, CAT, AGGREGATE), copula.label());
    }

    private static void assertBothEnginesAgree(Treaty treaty, String name) {
        List<LayerStatistics> drawn = Simulation.run(treaty, SETTINGS, RunControl.NONE).layers();
        TransformEngine engine = new TransformEngine(treaty, Accuracy.USUAL);
        for (int j = 0; j < treaty.layers(); j++) {
            LayerStatistics exact = engine.price(j);
            String of = name + " " + treaty.layer(j).name() + ": ";
            assertTrue(exact.expectedLoss().error() <= 2e-6 * treaty.layer(j).terms().line(), of + exact.expectedLoss());
            assertWithin(exact.expectedLoss(), drawn.get(j).expectedLoss(), of + "expected loss");
            assertWithin(exact.standardDeviation(), drawn.get(j).standardDeviation(), of + "standard deviation");
            assertWithin(exact.attachmentProbability(), drawn.get(j).attachmentProbability(), of + "attachment");
            assertWithin(exact.tailValueAtRisk(), drawn.get(j).tailValueAtRisk(), of + "tail mean");
        }
    }

    private static void assertWithin(Figure exact, Figure drawn, String what) {
        assertEquals(exact.value(), drawn.value(), exact.error() + STANDARD_ERRORS * drawn.error(), what + " " + exact + " " + drawn);
    }

    /** A layer sees only the perils that it covers, so four of many are those four alone. */
    @Test
    void coveredPerilsOfManyArePricedAsIfAlone() {
        Copula copula = Archimedean.ofKendallTau(ArchimedeanFamily.JOE, false, 0.4);
        List<Peril> all = perils(64, 30);
        List<Peril> four = all.subList(10, 14);
        Layer covering = AGGREGATE.covering(four.stream().map(Peril::name).toArray(String[]::new));
        Layer low = Layer.of("low", OccurrenceTerms.excess(45, 5), new AnnualTerms(10, 100));
        LayerStatistics ofMany = new TransformEngine(Models.counts(all, copula, covering), Accuracy.USUAL).price(0);
        LayerStatistics alone = new TransformEngine(Models.counts(four, copula, AGGREGATE), Accuracy.USUAL).price(0);
        assertEquals(alone.expectedLoss().value(), ofMany.expectedLoss().value(), 1e-12);
        assertTrue(new TransformEngine(Models.counts(four, copula, low), Accuracy.USUAL).price(0).expectedLoss().value() > alone.expectedLoss().value());
    }
}
