package layerweft.figures;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class FigureTextTest {

    @ParameterizedTest
    @CsvSource(quoteCharacter = '"', value = {
        "3.14159, 0.02, 3.14, ± 0.02", "3.14159, 0.2, 3.1, ± 0.2", "3.14159, 4, 3, ± 4", "3.14159, 0.096, 3.1, ± 0.1", "0.00123456, 0.00002, 0.00123, ± 0.00002",
        "12345.6, 300, \"12,300\", ± 300", "-7.25, 0.1, -7.3, ± 0.1", "1234567, 20000, \"1,230,000\", \"± 20,000\"", "0, 0.03, 0, ± 0.03", "-0.0001, 0.01, 0.00, ± 0.01"})
    void digitsFollowTheError(double value, double error, String text, String errorText) {
        Figure figure = new Figure(value, error);
        assertEquals(text, FigureText.value(figure));
        assertEquals(errorText, FigureText.error(figure));
    }

    /** Four significant digits are enough: a smaller error is said to be below the last one. */
    @ParameterizedTest
    @CsvSource(quoteCharacter = '"', value = {"3.14159, 1e-9, 3.142, ± < 0.001", "123456, 1, \"123,500\", ± < 100", "0.000123456, 1e-12, 0.0001235, ± < 0.0000001"})
    void smallErrorsAreBounded(double value, double error, String text, String errorText) {
        assertEquals(text, FigureText.value(new Figure(value, error)));
        assertEquals(errorText, FigureText.error(new Figure(value, error)));
    }

    @ParameterizedTest
    @CsvSource(quoteCharacter = '"', value = {"3.14159, 3.142", "1500, \"1,500\"", "0.25, 0.2500", "1e9, \"1,000,000,000\"", "-12, -12.00"})
    void exactFiguresHaveFourDigitsAndNoError(double value, String text) {
        assertEquals(text, FigureText.value(Figure.exact(value)));
        assertEquals("", FigureText.error(Figure.exact(value)));
    }

    @Test
    void specials() {
        assertEquals("—", FigureText.value(Figure.UNDEFINED));
        assertEquals("—", FigureText.percent(Figure.UNDEFINED));
        assertEquals("∞", FigureText.value(Figure.INFINITE));
        assertEquals("∞", FigureText.percent(Figure.INFINITE));
        assertEquals("0", FigureText.value(Figure.exact(0)));
        assertEquals("", FigureText.error(Figure.UNDEFINED) + FigureText.error(Figure.INFINITE) + FigureText.error(Figure.exact(0)));
    }

    /** An error that is not known does not hide the value. */
    @Test
    void anUnknownErrorIsInfinite() {
        Figure figure = new Figure(5.25, Double.NaN);
        assertEquals("5.250", FigureText.value(figure));
        assertEquals("± ∞", FigureText.error(figure));
        assertEquals("0", FigureText.value(new Figure(0, Double.POSITIVE_INFINITY)));
    }

    @Test
    void percent() {
        assertEquals("12.3 %", FigureText.percent(new Figure(0.12345, 0.002)));
        assertEquals("± 0.2", FigureText.percentError(new Figure(0.12345, 0.002)));
        assertEquals("12.35 %", FigureText.percent(Figure.exact(0.12346)));
        assertEquals("0 %", FigureText.plainPercent(0));
    }

    @ParameterizedTest
    @CsvSource({"0.9, 90 %", "0.995, 99.5 %", "1, 100 %", "0.07, 7 %", "0.3333, 33.33 %"})
    void agreedPartsKeepTheirDigits(double part, String text) {
        assertEquals(text, FigureText.plainPercent(part));
    }

    @ParameterizedTest
    @CsvSource(quoteCharacter = '"', value = {"0.012, 1 in 83.3", "0.5, 1 in 2.00", "1, 1 in 1.00", "0.004, 1 in 250", "0.0001, \"1 in 10,000\"", "0, never", "NaN, never"})
    void oneIn(double chance, String text) {
        assertEquals(text, FigureText.oneIn(Figure.exact(chance)));
    }

    @ParameterizedTest
    @CsvSource({"0.99, 0.99", "250, 250", "1e7, 10000000", "1e-7, 0.0000001", "0.1, 0.1"})
    void plainIsTheShortestDecimal(double value, String text) {
        assertEquals(text, FigureText.plain(value));
    }

    @ParameterizedTest
    @ValueSource(doubles = {0.1, 1.0 / 3, 0.996, 1e22, 123.456, Double.MIN_VALUE, 5e-324, 1e300})
    void plainReadsBackTheSame(double value) {
        assertEquals(value, Double.parseDouble(FigureText.plain(value)));
    }
}
