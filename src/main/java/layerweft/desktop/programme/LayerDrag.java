package layerweft.desktop.programme;

import java.util.Locale;
import layerweft.file.FileTree;

/** What a hand on the tower does to a layer: the upper edge moves its limit, the lower one its retention with the top held, the body both. */
final class LayerDrag {

    private LayerDrag() {}

    /**
     * @param top whether the upper edge is held
     * @param bottom whether the lower edge is held; with neither the whole layer moves
     * @param change of the amount under the hand
     * @param snap edges stop at multiples of this; 0 for any place
     */
    static FileTree moved(FileTree programme, int layer, boolean top, boolean bottom, double change, double snap) {
        String at = "layers[" + layer + "].occurrence";
        String start = programme.has(at + ".franchise") ? at + ".franchise" : at + ".retention";
        double retention = Double.isNaN(programme.number(start)) ? 0 : programme.number(start);
        double limit = programme.number(at + ".limit");
        if (Double.isNaN(limit)) {
            return programme;
        }
        double least = snap > 0 ? snap : 1e-3 * limit;
        if (top) {
            double end = tidy(snapped(retention + limit + change, snap));
            return end - retention >= least ? programme.set(at + ".limit", tidy(end - retention)) : programme;
        }
        double moved = tidy(Math.max(0, snapped(retention + change, snap)));
        if (bottom) {
            double left = tidy(retention + limit - moved);
            return left >= least ? programme.set(start, moved).set(at + ".limit", left) : programme;
        }
        return programme.set(start, moved);
    }

    private static double snapped(double amount, double snap) {
        return snap > 0 ? Math.rint(amount / snap) * snap : amount;
    }

    /** 0.1 + 0.2 is 0.3, and no more digits than a hand can mean. */
    private static double tidy(double amount) {
        return Double.parseDouble(String.format(Locale.ROOT, "%.6g", amount));
    }
}
