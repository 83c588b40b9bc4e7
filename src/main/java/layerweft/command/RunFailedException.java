package layerweft.command;

/** Something outside the files' contents that the user has to mend: ends with exit status 2 and this message. */
final class RunFailedException extends RuntimeException {
    private static final long serialVersionUID = 1L;

    RunFailedException(String message) {
        super(message);
    }
}
