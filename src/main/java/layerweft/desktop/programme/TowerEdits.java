package layerweft.desktop.programme;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.function.UnaryOperator;
import layerweft.desktop.picture.TowerActions;
import layerweft.desktop.picture.TowerChange;
import layerweft.desktop.session.LayerEdit;
import layerweft.desktop.session.Session;
import layerweft.file.FileTree;

/** Writes what a hand does to the tower into the programme: one step of undo for each movement. */
final class TowerEdits implements TowerActions {
    private final Session session;
    private Object gesture;

    TowerEdits(Session session) {
        this.session = session;
    }

    @Override
    public void select(int layer) {
        session.selectedLayer().set(layer);
    }

    @Override
    public void terms(List<TowerChange> changes, Phase phase) {
        follow("change of terms", phase, programme -> {
            FileTree moved = programme;
            for (TowerChange change : changes) {
                moved = moved(moved, change);
            }
            return moved;
        });
    }

    @Override
    public void reinstatements(int layer, int number, Phase phase) {
        follow("change of reinstatements", phase, programme -> reinstated(programme, layer, number));
    }

    @Override
    public void drawn(double retention, double limit) {
        session.edit("a new layer", d -> d.withProgramme(t -> LayerEdit.added(t, LayerEdit.count(t), retention, limit)));
    }

    /** Edits of one movement share a gesture; keys, which begin and end at once, have none. */
    private void follow(String what, Phase phase, UnaryOperator<FileTree> edit) {
        if (phase == Phase.GIVEN_UP) {
            session.giveUp(gesture);
            gesture = null;
            return;
        }
        if (gesture == null && phase == Phase.MOVING) {
            gesture = new Object();
        }
        Object present = gesture;
        session.edit(what, present, d -> d.withProgramme(edit));
        if (phase == Phase.DONE) {
            gesture = null;
        }
    }

    /** Heights are subject losses; the terms are agreed on the quota share of them. */
    private static FileTree moved(FileTree programme, TowerChange change) {
        String at = "layers[" + change.layer() + "]";
        double share = programme.number(at + ".quotaShare");
        double q = Double.isNaN(share) ? 1 : share;
        double limit = change.limit() < Double.POSITIVE_INFINITY ? change.limit() * q : Double.NaN;
        boolean ofYear = ofYear(programme, at);
        String terms = at + (ofYear ? ".annual" : ".occurrence");
        FileTree limited = Double.isNaN(limit) ? programme : programme.set(terms + ".limit", tidy(limit));
        return programme.has(at + ".occurrence.franchise") ? limited : limited.set(terms + (ofYear ? ".deductible" : ".retention"), tidy(change.retention() * q));
    }

    /** As {@link TowerOf} sees it: no terms of an event, but terms of the year. */
    private static boolean ofYear(FileTree programme, String at) {
        boolean limited = programme.has(at + ".occurrence.limit") || programme.has(at + ".occurrence.franchise");
        return !limited && !(programme.number(at + ".occurrence.retention") > 0) && programme.has(at + ".annual");
    }

    private static double tidy(double amount) {
        return Double.parseDouble(String.format(Locale.ROOT, "%.10g", amount));
    }

    /** New reinstatements cost what the last one does, the first 100 %. */
    private static FileTree reinstated(FileTree programme, int layer, int number) {
        String path = "layers[" + layer + "].reinstatements";
        List<Object> rates = new ArrayList<>(programme.get(path) instanceof List<?> list ? list : List.of());
        while (rates.size() > number) {
            rates.remove(rates.size() - 1);
        }
        while (rates.size() < number) {
            rates.add(rates.isEmpty() ? 1.0 : rates.get(rates.size() - 1));
        }
        return programme.set(path, rates);
    }
}
