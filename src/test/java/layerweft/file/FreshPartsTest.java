package layerweft.file;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;

class FreshPartsTest {
    private static final FileTree PORTFOLIO = FileTree.parse("book.json", Examples.PORTFOLIO);
    private static final FileTree PROGRAMME = FileTree.parse("cover.json", Examples.PROGRAMME);

    private static void assertValid(FileTree portfolio, FileTree programme) {
        TreatyCheck check = TreatyCheck.of(portfolio, programme);
        assertEquals(List.of(), check.portfolioFaults());
        assertEquals(List.of(), check.programmeFaults());
    }

    @Test
    void newPerilsAreValidNamedApartAndOfASizeWithTheFirst() {
        FileTree one = PORTFOLIO.insert("perils", 2, FreshParts.peril(PORTFOLIO));
        FileTree two = one.insert("perils", 0, FreshParts.peril(one));
        assertValid(two, PROGRAMME);
        assertEquals("New peril", two.get("perils[3].name"));
        assertEquals("New peril 2", two.get("perils[0].name"));
        assertEquals(10.0, one.get("perils[2].severity.mean"), "the first peril's mean of 13.3, in one digit");
    }

    @Test
    void newSubPerilsAreValid() {
        String list = "perils[1].subPerils";
        assertValid(PORTFOLIO.insert(list, 2, FreshParts.subPeril(PORTFOLIO, list)), PROGRAMME);
    }

    @Test
    void aNewLayerStandsOnTopOfTheOneBeforeIt() {
        FileTree programme = PROGRAMME.insert("layers", 1, FreshParts.layer(PROGRAMME, 1));
        assertValid(PORTFOLIO, programme);
        assertEquals(Map.of("name", "New layer", "occurrence", Map.of("retention", 50.0, "limit", 30.0), "reinstatements", List.of(1.0)),
                programme.get("layers[1]"));
        assertValid(PORTFOLIO, programme.insert("layers", 3, FreshParts.layer(programme, 3)));
    }

    @Test
    void aNewReinstatementHasTheRateOfTheLast() {
        assertEquals(0.5, FreshParts.reinstatement(PROGRAMME, "layers[0].reinstatements"));
        assertEquals(1, FreshParts.reinstatement(PROGRAMME, "layers[1].reinstatements"));
    }

    @Test
    void aNewGroupIsMoreStronglyJoinedThanWhatHoldsIt() {
        FileTree three = PORTFOLIO.insert("perils", 2, FreshParts.peril(PORTFOLIO));
        FileTree grouped = three.insert("dependence.copula.groups", 0, FreshParts.group(three, "dependence.copula", List.of("wind", "New peril")));
        assertValid(grouped, PROGRAMME);
        assertEquals(0.48, grouped.get("dependence.copula.groups[0].kendallTau"));
        FileTree theta = three.set("dependence.copula", Map.of("family", "gumbel", "theta", 1.5));
        assertValid(theta.insert("dependence.copula.groups", 0, FreshParts.group(theta, "dependence.copula", List.of("wind"))), PROGRAMME);
    }
}
