package layerweft.desktop.picture;

import java.util.ArrayList;
import java.util.List;
import layerweft.model.copula.CopulaFamily;

/** Writes down what a tile asks for. */
final class TileRecorder implements TileActions {
    final List<String> asked = new ArrayList<>();

    @Override
    public void preview(CopulaFamily family) {
        asked.add("preview " + family.label());
    }

    @Override
    public void take(CopulaFamily family) {
        asked.add("take " + family.label());
    }

    @Override
    public void giveUp(CopulaFamily family) {
        asked.add("give up " + family.label());
    }
}
