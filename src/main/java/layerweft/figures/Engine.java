package layerweft.figures;

/** Which engine answered. */
public enum Engine {
    TRANSFORM("transform"),
    SIMULATION("simulation");

    private final String label;

    Engine(String label) {
        this.label = label;
    }

    /** As written in files and on the command line. */
    public String label() {
        return label;
    }
}
