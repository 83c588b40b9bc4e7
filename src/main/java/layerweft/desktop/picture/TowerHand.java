package layerweft.desktop.picture;

import java.util.List;

/**
 * A movement in progress. Everything is reckoned from where it began, so that nothing creeps.
 *
 * @param before the tower as it was
 * @param scale as it was: an axis that moved with the hand would run away from it
 * @param grip what is held; null while the first layer is drawn
 * @param from amount at which the hand took hold
 * @param fromX place on the sheet
 * @param pitch width of a full limit on the sheet
 */
record TowerHand(Tower before, AmountScale scale, TowerGrip grip, double from, double fromX, double pitch) {
    private static final int MOST_REINSTATEMENTS = 20;

    List<TowerChange> terms(double y, boolean free, boolean together) {
        return grip.moved(before, from, scale.amount(y), scale, free, together);
    }

    /** One more or fewer for each width of a full limit; unlimited ones begin from what is drawn. */
    int reinstatements(double x) {
        Tower.Layer layer = before.layers().get(grip.layer());
        int had = layer.reinstatements() == Tower.UNLIMITED
                ? (int) TowerCells.of(layer).stream().filter(c -> c.kind() != TowerCells.Kind.KEPT).count() - 1 : layer.reinstatements();
        return Math.max(0, Math.min(MOST_REINSTATEMENTS, had + (int) Math.round((x - fromX) / pitch)));
    }

    /** The first layer: from where the hand took hold to where it is. */
    TowerChange drawn(double y, boolean free) {
        double start = free ? from : scale.snapped(from);
        double end = free ? scale.amount(y) : scale.snapped(scale.amount(y));
        return new TowerChange(0, Math.min(start, end), AmountScale.tidy(Math.abs(end - start)));
    }

    /** The terms as they were, of the layers that were moved. */
    List<TowerChange> back(List<TowerChange> moved) {
        return moved.stream().map(c -> new TowerChange(c.layer(), before.layers().get(c.layer()).retention(), before.layers().get(c.layer()).limit())).toList();
    }
}
