package layerweft.model.treaty;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import layerweft.model.Finding;
import layerweft.model.InadmissibleException;
import layerweft.model.copula.Independence;
import layerweft.model.frequency.Poisson;
import layerweft.model.portfolio.Dependence;
import layerweft.model.portfolio.EventLoss;
import layerweft.model.portfolio.Peril;
import layerweft.model.portfolio.Portfolio;
import layerweft.model.portfolio.SubPeril;
import layerweft.model.severity.Exponential;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class CoverTest {
    private static final Portfolio BOOK = new Portfolio("Book", "EUR", "", List.of(
            new Peril("storm", new Poisson(1), new EventLoss.Split(List.of(new SubPeril("wind", 1, new Exponential(1)), new SubPeril("surge", 0.5,
                    new Exponential(2))), new Independence())),
            new Peril("flood", new Poisson(1), new EventLoss.Single(new Exponential(3)))), Dependence.NONE);

    private static Cover cover(String... perils) {
        return Cover.of(Layer.of("layer", OccurrenceTerms.NONE, AnnualTerms.NONE).covering(perils), BOOK, "layers[4]");
    }

    @Test
    void noNamesMeanAllPerils() {
        Cover all = cover();
        assertTrue(all.coversWhole(0) && all.coversWhole(1) && all.covers(0, 1) && all.covers(1, 0));
        assertEquals(2, all.size());
    }

    @Test
    void aPerilMeansAllItsParts() {
        Cover storm = cover("storm");
        assertTrue(storm.coversWhole(0) && storm.covers(0, 0) && storm.covers(0, 1));
        assertFalse(storm.covers(1) || storm.covers(1, 0) || storm.coversWhole(1));
        assertEquals(1, storm.size());
    }

    @Test
    void aSubPerilMeansItselfAndBothMeanTheWhole() {
        Cover surge = cover("flood", "storm/surge");
        assertTrue(surge.covers(0) && surge.covers(0, 1) && surge.covers(1));
        assertFalse(surge.covers(0, 0) || surge.coversWhole(0));
        assertEquals(2, surge.size());
        assertTrue(cover("storm/surge", "storm/wind").coversWhole(0));
    }

    @ParameterizedTest
    @CsvSource({"fire, 0", "storm/hail, 0", "flood/river, 0", "storm/, 0", "'', 0"})
    void unknownNamesAreRefusedWithAllThatAreKnown(String name, int at) {
        Finding finding = only(name);
        assertEquals("layers[4].perils[" + at + "]", finding.field());
        assertEquals("\"" + name + "\"", finding.found());
        assertTrue(finding.admissible().endsWith("storm, storm/wind, storm/surge, flood"), finding.admissible());
    }

    @ParameterizedTest
    @CsvSource({"flood, flood", "storm/wind, storm/wind", "storm, storm/wind", "storm/wind, storm"})
    void aLossIsCoveredOnce(String first, String second) {
        assertEquals("layers[4].perils[1]", only(first, second).field());
    }

    @Test
    void everyFaultIsFound() {
        assertEquals(List.of("layers[4].perils[0]", "layers[4].perils[2]"),
                assertThrows(InadmissibleException.class, () -> cover("fire", "flood", "hail")).findings().stream().map(Finding::field).toList());
    }

    private static Finding only(String... names) {
        List<Finding> findings = assertThrows(InadmissibleException.class, () -> cover(names)).findings();
        assertEquals(1, findings.size(), findings::toString);
        return findings.get(0);
    }
}
