package layerweft.engine.transform;

import java.util.SortedMap;
import java.util.TreeMap;
import layerweft.figures.Bracket;
import layerweft.figures.Engine;
import layerweft.figures.Figure;
import layerweft.figures.LayerStatistics;
import layerweft.model.treaty.Buyer;

/** The figures of a layer that stands above every possible loss: nothing, exactly. */
final class UnreachableLayer {
    private static final Figure NOTHING = Figure.exact(0);

    private UnreachableLayer() {}

    static LayerStatistics statistics(Buyer buyer) {
        SortedMap<Double, Figure> nothing = new TreeMap<>();
        buyer.levels().forEach(level -> nothing.put(level, NOTHING));
        return new LayerStatistics(Engine.TRANSFORM, NOTHING, new Bracket(0, 0), NOTHING, NOTHING, NOTHING, NOTHING, NOTHING, NOTHING, NOTHING,
                nothing, NOTHING, nothing);
    }
}
