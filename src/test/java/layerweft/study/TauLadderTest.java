package layerweft.study;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.function.DoubleFunction;
import layerweft.figures.Figure;
import layerweft.model.copula.CopulaFamily;
import layerweft.model.copula.TauRange;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class TauLadderTest {
    private static final TauRange GUMBEL = CopulaFamily.parse("gumbel").tauRange(3);
    private static final DoubleFunction<Figure> PARABOLA = tau -> new Figure(2 + 3 * tau - 4 * tau * tau, 1e-6);

    @ParameterizedTest
    @ValueSource(doubles = {0, 0.01, 0.3, 0.5, 0.985})
    void parabolasHaveTheirSlopeExactly(double tau) {
        TauLadder ladder = new TauLadder(List.of(0.5, 0.0, 0.3, 0.985, 0.01), GUMBEL, true);
        Figure slope = ladder.slope(tau, PARABOLA);
        assertEquals(3 - 8 * tau, slope.value(), 1e-10);
        assertTrue(slope.error() >= 1e-6 / 0.1, "errors grow by the step: " + slope.error());
    }

    @Test
    void pricesOnlyWhatTheFamilyCanHave() {
        List<Double> taus = new TauLadder(List.of(0.0, 0.5, 0.985), GUMBEL, true).taus();
        assertEquals(taus.stream().sorted().distinct().toList(), taus);
        assertTrue(taus.containsAll(List.of(0.0, 0.5, 0.985)));
        assertTrue(taus.stream().allMatch(GUMBEL::contains), taus.toString());
    }

    @Test
    void closeNeighboursServeAsTheyAre() {
        List<Double> asked = List.of(0.2, 0.25, 0.3);
        List<Double> taus = new TauLadder(asked, GUMBEL, true).taus();
        assertFalse(taus.contains(0.25 + 0.02));
    }

    @Test
    void simulatedPointsGiveWhatTheyHave() {
        assertEquals(List.of(0.0, 0.4), new TauLadder(List.of(0.4, 0.0), GUMBEL, false).taus());
        assertEquals(3 - 4 * 0.4, new TauLadder(List.of(0.0, 0.4), GUMBEL, false).slope(0.4, PARABOLA).value(), 1e-12);
        assertEquals(3 - 8 * 0.4, new TauLadder(List.of(0.0, 0.4, 0.9), GUMBEL, false).slope(0.4, PARABOLA).value(), 1e-12);
        assertFalse(new TauLadder(List.of(0.4), GUMBEL, false).slope(0.4, PARABOLA).defined());
    }
}
