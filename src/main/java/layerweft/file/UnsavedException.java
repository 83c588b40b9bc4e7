package layerweft.file;

import java.nio.file.Path;

/** Thrown where a file could not be saved; what was there before still is, whole. The message says why, for a person. */
public final class UnsavedException extends RuntimeException {
    private static final long serialVersionUID = 1L;

    /** What stood in the way. */
    public enum Reason {
        /** The folder to save in is not there. */
        NO_FOLDER,
        /** There is a folder of that name. */
        IS_A_FOLDER,
        /** The file or its folder may not be written. */
        READ_ONLY,
        /** There is no room left. */
        DISK_FULL,
        /** Somebody else has changed, removed or made the file since it was last seen. */
        CHANGED_MEANWHILE,
        /** The file system reports something else. */
        OTHER
    }

    private final Reason reason;
    private final transient Path file;

    UnsavedException(Reason reason, Path file, String message, Exception cause) {
        super(message, cause);
        this.reason = reason;
        this.file = file;
    }

    public Reason reason() {
        return reason;
    }

    /** The file that was to be saved. */
    public Path file() {
        return file;
    }
}
