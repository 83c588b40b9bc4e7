package layerweft.file;

import static layerweft.file.Examples.PORTFOLIO;
import static layerweft.file.Examples.PROGRAMME;
import static layerweft.file.Examples.bytes;
import static layerweft.file.Examples.changed;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNull;

import java.util.List;
import java.util.stream.Stream;
import layerweft.model.copula.Archimedean;
import layerweft.model.copula.ArchimedeanFamily;
import layerweft.model.copula.Comonotonic;
import layerweft.model.copula.Copula;
import layerweft.model.copula.Countermonotonic;
import layerweft.model.copula.Gaussian;
import layerweft.model.copula.Group;
import layerweft.model.copula.GroupedArchimedean;
import layerweft.model.copula.Independence;
import layerweft.model.copula.MixtureCopula;
import layerweft.model.copula.Student;
import layerweft.model.frequency.Binomial;
import layerweft.model.frequency.EmpiricalCounts;
import layerweft.model.frequency.FrequencyModel;
import layerweft.model.frequency.NegativeBinomial;
import layerweft.model.frequency.Poisson;
import layerweft.model.portfolio.Dependence;
import layerweft.model.portfolio.EventLoss;
import layerweft.model.portfolio.Portfolio;
import layerweft.model.severity.Beta;
import layerweft.model.severity.Burr;
import layerweft.model.severity.Capped;
import layerweft.model.severity.DiscreteLosses;
import layerweft.model.severity.Exponential;
import layerweft.model.severity.Gamma;
import layerweft.model.severity.GeneralizedPareto;
import layerweft.model.severity.InverseGaussian;
import layerweft.model.severity.Loglogistic;
import layerweft.model.severity.Lognormal;
import layerweft.model.severity.Mbbefd;
import layerweft.model.severity.Mixture;
import layerweft.model.severity.Pareto;
import layerweft.model.severity.SeverityModel;
import layerweft.model.severity.Spliced;
import layerweft.model.severity.Weibull;
import layerweft.model.treaty.AnnualTerms;
import layerweft.model.treaty.Buyer;
import layerweft.model.treaty.Layer;
import layerweft.model.treaty.Loading;
import layerweft.model.treaty.OccurrenceTerms;
import layerweft.model.treaty.Pricing;
import layerweft.model.treaty.Programme;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;

/** Each kind of a file becomes its model with the parameters in their places; what is left out has its default. */
class ModelsFromFilesTest {

    private static Portfolio portfolio(String from, String to) {
        return PortfolioReader.read("file.json", bytes(changed(PORTFOLIO, from, to)));
    }

    private static Programme programme(String text) {
        return ProgrammeReader.read("file.json", bytes(text));
    }

    static Stream<Arguments> severities() {
        return Stream.of(
                Arguments.of("'model': 'lognormal', 'mu': 1, 'sigma': 0.5", new Lognormal(1, 0.5)),
                Arguments.of("'model': 'lognormal', 'mean': 3, 'cv': 0.5", Lognormal.ofMeanAndCv(3, 0.5)),
                Arguments.of("'model': 'pareto', 'threshold': 2, 'alpha': 1.5", new Pareto(2, 1.5)),
                Arguments.of("'model': 'generalizedPareto', 'threshold': 2, 'scale': 3, 'shape': -0.2", new GeneralizedPareto(2, 3, -0.2)),
                Arguments.of("'model': 'gamma', 'shape': 2, 'scale': 3", new Gamma(2, 3)),
                Arguments.of("'model': 'gamma', 'mean': 2, 'cv': 0.3", Gamma.ofMeanAndCv(2, 0.3)),
                Arguments.of("'model': 'weibull', 'shape': 0.7, 'scale': 3", new Weibull(0.7, 3)),
                Arguments.of("'model': 'burr', 'alpha': 2, 'gamma': 1.5, 'theta': 4", new Burr(2, 1.5, 4)),
                Arguments.of("'model': 'loglogistic', 'shape': 2, 'scale': 3", new Loglogistic(2, 3)),
                Arguments.of("'model': 'exponential', 'mean': 3", new Exponential(3)),
                Arguments.of("'model': 'inverseGaussian', 'mean': 3, 'shape': 2", new InverseGaussian(3, 2)),
                Arguments.of("'model': 'beta', 'a': 2, 'b': 3, 'exposedValue': 50", new Beta(2, 3, 50)),
                Arguments.of("'model': 'mbbefd', 'c': 3, 'exposedValue': 50", Mbbefd.ofC(3, 50)),
                Arguments.of("'model': 'mbbefd', 'b': 0.5, 'g': 9, 'exposedValue': 50", new Mbbefd(0.5, 9, 50)),
                Arguments.of("'model': 'discrete', 'losses': [0, 5], 'probabilities': [0.25, 0.75]",
                        new DiscreteLosses(List.of(0.0, 5.0), List.of(0.25, 0.75))),
                Arguments.of("'model': 'empirical', 'losses': [1, 5]", DiscreteLosses.ofEquallyLikely(List.of(1.0, 5.0))),
                Arguments.of("'model': 'spliced', 'body': {'model': 'exponential', 'mean': 3, 'cap': 90}, 'threshold': 5, "
                                + "'tail': {'model': 'pareto', 'threshold': 5, 'alpha': 2}, 'tailWeight': 0.1",
                        new Spliced(new Capped(new Exponential(3), 90), 5, new Pareto(5, 2), 0.1)),
                Arguments.of("'model': 'mixture', 'weights': [0.25, 0.75], 'components': [{'model': 'exponential', 'mean': 3}, "
                                + "{'model': 'exponential', 'mean': 9, 'cap': 80}]",
                        new Mixture(List.of(0.25, 0.75), List.of(new Exponential(3), new Capped(new Exponential(9), 80)))),
                Arguments.of("'cap': 100, 'model': 'pareto', 'threshold': 2, 'alpha': 1.5", new Capped(new Pareto(2, 1.5), 100)));
    }

