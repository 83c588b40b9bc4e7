package layerweft.file;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertNull;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Map;
import java.util.stream.LongStream;
import layerweft.file.FormKinds.Converted;
import layerweft.file.FormKinds.Kind;
import layerweft.file.FormKinds.Subject;
import layerweft.model.copula.Copula;
import layerweft.model.portfolio.EventLoss;
import layerweft.model.portfolio.Portfolio;
import layerweft.model.severity.SeverityModel;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;

class FormKindsTest {
    private static final String SEVERITY = "perils[0].severity";
    private static final String FREQUENCY = "perils[0].frequency";
    private static final String COPULA = "dependence.copula";
    private static final FileTree BOOK = FileTree.parse("book.json", Examples.PORTFOLIO);

    private static FileTree with(String path, String json) {
        return BOOK.set(path, FileTree.parse("part.json", json));
    }

    private static Portfolio read(FileTree tree) {
        return PortfolioReader.read("book.json", Examples.bytes(tree.text()));
    }

    private static SeverityModel severity(FileTree tree) {
        return ((EventLoss.Single) read(tree).perils().get(0).eventLoss()).severity();
    }

    private static Copula copula(FileTree tree) {
        return read(tree).dependence().copula();
    }

    static LongStream seeds() {
        return LongStream.range(0, 5);
    }

    @Test
    void everyKindHasALabelAndWays() {
        assertEquals(List.of(15, 4, 10, 6), List.of(Subject.values()).stream().map(s -> FormKinds.kinds(s).size()).toList());
        for (Subject subject : Subject.values()) {
            for (Kind kind : FormKinds.kinds(subject)) {
                assertFalse(kind.ways().isEmpty(), kind.name());
                assertTrue(Character.isUpperCase(kind.label().charAt(0)), kind.label());
                assertTrue(kind.ways().stream().flatMap(w -> w.fields().stream()).noneMatch(f -> f.name().equals(subject.tag())), kind.name());
            }
        }
    }

    @Test
    void waysTellTheirFields() {
        Kind lognormal = FormKinds.kinds(Subject.SEVERITY).get(0);
        assertEquals(List.of("mu and sigma", "mean and cv"), lognormal.ways().stream().map(FormKinds.Way::name).toList());
        assertEquals("[FormField[name=mean, type=NUMBER, required=true, fallback=null], FormField[name=cv, type=NUMBER, required=true, fallback=null],"
                + " FormField[name=cap, type=NUMBER, required=false, fallback=null]]", lognormal.ways().get(1).fields().toString());
        Kind gumbel = FormKinds.kinds(Subject.COPULA).stream().filter(k -> k.name().equals("gumbel")).findAny().orElseThrow();
        assertEquals("[FormField[name=kendallTau, type=NUMBER, required=true, fallback=null], FormField[name=survival, type=TRUTH, required=false,"
                + " fallback=false], FormField[name=groups, type=GROUPS, required=false, fallback=[]]]", gumbel.ways().get(0).fields().toString());
        assertEquals(List.of(FieldType.SEVERITY, FieldType.NUMBER, FieldType.SEVERITY, FieldType.NUMBER, FieldType.NUMBER), types("spliced"));
        assertEquals(List.of(FieldType.NUMBERS, FieldType.SEVERITIES, FieldType.NUMBER), types("mixture"));
    }

    private static List<FieldType> types(String severity) {
        return FormKinds.kinds(Subject.SEVERITY).stream().filter(k -> k.name().equals(severity)).findAny().orElseThrow().ways().get(0).fields()
                .stream().map(FormKinds.FormField::type).toList();
    }

    @Test
    void theSubjectIsToldByThePath() {
        assertEquals(Subject.SEVERITY, Subject.at("perils[1].subPerils[0].severity"));
        assertEquals(Subject.SEVERITY, Subject.at("perils[1].severity.components[2]"));
        assertEquals(Subject.COPULA, Subject.at("dependence.copula.mixture[1].copula"));
        assertEquals(Subject.COPULA, Subject.at("perils[0].subPerilCopula"));
        assertEquals(Subject.LOADING, Subject.at("pricing.loading"));
        assertThrows(IllegalArgumentException.class, () -> Subject.at("layers[0].occurrence"));
        assertThrows(IllegalArgumentException.class, () -> FormKinds.convert(BOOK, SEVERITY, "normal", 0));
        assertThrows(IllegalArgumentException.class, () -> FormKinds.convert(BOOK, SEVERITY, "pareto", 1));
    }

