package layerweft.desktop.picture;

import java.util.ArrayList;
import java.util.List;

/** Writes down what a tower asks for. */
final class TowerRecorder implements TowerActions {
    final List<String> asked = new ArrayList<>();
    final List<TowerChange> last = new ArrayList<>();

    @Override
    public void select(int layer) {
        asked.add("select " + layer);
    }

    @Override
    public void terms(List<TowerChange> changes, Phase phase) {
        last.clear();
        last.addAll(changes);
        asked.add("terms " + phase);
    }

    @Override
    public void reinstatements(int layer, int number, Phase phase) {
        asked.add("reinstatements " + layer + " " + number + " " + phase);
    }

    @Override
    public void drawn(double retention, double limit) {
        asked.add("drawn " + TowerText.terms(limit, retention));
    }

    String lastAsked() {
        return asked.get(asked.size() - 1);
    }
}
