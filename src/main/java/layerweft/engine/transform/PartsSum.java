package layerweft.engine.transform;

import java.util.Arrays;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.function.IntFunction;
import layerweft.model.copula.Copula;
import layerweft.model.portfolio.EventLoss;
import layerweft.model.portfolio.SubPeril;
import layerweft.model.severity.Capped;
import layerweft.model.severity.DiscreteLosses;
import layerweft.model.severity.Mixture;
import layerweft.model.severity.SeverityModel;
import layerweft.model.severity.Spliced;

/**
 * The subject loss s = q ΣX_m of an event that several covered sub-perils bring, each with its own chance, the sizes of those that occur
 * joined by a copula. Its law is known on lattices only: of parts whose mass is spread to the lattice points, fused at them, or rounded.
 */
final class PartsSum {
    /** Error of probabilities of the sum, by the quadrature over the copula's latent factor. */
    static final double JOINT_ERROR = 1e-9;
    /** Relative slack for amounts that should meet in exact arithmetic. */
    private static final double SLACK = 1e-13;
    private final List<SubPeril> parts;
    private final int[] members;
    private final Copula copula;
    private final double quotaShare;
    private final Map<Double, double[]> spread = new HashMap<>();

    /** @param members indices of the covered sub-perils, rising, two at least */
    PartsSum(EventLoss.Split loss, int[] members, double quotaShare) {
        this.parts = loss.subPerils();
        this.copula = loss.copula();
        this.members = members.clone();
        this.quotaShare = quotaShare;
    }

    /** Whether {@link #spread} and {@link #fused} are above and below the law of s in increasing convex order. */
    boolean ordered() {
        return ConvexOrder.keptBy(copula, members);
    }

    /** E[s], possibly infinite. */
    double mean() {
        return limitedParts(Double.POSITIVE_INFINITY);
    }

    /** Σ E[min(q X_m, cap)] over the parts, with their chances. */
    double limitedParts(double cap) {
        double sum = 0;
        for (int m : members) {
            sum += parts.get(m).chance() * quotaShare * parts.get(m).severity().limitedMean(cap / quotaShare);
        }
        return sum;
    }

    boolean infiniteVariance() {
        return Arrays.stream(members).anyMatch(m -> Double.isInfinite(parts.get(m).severity().limitedSecondMoment(Double.POSITIVE_INFINITY)));
    }

    /** P(s &gt; 0). */
    double positive() {
        double none = 0;
        for (int subset = 0; subset < 1 << members.length; subset++) {
            double[] u = new double[parts.size()];
            Arrays.fill(u, 1);
            boolean certain = true;
            for (int m = 0; m < members.length; m++) {
                if ((subset >> m & 1) == 1) {
                    u[members[m]] = severity(m).cdf(0);
                    certain &= u[members[m]] == 1;
                }
            }
            boolean impossible = Arrays.stream(u).anyMatch(p -> p == 0);
            none += chance(subset) * (impossible ? 0 : certain ? 1 : copula.cdf(u));
        }
        return 1 - none;
    }

    /** P(the sum of spread parts &gt; kh), the average of an approximate P(s &gt; y) over cell k; of at least so many cells. */
    double[] spread(double step, int cells) {
        return spread.compute(step, (h, known) -> known != null && known.length >= cells ? known : mixed(m -> averages(m, h, cells), cells));
    }

    /** P(the sum of fused parts &gt; kh), the parts capped at the end of the lattice. */
    double[] fused(double step, int cells) {
        return mixed(m -> fusedPart(m, step, cells), cells);
    }

    /** Σ E[X''_m] over the fused parts, with their chances. */
    double fusedMean(double step, int cells) {
        double sum = 0;
        for (int m = 0; m < members.length; m++) {
            sum += parts.get(members[m]).chance() * step * Arrays.stream(fusedPart(m, step, cells)).sum();
        }
        return sum;
    }

    /** P(the sum of parts rounded down &gt; kh). */
    double[] roundedDown(double step, int cells) {
        return mixed(m -> {
            double[] survival = new double[cells];
            Arrays.setAll(survival, k -> severity(m).survival((k + 1) * step / quotaShare * (1 - SLACK)));
            return survival;
        }, cells);
    }

