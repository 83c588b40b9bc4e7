package layerweft.file;

import static layerweft.file.Examples.bytes;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.stream.IntStream;
import java.util.stream.LongStream;
import layerweft.model.copula.Archimedean;
import layerweft.model.copula.ArchimedeanFamily;
import layerweft.model.copula.Copula;
import layerweft.model.copula.Gaussian;
import layerweft.model.frequency.Poisson;
import layerweft.model.portfolio.Dependence;
import layerweft.model.portfolio.EventLoss;
import layerweft.model.portfolio.Peril;
import layerweft.model.portfolio.Portfolio;
import layerweft.model.severity.Capped;
import layerweft.model.severity.Exponential;
import layerweft.model.severity.Lognormal;
import layerweft.model.severity.Mbbefd;
import layerweft.model.severity.SeverityModel;
import layerweft.model.treaty.AnnualTerms;
import layerweft.model.treaty.Buyer;
import layerweft.model.treaty.Layer;
import layerweft.model.treaty.OccurrenceTerms;
import layerweft.model.treaty.Pricing;
import layerweft.model.treaty.Programme;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** What is written reads back to the same model. */
class WriterTest {
    private static final int SEEDS = 40;

    static LongStream seeds() {
        return LongStream.range(0, SEEDS);
    }

    static LongStream fewSeeds() {
        return LongStream.range(0, SEEDS / 5);
    }

    private static void assertReadsBack(Portfolio portfolio, String what) {
        String text = PortfolioWriter.text(portfolio);
        assertEquals(portfolio, PortfolioReader.read("written.json", bytes(text)), () -> what + "\n" + text);
    }

    private static void assertReadsBack(Programme programme, String what) {
        String text = ProgrammeWriter.text(programme);
        assertEquals(programme, ProgrammeReader.read("written.json", bytes(text)), () -> what + "\n" + text);
    }

    private static Portfolio of(SeverityModel severity) {
        return new Portfolio("Book", "EUR", "million", List.of(new Peril("wind", new Poisson(1), new EventLoss.Single(severity))), Dependence.NONE);
    }

    private static Portfolio of(Copula copula, int dimension) {
        List<Peril> perils = IntStream.range(0, dimension)
                .mapToObj(i -> new Peril("peril " + i, new Poisson(1), new EventLoss.Single(new Exponential(1)))).toList();
        return new Portfolio("Book", "EUR", "million", perils, new Dependence(Dependence.Links.COUNTS, copula));
    }

    @ParameterizedTest
    @MethodSource("seeds")
    void randomPortfoliosReadBack(long seed) {
        assertReadsBack(new RandomModels(seed).portfolio(), "seed " + seed);
    }

    @ParameterizedTest
    @MethodSource("seeds")
    void randomProgrammesReadBack(long seed) {
        assertReadsBack(new RandomModels(seed).programme(), "seed " + seed);
    }

    @ParameterizedTest
    @MethodSource("fewSeeds")
    void everyKindReadsBack(long seed) {
        RandomModels models = new RandomModels(seed);
        for (int kind = 0; kind < RandomModels.SEVERITIES; kind++) {
            assertReadsBack(of(models.severity(kind, 2)), "seed " + seed + ", severity " + kind);
        }
        for (int kind = 0; kind < RandomModels.COPULAS; kind++) {
            for (int dimension = 2; dimension < 6; dimension++) {
                assertReadsBack(of(models.copula(kind, dimension), dimension), "seed " + seed + ", copula " + kind);
            }
        }
        for (int kind = 0; kind < RandomModels.FREQUENCIES; kind++) {
            Peril peril = new Peril("wind", models.frequency(kind), new EventLoss.Single(new Exponential(1)));
            assertReadsBack(new Portfolio("Book", "EUR", "million", List.of(peril), Dependence.NONE), "seed " + seed + ", frequency " + kind);
        }
        for (int kind = 0; kind < RandomModels.LOADINGS; kind++) {
            Programme programme = models.programme();
            assertReadsBack(new Programme("Cover", programme.layers(), new Pricing(models.loading(kind), 0, 0, true), programme.buyer()),
                    "seed " + seed + ", loading " + kind);
        }
    }

    static List<Path> files() throws IOException {
        List<Path> files = new ArrayList<>(Examples.demoFiles().stream().map(Path::of).toList());
        for (Path folder : ReferenceRefusalTest.read()) {
            files.add(folder.resolve("portfolio.json"));
            files.add(folder.resolve("programme.json"));
        }
        return files;
    }

