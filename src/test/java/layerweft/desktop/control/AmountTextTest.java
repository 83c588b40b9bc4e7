package layerweft.desktop.control;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import layerweft.desktop.control.AmountText.Kind;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class AmountTextTest {

    @ParameterizedTest
    @CsvSource(delimiter = ';', value = {
        "12.5m; million; 12.5", "12.5m; thousand; 12500", "2bn; million; 2000", "750k; million; 0.75", "3 m; one; 3000000", "0.1bn; million; 100",
        "1,200; million; 1200", "1,234,567.5; thousand; 1234567.5", " 20 ; million; 20", ".5; million; 0.5", "−5; million; -5", "1e3; million; 1000",
        "12.5m; Million; 12.5"})
    void amountsComeInTheUnitOfTheFile(String typed, String unit, double value) {
        AmountText.Read read = AmountText.read(typed, Kind.AMOUNT, unit);
        assertEquals("", read.refusal());
        assertEquals(value, read.value());
    }

    @ParameterizedTest
    @CsvSource({"35%, 0.35", "35, 0.35", "7.5 %, 0.075", "100%, 1", "0, 0"})
    void partsComeInPercent(String typed, double value) {
        assertEquals(value, AmountText.read(typed, Kind.PART, "million").value(), 1e-15);
    }

    @Test
    void aPercentSignDividesAPlainNumber() {
        assertEquals(0.35, AmountText.read("35%", Kind.NUMBER, "").value());
    }

    @ParameterizedTest
    @ValueSource(strings = {"", "m", ".", "1,20", "12,5", "ten", "1 2 x", "12.5mm", "--3", "1e999", "NaN", "Infinity"})
    void whatIsNoNumberIsRefusedWithWhatWouldBe(String typed) {
        AmountText.Read read = AmountText.read(typed, Kind.AMOUNT, "million");
        assertTrue(Double.isNaN(read.value()));
        assertTrue(read.refusal().contains("number"), read.refusal());
    }

    @Test
    void suffixesAreRefusedWhereTheUnitIsAnother() {
        assertEquals("an amount without m: the file counts in lakh", AmountText.read("3m", Kind.AMOUNT, "lakh").refusal());
        assertEquals("an amount, not a percentage", AmountText.read("3%", Kind.AMOUNT, "million").refusal());
        assertEquals("a number without k", AmountText.read("3k", Kind.NUMBER, "million").refusal());
    }

    @ParameterizedTest
    @CsvSource(delimiter = ';', value = {"12500; AMOUNT; 12,500", "0.35; PART; 35", "0.07; PART; 7", "-5; AMOUNT; −5", "0.3; NUMBER; 0.3"})
    void numbersAtRestAreGroupedWithATrueMinus(double value, Kind kind, String shown) {
        assertEquals(shown, AmountText.write(value, kind));
    }
}