    @ParameterizedTest
    @MethodSource("severities")
    void severitiesBecomeTheirModels(String text, SeverityModel expected) {
        Portfolio portfolio = portfolio("\"model\": \"pareto\", \"threshold\": 5, \"alpha\": 1.6", text.replace('\'', '"'));
        assertEquals(new EventLoss.Single(expected), portfolio.perils().get(0).eventLoss());
    }

    static Stream<Arguments> frequencies() {
        return Stream.of(
                Arguments.of("'model': 'poisson', 'mean': 1.8", new Poisson(1.8)),
                Arguments.of("'model': 'negativeBinomial', 'mean': 2, 'varianceToMean': 1.5", new NegativeBinomial(2, 1.5)),
                Arguments.of("'model': 'binomial', 'trials': 4, 'chance': 0.5", new Binomial(4, 0.5)),
                Arguments.of("'model': 'empirical', 'probabilities': [0.5, 0.25, 0.25]", new EmpiricalCounts(List.of(0.5, 0.25, 0.25))));
    }

    @ParameterizedTest
    @MethodSource("frequencies")
    void frequenciesBecomeTheirModels(String text, FrequencyModel expected) {
        assertEquals(expected, portfolio("\"model\": \"poisson\", \"mean\": 1.5", text.replace('\'', '"')).perils().get(0).frequency());
    }

    static Stream<Arguments> copulas() {
        double[][] matrix = {{1, -0.5}, {-0.5, 1}};
        ArchimedeanFamily joe = ArchimedeanFamily.JOE;
        return Stream.of(
                Arguments.of("'family': 'independence'", new Independence()),
                Arguments.of("'family': 'comonotonic'", new Comonotonic()),
                Arguments.of("'family': 'countermonotonic'", new Countermonotonic()),
                Arguments.of("'family': 'gaussian', 'kendallTau': -0.3", Gaussian.ofKendallTau(-0.3)),
                Arguments.of("'family': 'gaussian', 'correlation': [[1, -0.5], [-0.5, 1]]", Gaussian.ofCorrelation(matrix)),
                Arguments.of("'family': 'student', 'kendallTau': 0.3, 'degreesOfFreedom': 4.5", Student.ofKendallTau(0.3, 4.5)),
                Arguments.of("'family': 'student', 'correlation': [[1, -0.5], [-0.5, 1]], 'degreesOfFreedom': 4", Student.ofCorrelation(matrix, 4)),
                Arguments.of("'family': 'clayton', 'kendallTau': -0.3", Archimedean.ofKendallTau(ArchimedeanFamily.CLAYTON, false, -0.3)),
                Arguments.of("'family': 'frank', 'theta': 3", Archimedean.ofTheta(ArchimedeanFamily.FRANK, false, 3)),
                Arguments.of("'family': 'gumbel', 'survival': true, 'kendallTau': 0.3",
                        Archimedean.ofKendallTau(ArchimedeanFamily.GUMBEL, true, 0.3)),
                Arguments.of("'family': 'joe', 'survival': true, 'theta': 1.5, 'groups': [{'theta': 2, 'perils': ['flood'], 'groups': "
                                + "[{'kendallTau': 0.6, 'perils': ['wind']}]}]",
                        GroupedArchimedean.of(joe, true, new Group(1.5, List.of(),
                                List.of(new Group(2, List.of(1), List.of(Group.ofKendallTau(joe, 0.6, List.of(0), List.of()))))))),
                Arguments.of("'mixture': [{'weight': 0.25, 'copula': {'family': 'comonotonic'}}, {'weight': 0.75, 'copula': "
                                + "{'mixture': [{'weight': 1, 'copula': {'family': 'joe', 'theta': 2}}]}}]",
                        new MixtureCopula(List.of(0.25, 0.75), List.of(new Comonotonic(),
                                new MixtureCopula(List.of(1.0), List.of(Archimedean.ofTheta(joe, false, 2)))))));
    }

