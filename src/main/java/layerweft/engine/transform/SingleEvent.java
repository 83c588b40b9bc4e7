package layerweft.engine.transform;

import java.util.stream.DoubleStream;
import layerweft.model.severity.Capped;
import layerweft.model.severity.DiscreteLosses;
import layerweft.model.severity.SeverityModel;
import layerweft.model.treaty.LayerTerms;

/** The occurrence loss of an event with one loss. */
record SingleEvent(SeverityModel severity, LayerTerms terms, double cap) implements EventLaw {
    /** Relative slack for amounts that should meet in exact arithmetic: an atom at R + L must fill the layer. */
    private static final double SLACK = 1e-13;
    /** A difference of limited means that keeps fewer digits than this is replaced by quadrature of the survival function. */
    private static final double DIGITS = 1e-12;
    /** Gauss–Legendre on [0, 1], four points. */
    private static final double[] POINTS = {0.06943184420297371, 0.33000947820757187, 0.6699905217924281, 0.9305681557970263};
    private static final double[] WEIGHTS = {0.17392742256872693, 0.32607257743127307, 0.32607257743127307, 0.17392742256872693};

    /** The ground-up loss at which o passes x. */
    private double groundUp(double x) {
        double s = terms.hasFranchise() ? Math.max(x, terms.franchise()) : x + terms.retention();
        return s / terms.quotaShare();
    }

    @Override
    public double hitChance() {
        double u = groundUp(0);
        return severity.survival(u * (1 + SLACK));
    }

    @Override
    public double fullChance() {
        double u = groundUp(cap);
        // at the franchise itself a loss is not paid
        double slack = terms.hasFranchise() && terms.franchise() >= cap ? 1 + SLACK : 1 - SLACK;
        return severity.survival(u * slack);
    }

    @Override
    public double survival(double x) {
        return severity.survival(groundUp(x) * (1 + SLACK));
    }

    @Override
    public double mean() {
        double q = terms.quotaShare();
        double start = groundUp(0);
        double end = groundUp(terms.occurrenceLimit());
        double paidAtOnce = terms.hasFranchise() ? Math.min(terms.franchise(), terms.occurrenceLimit()) * hitChance() : 0;
        return paidAtOnce + q * (severity.limitedMean(end) - severity.limitedMean(start));
    }

    /** E[(min(s, b) − a)²; s &gt; a] = E[min(s, b)²] − E[min(s, a)²] − 2a(E[min(s, b)] − E[min(s, a)]); a franchise pays from 0: + 2aE + a²P. */
    @Override
    public double secondMoment() {
        double q = terms.quotaShare();
        double start = groundUp(0);
        double end = groundUp(terms.occurrenceLimit());
        double high = severity.limitedSecondMoment(end);
        if (Double.isInfinite(high)) {
            return high;
        }
        double squares = high - severity.limitedSecondMoment(start);
        double means = severity.limitedMean(end) - severity.limitedMean(start);
        if (!terms.hasFranchise()) {
            return Math.max(0, q * q * (squares - 2 * start * means));
        }
        double paidAtOnce = Math.min(terms.franchise(), terms.occurrenceLimit());
        return paidAtOnce * paidAtOnce * hitChance() + q * q * squares;
    }

    /** P(o ≥ x), x &gt; 0. */
    private double reaches(double x) {
        boolean inFranchise = terms.hasFranchise() && x <= terms.franchise();
        return severity.survival(groundUp(x) * (inFranchise ? 1 + SLACK : 1 - SLACK));
    }