    @Test
    void kindAndWayAreToldOfFaultyObjectsToo() {
        assertEquals(new FormKinds.Choice("lognormal", 1), FormKinds.choice(with(SEVERITY, "{\"model\": \"lognormal\", \"cv\": -2, \"x\": 1}"), SEVERITY));
        assertEquals(new FormKinds.Choice("mixture", 0), FormKinds.choice(with(COPULA, "{\"mixture\": []}"), COPULA));
        assertEquals(new FormKinds.Choice("gumbel", 1), FormKinds.choice(with(COPULA, "{\"family\": \"gumbel\", \"theta\": 2}"), COPULA));
        assertNull(FormKinds.choice(with(SEVERITY, "{\"model\": \"normal\"}"), SEVERITY));
        assertNull(FormKinds.choice(BOOK.remove(SEVERITY), SEVERITY));
    }

    @Test
    void waysOfALognormalGiveTheSameModelAndComeBackDigitByDigit() {
        FileTree start = with(SEVERITY, "{\"model\": \"lognormal\", \"mean\": 14, \"cv\": 2.1, \"cap\": 900}");
        Converted there = FormKinds.convert(start, SEVERITY, "lognormal", 0);
        assertTrue(there.tree().has(SEVERITY + ".sigma") && !there.tree().has(SEVERITY + ".cv"));
        assertEquals(severity(start), severity(there.tree()));
        assertEquals("The same in other parameters.", there.kept());
        assertEquals(start, FormKinds.convert(there.tree(), SEVERITY, "lognormal", 1).tree());
    }

    @Test
    void waysOfACopulaGiveTheSameModel() {
        FileTree theta = FormKinds.convert(BOOK, COPULA, "gumbel", 1).tree();
        assertEquals(copula(BOOK), copula(theta));
        assertEquals(BOOK, FormKinds.convert(theta, COPULA, "gumbel", 0).tree());
        FileTree gaussian = FormKinds.convert(BOOK, COPULA, "gaussian", 0).tree();
        Converted matrix = FormKinds.convert(gaussian, COPULA, "gaussian", 1);
        assertEquals(0.3, copula(matrix.tree()).kendallTau(0, 1), 1e-12);
        assertEquals("The correlation of every pair is kept.", matrix.kept());
        assertEquals(gaussian, FormKinds.convert(matrix.tree(), COPULA, "gaussian", 0).tree());
    }

    @ParameterizedTest
    @CsvSource({"lognormal, 1", "gamma, 1", "pareto, 0", "generalizedPareto, 0", "weibull, 0", "burr, 0", "loglogistic, 0", "inverseGaussian, 0",
        "beta, 0", "mbbefd, 0", "mbbefd, 1", "discrete, 0", "empirical, 0", "mixture, 0"})
    void meanStandardDeviationAndCapAreKept(String kind, int way) {
        FileTree start = with(SEVERITY, "{\"model\": \"gamma\", \"mean\": 14, \"cv\": 0.8, \"cap\": 900}");
        Converted to = FormKinds.convert(start, SEVERITY, kind, way);
        SeverityModel law = SeverityMapping.uncapped(severity(to.tree()));
        assertEquals(14, law.mean(), 1e-7, to.kept());
        assertEquals(14 * 0.8, SeverityMatch.deviation(law), 1e-5, to.kept());
        assertEquals(900.0, to.tree().get(SEVERITY + ".cap"));
        if (!kind.equals("mixture") && !kind.equals("gamma")) {
            assertEquals("The mean, 14, is kept. The standard deviation, 11.2, is kept. The cap, 900, is kept.", to.kept());
        }
    }

