package layerweft.file;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertNull;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.junit.jupiter.api.Test;

class TreatyCheckTest {
    private static final FileTree PORTFOLIO = Examples.demo(DemoFiles.PORTFOLIO);
    private static final FileTree PROGRAMME = Examples.demo(DemoFiles.PROGRAMME);

    private static List<String> paths(List<Fault> faults) {
        return faults.stream().map(Fault::path).toList();
    }

    @Test
    void treesWithoutFaultsAreATreaty() {
        TreatyCheck check = TreatyCheck.of(PORTFOLIO, PROGRAMME);
        assertTrue(check.valid());
        assertEquals(DemoFiles.treaty().portfolio(), check.treaty().portfolio());
        assertEquals(DemoFiles.treaty().programme(), check.treaty().programme());
        assertEquals(List.of(), check.portfolioFaults());
        assertEquals(List.of(), check.programmeFaults());
    }

    @Test
    void everyFaultOfBothIsNamedByItsPath() {
        TreatyCheck check = TreatyCheck.of(PORTFOLIO.set("perils[1].severity.alpha", -2).remove("perils[2].frequency.mean"),
                PROGRAMME.set("layers[0].share", 7).set("layers[1].perils", List.of("fire")));
        assertFalse(check.valid());
        assertNull(check.treaty());
        assertEquals(List.of("perils[1].severity.alpha", "perils[2].frequency.mean"), paths(check.portfolioFaults()));
        assertTrue(paths(check.programmeFaults()).contains("layers[0].share"), check.programmeFaults().toString());
    }

    @Test
    void aProgrammeThatNamesWhatThePortfolioHasNotIsAtFault() {
        TreatyCheck check = TreatyCheck.of(PORTFOLIO, PROGRAMME.set("layers[1].perils", List.of("fire")));
        assertNull(check.treaty());
        assertEquals(List.of(), check.portfolioFaults());
        assertEquals(List.of("layers[1].perils[0]"), paths(check.programmeFaults()));
    }

    @Test
    void aRenamedPerilIsAFaultOfTheProgrammeThatNamesIt() {
        TreatyCheck check = TreatyCheck.of(PORTFOLIO.set("perils[2].name", "hailstorm"), PROGRAMME);
        assertEquals(List.of("layers[2].perils[2]"), paths(check.programmeFaults()));
    }

    @Test
    void anotherFormatIsOneFault() {
        TreatyCheck check = TreatyCheck.of(PROGRAMME, PROGRAMME);
        assertEquals(List.of("format"), paths(check.portfolioFaults()));
        assertEquals(List.of(), check.programmeFaults());
    }
}
