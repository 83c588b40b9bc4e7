package layerweft.desktop.picture;

import java.util.List;

/** What a hand asks of a tower's owner. */
public interface TowerActions {

    /** Where a movement is. */
    enum Phase {
        /** Still in the hand. */
        MOVING,
        /** Let go: this is what is wanted. */
        DONE,
        /** Given up: the terms are those before. */
        GIVEN_UP
    }

    /** @param layer position of the layer that was chosen */
    void select(int layer);

    /** New terms: of one layer, or of several that move together. */
    void terms(List<TowerChange> changes, Phase phase);

    /** @param number of reinstatements, at least 0; {@link Tower#UNLIMITED} where a movement is given up that began there */
    void reinstatements(int layer, int number, Phase phase);

    /** The first layer of an empty programme. */
    void drawn(double retention, double limit);
}