    @Test
    void whatAKindCannotHaveIsSaid() {
        FileTree start = with(SEVERITY, "{\"model\": \"lognormal\", \"mean\": 14, \"cv\": 2}");
        assertEquals("The mean, 14, is kept. The standard deviation was 28 and is now 14.",
                FormKinds.convert(start, SEVERITY, "exponential", 0).kept());
        FileTree heavy = with(SEVERITY, "{\"model\": \"pareto\", \"threshold\": 5, \"alpha\": 1.6}");
        Converted gamma = FormKinds.convert(heavy, SEVERITY, "gamma", 1);
        assertTrue(gamma.kept().startsWith("The mean, 13.33, is kept. The standard deviation was infinite and is now "), gamma.kept());
        FileTree infinite = with(SEVERITY, "{\"model\": \"pareto\", \"threshold\": 5, \"alpha\": 1}");
        Converted lognormal = FormKinds.convert(infinite, SEVERITY, "lognormal", 1);
        assertTrue(lognormal.kept().startsWith("The median, 10, is kept. The mean was infinite and is now "), lognormal.kept());
    }

    @Test
    void lossesWhoseMeanOnlyTheCapMakesFiniteKeepItAsCapped() {
        FileTree start = with(SEVERITY, "{\"model\": \"pareto\", \"threshold\": 20, \"alpha\": 1, \"cap\": 2000}");
        Converted to = FormKinds.convert(start, SEVERITY, "lognormal", 0);
        assertEquals(severity(start).mean(), severity(to.tree()).mean(), 1e-6);
        assertTrue(to.kept().contains("Both are of the losses as capped. The cap, 2000, is kept."), to.kept());
    }

    @Test
    void lawsThatAreCasesOfOthersStayTheSame() {
        FileTree pareto = with(SEVERITY, "{\"model\": \"pareto\", \"threshold\": 5, \"alpha\": 1.6, \"cap\": 600}");
        Converted general = FormKinds.convert(pareto, SEVERITY, "generalizedPareto", 0);
        assertEquals("The same law. The cap, 600, is kept.".substring(0, 13), general.kept());
        assertEquals(pareto, FormKinds.convert(general.tree(), SEVERITY, "pareto", 0).tree());
        FileTree mixture = FormKinds.convert(pareto, SEVERITY, "mixture", 0).tree();
        assertEquals(severity(pareto).survival(37), severity(mixture).survival(37), 1e-15);
    }

    @Test
    void aTailIsPutOnTheBodyThatWasThere() {
        Converted to = FormKinds.convert(with(SEVERITY, "{\"model\": \"lognormal\", \"mean\": 14, \"cv\": 2}"), SEVERITY, "spliced", 0);
        assertEquals(Map.of("model", "lognormal", "mean", 14.0, "cv", 2.0), to.tree().get(SEVERITY + ".body"));
        assertEquals(0.1, (Double) to.tree().get(SEVERITY + ".tailWeight"), 1e-9);
        assertEquals(14, severity(to.tree()).mean(), 1e-6);
        assertTrue(to.kept().startsWith("The mean, 14, is kept."), to.kept());
    }

    @Test
    void countsKeepMeanAndWhereTheyCanVariance() {
        FileTree start = with(FREQUENCY, "{\"model\": \"negativeBinomial\", \"mean\": 1.8, \"varianceToMean\": 1.4}");
        Converted poisson = FormKinds.convert(start, FREQUENCY, "poisson", 0);
        assertEquals(Map.of("model", "poisson", "mean", 1.8), poisson.tree().get(FREQUENCY));
        assertEquals("The mean, 1.8, is kept. The variance was 2.52 and is now 1.8.", poisson.kept());
        Converted listed = FormKinds.convert(start, FREQUENCY, "empirical", 0);
        assertEquals("The mean, 1.8, is kept. The variance, 2.52, is kept.", listed.kept());
        assertEquals(start, FormKinds.convert(listed.tree(), FREQUENCY, "negativeBinomial", 0).tree().set(FREQUENCY + ".mean", 1.8)
                .set(FREQUENCY + ".varianceToMean", 1.4));
        Converted binomial = FormKinds.convert(with(FREQUENCY, "{\"model\": \"poisson\", \"mean\": 1.8}"), FREQUENCY, "binomial", 0);
        assertTrue(binomial.kept().startsWith("The mean, 1.8, is kept."), binomial.kept());
        Converted back = FormKinds.convert(with(FREQUENCY, "{\"model\": \"binomial\", \"trials\": 6, \"chance\": 0.3}"), FREQUENCY, "binomial", 0);
        assertEquals(6.0, back.tree().get(FREQUENCY + ".trials"));
    }