    @Override
    public double[] cellSurvival(double step, int cells) {
        double[] mean = new double[cells];
        double q = terms.quotaShare();
        double right = survival(0);
        double limitedRight = severity.limitedMean(groundUp(0));
        for (int k = 0; k < cells; k++) {
            double left = right;
            double limitedLeft = limitedRight;
            double a = k * step;
            double b = k + 1 == cells ? cap : (k + 1) * step;
            right = survival(b);
            limitedRight = severity.limitedMean(groundUp(b));
            boolean plain = !terms.hasFranchise() || a >= terms.franchise();
            double high = left;
            if (high <= 0) {
                mean[k] = 0;
            } else if (right >= high) {
                mean[k] = high;
            } else if (plain && 4e-16 * q * limitedRight <= DIGITS * (b - a) * high) {
                mean[k] = Math.min(high, Math.max(right, q * (limitedRight - limitedLeft) / (b - a)));
            } else {
                mean[k] = average(a, b, high, right, 0);
            }
        }
        return mean;
    }

    /** Mean of P(o &gt; x) over [a, b] by halving until the four-point rule settles; at a jump the halves close in on it. */
    private double average(double a, double b, double left, double right, int depth) {
        if (left - right <= 1e-14 * left) {
            return 0.5 * (left + right);
        }
        double whole = rule(a, b);
        double middle = 0.5 * (a + b);
        double halves = 0.5 * (rule(a, middle) + rule(middle, b));
        if (depth == 40 || Math.abs(whole - halves) <= 1e-13 * halves) {
            return halves;
        }
        double centre = survival(middle);
        return 0.5 * (average(a, middle, left, centre, depth + 1) + average(middle, b, centre, right, depth + 1));
    }

    private double rule(double a, double b) {
        double sum = 0;
        for (int j = 0; j < POINTS.length; j++) {
            sum += WEIGHTS[j] * survival(a + (b - a) * POINTS[j]);
        }
        return sum;
    }

    @Override
    public double[] lowerSurvival(double step, int cells) {
        double[] mean = cellSurvival(step, cells);
        double[] reaches = new double[cells];
        double[] passes = new double[cells];
        for (int k = 0; k < cells; k++) {
            reaches[k] = k == cells - 1 ? fullChance() : reaches((k + 1) * step);
            passes[k] = k == cells - 1 ? reaches[k] : survival((k + 1) * step);
        }
        return FusedLaw.survival(hitChance(), mean, reaches, passes);
    }

    @Override
    public double[][] roundedSurvival(double step, int cells) {
        double[] down = new double[cells];
        double[] up = new double[cells];
        for (int k = 0; k < cells; k++) {
            down[k] = k == cells - 1 ? fullChance() : reaches((k + 1) * step);
            up[k] = survival(k * step);
        }
        return new double[][] {down, up};
    }

    @Override
    public double[] atoms(double step, int cells) {
        double[] atoms = new double[cells + 1];
        boolean any = false;
        for (int k = 1; k < cells; k++) {
            double x = k * step;
            double near = severity.survival(groundUp(x) * (1 - SLACK)) - severity.survival(groundUp(x) * (1 + SLACK));
            double around = severity.survival(groundUp(x - 0.5 * step)) - severity.survival(groundUp(x + 0.5 * step));
            boolean hidden = terms.hasFranchise() && x <= terms.franchise();
            if (!hidden && near > 1e-7 * around && near > 0) {
                atoms[k] = near;
                any = true;
            }
        }
        atoms[0] = 1 - hitChance();
        atoms[cells] = fullChance();
        return any ? atoms : null;
    }

    @Override
    public double[] landmarks() {
        SeverityModel bare = severity instanceof Capped capped ? capped.model() : severity;
        DoubleStream amounts = bare instanceof DiscreteLosses discrete && discrete.losses().size() <= 64
                ? discrete.losses().stream().mapToDouble(Double::doubleValue) : DoubleStream.of(severity.quantile(0));
        if (terms.hasFranchise()) {
            amounts = DoubleStream.concat(amounts, DoubleStream.of(terms.franchise() / terms.quotaShare()));
        }
        return DoubleStream.concat(amounts, DoubleStream.of(severity.upperEnd()))
                .map(x -> x * terms.quotaShare() - terms.retention()).filter(o -> o > 0 && o < cap).distinct().toArray();
    }
}
