package layerweft.engine.transform;

import java.util.Optional;
import java.util.function.DoubleUnaryOperator;
import java.util.stream.IntStream;
import layerweft.model.portfolio.EventLoss;

/** P(X &gt; x) of the whole ground-up loss of one event, for curves. */
public final class EventLosses {
    private static final int CELLS = 512;
    private static final int MOST_PARTS = 3;
    /** Lattices, each twice as long as the one before: together they span a factor of 2^20. */
    private static final int LATTICES = 20;

    private EventLosses() {}

    /** Empty where the sum of an event's parts is not known without drawing it: more than three sub-perils, or discrete losses among several. */
    public static Optional<DoubleUnaryOperator> survival(EventLoss loss) {
        if (loss instanceof EventLoss.Single single) {
            return Optional.of(single.severity()::survival);
        }
        EventLoss.Split split = (EventLoss.Split) loss;
        int parts = split.subPerils().size();
        if (parts == 1) {
            return Optional.of(x -> split.subPerils().get(0).chance() * split.subPerils().get(0).severity().survival(x));
        }
        boolean drawn = parts > MOST_PARTS || split.subPerils().stream().anyMatch(p -> PartsSum.hasAtoms(p.severity()))
                || DependentSum.refusal(split.copula(), IntStream.range(0, parts).toArray()).isPresent();
        return drawn ? Optional.empty() : Optional.of(ofParts(split));
    }

    private static DoubleUnaryOperator ofParts(EventLoss.Split split) {
        PartsSum sum = new PartsSum(split, IntStream.range(0, split.subPerils().size()).toArray(), 1);
        double[][] lattices = new double[LATTICES][];
        double longest = split.subPerils().stream().mapToDouble(p -> p.severity().survivalQuantile(1e-7)).sum();
        return x -> {
            if (x <= 0) {
                return sum.positive();
            }
            if (x >= longest) {
                return split.subPerils().stream().mapToDouble(p -> p.chance() * p.severity().survival(x)).sum();
            }
            int k = (int) Math.min(LATTICES - 1, Math.floor(Math.log(longest / x) / Math.log(2)));
            double step = longest / Math.scalb(1.0, k) / CELLS;
            if (lattices[k] == null) {
                lattices[k] = sum.spread(step, CELLS + 2);
            }
            // averages over cells, read between their middles
            double at = Math.max(0, x / step - 0.5);
            int cell = (int) at;
            return lattices[k][cell] + (at - cell) * (lattices[k][cell + 1] - lattices[k][cell]);
        };
    }
}