    @Test
    void groupsSurvivalAndTauAreKeptBetweenArchimedeanFamilies() {
        FileTree eastmere = Examples.demo("demo-portfolios/eastmere-group.json");
        Converted clayton = FormKinds.convert(eastmere, COPULA, "clayton", 0);
        assertEquals("Groups and Kendall's τ of every pair are kept.", clayton.kept());
        assertEquals(eastmere, clayton.tree().set(COPULA + ".family", "gumbel"));
        FileTree survival = BOOK.set(COPULA + ".survival", true);
        assertEquals(true, FormKinds.convert(survival, COPULA, "joe", 0).tree().get(COPULA + ".survival"));
    }

    @Test
    void aTauThatAFamilyCannotHaveBecomesTheNearest() {
        FileTree negative = with(COPULA, "{\"family\": \"frank\", \"kendallTau\": -0.4}");
        Converted gumbel = FormKinds.convert(negative, COPULA, "gumbel", 0);
        assertEquals(0.0, gumbel.tree().get(COPULA + ".kendallTau"));
        assertEquals("Kendall's τ was -0.4 and is now 0, the nearest of this family.", gumbel.kept());
        Converted one = FormKinds.convert(with(COPULA, "{\"family\": \"comonotonic\"}"), COPULA, "gumbel", 0);
        assertEquals(0.95, one.tree().get(COPULA + ".kendallTau"));
    }

    @Test
    void aCopulaBecomesAMixtureOfItself() {
        FileTree mixture = FormKinds.convert(BOOK, COPULA, "mixture", 0).tree();
        assertEquals(0.5, mixture.get(COPULA + ".mixture[1].weight"));
        assertEquals(copula(BOOK).cdf(0.3, 0.6), copula(mixture).cdf(0.3, 0.6), 1e-15);
        assertEquals(BOOK, FormKinds.convert(mixture, COPULA, "gumbel", 0).tree());
    }

    @Test
    void whatIsNotThereOrFaultyGivesWayToUsualValues() {
        Converted fresh = FormKinds.convert(BOOK.remove("dependence"), COPULA, "clayton", 0);
        assertEquals(Map.of("family", "clayton", "kendallTau", 0.3), fresh.tree().get(COPULA));
        assertEquals("Usual values to start from.", fresh.kept());
        Converted faulty = FormKinds.convert(with(SEVERITY, "{\"model\": \"pareto\", \"alpha\": -1}"), SEVERITY, "gamma", 1);
        assertEquals(Map.of("model", "gamma", "mean", 10.0, "cv", 2.0), faulty.tree().get(SEVERITY));
        assertTrue(faulty.kept().contains("has faults"), faulty.kept());
    }

    @Test
    void loadingsStartFromUsualValues() {
        FileTree programme = FileTree.parse("cover.json", Examples.PROGRAMME);
        for (Kind kind : FormKinds.kinds(Subject.LOADING)) {
            FileTree tree = FormKinds.convert(programme, "pricing.loading", kind.name(), 0).tree();
            assertTrue(TreatyCheck.of(BOOK, tree).valid(), kind.name());
        }
        assertEquals(0.25, FormKinds.convert(programme, "pricing.loading", "standardDeviation", 0).tree().get("pricing.loading.factor"));
    }

