package layerweft.command;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;

class TextTableTest {

    @Test
    void namesStandLeftNumbersRightAndErrorsBesideTheirNumbers() {
        TextTable table = new TextTable("", "loss", "", "engine").row("first", "3.14", "± 0.02", "transform").row("second layer", "12.1", "", "x");
        assertEquals("""
                              loss            engine
                ────────────────────────────────────
                first         3.14 ± 0.02  transform
                second layer  12.1                 x
                """, table.toString());
    }

    @Test
    void columnsWithoutAnyTextTakeNoRoom() {
        assertEquals("""
                   a  b
                ───────
                x  1  2
                """, new TextTable("", "a", "", "b").row("x", "1", "", "2").toString());
    }

    /** One place for each character, also for those that Java holds in two. */
    @Test
    void widthsCountCharacters() {
        String[] lines = new TextTable("", "τ").row("𝜏𝜏", "∞").row("ab", "1").toString().split("\n");
        assertEquals("𝜏𝜏  ∞", lines[2]);
        assertEquals("ab  1", lines[3]);
    }

    @Test
    void aRowOfAnotherLengthIsRefused() {
        String message = assertThrows(IllegalArgumentException.class, () -> new TextTable("a", "b").row("1")).getMessage();
        assertTrue(message.contains("1 cells") && message.contains("2 columns"), message);
    }
}
