package layerweft.file;

import com.fasterxml.jackson.core.JsonLocation;
import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.core.io.JsonEOFException;

/** What the JSON parser says of text that is not JSON, in a user's words and at the start of the offending piece. */
final class SyntaxFault {
    /** Part of the parser's message, and what would have been admissible. */
    private static final String[][] ADMISSIBLE = {
        {"numeric value", "a number as JSON writes it, e.g. 0.5 or -1.2e3"},
        {"has to be escaped", "control characters written as escapes, e.g. \\n"},
        {"escape", "one of the escapes \\\" \\\\ \\/ \\b \\f \\n \\r \\t \\uXXXX"},
        {"separate field name", "a colon after the field name"},
        {"double-quote to start field name", "a field name in double quotes"},
        {"separate Object entries", "a comma or } after a field"},
        {"separate Array entries", "a comma or ] after a value"},
        {"close marker", "} at the end of an object and ] at the end of a list"},
        {"comment", "JSON without comments"},
        {"token", "a number, a text in double quotes, true, false, null, a list or an object"},
        {"value", "a number, a text in double quotes, true, false, null, a list or an object"},
    };

    private SyntaxFault() {}

    static void add(JsonProcessingException e, String text, String path, Faults faults) {
        JsonLocation location = e.getLocation();
        int offset = (int) Math.min(Math.max(location.getCharOffset(), 0), text.length());
        if (e instanceof JsonEOFException) {
            faults.add(new Place(location.getLineNr(), location.getColumnNr()), path, "the end of the file", "the rest of the JSON object");
            return;
        }
        String message = e.getOriginalMessage();
        int start = offset;
        // of a word or number the parser tells the end, of anything else the character itself
        boolean word = message.contains("token '") || message.contains("numeric value") || offset < text.length() && inWord(text.charAt(offset));
        while (word && start > 0 && inWord(text.charAt(start - 1))) {
            start--;
        }
        int end = start;
        while (end < text.length() && inWord(text.charAt(end))) {
            end++;
        }
        String piece = text.substring(start, Math.min(Math.max(end, start + 1), text.length()));
        faults.add(new Place(location.getLineNr(), location.getColumnNr() - (offset - start)), path, describe(piece), admissible(message));
    }

    private static boolean inWord(char c) {
        return Character.isLetterOrDigit(c) || "+-._\\".indexOf(c) >= 0;
    }

    private static String describe(String piece) {
        boolean printable = piece.codePoints().allMatch(Excerpt::isPrintable);
        return printable ? Excerpt.plain(piece) : "the control character " + Excerpt.plain(piece);
    }

    private static String admissible(String message) {
        for (String[] known : ADMISSIBLE) {
            if (message.contains(known[0])) {
                return known[1];
            }
        }
        return "well-formed JSON";
    }
}
