package layerweft.engine.transform;

import java.util.Arrays;
import java.util.stream.DoubleStream;
import layerweft.model.severity.Capped;
import layerweft.model.severity.DiscreteLosses;
import layerweft.model.severity.SeverityModel;
import layerweft.model.treaty.LayerTerms;

/** The occurrence loss of an event with one loss. */
record SingleEvent(SeverityModel severity, LayerTerms terms, double cap) implements EventLaw {
    /** Relative slack for amounts that should meet in exact arithmetic: an atom at R + L must fill the layer. */
    private static final double SLACK = 1e-13;

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
        return layerMean(0, terms.occurrenceLimit());
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
        double means = severity.layerMean(start, end);
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
        double right = hitChance();
        for (int k = 0; k < cells; k++) {
            double left = right;
            double a = k * step;
            double b = k + 1 == cells ? cap : (k + 1) * step;
            right = survival(b);
            mean[k] = left <= right ? left : Math.min(left, Math.max(right, layerMean(a, b) / (b - a)));
        }
        return mean;
    }

    /** ∫_a^b P(o &gt; x) dx; below a franchise the probability stands still. */
    private double layerMean(double a, double b) {
        double q = terms.quotaShare();
        if (!terms.hasFranchise() || a >= terms.franchise()) {
            return q * severity.layerMean(groundUp(a), groundUp(b));
        }
        double middle = Math.min(b, terms.franchise());
        return (middle - a) * hitChance() + (b > middle ? q * severity.layerMean(groundUp(middle), groundUp(b)) : 0);
    }

    /** Mass spread to the lattice points above, mass fused at them below: the order is one of convex functions, with nothing to spare. */
    @Override
    public OrderedLaws ordered(double step, int cells) {
        double[] mean = cellSurvival(step, cells);
        double[] reaches = new double[cells];
        double[] passes = new double[cells];
        for (int k = 0; k < cells; k++) {
            reaches[k] = k == cells - 1 ? fullChance() : reaches((k + 1) * step);
            passes[k] = k == cells - 1 ? reaches[k] : survival((k + 1) * step);
        }
        double capped = step * Arrays.stream(mean).sum();
        double beyond = terms.occurrenceLimit() < Double.POSITIVE_INFINITY ? 0 : layerMean(cap, Double.POSITIVE_INFINITY);
        return new OrderedLaws(step, mean, FusedLaw.survival(hitChance(), mean, reaches, passes), 0, capped, capped, beyond, beyond, mean(), mean());
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
