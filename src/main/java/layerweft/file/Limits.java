package layerweft.file;

/** The largest files and lists that are read. Far above what a treaty needs, low enough that a hostile file ends quickly. */
final class Limits {
    /** Bytes of a file: 64 MB. */
    static final int FILE_BYTES = 64 * 1024 * 1024;
    /** Objects and lists inside one another. */
    static final int NESTING = 64;
    /** Values of a file, counting objects and lists. */
    static final int VALUES = 2_500_000;
    static final int PERILS = 256;
    static final int SUB_PERILS = 256;
    static final int LAYERS = 1_000;
    /** Losses or probabilities of one law. */
    static final int LOSSES = 1_000_000;
    /** Lists of everything else: components, reinstatements, return periods. */
    static final int LIST = 1_000;
    /** Characters of a name or label. */
    static final int TEXT = 1_000;
    /** Faults reported of one file. */
    static final int FAULTS = 1_000;

    private Limits() {}
}
