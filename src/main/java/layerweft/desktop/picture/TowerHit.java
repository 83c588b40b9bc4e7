package layerweft.desktop.picture;

import java.util.List;
import java.util.Optional;

/** What of a tower lies under the hand. */
final class TowerHit {
    private static final double NEAR = 5;
    /** In a low block the edges leave a third of the height to the body. */
    private static final double PART_OF_LOW = 1 / 3.0;

    private TowerHit() {}

    /** @param selected layer whose edges win where two layers share one */
    static Optional<TowerGrip> at(Tower tower, TowerLayout layout, int selected, double x, double y) {
        Optional<TowerGrip> own = layout.all().stream().filter(b -> b.layer() == selected).findFirst().flatMap(b -> of(tower, b, x, y));
        if (own.isPresent()) {
            return own;
        }
        List<TowerLayout.Block> blocks = layout.all();
        for (TowerLayout.Block block : blocks) {
            if (block.contains(x, y, 0)) {
                return of(tower, block, x, y);
            }
        }
        return blocks.stream().flatMap(b -> of(tower, b, x, y).stream()).findFirst();
    }

    private static Optional<TowerGrip> of(Tower tower, TowerLayout.Block block, double x, double y) {
        Tower.Layer layer = tower.layers().get(block.layer());
        if (!block.contains(x, y, NEAR)) {
            return Optional.empty();
        }
        double inside = Math.min(NEAR, block.height() * PART_OF_LOW);
        if (layer.reinstates() && x >= block.right() - NEAR) {
            return Optional.of(new TowerGrip(block.layer(), TowerGrip.Part.RIGHT));
        }
        if (layer.limit() < Double.POSITIVE_INFINITY && y <= block.top() + inside) {
            return Optional.of(new TowerGrip(block.layer(), TowerGrip.Part.TOP));
        }
        if (Double.isNaN(layer.franchise()) && y >= block.bottom() - inside) {
            return Optional.of(new TowerGrip(block.layer(), TowerGrip.Part.BOTTOM));
        }
        return Optional.of(new TowerGrip(block.layer(), TowerGrip.Part.BODY));
    }
}
