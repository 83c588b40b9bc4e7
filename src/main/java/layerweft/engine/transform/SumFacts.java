package layerweft.engine.transform;

/**
 * What is known of a layer's annual sum A of occurrence losses without any lattice of A.
 *
 * @param lossChance P(A &gt; 0)
 * @param mean E[A]
 * @param secondMoment E[A²]
 * @param secondMomentError of E[A²]; 0 where it is exact
 * @param expectedEvents events a year with an occurrence loss above 0
 */
record SumFacts(double lossChance, double mean, double secondMoment, double secondMomentError, double expectedEvents) {

    /**
     * From E[A] = Σ E[N_i]·E[o_i] and E[A²] = Σ E[N_i]·E[o_i²] + Σ E[N_i(N_i−1)]·E[o_i]² + 2 Σ_{i&lt;j} E[N_i N_j]·E[o_i]·E[o_j].
     *
     * @param means E[N_i]
     */
    static SumFacts of(PreparedLayer.EventMoments[] events, double[] means, JointLaw nodes) {
        int d = events.length;
        double mean = 0;
        double second = 0;
        double expectedEvents = 0;
        double[] hits = new double[d];
        double[] losses = new double[d];
        for (int i = 0; i < d; i++) {
            hits[i] = events[i].hitChance();
            losses[i] = events[i].mean();
            mean += means[i] * losses[i];
            second += means[i] * events[i].secondMoment();
            expectedEvents += means[i] * hits[i];
        }
        if (Double.isInfinite(second) || Double.isInfinite(mean)) {
            return new SumFacts(nodes.at(hits), mean, Double.POSITIVE_INFINITY, 0, expectedEvents);
        }
        second += nodes.productMoment(losses);
        return new SumFacts(nodes.at(hits), mean, second, 0, expectedEvents);
    }
}