    /** P(the sum of parts rounded up &gt; kh). */
    double[] roundedUp(double step, int cells) {
        return mixed(m -> {
            double[] survival = new double[cells];
            Arrays.setAll(survival, k -> severity(m).survival(k * step / quotaShare * (1 + SLACK)));
            return survival;
        }, cells);
    }

    /** Whether a severity has losses of positive probability other than a cap: lattices off these amounts would smear them. */
    static boolean hasAtoms(SeverityModel severity) {
        if (severity instanceof Capped capped) {
            return hasAtoms(capped.model());
        }
        if (severity instanceof Mixture mixture) {
            return mixture.components().stream().anyMatch(PartsSum::hasAtoms);
        }
        return severity instanceof DiscreteLosses || severity instanceof Spliced spliced && (hasAtoms(spliced.body()) || hasAtoms(spliced.tail()));
    }

    /** Averages over cells from {@code start} on of a function that is constant on the lattice's own cells. */
    static double[] layered(double[] survival, double start, double step, int cells) {
        int shift = (int) Math.floor(start / step + 1e-7);
        double part = Math.max(0, start / step - shift);
        part = part < 1e-7 ? 0 : part;
        double[] mean = new double[cells];
        for (int k = 0; k < cells; k++) {
            mean[k] = (1 - part) * survival[shift + k] + part * survival[shift + k + 1];
        }
        return mean;
    }

    private SeverityModel severity(int m) {
        return parts.get(members[m]).severity();
    }

    /** Averages of P(qX &gt; y) over the cells. */
    private double[] averages(int m, double step, int cells) {
        SeverityModel severity = severity(m);
        double h = step / quotaShare;
        double[] mean = new double[cells];
        double right = severity.survival(0);
        for (int k = 0; k < cells; k++) {
            double left = right;
            right = severity.survival((k + 1) * h);
            mean[k] = left <= right ? left : Math.min(left, Math.max(right, severity.layerMean(k * h, (k + 1) * h) / h));
        }
        return mean;
    }

    private double[] fusedPart(int m, double step, int cells) {
        SeverityModel severity = severity(m);
        double h = step / quotaShare;
        double[] reaches = new double[cells];
        double[] passes = new double[cells];
        for (int k = 0; k < cells; k++) {
            reaches[k] = severity.survival((k + 1) * h * (1 - SLACK));
            passes[k] = k == cells - 1 ? reaches[k] : severity.survival((k + 1) * h * (1 + SLACK));
        }
        return FusedLaw.survival(severity.survival(0), averages(m, step, cells), reaches, passes);
    }

    /** Chance that just these of the covered sub-perils occur. */
    private double chance(int subset) {
        double p = 1;
        for (int m = 0; m < members.length; m++) {
            double own = parts.get(members[m]).chance();
            p *= (subset >> m & 1) == 1 ? own : 1 - own;
        }
        return p;
    }

    /** The sum over all sets of sub-perils that may occur together. */
    private double[] mixed(IntFunction<double[]> law, int cells) {
        CountMargin[] laws = new CountMargin[members.length];
        for (int m = 0; m < laws.length; m++) {
            double[] survival = law.apply(m);
            laws[m] = new CountMargin(Arrays.stream(survival).map(s -> 1 - s).toArray(), survival);
        }
        double[] sum = new double[cells];
        for (int subset = 1; subset < 1 << members.length; subset++) {
            double chance = chance(subset);
            if (chance == 0) {
                continue;
            }
            int size = Integer.bitCount(subset);
            int[] positions = new int[size];
            CountMargin[] margins = new CountMargin[size];
            for (int m = 0, j = 0; m < members.length; m++) {
                if ((subset >> m & 1) == 1) {
                    positions[j] = members[m];
                    margins[j++] = laws[m];
                }
            }
            double[] part = DependentSum.survival(copula, positions, margins, JOINT_ERROR);
            for (int k = 0; k < cells; k++) {
                sum[k] += chance * part[k];
            }
        }
        return sum;
    }
}
