package layerweft.model;

/**
 * One thing about a value that is not admissible.
 *
 * @param field name of the field at fault, as in the file formats, possibly with a path below it ({@code groups[1].theta});
 *     empty where the whole object is at fault
 * @param found the value found, as text for the reader
 * @param admissible what would have been admissible, in words
 */
public record Finding(String field, String found, String admissible) {

    @Override
    public String toString() {
        return (field.isEmpty() ? "" : field + ": ") + "found " + found + "; admissible: " + admissible;
    }
}
