package layerweft.desktop.session;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestInstance;

@TestInstance(TestInstance.Lifecycle.PER_CLASS)
class StripCellTest {
    private Session session;

    @BeforeAll
    void price() {
        Document document = Sessions.twoPerils(Sessions.gumbel(0.3)).withProgramme(p -> p
                .insert("layers", 1, Map.of("name", "Only a", "perils", List.of("a"), "annual", Map.of("deductible", 20, "limit", 20)))
                .insert("layers", 2, Map.of("name", "No limit", "annual", Map.of("deductible", 60))));
        session = Sessions.complete(document);
        session.pin();
        session.setTau(0.5, null);
    }

    private List<StripCell> cells() {
        return StripCell.of(session.prices().get(), session.curves().get(), session.pinned().get());
    }

    @Test
    void theMarkStandsOnTheCurve() {
        StripCell cell = cells().get(0);
        int at = cell.taus().indexOf(0.5);
        assertEquals(cell.curve().get(at), cell.lift(), 1e-4);
        assertEquals(cell.curve().get(cell.taus().indexOf(0.3)), cell.pinnedLift(), 1e-4);
        assertEquals(0.3, cell.pinnedTau(), 1e-9);
        assertEquals(0, cell.curve().get(0), 1e-4);
    }

    @Test
    void dependenceMovesAnAggregateLayerAndTheChangeIsTold() {
        StripCell cell = cells().get(0);
        assertTrue(cell.lift() > cell.pinnedLift() && cell.pinnedLift() > 0);
        assertTrue(cell.change().matches("\\+\\d+\\.\\d+"), cell.change());
    }

    @Test
    void aLayerOfOnePerilHasNoCopula() {
        StripCell cell = cells().get(1);
        assertEquals("it covers one peril", cell.unmoved().orElseThrow());
        assertTrue(cell.change().matches("0\\.0+"), cell.change());
        assertTrue(cell.hover().contains("No copula: it covers one peril"));
    }

    @Test
    void withoutALimitThereIsNoLossOnLineAndTheHoverSaysWhy() {
        StripCell cell = cells().get(2);
        assertEquals("—", cell.figure().value());
        assertTrue(cell.hover().contains("not defined: the layer has no limit"));
    }

    @Test
    void allCellsShareOneAxis() {
        LiftCurves curves = session.curves().get();
        assertTrue(curves.highestLift() >= cells().get(0).curve().stream().mapToDouble(Double::doubleValue).max().orElseThrow());
        assertEquals(2, curves.mostMoved());
    }
}