    @ParameterizedTest
    @MethodSource("copulas")
    void copulasBecomeTheirModels(String text, Copula expected) {
        assertEquals(new Dependence(Dependence.Links.COUNTS, expected),
                portfolio("\"family\": \"gumbel\", \"kendallTau\": 0.3", text.replace('\'', '"')).dependence());
    }

    static Stream<Arguments> loadings() {
        return Stream.of(
                Arguments.of("'principle': 'none'", new Loading.None()),
                Arguments.of("'principle': 'standardDeviation', 'factor': 0.3", new Loading.StandardDeviation(0.3)),
                Arguments.of("'principle': 'variance', 'factor': 0.3", new Loading.Variance(0.3)),
                Arguments.of("'principle': 'costOfCapital', 'rate': 0.08, 'level': 0.99", new Loading.CostOfCapital(0.08, 0.99)),
                Arguments.of("'principle': 'proportionalHazard', 'rho': 1.3", new Loading.ProportionalHazard(1.3)),
                Arguments.of("'principle': 'wang', 'lambda': -0.4", new Loading.Wang(-0.4)));
    }

    @ParameterizedTest
    @MethodSource("loadings")
    void loadingsBecomeTheirModels(String text, Loading expected) {
        String changed = changed(PROGRAMME, "\"principle\": \"standardDeviation\", \"factor\": 0.25", text.replace('\'', '"'));
        assertEquals(new Pricing(expected, 0.1, 0.05, true), programme(changed).pricing());
    }

    @Test
    void aProgrammeBecomesItsModel() {
        Layer cat = new Layer("Cat", List.of("wind", "flood/sea"), OccurrenceTerms.excess(30, 20), AnnualTerms.NONE, List.of(1.0, 0.5), 1, 0.9,
                false, List.of(), 6.5);
        Layer aggregate = new Layer("Aggregate", List.of(), OccurrenceTerms.NONE, new AnnualTerms(40, 60), null, 1, 1, false, List.of("Cat"),
                null);
        assertEquals(new Programme("Cover", List.of(cat, aggregate), new Pricing(new Loading.StandardDeviation(0.25), 0.1, 0.05, true),
                new Buyer(List.of(10.0, 200.0), 0.99, 0.07)), programme(PROGRAMME));
    }

    @Test
    void whatIsLeftOutOfAProgrammeHasItsDefault() {
        Programme programme = programme("{\"format\": \"layerweft/programme/1\", \"name\": \"P\", \"layers\": [{\"name\": \"All\"}]}");
        assertEquals(new Programme("P", List.of(Layer.of("All", OccurrenceTerms.NONE, AnnualTerms.NONE)), Pricing.PLAIN, Buyer.USUAL), programme);
        assertNull(programme.layers().get(0).reinstatements());
    }

    @Test
    void emptyTermsPricingAndBuyerHaveTheirDefaults() {
        Programme programme = programme("""
                {"format": "layerweft/programme/1", "name": "P", "pricing": {}, "buyer": {},
                 "layers": [{"name": "All", "occurrence": {}, "annual": {}, "inuring": []}]}""");
        assertEquals(new Programme("P", List.of(Layer.of("All", OccurrenceTerms.NONE, AnnualTerms.NONE)), Pricing.PLAIN, Buyer.USUAL), programme);
    }

    @Test
    void everyFieldOfALayerArrivesInItsPlace() {
        Layer layer = programme("""
                {"format": "layerweft/programme/1", "name": "P", "layers": [{"name": "L", "occurrence": {"franchise": 7, "limit": 20},
                 "annual": {"deductible": 3, "limit": 30}, "reinstatements": [], "quotaShare": 0.5, "share": 0.25, "proRataTime": true,
                 "premium": 0}]}
                """).layers().get(0);
        assertEquals(new Layer("L", List.of(), new OccurrenceTerms(0, 7.0, 20), new AnnualTerms(3, 30), List.of(), 0.5, 0.25, true, List.of(), 0.0),
                layer);
    }

    @Test
    void subPerilsAndTheirCopulaBecomeTheirModels() {
        EventLoss.Split split = (EventLoss.Split) portfolio("\"frequency\": {\"model\": \"binomial\"",
                "\"subPerilCopula\": {\"family\": \"comonotonic\"}, \"frequency\": {\"model\": \"binomial\"").perils().get(1).eventLoss();
        assertEquals(new Comonotonic(), split.copula());
        assertEquals(List.of(1.0, 0.4), split.subPerils().stream().map(s -> s.chance()).toList());
    }

    @Test
    void dependenceLeftOutIsIndependence() {
        String text = changed(PORTFOLIO, ",\n  \"dependence\": {\"links\": \"counts\", \"copula\": {\"family\": \"gumbel\", \"kendallTau\": 0.3}}", "");
        assertEquals(Dependence.NONE, PortfolioReader.read("file.json", bytes(text)).dependence());
        assertEquals(Dependence.Links.ANNUAL_TOTALS, portfolio("\"counts\"", "\"annualTotals\"").dependence().links());
    }
}
