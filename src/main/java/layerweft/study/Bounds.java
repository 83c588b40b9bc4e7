package layerweft.study;

import java.util.List;
import java.util.concurrent.CancellationException;
import java.util.concurrent.atomic.AtomicInteger;
import java.util.stream.IntStream;
import layerweft.engine.RunControl;
import layerweft.engine.bounds.BoundsEngine;
import layerweft.engine.bounds.LayerRange;
import layerweft.model.treaty.Treaty;

/**
 * How far any dependence between the perils can move the expected loss of each layer of a treaty.
 *
 * @param layers in the order of the programme
 */
public record Bounds(Treaty treaty, List<Answer> layers) {

    /**
     * One layer.
     *
     * @param range in the portfolio's unit at the layer's share; null where there is none
     * @param note why there is no range, or why dependence does not matter, in plain words; null where there is nothing to say
     */
    public record Answer(String name, LayerRange range, String note) {}

    public Bounds {
        layers = List.copyOf(layers);
    }

    /** @throws CancellationException if the control stops it between two layers */
    public static Bounds of(Treaty treaty, RunControl control) {
        BoundsEngine engine = new BoundsEngine(treaty);
        AtomicInteger done = new AtomicInteger();
        // layers share nothing, so that they can be taken in any order and at once
        return new Bounds(treaty, IntStream.range(0, treaty.layers()).parallel().mapToObj(j -> {
            if (control.cancelled()) {
                throw new CancellationException();
            }
            Answer answer = answer(treaty, engine, j);
            control.progress(done.incrementAndGet(), treaty.layers());
            return answer;
        }).toList());
    }

    private static Answer answer(Treaty treaty, BoundsEngine engine, int j) {
        String name = treaty.layer(j).name();
        String refusal = engine.refusal(j).orElse(null);
        if (refusal != null) {
            return new Answer(name, null, refusal);
        }
        LayerRange range = engine.placedRange(j);
        return new Answer(name, range, range.free() ? freedom(treaty, j, range) : null);
    }

    private static String freedom(Treaty treaty, int j, LayerRange range) {
        if (treaty.cover(j).size() == 1) {
            return "one peril: dependence between perils does not matter";
        }
        if (!treaty.layer(j).terms().hasAnnualTerms()) {
            return "no annual terms: dependence between perils does not move the expected loss";
        }
        return Double.isInfinite(range.independent()) ? "the expected loss is infinite under every dependence"
                : "only one peril reaches the layer: dependence between perils does not matter";
    }
}
