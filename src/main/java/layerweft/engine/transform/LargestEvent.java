package layerweft.engine.transform;

import java.util.List;
import layerweft.model.treaty.LayerTerms;

/**
 * The law of the year's largest recovery from one event: min(max_e o_e, M), exact where there is no annual deductible; with one, it is
 * what the largest event would bring if the deductible were used up. P(max ≤ x) = E[Π P(o_i ≤ x)^{N_i}], a generating function at one
 * real point.
 */
final class LargestEvent {
    private final List<EventLaw> events;
    private final LatentNodes nodes;
    private final double most;

    LargestEvent(List<EventLaw> events, LatentNodes nodes, LayerTerms terms) {
        this.events = events;
        this.nodes = nodes;
        this.most = Math.min(terms.occurrenceLimit(), terms.annualLimit());
    }

    /** P(largest &gt; x). */
    double survival(double x) {
        return x >= most ? 0 : JointDeficit.at(nodes, events.stream().mapToDouble(e -> e.survival(x)).toArray());
    }

    /** inf{x : P(largest ≤ x) ≥ level}, to 1e-12 of its value. */
    double quantile(double level) {
        double tail = (1 - level) * (1 + 1e-12);
        if (survival(0) <= tail) {
            return 0;
        }
        double high = most;
        if (Double.isInfinite(most)) {
            high = 1;
            while (survival(high) > tail && high < 1e300) {
                high *= 4;
            }
        }
        double low = 0;
        for (int step = 0; step < 200 && high - low > 1e-12 * high; step++) {
            double middle = low > 0 && high > 4 * low ? Math.sqrt(low * high) : 0.5 * (low + high);
            if (survival(middle) > tail) {
                low = middle;
            } else {
                high = middle;
            }
        }
        return high;
    }
}
