package layerweft.model.severity;

/** The argument of a quantile function. */
final class Probability {

    private Probability() {}

    /** @throws IllegalArgumentException unless p is in [0, 1] */
    static void check(double p) {
        if (!(p >= 0 && p <= 1)) {
            throw new IllegalArgumentException("probability " + p + "; admissible: from 0 to 1");
        }
    }
}
