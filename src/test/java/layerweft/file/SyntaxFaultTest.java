package layerweft.file;

import static layerweft.file.Examples.faults;
import static layerweft.file.Examples.lines;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Text that is not JSON: one fault, where the offending piece starts. */
class SyntaxFaultTest {

    @ParameterizedTest
    @CsvSource(delimiter = '|', quoteCharacter = '`', textBlock = """
            {"a": NaN}           | 1:7: a: found NaN; admissible: a number, a text
            {"a": -Infinity}     | 1:7: a: found -Infinity; admissible: a number, a text
            {"a": 01}            | 1:7: a: found 01; admissible: a number as JSON writes it
            {"a": 1.}            | 1:7: a: found 1.; admissible: a number as JSON writes it
            {"a": +1}            | 1:7: a: found +1; admissible: a number as JSON writes it
            {"a": 0x10}          | 1:7: a: found 0x10; admissible:
            {"a": -}             | 1:7: a: found -; admissible: a number as JSON writes it
            {"a": tru}           | 1:7: a: found tru; admissible: a number, a text
            {"a": 'x'}           | 1:7: a: found '; admissible: a number, a text
            {"a" 1}              | 1:6: a: found 1; admissible: a colon after the field name
            {"a": }              | 1:7: a: found }; admissible: a number, a text
            {"a": 1,}            | 1:9: a: found }; admissible: a field name in double quotes
            {a: 1}               | 1:2: found a; admissible: a field name in double quotes
            {"a": 1 "b": 2}      | 1:9: a: found "; admissible: a comma or } after a field
            {"a": [1 2]}         | 1:10: a[1]: found 2; admissible: a comma or ] after a value
            {"a": [1,]}          | 1:10: a[1]: found ]; admissible: a number, a text
            {"a": 1]             | 1:8: a: found ]; admissible: } at the end of an object
            {"a": {"b": 1        | 1:14: a.b: found the end of the file; admissible: the rest
            {"a": "b             | 1:9: a: found the end of the file; admissible: the rest
            {"a": "\\q"}         | found \\q; admissible: one of the escapes
            // note              | 1:1: found /; admissible: JSON without comments
            {} {}                | 1:4: found text after the end
            {} x                 | 1:4: found x
            [1]                  | 1:1: found a list; admissible: a JSON object
            7                    | 1:1: found 7; admissible: a JSON object
            """)
    void theOffendingPieceIsNamed(String text, String expected) {
        List<Fault> faults = faults(text);
        assertEquals(1, faults.size(), String.join("\n", lines(faults)));
        assertTrue(faults.get(0).toString().contains(expected), faults.get(0).toString());
    }

    @Test
    void linesAreCountedWithEveryLineEnd() {
        assertTrue(faults("{\n\"a\": 1,\r\n\"b\":\r\t x}").get(0).toString().startsWith("file.json:4:3: b: found x"));
    }

    @Test
    void aRawControlCharacterInATextIsNamedByItsNumber() {
        assertEquals("file.json:1:9: a: found the control character \\u000A; admissible: control characters written as escapes, e.g. \\n",
                faults("{\"a\": \"x\ny\"}").get(0).toString());
    }

    @Test
    void anEmptyFileIsCalledSo() {
        assertEquals("file.json:1:1: found an empty file; admissible: a JSON object", faults("").get(0).toString());
        assertEquals("file.json:1:1: found an empty file; admissible: a JSON object", faults(" \n\t").get(0).toString());
    }
}
