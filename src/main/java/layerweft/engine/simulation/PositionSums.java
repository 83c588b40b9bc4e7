package layerweft.engine.simulation;

/** Sums over years of one annual total and, for the control variate, of its product with the ground-up total. */
final class PositionSums {
    long years;
    double x;
    double xx;
    double xGross;

    static PositionSums of(double[] totals, double[] gross, int years) {
        PositionSums s = new PositionSums();
        s.years = years;
        for (int i = 0; i < years; i++) {
            s.x += totals[i];
            s.xx += totals[i] * totals[i];
            s.xGross += totals[i] * gross[i];
        }
        return s;
    }

    void add(PositionSums o) {
        years += o.years;
        x += o.x;
        xx += o.xx;
        xGross += o.xGross;
    }
}
