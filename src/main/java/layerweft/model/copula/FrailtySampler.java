package layerweft.model.copula;

/** Draws of a frailty from a stream that it was bound to; one for each thread. */
@FunctionalInterface
public interface FrailtySampler {

    /** The natural logarithm of the next frailty V: V itself may lie beyond any double. */
    double logSample();
}
