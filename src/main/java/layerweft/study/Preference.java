package layerweft.study;

import java.util.ArrayList;
import java.util.List;
import java.util.TreeSet;
import layerweft.model.copula.CopulaFamily;

/**
 * Which structure is best for the buyer along τ, for one family and one measure.
 *
 * @param spans from the lowest τ looked at to the highest, each beginning where the one before it ends
 */
public record Preference(CopulaFamily family, BreakEven.Measure measure, List<Span> spans) {

    /**
     * A range of τ.
     *
     * @param best positions of the structures that none is better than; several where they do not differ by more than their errors
     */
    public record Span(double from, double to, List<Integer> best) {}

    public Preference {
        spans = List.copyOf(spans);
    }

    /** From the break-evens of all pairs of a comparison; empty where there are none. */
    public static List<Preference> of(Comparison comparison) {
        List<Preference> preferences = new ArrayList<>();
        List<BreakEven> first = comparison.pairs().get(0).breakEvens();
        for (int m = 0; m < first.size(); m++) {
            for (int f = 0; f < first.get(m).answers().size(); f++) {
                preferences.add(of(comparison, m, f));
            }
        }
        return preferences;
    }

    private static Preference of(Comparison comparison, int m, int f) {
        BreakEven.Answer any = comparison.pairs().get(0).breakEvens().get(m).answers().get(f);
        TreeSet<Double> ends = new TreeSet<>(List.of(any.from(), any.to()));
        for (StructurePair pair : comparison.pairs()) {
            pair.breakEvens().get(m).answers().get(f).taus().forEach(tau -> ends.add(tau.value()));
        }
        List<Span> spans = new ArrayList<>();
        List<Double> cuts = List.copyOf(ends);
        for (int k = 1; k < cuts.size(); k++) {
            List<Integer> best = best(comparison, m, f, 0.5 * (cuts.get(k - 1) + cuts.get(k)));
            Span before = spans.isEmpty() ? null : spans.get(spans.size() - 1);
            if (before != null && before.best().equals(best)) {
                spans.set(spans.size() - 1, new Span(before.from(), cuts.get(k), best));
            } else {
                spans.add(new Span(cuts.get(k - 1), cuts.get(k), best));
            }
        }
        return new Preference(any.family(), comparison.pairs().get(0).breakEvens().get(m).measure(), spans);
    }

    private static List<Integer> best(Comparison comparison, int m, int f, double tau) {
        boolean[] beaten = new boolean[comparison.structures().size()];
        for (StructurePair pair : comparison.pairs()) {
            int sign = pair.breakEvens().get(m).answers().get(f).signAt(tau, comparison.structures().get(pair.first()).programme().name());
            beaten[pair.first()] |= sign > 0;
            beaten[pair.second()] |= sign < 0;
        }
        List<Integer> best = new ArrayList<>();
        for (int k = 0; k < beaten.length; k++) {
            if (!beaten[k]) {
                best.add(k);
            }
        }
        return best;
    }
}
