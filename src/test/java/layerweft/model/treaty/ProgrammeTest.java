package layerweft.model.treaty;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import layerweft.model.Finding;
import layerweft.model.InadmissibleException;
import org.junit.jupiter.api.Test;

class ProgrammeTest {

    private static Layer layer(String name, String... inuring) {
        return new Layer(name, List.of(), OccurrenceTerms.excess(10, 5), AnnualTerms.NONE, null, 1, 1, false, List.of(inuring), null);
    }

    private static Programme programme(Layer... layers) {
        return new Programme("programme", List.of(layers), Pricing.PLAIN, Buyer.USUAL);
    }

    private static List<Finding> findings(Layer... layers) {
        return assertThrows(InadmissibleException.class, () -> programme(layers)).findings();
    }

    @Test
    void inuringLayersComeFirst() {
        assertEquals(List.of(1, 2, 0), programme(layer("aggregate", "first", "second"), layer("first"), layer("second", "first")).inuringOrder());
    }

    @Test
    void aCycleIsRefusedAndShown() {
        Finding finding = findings(layer("a", "c"), layer("b", "a"), layer("c", "b"), layer("d")).get(0);
        assertEquals("layers[0].inuring", finding.field());
        assertEquals("layers that inure to each other: a → b → c → a", finding.found());
    }

    @Test
    void aLayerThatInuresToItselfIsACycle() {
        assertEquals("layers that inure to each other: a → a", findings(layer("a", "a")).get(0).found());
    }

    @Test
    void unknownInuringLayersAndRepeatedNamesAreAllFound() {
        List<Finding> findings = findings(layer("a", "x"), layer("a"), layer("b", "y"));
        assertEquals(List.of("layers[1].name", "layers[0].inuring[0]", "layers[2].inuring[0]"), findings.stream().map(Finding::field).toList());
        assertTrue(findings.get(1).admissible().contains("a, a, b"), findings.get(1).admissible());
    }

    @Test
    void anyDepthOfProgrammeIsLegal() {
        List<Layer> chain = new ArrayList<>();
        chain.add(layer("0"));
        for (int j = 1; j < 1000; j++) {
            chain.add(0, layer(String.valueOf(j), String.valueOf(j - 1)));
        }
        List<Integer> order = programme(chain.toArray(Layer[]::new)).inuringOrder();
        assertEquals(999, order.get(0));
        assertEquals(0, order.get(999));
    }

    @Test
    void noLayersAtAllIsRefused() {
        assertEquals("layers", findings().get(0).field());
    }

    @Test
    void levelsAreThoseAPersonWouldWrite() {
        assertEquals(List.of(0.9, 0.98, 0.99, 0.995, 0.996), Buyer.USUAL.levels());
        assertEquals(1 - 1 / 3.0, Buyer.levelOf(3));
    }

    @Test
    void reinstatementsNeedAnOccurrenceLimit() {
        InadmissibleException e = assertThrows(InadmissibleException.class,
                () -> Layer.of("a", OccurrenceTerms.NONE, new AnnualTerms(0, 5)).withReinstatements(List.of()));
        assertEquals("reinstatements", e.findings().get(0).field());
    }

    @Test
    void notANumberIsAdmissibleNowhere() {
        double nan = Double.NaN;
        assertThrows(InadmissibleException.class, () -> new OccurrenceTerms(nan, null, 1));
        assertThrows(InadmissibleException.class, () -> new OccurrenceTerms(0, nan, 1));
        assertThrows(InadmissibleException.class, () -> new OccurrenceTerms(0, null, nan));
        assertThrows(InadmissibleException.class, () -> new AnnualTerms(nan, 1));
        assertThrows(InadmissibleException.class, () -> new AnnualTerms(0, nan));
        assertThrows(InadmissibleException.class, () -> new Pricing(new Loading.None(), nan, 0, true));
        assertThrows(InadmissibleException.class, () -> new Pricing(new Loading.None(), 0, nan, true));
        assertThrows(InadmissibleException.class, () -> new Loading.StandardDeviation(nan));
        assertThrows(InadmissibleException.class, () -> new Loading.CostOfCapital(0.1, nan));
        assertThrows(InadmissibleException.class, () -> new Loading.ProportionalHazard(nan));
        assertThrows(InadmissibleException.class, () -> new Loading.Wang(nan));
        assertThrows(InadmissibleException.class, () -> new Buyer(List.of(nan), 0.99, 0));
        assertThrows(InadmissibleException.class, () -> new Buyer(List.of(10.0), nan, 0));
    }
}
