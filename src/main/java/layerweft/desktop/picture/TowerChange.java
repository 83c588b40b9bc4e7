package layerweft.desktop.picture;

/**
 * New terms of a layer that a hand moves.
 *
 * @param layer position in the programme
 * @param retention of an event, or annual deductible of a cover of the year's total
 * @param limit likewise, above 0
 */
public record TowerChange(int layer, double retention, double limit) {}
