package layerweft.engine.bounds;

import java.util.Arrays;

/**
 * A proven lower bound of a layer's expected loss over all joint laws, f(s) = min((s − D)+, M).
 *
 * <p>Take base amounts m_i ≥ 0 with Σm_i ≤ D and D' = D − Σm_i. Then for all a_i ≥ 0
 * <pre>    f(Σa_i) ≥ min(Σ(a_i − m_i − D')+, M) − Σ(m_i − a_i)+.</pre>
 * With b_i = a_i − m_i, x = (Σb_i⁺ − D')+ and y = Σb_i⁻ we have Σa_i − D = Σb_i⁺ − D' − y. The first sum is x at most, because
 * (b + c − D')+ ≥ (b − D')+ + (c − D')+ for b, c, D' ≥ 0, and min(x, M) − y ≤ min((x − y)+, M) for y ≥ 0. The right side is concave in
 * the first sum, so that its mean is smallest where the excesses are comonotone (Dhaene et al. 2002); the mean of the second sum is the
 * same under every dependence. With m = 0 this is the bound by excesses of single perils, with Σm_i = D the bound ΣE[A_i] − D of Jensen.
 *
 * <p>Moreover f ≥ (M/M')·f' for the layer f' with the higher limit M' in place of M.
 */
final class LowerDual {
    private static final double[] PARTS = {0, 0.1, 0.2, 0.3, 0.4, 0.5, 0.6, 0.7, 0.8, 0.9, 1};
    private static final double[] WIDTHS = {1, 1.2, 1.5, 2, 3, 5, 10};
    private static final int HALVINGS = 10;
    private final Margin[] margins;
    private final AnnualLayer layer;
    private double[] base;
    private double width = 1;
    private double best;

    LowerDual(Margin[] margins, AnnualLayer layer) {
        this.margins = margins;
        this.layer = layer;
    }

    /** The largest bound found. */
    double bound() {
        base = new double[margins.length];
        best = 0;
        double[] split = comonotoneSplit();
        for (double w : layer.limited() ? WIDTHS : new double[] {1}) {
            for (double part : PARTS) {
                attempt(Arrays.stream(split).map(m -> part * m).toArray(), w);
            }
        }
        double step = layer.deductible() / 4;
        for (int halving = 0; halving < HALVINGS; halving++, step /= 2) {
            for (int i = 0; i < base.length; i++) {
                along(i, step);
                along(i, -step);
            }
            for (int i = 0; layer.limited() && i < 2; i++) {
                attempt(base.clone(), Math.max(1, width * (i == 0 ? 1 + 0.4 / (1 << halving) : 1 / (1 + 0.4 / (1 << halving)))));
            }
        }
        return best;
    }

    /** Moves one base amount, and where the sum would pass D takes the difference off the others. */
    private void along(int i, double step) {
        double[] moved = base.clone();
        moved[i] = Math.max(0, Math.min(layer.deductible(), moved[i] + step));
        double others = Arrays.stream(moved).sum() - moved[i];
        double room = layer.deductible() - moved[i];
        for (int j = 0; j < moved.length; j++) {
            moved[j] *= j != i && others > room ? room / others : 1;
        }
        attempt(moved, width);
    }

    private void attempt(double[] amounts, double wider) {
        double value = value(amounts, wider);
        if (value > best) {
            best = value;
            base = amounts;
            width = wider;
        }
    }

    private double value(double[] amounts, double wider) {
        double room = Math.max(0, layer.deductible() - Arrays.stream(amounts).sum());
        double missing = 0;
        double[] from = new double[margins.length];
        for (int i = 0; i < from.length; i++) {
            missing += amounts[i] - margins[i].limited(amounts[i]);
            from[i] = amounts[i] + room;
        }
        return (excess(from, layer.limit() * wider) - missing) / wider;
    }

    /**
     * E[min(Σ(A_i − from_i)+, limit)] for comonotone A_i: with t the chance that the sum passes the limit and q_i the value of A_i that is
     * passed with chance t, t·limit + Σ(E[min((A_i − from_i)+, q_i − from_i)] − t·(q_i − from_i)) over the i with q_i &gt; from_i.
     */
    private double excess(double[] from, double limit) {
        double t = limit < Double.POSITIVE_INFINITY ? chance(from, limit) : 0;
        double sum = t > 0 ? t * limit : 0;
        for (int i = 0; i < from.length; i++) {
            double q = margins[i].value(margins[i].atomFrom(t));
            sum += q > from[i] ? margins[i].limited(q) - margins[i].limited(from[i]) - t * (q - from[i]) : 0;
        }
        return sum;
    }

    private double chance(double[] from, double limit) {
        double low = 0;
        double high = 1;
        if (passed(from, 0) <= limit) {
            return 0;
        }
        for (int step = 0; step < 60; step++) {
            double t = 0.5 * (low + high);
            if (passed(from, t) > limit) {
                low = t;
            } else {
                high = t;
            }
        }
        return high;
    }

    /** The sum of the excesses that is passed with chance t. */
    private double passed(double[] from, double t) {
        double sum = 0;
        for (int i = 0; i < from.length; i++) {
            sum += Math.max(0, margins[i].value(margins[i].atomFrom(t)) - from[i]);
        }
        return sum;
    }

    /** Amounts at which the comonotone sum is about D: each A_i at the same chance of being passed. */
    private double[] comonotoneSplit() {
        double t = chance(new double[margins.length], layer.deductible());
        double[] amounts = Arrays.stream(margins).mapToDouble(m -> m.value(m.atomFrom(t))).toArray();
        double sum = Arrays.stream(amounts).sum();
        double scale = sum > 0 ? layer.deductible() / sum : 0;
        for (int i = 0; i < amounts.length; i++) {
            amounts[i] = sum > 0 ? amounts[i] * scale : layer.deductible() / amounts.length;
        }
        return amounts;
    }
}
