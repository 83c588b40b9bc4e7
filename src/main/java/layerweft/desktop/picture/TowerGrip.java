package layerweft.desktop.picture;

import java.util.ArrayList;
import java.util.List;

/**
 * What a hand holds of a tower, and what moving it does.
 *
 * @param layer position in the programme
 */
record TowerGrip(int layer, Part part) {

    /** Parts that can be moved. */
    enum Part { TOP, BOTTOM, BODY, RIGHT }

    private static final double SAME = 1e-9;

    /**
     * The terms after a movement up or down.
     *
     * @param from amount at which the hand took hold
     * @param to amount at which it is
     * @param scale gives the steps
     * @param free whether it may stop between steps
     * @param together whether adjoining layers move too: those at a shared edge, with the body the whole pile
     */
    List<TowerChange> moved(Tower tower, double from, double to, AmountScale scale, boolean free, boolean together) {
        Tower.Layer held = tower.layers().get(layer);
        return switch (part) {
            case TOP -> edge(tower, held.top(), place(held.top() + to - from, scale, free), scale, together);
            case BOTTOM -> edge(tower, held.retention(), place(held.retention() + to - from, scale, free), scale, together);
            case BODY -> body(tower, place(held.retention() + to - from, scale, free) - held.retention(), together);
            case RIGHT -> List.of();
        };
    }

    private static double place(double amount, AmountScale scale, boolean free) {
        return Math.max(0, free ? rounded(amount, scale) : scale.snapped(amount));
    }

    /** Even a free hand leaves no more digits than the eye can tell apart. */
    private static double rounded(double amount, AmountScale scale) {
        double step = AmountScale.stepOf(scale.step(amount) / 50);
        return AmountScale.tidy(Math.rint(amount / step) * step);
    }

    /** Moves an edge, the far ends held; never across a layer's other edge. */
    private List<TowerChange> edge(Tower tower, double old, double wished, AmountScale scale, boolean together) {
        double least = 0;
        double most = Double.POSITIVE_INFINITY;
        List<Integer> hung = new ArrayList<>();
        List<Integer> standing = new ArrayList<>();
        for (int j = 0; j < tower.layers().size(); j++) {
            Tower.Layer other = tower.layers().get(j);
            boolean own = j == layer;
            boolean beside = together && other.ofYear() == tower.layers().get(layer).ofYear();
            if (part == Part.TOP ? own || beside && same(other.top(), old) : beside && !own && same(other.top(), old)) {
                hung.add(j);
                least = Math.max(least, other.retention() + scale.step(other.retention()));
            }
            if (part == Part.BOTTOM ? own || beside && same(other.retention(), old) : beside && !own && same(other.retention(), old)) {
                standing.add(j);
                most = Math.min(most, other.top() - scale.step(other.top()));
            }
        }
        if (most < least) {
            return List.of();
        }
        double edge = Math.max(least, Math.min(most, wished));
        List<TowerChange> changes = new ArrayList<>();
        for (int j : hung) {
            double retention = tower.layers().get(j).retention();
            changes.add(new TowerChange(j, retention, AmountScale.tidy(edge - retention)));
        }
        for (int j : standing) {
            changes.add(new TowerChange(j, edge, AmountScale.tidy(tower.layers().get(j).top() - edge)));
        }
        return changes;
    }

    private List<TowerChange> body(Tower tower, double by, boolean together) {
        List<Integer> pile = together ? pile(tower) : List.of(layer);
        double lowest = pile.stream().mapToDouble(j -> tower.layers().get(j).retention()).min().orElse(0);
        double shift = Math.max(by, -lowest);
        return pile.stream().map(j -> new TowerChange(j, AmountScale.tidy(tower.layers().get(j).retention() + shift), tower.layers().get(j).limit())).toList();
    }

    /** The layer and all that adjoin it, directly or through others. */
    private List<Integer> pile(Tower tower) {
        List<Integer> pile = new ArrayList<>(List.of(layer));
        for (int k = 0; k < pile.size(); k++) {
            Tower.Layer one = tower.layers().get(pile.get(k));
            for (int j = 0; j < tower.layers().size(); j++) {
                Tower.Layer other = tower.layers().get(j);
                boolean adjoins = same(other.retention(), one.top()) || same(other.top(), one.retention());
                if (adjoins && other.ofYear() == one.ofYear() && !pile.contains(j)) {
                    pile.add(j);
                }
            }
        }
        return pile;
    }

    private static boolean same(double a, double b) {
        return Math.abs(a - b) <= SAME * Math.max(1, Math.abs(a)) && a < Double.POSITIVE_INFINITY;
    }
}
