package layerweft.engine.transform;

import java.util.List;
import layerweft.model.treaty.LayerTerms;

/**
 * The law of the year's largest recovery from one event, each event taken as the first of its year: the annual terms applied to the year's
 * largest occurrence loss. P(max o ≤ x) = E[Π P(o_i ≤ x)^{N_i}], a generating function at one real point.
 */
final class LargestEvent {
    private final List<EventLaw> events;
    private final JointLaw nodes;
    private final LayerTerms terms;
    /** Largest occurrence loss that makes a difference. */
    private final double most;

    LargestEvent(List<EventLaw> events, JointLaw nodes, LayerTerms terms) {
        this.events = events;
        this.nodes = nodes;
        this.terms = terms;
        this.most = Math.min(terms.occurrenceLimit(), terms.deductible() + terms.annualLimit());
    }

    /** P(max o &gt; x). */
    double survival(double x) {
        return x >= most ? 0 : nodes.at(events.stream().mapToDouble(e -> e.survival(x)).toArray());
    }

    /** inf{x : P(recovery from the largest event ≤ x) ≥ level}, to 1e-11 of the occurrence loss. */
    double quantile(double level) {
        return terms.annualLoss(largestOccurrence(level));
    }

    /** inf{x : P(max o ≤ x) ≥ level}. */
    private double largestOccurrence(double level) {
        double tail = (1 - level) * (1 + 1e-12);
        double atNothing = survival(0);
        if (atNothing <= tail) {
            return 0;
        }
        double low = 0;
        double high = Math.min(most, 1);
        double above = atNothing;
        double value = survival(high);
        while (value > tail && high < most) {
            low = high;
            above = value;
            high = Math.min(most, 4 * high);
            value = survival(high);
        }
        if (high == most && beforeMost() > tail) {
            return most;
        }
        return crossing(low, above, high, value, tail);
    }

    /** P(max o ≥ most). */
    private double beforeMost() {
        return Double.isInfinite(most) ? 0
                : nodes.at(events.stream().mapToDouble(e -> e.survival(most * (1 - 1e-12))).toArray());
    }

    /** Halving and the secant's point by turns, so that neither a jump nor a flat piece holds the search up. */
    private double crossing(double low, double atLow, double high, double atHigh, double tail) {
        double a = low;
        double b = high;
        double fa = Math.log(atLow / tail);
        double fb = atHigh > 0 ? Math.log(atHigh / tail) : -40;
        for (int step = 0; step < 100 && b - a > 1e-11 * b; step++) {
            double secant = fa - fb > 0 ? a + (b - a) * fa / (fa - fb) : 0.5 * (a + b);
            // a little towards the far end, so that both ends close in
            double nudged = step % 3 == 2 ? 0.5 * (a + b) : secant + (secant - 0.5 * (a + b) > 0 ? -1 : 1) * 1e-3 * Math.min(b - secant, secant - a);
            double value = survival(nudged);
            double f = value > 0 ? Math.log(value / tail) : -40;
            if (value > tail) {
                a = nudged;
                fa = f;
            } else {
                b = nudged;
                fb = f;
            }
        }
        return b;
    }
}
