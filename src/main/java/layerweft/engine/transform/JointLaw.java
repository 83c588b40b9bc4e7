package layerweft.engine.transform;

/** The joint law of the perils' counts under a copula, by what sums of events need of it. Perils are in the order of the layer. */
interface JointLaw {
    /** High counts with this part of the chance of any event, in all, are left out. */
    double NEGLIGIBLE = 1e-10;

    /**
     * 1 − E[Π_i φ_i^{N_i}] at many frequencies.
     *
     * @param deficits w_i = 1 − φ_i, peril × {real, imaginary} × frequency
     * @param negligible high counts of this probability in all may be left out; 0 where the transforms are tilted upwards
     * @return {real, imaginary} × frequency
     */
    double[][] deficit(double[][][] deficits, double negligible);

    /** The same at one real point. */
    double at(double[] deficits);

    /** E[(Σ N_i x_i)²] − Σ E[N_i] x_i²: the squares of sums of events, each with itself left out. */
    double productMoment(double[] losses);

    /**
     * The law of those events alone that happen with a chance each, with as few nodes as its own size asks for.
     *
     * @param chances per peril
     * @param budget for the error of joint probabilities, as a part of the chance of any such event
     */
    JointLaw hits(double[] chances, double budget);

    /** Largest error of a joint probability of the counts. */
    double error();
}
