package layerweft.file;

/** A place in a file: line and column from 1, the column in characters. */
record Place(int line, int column) {
    static final Place NONE = new Place(0, 0);
}