    @ParameterizedTest
    @MethodSource("files")
    void modelsOfDemoAndReferenceFilesReadBack(Path file) throws IOException {
        if (Files.readString(file).contains(ProgrammeMapping.FORMAT)) {
            assertReadsBack(ProgrammeReader.read(file), file.toString());
        } else {
            assertReadsBack(PortfolioReader.read(file), file.toString());
        }
    }

    @ParameterizedTest
    @MethodSource("files")
    void treesOfDemoAndReferenceFilesReadBack(Path file) {
        FileTree tree = FileTree.read(file);
        assertEquals(tree, FileTree.parse("again.json", tree.text()));
    }

    @Test
    void whatHoldsWhenLeftOutIsLeftOut() {
        assertEquals(Map.of("format", ProgrammeMapping.FORMAT, "name", "Cover", "layers", List.of(Map.of("name", "All"))),
                ProgrammeWriter.tree(new Programme("Cover", List.of(Layer.of("All", OccurrenceTerms.NONE, AnnualTerms.NONE)), Pricing.PLAIN, Buyer.USUAL)).get(""));
        assertEquals(Map.of("name", "wind", "frequency", Map.of("model", "poisson", "mean", 1.0), "severity",
                Map.of("model", "exponential", "mean", 2.0)), PortfolioWriter.tree(of(new Exponential(2))).get("perils[0]"));
    }

    @Test
    void strengthsAreWrittenAsAPersonGaveThem() {
        assertEquals(Map.of("family", "gaussian", "kendallTau", 0.3), copula(Gaussian.ofKendallTau(0.3)));
        assertEquals(Map.of("family", "frank", "kendallTau", 0.3), copula(Archimedean.ofKendallTau(ArchimedeanFamily.FRANK, false, 0.3)));
        assertEquals(Map.of("family", "joe", "kendallTau", 0.55, "survival", true),
                copula(Archimedean.ofKendallTau(ArchimedeanFamily.JOE, true, 0.55)));
        assertEquals(Map.of("family", "gumbel", "theta", 1.3), copula(Archimedean.ofTheta(ArchimedeanFamily.GUMBEL, false, 1.3)));
    }

    @Test
    void parametersAreWrittenAsAPersonGaveThem() {
        assertEquals(Map.of("model", "lognormal", "mean", 14.0, "cv", 2.1), severity(Lognormal.ofMeanAndCv(14, 2.1)));
        assertEquals(Map.of("model", "lognormal", "mu", 3.1, "sigma", 1.1), severity(new Lognormal(3.1, 1.1)));
        assertEquals(Map.of("model", "mbbefd", "c", 3.0, "exposedValue", 40.0), severity(Mbbefd.ofC(3, 40)));
        assertEquals(Map.of("model", "mbbefd", "b", 2.0, "g", 3.0, "exposedValue", 40.0, "cap", 30.0),
                severity(new Capped(new Mbbefd(2, 3, 40), 30)));
    }

    private static Object severity(SeverityModel model) {
        return PortfolioWriter.tree(of(model)).get("perils[0].severity");
    }

    private static Object copula(Copula copula) {
        return PortfolioWriter.tree(of(copula, 2)).get("dependence.copula");
    }

    @Test
    void capsInCapsAreOneCap() {
        Portfolio portfolio = of(new Capped(new Capped(new Lognormal(1, 1), 7), 9));
        assertEquals(7.0, PortfolioWriter.tree(portfolio).get("perils[0].severity.cap"));
    }

    @Test
    void writtenFilesAreWithoutFaults() {
        Portfolio portfolio = new RandomModels(1).portfolio();
        FileTree programme = FileTree.of("cover.json", Map.of("format", ProgrammeMapping.FORMAT, "name", "Cover", "layers",
                List.of(Map.of("name", "All"))));
        assertTrue(TreatyCheck.of(PortfolioWriter.tree(portfolio), programme).valid());
    }

    @Test
    void whatNoFileCanSayIsRefused() {
        Field<Double> field = Field.number("mean");
        Shape<Double> positive = Shape.of("positive", Variant.of(field.of(x -> x > 0 ? x : null), x -> x));
        assertEquals(Map.of("mean", 2.0), TreeValues.plain(positive.write(2.0)));
        assertThrows(IllegalArgumentException.class, () -> positive.write(-2.0));
    }
}