    @Test
    void aWayThatCannotHoldTheParametersChangesNothing() {
        FileTree huge = with(SEVERITY, "{\"model\": \"lognormal\", \"mu\": 900, \"sigma\": 1}");
        Converted to = FormKinds.convert(huge, SEVERITY, "lognormal", 1);
        assertEquals(huge, to.tree());
        assertTrue(to.kept().startsWith("Nothing is changed"), to.kept());
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', textBlock = """
            perils[0].severity | {"model": "empirical", "losses": [0]}
            perils[0].severity | {"model": "discrete", "losses": [0, 7], "probabilities": [1, 0], "cap": 3}
            perils[0].severity | {"model": "empirical", "losses": [5]}
            perils[0].severity | {"model": "mbbefd", "c": 0, "exposedValue": 5}
            perils[0].severity | {"model": "pareto", "threshold": 5, "alpha": 0.001, "cap": 5.0001}
            perils[0].severity | {"model": "lognormal", "mu": 900, "sigma": 0.001}
            perils[0].severity | {"model": "lognormal", "mean": 5, "cv": 1e-9}
            perils[0].severity | {"model": "lognormal", "mean": 5, "cv": 1e7}
            perils[0].severity | {"model": "weibull", "shape": 0.01, "scale": 1}
            perils[0].severity | {"model": "generalizedPareto", "threshold": 0, "scale": 1, "shape": -1}
            perils[0].severity | {"model": "mixture", "weights": [0.6, 0.4], "components": [{"model": "empirical", "losses": [0]},             {"model": "pareto", "threshold": 1, "alpha": 0.5}]}
            perils[0].frequency | {"model": "empirical", "probabilities": [1]}
            perils[0].frequency | {"model": "poisson", "mean": 1e9}
            perils[0].frequency | {"model": "negativeBinomial", "mean": 1e-9, "varianceToMean": 1e9}
            perils[0].frequency | {"model": "binomial", "trials": 1, "chance": 1}
            dependence.copula | {"family": "gumbel", "theta": 1e300}
            dependence.copula | {"family": "frank", "theta": -1e6}
            dependence.copula | {"family": "gaussian", "correlation": [[1, -1], [-1, 1]]}
            """)
    void extremesFindTheirWayToo(String path, String json) {
        FileTree tree = with(path, json);
        for (Kind kind : FormKinds.kinds(Subject.at(path))) {
            for (int way = 0; way < kind.ways().size(); way++) {
                Converted to = FormKinds.convert(tree, path, kind.name(), way);
                List<Fault> faults = TreatyCheck.of(to.tree(), FileTree.parse("cover.json", Examples.PROGRAMME)).portfolioFaults();
                assertEquals(List.of(), faults, kind.name() + ", way " + way + ", " + to.kept());
            }
        }
    }

    @Test
    void listedLossesThatAreEquallyLikelyStayTheSame() {
        FileTree discrete = with(SEVERITY, "{\"model\": \"discrete\", \"losses\": [1, 2, 9, 40], \"probabilities\": [0.25, 0.25, 0.25, 0.25]}");
        FileTree empirical = FormKinds.convert(discrete, SEVERITY, "empirical", 0).tree();
        assertEquals(List.of(1.0, 2.0, 9.0, 40.0), empirical.get(SEVERITY + ".losses"));
        assertEquals(discrete, FormKinds.convert(empirical, SEVERITY, "discrete", 0).tree());
    }

    @ParameterizedTest
    @MethodSource("seeds")
    void whateverIsThereEveryKindAndWayCanBeReached(long seed) {
        RandomModels models = new RandomModels(seed);
        for (int from = 0; from < RandomModels.SEVERITIES; from++) {
            FileTree tree = BOOK.set(SEVERITY, SeverityMapping.SEVERITY.write(models.severity(from, 1)));
            everyKind(tree, SEVERITY, "seed " + seed + ", severity " + from);
        }
        for (int from = 0; from < RandomModels.FREQUENCIES; from++) {
            everyKind(BOOK.set(FREQUENCY, FrequencyMapping.FREQUENCY.write(models.frequency(from))), FREQUENCY, "seed " + seed + ", counts " + from);
        }
        for (int from = 0; from < RandomModels.COPULAS; from++) {
            Copula copula = models.copula(from, 2);
            everyKind(BOOK.set(COPULA, CopulaMapping.of(List.of("wind", "flood")).write(copula)), COPULA, "seed " + seed + ", copula " + from);
        }
    }

    private static void everyKind(FileTree tree, String path, String what) {
        for (Kind kind : FormKinds.kinds(Subject.at(path))) {
            for (int way = 0; way < kind.ways().size(); way++) {
                Converted to = FormKinds.convert(tree, path, kind.name(), way);
                List<Fault> faults = TreatyCheck.of(to.tree(), FileTree.parse("cover.json", Examples.PROGRAMME)).portfolioFaults();
                assertEquals(List.of(), faults, what + " to " + kind.name() + ", way " + way + "\n" + tree.at(path) + to.tree().at(path));
                assertNotEquals("", to.kept());
                assertEquals(kind.name(), FormKinds.choice(to.tree(), path).kind(), what);
            }
        }
    }
}
