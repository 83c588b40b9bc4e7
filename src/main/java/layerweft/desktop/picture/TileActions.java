package layerweft.desktop.picture;

import layerweft.model.copula.CopulaFamily;

/** What a hand asks of a tile's owner. */
public interface TileActions {

    /** The tile is pressed: show what the family would do. */
    void preview(CopulaFamily family);

    /** The tile was clicked: take the family. */
    void take(CopulaFamily family);

    /** The press was given up: as before. */
    void giveUp(CopulaFamily family);
}
