package layerweft.study;

/** The engine that was asked for cannot price a layer. */
public final class EngineRefusedException extends RuntimeException {
    private static final long serialVersionUID = 1L;

    EngineRefusedException(String layer, String reason) {
        super("the transform engine cannot price layer \"" + layer + "\": " + reason + "; ask for engine auto or simulation");
    }
}
