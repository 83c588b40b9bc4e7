package layerweft.file;

/**
 * One thing wrong with a file. What it quotes from the file is shortened and made printable, so that {@link #toString} is one line.
 *
 * @param file the file as the user named it
 * @param line from 1; 0 where the fault is with the file as a whole
 * @param column from 1, in characters; 0 where the fault is with the file as a whole
 * @param path of the field at fault or of the object that holds it, e.g. {@code perils[1].severity.alpha}; empty for the whole file
 * @param found what was found
 * @param admissible what would have been admissible
 */
public record Fault(String file, int line, int column, String path, String found, String admissible) {
    private static final int LONGEST_PART = 400;

    public Fault {
        file = Excerpt.printable(file, LONGEST_PART);
        path = Excerpt.printable(path, LONGEST_PART);
        found = Excerpt.printable(found, LONGEST_PART);
        admissible = Excerpt.printable(admissible, LONGEST_PART);
    }

    /** E.g. {@code portfolio.json:12:31: perils[1].severity.alpha: found -2; admissible: a finite number above 0}. */
    @Override
    public String toString() {
        return file + (line > 0 ? ":" + line + ":" + column : "") + ": " + (path.isEmpty() ? "" : path + ": ")
                + "found " + found + "; admissible: " + admissible;
    }
}
