package layerweft.model;

import static org.junit.jupiter.api.Assertions.assertDoesNotThrow;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;

class CheckTest {
    private static final double INFINITY = Double.POSITIVE_INFINITY;

    private interface OfNumber {
        Check check(Check check, double value);
    }

    private static Arguments row(String name, OfNumber rule, List<Double> good, List<Double> bad) {
        return Arguments.of(name, rule, good, bad);
    }

    static Stream<Arguments> rules() {
        return Stream.of(
                row("positive", (c, v) -> c.positive("x", v), List.of(1e-300, 5.0), List.of(0.0, -0.0, -1.0, INFINITY)),
                row("notNegative", (c, v) -> c.notNegative("x", v), List.of(0.0, -0.0, 5.0), List.of(-1e-300, INFINITY)),
                row("positiveOrInfinite", (c, v) -> c.positiveOrInfinite("x", v), List.of(1e-300, INFINITY), List.of(0.0, -1.0, -INFINITY)),
                row("finite", (c, v) -> c.finite("x", v), List.of(-1e300, 0.0), List.of(INFINITY, -INFINITY)),
                row("within", (c, v) -> c.within("x", v, 1, 2), List.of(1.0, 1.5, 2.0), List.of(Math.nextDown(1.0), Math.nextUp(2.0))),
                row("between", (c, v) -> c.between("x", v, 1, 2), List.of(1.5), List.of(1.0, 2.0, INFINITY)),
                row("between, open above", (c, v) -> c.between("x", v, 1, INFINITY), List.of(1.5, 1e300), List.of(1.0, INFINITY)));
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("rules")
    void rulesHoldAtTheirEndsAndNeverForNaN(String name, OfNumber rule, List<Double> good, List<Double> bad) {
        for (double value : good) {
            assertTrue(rule.check(new Check(), value).clean(), name + " " + value);
        }
        for (double value : bad) {
            assertFalse(rule.check(new Check(), value).clean(), name + " " + value);
        }
        assertFalse(rule.check(new Check(), Double.NaN).clean(), name + " NaN");
    }

    @Test
    void allFindingsAreGatheredInTheirOrder() {
        Check check = new Check().positive("threshold", -3).finite("scale", 2).within("share", 1.25, 0, 1);
        InadmissibleException e = assertThrows(InadmissibleException.class, check::orThrow);
        assertEquals(List.of(new Finding("threshold", "-3", "a finite number above 0"), new Finding("share", "1.25", "from 0 to 1")), e.findings());
        assertEquals("threshold: found -3; admissible: a finite number above 0\nshare: found 1.25; admissible: from 0 to 1", e.getMessage());
    }

    @Test
    void namesAreNotBlank() {
        assertTrue(new Check().name("name", "x").clean());
        assertEquals("name: found \" \"; admissible: a name that is not blank",
                assertThrows(InadmissibleException.class, () -> new Check().name("name", " ").orThrow()).getMessage());
        assertEquals("nothing", assertThrows(InadmissibleException.class, () -> new Check().name("name", null).orThrow()).findings().get(0).found());
    }

    @Test
    void findingsOfAPartStandBelowItsField() {
        InadmissibleException part = new InadmissibleException(List.of(new Finding("theta", "0", "more"), new Finding("[2]", "x", "y"), new Finding("", "z", "w")));
        InadmissibleException whole = assertThrows(InadmissibleException.class, () -> new Check().within("copula", part).orThrow());
        assertEquals(List.of("copula.theta", "copula[2]", "copula"), whole.findings().stream().map(Finding::field).toList());
        InadmissibleException top = assertThrows(InadmissibleException.class, () -> new Check().within("", part).orThrow());
        assertEquals(List.of("theta", "[2]", ""), top.findings().stream().map(Finding::field).toList());
    }

    @Test
    void withoutFindingsNothingIsThrown() {
        assertDoesNotThrow(() -> new Check().positive("x", 1).orThrow());
    }
}
