package layerweft.engine.transform;

/**
 * Counts of the events that hit a layer, where transforms and losses are still of any event: φ = 1 − p(1 − φ_hit), p the chance that an
 * event hits. There are fewer such events, and their number says less about the latent factor, so few nodes and low counts do.
 *
 * @param law of the numbers of hits
 * @param chances p by peril, above 0
 */
record HitCounts(JointLaw law, double[] chances) implements JointLaw {

    @Override
    public double[][] deficit(double[][][] deficits, double negligible) {
        double[][][] given = new double[deficits.length][2][];
        for (int i = 0; i < given.length; i++) {
            for (int part = 0; part < 2; part++) {
                given[i][part] = deficits[i][part].clone();
                for (int f = 0; f < given[i][part].length; f++) {
                    given[i][part][f] /= chances[i];
                }
            }
        }
        return law.deficit(given, negligible);
    }

    @Override
    public double at(double[] deficits) {
        return law.at(given(deficits));
    }

    @Override
    public double productMoment(double[] losses) {
        return law.productMoment(given(losses));
    }

    @Override
    public JointLaw hits(double[] others, double budget) {
        return new HitCounts(law.hits(given(others), budget), others);
    }

    @Override
    public double error() {
        return law.error();
    }

    private double[] given(double[] values) {
        double[] given = values.clone();
        for (int i = 0; i < given.length; i++) {
            given[i] /= chances[i];
        }
        return given;
    }
}
