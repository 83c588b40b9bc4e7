package layerweft.file;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNull;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** What messages quote and suggest. */
class ExcerptTest {

    @Test
    void controlFormattingAndUnpairedCharactersAreEscaped() {
        assertEquals("a\\u000A\\u001B\\u202E\\uD800τ≤", Excerpt.printable("a\n\u001b\u202e\ud800τ≤", 100));
    }

    @Test
    void longTextsAreCutWithTheirLength() {
        assertEquals('"' + "x".repeat(60) + "…\" (61 characters)", Excerpt.quoted("x".repeat(61)));
        assertEquals('"' + "x".repeat(60) + '"', Excerpt.quoted("x".repeat(60)));
    }

    @ParameterizedTest
    @CsvSource({"alfa, alpha", "treshold, threshold", "retentoin, retention", "Mean, mean", "kendalltau, kendallTau"})
    void aMisspeltNameIsRecognised(String given, String meant) {
        assertEquals(meant, NearMiss.of(given, List.of("alpha", "threshold", "retention", "mean", "kendallTau", "b")));
    }

    @ParameterizedTest
    @CsvSource({"deductible", "x", "meaning", "a"})
    void aNameThatIsNotNearSuggestsNothing(String given) {
        assertNull(NearMiss.of(given, List.of("alpha", "threshold", "mean", "b")));
    }
}
