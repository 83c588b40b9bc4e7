package layerweft.file;

/** Text from a file as a message may quote it: short, and without characters that a terminal would act on. */
final class Excerpt {
    private static final int LONGEST_QUOTE = 60;

    private Excerpt() {}

    /** In double quotes, at most about 60 characters. */
    static String quoted(String text) {
        return '"' + printable(text, LONGEST_QUOTE) + '"' + (text.length() > LONGEST_QUOTE ? " (" + text.length() + " characters)" : "");
    }

    /** Without quotes, at most about 60 characters. */
    static String plain(String text) {
        return printable(text, LONGEST_QUOTE);
    }

    /** Control, formatting and unpaired surrogate characters escaped; cut off with … beyond the given number of characters. */
    static String printable(String text, int longest) {
        StringBuilder shown = new StringBuilder();
        int taken = 0;
        for (int i = 0; i < text.length() && taken < longest; taken++) {
            int c = text.codePointAt(i);
            i += Character.charCount(c);
            if (isPrintable(c)) {
                shown.appendCodePoint(c);
            } else {
                shown.append(String.format("\\u%04X", c));
            }
        }
        return text.codePointCount(0, text.length()) > longest ? shown.append('…').toString() : shown.toString();
    }

    static boolean isPrintable(int codePoint) {
        return switch (Character.getType(codePoint)) {
            case Character.CONTROL, Character.FORMAT, Character.SURROGATE, Character.LINE_SEPARATOR, Character.PARAGRAPH_SEPARATOR -> false;
            default -> true;
        };
    }
}
