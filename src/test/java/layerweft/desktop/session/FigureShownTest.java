package layerweft.desktop.session;

import static org.junit.jupiter.api.Assertions.assertEquals;

import layerweft.figures.Figure;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class FigureShownTest {

    @ParameterizedTest
    @CsvSource(delimiter = ';', value = {
        "0.1487; 0.0003; 14.87; %; ± 0.03", "0.149; 0.003; 14.9; %; ± 0.3", "0.26241; 1e-9; 26.24; %; ± < 0.01", "0; 0; 0; %; ''",
        "-0.05; 0.001; −5.0; %; ± 0.1", "Infinity; 0; ∞; ''; ''", "NaN; 0; —; ''; ''", "0.00004; 0.0001; < 0.01; %; ± 0.01"})
    void digitsFollowTheError(double value, double error, String shown, String unit, String plusMinus) {
        FigureShown figure = FigureShown.percent(new Figure(value, error));
        assertEquals(new FigureShown(shown, unit, plusMinus), figure);
    }

    @ParameterizedTest
    @CsvSource(delimiter = ';', value = {"0.72; +0.72", "-0.051; −0.05", "0.004; 0.00", "-0.004; 0.00", "0; 0.00", "1234.5; +1,234.50", "NaN; —"})
    void changesHaveASignWhereSomethingShows(double change, String shown) {
        assertEquals(shown, FigureShown.percent(new Figure(0.0462, 0.0001)).change(change));
    }

    @Test
    void anUnitStaysWithItsNumber() {
        assertEquals("4.62\u2009%", FigureShown.percent(new Figure(0.0462, 0.0001)).text());
    }
}
