package layerweft.desktop.picture;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.IntStream;
import layerweft.model.Check;

/**
 * A programme to be drawn as a tower. Amounts are in the portfolio's unit, at 100 %.
 *
 * @param perils names, in the order of the file
 * @param layers in the order of the file
 * @param haze the year's largest event: rising amounts with their return periods; empty where it is not known yet
 */
public record Tower(List<String> perils, List<Layer> layers, List<Mark> haze) {

    /** Reinstatements without end. */
    public static final int UNLIMITED = -1;
    /** What the year can use is set by an annual limit, not by reinstatements. */
    public static final int BY_ANNUAL_LIMIT = -2;

    public Tower {
        perils = List.copyOf(perils);
        layers = List.copyOf(layers);
        haze = List.copyOf(haze);
    }

    /** An amount that the year's largest event passes once in so many years. */
    public record Mark(double amount, double years) {}

    /**
     * One layer.
     *
     * @param terms in words, e.g. {@code 30 xs 30, 2 at 100 %}
     * @param ofYear whether it covers the year's total rather than each event
     * @param retention of an event, or the annual deductible of a cover of the year's total
     * @param limit likewise; infinite where there is none
     * @param franchise NaN where there is none; the layer then begins at 0
     * @param kept full limits that the annual deductible keeps, at least 0
     * @param limits full limits that the year can use, above 0, infinite for no end
     * @param reinstatements their number, {@link #UNLIMITED} or {@link #BY_ANNUAL_LIMIT}
     * @param uses chance-weighted use of each full limit as a part of it, as far as known
     * @param shares of the layer's expected loss by peril; NaN where the peril is not covered
     * @param lossOnLine NaN where it is not defined or not known
     * @param recoveredBefore positions of the layers whose recoveries come off first
     */
    public record Layer(String name, String terms, boolean ofYear, double retention, double limit, double franchise, double kept, double limits,
            int reinstatements, List<Double> uses, List<Double> shares, double lossOnLine, List<Integer> recoveredBefore) {

        public Layer {
            uses = List.copyOf(uses);
            shares = List.copyOf(shares);
            recoveredBefore = List.copyOf(recoveredBefore);
            new Check().notNegative("retention", retention).positiveOrInfinite("limit", limit).notNegative("kept", kept)
                    .positiveOrInfinite("limits", limits).orThrow();
        }

        double top() {
            return retention + limit;
        }

        boolean covers(int peril) {
            return !Double.isNaN(shares.get(peril));
        }

        Layer with(double newRetention, double newLimit) {
            return new Layer(name, terms, ofYear, newRetention, newLimit, franchise, kept, limits, reinstatements, uses, shares, lossOnLine, recoveredBefore);
        }

        Layer withReinstatements(int number) {
            return new Layer(name, terms, ofYear, retention, limit, franchise, kept, number + 1, number, uses, shares, lossOnLine, recoveredBefore);
        }

        /** Whether the right edge adds and removes reinstatements. */
        boolean reinstates() {
            return !ofYear && reinstatements != BY_ANNUAL_LIMIT && limit < Double.POSITIVE_INFINITY;
        }

        /** What is drawn, in words. */
        String inWords() {
            List<String> parts = new ArrayList<>(List.of(name, terms));
            if (!Double.isNaN(lossOnLine)) {
                parts.add("loss on line " + TowerText.part(lossOnLine));
            }
            for (int k = 0; k < uses.size() && !ofYear; k++) {
                parts.add(TowerText.place(k) + " limit used " + TowerText.part(uses.get(k)));
            }
            return String.join(", ", parts);
        }
    }

    /** With other terms where a hand moves them. */
    Tower with(List<TowerChange> changes) {
        List<Layer> moved = new ArrayList<>(layers);
        changes.forEach(c -> moved.set(c.layer(), layers.get(c.layer()).with(c.retention(), c.limit())));
        return new Tower(perils, moved, haze);
    }

    /** With another number of reinstatements where a hand adds or removes them. */
    Tower withReinstatements(int layer, int number) {
        List<Layer> changed = new ArrayList<>(layers);
        changed.set(layer, layers.get(layer).withReinstatements(number));
        return new Tower(perils, changed, haze);
    }

    /** Positions of the layers that cover each event, or the year's total. */
    List<Integer> positions(boolean ofYear) {
        return IntStream.range(0, layers.size()).filter(j -> layers.get(j).ofYear() == ofYear).boxed().toList();
    }

    /** How far up the axis must reach. */
    double highest() {
        double highest = 0;
        for (Layer layer : layers) {
            highest = Math.max(highest, layer.limit() < Double.POSITIVE_INFINITY ? layer.top() : 2 * layer.retention());
        }
        if (highest > 0) {
            return highest;
        }
        return haze.stream().filter(mark -> mark.years() <= 101).mapToDouble(Mark::amount).filter(a -> a > 0).max().orElse(100);
    }

    /** The lowest retention above 0, half of which a logarithmic axis starts from. */
    double lowest() {
        return layers.stream().mapToDouble(Layer::retention).filter(r -> r > 0).min().orElse(highest() / 10);
    }
}
