package layerweft.report;

/** Text that every form can carry: names come from files, and may hold what XML forbids or what turns the writing direction of a page. */
final class Letters {
    private static final int REPLACEMENT = 0xFFFD;

    private Letters() {}

    /** Line ends and tabs become spaces; controls, direction marks and halves of letters become U+FFFD. */
    static String admissible(String text) {
        StringBuilder out = new StringBuilder(text.length());
        text.codePoints().forEach(c -> out.appendCodePoint(c == '\n' || c == '\r' || c == '\t' ? ' ' : forbidden(c) ? REPLACEMENT : c));
        return out.toString();
    }

    private static boolean forbidden(int c) {
        int type = Character.getType(c);
        boolean directional = c >= 0x202A && c <= 0x202E || c >= 0x2066 && c <= 0x2069 || c == 0x200E || c == 0x200F || c == 0x061C;
        return type == Character.CONTROL || type == Character.SURROGATE || directional || (c & 0xFFFE) == 0xFFFE
                || type == Character.LINE_SEPARATOR || type == Character.PARAGRAPH_SEPARATOR;
    }
}
